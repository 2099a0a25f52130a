import loadHighs from 'highs';
import { describe, expect, it } from 'vitest';
import { cutPlan } from '../../../model/takeoff/cutPlan';
import { LpText } from '../../helpers/lpText';

/** A repeatable stream of whole numbers in a range (Park and Miller's generator). */
function makeRandom(seed: number): (least: number, most: number) => number {
  let state = seed;
  return (least, most) => {
    state = (state * 48_271) % 2_147_483_647;
    return least + (state % (most - least + 1));
  };
}

/** Bin packing as it is written in textbooks: y_b, length b is bought; x_ib, cut i is made from it. */
function programFor(cuts: readonly number[], stock: number, kerf: number, bins: number): string {
  const lp = new LpText();
  const all = Array.from({ length: bins }, (_, b) => b);
  cuts.forEach((_, i) =>
    lp.row(
      all.filter((b) => b <= i).map((b) => [1, `x${i}_${b}`]),
      '=',
      1,
    ),
  );
  for (const b of all) {
    const terms = cuts.flatMap((cut, i): [number, string][] => (b <= i ? [[cut + kerf, `x${i}_${b}`]] : []));
    lp.row([...terms, [-(stock + kerf), `y${b}`]], '<=', 0);
    lp.binary(`y${b}`);
    cuts.forEach((_, i) => b <= i && lp.binary(`x${i}_${b}`));
    if (b > 0)
      lp.row(
        [
          [1, `y${b - 1}`],
          [-1, `y${b}`],
        ],
        '>=',
        0,
      );
  }
  return lp.minimise(all.map((b) => [1, `y${b}`]));
}

describe('A cutting plan, against a general solver', () => {
  it('needs as few lengths as HiGHS on 150 random lists, poles, bars and closers alike', async () => {
    const highs = await loadHighs();
    const random = makeRandom(20_261);
    let better = 0;
    for (let n = 0; n < 150; n += 1) {
      const stock = random(60, 200);
      const kerf = random(0, 3);
      const kinds = Array.from({ length: random(2, 9) }, () => random(Math.ceil(stock / 8), Math.ceil(stock * 0.7)));
      const cuts = Array.from({ length: random(4, 13) }, () => kinds[random(0, kinds.length - 1)]!);
      const plan = cutPlan(cuts, stock, kerf);
      expect(plan.proved).toBe(true);
      const solution = highs.solve(
        programFor(
          [...cuts].sort((a, b) => b - a),
          stock,
          kerf,
          plan.stock.length,
        ),
      );
      expect(solution.Status).toBe('Optimal');
      expect(plan.stock).toHaveLength(Math.round(solution.ObjectiveValue));
      if (plan.stock.length > Math.ceil(cuts.reduce((sum, cut) => sum + cut + kerf, 0) / (stock + kerf))) better += 1;
    }
    // The lists are not all so easy that the sum of the lengths decides them.
    expect(better).toBeGreaterThan(20);
  }, 30_000);

  it('proves plans of sixty cuts, and says so where the work runs out', () => {
    const random = makeRandom(7);
    let proved = 0;
    for (let n = 0; n < 100; n += 1) {
      const cuts = Array.from({ length: 60 }, () => random(8, 70));
      const plan = cutPlan(cuts, 100, 1);
      expect(plan.stock.flatMap((stock) => stock.cuts).sort()).toEqual([...cuts].sort());
      for (const { cuts: made } of plan.stock)
        expect(made.reduce((sum, cut) => sum + cut, 0) + made.length - 1).toBeLessThanOrEqual(100);
      expect(plan.least).toBeLessThanOrEqual(plan.stock.length);
      expect(plan.proved).toBe(plan.least === plan.stock.length);
      if (plan.proved) proved += 1;
    }
    expect(proved).toBeGreaterThanOrEqual(95);
    // First fit takes three and the bound is two; two steps of work can't say which.
    const hard = cutPlan([6, 5, 5, 4, 2, 2], 12, 0, 2);
    expect([hard.proved, hard.least, hard.stock.length]).toEqual([false, 2, 3]);
  });
});
