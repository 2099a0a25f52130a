import { Slot, useLocalSearchParams } from 'expo-router';
import { SiteShell } from '../../../../canvas/panels/shell/lazyScreens';

export default function SiteLayout() {
  const { siteId } = useLocalSearchParams<{ siteId: string }>();
  return (
    <SiteShell siteId={siteId}>
      <Slot />
    </SiteShell>
  );
}
