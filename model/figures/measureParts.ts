/** A measurement taken apart for setting in type: the fraction by itself, since only it is set small. */
import { TICKS_PER_FOOT, TICKS_PER_INCH, TICKS_PER_MM, roundToStep, type Ticks } from '../length/ticks';
import type { Tape } from './figure';

export interface MeasurePart {
  readonly text: string;
  /** `3/8`, to be set as one fraction. */
  readonly fraction: boolean;
}

function reduced(top: number, bottom: number): string {
  let [a, b] = [top, bottom];
  while (b !== 0) [a, b] = [b, a % b];
  return `${top / a}/${bottom / a}`;
}

/** Feet, inches and fraction (or millimetres), rounded once to the tape step. Feet are left out under one foot. */
export function measureParts(length: Ticks, tape: Tape): MeasurePart[] {
  const rounded = roundToStep(length, tape.step);
  const size = Math.abs(rounded);
  const sign = rounded < 0 ? '−' : '';
  if (tape.units === 'metric') return [{ text: `${sign}${Math.round(size / TICKS_PER_MM)} mm`, fraction: false }];
  const feet = Math.floor(size / TICKS_PER_FOOT);
  const rest = size - feet * TICKS_PER_FOOT;
  const whole = Math.floor(rest / TICKS_PER_INCH);
  const part = Math.round(((rest - whole * TICKS_PER_INCH) * 128) / TICKS_PER_INCH);
  const before = `${sign}${feet > 0 ? `${feet}′ ` : ''}`;
  if (part === 0) return [{ text: `${before}${whole}″`, fraction: false }];
  const inch = whole > 0 || feet > 0 ? `${whole} ` : '';
  return [
    { text: `${before}${inch}`, fraction: false },
    { text: reduced(part, 128), fraction: true },
    { text: '″', fraction: false },
  ];
}
