import { useLocalSearchParams } from 'expo-router';
import { CrewScreen } from '../../../../canvas/panels/crew/CrewScreen';

export default function CrewRoute() {
  const { siteId } = useLocalSearchParams<{ siteId: string }>();
  return <CrewScreen siteId={siteId} />;
}
