/** What lies under the finger. */
import type { Drawing } from '../drawing/schema';
import { boxAround, boxOf, boxOfSegment, type Box } from '../geometry/box';
import { gridOf, type Grid } from '../geometry/grid';
import type { PlanPoint, Vec } from '../geometry/point';
import { distanceToPolygon, edges } from '../geometry/polygon';
import { distanceToSegment } from '../geometry/segment';
import { distance } from '../geometry/vec';
import type { PoleSet } from '../poles/types';
import type { ThingKind, ThingRef } from '../things';
import { openingBody } from '../walls/openingBody';
import type { Walls } from '../walls/types';

/**
 * Handles are caught anywhere within reach, before anything else; areas by how near their edge is, nothing where the
 * finger is on them. The order settles what is equally near.
 */
const HANDLES: readonly ThingKind[] = ['corner', 'pole', 'brace'];
const AREAS: readonly ThingKind[] = ['opening', 'run', 'keepClear', 'boundary'];

interface Target {
  readonly thing: ThingRef;
  readonly box: Box;
  readonly distance: (point: Vec) => number;
}

export interface HitIndex {
  readonly targets: readonly Target[];
  readonly grid: Grid;
}

export interface Hit {
  readonly thing: ThingRef;
  /** From the point to the thing, in ticks; 0 where the point is on it. */
  readonly distance: number;
}

function pointTarget(thing: ThingRef, at: PlanPoint): Target {
  return { thing, box: boxAround(at, 0), distance: (point) => distance(point, at) };
}

function areaTarget(thing: ThingRef, ring: readonly Vec[]): Target[] {
  const box = boxOf(ring);
  return box ? [{ thing, box, distance: (point) => distanceToPolygon(ring, point) }] : [];
}

function edgeTargets(thing: ThingRef, ring: readonly Vec[]): Target[] {
  return edges(ring).map(([a, b]) => ({
    thing,
    box: boxOfSegment(a, b),
    distance: (point) => distanceToSegment(a, b, point),
  }));
}

function poleTargets(poles: PoleSet): Target[] {
  return poles.poles.flatMap((pole) => [
    ...areaTarget({ kind: 'pole', id: pole.id }, pole.section),
    ...pole.braces.map((brace): Target => ({
      thing: { kind: 'brace', id: brace.id },
      box: boxOfSegment(pole.at, brace.foot),
      distance: (point) => distanceToSegment(pole.at, brace.foot, point),
    })),
  ]);
}

/** Everything that can be hit, indexed once for a drawing. Openings that don't stand rightly can be hit too, to be mended. */
export function indexHits(drawing: Drawing, walls: Walls, poles: PoleSet | null): HitIndex {
  const targets: Target[] = [
    ...drawing.corners.map((corner) => pointTarget({ kind: 'corner', id: corner.id }, corner)),
    ...(poles ? poleTargets(poles) : []),
    ...drawing.openings.flatMap((opening) => {
      const run = walls.runById.get(opening.runId);
      return run ? areaTarget({ kind: 'opening', id: opening.id }, openingBody(run, opening)) : [];
    }),
    ...walls.runs.flatMap((run) => areaTarget({ kind: 'run', id: run.runId }, run.body)),
    ...drawing.keepClears.flatMap((area) => areaTarget({ kind: 'keepClear', id: area.id }, area.points)),
    ...(drawing.boundary ? edgeTargets({ kind: 'boundary', id: 'boundary' }, drawing.boundary) : []),
  ];
  return { targets, grid: gridOf(targets.map((target) => target.box)) };
}

function rank(kind: ThingKind): number {
  const handle = HANDLES.indexOf(kind);
  return handle >= 0 ? handle : HANDLES.length + AREAS.indexOf(kind);
}

function compareHits(a: Hit, b: Hit): number {
  const [rankA, rankB] = [rank(a.thing.kind), rank(b.thing.kind)];
  const [handleA, handleB] = [rankA < HANDLES.length, rankB < HANDLES.length];
  if (handleA !== handleB) return handleA ? -1 : 1;
  if (handleA) return rankA - rankB || a.distance - b.distance;
  return a.distance - b.distance || rankA - rankB;
}

/** Everything within reach of a point, the likeliest meant first; only of some kinds, where they are given. */
export function hitAll(index: HitIndex, point: Vec, reach: number, kinds?: ReadonlySet<ThingKind>): readonly Hit[] {
  const hits: Hit[] = [];
  for (const i of index.grid.find(boxAround(point, reach))) {
    const target = index.targets[i];
    if (!target || (kinds && !kinds.has(target.thing.kind))) continue;
    const away = target.distance(point);
    if (away <= reach) hits.push({ thing: target.thing, distance: away });
  }
  return hits.sort(compareHits);
}

/** The thing most likely meant by a point: a handle within reach, else the nearest area; null where there is none. */
export function hitTest(index: HitIndex, point: Vec, reach: number, kinds?: ReadonlySet<ThingKind>): ThingRef | null {
  return hitAll(index, point, reach, kinds)[0]?.thing ?? null;
}

/** A point of a keep-clear or of the boundary, counted from 0. */
export interface AreaPoint {
  readonly thing: ThingRef;
  readonly index: number;
}

/** The nearest point of any keep-clear or the boundary within reach. */
export function hitAreaPoint(drawing: Drawing, point: Vec, reach: number): AreaPoint | null {
  let best: AreaPoint | null = null;
  let least = reach;
  const look = (thing: ThingRef, ring: readonly PlanPoint[]): void =>
    ring.forEach((corner, index) => {
      const away = distance(point, corner);
      if (away > least || (best !== null && away === least)) return;
      least = away;
      best = { thing, index };
    });
  for (const area of drawing.keepClears) look({ kind: 'keepClear', id: area.id }, area.points);
  if (drawing.boundary) look({ kind: 'boundary', id: 'boundary' }, drawing.boundary);
  return best;
}
