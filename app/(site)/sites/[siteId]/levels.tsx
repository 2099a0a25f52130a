import { useLocalSearchParams } from 'expo-router';
import { LevelsScreen } from '../../../../canvas/panels/shell/lazyScreens';

export default function LevelsRoute() {
  const { siteId } = useLocalSearchParams<{ siteId: string }>();
  return <LevelsScreen siteId={siteId} />;
}
