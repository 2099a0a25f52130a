import type { Ticks } from '../length/ticks';
import type { Reason } from '../reasons';
import type { ThingRef } from '../things';

export type MarkKind = 'course' | 'sill' | 'head' | 'lintelSeat' | 'beamSoffit' | 'beamTop' | 'plate' | 'named';

/** One mark on a pole. Each printed figure is rounded once, from its exact height. */
export interface PoleMark {
  /** Above the high point, exact. */
  readonly height: Ticks;
  readonly course: number | null;
  readonly kinds: readonly MarkKind[];
  /** What the kinds other than `course` belong to. */
  readonly things: readonly ThingRef[];
  /** Up from the level line; down is negative. */
  readonly fromLine: Ticks;
  /** Above the pole's foot. */
  readonly fromFoot: Ticks;
  /** Above the foundation at this pole. */
  readonly aboveFoundation: Ticks;
  readonly printed: { readonly fromLine: Ticks; readonly fromFoot: Ticks; readonly aboveFoundation: Ticks };
}

export interface PoleMarks {
  readonly poleId: string;
  readonly letter: string;
  readonly lift: number;
  /** Height of the foundation at this pole, above the high point: zero or negative. */
  readonly foundation: Ticks;
  /** Heights of the pole's foot and head above the high point. */
  readonly foot: Ticks;
  readonly head: Ticks;
  /** The level line above the high point. */
  readonly levelLine: Ticks;
  /** Highest mark first. */
  readonly marks: readonly PoleMark[];
}

export interface Marks {
  readonly poles: readonly PoleMarks[];
  readonly reasons: readonly Reason[];
}
