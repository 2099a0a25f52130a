import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  clipToConvex,
  contains,
  counterClockwise,
  distanceBetweenPolygons,
  distanceSegmentToPolygon,
  distanceToPolygon,
  floatArea,
  overlapDepth,
  signedArea,
  whereIs,
} from '../../../model/geometry/polygon';
import { ticks } from '../../../model/length/ticks';

const at = (x: number, y: number) => ({ x: ticks(x), y: ticks(y) });
const box = (x: number, y: number, w: number, h: number) => [at(x, y), at(x + w, y), at(x + w, y + h), at(x, y + h)];
const ell = [at(0, 0), at(10, 0), at(10, 4), at(4, 4), at(4, 10), at(0, 10)];

describe('the area of a polygon', () => {
  it('is signed, positive counter-clockwise', () => {
    expect(signedArea(box(0, 0, 3, 4))).toBe(12);
    expect(signedArea([...box(0, 0, 3, 4)].reverse())).toBe(-12);
    expect(signedArea(ell)).toBe(64);
    expect(signedArea(counterClockwise([...ell].reverse()))).toBe(64);
  });
  it('keeps halves, and is exact for shapes far from the origin', () => {
    expect(signedArea([at(0, 0), at(1, 0), at(0, 1)])).toBe(0.5);
    expect(signedArea(box(1_279_000_000, -1_279_000_000, 7, 3))).toBe(21);
  });
  it('is none for fewer than three points', () => {
    expect(signedArea([])).toBe(0);
    expect(signedArea([at(3, 4), at(9, 9)])).toBe(0);
  });
});

describe('where a point lies', () => {
  it('tells inside, edge and outside', () => {
    expect(whereIs(ell, at(2, 2))).toBe('inside');
    expect(whereIs(ell, at(4, 7))).toBe('edge');
    expect(whereIs(ell, at(10, 4))).toBe('edge');
    expect(whereIs(ell, at(7, 7))).toBe('outside');
    expect(whereIs(ell, at(-1, 0))).toBe('outside');
  });
  it('does not depend on the way round', () => {
    for (let x = -1; x <= 11; x++) {
      for (let y = -1; y <= 11; y++) expect(whereIs([...ell].reverse(), at(x, y))).toBe(whereIs(ell, at(x, y)));
    }
  });
  it('agrees with the test in floating point away from the edges', () => {
    for (let x = -0.5; x < 11; x++) {
      for (let y = -0.5; y < 11; y++) {
        const inside = x > 0 && y > 0 && x < 10 && y < 10 && (x < 4 || y < 4);
        expect(contains(ell, { x, y })).toBe(inside);
      }
    }
  });
});

describe('distances', () => {
  it('are none inside and to the nearest edge outside', () => {
    expect(distanceToPolygon(ell, { x: 2, y: 2 })).toBe(0);
    expect(distanceToPolygon(ell, { x: 7, y: 6 })).toBe(2);
    expect(distanceToPolygon(ell, { x: 13, y: 8 })).toBe(5);
  });
  it('between polygons are none where they overlap or one holds the other', () => {
    expect(distanceBetweenPolygons(box(0, 0, 4, 4), box(7, 8, 2, 2))).toBe(5);
    expect(distanceBetweenPolygons(box(0, 0, 4, 4), box(4, 0, 4, 4))).toBe(0);
    expect(distanceBetweenPolygons(box(0, 0, 10, 10), box(3, 3, 1, 1))).toBe(0);
    expect(distanceBetweenPolygons([], box(0, 0, 1, 1))).toBe(Infinity);
  });
  it('from a segment to a polygon', () => {
    expect(distanceSegmentToPolygon(box(0, 0, 4, 4), at(6, -5), at(6, 9))).toBe(2);
    expect(distanceSegmentToPolygon(box(0, 0, 4, 4), at(-2, 2), at(9, 2))).toBe(0);
    expect(distanceSegmentToPolygon(box(0, 0, 4, 4), at(1, 1), at(2, 2))).toBe(0);
  });
});

describe('how deep convex polygons overlap', () => {
  it('is the least shift that parts them', () => {
    expect(overlapDepth(box(0, 0, 10, 10), box(7, 2, 10, 3))).toBe(3);
    expect(overlapDepth(box(0, 0, 10, 10), box(10, 0, 4, 4))).toBe(0);
    expect(overlapDepth(box(0, 0, 10, 10), box(13, 0, 4, 4))).toBe(-3);
  });
  it('is the same both ways', () => {
    const side = fc.integer({ min: -20, max: 20 });
    const size = fc.integer({ min: 1, max: 20 });
    fc.assert(
      fc.property(side, side, size, size, side, side, size, size, (x, y, w, h, u, v, s, t) => {
        const [p, q] = [box(x, y, w, h), box(u, v, s, t)];
        expect(overlapDepth(p, q) > 0).toBe(overlapDepth(q, p) > 0);
        expect(overlapDepth(p, q) > 0).toBe(x < u + s && u < x + w && y < v + t && v < y + h);
      }),
    );
  });
});

describe('clipping to a convex polygon', () => {
  it('keeps the part inside', () => {
    expect(floatArea(clipToConvex(ell, box(2, 2, 20, 20)))).toBe(8 * 8 - 6 * 6);
    expect(clipToConvex(ell, box(20, 20, 5, 5))).toEqual([]);
    expect(floatArea(clipToConvex(box(0, 0, 4, 4), box(-9, -9, 30, 30)))).toBe(16);
  });
});
