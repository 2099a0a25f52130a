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
  /** Those of them that stand away from the ends of the stretch: they are never laid one over another. */
  readonly innerClosers: readonly number[];
  readonly cuts: number;
  /** Pieces shorter than the least, and closers that stand as the corner's own unit. */
  readonly faults: number;
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
  innerClosers: [],
  cuts: 0,
  faults: 0,
  shortPieces: 0,
  endClosers: 0,
  jointOff: 0,
  clear: 1 / 2,
};

/** Takes the measures of a course from its pieces (`[start, end, …]`, in order, whole where they are as long as a unit). */
export function measureFill(span: Span, pieces: readonly number[], limits: BondLimits): CourseFill {
  const length = spanLength(span);
  const joints: number[] = [];
  const closers: number[] = [];
  const innerClosers: number[] = [];
  let shortPieces = 0;
  let quoinClosers = 0;
  let endClosers = 0;
  let clear = 1 / 2;
  let mortar = 0;
  let reached = span.from.at;
  for (let i = 0; i <= pieces.length; i += 2) {
    const end = i === 0 ? span.from : i === pieces.length ? span.to : null;
    const start = i === pieces.length ? span.to.at : pieces[i]!;
    if (end === null || end.joint) {
      if (end === null || end.lapped) joints.push(reached, start);
      mortar += start - reached;
    }
    if (i === pieces.length) break;
    const stop = pieces[i + 1]!;
    reached = stop;
    if (stop - start < limits.leastPiece) shortPieces += 1;
    if (stop - start === limits.unit) continue;
    closers.push(start, stop);
    clear = Math.min(clear, (start - span.from.at) / length, (span.to.at - stop) / length);
    const isFirst = i === 0;
    const isLast = i === pieces.length - 2;
    if (isFirst || isLast) endClosers += 1;
    else innerClosers.push(start, stop);
    if ((isFirst && span.from.quoin) || (isLast && span.to.quoin)) quoinClosers += 1;
  }
  const jointCount = pieces.length / 2 - 1 + endJoints(span);
  const jointOff = jointCount > 0 ? Math.abs(mortar / jointCount - limits.joint.nominal) : 0;
  return {
    pieces,
    joints,
    closers,
    innerClosers,
    cuts: closers.length / 2,
    faults: shortPieces + quoinClosers,
    shortPieces,
    endClosers,
    jointOff,
    clear,
  };
}

/**
 * Lays `count` pieces, whole but for the closers, with equal joints: what is left of the span is shared out so that the
 * sum is exact and no joint differs from another by more than one tick.
 */
export function layCourse(span: Span, count: number, closers: readonly Closer[], limits: BondLimits): CourseFill {
  const { unit } = limits;
  const masonry = closers.reduce((sum, closer) => sum + closer.length - unit, count * unit);
  const jointCount = count - 1 + endJoints(span);
  const mortar = spanLength(span) - masonry;
  const pieces: number[] = [];
  let shared = 0;
  let k = 0;
  let next = 0;
  let at = span.from.at;
  for (let i = 0; i < count; i += 1) {
    if (i > 0 || span.from.joint) {
      k += 1;
      const upTo = Math.round((mortar * k) / jointCount);
      at += upTo - shared;
      shared = upTo;
    }
    const size = next < closers.length && closers[next]!.index === i ? closers[next++]!.length : unit;
    pieces.push(at, at + size);
    at += size;
  }
  return measureFill(span, pieces, limits);
}
