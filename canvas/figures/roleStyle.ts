/** How each role of a figure looks on screen, from the theme: fill, stroke, dash and weight, never colour alone. */
import type { Emphasis, Role, TextSize } from '../../model/figures/figure';
import type { Colours, Strokes } from '../ui/tokens';

export interface FigureTheme {
  readonly colours: Colours;
  readonly strokes: Strokes;
}

export interface RoleStyle {
  /** Fill of closed shapes; `none` for outlines. */
  readonly fill: string;
  readonly stroke: string;
  /** Pixels, whatever the figure's scale. */
  readonly width: number;
  readonly dash?: string;
  /** Colour of text. */
  readonly text: string;
}

/** Pixel height of each text size on screen. */
export const figureTextSize: Readonly<Record<TextSize, number>> = { small: 13, label: 14, dimension: 16, letter: 16 };

const NONE = 'none';

function plainStyle(role: Role, { colours, strokes }: FigureTheme): RoleStyle {
  const text = colours.ink;
  switch (role) {
    case 'face':
      return { fill: NONE, stroke: colours.ink, width: strokes.normal, text };
    case 'body':
    case 'unit':
    case 'return':
      return {
        fill: colours.earth,
        stroke: role === 'body' ? NONE : colours.earthDeep,
        width: strokes.hair * 0.5,
        text,
      };
    case 'closer':
      return { fill: colours.selected, stroke: colours.earthDeep, width: strokes.hair * 0.5, text };
    case 'joint':
      return { fill: colours.rule, stroke: colours.earthDeep, width: strokes.hair * 0.7, text };
    case 'frame':
      return { fill: colours.frame, stroke: colours.frame, width: strokes.thin, text: colours.frame };
    case 'opening':
      return { fill: colours.surface, stroke: NONE, width: strokes.hair, text };
    case 'swing':
      return { fill: NONE, stroke: colours.frame, width: strokes.hair, text };
    case 'way':
      return { fill: NONE, stroke: colours.hatch, width: strokes.hair, dash: '4 3', text };
    case 'keep-clear':
      return { fill: NONE, stroke: colours.caution, width: strokes.hair, dash: '2 3', text: colours.caution };
    case 'boundary':
      return { fill: NONE, stroke: colours.inkSoft, width: strokes.hair, dash: '12 4 2 4', text };
    case 'line':
      return { fill: NONE, stroke: colours.line, width: strokes.thin, text: colours.line };
    case 'pole':
      return { fill: colours.steel, stroke: colours.steel, width: strokes.normal, text };
    case 'brace':
      return { fill: NONE, stroke: colours.steel, width: strokes.thin, dash: '7 4', text: colours.steel };
    case 'foot':
      return { fill: colours.surface, stroke: colours.steel, width: strokes.thin, text };
    case 'mark':
      return { fill: NONE, stroke: colours.line, width: strokes.thin, text };
    case 'mark-main':
      return { fill: NONE, stroke: colours.line, width: strokes.heavy, text: colours.line };
    case 'level-line':
      return {
        fill: NONE,
        stroke: colours.levelLine,
        width: strokes.normal,
        dash: '10 4 2 4',
        text: colours.levelLine,
      };
    case 'ground':
      return { fill: NONE, stroke: colours.ink, width: strokes.normal, text };
    case 'concrete':
      return { fill: colours.concrete, stroke: colours.ink, width: strokes.hair, text };
    case 'lintel':
      return { fill: colours.frame, stroke: colours.frame, width: strokes.hair, text };
    case 'dimension':
      return { fill: NONE, stroke: colours.inkSoft, width: strokes.hair, text };
    case 'letter':
      return { fill: colours.surface, stroke: colours.steel, width: strokes.thin, text };
    case 'caution':
      return { fill: colours.cautionTint, stroke: colours.caution, width: strokes.thin, text: colours.caution };
    case 'note':
      return { fill: colours.surface, stroke: colours.ink, width: strokes.hair, text };
  }
}

/** Selected things are solid and heavy, differing ones heavy and broken in long dashes, the others as they are. */
export function roleStyle(role: Role, emphasis: Emphasis | undefined, theme: FigureTheme): RoleStyle {
  const style = plainStyle(role, theme);
  const { colours } = theme;
  switch (emphasis) {
    case 'selected':
      if (role === 'letter') return { ...style, fill: colours.steel, stroke: colours.steel, text: colours.surface };
      if (role === 'body') return { ...style, stroke: colours.earthDeep, width: theme.strokes.heavy };
      if (role === 'way') return style;
      return { ...style, width: style.width * 1.6, dash: undefined };
    case 'differs':
      if (role === 'letter' || role === 'note')
        return { ...style, fill: colours.caution, stroke: colours.caution, text: colours.surface };
      if (role === 'opening') return { ...style, stroke: colours.caution, width: theme.strokes.normal, dash: '3 3' };
      if (role === 'way') return { ...style, stroke: colours.caution };
      if (role === 'frame' || role === 'lintel') return { ...style, fill: colours.caution, stroke: colours.caution };
      return { ...style, stroke: colours.caution, width: style.width * 1.6, dash: '6 3' };
    case 'quiet':
      // The far leg of a steel angle, lighter than the near one.
      if (role === 'pole') return { ...style, fill: colours.steelLight, stroke: NONE };
      return { ...style, stroke: style.stroke === NONE ? NONE : colours.rule, text: colours.inkSoft };
    default:
      return style;
  }
}
