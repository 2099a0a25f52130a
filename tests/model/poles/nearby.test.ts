/** The quick test of a brace line against the plain one, over every candidate of random sites. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Drawing } from '../../../model/drawing/schema';
import { inches } from '../../../model/length/ticks';
import { headingsAt, idealsAt, reachesWithin, reachLimits, WIDE_CANDIDATES } from '../../../model/poles/candidates';
import { tryBrace } from '../../../model/poles/clearance';
import { Nearby } from '../../../model/poles/nearby';
import { groundOf, obstacleOf, obstaclesOf } from '../../../model/poles/obstacles';
import { stepFrom } from '../../../model/poles/plane';
import { standAt } from '../../../model/poles/section';
import { seatsAtCorners } from '../../../model/poles/seats';
import { layOutWalls } from '../../../model/walls/layOutWalls';
import { door, emptySite, withOpenings, withWalls, type Place } from './sites';

const COARSE = { ...WIDE_CANDIDATES, turnStep: 3 };

/** A crooked building with a door, areas of any shape to keep clear, and now and then a boundary. */
const sites: fc.Arbitrary<Drawing> = fc
  .record({
    bend: fc.tuple(fc.integer({ min: -60, max: 60 }), fc.integer({ min: -50, max: 50 })),
    doorAt: fc.integer({ min: 12, max: 150 }),
    depth: fc.integer({ min: 10, max: 120 }),
    opens: fc.constantFrom('in' as const, 'out' as const),
    areas: fc.array(
      fc.array(fc.tuple(fc.integer({ min: -120, max: 360 }), fc.integer({ min: -120, max: 260 })), {
        minLength: 3,
        maxLength: 5,
      }),
      { maxLength: 3 },
    ),
    boundary: fc.option(fc.integer({ min: 10, max: 120 })),
  })
  .map(({ bend: [bx, by], doorAt, depth, opens, areas, boundary }) => {
    const point = ([x, y]: Place) => ({ x: inches(x), y: inches(y) });
    const walls = withWalls(emptySite(), [
      [0, 0],
      [240, by],
      [240 + bx, 144],
      [120, 140 - by],
      [bx / 2, 200],
    ]);
    const way = { used: true, width: inches(44), depth: inches(depth) };
    const opened = withOpenings(walls, door('AB', doorAt, { way, swing: { hinge: 'near', opens } }));
    const out = boundary ?? 0;
    return {
      ...opened,
      keepClears: areas.map((ring, i) => ({ id: `k${i}`, name: 'area', points: ring.map(point) })),
      boundary:
        boundary === null
          ? null
          : (
              [
                [-out, -out - 40],
                [300, -out],
                [320, 220],
                [100, 260 - out],
                [-out, 240],
              ] as Place[]
            ).map(point),
    };
  });

describe('a brace line tried quickly', () => {
  it('is refused, and passes over ways, exactly as by the general geometry', () => {
    let refused = 0;
    let over = 0;
    fc.assert(
      fc.property(sites, (drawing) => {
        const kit = { ...drawing.poleKit, brace: { ...drawing.poleKit.brace, headRoom: inches(40) } };
        const laid = layOutWalls(drawing);
        const seats = seatsAtCorners(laid);
        const stands = seats.map((seat) => standAt(seat, kit));
        const poles = seats.map((seat, i) => obstacleOf('pole', { kind: 'pole', id: seat.id }, stands[i]!.ring));
        const ground = groundOf([...obstaclesOf(drawing, laid), ...poles], drawing.boundary);
        const limits = reachLimits(kit)!;
        seats.forEach((seat, i) => {
          const { at } = stands[i]!;
          const nearby = new Nearby(at, seat.id, kit, ground, limits.most);
          const reaches = reachesWithin(kit, limits, COARSE);
          for (const { direction } of headingsAt(idealsAt(seat), seat, COARSE).flat()) {
            for (const { reach } of reaches) {
              const foot = stepFrom(at, [direction, reach]);
              const plain = tryBrace({ from: at, foot }, seat.id, kit, ground);
              expect(nearby.over(foot)).toEqual(plain.free ? plain.over : null);
              if (!plain.free) refused += 1;
              else if (plain.over.length > 0) over += 1;
            }
          }
        });
      }),
      { numRuns: 30, seed: 7 },
    );
    // The sites hold what they are meant to.
    expect(refused).toBeGreaterThan(1000);
    expect(over).toBeGreaterThan(20);
  });
});
