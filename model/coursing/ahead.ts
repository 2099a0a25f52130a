/** What the stops above each stop cost at least, wherever that stop lies: it lets a search drop dead ends early. */
import { charged, lowestOf, prune, slideUp, sumOf, type Cost, type Piece } from './costPieces';
import { heightLimits, makesWithin } from './fitInterval';
import { chargeOf, partsOf, thinCost, windowOf, type Problem, type Stop } from './problem';
import type { Work } from './search';

/**
 * For each stop, least soft cost of all the stops above it under the problem's own joint limits. The search is the forward
 * one walked from the top down, on heights turned over; that a lift needs a course is left out, which only makes the bound
 * lower. Only meant where no hard height is missed; `most` is the most that is asked for. Null where the work ran out.
 */
export function costAhead(problem: Problem, most: number, work: Work): Cost[] | null {
  const bound: Cost = { hard: 0, soft: most };
  const ahead: Cost[] = [];
  let above: readonly Piece[] = [];
  for (let i = problem.stops.length - 1; i >= 0; i--) {
    const stop = problem.stops[i] as Stop;
    const { lo, hi } = windowOf(problem, i);
    const free = { lo: -hi, hi: -lo, hard: 0, soft: 0, hardSlope: 0, softSlope: 0 };
    const from = i === problem.stops.length - 1 ? [free] : comeDown(problem, stop, above, -hi, -lo, work);
    if (work.left < 0) return null;
    ahead[i] = { hard: 0, soft: Math.min(most, leastSoft(from)) };
    const turned = { ...stop, height: -stop.height as Stop['height'] };
    above = prune(sumOf(from, chargeOf(turned, -hi, -lo, partsOf(problem))), bound);
  }
  return ahead;
}

function comeDown(
  problem: Problem,
  stop: Stop,
  above: readonly Piece[],
  lo: number,
  hi: number,
  work: Work,
): readonly Piece[] {
  const first = above[0];
  const last = above[above.length - 1];
  if (!first || !last) return [];
  const { unit, joint } = problem;
  const least = lo - stop.beamDepth - last.hi;
  const most = hi - stop.beamDepth - first.lo;
  const arrivals: (readonly Piece[])[] = [];
  for (const { count, thin } of makesWithin(least, most, unit, joint, problem.thin ?? null)) {
    const limits = heightLimits(count, unit, joint, thin);
    if (limits.least > limits.most) continue;
    work.left -= above.length;
    if (work.left < 0) return [];
    const risen = slideUp(above, limits.least + stop.beamDepth, limits.most + stop.beamDepth, lo, hi);
    arrivals.push(charged(risen, thinCost(problem, thin)));
  }
  return lowestOf(arrivals);
}

function leastSoft(pieces: readonly Piece[]): number {
  return pieces.reduce(
    (least, piece) => Math.min(least, piece.soft, piece.soft + piece.softSlope * (piece.hi - piece.lo)),
    Infinity,
  );
}
