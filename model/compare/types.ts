import type { Ticks } from '../length/ticks';
import type { ThingRef } from '../things';

/** One change in the trade's words: a code with its figures, worded by the reader's language. */
export interface Change {
  readonly code:
    | 'runAdded'
    | 'runRemoved'
    | 'runLength'
    | 'runTurned'
    | 'cornerMoved'
    | 'cornerAdded'
    | 'cornerRemoved'
    | 'openingAdded'
    | 'openingRemoved'
    | 'openingMoved'
    | 'openingWidth'
    | 'openingSill'
    | 'openingHead'
    | 'openingFrame'
    | 'lintel'
    | 'doorHinge'
    | 'doorOpens'
    | 'doorWay'
    | 'keepClearAdded'
    | 'keepClearRemoved'
    | 'keepClearChanged'
    | 'boundary'
    | 'controlAdded'
    | 'controlRemoved'
    | 'controlHeight'
    | 'beamAdded'
    | 'beamRemoved'
    | 'beamChanged'
    | 'wallType'
    | 'poleKit'
    | 'rule'
    | 'units'
    | 'tapeStep'
    | 'survey'
    | 'jointChanged'
    | 'poleSetOff'
    | 'braceTurned'
    | 'braceStraight';
  readonly thing: ThingRef;
  /** Names for the words: letters of a run, an opening's kind, a rule's id … */
  readonly names: Readonly<Record<string, string>>;
  readonly before: Ticks | null;
  readonly after: Ticks | null;
}

/** A pole whose marks moved. */
export interface PoleToRemark {
  readonly poleId: string;
  readonly letter: string;
  readonly lift: number;
  /** Courses whose printed mark from the level line moved, was added, or was removed. */
  readonly firstCourse: number | null;
  readonly lastCourse: number | null;
  readonly moved: number;
  readonly added: number;
  readonly removed: number;
  /** The largest move, up positive. */
  readonly most: Ticks;
}

export interface Comparison {
  readonly changes: readonly Change[];
  readonly polesToRemark: readonly PoleToRemark[];
  /** Things that differ, to be drawn so on each plan. */
  readonly differingBefore: readonly ThingRef[];
  readonly differingAfter: readonly ThingRef[];
}
