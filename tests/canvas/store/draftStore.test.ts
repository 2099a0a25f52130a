import { describe, expect, it } from 'vitest';
import { createDraftStore, FIELDS } from '../../../canvas/store/draftStore';
import { entryBetween } from '../../../canvas/store/history';
import { EMPTY_SURVEY } from '../../../model/drawing/surveySchema';
import type { Drawing } from '../../../model/drawing/schema';
import { feet } from '../../../model/length/ticks';
import { building, withWindow } from '../helpers';

const square = building([
  [0, 0],
  [20, 0],
  [20, 10],
  [0, 10],
]);

function store(drawing: Drawing = square, role: 'lead' | 'mason' | 'observer' = 'lead') {
  return createDraftStore({ drawing, survey: EMPTY_SURVEY, role });
}

function moveCorner(drawing: Drawing, id: string, x: number): Drawing {
  return {
    ...drawing,
    corners: drawing.corners.map((corner) => (corner.id === id ? { ...corner, x: feet(x) } : corner)),
  };
}

const without = (drawing: Drawing, runId: string): Drawing => ({
  ...drawing,
  runs: drawing.runs.filter((run) => run.id !== runId),
});

describe('a step of history', () => {
  it('holds only the item that changed', () => {
    const entry = entryBetween(square, moveCorner(square, 'B', 24), 'x');
    expect(entry?.patches.map((patch) => patch.path)).toEqual([['corners', 1]]);
    expect(entry?.inverse.map((patch) => patch.path)).toEqual([['corners', 1]]);
  });

  it('is nothing when nothing changed', () => {
    expect(entryBetween(square, square, 'x')).toBe(null);
    expect(entryBetween(square, { ...square }, 'x')).toBe(null);
  });

  it('adds and removes in a list, and replaces a plain field', () => {
    const grown = withWindow(square, 'AB', 2, 3);
    const added = entryBetween(square, { ...square, openings: grown.openings }, 'x');
    expect(added?.patches).toHaveLength(1);
    const units = entryBetween(square, { ...square, units: 'metric' }, 'x');
    expect(units?.patches).toEqual([{ op: 'replace', path: ['units'], value: 'metric' }]);
  });
});

describe('the draft on the screen', () => {
  it('undoes and redoes to exactly what was', () => {
    const s = store();
    s.edit('move', (d) => moveCorner(d, 'B', 24));
    s.edit('remove', (d) => without(d, 'BC'));
    const after = s.get().drawing;
    s.undo();
    s.undo();
    expect(s.get().drawing).toEqual(square);
    s.undo();
    s.redo();
    s.redo();
    expect(s.get().drawing).toEqual(after);
    s.redo();
    expect(s.get().drawing).toEqual(after);
  });

  it('makes one undo step of one gesture, worked out each time from where it began', () => {
    const s = store();
    s.begin('move');
    for (const x of [21, 25, 23]) s.update((d) => moveCorner(d, 'B', x));
    expect(s.get().drawing.corners[1]?.x).toBe(feet(23));
    s.commit();
    expect(s.get().history.past.map((entry) => entry.label)).toEqual(['move']);
    s.undo();
    expect(s.get().drawing).toEqual(square);
  });

  it('leaves no step and no change behind a cancelled gesture', () => {
    const s = store();
    s.begin('move');
    s.update((d) => moveCorner(d, 'B', 25));
    s.cancel();
    expect(s.get().drawing).toBe(square);
    expect(s.get().history.past).toEqual([]);
    expect(s.get().gesture).toBe(null);
  });

  it('leaves no step behind a gesture that ended where it began', () => {
    const s = store();
    s.begin('move');
    s.update((d) => moveCorner(d, 'B', 25));
    s.update((d) => d);
    s.commit();
    expect(s.get().history.past).toEqual([]);
  });

  it('takes back a gesture under way when undo is asked for in the middle of it', () => {
    const s = store();
    s.edit('first', (d) => moveCorner(d, 'B', 24));
    s.begin('second');
    s.update((d) => moveCorner(d, 'B', 30));
    s.undo();
    expect(s.get().drawing).toEqual(square);
    expect(s.get().history.future.map((entry) => entry.label)).toEqual(['first']);
  });

  it('forgets what could be redone once something else is done', () => {
    const s = store();
    s.edit('one', (d) => moveCorner(d, 'B', 24));
    s.undo();
    s.edit('two', (d) => moveCorner(d, 'B', 28));
    s.redo();
    expect(s.get().drawing.corners[1]?.x).toBe(feet(28));
  });

  it('lets go of a selected thing that an undo takes away', () => {
    const s = store();
    s.edit('add', (d) => withWindow(d, 'AB', 2, 3));
    s.select({ kind: 'opening', id: 'w1' });
    expect(s.get().openRunId).toBe('AB');
    s.undo();
    expect(s.get().selection).toBe(null);
  });

  it('opens the wall and the pole that belong to what is selected', () => {
    const s = store();
    s.select({ kind: 'corner', id: 'C' });
    expect([s.get().openRunId, s.get().openPoleId]).toEqual(['CD', 'C']);
    s.select({ kind: 'run', id: 'AB' });
    expect([s.get().openRunId, s.get().openPoleId]).toEqual(['AB', 'C']);
    s.select({ kind: 'run', id: 'nowhere' });
    expect(s.get().selection).toBe(null);
  });

  it('lets who may not draw change nothing, and a mason change readings', () => {
    const s = store(square, 'mason');
    s.edit('move', (d) => moveCorner(d, 'B', 24));
    s.begin('move');
    s.update((d) => moveCorner(d, 'B', 24));
    s.commit();
    s.setMode('edit');
    expect(s.get().drawing).toBe(square);
    expect(s.get().mode).toBe('view');
    const reading = { id: 'r', station: { kind: 'corner' as const, cornerId: 'A' }, down: feet(4) };
    s.editSurvey(() => ({ ...EMPTY_SURVEY, readings: [reading] }));
    expect(s.get().survey.readings).toEqual([reading]);
    const o = store(square, 'observer');
    o.editSurvey(() => ({ ...EMPTY_SURVEY, readings: [reading] }));
    expect(o.get().survey).toBe(EMPTY_SURVEY);
  });

  it('takes up the wall tool to draw where nothing stands yet, and the hand that moves where something does', () => {
    const empty = store({ ...square, corners: [], runs: [] });
    empty.setMode('edit');
    expect(empty.get().tool).toBe('run');
    const begun = store();
    begun.setMode('edit');
    expect(begun.get().tool).toBe('select');
  });

  it('says of every field whether it is undone and where it is kept, and undoes only the drawing', () => {
    expect(Object.keys(FIELDS).sort()).toEqual(Object.keys(store().get()).sort());
    const undoable = Object.entries(FIELDS).filter(([, field]) => field.undoable);
    expect(undoable.map(([name]) => name)).toEqual(['drawing']);
  });
});
