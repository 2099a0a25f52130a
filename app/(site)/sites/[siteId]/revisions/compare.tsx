import { useLocalSearchParams } from 'expo-router';
import { CompareScreen } from '../../../../../canvas/panels/shell/lazyScreens';

export default function CompareRoute() {
  const { siteId, before, after } = useLocalSearchParams<{ siteId: string; before?: string; after?: string }>();
  return <CompareScreen siteId={siteId} before={before ?? ''} after={after ?? ''} />;
}
