/** The camera that shows a whole figure, its labels included, although their size depends on that very camera. */
import type { Figure, LabelScale } from '../../model/figures/figure';
import { fitBox, type Camera, type Padding, type ViewSize } from '../viewport/camera';
import { labelScale } from './labelScale';

/** Labels smaller than this in plan take no room to speak of: the first guess is by the drawing alone. */
const NO_LABELS = 1;
const ROUNDS = 4;

/** Fits by rounds: each takes the labels at the size that the round before arrived at, and they settle quickly. */
export function fitFigure(make: (scale: LabelScale) => Figure, size: ViewSize, padding: Padding): Camera {
  let camera = fitBox(make(labelScale(NO_LABELS)).bounds, size, padding);
  for (let round = 0; round < ROUNDS; round += 1) {
    const next = fitBox(make(labelScale(camera.scale)).bounds, size, padding);
    if (Math.abs(next.scale - camera.scale) < camera.scale * 0.01) return next;
    camera = next;
  }
  return camera;
}
