import { describe, expect, it } from 'vitest';
import { feet } from '../../../model/length/ticks';
import { building } from '../helpers';
import { hand, inFeet } from './hand';

const square = building([
  [0, 0],
  [20, 0],
  [20, 10],
  [0, 10],
]);

describe('placing openings', () => {
  it.each(['door', 'window', 'passage'] as const)('places a %s where the run is tapped, and selects it', (kind) => {
    const h = hand(square).tool(kind);
    h.draft.setSnapping(false);
    h.tap(10, 0.2);
    const [opening] = h.draft.get().drawing.openings;
    expect(opening?.kind).toBe(kind);
    expect(inFeet(opening!.at + opening!.width / 2)).toBe(10);
    expect(h.draft.get().selection).toEqual({ kind: 'opening', id: opening?.id });
    expect(h.draft.get().tool).toBe('select');
    expect(h.undoLabels()).toEqual(['plan.did.placeOpening']);
  });

  it('slides it live before it is let go, as one undo step', () => {
    const h = hand(square).tool('window');
    h.draft.setSnapping(false);
    h.down(5, 0.2).move(8, 0.2);
    expect(inFeet(h.draft.get().drawing.openings[0]!.at)).toBe(6.5);
    h.move(12, 0.2).up(12, 0.2);
    expect(inFeet(h.draft.get().drawing.openings[0]!.at)).toBe(10.5);
    expect(h.undoLabels()).toHaveLength(1);
    h.draft.undo();
    expect(h.draft.get().drawing.openings).toEqual([]);
  });

  it('keeps it on its run', () => {
    const h = hand(square).tool('window').down(5, 0.2).move(60, 0.2).up(60, 0.2);
    const [opening] = h.draft.get().drawing.openings;
    expect(opening!.at + opening!.width).toBe(feet(20));
  });

  it('places nothing off a run, and nothing when the stroke is taken back', () => {
    const h = hand(square).as('touch').tool('door').tap(10, 5);
    expect(h.draft.get().drawing.openings).toEqual([]);
    h.down(10, 0.2).down(14, 5, 2).up(14, 5, 2).up(10, 0.2);
    expect(h.draft.get().drawing.openings).toEqual([]);
    expect(h.draft.get().tool).toBe('door');
  });
});

describe('drawing a keep-clear', () => {
  it('goes round by taps and closes on its first point', () => {
    const h = hand(square).tool('keepClear');
    h.draft.setSnapping(false);
    h.tap(24, 0).tap(28, 0).tap(28, 6);
    expect(h.draft.get().preview?.outline).toHaveLength(4);
    h.tap(24.1, 0.1);
    const [area] = h.draft.get().drawing.keepClears;
    expect(area?.points).toEqual([
      { x: feet(24), y: feet(0) },
      { x: feet(28), y: feet(0) },
      { x: feet(28), y: feet(6) },
    ]);
    expect(h.draft.get().selection).toEqual({ kind: 'keepClear', id: area?.id });
  });

  it('closes by Done from three points up, and is dropped with fewer', () => {
    const h = hand(square).tool('keepClear');
    h.draft.setSnapping(false);
    h.tap(24, 0).tap(28, 0);
    expect(h.tools.finish()).toBe(true);
    expect(h.draft.get().drawing.keepClears).toEqual([]);
    h.tool('keepClear').tap(24, 0).tap(28, 0).tap(28, 6);
    h.tools.finish();
    expect(h.draft.get().drawing.keepClears).toHaveLength(1);
  });

  it('steps back point by point', () => {
    const h = hand(square).tool('keepClear');
    h.draft.setSnapping(false);
    h.tap(24, 0).tap(28, 0);
    expect([h.tools.stepBack(), h.tools.stepBack(), h.tools.stepBack()]).toEqual([true, true, false]);
    expect(h.draft.get().preview).toBe(null);
  });

  it('keeps its points when a second finger comes', () => {
    const h = hand(square).as('touch').tool('keepClear');
    h.draft.setSnapping(false);
    h.tap(24, 0).tap(28, 0).down(28, 4).down(20, 4, 2).up(20, 4, 2).up(28, 4);
    expect(h.draft.get().preview?.outline).toHaveLength(2);
  });
});

describe('drawing the site boundary', () => {
  it('sets it by the same taps as a keep-clear, as one undo step, and adds no area', () => {
    const h = hand(square);
    h.draft.setSnapping(false);
    h.draft.setArea('boundary');
    h.tool('keepClear').tap(-5, -5).tap(30, -5).tap(30, 20).tap(-5, 20).tap(-5, -5);
    expect(h.draft.get().drawing.boundary).toHaveLength(4);
    expect(h.draft.get().drawing.keepClears).toEqual(square.keepClears);
    expect(h.draft.get().selection).toEqual({ kind: 'boundary', id: 'boundary' });
    expect(h.undoLabels()).toEqual(['plan.did.boundary']);
    h.draft.undo();
    expect(h.draft.get().drawing.boundary).toBe(null);
  });
});
