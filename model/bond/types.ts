import type { Ticks } from '../length/ticks';
import type { Reason } from '../reasons';

/**
 * `unit`: whole, along the run. `closer`: cut. `return`: a whole unit of the crossing run seen end on at a corner, or the
 * part of a unit that the next run in line lays over their common corner; it is counted with that other run.
 */
export interface Piece {
  readonly kind: 'unit' | 'closer' | 'return';
  /**
   * Along the run's outside face from its first corner. At a reentrant corner a course that goes through starts before 0
   * or ends past the run's length by the other wall's thickness, unseen from outside; a unit laid over the corner of two
   * runs in line does so by its part beyond. A drawing of the face clips to the run.
   */
  readonly start: Ticks;
  readonly end: Ticks;
}

/** One course's pieces, in order; courses alike share one pattern. */
export interface BondPattern {
  readonly pieces: readonly Piece[];
}

export interface RunBond {
  readonly runId: string;
  readonly patterns: readonly BondPattern[];
  /** Index into `patterns` for each course, first course at 0. */
  readonly patternByCourse: readonly number[];
  /**
   * Nearest run lengths, this one included, that need no cutting, with its corners turned either way. The closer that a
   * free end or a stem takes in alternate courses at any length is not counted.
   */
  readonly noCut: { readonly below: Ticks | null; readonly above: Ticks | null };
  /** Closers in the first two courses. */
  readonly closersPerCoursePair: number;
  /** Smallest lap found between neighbouring courses; 0 for a straight joint, a whole unit where no joint faces another. */
  readonly lap: Ticks;
}

export interface Bond {
  readonly runs: readonly RunBond[];
  readonly byRun: ReadonlyMap<string, RunBond>;
  readonly reasons: readonly Reason[];
}
