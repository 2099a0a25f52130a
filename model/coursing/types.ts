import type { Ticks } from '../length/ticks';
import type { Reason } from '../reasons';
import type { ThingRef } from '../things';

/** One course of the whole building; heights above the high point. */
export interface Course {
  /** 1 at the bottom, counted through all lifts. */
  readonly number: number;
  readonly lift: number;
  /** Underside of its units. */
  readonly bottom: Ticks;
  /** Top of its units: the mark. */
  readonly top: Ticks;
  /** Bed joint under it (under the first course: the least bedding). */
  readonly joint: Ticks;
}

/** Equal courses between two heights, one joint for the crew to remember. */
export interface CourseInterval {
  readonly lift: number;
  readonly fromHeight: Ticks;
  readonly toHeight: Ticks;
  readonly count: number;
  /** The joint exactly, in ticks, not rounded: `(toHeight − fromHeight − count × unit) / count` where every course is whole. */
  readonly joint: number;
  readonly firstCourse: number;
  readonly lastCourse: number;
  /** Height of the unit of its last course, where that is a thinner one: `joint` is then what every joint is, the last included. */
  readonly thin?: Ticks;
}

/** What became of one height that the courses had to meet. */
export interface ControlResult {
  readonly thing: ThingRef;
  readonly kind: 'sill' | 'head' | 'bondBeam' | 'plate' | 'named';
  readonly wanted: Ticks;
  /** The course line nearest to it in this answer. */
  readonly got: Ticks;
  /** Got less wanted: positive where the line lies above. */
  readonly miss: Ticks;
  readonly course: number | null;
  readonly hold: 'hard' | 'soft';
  readonly met: boolean;
  /** Nearest heights that courses can meet, when this one is missed. */
  readonly below: Ticks | null;
  readonly above: Ticks | null;
}

/** The masonry between two bond beams. */
export interface Lift {
  readonly number: number;
  /** Height where it starts: 0 (the high point) or the top of the beam below. */
  readonly base: Ticks;
  /** Where it stops: the soffit of the beam above, or the plate. */
  readonly top: Ticks;
  /** The beam that closes it, where its soffit ended up. */
  readonly beam: { readonly id: string; readonly soffit: Ticks; readonly top: Ticks } | null;
  /** Most height allowed by the rule in force. */
  readonly most: Ticks;
  readonly firstCourse: number;
  readonly lastCourse: number;
}

/** A whole answer: joints of each interval, misses, and what it costs. */
export interface CoursingAnswer {
  readonly intervals: readonly CourseInterval[];
  readonly controls: readonly ControlResult[];
  readonly cost: CoursingCost;
}

/**
 * What an answer is judged by, in strict order, the least first: hard heights missed, as many as there are; ticks they
 * are missed by; soft misses, weight × ticks, those beyond the tolerance tenfold; thinner courses; largest step of a
 * joint from the nominal, in ticks; unevenness, the thickest joint less the thinnest, in ticks. Every part is
 * a linear function of the heights, once the counts of courses are chosen.
 */
export type CoursingCost = readonly [
  hardMissed: number,
  hardTicks: number,
  soft: number,
  thin: number,
  step: number,
  spread: number,
];

/**
 * How far the answer is known to be the best. `all`: in every part of its cost. `heights`: no answer misses less or has
 * fewer thinner courses, but the work ran out before its joints were proved. `held`: so of the heights that
 * were held, but the work ran out before the lightest could be.  `none`: no count of courses fits.
 */
export type Proof = 'all' | 'heights' | 'held' | 'none';

export interface Coursing {
  readonly unitHeight: Ticks;
  readonly courses: readonly Course[];
  readonly lifts: readonly Lift[];
  readonly answer: CoursingAnswer;
  /** The next best answers that really differ, best first. */
  readonly others: readonly CoursingAnswer[];
  /** False where the work ran out before every other answer was looked for: there may be more than these. */
  readonly othersComplete?: boolean;
  /** Absent where the courses were not chosen by `planCourses`. */
  readonly proof?: Proof;
  /** Top of the masonry or of the last beam. */
  readonly top: Ticks;
  readonly reasons: readonly Reason[];
}
