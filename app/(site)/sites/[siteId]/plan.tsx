import { useLocalSearchParams } from 'expo-router';
import { PlanScreen } from '../../../../canvas/panels/shell/lazyScreens';

export default function PlanRoute() {
  const { siteId } = useLocalSearchParams<{ siteId: string }>();
  return <PlanScreen siteId={siteId} />;
}
