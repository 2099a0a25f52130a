/** The nearest heights below and above a missed one that courses can meet, with a thinner one at most on each side, while every other hard height is held. */
import { ticks, type Ticks } from '../length/ticks';
import { heightLimits } from './fitInterval';
import { MOST_COURSES } from './controls';
import type { Problem, Stop } from './problem';
import type { Plan } from './search';

interface Range {
  readonly lo: number;
  readonly hi: number;
}

/** Nearest meetable heights round a stop of a plan; null on a side where there is none. */
export function nearestReachable(
  problem: Problem,
  plan: Pick<Plan, 'heights'>,
  index: number,
): { below: Ticks | null; above: Ticks | null } {
  const { height } = problem.stops[index] as Stop;
  const up = climb(problem, plan, index);
  const down = descend(problem, plan, index);
  let below: number | null = null;
  let above: number | null = null;
  // Both lists rise; equal pairs are met in one pass.
  for (let i = 0, j = 0; i < up.length && j < down.length;) {
    const one = up[i] as Range;
    const other = down[j] as Range;
    const lo = Math.max(one.lo, other.lo);
    const hi = Math.min(one.hi, other.hi);
    if (lo <= hi) {
      if (lo <= height) below = Math.max(below ?? -Infinity, Math.min(hi, height));
      if (hi >= height) above = Math.min(above ?? Infinity, Math.max(lo, height));
    }
    if (one.hi <= other.hi) i++;
    else j++;
  }
  return { below: below === null ? null : ticks(below), above: above === null ? null : ticks(above) };
}

/** Heights that whole courses reach from the hard height below, or from the first course. */
function climb(problem: Problem, plan: Pick<Plan, 'heights'>, index: number): Range[] {
  let from: number = problem.start;
  let beams = 0;
  let depth = 0;
  for (let i = index - 1; i >= 0; i--) {
    const stop = problem.stops[i] as Stop;
    if (stop.beamDepth > 0) {
      depth += stop.beamDepth;
      beams++;
    }
    if (stop.hold === 'hard') {
      from = plan.heights[i] as number;
      break;
    }
  }
  return ranges(problem, beams, (limits) => ({ lo: from + depth + limits.least, hi: from + depth + limits.most }));
}

/** Heights from which whole courses reach the hard height above; anywhere when there is none. */
function descend(problem: Problem, plan: Pick<Plan, 'heights'>, index: number): Range[] {
  let beams = 0;
  let depth: number = (problem.stops[index] as Stop).beamDepth;
  if (depth > 0) beams++;
  for (let i = index + 1; i < problem.stops.length; i++) {
    const stop = problem.stops[i] as Stop;
    if (stop.hold === 'hard') {
      const to = plan.heights[i] as number;
      return ranges(problem, beams, (limits) => ({
        lo: to - depth - limits.most,
        hi: to - depth - limits.least,
      }));
    }
    if (stop.beamDepth > 0) {
      depth += stop.beamDepth;
      beams++;
    }
  }
  return [{ lo: -Infinity, hi: Infinity }];
}

/**
 * One range for each count from `least` up, with every course whole and, where that is allowed, with one of them thinner;
 * rising, and joined where they meet.
 */
function ranges(problem: Problem, least: number, range: (limits: { least: number; most: number }) => Range): Range[] {
  const found: Range[] = [];
  for (let count = least; count <= MOST_COURSES; count++) {
    for (const thin of problem.thin && count > 0 ? [problem.thin, null] : [null]) {
      const limits = heightLimits(count, problem.unit, problem.joint, thin);
      if (limits.least <= limits.most) found.push(range(limits));
    }
  }
  return joined(found);
}

function joined(found: Range[]): Range[] {
  const rising: Range[] = [];
  for (const one of found.sort((a, b) => a.lo - b.lo)) {
    const last = rising[rising.length - 1];
    if (last && one.lo <= last.hi + 1) rising[rising.length - 1] = { lo: last.lo, hi: Math.max(last.hi, one.hi) };
    else rising.push(one);
  }
  return rising;
}
