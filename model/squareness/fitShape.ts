/** The shape that taped lengths make, by least squares. */
import type { Vec } from '../geometry/point';
import { factor, solveWith } from './solveSymmetric';

/** One length between two points, by their places in the list. */
export interface Length {
  readonly a: number;
  readonly b: number;
  readonly length: number;
}

export interface FittedShape {
  readonly points: readonly Vec[];
  /** Fitted less given, for each length. */
  readonly residuals: readonly number[];
  /** Redundancy numbers, 0 to 1: the diagonal of I − A N⁻¹ Aᵀ. Their sum is the count of spare lengths. */
  readonly checked: readonly number[];
}

/** From a drawing a few hundredths out, three steps reach the rounding of the numbers; the rest are for worse. */
const STEPS = 12;
const DAMPING = 1e-10;

/**
 * Gauss-Newton from the given points, a fixed number of steps. Lengths fix a shape but neither place nor turn, so the
 * three free motions are held by inner constraints (no mean shift, no mean turn); what the lengths leave open keeps
 * as near to the start as it can by a slight damping of each step, which a shape that is fixed does not feel: where a step
 * vanishes, so does its damping. A step is never longer than the shape is wide, and two points in one place
 * give no direction, so that any input ends in finite numbers. Work: steps × n³ for n points.
 */
export function fitShape(start: readonly Vec[], lengths: readonly Length[]): FittedShape {
  const points = start.map(({ x, y }) => ({ x, y }));
  const size = points.reduce((most, { x, y }) => Math.max(most, Math.hypot(x, y)), 0);
  for (let step = 0; step < STEPS; step++) {
    const rows = directions(points, lengths);
    const lower = factor(normal(points, rows));
    const right = new Float64Array(2 * points.length);
    lengths.forEach(({ a, b, length }, i) => {
      const row = rows[i]!;
      const misses = length - row.length;
      right[2 * a]! -= row.x * misses;
      right[2 * a + 1]! -= row.y * misses;
      right[2 * b]! += row.x * misses;
      right[2 * b + 1]! += row.y * misses;
    });
    const move = solveWith(lower, right);
    const longest = move.reduce((most, part) => Math.max(most, Math.abs(part)), 0);
    const shrink = longest > size ? size / longest : 1;
    points.forEach((point, i) => {
      point.x += shrink * move[2 * i]!;
      point.y += shrink * move[2 * i + 1]!;
    });
  }
  const rows = directions(points, lengths);
  const lower = factor(normal(points, rows));
  const checked = lengths.map(({ a, b }, i) => {
    const row = rows[i]!;
    const column = new Float64Array(2 * points.length);
    column[2 * a]! -= row.x;
    column[2 * a + 1]! -= row.y;
    column[2 * b]! += row.x;
    column[2 * b + 1]! += row.y;
    const x = solveWith(lower, column);
    const part = row.x * (x[2 * b]! - x[2 * a]!) + row.y * (x[2 * b + 1]! - x[2 * a + 1]!);
    return Math.min(1, Math.max(0, 1 - part));
  });
  return { points, residuals: lengths.map(({ length }, i) => rows[i]!.length - length), checked };
}

interface Direction extends Vec {
  readonly a: number;
  readonly b: number;
  readonly length: number;
}

function directions(points: readonly Vec[], lengths: readonly Length[]): readonly Direction[] {
  return lengths.map(({ a, b }) => {
    const [p, q] = [points[a]!, points[b]!];
    const length = Math.hypot(q.x - p.x, q.y - p.y);
    return length === 0
      ? { a, b, x: 0, y: 0, length }
      : { a, b, x: (q.x - p.x) / length, y: (q.y - p.y) / length, length };
  });
}

/** Normal matrix of the lengths with the three free motions and the damping added. */
function normal(points: readonly Vec[], rows: readonly Direction[]): Float64Array[] {
  const n = points.length;
  const matrix = Array.from({ length: 2 * n }, () => new Float64Array(2 * n));
  for (const { a, b, x, y } of rows) {
    for (const [i, si] of [
      [a, -1],
      [b, 1],
    ] as const) {
      for (const [j, sj] of [
        [a, -1],
        [b, 1],
      ] as const) {
        const sign = si * sj;
        matrix[2 * i]![2 * j]! += sign * x * x;
        matrix[2 * i]![2 * j + 1]! += sign * x * y;
        matrix[2 * i + 1]![2 * j]! += sign * x * y;
        matrix[2 * i + 1]![2 * j + 1]! += sign * y * y;
      }
    }
  }
  const middle = points.reduce((sum, { x, y }) => ({ x: sum.x + x / n, y: sum.y + y / n }), { x: 0, y: 0 });
  const turn = points.flatMap(({ x, y }) => [-(y - middle.y), x - middle.x]);
  const turned = turn.reduce((sum, part) => sum + part * part, 0);
  for (let i = 0; i < 2 * n; i++) {
    for (let j = 0; j < 2 * n; j++) {
      const shift = i % 2 === j % 2 ? 1 / n : 0;
      matrix[i]![j]! += shift + (turned > 0 ? (turn[i]! * turn[j]!) / turned : 0);
    }
    matrix[i]![i]! += DAMPING;
  }
  return matrix;
}
