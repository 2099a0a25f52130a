/** What may stand in the way of a pole, a brace or its foot: walls, ways through, door swings, keep-clears, the boundary. */
import type { Door, Drawing, Opening, WayThrough } from '../drawing/schema';
import { boxOf, inflate, type Box } from '../geometry/box';
import { gridOf } from '../geometry/grid';
import type { PlanPoint, Vec } from '../geometry/point';
import { negate } from '../geometry/vec';
import type { ThingRef } from '../things';
import type { RunGeometry, Walls } from '../walls/types';
import { stepFrom, turn } from './plane';

export interface Obstacle {
  readonly kind: 'wall' | 'frame' | 'way' | 'swing' | 'keepClear' | 'pole';
  readonly thing: ThingRef;
  readonly ring: readonly PlanPoint[];
  /** What a brace has to keep out of: the ring, and for a way through the working clearance round it. */
  readonly keep: readonly PlanPoint[];
  /** Box of `keep`. */
  readonly box: Box;
  /** `keep` as x, y, x, y …, its first point once more at the end. */
  readonly flat: Float64Array;
}

const EMPTY: Box = { minX: 0, minY: 0, maxX: 0, maxY: 0 };

/** A ring as x, y, x, y …, its first point once more at the end. */
export function flatOf(ring: readonly PlanPoint[]): Float64Array {
  const flat = new Float64Array(2 * (ring.length + 1));
  for (let i = 0; i <= ring.length; i += 1) {
    const point = ring[i % ring.length];
    flat[2 * i] = point?.x ?? 0;
    flat[2 * i + 1] = point?.y ?? 0;
  }
  return flat;
}

export function obstacleOf(
  kind: Obstacle['kind'],
  thing: ThingRef,
  ring: readonly PlanPoint[],
  keep: readonly PlanPoint[] = ring,
): Obstacle {
  return { kind, thing, ring, keep, box: boxOf(keep) ?? EMPTY, flat: flatOf(keep) };
}

const openingRef = (opening: Opening): ThingRef => ({ kind: 'opening', id: opening.id });

/** A strip across the wall: along the run from `from` to `to`, `out` beyond the outside face and `back` beyond the inside. */
function strip(run: RunGeometry, from: number, to: number, out: number, back: number): PlanPoint[] {
  const outward = -out;
  const inward = run.thickness + back;
  return [
    stepFrom(run.start, [run.direction, from], [run.inward, outward]),
    stepFrom(run.start, [run.direction, to], [run.inward, outward]),
    stepFrom(run.start, [run.direction, to], [run.inward, inward]),
    stepFrom(run.start, [run.direction, from], [run.inward, inward]),
  ];
}

/** The opening itself, through the thickness of the wall. */
export function frameOf(run: RunGeometry, opening: Opening): Obstacle {
  return obstacleOf('frame', openingRef(opening), strip(run, opening.at, opening.at + opening.width, 0, 0));
}

/** The room to keep free on both sides of a way through, centred on its opening; braces keep `clearance` off it. */
export function wayOf(
  run: RunGeometry,
  opening: Opening & { readonly way: WayThrough },
  clearance: number,
): Obstacle | null {
  const { used, width, depth } = opening.way;
  if (!used || width === 0) return null;
  const middle = opening.at + opening.width / 2;
  const wide = (off: number) =>
    strip(run, middle - width / 2 - off, middle + width / 2 + off, depth + off, depth + off);
  return obstacleOf('way', openingRef(opening), wide(0), wide(clearance));
}

/** Degrees between the points drawn on a swing's arc; a multiple of them is a quarter-turn. */
const ARC_STEP = 7.5;

/**
 * The quarter-disc that a door's leaf sweeps, from its hinge on the face that it opens to. Drawn a little outside the
 * arc, so that nothing inside the arc is missed.
 */
export function swingOf(run: RunGeometry, door: Door): Obstacle | null {
  const leaf = door.width - 2 * door.frame;
  if (leaf <= 0) return null;
  const near = door.swing.hinge === 'near';
  const at = near ? door.at + door.frame : door.at + door.width - door.frame;
  const out = door.swing.opens === 'out';
  const hinge = stepFrom(run.start, [run.direction, at], [run.inward, out ? 0 : run.thickness]);
  const shut: Vec = near ? run.direction : negate(run.direction);
  const side = (near ? 1 : -1) * (out ? -1 : 1);
  const radius = leaf / Math.cos((ARC_STEP * Math.PI) / 360);
  const ring = [hinge, stepFrom(hinge, [shut, leaf])];
  for (let a = ARC_STEP / 2; a < 90; a += ARC_STEP) ring.push(stepFrom(hinge, [turn(shut, side * a), radius]));
  ring.push(stepFrom(hinge, [out ? negate(run.inward) : run.inward, leaf]));
  return obstacleOf('swing', openingRef(door), ring);
}

function ofOpening(run: RunGeometry, opening: Opening, clearance: number): Obstacle[] {
  const found = [frameOf(run, opening)];
  if (opening.kind !== 'window') {
    const way = wayOf(run, opening, clearance);
    if (way) found.push(way);
  }
  const swing = opening.kind === 'door' ? swingOf(run, opening) : null;
  if (swing) found.push(swing);
  return found;
}

/** Every obstacle of a drawing but the poles themselves. */
export function obstaclesOf(drawing: Drawing, walls: Walls): Obstacle[] {
  const found = walls.runs
    .filter((run) => run.body.length >= 3)
    .map((run) => obstacleOf('wall', { kind: 'run', id: run.runId }, run.body));
  const openings = new Map(drawing.openings.map((opening) => [opening.id, opening]));
  for (const run of walls.runs)
    for (const id of walls.openingsByRun.get(run.runId) ?? []) {
      const opening = openings.get(id);
      if (opening) found.push(...ofOpening(run, opening, drawing.poleKit.clearance));
    }
  for (const area of drawing.keepClears)
    found.push(obstacleOf('keepClear', { kind: 'keepClear', id: area.id }, area.points));
  return found;
}

/** The ground that braces stand on: obstacles findable by place, and the boundary. */
export interface Ground {
  readonly near: (box: Box) => readonly Obstacle[];
  readonly boundary: readonly PlanPoint[] | null;
}

export function groundOf(obstacles: readonly Obstacle[], boundary: readonly PlanPoint[] | null): Ground {
  const grid = gridOf(obstacles.map((obstacle) => obstacle.box));
  const near = (box: Box) => grid.find(inflate(box, 1)).flatMap((i) => obstacles[i] ?? []);
  return { near, boundary };
}
