import fc from 'fast-check';
import Fraction from 'fraction.js';
import { describe, expect, it } from 'vitest';
import { checkLaid } from '../../../model/asLaid/checkLaid';
import type { LaidLog } from '../../../model/asLaid/types';
import type { Drawing } from '../../../model/drawing/schema';
import { EMPTY_SURVEY } from '../../../model/drawing/surveySchema';
import { inches, ticks, TICKS_PER_INCH } from '../../../model/length/ticks';
import { solve } from '../../../model/setOut';
import { rectangle } from '../../helpers/drawings';

/** 4 in courses on 1/2 in joints: sill at 24 in (course 6), beam soffit at 48 (course 12), plate at 94 (lift 2: 40 in over a 6 in beam). */
const drawing: Drawing = {
  ...rectangle(480, 240),
  controlHeights: [
    { id: 'sill', kind: 'sill', name: 'Sill', height: inches(24), tolerance: ticks(0), hold: 'hard', weight: 1 },
    { id: 'plate', kind: 'plate', name: 'Plate', height: inches(94), tolerance: ticks(0), hold: 'hard', weight: 1 },
  ],
  bondBeams: [
    {
      id: 'beam',
      name: 'Bond beam',
      soffit: inches(48),
      depth: inches(6),
      tolerance: ticks(0),
      hold: 'hard',
      bars: { count: 0, diameter: ticks(0), lap: ticks(0) },
    },
  ],
};
const { walls, coursing } = solve(drawing, EMPTY_SURVEY);
const EMPTY: LaidLog = { heights: [], plumbs: [], joints: [] };
const at = (place: number) => ({ runId: 'r1', at: inches(place) });
const height = (id: string, place: number, course: number, top: number) => ({
  id,
  ...at(place),
  course,
  height: inches(top),
});
const check = (log: Partial<LaidLog>, set?: 'tms' | 'labc') =>
  checkLaid(drawing, walls, coursing, { ...EMPTY, ...log }, set);
const short = (log: Partial<LaidLog>, set?: 'tms' | 'labc') =>
  check(log, set).findings.map(({ kind, readingIds, off, over }) => [
    kind,
    readingIds.join(),
    off / TICKS_PER_INCH,
    over / TICKS_PER_INCH,
  ]);

describe('work as laid', () => {
  it('stands on a plan of 4 in courses, for what follows', () => {
    expect(coursing.courses[5]!.top).toBe(inches(24));
    expect(coursing.lifts.map(({ lastCourse }) => lastCourse)).toEqual([12, 22]);
  });

  it('holds courses to their heights and to each other along a run', () => {
    // 1/8 up and 1/4 down 10 ft apart: 3/8 out of level where 1/4 is allowed. To the far end, 30 ft: 1/2 at most.
    expect(
      short({ heights: [height('a', 0, 2, 8.125), height('b', 120, 2, 7.75), height('c', 360, 2, 8.75)] }),
    ).toEqual([
      ['height', 'a', 0.125, 0],
      ['height', 'b', -0.25, 0],
      ['height', 'c', 0.75, 0.25],
      ['level', 'a,b', -0.375, 0.125],
      ['level', 'b,c', 1, 0.5],
      ['level', 'a,c', 0.625, 0.125],
    ]);
  });

  it('holds two readings of a course to each other once', () => {
    expect(
      short({ heights: [height('b', 120, 2, 8), height('a', 0, 2, 8)] }).filter(([kind]) => kind === 'level'),
    ).toEqual([['level', 'a,b', 0, 0]]);
  });

  it('takes the last of two readings of one course at one place', () => {
    expect(short({ heights: [height('a', 0, 2, 9), height('b', 0, 2, 8)] })).toEqual([['height', 'b', 0, 0]]);
  });

  it('holds plumb within each lift, and lift on lift', () => {
    const plumb = (id: string, from: number, to: number, lean: number) => ({
      id,
      ...at(0),
      from: inches(from),
      to: inches(to),
      lean: inches(lean),
    });
    // Each within its 1/4; together 7/16 over 20 ft, where 3/8 is allowed.
    expect(short({ plumbs: [plumb('two', 120, 240, 0.1875), plumb('one', 0, 120, 0.25)] })).toEqual([
      ['plumb', 'one', 0.25, 0],
      ['plumb', 'two', 0.1875, 0],
      ['liftBase', 'one,two', 0.4375, 0.0625],
    ]);
    expect(short({ plumbs: [plumb('out', 0, 48, -0.375)] })).toEqual([['plumb', 'out', -0.375, 0.125]]);
  });

  it('holds each joint to its plan, and the first to its own limits', () => {
    const joint = (id: string, course: number, thickness: number) => ({
      id,
      ...at(0),
      course,
      thickness: inches(thickness),
    });
    expect(
      short({ joints: [joint('a', 1, 0.875), joint('b', 2, 0.5), joint('c', 3, 0.6875), joint('d', 4, 0.25)] }),
    ).toEqual([
      ['firstJoint', 'a', 0.125, 0.125],
      ['joint', 'b', 0, 0],
      ['joint', 'c', 0.1875, 0.0625],
      ['joint', 'd', -0.25, 0.125],
    ]);
    expect(short({ joints: [joint('a', 1, 0.125)] })).toEqual([['firstJoint', 'a', -0.125, 0.125]]);
    expect(check({ joints: [joint('a', 1, 0.5)] }).findings[0]!.over).toBe(0);
  });

  it('says which readings belong to no course and no wall', () => {
    const found = check({
      heights: [height('a', 0, 99, 8), { ...height('b', 0, 2, 8), runId: 'gone' }, height('c', 481, 2, 8)],
    });
    expect(found).toEqual({ findings: [], back: [], ignored: ['a', 'b', 'c'] });
  });
});

describe('the way back to the plan', () => {
  const back = (course: number, top: number) => check({ heights: [height('a', 0, course, top)] }).back[0]!;

  it('is a little in each joint up to the next control height', () => {
    // Course 2 is 1/4 high at 8 1/4: to 24 in four courses, 4 × 3 1/2 in of units, 1 3/4 in of joints: 7/16 each.
    expect(back(2, 8.25)).toEqual({
      place: at(0),
      course: 2,
      drift: inches(0.25),
      control: { thing: { kind: 'controlHeight', id: 'sill' }, course: 6, height: inches(24) },
      joint: { exact: inches(7 / 16), count: 4, within: true },
      // One joint of 1/4 or two of 3/8: two courses up the line is met again, at the least joint.
      first: { course: 4, height: inches(16), joint: inches(0.375) },
      nearest: inches(24),
    });
  });

  it('says what can be reached instead, and the first line that can be met, where the control height can’t', () => {
    // Course 5 is 1/4 high: the one joint left would be 1/4, its least is 3/8: 24 1/8 is the nearest.
    const found = back(5, 20.25);
    expect(found.joint).toEqual({ exact: inches(0.25), count: 1, within: false });
    expect(found.nearest).toBe(inches(24.125));
    expect(found.first).toEqual({ course: 7, height: inches(28), joint: inches(0.375) });
  });

  it('ends with the lift: the beam over it is formed to its own height', () => {
    const found = back(11, 44.5);
    expect(found.control).toEqual({ thing: { kind: 'bondBeam', id: 'beam' }, course: 12, height: inches(48) });
    expect(found.joint!.within).toBe(false);
    expect(found.first).toBeNull();
    expect(back(12, 48.25)).toMatchObject({ control: null, joint: null, first: null, nearest: null });
    expect(back(13, 58).control).toEqual({
      thing: { kind: 'controlHeight', id: 'plate' },
      course: 22,
      height: inches(94),
    });
  });

  it('is what rational arithmetic and trying every count of courses find', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 11 }), fc.integer({ min: -20_000, max: 20_000 }), (course, drift) => {
        const laid = { id: 'a', ...at(0), course, height: ticks(inches(4 * course) + drift) };
        const found = check({ heights: [laid] }).back[0]!;
        const joint = (to: number) =>
          new Fraction(inches(4 * to))
            .sub(laid.height)
            .sub(inches(3.5) * (to - course))
            .div(to - course);
        const reached = Array.from({ length: 12 - course }, (_, i) => course + 1 + i).find((to) => {
          const needed = joint(to);
          return needed.compare(inches(0.375)) >= 0 && needed.compare(inches(0.625)) <= 0;
        });
        expect(found.first?.course ?? null).toBe(reached ?? null);
        const control = course < 6 ? 6 : 12;
        expect(found.joint!.exact).toBeCloseTo(joint(control).valueOf(), 6);
        // Laid with the joint that it says, the work stands on the line.
        if (found.first) {
          const top = laid.height + (found.first.course - course) * (inches(3.5) + found.first.joint);
          expect(top).toBeCloseTo(found.first.height, 6);
        }
      }),
    );
  });
});
