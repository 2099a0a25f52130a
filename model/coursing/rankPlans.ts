/** The best few plans that differ in the count of some interval, in strict order of cost. */
import { costAhead } from './ahead';
import { compareCosts, HARD_MISS } from './costPieces';
import { ANY_SOFT, cheapestPlan, type CostRange } from './deepen';
import { BEYOND_TOLERANCE, partsOf, type Problem } from './problem';
import { compareRated, refine, type RatedPlan } from './refine';
import type { CountAllowed, Plan, SearchHelp, Work } from './search';

/** Makes (see `makeOf`) already settled from the bottom up, and makes that the next stop may not have. */
interface Branch {
  readonly settled: readonly number[];
  readonly barred: ReadonlySet<number>;
  readonly plan: Plan;
  readonly rated: RatedPlan | null;
}

/** Most pieces of cost made in looking for the best plan, in refining it, and in looking for the others. */
export interface WorkLimits {
  readonly best: number;
  readonly refined: number;
  readonly others: number;
}

const WORK: WorkLimits = { best: 2_000_000, refined: 1_000_000, others: 1_000_000 };

export interface Ranking {
  readonly plans: readonly RatedPlan[];
  /** False where the bound on the work was reached: there may be more plans, and with none at all there may be a best one. */
  readonly complete: boolean;
  /** False where the work ran out before the best plan's joints were proved the nearest to nominal and the most even. */
  readonly proved: boolean;
}

/**
 * Soft cost that an alternative may have: the best plan's, and half a course more beyond tolerance for the
 * lightest height. What costs more moves a height to another course, and is no answer to the same drawing. Where hard
 * heights are missed there is no bound: the alternatives are other ways of giving them up.
 */
export function mostSoftOfOthers(problem: Problem, best: Plan): number {
  if (best.cost.hard > 0) return ANY_SOFT;
  const weights = problem.stops.flatMap((stop) => (stop.hold === 'soft' ? [stop.weight] : []));
  const lightest = weights.length > 0 ? Math.min(...weights) : 0;
  const halfCourse = (problem.unit + problem.joint.nominal) / 2;
  // One thinner course more for every stop is no dearer than that.
  const thin = problem.thin ? problem.stops.length : 0;
  return best.cost.soft + lightest * BEYOND_TOLERANCE * halfCourse * partsOf(problem) + thin;
}

/**
 * The best plan, and the next best ones up to `most`, each with different counts, that miss no more hard heights and
 * are within `mostSoftOfOthers`. The plans without the best one's counts are parted by the first stop
 * where they differ, and each part is searched in the same exact way (Lawler's partition).
 */
export function rankPlans(problem: Problem, most: number, limits: WorkLimits = WORK): Ranking {
  const hardStops = problem.stops.filter((stop) => stop.hold === 'hard').length;
  const best: Work = { left: limits.best };
  const first = cheapestPlan(problem, { missed: hardStops, leastSoft: 0, mostSoft: ANY_SOFT }, { work: best });
  if (!first) return { plans: [], complete: best.left >= 0, proved: false };
  const missed = Math.floor(first.cost.hard / HARD_MISS);
  const range: CostRange = { missed, leastSoft: first.cost.soft, mostSoft: mostSoftOfOthers(problem, first) };
  const refining: Work = { left: limits.refined };
  const ahead = missed === 0 ? costAhead(problem, range.mostSoft, refining) : null;
  const help = (work: Work, allowed: CountAllowed): SearchHelp =>
    ahead ? { work, allowed, ahead } : { work, allowed };

  const plans: RatedPlan[] = [];
  const open: Branch[] = [{ settled: [], barred: new Set(), plan: first, rated: null }];
  const others: Work = { left: limits.others };
  while (open.length > 0 && plans.length < most) {
    if (others.left < 0) return { plans, complete: false, proved: refining.left >= 0 };
    const at = cheapestIndex(open);
    const best = open[at] as Branch;
    if (!best.rated) {
      const work = best.plan === first ? refining : others;
      open[at] = { ...best, rated: refine(problem, best.plan, help(work, allowedBy(best.settled, best.barred))) };
      continue;
    }
    open.splice(at, 1);
    plans.push(best.rated);
    if (plans.length === most) break;
    const { counts, thins } = best.rated;
    const makes = counts.map((count, i) => makeOf(count, thins[i] === true));
    for (let i = best.settled.length; i < makes.length; i++) {
      const settled = makes.slice(0, i);
      const barred = new Set(i === best.settled.length ? best.barred : []);
      barred.add(makes[i] as number);
      const plan = cheapestPlan(problem, range, help(others, allowedBy(settled, barred)));
      if (plan) open.push({ settled, barred, plan, rated: null });
    }
  }
  return { plans, complete: others.left >= 0, proved: refining.left >= 0 };
}

/** A count of courses, with or without a thinner one, as one number. */
function makeOf(count: number, thin: boolean): number {
  return 2 * count + (thin ? 1 : 0);
}

function allowedBy(settled: readonly number[], barred: ReadonlySet<number>): CountAllowed {
  return (stop, count, thin) => {
    const make = makeOf(count, thin);
    return stop < settled.length ? settled[stop] === make : stop > settled.length || !barred.has(make);
  };
}

/** The branch of least cost; an unrated one before rated ones of the same cost, because it may prove better. */
function cheapestIndex(open: readonly Branch[]): number {
  let at = 0;
  for (let i = 1; i < open.length; i++) {
    const one = open[i] as Branch;
    const best = open[at] as Branch;
    const cost = compareCosts(one.plan.cost, best.plan.cost);
    if (cost < 0) at = i;
    else if (cost > 0) continue;
    else if (!one.rated && best.rated) at = i;
    else if (one.rated && best.rated && compareRated(one.rated, best.rated) < 0) at = i;
  }
  return at;
}
