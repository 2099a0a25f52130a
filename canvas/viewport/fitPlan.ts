/** The camera that shows a whole plan with its poles, its letters and its dimensions. */
import type { Drawing } from '../../model/drawing/schema';
import type { Box, Figure, LabelScale } from '../../model/figures/figure';
import { ticks } from '../../model/length/ticks';
import type { SetOut } from '../../model/setOut';
import { fitBox, type Camera, type Padding, type ViewSize } from './camera';

export interface FitPlan {
  readonly drawing: Drawing;
  readonly setOut: SetOut;
  readonly size: ViewSize;
  readonly padding: Padding;
  figureAt(scale: LabelScale): Figure;
  labelScale(pixelsPerTick: number): LabelScale;
}

/** What is seen of nothing: thirty feet, where the first corner may go. */
const EMPTY_HALF = 2_900_000;

/** The walls with their poles and braces: what must be seen. Areas may lie far off. */
export function groundBox(drawing: Drawing, setOut: SetOut): Box | null {
  let left = Infinity;
  let bottom = Infinity;
  let right = -Infinity;
  let top = -Infinity;
  const take = ({ x, y }: { readonly x: number; readonly y: number }): void => {
    left = Math.min(left, x);
    right = Math.max(right, x);
    bottom = Math.min(bottom, y);
    top = Math.max(top, y);
  };
  drawing.corners.forEach(take);
  setOut.poles.poles.forEach((pole) => pole.braces.forEach((brace) => take(brace.foot)));
  if (drawing.corners.length === 0) drawing.keepClears.forEach((area) => area.points.forEach(take));
  return left > right ? null : { left: ticks(left), bottom: ticks(bottom), right: ticks(right), top: ticks(top) };
}

/** Labels are sized on the screen, so how much room they take is known only at a scale: a few looks settle it. */
export function fitPlan({ drawing, setOut, size, padding, figureAt, labelScale }: FitPlan): Camera {
  const ground = groundBox(drawing, setOut);
  if (!ground) {
    const empty = {
      left: ticks(-EMPTY_HALF),
      bottom: ticks(-EMPTY_HALF),
      right: ticks(EMPTY_HALF),
      top: ticks(EMPTY_HALF),
    };
    return fitBox(empty, size, padding);
  }
  let camera = fitBox(ground, size, padding);
  for (let look = 0; look < 4; look += 1) camera = fitBox(figureAt(labelScale(camera.scale)).bounds, size, padding);
  return camera;
}
