import type { Piece } from '../bond/types';
import type { Ticks } from '../length/ticks';

/** One run's share of a course. */
export interface CourseRun {
  readonly runId: string;
  /** As in the bond: along the run's outside face from its first corner. */
  readonly pieces: readonly Piece[];
  readonly whole: number;
  readonly closers: number;
  /** Openings and lintels that stand in this course, in order along the run. */
  readonly gaps: readonly CourseGap[];
}

export interface CourseGap {
  readonly openingId: string;
  readonly what: 'opening' | 'lintel';
  /** Along the run: the jambs, or the ends of the lintel. */
  readonly from: Ticks;
  readonly to: Ticks;
}

/** Where the line is set at one pole: the mark of this course's top, as the pole has it. */
export interface LineSetting {
  readonly poleId: string;
  readonly letter: string;
  /** Up from the level line; down is negative. Exact, and as printed on the tape. */
  readonly fromLine: Ticks;
  /** Up from the pole's foot. */
  readonly fromFoot: Ticks;
  readonly printed: { readonly fromLine: Ticks; readonly fromFoot: Ticks };
  /** The mark lies above the pole's head, so that no line can be set there. */
  readonly beyondHead: boolean;
}

/** Closers of one length for one wall type: what to cut before the line goes up. */
export interface CourseCut {
  readonly wallTypeId: string;
  readonly length: Ticks;
  readonly count: number;
  readonly runIds: readonly string[];
}

/**
 * What is not as in the course below. `bedJoint` and `unitHeight` carry both values; `newLift` says that the course is
 * laid on a bond beam. An opening starts where it stands in this course and not in the one below. `cornerTurns`:
 * another run goes through at the corner than below. `pieces`: the run is laid otherwise than in the last course of
 * the same parity, two below; the plain alternation of two courses is no such change.
 */
export type CourseChange =
  | { readonly what: 'bedJoint' | 'unitHeight'; readonly from: Ticks; readonly to: Ticks }
  | { readonly what: 'newLift'; readonly beamId: string | null }
  | {
      readonly what: 'openingStarts' | 'openingEnds' | 'lintelStarts' | 'lintelEnds';
      readonly openingId: string;
      readonly runId: string;
    }
  | { readonly what: 'cornerTurns'; readonly cornerId: string; readonly runId: string }
  | { readonly what: 'pieces'; readonly runId: string };

/** One course of the whole building, as the crew comes to it. */
export interface CourseWalk {
  /** 1 at the bottom. */
  readonly course: number;
  readonly lift: number;
  /** Heights above the high point, and the bed joint under the course (the least bedding under the first). */
  readonly bottom: Ticks;
  readonly top: Ticks;
  readonly joint: Ticks;
  readonly runs: readonly CourseRun[];
  /** In the order of the poles. */
  readonly lines: readonly LineSetting[];
  /** Longest first within a wall type, wall types in the order of the drawing. */
  readonly cuts: readonly CourseCut[];
  /** Whole units to have beside the wall for the closers, offcuts of this course reused with the kerf lost. */
  readonly cutFrom: number;
  readonly changes: readonly CourseChange[];
}
