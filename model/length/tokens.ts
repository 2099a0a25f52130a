/** Splits a written length into numbers, units and dashes, each with its place in the text. */

import type { LengthUnits } from './units';

/** What can be wrong with a written length; worded by the dictionary under `lengths.problems`. */
export const LENGTH_PROBLEMS = [
  'empty',
  'tooLong',
  'unexpectedCharacter',
  'unexpectedNumber',
  'unknownUnit',
  'unitWithoutNumber',
  'zeroDenominator',
  'fractionTooLarge',
  'fractionUnfinished',
  'inchesTooLarge',
  'ambiguousComma',
  'tooLarge',
] as const;
export type LengthProblem = (typeof LENGTH_PROBLEMS)[number];

export type UnitName = 'ft' | 'in' | 'mm' | 'cm' | 'm';

/** An exact number, not negative. */
export interface Amount {
  readonly top: bigint;
  readonly bottom: bigint;
}

export type Token =
  | {
      readonly kind: 'number';
      readonly at: number;
      readonly amount: Amount;
      readonly form: 'whole' | 'decimal' | 'fraction';
    }
  | { readonly kind: 'unit'; readonly at: number; readonly unit: UnitName }
  | { readonly kind: 'dash'; readonly at: number };

export interface Tokens {
  readonly negative: boolean;
  readonly tokens: readonly Token[];
  readonly problem: { readonly at: number; readonly problem: LengthProblem } | null;
}

const LONGEST = 40;

const GLYPHS: Readonly<Record<string, readonly [number, number]>> = {
  '½': [1, 2],
  '⅓': [1, 3],
  '⅔': [2, 3],
  '¼': [1, 4],
  '¾': [3, 4],
  '⅕': [1, 5],
  '⅖': [2, 5],
  '⅗': [3, 5],
  '⅘': [4, 5],
  '⅙': [1, 6],
  '⅚': [5, 6],
  '⅛': [1, 8],
  '⅜': [3, 8],
  '⅝': [5, 8],
  '⅞': [7, 8],
  '⅒': [1, 10],
};

const UNITS: Readonly<Record<string, UnitName>> = {
  ft: 'ft',
  foot: 'ft',
  feet: 'ft',
  in: 'in',
  ins: 'in',
  inch: 'in',
  inches: 'in',
  mm: 'mm',
  cm: 'cm',
  m: 'm',
};

const FOOT_MARKS = /^['′’‘ʹʼ´`]/;
/** Two foot marks together are one inch mark. */
const INCH_MARKS = /^(?:["″”“ʺˮ]|['′’‘ʹʼ´`]{2})/;
const MINUS = /^[-−–]/;
const DASH = /^[-−–—]/;
const SLASH = /^\s*[/⁄∕]\s*/;
const SPACE = /^\s+/;
/** A comma with a number after it. */
const COMMA = /^,\s+(?=[\d.½⅓⅔¼¾⅕⅖⅗⅘⅙⅚⅛⅜⅝⅞⅒])/;
const WORD = /^[A-Za-zµ]+\.?/;
/** Digits in threes, as metric drawings set them apart; a fraction's digits are none. */
const GROUPED = /^\d{1,3}(?:\s\d{3})+(?!\d|\s*[/⁄∕])/;
/** What follows a metric number: its decimals, then its unit. */
const METRIC_UNIT = /^(?:[.,]\d*)?\s*(?:mm|cm|m)(?![A-Za-z])/i;
const NO_UNIT = /^(?:[.,]\d*)?\s*$/;

function decimal(whole: string, part: string): Amount {
  return { top: BigInt(`${whole}${part}` || '0'), bottom: 10n ** BigInt(part.length) };
}

interface Found {
  readonly token: Token;
  readonly length: number;
}
interface Trouble {
  readonly at: number;
  readonly problem: LengthProblem;
}

function readNumber(rest: string, at: number): Found | Trouble | null {
  const glyph = GLYPHS[rest[0] ?? ''];
  if (glyph) {
    const amount = { top: BigInt(glyph[0]), bottom: BigInt(glyph[1]) };
    return { token: { kind: 'number', at, amount, form: 'fraction' }, length: 1 };
  }
  const digits = /^(\d*)(?:([.,])(\d*))?/.exec(rest);
  const [all = '', whole = '', mark, part = ''] = digits ?? [];
  if (whole === '' && part === '') return null;
  if (mark !== undefined) {
    // `1,200` is 1.2 to some and 1 200 to others.
    if (mark === ',' && part.length === 3) return { at: at + whole.length, problem: 'ambiguousComma' };
    if (mark === ',' && (whole === '' || part === '')) return { at: at + whole.length, problem: 'unexpectedCharacter' };
    return { token: { kind: 'number', at, amount: decimal(whole, part), form: 'decimal' }, length: all.length };
  }
  const slash = SLASH.exec(rest.slice(whole.length));
  if (!slash) return { token: { kind: 'number', at, amount: decimal(whole, ''), form: 'whole' }, length: whole.length };
  const below = whole.length + slash[0].length;
  const bottom = /^\d+/.exec(rest.slice(below))?.[0];
  if (bottom === undefined) return { at: at + whole.length + slash[0].search(/\S/), problem: 'fractionUnfinished' };
  if (BigInt(bottom) === 0n) return { at: at + below, problem: 'zeroDenominator' };
  const amount = { top: BigInt(whole), bottom: BigInt(bottom) };
  return { token: { kind: 'number', at, amount, form: 'fraction' }, length: below + bottom.length };
}

/** `1 200 mm` is one number; so is `1 200` where bare numbers are millimetres. Elsewhere they are two. */
function readGrouped(rest: string, at: number, units: LengthUnits): Found | Trouble | null {
  const digits = GROUPED.exec(rest)?.[0];
  if (digits === undefined) return null;
  const after = rest.slice(digits.length);
  if (!METRIC_UNIT.test(after) && !(units === 'metric' && NO_UNIT.test(after))) return null;
  const joined = digits.replace(/\s/g, '');
  const gaps = digits.length - joined.length;
  const found = readNumber(joined + after, at);
  if (!found) return null;
  return 'problem' in found ? { ...found, at: found.at + gaps } : { ...found, length: found.length + gaps };
}

function readUnit(rest: string, at: number): Found | Trouble | null {
  const inch = INCH_MARKS.exec(rest);
  if (inch) return { token: { kind: 'unit', at, unit: 'in' }, length: inch[0].length };
  if (FOOT_MARKS.test(rest)) return { token: { kind: 'unit', at, unit: 'ft' }, length: 1 };
  const word = WORD.exec(rest)?.[0];
  if (word === undefined) return null;
  const name = word.toLowerCase().replace(/\.$/, '');
  const unit = Object.hasOwn(UNITS, name) ? UNITS[name] : undefined;
  return unit === undefined
    ? { at, problem: 'unknownUnit' }
    : { token: { kind: 'unit', at, unit }, length: word.length };
}

/** Splits a text; stops at the first thing that can't be part of a length. `units` are those of a bare number. */
export function tokenise(text: string, units: LengthUnits): Tokens {
  const tokens: Token[] = [];
  let negative = false;
  const stop = (at: number, problem: LengthProblem): Tokens => ({ negative, tokens, problem: { at, problem } });
  const start = SPACE.exec(text)?.[0].length ?? 0;
  if (start === text.length) return stop(0, 'empty');
  if (text.trimEnd().length - start > LONGEST) return stop(start + LONGEST, 'tooLong');
  let at = start;
  if (MINUS.test(text.slice(at))) {
    negative = true;
    at++;
  }
  while (at < text.length) {
    const rest = text.slice(at);
    const space = SPACE.exec(rest);
    // `5 feet, 4 inches`: the comma only parts what its unit has ended.
    const parting = tokens[tokens.length - 1]?.kind === 'unit' && COMMA.test(rest);
    if (parting) {
      at++;
      continue;
    }
    if (space) {
      at += space[0].length;
      continue;
    }
    const found = readGrouped(rest, at, units) ?? readNumber(rest, at) ?? readUnit(rest, at);
    if (found && 'problem' in found) return stop(found.at, found.problem);
    if (found) {
      tokens.push(found.token);
      at += found.length;
    } else if (DASH.test(rest)) {
      tokens.push({ kind: 'dash', at });
      at++;
    } else return stop(at, 'unexpectedCharacter');
  }
  return { negative, tokens, problem: null };
}
