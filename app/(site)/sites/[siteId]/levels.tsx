import { useLocalSearchParams } from 'expo-router';
import { LevelsScreen } from '../../../../canvas/panels/levels/LevelsScreen';

export default function LevelsRoute() {
  const { siteId } = useLocalSearchParams<{ siteId: string }>();
  return <LevelsScreen siteId={siteId} />;
}
