/** Mortar by kind: under the first course, in the bed joints, and in the head joints. */
import { faceDistance } from '../bond/ends';
import type { BondPattern } from '../bond/types';
import { unitSize } from '../bond/unitSize';
import type { Bond } from '../bond/types';
import type { Coursing } from '../coursing/types';
import type { Drawing, WallType } from '../drawing/schema';
import { TICKS_PER_MM } from '../length/ticks';
import { heightOnProfile } from '../survey/heightAt';
import type { Ground, ProfilePoint } from '../survey/types';
import type { RunGeometry, Walls } from '../walls/types';
import type { MortarVolume } from './types';

/** What mortar has to know of one course of one run. */
interface CourseShape {
  /** `[start, end, …]` of the masonry, head joints included, along the run. */
  readonly laid: readonly number[];
  readonly laidLength: number;
  /** Sum of its head joints. */
  readonly headJoints: number;
}

/** Cubic ticks in a cubic millimetre. */
const PER_CUBIC_MM = TICKS_PER_MM ** 3;

/** The masonry of a course: pieces nearer than the widest head joint are joined, what is wider is an opening or a lintel. */
function shapeOf(pattern: BondPattern, run: RunGeometry, mostJoint: number): CourseShape {
  const laid: number[] = [];
  let headJoints = 0;
  // What a course butts against at a reentrant corner or a bar is not among its pieces.
  let reached = faceDistance(run, 0);
  const isJoint = (gap: number) => gap > 0 && gap <= mostJoint + 1;
  for (const piece of pattern.pieces) {
    const joined = isJoint(piece.start - reached);
    if (joined) headJoints += piece.start - reached;
    if (piece.kind === 'return') {
      if (joined && laid.length > 0) laid[laid.length - 1] = piece.start;
      reached = Math.max(reached, piece.end);
      continue;
    }
    const from = joined ? reached : piece.start;
    if (laid.length > 0 && laid[laid.length - 1] === from) laid[laid.length - 1] = piece.end;
    else laid.push(from, piece.end);
    reached = piece.end;
  }
  const last = run.length - faceDistance(run, 1) - reached;
  if (laid.length > 0 && isJoint(last)) {
    headJoints += last;
    laid[laid.length - 1] = reached + last;
  }
  let laidLength = 0;
  for (let i = 0; i < laid.length; i += 2) laidLength += laid[i + 1]! - laid[i]!;
  return { laid, laidLength, headJoints };
}

/** Area between a level at `height` and the foundation's profile, from one place to another along the run, in square ticks. */
function areaOver(profile: readonly ProfilePoint[], height: number, from: number, to: number): number {
  const stops = [from, ...profile.map((point) => point.at as number).filter((at) => at > from && at < to), to];
  let area = 0;
  for (let i = 1; i < stops.length; i += 1) {
    const [a, b] = [stops[i - 1]!, stops[i]!];
    area += (b - a) * (height - (heightOnProfile(profile, a) + heightOnProfile(profile, b)) / 2);
  }
  return Math.max(0, area);
}

interface Mortar {
  bedding: number;
  bed: number;
  head: number;
}

function addRun(
  mortar: Mortar,
  run: RunGeometry,
  wallType: WallType,
  parts: { ground: Ground; coursing: Coursing; bond: Bond },
): void {
  const { ground, coursing, bond } = parts;
  const laid = bond.byRun.get(run.runId);
  if (!laid) return;
  const { thickness, height } = unitSize(wallType);
  const shapes = new Map<number, CourseShape>();
  coursing.courses.forEach((course, i) => {
    const index = laid.patternByCourse[i] ?? -1;
    const pattern = laid.patterns[index];
    if (!pattern) return;
    const shape = shapes.get(index) ?? shapeOf(pattern, run, wallType.headJoint.most);
    shapes.set(index, shape);
    mortar.head += shape.headJoints * thickness * height;
    if (i > 0) mortar.bed += shape.laidLength * thickness * course.joint;
    else {
      const profile = ground.profileByRun.get(run.runId) ?? [];
      for (let k = 0; k < shape.laid.length; k += 2)
        mortar.bedding += thickness * areaOver(profile, course.bottom, shape.laid[k]!, shape.laid[k + 1]!);
    }
  });
}

/**
 * Volumes in cubic millimetres, as laid, joints full over the wall's thickness. Bedding follows the foundation's
 * profile under the masonry of the first course, so nothing is counted under a door; a corner counts once, with the run
 * that goes through. The joints at a lintel's two ends are not counted.
 */
export function mortarVolume(
  drawing: Drawing,
  parts: { walls: Walls; ground: Ground; coursing: Coursing; bond: Bond },
): MortarVolume {
  const types = new Map(drawing.wallTypes.map((type) => [type.id, type]));
  const mortar: Mortar = { bedding: 0, bed: 0, head: 0 };
  for (const run of parts.walls.runs) {
    const wallType = types.get(run.wallTypeId);
    if (wallType) addRun(mortar, run, wallType, parts);
  }
  return {
    bedding: mortar.bedding / PER_CUBIC_MM,
    bed: mortar.bed / PER_CUBIC_MM,
    head: mortar.head / PER_CUBIC_MM,
  };
}
