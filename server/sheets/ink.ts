/** How each role of a figure looks on paper: dark ink on white, told apart by line as well as by colour. */
import type { Emphasis, LabelScale, Role, TextSize } from '../../model/figures/figure';

export interface Ink {
  readonly fill: string | null;
  readonly stroke: string | null;
  /** Points. */
  readonly width: number;
  readonly dash: readonly number[] | null;
  readonly text: string;
}

export const colours = {
  ink: '#1B1815',
  soft: '#5E564B',
  rule: '#BDB3A2',
  earth: '#EBD6B9',
  mortar: '#F6F1E7',
  earthDeep: '#8A4B1F',
  line: '#C2185B',
  levelLine: '#1E5A9C',
  frame: '#5B6B2F',
  steel: '#3B4754',
  steelLight: '#6B7681',
  concrete: '#D5D0CA',
  hatch: '#A9A283',
  caution: '#A34700',
  pale: '#EFEBE4',
  white: '#FFFFFF',
} as const;

/** Heights of texts on paper, points. */
export const paperTextSize: Readonly<Record<TextSize, number>> = { small: 7.5, label: 9, dimension: 9, letter: 11 };

/** Sizes of texts in ticks at a scale of the paper. */
export function paperLabelScale(pointsPerTick: number): LabelScale {
  return {
    textHeight: {
      small: paperTextSize.small / pointsPerTick,
      label: paperTextSize.label / pointsPerTick,
      dimension: paperTextSize.dimension / pointsPerTick,
      letter: paperTextSize.letter / pointsPerTick,
    },
    advance: 0.46,
    clear: 2.5 / pointsPerTick,
  };
}

const { ink } = colours;
const filled = (fill: string, stroke: string | null, width: number): Ink => ({
  fill,
  stroke,
  width,
  dash: null,
  text: ink,
});
const lined = (stroke: string, width: number, dash: readonly number[] | null = null, text: string = ink): Ink => ({
  fill: null,
  stroke,
  width,
  dash,
  text,
});

const INKS: Readonly<Record<Role, Ink>> = {
  face: lined(ink, 1.1),
  body: filled(colours.earth, null, 0),
  unit: filled(colours.earth, '#B98A5E', 0.25),
  closer: filled(colours.mortar, colours.earthDeep, 0.35),
  return: filled('#E0C49E', '#B98A5E', 0.25),
  joint: filled(colours.mortar, colours.earthDeep, 0.3),
  frame: { ...filled(colours.frame, colours.frame, 0.6), text: colours.frame },
  opening: filled(colours.white, null, 0),
  swing: lined(colours.frame, 0.5),
  way: lined(colours.hatch, 0.5, [3, 2]),
  'keep-clear': lined(colours.caution, 0.5, [1.5, 2], colours.caution),
  boundary: lined(colours.soft, 0.6, [8, 2.5, 1.5, 2.5]),
  line: lined(colours.line, 0.8, null, colours.line),
  pole: filled(colours.steel, colours.steel, 1),
  brace: lined(colours.steel, 0.8),
  foot: filled(colours.white, colours.steel, 0.9),
  mark: lined(colours.line, 0.8),
  'mark-main': lined(colours.line, 1.8, null, colours.line),
  'level-line': lined(colours.levelLine, 0.9, [7, 2.5, 1.5, 2.5], colours.levelLine),
  ground: lined(ink, 1.1),
  concrete: filled(colours.concrete, ink, 0.5),
  lintel: filled(colours.frame, colours.frame, 0.4),
  dimension: lined(colours.soft, 0.5),
  letter: filled(colours.white, colours.steel, 0.9),
  caution: { ...filled(colours.white, colours.caution, 0.8), text: colours.caution },
  note: { ...filled(colours.white, ink, 0.5), text: ink },
};

export function inkOf(role: Role, emphasis: Emphasis | undefined): Ink {
  const base = INKS[role];
  if (emphasis === 'quiet') return role === 'pole' ? { ...base, fill: colours.steelLight, stroke: null } : base;
  if (emphasis === 'selected') return { ...base, width: base.width * 1.5, dash: null };
  if (emphasis === 'differs') return { ...base, stroke: colours.caution, dash: [4, 2] };
  return base;
}
