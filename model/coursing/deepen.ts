/** The cheapest plan without its cost known: bounds are tried from tight to loose, so that most searches are small. */
import { HARD_MISS, type Cost } from './costPieces';
import { partsOf, type Problem } from './problem';
import { cheapestWithin, type Plan, type SearchHelp } from './search';

/** How much soft cost over the least known the first bound allows: a thousandth of an inch; then three times as much each time. */
const FIRST_SOFT = 16;

/** Over any soft cost: 26 stops of weight 200 000 missed by 200 m tenfold stay under it. */
export const ANY_SOFT = 2 ** 53;

export interface CostRange {
  /** Hard heights that may be missed, at most. */
  readonly missed: number;
  /** A soft cost known to be no more than the answer's, and the most that is asked for. */
  readonly leastSoft: number;
  readonly mostSoft: number;
}

/**
 * The cheapest plan within a range, or null where there is none or the work ran out. First the hard heights alone: the fewest that are
 * missed, and by how little. Then the soft ones within that, the bound on their cost loosened until a plan is found; the
 * first one found is the cheapest of all, because its cost is within the bound.
 */
export function cheapestPlan(problem: Problem, range: CostRange, help: SearchHelp): Plan | null {
  const hard = leastHard(problem, range.missed, help);
  if (hard === null) return null;
  for (let more = 0; ; more = more === 0 ? FIRST_SOFT * partsOf(problem) : more * 3) {
    const soft = Math.min(range.mostSoft, range.leastSoft + more);
    const plan = cheapestWithin(problem, problem.joint, { hard, soft }, help);
    if (plan || soft === range.mostSoft || help.work.left < 0) return plan;
  }
}

/** Least cost of the hard heights, the soft ones left out of account; null where no counts fit at all. */
function leastHard(problem: Problem, most: number, help: SearchHelp): number | null {
  const hardOnly: Problem = {
    ...problem,
    thinIsFree: true,
    stops: problem.stops.map((stop) => (stop.hold === 'hard' ? stop : { ...stop, weight: 0 })),
  };
  const { work, allowed } = help;
  for (let missed = 0; missed <= most; missed++) {
    const bound: Cost = { hard: missed === 0 ? 0 : (missed + 0.5) * HARD_MISS, soft: 0 };
    const plan = cheapestWithin(hardOnly, problem.joint, bound, allowed ? { work, allowed } : { work });
    if (plan) return plan.cost.hard;
  }
  return null;
}
