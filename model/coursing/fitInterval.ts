/** One interval of equal courses: which counts fit between two heights, and what joint they have. */

/** Limits of the bed joint, in ticks; not whole while the search narrows them. */
export interface JointLimits {
  readonly least: number;
  readonly most: number;
}

/**
 * Float error allowed when a limit is itself a joint, Δ / n: with n under 10 000 courses such a limit times another
 * count is either whole or at least 1e-4 away from it.
 */
const SLACK = 1e-6;

/** Least and most height of `count` courses in whole ticks; least is over most where no whole height fits. */
export function heightLimits(count: number, unit: number, joint: JointLimits): { least: number; most: number } {
  return {
    least: Math.ceil(count * (unit + joint.least) - SLACK),
    most: Math.floor(count * (unit + joint.most) + SLACK),
  };
}

/** The counts whose heights can lie within `least`…`most`, as a range from 0; empty where `to` is under `from`. */
export function countsWithin(
  least: number,
  most: number,
  unit: number,
  joint: JointLimits,
): { from: number; to: number } {
  if (most < 0) return { from: 0, to: -1 };
  return {
    from: Math.max(0, Math.ceil((least - SLACK) / (unit + joint.most))),
    to: Math.floor((most + SLACK) / (unit + joint.least)),
  };
}

/** The bed joint of `count` equal courses between two heights, in ticks, not rounded; `count` above zero. */
export function jointOf(from: number, to: number, count: number, unit: number): number {
  return (to - from) / count - unit;
}
