/**
 * The least cost of one coursing problem within given joint limits, exactly.
 *
 * Every stop i takes a whole height yᵢ, and every interval between neighbouring stops a whole count nᵢ of courses with
 * nᵢ (u + l) ≤ yᵢ − (yᵢ₋₁ + depth of the beam between) ≤ nᵢ (u + m), for unit u and joint limits l…m; each lift has a
 * course at least. Where one course of an interval may be thinner, of p…q, its limits are lower by u − p and u − q and it
 * costs one part more. The cost is the sum of the stops' charges. For given counts these are difference constraints,
 * whose matrix is totally unimodular, so whole heights lose nothing. The least cost of having come to each
 * height is a piecewise linear function: it is carried from stop to stop, for all counts at once.
 */
import {
  charged,
  compareCosts,
  costAt,
  lowestOf,
  prune,
  raise,
  slideUp,
  sumOf,
  type Cost,
  type Piece,
  costOn,
} from './costPieces';
import { heightLimits, jointRange, makesWithin, type JointLimits, type Make } from './fitInterval';
import { chargeOf, partsOf, thinCost, windowOf, type Problem, type Stop, type ThinCourse } from './problem';

/** Counts and heights of one answer, stop by stop. */
export interface Plan {
  readonly cost: Cost;
  /** Height taken by each stop. */
  readonly heights: readonly number[];
  /** Courses between the stop below (or the start, or the beam below) and this one. */
  readonly counts: readonly number[];
  /** Whether the last of those courses is a thinner one. */
  readonly thins: readonly boolean[];
}

/** Which counts a stop's interval may have, with and without a thinner course. */
export type CountAllowed = (stop: number, count: number, thin: boolean) => boolean;

/** Pieces of cost that searches may still make; below zero they have stopped for lack of it. */
export interface Work {
  left: number;
}

export interface SearchHelp {
  /** Shared by the searches of one task, and used up by them. */
  readonly work: Work;
  readonly allowed?: CountAllowed;
  /** For each stop, a cost that the stops above it are known to add at least. */
  readonly ahead?: readonly Cost[];
}

interface Stage {
  /** Least cost of having come to each height, this stop's charge included: with a course in this lift, and with none yet. */
  readonly begun: readonly Piece[];
  readonly bare: readonly Piece[];
}

const ANY_COUNT: CountAllowed = () => true;

/**
 * The cheapest plan of those with neither part of the cost over `bound`, or null where there is none or `work` ran out. Ties go to joints
 * near the nominal. Costs only grow from stop to stop, so what is over the bound is dropped on the way: a tight bound
 * makes the search quick, and changes nothing else.
 */
export function cheapestWithin(
  problem: Problem,
  joint: JointLimits,
  bound: Cost,
  { work, allowed = ANY_COUNT, ahead }: SearchHelp,
): Plan | null {
  const stages: Stage[] = [
    {
      begun: [{ lo: problem.start, hi: problem.start, hard: 0, soft: 0, hardSlope: 0, softSlope: 0 }],
      bare: [],
    },
  ];
  for (let i = 0; i < problem.stops.length; i++) {
    const next = advance(problem, joint, stages[i] as Stage, i, allowed, lessCost(bound, ahead?.[i]), work);
    if (work.left < 0 || (next.begun.length === 0 && next.bare.length === 0)) return null;
    stages.push(next);
  }
  return retrace(problem, joint, stages, allowed);
}

function lessCost(bound: Cost, ahead: Cost | undefined): Cost {
  return ahead ? { hard: bound.hard - ahead.hard, soft: bound.soft - ahead.soft } : bound;
}

function advance(
  problem: Problem,
  joint: JointLimits,
  from: Stage,
  index: number,
  allowed: CountAllowed,
  bound: Cost,
  work: Work,
): Stage {
  const stop = problem.stops[index] as Stop;
  const { lo, hi } = windowOf(problem, index);
  const charge = chargeOf(stop, lo, hi, partsOf(problem));
  const arrivals: (readonly Piece[])[] = [];
  for (const [pieces, leastCount] of [
    [from.begun, 0],
    [from.bare, 1],
  ] as const) {
    for (const { count, thin } of makesFrom(pieces, lo, hi, problem, joint)) {
      if (count < leastCount || !allowed(index, count, thin !== null)) continue;
      const limits = heightLimits(count, problem.unit, joint, thin);
      if (limits.least > limits.most) continue;
      work.left -= pieces.length;
      if (work.left < 0) return { begun: [], bare: [] };
      arrivals.push(charged(slideUp(pieces, limits.least, limits.most, lo, hi), thinCost(problem, thin)));
    }
  }
  const begun = prune(sumOf(lowestOf(arrivals), charge), bound);
  if (stop.beamDepth > 0) return { begun: [], bare: raise(begun, stop.beamDepth) };
  return { begun, bare: allowed(index, 0, false) ? prune(sumOf(from.bare, charge), bound) : [] };
}

function makesFrom(pieces: readonly Piece[], lo: number, hi: number, problem: Problem, joint: JointLimits): Make[] {
  const first = pieces[0];
  const last = pieces[pieces.length - 1];
  if (!first || !last) return [];
  return makesWithin(lo - last.hi, hi - first.lo, problem.unit, joint, problem.thin ?? null);
}

/** Goes back from the cheapest end, taking at every stop a count and a height below that explain the cost. */
function retrace(problem: Problem, joint: JointLimits, stages: readonly Stage[], allowed: CountAllowed): Plan | null {
  const end = stages[stages.length - 1] as Stage;
  const last = cheapestOf([...end.begun, ...end.bare]);
  if (!last) return null;
  const heights: number[] = [];
  const counts: number[] = [];
  const thins: boolean[] = [];
  const lastStop = problem.stops[problem.stops.length - 1];
  let height = last.height - (lastStop?.beamDepth ?? 0);
  let bare = (lastStop?.beamDepth ?? 0) === 0 && !isCost(costAt(end.begun, last.height), last.cost);
  for (let i = problem.stops.length - 1; i >= 0; i--) {
    const from = stages[i] as Stage;
    const step = bare
      ? { count: 0, thin: null, below: height, bare: true }
      : stepBelow(problem, joint, from, i, height, allowed);
    if (!step) return null;
    heights.unshift(height);
    counts.unshift(step.count);
    thins.unshift(step.thin !== null);
    const depth = problem.stops[i - 1]?.beamDepth ?? 0;
    height = step.below - depth;
    bare = step.bare && depth === 0;
  }
  return { cost: last.cost, heights, counts, thins };
}

function isCost(found: Cost | null, cost: Cost): boolean {
  return found !== null && compareCosts(found, cost) === 0;
}

interface Step {
  readonly count: number;
  readonly thin: ThinCourse | null;
  readonly below: number;
  readonly bare: boolean;
}

function stepBelow(
  problem: Problem,
  joint: JointLimits,
  from: Stage,
  index: number,
  height: number,
  allowed: CountAllowed,
): Step | null {
  const gauge = problem.unit + problem.joint.nominal;
  let best: (Step & { cost: Cost; off: number }) | null = null;
  for (const [pieces, leastCount] of [
    [from.begun, 0],
    [from.bare, 1],
  ] as const) {
    for (const make of makesFrom(pieces, height, height, problem, joint)) {
      const { count, thin } = make;
      if (count < leastCount || !allowed(index, count, thin !== null)) continue;
      const limits = heightLimits(count, problem.unit, joint, thin);
      const wish = height - count * gauge + (thin ? problem.unit - thin.most : 0);
      const found = cheapestOf(pieces, height - limits.most, height - limits.least, wish);
      if (!found) continue;
      const cost = { hard: found.cost.hard, soft: found.cost.soft + thinCost(problem, thin) };
      const off = count === 0 ? 0 : stepOf(jointRange(height - found.height, make, problem.unit, joint), problem);
      const order = best ? compareCosts(cost, best.cost) || off - best.off : -1;
      if (order < 0) best = { count, thin, below: found.height, bare: leastCount === 1, cost, off };
    }
  }
  return best;
}

/** The cheapest height within `lo`…`hi`; of equal ones the nearest to `wish`. */
function cheapestOf(
  pieces: readonly Piece[],
  lo = -Infinity,
  hi = Infinity,
  wish = 0,
): { height: number; cost: Cost } | null {
  let best: { height: number; cost: Cost } | null = null;
  for (const piece of pieces) {
    const from = Math.max(lo, piece.lo);
    const to = Math.min(hi, piece.hi);
    if (from > to) continue;
    const slope = piece.hardSlope !== 0 ? piece.hardSlope : piece.softSlope;
    const height = slope > 0 ? from : slope < 0 ? to : Math.min(to, Math.max(from, Math.round(wish)));
    const cost = costOn(piece, height);
    const order = best ? compareCosts(cost, best.cost) || Math.abs(height - wish) - Math.abs(best.height - wish) : -1;
    if (order < 0) best = { height, cost };
  }
  return best;
}

/** How far from nominal the best of an interval's joints is. */
function stepOf(range: JointLimits, problem: Problem): number {
  const { nominal } = problem.joint;
  return Math.max(0, range.least - nominal, nominal - range.most);
}
