import { describe, expect, it } from 'vitest';
import { newDrawing, newOpening } from '../../../model/drawing/defaults';
import { slideRun } from '../../../model/drawing/edits/slideRun';
import type { Drawing } from '../../../model/drawing/schema';
import { inches, ticks } from '../../../model/length/ticks';
import { snapOpening, snapSlide } from '../../../model/snapping/snapAlong';
import { layOutWalls } from '../../../model/walls/layOutWalls';

//   D──────C
//   │      │      360 × 240 in; module 18 in
//   A──────B
const ROOM: Drawing = {
  ...newDrawing('imperial'),
  corners: [
    { id: 'A', letter: 'A', x: inches(0), y: inches(0) },
    { id: 'B', letter: 'B', x: inches(360), y: inches(0) },
    { id: 'C', letter: 'C', x: inches(360), y: inches(240) },
    { id: 'D', letter: 'D', x: inches(0), y: inches(240) },
  ],
  runs: ['A-B', 'B-C', 'C-D', 'D-A'].map((id) => {
    const [from = '', to = ''] = id.split('-');
    return { id, from, to, wallTypeId: 'wall' };
  }),
};
const WALLS = layOutWalls(ROOM);

function opening(raw: number, { width = 36, reach = 2, drawing = ROOM, openingId = 'o' } = {}) {
  const snap = snapOpening({
    drawing,
    walls: WALLS,
    runId: 'A-B',
    raw: inches(raw),
    width: inches(width),
    reach: inches(reach),
    openingId,
  });
  return [snap.at / inches(1), snap.kind];
}

describe('an opening moved along its run', () => {
  it('stops in the middle', () => {
    expect(opening(161)).toEqual([162, 'centre']);
  });
  it('stops after whole and half units from the first corner', () => {
    // Three units and two joints: 3 × 18 − 3/8.
    expect(opening(53.5)).toEqual([53.625, 'unit']);
    expect(opening(62)).toEqual([62.625, 'unit']);
  });
  it('stops before whole units from the far corner', () => {
    // The far jamb is 53 5/8 from B.
    expect(opening(360 - 36 - 53, { reach: 0.7 })).toEqual([360 - 36 - 53.625, 'unit']);
  });
  it('stops whole units away from another opening', () => {
    const other = newOpening('imperial', 'window', { id: 'w', runId: 'A-B', at: inches(40) });
    const drawing = { ...ROOM, openings: [other] };
    // 76 in is the other's far jamb; two units and a joint further, 35 5/8.
    expect(opening(111.7, { drawing, reach: 0.2 })).toEqual([111.625, 'opening']);
    expect(opening(111.7, { drawing: { ...ROOM, openings: [{ ...other, id: 'o' }] }, reach: 0.2 })[1]).toBe('step');
  });
  it('stays within its run, on the tape’s step where nothing is near', () => {
    expect(opening(-30)).toEqual([0, 'step']);
    expect(opening(400)).toEqual([324, 'step']);
    expect(opening(58.03, { reach: 0.1 })).toEqual([58, 'step']);
  });
  it('is put on the step where its run is gone', () => {
    const snap = snapOpening({ drawing: ROOM, walls: WALLS, runId: 'gone', raw: 1500, width: ticks(9), reach: 9 });
    expect(snap).toEqual({ at: 1016, kind: 'step' });
  });
});

describe('a run slid sideways', () => {
  const slide = (raw: number, change: { reach?: number; goodLengths?: (near: number) => number[] } = {}) => {
    const { reach = 3, goodLengths } = change;
    const drawing = {
      ...ROOM,
      corners: [...ROOM.corners, { id: 'E', letter: 'E', x: inches(500), y: inches(30) }],
    };
    const good = goodLengths && ((near: number) => goodLengths(near / inches(1)).map((length) => inches(length)));
    return snapSlide({
      drawing,
      walls: WALLS,
      runId: 'A-B',
      raw: inches(raw),
      reach: inches(reach),
      ...(good ? { goodLengths: good } : {}),
    });
  };

  it('stops where it was', () => {
    expect(slide(1)).toEqual({ by: 0, kind: 'back' });
  });
  it('stops in line with another corner', () => {
    expect(slide(28)).toEqual({ by: inches(30), kind: 'align', withId: 'E' });
  });
  it('stops where its neighbours need no cutting', () => {
    const goodLengths = (near: number) => [Math.round(near / 18) * 18];
    // B–C is 240 long: 13 units are 234, so 6 in towards the body.
    const snap = slide(7, { goodLengths });
    expect(snap).toMatchObject({ by: inches(6), kind: 'module' });
    const slid = layOutWalls(slideRun(ROOM, 'A-B', snap.by));
    expect(slid.runById.get('B-C')?.length).toBe(inches(234));
    expect(slide(-11, { goodLengths })).toMatchObject({ by: inches(-12), kind: 'module' });
  });
  it('falls on the tape’s step where nothing is near', () => {
    expect(slide(15.01)).toEqual({ by: inches(15), kind: 'step' });
  });
});
