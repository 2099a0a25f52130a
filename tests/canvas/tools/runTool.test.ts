import { describe, expect, it } from 'vitest';
import { feet, inches } from '../../../model/length/ticks';
import { building } from '../helpers';
import { hand, inFeet } from './hand';

const nothing = building([], false);

describe('drawing wall runs', () => {
  /*
   *   D────C
   *   │    │     four taps and the first corner again, snapping off: a loop that stands inside its line
   *   A────B
   */
  it('taps round a loop and closes it on the first corner', () => {
    const h = hand(nothing).tool('run');
    h.draft.setSnapping(false);
    h.tap(0, 0).tap(20, 0).tap(20, 10).tap(0, 10);
    h.draft.setSnapping(true);
    h.tap(0.1, 0.1);
    expect(h.corners()).toEqual(['A 0,0', 'B 20,0', 'C 20,10', 'D 0,10']);
    expect(h.runs()).toEqual(['A–B', 'B–C', 'C–D', 'D–A']);
    expect(h.undoLabels()).toHaveLength(4);
    expect(h.draft.get().preview).toBe(null);
    h.tap(30, 0).hover(35, 0);
    expect(h.draft.get().preview?.run?.from).toEqual({ x: feet(30), y: feet(0) });
  });

  it('turns a loop drawn clockwise so that it stands inside its line', () => {
    const h = hand(nothing).tool('run');
    h.draft.setSnapping(false);
    h.tap(0, 0).tap(0, 10).tap(20, 10).tap(20, 0);
    h.draft.setSnapping(true);
    h.tap(0, 0);
    expect(h.runs()).toEqual(['B–A', 'C–B', 'D–C', 'A–D']);
  });

  it('draws a run by one drag, and goes on from its end', () => {
    const h = hand(nothing).tool('run');
    h.draft.setSnapping(false);
    h.drag(0, 0, 12, 0).tap(12, 8);
    expect(h.runs()).toEqual(['A–B', 'B–C']);
    expect(h.corners()).toEqual(['A 0,0', 'B 12,0', 'C 12,8']);
  });

  it('shows the length while the pointer moves, square to the run before it', () => {
    const h = hand(nothing).tool('run');
    h.draft.setSnapping(false);
    h.tap(0, 0).tap(12, 0);
    h.draft.setSnapping(true);
    h.hover(12.1, 8);
    const run = h.draft.get().preview?.run;
    expect(run?.to.x).toBe(feet(12));
    expect(run?.angle).toBe(90);
  });

  /*
   *        C
   *        │        from the middle of A–B: the run is split there, a tee
   *   A────T────B
   */
  it('makes a tee of a tap on a run, and ends where it meets one', () => {
    const line = building(
      [
        [0, 0],
        [20, 0],
      ],
      false,
    );
    const h = hand(line).tool('run').tap(8, 0).tap(8, 9);
    expect(h.runs()).toHaveLength(3);
    const stem = h.draft.get().drawing.corners.find((corner) => inFeet(corner.y) > 8);
    expect(inFeet(stem!.x)).toBe(8);
    expect(h.runs()).toEqual(['A–C', 'C–B', 'C–D']);
    const back = hand(line).tool('run').tap(8, 9).tap(8, 0);
    expect(back.runs()).toHaveLength(3);
    expect(back.tools.isBusy()).toBe(false);
  });

  it('takes an exact length and angle that were typed, on the side of the pointer', () => {
    const h = hand(nothing).tool('run');
    h.draft.setSnapping(false);
    h.tap(0, 0).tap(12, 0).hover(14, 6);
    h.tools.holdAngle(90);
    h.tools.holdLength(feet(9, 4.5));
    expect(h.draft.get().preview?.run?.to).toEqual({ x: feet(12), y: feet(9, 4.5) });
    expect(h.tools.place()).toBe(true);
    expect(h.corners()[2]).toBe('C 12,9.375');
    h.hover(5, 20);
    expect(h.draft.get().preview?.run?.heldLength).toBe(null);
  });

  it('types a length before the pointer has moved at all', () => {
    const h = hand(nothing).tool('run');
    h.tap(0, 0);
    h.tools.holdLength(inches(100));
    expect(h.tools.place()).toBe(true);
    const [a, b] = h.draft.get().drawing.corners;
    expect(b!.x - a!.x).toBe(inches(100));
  });

  it('ends free by Done, and by a double tap', () => {
    const h = hand(nothing).tool('run');
    h.draft.setSnapping(false);
    h.tap(0, 0).tap(10, 0);
    expect(h.tools.finish()).toBe(true);
    h.hover(10, 5);
    expect(h.draft.get().preview?.run).toBe(null);
    const twice = hand(nothing).tool('run');
    twice.draft.setSnapping(false);
    twice.tap(0, 0).tap(10, 0).tapAgain(10, 0);
    expect(twice.runs()).toEqual(['A–B']);
    expect(twice.tools.isBusy()).toBe(false);
  });

  it('takes back the stroke and keeps the chain when a second finger comes', () => {
    const h = hand(nothing).as('touch').tool('run');
    h.draft.setSnapping(false);
    h.tap(0, 0).tap(10, 0).down(10, 6).move(10, 7).down(20, 7, 2).move(22, 7, 2).up(22, 7, 2).up(10, 7);
    expect(h.runs()).toEqual(['A–B']);
    expect(h.draft.get().preview?.run?.length).toBe(0);
    expect(h.camera().scale).not.toBe(hand(nothing).camera().scale);
    expect(h.tools.isBusy()).toBe(true);
  });

  it('steps back along the chain by undo', () => {
    const h = hand(nothing).tool('run');
    h.draft.setSnapping(false);
    h.tap(0, 0).tap(10, 0).tap(10, 8);
    h.draft.undo();
    expect(h.draft.get().preview?.run?.from).toEqual({ x: feet(10), y: feet(0) });
    h.tap(16, 0);
    expect(h.corners().map((corner) => corner.slice(2))).toEqual(['0,0', '10,0', '16,0']);
    expect(h.runs()).toHaveLength(2);
  });

  it('takes back a first corner that nothing stands on yet', () => {
    const h = hand(nothing).tool('run').tap(0, 0);
    expect(h.tools.stepBack()).toBe(true);
    expect(h.tools.stepBack()).toBe(false);
    expect(h.draft.get().preview).toBe(null);
  });

  it('leaves nothing on the screen when another tool is taken up', () => {
    const h = hand(nothing).tool('run').tap(0, 0).hover(5, 5).tool('select');
    expect(h.draft.get().preview).toBe(null);
    expect(h.tools.isBusy()).toBe(false);
  });
});
