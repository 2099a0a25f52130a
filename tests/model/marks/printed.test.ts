/** Printed marks over random buildings: rounded once each, never stepped from one another, level from pole to pole. */
import fc from 'fast-check';
import Fraction from 'fraction.js';
import { describe, expect, it } from 'vitest';
import { planCourses } from '../../../model/coursing/planCourses';
import type { Coursing } from '../../../model/coursing/types';
import { drawingSchema, type Drawing } from '../../../model/drawing/schema';
import { EMPTY_SURVEY, type Survey } from '../../../model/drawing/surveySchema';
import { inches, ticks } from '../../../model/length/ticks';
import { levelCheck } from '../../../model/marks/levelCheck';
import { markPoles } from '../../../model/marks/markPoles';
import { areLevel, levelDifferences, printedErrors } from '../../../model/marks/printedErrors';
import type { Marks } from '../../../model/marks/types';
import { placePoles } from '../../../model/poles/placePoles';
import { levelGround } from '../../../model/survey/levelGround';
import { layOutWalls } from '../../../model/walls/layOutWalls';
import { earthBlock, rectangle, withDoor, withWindow } from '../../helpers/drawings';

interface Site {
  readonly drawing: Drawing;
  readonly survey: Survey;
}

/** Two lifts, a door, a window and a plate, at heights of whole 1/128 in; any tape; a foundation that is out of level. */
const sites = fc
  .record({
    step: fc.constantFrom(2032, 1016, 508, 640),
    unit: fc.integer({ min: 320, max: 1000 }),
    soffit: fc.integer({ min: 80 * 128, max: 110 * 128 }),
    second: fc.integer({ min: 60 * 128, max: 100 * 128 }),
    sill: fc.integer({ min: 20 * 128, max: 40 * 128 }),
    head: fc.integer({ min: 60 * 128, max: 78 * 128 }),
    hold: fc.constantFrom('hard' as const, 'soft' as const),
    thin: fc.boolean(),
    downs: fc.array(fc.integer({ min: 40 * 128, max: 49 * 128 }), { minLength: 4, maxLength: 4 }),
  })
  .map(({ step, unit, soffit, second, sill, head, hold, thin, downs }): Site => {
    const height = ticks(unit * 127);
    const type = earthBlock({
      unit: { length: inches(14), width: inches(10), height },
      bedding: { least: inches(0.5), most: inches(12) },
      ...(thin ? { thinCourse: { least: ticks(height >> 2), most: ticks(height - 127) } } : {}),
    });
    const bare = withDoor(rectangle(240, 120, type), 'r1', 60, 36, head / 128);
    const drawing = withWindow(bare, 'r3', { at: 60, width: 36, sill: sill / 128, head: head / 128 });
    const beam = (id: string, at: number): Drawing['bondBeams'][number] => ({
      id,
      name: '',
      soffit: ticks(at * 127),
      depth: inches(8),
      tolerance: ticks(0),
      hold,
      bars: { count: 2, diameter: inches(0.5), lap: inches(20) },
    });
    return {
      drawing: {
        ...drawing,
        tapeStep: ticks(step),
        bondBeams: [beam('b1', soffit), beam('b2', soffit + 8 * 128 + second)],
      },
      survey: {
        ...EMPTY_SURVEY,
        readings: downs.map((down, i) => ({
          id: `s${i}`,
          station: { kind: 'corner', cornerId: `c${i + 1}` },
          down: ticks(down * 127),
        })),
      } as Survey,
    };
  });

function setOut({ drawing, survey }: Site): { coursing: Coursing; marks: Marks } {
  drawingSchema.parse(drawing);
  const walls = layOutWalls(drawing);
  const ground = levelGround(drawing, walls, survey);
  const coursing = planCourses(drawing, walls, ground);
  return { coursing, marks: markPoles(drawing, ground, coursing, placePoles(drawing, walls)) };
}

/** Rounded to a step by rational arithmetic, half away from zero. */
function roundedTo(value: number, step: number): number {
  const steps = new Fraction(value).div(step);
  const size = steps.abs().add(new Fraction(1, 2)).floor();
  return Number(size.mul(steps.s).mul(step).valueOf()) + 0;
}

const RUNS = { numRuns: 60, seed: 88 };

describe('printed marks', () => {
  it('are each rounded once from their exact distance, and never more than half a step out', () => {
    fc.assert(
      fc.property(sites, (site) => {
        const step = site.drawing.tapeStep;
        const { marks } = setOut(site);
        for (const mark of marks.poles.flatMap((pole) => pole.marks)) {
          for (const key of ['fromLine', 'fromFoot', 'aboveFoundation'] as const)
            expect(mark.printed[key]).toBe(roundedTo(mark[key], step));
        }
        const errors = printedErrors(marks);
        expect(errors).toHaveLength(marks.poles.reduce((sum, pole) => sum + pole.marks.length, 0));
        for (const { fromLine, fromFoot, aboveFoundation } of errors)
          for (const error of [fromLine, fromFoot, aboveFoundation])
            expect(Math.abs(error) * 2).toBeLessThanOrEqual(step);
      }),
      RUNS,
    );
  });

  it('would drift if the rounded gauge were stepped from mark to mark, and do not', () => {
    let drifting = 0;
    fc.assert(
      fc.property(sites, (site) => {
        const step = site.drawing.tapeStep;
        const { coursing, marks } = setOut(site);
        const first = marks.poles[0]!;
        for (const { firstCourse, lastCourse, count, joint, thin } of coursing.answer.intervals) {
          const last = first.marks.find((mark) => mark.course === lastCourse);
          const start = first.marks.find((mark) => mark.course === firstCourse);
          if (!last || !start || count < 2) continue;
          const whole = thin === undefined ? count - 1 : count - 2;
          const gauge = coursing.unitHeight + joint;
          const thinner = thin === undefined ? 0 : roundedTo(thin + joint, step);
          const stepped = start.printed.fromLine + whole * roundedTo(gauge, step) + thinner;
          if (Math.abs(stepped - last.fromLine) > step) drifting++;
          expect(Math.abs(last.printed.fromLine - last.fromLine) * 2).toBeLessThanOrEqual(step);
        }
      }),
      RUNS,
    );
    expect(drifting).toBeGreaterThan(30);
  });

  it('stand level from pole to pole: alike from the level line, within a step from the foot and the foundation', () => {
    let apart = 0;
    fc.assert(
      fc.property(sites, (site) => {
        const { marks } = setOut(site);
        for (const lift of [1, 2]) {
          const poles = marks.poles.filter((pole) => pole.lift === lift);
          for (const [i, one] of poles.entries()) {
            for (const other of poles.slice(i + 1)) {
              expect(levelCheck(one, other)).toEqual([]);
              expect(areLevel(one, other, site.drawing.tapeStep)).toBe(true);
              const differences = levelDifferences(one, other);
              expect(differences).toHaveLength(one.marks.length);
              for (const difference of differences) {
                expect(difference.fromLine).toBe(0);
                if (difference.aboveFoundation !== 0) apart++;
              }
            }
          }
        }
      }),
      RUNS,
    );
    // Otherwise the foundations were level and nothing was tried.
    expect(apart).toBeGreaterThan(100);
  });

  it('are found out where two poles were marked from different heights of the level line', () => {
    const [site] = fc.sample(sites, { numRuns: 1, seed: 4 });
    const { marks } = setOut(site!);
    const [one, other] = marks.poles.filter((pole) => pole.lift === 1);
    const moved = { ...other!, levelLine: ticks(other!.levelLine + 3 * site!.drawing.tapeStep) };
    expect(areLevel(one!, other!, site!.drawing.tapeStep)).toBe(true);
    expect(areLevel(one!, moved, site!.drawing.tapeStep)).toBe(false);
  });

  it('carry what a lift is laid to: every course, beam soffits and tops, sills, heads and lintel seats', () => {
    fc.assert(
      fc.property(sites, (site) => {
        const { coursing, marks } = setOut(site);
        for (const pole of marks.poles) {
          const lift = coursing.lifts[pole.lift - 1]!;
          const heightsOf = (kind: string) =>
            pole.marks.flatMap((mark) => (mark.kinds.includes(kind as never) ? [mark.height] : []));
          const tops = coursing.courses.flatMap((course) => (course.lift === pole.lift ? [course.top] : []));
          expect(heightsOf('course').reverse()).toEqual(tops);
          expect(heightsOf('beamSoffit')).toEqual(lift.beam ? [lift.beam.soffit] : []);
          expect(heightsOf('beamTop')).toEqual(lift.beam ? [lift.beam.top] : []);
          // Remounted, the foot is lapped down over the beam below.
          const stands = pole.lift === 1 ? pole.foundation : lift.base;
          expect(pole.foot).toBe(stands - site.drawing.poleKit.footLap);
          expect(pole.head - pole.foot).toBe(site.drawing.poleKit.poleLength);
        }
        const first = marks.poles.find((pole) => pole.lift === 1)!;
        for (const control of coursing.answer.controls) {
          if (control.thing.kind !== 'opening') continue;
          const kinds = control.kind === 'sill' ? (['sill'] as const) : (['head', 'lintelSeat'] as const);
          for (const kind of kinds) {
            const height = kind === 'head' || control.course === null ? control.wanted : control.got;
            expect(first.marks.find((mark) => mark.height === height)?.kinds).toContain(kind);
          }
        }
      }),
      RUNS,
    );
  });
});
