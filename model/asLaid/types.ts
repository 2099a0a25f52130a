import type { Ticks } from '../length/ticks';
import type { RuleId } from '../rules/ids';
import type { ThingRef } from '../things';

/** Where on the walls a check was made: along a run's outside face from its first corner. */
export interface LaidPlace {
  readonly runId: string;
  readonly at: Ticks;
}

/** Height of a course's top as laid, above the high point (level line − measure-down). */
export interface LaidHeight extends LaidPlace {
  readonly id: string;
  readonly course: number;
  readonly height: Ticks;
}

/** How far the wall leans from one height to another, outwards positive; taken lift by lift. */
export interface LaidPlumb extends LaidPlace {
  readonly id: string;
  readonly from: Ticks;
  readonly to: Ticks;
  readonly lean: Ticks;
}

/** Thickness of the bed joint under a course; under the first, its bedding. */
export interface LaidJoint extends LaidPlace {
  readonly id: string;
  readonly course: number;
  readonly thickness: Ticks;
}

/** Readings of the work as laid, in the order in which they were logged: of two alike the last counts. */
export interface LaidLog {
  readonly heights: readonly LaidHeight[];
  readonly plumbs: readonly LaidPlumb[];
  readonly joints: readonly LaidJoint[];
}

/** Whose tolerances are held: `tms` (TMS 602) or `labc` (LABC Technical Manual, for level and joints). */
export type ToleranceSet = 'tms' | 'labc';

export interface LaidFinding {
  /**
   * `height`: a course off its planned height. `level`: out of level between two readings of a course on one run.
   * `plumb`: leaning within one lift. `liftBase`: leaning from the foundation to a lift's base or top, lift on lift.
   * `joint`: off the planned joint. `firstJoint`: bedding outside its limits. `jointFromMean`: off the mean of eight.
   */
  readonly kind: 'height' | 'level' | 'plumb' | 'liftBase' | 'joint' | 'firstJoint' | 'jointFromMean';
  /** The readings it is made of. */
  readonly readingIds: readonly string[];
  readonly place: LaidPlace;
  readonly rule: RuleId;
  /** How far off: up, outwards or thicker positive; a first joint's from the limit that it passes. */
  readonly off: Ticks;
  /** How far off is allowed, either way; a first joint's limit. */
  readonly allowed: Ticks;
  /** Beyond what is allowed; 0 when within. */
  readonly over: Ticks;
}

/** How the work at one place comes back to its planned heights. */
export interface BackToPlan {
  readonly place: LaidPlace;
  /** The last course read there, and how far its top is above (positive) or below its planned height. */
  readonly course: number;
  readonly drift: Ticks;
  /** The next height that the courses must meet in this lift. */
  readonly control: { readonly thing: ThingRef | null; readonly course: number; readonly height: Ticks } | null;
  /**
   * Equal joints that reach the control height, exact in ticks, and whether the wall type's limits allow them; null where
   * there is no control height above, or none of its courses is left to lay.
   */
  readonly joint: { readonly exact: number; readonly count: number; readonly within: boolean } | null;
  /** The first planned course line that can be met again inside the limits; null where none of the lift's can. */
  readonly first: { readonly course: number; readonly height: Ticks; readonly joint: number } | null;
  /** The nearest to the control height that the courses left can reach inside the limits; null without one. */
  readonly nearest: Ticks | null;
}

export interface AsLaid {
  readonly findings: readonly LaidFinding[];
  readonly back: readonly BackToPlan[];
  /** Readings of courses that are not planned, or places that are not drawn. */
  readonly ignored: readonly string[];
}
