import { memo } from 'react';
import { Circle, G, Path, Rect } from 'react-native-svg';
import type { DimensionShape, Figure, Shape, Tape, TextShape } from '../../model/figures/figure';
import { textBox } from '../../model/figures/text';
import { FigureText } from './FigureText';
import { HATCH_ID } from './Hatch';
import { labelScale } from './labelScale';
import { pathOf } from './paths';
import { figureTextSize, roleStyle, type FigureTheme } from './roleStyle';

interface ShapeProps<S extends Shape = Shape> {
  readonly shape: S;
  readonly scale: number;
  readonly theme: FigureTheme;
  readonly tape: Tape;
}

function Letter({ shape, scale, theme, tape }: ShapeProps<TextShape>) {
  const style = roleStyle(shape.role, shape.emphasis, theme);
  const x = shape.at.x * scale;
  const y = -shape.at.y * scale;
  const size = figureTextSize[shape.size];
  const box = shape.framed ? textBox(shape.text, shape.size, true, labelScale(1), tape) : null;
  return (
    <G>
      {box && (
        <Rect
          x={x - box.width / 2}
          y={y - box.height / 2}
          width={box.width}
          height={box.height}
          rx={3}
          fill={style.fill}
          stroke={style.stroke}
          strokeWidth={style.width}
          strokeDasharray={style.dash}
        />
      )}
      <FigureText
        words={shape.text}
        tape={tape}
        x={x}
        y={y}
        size={size}
        turn={shape.turn}
        anchor={shape.anchor}
        colour={style.text}
      />
    </G>
  );
}

/** Half the length of the slash at a dimension's end, px. */
const SLASH = 5;

function Dimension({ shape, scale, theme, tape }: ShapeProps<DimensionShape>) {
  const style = roleStyle('dimension', shape.emphasis, theme);
  const [x1, y1, x2, y2] = [shape.from.x, -shape.from.y, shape.to.x, -shape.to.y].map((value) => value * scale) as [
    number,
    number,
    number,
    number,
  ];
  const [tx, ty] = [shape.textAt.x * scale, -shape.textAt.y * scale];
  const length = Math.hypot(x2 - x1, y2 - y1);
  if (!(length > 0)) return null;
  const [ux, uy] = [(x2 - x1) / length, (y2 - y1) / length];
  const words = { kind: 'measure', length: shape.length } as const;
  const gap = textBox(words, 'dimension', false, labelScale(1), tape).width / 2 + 5;
  const middle = (tx - x1) * ux + (ty - y1) * uy;
  const along = (far: number) => `${x1 + ux * far} ${y1 + uy * far}`;
  const slash = (x: number, y: number) => {
    // The slash stands at 45° to the line, leaning the way writing leans.
    const [sx, sy] = [(ux + uy) * Math.SQRT1_2 * SLASH, (uy - ux) * Math.SQRT1_2 * SLASH];
    return `M${x - sx} ${y - sy}L${x + sx} ${y + sy}`;
  };
  const path = `M${along(0)}L${along(Math.max(0, middle - gap))}M${along(Math.min(length, middle + gap))}L${along(length)}`;
  return (
    <G>
      <Path d={path} stroke={style.stroke} strokeWidth={style.width} fill="none" strokeDasharray={style.dash} />
      <Path d={slash(x1, y1) + slash(x2, y2)} stroke={style.stroke} strokeWidth={style.width * 1.5} fill="none" />
      <FigureText
        words={words}
        tape={tape}
        x={tx}
        y={ty}
        size={figureTextSize.dimension}
        turn={shape.turn}
        anchor="middle"
        colour={style.text}
      />
    </G>
  );
}

function Outline({ shape, scale, theme }: Omit<ShapeProps, 'tape'>) {
  const style = roleStyle(shape.role, shape.emphasis, theme);
  const closed = shape.kind === 'polygon' || shape.kind === 'boxes';
  const hatched = shape.kind === 'polygon' && shape.hatched === true;
  return (
    <Path
      d={pathOf(shape, scale) ?? ''}
      fill={hatched ? `url(#${HATCH_ID})` : closed ? style.fill : 'none'}
      stroke={style.stroke}
      strokeWidth={style.width}
      strokeDasharray={style.dash}
      strokeLinejoin={shape.role === 'line' ? 'round' : 'miter'}
      strokeLinecap={shape.role === 'face' ? 'square' : 'butt'}
    />
  );
}

function OneShape({ shape, scale, theme, tape }: ShapeProps) {
  switch (shape.kind) {
    case 'text':
      return <Letter shape={shape} scale={scale} theme={theme} tape={tape} />;
    case 'dimension':
      return <Dimension shape={shape} scale={scale} theme={theme} tape={tape} />;
    case 'dot': {
      const style = roleStyle(shape.role, shape.emphasis, theme);
      return (
        <Circle
          cx={shape.at.x * scale}
          cy={-shape.at.y * scale}
          r={shape.size === 'large' ? 6.5 : 4.5}
          fill={style.fill}
          stroke={style.stroke}
          strokeWidth={style.width}
        />
      );
    }
    default:
      return <Outline shape={shape} scale={scale} theme={theme} />;
  }
}

interface Props {
  readonly figure: Figure;
  /** Pixels per tick. */
  readonly scale: number;
  readonly theme: FigureTheme;
}

/** Every shape of a figure around the figure's own origin, to stand in an Svg. Nothing in it takes the pointer. */
export const FigureShapes = memo(function FigureShapes({ figure, scale, theme }: Props) {
  return (
    <G pointerEvents="none">
      {figure.shapes.map((shape, i) => (
        <OneShape key={i} shape={shape} scale={scale} theme={theme} tape={figure.tape} />
      ))}
    </G>
  );
});
