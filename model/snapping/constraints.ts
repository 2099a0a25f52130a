/** The lines and circles near a point that it could be drawn onto. */
import { boxAround } from '../geometry/box';
import type { PlanPoint, Vec } from '../geometry/point';
import { meetLines, partAlong } from '../geometry/segment';
import { along, cross, distance, dot, fromBearing, sub, unit } from '../geometry/vec';
import { roundTicks, type Ticks } from '../length/ticks';
import type { RunGeometry } from '../walls/types';
import type { SceneCorner, SnapScene } from './scene';
import type { CaughtKind, GoodLengths, SnapAnchor } from './types';

/** A line through a point, or a circle about the anchor. Stronger ones win. */
export type Constraint =
  | {
      readonly shape: 'line';
      readonly kind: CaughtKind;
      readonly strength: number;
      readonly through: PlanPoint;
      readonly direction: Vec;
      /** A corner that the guide starts from. */
      readonly from: PlanPoint;
      readonly cornerId?: string;
      readonly run?: RunGeometry;
    }
  | {
      readonly shape: 'circle';
      readonly kind: 'module';
      readonly strength: number;
      readonly from: PlanPoint;
      readonly radius: Ticks;
    };

const STRENGTH: Readonly<Record<CaughtKind, number>> = {
  corner: 100,
  close: 100,
  point: 100,
  onRun: 8,
  rightAngle: 7,
  alignX: 5,
  alignY: 5,
  module: 4,
  angle15: 2,
};

/** Where a point falls on a constraint. */
export function dropOnto(constraint: Constraint, point: Vec): Vec {
  if (constraint.shape === 'circle') {
    const way = unit(sub(point, constraint.from));
    return along(constraint.from, way, constraint.radius);
  }
  const { through, direction } = constraint;
  return along(through, direction, dot(sub(point, through), direction));
}

/** Where two constraints meet, up to two places. */
export function meetConstraints(a: Constraint, b: Constraint): readonly Vec[] {
  if (a.shape === 'circle' && b.shape === 'circle') return [];
  if (a.shape === 'line' && b.shape === 'line') {
    // Lines almost along one another meet far from where either was caught.
    if (Math.abs(cross(a.direction, b.direction)) < 0.05) return [];
    const met = meetLines(a.through, a.direction, b.through, b.direction);
    return met ? [met] : [];
  }
  const [line, circle] = a.shape === 'line' ? [a, b] : [b, a];
  if (line.shape !== 'line' || circle.shape !== 'circle') return [];
  const middle = dropOnto(line, circle.from);
  const half = circle.radius ** 2 - distance(circle.from, middle) ** 2;
  if (half < 0) return [];
  const reach = Math.sqrt(half);
  return [along(middle, line.direction, reach), along(middle, line.direction, -reach)];
}

function nearest(sorted: readonly SceneCorner[], axis: 'x' | 'y', value: number, reach: number): SceneCorner[] {
  let low = 0;
  let high = sorted.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if ((sorted[middle]?.[axis] ?? 0) < value - reach) low = middle + 1;
    else high = middle;
  }
  const found: SceneCorner[] = [];
  for (let corner = sorted[low]; corner && corner[axis] <= value + reach; corner = sorted[++low]) found.push(corner);
  return found;
}

/** The corner in line with the point: the nearest line first, and along it the corner nearest to the point. */
function bestAligned(
  sorted: readonly SceneCorner[],
  axis: 'x' | 'y',
  raw: Vec,
  reach: number,
  skip: (corner: SceneCorner) => boolean,
): SceneCorner | null {
  let best: SceneCorner | null = null;
  let bestOff = Infinity;
  let bestFar = Infinity;
  for (const corner of nearest(sorted, axis, raw[axis], reach)) {
    if (skip(corner)) continue;
    const off = Math.abs(corner[axis] - raw[axis]);
    const far = distance(corner, raw);
    if (off < bestOff || (off === bestOff && far < bestFar)) [best, bestOff, bestFar] = [corner, off, far];
  }
  return best;
}

function alignments(
  scene: SnapScene,
  raw: Vec,
  reach: number,
  skip: (corner: SceneCorner) => boolean,
): readonly Constraint[] {
  const found: Constraint[] = [];
  const over = bestAligned(scene.byX, 'x', raw, reach, skip);
  if (over) found.push(alignment('alignX', over, { x: 0, y: 1 }));
  const beside = bestAligned(scene.byY, 'y', raw, reach, skip);
  if (beside) found.push(alignment('alignY', beside, { x: 1, y: 0 }));
  return found;
}

function alignment(kind: 'alignX' | 'alignY', corner: SceneCorner, direction: Vec): Constraint {
  const place = { x: corner.x, y: corner.y };
  return { shape: 'line', kind, strength: STRENGTH[kind], through: place, direction, from: place, cornerId: corner.id };
}

function angles(anchor: SnapAnchor, raw: Vec, reach: number): readonly Constraint[] {
  const { point, along: runs = [] } = anchor;
  const line = (kind: 'rightAngle' | 'angle15', direction: Vec): Constraint => {
    return { shape: 'line', kind, strength: STRENGTH[kind], through: point, direction, from: point };
  };
  const square = [{ x: 1, y: 0 }, { x: 0, y: 1 }, ...runs.flatMap((way) => [way, { x: 0 - way.y, y: way.x }])];
  const turned = [15, 30, 45, 60, 75, 105, 120, 135, 150, 165].map(fromBearing);
  const within = (one: Constraint): boolean => distance(dropOnto(one, raw), raw) <= reach;
  const rights = square.map((way) => line('rightAngle', way)).filter(within);
  return [...rights, ...turned.map((way) => line('angle15', way)).filter(within)];
}

function modules(anchor: SnapAnchor, raw: Vec, reach: number, goodLengths: GoodLengths): readonly Constraint[] {
  const away = distance(anchor.point, raw);
  return goodLengths(roundTicks(away))
    .filter((radius) => radius > 0 && Math.abs(radius - away) <= reach)
    .map((radius) => ({ shape: 'circle', kind: 'module', strength: STRENGTH.module, from: anchor.point, radius }));
}

function runLines(
  scene: SnapScene,
  raw: Vec,
  reach: number,
  skip: (run: RunGeometry) => boolean,
): readonly Constraint[] {
  return scene.runGrid.find(boxAround(raw, reach)).flatMap((i): Constraint[] => {
    const run = scene.runs[i];
    if (!run || skip(run)) return [];
    const part = partAlong(run.start, run.end, raw);
    const line: Constraint = {
      shape: 'line',
      kind: 'onRun',
      strength: STRENGTH.onRun,
      through: run.start,
      direction: run.direction,
      from: run.start,
      run,
    };
    return part > 0 && part < 1 && distance(dropOnto(line, raw), raw) <= reach ? [line] : [];
  });
}

export interface ConstraintRequest {
  readonly scene: SnapScene;
  readonly raw: Vec;
  readonly reach: number;
  readonly anchors: readonly SnapAnchor[];
  readonly rightAngles: boolean;
  readonly alignment: boolean;
  readonly points: boolean;
  readonly goodLengths: GoodLengths | null;
  readonly skipCorner: (corner: SceneCorner) => boolean;
  readonly skipRun: (run: RunGeometry) => boolean;
}

/** Every constraint within reach of the raw point. */
export function constraintsNear(request: ConstraintRequest): readonly Constraint[] {
  const { scene, raw, reach, anchors, goodLengths } = request;
  // A constraint through the anchor says nothing while the point is still on it.
  const held = anchors.filter((anchor) => distance(anchor.point, raw) > reach);
  return [
    ...(request.points ? runLines(scene, raw, reach, request.skipRun) : []),
    ...(request.rightAngles ? held.flatMap((anchor) => angles(anchor, raw, reach)) : []),
    ...(request.alignment ? alignments(scene, raw, reach, request.skipCorner) : []),
    ...(goodLengths ? held.flatMap((anchor) => modules(anchor, raw, reach, goodLengths)) : []),
  ];
}

/** Whether a rounded point keeps a constraint to the tick. */
export function keeps(constraint: Constraint, point: PlanPoint): boolean {
  return distance(dropOnto(constraint, point), point) < 1;
}
