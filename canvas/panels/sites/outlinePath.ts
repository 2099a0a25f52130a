import type { PlanPoint } from '../../../model/geometry/point';

const MARGIN = 0.13;

function round(pixels: number): number {
  return Math.round(pixels * 10) / 10;
}

/** Outlines of walls (in ticks, y up) fitted into a square of `size` px as SVG path data, y down; null where there are none. */
export function outlinePath(outlines: readonly (readonly PlanPoint[])[], size: number): string | null {
  let [left, right, bottom, top] = [Infinity, -Infinity, Infinity, -Infinity];
  for (const outline of outlines) {
    for (const { x, y } of outline) {
      left = Math.min(left, x);
      right = Math.max(right, x);
      bottom = Math.min(bottom, y);
      top = Math.max(top, y);
    }
  }
  const span = Math.max(right - left, top - bottom);
  if (!(span > 0)) return null;
  const scale = (size * (1 - 2 * MARGIN)) / span;
  const px = (x: number) => round(size / 2 + (x - (left + right) / 2) * scale);
  const py = (y: number) => round(size / 2 - (y - (bottom + top) / 2) * scale);
  return outlines
    .filter((outline) => outline.length > 1)
    .map((outline) => `M${outline.map(({ x, y }) => `${px(x)} ${py(y)}`).join('L')}Z`)
    .join('');
}
