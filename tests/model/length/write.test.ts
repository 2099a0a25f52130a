import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readLength } from '../../../model/length/read';
import { sayLength, sayNumber } from '../../../model/length/say';
import { inches, mm, ticks } from '../../../model/length/ticks';
import { measureParts, shownLength, writeLength, type LengthFormat } from '../../../model/length/write';

const sixteenth = ticks(1016);
const feetInches = { units: 'imperial', step: sixteenth } as const;
const onlyInches = { units: 'imperial', step: sixteenth, style: 'inches' } as const;
const millimetres = { units: 'metric', step: mm(1) } as const;
const metres = { units: 'metric', step: mm(1), style: 'm' } as const;

/** Every setting of the tape with every style that it can show. */
const FORMATS: readonly LengthFormat[] = [
  ...[2032, 1016, 508].flatMap((step) =>
    (['feetInches', 'inches'] as const).map((style) => ({ units: 'imperial' as const, step: ticks(step), style })),
  ),
  millimetres,
  metres,
  { units: 'metric', step: ticks(64), style: 'mm' },
  { units: 'metric', step: ticks(64), style: 'm' },
];

describe('a length in writing', () => {
  it.each([
    [0, `0"`, `0"`],
    [3 / 8, `3/8"`, `3/8"`],
    [4, `4"`, `4"`],
    [4.375, `4 3/8"`, `4 3/8"`],
    [12, `1' 0"`, `12"`],
    [12.5, `1' 0 1/2"`, `12 1/2"`],
    [64.375, `5' 4 3/8"`, `64 3/8"`],
    [-0.375, `-3/8"`, `-3/8"`],
    [-64, `-5' 4"`, `-64"`],
    [71.97, `6' 0"`, `72"`],
    [71.96, `5' 11 15/16"`, `71 15/16"`],
    [-1 / 64, `0"`, `0"`],
  ])('writes %d in as %s and %s', (value, inFeet, inInches) => {
    expect(writeLength(inches(value), feetInches)).toBe(inFeet);
    expect(writeLength(inches(value), onlyInches)).toBe(inInches);
  });

  it('rounds half a sixteenth away from zero', () => {
    expect(writeLength(ticks(508), onlyInches)).toBe(`1/16"`);
    expect(writeLength(ticks(507), onlyInches)).toBe(`0"`);
    expect(writeLength(ticks(-508), onlyInches)).toBe(`-1/16"`);
  });

  // n × 8/3 in, each from zero: derived from the vertical coursing table of the Brick Industry Association's Technical Notes.
  it.each([
    [1, `2 11/16"`],
    [2, `5 5/16"`],
    [4, `10 11/16"`],
    [5, `1' 1 5/16"`],
    [7, `1' 6 11/16"`],
    [8, `1' 9 5/16"`],
    [10, `2' 2 11/16"`],
    [45, `10' 0"`],
    [50, `11' 1 5/16"`],
    [100, `22' 2 11/16"`],
  ])('rounds the mark of course %i of modular brick to %s', (course, written) => {
    expect(writeLength(inches((course * 8) / 3), feetInches)).toBe(written);
  });

  it('writes millimetres and metres', () => {
    expect(writeLength(mm(350), millimetres)).toBe('350 mm');
    expect(writeLength(mm(349.5), millimetres)).toBe('350 mm');
    expect(writeLength(mm(-0.4), millimetres)).toBe('0 mm');
    expect(writeLength(mm(1200), metres)).toBe('1.200 m');
    expect(writeLength(mm(-5), metres)).toBe('-0.005 m');
    expect(writeLength(mm(12.3), { units: 'metric', step: ticks(64) })).toBe('12.3 mm');
    expect(writeLength(inches(4), { units: 'metric', step: sixteenth })).toBe('102 mm');
  });

  it('reads back to what it showed, on every step of every tape', () => {
    for (const format of FORMATS) {
      fc.assert(
        fc.property(fc.integer({ min: -40_000_000, max: 40_000_000 }), (length) => {
          const shown = shownLength(ticks(length), format);
          expect(readLength(writeLength(ticks(length), format), format)).toEqual({ ok: true, ticks: shown });
        }),
        { numRuns: 300 },
      );
    }
    // And every single step over a ten-foot pole, up and down.
    for (const format of FORMATS) {
      const wrong: number[] = [];
      for (let length = -inches(120); length <= inches(120); length += format.step) {
        const whole = shownLength(ticks(length), format);
        const read = readLength(writeLength(whole, format), format);
        if (!read.ok || read.ticks !== whole) wrong.push(whole);
      }
      expect(wrong).toEqual([]);
    }
  });

  it('never shows 12 inches beside feet, an unreduced fraction or minus zero', () => {
    fc.assert(
      fc.property(fc.integer({ min: -40_000_000, max: 40_000_000 }), (length) => {
        const { feet, whole, numerator, denominator, sign } = measureParts(ticks(length), feetInches);
        expect(whole).toBeLessThan(12);
        expect(feet ?? 1).toBeGreaterThan(0);
        expect(numerator === 0 ? denominator === 1 : numerator % 2 === 1 && 16 % denominator === 0).toBe(true);
        if ((feet ?? 0) + whole + numerator === 0) expect(sign).toBe('');
      }),
    );
  });
});

describe('a length read aloud', () => {
  it.each([
    [51.375, 'four feet three and three eighths'],
    [48, 'four feet'],
    [12, 'one foot'],
    [13, 'one foot one'],
    [12.5, 'one foot and one half of an inch'],
    [4.375, 'four and three eighths inches'],
    [1, 'one inch'],
    [0, 'zero inches'],
    [0.375, 'three eighths of an inch'],
    [1 / 16, 'one sixteenth of an inch'],
    [-4, 'minus four inches'],
    [24 * 12 + 11.75, 'twenty-four feet eleven and three quarters'],
  ])('says %d in as "%s"', (value, said) => {
    expect(sayLength(inches(value), 'imperial', sixteenth)).toBe(said);
  });

  it('says inches alone where the style is inches', () => {
    expect(sayLength(inches(64.375), 'imperial', sixteenth, 'inches')).toBe('sixty-four and three eighths inches');
  });

  it('says no two steps of a tape alike, over a ten-foot pole', () => {
    for (const { units, step, style } of FORMATS) {
      const said = new Map<string, number>();
      for (let length = 0; length <= inches(120); length += step) {
        const words = sayLength(ticks(length), units, step, style);
        expect([words, said.get(words)]).toEqual([words, undefined]);
        said.set(words, length);
      }
      expect(said.size).toBe(Math.floor(inches(120) / step) + 1);
    }
  });

  it('says metric lengths', () => {
    expect(sayLength(mm(350), 'metric', mm(1))).toBe('three hundred and fifty millimetres');
    expect(sayLength(mm(1), 'metric', mm(1))).toBe('one millimetre');
    expect(sayLength(mm(1200), 'metric', mm(1), 'm')).toBe('one point two metres');
    expect(sayLength(mm(3005), 'metric', mm(1), 'm')).toBe('three point zero zero five metres');
    expect(sayLength(mm(1000), 'metric', mm(1), 'm')).toBe('one metre');
  });

  it('says numbers as people do', () => {
    expect([0, 13, 20, 42, 100, 101, 999].map(sayNumber)).toEqual([
      'zero',
      'thirteen',
      'twenty',
      'forty-two',
      'one hundred',
      'one hundred and one',
      'nine hundred and ninety-nine',
    ]);
    expect([1000, 1005, 1250, 20_000].map(sayNumber)).toEqual([
      'one thousand',
      'one thousand and five',
      'one thousand two hundred and fifty',
      'twenty thousand',
    ]);
    expect(sayNumber(1_000_000)).toBe('1000000');
  });
});
