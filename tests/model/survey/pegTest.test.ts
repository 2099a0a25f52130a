import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { PegTest, RodSurvey } from '../../../model/drawing/surveySchema';
import { mm, ticks } from '../../../model/length/ticks';
import { levelGround } from '../../../model/survey/levelGround';
import { checkPegs } from '../../../model/survey/pegTest';
import { layOutWalls } from '../../../model/walls/layOutWalls';
import { rectangle } from '../../helpers/drawings';

/** What a level with that slope reads on pegs `rise` apart, B the higher, from these distances. */
function readPegs(rise: number, slope: number, [toA, toB]: readonly [number, number], sight: number) {
  return {
    a: ticks(Math.round(sight + slope * toA)),
    b: ticks(Math.round(sight - rise + slope * toB)),
    toA: ticks(toA),
    toB: ticks(toB),
  };
}

// Worked by hand: 1.400 and 1.200 m from midway (30 m each), so B stands 0.200 m higher; from 3 m off B and 63 m off A,
// 1.538 and 1.326 m make it 0.212 m: 12 mm in 60 m.
const pegs: PegTest = {
  midway: { a: mm(1400), b: mm(1200), toA: mm(30_000), toB: mm(30_000) },
  near: { a: mm(1538), b: mm(1326), toA: mm(63_000), toB: mm(3000) },
};

describe('the two-peg check', () => {
  it('finds the slope of the line of sight, the true rise, and the rods an adjusted level would read', () => {
    const { slope, rise, wanted } = checkPegs(pegs);
    expect(slope).toBeCloseTo(0.0002, 15);
    expect(rise).toBe(mm(200));
    expect(wanted).toEqual({ a: mm(1538 - 12.6), b: mm(1326 - 0.6) });
    expect(wanted.a - wanted.b).toBe(mm(200));
  });

  it('finds any slope from any two places that differ, to the rounding of the rods', () => {
    const distance = fc.integer({ min: 1_000_000, max: 50_000_000 });
    fc.assert(
      fc.property(
        fc.integer({ min: -300_000, max: 300_000 }),
        fc.double({ min: -0.001, max: 0.001, noNaN: true }),
        distance,
        distance,
        (rise, slope, half, far) => {
          const found = checkPegs({
            midway: readPegs(rise, slope, [half, half], 1_000_000),
            near: readPegs(rise, slope, [half + far, half], 1_000_000),
          });
          expect(Math.abs(found.rise - rise)).toBeLessThanOrEqual(1);
          expect(Math.abs(found.slope! - slope) * far).toBeLessThanOrEqual(2.001);
        },
      ),
    );
  });

  it('can’t tell where both places lie alike to the pegs', () => {
    const { slope, wanted } = checkPegs({ midway: pegs.midway, near: pegs.midway });
    expect(slope).toBeNull();
    expect(wanted).toEqual({ a: mm(1400), b: mm(1200) });
  });

  it('corrects nothing by a slope that is no level’s but a misread peg', () => {
    const misread = { ...pegs, near: { ...pegs.near, a: mm(2538) } };
    expect(checkPegs(misread).slope).toBeCloseTo(1.012 / 60, 12);
    expect(checkPegs(misread).wanted).toEqual({ a: mm(2538), b: mm(1326) });
  });

  it('takes the error out of every rod whose distance is known, and says that the level wants adjusting', () => {
    const drawing = rectangle(240, 120);
    const survey: RodSurvey = {
      version: 1,
      method: 'rod',
      benchmark: { name: 'Nail', height: mm(0) },
      closing: null,
      share: 'setUps',
      pegTest: pegs,
      readings: [
        { id: 'b', station: null, sight: 'back', rod: mm(1500), distance: mm(5000) },
        {
          id: 'n',
          station: { kind: 'corner', cornerId: 'c1' },
          sight: 'intermediate',
          rod: mm(1500),
          distance: mm(25_000),
        },
        { id: 'f', station: { kind: 'corner', cornerId: 'c2' }, sight: 'intermediate', rod: mm(1500) },
      ],
    };
    const ground = levelGround(drawing, layOutWalls(drawing), survey);
    // 20 m further at 0.2 mm a metre: read 4 mm too low. The one without a distance stays as read, 1 mm under.
    expect(ground.book?.rows.map(({ height }) => height)).toEqual([0, mm(4), -mm(1)]);
    const said = ground.reasons.find(({ code }) => code === 'collimationOverMost');
    expect(said).toMatchObject({ rule: 'collimationMost', amount: mm(1) });
  });
});
