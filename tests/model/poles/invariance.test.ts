/** What must not change the cost of a placing: where the building stands, how it is turned, and the order of its lists. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Drawing, Opening } from '../../../model/drawing/schema';
import type { PlanPoint } from '../../../model/geometry/point';
import { inches, ticks } from '../../../model/length/ticks';
import { placePoles } from '../../../model/poles/placePoles';
import type { PoleSet } from '../../../model/poles/types';
import { layOutWalls } from '../../../model/walls/layOutWalls';
import { door, ell, withOpenings, withWalls } from './sites';

const place = (drawing: Drawing): PoleSet => placePoles(drawing, layOutWalls(drawing));

type Move = (p: PlanPoint) => PlanPoint;

function moved(drawing: Drawing, move: Move): Drawing {
  return {
    ...drawing,
    corners: drawing.corners.map((corner) => ({ ...corner, ...move(corner) })),
    keepClears: drawing.keepClears.map((area) => ({ ...area, points: area.points.map(move) })),
    boundary: drawing.boundary && drawing.boundary.map(move),
  };
}

/** Mirrored, with each run from its other end so that its body stays on its left, and its openings from there. */
function mirrored(drawing: Drawing): Drawing {
  const flipped = moved(drawing, ({ x, y }) => ({ x: ticks(0 - x), y }));
  const walls = layOutWalls(drawing);
  const turn = (opening: Opening): Opening => {
    const length = walls.runById.get(opening.runId)?.length ?? ticks(0);
    const at = ticks(length - opening.at - opening.width);
    if (opening.kind !== 'door') return { ...opening, at };
    return { ...opening, at, swing: { ...opening.swing, hinge: opening.swing.hinge === 'near' ? 'far' : 'near' } };
  };
  return {
    ...flipped,
    runs: flipped.runs.map((run) => ({ ...run, from: run.to, to: run.from })),
    openings: flipped.openings.map(turn),
  };
}

const square = (x: number, y: number, size: number) =>
  [
    [x, y],
    [x + size, y],
    [x + size, y + size],
    [x, y + size],
  ].map(([px, py]) => ({ x: inches(px!), y: inches(py!) }));

/** An L with a door near its reentrant corner, a second building close by, and areas to keep clear at random. */
const sites: fc.Arbitrary<Drawing> = fc
  .record({
    gap: fc.integer({ min: 52, max: 140 }),
    doorAt: fc.integer({ min: 20, max: 70 }),
    opens: fc.constantFrom('in' as const, 'out' as const),
    areas: fc.array(fc.tuple(fc.integer({ min: -70, max: 340 }), fc.integer({ min: -70, max: 260 })), { maxLength: 3 }),
  })
  .map(({ gap, doorAt, opens, areas }) => {
    const x = 288 + gap;
    const two = withWalls(
      ell(),
      [
        [x, 0],
        [x + 120, 0],
        [x + 120, 144],
        [x, 144],
      ],
      true,
      'n',
    );
    const way = { used: true, width: inches(40), depth: inches(30) };
    const opened = withOpenings(two, door('CD', doorAt, { way, swing: { hinge: 'far', opens } }));
    const keepClears = areas.map(([px, py], i) => ({ id: `k${i}`, name: 'area', points: square(px, py, 25) }));
    return { ...opened, keepClears };
  });

const outcome = (set: PoleSet) => ({
  cost: set.cost,
  exact: set.exact,
  braced: set.poles.filter((pole) => pole.braces.length === 2).length,
  // Of two poles that leave each other no room, which one goes without is the same to the crew.
  reasons: set.reasons.map((reason) => reason.code).sort(),
});

describe('the cost of a placing', () => {
  it('does not change with where the building stands', () => {
    fc.assert(
      fc.property(
        sites,
        fc.integer({ min: -1e8, max: 1e8 }),
        fc.integer({ min: -1e8, max: 1e8 }),
        (drawing, dx, dy) => {
          const shifted = moved(drawing, ({ x, y }) => ({ x: ticks(x + dx), y: ticks(y + dy) }));
          expect(outcome(place(shifted))).toEqual(outcome(place(drawing)));
        },
      ),
      { numRuns: 40, seed: 12, endOnFailure: true },
    );
  });

  it('does not change by a quarter-turn', () => {
    fc.assert(
      fc.property(sites, (drawing) => {
        const turned = moved(drawing, ({ x, y }) => ({ x: ticks(0 - y), y: x }));
        expect(outcome(place(turned))).toEqual(outcome(place(drawing)));
      }),
      { numRuns: 40, seed: 12, endOnFailure: true },
    );
  });

  it('does not change in a mirror', () => {
    fc.assert(
      fc.property(sites, (drawing) => {
        expect(outcome(place(mirrored(drawing)))).toEqual(outcome(place(drawing)));
      }),
      { numRuns: 40, seed: 12, endOnFailure: true },
    );
  });

  it('does not change with the order of the drawing’s lists', () => {
    fc.assert(
      fc.property(sites, (drawing) => {
        const reordered = {
          ...drawing,
          corners: [...drawing.corners].reverse(),
          runs: [...drawing.runs].reverse(),
          keepClears: [...drawing.keepClears].reverse(),
        };
        const set = place(drawing);
        const other = place(reordered);
        expect(outcome(other)).toEqual(outcome(set));
        for (const pole of set.poles)
          expect(other.poleById.get(pole.id)?.braces.map((brace) => brace.foot)).toEqual(
            pole.braces.map((brace) => brace.foot),
          );
      }),
      { numRuns: 40, seed: 12, endOnFailure: true },
    );
  });
});

describe('a building of many walls', () => {
  it('costs, and is priced, in proportion: a thousand runs as ten times a hundred', () => {
    const many = (count: number): Drawing => {
      let drawing = { ...ell(), corners: [], runs: [] } as Drawing;
      for (let i = 0; i < count; i += 1) {
        const x = (i % 13) * 500;
        const y = Math.floor(i / 13) * 400;
        const places = [
          [0, 0],
          [288, 0],
          [288, 144],
          [168, 144],
          [168, 216],
          [0, 216],
        ].map(([px, py]) => [px! + x, py! + y] as const);
        drawing = withWalls(drawing, places, true, `b${i}`);
      }
      return drawing;
    };
    const one = place(many(1));
    const small = place(many(17));
    const large = place(many(170));
    expect(small.cost).toBe(17 * one.cost);
    expect(large.cost).toBe(170 * one.cost);
    expect(large.exact).toBe(true);
  });
});
