/** What each end of a run offers to its courses: where they start, with or without a head joint, and the return seen there. */
import type { EndKind, RunGeometry, Walls } from '../walls/types';

/** Odd courses (the first, third …) are parity 0, even ones parity 1. */
export type Parity = 0 | 1;

export interface CourseEnd {
  /** Along the face: the solid against which the course starts or stops. */
  readonly at: number;
  /** A head joint stands between that solid and the first piece. */
  readonly joint: boolean;
  /** Whether that joint has to be lapped by the next course; false where it stands in every course. */
  readonly lapped: boolean;
  /** Width of the other run's end seen on this face beyond `at`; 0 where none is. */
  readonly returnWidth: number;
  /** The course's last unit here is the corner's own, which is never cut where it can be helped. */
  readonly quoin: boolean;
}

/** An end in odd and in even courses. */
export type EndPair = readonly [CourseEnd, CourseEnd];

/** At very blunt corners the end of the crossing run is cut on the skew, and shows no wider than this times its thickness. */
const MOST_SKEW = 2;

function plainEnd(at: number, quoin = false): CourseEnd {
  return { at, joint: false, lapped: false, returnWidth: 0, quoin };
}

/** How wide a wall of `thickness` shows where it is cut by another face at `angle` degrees. */
function skewWidth(thickness: number, angle: number | null): number {
  const sine = Math.abs(Math.sin(((angle ?? 90) * Math.PI) / 180));
  return Math.round(thickness * Math.min(MOST_SKEW, sine > 0 ? 1 / sine : MOST_SKEW));
}

/**
 * An end by its kind, measured from the corner into the run: the units lap in alternation at a corner of two runs, so
 * `goesThrough` says in which parity this run's courses reach past the other's.
 * At an outside corner the through course stops at the corner and the other shows the return. At a reentrant corner the
 * outside faces meet in the hollow, so the through course passes the corner by the other wall's thickness, unseen from outside.
 */
export function endByKind(kind: EndKind, width: number, goesThrough: Parity, stemAt: number): EndPair {
  const pair = (through: CourseEnd, butt: CourseEnd): EndPair =>
    goesThrough === 0 ? [through, butt] : [butt, through];
  switch (kind) {
    case 'outside':
      return pair(plainEnd(0, true), { at: width, joint: true, lapped: true, returnWidth: width, quoin: false });
    case 'reentrant':
      return pair(plainEnd(-width, true), { at: 0, joint: true, lapped: true, returnWidth: 0, quoin: false });
    case 'teeStem':
    case 'cross': {
      const butt = { at: stemAt, joint: true, lapped: false, returnWidth: 0, quoin: false };
      return [butt, butt];
    }
    case 'straight':
    case 'teeBar':
    case 'free':
      return [plainEnd(0), plainEnd(0)];
  }
}

/** How a run meets the other run at a corner of two: whether it counts there as the one that arrives. */
function arrivesAt(walls: Walls, run: RunGeometry, which: 0 | 1): boolean {
  const end = run.ends[which];
  const other = walls.runById.get(end.others[0] ?? '');
  if (!other) return which === 1;
  const otherArrives = other.ends[1].cornerId === end.cornerId;
  // Where both arrive or both leave, the one with the lower id counts as arriving.
  if (which === 1) return !otherArrives || run.runId < other.runId;
  return !otherArrives && run.runId < other.runId;
}

/** Whether the end is a corner where this run and one other lap each other in alternation. */
export function isLappedEnd(run: RunGeometry, which: 0 | 1): boolean {
  const { kind, others } = run.ends[which];
  return (kind === 'outside' || kind === 'reentrant') && others.length === 1;
}

/**
 * An end of a real run, measured from that corner into the run. `arriverFirst` says in which parity the run that arrives
 * at that corner goes through; the one that leaves goes through in the other.
 */
export function endOfRun(walls: Walls, run: RunGeometry, which: 0 | 1, arriverFirst: Parity): EndPair {
  const end = run.ends[which];
  const isCorner = end.kind === 'outside' || end.kind === 'reentrant';
  const kind = isCorner && !isLappedEnd(run, which) ? 'teeStem' : end.kind;
  const other = walls.runById.get(end.others[0] ?? '');
  const width = other ? skewWidth(other.thickness, walls.cornerById.get(end.cornerId)?.angle ?? null) : 0;
  const through: Parity = arrivesAt(walls, run, which) ? arriverFirst : arriverFirst === 0 ? 1 : 0;
  return endByKind(kind, width, through, stemDistance(run, which));
}

/** From an end's corner into the run: where its outside face can start, past the bar that a stem butts into. */
export function faceDistance(run: RunGeometry, which: 0 | 1): number {
  const { kind } = run.ends[which];
  return kind === 'teeStem' || kind === 'cross' ? stemDistance(run, which) : 0;
}

function stemDistance(run: RunGeometry, which: 0 | 1): number {
  const face = run.outside[which];
  const corner = which === 0 ? run.start : run.end;
  const along = (face.x - corner.x) * run.direction.x + (face.y - corner.y) * run.direction.y;
  const distance = which === 0 ? along : -along;
  return Number.isFinite(distance) ? Math.round(distance) : 0;
}
