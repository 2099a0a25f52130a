/** Published levelling examples, by the one arithmetic of readings from a level line: height = line − reading. */
import { describe, expect, it } from 'vitest';
import { EMPTY_SURVEY, type RodSurvey } from '../../../model/drawing/surveySchema';
import { mm, ticks, TICKS_PER_FOOT } from '../../../model/length/ticks';
import { RULES } from '../../../model/rules/registry';
import { allowedMisclosure } from '../../../model/survey/closeLevels';
import { reduceBook } from '../../../model/survey/levelBook';
import { levelGround } from '../../../model/survey/levelGround';
import { layOutWalls } from '../../../model/walls/layOutWalls';
import { rectangle } from '../../helpers/drawings';

function heightsOf(downs: readonly number[]): number[] {
  const drawing = rectangle(240, 120);
  const walls = layOutWalls(drawing);
  const readings = downs.map((down, i) => ({
    id: `s${i}`,
    station: { kind: 'corner' as const, cornerId: `c${i + 1}` },
    down: ticks(Math.round(down)),
  }));
  const ground = levelGround(drawing, walls, { ...EMPTY_SURVEY, readings });
  expect(ground.levelLine).toBe(Math.min(...readings.map((reading) => reading.down)));
  return ground.stations.map((station) => station.height);
}

describe('readings from a level line', () => {
  // NAVEDTRA 14081 p. 15-29: 100.0 + 5.5 = 105.5 and 105.5 − 2.3 = 103.2, so the second point is 3.2 higher.
  it('put a point read 2.3 ft as 3.2 ft over one read 5.5 ft', () => {
    const [back, fore] = heightsOf([5.5 * TICKS_PER_FOOT, 2.3 * TICKS_PER_FOOT]);
    expect(Math.abs(fore! - back! - 3.2 * TICKS_PER_FOOT)).toBeLessThan(1.01);
  });

  // Ghilani & Wolf, Elementary Surveying: 820.00 + 8.42 = 828.42 and 828.42 − 1.20 = 827.22, a rise of 7.22.
  it('put a point read 1.20 ft as 7.22 ft over one read 8.42 ft', () => {
    const [back, fore] = heightsOf([8.42 * TICKS_PER_FOOT, 1.2 * TICKS_PER_FOOT]);
    expect(Math.abs(fore! - back! - 7.22 * TICKS_PER_FOOT)).toBeLessThan(1.01);
  });

  // Common practice, no source: the smallest measure-down is the highest ground.
  it('make the smallest one the high point, at height zero', () => {
    expect(heightsOf([mm(1234), mm(1200), mm(1210.5), mm(1201)])).toEqual([-mm(34), 0, -mm(10.5), -mm(1)]);
  });
});

describe('a level book', () => {
  const row = (i: number, sight: 'back' | 'intermediate' | 'fore', rod: number) => ({
    id: `s${i}`,
    station: null,
    sight,
    rod: ticks(Math.round(rod)),
  });
  const bookOf = (height: number, readings: RodSurvey['readings']): RodSurvey => ({
    version: 1,
    method: 'rod',
    benchmark: { name: '', height: ticks(Math.round(height)) },
    closing: null,
    share: 'setUps',
    readings,
  });

  // NAVEDTRA 14081 p. 15-29; Ghilani & Wolf, Elementary Surveying.
  it.each([
    [100, 5.5, 105.5, 2.3, 103.2],
    [820, 8.42, 828.42, 1.2, 827.22],
  ])(
    'from %f ft with a backsight of %f has its instrument at %f, and %f down from it a point at %f',
    (start, back, instrument, fore, height) => {
      const readings = [row(0, 'back', back * TICKS_PER_FOOT), row(1, 'fore', fore * TICKS_PER_FOOT)];
      const [, last] = reduceBook(bookOf(start * TICKS_PER_FOOT, readings), 12).rows;
      expect((last!.instrument / TICKS_PER_FOOT).toFixed(4)).toBe(instrument.toFixed(4));
      expect((last!.height / TICKS_PER_FOOT).toFixed(4)).toBe(height.toFixed(4));
    },
  );

  // A published worked example gives the sums: ΣBS 5.620 − ΣFS 4.950 = Σrise 1.37 − Σfall 0.70 = 100.67 − 100 = 0.67 m. The
  // single rods are chosen here to make those sums. The check is NAVEDTRA 14071, ch. 7.
  it('proves its arithmetic three ways', () => {
    const metres = [
      ['back', 2.5],
      ['intermediate', 1.9],
      ['intermediate', 2.2],
      ['fore', 2.35],
      ['back', 3.12],
      ['intermediate', 2.35],
      ['fore', 2.6],
    ] as const;
    const { check } = reduceBook(
      bookOf(
        mm(100_000),
        metres.map(([sight, rod], i) => row(i, sight, mm(1000 * rod))),
      ),
      12,
    );
    expect(check).toEqual({
      backs: mm(5620),
      fores: mm(4950),
      rises: mm(1370),
      falls: mm(700),
      first: mm(100_000),
      last: mm(100_670),
      holds: true,
    });
  });

  // NOAA/FGCS third order (secondary): 12 mm √K; a 100 m loop may miss by 3.8 mm.
  it('may miss by 3.8 mm in 100 m', () => {
    expect(RULES.levelMisclosure).toMatchObject({ value: 12, unit: 'mmPerRootKm', standing: 'guidance' });
    const allowed = allowedMisclosure(mm(100_000), RULES.levelMisclosure.value);
    expect((allowed / mm(1)).toFixed(1)).toBe('3.8');
    expect(allowedMisclosure(mm(1_000_000), 12)).toBe(mm(12));
  });

  // Common practice, no source: thicken the bedding rather than cut the unit.
  it('of low ground thickens the bedding there and moves no mark', () => {
    const drawing = rectangle(240, 120);
    const walls = layOutWalls(drawing);
    const read = (downs: readonly number[]) =>
      levelGround(drawing, walls, {
        ...EMPTY_SURVEY,
        readings: downs.map((down, i) => ({
          id: `s${i}`,
          station: { kind: 'corner', cornerId: `c${i + 1}` },
          down: mm(down),
        })),
      });
    const [level, low] = [read([1200, 1200, 1200, 1200]), read([1200, 1200, 1212, 1200])];
    expect(low.firstCourseTop).toBe(level.firstCourseTop);
    expect(low.stations[2]!.bedding - level.stations[2]!.bedding).toBe(mm(12));
  });
});
