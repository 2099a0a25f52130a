/** Poles and walls of drawings that make no sense: an answer, reasons, whole figures, and no endless search. */
import { assert as check, array, boolean, constantFrom, integer, option, property, record, tuple } from 'fast-check';
import { describe, expect, it } from 'vitest';
import { drawingSchema, type Drawing } from '../../../model/drawing/schema';
import { inches, ticks } from '../../../model/length/ticks';
import { placePoles } from '../../../model/poles/placePoles';
import { layOutWalls } from '../../../model/walls/layOutWalls';
import { door, emptySite, KIT } from './sites';

const place = integer({ min: -12, max: 12 });
const point = tuple(place, place, constantFrom(0, 1)).map(([x, y, off]) => ({
  x: ticks(inches(x * 20) + off),
  y: inches(y * 20),
}));
const size = integer({ min: 0, max: 200 });

const drawings = record({
  corners: array(point, { minLength: 1, maxLength: 9 }),
  runs: array(tuple(integer({ min: 0, max: 8 }), integer({ min: 0, max: 8 })), { maxLength: 14 }),
  doors: array(tuple(integer({ min: 0, max: 13 }), integer({ min: -50, max: 400 }), size, size, boolean()), {
    maxLength: 4,
  }),
  areas: array(array(point, { minLength: 3, maxLength: 5 }), { maxLength: 3 }),
  boundary: option(array(point, { minLength: 3, maxLength: 6 })),
  clearance: integer({ min: 0, max: 30 }),
  leg: integer({ min: 1, max: 12 }),
  legs: tuple(integer({ min: 1, max: 200 }), integer({ min: 0, max: 100 })),
  fixing: integer({ min: 1, max: 120 }),
}).map(({ corners, runs, doors, areas, boundary, clearance, leg, legs, fixing }): Drawing => {
  const ids = corners.map((_, i) => `c${i}`);
  const wallRuns = runs.flatMap(([a, b], i) => {
    const [from, to] = [ids[a % ids.length]!, ids[b % ids.length]!];
    return from === to ? [] : [{ id: `r${i}`, from, to, wallTypeId: 'earth' }];
  });
  return {
    ...emptySite(),
    corners: corners.map((at, i) => ({ id: ids[i]!, letter: String.fromCharCode(65 + i), ...at })),
    runs: wallRuns,
    openings: doors.flatMap(([run, at, width, depth, used], i) => {
      const on = wallRuns[run % Math.max(1, wallRuns.length)];
      const way = { used, width: inches(width), depth: inches(depth) };
      return on ? [door(on.id, at, { id: `d${i}`, width: inches(width + 1), way })] : [];
    }),
    keepClears: areas.map((points, i) => ({ id: `k${i}`, name: 'area', points })),
    boundary,
    poleKit: {
      ...KIT,
      leg: inches(leg),
      clearance: inches(clearance),
      brace: { ...KIT.brace, fixing: inches(fixing), leastLeg: inches(legs[0]), mostLeg: inches(legs[0] + legs[1]) },
    },
  };
});

describe('any drawing', () => {
  it('has its walls laid out and its poles placed, or reasons why not, in whole figures', () => {
    let braced = 0;
    let blocked = 0;
    check(
      property(drawings, (drawing) => {
        expect(drawingSchema.safeParse(drawing).success).toBe(true);
        const walls = layOutWalls(drawing);
        const set = placePoles(drawing, walls);
        const whole = (points: readonly { x: number; y: number }[]) =>
          points.every(({ x, y }) => Number.isInteger(x) && Number.isInteger(y));
        expect(walls.runs.every((run) => whole(run.body) && Number.isFinite(run.direction.x))).toBe(true);
        expect([set.cost, set.gap].every((value) => Number.isFinite(value) && value! >= 0)).toBe(true);
        if (set.exact) expect(set.gap).toBe(0);
        const named = new Set(set.reasons.map((reason) => reason.thing.id));
        for (const pole of set.poles) {
          expect(whole([pole.at, pole.corner, ...pole.section])).toBe(true);
          for (const brace of pole.braces) {
            expect([brace.leg, brace.reach, brace.foot.x, brace.foot.y].every(Number.isInteger)).toBe(true);
            expect(Number.isFinite(brace.bearing + brace.slope)).toBe(true);
          }
          if (pole.braces.length === 2) braced += 1;
          else {
            blocked += 1;
            expect(named.has(pole.id) || named.has('site')).toBe(true);
          }
        }
      }),
      { numRuns: 250, seed: 21, endOnFailure: true },
    );
    expect(Math.min(braced, blocked)).toBeGreaterThan(50);
  });
});
