import { useEffect, type ReactNode } from 'react';
import { keepPageFiles } from '../../client/pageFiles';
import { DraftWhenDrawn } from './DraftWhenDrawn';
import { fetchSiteScreens } from './lazyScreens';
import { SiteFrame } from './SiteFrame';

const QUIET_MS = 4000;

/** Around every screen of a site: who may be here, the bar or the rail, and the open draft. */
export function SiteShell({ siteId, children }: { siteId: string; children: ReactNode }) {
  useEffect(() => {
    // Once the site stands: the code of its other screens, so that they open at once, also where there is no signal.
    const timer = setTimeout(() => keepPageFiles(fetchSiteScreens()), QUIET_MS);
    return () => clearTimeout(timer);
  }, []);
  return (
    <SiteFrame siteId={siteId}>
      <DraftWhenDrawn siteId={siteId}>{children}</DraftWhenDrawn>
    </SiteFrame>
  );
}
