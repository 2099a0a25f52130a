import { useLocalSearchParams } from 'expo-router';
import { MoreScreen } from '../../../../canvas/panels/shell/lazyScreens';

export default function MoreRoute() {
  const { siteId } = useLocalSearchParams<{ siteId: string }>();
  return <MoreScreen siteId={siteId} />;
}
