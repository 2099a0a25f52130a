import { describe, expect, it } from 'vitest';
import type { Drawing } from '../../../model/drawing/schema';
import type { Survey } from '../../../model/drawing/surveySchema';
import { EMPTY_SURVEY } from '../../../model/drawing/surveySchema';
import type { Figure, LabelScale, Shape } from '../../../model/figures/figure';
import { planFigure } from '../../../model/figures/plan';
import { feet, inches, ticks, type Ticks } from '../../../model/length/ticks';
import { solve } from '../../../model/setOut';
import { coveredTexts, sharedArea } from './texts';
import { readingsAt, rowOfRooms, slantedStudio, toolStore, yardWall } from './scenes';

/** Texts of 13 to 16 px, where so many ticks are one pixel. */
function scaleOf(ticksPerPixel: number): LabelScale {
  const height = (pixels: number) => pixels * ticksPerPixel;
  return {
    textHeight: { small: height(13), label: height(14), dimension: height(16), letter: height(16) },
    advance: 0.46,
    clear: height(4),
  };
}

const PHONE = 20_000;
const SCALES = [4_000, 9_000, PHONE, 45_000, 120_000];

function plan(drawing: Drawing, scale: LabelScale, survey: Survey = EMPTY_SURVEY, more = {}): Figure {
  const setOut = solve(drawing, survey);
  return planFigure(drawing, setOut, { selection: null, scale, dimensions: true, ...more });
}

const scenes: readonly (readonly [string, Drawing])[] = [
  ['the tool store', toolStore()],
  ['a slanted studio', slantedStudio()],
  ['a yard wall with free ends', yardWall()],
  ['a row of rooms', rowOfRooms(5)],
];

function letters(figure: Figure): Extract<Shape, { kind: 'text' }>[] {
  return figure.shapes.filter((shape) => shape.kind === 'text').filter((shape) => shape.role === 'letter');
}

describe('the plan as a figure', () => {
  for (const [name, drawing] of scenes)
    for (const ticksPerPixel of SCALES)
      it(`keeps every letter, caution and dimension of ${name} off the others at ${ticksPerPixel} ticks to the pixel`, () => {
        const scale = scaleOf(ticksPerPixel);
        const figure = plan(drawing, scale, readingsAt(drawing, [6, 2, 0, 1]));
        const texts = coveredTexts(figure, scale);
        const clashes = texts.flatMap((a, i) =>
          texts
            .slice(i + 1)
            .filter((b) => sharedArea(a.points, b.points) > 1)
            .map((b) => `${a.what} on ${b.what}`),
        );
        expect(clashes).toEqual([]);
      });

  it('letters every corner of the tool store on a phone, none of them on a wall', () => {
    const drawing = toolStore();
    const scale = scaleOf(PHONE);
    const figure = plan(drawing, scale);
    expect(letters(figure).map((shape) => (shape.text.kind === 'literal' ? shape.text.text : ''))).toEqual([
      'A',
      'B',
      'C',
      'D',
      'E',
      'F',
    ]);
    const bodies = figure.shapes.filter((shape) => shape.kind === 'polygon').filter((shape) => shape.role === 'body');
    expect(bodies).toHaveLength(6);
    for (const text of coveredTexts(figure, scale))
      for (const body of bodies) expect(sharedArea(text.points, body.points)).toBeLessThan(1);
  });

  it('says the length of each run once, and drops lengths before letters when there is no room', () => {
    const near = plan(toolStore(), scaleOf(9_000));
    const lengths = (figure: Figure) =>
      figure.shapes.flatMap((shape) => (shape.kind === 'dimension' ? [shape.length] : []));
    // 24, 12, 10, 6, 14 and 18 ft by the drawing's own corners.
    expect(lengths(near).sort((a, b) => a - b)).toEqual([6, 10, 12, 14, 18, 24].map((n) => feet(n)));
    const far = plan(toolStore(), scaleOf(120_000));
    expect(lengths(far).length).toBeLessThan(6);
    expect(letters(far).length).toBeGreaterThan(lengths(far).length);
  });

  it('bounds hold every corner, brace foot and text', () => {
    for (const [, drawing] of scenes) {
      const scale = scaleOf(PHONE);
      const setOut = solve(drawing, EMPTY_SURVEY);
      const figure = planFigure(drawing, setOut, { selection: null, scale, dimensions: true });
      const points = [
        ...drawing.corners,
        ...setOut.poles.poles.flatMap((pole) => pole.braces.map((brace) => brace.foot)),
        ...coveredTexts(figure, scale).flatMap((text) => text.points),
      ];
      expect(points.length).toBeGreaterThan(8);
      for (const { x, y } of points) {
        expect(x).toBeGreaterThanOrEqual(figure.bounds.left);
        expect(x).toBeLessThanOrEqual(figure.bounds.right);
        expect(y).toBeGreaterThanOrEqual(figure.bounds.bottom);
        expect(y).toBeLessThanOrEqual(figure.bounds.top);
      }
    }
  });

  it('moves as a whole with the building', () => {
    const drawing = toolStore();
    const [dx, dy] = [feet(1000), feet(-350, 7)];
    const moved: Drawing = {
      ...drawing,
      corners: drawing.corners.map((corner) => ({
        ...corner,
        x: ticks(corner.x + dx),
        y: ticks(corner.y + dy),
      })),
    };
    const here = plan(drawing, scaleOf(PHONE));
    const there = plan(moved, scaleOf(PHONE));
    expect(there.bounds).toEqual({
      left: here.bounds.left + dx,
      right: here.bounds.right + dx,
      bottom: here.bounds.bottom + dy,
      top: here.bounds.top + dy,
    });
    expect(there.shapes.map((shape) => shape.kind)).toEqual(here.shapes.map((shape) => shape.kind));
  });

  it('breaks the faces where openings are', () => {
    const drawing = toolStore();
    const figure = plan(drawing, scaleOf(PHONE));
    const face = figure.shapes.find((shape) => shape.role === 'face' && shape.thing?.id === 'r0');
    if (face?.kind !== 'lines') throw new Error('run r0 has no face');
    // Along the outside face of A–B: to the door at 18 in, from it (39 in wide) to the window at 13 ft, on from it.
    const outside = face.lines
      .filter((line) => line.every((point) => point.y === 0) && line[0]?.x !== line[1]?.x)
      .map((line) => line.map((point) => point.x));
    expect(outside).toEqual([
      [0, inches(18)],
      [inches(57), feet(13)],
      [feet(16), feet(24)],
    ]);
  });

  it('draws the door’s leaf at a right angle to the wall, as long as the clear width, with a quarter turn of swing', () => {
    const figure = plan(toolStore(), scaleOf(PHONE));
    const arc = figure.shapes.find((shape) => shape.kind === 'arc' && shape.thing?.id === 'o0');
    if (arc?.kind !== 'arc') throw new Error('no swing');
    // 39 in less two frames of 1 1/2 in.
    expect(arc.radius).toBe(inches(36));
    // Hinged on the jamb near A, opening in: the inside face is 12 in from the outside one.
    expect(arc.centre).toEqual({ x: inches(19.5), y: inches(12) });
    expect([arc.from, arc.to]).toEqual([0, 90]);
  });

  it('shows selected, differing and plain things apart', () => {
    const drawing = toolStore();
    const figure = plan(drawing, scaleOf(PHONE), EMPTY_SURVEY, {
      selection: { kind: 'pole', id: 'c0' },
      differing: [{ kind: 'opening', id: 'o1' }],
      notes: [{ thing: { kind: 'opening', id: 'o1' }, text: { kind: 'literal', text: '1' } }],
    });
    const emphasisOf = (role: string, id: string) =>
      new Set(figure.shapes.filter((s) => s.role === role && s.thing?.id === id).map((s) => s.emphasis));
    expect(emphasisOf('brace', 'c0.1')).toEqual(new Set(['selected']));
    expect(emphasisOf('brace', 'c1.1')).toEqual(new Set(['plain']));
    expect(emphasisOf('opening', 'o1')).toEqual(new Set(['differs']));
    expect(emphasisOf('note', 'o1')).toEqual(new Set(['differs']));
  });

  it('keeps labels inside what is in view, for things that are in view', () => {
    const drawing = toolStore();
    const scale = scaleOf(9_000);
    // The lower left of the building, its corner 20 px from the left edge and 30 px from the lower one.
    const within = { left: ticks(-180_000), bottom: ticks(-270_000), right: feet(12), top: feet(10) };
    const figure = plan(drawing, scale, EMPTY_SURVEY, { within });
    const a = letters(figure).find((shape) => shape.thing?.id === 'c0');
    const covered = coveredTexts({ ...figure, shapes: a ? [a] : [] }, scale)[0];
    expect(covered).toBeDefined();
    for (const point of covered?.points ?? []) {
      expect(point.x).toBeGreaterThanOrEqual(within.left);
      expect(point.y).toBeGreaterThanOrEqual(within.bottom);
    }
  });

  it('draws an empty drawing as nothing, in bounds of no size', () => {
    const figure = plan({ ...toolStore(), corners: [], runs: [], openings: [] }, scaleOf(PHONE));
    expect(figure.shapes).toEqual([]);
    expect(figure.bounds).toEqual({ left: 0, bottom: 0, right: 0, top: 0 });
  });

  it('outlines an opening that does not stand on its run as a caution', () => {
    const drawing = toolStore();
    const past = {
      ...drawing,
      openings: drawing.openings.map((each) => (each.id === 'o1' ? { ...each, at: feet(23) as Ticks } : each)),
    };
    const figure = plan(past, scaleOf(PHONE));
    const shapes = figure.shapes.filter((shape) => shape.kind === 'polygon' && shape.thing?.id === 'o1');
    expect(shapes.map((shape) => shape.role)).toContain('caution');
    expect(shapes.map((shape) => shape.role)).not.toContain('opening');
  });
});
