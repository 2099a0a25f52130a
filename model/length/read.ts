/** Reads a length as people write it on site, exactly, or says what was wrong with it and where. */
import type { LengthUnits } from './units';
import { ticks, TICKS_PER_INCH, TICKS_PER_MM, type Ticks } from './ticks';
import { tokenise, type Amount, type LengthProblem, type Token, type UnitName } from './tokens';

export type ReadLength =
  | { readonly ok: true; readonly ticks: Ticks }
  | {
      readonly ok: false;
      /** Index, in the text as given, of the character that is wrong. */
      readonly at: number;
      readonly problem: LengthProblem;
    };

/** Lengths stay within 2 km, as the drawing's coordinates do. */
const MOST = BigInt(2_000_000 * TICKS_PER_MM);

const TICKS_PER_UNIT: Readonly<Record<UnitName, number>> = {
  ft: 12 * TICKS_PER_INCH,
  in: TICKS_PER_INCH,
  mm: TICKS_PER_MM,
  cm: 10 * TICKS_PER_MM,
  m: 1000 * TICKS_PER_MM,
};

/** A number with its unit: `4 3/8"` is a whole 4, a fraction 3/8 and inches. */
interface Quantity {
  readonly at: number;
  readonly amount: Amount;
  readonly unit: UnitName | null;
  /** Joined to what came before by a dash: `5-4`. */
  readonly dashed: boolean;
}

interface Trouble {
  readonly at: number;
  readonly problem: LengthProblem;
}

function addAmounts(a: Amount, b: Amount): Amount {
  return { top: a.top * b.bottom + b.top * a.bottom, bottom: a.bottom * b.bottom };
}

/** Joins a whole number and the fraction after it, and each number with its unit. */
function groupQuantities(tokens: readonly Token[]): readonly Quantity[] | Trouble {
  const quantities: Quantity[] = [];
  let i = 0;
  let dashed = false;
  for (let token = tokens[i]; token; token = tokens[i]) {
    if (token.kind === 'unit') return { at: token.at, problem: 'unitWithoutNumber' };
    if (token.kind === 'dash') {
      const after = tokens[i + 1];
      if (quantities.length === 0 || dashed || !after) return { at: token.at, problem: 'unexpectedCharacter' };
      dashed = true;
      i++;
      continue;
    }
    let { amount } = token;
    i++;
    const gap = tokens[i]?.kind === 'dash' ? 1 : 0;
    const fraction = tokens[i + gap];
    if (fraction?.kind === 'number' && fraction.form === 'fraction') {
      if (token.form !== 'whole') return { at: fraction.at, problem: 'unexpectedNumber' };
      if (fraction.amount.top >= fraction.amount.bottom) return { at: fraction.at, problem: 'fractionTooLarge' };
      amount = addAmounts(amount, fraction.amount);
      i += gap + 1;
    }
    const unit = tokens[i];
    if (unit?.kind === 'unit') i++;
    quantities.push({ at: token.at, amount, unit: unit?.kind === 'unit' ? unit.unit : null, dashed });
    dashed = false;
  }
  return quantities;
}

interface Settled extends Quantity {
  readonly unit: UnitName;
}

/** Gives every quantity a unit: `5'4` and `5-4` are feet and inches, one bare number takes the site's unit. */
function settleUnits(quantities: readonly Quantity[], units: LengthUnits): readonly Settled[] | Trouble {
  const [first, second, third] = quantities;
  if (!first) return [];
  if (third) return { at: third.at, problem: 'unexpectedNumber' };
  if (!second) return [{ ...first, unit: first.unit ?? (units === 'imperial' ? 'in' : 'mm') }];
  const feetFirst = first.unit === 'ft' || (first.unit === null && second.dashed);
  const unit = second.unit ?? 'in';
  if (feetFirst && unit === 'in') {
    if (second.amount.top >= 12n * second.amount.bottom) return { at: second.at, problem: 'inchesTooLarge' };
    return [
      { ...first, unit: 'ft' },
      { ...second, unit },
    ];
  }
  const order: readonly UnitName[] = ['m', 'cm', 'mm'];
  const larger = first.unit === null ? -1 : order.indexOf(first.unit);
  if (first.unit !== null && larger >= 0 && second.unit !== null && order.indexOf(second.unit) > larger) {
    return [
      { ...first, unit: first.unit },
      { ...second, unit: second.unit },
    ];
  }
  return { at: second.at, problem: 'unexpectedNumber' };
}

/** Half away from zero, of a fraction that is not negative. */
function roundFraction(top: bigint, bottom: bigint): bigint {
  return (2n * top + bottom) / (2n * bottom);
}

function refuse(trouble: Trouble): ReadLength {
  return { ok: false, at: trouble.at, problem: trouble.problem };
}

/**
 * Reads a length. A bare number takes the site's unit: inches or millimetres. Decimals and fractions are added exactly and
 * rounded to the tick once, half away from zero. A minus sign in front is allowed; whether a negative length makes sense
 * is for the asker to say.
 */
export function readLength(text: string, site: { readonly units: LengthUnits }): ReadLength {
  const { negative, tokens, problem } = tokenise(text, site.units);
  if (problem) return refuse(problem);
  const quantities = groupQuantities(tokens);
  if ('problem' in quantities) return refuse(quantities);
  const parts = settleUnits(quantities, site.units);
  if ('problem' in parts) return refuse(parts);
  const [first] = parts;
  if (!first) return refuse({ at: Math.max(0, text.trimEnd().length - 1), problem: 'empty' });
  let sum: Amount = { top: 0n, bottom: 1n };
  for (const { amount, unit } of parts)
    sum = addAmounts(sum, { top: amount.top * BigInt(TICKS_PER_UNIT[unit]), bottom: amount.bottom });
  const size = roundFraction(sum.top, sum.bottom);
  if (size > MOST) return refuse({ at: first.at, problem: 'tooLarge' });
  const value = Number(size);
  return { ok: true, ticks: ticks(negative && value > 0 ? -value : value) };
}
