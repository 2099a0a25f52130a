import type { Ticks } from '../length/ticks';

export interface UnitCount {
  readonly whole: number;
  /** Cut pieces laid. */
  readonly closers: number;
  /** Whole units consumed to make them, offcuts reused. */
  readonly cutFrom: number;
  /** `whole + cutFrom`. */
  readonly total: number;
}

/** Volumes in cubic millimetres. */
export interface MortarVolume {
  readonly bedding: number;
  readonly bed: number;
  readonly head: number;
}

export interface CourseCount {
  /** 1 at the bottom. */
  readonly course: number;
  readonly lift: number;
  readonly whole: number;
  readonly closers: number;
}

/** So many stock lengths, each cut alike. */
export interface StockPlan {
  readonly count: number;
  readonly cuts: readonly Ticks[];
  readonly left: Ticks;
}

export interface Takeoff {
  readonly units: UnitCount;
  readonly unitsByRun: readonly { readonly runId: string; readonly count: UnitCount }[];
  readonly unitsByLift: readonly { readonly lift: number; readonly count: UnitCount }[];
  /** What each course takes: whole units and closers. Units cut for closers are shared between courses, so none are said. */
  readonly unitsByCourse: readonly CourseCount[];
  readonly mortar: MortarVolume;
  /** Concrete of the bond beams, and their bar: total length with laps. */
  readonly beams: readonly {
    readonly beamId: string;
    readonly length: Ticks;
    readonly concrete: number;
    readonly bar: Ticks;
    /** Stock lengths to buy for the bar, plans alike counted together; empty where the stock is no longer than a lap. */
    readonly stock: readonly StockPlan[];
  }[];
  readonly lintels: readonly { readonly length: Ticks; readonly depth: Ticks; readonly count: number }[];
  readonly poles: {
    readonly count: number;
    readonly braces: number;
    /** Stock lengths to buy and the cuts from each, with kerf. */
    readonly stock: readonly { readonly cuts: readonly Ticks[]; readonly left: Ticks }[];
    readonly lineBlocks: number;
    readonly line: Ticks;
  };
}
