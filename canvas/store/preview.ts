/** What a tool shows while it works: only on screen, never saved. */
import type { PlanPoint } from '../../model/geometry/point';
import type { Ticks } from '../../model/length/ticks';
import type { PointerKind } from '../input/events';

/** What a point caught, as words under `plan.caught`. */
export type CaughtWord =
  | 'corner'
  | 'close'
  | 'run'
  | 'square'
  | 'angle'
  | 'inLine'
  | 'noCut'
  | 'middle'
  | 'end'
  | 'units'
  | 'opening'
  | 'back';

/** A run being drawn: pale and dashed until it is placed. */
export interface RunPreview {
  readonly from: PlanPoint;
  readonly to: PlanPoint;
  readonly length: Ticks;
  /** Angle to the run it goes on from, in degrees; null where it starts a chain. */
  readonly angle: number | null;
  /** What the length and angle are held at, when typed. */
  readonly heldLength: Ticks | null;
  readonly heldAngle: number | null;
}

export interface Preview {
  readonly run: RunPreview | null;
  /** Corners of a keep-clear so far, and where its next would be. */
  readonly outline: readonly PlanPoint[];
  /** Lines that show what was caught, from the thing caught to the point. */
  readonly guides: readonly (readonly [PlanPoint, PlanPoint])[];
  /** Where the point stands, after snapping. */
  readonly at: PlanPoint | null;
  readonly caught: CaughtWord | null;
  /** The finger or pen that the numbers keep clear of. */
  readonly pointer: PointerKind;
  /** A length that the drag is changing, to ride beside it. */
  readonly length: Ticks | null;
}

export const EMPTY_PREVIEW: Preview = {
  run: null,
  outline: [],
  guides: [],
  at: null,
  caught: null,
  pointer: 'mouse',
  length: null,
};
