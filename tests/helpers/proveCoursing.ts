/** Random coursing problems, each solved twice: by our search, and by HiGHS from the objective alone. */
import loadHighs from 'highs';
import { expect } from 'vitest';
import { HARD_MISS } from '../../model/coursing/costPieces';
import { takeApart } from '../../model/coursing/problem';
import { rankPlans } from '../../model/coursing/rankPlans';
import { leastByMilp, SAME, type CostParts } from './coursingMilp';
import { coursingProblems } from './coursingProblems';
import { judgeCourses } from './judgeCourses';

export interface Proved {
  readonly equal: number;
  /** Problems whose hard heights can't all be met. */
  readonly infeasible: number;
  /** Problems whose best answer has a thinner course. */
  readonly thinned: number;
  /** Problems whose best answer has joints that are not all alike. */
  readonly uneven: number;
}

/**
 * Every problem's plan is first checked for being one, and for costing what it says; then HiGHS must find that each part
 * of that cost is the least there is, given the parts before it.
 */
export async function proveCoursing(count: number, seed: number): Promise<Proved> {
  const highs = await loadHighs();
  let [equal, infeasible, thinned, uneven] = [0, 0, 0, 0];
  for (const [i, problem] of coursingProblems(count, seed).entries()) {
    const { plans, complete, proved } = rankPlans(problem, 1);
    const plan = plans[0]!;
    const { soft, thin } = takeApart(problem, plan.cost.soft);
    const missed = Math.floor(plan.cost.hard / HARD_MISS);
    const says: CostParts = [missed, plan.cost.hard - missed * HARD_MISS, soft, thin, plan.step, plan.spread];
    const costs = judgeCourses(problem, plan);
    const least = leastByMilp(highs, problem, says);
    const isSame = (other: CostParts | string) =>
      typeof other !== 'string' && other.every((part, k) => Math.abs(part - says[k]!) < SAME);
    if (!complete || !proved || !isSame(costs) || !isSame(least)) {
      expect({ i, problem, plan, costs }).toEqual({ i, problem, plan, costs: least });
      throw new Error(`problem ${i} was not proved: complete ${complete}, proved ${proved}`);
    }
    equal++;
    if (missed > 0) infeasible++;
    if (thin > 0) thinned++;
    if (plan.spread > SAME) uneven++;
  }
  return { equal, infeasible, thinned, uneven };
}
