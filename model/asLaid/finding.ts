import { roundTicks } from '../length/ticks';
import type { Allowed } from './tolerances';
import type { LaidFinding, LaidPlace } from './types';

/** The same for the same place. */
export function placeKey({ runId, at }: LaidPlace): string {
  return `${runId}@${at}`;
}

/** A finding; `over` is how far it lies beyond what is allowed. */
export function finding(
  kind: LaidFinding['kind'],
  readings: readonly [LaidPlace & { id: string }, ...(LaidPlace & { id: string })[]],
  off: number,
  { rule, most }: Allowed,
): LaidFinding {
  const [{ runId, at }] = readings;
  return {
    kind,
    readingIds: readings.map(({ id }) => id),
    place: { runId, at },
    rule,
    off: roundTicks(off),
    allowed: most,
    over: roundTicks(Math.max(0, Math.abs(off) - most)),
  };
}
