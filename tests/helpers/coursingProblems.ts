/** Random coursing problems, for the proofs and the bench: the same ones for the same seed. */
import fc from 'fast-check';
import type { Problem, Stop, ThinCourse } from '../../model/coursing/problem';
import { ticks } from '../../model/length/ticks';

const stop = fc.record({
  rise: fc.integer({ min: 1, max: 9000 }),
  hold: fc.constantFrom('hard' as const, 'soft' as const, 'soft' as const),
  tolerance: fc.integer({ min: 0, max: 60 }),
  weight: fc.integer({ min: 1, max: 9 }),
  depth: fc.constantFrom(0, 0, 0, 0, 1500, 2000),
});

/** Whole lengths that are easy on another solver's floating point: as if one tick were a tenth of a millimetre. */
const parts = fc.record({
  unit: fc.integer({ min: 600, max: 1200 }),
  least: fc.integer({ min: 50, max: 90 }),
  nominal: fc.integer({ min: 0, max: 40 }),
  most: fc.integer({ min: 0, max: 40 }),
  bedding: fc.integer({ min: 50, max: 200 }),
  /** Thinner courses: none, of one height, or ripped to any of a range. */
  thin: fc.oneof(
    fc.constant(null),
    fc.integer({ min: 250, max: 500 }).map((height) => ({ least: ticks(height), most: ticks(height) })),
    fc
      .tuple(fc.integer({ min: 200, max: 350 }), fc.integer({ min: 0, max: 240 }))
      .map(([least, more]) => ({ least: ticks(least), most: ticks(least + more) })),
  ) as fc.Arbitrary<ThinCourse | null>,
  stops: fc.array(stop, { minLength: 1, maxLength: 5 }),
});

const problems = parts.map(({ unit, least, nominal, most, bedding, thin, stops }): Problem => {
  const start = bedding + unit;
  let height = start;
  return {
    unit: ticks(unit),
    joint: { least: ticks(least), nominal: ticks(least + nominal), most: ticks(least + nominal + most) },
    start: ticks(start),
    stops: stops.map(({ rise, hold, tolerance, weight, depth }): Stop => {
      height += rise;
      const made = { height, hold, tolerance, weight, controls: [], beamDepth: depth };
      height += depth;
      return made as unknown as Stop;
    }),
    ...(thin ? { thin } : {}),
  };
});

/** `count` random problems: one to five stops, some with beams, a third of their heights hard and often out of reach. */
export function coursingProblems(count: number, seed: number): Problem[] {
  return fc.sample(problems, { numRuns: count, seed });
}
