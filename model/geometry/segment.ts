/** Segments between plan points: where they meet, exactly, and how far apart they are. */
import { boxesMeet, boxOfSegment } from './box';
import { orientation } from './orientation';
import type { PlanPoint, Vec } from './point';
import { between, cross, distance, dot, sub } from './vec';

export interface Segment {
  readonly a: PlanPoint;
  readonly b: PlanPoint;
}

/**
 * How two segments meet. `cross`: each passes through the other. `touch`: an end of one lies on the other.
 * `overlap`: they share a stretch of some length. The kind is exact; `at` is in floating point.
 */
export type Meeting =
  | { readonly kind: 'apart' }
  | { readonly kind: 'cross'; readonly at: Vec }
  | { readonly kind: 'touch'; readonly at: PlanPoint }
  | { readonly kind: 'overlap'; readonly from: PlanPoint; readonly to: PlanPoint };

const APART: Meeting = { kind: 'apart' };

function isBetween(a: PlanPoint, b: PlanPoint, point: PlanPoint): boolean {
  return (
    point.x >= Math.min(a.x, b.x) &&
    point.x <= Math.max(a.x, b.x) &&
    point.y >= Math.min(a.y, b.y) &&
    point.y <= Math.max(a.y, b.y)
  );
}

/** Whether `point` lies on the segment from `a` to `b`, ends included. Exact. */
export function isOnSegment(a: PlanPoint, b: PlanPoint, point: PlanPoint): boolean {
  return isBetween(a, b, point) && orientation(a, b, point) === 0;
}

function meetInLine(p: Segment, q: Segment): Meeting {
  // Along one line a point's order is that of its larger-spread coordinate; ties by the other keep points in order.
  const order = (a: PlanPoint, b: PlanPoint): number => a.x - b.x || a.y - b.y;
  const [p1, p2] = order(p.a, p.b) <= 0 ? [p.a, p.b] : [p.b, p.a];
  const [q1, q2] = order(q.a, q.b) <= 0 ? [q.a, q.b] : [q.b, q.a];
  const from = order(p1, q1) >= 0 ? p1 : q1;
  const to = order(p2, q2) <= 0 ? p2 : q2;
  const left = order(from, to);
  if (left > 0) return APART;
  return left === 0 ? { kind: 'touch', at: from } : { kind: 'overlap', from, to };
}

/** How segments `p` and `q` meet. Segments of no length are points. */
export function meetSegments(p: Segment, q: Segment): Meeting {
  if (!boxesMeet(boxOfSegment(p.a, p.b), boxOfSegment(q.a, q.b))) return APART;
  const a = orientation(p.a, p.b, q.a);
  const b = orientation(p.a, p.b, q.b);
  const c = orientation(q.a, q.b, p.a);
  const d = orientation(q.a, q.b, p.b);
  if (a === 0 && b === 0 && c === 0 && d === 0) return meetInLine(p, q);
  if (a === 0 && isBetween(p.a, p.b, q.a)) return { kind: 'touch', at: q.a };
  if (b === 0 && isBetween(p.a, p.b, q.b)) return { kind: 'touch', at: q.b };
  if (c === 0 && isBetween(q.a, q.b, p.a)) return { kind: 'touch', at: p.a };
  if (d === 0 && isBetween(q.a, q.b, p.b)) return { kind: 'touch', at: p.b };
  if (a * b < 0 && c * d < 0) {
    const along = sub(p.b, p.a);
    const other = sub(q.b, q.a);
    const part = cross(sub(q.a, p.a), other) / cross(along, other);
    return { kind: 'cross', at: between(p.a, p.b, part) };
  }
  return APART;
}

/** Where `point` falls square on the line from `a` to `b`: 0 at `a`, 1 at `b`; 0 where the line has no length. */
export function partAlong(a: Vec, b: Vec, point: Vec): number {
  const line = sub(b, a);
  const size = dot(line, line);
  return size === 0 ? 0 : dot(sub(point, a), line) / size;
}

/** The point of the segment nearest to `point`. */
function nearestOnSegment(a: Vec, b: Vec, point: Vec): Vec {
  return between(a, b, Math.min(1, Math.max(0, partAlong(a, b, point))));
}

export function distanceToSegment(a: Vec, b: Vec, point: Vec): number {
  return distance(point, nearestOnSegment(a, b, point));
}

/** Least distance between two segments; 0 where they cross or touch. */
export function distanceBetweenSegments(a: Vec, b: Vec, c: Vec, d: Vec): number {
  if (crossInFloat(a, b, c, d)) return 0;
  return Math.min(
    distanceToSegment(a, b, c),
    distanceToSegment(a, b, d),
    distanceToSegment(c, d, a),
    distanceToSegment(c, d, b),
  );
}

function crossInFloat(a: Vec, b: Vec, c: Vec, d: Vec): boolean {
  const along = sub(b, a);
  const other = sub(d, c);
  const sides = cross(along, sub(c, a)) * cross(along, sub(d, a));
  return sides < 0 && cross(other, sub(a, c)) * cross(other, sub(b, c)) < 0;
}

/** Where two lines, each through a point in a direction, cross; null where they are parallel. */
export function meetLines(a: Vec, alongA: Vec, b: Vec, alongB: Vec): Vec | null {
  const turn = cross(alongA, alongB);
  if (turn === 0) return null;
  const by = cross(sub(b, a), alongB) / turn;
  return { x: a.x + alongA.x * by, y: a.y + alongA.y * by };
}
