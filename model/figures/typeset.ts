/** A measurement as pieces of text to be set one after another: the fraction by itself, since only it is set small. */
import type { Ticks } from '../length/ticks';
import { measureParts, type LengthStyle } from '../length/write';
import type { Tape } from './figure';

export interface TypePart {
  readonly text: string;
  /** `3/8`, to be set as one fraction. */
  readonly fraction: boolean;
}

/** Feet, inches and fraction (or millimetres), rounded once to the tape step, with typographic primes and minus. */
export function typesetMeasure(length: Ticks, tape: Tape, style?: LengthStyle): TypePart[] {
  const parts = measureParts(length, { units: tape.units, step: tape.step, ...(style ? { style } : null) });
  const sign = parts.sign === '-' ? '−' : '';
  if (parts.unit !== 'in') {
    const decimals = parts.decimals === '' ? '' : `.${parts.decimals}`;
    return [{ text: `${sign}${parts.whole}${decimals} ${parts.unit}`, fraction: false }];
  }
  const feet = parts.feet === undefined ? '' : `${parts.feet}′ `;
  if (parts.numerator === 0) return [{ text: `${sign}${feet}${parts.whole}″`, fraction: false }];
  const whole = parts.whole === 0 && parts.feet === undefined ? '' : `${parts.whole} `;
  return [
    { text: `${sign}${feet}${whole}`, fraction: false },
    { text: `${parts.numerator}/${parts.denominator}`, fraction: true },
    { text: '″', fraction: false },
  ];
}
