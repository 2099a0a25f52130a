import { describe, expect, it } from 'vitest';
import { createDraftStore } from '../../../canvas/store/draftStore';
import { createSolver } from '../../../canvas/store/solver';
import type { Drawing } from '../../../model/drawing/schema';
import { EMPTY_SURVEY } from '../../../model/drawing/surveySchema';
import type { SetOut } from '../../../model/setOut';
import { building, withWindow } from '../helpers';

const square = building([
  [0, 0],
  [20, 0],
  [20, 10],
  [0, 10],
]);

/** A solver over a stand-in solve that only remembers what it was given. */
function bench(cost = 5) {
  let now = 0;
  const pending: { atLeast: number; run: () => void }[] = [];
  const solved: Drawing[] = [];
  const errors: unknown[] = [];
  let broken = false;
  const draft = createDraftStore({ drawing: square, survey: EMPTY_SURVEY, role: 'lead' });
  const solver = createSolver(draft, {
    solve(drawing) {
      now += cost;
      if (broken) throw new Error('broken');
      solved.push(drawing);
      return { reasons: [] } as unknown as SetOut;
    },
    soon(atLeast, run) {
      const item = { atLeast, run };
      pending.push(item);
      return () => pending.splice(pending.indexOf(item), 1);
    },
    now: () => now,
    report: (error) => errors.push(error),
  });
  return {
    draft,
    solver,
    solved,
    errors,
    pending,
    frame() {
      for (const item of pending.splice(0)) item.run();
    },
    breakIt() {
      broken = true;
    },
  };
}

describe('solving as the drawing changes', () => {
  it('solves at once to begin with, then once a frame however often it changed', () => {
    const b = bench();
    expect(b.solved).toEqual([square]);
    b.draft.edit('a', (d) => withWindow(d, 'AB', 2, 2, 'w1'));
    b.draft.edit('b', (d) => withWindow(d, 'AB', 6, 2, 'w2'));
    expect(b.pending).toHaveLength(1);
    b.frame();
    expect(b.solved).toHaveLength(2);
    expect(b.solver.get().solved?.drawing.openings.map((opening) => opening.id)).toEqual(['w1', 'w2']);
  });

  it('is not disturbed by what is only on the screen', () => {
    const b = bench();
    b.draft.select({ kind: 'run', id: 'AB' });
    b.draft.setMode('edit');
    expect(b.pending).toHaveLength(0);
  });

  it('leaves as much time free as the last solving took', () => {
    const b = bench(80);
    b.draft.edit('a', (d) => withWindow(d, 'AB', 2, 2));
    expect(b.pending[0]?.atLeast).toBe(80);
  });

  it('keeps the last good set-out when a change cannot be solved, and says so', () => {
    const b = bench();
    const good = b.solver.get().solved;
    b.breakIt();
    b.draft.edit('a', (d) => withWindow(d, 'AB', 2, 2));
    b.frame();
    expect(b.solver.get()).toEqual({ solved: good, failed: true });
    expect(b.errors).toHaveLength(1);
  });

  it('tells its listeners once for each set-out, and nothing after it stopped', () => {
    const b = bench();
    let told = 0;
    b.solver.subscribe(() => {
      told += 1;
    });
    b.draft.edit('a', (d) => withWindow(d, 'AB', 2, 2));
    b.frame();
    expect(told).toBe(1);
    b.draft.edit('b', (d) => withWindow(d, 'AB', 6, 2, 'w2'));
    b.solver.stop();
    b.frame();
    expect(told).toBe(1);
  });
});
