/**
 * Checks a laid bond from its pieces alone, by other means than the code that laid it: order, joints, coverage, sizes and
 * laps of every course, read off the faces.
 */
import type { RunBond } from '../../model/bond/types';
import type { Coursing } from '../../model/coursing/types';
import type { Drawing, WallType } from '../../model/drawing/schema';
import type { Walls } from '../../model/walls/types';

export interface BondFaults {
  /** Sentences that say what is wrong; empty when all holds. */
  readonly faults: readonly string[];
  /** Smallest clear distance between joints of neighbouring courses in one lift. */
  readonly lap: number;
  /** Shortest piece laid. */
  readonly shortest: number;
}

type Span = readonly [number, number];

/** Where units may be missing from a course: openings that it passes, and lintels with a joint at both ends. */
function holesOf(drawing: Drawing, runId: string, bottom: number, top: number): Span[] {
  return drawing.openings
    .filter((opening) => opening.runId === runId)
    .flatMap(({ at, width, sill, head, lintel }): Span[] => {
      const holes: Span[] = [];
      if (top > sill && bottom < head) holes.push([at, at + width]);
      if (lintel.depth > 0 && top > head && bottom < head + lintel.depth)
        holes.push([at - lintel.bearing, at + width + lintel.bearing]);
      return holes;
    });
}

function checkCourse(run: RunBond, index: number, wall: WallType, length: number, holes: readonly Span[]): string[] {
  const faults: string[] = [];
  const unit = wall.laid === 'stretcher' ? wall.unit.length : wall.unit.width;
  const say = (what: string) => faults.push(`${run.runId} course ${index + 1}: ${what}`);
  const { pieces } = run.patterns[run.patternByCourse[index]!]!;
  const isJoint = (gap: number) => gap >= wall.headJoint.least - 1 && gap <= wall.headJoint.most + 1;
  const isHole = (from: number, to: number) =>
    holes.some(([a, b]) => [0, 1].some((j) => Math.abs(from - a) <= j * wall.headJoint.most && to >= b));
  pieces.forEach((piece, i) => {
    const size = piece.end - piece.start;
    if (!Number.isInteger(piece.start) || !Number.isInteger(piece.end)) say('a piece is not in whole ticks');
    if (size <= 0) say('a piece has no length');
    if (piece.kind === 'unit' && size !== unit) say(`a whole unit is ${size} long`);
    if (piece.kind === 'closer' && size >= unit) say('a closer is no shorter than a unit');
    if (piece.kind !== 'return' && holes.some(([a, b]) => piece.start < b && piece.end > a))
      say('a piece stands in an opening');
    const before = pieces[i - 1];
    if (!before) return;
    const gap = piece.start - before.end;
    if (gap < 0) say('pieces overlap');
    else if (!isJoint(gap) && !isHole(before.end, piece.start)) say(`a gap of ${gap} at ${before.end}`);
  });
  const first = pieces[0];
  const last = pieces[pieces.length - 1];
  if (!first || !last) {
    say('nothing is laid');
    return faults;
  }
  if (first.start > wall.headJoint.most && !isHole(0, first.start)) say('it starts late');
  if (last.end < length - wall.headJoint.most && !isHole(last.end, length)) say('it stops early');
  return faults;
}

/** Head joints of a course: the gaps between pieces that are no wider than a joint may be. */
function jointsOf(run: RunBond, index: number, wall: WallType): Span[] {
  const { pieces } = run.patterns[run.patternByCourse[index]!]!;
  return pieces.flatMap((piece, i): Span[] => {
    const before = pieces[i - 1];
    return before && piece.start - before.end <= wall.headJoint.most + 1 ? [[before.end, piece.start]] : [];
  });
}

/** Checks one run; every pair of neighbouring courses, joint against joint. */
export function checkRun(drawing: Drawing, walls: Walls, coursing: Coursing, run: RunBond): BondFaults {
  const geometry = walls.runById.get(run.runId)!;
  const wall = drawing.wallTypes.find((type) => type.id === geometry.wallTypeId)!;
  const faults: string[] = [];
  let lap = Infinity;
  let shortest = Infinity;
  const seen = new Set<string>();
  coursing.courses.forEach((course, i) => {
    const under = i > 0 && coursing.courses[i - 1]!.lift === course.lift ? run.patternByCourse[i - 1]! : -1;
    const key = `${under} ${run.patternByCourse[i]!}`;
    if (!seen.has(key) && under >= 0)
      for (const [a, b] of jointsOf(run, i, wall))
        for (const [c, d] of jointsOf(run, i - 1, wall)) lap = Math.min(lap, Math.max(a - d, c - b));
    seen.add(key);
    for (const piece of run.patterns[run.patternByCourse[i]!]!.pieces)
      if (piece.kind !== 'return') shortest = Math.min(shortest, piece.end - piece.start);
    const holes = holesOf(drawing, run.runId, course.bottom, course.top);
    faults.push(...checkCourse(run, i, wall, geometry.length, holes));
  });
  return { faults, lap, shortest };
}
