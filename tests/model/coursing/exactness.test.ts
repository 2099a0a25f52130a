import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { HARD_MISS } from '../../../model/coursing/costPieces';
import { windowOf, type Problem, type Stop } from '../../../model/coursing/problem';
import { mostSoftOfOthers, rankPlans } from '../../../model/coursing/rankPlans';
import type { RatedPlan } from '../../../model/coursing/refine';
import { ticks } from '../../../model/length/ticks';
import { compareJudged, everyPlan, type Judged } from './everyPlan';

const stopParts = fc.record({
  rise: fc.integer({ min: 0, max: 11 }),
  hold: fc.constantFrom('hard', 'soft', 'soft'),
  tolerance: fc.integer({ min: 0, max: 2 }),
  weight: fc.integer({ min: 1, max: 3 }),
  depth: fc.constantFrom(0, 0, 0, 2, 5),
});

const smallProblem = fc
  .record({
    unit: fc.integer({ min: 2, max: 6 }),
    least: fc.integer({ min: 0, max: 2 }),
    nominalOver: fc.integer({ min: 0, max: 2 }),
    mostOver: fc.integer({ min: 0, max: 2 }),
    start: fc.integer({ min: 1, max: 7 }),
    stops: fc.array(stopParts, { minLength: 1, maxLength: 4 }),
  })
  .map(({ unit, least, nominalOver, mostOver, start, stops }): Problem => {
    let height = start;
    return {
      unit: ticks(unit),
      joint: { least: ticks(least), nominal: ticks(least + nominalOver), most: ticks(least + nominalOver + mostOver) },
      start: ticks(start),
      stops: stops.map(({ rise, hold, tolerance, weight, depth }, i): Stop => {
        height += i > 0 ? Math.max(1, rise) : rise;
        const stop = { height, hold, tolerance, weight, controls: [], beamDepth: depth };
        height += depth;
        return stop as unknown as Stop;
      }),
    };
  });

function judgedOf(plan: RatedPlan): Judged {
  const missed = Math.floor(plan.cost.hard / HARD_MISS);
  return [missed, plan.cost.hard - missed * HARD_MISS, plan.cost.soft, plan.step, plan.spread];
}

/** The highest height that the search may look at. */
function highestOf(problem: Problem): number {
  return Math.max(...problem.stops.map((_, i) => windowOf(problem, i).hi));
}

describe('the search for courses', () => {
  it('finds the very best plan of all that there are', () => {
    fc.assert(
      fc.property(smallProblem, (problem) => {
        const last = problem.stops[problem.stops.length - 1]!;
        const [best] = everyPlan(problem, last.height + 2 * (problem.unit + problem.joint.most));
        const [found] = rankPlans(problem, 1).plans;
        expect(best).toBeDefined();
        expect(found).toBeDefined();
        const judged = judgedOf(found!);
        expect([compareJudged(judged, best!.judged), judged]).toEqual([0, best!.judged]);
      }),
      { numRuns: 300, seed: 20_260_401 },
    );
  }, 120_000);

  it('finds the next best plans in order, of all that move no height to another course', () => {
    let several = 0;
    fc.assert(
      fc.property(smallProblem, (problem) => {
        const all = everyPlan(problem, highestOf(problem), (stop, height) => {
          const { lo, hi } = windowOf(problem, stop);
          return lo <= height && height <= hi;
        });
        const ranked = rankPlans(problem, 6);
        const [missed] = all[0]!.judged;
        const mostSoft = mostSoftOfOthers(problem, ranked.plans[0]!);
        const fit = all.filter(({ judged }) => judged[0] === missed && judged[2] <= mostSoft);
        expect([ranked.complete, ranked.proved]).toEqual([true, true]);
        expect(ranked.plans.length).toBe(Math.min(6, fit.length));
        if (fit.length > 1) several++;
        ranked.plans.forEach((plan, i) => {
          const judged = judgedOf(plan);
          expect([i, compareJudged(judged, fit[i]!.judged), judged]).toEqual([i, 0, fit[i]!.judged]);
        });
      }),
      { numRuns: 150, seed: 7_041 },
    );
    expect(several).toBeGreaterThan(50);
  }, 120_000);
});
