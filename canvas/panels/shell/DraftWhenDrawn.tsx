import { usePathname } from 'expo-router';
import { useState, type ReactNode } from 'react';
import { DraftProvider } from '../workspace/DraftProvider';

/** Parts of a site that show nothing of the drawing, and so need not wait for its draft. */
const WITHOUT_DRAWING = /^\/sites\/[^/]+\/(crew|more)$/;

/** Opens the draft once a part that draws is first shown, and then keeps it open for the whole visit to the site. */
export function DraftWhenDrawn({ siteId, children }: { siteId: string; children: ReactNode }) {
  const draws = !WITHOUT_DRAWING.test(usePathname());
  const [drawn, setDrawn] = useState(draws);
  if (draws && !drawn) setDrawn(true);
  return drawn || draws ? <DraftProvider siteId={siteId}>{children}</DraftProvider> : children;
}
