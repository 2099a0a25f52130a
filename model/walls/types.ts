import type { PlanPoint, Vec } from '../geometry/point';
import type { Ticks } from '../length/ticks';
import type { Reason } from '../reasons';

/** How a run ends: at a plain corner of two runs, free, at a tee (as its stem, or as one half of the bar), or in line with the next run. */
export type EndKind = 'outside' | 'reentrant' | 'free' | 'teeStem' | 'teeBar' | 'straight' | 'cross';

export interface RunEnd {
  readonly cornerId: string;
  readonly kind: EndKind;
  /** Runs that meet this one here. */
  readonly others: readonly string[];
}

/** One run as built: its faces, mitred at the corners, and its lengths. */
export interface RunGeometry {
  readonly runId: string;
  /** Letters of its corners: `A–B`. */
  readonly name: string;
  readonly wallTypeId: string;
  readonly thickness: Ticks;
  readonly direction: Vec;
  /** Unit normal into the wall's body: to the left from first corner to second. */
  readonly inward: Vec;
  readonly start: PlanPoint;
  readonly end: PlanPoint;
  /** Along the outside face, corner to corner. */
  readonly length: Ticks;
  readonly insideLength: Ticks;
  readonly centreLength: Ticks;
  /** Outside face from first corner to second, and inside face beside it, mitred with their neighbours. */
  readonly outside: readonly [PlanPoint, PlanPoint];
  readonly inside: readonly [PlanPoint, PlanPoint];
  /** The body in plan, counter-clockwise. */
  readonly body: readonly PlanPoint[];
  readonly ends: readonly [RunEnd, RunEnd];
}

export type CornerKind = 'outside' | 'reentrant' | 'free' | 'tee' | 'straight' | 'cross' | 'alone';

export interface CornerGeometry {
  readonly cornerId: string;
  readonly letter: string;
  readonly at: PlanPoint;
  readonly kind: CornerKind;
  /** Runs that meet here, counter-clockwise by bearing away from the corner. */
  readonly runIds: readonly string[];
  /** Angle between the outside faces through the body, in degrees; null unless two runs meet. */
  readonly angle: number | null;
}

/** A closed loop of runs. */
export interface Footprint {
  readonly cornerIds: readonly string[];
  readonly runIds: readonly string[];
  /** Outside and inside area in square ticks, by the outside faces' polygon and by the inside's. */
  readonly areaOutside: number;
  readonly areaInside: number;
  readonly perimeter: Ticks;
  /** Drawn so that the body lies inside its line. */
  readonly bodyInside: boolean;
}

export interface Diagonal {
  readonly from: string;
  readonly to: string;
  readonly length: Ticks;
}

/** Running dimensions along a run's outside face, from its first corner: jambs and end. */
export interface RunningDimension {
  readonly runId: string;
  readonly at: Ticks;
  readonly what: 'jamb' | 'end';
  readonly openingId: string | null;
}

export interface Walls {
  readonly runs: readonly RunGeometry[];
  readonly runById: ReadonlyMap<string, RunGeometry>;
  readonly corners: readonly CornerGeometry[];
  readonly cornerById: ReadonlyMap<string, CornerGeometry>;
  readonly footprints: readonly Footprint[];
  readonly diagonals: readonly Diagonal[];
  readonly running: readonly RunningDimension[];
  /** Openings that stand rightly on their run, by run, in order along it; the others have a reason. */
  readonly openingsByRun: ReadonlyMap<string, readonly string[]>;
  readonly perimeter: Ticks;
  readonly reasons: readonly Reason[];
}
