/** The look in numbers: colours of both themes, spacing, type and strokes. Plain data, so that printers and tests may read it. */

export interface Colours {
  /** Behind everything, and behind a drawing. */
  readonly ground: string;
  /** Headers, rows, ledgers and dialogs. */
  readonly surface: string;
  readonly ink: string;
  readonly inkSoft: string;
  /** Hairlines between rows and around surfaces. */
  readonly rule: string;
  /** The edge of a field or an unpressed control: dark enough to be seen as a control. */
  readonly edge: string;
  /** The fill of a unit. */
  readonly earth: string;
  /** Accent and actions. */
  readonly earthDeep: string;
  /** The accent while pressed or under the pointer. */
  readonly earthPressed: string;
  /** Text and icons on the accent. */
  readonly onEarthDeep: string;
  readonly line: string;
  readonly levelLine: string;
  readonly frame: string;
  readonly steel: string;
  /** The lit edge of a steel angle. */
  readonly steelLight: string;
  readonly concrete: string;
  readonly caution: string;
  /** Behind a caution's text. */
  readonly cautionTint: string;
  /** A selected row, and the bed that keys and strips lie on. */
  readonly selected: string;
  /** A row or a quiet button under the pointer. */
  readonly hover: string;
  /** Hatching of ways through and keep-clears. */
  readonly hatch: string;
  readonly focus: string;
  /** Behind a dialog. */
  readonly scrim: string;
  /** A dark label that rides over the drawing, and its text. */
  readonly tag: string;
  readonly onTag: string;
}

export interface Strokes {
  readonly hair: number;
  readonly thin: number;
  readonly normal: number;
  readonly heavy: number;
  /** Icons, on their 24 px grid. */
  readonly icon: number;
}

export interface ThemeTokens {
  readonly colours: Colours;
  readonly strokes: Strokes;
}

export type ThemeName = 'light' | 'sun';

export const themes: Readonly<Record<ThemeName, ThemeTokens>> = {
  light: {
    colours: {
      ground: '#F7F2E8',
      surface: '#FFFDF8',
      ink: '#24201B',
      inkSoft: '#5E564B',
      rule: '#D9CFBD',
      edge: '#8C8170',
      earth: '#D8B48A',
      earthDeep: '#8A4B1F',
      earthPressed: '#6F3A15',
      onEarthDeep: '#FFFDF8',
      line: '#C2185B',
      levelLine: '#1E5A9C',
      frame: '#5B6B2F',
      steel: '#3B4754',
      steelLight: '#5D6873',
      concrete: '#C9C3BC',
      caution: '#A34700',
      cautionTint: '#FBEBDC',
      selected: '#EFE4D2',
      hover: '#F5EDDF',
      hatch: '#A9A283',
      focus: '#1E5A9C',
      scrim: 'rgba(36, 32, 27, 0.5)',
      tag: '#24201B',
      onTag: '#FFFDF8',
    },
    strokes: { hair: 1, thin: 1.5, normal: 2, heavy: 3, icon: 2 },
  },
  sun: {
    colours: {
      ground: '#FFFFFF',
      surface: '#FFFFFF',
      ink: '#000000',
      inkSoft: '#2B2B2B',
      rule: '#8A8A8A',
      edge: '#4A4A4A',
      earth: '#E9D2B4',
      earthDeep: '#6B3410',
      earthPressed: '#4D240A',
      onEarthDeep: '#FFFFFF',
      line: '#A3004A',
      levelLine: '#003E80',
      frame: '#3D4A16',
      steel: '#1E2730',
      steelLight: '#46515C',
      concrete: '#CFCFCF',
      caution: '#7A3300',
      cautionTint: '#FFEFE0',
      selected: '#EDEDED',
      hover: '#F4F4F4',
      hatch: '#6E6E6E',
      focus: '#003E80',
      scrim: 'rgba(0, 0, 0, 0.6)',
      tag: '#000000',
      onTag: '#FFFFFF',
    },
    strokes: { hair: 2, thin: 2, normal: 3, heavy: 4, icon: 2.5 },
  },
};

/** Pixels: 4, 8, 12, 16, 24, 32. */
export const space = { xs: 4, s: 8, m: 12, l: 16, xl: 24, xxl: 32 } as const;

/** Words: 13, 15, 17, 22 px. */
export const textSize = { small: 13, body: 15, large: 17, title: 22 } as const;

/** Numbers: 17, 24, 46, 72, 120 px. */
export const numberSize = { table: 17, row: 24, ledger: 46, screen: 72, huge: 120 } as const;

export const radius = 4;

/** Least size of anything to touch on a field screen, px. */
export const touch = 48;

/** Each with a stand-in of about its width, for the moment before it arrives. */
export const fonts = {
  text: 'Barlow, "Barlow stand-in", sans-serif',
  numbers: '"Barlow Condensed", "Barlow Condensed stand-in", sans-serif',
} as const;

export type TextSizeName = keyof typeof textSize;
export type NumberSizeName = keyof typeof numberSize;
export type Weight = 'regular' | 'medium' | 'semibold';

export const fontWeights = { regular: '400', medium: '500', semibold: '600' } as const;

/** Names of the colours that words may take. */
export type Tone = 'ink' | 'soft' | 'accent' | 'caution' | 'level' | 'line' | 'frame' | 'onAccent' | 'onTag';

export function toneColour(colours: Colours, tone: Tone): string {
  switch (tone) {
    case 'ink':
      return colours.ink;
    case 'soft':
      return colours.inkSoft;
    case 'accent':
      return colours.earthDeep;
    case 'caution':
      return colours.caution;
    case 'level':
      return colours.levelLine;
    case 'line':
      return colours.line;
    case 'frame':
      return colours.frame;
    case 'onAccent':
      return colours.onEarthDeep;
    case 'onTag':
      return colours.onTag;
  }
}
