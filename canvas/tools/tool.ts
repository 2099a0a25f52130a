/** What every drawing tool is: a small state chart fed with events, that changes the draft and says what to show. */
import type { PlanPoint, Vec } from '../../model/geometry/point';
import type { SnapAnchor } from '../../model/snapping/types';
import type { Ticks } from '../../model/length/ticks';
import type { ThingRef } from '../../model/things';
import type { InputEvent, PointerKind } from '../input/events';
import type { DraftStore } from '../store/draftStore';
import type { CaughtWord } from '../store/preview';

/** What a point caught, and how to show it. */
export interface Caught {
  readonly at: PlanPoint;
  /** A corner to join to. */
  readonly cornerId: string | null;
  /** A run to join to as a tee, and how far along it. */
  readonly onRun: { readonly runId: string; readonly at: Ticks } | null;
  readonly guides: readonly (readonly [PlanPoint, PlanPoint])[];
  /** A dictionary key under `plan.caught`; null when it caught nothing. */
  readonly word: CaughtWord | null;
}

export interface CatchOptions {
  /** Ticks that the pointer reaches. */
  readonly reach: number;
  /** Off: the point only falls on the tape's step. */
  readonly snapping: boolean;
  /** Where the run being drawn is held from, with the runs that are there already. */
  readonly from: SnapAnchor | null;
  /** Neighbours of a corner being moved. */
  readonly also?: readonly SnapAnchor[];
  /** Corners and runs that move with the point and so catch nothing. */
  readonly without?: ReadonlySet<string>;
  /** A corner that would close the chain being drawn. */
  readonly closes?: string;
  /** Points that catch besides corners: the first of an outline. */
  readonly points?: readonly PlanPoint[];
}

/** Where an opening's near jamb stops along its run, or a run that is slid sideways. */
export interface CaughtAlong {
  readonly at: Ticks;
  readonly word: CaughtWord | null;
}

/** What a tool may ask of the world. */
export interface ToolHost {
  readonly draft: DraftStore;
  /** Ticks that a pointer of this kind reaches, as the plan is seen now. */
  reach(pointer: PointerKind): number;
  hit(at: Vec, reach: number): ThingRef | null;
  catchPoint(at: Vec, options: CatchOptions): Caught;
  catchOpening(of: {
    readonly runId: string;
    readonly raw: number;
    readonly width: Ticks;
    readonly reach: number;
    readonly snapping: boolean;
    readonly openingId: string;
  }): CaughtAlong;
  /** A run slid sideways by so much, to the side of its body. */
  catchSlide(of: {
    readonly runId: string;
    readonly raw: number;
    readonly reach: number;
    readonly snapping: boolean;
  }): CaughtAlong;
  newId(): string;
}

export interface Tool {
  /** `pan`: this drag began on nothing and should move the paper. */
  handle(event: InputEvent): 'keep' | 'pan';
  /** The tool is laid down: nothing of it may stay on the screen. */
  leave(): void;
  /** Ends what is being drawn where it stands: Done, a double tap, or the key for it. True when there was something to end. */
  finish(): boolean;
  /** Takes back the last point of what is being drawn; false when there is none, so that the drawing's own undo runs. */
  stepBack(): boolean;
  /** The drawing changed under the tool: by undo, or by another's version. */
  refresh?(): void;
  /** Name of the chart's state, for tests and for what the screen says. */
  stateName(): string;
}

/** The tool for runs takes exact numbers while a run is being drawn. */
export interface RunTool extends Tool {
  holdLength(length: Ticks | null): void;
  /** Degrees to the run before; null for any. */
  holdAngle(degrees: number | null): void;
  /** Places the corner where the preview stands. */
  place(): boolean;
}
