/** Two plans in one: the earlier one pale underneath, the later one over it. */
import type { Box, Figure, Role } from './figure';

/** Of the earlier plan only what is built is shown: its words would only stand in the way of the later one's. */
const UNDER: ReadonlySet<Role> = new Set(['face', 'frame', 'swing', 'pole', 'brace', 'foot', 'keep-clear', 'boundary']);

/** The box around both. */
export function joinBounds(a: Box, b: Box): Box {
  return {
    left: a.left < b.left ? a.left : b.left,
    bottom: a.bottom < b.bottom ? a.bottom : b.bottom,
    right: a.right > b.right ? a.right : b.right,
    top: a.top > b.top ? a.top : b.top,
  };
}

export function overlayFigure(before: Figure, after: Figure): Figure {
  const under = before.shapes
    .filter((shape) => UNDER.has(shape.role))
    .map((shape) => ({ ...shape, emphasis: shape.emphasis === 'differs' ? ('differs' as const) : ('quiet' as const) }));
  return { ...after, bounds: joinBounds(before.bounds, after.bounds), shapes: [...under, ...after.shapes] };
}
