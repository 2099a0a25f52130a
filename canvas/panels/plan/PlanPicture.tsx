import { memo } from 'react';
import type { Figure } from '../../../model/figures/figure';
import { FigureView } from '../../figures/FigureView';
import type { Camera, ViewSize } from '../../viewport/camera';

/** The plan as drawn for one camera: the same figure is never drawn twice. */
export const PlanPicture = memo(function PlanPicture(props: { figure: Figure; camera: Camera; size: ViewSize }) {
  return <FigureView figure={props.figure} camera={props.camera} size={props.size} />;
});
