import { useLocalSearchParams } from 'expo-router';
import { RevisionsScreen } from '../../../../../canvas/panels/shell/lazyScreens';

export default function RevisionsRoute() {
  const { siteId, save } = useLocalSearchParams<{ siteId: string; save?: string }>();
  return <RevisionsScreen siteId={siteId} save={save === 'yes'} />;
}
