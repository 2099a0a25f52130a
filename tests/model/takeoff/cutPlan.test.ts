import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { firstFitFalling, planCuts } from '../../../model/takeoff/cutPlan';

/** The fewest lengths by trying every way to part the cuts into groups. */
function fewest(cuts: readonly number[], stock: number, kerf: number): number {
  const fits = (group: readonly number[]) => group.reduce((a, b) => a + b, 0) + kerf * (group.length - 1) <= stock;
  const part = (k: number, groups: number[][]): number => {
    if (k === cuts.length) return groups.every(fits) ? groups.length : Infinity;
    let best = Infinity;
    groups.forEach((group, i) => {
      const grown = groups.map((other, j) => (i === j ? [...group, cuts[k]!] : other));
      if (fits(grown[i]!)) best = Math.min(best, part(k + 1, grown));
    });
    return Math.min(best, part(k + 1, [...groups, [cuts[k]!]]));
  };
  return part(0, []);
}

describe('A cutting plan', () => {
  it('takes a kerf between two cuts, none after the last', () => {
    expect(planCuts([50, 50], 100, 0)).toEqual([{ cuts: [50, 50], left: 0 }]);
    expect(planCuts([50, 50], 100, 1)).toHaveLength(2);
    expect(planCuts([50, 49], 100, 1)).toEqual([{ cuts: [50, 49], left: 0 }]);
  });

  it('finds a plan that first fit misses', () => {
    // First fit puts 6 and 5 together and then needs a third length; 6 + 4 + 2 and 5 + 5 + 2 fill two.
    const cuts = [6, 5, 5, 4, 2, 2];
    expect(firstFitFalling(cuts, 12, 0)).toHaveLength(3);
    expect(planCuts(cuts, 12, 0)).toEqual([
      { cuts: [6, 4, 2], left: 0 },
      { cuts: [5, 5, 2], left: 0 },
    ]);
  });

  it('needs no more lengths than trying every grouping does, and makes every cut once', () => {
    fc.assert(
      fc.property(
        fc.array(fc.integer({ min: 5, max: 60 }), { maxLength: 7 }),
        fc.integer({ min: 0, max: 4 }),
        (cuts, kerf) => {
          const plan = planCuts(cuts, 100, kerf);
          expect(plan).toHaveLength(fewest(cuts, 100, kerf));
          expect(plan.flatMap((stock) => stock.cuts).sort()).toEqual([...cuts].sort());
          for (const { cuts: made } of plan)
            expect(made.reduce((a, b) => a + b, 0) + kerf * (made.length - 1)).toBeLessThanOrEqual(100);
        },
      ),
      { numRuns: 200 },
    );
  });

  it('leaves out a cut longer than the stock', () => {
    expect(planCuts([120, 30], 100, 1)).toEqual([{ cuts: [30], left: 69 }]);
  });
});
