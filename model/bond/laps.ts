/** Laps between two courses, from their head joints. */

/** Head joints of a course: `[start, end, start, end, …]` along the face, in order. */
export type Joints = readonly number[];

/** Positions are rounded to whole ticks, each within half a tick, so a lap may read two ticks (0.003 mm) short and still be whole. */
export const LAP_ROUNDING = 2;

export interface LapResult {
  /** Smallest lap found; Infinity where no joint faces another. Zero or less: one joint over another. */
  readonly least: number;
  /** Joints whose lap is under the least. */
  readonly breaks: number;
}

/**
 * The lap of a joint is the unit over unit beside it: the clear distance to the nearest joint of the other course.
 * Walks both courses once. Stops early once more than `mostBreaks` are found.
 */
export function lapsBetween(upper: Joints, lower: Joints, leastLap: number, mostBreaks: number): LapResult {
  let least = Infinity;
  let breaks = 0;
  let j = 0;
  const enough = leastLap - LAP_ROUNDING;
  for (let i = 0; i < upper.length; i += 2) {
    const start = upper[i]!;
    const end = upper[i + 1]!;
    while (j < lower.length && lower[j + 1]! < start) j += 2;
    let lap = Infinity;
    if (j > 0) lap = start - lower[j - 1]!;
    if (j < lower.length) lap = Math.min(lap, lower[j]! - end);
    if (lap < least) least = lap;
    if (lap < enough && ++breaks > mostBreaks) break;
  }
  return { least, breaks };
}

/** Calls `visit` for every joint of the upper course that faces one of the lower, with its middle and its lap. */
export function visitLaps(upper: Joints, lower: Joints, visit: (at: number, lap: number) => void): void {
  let j = 0;
  for (let i = 0; i < upper.length; i += 2) {
    const start = upper[i]!;
    const end = upper[i + 1]!;
    while (j < lower.length && lower[j + 1]! < start) j += 2;
    let lap = Infinity;
    if (j > 0) lap = start - lower[j - 1]!;
    if (j < lower.length) lap = Math.min(lap, lower[j]! - end);
    if (lap < Infinity) visit((start + end) / 2, lap);
  }
}

/** How many spans of one list (`[start, end, …]`) lie over part of a span of the other. */
export function countOverlaps(upper: Joints, lower: Joints): number {
  let count = 0;
  for (let i = 0; i < upper.length; i += 2)
    for (let j = 0; j < lower.length; j += 2) if (upper[i]! < lower[j + 1]! && lower[j]! < upper[i + 1]!) count += 1;
  return count;
}
