/** Polygons as rings of points without a repeated last point. */
import { orientation } from './orientation';
import type { PlanPoint, Vec } from './point';
import { distanceBetweenSegments, distanceToSegment, isOnSegment } from './segment';
import { cross, dot, perp, sub } from './vec';

/**
 * Signed area in square ticks, positive counter-clockwise, by the shoelace formula in whole numbers. The sum is exact;
 * the answer is the nearest double.
 */
export function signedArea(ring: readonly PlanPoint[]): number {
  let twice = 0n;
  for (let i = 0; i < ring.length; i++) {
    const a = ring[i];
    const b = ring[(i + 1) % ring.length];
    if (a && b) twice += BigInt(a.x) * BigInt(b.y) - BigInt(b.x) * BigInt(a.y);
  }
  // Halves are kept: 2A is odd where A ends in one half.
  return Number(twice / 2n) + Number(twice % 2n) / 2;
}

/** The same ring counter-clockwise. */
export function counterClockwise(ring: readonly PlanPoint[]): readonly PlanPoint[] {
  return signedArea(ring) < 0 ? [...ring].reverse() : ring;
}

/** Where a point lies: exact for whole ticks and any simple ring. */
export function whereIs(ring: readonly PlanPoint[], point: PlanPoint): 'inside' | 'edge' | 'outside' {
  let inside = false;
  for (let i = 0; i < ring.length; i++) {
    const a = ring[i];
    const b = ring[(i + 1) % ring.length];
    if (!a || !b) continue;
    if (isOnSegment(a, b, point)) return 'edge';
    if (a.y > point.y !== b.y > point.y) {
      const turn = orientation(a, b, point);
      if (b.y > a.y ? turn > 0 : turn < 0) inside = !inside;
    }
  }
  return inside ? 'inside' : 'outside';
}

/** Whether a place in floating point lies inside a ring (even-odd); on an edge either answer may come. */
export function contains(ring: readonly Vec[], point: Vec): boolean {
  let inside = false;
  for (let i = 0, j = ring.length - 1; i < ring.length; j = i++) {
    const a = ring[i];
    const b = ring[j];
    if (!a || !b || a.y > point.y === b.y > point.y) continue;
    if (point.x < ((b.x - a.x) * (point.y - a.y)) / (b.y - a.y) + a.x) inside = !inside;
  }
  return inside;
}

/** Every edge in turn, the closing one last. */
export function edges(ring: readonly Vec[]): readonly (readonly [Vec, Vec])[] {
  const found: [Vec, Vec][] = [];
  for (let i = 0; i < ring.length; i++) {
    const a = ring[i];
    const b = ring[(i + 1) % ring.length];
    if (a && b) found.push([a, b]);
  }
  return found;
}

/** Distance from a place to a polygon: 0 inside it. */
export function distanceToPolygon(ring: readonly Vec[], point: Vec): number {
  if (contains(ring, point)) return 0;
  let least = Infinity;
  for (const [a, b] of edges(ring)) least = Math.min(least, distanceToSegment(a, b, point));
  return least;
}

/** Least distance between two polygons: 0 where they touch, cross, or one holds the other; Infinity where one is empty. */
export function distanceBetweenPolygons(p: readonly Vec[], q: readonly Vec[]): number {
  const firstP = p[0];
  const firstQ = q[0];
  if (!firstP || !firstQ) return Infinity;
  if (contains(p, firstQ) || contains(q, firstP)) return 0;
  let least = Infinity;
  for (const [a, b] of edges(p)) {
    for (const [c, d] of edges(q)) least = Math.min(least, distanceBetweenSegments(a, b, c, d));
  }
  return least;
}

/** Distance from a segment to a polygon: 0 where it touches or lies inside. */
export function distanceSegmentToPolygon(ring: readonly Vec[], a: Vec, b: Vec): number {
  if (contains(ring, a) || contains(ring, b)) return 0;
  let least = Infinity;
  for (const [c, d] of edges(ring)) least = Math.min(least, distanceBetweenSegments(a, b, c, d));
  return least;
}

/**
 * How deep two convex polygons run into each other: the least shift that would part them (separating-axis theorem, over
 * the edge normals of both). 0 or less where they touch or stand apart.
 */
export function overlapDepth(p: readonly Vec[], q: readonly Vec[]): number {
  let least = Infinity;
  for (const [a, b] of [...edges(p), ...edges(q)]) {
    const side = sub(b, a);
    const size = Math.hypot(side.x, side.y);
    if (size === 0) continue;
    const axis = perp(side);
    const [minP, maxP] = spread(p, axis);
    const [minQ, maxQ] = spread(q, axis);
    least = Math.min(least, Math.min(maxP - minQ, maxQ - minP) / size);
    if (least <= 0) return least;
  }
  return least === Infinity ? 0 : least;
}

function spread(ring: readonly Vec[], axis: Vec): [number, number] {
  let least = Infinity;
  let most = -Infinity;
  for (const point of ring) {
    const value = dot(point, axis);
    if (value < least) least = value;
    if (value > most) most = value;
  }
  return [least, most];
}

/** The part of a polygon inside a convex, counter-clockwise one (Sutherland–Hodgman); empty where there is none. */
export function clipToConvex(ring: readonly Vec[], convex: readonly Vec[]): readonly Vec[] {
  let kept: readonly Vec[] = ring;
  for (const [a, b] of edges(convex)) {
    const side = sub(b, a);
    const next: Vec[] = [];
    for (const [from, to] of edges(kept)) {
      const before = cross(side, sub(from, a));
      const after = cross(side, sub(to, a));
      if (before >= 0) next.push(from);
      if ((before > 0 && after < 0) || (before < 0 && after > 0)) {
        const part = before / (before - after);
        next.push({ x: from.x + (to.x - from.x) * part, y: from.y + (to.y - from.y) * part });
      }
    }
    kept = next;
  }
  return kept;
}

/** Signed area of a ring in floating point. */
export function floatArea(ring: readonly Vec[]): number {
  const origin = ring[0];
  if (!origin) return 0;
  let twice = 0;
  for (const [a, b] of edges(ring)) twice += cross(sub(a, origin), sub(b, origin));
  return twice / 2;
}
