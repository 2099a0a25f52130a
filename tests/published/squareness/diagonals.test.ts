/** Diagonals and squareness against geometry and a published figure. */
import Fraction from 'fraction.js';
import { describe, expect, it } from 'vitest';
import { feet, inches, roundToStep, ticks, TICKS_PER_INCH, type Ticks } from '../../../model/length/ticks';
import { checkSquare } from '../../../model/squareness/checkSquare';
import { rectangleLean } from '../../../model/squareness/rectangle';
import { squareLimits } from '../../../model/squareness/squareLimits';
import type { DrawnCorner } from '../../../model/squareness/types';
import { layOutWalls } from '../../../model/walls/layOutWalls';
import { rectangle } from '../../helpers/drawings';

const limits = squareLimits(rectangle(240, 120));

function corners(places: readonly (readonly [number, number])[]): DrawnCorner[] {
  return places.map(([x, y], i) => ({ id: 'ABCD'[i]!, at: { x: inches(x), y: inches(y) } }));
}

function taped(places: readonly (readonly [number, number])[]) {
  return ['AB', 'BC', 'CD', 'DA', 'AC', 'BD'].map((id) => {
    const [p, q] = [...id].map((letter) => places['ABCD'.indexOf(letter)]!);
    return { id, from: id[0]!, to: id[1]!, length: inches(Math.hypot(q![0] - p![0], q![1] - p![1])) };
  });
}

function diagonalOf(width: number, depth: number): Ticks {
  const { diagonals } = layOutWalls(rectangle(width, depth));
  expect(diagonals).toHaveLength(2);
  expect(diagonals[0]!.length).toBe(diagonals[1]!.length);
  return diagonals[0]!.length;
}

describe('the diagonal of a rectangle', () => {
  // US Army EN0069A, fig. 1-39: 30 × 40 → 50; and 8.5 × 11 → 13.90, in feet here.
  it('of 30 × 40 ft is 50 ft', () => {
    expect(diagonalOf(360, 480)).toBe(feet(50));
  });

  it('of 8.5 × 11 ft is 13.90 ft', () => {
    expect((diagonalOf(8.5 * 12, 11 * 12) / feet(1)).toFixed(2)).toBe('13.90');
  });

  // Derived: 5'-4" × 5'-8", to 1/16 in.
  it('of 5 ft 4 in × 5 ft 8 in is 7 ft 9 3/8 in to the sixteenth', () => {
    expect(roundToStep(diagonalOf(64, 68), ticks(1016))).toBe(feet(7, 9.375));
  });
});

describe('out of square', () => {
  const drawn = [
    [0, 0],
    [360, 0],
    [360, 240],
    [0, 240],
  ] as const;

  // Derived: 20 × 30 ft skewed 1/4 in along the 30 ft side: the diagonals differ by 0.416 in.
  it('by 1/4 in along 30 ft makes diagonals that differ by 0.416 in, and is found again', () => {
    const leaning = [drawn[0], drawn[1], [360.25, 240], [0.25, 240]] as const;
    const [long, short] = taped(leaning).slice(4);
    expect(((long!.length - short!.length) / TICKS_PER_INCH).toFixed(3)).toBe('0.416');
    expect(Math.abs(rectangleLean(feet(30), long!.length, short!.length) - inches(0.25))).toBeLessThan(3);
    // The difference of squares is 4 l s exactly (Pythagoras), by rational arithmetic.
    const squares = (s: Fraction) => new Fraction(360).add(s).pow(2)!.sub(new Fraction(360).sub(s).pow(2)!);
    expect(squares(new Fraction(1, 4)).equals(new Fraction(4 * 360).div(4))).toBe(true);
    const found = checkSquare(corners(drawn), taped(leaning), limits);
    expect(found.within).toBe(true);
    expect(found.worst).toBe(found.taped[4]!.off);
  });

  // Geometry (US Army EN0069A, fig. 1-39): equal diagonals mean square only where opposite sides are equal.
  it('an isosceles trapezoid has equal diagonals and is not square', () => {
    const trapezoid = [drawn[0], drawn[1], [354, 240], [6, 240]] as const;
    const [long, other] = taped(trapezoid).slice(4);
    expect(long!.length).toBe(other!.length);
    const found = checkSquare(corners(drawn), taped(trapezoid), limits);
    expect(found.within).toBe(false);
    expect(found.moves.some(({ distance }) => distance > inches(5))).toBe(true);
  });
});
