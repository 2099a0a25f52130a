/** Reads a length as people write it on site, exactly, or says what was wrong with it and where. */
import type { Units } from '../drawing/schema';
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

class Wrong extends Error {
  constructor(
    readonly at: number,
    readonly problem: LengthProblem,
  ) {
    super(problem);
  }
}

function addAmounts(a: Amount, b: Amount): Amount {
  return { top: a.top * b.bottom + b.top * a.bottom, bottom: a.bottom * b.bottom };
}

/** Joins a whole number and the fraction after it, and each number with its unit. */
function groupQuantities(tokens: readonly Token[]): readonly Quantity[] {
  const quantities: Quantity[] = [];
  let i = 0;
  let dashed = false;
  while (i < tokens.length) {
    const token = tokens[i];
    if (!token) break;
    if (token.kind === 'dash') {
      const after = tokens[i + 1];
      if (quantities.length === 0 || dashed || after?.kind !== 'number')
        throw new Wrong(token.at, 'unexpectedCharacter');
      dashed = true;
      i++;
      continue;
    }
    if (token.kind === 'unit') throw new Wrong(token.at, 'unitWithoutNumber');
    let amount = token.amount;
    i++;
    const dash = tokens[i];
    const gap = dash?.kind === 'dash' ? 1 : 0;
    const fraction = tokens[i + gap];
    if (fraction?.kind === 'number' && fraction.form === 'fraction') {
      if (token.form !== 'whole') throw new Wrong(fraction.at, 'unexpectedNumber');
      if (fraction.amount.top >= fraction.amount.bottom) throw new Wrong(fraction.at, 'fractionTooLarge');
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

/** Gives every quantity a unit: `5'4` and `5-4` are feet and inches, one bare number takes the site's unit. */
function settleUnits(quantities: readonly Quantity[], units: Units): readonly { q: Quantity; unit: UnitName }[] {
  const [first, second, third] = quantities;
  if (!first) return [];
  if (third) throw new Wrong(third.at, 'unexpectedNumber');
  if (!second) return [{ q: first, unit: first.unit ?? (units === 'imperial' ? 'in' : 'mm') }];
  const feetFirst = first.unit === 'ft' || (first.unit === null && second.dashed);
  const unit = second.unit ?? 'in';
  if (feetFirst && unit === 'in') {
    if (second.amount.top >= 12n * second.amount.bottom) throw new Wrong(second.at, 'inchesTooLarge');
    return [
      { q: first, unit: 'ft' },
      { q: second, unit },
    ];
  }
  const order: readonly UnitName[] = ['m', 'cm', 'mm'];
  const larger = first.unit === null ? -1 : order.indexOf(first.unit);
  if (larger >= 0 && second.unit !== null && order.indexOf(second.unit) > larger) {
    return [
      { q: first, unit: first.unit ?? 'm' },
      { q: second, unit: second.unit },
    ];
  }
  throw new Wrong(second.at, 'unexpectedNumber');
}

/** Half away from zero, of a fraction that is not negative. */
function roundFraction(top: bigint, bottom: bigint): bigint {
  return (2n * top + bottom) / (2n * bottom);
}

function readWhole(text: string, units: Units): Ticks {
  const { negative, tokens, problem } = tokenise(text);
  if (problem) throw new Wrong(problem.at, problem.problem);
  const parts = settleUnits(groupQuantities(tokens), units);
  const first = parts[0];
  if (!first) throw new Wrong(Math.max(0, text.length - 1), 'empty');
  let sum: Amount = { top: 0n, bottom: 1n };
  for (const { q, unit } of parts)
    sum = addAmounts(sum, { top: q.amount.top * BigInt(TICKS_PER_UNIT[unit]), bottom: q.amount.bottom });
  const size = roundFraction(sum.top, sum.bottom);
  if (size > MOST) throw new Wrong(first.q.at, 'tooLarge');
  const value = Number(size);
  return ticks(negative && value > 0 ? -value : value);
}

/**
 * Reads a length. A bare number takes the site's unit: inches or millimetres. Decimals and fractions are added exactly and
 * rounded to the tick once, half away from zero. A minus sign in front is allowed; whether a negative length makes sense
 * is for the asker to say.
 */
export function readLength(text: string, site: { readonly units: Units }): ReadLength {
  try {
    return { ok: true, ticks: readWhole(text, site.units) };
  } catch (wrong) {
    if (wrong instanceof Wrong) return { ok: false, at: wrong.at, problem: wrong.problem };
    throw wrong;
  }
}
