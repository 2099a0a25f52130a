/** Arithmetic of directions and places in floating point; nothing here changes its arguments. */
import { roundTicks } from '../length/ticks';
import type { PlanPoint, Vec } from './point';

export function add(a: Vec, b: Vec): Vec {
  return { x: a.x + b.x, y: a.y + b.y };
}

/** From `b` to `a`. */
export function sub(a: Vec, b: Vec): Vec {
  return { x: a.x - b.x, y: a.y - b.y };
}

export function scale(a: Vec, factor: number): Vec {
  return { x: a.x * factor, y: a.y * factor };
}

/** `a + direction × distance`. */
export function along(a: Vec, direction: Vec, distance: number): Vec {
  return { x: a.x + direction.x * distance, y: a.y + direction.y * distance };
}

export function dot(a: Vec, b: Vec): number {
  return a.x * b.x + a.y * b.y;
}

/** Positive where `b` lies to the left of `a`. */
export function cross(a: Vec, b: Vec): number {
  return a.x * b.y - a.y * b.x;
}

export function length(a: Vec): number {
  return Math.hypot(a.x, a.y);
}

export function distance(a: Vec, b: Vec): number {
  return Math.hypot(b.x - a.x, b.y - a.y);
}

/** Length 1 in the same direction; the zero vector stays zero. Axis-aligned directions come out exact. */
export function unit(a: Vec): Vec {
  const size = length(a);
  return size === 0 ? { x: 0, y: 0 } : { x: a.x / size, y: a.y / size };
}

/** A quarter turn counter-clockwise: the left-hand side of a direction. */
export function perp(a: Vec): Vec {
  return { x: 0 - a.y, y: a.x };
}

export function negate(a: Vec): Vec {
  return { x: 0 - a.x, y: 0 - a.y };
}

/** Part way from `a` (0) to `b` (1). */
export function between(a: Vec, b: Vec, part: number): Vec {
  return { x: a.x + (b.x - a.x) * part, y: a.y + (b.y - a.y) * part };
}

/** Back to whole ticks, each coordinate rounded once. */
export function toPoint(a: Vec): PlanPoint {
  return { x: roundTicks(a.x), y: roundTicks(a.y) };
}

/** Degrees counter-clockwise from +x, from 0 up to but not including 360. */
export function bearing(a: Vec): number {
  const degrees = (Math.atan2(a.y, a.x) * 180) / Math.PI;
  return degrees < 0 ? (degrees + 360) % 360 : degrees;
}

/** Length 1 in the direction of a bearing in degrees; the four quarter turns come out exact. */
export function fromBearing(degrees: number): Vec {
  const turned = ((degrees % 360) + 360) % 360;
  if (turned % 90 === 0) {
    const quarter = turned / 90;
    return { x: [1, 0, -1, 0][quarter] ?? 1, y: [0, 1, 0, -1][quarter] ?? 0 };
  }
  const radians = (turned * Math.PI) / 180;
  return { x: Math.cos(radians), y: Math.sin(radians) };
}

export function samePoint(a: Vec, b: Vec): boolean {
  return a.x === b.x && a.y === b.y;
}
