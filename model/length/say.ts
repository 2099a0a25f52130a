/** A length in words, as a person would say it, for screen readers. */
import type { LengthUnits } from './units';
import { lengths } from '../words/en/lengths';
import type { Ticks } from './ticks';
import { measureParts, type LengthStyle } from './write';

const words = lengths.say;

/** Numbers from here up are left in digits: "1000000" is said well enough by any voice. */
const IN_WORDS_BELOW = 1_000_000;

/** A whole number in words. */
export function sayNumber(value: number): string {
  if (value >= IN_WORDS_BELOW) return String(value);
  if (value >= 1000) {
    const rest = value % 1000;
    const head = `${sayNumber(Math.floor(value / 1000))} ${words.thousand}`;
    if (rest === 0) return head;
    return rest < 100 ? `${head} ${words.and} ${sayNumber(rest)}` : `${head} ${sayNumber(rest)}`;
  }
  if (value >= 100) {
    const head = `${sayNumber(Math.floor(value / 100))} ${words.hundred}`;
    return value % 100 === 0 ? head : `${head} ${words.and} ${sayNumber(value % 100)}`;
  }
  if (value < 20) return words.small[value] ?? String(value);
  const ten = words.tens[Math.floor(value / 10)] ?? '';
  return value % 10 === 0 ? ten : `${ten}-${words.small[value % 10] ?? ''}`;
}

/** A fraction in words: "one half", "three eighths". */
function sayFraction(numerator: number, denominator: number): string {
  const part = (words.parts as Readonly<Record<number, readonly [string, string]>>)[denominator];
  if (!part) return `${numerator}/${denominator}`;
  return `${sayNumber(numerator)} ${part[numerator === 1 ? 0 : 1]}`;
}

function sayInches(whole: number, numerator: number, denominator: number): string {
  const fraction = numerator === 0 ? null : sayFraction(numerator, denominator);
  if (fraction === null) return `${sayNumber(whole)} ${whole === 1 ? words.inch : words.inches}`;
  if (whole === 0) return `${fraction} ${words.ofAnInch}`;
  return `${sayNumber(whole)} ${words.and} ${fraction} ${words.inches}`;
}

/** After feet the word "inches" is left out, as on site: "four feet three and three eighths". */
function sayFeet(feet: number, whole: number, numerator: number, denominator: number): string {
  const head = `${sayNumber(feet)} ${feet === 1 ? words.foot : words.feet}`;
  if (numerator === 0) return whole === 0 ? head : `${head} ${sayNumber(whole)}`;
  const fraction = sayFraction(numerator, denominator);
  if (whole === 0) return `${head} ${words.and} ${fraction} ${words.ofAnInch}`;
  return `${head} ${sayNumber(whole)} ${words.and} ${fraction}`;
}

/** Says a length, rounded to the tape's step as it is shown: "four feet three and three eighths". */
export function sayLength(length: Ticks, units: LengthUnits, step: Ticks, style?: LengthStyle): string {
  const parts = measureParts(length, style ? { units, step, style } : { units, step });
  const sign = parts.sign === '' ? '' : `${words.minus} `;
  const { feet, whole, numerator, denominator, decimals, unit } = parts;
  if (unit === 'in') {
    return feet === undefined
      ? sign + sayInches(whole, numerator, denominator)
      : sign + sayFeet(feet, whole, numerator, denominator);
  }
  const digits = decimals.replace(/0+$/, '');
  const spoken = [...digits].map((digit) => sayNumber(Number(digit))).join(' ');
  const number = digits === '' ? sayNumber(whole) : `${sayNumber(whole)} ${words.point} ${spoken}`;
  const one = whole === 1 && digits === '';
  if (unit === 'mm') return `${sign}${number} ${one ? words.millimetre : words.millimetres}`;
  return `${sign}${number} ${one ? words.metre : words.metres}`;
}
