/** Small drawings in inches for the tests of edits, and their corners read back in inches. */
import { newDrawing, newOpening, type OpeningKind } from '../../../../model/drawing/defaults';
import { letterAt } from '../../../../model/drawing/letters';
import { drawingSchema, type Drawing, type Opening } from '../../../../model/drawing/schema';
import { inches } from '../../../../model/length/ticks';
import { expect } from 'vitest';

export type Place = readonly [number, number];

/** Corners by name; runs as `A-B`. Ids are the names. */
export function plan(corners: Readonly<Record<string, Place>>, runs: readonly string[]): Drawing {
  return {
    ...newDrawing('imperial'),
    corners: Object.entries(corners).map(([id, [x, y]], i) => {
      return { id, letter: letterAt(i), x: inches(x), y: inches(y) };
    }),
    runs: runs.map((id) => {
      const [from = '', to = ''] = id.split('-');
      return { id, from, to, wallTypeId: 'wall' };
    }),
  };
}

export function withOpening(
  drawing: Drawing,
  id: string,
  runId: string,
  at: number,
  kind: OpeningKind = 'window',
): Drawing {
  const opening = newOpening('imperial', kind, { id, runId, at: inches(at) });
  return { ...drawing, openings: [...drawing.openings, opening] };
}

/** Where every corner is, in inches. */
export function places(drawing: Drawing): Record<string, Place> {
  return Object.fromEntries(drawing.corners.map(({ id, x, y }) => [id, [x / inches(1), y / inches(1)] as const]));
}

export function runNames(drawing: Drawing): string[] {
  return drawing.runs.map((run) => `${run.from}-${run.to}`);
}

export function openingAt(drawing: Drawing, id: string): { runId: string; at: number } {
  const opening = drawing.openings.find((one) => one.id === id) as Opening;
  return { runId: opening.runId, at: opening.at / inches(1) };
}

/** Ids n1, n2, … */
export function ids(): () => string {
  let count = 0;
  return () => `n${++count}`;
}

/** The edit made a drawing that can be saved, and left the one it was given alone. */
export function expectWhole(before: Drawing, edit: (drawing: Drawing) => Drawing): Drawing {
  const copy = structuredClone(before);
  const after = edit(before);
  expect(before).toEqual(copy);
  expect(drawingSchema.safeParse(after).error?.issues ?? []).toEqual([]);
  return after;
}

export const RECTANGLE = plan({ A: [0, 0], B: [360, 0], C: [360, 240], D: [0, 240] }, ['A-B', 'B-C', 'C-D', 'D-A']);

//   D────S────C
//   │    │    │
//   A────T────B
export const TEED = plan({ A: [0, 0], T: [144, 0], B: [360, 0], C: [360, 240], S: [144, 240], D: [0, 240] }, [
  'A-T',
  'T-B',
  'B-C',
  'C-S',
  'S-D',
  'D-A',
  'T-S',
]);
