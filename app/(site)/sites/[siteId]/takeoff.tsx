import { useLocalSearchParams } from 'expo-router';
import { TakeoffScreen } from '../../../../canvas/panels/shell/lazyScreens';

export default function TakeoffRoute() {
  const { siteId } = useLocalSearchParams<{ siteId: string }>();
  return <TakeoffScreen siteId={siteId} />;
}
