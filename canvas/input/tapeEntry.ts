/** What the keys of the tape keypad make of the text of a length: `5'4 3/8`, `350 mm`. Whole and fraction are set apart. */
import type { Units } from '../../model/drawing/schema';

export type TapeKey =
  | { readonly kind: 'digit'; readonly digit: string }
  /** What was typed so far is feet. */
  | { readonly kind: 'feet' }
  /** The fraction becomes so many eighths; the same key again takes it off. */
  | { readonly kind: 'eighths'; readonly count: number }
  /** Adds a sixteenth or a thirty-second to the fraction; again takes it off. */
  | { readonly kind: 'odd'; readonly part: 16 | 32 }
  | { readonly kind: 'point' }
  | { readonly kind: 'unit'; readonly unit: 'mm' | 'm' }
  | { readonly kind: 'erase' };

const DIGITS_MOST = 6;
const IMPERIAL = /^(?:(\d+)')?(\d*)(?: ?(\d+)\/(\d+))?$/;
const METRIC = /^(\d*\.?\d*) ?(mm|m)?$/;

/** The fraction in thirty-seconds, so that eighths, sixteenths and thirty-seconds are all whole. */
interface InchEntry {
  readonly feet: string | null;
  readonly whole: string;
  readonly fraction: number;
}

function readInches(text: string): InchEntry | null {
  const match = IMPERIAL.exec(text.trim());
  if (!match) return null;
  const [, feet, whole = '', top, bottom] = match;
  const fraction = top === undefined ? 0 : (Number(top) * 32) / Number(bottom);
  if (!Number.isInteger(fraction) || fraction < 0 || fraction >= 32) return null;
  return { feet: feet ?? null, whole, fraction };
}

function writeInches({ feet, whole, fraction }: InchEntry): string {
  const head = (feet === null ? '' : `${feet}'`) + whole;
  if (fraction === 0) return head;
  let top = fraction;
  let bottom = 32;
  while (top % 2 === 0) {
    top /= 2;
    bottom /= 2;
  }
  return `${head}${head === '' ? '' : ' '}${top}/${bottom}`;
}

function pressImperial(entry: InchEntry, key: TapeKey): InchEntry {
  const { feet, whole, fraction } = entry;
  switch (key.kind) {
    case 'digit': {
      const grown = whole === '0' ? key.digit : whole + key.digit;
      return grown.length > DIGITS_MOST ? entry : { feet, whole: grown, fraction };
    }
    case 'feet':
      return feet !== null || whole === '' ? entry : { feet: whole, whole: '', fraction };
    case 'eighths': {
      const odd = fraction % 4;
      const same = fraction - odd === key.count * 4;
      return { feet, whole, fraction: same ? odd : key.count * 4 };
    }
    case 'odd': {
      const part = 32 / key.part;
      const on = Math.floor(fraction / part) % 2 === 1;
      return { feet, whole, fraction: on ? fraction - part : fraction + part };
    }
    case 'erase':
      if (fraction > 0) return { feet, whole, fraction: 0 };
      if (whole !== '') return { feet, whole: whole.slice(0, -1), fraction };
      return { feet: null, whole: feet ?? '', fraction };
    default:
      return entry;
  }
}

function pressMetric(text: string, key: TapeKey): string {
  const match = METRIC.exec(text.trim());
  if (!match) return key.kind === 'erase' ? text.slice(0, -1) : text;
  const [, number = '', unit] = match;
  const tail = unit === undefined ? '' : ` ${unit}`;
  switch (key.kind) {
    case 'digit':
      return number.length >= DIGITS_MOST + 2 ? text : (number === '0' ? key.digit : number + key.digit) + tail;
    case 'point':
      return number.includes('.') ? text : `${number === '' ? '0' : number}.${tail}`;
    case 'unit':
      return number === '' ? text : unit === key.unit ? number : `${number} ${key.unit}`;
    case 'erase':
      return unit === undefined ? number.slice(0, -1) : number;
    default:
      return text;
  }
}

/** The text after one key. Text that the keys could not have made (typed by hand) only loses its end to the erase key. */
export function pressTapeKey(text: string, key: TapeKey, units: Units): string {
  if (units === 'metric') return pressMetric(text, key);
  const entry = readInches(text);
  if (entry) return writeInches(pressImperial(entry, key));
  return key.kind === 'erase' ? text.slice(0, -1) : text;
}

/** What the keypad should show as pressed: the eighths and odd parts in the text; null where there are none to show. */
export function fractionOf(
  text: string,
): { readonly eighths: number; readonly sixteenth: boolean; readonly thirtySecond: boolean } | null {
  const entry = readInches(text);
  if (!entry) return null;
  return {
    eighths: Math.floor(entry.fraction / 4),
    sixteenth: Math.floor(entry.fraction / 2) % 2 === 1,
    thirtySecond: entry.fraction % 2 === 1,
  };
}

/** The text after one key of a physical keyboard; null when the key means nothing to a length. */
export function typeTapeKey(text: string, key: string): string | null {
  if (key === 'Backspace') return text.slice(0, -1);
  return /^[0-9.'"/ m-]$/.test(key) ? text + key : null;
}
