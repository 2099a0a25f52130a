import { describe, expect, it } from 'vitest';
import { startAutosave, worse, type LocalDraft } from '../../../canvas/store/autosave';
import { createDraftStore } from '../../../canvas/store/draftStore';
import type { Attempt, SendResult } from '../../../canvas/store/saver';
import type { Role } from '../../../model/contracts/common';
import type { Drawing } from '../../../model/drawing/schema';
import { EMPTY_SURVEY, type Survey } from '../../../model/drawing/surveySchema';
import { feet } from '../../../model/length/ticks';
import { building, withWindow } from '../helpers';

const square = building([
  [0, 0],
  [20, 0],
  [20, 10],
  [0, 10],
]);
const nothingKept: LocalDraft = { drawing: null, survey: null };

function bench(role: Role = 'lead', local: LocalDraft = nothingKept) {
  const draft = createDraftStore({ drawing: square, survey: EMPTY_SURVEY, role });
  const drawings: Attempt<Drawing>[] = [];
  const surveys: Attempt<Survey>[] = [];
  const runs: (() => void)[] = [];
  let answer: SendResult<Drawing> = { kind: 'saved', version: 4 };
  const autosave = startAutosave(
    draft,
    {
      async sendDrawing(attempt) {
        drawings.push(attempt);
        return answer;
      },
      async sendSurvey(attempt) {
        surveys.push(attempt);
        return { kind: 'saved', version: 8 };
      },
      keepDrawing: async () => undefined,
      keepSurvey: async () => undefined,
      later(_, run) {
        runs.push(run);
        return () => runs.splice(runs.indexOf(run), 1);
      },
      newWriteId: () => `w${drawings.length + surveys.length}`,
    },
    { drawing: 3, survey: 7 },
    local,
  );
  async function pass() {
    for (const run of runs.splice(0)) run();
    for (let i = 0; i < 6; i += 1) await Promise.resolve();
  }
  return {
    draft,
    autosave,
    drawings,
    surveys,
    pass,
    answerWith(result: SendResult<Drawing>) {
      answer = result;
    },
  };
}

describe('saving a draft', () => {
  it('saves the drawing and the survey apart, each on its own version', async () => {
    const b = bench();
    b.draft.edit('add', (d) => withWindow(d, 'AB', 2, 3));
    b.draft.editSurvey(() => ({
      ...EMPTY_SURVEY,
      readings: [{ id: 'r', station: { kind: 'corner', cornerId: 'A' }, down: feet(4) }],
    }));
    await b.pass();
    expect(b.drawings.map((sent) => [sent.baseVersion, sent.value.openings.length])).toEqual([[3, 1]]);
    expect(b.surveys.map((sent) => [sent.baseVersion, sent.value.readings.length])).toEqual([[7, 1]]);
    expect(b.autosave.versions()).toEqual({ drawing: 4, survey: 8 });
    expect(b.draft.get().drawingSave).toBe('saved');
  });

  it('sends nothing of a gesture until it ends, and nothing at all of one that is cancelled', async () => {
    const b = bench();
    b.draft.begin('add');
    b.draft.update((d) => withWindow(d, 'AB', 2, 3));
    await b.pass();
    expect(b.drawings).toEqual([]);
    b.draft.cancel();
    await b.pass();
    expect(b.drawings).toEqual([]);
    b.draft.begin('add');
    b.draft.update((d) => withWindow(d, 'AB', 4, 3));
    b.draft.commit();
    await b.pass();
    expect(b.drawings.map((sent) => sent.value.openings[0]?.at)).toEqual([feet(4)]);
  });

  it('shows both versions of a clash and saves mine over theirs when chosen', async () => {
    const b = bench();
    const theirs = withWindow(square, 'CD', 5, 2, 'w9');
    b.answerWith({ kind: 'stale', theirs, version: 6, by: 'Ana', at: '2026-01-01T00:00:00Z' });
    b.draft.edit('add', (d) => withWindow(d, 'AB', 2, 3));
    await b.pass();
    const [clash] = b.draft.get().conflicts;
    expect(clash?.part === 'drawing' && clash.conflict.theirs).toBe(theirs);
    expect(b.draft.get().drawingSave).toBe('conflict');
    b.answerWith({ kind: 'saved', version: 7 });
    b.autosave.resolve('drawing', 'mine');
    await b.pass();
    expect(b.drawings[1]?.baseVersion).toBe(6);
    expect(b.drawings[1]?.value.openings[0]?.id).toBe('w1');
    expect(b.draft.get().conflicts).toEqual([]);
  });

  it('puts theirs on the screen when chosen', async () => {
    const b = bench();
    const theirs = withWindow(square, 'CD', 5, 2, 'w9');
    b.answerWith({ kind: 'stale', theirs, version: 6, by: null, at: '2026-01-01T00:00:00Z' });
    b.draft.edit('add', (d) => withWindow(d, 'AB', 2, 3));
    await b.pass();
    b.autosave.resolve('drawing', 'theirs');
    await b.pass();
    expect(b.draft.get().drawing).toBe(theirs);
    expect(b.drawings).toHaveLength(1);
    b.draft.undo();
    expect(b.draft.get().drawing).toBe(theirs);
  });

  it('puts what the device kept on the screen and sends it from the version it was made from', async () => {
    const kept = withWindow(square, 'AB', 6, 2);
    const b = bench('lead', { drawing: { value: kept, baseVersion: 2, attempt: null }, survey: null });
    expect(b.draft.get().drawing).toBe(kept);
    await b.pass();
    expect(b.drawings.map((sent) => [sent.baseVersion, sent.value])).toEqual([[2, kept]]);
  });

  it('saves a mason’s readings and never a drawing', async () => {
    const kept = withWindow(square, 'AB', 6, 2);
    const b = bench('mason', { drawing: { value: kept, baseVersion: 2, attempt: null }, survey: null });
    b.draft.editSurvey(() => ({
      ...EMPTY_SURVEY,
      readings: [{ id: 'r', station: { kind: 'corner', cornerId: 'A' }, down: feet(4) }],
    }));
    await b.pass();
    expect(b.drawings).toEqual([]);
    expect(b.surveys).toHaveLength(1);
    expect(b.draft.get().drawing).toBe(square);
  });

  it('says the worse of two states', () => {
    expect(worse('saved', 'offline')).toBe('offline');
    expect(worse('conflict', 'saving')).toBe('conflict');
    expect(worse('saved', 'saved')).toBe('saved');
  });
});
