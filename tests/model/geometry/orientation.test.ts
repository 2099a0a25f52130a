import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { compareBearings, orientation } from '../../../model/geometry/orientation';
import { ticks } from '../../../model/length/ticks';

const MOST = 1_280_000_000;
const point = fc.record({ x: fc.integer({ min: -MOST, max: MOST }), y: fc.integer({ min: -MOST, max: MOST }) });
const at = (x: number, y: number) => ({ x: ticks(x), y: ticks(y) });

/** The same sign in whole numbers of any size. */
function exactSign(a: { x: number; y: number }, b: { x: number; y: number }, c: { x: number; y: number }): number {
  const big = BigInt;
  const value = (big(b.x) - big(a.x)) * (big(c.y) - big(a.y)) - (big(b.y) - big(a.y)) * (big(c.x) - big(a.x));
  return value > 0n ? 1 : value < 0n ? -1 : 0;
}

describe('orientation', () => {
  it('tells left from right', () => {
    expect(orientation(at(0, 0), at(10, 0), at(5, 1))).toBe(1);
    expect(orientation(at(0, 0), at(10, 0), at(5, -1))).toBe(-1);
    expect(orientation(at(0, 0), at(10, 0), at(20, 0))).toBe(0);
  });

  it('is exact where products pass 2^53', () => {
    // One tick off a line 3.6 km long: the products are near 6.5e18 and differ by about 2.6e9, or by 1.
    expect(orientation(at(-MOST, -MOST), at(MOST, MOST - 1), at(0, 0))).toBe(1);
    expect(orientation(at(-MOST, -MOST), at(MOST, MOST), at(1, 1))).toBe(0);
    // n(n − 2) − (n − 1)² = −1, though each product is near 1.6e18.
    const n = 1_279_999_999;
    expect(orientation(at(0, 0), at(n, n - 1), at(n - 1, n - 2))).toBe(-1);
  });

  it('agrees with whole numbers of any size everywhere, near lines above all', () => {
    fc.assert(
      fc.property(
        point,
        point,
        fc.double({ min: -1, max: 1, noNaN: true }),
        fc.integer({ min: -2, max: 2 }),
        (a, b, t, off) => {
          const c = { x: Math.round((a.x + (b.x - a.x) * t) / 2), y: Math.round((a.y + (b.y - a.y) * t) / 2) + off };
          expect(orientation(at(a.x, a.y), at(b.x, b.y), at(c.x, c.y))).toBe(exactSign(a, b, c));
        },
      ),
      { numRuns: 2000 },
    );
  });
});

describe('the order of bearings', () => {
  it('goes counter-clockwise from +x', () => {
    const ways = [
      [1, 0],
      [2, 1],
      [0, 1],
      [-1, 1],
      [-1, 0],
      [-1, -1],
      [0, -1],
      [1, -1],
    ] as const;
    const shuffled = [...ways].reverse().sort((a, b) => compareBearings(a[0], a[1], b[0], b[1]));
    expect(shuffled).toEqual(ways);
  });

  it('finds directions equal whatever their length, and opposite ones not', () => {
    expect(compareBearings(1, 2, 3, 6)).toBe(0);
    expect(compareBearings(1, 2, -1, -2)).not.toBe(0);
  });
});
