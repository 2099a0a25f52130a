import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { moveCorner, placeCorners } from '../../../../model/drawing/edits/moveCorners';
import { placeAt, setRunAngle, setRunLength } from '../../../../model/drawing/edits/runLength';
import { slideRun } from '../../../../model/drawing/edits/slideRun';
import { fromBearing } from '../../../../model/geometry/vec';
import { inches, ticks } from '../../../../model/length/ticks';
import { layOutWalls } from '../../../../model/walls/layOutWalls';
import { expectWhole, openingAt, places, plan, RECTANGLE, TEED, withOpening } from './scene';

const at = (x: number, y: number) => ({ x: inches(x), y: inches(y) });

describe('moving a corner', () => {
  it('moves it, and openings keep their distance from the end that stays', () => {
    const opened = withOpening(withOpening(RECTANGLE, 'ab', 'A-B', 30), 'bc', 'B-C', 100);
    const drawing = expectWhole(opened, (d) => moveCorner(d, 'B', at(360, -60)));
    expect(places(drawing)['B']).toEqual([360, -60]);
    expect(openingAt(drawing, 'ab').at).toBe(30);
    // C stays and B–C grows by 60: the opening stays where it is on the plan.
    expect(openingAt(drawing, 'bc').at).toBe(160);
  });

  it('keeps a wall straight through its tees, each on its stem’s line', () => {
    const drawing = expectWhole(TEED, (d) => moveCorner(d, 'B', at(360, -36)));
    expect(drawing.corners.find((one) => one.id === 'T')).toMatchObject(at(144, -14.4));
    expect(places(drawing)['S']).toEqual([144, 240]);
    expect(layOutWalls(drawing).cornerById.get('T')?.kind).toBe('tee');
  });

  it('bends a wall at a corner in its middle', () => {
    const wall = plan({ A: [0, 0], M: [100, 0], B: [250, 0] }, ['A-M', 'M-B']);
    expect(places(moveCorner(wall, 'M', at(100, 20)))).toEqual({ A: [0, 0], M: [100, 20], B: [250, 0] });
  });

  it('changes nothing where it is there already, is off the plan, or is not there', () => {
    expect(moveCorner(RECTANGLE, 'B', at(360, 0))).toBe(RECTANGLE);
    expect(moveCorner(RECTANGLE, 'B', { x: ticks(2_000_000_000), y: ticks(0) })).toBe(RECTANGLE);
    expect(moveCorner(RECTANGLE, 'B', { x: ticks(Number.NaN), y: ticks(0) })).toBe(RECTANGLE);
    expect(moveCorner(RECTANGLE, 'gone', at(0, 9))).toBe(RECTANGLE);
  });

  it('carries openings along where both ends move alike', () => {
    const opened = withOpening(RECTANGLE, 'ab', 'A-B', 30);
    const drawing = placeCorners(
      opened,
      new Map([
        ['A', at(10, 10)],
        ['B', at(370, 10)],
      ]),
    );
    expect(openingAt(drawing, 'ab').at).toBe(30);
  });
});

describe('sliding a run', () => {
  it('stretches the walls at its ends along their own lines', () => {
    const drawing = expectWhole(RECTANGLE, (d) => slideRun(d, 'C-D', inches(-30)));
    expect(places(drawing)).toEqual({ A: [0, 0], B: [360, 0], C: [360, 270], D: [0, 270] });
  });

  it('to the left goes into its body', () => {
    expect(places(slideRun(RECTANGLE, 'A-B', inches(20)))).toMatchObject({ A: [0, 20], B: [360, 20] });
  });

  it('takes the whole straight wall along, tees and all', () => {
    const drawing = expectWhole(TEED, (d) => slideRun(d, 'A-T', inches(-24)));
    expect(places(drawing)).toMatchObject({ A: [0, -24], T: [144, -24], B: [360, -24], S: [144, 240] });
  });

  it('slides a stem along its bars', () => {
    expect(places(slideRun(TEED, 'T-S', inches(-40)))).toMatchObject({ T: [184, 0], S: [184, 240], A: [0, 0] });
  });

  it('moves free ends square', () => {
    const wall = plan({ A: [0, 0], B: [100, 0] }, ['A-B']);
    expect(places(slideRun(wall, 'A-B', inches(7)))).toEqual({ A: [0, 7], B: [100, 7] });
  });

  it('follows slanting neighbours, and keeps openings where they are on the plan', () => {
    const shape = plan({ A: [0, 0], B: [300, 0], C: [250, 100], D: [50, 100] }, ['A-B', 'B-C', 'C-D', 'D-A']);
    const drawing = expectWhole(withOpening(shape, 'o', 'A-B', 100), (d) => slideRun(d, 'A-B', inches(20)));
    expect(places(drawing)).toMatchObject({ A: [10, 20], B: [290, 20] });
    expect(openingAt(drawing, 'o').at).toBe(90);
  });

  it('changes nothing where a wall would turn back on itself', () => {
    expect(slideRun(RECTANGLE, 'C-D', inches(240))).toBe(RECTANGLE);
    expect(slideRun(RECTANGLE, 'C-D', inches(300))).toBe(RECTANGLE);
    expect(slideRun(RECTANGLE, 'C-D', ticks(0))).toBe(RECTANGLE);
    expect(slideRun(RECTANGLE, 'gone', ticks(9))).toBe(RECTANGLE);
  });

  it('and back is as it was', () => {
    fc.assert(
      fc.property(fc.integer({ min: -3_000_000, max: 3_000_000 }), (by) => {
        fc.pre(by !== 0);
        const there = slideRun(RECTANGLE, 'A-B', ticks(by));
        expect(slideRun(there, 'A-B', ticks(-by))).toEqual(RECTANGLE);
      }),
    );
  });
});

describe('giving a run a length', () => {
  it('keeps a rectangle a rectangle', () => {
    const drawing = expectWhole(RECTANGLE, (d) => setRunLength(d, 'A-B', inches(400), 'from'));
    expect(places(drawing)).toEqual({ A: [0, 0], B: [400, 0], C: [400, 240], D: [0, 240] });
    const back = setRunLength(RECTANGLE, 'A-B', inches(400), 'to');
    expect(places(back)).toEqual({ A: [-40, 0], B: [360, 0], C: [360, 240], D: [-40, 240] });
  });

  it('carries along all that is joined to the far end only', () => {
    const chain = withOpening(
      plan({ A: [0, 0], B: [90, 0], C: [90, 60], D: [0, 60] }, ['A-B', 'B-C', 'C-D']),
      'o',
      'C-D',
      20,
    );
    const drawing = expectWhole(chain, (d) => setRunLength(d, 'A-B', inches(100), 'from'));
    expect(places(drawing)).toEqual({ A: [0, 0], B: [100, 0], C: [100, 60], D: [10, 60] });
    expect(openingAt(drawing, 'o').at).toBe(20);
  });

  it('stretches every wall that runs the same way across an outline', () => {
    //  F──E
    //  │  D──C     A–B grows: E–F or C–D takes it up, whichever comes first from B
    //  A─────B
    const ell = plan({ A: [0, 0], B: [360, 0], C: [360, 120], D: [180, 120], E: [180, 240], F: [0, 240] }, [
      'A-B',
      'B-C',
      'C-D',
      'D-E',
      'E-F',
      'F-A',
    ]);
    const longer = expectWhole(ell, (d) => setRunLength(d, 'A-B', inches(400), 'from'));
    expect(places(longer)).toMatchObject({ B: [400, 0], C: [400, 120], D: [180, 120], E: [180, 240] });
    // Neither C–D nor E–F, 180 in each, can give 200 in way.
    expect(setRunLength(ell, 'A-B', inches(160), 'from')).toBe(ell);
    const shorter = setRunLength(ell, 'A-B', inches(200), 'from');
    expect(places(shorter)).toMatchObject({ B: [200, 0], C: [200, 120], D: [180, 120] });
  });

  it('moves a tee along its bar', () => {
    const drawing = expectWhole(TEED, (d) => setRunLength(d, 'A-T', inches(120), 'from'));
    expect(places(drawing)).toMatchObject({ T: [120, 0], S: [120, 240], B: [360, 0], D: [0, 240] });
  });

  it('moves only the far corner of a triangle', () => {
    const triangle = plan({ A: [0, 0], B: [90, 0], C: [30, 90] }, ['A-B', 'B-C', 'C-A']);
    expect(places(setRunLength(triangle, 'A-B', inches(100), 'from'))).toEqual({ A: [0, 0], B: [100, 0], C: [30, 90] });
  });

  it('comes out to the tick at any angle', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 360, noNaN: true }),
        fc.integer({ min: 1000, max: 100_000_000 }),
        (degrees, length) => {
          const place = placeAt({ x: ticks(0), y: ticks(0) }, fromBearing(degrees), ticks(length));
          expect(Math.round(Math.hypot(place.x, place.y))).toBe(length);
        },
      ),
    );
  });

  it('changes nothing for no length, the length it has, or no run', () => {
    expect(setRunLength(RECTANGLE, 'A-B', inches(360), 'from')).toBe(RECTANGLE);
    expect(setRunLength(RECTANGLE, 'A-B', ticks(0), 'from')).toBe(RECTANGLE);
    expect(setRunLength(RECTANGLE, 'gone', inches(9), 'from')).toBe(RECTANGLE);
  });
});

describe('giving a run a bearing', () => {
  it('turns it about the end that stays and carries the rest along', () => {
    const chain = plan({ A: [0, 0], B: [90, 0], C: [90, 60] }, ['A-B', 'B-C']);
    expect(places(expectWhole(chain, (d) => setRunAngle(d, 'A-B', 90, 'from')))).toEqual({
      A: [0, 0],
      B: [0, 90],
      C: [0, 150],
    });
    expect(places(setRunAngle(chain, 'A-B', 90, 'to'))).toEqual({ A: [90, -90], B: [90, 0], C: [90, 60] });
  });
  it('moves only the far corner of a closed outline', () => {
    expect(places(setRunAngle(RECTANGLE, 'A-B', 270, 'from'))).toMatchObject({ B: [0, -360], C: [360, 240] });
  });
  it('changes nothing for no number', () => {
    expect(setRunAngle(RECTANGLE, 'A-B', Number.NaN, 'from')).toBe(RECTANGLE);
  });
});
