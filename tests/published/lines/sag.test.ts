/** Sag of a taut line and when to hold it up, against statics and published advice. */
import { describe, expect, it } from 'vitest';
import { feet, TICKS_PER_INCH } from '../../../model/length/ticks';
import { sagExact } from '../../../model/lines/sag';
import { stringLines } from '../../../model/lines/stringLines';
import { placePoles } from '../../../model/poles/placePoles';
import { layOutWalls } from '../../../model/walls/layOutWalls';
import { freeWall } from '../../helpers/drawings';

/** The pound is exactly 0.45359237 kg and standard gravity 9.80665 m/s² (NIST SP 811, appendix B). */
const NEWTONS_PER_POUND = 0.45359237 * 9.80665;
/** 1 100 ft of line to the pound; the line's weight is from memory. */
const LINE_WEIGHT = (NEWTONS_PER_POUND * 1000) / (1100 * 0.3048);

describe('sag of a taut line', () => {
  // Derived: s = w L² / (8 T) (statics), for a line of 1 100 ft to the pound (from memory).
  it.each([
    [20, 20, 0.027],
    [40, 20, 0.109],
    [40, 10, 0.218],
  ])('of %i ft at %i lb is %f in', (span, pounds, sag) => {
    const found = sagExact(feet(span), LINE_WEIGHT, pounds * NEWTONS_PER_POUND) / TICKS_PER_INCH;
    expect(found.toFixed(3)).toBe(sag.toFixed(3));
  });

  // Statics: sag grows with the square of the length.
  it('is four times as much for a line twice as long, and a quarter with a trig at the middle', () => {
    const whole = sagExact(feet(36), LINE_WEIGHT, 90);
    expect(sagExact(feet(72), LINE_WEIGHT, 90) / whole).toBeCloseTo(4, 12);
    expect(sagExact(feet(18), LINE_WEIGHT, 90) / whole).toBeCloseTo(1 / 4, 12);
  });
});

describe('trigs', () => {
  // Masonry Construction magazine, "Building walls straight": set one or more trigs on walls of 40 ft and more.
  it.each([
    ['just under 40 ft has none', 479, 0],
    ['of 40 ft has one', 480, 1],
  ])('a line %s, where its sag alone would not ask for one', (_, length, trigs) => {
    const drawing = { ...freeWall(length), ruleValues: { lineSagMost: 2 * TICKS_PER_INCH } };
    const walls = layOutWalls(drawing);
    const poles = placePoles(drawing, walls);
    const [first, last] = ['c1', 'c2'].map((id) => poles.poleById.get(id)!);
    const ends = { ...poles, poles: [first!, last!] };
    expect(stringLines(drawing, walls, ends).lines[0]!.trigs).toHaveLength(trigs);
  });
});
