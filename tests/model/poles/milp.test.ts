/** Braces of larger sites against HiGHS, a general mixed-integer solver: one pair a pole, pairwise conflicts. */
import loadHighs from 'highs';
import { describe, expect, it } from 'vitest';
import { lanesOf, randomFrom } from '../../helpers/lanes';
import { leastByHighs, leastByUs, modelOf, polesOf } from '../../helpers/polesMilp';

const SITES = 12;

describe('the least cost of a row of buildings', () => {
  it('is the one that a mixed-integer solver finds', async () => {
    const highs = await loadHighs();
    let solved = 0;
    let givenWay = 0;
    for (let seed = 1; seed <= SITES; seed += 1) {
      const drawing = lanesOf(4, randomFrom(seed));
      const poles = polesOf(drawing);
      const { clearance } = drawing.poleKit;
      const fresh = poles();
      if (fresh.some((pole) => !pole.own())) continue;
      const ours = leastByUs(fresh, clearance);
      expect(ours).toBe(leastByHighs(highs, modelOf(poles(), clearance)));
      solved += 1;
      if (ours !== fresh.reduce((sum, pole) => sum + (pole.own()?.cost ?? 0), 0)) givenWay += 1;
    }
    expect(solved).toBeGreaterThanOrEqual(8);
    expect(givenWay).toBeGreaterThanOrEqual(4);
  });
});
