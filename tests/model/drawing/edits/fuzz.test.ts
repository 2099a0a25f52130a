import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { addRun, type EndPlace } from '../../../../model/drawing/edits/addRun';
import { closeLoop, reverseRuns, standInside } from '../../../../model/drawing/edits/closeLoop';
import { deleteThing } from '../../../../model/drawing/edits/deleteThing';
import { joinCorners, joinCornerToRun } from '../../../../model/drawing/edits/joinCorners';
import { moveCorner } from '../../../../model/drawing/edits/moveCorners';
import { addOpening, changeOpening, moveOpening } from '../../../../model/drawing/edits/openings';
import { setRunAngle, setRunLength } from '../../../../model/drawing/edits/runLength';
import { slideRun } from '../../../../model/drawing/edits/slideRun';
import { newDrawing } from '../../../../model/drawing/defaults';
import { drawingOutlines } from '../../../../model/drawing/emptyOutline';
import { drawingSchema, MAX_COORDINATE, type Drawing } from '../../../../model/drawing/schema';
import { ticks, type Ticks } from '../../../../model/length/ticks';
import { layOutWalls } from '../../../../model/walls/layOutWalls';
import { ids } from './scene';

/** One edit, on whichever of the drawing's things the numbers fall. */
interface Step {
  readonly what: number;
  readonly a: number;
  readonly b: number;
  readonly x: number;
  readonly y: number;
}

const KINDS = ['door', 'window', 'passage'] as const;

function pick<T>(list: readonly T[], n: number): T | undefined {
  return list.length === 0 ? undefined : list[n % list.length];
}

function edit(drawing: Drawing, step: Step, newId: () => string): Drawing {
  const { a, b } = step;
  const point = { x: ticks(step.x), y: ticks(step.y) };
  const by: Ticks = ticks(step.x);
  const corner = pick(drawing.corners, a)?.id ?? 'none';
  const other = pick(drawing.corners, b)?.id ?? 'none';
  const run = pick(drawing.runs, a)?.id ?? 'none';
  const otherRun = pick(drawing.runs, b)?.id ?? 'none';
  const opening = pick(drawing.openings, a)?.id ?? 'none';
  const ends: readonly EndPlace[] = [
    { kind: 'point', point },
    { kind: 'corner', cornerId: corner },
    { kind: 'run', runId: run, at: by },
    { kind: 'point', point: { x: point.y, y: point.x } },
    { kind: 'run', runId: otherRun, at: ticks(Math.abs(step.y)) },
  ];
  const from = pick(ends, a) ?? ends[0];
  const to = pick(ends, b) ?? ends[0];
  const kind = pick(KINDS, b) ?? 'door';
  const keep = b % 2 === 0 ? 'from' : 'to';
  const edits: readonly (() => Drawing)[] = [
    () => (from && to ? addRun(drawing, { from, to }, newId) : drawing),
    () => (from && to ? addRun(drawing, { from: to, to: from }, newId) : drawing),
    () => addOpening(drawing, { kind, runId: run, at: by }, newId),
    () => moveOpening(drawing, opening, otherRun, by),
    () => changeOpening(drawing, opening, { kind, width: by }),
    () => moveCorner(drawing, corner, point),
    () => slideRun(drawing, run, by),
    () => setRunLength(drawing, run, by, keep),
    () => setRunAngle(drawing, run, step.y % 360, keep),
    () => closeLoop(drawing, corner, newId),
    () => reverseRuns(drawing, [run, otherRun]),
    () => standInside(drawing, corner),
    () => joinCorners(drawing, corner, other),
    () => joinCornerToRun(drawing, corner, otherRun, by, newId),
    () => deleteThing(drawing, { kind: 'corner', id: corner }),
    () => deleteThing(drawing, { kind: 'run', id: run }),
  ];
  return (pick(edits, step.what) ?? (() => drawing))();
}

/** Mostly the size of a house, sometimes as far as the plan goes. */
const coordinate = fc.oneof(
  { weight: 5, arbitrary: fc.integer({ min: -40, max: 40 }).map((n) => n * 130_048) },
  { weight: 2, arbitrary: fc.integer({ min: -6_000_000, max: 6_000_000 }) },
  { weight: 1, arbitrary: fc.integer({ min: -MAX_COORDINATE, max: MAX_COORDINATE }) },
);
const step = fc.record({ what: fc.nat(1000), a: fc.nat(1000), b: fc.nat(1000), x: coordinate, y: coordinate });
/** Runs first, so that there is something to edit. */
const steps = fc
  .tuple(
    fc.array(
      step.map((one) => ({ ...one, what: 0, a: 0, b: 3 })),
      { minLength: 3, maxLength: 8 },
    ),
    fc.array(step, { maxLength: 25 }),
  )
  .map(([first, rest]) => [...first, ...rest]);

describe('any edits one after another', () => {
  it('leave a drawing that can be saved and laid out', () => {
    let edited = 0;
    fc.assert(
      fc.property(steps, (list) => {
        const newId = ids();
        let drawing = newDrawing('imperial');
        for (const one of list) {
          const next = edit(drawing, one, newId);
          if (next !== drawing) edited++;
          drawing = next;
        }
        expect(drawingSchema.safeParse(drawing).error?.issues ?? []).toEqual([]);
        const walls = layOutWalls(drawing);
        expect(walls.runs.every((run) => run.body.every((point) => Number.isInteger(point.x + point.y)))).toBe(true);
        const shown = drawingOutlines(drawing).reduce((sum, line) => sum + line.length - 1, 0);
        expect(shown).toBe(drawing.runs.length);
      }),
      { numRuns: 400 },
    );
    expect(edited).toBeGreaterThan(3000);
  });
});
