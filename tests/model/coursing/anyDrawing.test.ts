/** Whatever the schema admits, heights are worked out without an exception, without NaN and in whole ticks. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { planCourses } from '../../../model/coursing/planCourses';
import { drawingSchema, type Drawing } from '../../../model/drawing/schema';
import { EMPTY_SURVEY, surveySchema, type Survey } from '../../../model/drawing/surveySchema';
import { inches, ticks } from '../../../model/length/ticks';
import { markPoles } from '../../../model/marks/markPoles';
import { placePoles } from '../../../model/poles/placePoles';
import { levelGround } from '../../../model/survey/levelGround';
import { layOutWalls } from '../../../model/walls/layOutWalls';
import { earthBlock, rectangle, withWindow } from '../../helpers/drawings';

const MOST = 200_000 * 640;
const size = fc.oneof(
  fc.integer({ min: 1, max: 40 }),
  fc.integer({ min: 1, max: 200_000 }),
  fc.integer({ min: 1, max: 3_000_000 }),
  fc.integer({ min: 1, max: MOST }),
);
const sizeOrZero = fc.oneof(fc.constant(0), size);
const hold = fc.constantFrom('hard' as const, 'soft' as const);

const anyDrawing = fc
  .record({
    unitHeight: size,
    joint: fc.tuple(sizeOrZero, sizeOrZero, sizeOrZero),
    bedding: fc.tuple(sizeOrZero, sizeOrZero),
    windows: fc.array(fc.record({ sill: sizeOrZero, rise: size }), { maxLength: 5 }),
    controls: fc.array(
      fc.record({
        kind: fc.constantFrom('sill' as const, 'head' as const, 'plate' as const, 'named' as const),
        height: size,
        tolerance: sizeOrZero,
        hold,
        weight: fc.integer({ min: 1, max: 100 }),
      }),
      { maxLength: 40 },
    ),
    beams: fc.array(fc.record({ soffit: size, depth: size, hold }), { maxLength: 10 }),
    downs: fc.array(sizeOrZero, { maxLength: 6 }),
    ratio: fc.constantFrom(0, 10, 1e9),
    thin: fc.option(fc.tuple(size, size), { nil: null }),
    first: fc.option(size, { nil: null }),
  })
  .map((parts): { drawing: Drawing; survey: Survey } => {
    const [least, nominal, most] = [...parts.joint].sort((a, b) => a - b) as [number, number, number];
    const [thin, thick] = [...parts.bedding].sort((a, b) => a - b) as [number, number];
    const type = earthBlock({
      unit: { length: inches(14), width: inches(10), height: ticks(parts.unitHeight) },
      bedJoint: { least: ticks(least), nominal: ticks(nominal), most: ticks(most) },
      bedding: { least: ticks(thin), most: ticks(thick) },
      ...(parts.thin
        ? { thinCourse: { least: ticks(Math.min(...parts.thin)), most: ticks(Math.max(...parts.thin)) } }
        : {}),
      ...(parts.first ? { firstCourse: { height: ticks(parts.first) } } : {}),
    });
    let drawing = rectangle(600, 240, type);
    parts.windows.forEach((window, i) => {
      drawing = withWindow(drawing, 'r1', { at: 30 + 60 * i, width: 24, sill: 0, head: 1 });
      const last = drawing.openings[i]!;
      const openings = [...drawing.openings.slice(0, i)];
      const head = Math.min(MOST, window.sill + window.rise);
      openings.push({ ...last, sill: ticks(window.sill), head: ticks(head) });
      drawing = { ...drawing, openings };
    });
    const controlHeights = parts.controls.map((control, i) => ({
      ...control,
      id: `k${i}`,
      name: '',
      height: ticks(control.height),
      tolerance: ticks(control.tolerance),
    }));
    const bondBeams = parts.beams.map((beam, i) => ({
      id: `b${i}`,
      name: '',
      soffit: ticks(beam.soffit),
      depth: ticks(beam.depth),
      tolerance: ticks(0),
      hold: beam.hold,
      bars: { count: 0, diameter: ticks(0), lap: ticks(0) },
    }));
    const readings = parts.downs.map((down, i) => ({
      id: `s${i}`,
      station:
        i < 3
          ? { kind: 'corner' as const, cornerId: `c${i + 1}` }
          : { kind: 'run' as const, runId: 'r2', at: ticks(i * 900_000) },
      down: ticks(down),
    }));
    return {
      drawing: { ...drawing, controlHeights, bondBeams, ruleValues: { liftToThickness: parts.ratio } },
      survey: { ...EMPTY_SURVEY, readings },
    };
  });

/** Every number found anywhere inside. */
function numbersIn(value: unknown, path = ''): [string, number][] {
  if (typeof value === 'number') return [[path, value]];
  if (value instanceof Map) return [...value].flatMap(([key, one]) => numbersIn(one, `${path}.${String(key)}`));
  if (value === null || typeof value !== 'object') return [];
  return Object.entries(value).flatMap(([key, one]) => numbersIn(one, `${path}.${key}`));
}

describe('heights of any drawing', () => {
  it('come out whole, in order, with courses that follow on', () => {
    fc.assert(
      fc.property(anyDrawing, ({ drawing, survey }) => {
        drawingSchema.parse(drawing);
        surveySchema.parse(survey);
        const walls = layOutWalls(drawing);
        const ground = levelGround(drawing, walls, survey);
        const coursing = planCourses(drawing, walls, ground);
        const poles = placePoles(drawing, walls);
        const marks = markPoles(drawing, ground, coursing, poles);
        const { courses, lifts, unitHeight } = coursing;
        for (const [path, number] of [...numbersIn({ courses, lifts, marks, controls: coursing.answer.controls })]) {
          if (!Number.isInteger(number) || Object.is(number, -0)) expect([path, number]).toEqual([path, 'whole']);
        }
        expect(coursing.answer.cost.every((part) => Number.isFinite(part) && part >= 0)).toBe(true);
        // The bound on courses is on whole ones; each stop may have one thinner besides.
        expect(courses.length).toBeLessThanOrEqual(1002 + 64);
        const thinTops = new Set(
          coursing.answer.intervals.flatMap((one) => (one.thin === undefined ? [] : [one.lastCourse])),
        );
        const thinCourse = drawing.wallTypes[0]!.thinCourse;
        const saysSo = coursing.reasons.some(({ code }) => code === 'searchBoundReached' || code === 'noCoursesFit');
        expect(coursing.proof !== 'all').toBe(saysSo);
        expect(coursing.others.length).toBeLessThanOrEqual(4);
        courses.forEach((course, i) => {
          expect(course.number).toBe(i + 1);
          const isThin = thinTops.has(course.number);
          const high = course.top - course.bottom;
          if (i === 0) expect(high).toBe((drawing.wallTypes[0]!.firstCourse ?? drawing.wallTypes[0]!.unit).height);
          else if (!isThin) expect(high).toBe(unitHeight);
          else {
            expect(high).toBeGreaterThanOrEqual(thinCourse!.least);
            expect(high).toBeLessThanOrEqual(Math.min(thinCourse!.most, unitHeight - 1));
          }
          const below = courses[i - 1];
          const lift = lifts[course.lift - 1]!;
          const base = below?.lift === course.lift ? below.top : lift.base;
          expect(course.bottom - course.joint).toBe(base);
          if (i > 0) {
            expect(course.joint).toBeGreaterThanOrEqual(drawing.wallTypes[0]!.bedJoint.least - 1);
            expect(course.joint).toBeLessThanOrEqual(drawing.wallTypes[0]!.bedJoint.most + 1);
          }
        });
        lifts.forEach((lift) => {
          const last = courses[lift.lastCourse - 1]!;
          expect(last.top).toBe(lift.top);
          expect(last.lift).toBe(lift.number);
          if (lift.beam) expect(lift.beam.soffit).toBe(lift.top);
        });
      }),
      { numRuns: 100, seed: 3 },
    );
  }, 120_000);
});
