import { describe, expect, it } from 'vitest';
import {
  add,
  along,
  bearing,
  between,
  cross,
  dot,
  fromBearing,
  negate,
  perp,
  scale,
  sub,
  toPoint,
  unit,
} from '../../../model/geometry/vec';

describe('vectors', () => {
  it('add, subtract, scale and turn back', () => {
    expect(add({ x: 1, y: 2 }, { x: 10, y: 20 })).toEqual({ x: 11, y: 22 });
    expect(sub({ x: 1, y: 2 }, { x: 10, y: 20 })).toEqual({ x: -9, y: -18 });
    expect(scale({ x: 1, y: -2 }, 3)).toEqual({ x: 3, y: -6 });
    expect(negate({ x: 0, y: 2 })).toEqual({ x: 0, y: -2 });
    expect(along({ x: 1, y: 1 }, { x: 0, y: 1 }, 5)).toEqual({ x: 1, y: 6 });
    expect(between({ x: 0, y: 0 }, { x: 8, y: 4 }, 0.25)).toEqual({ x: 2, y: 1 });
  });
  it('have a left side', () => {
    expect(perp({ x: 1, y: 0 })).toEqual({ x: 0, y: 1 });
    expect(perp({ x: 0, y: 1 })).toEqual({ x: -1, y: 0 });
    expect(cross({ x: 1, y: 0 }, { x: 0, y: 1 })).toBe(1);
    expect(dot({ x: 3, y: 4 }, { x: 4, y: -3 })).toBe(0);
  });
  it('have unit length, exactly along the axes, and none without a direction', () => {
    expect(unit({ x: -7, y: 0 })).toEqual({ x: -1, y: 0 });
    expect(unit({ x: 3, y: 4 })).toEqual({ x: 0.6, y: 0.8 });
    expect(unit({ x: 0, y: 0 })).toEqual({ x: 0, y: 0 });
  });
  it('have bearings from 0 up to 360', () => {
    expect([
      bearing({ x: 1, y: 0 }),
      bearing({ x: 0, y: 1 }),
      bearing({ x: -1, y: 0 }),
      bearing({ x: 0, y: -1 }),
      bearing({ x: 1, y: -1 }),
    ]).toEqual([0, 90, 180, 270, 315]);
    expect([0, 90, 180, 270, 360, -90].map(fromBearing)).toEqual([
      { x: 1, y: 0 },
      { x: 0, y: 1 },
      { x: -1, y: 0 },
      { x: 0, y: -1 },
      { x: 1, y: 0 },
      { x: 0, y: -1 },
    ]);
    for (let degrees = 0; degrees < 360; degrees += 7) expect(bearing(fromBearing(degrees))).toBeCloseTo(degrees, 9);
  });
  it('round to ticks half away from zero, never to minus zero', () => {
    expect(toPoint({ x: 0.5, y: -0.5 })).toEqual({ x: 1, y: -1 });
    expect(Object.is(toPoint({ x: -0.2, y: 0 }).x, 0)).toBe(true);
  });
});
