/** The camera that shows a whole figure, its labels included, although their size depends on that very camera. */
import type { Box, Figure, LabelScale } from '../../model/figures/figure';
import { joinBounds } from '../../model/figures/overlay';
import { roundTicks, ticks } from '../../model/length/ticks';
import { fitBox, type Camera, type Padding, type ViewSize } from '../viewport/camera';
import { labelScale } from './labelScale';

/** Labels smaller than this in plan take no room to speak of: the first guess is by the drawing alone. */
const NO_LABELS = 1;
const ROUNDS = 10;

/** Makes a figure for labels of a size; where they are placed by a search, inside what is in view. */
export type MakeFigure = (scale: LabelScale, within: Box | null) => Figure;

const NOTHING = { left: ticks(0), bottom: ticks(0), right: ticks(0), top: ticks(0) };

function fitAt(makes: readonly MakeFigure[], scale: LabelScale, size: ViewSize, padding: Padding): Camera {
  const [first, ...others] = makes.map((make) => make(scale, null).bounds);
  return fitBox(first ? others.reduce(joinBounds, first) : NOTHING, size, padding);
}

/** Fits what is drawn, with the padding as room for labels that are placed by a search: they find room or give way. */
export function fitDrawing(makes: readonly MakeFigure[], size: ViewSize, padding: Padding): Camera {
  return fitAt(makes, labelScale(NO_LABELS), size, padding);
}

/** Fits labels and all, by rounds: each takes the labels at the size that the round before arrived at. */
export function fitLabels(makes: readonly MakeFigure[], size: ViewSize, padding: Padding): Camera {
  let camera = fitDrawing(makes, size, padding);
  for (let round = 0; round < ROUNDS; round += 1) {
    const next = fitAt(makes, labelScale(camera.scale), size, padding);
    if (Math.abs(next.scale - camera.scale) < camera.scale * 0.004) return next;
    camera = next;
  }
  return camera;
}

/** What a camera sees, less a margin in pixels. */
export function boxInView(camera: Camera, size: ViewSize, margin: number): Box {
  const wide = (size.width / 2 - margin) / camera.scale;
  const high = (size.height / 2 - margin) / camera.scale;
  return {
    left: roundTicks(camera.x - wide),
    bottom: roundTicks(camera.y - high),
    right: roundTicks(camera.x + wide),
    top: roundTicks(camera.y + high),
  };
}
