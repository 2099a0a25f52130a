/** Where the numbers ride so that the pointer never covers them. */
import type { PointerKind } from '../../input/events';
import type { ViewSize } from '../../viewport/camera';

/** How far above the pointer they ride, in pixels: a finger hides more than a mouse. */
const CLEAR: Readonly<Record<PointerKind, number>> = { touch: 64, pen: 40, mouse: 28 };
const WIDTH = 260;
const HEIGHT = 38;

export interface ChipPlace {
  readonly left: number;
  readonly top: number;
  readonly width: number;
}

/** Above the pointer; beside it where there is no room above; always inside the view. */
export function chipPlace(
  at: { readonly x: number; readonly y: number },
  pointer: PointerKind,
  size: ViewSize,
): ChipPlace {
  const width = Math.min(WIDTH, size.width);
  const clear = CLEAR[pointer];
  const inside = (left: number) => Math.max(0, Math.min(size.width - width, left));
  const above = at.y - clear - HEIGHT;
  if (above >= 4) return { left: inside(at.x - width / 2), top: above, width };
  const toRight = at.x < size.width / 2;
  const left = inside(toRight ? at.x + clear : at.x - clear - width);
  return { left, top: Math.max(4, at.y - HEIGHT / 2), width };
}
