import fc from 'fast-check';
import Fraction from 'fraction.js';
import { describe, expect, it } from 'vitest';
import { surveySchema, type RodReading, type RodSurvey } from '../../../model/drawing/surveySchema';
import { mm, ticks, type Ticks } from '../../../model/length/ticks';
import { allowedMisclosure } from '../../../model/survey/closeLevels';
import { reduceBook } from '../../../model/survey/levelBook';
import { levelGround } from '../../../model/survey/levelGround';
import { layOutWalls } from '../../../model/walls/layOutWalls';
import { rectangle } from '../../helpers/drawings';

type Row = readonly [RodReading['sight'], rod: number, place?: RodReading['station'], metres?: number];

const corner = (n: number) => ({ kind: 'corner' as const, cornerId: `c${n}` });

/** A book of rods in millimetres, from a benchmark of 10 m. */
function book(rows: readonly Row[], change: Partial<RodSurvey> = {}): RodSurvey {
  return {
    version: 1,
    method: 'rod',
    benchmark: { name: 'Nail', height: mm(10_000) },
    closing: null,
    share: 'distance',
    readings: rows.map(([sight, rod, station = null, metres], i) => ({
      id: `s${i}`,
      station,
      sight,
      rod: mm(rod),
      ...(metres === undefined ? {} : { distance: mm(1000 * metres) }),
    })),
    ...change,
  };
}

/** A round of three set-ups back to the benchmark, `miss` mm too high at the end. */
const round = (miss: number, change: Partial<RodSurvey> = {}) =>
  book(
    [
      ['back', 1500, null, 10],
      ['intermediate', 1400, corner(1)],
      ['fore', 1300, corner(2), 30],
      ['back', 1250, null, 20],
      ['intermediate', 1450, corner(3)],
      ['fore', 1650, null, 20],
      ['back', 1700, null, 10],
      ['fore', 1500 - miss, null, 10],
    ],
    { closing: mm(10_000), ...change },
  );

describe('a level book', () => {
  it('carries heights by height of instrument over its turning points', () => {
    const { rows, check } = reduceBook(round(0), 12);
    expect(rows.map(({ setUp }) => setUp)).toEqual([1, 1, 1, 2, 2, 2, 3, 3]);
    expect(rows.map(({ instrument }) => instrument)).toEqual(
      [11_500, 11_500, 11_500, 11_450, 11_450, 11_450, 11_500, 11_500].map(mm),
    );
    expect(rows.map(({ height }) => height)).toEqual(
      [10_000, 10_100, 10_200, 10_200, 10_000, 9800, 9800, 10_000].map(mm),
    );
    expect(check).toEqual({
      backs: mm(4450),
      fores: mm(4450),
      rises: mm(400),
      falls: mm(400),
      first: mm(10_000),
      last: mm(10_000),
      holds: true,
    });
  });

  it('shares an accepted misclosure out by distance, a whole set-up together, and closes exactly', () => {
    // 100 m: 12 mm × √0.1 = 3.79 mm. The set-ups end at 40, 80 and 100 m.
    const { rows, closure } = reduceBook(round(3), 12);
    expect(closure).toMatchObject({ state: 'accepted', misclosure: mm(3), by: 'distance', length: mm(100_000) });
    expect(rows.map(({ correction }) => correction)).toEqual(
      [0, -1.2, -1.2, -1.2, -2.4, -2.4, -2.4, -3].map((share) => mm(share)),
    );
    expect(rows[7]!.adjusted).toBe(mm(10_000));
  });

  it('shares it out by set-ups where asked, or where a sight has no distance', () => {
    const thirds = [0, -1, -1, -1, -2, -2, -2, -3].map((share) => mm(share));
    const asked = reduceBook(round(3, { share: 'setUps' }), 12);
    expect(asked.rows.map(({ correction }) => correction)).toEqual(thirds);
    const readings = round(3).readings.map(({ distance: _, ...row }) => row);
    const unpaced = reduceBook(round(3, { readings, length: mm(100_000) }), 12);
    expect(unpaced.closure.by).toBe('setUps');
    expect(unpaced.rows.map(({ correction }) => correction)).toEqual(thirds);
  });

  it('refuses a larger one and leaves every height as read', () => {
    const { rows, closure } = reduceBook(round(4), 12);
    expect(closure).toMatchObject({ state: 'refused', misclosure: mm(4), by: null });
    expect(rows.every(({ correction }) => correction === 0)).toBe(true);
    expect(reduceBook(round(4), 13).closure.state).toBe('accepted');
  });

  it('accepts a misclosure that is just what the rule allows', () => {
    // 1 km: 12 mm.
    const readings = round(12).readings;
    const just = reduceBook(round(12, { readings, length: mm(1_000_000) }), 12);
    expect(just.closure).toMatchObject({ state: 'accepted', misclosure: mm(12), allowed: mm(12) });
    const over = round(12, { length: mm(1_000_000), closing: ticks(mm(10_000) - 1) });
    expect(reduceBook(over, 12).closure.state).toBe('refused');
  });

  it('can’t judge a miss without a length, nor close without the last foresight', () => {
    const readings = round(3).readings.map(({ distance: _, ...row }) => row);
    expect(reduceBook(round(3, { readings }), 12).closure).toMatchObject({ state: 'unchecked', allowed: null });
    expect(reduceBook(round(3, { readings: round(3).readings.slice(0, 7) }), 12).closure.state).toBe('open');
    expect(reduceBook(round(3, { closing: null }), 12).closure.state).toBe('open');
    expect(reduceBook(book([]), 12)).toMatchObject({ rows: [], check: { holds: true }, levelLine: mm(10_000) });
  });

  it('always proves its arithmetic, closes to the tick when accepted, and shares by exact proportion', () => {
    const setUp = fc.record({
      back: fc.integer({ min: 0, max: 2_000_000 }),
      between: fc.array(fc.integer({ min: 0, max: 2_000_000 }), { maxLength: 3 }),
      fore: fc.integer({ min: 0, max: 2_000_000 }),
      distances: fc.tuple(fc.integer({ min: 1, max: 30_000_000 }), fc.integer({ min: 1, max: 30_000_000 })),
    });
    fc.assert(
      fc.property(fc.array(setUp, { minLength: 1, maxLength: 8 }), fc.integer({ min: -900, max: 900 }), (ups, miss) => {
        const readings = ups.flatMap(({ back, between, fore, distances }, u): RodReading[] => {
          const row = (sight: RodReading['sight'], rod: number, i: number, distance?: number): RodReading => ({
            id: `${u}-${i}`,
            station: null,
            sight,
            rod: ticks(rod),
            ...(distance === undefined ? {} : { distance: ticks(distance) }),
          });
          return [
            row('back', back, 0, distances[0]),
            ...between.map((rod, i) => row('intermediate', rod, i + 2)),
            row('fore', fore, 1, distances[1]),
          ];
        });
        const carried = ups.reduce((height, { back, fore }) => height + back - fore, mm(10_000) as number);
        const survey = book([], { readings, closing: ticks(carried - miss), length: mm(1_000_000) });
        expect(surveySchema.safeParse(survey).success).toBe(true);
        const { rows, check, closure } = reduceBook(survey, 12);
        expect(check.holds).toBe(true);
        expect(closure.state).toBe('accepted');
        expect(rows[rows.length - 1]!.adjusted).toBe(carried - miss);
        const whole = ups.reduce((sum, { distances: [a, b] }) => sum + a + b, 0);
        let reached = 0;
        for (const [u, { distances }] of ups.entries()) {
          reached += distances[0] + distances[1];
          const exact = new Fraction(-miss).mul(reached).div(whole);
          const fore = rows.find(({ reading }) => reading.id === `${u}-1`)!;
          expect(exact.sub(fore.correction).abs().compare(new Fraction(1, 2))).toBeLessThanOrEqual(0);
        }
      }),
    );
  });
});

describe('the level book’s schema', () => {
  it.each<[string, readonly Row[]]>([
    ['begins with an intermediate sight', [['intermediate', 1000]]],
    [
      'goes on after a foresight without a backsight',
      [
        ['back', 1000],
        ['fore', 1000],
        ['intermediate', 1000],
      ],
    ],
    [
      'moves the level before a foresight',
      [
        ['back', 1000],
        ['intermediate', 900],
        ['back', 1000],
      ],
    ],
  ])('refuses a book that %s', (_, rows) => {
    expect(surveySchema.safeParse(book(rows)).success).toBe(false);
  });

  it('takes every beginning of a good book, so that it can be saved row by row', () => {
    const whole = round(0).readings;
    for (let rows = 0; rows <= whole.length; rows++)
      expect(surveySchema.safeParse(book([], { readings: whole.slice(0, rows) })).success).toBe(true);
  });
});

describe('a foundation read by rod', () => {
  const drawing = rectangle(240, 120);
  const walls = layOutWalls(drawing);

  it('is the one that measuring down from the line of sight finds', () => {
    const rods: readonly Ticks[] = [mm(1400), mm(1425), mm(1390), mm(1402)];
    const byRod = levelGround(
      drawing,
      walls,
      book([['back', 1500], ...rods.map((rod, i): Row => ['intermediate', rod / 640, corner(i + 1)])]),
    );
    const byTape = levelGround(drawing, walls, {
      version: 1,
      method: 'measureDown',
      readings: rods.map((down, i) => ({ id: `s${i + 1}`, station: corner(i + 1), down })),
    });
    expect({ ...byRod, book: null, reasons: [] }).toEqual({ ...byTape, reasons: [] });
    expect(byRod.levelLine).toBe(mm(1390));
    expect(byRod.reasons.map(({ code }) => code)).toContain('levelsNotClosed');
  });

  it('lies under a level line that was marked at a height of its own', () => {
    const ground = levelGround(
      drawing,
      walls,
      book(
        [
          ['back', 1500],
          ['intermediate', 1400, corner(1)],
        ],
        { levelLine: mm(11_300) },
      ),
    );
    expect(ground.levelLine).toBe(mm(1200));
    expect(ground.stations[0]!.down).toBe(mm(1200));
  });

  it('counts a corner that is the benchmark, and a turning point once, with its foresight', () => {
    const survey = book([
      ['back', 1500, corner(1)],
      ['fore', 1450, corner(2)],
      ['back', 1300, corner(2)],
      ['intermediate', 1290, corner(3)],
    ]);
    const { stations } = levelGround(drawing, walls, survey);
    expect(stations.map(({ readingId, height, earlier }) => [readingId, height, earlier.length])).toEqual([
      ['s0', -mm(60), 0],
      ['s1', -mm(10), 0],
      ['s3', 0, 0],
    ]);
  });

  it('has nothing to say of an empty book but that nothing was read', () => {
    expect(levelGround(drawing, walls, book([])).reasons.map(({ code }) => code)).toEqual(['surveyAssumed']);
  });

  it('says when the levels miss by too much, and by how much', () => {
    const { reasons, stations } = levelGround(drawing, walls, round(4));
    const over = mm(4) - allowedMisclosure(mm(100_000), 12);
    expect(reasons.find(({ code }) => code === 'misclosureOverMost')).toEqual({
      code: 'misclosureOverMost',
      weight: 'warning',
      thing: { kind: 'site', id: 'site' },
      rule: 'levelMisclosure',
      amount: over,
    });
    expect(stations.map(({ height }) => height)).toEqual([-mm(100), 0, -mm(200)]);
  });

  it('takes the site’s own rule for what may be missed', () => {
    const own = { ...drawing, ruleValues: { levelMisclosure: 20 } };
    expect(levelGround(own, walls, round(4)).book?.closure.state).toBe('accepted');
  });

  it('keeps all readings of a station: the last in force, the spread shown', () => {
    const twice = book([
      ['back', 1500],
      ['intermediate', 1400, corner(1)],
      ['intermediate', 1400, corner(2)],
      ['intermediate', 1405, corner(1)],
      ['intermediate', 1409, corner(1)],
    ]);
    const { stations, reasons } = levelGround(drawing, walls, twice);
    expect(stations.map(({ readingId, earlier, spread }) => [readingId, earlier, spread])).toEqual([
      ['s2', [], 0],
      [
        's4',
        [
          { readingId: 's1', down: mm(1400) },
          { readingId: 's3', down: mm(1405) },
        ],
        mm(9),
      ],
    ]);
    expect(reasons.find(({ code }) => code === 'rereadingsDiffer')?.amount).toBe(mm(9));
  });
});
