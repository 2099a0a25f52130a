import { describe, expect, it } from 'vitest';
import { runKey } from '../../../canvas/actions/keys';
import { redo, undo, cancel } from '../../../canvas/actions/historyActions';
import { nudge, nudgeStep } from '../../../canvas/actions/nudge';
import { duplicate, flipHinge, openOtherWay, remove, turnRun } from '../../../canvas/actions/thingActions';
import { toolActions } from '../../../canvas/actions/toolActions';
import { draw, penDraws, snapping } from '../../../canvas/actions/viewActions';
import type { ActionContext } from '../../../canvas/actions/action';
import { NO_MODIFIERS, type Modifiers } from '../../../canvas/input/events';
import { addOpening } from '../../../model/drawing/edits/openings';
import { feet, inches, ticks } from '../../../model/length/ticks';
import { building, withWindow } from '../helpers';
import { hand } from '../tools/hand';

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

function bench(drawing = square, options: Parameters<typeof hand>[1] = {}) {
  const h = hand(drawing, options);
  const seen = { fits: 0, zooms: [] as number[] };
  let ids = 0;
  const context: ActionContext = {
    draft: h.draft,
    tools: h.tools,
    view: {
      fit() {
        seen.fits += 1;
      },
      zoomBy(factor) {
        seen.zooms.push(factor);
      },
    },
    newId: () => `c${(ids += 1)}`,
  };
  const key = (name: string, modifiers: Partial<Modifiers> = {}, typing = false) =>
    runKey({ kind: 'key', key: name, modifiers: { ...NO_MODIFIERS, ...modifiers } }, context, typing);
  return { h, draft: h.draft, context, seen, key };
}

describe('commands', () => {
  it('deletes the selected thing, and undoes and redoes it', () => {
    const { draft, context } = bench();
    expect(remove.enabled(draft.get())).toBe(false);
    draft.select({ kind: 'opening', id: 'w1' });
    remove.run(context);
    expect(draft.get().drawing.openings).toEqual([]);
    expect(undo.of?.(draft.get())).toBe('plan.did.remove');
    undo.run(context);
    expect(draft.get().drawing.openings).toHaveLength(1);
    redo.run(context);
    expect(draft.get().drawing.openings).toEqual([]);
  });

  it('takes the last point of what is being drawn back before the drawing’s own steps', () => {
    const { h, draft, context } = bench();
    draft.edit('x', (d) => ({ ...d, units: 'metric' }));
    h.tool('keepClear').tap(24, 0).tap(28, 0);
    undo.run(context);
    expect(draft.get().preview?.outline).toHaveLength(1);
    expect(draft.get().drawing.units).toBe('metric');
    undo.run(context);
    undo.run(context);
    expect(draft.get().drawing.units).toBe('imperial');
  });

  it('turns a door’s hinge and the way it opens', () => {
    const { draft, context } = bench(addOpening(square, { kind: 'door', runId: 'CD', at: feet(2) }, () => 'd1'));
    draft.select({ kind: 'opening', id: 'd1' });
    flipHinge.run(context);
    openOtherWay.run(context);
    const door = draft.get().drawing.openings.find((opening) => opening.id === 'd1');
    expect(door?.kind === 'door' && door.swing).toEqual({ hinge: 'far', opens: 'out' });
    draft.select({ kind: 'opening', id: 'w1' });
    expect(flipHinge.enabled(draft.get())).toBe(false);
  });

  it('puts one more of an opening its own width away, and none where there is no room', () => {
    const { draft, context } = bench();
    draft.select({ kind: 'opening', id: 'w1' });
    duplicate.run(context);
    expect(draft.get().drawing.openings.map((opening) => [opening.id, opening.at])).toEqual([
      ['w1', feet(4)],
      ['c1', feet(10)],
    ]);
    const narrow = bench(
      withWindow(
        building(
          [
            [0, 0],
            [5, 0],
          ],
          false,
        ),
        'AB',
        1,
        3,
      ),
    );
    narrow.draft.select({ kind: 'opening', id: 'w1' });
    expect(duplicate.enabled(narrow.draft.get())).toBe(false);
  });

  it('turns a run to its other side and leaves its window where it stands', () => {
    const { draft, context } = bench();
    draft.select({ kind: 'run', id: 'AB' });
    turnRun.run(context);
    const run = draft.get().drawing.runs.find((one) => one.id === 'AB');
    expect([run?.from, run?.to]).toEqual(['B', 'A']);
    expect(draft.get().drawing.openings[0]?.at).toBe(feet(13));
  });

  it('offers nothing that changes the drawing while only looking, and never to who may not draw', () => {
    const { draft } = bench(square, { mode: 'view' });
    draft.select({ kind: 'run', id: 'AB' });
    for (const action of [remove, turnRun, undo, redo, snapping, ...toolActions])
      expect([action.id, action.enabled(draft.get())]).toEqual([action.id, false]);
    expect(draw.enabled(draft.get())).toBe(true);
    expect(draw.enabled(bench(square, { role: 'mason' }).draft.get())).toBe(false);
  });

  it('offers the pen’s switch only once a pen has been seen', () => {
    const { draft, context } = bench();
    expect(penDraws.enabled(draft.get())).toBe(false);
    draft.setPen('draws');
    penDraws.run(context);
    expect(draft.get().pen).toBe('asFinger');
  });

  it('lets go step by step: what is drawn, the tool, the selection, editing', () => {
    const { h, draft, context } = bench();
    draft.select({ kind: 'run', id: 'AB' });
    draft.setTool('run');
    h.tap(25, 5).hover(26, 6);
    draft.select({ kind: 'run', id: 'AB' });
    cancel.run(context);
    expect([h.tools.isBusy(), draft.get().tool]).toEqual([false, 'run']);
    cancel.run(context);
    expect([draft.get().tool, draft.get().selection?.id]).toEqual(['select', 'AB']);
    cancel.run(context);
    expect([draft.get().selection, draft.get().mode]).toEqual([null, 'edit']);
    cancel.run(context);
    expect(draft.get().mode).toBe('view');
  });
});

describe('keys', () => {
  it('undo and redo by their usual keys', () => {
    const { draft, key } = bench();
    draft.edit('x', (d) => ({ ...d, units: 'metric' }));
    expect(key('z', { command: true })).toBe(true);
    expect(draft.get().drawing.units).toBe('imperial');
    expect(key('Z', { command: true, shift: true })).toBe(true);
    expect(draft.get().drawing.units).toBe('metric');
  });

  it('nudges by a tape step, and with shift by one unit and its joint', () => {
    const { draft, key } = bench();
    expect(nudgeStep(square, false)).toBe(inches(1 / 16));
    expect(nudgeStep(square, true)).toBe(inches(14.5));
    draft.select({ kind: 'opening', id: 'w1' });
    key('ArrowRight');
    key('ArrowRight', { shift: true });
    key('ArrowUp');
    expect(draft.get().drawing.openings[0]?.at).toBe(feet(4, 14.5 + 1 / 16));
    draft.select({ kind: 'corner', id: 'C' });
    key('ArrowUp');
    expect(draft.get().drawing.corners[2]?.y).toBe(ticks(feet(10) + inches(1 / 16)));
  });

  it('slides a run sideways only, whichever way it was drawn', () => {
    const up = nudge(square, { kind: 'run', id: 'CD' }, { x: 0, y: 1 }, false);
    expect(up.corners.map((corner) => corner.y)).toEqual([0, 0, feet(10, 1 / 16), feet(10, 1 / 16)]);
    expect(nudge(square, { kind: 'run', id: 'CD' }, { x: 1, y: 0 }, false)).toBe(square);
  });

  it('fits and zooms, also while only looking', () => {
    const { key, seen } = bench(square, { mode: 'view' });
    for (const name of ['0', '+', '-']) expect(key(name)).toBe(true);
    expect(seen.fits).toBe(1);
    expect(seen.zooms.map((factor) => factor > 1)).toEqual([true, false]);
    expect(key('ArrowUp')).toBe(false);
    expect(key('q')).toBe(false);
  });

  it('leaves digits, signs and erasing to a length that is being typed', () => {
    const { draft, key, seen } = bench();
    draft.select({ kind: 'opening', id: 'w1' });
    for (const name of ['0', '-', 'Backspace', 'Enter']) expect(key(name, {}, true)).toBe(false);
    expect(seen.fits).toBe(0);
    expect(draft.get().drawing.openings).toHaveLength(1);
    expect(key('Escape', {}, true)).toBe(true);
  });

  it('places by Enter what was typed, and ends by it what was only pointed', () => {
    const { h, draft, key } = bench(building([], false));
    h.tool('run');
    draft.setSnapping(false);
    h.tap(0, 0).hover(5, 0);
    h.tools.holdLength(feet(7));
    expect(key('Enter')).toBe(true);
    expect(h.corners()).toEqual(['A 0,0', 'B 7,0']);
    expect(key('Enter')).toBe(true);
    expect(h.tools.isBusy()).toBe(false);
  });
});
