import type { ReactNode } from 'react';
import { Text, type StyleProp, type TextProps, type TextStyle } from 'react-native';
import { fonts, fontWeights, numberSize, textSize, toneColour } from './tokens';
import type { NumberSizeName, TextSizeName, Tone, Weight } from './tokens';
import { useTheme } from './theme';

export interface TxtProps extends Omit<TextProps, 'style' | 'role'> {
  readonly children?: ReactNode;
  /** Words take 13 to 22 px; with `numeric`, 17 to 120 px. */
  readonly size?: TextSizeName | NumberSizeName;
  readonly tone?: Tone;
  readonly weight?: Weight;
  /** Condensed with tabular figures: dimensions and numbers. */
  readonly numeric?: boolean;
  readonly align?: 'left' | 'center' | 'right';
  readonly role?: TextProps['role'];
  /** Level of a heading: give with `role="heading"`. */
  readonly level?: 1 | 2 | 3;
  readonly style?: StyleProp<TextStyle>;
}

const sizes: Readonly<Record<TextSizeName | NumberSizeName, number>> = { ...textSize, ...numberSize };

/** Line height of a text of this many pixels: looser for words, tight for the big numbers. */
export function lineHeightOf(pixels: number): number {
  return Math.round(pixels * (pixels > 24 ? 1.05 : 1.35));
}

/** All words and plain numbers on screen. */
export function Txt(props: TxtProps) {
  const { size = 'body', tone = 'ink', weight = 'regular', numeric = false, align, level, style, ...rest } = props;
  const { colours } = useTheme();
  const pixels = sizes[size];
  const heading = level === undefined ? null : ({ 'aria-level': level } as object);
  return (
    <Text
      {...rest}
      {...heading}
      style={[
        {
          color: toneColour(colours, tone),
          fontFamily: numeric ? fonts.numbers : fonts.text,
          fontWeight: fontWeights[weight],
          fontSize: pixels,
          lineHeight: lineHeightOf(pixels),
          textAlign: align,
        },
        numeric && tabular,
        style,
      ]}
    />
  );
}

const tabular: TextStyle = { fontVariant: ['tabular-nums'] };
