import { describe, expect, it } from 'vitest';
import { feet } from '../../../model/length/ticks';
import { addKeepClear } from '../../../model/drawing/edits/keepClears';
import { building, withWindow } from '../helpers';
import { hand } from './hand';

/*
 *   D────────C
 *   │        │    20 × 10 ft
 *   A──═══───B    a window 4 ft from A, 3 ft wide
 */
const square = withWindow(
  building([
    [0, 0],
    [20, 0],
    [20, 10],
    [0, 10],
  ]),
  'AB',
  4,
  3,
);

describe('selecting', () => {
  it.each([
    ['a corner', 0, 0, { kind: 'corner', id: 'A' }],
    ['a run, on its body', 12, 0.3, { kind: 'run', id: 'AB' }],
    ['a window, before its run', 5, 0.3, { kind: 'opening', id: 'w1' }],
    ['nothing', 10, 5, null],
  ])('takes %s', (_, x, y, thing) => {
    const h = hand(square, { mode: 'view' }).tap(x, y);
    expect(h.draft.get().selection).toEqual(thing);
  });

  it('reaches farther for a finger than for a mouse', () => {
    expect(hand(square).as('mouse').tap(12, -0.8).draft.get().selection).toBe(null);
    expect(hand(square).as('touch').tap(12, -0.8).draft.get().selection).toEqual({ kind: 'run', id: 'AB' });
  });

  it('moves the paper and nothing else by a drag while only looking', () => {
    const h = hand(square, { mode: 'view' });
    const before = h.camera();
    h.drag(0, 0, 3, 3);
    expect(h.draft.get().drawing).toBe(square);
    expect(h.camera()).not.toEqual(before);
  });

  it('moves the paper by a drag that begins on nothing', () => {
    const h = hand(square).drag(10, 5, 13, 5);
    expect(h.draft.get().drawing).toBe(square);
    expect(h.camera().x).toBeLessThan(feet(15));
  });

  it('changes nothing for who may not draw', () => {
    const h = hand(square, { role: 'observer' }).drag(20, 0, 24, 0);
    expect(h.draft.get().drawing).toBe(square);
  });
});

describe('moving by a drag', () => {
  it('moves a corner as one undo step, and keeps it in line with its neighbour', () => {
    const h = hand(square).drag(20, 10, 24, 10.1);
    expect(h.corners()[2]).toMatch(/^C 2\d(\.\d+)?,10$/);
    expect(h.undoLabels()).toEqual(['plan.did.moveCorner']);
    h.draft.undo();
    expect(h.draft.get().drawing).toEqual(square);
  });

  it('slides a run sideways: its neighbours stretch along their lines', () => {
    const h = hand(square);
    h.draft.setSnapping(false);
    h.drag(10, 9.8, 13, 11.8);
    expect(h.corners()).toEqual(['A 0,0', 'B 20,0', 'C 20,12', 'D 0,12']);
    expect(h.undoLabels()).toEqual(['plan.did.slideRun']);
  });

  it('slides an opening along its run and no farther than its end', () => {
    const h = hand(square);
    h.draft.setSnapping(false);
    h.drag(5, 0.3, 8, 3);
    expect(h.draft.get().drawing.openings[0]?.at).toBe(feet(7));
    h.drag(8, 0.3, 40, 0.3);
    expect(h.draft.get().drawing.openings[0]?.at).toBe(feet(17));
    expect(h.draft.get().selection).toEqual({ kind: 'opening', id: 'w1' });
  });

  it('catches the middle of the run', () => {
    const h = hand(square).down(5, 0.3).move(7, 0.3).move(9.6, 0.3);
    expect(h.draft.get().preview?.caught).toBe('middle');
    h.up(9.6, 0.3);
    expect(h.draft.get().drawing.openings[0]?.at).toBe(feet(8.5));
  });

  it('moves a point of a keep-clear, or the whole of it', () => {
    const ring = [
      { x: feet(24), y: feet(0) },
      { x: feet(28), y: feet(0) },
      { x: feet(28), y: feet(6) },
    ];
    const h = hand(addKeepClear(square, { name: 'tree', points: ring }, () => 'k'));
    h.draft.setSnapping(false);
    h.drag(28, 6, 29, 8);
    expect(h.draft.get().drawing.keepClears[0]?.points[2]).toEqual({ x: feet(29), y: feet(8) });
    h.drag(27, 2, 28, 2);
    expect(h.draft.get().drawing.keepClears[0]?.points[0]).toEqual({ x: feet(25), y: feet(0) });
  });

  it('puts everything back when a second finger comes', () => {
    const h = hand(square).as('touch').down(20, 10).move(24, 10).move(26, 12);
    expect(h.draft.get().drawing).not.toEqual(square);
    h.down(5, 5, 2);
    expect(h.draft.get().drawing).toBe(square);
    h.up(5, 5, 2).up(26, 12);
    expect(h.undoLabels()).toEqual([]);
    expect(h.draft.get().preview).toBe(null);
  });
});

/*
 *   D────────C
 *            │    open: A and D are free ends
 *   A────────B
 */
describe('letting go of a dragged corner', () => {
  const open = building(
    [
      [0, 0],
      [20, 0],
      [20, 10],
      [0, 10],
    ],
    false,
  );

  it('joins it to the corner it lands on, as one undo step', () => {
    const h = hand(open).drag(0, 10, 0, 0);
    expect(h.corners()).toEqual(['A 0,0', 'B 20,0', 'C 20,10']);
    expect(h.draft.get().drawing.runs.map(({ from, to }) => `${from}${to}`)).toEqual(['AB', 'BC', 'CA']);
    expect(h.draft.get().selection).toEqual({ kind: 'corner', id: 'A' });
    expect(h.undoLabels()).toEqual(['plan.did.moveCorner']);
    h.draft.undo();
    expect(h.draft.get().drawing).toEqual(open);
  });

  it('makes a tee of the run it lands on', () => {
    const h = hand(open).drag(0, 10, 8, 0);
    const { corners, runs } = h.draft.get().drawing;
    expect(corners).toHaveLength(4);
    const met = corners.filter(({ id }) => runs.filter(({ from, to }) => from === id || to === id).length === 3);
    expect(met).toHaveLength(1);
    expect(met[0]?.y).toBe(0);
    expect(Math.abs((met[0]?.x ?? 0) - feet(8))).toBeLessThan(feet(1));
  });
});
