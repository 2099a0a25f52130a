/** The whole solver over drawings that make no sense: answers and reasons, never an exception or a number that is none. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { solve } from '../../model/setOut';
import type { Drawing } from '../../model/drawing/schema';
import { ticks } from '../../model/length/ticks';
import { anySite } from '../helpers/anyDrawing';

/** The path of the first number that is not finite, or null. */
function findBadNumber(value: unknown, path = 'setOut'): string | null {
  if (typeof value === 'number') return Number.isFinite(value) ? null : `${path} is ${value}`;
  if (value instanceof Map) {
    for (const [key, each] of value) {
      const bad = findBadNumber(each, `${path}[${String(key)}]`);
      if (bad !== null) return bad;
    }
    return null;
  }
  if (value === null || typeof value !== 'object') return null;
  for (const [key, each] of Object.entries(value)) {
    const bad = findBadNumber(each, `${path}.${key}`);
    if (bad !== null) return bad;
  }
  return null;
}

function turned(drawing: Drawing): Drawing {
  const turn = <P extends { readonly x: number; readonly y: number }>(p: P) => ({
    ...p,
    x: ticks(0 - p.y),
    y: ticks(p.x),
  });
  return {
    ...drawing,
    corners: drawing.corners.map(turn),
    keepClears: drawing.keepClears.map((area) => ({ ...area, points: area.points.map(turn) })),
  };
}

function shifted(drawing: Drawing): Drawing {
  const shift = <P extends { readonly x: number; readonly y: number }>(p: P) => ({
    ...p,
    x: ticks(p.x + 640_123),
    y: ticks(p.y - 77_777),
  });
  return {
    ...drawing,
    corners: drawing.corners.map(shift),
    keepClears: drawing.keepClears.map((area) => ({ ...area, points: area.points.map(shift) })),
  };
}

describe('the whole set-out', () => {
  it(
    'answers for any drawing that can be saved, in finite numbers, and names only what is there',
    { timeout: 300_000 },
    () => {
      let said = 0;
      fc.assert(
        fc.property(anySite, ({ drawing, survey }) => {
          const setOut = solve(drawing, survey);
          expect(findBadNumber(setOut)).toBeNull();
          said += setOut.reasons.length;
          const runs = new Set(drawing.runs.map((run) => run.id));
          for (const { thing } of setOut.reasons) if (thing.kind === 'run') expect(runs.has(thing.id)).toBe(true);
        }),
        { numRuns: 600 },
      );
      expect(said).toBeGreaterThan(600);
    },
  );

  it('costs the same where the building is shifted, or turned by a quarter', { timeout: 300_000 }, () => {
    let placed = 0;
    fc.assert(
      fc.property(anySite, ({ drawing, survey }) => {
        const plain = solve(drawing, survey);
        for (const other of [shifted(drawing), turned(drawing)]) {
          const moved = solve(other, survey);
          expect(moved.coursing.answer.cost).toEqual(plain.coursing.answer.cost);
          if (plain.poles.exact && moved.poles.exact) expect(moved.poles.cost).toBe(plain.poles.cost);
          expect(moved.takeoff.units).toEqual(plain.takeoff.units);
        }
        placed += plain.poles.poles.length;
      }),
      { numRuns: 150 },
    );
    expect(placed).toBeGreaterThan(150);
  });
});
