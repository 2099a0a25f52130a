/** Arbitrary drawings and surveys that the schema admits, sensible or not: crossing runs, sharp corners, openings anywhere. */
import fc from 'fast-check';
import { newDrawing, newOpening } from '../../model/drawing/defaults';
import { letterAt } from '../../model/drawing/letters';
import { drawingSchema, type Drawing } from '../../model/drawing/schema';
import { surveySchema, type Survey } from '../../model/drawing/surveySchema';
import { mm, ticks } from '../../model/length/ticks';

/** Coordinates of a few metres, on a coarse grid half the time so that runs coincide, cross and line up. */
const coordinate = fc.oneof(
  fc.integer({ min: -6, max: 6 }).map((step) => mm(step * 1000)),
  fc.integer({ min: -6_000_000, max: 6_000_000 }).map(ticks),
);
const size = fc.oneof(fc.integer({ min: 0, max: 2500 }).map(mm), fc.integer({ min: 0, max: 1_600_000 }).map(ticks));

interface Any {
  readonly drawing: Drawing;
  readonly survey: Survey;
}

export const anySite: fc.Arbitrary<Any> = fc
  .record({
    units: fc.constantFrom('imperial' as const, 'metric' as const),
    corners: fc.array(fc.record({ x: coordinate, y: coordinate }), { minLength: 0, maxLength: 8 }),
    runs: fc.array(fc.tuple(fc.nat(7), fc.nat(7)), { maxLength: 9 }),
    openings: fc.array(
      fc.record({
        run: fc.nat(8),
        kind: fc.constantFrom('door' as const, 'window' as const, 'passage' as const),
        at: coordinate,
        width: size,
        sill: size,
        head: size,
      }),
      { maxLength: 4 },
    ),
    areas: fc.array(fc.array(fc.record({ x: coordinate, y: coordinate }), { minLength: 3, maxLength: 5 }), {
      maxLength: 2,
    }),
    heights: fc.array(fc.record({ height: size, hard: fc.boolean() }), { maxLength: 4 }),
    beams: fc.array(fc.record({ soffit: size, depth: size, hard: fc.boolean() }), { maxLength: 3 }),
    readings: fc.array(
      fc.record({ run: fc.nat(8), corner: fc.nat(7), at: coordinate, down: size, onRun: fc.boolean() }),
      {
        maxLength: 6,
      },
    ),
  })
  .map(({ units, corners, runs, openings, areas, heights, beams, readings }) => {
    const base = newDrawing(units);
    const ends = runs.filter(([from, to]) => from !== to && from < corners.length && to < corners.length);
    const run = (place: number) => `w${place % Math.max(1, ends.length)}`;
    const drawing: Drawing = {
      ...base,
      corners: corners.map((place, i) => ({ id: `c${i}`, letter: letterAt(i), ...place })),
      runs: ends.map(([from, to], i) => ({
        id: `w${i}`,
        from: `c${from}`,
        to: `c${to}`,
        wallTypeId: base.wallTypes[0]!.id,
      })),
      openings: (ends.length === 0 ? [] : openings).map((one, i) => ({
        ...newOpening(units, one.kind, { id: `o${i}`, runId: run(one.run), at: one.at }),
        width: ticks(one.width + 1),
        sill: one.sill,
        head: one.head,
      })),
      keepClears: areas.map((points, i) => ({ id: `k${i}`, name: '', points })),
      controlHeights: heights.map(({ height, hard }, i) => ({
        id: `h${i}`,
        kind: 'named' as const,
        name: '',
        height: ticks(height + 1),
        tolerance: mm(3),
        hold: hard ? ('hard' as const) : ('soft' as const),
        weight: 1,
      })),
      bondBeams: beams.map(({ soffit, depth, hard }, i) => ({
        ...base.bondBeams[0]!,
        id: `b${i}`,
        soffit: ticks(soffit + 1),
        depth: ticks(depth + 1),
        hold: hard ? ('hard' as const) : ('soft' as const),
      })),
    };
    const survey: Survey = {
      version: 1,
      method: 'measureDown',
      readings: (ends.length === 0 ? [] : readings).map((one, i) => ({
        id: `r${i}`,
        down: one.down,
        station: one.onRun
          ? { kind: 'run' as const, runId: run(one.run), at: one.at }
          : { kind: 'corner' as const, cornerId: `c${one.corner % corners.length}` },
      })),
    };
    return { drawing: drawingSchema.parse(drawing), survey: surveySchema.parse(survey) };
  });
