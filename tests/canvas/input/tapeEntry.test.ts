import { describe, expect, it } from 'vitest';
import { fractionOf, pressTapeKey, typeTapeKey, type TapeKey } from '../../../canvas/input/tapeEntry';
import type { Units } from '../../../model/drawing/schema';

/** Keys as they are written on the keypad. */
function keyOf(name: string): TapeKey {
  if (/^\d$/.test(name)) return { kind: 'digit', digit: name };
  if (/^\d\/8$/.test(name)) return { kind: 'eighths', count: Number(name[0]) };
  if (name === '+16' || name === '+32') return { kind: 'odd', part: name === '+16' ? 16 : 32 };
  if (name === "'") return { kind: 'feet' };
  if (name === '.') return { kind: 'point' };
  if (name === 'mm' || name === 'm') return { kind: 'unit', unit: name };
  return { kind: 'erase' };
}
const press = (keys: string, units: Units = 'imperial', text = '') =>
  keys.split(' ').reduce((now, key) => pressTapeKey(now, keyOf(key), units), text);

describe('the tape keypad', () => {
  it.each([
    ['4 8', '48'],
    ['4 8 5/8', '48 5/8'],
    ["5 ' 4 3/8", "5'4 3/8"],
    ["1 6 '", "16'"],
    ["1 6 ' 0", "16'0"],
    ['3/8', '3/8'],
    ['4/8', '1/2'],
    ['4 3/8 +16', '4 7/16'],
    ['4 3/8 +16 +16', '4 3/8'],
    ['4 7/8 +16', '4 15/16'],
    ['+16', '1/16'],
    ['4 3/8 3/8', '4'],
    ['4 3/8 5/8', '4 5/8'],
    ['3/8 +32', '13/32'],
    ['0 7', '7'],
  ])('makes of %s: %s', (keys, text) => {
    expect(press(keys)).toBe(text);
  });

  it('keeps whole and fraction apart: a digit after a fraction still goes to the whole', () => {
    expect(press('4 3/8 5')).toBe('45 3/8');
  });

  it('erases the fraction, then the digits, then the foot mark', () => {
    const text = press("5 ' 4 3/8");
    expect(press('<', 'imperial', text)).toBe("5'4");
    expect(press('< <', 'imperial', text)).toBe("5'");
    expect(press('< < <', 'imperial', text)).toBe('5');
    expect(press('< < < < <', 'imperial', text)).toBe('');
  });

  it('takes one foot mark only, and none before a digit', () => {
    expect(press("5 ' '")).toBe("5'");
    expect(press("'")).toBe('');
    expect(press("5 ' 4 '")).toBe("5'4");
  });

  it('takes no more digits than a site is long', () => {
    expect(press('1 2 3 4 5 6 7 8')).toBe('123456');
  });

  it.each([
    ['3 5 0', '350'],
    ['1 . 2 m', '1.2 m'],
    ['1 . . 2', '1.2'],
    ['. 5 m', '0.5 m'],
    ['3 5 mm', '35 mm'],
    ['3 5 mm mm', '35'],
    ['3 5 mm 0', '350 mm'],
    ['3 5 mm < <', '3'],
    ['m', ''],
  ])('makes of %s in millimetres: %s', (keys, text) => {
    expect(press(keys, 'metric')).toBe(text);
  });

  it('only erases in a text that the keys could not have made', () => {
    expect(press('5', 'imperial', '64.375')).toBe('64.375');
    expect(press('<', 'imperial', '64.375')).toBe('64.37');
  });

  it('shows which fraction keys are down', () => {
    expect(fractionOf('4 15/16')).toEqual({ eighths: 7, sixteenth: true, thirtySecond: false });
    expect(fractionOf('4')).toEqual({ eighths: 0, sixteenth: false, thirtySecond: false });
    expect(fractionOf('1.2 m')).toBe(null);
  });

  it('takes a physical keyboard’s keys as they are typed', () => {
    expect(typeTapeKey('5', "'")).toBe("5'");
    expect(typeTapeKey('5', 'Backspace')).toBe('');
    expect(typeTapeKey('5', 'x')).toBe(null);
    expect(typeTapeKey('5', 'Shift')).toBe(null);
  });
});
