/** Overlap of convex shapes in plan: points, segments and convex polygons alike. */
import type { Vec } from '../geometry/point';

function spanAlong(points: readonly Vec[], x: number, y: number): [number, number] {
  let least = Infinity;
  let most = -Infinity;
  for (const point of points) {
    const value = point.x * x + point.y * y;
    if (value < least) least = value;
    if (value > most) most = value;
  }
  return [least, most];
}

/** Overlap of both along one direction, in ticks; zero or less when apart. */
function overlapAlong(a: readonly Vec[], b: readonly Vec[], x: number, y: number): number {
  const [aLeast, aMost] = spanAlong(a, x, y);
  const [bLeast, bMost] = spanAlong(b, x, y);
  return Math.min(aMost - bLeast, bMost - aLeast);
}

/**
 * How deep two convex shapes overlap, in ticks: the least move that would part them (separating axes). Zero when they
 * are apart or only touch. Shapes without any length overlap nothing.
 */
export function overlapDepth(a: readonly Vec[], b: readonly Vec[]): number {
  let depth = Infinity;
  for (const shape of [a, b]) {
    for (let i = 0; i < shape.length; i += 1) {
      const from = shape[i];
      const to = shape[(i + 1) % shape.length];
      if (!from || !to) continue;
      const length = Math.hypot(to.x - from.x, to.y - from.y);
      if (length === 0) continue;
      const x = (to.x - from.x) / length;
      const y = (to.y - from.y) / length;
      depth = Math.min(depth, overlapAlong(a, b, -y, x));
      if (depth <= 0) return 0;
      if (shape.length === 2) {
        depth = Math.min(depth, overlapAlong(a, b, x, y));
        if (depth <= 0) return 0;
        break;
      }
    }
  }
  return depth === Infinity ? 0 : depth;
}

/** Things in plan by the square cells that they touch, so that what lies near a place is found without asking all. */
export class CellIndex<T> {
  private readonly cells = new Map<string, Set<T>>();

  /** @param cell side of a cell in ticks, above zero */
  constructor(private readonly cell: number) {}

  add(points: readonly Vec[], item: T): void {
    for (const key of this.keysOf(points)) {
      const there = this.cells.get(key);
      if (there) there.add(item);
      else this.cells.set(key, new Set([item]));
    }
  }

  remove(points: readonly Vec[], item: T): void {
    for (const key of this.keysOf(points)) this.cells.get(key)?.delete(item);
  }

  /** Every item in the cells that these points' box touches, each once, in the order of their adding within a cell. */
  near(points: readonly Vec[]): Set<T> {
    const found = new Set<T>();
    for (const key of this.keysOf(points)) for (const item of this.cells.get(key) ?? []) found.add(item);
    return found;
  }

  private *keysOf(points: readonly Vec[]): Generator<string> {
    const [left, right] = spanAlong(points, 1, 0);
    const [bottom, top] = spanAlong(points, 0, 1);
    if (left > right) return;
    const lastX = Math.floor(right / this.cell);
    const lastY = Math.floor(top / this.cell);
    for (let x = Math.floor(left / this.cell); x <= lastX; x += 1)
      for (let y = Math.floor(bottom / this.cell); y <= lastY; y += 1) yield `${x},${y}`;
  }
}
