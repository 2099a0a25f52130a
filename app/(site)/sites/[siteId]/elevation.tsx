import { useLocalSearchParams } from 'expo-router';
import { ElevationScreen } from '../../../../canvas/panels/shell/lazyScreens';

export default function ElevationRoute() {
  const { siteId } = useLocalSearchParams<{ siteId: string }>();
  return <ElevationScreen siteId={siteId} />;
}
