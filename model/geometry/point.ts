import type { Ticks } from '../length/ticks';

/** A place on the plan: x right, y up, in ticks. */
export interface PlanPoint {
  readonly x: Ticks;
  readonly y: Ticks;
}

/** A direction or a place between ticks, in floating point; never stored in a drawing. */
export interface Vec {
  readonly x: number;
  readonly y: number;
}
