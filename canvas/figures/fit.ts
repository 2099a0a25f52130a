/** The camera that shows a whole figure, its labels included, although their size depends on that very camera. */
import type { Figure, LabelScale } from '../../model/figures/figure';
import { joinBounds } from '../../model/figures/overlay';
import { ticks } from '../../model/length/ticks';
import { fitBox, type Camera, type Padding, type ViewSize } from '../viewport/camera';
import { labelScale } from './labelScale';

/** Labels smaller than this in plan take no room to speak of: the first guess is by the drawing alone. */
const NO_LABELS = 1;
const ROUNDS = 4;

export type MakeFigure = (scale: LabelScale) => Figure;

/** Fits by rounds: each takes the labels at the size that the round before arrived at, and they settle quickly. */
export function fitFigures(makes: readonly MakeFigure[], size: ViewSize, padding: Padding): Camera {
  const fitAt = (scale: LabelScale) => {
    const [first, ...others] = makes.map((make) => make(scale).bounds);
    return fitBox(first ? others.reduce(joinBounds, first) : NOTHING, size, padding);
  };
  let camera = fitAt(labelScale(NO_LABELS));
  for (let round = 0; round < ROUNDS; round += 1) {
    const next = fitAt(labelScale(camera.scale));
    if (Math.abs(next.scale - camera.scale) < camera.scale * 0.01) return next;
    camera = next;
  }
  return camera;
}

const NOTHING = { left: ticks(0), bottom: ticks(0), right: ticks(0), top: ticks(0) };
