import { useLocalSearchParams } from 'expo-router';
import { PoleScreen } from '../../../../canvas/panels/shell/lazyScreens';

export default function PoleRoute() {
  const { siteId } = useLocalSearchParams<{ siteId: string }>();
  return <PoleScreen siteId={siteId} />;
}
