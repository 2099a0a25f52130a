import { useLocalSearchParams } from 'expo-router';
import { RevisionsScreen } from '../../../../../canvas/panels/shell/lazyScreens';

export default function RevisionsRoute() {
  const { siteId } = useLocalSearchParams<{ siteId: string }>();
  return <RevisionsScreen siteId={siteId} />;
}
