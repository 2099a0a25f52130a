import type { Ticks } from '../length/ticks';
import type { Reason } from '../reasons';

/** `unit`: whole, along the run. `closer`: cut. `return`: a whole unit of the crossing run seen end on at a corner. */
export interface Piece {
  readonly kind: 'unit' | 'closer' | 'return';
  /** Along the run's outside face from its first corner. */
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
  /** Nearest run lengths, this one included, that need no cutting. */
  readonly noCut: { readonly below: Ticks | null; readonly above: Ticks | null };
  readonly closersPerCoursePair: number;
  /** Smallest lap found between neighbouring courses. */
  readonly lap: Ticks;
}

export interface Bond {
  readonly runs: readonly RunBond[];
  readonly byRun: ReadonlyMap<string, RunBond>;
  readonly reasons: readonly Reason[];
}
