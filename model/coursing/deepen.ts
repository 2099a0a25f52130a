/** The cheapest plan without a bound given: bounds are tried from tight to loose, so that most searches are small. */
import { HARD_MISS, type Cost } from './costPieces';
import type { JointLimits } from './fitInterval';
import type { Problem } from './problem';
import { cheapestWithin, type CountAllowed, type Plan } from './search';

/** Soft cost that the first try may have, and how much more each next try may: a thousandth of an inch, and fourfold. */
const FIRST_SOFT = 16;
const MORE_SOFT = 4;
/** Over any soft cost: 40 stops of weight 200 000 missed by 200 m tenfold stay under it. */
const ANY_SOFT = 2 ** 53;

/**
 * The cheapest plan, or null where no counts fit. First the hard heights alone: the fewest that are missed and by how
 * little. Then the soft ones within that, the bound on their cost loosened until a plan is found; the first one found is the
 * cheapest of all, because its cost is within the bound. `atLeast` is a soft cost known to be no more than the answer's.
 */
export function cheapestPlan(problem: Problem, joint: JointLimits, allowed?: CountAllowed, atLeast = 0): Plan | null {
  const hard = leastHard(problem, joint, allowed);
  if (hard === null) return null;
  for (let more = 0; ; more = more === 0 ? FIRST_SOFT : more * MORE_SOFT) {
    const soft = Math.min(ANY_SOFT, atLeast + more);
    const plan = cheapestWithin(problem, joint, { hard, soft }, allowed);
    if (plan || soft === ANY_SOFT) return plan;
  }
}

/** Least cost of the hard heights, the soft ones left out of account; null where no counts fit at all. */
function leastHard(problem: Problem, joint: JointLimits, allowed?: CountAllowed): number | null {
  const count = problem.stops.filter((stop) => stop.hold === 'hard').length;
  const hardOnly: Problem = {
    ...problem,
    stops: problem.stops.map((stop) => (stop.hold === 'hard' ? stop : { ...stop, weight: 0 })),
  };
  for (let missed = 0; missed <= count; missed++) {
    const bound: Cost = { hard: missed * HARD_MISS + HARD_MISS / 2, soft: 0 };
    const plan = cheapestWithin(hardOnly, joint, missed === 0 ? { hard: 0, soft: 0 } : bound, allowed);
    if (plan) return plan.cost.hard;
  }
  return null;
}
