import { Slot, useLocalSearchParams } from 'expo-router';
import { SiteFrame } from '../../../../canvas/panels/shell/SiteFrame';
import { DraftWhenDrawn } from '../../../../canvas/panels/shell/DraftWhenDrawn';

export default function SiteLayout() {
  const { siteId } = useLocalSearchParams<{ siteId: string }>();
  return (
    <SiteFrame siteId={siteId}>
      <DraftWhenDrawn siteId={siteId}>
        <Slot />
      </DraftWhenDrawn>
    </SiteFrame>
  );
}
