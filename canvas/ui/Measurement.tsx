import { Text, type StyleProp, type TextStyle } from 'react-native';
import type { Units } from '../../model/drawing/schema';
import { sayLength } from '../../model/length/say';
import type { Ticks } from '../../model/length/ticks';
import { measureParts, type LengthStyle } from '../../model/length/write';
import { lineHeightOf } from './Txt';
import { fonts, fontWeights, numberSize, toneColour } from './tokens';
import type { NumberSizeName, Tone, Weight } from './tokens';
import { useTheme } from './theme';

export interface MeasurementProps {
  /** Exact: rounded here, once, to the tape's step. */
  readonly length: Ticks;
  readonly units: Units;
  /** The tape's step, in ticks. */
  readonly step: Ticks;
  readonly size?: NumberSizeName;
  readonly tone?: Tone;
  readonly weight?: Weight;
  /** `inches`: 64 3/8″, as marks are read. `feet`: 5′ 4 3/8″, as buildings are dimensioned. Metric lengths ignore it. */
  readonly form?: 'inches' | 'feet';
  readonly style?: StyleProp<TextStyle>;
}

/** A length with whole, fraction and unit set apart; read aloud as a person would say it. */
export function Measurement(props: MeasurementProps) {
  const { length, units, step, size = 'table', tone = 'ink', weight = 'semibold', form = 'inches', style } = props;
  const { colours } = useTheme();
  const written: LengthStyle = units === 'metric' ? 'mm' : form === 'feet' ? 'feetInches' : 'inches';
  const parts = measureParts(length, { units, step, style: written });
  const hasFraction = parts.numerator > 0;
  const showWhole = parts.whole > 0 || parts.feet !== undefined || !hasFraction;
  const pixels = numberSize[size];
  const unit: TextStyle = tone === 'ink' ? { color: colours.inkSoft } : {};
  const gap = Math.max(2, Math.round(pixels * 0.14));
  return (
    <Text
      style={[
        {
          color: toneColour(colours, tone),
          fontFamily: fonts.numbers,
          fontWeight: fontWeights[weight],
          fontSize: pixels,
          lineHeight: lineHeightOf(pixels),
          fontVariant: ['tabular-nums'],
        },
        // A measurement is never broken over two lines.
        { whiteSpace: 'nowrap' } as object,
        style,
      ]}
    >
      <Text style={readOnly}>{sayLength(length, units, step, written)}</Text>
      <Text aria-hidden>
        {parts.sign === '-' ? '−' : ''}
        {parts.feet === undefined ? null : (
          <Text>
            {parts.feet}
            <Text style={unit}>′</Text>
          </Text>
        )}
        {showWhole ? (
          <Text style={{ marginLeft: parts.feet === undefined ? 0 : gap * 2 }}>
            {parts.whole}
            {parts.decimals === '' ? '' : `.${parts.decimals}`}
          </Text>
        ) : null}
        {hasFraction ? (
          <Text style={[{ marginLeft: showWhole ? gap : 0 }, fraction]}>
            {`${parts.numerator}/${parts.denominator}`}
          </Text>
        ) : null}
        <Text style={unit}>{parts.unit === 'in' ? '″' : ` ${parts.unit}`}</Text>
      </Text>
    </Text>
  );
}

/** `frac` must cover the fraction alone: over the whole number it would shrink that too. */
const fraction = { fontFeatureSettings: '"frac"', fontVariant: [] } as TextStyle;

/** For screen readers only: in the text's flow, out of sight. */
const readOnly = {
  position: 'absolute',
  width: 1,
  height: 1,
  overflow: 'hidden',
  clipPath: 'inset(50%)',
} as unknown as TextStyle;
