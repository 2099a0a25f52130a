/** One interval of equal courses: which counts fit between two heights, and what joint they have. */
import type { ThinCourse } from './problem';

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

/**
 * Least and most height of `count` courses in whole ticks, the last of them a thinner one where `thin` is given; least is
 * over most where no whole height fits.
 */
export function heightLimits(
  count: number,
  unit: number,
  joint: JointLimits,
  thin: ThinCourse | null = null,
): { least: number; most: number } {
  const less = thin ? { least: unit - thin.least, most: unit - thin.most } : { least: 0, most: 0 };
  return {
    least: Math.ceil(count * (unit + joint.least) - less.least - SLACK),
    most: Math.floor(count * (unit + joint.most) - less.most + SLACK),
  };
}

/** What an interval may be made of: a count of courses, and whether its last one is thinner. */
export interface Make {
  readonly count: number;
  readonly thin: ThinCourse | null;
}

/** Every make whose height can lie within `least`…`most`. */
export function makesWithin(
  least: number,
  most: number,
  unit: number,
  joint: JointLimits,
  thin: ThinCourse | null,
): Make[] {
  const makes: Make[] = [];
  const { from, to } = countsWithin(least, most, unit, joint);
  for (let count = from; count <= to; count++) makes.push({ count, thin: null });
  if (!thin) return makes;
  const full = countsWithin(least - thin.most - joint.most, most - thin.least - joint.least, unit, joint);
  for (let count = full.from; count <= full.to; count++) makes.push({ count: count + 1, thin });
  return makes;
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

/** The bed joints that an interval may have: one, or where its last course may be ripped to any height, a range. */
export function jointRange(rise: number, { count, thin }: Make, unit: number, joint: JointLimits): JointLimits {
  const even = rise / count - unit;
  if (!thin) return { least: even, most: even };
  const least = even + (unit - thin.most) / count;
  const most = even + (unit - thin.least) / count;
  // A split unit has one height, and so its interval has one joint: no limit may move it.
  return thin.least === thin.most
    ? { least, most }
    : { least: Math.max(least, joint.least), most: Math.min(most, joint.most) };
}
