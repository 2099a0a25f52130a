/** Which of two runs goes through at each corner in odd courses, so that the fewest units are cut. */
import type { Walls } from '../walls/types';
import type { Chain } from './chains';
import { spanLength, type BondLimits } from './courseFill';
import { endOfRun, isLappedEnd, type EndPair, type Parity } from './ends';
import { fewestCuts } from './fillStretch';
import { lapsBetween } from './laps';
import { hasTooManyPieces } from './limits';
import { layWhole, spansOf, type FillMemo } from './layZones';
import { exchanged, farEnd } from './noCut';

/** What a wall type's stretches are solved with. */
export interface BondKit {
  readonly limits: BondLimits;
  readonly memo: FillMemo;
}

/** Cuts to count for a stretch that breaks a rule however it is cut. */
const BROKEN = 100;

/** A chain between two corners that can be turned either way. */
interface Link {
  readonly corners: readonly [string, string];
  /** Whether its two corners are to be turned unlike each other. */
  unlike: boolean;
  /** Cuts saved by that. */
  readonly saved: number;
}

/** Cuts in the two courses of a chain from end to end, no openings. */
function cutsOf(start: EndPair, end: EndPair, kit: BondKit): number {
  const spans = spansOf({ start, end });
  if (spanLength(spans[0]) <= 0 || spanLength(spans[1]) <= 0) return BROKEN;
  const [odd, even] = layWhole({ start, end }, kit.limits, kit.memo);
  const broken = odd.faults + even.faults + lapsBetween(even.joints, odd.joints, kit.limits.leastLap, 0).breaks;
  return broken > 0 ? BROKEN : odd.cuts + even.cuts;
}

/** Most cuts that two courses without openings are searched for. */
const MOST_CUTS = 4;

function linkOf(chain: Chain, walls: Walls, kit: BondKit): Link | null {
  const first = chain.runs[0]!.run;
  const last = chain.runs[chain.runs.length - 1]!.run;
  if (
    chain.length <= 0 ||
    hasTooManyPieces(chain.length, kit.limits) ||
    !isLappedEnd(first, 0) ||
    !isLappedEnd(last, 1)
  )
    return null;
  const start = endOfRun(walls, first, 0, 0);
  const end = farEnd(endOfRun(walls, last, 1, 0), chain.length);
  const alike = cutsOf(start, end, kit);
  const corners = [first.ends[0].cornerId, last.ends[1].cornerId] as const;
  if (alike === 0) return { corners, unlike: false, saved: 0 };
  const spans = spansOf({ start, end: exchanged(end) });
  const unlike = fewestCuts(spans, Math.min(alike - 1, MOST_CUTS), kit.limits) ?? alike;
  return { corners, unlike: unlike < alike, saved: alike - unlike };
}

/**
 * The parity in which the arriving run goes through, for every corner where two runs lap. Corners turned alike let each
 * run pass through at its far end in odd courses and at its near end in even ones: that fits a length of units and one
 * return. A length of whole units fits with the run passing at both ends in the same courses, its two corners turned
 * unlike. Corners have two runs each, so that the chains between them make rows and rings; in a ring the corners turned
 * unlike must be even in number, and where they are not, the one that saves least is turned back. Each choice is then the
 * best there is: cost grows with the runs.
 */
export function turnCorners(
  chains: readonly Chain[],
  walls: Walls,
  kits: ReadonlyMap<string, BondKit>,
): Map<string, Parity> {
  const links: Link[] = [];
  const at = new Map<string, Link[]>();
  for (const chain of chains) {
    const kit = kits.get(chain.runs[0]!.run.wallTypeId);
    const link = kit ? linkOf(chain, walls, kit) : null;
    if (!link) continue;
    links.push(link);
    for (const corner of link.corners) at.set(corner, [...(at.get(corner) ?? []), link]);
  }
  const turns = new Map<string, Parity>();
  for (const link of links) {
    if (turns.has(link.corners[0])) continue;
    const ring = ringOf(link, at);
    if (ring.closed && ring.links.filter(({ unlike }) => unlike).length % 2 === 1) {
      const least = ring.links.reduce<Link | null>(
        (best, other) => (other.unlike && (!best || other.saved < best.saved) ? other : best),
        null,
      );
      if (least) least.unlike = false;
    }
    turnRing(ring.links, turns, at);
  }
  return turns;
}

/** The links that hang together with this one, and whether they close. */
function ringOf(link: Link, at: ReadonlyMap<string, readonly Link[]>): { links: Link[]; closed: boolean } {
  const links = new Set<Link>([link]);
  const corners = new Set<string>();
  for (const { corners: ends } of links)
    for (const corner of ends) {
      corners.add(corner);
      for (const other of at.get(corner) ?? []) links.add(other);
    }
  return { links: [...links], closed: links.size === corners.size };
}

function turnRing(links: readonly Link[], turns: Map<string, Parity>, at: ReadonlyMap<string, readonly Link[]>): void {
  const first = links[0]!.corners[0];
  turns.set(first, 0);
  const next = [first];
  for (let corner = next.pop(); corner !== undefined; corner = next.pop())
    for (const { corners, unlike } of at.get(corner) ?? []) {
      const other = corners[0] === corner ? corners[1] : corners[0];
      if (turns.has(other)) continue;
      const here = turns.get(corner)!;
      turns.set(other, unlike ? (here === 0 ? 1 : 0) : here);
      next.push(other);
    }
}
