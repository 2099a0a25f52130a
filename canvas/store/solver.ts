/** Keeps the set-out of what is on the screen: solved again as it changes, at most once a frame, the last good one kept. */
import type { Drawing } from '../../model/drawing/schema';
import type { Survey } from '../../model/drawing/surveySchema';
import type { SetOut } from '../../model/setOut';
import type { DraftStore } from './draftStore';

/** A set-out with the drawing and survey that it is of: a figure must not mix two states. */
export interface Solved {
  readonly drawing: Drawing;
  readonly survey: Survey;
  readonly setOut: SetOut;
}

export interface SolverHost {
  solve(drawing: Drawing, survey: Survey): SetOut;
  /** Runs before the next picture, but not sooner than so many milliseconds; answers how to call it off. */
  soon(atLeast: number, run: () => void): () => void;
  now(): number;
  report(error: unknown): void;
}

export interface SolverState {
  /** Null only where the very first drawing could not be solved. */
  readonly solved: Solved | null;
  /** True where the last change could not be solved and the set-out is from before it. */
  readonly failed: boolean;
}

export interface Solver {
  get(): SolverState;
  subscribe(listener: () => void): () => void;
  stop(): void;
}

export function createSolver(draft: DraftStore, host: SolverHost): Solver {
  const listeners = new Set<() => void>();
  let state: SolverState = { solved: null, failed: false };
  let took = 0;
  let cancel: (() => void) | null = null;

  function solveNow(): void {
    const { drawing, survey } = draft.get();
    if (state.solved?.drawing === drawing && state.solved.survey === survey && !state.failed) return;
    const start = host.now();
    try {
      state = { solved: { drawing, survey, setOut: host.solve(drawing, survey) }, failed: false };
    } catch (error) {
      host.report(error);
      state = { solved: state.solved, failed: true };
    }
    took = host.now() - start;
    for (const listener of [...listeners]) listener();
  }

  solveNow();
  const unsubscribe = draft.api.subscribe((now, before) => {
    if ((now.drawing === before.drawing && now.survey === before.survey) || cancel) return;
    // A building that takes long to solve must not hold up the finger: half the time stays free for it.
    cancel = host.soon(took, () => {
      cancel = null;
      solveNow();
    });
  });

  return {
    get: () => state,
    subscribe(listener) {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
    stop() {
      unsubscribe();
      cancel?.();
      cancel = null;
    },
  };
}
