import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Drawing } from '../../../model/drawing/schema';
import { inches, ticks } from '../../../model/length/ticks';
import { layOutWalls } from '../../../model/walls/layOutWalls';
import type { Walls } from '../../../model/walls/types';
import { bodyAreas, outline, plan, wallType, type Place } from './shapes';

/** Star-shaped outlines of 3 to 9 corners at any angles, and drawings of any runs at all between a few places. */
const star = fc.array(fc.integer({ min: 150, max: 600 }), { minLength: 3, maxLength: 9 }).map((radii) =>
  outline(
    radii.map((radius, i): Place => {
      const angle = (2 * Math.PI * i) / radii.length;
      return [Math.round(radius * Math.cos(angle)), Math.round(radius * Math.sin(angle))];
    }),
  ),
);
const NAMES = ['A', 'B', 'C', 'D', 'E', 'F'];
const wild = fc
  .tuple(
    fc.array(fc.tuple(fc.integer({ min: 0, max: 8 }), fc.integer({ min: 0, max: 8 })), { minLength: 6, maxLength: 6 }),
    fc.uniqueArray(fc.tuple(fc.constantFrom(...NAMES), fc.constantFrom(...NAMES)), {
      selector: ([a, b]) => a + b,
      maxLength: 12,
    }),
  )
  .map(([places, pairs]) =>
    plan(
      Object.fromEntries(places.map(([x, y], i) => [NAMES[i] ?? '', [x * 15, y * 15] as Place])),
      pairs.filter(([a, b]) => a !== b).map(([a, b]) => `${a}-${b}`),
    ),
  );
const any = fc.oneof(star, wild);

function moved(drawing: Drawing, move: (x: number, y: number) => [number, number]): Drawing {
  return {
    ...drawing,
    corners: drawing.corners.map((corner) => {
      const [x, y] = move(corner.x, corner.y);
      return { ...corner, x: ticks(x + 0), y: ticks(y + 0) };
    }),
  };
}

function measures(walls: Walls) {
  return {
    runs: walls.runs.map((run) => [
      run.runId,
      run.length,
      run.insideLength,
      run.centreLength,
      run.thickness,
      run.body.length,
      run.ends.map((end) => end.kind),
    ]),
    corners: walls.corners.map((corner) => [corner.cornerId, corner.kind, corner.angle && corner.angle.toFixed(6)]),
    footprints: walls.footprints.map((one) => [one.areaOutside, one.perimeter, one.bodyInside]),
    diagonals: walls.diagonals.map((one) => one.length),
    reasons: walls.reasons.map((reason) => [reason.code, reason.thing.id, reason.against?.map((one) => one.id).sort()]),
  };
}

describe('walls laid out', () => {
  it('are the same anywhere on the plan', () => {
    fc.assert(
      fc.property(any, fc.integer({ min: -9e8, max: 9e8 }), fc.integer({ min: -9e8, max: 9e8 }), (drawing, dx, dy) => {
        const there = layOutWalls(moved(drawing, (x, y) => [x + dx, y + dy]));
        const here = layOutWalls(drawing);
        expect(measures(there)).toEqual(measures(here));
        here.runs.forEach((run, i) => {
          const shifted = run.body.map((point) => [point.x + dx, point.y + dy]);
          there.runs[i]?.body.forEach((point, k) => {
            // Far from the origin a face may round to the next tick.
            expect(Math.abs(point.x - (shifted[k]?.[0] ?? 0))).toBeLessThanOrEqual(1);
            expect(Math.abs(point.y - (shifted[k]?.[1] ?? 0))).toBeLessThanOrEqual(1);
          });
        });
      }),
      { numRuns: 200 },
    );
  });

  it('turn with the plan by a quarter', () => {
    fc.assert(
      fc.property(star, (drawing) => {
        const here = layOutWalls(drawing);
        const turned = layOutWalls(moved(drawing, (x, y) => [-y, x]));
        expect(measures(turned).runs).toEqual(measures(here).runs);
        expect(measures(turned).corners).toEqual(measures(here).corners);
        expect(measures(turned).footprints).toEqual(measures(here).footprints);
        here.runs.forEach((run, i) => {
          expect(turned.runs[i]?.body).toEqual(run.body.map((point) => ({ x: 0 - point.y, y: point.x })));
        });
      }),
      { numRuns: 100 },
    );
  });

  it('do not depend on the order of the lists', () => {
    fc.assert(
      fc.property(star, (drawing) => {
        const here = layOutWalls(drawing);
        const back = layOutWalls({
          ...drawing,
          corners: [...drawing.corners].reverse(),
          runs: [...drawing.runs].reverse(),
        });
        for (const run of here.runs) expect(back.runById.get(run.runId)).toEqual(run);
        for (const corner of here.corners) expect(back.cornerById.get(corner.cornerId)).toEqual(corner);
        expect(back.footprints.map((one) => one.areaInside)).toEqual(here.footprints.map((one) => one.areaInside));
        expect(back.reasons.map((one) => one.code).sort()).toEqual(here.reasons.map((one) => one.code).sort());
      }),
      { numRuns: 100 },
    );
  });

  // Up to six corners: nearer to a straight line two thicknesses meet in a step, square ends and all.
  it('of two thicknesses meet at any angle without a gap or an overlap, by a general geometry library', () => {
    const types = [wallType('thin', 8), wallType('thick', 14)];
    const mixed = fc
      .array(fc.tuple(fc.integer({ min: 300, max: 420 }), fc.boolean()), { minLength: 4, maxLength: 6 })
      .map((corners) => {
        const drawing = outline(
          corners.map(([radius], i): Place => {
            const angle = (2 * Math.PI * i) / corners.length;
            return [Math.round(radius * Math.cos(angle)), Math.round(radius * Math.sin(angle))];
          }),
          types,
        );
        const runs = drawing.runs.map((run, i) => ({ ...run, wallTypeId: corners[i]?.[1] ? 'thick' : 'thin' }));
        return { ...drawing, runs };
      });
    let both = 0;
    fc.assert(
      fc.property(mixed, (drawing) => {
        const walls = layOutWalls(drawing);
        expect(walls.reasons).toEqual([]);
        const [footprint] = walls.footprints;
        const areas = bodyAreas(walls);
        // Faces are rounded to the tick: an area may be out by a tick along the perimeter.
        expect(Math.abs(areas.union - areas.sum)).toBeLessThan(walls.perimeter);
        const between = (footprint?.areaOutside ?? 0) - (footprint?.areaInside ?? 0);
        expect(Math.abs(areas.union - between)).toBeLessThan(walls.perimeter);
        if (new Set(walls.runs.map((run) => run.thickness)).size === 2) both += 1;
      }),
      { numRuns: 100, seed: 6, endOnFailure: true },
    );
    expect(both).toBeGreaterThan(50);
  });

  it('have whole coordinates and no NaN, whatever is drawn', () => {
    fc.assert(
      fc.property(any, (drawing) => {
        const walls = layOutWalls(drawing);
        for (const run of walls.runs) {
          const points = [...run.body, ...run.outside, ...run.inside];
          expect(points.every((point) => Number.isInteger(point.x) && Number.isInteger(point.y))).toBe(true);
          expect([run.length, run.insideLength, run.centreLength].every((size) => size >= 0)).toBe(true);
        }
        for (const one of walls.footprints) {
          expect(one.cornerIds.length).toBe(one.runIds.length);
          expect(new Set(one.cornerIds).size).toBe(one.cornerIds.length);
          expect(Number.isFinite(one.areaInside + one.areaOutside)).toBe(true);
        }
        for (const corner of walls.corners) expect(corner.angle === null || Number.isFinite(corner.angle)).toBe(true);
      }),
      { numRuns: 500 },
    );
  });

  it('find every pair of runs that meet off their corners', () => {
    fc.assert(
      fc.property(wild, (drawing) => {
        const found = layOutWalls(drawing)
          .reasons.filter((reason) => reason.code === 'runsCross')
          .map((reason) => [reason.thing.id, reason.against?.[0]?.id].sort().join(' '));
        expect(new Set(found).size).toBe(found.length);
        expect(found.sort()).toEqual(properCrossings(drawing).sort());
      }),
      { numRuns: 300 },
    );
  });
});

/** Pairs that share no corner and meet in one point that is not an end of both, by solving for both parts in small numbers. */
function properCrossings(drawing: Drawing): string[] {
  const at = new Map(drawing.corners.map((c) => [c.id, { x: c.x / inches(15), y: c.y / inches(15) }]));
  const lines = new Map<
    string,
    { id: string; ends: string[]; a: { x: number; y: number }; b: { x: number; y: number } }
  >();
  for (const run of drawing.runs) {
    const [a, b] = [at.get(run.from), at.get(run.to)];
    const key = [run.from, run.to].sort().join('');
    if (a && b && (a.x !== b.x || a.y !== b.y) && !lines.has(key))
      lines.set(key, { id: run.id, ends: [run.from, run.to], a, b });
  }
  const list = [...lines.values()];
  return list.flatMap((p, i) =>
    list.slice(i + 1).flatMap((q) => {
      if (p.ends.some((end) => q.ends.includes(end))) return [];
      const d = { x: p.b.x - p.a.x, y: p.b.y - p.a.y };
      const e = { x: q.b.x - q.a.x, y: q.b.y - q.a.y };
      const w = { x: q.a.x - p.a.x, y: q.a.y - p.a.y };
      const turn = d.x * e.y - d.y * e.x;
      if (turn === 0) return [];
      const s = (w.x * e.y - w.y * e.x) / turn;
      const t = (w.x * d.y - w.y * d.x) / turn;
      const inside = (part: number): boolean => part >= 0 && part <= 1;
      const isEnd = (part: number): boolean => part === 0 || part === 1;
      return inside(s) && inside(t) && !(isEnd(s) && isEnd(t)) ? [[p.id, q.id].sort().join(' ')] : [];
    }),
  );
}
