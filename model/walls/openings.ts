/** Which openings stand rightly on their run, and why the others don't. */
import type { Opening } from '../drawing/schema';
import { roundTicks } from '../length/ticks';
import type { Reason } from '../reasons';
import type { FacedRun } from './faces';

export interface PlacedOpenings {
  /** In order along the run. */
  readonly openings: readonly Opening[];
  readonly reasons: readonly Reason[];
}

function end(opening: Opening): number {
  return opening.at + opening.width;
}

function wrongByItself(opening: Opening, run: FacedRun): Reason | null {
  const thing = { kind: 'opening', id: opening.id } as const;
  if (opening.head <= opening.sill)
    return { code: 'openingUpsideDown', weight: 'blocked', thing, amount: roundTicks(opening.sill - opening.head) };
  const [from, to] = run.clear;
  const past = Math.max(from - opening.at, end(opening) - to);
  // Faces are rounded to the tick, so less than one past the end is none.
  if (past >= 1) {
    const against = [{ kind: 'run', id: run.geometry.runId }] as const;
    return { code: 'openingPastEnd', weight: 'blocked', thing, against, amount: roundTicks(past) };
  }
  return null;
}

/** Two openings share wall where they overlap along the run and in height; the lower one's lintel is part of it. */
function shareWall(a: Opening, b: Opening): boolean {
  if (a.at >= end(b) || b.at >= end(a)) return false;
  return a.sill < b.head + b.lintel.depth && b.sill < a.head + a.lintel.depth;
}

/** How far a lintel's bearing reaches past the run's end or into another opening at its height. */
function bearingReason(opening: Opening, run: FacedRun, near: readonly Opening[]): Reason | null {
  const { bearing, depth } = opening.lintel;
  if (bearing === 0 || depth === 0) return null;
  const thing = { kind: 'opening', id: opening.id } as const;
  const from = opening.at - bearing;
  const to = end(opening) + bearing;
  const [first, last] = [0, run.geometry.length];
  const past = Math.max(first - from, to - last);
  if (past >= 1) {
    const against = [{ kind: 'run', id: run.geometry.runId }] as const;
    return { code: 'lintelBearingPastEnd', weight: 'warning', thing, against, amount: roundTicks(past) };
  }
  for (const other of near) {
    if (other === opening || other.head <= opening.head || other.sill >= opening.head + depth) continue;
    const into = Math.min(to, end(other)) - Math.max(from, other.at);
    if (into < 1) continue;
    const against = [{ kind: 'opening', id: other.id }] as const;
    return { code: 'lintelBearingPastEnd', weight: 'warning', thing, against, amount: roundTicks(into) };
  }
  return null;
}

/** Sorts one run's openings along it and takes out those that can't stand: of two that overlap, the further one. */
export function placeOpenings(run: FacedRun, openings: readonly Opening[]): PlacedOpenings {
  const sorted = [...openings].sort((a, b) => a.at - b.at || a.sill - b.sill || (a.id < b.id ? -1 : 1));
  const placed: Opening[] = [];
  const reasons: Reason[] = [];
  // Openings that reach past the one at hand; the others are behind and can't overlap any that follow.
  let open: Opening[] = [];
  for (const opening of sorted) {
    const wrong = wrongByItself(opening, run);
    if (wrong) {
      reasons.push(wrong);
      continue;
    }
    open = open.filter((other) => end(other) > opening.at);
    const over = open.find((other) => shareWall(other, opening));
    if (over) {
      reasons.push({
        code: 'openingsOverlap',
        weight: 'blocked',
        thing: { kind: 'opening', id: opening.id },
        against: [{ kind: 'opening', id: over.id }],
        amount: roundTicks(Math.min(end(over), end(opening)) - opening.at),
      });
      continue;
    }
    placed.push(opening);
    open.push(opening);
  }
  placed.forEach((opening, i) => {
    const reason = bearingReason(opening, run, nearTo(placed, i));
    if (reason) reasons.push(reason);
  });
  return { openings: placed, reasons };
}

/** The openings on either side that a bearing can reach, few enough to look at one by one. */
function nearTo(placed: readonly Opening[], i: number): readonly Opening[] {
  return placed.slice(Math.max(0, i - 4), i + 5);
}
