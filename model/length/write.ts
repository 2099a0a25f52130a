/** Writes a length to the tape's step: rounded once, fractions reduced, never 12 inches beside feet, never −0. */
import type { LengthUnits } from './units';
import { roundToStep, ticks, TICKS_PER_INCH, TICKS_PER_MM, type Ticks } from './ticks';

/** `feetInches`: 5' 4 3/8". `inches`: 64 3/8". `mm`: 350 mm. `m`: 1.200 m. */
export type LengthStyle = 'feetInches' | 'inches' | 'mm' | 'm';

export interface LengthFormat {
  readonly units: LengthUnits;
  /** The tape's step in ticks. */
  readonly step: Ticks;
  /** Feet and inches, or millimetres, unless it says otherwise. */
  readonly style?: LengthStyle;
}

/** A length's parts, each to be set apart from the others. */
export interface MeasureParts {
  readonly sign: '' | '-';
  /** Whole feet; only in the style `feetInches`, and only from one foot up. */
  readonly feet?: number;
  /** Whole inches, millimetres or metres. */
  readonly whole: number;
  /** A reduced fraction of an inch; 0 over 1 where there is none. */
  readonly numerator: number;
  readonly denominator: number;
  /** Digits after the decimal mark, in metric styles; '' where there are none. */
  readonly decimals: string;
  readonly unit: 'in' | 'mm' | 'm';
}

const SIXTEENTH = ticks(TICKS_PER_INCH / 16);
const MILLIMETRE = ticks(TICKS_PER_MM);
const TENTH = TICKS_PER_MM / 10;

function styleOf(format: LengthFormat): LengthStyle {
  return format.style ?? (format.units === 'imperial' ? 'feetInches' : 'mm');
}

/** The step that a style can show: a whole part of an inch, or whole tenths of a millimetre. */
function shownStep(format: LengthFormat): Ticks {
  const { step } = format;
  const style = styleOf(format);
  if (style === 'feetInches' || style === 'inches') return step > 0 && TICKS_PER_INCH % step === 0 ? step : SIXTEENTH;
  return step > 0 && step % TENTH === 0 ? step : MILLIMETRE;
}

function reduce(top: number, bottom: number): readonly [number, number] {
  let [a, b] = [top, bottom];
  while (b > 0) [a, b] = [b, a % b];
  return [top / a, bottom / a];
}

/** A length rounded to what `writeLength` would show, in ticks. */
export function shownLength(length: Ticks, format: LengthFormat): Ticks {
  return roundToStep(length, shownStep(format));
}

/** The parts of a length as it is shown: rounded to the step once, from the exact length. */
export function measureParts(length: Ticks, format: LengthFormat): MeasureParts {
  const style = styleOf(format);
  const shown = shownLength(length, format);
  const size = Math.abs(shown);
  const sign = shown < 0 ? '-' : '';
  if (style === 'feetInches' || style === 'inches') {
    const inches = Math.floor(size / TICKS_PER_INCH);
    const [numerator, denominator] = reduce(size % TICKS_PER_INCH, TICKS_PER_INCH);
    const feet = style === 'feetInches' ? Math.floor(inches / 12) : 0;
    const parts = { sign, whole: inches - 12 * feet, numerator, denominator, decimals: '', unit: 'in' } as const;
    return feet > 0 ? { ...parts, feet } : parts;
  }
  const tenths = shownStep(format) % MILLIMETRE !== 0;
  const perUnit = style === 'mm' ? TICKS_PER_MM : 1000 * TICKS_PER_MM;
  const digits = (style === 'mm' ? 0 : 3) + (tenths ? 1 : 0);
  const rest = (size % perUnit) / (perUnit / 10 ** digits);
  const decimals = digits === 0 ? '' : String(rest).padStart(digits, '0');
  return { sign, whole: Math.floor(size / perUnit), numerator: 0, denominator: 1, decimals, unit: style };
}

/** A length in one line of text, that `readLength` reads back to the same step. */
export function writeLength(length: Ticks, format: LengthFormat): string {
  const { sign, feet, whole, numerator, denominator, decimals, unit } = measureParts(length, format);
  if (unit !== 'in') return `${sign}${whole}${decimals === '' ? '' : `.${decimals}`} ${unit}`;
  const fraction = numerator === 0 ? '' : `${numerator}/${denominator}`;
  // No whole inches are written beside a fraction alone, but feet keep their 0: 5' 0 3/8" can't be misheard.
  const inches = fraction === '' ? `${whole}` : whole === 0 && feet === undefined ? fraction : `${whole} ${fraction}`;
  return `${sign}${feet === undefined ? '' : `${feet}' `}${inches}"`;
}
