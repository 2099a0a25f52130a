/** Sizes of texts in a figure, in ticks, at a scale of the screen. */
import type { LabelScale } from '../../model/figures/figure';
import { figureTextSize } from './roleStyle';

/** Mean advance of Barlow Condensed semibold's figures and capitals, as a part of the text's height. */
const ADVANCE = 0.46;
const CLEAR = 4;

/** @param pixelsPerTick above zero */
export function labelScale(pixelsPerTick: number): LabelScale {
  return {
    textHeight: {
      small: figureTextSize.small / pixelsPerTick,
      label: figureTextSize.label / pixelsPerTick,
      dimension: figureTextSize.dimension / pixelsPerTick,
      letter: figureTextSize.letter / pixelsPerTick,
    },
    advance: ADVANCE,
    clear: CLEAR / pixelsPerTick,
  };
}
