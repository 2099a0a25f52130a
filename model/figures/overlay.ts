/** Two plans in one: the earlier one pale underneath, the later one over it. */
import type { Box, Figure, Role, Shape } from './figure';

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
  const keyOf = ({ thing }: Shape) => (thing ? `${thing.kind} ${thing.id}` : '');
  const still = new Set(after.shapes.map(keyOf));
  // What is gone stays as strong as what is new; what only moved is pale where it was.
  const under = before.shapes
    .filter((shape) => UNDER.has(shape.role))
    .map((shape): Shape => (still.has(keyOf(shape)) ? { ...shape, emphasis: 'quiet' } : shape));
  return { ...after, bounds: joinBounds(before.bounds, after.bounds), shapes: [...under, ...after.shapes] };
}
