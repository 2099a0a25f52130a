/** The same problem given to a general mixed-integer solver (HiGHS), which knows nothing of how ours searches. */
import fc from 'fast-check';
import loadHighs from 'highs';
import { describe, expect, it } from 'vitest';
import { HARD_MISS } from '../../../model/coursing/costPieces';
import type { Problem, Stop } from '../../../model/coursing/problem';
import { rankPlans } from '../../../model/coursing/rankPlans';
import { mm } from '../../../model/length/ticks';

interface StopInMm {
  readonly height: number;
  readonly hold: 'hard' | 'soft';
  readonly tolerance: number;
  readonly weight: number;
  readonly depth: number;
}
interface ProblemInMm {
  readonly unit: number;
  readonly least: number;
  readonly nominal: number;
  readonly most: number;
  readonly start: number;
  readonly stops: readonly StopInMm[];
}

const problemInMm = fc
  .record({
    unit: fc.integer({ min: 600, max: 1200 }),
    least: fc.integer({ min: 50, max: 90 }),
    nominal: fc.integer({ min: 0, max: 40 }),
    most: fc.integer({ min: 0, max: 40 }),
    bedding: fc.integer({ min: 50, max: 200 }),
    stops: fc.array(
      fc.record({
        rise: fc.integer({ min: 1, max: 9000 }),
        hold: fc.constantFrom('hard' as const, 'soft' as const, 'soft' as const),
        tolerance: fc.integer({ min: 0, max: 60 }),
        weight: fc.integer({ min: 1, max: 9 }),
        depth: fc.constantFrom(0, 0, 0, 0, 1500, 2000),
      }),
      { minLength: 2, maxLength: 6 },
    ),
  })
  .map(({ unit, least, nominal, most, bedding, stops }): ProblemInMm => {
    const start = (bedding + unit) / 10;
    let height = start;
    return {
      unit: unit / 10,
      least: least / 10,
      nominal: (least + nominal) / 10,
      most: (least + nominal + most) / 10,
      start,
      stops: stops.map((stop) => {
        height += stop.rise / 10;
        const made = { ...stop, height, tolerance: stop.tolerance / 10, depth: stop.depth / 10 };
        height += made.depth;
        return made;
      }),
    };
  });

function inTicks(problem: ProblemInMm): Problem {
  return {
    unit: mm(problem.unit),
    joint: { least: mm(problem.least), nominal: mm(problem.nominal), most: mm(problem.most) },
    start: mm(problem.start),
    stops: problem.stops.map((stop): Stop => {
      const { hold, weight } = stop;
      const [height, tolerance, beamDepth] = [mm(stop.height), mm(stop.tolerance), mm(stop.depth)];
      return { height, hold, tolerance, weight, controls: [], beamDepth };
    }),
  };
}

/** A number as LP text, without an exponent. */
function lp(value: number): string {
  return value.toFixed(4);
}

/** How far from its height a hard stop may lie once it is given up. */
const FAR = 1000;

function lpText(problem: ProblemInMm, objective: string, extra: readonly string[]): string {
  const rows: string[] = [...extra];
  let below = lp(problem.start);
  let belowIsNumber = true;
  let inLift: string[] | null = null;
  problem.stops.forEach((stop, i) => {
    const rise = belowIsNumber ? '' : ` - ${below}`;
    const depthBelow = problem.stops[i - 1]?.depth ?? 0;
    const base = belowIsNumber ? problem.start : depthBelow;
    rows.push(`y${i}${rise} - ${lp(problem.unit + problem.least)} n${i} >= ${lp(base)}`);
    rows.push(`y${i}${rise} - ${lp(problem.unit + problem.most)} n${i} <= ${lp(base)}`);
    inLift?.push(`n${i}`);
    if (stop.depth > 0) {
      if (inLift) rows.push(`${inLift.join(' + ')} >= 1`);
      inLift = [];
    }
    rows.push(`y${i} - d${i} <= ${lp(stop.height)}`, `y${i} + d${i} >= ${lp(stop.height)}`);
    if (stop.hold === 'hard') rows.push(`d${i} - ${FAR} b${i} <= 0`);
    else rows.push(`e${i} - d${i} >= ${lp(-stop.tolerance)}`);
    below = `y${i}`;
    belowIsNumber = false;
  });
  const whole = problem.stops.map((_, i) => `n${i}`).join(' ');
  const binary = problem.stops.flatMap((stop, i) => (stop.hold === 'hard' ? [`b${i}`] : [])).join(' ');
  return `Minimize\n obj: ${objective}\nSubject To\n${rows.map((row, i) => ` c${i}: ${row}`).join('\n')}\nGeneral\n ${whole}\n${binary ? `Binary\n ${binary}\n` : ''}End\n`;
}

function terms(problem: ProblemInMm, hold: 'hard' | 'soft', term: (stop: StopInMm, i: number) => string): string {
  const found = problem.stops.flatMap((stop, i) => (stop.hold === hold ? [term(stop, i)] : []));
  return found.length > 0 ? found.join(' + ') : '0 n0';
}

describe('the first parts of the cost, against HiGHS', () => {
  it('misses as few hard heights, by as little, and soft ones by as little weight, on 60 random problems', async () => {
    const highs = await loadHighs();
    const solve = (text: string): number => {
      const solution = highs.solve(text, { mip_rel_gap: 0, mip_abs_gap: 1e-7, mip_feasibility_tolerance: 1e-9 });
      expect(solution.Status).toBe('Optimal');
      return solution.ObjectiveValue;
    };
    let missedSomewhere = 0;
    for (const problem of fc.sample(problemInMm, { numRuns: 60, seed: 1404 })) {
      const hasHard = problem.stops.some((stop) => stop.hold === 'hard');
      const count = terms(problem, 'hard', (_, i) => `b${i}`);
      const amount = terms(problem, 'hard', (_, i) => `d${i}`);
      const soft = terms(problem, 'soft', (stop, i) => `${lp(stop.weight)} d${i} + ${lp(9 * stop.weight)} e${i}`);
      const missed = hasHard ? Math.round(solve(lpText(problem, count, []))) : 0;
      const held = hasHard ? [`${count} <= ${missed}`] : [];
      const least = hasHard ? solve(lpText(problem, amount, held)) : 0;
      const also = hasHard ? [...held, `${amount} <= ${(least + 1e-5).toFixed(6)}`] : [];
      const softly = solve(lpText(problem, soft, also));

      const found = rankPlans(inTicks(problem), 1).plans[0]!;
      const foundMissed = Math.floor(found.cost.hard / HARD_MISS);
      expect(foundMissed).toBe(missed);
      expect((found.cost.hard - foundMissed * HARD_MISS) / 640).toBeCloseTo(least, 3);
      expect(Math.abs(found.cost.soft / 640 - softly)).toBeLessThan(0.01);
      if (softly > 0.1 || missed > 0) missedSomewhere++;
    }
    expect(missedSomewhere).toBeGreaterThan(30);
  }, 120_000);
});
