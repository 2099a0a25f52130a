/** Where a point stops: on corners first, then where two things agree, then on one. */
import { boxAround } from '../geometry/box';
import type { PlanPoint, Vec } from '../geometry/point';
import { along, bearing, cross, distance, dot, samePoint, sub, toPoint, unit } from '../geometry/vec';
import { roundTicks, type Ticks } from '../length/ticks';
import type { RunGeometry } from '../walls/types';
import { placeAt } from '../drawing/edits/runLength';
import { constraintsNear, dropOnto, keeps, meetConstraints, type Constraint } from './constraints';
import type { SnapScene } from './scene';
import type { CaughtThing, GoodLengths, Snap, SnapAnchor, SnapOptions } from './types';

export interface SnapRequest {
  readonly scene: SnapScene;
  /** Where the run being drawn starts; null while nothing holds the point. */
  readonly from: SnapAnchor | null;
  /** Other anchors: the second neighbour of a corner being moved. */
  readonly also?: readonly SnapAnchor[];
  readonly raw: Vec;
  /** Ticks that the finger reaches. */
  readonly reach: number;
  readonly options: SnapOptions;
  /** Ids of corners and runs that catch nothing, because they move with the point. */
  readonly exclude?: ReadonlySet<string>;
  /** A corner that would close the outline being drawn. */
  readonly closes?: string;
  /** Points that catch besides corners: the first point of an area being drawn. */
  readonly points?: readonly PlanPoint[];
  /** Run lengths that need no cutting; whole units with their joints unless given. */
  readonly goodLengths?: GoodLengths;
}

const NONE: ReadonlySet<string> = new Set();

function finish(request: SnapRequest, point: PlanPoint, caught: readonly CaughtThing[]): Snap {
  const { from } = request;
  if (!from) return { point, caught };
  const length = roundTicks(distance(from.point, point));
  return samePoint(from.point, point)
    ? { point, caught, length }
    : { point, caught, length, angle: bearing(sub(point, from.point)) };
}

function catchCorner(request: SnapRequest): Snap | null {
  const { scene, raw, reach, from, exclude = NONE } = request;
  let best: { point: PlanPoint; caught: CaughtThing } | null = null;
  let least = reach;
  for (const i of scene.cornerGrid.find(boxAround(raw, reach))) {
    const corner = scene.corners[i];
    if (!corner || exclude.has(corner.id) || (from && samePoint(corner, from.point))) continue;
    const away = distance(corner, raw);
    if (away > least || (best && away === least)) continue;
    least = away;
    const kind = corner.id === request.closes ? 'close' : 'corner';
    best = { point: { x: corner.x, y: corner.y }, caught: { kind, thing: { kind: 'corner', id: corner.id } } };
  }
  for (const point of request.points ?? []) {
    const away = distance(point, raw);
    if (away > least || (best && away === least)) continue;
    least = away;
    best = { point: { x: point.x, y: point.y }, caught: { kind: 'point' } };
  }
  return best ? finish(request, best.point, [best.caught]) : null;
}

/** How far along a run a place lies, to the tick: a tee is made at that distance. */
function atAlong(run: RunGeometry, place: Vec): Ticks {
  return roundTicks(dot(sub(place, run.start), run.direction));
}

/** What a constraint that the point keeps is shown as. */
function caughtBy(constraint: Constraint, point: PlanPoint): CaughtThing {
  const guide = [constraint.from, point] as const;
  if (constraint.shape === 'circle') return { kind: 'module', guide };
  const { kind, run, cornerId } = constraint;
  if (run) return { kind, guide: [run.start, run.end], thing: { kind: 'run', id: run.runId }, at: atAlong(run, point) };
  return cornerId === undefined ? { kind, guide } : { kind, guide, thing: { kind: 'corner', id: cornerId } };
}

interface Candidate {
  readonly place: Vec;
  readonly strength: number;
  readonly away: number;
  readonly by: readonly Constraint[];
}

/** Two agreeing before one; then the stronger; then the nearer. Places of one strength are told apart by distance alone. */
function better(a: Candidate, b: Candidate | null): boolean {
  if (!b) return true;
  if (a.by.length !== b.by.length) return a.by.length > b.by.length;
  return a.strength !== b.strength ? a.strength > b.strength : a.away < b.away;
}

function bestCandidate(constraints: readonly Constraint[], raw: Vec, reach: number): Candidate | null {
  let best: Candidate | null = null;
  const offer = (place: Vec, by: readonly Constraint[]): void => {
    const away = distance(place, raw);
    // Two lines meet up to a diagonal away from a point that is within reach of both.
    if (away > reach * (by.length > 1 ? Math.SQRT2 : 1)) return;
    const candidate = { place, strength: by.reduce((sum, one) => sum + one.strength, 0), away, by };
    if (better(candidate, best)) best = candidate;
  };
  constraints.forEach((a, i) => {
    offer(dropOnto(a, raw), [a]);
    for (const b of constraints.slice(i + 1)) for (const place of meetConstraints(a, b)) offer(place, [a, b]);
  });
  return best;
}

/**
 * The candidate's place in whole ticks. A module's length comes out to the tick: rounding both coordinates could miss it by
 * one. On a run the point is the one that a tee made at that distance gets.
 */
function settle(candidate: Candidate): PlanPoint {
  const { place, by } = candidate;
  for (const one of by) {
    if (one.shape === 'line' && one.run)
      return toPoint(along(one.run.start, one.run.direction, atAlong(one.run, place)));
  }
  const circle = by.find((one) => one.shape === 'circle');
  if (circle?.shape !== 'circle') return toPoint(place);
  const point = placeAt(circle.from, unit(sub(place, circle.from)), circle.radius);
  return by.every((one) => keeps(one, point)) ? point : toPoint(place);
}

/** Whether two constraints are one line, as far as the eye can tell: a run and the corners at its ends. */
function sameLine(a: Constraint, b: Constraint): boolean {
  if (a.shape === 'circle' || b.shape === 'circle') return false;
  return Math.abs(cross(a.direction, b.direction)) < 1e-6 && distance(dropOnto(a, b.through), b.through) < 1;
}

/** Where a raw point stops and what it caught. Off or out of everything's reach it is only rounded to the tick. */
export function snapPoint(request: SnapRequest): Snap {
  const { scene, raw, reach, from, also = [], options, exclude = NONE } = request;
  if (!options.on) return finish(request, toPoint(raw), []);
  const corner = options.points ? catchCorner(request) : null;
  if (corner) return corner;
  const constraints = constraintsNear({
    scene,
    raw,
    reach,
    anchors: from ? [from, ...also] : also,
    rightAngles: options.rightAngles,
    alignment: options.alignment,
    points: options.points,
    goodLengths: options.module ? (request.goodLengths ?? scene.wholeUnits) : null,
    skipCorner: (one) => exclude.has(one.id) || (from !== null && samePoint(one, from.point)),
    skipRun: (run) => exclude.has(run.runId) || run.ends.some((end) => exclude.has(end.cornerId)),
  });
  const best = bestCandidate(constraints, raw, reach);
  if (!best) return finish(request, toPoint(raw), []);
  const point = settle(best);
  const others = constraints.filter(
    (one) => one.kind !== 'angle15' && keeps(one, point) && !best.by.some((by) => by === one || sameLine(by, one)),
  );
  return finish(
    request,
    point,
    [...best.by, ...others].map((one) => caughtBy(one, point)),
  );
}
