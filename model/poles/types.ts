import type { PlanPoint } from '../geometry/point';
import type { Ticks } from '../length/ticks';
import type { Reason } from '../reasons';
import type { ThingRef } from '../things';

/** A tape distance from a named corner to a brace's foot. */
export interface Tie {
  readonly cornerId: string;
  readonly distance: Ticks;
}

export interface Brace {
  /** `<poleId>.1` or `<poleId>.2`. */
  readonly id: string;
  readonly poleId: string;
  readonly foot: PlanPoint;
  /** Degrees, counter-clockwise from +x, from the pole to the foot. */
  readonly bearing: number;
  /** Plan distance from pole to foot. */
  readonly reach: Ticks;
  /** Height of its fixing above the pole's foot. */
  readonly fixing: Ticks;
  readonly leg: Ticks;
  /** Angle above the ground, in degrees. */
  readonly slope: number;
  /** The run it is in line with, and how far it was turned away from that, in degrees (0 is best). */
  readonly inLineWith: string;
  readonly turned: number;
  /** What made it turn, when it did. */
  readonly turnedFor: ThingRef | null;
  /** Ways through that it passes over with head room. */
  readonly over: readonly ThingRef[];
  readonly ties: readonly Tie[];
}

export interface StoryPole {
  /** The corner's id, or `<runId>@<ticks>` for a pole along a run. */
  readonly id: string;
  readonly letter: string;
  readonly cornerId: string | null;
  /** Where the lines it carries cross: the corner of the outside faces. */
  readonly corner: PlanPoint;
  /** Heel of the angle in plan. */
  readonly at: PlanPoint;
  /** The angle's section in plan: an L, counter-clockwise. */
  readonly section: readonly PlanPoint[];
  /** Set off along a wall line, clear of a frame. */
  readonly setOff: { readonly runId: string; readonly by: Ticks; readonly for: ThingRef } | null;
  readonly runIds: readonly string[];
  readonly braces: readonly Brace[];
}

export interface PoleSet {
  readonly poles: readonly StoryPole[];
  readonly poleById: ReadonlyMap<string, StoryPole>;
  /** Total cost of the braces as placed; lower is better. */
  readonly cost: number;
  /**
   * How far at most the cost is above the least there is: 0 where it is exact. A pole left without braces counts with a
   * million, so a gap as large says that one more might be braced.
   */
  readonly gap?: number;
  /** Groups of poles whose braces can touch one another, solved apart. */
  readonly neighbourhoods: readonly (readonly string[])[];
  /** False where the counted bound of the search was reached. */
  readonly exact: boolean;
  readonly reasons: readonly Reason[];
}
