/** One course of one stretch, laid: its pieces, and what the search has to know of them. */
import type { CourseEnd } from './ends';

/** What every course of a wall type is held to, in ticks. */
export interface BondLimits {
  readonly unit: number;
  readonly joint: { readonly nominal: number; readonly least: number; readonly most: number };
  readonly leastLap: number;
  readonly leastPiece: number;
  /** The lap that the chosen offset would give; more is no better. */
  readonly wantedLap: number;
  /** The bond's offset as a part of the module. */
  readonly offset: number;
}

/** A course's clear span and the joints at its ends. */
export interface Span {
  readonly from: CourseEnd;
  readonly to: CourseEnd;
}

export interface Closer {
  readonly index: number;
  readonly length: number;
}

export interface CourseFill {
  /** `[start, end, …]` of every piece along the face. */
  readonly pieces: readonly number[];
  /** `[start, end, …]` of the head joints that the next course has to lap. */
  readonly joints: readonly number[];
  /** `[start, end, …]` of the closers. */
  readonly closers: readonly number[];
  readonly cuts: number;
  /** Pieces shorter than the least. */
  readonly shortPieces: number;
  /** Closers beside a corner or a jamb. */
  readonly endClosers: number;
  /** How far its joints are from nominal. */
  readonly jointOff: number;
  /** From its closers to the nearest end of the stretch, as a part of the stretch; 1/2 where there are none. */
  readonly clear: number;
}

export function spanLength(span: Span): number {
  return span.to.at - span.from.at;
}

/** Joints that are there whatever the pieces: those between the course and what it butts against. */
export function endJoints(span: Span): number {
  return (span.from.joint ? 1 : 0) + (span.to.joint ? 1 : 0);
}

/** A course with nothing in it, for a stretch of no length. */
export const EMPTY_FILL: CourseFill = {
  pieces: [],
  joints: [],
  closers: [],
  cuts: 0,
  shortPieces: 0,
  endClosers: 0,
  jointOff: 0,
  clear: 1 / 2,
};

/**
 * Lays `count` pieces, whole but for the closers, with equal joints: what is left of the span is shared out so that the
 * sum is exact and no joint differs from another by more than one tick.
 */
export function layCourse(span: Span, count: number, closers: readonly Closer[], limits: BondLimits): CourseFill {
  const { unit, joint } = limits;
  const length = spanLength(span);
  const masonry = closers.reduce((sum, closer) => sum + closer.length - unit, count * unit);
  const jointCount = count - 1 + endJoints(span);
  const mortar = length - masonry;
  const share = (k: number) => (jointCount > 0 ? Math.round((mortar * k) / jointCount) : 0);

  const pieces: number[] = [];
  const joints: number[] = [];
  const cut: number[] = [];
  let at = span.from.at;
  let k = 0;
  const addJoint = (lapped: boolean) => {
    const end = at + share(k + 1) - share(k);
    if (lapped) joints.push(at, end);
    at = end;
    k += 1;
  };
  let shortPieces = 0;
  let clear = 1 / 2;
  let endClosers = 0;
  let next = 0;
  if (span.from.joint) addJoint(span.from.lapped);
  for (let i = 0; i < count; i += 1) {
    const closer = next < closers.length && closers[next]!.index === i ? closers[next++]! : null;
    const size = closer ? closer.length : unit;
    pieces.push(at, at + size);
    if (closer) {
      cut.push(at, at + size);
      clear = Math.min(clear, (at - span.from.at) / length, (span.to.at - at - size) / length);
      if (i === 0 || i === count - 1) endClosers += 1;
    }
    if (size < limits.leastPiece) shortPieces += 1;
    at += size;
    if (i < count - 1) addJoint(true);
  }
  if (span.to.joint) addJoint(span.to.lapped);
  const jointOff = jointCount > 0 ? Math.abs(mortar / jointCount - joint.nominal) : 0;
  return { pieces, joints, closers: cut, cuts: closers.length, shortPieces, endClosers, jointOff, clear };
}
