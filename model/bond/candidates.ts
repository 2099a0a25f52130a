/** The ways to fill one course that are worth trying, by the number of closers in it. */
import {
  endJoints,
  layCourse,
  spanLength,
  type BondLimits,
  type Closer,
  type CourseFill,
  type Span,
} from './courseFill';

/** Stretches of up to this many pieces try a closer in every place; longer ones in a few. */
const EVERY_PLACE = 8;

/** Where joints may vary so much that more counts of units fit, only those with joints nearest to nominal are tried. */
const MOST_COUNTS = 6;

/**
 * A course of more pieces than this takes up any length in its joints, or in one closer with nominal joints: joints off
 * nominal would only let two courses drift apart along it. Fewer counts and no other joints are tried, so that
 * the ways to lay a long course are as many as for a short one.
 */
const LONG = 40;
const MOST_COUNTS_LONG = 3;

interface Counted {
  readonly count: number;
  /** Joints between which the sum of the closers stays inside its limits. */
  readonly least: number;
  readonly most: number;
  readonly jointCount: number;
}

/**
 * How many pieces can fill the span with `closers` of them cut, and with which joints. The sum of the closers must lie
 * in `[leastSum, mostSum]`.
 */
function countsFor(span: Span, closers: number, leastSum: number, mostSum: number, limits: BondLimits): Counted[] {
  const { unit, joint } = limits;
  const length = spanLength(span);
  const ends = endJoints(span);
  const counted: Counted[] = [];
  const wholes = Math.min(Math.floor((length + joint.most) / (unit + joint.least)), Math.floor(length / unit));
  for (let whole = Math.max(0, wholes + 1); whole >= 0; whole -= 1) {
    const count = whole + closers;
    if (count < 1) break;
    const jointCount = count - 1 + ends;
    const left = length - whole * unit;
    if (left < leastSum + jointCount * joint.least) continue;
    if (left > mostSum + jointCount * joint.most) break;
    const least = jointCount > 0 ? Math.max(joint.least, (left - mostSum) / jointCount) : joint.nominal;
    const most = jointCount > 0 ? Math.min(joint.most, (left - leastSum) / jointCount) : joint.nominal;
    if (least <= most) counted.push({ count, least, most, jointCount });
  }
  const off = ({ least, most }: Counted) => Math.abs(clamp(joint.nominal, least, most) - joint.nominal);
  const enough = wholes > LONG ? MOST_COUNTS_LONG : MOST_COUNTS;
  return counted.length > enough ? counted.sort((a, b) => off(a) - off(b)).slice(0, enough) : counted;
}

function clamp(value: number, least: number, most: number): number {
  return Math.min(Math.max(value, least), most);
}

/** Joints worth trying: nominal or as near as can be, both limits, and half-way to them. */
function jointsToTry({ least, most }: Counted, near: number): number[] {
  return [...new Set([near, least, most, (least + near) / 2, (near + most) / 2])];
}

/**
 * Closers that bring the joints of this course to where the next course laps them just enough, or by the bond's
 * offset, given how far the two courses are apart at their start.
 */
function fittingClosers(apart: number, joint: number, limits: BondLimits): number[] {
  const module = limits.unit + joint;
  const enough = limits.leastLap + joint;
  const sizes: number[] = [];
  for (const phase of [0, apart, -apart])
    for (const wanted of [enough, module - enough, limits.offset * module, (1 - limits.offset) * module]) {
      const size = (((phase - wanted - joint) % module) + module) % module;
      sizes.push(Math.round(size));
    }
  return sizes;
}

function placesFor(count: number): number[] {
  if (count <= EVERY_PLACE) return Array.from({ length: count }, (_, i) => i);
  const middle = count >> 1;
  const quarter = count >> 2;
  return [0, 1, 2, quarter, middle - 1, middle, middle + 1, count - 1 - quarter, count - 3, count - 2, count - 1];
}

function pairsOfPlaces(count: number): [number, number][] {
  const last = count - 1;
  const middle = count >> 1;
  if (count <= 6) {
    const pairs: [number, number][] = [];
    for (let p = 0; p < count; p += 1) for (let q = p + 1; q < count; q += 1) pairs.push([p, q]);
    return pairs;
  }
  const third = Math.floor(count / 3);
  return [
    [middle - 1, middle],
    [middle, middle + 1],
    [third, last - third],
    [middle, last - 1],
    [1, middle],
    [1, last - 1],
    [middle, last],
    [0, middle],
    [1, last],
    [0, last - 1],
    [0, last],
    [0, 1],
    [last - 1, last],
  ];
}

function wholeCourses(span: Span, limits: BondLimits): CourseFill[] {
  return countsFor(span, 0, 0, 0, limits).map(({ count }) => layCourse(span, count, [], limits));
}

function oneCloser(span: Span, apart: number, limits: BondLimits, thorough: boolean): CourseFill[] {
  const { unit, leastPiece } = limits;
  const fills: CourseFill[] = [];
  for (const counted of countsFor(span, 1, Math.min(leastPiece, unit - 1), unit - 1, limits)) {
    const left = spanLength(span) - (counted.count - 1) * unit;
    const near = clamp(limits.joint.nominal, counted.least, counted.most);
    const sizes = new Set<number>([Math.round(left - counted.jointCount * near)]);
    const joints = counted.count > LONG ? [near] : jointsToTry(counted, near);
    for (const joint of thorough ? joints : []) {
      sizes.add(Math.round(left - counted.jointCount * joint));
      for (const size of fittingClosers(apart, joint, limits)) sizes.add(size);
    }
    for (const size of sizes) {
      if (size < 1 || size < Math.min(leastPiece, unit - 1) || size >= unit) continue;
      if (!jointsHold(left - size, counted.jointCount, limits)) continue;
      for (const index of placesFor(counted.count))
        fills.push(layCourse(span, counted.count, [{ index, length: size }], limits));
    }
  }
  return fills;
}

/** Whether sharing `mortar` among the joints keeps each inside its limits. */
function jointsHold(mortar: number, jointCount: number, { joint }: BondLimits): boolean {
  return mortar >= jointCount * joint.least && mortar <= jointCount * joint.most;
}

function twoClosers(span: Span, apart: number, limits: BondLimits, thorough: boolean): CourseFill[] {
  const { unit, leastPiece } = limits;
  const fills: CourseFill[] = [];
  const least = Math.min(leastPiece, unit - 1);
  for (const counted of countsFor(span, 2, 2 * least, 2 * unit - 2, limits)) {
    const left = spanLength(span) - (counted.count - 2) * unit;
    const joint = clamp(limits.joint.nominal, counted.least, counted.most);
    const sum = Math.round(left - counted.jointCount * joint);
    if (!jointsHold(left - sum, counted.jointCount, limits)) continue;
    const firsts = new Set([Math.round(sum / 2), Math.max(least, sum - unit + 1), Math.min(unit - 1, sum - least)]);
    for (const size of thorough ? fittingClosers(apart, joint, limits) : []) firsts.add(size).add(sum - size);
    for (const first of firsts) {
      const second = sum - first;
      if (first < least || second < least || first >= unit || second >= unit) continue;
      for (const [p, q] of pairsOfPlaces(counted.count)) {
        const closers: Closer[] = [
          { index: p, length: first },
          { index: q, length: second },
        ];
        fills.push(layCourse(span, counted.count, closers, limits));
      }
    }
  }
  return fills;
}

/** More than two closers in a course of one stretch never help: two at its ends already fit any length. */
export const MOST_CLOSERS = 2;

/**
 * Ways to fill a span with exactly `closers` cut units, joints inside their limits.
 * `apart` is how far this course starts before the next one, which sets the closers that make them lap. Those few whose
 * joints are nominal, or as near as can be, are enough for most walls; the thorough list has more.
 */
export function candidateFills(
  span: Span,
  closers: number,
  apart: number,
  limits: BondLimits,
  thorough: boolean,
): CourseFill[] {
  if (spanLength(span) <= 0 || closers > MOST_CLOSERS) return [];
  if (closers === 0) return wholeCourses(span, limits);
  return closers === 1 ? oneCloser(span, apart, limits, thorough) : twoClosers(span, apart, limits, thorough);
}

/** What is left where nothing fits: a single cut piece, or as many whole units as go in and a piece, however short. */
export function forcedFill(span: Span, limits: BondLimits): CourseFill | null {
  const { unit, joint } = limits;
  const ends = endJoints(span);
  const length = spanLength(span);
  const whole = Math.max(0, Math.floor((length - ends * joint.least - 1) / (unit + joint.least)));
  const piece = Math.floor(length - whole * unit - (whole + ends) * joint.nominal);
  const size = Math.min(unit, Math.max(1, piece));
  if (length < size + whole * unit) return null;
  const index = (whole + 1) >> 1;
  return layCourse(span, whole + 1, size < unit ? [{ index, length: size }] : [], limits);
}
