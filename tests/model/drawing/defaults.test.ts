import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { newBondBeam, newControlHeight, newDrawing, newOpening } from '../../../model/drawing/defaults';
import { drawingOutlines } from '../../../model/drawing/emptyOutline';
import { letterAt, nextLetter } from '../../../model/drawing/letters';
import {
  bondBeamSchema,
  controlHeightSchema,
  drawingSchema,
  openingSchema,
  type Drawing,
} from '../../../model/drawing/schema';
import { EMPTY_SURVEY } from '../../../model/drawing/surveySchema';
import { parseStoredDrawing } from '../../../model/drawing/upgrade';
import { feet, inches, mm, ticks } from '../../../model/length/ticks';
import { solve } from '../../../model/setOut';
import { rectangle } from '../../helpers/drawings';

const UNITS = ['imperial', 'metric'] as const;

describe('a new drawing', () => {
  it.each(UNITS)('in %s units is one that can be saved', (units) => {
    const drawing = newDrawing(units);
    expect(drawingSchema.parse(drawing)).toEqual(drawing);
    expect(drawing.corners).toEqual([]);
  });

  it('has units whose gauge is a round number', () => {
    const gauge = (drawing: Drawing) =>
      (drawing.wallTypes[0]?.unit.height ?? 0) + (drawing.wallTypes[0]?.bedJoint.nominal ?? 0);
    expect(gauge(newDrawing('imperial'))).toBe(inches(4));
    expect(gauge(newDrawing('metric'))).toBe(mm(100));
  });

  it('has a bond beam on a course line, no taller above the foundation than ten thicknesses', () => {
    for (const units of UNITS) {
      const { soffit } = newBondBeam(units, 'beam');
      const [type] = newDrawing(units).wallTypes;
      if (!type) throw new Error('no wall type');
      const gauge = type.unit.height + type.bedJoint.nominal;
      expect((soffit - type.bedding.least - type.unit.height) % gauge).toBe(0);
      expect(soffit).toBeLessThanOrEqual(10 * type.unit.width);
    }
  });

  it('laps a corner by no less than its least lap, a quarter of the unit (NMAC 14.7.4.11 E)', () => {
    for (const units of UNITS) {
      const [type] = newDrawing(units).wallTypes;
      if (!type) throw new Error('no wall type');
      const { unit, headJoint, leastLap } = type;
      // The return and its joint lie under the corner's unit; what is left of the unit is its lap, joint edge to joint edge.
      expect(unit.length - unit.width - headJoint.nominal).toBeGreaterThanOrEqual(leastLap);
      expect(4 * leastLap).toBe(unit.length);
    }
  });

  it('lays a first rectangle of any size with nothing to warn of', () => {
    const side = fc.integer({ min: mm(2500), max: mm(12_000) });
    fc.assert(
      fc.property(fc.constantFrom(...UNITS), side, side, (units, width, depth) => {
        const drawn = rectangle(width / 16_256, depth / 16_256, newDrawing(units).wallTypes[0]);
        const drawing: Drawing = { ...newDrawing(units), corners: drawn.corners, runs: drawn.runs };
        expect(solve(drawing, EMPTY_SURVEY).bond.reasons).toEqual([]);
      }),
      { numRuns: 40 },
    );
  });

  it('cuts two poles from one stock length', () => {
    for (const units of UNITS) {
      const { stockLength, poleLength } = newDrawing(units).poleKit;
      expect(2 * poleLength).toBe(stockLength);
    }
  });

  it('has openings and heights of every kind that can be saved, sills and heads on course lines', () => {
    for (const units of UNITS) {
      const gauge = units === 'imperial' ? inches(4) : mm(100);
      for (const kind of ['door', 'window', 'passage'] as const) {
        const opening = newOpening(units, kind, { id: 'o', runId: 'r', at: ticks(0) });
        expect(openingSchema.parse(opening)).toEqual(opening);
        expect([opening.sill % gauge, opening.head % gauge]).toEqual([0, 0]);
      }
      for (const kind of ['sill', 'head', 'plate', 'named'] as const)
        expect(controlHeightSchema.safeParse(newControlHeight(units, kind, 'h')).success).toBe(true);
      expect(bondBeamSchema.safeParse(newBondBeam(units, 'b')).success).toBe(true);
    }
  });
});

describe('corner letters', () => {
  it('go from A to Z, then AA, as columns of a table', () => {
    expect([0, 1, 25, 26, 27, 51, 52, 701, 702].map(letterAt)).toEqual([
      'A',
      'B',
      'Z',
      'AA',
      'AB',
      'AZ',
      'BA',
      'ZZ',
      'AAA',
    ]);
  });
  it('never repeat in as many corners as a drawing holds', () => {
    const letters = Array.from({ length: 6000 }, (_, i) => letterAt(i));
    expect(new Set(letters).size).toBe(6000);
    expect(letters.every((letter) => /^[A-Z]{1,3}$/.test(letter))).toBe(true);
  });
  it('fill the first gap', () => {
    expect(nextLetter([])).toBe('A');
    expect(nextLetter([{ letter: 'A' }, { letter: 'C' }])).toBe('B');
  });
});

describe('a stored drawing', () => {
  it('comes back as it was', () => {
    const drawing = newDrawing('imperial');
    expect(parseStoredDrawing(JSON.parse(JSON.stringify(drawing)))).toEqual({ ok: true, drawing });
  });
  it('of a later version is refused as such', () => {
    expect(parseStoredDrawing({ ...newDrawing('metric'), version: 2 })).toEqual({
      ok: false,
      problem: 'newer',
      path: 'version',
    });
  });
  it('that is damaged says where', () => {
    const drawing = newDrawing('metric');
    const damaged = { ...drawing, poleKit: { ...drawing.poleKit, leg: 'long' } };
    expect(parseStoredDrawing(damaged)).toEqual({ ok: false, problem: 'unreadable', path: 'poleKit.leg' });
    for (const nothing of [null, undefined, 7, 'drawing', [], {}, { version: 0 }])
      expect(parseStoredDrawing(nothing)).toEqual({ ok: false, problem: 'unreadable', path: '' });
  });
});

describe('the outlines for a small picture', () => {
  const at = (x: number, y: number) => ({ x: feet(x), y: feet(y) });
  const drawing = (
    places: readonly (readonly [number, number])[],
    runs: readonly (readonly [number, number])[],
  ): Drawing => ({
    ...newDrawing('imperial'),
    corners: places.map(([x, y], i) => ({ id: `c${i}`, letter: letterAt(i), ...at(x, y) })),
    runs: runs.map(([from, to], i) => ({ id: `r${i}`, from: `c${from}`, to: `c${to}`, wallTypeId: 'wall' })),
  });

  it('are none where nothing is drawn', () => {
    expect(drawingOutlines(newDrawing('metric'))).toEqual([]);
  });
  it('close where the walls close', () => {
    const square = drawing(
      [
        [0, 0],
        [9, 0],
        [9, 9],
        [0, 9],
      ],
      [
        [0, 1],
        [1, 2],
        [2, 3],
        [3, 0],
      ],
    );
    const [line, more] = drawingOutlines(square);
    expect(more).toBeUndefined();
    expect(line?.length).toBe(5);
    expect(line?.[0]).toEqual(line?.[4]);
  });
  it('show every run once', () => {
    const tees = drawing(
      [
        [0, 0],
        [9, 0],
        [20, 0],
        [9, 9],
        [30, 30],
        [40, 30],
        [50, 50],
      ],
      [
        [0, 1],
        [1, 2],
        [1, 3],
        [4, 5],
      ],
    );
    const shown = drawingOutlines(tees).flatMap((line) =>
      line.slice(1).map((to, i) =>
        [line[i], to]
          .map((place) => `${place?.x},${place?.y}`)
          .sort()
          .join(' '),
      ),
    );
    const expected = tees.runs.map((run) =>
      [run.from, run.to]
        .map((id) => tees.corners.find((corner) => corner.id === id))
        .map((place) => `${place?.x},${place?.y}`)
        .sort()
        .join(' '),
    );
    expect(shown.sort()).toEqual(expected.sort());
  });
});
