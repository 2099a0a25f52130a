import type { Vec } from '../geometry/point';

/**
 * The points of `shape` turned and shifted, without stretching, to lie as near as can be to those of `onto` in the sum of
 * squares over the points for which `counts` says so: the closed form of the plane's orthogonal Procrustes problem, tan of the
 * turn = Σ cross / Σ dot about the two means. Both lists in the same order; the turn is none where it is not defined.
 */
export function alignShape(
  shape: readonly Vec[],
  onto: readonly Vec[],
  counts: (index: number) => boolean = () => true,
): readonly Vec[] {
  const pairs = shape.flatMap((from, i) => (counts(i) ? [{ from, to: onto[i]! }] : []));
  const n = Math.max(1, pairs.length);
  const [fx, fy, tx, ty] = pairs.reduce(
    ([a, b, c, d], { from, to }) => [a + from.x / n, b + from.y / n, c + to.x / n, d + to.y / n],
    [0, 0, 0, 0],
  ) as [number, number, number, number];
  let [dot, cross] = [0, 0];
  for (const { from, to } of pairs) {
    const [ax, ay, bx, by] = [from.x - fx, from.y - fy, to.x - tx, to.y - ty];
    dot += ax * bx + ay * by;
    cross += ax * by - ay * bx;
  }
  const size = Math.hypot(dot, cross);
  const [cos, sin] = size === 0 ? [1, 0] : [dot / size, cross / size];
  return shape.map(({ x, y }) => ({
    x: tx + cos * (x - fx) - sin * (y - fy),
    y: ty + sin * (x - fx) + cos * (y - fy),
  }));
}
