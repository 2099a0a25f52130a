import { Slot, useLocalSearchParams } from 'expo-router';
import { SiteFrame } from '../../../../canvas/panels/shell/SiteFrame';
import { DraftProvider } from '../../../../canvas/panels/workspace/DraftProvider';

export default function SiteLayout() {
  const { siteId } = useLocalSearchParams<{ siteId: string }>();
  return (
    <SiteFrame siteId={siteId}>
      <DraftProvider siteId={siteId}>
        <Slot />
      </DraftProvider>
    </SiteFrame>
  );
}
