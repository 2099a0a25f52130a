/**
 * Plane arithmetic that only poles and braces need. Every formula is the same, term by term, after a quarter-turn or a
 * mirroring, so that a building turned or mirrored gets the same answer.
 */
import type { PlanPoint, Vec } from '../geometry/point';
import { contains, edges, whereIs } from '../geometry/polygon';
import { cross, dot, sub } from '../geometry/vec';
import { roundTicks, type Ticks } from '../length/ticks';

const RADIANS = Math.PI / 180;
const COSINES = Array.from({ length: 181 }, (_, degrees) => Math.cos(degrees * RADIANS));
const SINES = Array.from({ length: 181 }, (_, degrees) => Math.sin(degrees * RADIANS));

/** `v` turned counter-clockwise by degrees. */
export function turn(v: Vec, degrees: number): Vec {
  const size = Math.abs(degrees);
  const c = COSINES[size] ?? Math.cos(size * RADIANS);
  const sine = SINES[size] ?? Math.sin(size * RADIANS);
  const s = degrees < 0 ? -sine : sine;
  return { x: v.x * c - v.y * s, y: v.x * s + v.y * c };
}

/** `from` and then each vector × length, the sum rounded once to ticks. */
export function stepFrom(from: PlanPoint, ...steps: readonly (readonly [Vec, number])[]): PlanPoint {
  let x = 0;
  let y = 0;
  for (const [v, length] of steps) {
    x += v.x * length;
    y += v.y * length;
  }
  return { x: (from.x + roundTicks(x)) as Ticks, y: (from.y + roundTicks(y)) as Ticks };
}

/** Degrees between two directions, 0 to 180. */
export function degreesBetween(a: Vec, b: Vec): number {
  return (Math.atan2(Math.abs(cross(a, b)), dot(a, b)) * 180) / Math.PI;
}

/** Parts of a segment shorter than this share of it count as a touch. */
const TOUCH = 1e-9;

/** The parts of a segment inside a polygon, as fractions of its length in order; none where it only touches an edge. */
export function partsInside(a: PlanPoint, b: PlanPoint, ring: readonly PlanPoint[]): [number, number][] {
  const ab = sub(b, a);
  const cuts = [0, 1];
  for (const [c, d] of edges(ring)) {
    const cd = sub(d, c);
    const ac = sub(c, a);
    const sine = cross(ab, cd);
    if (sine === 0) continue;
    const t = cross(ac, cd) / sine;
    const u = cross(ac, ab) / sine;
    if (t > 0 && t < 1 && u >= -TOUCH && u <= 1 + TOUCH) cuts.push(t);
  }
  cuts.sort((x, y) => x - y);
  const parts: [number, number][] = [];
  for (let i = 1; i < cuts.length; i += 1) {
    const from = cuts[i - 1] ?? 0;
    const to = cuts[i] ?? 1;
    if (to - from > TOUCH && isWithin(a, ab, (from + to) / 2, ring)) parts.push([from, to]);
  }
  return parts;
}

/** Inside, and off every edge: a segment that runs along an edge is not inside. */
function isWithin(a: PlanPoint, ab: Vec, part: number, ring: readonly PlanPoint[]): boolean {
  const middle = { x: a.x + ab.x * part, y: a.y + ab.y * part };
  if (!contains(ring, middle)) return false;
  return edges(ring).every(([c, d]) => {
    const cd = sub(d, c);
    const size = Math.hypot(cd.x, cd.y);
    return size === 0 || cross(ab, cd) !== 0 || Math.abs(cross(cd, sub(middle, c))) > size * 0.5;
  });
}

/** True where the rings share more than an edge. */
export function ringsOverlap(p: readonly PlanPoint[], q: readonly PlanPoint[]): boolean {
  const enters = (from: readonly PlanPoint[], into: readonly PlanPoint[]) =>
    from.some((a, i) => {
      const b = from[(i + 1) % from.length];
      return whereIs(into, a) === 'inside' || (b !== undefined && partsInside(a, b, into).length > 0);
    });
  return enters(p, q) || enters(q, p);
}
