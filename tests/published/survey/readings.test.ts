/** Published levelling examples, by the one arithmetic of readings from a level line: height = line − reading. */
import { describe, expect, it } from 'vitest';
import { EMPTY_SURVEY } from '../../../model/drawing/surveySchema';
import { mm, ticks, TICKS_PER_FOOT } from '../../../model/length/ticks';
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
