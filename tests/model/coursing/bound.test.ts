/** The bound on the search's work: counted, said, and never at the price of a plan that is none. */
import { describe, expect, it } from 'vitest';
import { takeApart, type Problem } from '../../../model/coursing/problem';
import { rankPlans, type WorkLimits } from '../../../model/coursing/rankPlans';
import { compareRated, type RatedPlan } from '../../../model/coursing/refine';
import { HARD_MISS } from '../../../model/coursing/costPieces';
import type { CostParts } from '../../helpers/coursingMilp';
import { coursingProblems } from '../../helpers/coursingProblems';
import { judgeCourses } from '../../helpers/judgeCourses';

function saysOf(problem: Problem, plan: RatedPlan): CostParts {
  const missed = Math.floor(plan.cost.hard / HARD_MISS);
  const { soft, thin } = takeApart(problem, plan.cost.soft);
  return [missed, plan.cost.hard - missed * HARD_MISS, soft, thin, plan.step, plan.spread];
}

function expectJudged(problem: Problem, plan: RatedPlan): void {
  const judged = judgeCourses(problem, plan);
  if (typeof judged === 'string') throw new Error(judged);
  judged.forEach((part, k) => expect(part).toBeCloseTo(saysOf(problem, plan)[k]!, 4));
}

const problems = coursingProblems(200, 77);

describe('answers beside the best', () => {
  it('are plans, differ in their courses, and come in order of their cost', () => {
    let several = 0;
    let thinned = 0;
    for (const problem of problems) {
      const { plans } = rankPlans(problem, 5);
      plans.forEach((plan, i) => {
        expectJudged(problem, plan);
        if (i > 0) expect(compareRated(plans[i - 1]!, plan)).toBeLessThanOrEqual(0);
      });
      expect(new Set(plans.map(({ counts, thins }) => JSON.stringify([counts, thins]))).size).toBe(plans.length);
      if (plans.length > 1) several++;
      if (plans.some((plan) => plan.thins.includes(true))) thinned++;
    }
    expect(Math.min(several, thinned)).toBeGreaterThan(60);
  });
});

describe('a search whose work is bounded', () => {
  const ALL = Infinity;
  const limits: WorkLimits[] = [
    { best: 0, refined: ALL, others: ALL },
    { best: 20, refined: ALL, others: ALL },
    { best: ALL, refined: 0, others: ALL },
    { best: ALL, refined: 8, others: ALL },
    { best: ALL, refined: ALL, others: 0 },
    { best: ALL, refined: ALL, others: 60 },
  ];

  it.each(limits)('gives plans that are true, and says what it did not prove, within %o', (limit) => {
    let cutShort = 0;
    for (const problem of problems) {
      const whole = rankPlans(problem, 5, { best: ALL, refined: ALL, others: ALL });
      const { plans, complete, proved } = rankPlans(problem, 5, limit);
      plans.forEach((plan) => expectJudged(problem, plan));
      if (complete && proved) expect(plans.map((plan) => plan.counts)).toEqual(whole.plans.map((plan) => plan.counts));
      else cutShort++;
      const [best] = plans;
      if (!best) {
        expect(complete).toBe(false);
        continue;
      }
      // Heights and thinner courses are the best there are as soon as there is a plan; joints when that is proved.
      expect(best.cost).toEqual(whole.plans[0]!.cost);
      if (proved) expect(compareRated(best, whole.plans[0]!)).toBe(0);
      else expect(compareRated(best, whole.plans[0]!)).toBeGreaterThanOrEqual(0);
    }
    expect(cutShort).toBeGreaterThan(10);
  });
});
