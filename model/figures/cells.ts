/** An index that things can be added to and taken out of again, by the cells that they touch. */
import { boxOf } from '../geometry/box';
import type { Vec } from '../geometry/point';

/** One number for a cell. Cells too far out to be told apart only bring more to look at, never less. */
function keyOf(x: number, y: number): number {
  return x * 67_108_864 + y;
}

/** Things in plan by the square cells that they touch, so that what lies near a place is found without asking all. */
export class CellIndex<T> {
  private readonly cells = new Map<number, Set<T>>();

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

  private *keysOf(points: readonly Vec[]): Generator<number> {
    const box = boxOf(points);
    if (!box) return;
    const lastX = Math.floor(box.maxX / this.cell);
    const lastY = Math.floor(box.maxY / this.cell);
    for (let x = Math.floor(box.minX / this.cell); x <= lastX; x += 1)
      for (let y = Math.floor(box.minY / this.cell); y <= lastY; y += 1) yield keyOf(x, y);
  }
}
