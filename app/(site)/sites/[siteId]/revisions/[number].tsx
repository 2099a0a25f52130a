import { useLocalSearchParams } from 'expo-router';
import { RevisionScreen } from '../../../../../canvas/panels/shell/lazyScreens';

export default function RevisionRoute() {
  const { siteId, number } = useLocalSearchParams<{ siteId: string; number: string }>();
  return <RevisionScreen siteId={siteId} number={Number(number)} />;
}
