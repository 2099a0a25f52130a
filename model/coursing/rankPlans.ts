/** The best few plans that differ in the count of some interval, in strict order of cost. */
import { compareCosts } from './costPieces';
import { compareRated, refine, type RatedPlan } from './refine';
import { cheapestPlan } from './deepen';
import type { CountAllowed, Plan } from './search';
import type { Problem } from './problem';

/** Counts already settled from the bottom up, and counts that the next stop may not have. */
interface Branch {
  readonly settled: readonly number[];
  readonly barred: ReadonlySet<number>;
  readonly plan: Plan;
  readonly rated: RatedPlan | null;
}

/** Exact searches that the alternatives may cost, the best answer apart. */
const MOST_SEARCHES = 150;

export interface Ranking {
  readonly plans: readonly RatedPlan[];
  /** False where the bound on the work was reached before `most` plans were found; the first is always the best. */
  readonly complete: boolean;
}

/**
 * The `most` best plans, each with different counts: the plans without the best one's counts are parted by the first
 * stop where they differ, and each part is searched in the same exact way (Lawler's partition).
 */
export function rankPlans(problem: Problem, most: number): Ranking {
  let searches = 0;
  const branch = (settled: readonly number[], barred: ReadonlySet<number>): Branch | null => {
    searches++;
    const plan = cheapestPlan(problem, problem.joint, allowedBy(settled, barred));
    return plan && { settled, barred, plan, rated: null };
  };
  const first = branch([], new Set());
  const plans: RatedPlan[] = [];
  const open: Branch[] = first ? [first] : [];
  while (open.length > 0 && plans.length < most) {
    if (searches > MOST_SEARCHES && plans.length > 0) return { plans, complete: false };
    const at = cheapestIndex(open);
    const best = open[at] as Branch;
    if (!best.rated) {
      const allowed: CountAllowed = (stop, count) => {
        searches += stop === 0 ? 0.2 : 0;
        return allowedBy(best.settled, best.barred)(stop, count);
      };
      open[at] = { ...best, rated: refine(problem, best.plan, allowed) };
      continue;
    }
    open.splice(at, 1);
    plans.push(best.rated);
    for (let i = best.settled.length; i < best.rated.counts.length; i++) {
      const barred = new Set(i === best.settled.length ? best.barred : []);
      barred.add(best.rated.counts[i] as number);
      const next = branch(best.rated.counts.slice(0, i), barred);
      if (next) open.push(next);
    }
  }
  return { plans, complete: true };
}

function allowedBy(settled: readonly number[], barred: ReadonlySet<number>): CountAllowed {
  return (stop, count) =>
    stop < settled.length ? settled[stop] === count : stop > settled.length || !barred.has(count);
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
