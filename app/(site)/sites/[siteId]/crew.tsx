import { useLocalSearchParams } from 'expo-router';
import { CrewScreen } from '../../../../canvas/panels/shell/lazyScreens';

export default function CrewRoute() {
  const { siteId } = useLocalSearchParams<{ siteId: string }>();
  return <CrewScreen siteId={siteId} />;
}
