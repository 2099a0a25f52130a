/** Vertical coursing against published tables: course n of a pole, printed to the tape. */
import Fraction from 'fraction.js';
import { describe, expect, it } from 'vitest';
import { planCourses } from '../../../model/coursing/planCourses';
import type { Drawing, WallType } from '../../../model/drawing/schema';
import { EMPTY_SURVEY, type Survey } from '../../../model/drawing/surveySchema';
import { inches, mm, ticks, TICKS_PER_INCH, type Ticks } from '../../../model/length/ticks';
import { markPoles } from '../../../model/marks/markPoles';
import type { PoleMarks } from '../../../model/marks/types';
import { placePoles } from '../../../model/poles/placePoles';
import { levelGround } from '../../../model/survey/levelGround';
import { layOutWalls } from '../../../model/walls/layOutWalls';
import { earthBlock, rectangle } from '../../helpers/drawings';

/** A wall of equal courses of exactly `gauge` ticks, bedding and unit making the first of them, held by a plate on top. */
function polesOf(gauge: Fraction, courses: number, change: Partial<Drawing> = {}): PoleMarks[] {
  const first = gauge.round().valueOf();
  const joint = inches(3 / 8);
  const type: WallType = earthBlock({
    unit: { length: inches(7.625), width: inches(3.625), height: ticks(first - joint) },
    bedJoint: { least: inches(1 / 4), nominal: joint, most: inches(1 / 2) },
    bedding: { least: joint, most: inches(1) },
  });
  const drawing: Drawing = {
    ...rectangle(240, 120, type),
    controlHeights: [
      {
        id: 'plate',
        kind: 'plate',
        name: 'Plate',
        height: ticks(gauge.mul(courses).round().valueOf()),
        tolerance: ticks(0),
        hold: 'hard',
        weight: 1,
      },
    ],
    ...change,
  };
  const walls = layOutWalls(drawing);
  const ground = levelGround(drawing, walls, EMPTY_SURVEY);
  const coursing = planCourses(drawing, walls, ground);
  return [...markPoles(drawing, ground, coursing, placePoles(drawing, walls)).poles];
}

/** Printed height of each course above the foundation, at every pole alike. */
function printed(poles: readonly PoleMarks[]): Map<number, Ticks> {
  const [first, ...others] = poles.map(
    (pole) =>
      new Map(
        pole.marks.flatMap((mark) =>
          mark.course === null ? [] : [[mark.course, mark.printed.aboveFoundation] as const],
        ),
      ),
  );
  for (const other of others) expect([...other]).toEqual([...first!]);
  return first!;
}

const inch = (value: number) => new Fraction(value).mul(TICKS_PER_INCH);

describe('modular brick, three courses to 8 in', () => {
  const marks = printed(polesOf(inch(8).div(3), 100));

  // Brick Industry Association, Technical Notes, vertical coursing table, reprinted in Masonry Magazine, April 1994, p. 25.
  it.each([
    [3, 0, 8],
    [6, 1, 4],
    [9, 2, 0],
    [12, 2, 8],
    [24, 5, 4],
    [36, 8, 0],
    [45, 10, 0],
    [48, 10, 8],
  ])('%i courses are %i ft %i in', (course, foot, inchPart) => {
    expect(marks.get(course)).toBe((foot * 12 + inchPart) * TICKS_PER_INCH);
  });

  // Derived: n × 8/3 in, to 1/16 in, each from zero.
  it.each([
    [1, 0, 2, 11],
    [2, 0, 5, 5],
    [4, 0, 10, 11],
    [5, 1, 1, 5],
    [7, 1, 6, 11],
    [8, 1, 9, 5],
    [10, 2, 2, 11],
    [50, 11, 1, 5],
    [100, 22, 2, 11],
  ])('%i courses are %i ft %i in and %i sixteenths', (course, foot, inchPart, sixteenths) => {
    expect(marks.get(course)).toBe((foot * 12 + inchPart) * TICKS_PER_INCH + sixteenths * 1016);
  });

  // Derived: 3 × 2 11/16 = 8 1/16, which is not 8.
  it('never adds rounded marks: three times the first mark is not the third', () => {
    expect(3 * marks.get(1)!).toBe(inches(8 + 1 / 16));
    expect(marks.get(3)).toBe(inches(8));
  });
});

describe('other gauges', () => {
  // Brick Industry Association, the same table: two courses to 4 in, and one course to 4 in.
  it.each([
    [2, 10, 20],
    [2, 50, 100],
    [2, 100, 200],
    [4, 12, 48],
    [4, 50, 200],
    [4, 100, 400],
  ])('at %i in a course, %i courses are %i in', (gauge, course, height) => {
    expect(printed(polesOf(inch(gauge), 100)).get(course)).toBe(inches(height));
  });

  // Common UK practice (secondary source): 65 mm brick and 10 mm joint, 75 mm a course, four courses to 300 mm.
  it('at 75 mm a course, 4 courses are 300 mm', () => {
    const marks = printed(polesOf(new Fraction(75 * 640), 40, { units: 'metric', tapeStep: ticks(640) }));
    expect(marks.get(1)).toBe(mm(75));
    expect(marks.get(4)).toBe(mm(300));
    expect(marks.get(40)).toBe(mm(3000));
  });

  // NAVEDTRA 14043 and 14045 (US Navy Builder manuals): courses of 8 in block = 1.5 × height in feet.
  it.each([
    [8, 12],
    [10, 15],
  ])('a wall of %i ft in 8 in block is %i courses', (height, courses) => {
    const block = earthBlock({
      unit: { length: inches(15.625), width: inches(7.625), height: inches(7.625) },
      bedJoint: { least: inches(1 / 4), nominal: inches(3 / 8), most: inches(1 / 2) },
      bedding: { least: inches(3 / 8), most: inches(3 / 4) },
    });
    const drawing: Drawing = {
      ...rectangle(240, 120, block),
      controlHeights: [
        {
          id: 'plate',
          kind: 'plate',
          name: 'Plate',
          height: inches(12 * height),
          tolerance: ticks(0),
          hold: 'hard',
          weight: 1,
        },
      ],
    };
    const walls = layOutWalls(drawing);
    const coursing = planCourses(drawing, walls, levelGround(drawing, walls, EMPTY_SURVEY));
    expect(coursing.courses).toHaveLength(courses);
    expect(coursing.answer.cost).toEqual([0, 0, 0, 0, 0, 0]);
  });
});

describe('earth block in one common size', () => {
  const readings: Survey = {
    ...EMPTY_SURVEY,
    readings: [48, 48.375, 48.25, 48].map((down, i) => ({
      id: `s${i}`,
      station: { kind: 'corner', cornerId: `c${i + 1}` },
      down: inches(down),
    })),
  };
  const drawing = rectangle(240, 120);
  const walls = layOutWalls(drawing);
  const ground = levelGround(drawing, walls, readings);
  const marks = markPoles(drawing, ground, planCourses(drawing, walls, ground), placePoles(drawing, walls));
  const first = (letter: string) =>
    marks.poles.find((pole) => pole.letter === letter)!.marks.find((mark) => mark.course === 1)!;

  // Common practice, no source: a 3 1/2 in unit on 1/2 in of bedding.
  it('has its first mark 4 in above the high point', () => {
    expect(first('A').printed.aboveFoundation).toBe(inches(4));
  });

  // Common practice, no source: a point 3/8 in lower takes 7/8 in of bedding, and its mark is 4 3/8 in up.
  it('takes 7/8 in of bedding where the foundation is 3/8 in lower, its mark 4 3/8 in above it', () => {
    expect(ground.stations[1]!.bedding).toBe(inches(7 / 8));
    expect(first('B').printed.aboveFoundation).toBe(inches(4 + 3 / 8));
  });

  // Common practice, no source: high point read 48 in below the line, so the 4 in mark is 44 in below it.
  it('has that mark 44 in below the level line at every pole', () => {
    for (const letter of ['A', 'B', 'C', 'D']) expect(first(letter).printed.fromLine).toBe(inches(-44));
  });
});

describe('a remounted pole', () => {
  // Common practice, no source: on a bond beam a 10 ft pole with 6 in of foot reaches 9 ft 6 in.
  it('reaches 9 ft 6 in above the beam', () => {
    const drawing: Drawing = {
      ...rectangle(240, 120),
      bondBeams: [96, 184].map((soffit, i) => ({
        id: `b${i}`,
        name: 'Bond beam',
        soffit: inches(soffit),
        depth: inches(8),
        tolerance: ticks(0),
        hold: 'hard' as const,
        bars: { count: 0, diameter: ticks(0), lap: ticks(0) },
      })),
    };
    const walls = layOutWalls(drawing);
    const ground = levelGround(drawing, walls, EMPTY_SURVEY);
    const marks = markPoles(drawing, ground, planCourses(drawing, walls, ground), placePoles(drawing, walls));
    const second = marks.poles.find((pole) => pole.lift === 2)!;
    expect(second.head - inches(104)).toBe(inches(9 * 12 + 6));
  });
});
