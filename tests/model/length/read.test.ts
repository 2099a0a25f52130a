import fc from 'fast-check';
import Fraction from 'fraction.js';
import { describe, expect, it } from 'vitest';
import { readLength } from '../../../model/length/read';
import type { LengthProblem } from '../../../model/length/tokens';
import { LENGTH_PROBLEMS } from '../../../model/length/tokens';
import { lengths } from '../../../model/words/en/lengths';

/** Ticks by rational arithmetic from outside: the inch is exactly 25.4 mm (NIST SP 811, B.8), the tick 1/640 mm. */
function ticksOf(inches: string): number {
  return Number(new Fraction(inches).mul(new Fraction('25.4')).mul(640).valueOf());
}

const imperial = { units: 'imperial' } as const;
const metric = { units: 'metric' } as const;

describe('a length as typed on an imperial site', () => {
  it.each([
    [`5' 4"`, '64'],
    [`5'4`, '64'],
    [`5'4"`, '64'],
    ['5-4', '64'],
    ['5-4 3/8', '515/8'],
    [`5'-4 3/8"`, '515/8'],
    [`5' - 4 3/8"`, '515/8'],
    ['64 3/8"', '515/8'],
    ['64.375', '515/8'],
    ['4 3/8', '35/8'],
    ['4-3/8', '35/8'],
    ['4⅜', '35/8'],
    ['4 ⅜"', '35/8'],
    ['4 3⁄8', '35/8'],
    ['½', '1/2'],
    ['3/8"', '3/8'],
    ['9/8', '9/8'],
    ['5′ 4½″', '129/2'],
    ['5’ 4¼”', '257/4'],
    [`5'' `, '5'],
    [`5' 0 3/8"`, '483/8'],
    ['5 ft 4 in', '64'],
    ['5 feet', '60'],
    ['1 foot 1 inch', '13'],
    ['5 feet, 4 inches', '64'],
    ['5ʼ 4ˮ', '64'],
    [`5'-4-3/8"`, '515/8'],
    ['5 100/128', '740/128'],
    ['5ft4', '64'],
    ['0', '0'],
    ['.5', '1/2'],
    ['5.', '5'],
    ['2,5', '5/2'],
    ['-4 3/8', '-35/8'],
    ['−4 3/8', '-35/8'],
    [`-5' 4"`, '-64'],
    [' 12 ', '12'],
  ])('reads %s as %s in', (text, inches) => {
    expect(readLength(text, imperial)).toEqual({ ok: true, ticks: ticksOf(inches) });
  });

  it('reads millimetres, centimetres and metres anywhere', () => {
    for (const site of [imperial, metric]) {
      expect(readLength('1.2 m', site)).toEqual({ ok: true, ticks: 768_000 });
      expect(readLength('350 mm', site)).toEqual({ ok: true, ticks: 224_000 });
      expect(readLength('35cm', site)).toEqual({ ok: true, ticks: 224_000 });
      expect(readLength('1 m 20 cm', site)).toEqual({ ok: true, ticks: 768_000 });
    }
  });

  it('reads digits set apart in threes where they can only be one metric number', () => {
    for (const site of [imperial, metric]) {
      expect(readLength('1 200 mm', site)).toEqual({ ok: true, ticks: 768_000 });
      expect(readLength('1 000 200,5 mm', site)).toEqual({ ok: true, ticks: 640_128_320 });
      expect(readLength('1\u202f200 mm', site)).toEqual({ ok: true, ticks: 768_000 });
      expect(readLength('1 200,125 mm', site)).toEqual({ ok: false, at: 5, problem: 'ambiguousComma' });
      expect(readLength('1 20 mm', site)).toEqual({ ok: false, at: 2, problem: 'unexpectedNumber' });
      expect(readLength('1 200 ft', site)).toEqual({ ok: false, at: 2, problem: 'unexpectedNumber' });
    }
    expect(readLength('1 200', metric)).toEqual({ ok: true, ticks: 768_000 });
    expect(readLength('1 200', imperial)).toEqual({ ok: false, at: 2, problem: 'unexpectedNumber' });
  });

  it('gives a bare number the unit of the site', () => {
    expect(readLength('64', imperial)).toEqual({ ok: true, ticks: 1_040_384 });
    expect(readLength('64', metric)).toEqual({ ok: true, ticks: 40_960 });
  });

  it('never gives minus zero', () => {
    const read = readLength('-0', imperial);
    expect(read.ok && Object.is(read.ticks, 0)).toBe(true);
  });

  it('adds decimals exactly and rounds once, half away from zero', () => {
    // 0.0001 in is 1.6256 ticks; 1/32 512 in is half a tick.
    expect(readLength('0.0001', imperial)).toEqual({ ok: true, ticks: 2 });
    expect(readLength('1/32512', imperial)).toEqual({ ok: true, ticks: 1 });
    expect(readLength('-1/32512', imperial)).toEqual({ ok: true, ticks: -1 });
    expect(readLength('1/32513', imperial)).toEqual({ ok: true, ticks: 0 });
  });

  it('agrees with rational arithmetic on every decimal', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 9999 }), fc.integer({ min: 0, max: 999_999 }), (whole, part) => {
        const text = `${whole}.${String(part).padStart(6, '0')}`;
        const exact = new Fraction(text).mul(16_256);
        const expected = Number(exact.add(new Fraction(1, 2)).floor().valueOf());
        expect(readLength(text, imperial)).toEqual({ ok: true, ticks: expected });
      }),
    );
  });
});

describe('a length that can’t be read', () => {
  it.each<[string, LengthProblem, number]>([
    ['', 'empty', 0],
    ['   ', 'empty', 0],
    ['-', 'empty', 0],
    ['four', 'unknownUnit', 0],
    ['4 x', 'unknownUnit', 2],
    ['4 cubits', 'unknownUnit', 2],
    ['constructor', 'unknownUnit', 0],
    ['4 * 3', 'unexpectedCharacter', 2],
    ['--3', 'unexpectedCharacter', 1],
    ['3-', 'unexpectedCharacter', 1],
    ['5 - - 4', 'unexpectedCharacter', 4],
    ['5 4', 'unexpectedNumber', 2],
    [`5' 4 3`, 'unexpectedNumber', 5],
    ['1.5 3/8', 'unexpectedNumber', 4],
    [`4" 5'`, 'unexpectedNumber', 3],
    ['"', 'unitWithoutNumber', 0],
    [`5' "`, 'unitWithoutNumber', 3],
    ['3/0', 'zeroDenominator', 2],
    ['4 3/0', 'zeroDenominator', 4],
    ['4 9/8', 'fractionTooLarge', 2],
    ['4 8/8', 'fractionTooLarge', 2],
    ['5/', 'fractionUnfinished', 1],
    ['5 /"', 'fractionUnfinished', 2],
    [`5' 12"`, 'inchesTooLarge', 3],
    ['5-12', 'inchesTooLarge', 2],
    ['1,200', 'ambiguousComma', 1],
    ['79000', 'tooLarge', 0],
    ['2.1 km', 'unknownUnit', 4],
    ['1'.repeat(41), 'tooLong', 40],
  ])('says what is wrong with %j: %s at %i', (text, problem, at) => {
    expect(readLength(text, imperial)).toEqual({ ok: false, problem, at });
  });

  it('points at a character that does not belong, wherever it stands', () => {
    const texts = [`5' 4 3/8"`, '5-4 3/8', '64.375', '1.2 m', '350 mm', '1 200 mm', '4½', '-4 3/8'];
    for (const text of texts) {
      for (let at = 0; at <= text.length; at++) {
        for (const foreign of ['#', '*', '=', '٣', '\u{1F9F1}']) {
          const read = readLength(text.slice(0, at) + foreign + text.slice(at), metric);
          // A fraction that is broken off before it is pointed at by its line.
          const line = text.indexOf('/');
          const expected = line >= 0 && at === line + 1 ? [at, line] : [at];
          expect(read.ok).toBe(false);
          if (!read.ok) expect(expected).toContain(read.at);
        }
      }
    }
  });

  it('has words for every problem', () => {
    expect(Object.keys(lengths.problems).sort()).toEqual([...LENGTH_PROBLEMS].sort());
  });

  it('answers for any text at all, and points into it', () => {
    const bits = fc.constantFrom('5', '12', '.', ',', "'", '"', '-', '/', ' ', '½', 'm', 'ft', '0', 'x', '′', '−');
    fc.assert(
      fc.property(
        fc.oneof(
          fc.string(),
          fc.array(bits).map((list) => list.join('')),
        ),
        (text) => {
          const read = readLength(text, metric);
          if (read.ok) expect(Number.isInteger(read.ticks)).toBe(true);
          else expect(read.at >= 0 && read.at <= Math.max(0, text.length - 1)).toBe(true);
        },
      ),
      { numRuns: 1000 },
    );
  });
});
