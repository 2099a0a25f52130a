import type { IconName } from '../../ui/iconPaths';

/** The parts of a site, as they stand in the bar and the rail. */
export const siteParts = [
  { part: 'plan', words: 'plan', icon: 'plan' },
  { part: 'elevation', words: 'walls', icon: 'walls' },
  { part: 'poles', words: 'poles', icon: 'poles' },
  { part: 'levels', words: 'levels', icon: 'levels' },
  { part: 'takeoff', words: 'takeoff', icon: 'takeoff' },
  { part: 'revisions', words: 'revisions', icon: 'revisions' },
  { part: 'crew', words: 'crew', icon: 'crew' },
  { part: 'more', words: 'more', icon: 'more' },
] as const satisfies readonly { part: string; words: string; icon: IconName }[];

export type SitePart = (typeof siteParts)[number]['part'];

/** On a phone five fit under the thumb; the others are reached from More. */
const inBar: ReadonlySet<SitePart> = new Set(['plan', 'elevation', 'poles', 'levels', 'more']);

export function partsInBar() {
  return siteParts.filter(({ part }) => inBar.has(part));
}

/** Which part a path shows: `/sites/1234/revisions/compare` shows revisions. */
export function partOf(pathname: string): SitePart | null {
  const name = /^\/sites\/[^/]+\/([^/]+)/.exec(pathname)?.[1];
  return siteParts.find(({ part }) => part === name)?.part ?? null;
}

/** Which item of the phone's bar is lit for a part. */
export function barPartOf(part: SitePart | null): SitePart | null {
  return part === null || inBar.has(part) ? part : 'more';
}
