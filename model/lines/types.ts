import type { Ticks } from '../length/ticks';
import type { Reason } from '../reasons';

/** The mason's line of one run, pole to pole. */
export interface LineRun {
  readonly runId: string;
  /** Between the two poles. */
  readonly span: Ticks;
  /** Span with hitch allowance at both ends. */
  readonly cut: Ticks;
  /** At mid-span without trigs. */
  readonly sag: Ticks;
  /** Places along the span that want a trig, from its first pole. */
  readonly trigs: readonly Ticks[];
  /** Largest sag with those trigs. */
  readonly sagWithTrigs: Ticks;
}

export interface Lines {
  readonly lines: readonly LineRun[];
  readonly reasons: readonly Reason[];
}
