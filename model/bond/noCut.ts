/** Lengths of a run that its units fill without cutting. */
import type { WallType } from '../drawing/schema';
import { ticks, type Ticks } from '../length/ticks';
import type { EndKind } from '../walls/types';
import type { BondLimits, Span } from './courseFill';
import { endByKind, type CourseEnd, type EndPair, type Parity } from './ends';
import { fewestCuts } from './fillStretch';
import { bondLimits, hasTooManyPieces } from './limits';
import { unitSize } from './unitSize';

export interface NoCut {
  readonly below: Ticks | null;
  readonly above: Ticks | null;
}

/** The far end of a run, turned about: from its distance into the run to its place along it. */
export function farEnd(pair: EndPair, length: number): EndPair {
  const turn = (end: CourseEnd): CourseEnd => ({ ...end, at: length - end.at });
  return [turn(pair[0]), turn(pair[1])];
}

function spansAt(start: EndPair, end: EndPair, length: number): readonly [Span, Span] {
  const far = farEnd(end, length);
  return [
    { from: start[0], to: far[0] },
    { from: start[1], to: far[1] },
  ];
}

/** An end that starts alike in both parities: its units need a closer in alternate courses whatever the length. */
function isPlain(pair: EndPair): boolean {
  return pair[0].at === pair[1].at && pair[0].joint === pair[1].joint;
}

/**
 * The nearest lengths at or below and at or above `near` that take no cutting. With n whole units and b joints at its
 * ends a course is `fixed + n × unit + (n − 1 + b) × joint` long, for any joint inside its limits; both parities have to
 * reach the same length, and their laps to hold. A free end or a stem takes a closer in alternate courses at any
 * length: that one is not counted, and the other courses are whole.
 */
function noCutBetween(start: EndPair, end: EndPair, near: number, limits: BondLimits): NoCut {
  if (!(near > 0) || hasTooManyPieces(near, limits)) return { below: null, above: null };
  const plain = (isPlain(start) ? 1 : 0) + (isPlain(end) ? 1 : 0);
  const { unit, joint } = limits;
  const fixed = (p: Parity) => start[p].at + end[p].at;
  const joints = (p: Parity) => (start[p].joint ? 1 : 0) + (end[p].joint ? 1 : 0);
  const lengthOf = (p: Parity, count: number, j: number) => fixed(p) + count * unit + (count - 1 + joints(p)) * j;
  /** The widest joint that still leaves the least lap where the courses start `apart`. */
  const apart = Math.abs(start[0].at - start[1].at);
  const lapJoint = Math.min(joint.most, Math.max(joint.least, unit - apart - limits.leastLap));
  const fits = (length: number) => length > 0 && fewestCuts(spansAt(start, end, length), plain, limits) !== null;

  /** Lengths that `count` units of one parity reach, inside what the other parity reaches when no end is plain. */
  const reach = (p: Parity, count: number): [number, number][] => {
    const own: [number, number] = [lengthOf(p, count, joint.least), lengthOf(p, count, joint.most)];
    if (plain > 0) return [own];
    const q: Parity = p === 0 ? 1 : 0;
    const ranges: [number, number][] = [];
    for (let other = Math.max(1, count - 1); other <= count + 1; other += 1) {
      const least = Math.max(own[0], lengthOf(q, other, joint.least));
      const most = Math.min(own[1], lengthOf(q, other, joint.most));
      if (least <= most) ranges.push([least, most]);
    }
    return ranges;
  };

  const search = (way: -1 | 1): Ticks | null => {
    let best: number | null = null;
    for (const p of plain > 0 ? ([0, 1] as const) : ([0] as const)) {
      const guess = Math.round((near - fixed(p)) / (unit + joint.nominal));
      const spread = Math.ceil((Math.max(0, guess) * (joint.most - joint.least)) / (unit + joint.nominal)) + 2;
      for (let step = -Math.min(spread, MOST_STEPS); step <= Math.min(spread, MOST_STEPS); step += 1) {
        const count = guess + way * step;
        if (count < 1) continue;
        for (const [least, most] of reach(p, count)) {
          const tries = [near, least, most, lengthOf(p, count, joint.nominal), lengthOf(p, count, lapJoint)];
          for (const length of tries) {
            const inside = Math.min(Math.max(length, least), most);
            if (way * (inside - near) < 0 || (best !== null && way * (inside - best) >= 0)) continue;
            if (fits(inside)) best = inside;
          }
        }
      }
    }
    return best === null ? null : ticks(best);
  };
  return { below: search(-1), above: search(1) };
}

/** Counts of units tried to each side of the nearest; a module each, so the nearest length is always among them. */
const MOST_STEPS = 4;

/** The same end with odd and even courses exchanged. */
export function exchanged(pair: EndPair): EndPair {
  return [pair[1], pair[0]];
}

/**
 * The nearest lengths that need no cutting whichever way the corners are turned: the run passing through at one end in
 * odd courses and at the other in even ones, or at both ends in the same courses.
 */
export function noCutEitherWay(start: EndPair, end: EndPair, near: number, limits: BondLimits): NoCut {
  const one = noCutBetween(start, end, near, limits);
  if (isPlain(start) || isPlain(end) || (one.below === near && one.above === near)) return one;
  const other = noCutBetween(start, exchanged(end), near, limits);
  const pick = (a: Ticks | null, b: Ticks | null, way: -1 | 1) =>
    a === null ? b : b === null ? a : way * (a - b) < 0 ? a : b;
  return { below: pick(one.below, other.below, -1), above: pick(one.above, other.above, 1) };
}

/**
 * Lengths for a run still being drawn, by its kind of ends, beside a wall of its own type at right angles: what a length
 * snaps to. Where `near` itself needs no cutting both are `near`.
 */
export function noCutLengths(wallType: WallType, endKinds: readonly [EndKind, EndKind], near: Ticks): NoCut {
  const { thickness } = unitSize(wallType);
  const start = endByKind(endKinds[0], thickness, 1, 0);
  const end = endByKind(endKinds[1], thickness, 0, 0);
  return noCutEitherWay(start, end, near, bondLimits(wallType));
}
