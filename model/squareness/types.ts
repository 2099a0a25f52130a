import type { PlanPoint } from '../geometry/point';
import type { Ticks } from '../length/ticks';

/** A corner as drawn. */
export interface DrawnCorner {
  readonly id: string;
  readonly at: PlanPoint;
}

/** A side or a diagonal as taped, between two of the corners. */
export interface Taped {
  readonly id: string;
  readonly from: string;
  readonly to: string;
  readonly length: Ticks;
}

/** How one corner must move, in the drawing's directions. */
export interface CornerMove {
  readonly cornerId: string;
  readonly x: Ticks;
  readonly y: Ticks;
  readonly distance: Ticks;
}

export interface TapedResult {
  readonly id: string;
  /** Drawn length; taped less drawn. */
  readonly drawn: Ticks;
  readonly off: Ticks;
  /** What least squares gives this length, less what was taped. */
  readonly residual: Ticks;
  /** Part of its own error that shows in its residual, 0 to 1: 0 where nothing else checks it. */
  readonly checked: number;
  /** Residual for its standard deviation, when the tape reads to `accuracy`; 0 where nothing checks it. */
  readonly normalised: number;
}

/** What taped sides and diagonals say of the corners as they stand. */
export interface Squareness {
  readonly taped: readonly TapedResult[];
  /** Measurements over those that the shape needs; below zero where there are too few. */
  readonly spare: number;
  /** Whether the measurements fix the shape. */
  readonly fixed: boolean;
  /** The greatest difference between a taped length and its drawn one, and whether the rule allows it. */
  readonly worst: Ticks;
  readonly within: boolean;
  /** Moves of all corners that make the drawing's shape with the least sum of squares. */
  readonly moves: readonly CornerMove[];
  /** The one corner that, moved alone, leaves the others least out; null where no shape is fixed. */
  readonly single: (CornerMove & { /** Farthest that another corner stays out. */ readonly left: Ticks }) | null;
  /**
   * Measurements of which one looks misread, with how much too long it would be: the largest normalised residual, where it
   * passes the limit. Several where they are as likely as each other (one spare measurement can't tell which).
   */
  readonly misread: readonly { readonly id: string; readonly by: Ticks }[];
}
