import type { Units } from '../../model/drawing/schema';
import { roundToStep, TICKS_PER_FOOT, TICKS_PER_INCH, TICKS_PER_MM, ticks, type Ticks } from '../../model/length/ticks';

/** A length cut into the parts that are set differently. */
export interface LengthParts {
  readonly sign: '' | '−';
  readonly feet: string | null;
  /** Whole inches or millimetres; null where a fraction stands alone. */
  readonly whole: string | null;
  /** As `11/16`, in lowest terms. */
  readonly fraction: string | null;
  readonly unit: '″' | ' mm';
}

function reduce(numerator: number, denominator: number): string {
  let a = numerator;
  let b = denominator;
  while (b > 0) [a, b] = [b, a % b];
  return `${numerator / a}/${denominator / a}`;
}

/** Rounds a length to the tape's step once and cuts it into parts; the step is a part of an inch, or a millimetre. */
export function lengthParts(length: Ticks, units: Units, step: Ticks, form: 'inches' | 'feet'): LengthParts {
  const rounded = roundToStep(length, step);
  const size = Math.abs(rounded);
  const sign = rounded < 0 ? '−' : '';
  if (units === 'metric') {
    const millimetres = Math.round((size / TICKS_PER_MM) * 10) / 10;
    return { sign, feet: null, whole: String(millimetres), fraction: null, unit: ' mm' };
  }
  // A millimetre step on an imperial drawing still has to be written as a fraction: to the nearest 1/32.
  const exact = TICKS_PER_INCH % step === 0 ? size : roundToStep(size, ticks(TICKS_PER_INCH / 32));
  const feet = form === 'feet' ? Math.floor(exact / TICKS_PER_FOOT) : 0;
  const rest = exact - feet * TICKS_PER_FOOT;
  const whole = Math.floor(rest / TICKS_PER_INCH);
  const over = rest - whole * TICKS_PER_INCH;
  const showFeet = feet > 0;
  return {
    sign,
    feet: showFeet ? String(feet) : null,
    whole: whole > 0 || over === 0 || showFeet ? String(whole) : null,
    fraction: over === 0 ? null : reduce(Math.round((over / TICKS_PER_INCH) * 128), 128),
    unit: '″',
  };
}
