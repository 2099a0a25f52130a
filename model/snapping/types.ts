import type { PlanPoint, Vec } from '../geometry/point';
import type { Ticks } from '../length/ticks';
import type { ThingRef } from '../things';

export type CaughtKind =
  'corner' | 'close' | 'onRun' | 'rightAngle' | 'angle15' | 'alignX' | 'alignY' | 'module' | 'point';

/** One thing that a point caught. */
export interface CaughtThing {
  readonly kind: CaughtKind;
  /** From what was caught to the point. */
  readonly guide?: readonly [PlanPoint, PlanPoint];
  readonly thing?: ThingRef;
  /** On a run: how far along its outside face from its first corner. */
  readonly at?: Ticks;
}

export interface Snap {
  readonly point: PlanPoint;
  readonly caught: readonly CaughtThing[];
  /** From the anchor, where there is one. */
  readonly length?: Ticks;
  /** Bearing from the anchor in degrees counter-clockwise from +x, where there is one and the point is off it. */
  readonly angle?: number;
}

export interface SnapOptions {
  /** Off: the point is only rounded to the tick. */
  readonly on: boolean;
  /** Square to and in line with the runs at the anchor and the axes of the plan; and every 15°, less strongly. */
  readonly rightAngles: boolean;
  /** Over, under or beside other corners. */
  readonly alignment: boolean;
  /** Corners and runs that are there. */
  readonly points: boolean;
  /** Lengths that need no cutting. */
  readonly module: boolean;
}

export const SNAP_ALL: SnapOptions = { on: true, rightAngles: true, alignment: true, points: true, module: true };

/** Where the point is held from: the corner that a run starts at, or a neighbour of the corner being moved. */
export interface SnapAnchor {
  readonly point: PlanPoint;
  /** Directions of the runs at the anchor, besides the one being drawn or moved. */
  readonly along?: readonly Vec[];
}

/** Run lengths near one, that need no cutting. */
export type GoodLengths = (near: Ticks) => readonly Ticks[];
