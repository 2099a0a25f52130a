import type { ReactNode } from 'react';
import Svg, { G } from 'react-native-svg';
import type { Figure } from '../../model/figures/figure';
import { useTheme } from '../ui/theme';
import { toScreen, type Camera, type ViewSize } from '../viewport/camera';
import { FigureShapes } from './FigureShapes';
import { Hatch } from './Hatch';

interface Props {
  readonly figure: Figure;
  readonly camera: Camera;
  readonly size: ViewSize;
  /** What the figure shows, read aloud in its stead; without it the figure is hidden from a screen reader. */
  readonly label?: string;
  /** SVG to lie over the figure, in the same pixels. */
  readonly children?: ReactNode;
}

/** A figure seen by a camera, as SVG that never takes the pointer: what is under a finger is found by the model. */
export function FigureView({ figure, camera, size, label, children }: Props) {
  const theme = useTheme();
  const origin = toScreen(camera, size, { x: 0, y: 0 });
  const spoken = label === undefined ? { 'aria-hidden': true } : { role: 'img', 'aria-label': label };
  return (
    <Svg width={size.width} height={size.height} pointerEvents="none" {...(spoken as object)}>
      <Hatch colour={theme.colours.hatch} width={theme.strokes.hair * 0.8} />
      <G transform={`translate(${origin.x} ${origin.y})`}>
        <FigureShapes figure={figure} scale={camera.scale} theme={theme} />
      </G>
      {children}
    </Svg>
  );
}
