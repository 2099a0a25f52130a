/** On which side of a line a point lies, exactly: coordinates reach 1.28e9 ticks, so products pass 2^53. */
import type { PlanPoint } from './point';

/** Two products of exact differences and one subtraction err by less than this part of the sum of the products. */
const ROUNDING = 4 * Number.EPSILON;

/** 1 where `c` lies to the left of the line from `a` to `b`, −1 to the right, 0 on it. Exact for whole ticks. */
export function orientation(a: PlanPoint, b: PlanPoint, c: PlanPoint): -1 | 0 | 1 {
  return crossSign(b.x - a.x, b.y - a.y, c.x - a.x, c.y - a.y);
}

/** The sign of `ax·by − ay·bx` for whole numbers up to 2^52, exactly. */
export function crossSign(ax: number, ay: number, bx: number, by: number): -1 | 0 | 1 {
  const left = ax * by;
  const right = ay * bx;
  const value = left - right;
  if (Math.abs(value) > ROUNDING * (Math.abs(left) + Math.abs(right))) return value > 0 ? 1 : -1;
  const exact = BigInt(ax) * BigInt(by) - BigInt(ay) * BigInt(bx);
  return exact > 0n ? 1 : exact < 0n ? -1 : 0;
}

/** Orders two directions, given as whole numbers, counter-clockwise from +x; 0 where they point the same way. Exact. */
export function compareBearings(ax: number, ay: number, bx: number, by: number): number {
  const halfA = ay < 0 || (ay === 0 && ax < 0) ? 1 : 0;
  const halfB = by < 0 || (by === 0 && bx < 0) ? 1 : 0;
  if (halfA !== halfB) return halfA - halfB;
  return 0 - crossSign(ax, ay, bx, by);
}
