import { Text as SvgText, TSpan } from 'react-native-svg';
import type { FigureText as Words, Tape } from '../../model/figures/figure';
import { typesetMeasure, type TypePart } from '../../model/figures/typeset';
import { fonts, fontWeights } from '../ui/tokens';
import { say } from '../ui/words';

/** Half the height of Barlow's capitals: texts stand with that height on their place. */
const HALF_CAPITAL = 0.35;
/** The browser takes CSS through `style`, which the library's types leave out. */
const tabular = { style: { fontVariantNumeric: 'tabular-nums' } } as object;
const asFraction = { style: { fontFeatureSettings: "'frac'", fontVariantNumeric: 'normal' } } as object;

interface Props {
  readonly words: Words;
  readonly tape: Tape;
  readonly x: number;
  readonly y: number;
  /** Pixels. */
  readonly size: number;
  /** Degrees counter-clockwise. */
  readonly turn: number;
  readonly anchor: 'start' | 'middle' | 'end';
  readonly colour: string;
}

function partsOf(words: Words, tape: Tape): readonly TypePart[] {
  switch (words.kind) {
    case 'literal':
      return [{ text: words.text, fraction: false }];
    case 'word':
      return [{ text: say(words.key, words.params), fraction: false }];
    case 'measure':
      return typesetMeasure(words.length, tape);
    case 'labelled':
      return [{ text: `${say(words.key)} `, fraction: false }, ...typesetMeasure(words.length, tape)];
  }
}

/** A text of a figure: a literal, a word, or a measurement whose fraction alone is set as one. */
export function FigureText({ words, tape, x, y, size, turn, anchor, colour }: Props) {
  const parts = partsOf(words, tape);
  return (
    <SvgText
      x={x}
      y={y + size * HALF_CAPITAL}
      fill={colour}
      fontFamily={fonts.numbers}
      fontWeight={fontWeights.semibold}
      fontSize={size}
      textAnchor={anchor}
      transform={turn === 0 ? undefined : `rotate(${-turn} ${x} ${y})`}
      {...tabular}
    >
      {parts.map((part, i) => (
        <TSpan key={i} {...(part.fraction ? asFraction : null)}>
          {part.text}
        </TSpan>
      ))}
    </SvgText>
  );
}
