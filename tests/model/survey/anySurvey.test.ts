/** Any rod survey that the schema admits, on odd drawings: finite heights, one ground, no exception. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { surveySchema, type RodReading, type RodSurvey } from '../../../model/drawing/surveySchema';
import { inches, mm, ticks } from '../../../model/length/ticks';
import { beddingAlong } from '../../../model/survey/bedding';
import { beddingChoices } from '../../../model/survey/beddingChoices';
import { levelGround } from '../../../model/survey/levelGround';
import { layOutWalls } from '../../../model/walls/layOutWalls';
import { loopOf, withDoor } from '../../helpers/drawings';

const size = fc.integer({ min: 0, max: 128_000_000 }).map(ticks);
const height = fc.integer({ min: -1_280_000_000, max: 1_280_000_000 }).map(ticks);
const station: fc.Arbitrary<RodReading['station']> = fc.oneof(
  fc.constant(null),
  fc.constantFrom('c1', 'c2', 'c3', 'c4', 'c9').map((cornerId) => ({ kind: 'corner' as const, cornerId })),
  fc.record({
    kind: fc.constant('run' as const),
    runId: fc.constantFrom('r1', 'r2', 'r3', 'r9'),
    at: fc.integer({ min: -1000, max: 5_000_000 }).map(ticks),
  }),
);
const shot = fc.record({ station, rod: size, distance: size }, { requiredKeys: ['station', 'rod'] });
const setUp = fc.record({ back: shot, between: fc.array(shot, { maxLength: 4 }), fore: shot });
const peg = fc.record({ a: size, b: size, toA: size, toB: size });

const anyBook: fc.Arbitrary<RodSurvey> = fc
  .record(
    {
      version: fc.constant(1 as const),
      method: fc.constant('rod' as const),
      benchmark: fc.record({ name: fc.constant('Nail'), height }),
      closing: fc.oneof(fc.constant(null), height),
      share: fc.constantFrom('distance' as const, 'setUps' as const),
      length: fc.integer({ min: 1, max: 1_280_000_000 }).map(ticks),
      levelLine: height,
      pegTest: fc.record({ midway: peg, near: peg }),
      setUps: fc.array(setUp, { maxLength: 4 }),
      cut: fc.nat({ max: 3 }),
    },
    { requiredKeys: ['version', 'method', 'benchmark', 'closing', 'share', 'setUps', 'cut'] },
  )
  .map(({ setUps, cut, ...survey }): RodSurvey => {
    const rows = setUps.flatMap(({ back, between, fore }) => [
      { ...back, sight: 'back' as const },
      ...between.map((one) => ({ ...one, sight: 'intermediate' as const })),
      { ...fore, sight: 'fore' as const },
    ]);
    const readings = rows.slice(0, Math.max(0, rows.length - cut)).map((row, i) => ({ ...row, id: `s${i}` }));
    return { ...survey, readings };
  });

/** Its third run lies back over its first, its fourth has no length. */
const odd = withDoor(
  loopOf([
    [0, 0],
    [200, 0],
    [200, 0],
    [50, 0],
    [50, 80],
  ]),
  'r1',
  20,
  30,
);
const plain = withDoor(
  loopOf([
    [0, 0],
    [240, 0],
    [300, 120],
    [-10, 140],
  ]),
  'r1',
  60,
  36,
);

describe('any rod survey', () => {
  it.each([
    ['on a plain building', plain],
    ['on runs that lie over each other', odd],
  ])('%s has a ground, and bedding that adds up', (_, drawing) => {
    const walls = layOutWalls(drawing);
    fc.assert(
      fc.property(anyBook, (survey) => {
        expect(surveySchema.safeParse(survey).success).toBe(true);
        const ground = levelGround(drawing, walls, survey);
        const heights = [...ground.heightByCorner.values(), ground.levelLine, ground.range, ground.firstCourseTop];
        expect(heights.every(Number.isSafeInteger)).toBe(true);
        for (const one of ground.stations) {
          expect(one.height).toBeLessThanOrEqual(0);
          expect(one.bedding).toBe(ground.leastBedding - one.height);
          expect(one.down).toBe(ground.levelLine - one.height);
        }
        for (const { rod, instrument, height: at, adjusted, correction } of ground.book!.rows) {
          expect([rod, instrument, at, adjusted, correction].every(Number.isSafeInteger)).toBe(true);
        }
        expect(ground.book!.check.holds).toBe(true);
        for (const { volume, thinnest, thickest } of beddingAlong(drawing, walls, ground)) {
          expect(Number.isFinite(volume)).toBe(true);
          expect(thinnest).toBeLessThanOrEqual(thickest);
        }
        for (const choice of beddingChoices(drawing, walls, ground)) {
          const numbers = [choice.length, choice.deepest, choice.beds, choice.mortar, choice.ground, choice.levelling];
          expect(numbers.every((n) => Number.isFinite(n) && n >= 0)).toBe(true);
        }
      }),
      { numRuns: 300 },
    );
  });

  it('cuts bedding at every door, however many stations lie between', () => {
    // Level at 1/2 in: two doors of 30 in from 200 in of wall, with a station in the middle of one and at the jamb of the other.
    const drawing = withDoor(
      withDoor(
        loopOf(
          [
            [0, 0],
            [200, 0],
          ],
          { closed: false },
        ),
        'r1',
        20,
        30,
      ),
      'r1',
      120,
      30,
    );
    const walls = layOutWalls(drawing);
    const ground = levelGround(drawing, walls, {
      version: 1,
      method: 'measureDown',
      readings: [35, 60, 120, 180].map((at, i) => ({
        id: `s${i}`,
        station: { kind: 'run', runId: 'r1', at: inches(at) },
        down: mm(1200),
      })),
    });
    const [run] = beddingAlong(drawing, walls, ground);
    expect(run!.volume / 25.4 ** 3).toBeCloseTo(140 * 10 * 0.5, 6);
  });
});
