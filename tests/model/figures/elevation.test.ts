import { describe, expect, it } from 'vitest';
import { EMPTY_SURVEY } from '../../../model/drawing/surveySchema';
import type { Drawing } from '../../../model/drawing/schema';
import { elevationFigure } from '../../../model/figures/elevation';
import { hitElevation } from '../../../model/figures/elevationHit';
import type { Figure, LabelScale } from '../../../model/figures/figure';
import { feet, inches } from '../../../model/length/ticks';
import { solve, type SetOut } from '../../../model/setOut';
import { readingsAt, slantedStudio, toolStore, yardWall } from './scenes';

const scale: LabelScale = {
  textHeight: { small: 60_000, label: 65_000, dimension: 70_000, letter: 75_000 },
  advance: 0.46,
  clear: 15_000,
};
const plain = { scale, selectedCourse: null, poleId: null };

function drawn(drawing: Drawing, setOut: SetOut, runId: string, options = {}): Figure {
  const figure = elevationFigure(drawing, setOut, runId, { ...plain, ...options });
  if (!figure) throw new Error(`no elevation of ${runId}`);
  return figure;
}

function boxesOf(figure: Figure, role: string): (readonly [number, number, number, number])[] {
  return figure.shapes.flatMap((shape) => (shape.kind === 'boxes' && shape.role === role ? shape.boxes : []));
}

describe('the elevation of a run', () => {
  for (const [name, drawing] of [
    ['the tool store', toolStore()],
    ['a slanted studio', slantedStudio()],
    ['a yard wall', yardWall()],
  ] as const)
    it(`shows every piece that the bond lays in sight, course by course: ${name}`, () => {
      const setOut = solve(drawing, EMPTY_SURVEY);
      for (const run of setOut.walls.runs) {
        const figure = drawn(drawing, setOut, run.runId);
        const bond = setOut.bond.byRun.get(run.runId);
        const pieces = setOut.coursing.courses.flatMap(
          (_, i) => bond?.patterns[bond.patternByCourse[i] ?? -1]?.pieces ?? [],
        );
        const inSight = pieces.filter((piece) => piece.end > 0 && piece.start < run.length);
        expect(inSight.length).toBeGreaterThan(40);
        for (const kind of ['unit', 'closer', 'return'] as const)
          expect(boxesOf(figure, kind)).toHaveLength(inSight.filter((piece) => piece.kind === kind).length);
      }
    });

  it('keeps units within the run, and each as high as a unit', () => {
    const drawing = toolStore();
    const setOut = solve(drawing, EMPTY_SURVEY);
    for (const run of setOut.walls.runs)
      for (const role of ['unit', 'closer', 'return'])
        for (const [x, , width, height] of boxesOf(drawn(drawing, setOut, run.runId), role)) {
          expect(x).toBeGreaterThanOrEqual(0);
          expect(x + width).toBeLessThanOrEqual(run.length);
          expect(height).toBe(inches(3.625));
        }
  });

  it('is the same wall from outside whichever way the plan lies: turned by a quarter turn', () => {
    const drawing = toolStore();
    const turned: Drawing = {
      ...drawing,
      corners: drawing.corners.map((corner) => ({ ...corner, x: (0 - corner.y) as typeof corner.x, y: corner.x })),
    };
    const a = drawn(drawing, solve(drawing, EMPTY_SURVEY), 'r0');
    const b = drawn(turned, solve(turned, EMPTY_SURVEY), 'r0');
    expect(b).toEqual(a);
  });

  it('puts the door frame at its place along the run and up to its head', () => {
    const drawing = toolStore();
    const figure = drawn(drawing, solve(drawing, EMPTY_SURVEY), 'r0');
    const door = figure.shapes.find(
      (shape) => shape.kind === 'polygon' && shape.role === 'opening' && shape.thing?.id === 'o0',
    );
    if (door?.kind !== 'polygon') throw new Error('no door');
    expect(Math.min(...door.points.map((point) => point.x))).toBe(inches(18));
    expect(Math.max(...door.points.map((point) => point.x))).toBe(inches(18 + 39));
    expect(Math.max(...door.points.map((point) => point.y))).toBe(inches(84));
    const lintel = figure.shapes.find((shape) => shape.role === 'lintel' && shape.thing?.id === 'o1');
    // 3 ft wide at 13 ft, bearing 12 in each side, 7 5/8 in deep on the head at 84 in.
    expect(lintel?.kind === 'boxes' && lintel.boxes).toEqual([[feet(12), inches(84), feet(5), inches(7.625)]]);
  });

  it('follows the foundation: the ground line passes through the read heights', () => {
    const drawing = toolStore();
    const setOut = solve(drawing, readingsAt(drawing, [5, 3, 0]));
    const ground = drawn(drawing, setOut, 'r0').shapes.find((shape) => shape.role === 'ground');
    if (ground?.kind !== 'lines') throw new Error('no ground');
    const line = ground.lines[0] ?? [];
    const heightAt = (x: number) => line.find((point) => point.x === x)?.y;
    // C is the high point; A lies 5/8 in and B 3/8 in below it.
    expect(heightAt(0)).toBe(inches(-5 / 8));
    expect(heightAt(feet(24))).toBe(inches(-3 / 8));
  });

  it('strings the line at the top of the selected course, pole to pole', () => {
    const drawing = toolStore();
    const setOut = solve(drawing, EMPTY_SURVEY);
    const figure = drawn(drawing, setOut, 'r0', { selectedCourse: 10 });
    const line = figure.shapes.find((shape) => shape.role === 'line');
    if (line?.kind !== 'lines') throw new Error('no line');
    const top = setOut.coursing.courses[9]?.top;
    expect(line.lines[0]?.map((point) => point.y)).toEqual([top, top]);
    expect(drawn(drawing, setOut, 'r0').shapes.some((shape) => shape.role === 'line')).toBe(false);
  });

  it('marks both poles with every mark of the lift', () => {
    const drawing = toolStore();
    const setOut = solve(drawing, EMPTY_SURVEY);
    const figure = drawn(drawing, setOut, 'r0');
    const marks = figure.shapes.filter((shape) => shape.kind === 'lines' && shape.role === 'mark');
    expect(marks.map((shape) => shape.thing?.id)).toEqual(['c0', 'c1']);
    for (const shape of marks)
      expect(shape.kind === 'lines' && shape.lines.length).toBe(
        setOut.marks.poles.find((pole) => pole.poleId === shape.thing?.id)?.marks.length,
      );
  });

  it('has none for a run that is not there', () => {
    const drawing = toolStore();
    expect(elevationFigure(drawing, solve(drawing, EMPTY_SURVEY), 'nowhere', plain)).toBeNull();
  });
});

describe('pointing at an elevation', () => {
  const drawing = toolStore();
  const setOut = solve(drawing, EMPTY_SURVEY);

  it('finds each course anywhere between the course below and its own top', () => {
    for (const course of setOut.coursing.courses) {
      expect(hitElevation(setOut, 'r0', { x: feet(10), y: course.top }, 100)).toEqual({
        kind: 'course',
        number: course.number,
      });
      expect(hitElevation(setOut, 'r0', { x: feet(10), y: course.bottom }, 100)).toEqual({
        kind: 'course',
        number: course.number,
      });
    }
  });

  it('finds a pole before the courses behind it, and nothing above the wall', () => {
    expect(hitElevation(setOut, 'r0', { x: 0, y: feet(3) }, inches(3))).toEqual({ kind: 'pole', poleId: 'c0' });
    expect(hitElevation(setOut, 'r0', { x: feet(24), y: feet(3) }, inches(3))).toEqual({ kind: 'pole', poleId: 'c1' });
    expect(hitElevation(setOut, 'r0', { x: feet(10), y: feet(30) }, 100)).toBeNull();
    expect(hitElevation(setOut, 'none', { x: 0, y: 0 }, 100)).toBeNull();
  });
});
