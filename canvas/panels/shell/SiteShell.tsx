import type { ReactNode } from 'react';
import { DraftWhenDrawn } from './DraftWhenDrawn';
import { SiteFrame } from './SiteFrame';

/** Around every screen of a site: who may be here, the bar or the rail, and the open draft. */
export function SiteShell({ siteId, children }: { siteId: string; children: ReactNode }) {
  return (
    <SiteFrame siteId={siteId}>
      <DraftWhenDrawn siteId={siteId}>{children}</DraftWhenDrawn>
    </SiteFrame>
  );
}
