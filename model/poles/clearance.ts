/** Whether one brace can stand where a candidate puts it, and what refuses it. */
import type { PoleKit } from '../drawing/schema';
import { boxOfSegment, inflate } from '../geometry/box';
import type { PlanPoint } from '../geometry/point';
import { distanceSegmentToPolygon, distanceToPolygon, edges, whereIs } from '../geometry/polygon';
import { distanceBetweenSegments } from '../geometry/segment';
import type { ThingRef } from '../things';
import type { Ground, Obstacle } from './obstacles';
import { partsInside } from './plane';

export interface BraceLine {
  readonly from: PlanPoint;
  readonly foot: PlanPoint;
}

/** What one obstacle says to a brace: nothing, no, or over it with head room. */
export type Verdict = 'clear' | 'refused' | 'over';

/** Where the last of a brace's parts inside a ring ends, as a share of its reach; null where it stays out. */
function leaves(line: BraceLine, ring: readonly PlanPoint[]): number | null {
  const parts = partsInside(line.from, line.foot, ring);
  return parts[parts.length - 1]?.[1] ?? null;
}

/**
 * A way through, with the working clearance round it, is passed over only where the brace, at `fixing × (1 − x/reach)`
 * above the ground at plan distance x, is more than the head room all across it; its lowest place is where it leaves it
 * on the foot's side. One that only comes into the clearance, high enough, passes beside the way and not over it.
 */
function overWay(line: BraceLine, { ring, keep }: Obstacle, kit: PoleKit): Verdict {
  const place = whereIs(keep, line.foot);
  if (place !== 'outside') return place === 'inside' ? 'refused' : 'clear';
  const last = leaves(line, keep);
  if (last === null) return 'clear';
  if (kit.brace.fixing * (1 - last) <= kit.brace.headRoom) return 'refused';
  return leaves(line, ring) === null ? 'clear' : 'over';
}

/** What an obstacle says to a brace, by the general geometry of any polygon; `nearby.ts` answers the plain cases sooner. */
export function verdictOf(line: BraceLine, obstacle: Obstacle, poleId: string, kit: PoleKit): Verdict {
  const { ring } = obstacle;
  switch (obstacle.kind) {
    case 'frame':
      return 'clear';
    case 'way':
      return overWay(line, obstacle, kit);
    case 'wall':
      if (distanceToPolygon(ring, line.foot) < kit.clearance) return 'refused';
      return distanceSegmentToPolygon(ring, line.from, line.foot) > 0 ? 'clear' : 'refused';
    case 'pole':
      if (obstacle.thing.id === poleId) return 'clear';
      return distanceSegmentToPolygon(ring, line.from, line.foot) < kit.clearance ? 'refused' : 'clear';
    case 'swing':
    case 'keepClear':
      if (whereIs(ring, line.foot) === 'inside') return 'refused';
      return partsInside(line.from, line.foot, ring).length > 0 ? 'refused' : 'clear';
  }
}

export function leavesBoundary(line: BraceLine, boundary: readonly PlanPoint[]): boolean {
  if (whereIs(boundary, line.foot) === 'outside') return true;
  const inside = partsInside(line.from, line.foot, boundary).reduce((sum, [from, to]) => sum + to - from, 0);
  return (
    inside < 1 - 1e-6 && !edges(boundary).some(([a, b]) => distanceBetweenSegments(a, b, line.foot, line.foot) === 0)
  );
}

export type Standing =
  | { readonly free: true; readonly over: readonly ThingRef[] }
  | { readonly free: false; readonly refusedBy: readonly Obstacle[]; readonly boundary: boolean };

/**
 * Tries one brace line from a pole. With `all`, every obstacle that refuses it is named; without, the first found is enough.
 */
export function tryBrace(line: BraceLine, poleId: string, kit: PoleKit, ground: Ground, all = false): Standing {
  const over: ThingRef[] = [];
  const refusedBy: Obstacle[] = [];
  const boundary = ground.boundary !== null && leavesBoundary(line, ground.boundary);
  if (boundary && !all) return { free: false, refusedBy, boundary };
  for (const obstacle of ground.near(inflate(boxOfSegment(line.from, line.foot), kit.clearance))) {
    const verdict = verdictOf(line, obstacle, poleId, kit);
    if (verdict === 'over') over.push(obstacle.thing);
    if (verdict !== 'refused') continue;
    refusedBy.push(obstacle);
    if (!all) break;
  }
  if (boundary || refusedBy.length > 0) return { free: false, refusedBy, boundary };
  return { free: true, over };
}

/** True where the point (x, y) lies nearer than √`square` to the segment from (ax, ay) by (ux, uy). */
export function pointNear(
  x: number,
  y: number,
  ax: number,
  ay: number,
  ux: number,
  uy: number,
  square: number,
): boolean {
  const px = x - ax;
  const py = y - ay;
  const along = px * ux + py * uy;
  const size = ux * ux + uy * uy;
  if (along <= 0) return px * px + py * py < square;
  if (along >= size) return (px - ux) * (px - ux) + (py - uy) * (py - uy) < square;
  const across = (ux * py - uy * px) / Math.sqrt(size);
  return across * across < square;
}

/** True where two braces of different poles come nearer than the clearance, line to line (feet included), or meet. */
export function bracesConflict(a: BraceLine, b: BraceLine, clearance: number): boolean {
  const { x: ax, y: ay } = a.from;
  const { x: bx, y: by } = b.from;
  const ux = a.foot.x - ax;
  const uy = a.foot.y - ay;
  const vx = b.foot.x - bx;
  const vy = b.foot.y - by;
  const wx = bx - ax;
  const wy = by - ay;
  // Apart along an axis by the clearance or more.
  if (Math.min(0, ux) - Math.max(wx, wx + vx) > clearance || Math.min(wx, wx + vx) - Math.max(0, ux) > clearance)
    return false;
  if (Math.min(0, uy) - Math.max(wy, wy + vy) > clearance || Math.min(wy, wy + vy) - Math.max(0, uy) > clearance)
    return false;
  const p = ux * wy - uy * wx;
  const q = ux * (wy + vy) - uy * (wx + vx);
  const r = vy * wx - vx * wy;
  const t = r + vx * uy - vy * ux;
  if (((p <= 0 && q >= 0) || (p >= 0 && q <= 0)) && ((r <= 0 && t >= 0) || (r >= 0 && t <= 0))) {
    const inLine = p === 0 && q === 0;
    if (!inLine || (spansMeet(0, ux, wx, wx + vx) && spansMeet(0, uy, wy, wy + vy))) return true;
  }
  const square = clearance * clearance;
  return (
    pointNear(bx, by, ax, ay, ux, uy, square) ||
    pointNear(b.foot.x, b.foot.y, ax, ay, ux, uy, square) ||
    pointNear(ax, ay, bx, by, vx, vy, square) ||
    pointNear(a.foot.x, a.foot.y, bx, by, vx, vy, square)
  );
}

function spansMeet(a: number, b: number, c: number, d: number): boolean {
  return Math.max(a, b) >= Math.min(c, d) && Math.max(c, d) >= Math.min(a, b);
}
