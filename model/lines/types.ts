import type { Ticks } from '../length/ticks';
import type { Reason } from '../reasons';

/** One of the mason's lines, pole to pole: a run has several where poles stand along it. */
export interface LineRun {
  /** The run it is strung along; the first of them where it passes on in line to the next. */
  readonly runId: string;
  /** The poles that hold its ends; null where it ends on a wall, at the foot of a tee. */
  readonly fromPoleId: string | null;
  readonly toPoleId: string | null;
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
  /** Pull that would hold the line to its most sag without trigs, in newtons; null where none does. */
  readonly pullWithoutTrigs: number | null;
}

export interface Lines {
  readonly lines: readonly LineRun[];
  readonly reasons: readonly Reason[];
}
