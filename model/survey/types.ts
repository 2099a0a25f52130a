import type { PlanPoint } from '../geometry/point';
import type { Ticks } from '../length/ticks';
import type { Station } from '../drawing/surveySchema';
import type { Reason } from '../reasons';
import type { LevelBook } from './levelBook';

export interface GroundStation {
  readonly readingId: string;
  readonly station: Station;
  readonly at: PlanPoint;
  readonly down: Ticks;
  /** Above the high point: zero there, negative elsewhere. */
  readonly height: Ticks;
  readonly bedding: Ticks;
  /** How much the bedding is over its most; 0 when within. */
  readonly over: Ticks;
  /** What was read here before, first to last, as far down from the level line: kept, but not in force. */
  readonly earlier: readonly { readonly readingId: string; readonly down: Ticks }[];
  /** Between the largest and smallest of all the readings here; 0 for one. */
  readonly spread: Ticks;
}

export interface ProfilePoint {
  /** Along the run's outside face from its first corner. */
  readonly at: Ticks;
  /** Above the high point: zero or negative. */
  readonly height: Ticks;
}

/** The foundation: heights are above its high point, which is height zero for everything else. */
export interface Ground {
  /** True where no reading was taken: the foundation is taken as level. */
  readonly assumed: boolean;
  /** The level line above the high point. */
  readonly levelLine: Ticks;
  readonly highPoint: GroundStation | null;
  readonly range: Ticks;
  readonly stations: readonly GroundStation[];
  readonly profileByRun: ReadonlyMap<string, readonly ProfilePoint[]>;
  /** Height of the foundation at each corner, read or interpolated. */
  readonly heightByCorner: ReadonlyMap<string, Ticks>;
  readonly leastBedding: Ticks;
  readonly firstCourseTop: Ticks;
  /** The rod readings worked out; null where the foundation was measured down. */
  readonly book: LevelBook | null;
  readonly reasons: readonly Reason[];
}
