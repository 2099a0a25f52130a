import { describe, expect, it } from 'vitest';
import { planCourses } from '../../../model/coursing/planCourses';
import type { Coursing } from '../../../model/coursing/types';
import type { BondBeam, ControlHeight, Drawing } from '../../../model/drawing/schema';
import { EMPTY_SURVEY } from '../../../model/drawing/surveySchema';
import { feet, inches, mm, ticks } from '../../../model/length/ticks';
import type { Reason } from '../../../model/reasons';
import { levelGround } from '../../../model/survey/levelGround';
import { layOutWalls } from '../../../model/walls/layOutWalls';
import { earthBlock, emptyDrawing, rectangle, withDoor, withWindow } from '../../helpers/drawings';

function plan(drawing: Drawing): Coursing {
  const walls = layOutWalls(drawing);
  return planCourses(drawing, walls, levelGround(drawing, walls, EMPTY_SURVEY));
}

function beam(soffit: number, change: Partial<BondBeam> = {}): BondBeam {
  return {
    id: 'b1',
    name: 'Bond beam',
    soffit: inches(soffit),
    depth: inches(8),
    tolerance: inches(0.125),
    hold: 'hard',
    bars: { count: 2, diameter: inches(0.5), lap: inches(20) },
    ...change,
  };
}

function control(height: number, change: Partial<ControlHeight> = {}): ControlHeight {
  return {
    id: 'k1',
    kind: 'named',
    name: 'Shelf',
    height: inches(height),
    tolerance: ticks(0),
    hold: 'soft',
    weight: 1,
    ...change,
  };
}

function codes(coursing: Coursing): Reason['code'][] {
  return coursing.reasons.map((reason) => reason.code);
}

const walls = rectangle(240, 120);

describe('planCourses', () => {
  it('lays even courses of the nominal joint where every height falls on a course line', () => {
    const coursing = plan({
      ...withWindow(withDoor(walls, 'r1', 60, 36, 80), 'r3', { at: 60, width: 36, sill: 36, head: 80 }),
      bondBeams: [beam(96)],
    });
    expect(coursing.answer.cost).toEqual([0, 0, 0, 0, 0, 0]);
    expect(coursing.courses).toHaveLength(24);
    expect(coursing.courses.map((course) => course.top)).toEqual(
      Array.from({ length: 24 }, (_, i) => inches(4 * (i + 1))),
    );
    expect(coursing.answer.intervals).toEqual([
      {
        lift: 1,
        fromHeight: inches(4),
        toHeight: inches(96),
        count: 23,
        joint: inches(0.5),
        firstCourse: 2,
        lastCourse: 24,
      },
    ]);
    expect(coursing.lifts).toEqual([
      {
        number: 1,
        base: 0,
        top: inches(96),
        beam: { id: 'b1', soffit: inches(96), top: inches(104) },
        most: inches(100),
        firstCourse: 1,
        lastCourse: 24,
      },
    ]);
    expect(coursing.top).toBe(inches(104));
    expect(codes(coursing)).toEqual([]);
    expect(coursing.answer.controls.every((one) => one.met && one.miss === 0)).toBe(true);
  });

  it('spreads the joints of an interval to meet a height, one joint for the whole interval', () => {
    const coursing = plan({ ...walls, bondBeams: [beam(96.75)] });
    const [interval] = coursing.answer.intervals;
    // 23 courses take 92 3/4 in: 92.75 / 23 − 3.5 in each.
    expect(interval!.count).toBe(23);
    expect(interval!.joint).toBeCloseTo(((92.75 - 23 * 3.5) / 23) * 16_256, 6);
    expect(coursing.courses[23]!.top).toBe(inches(96.75));
    const joints = new Set(coursing.courses.slice(1).map((course) => course.joint));
    expect(Math.max(...joints) - Math.min(...joints)).toBeLessThanOrEqual(1);
    coursing.courses.slice(1).forEach((course, i) => {
      expect(course.bottom - course.joint).toBe(coursing.courses[i]!.top);
    });
  });

  it('starts each lift on its beam, with a joint under its first course', () => {
    const coursing = plan({ ...walls, bondBeams: [beam(96), beam(184, { id: 'b2' })] });
    expect(
      coursing.lifts.map(({ base, top, firstCourse, lastCourse }) => [base, top, firstCourse, lastCourse]),
    ).toEqual([
      [0, inches(96), 1, 24],
      [inches(104), inches(184), 25, 44],
    ]);
    expect(coursing.courses[24]).toEqual({
      number: 25,
      lift: 2,
      bottom: inches(104.5),
      top: inches(108),
      joint: inches(0.5),
    });
  });

  it('says what a hard height misses by, and the nearest heights that courses can meet', () => {
    // One course of 3.875 to 4.125 in over the 4 in line, or two of 7.75 to 8.25: 10 in is between.
    const coursing = plan({ ...walls, controlHeights: [control(10, { hold: 'hard' })], bondBeams: [beam(96)] });
    const reason = coursing.reasons.find((one) => one.code === 'hardHeightNotMet');
    expect(reason).toEqual({
      code: 'hardHeightNotMet',
      weight: 'warning',
      thing: { kind: 'controlHeight', id: 'k1' },
      amount: inches(1.75),
      nearest: { below: inches(8.125), above: inches(11.75) },
    });
    expect(coursing.answer.cost[0]).toBe(1);
    expect(coursing.answer.controls.find((one) => one.kind === 'bondBeam')!.met).toBe(true);
  });

  it('meets a hard height at the cost of a soft one', () => {
    const coursing = plan({
      ...walls,
      controlHeights: [control(36.5, { hold: 'hard' }), control(38, { id: 'k2', weight: 100 })],
      bondBeams: [beam(96)],
    });
    const [hard, soft] = coursing.answer.controls;
    expect(hard).toMatchObject({ wanted: inches(36.5), got: inches(36.5), met: true });
    expect(soft!.met).toBe(false);
    expect(codes(coursing)).toEqual(['softHeightMissed']);
  });

  it('counts a soft height within its tolerance as met', () => {
    const [within] = plan({
      ...walls,
      controlHeights: [control(8.25, { tolerance: inches(0.125) })],
      bondBeams: [beam(96)],
    }).answer.controls;
    expect(within).toMatchObject({ got: inches(8.125), met: true, below: null, above: null });
  });

  it('holds two soft heights within their tolerance rather than one of them exactly', () => {
    // 8 1/8 and 8 3/8 can't both be course lines; both lie within 1/8 in of 8 1/4.
    const tolerance = inches(0.125);
    const coursing = plan({
      ...emptyDrawing(earthBlock({ bedJoint: { least: inches(0.25), nominal: inches(0.5), most: inches(0.75) } })),
      controlHeights: [control(8.125, { tolerance }), control(8.375, { id: 'k2', tolerance })],
    });
    expect(coursing.answer.controls.map((one) => one.met)).toEqual([true, true]);
  });

  it('offers other answers that differ in their courses, none better than the first, best first', () => {
    const wide = earthBlock({ bedJoint: { least: inches(0.25), nominal: inches(0.5), most: inches(0.75) } });
    const coursing = plan({ ...rectangle(240, 120, wide), bondBeams: [beam(96)] });
    expect(coursing.others.length).toBeGreaterThanOrEqual(2);
    expect(coursing.others.length).toBeLessThanOrEqual(4);
    const answers = [coursing.answer, ...coursing.others];
    expect(new Set(answers.map((answer) => answer.intervals[0]!.count)).size).toBe(answers.length);
    answers.slice(1).forEach((answer, i) => {
      const before = answers[i]!.cost;
      const first = answer.cost.findIndex((part, k) => Math.abs(part - before[k]!) > 1e-6);
      if (first >= 0) expect(answer.cost[first]!).toBeGreaterThan(before[first]!);
    });
    // 92 in by 24 courses takes joints of 1/3 in, 1/6 from nominal; by 22, 0.682 in, 0.182 from it.
    expect(coursing.others[0]!.intervals[0]!.joint).toBeCloseTo(16_256 / 3, 6);
  });

  it('offers even joints past a height that cannot be met anyway', () => {
    // No course line reaches 9 3/4 in; the best bends the joints to 8 1/8, the other lets it go.
    const coursing = plan({ ...walls, controlHeights: [control(9.75)], bondBeams: [beam(96)] });
    expect(coursing.answer.controls[0]).toMatchObject({ got: inches(8.125), miss: inches(-1.625), met: false });
    const passing = coursing.others.find((other) => other.intervals.length === 1);
    expect(passing?.intervals[0]!.joint).toBe(inches(0.5));
    expect(passing?.controls[0]).toMatchObject({
      wanted: inches(9.75),
      got: inches(8),
      miss: inches(-1.75),
      met: false,
    });
    // 1 3/4 in at weight 1, tenfold because the tolerance is nothing.
    expect(passing?.cost).toEqual([0, 0, 17.5 * 16_256, 0, 0, 0]);
  });

  it('warns of a lift taller than ten times its thinnest wall, to the underside of the beam', () => {
    expect(codes(plan({ ...walls, bondBeams: [beam(100)] }))).toEqual([]);
    const tall = plan({ ...walls, bondBeams: [beam(104)] });
    expect(tall.reasons).toEqual([
      {
        code: 'liftTooTall',
        weight: 'warning',
        thing: { kind: 'lift', id: '1' },
        against: [{ kind: 'bondBeam', id: 'b1' }],
        rule: 'liftToThickness',
        amount: inches(4),
        nearest: { below: inches(100), above: null },
      },
    ]);
    expect(codes(plan({ ...walls, bondBeams: [beam(104)], ruleValues: { liftToThickness: 12 } }))).toEqual([]);
    // At 9.95 times the thickness no beam may be set above 99 1/2 in: the course line below it is at 96.
    const [reason] = plan({ ...walls, bondBeams: [beam(104)], ruleValues: { liftToThickness: 9.95 } }).reasons;
    expect(reason?.nearest).toEqual({ below: inches(96), above: null });
  });

  it('goes up to 10 ft or 3 m where nothing drawn ends the wall, and says so', () => {
    const open = plan(walls);
    expect(open.top).toBe(feet(10));
    expect(codes(open)).toEqual(['noWallTop', 'liftTooTall']);
    const metric = plan({
      ...emptyDrawing(earthBlock({ unit: { length: mm(295), width: mm(240), height: mm(90) } })),
      units: 'metric',
    });
    expect(Math.abs(metric.top - mm(3000))).toBeLessThan(mm(60));
  });

  it('ends the last lift at a plate above the beam', () => {
    const coursing = plan({
      ...walls,
      bondBeams: [beam(96)],
      controlHeights: [control(152, { kind: 'plate', hold: 'hard' })],
    });
    expect(coursing.lifts.map((lift) => [lift.base, lift.top, lift.beam?.id ?? null])).toEqual([
      [0, inches(96), 'b1'],
      [inches(104), inches(152), null],
    ]);
    expect(coursing.top).toBe(inches(152));
    expect(codes(coursing)).toEqual([]);
  });

  it.each([
    [
      'a sill in the first course',
      withWindow(walls, 'r1', { at: 60, width: 36, sill: 2, head: 80 }),
      'heightBelowFirstCourse',
      2,
    ],
    ['a head inside the beam', withDoor(walls, 'r1', 60, 36, 99), 'heightInsideBeam', 3],
    ['a head above the wall', withDoor(walls, 'r1', 60, 36, 110), 'openingAboveWall', 6],
  ] as const)('refuses %s and says by how much', (_, drawing, code, amount) => {
    const coursing = plan({ ...drawing, bondBeams: [beam(96)] });
    const reason = coursing.reasons.find((one) => one.code === code);
    expect(reason?.thing).toEqual({ kind: 'opening', id: 'o1' });
    expect(reason?.amount).toBe(inches(amount));
    expect(coursing.courses).toHaveLength(24);
  });

  it('leaves out a beam that starts inside another', () => {
    const coursing = plan({ ...walls, bondBeams: [beam(96), beam(100, { id: 'b2' })] });
    expect(coursing.reasons).toEqual([
      {
        code: 'beamsOverlap',
        weight: 'blocked',
        thing: { kind: 'bondBeam', id: 'b2' },
        against: [{ kind: 'bondBeam', id: 'b1' }],
        amount: inches(4),
      },
    ]);
    expect(coursing.lifts).toHaveLength(1);
  });

  it('courses nothing beyond a thousand courses, and says so', () => {
    const thin = earthBlock({
      unit: { length: inches(14), width: inches(10), height: ticks(1) },
      bedJoint: { least: ticks(0), nominal: ticks(0), most: ticks(0) },
    });
    const coursing = plan({ ...rectangle(240, 120, thin), bondBeams: [beam(96)] });
    expect(codes(coursing)).toContain('noCoursesFit');
    expect(coursing.courses.length).toBeLessThanOrEqual(1001);
  });

  it('is the same whichever order openings and heights are drawn in', () => {
    const drawing = withWindow(withDoor(walls, 'r1', 60, 36, 81), 'r3', { at: 60, width: 36, sill: 37, head: 80.5 });
    const one = plan({ ...drawing, bondBeams: [beam(96)] });
    const other = plan({ ...drawing, openings: [...drawing.openings].reverse(), bondBeams: [beam(96)] });
    expect(other.courses).toEqual(one.courses);
    expect(other.answer.cost).toEqual(one.answer.cost);
  });

  describe('with a thinner course allowed', () => {
    const ripped = earthBlock({ thinCourse: { least: inches(1.5), most: inches(3) } });
    const split = earthBlock({ thinCourse: { least: inches(1.625), most: inches(1.625) } });

    it('rips one course to meet a height between two course lines, and keeps the joints nominal', () => {
      // Two courses reach 8 in; a third of 2 1/2 in on a joint of 1/2 reaches 11. Whole ones reach 8 1/8 or 11 5/8.
      const coursing = plan({
        ...rectangle(240, 120, ripped),
        controlHeights: [control(11, { hold: 'hard' })],
        bondBeams: [beam(95)],
      });
      expect(coursing.answer.cost).toEqual([0, 0, 0, 1, 0, 0]);
      expect(coursing.answer.intervals[0]).toMatchObject({ count: 2, joint: inches(0.5), thin: inches(2.5) });
      expect(coursing.courses.slice(1, 4).map(({ bottom, top, joint }) => [bottom, top, joint])).toEqual([
        [inches(4.5), inches(8), inches(0.5)],
        [inches(8.5), inches(11), inches(0.5)],
        [inches(11.5), inches(15), inches(0.5)],
      ]);
      expect(coursing.courses[coursing.courses.length - 1]!.top).toBe(inches(95));
      expect(coursing.proof).toBe('all');
    });

    it('rips nothing where whole courses meet the heights as nearly, whatever their joints', () => {
      const coursing = plan({ ...rectangle(240, 120, ripped), bondBeams: [beam(98)] });
      expect(coursing.answer.cost[3]).toBe(0);
      expect(coursing.answer.cost[4]).toBeGreaterThan(0);
      // The next answer spends a thinner course on joints nearer the nominal.
      expect(coursing.others.some((other) => other.cost[3] === 1 && other.cost[4] < 1)).toBe(true);
    });

    it('lays a split unit at its one height', () => {
      // 4 in, two whole courses of 4 and a split one of 1 5/8 + 3/8: 13 3/4 takes joints of 7/16 in three places.
      const coursing = plan({
        ...rectangle(240, 120, split),
        controlHeights: [control(13.9375, { hold: 'hard' })],
        bondBeams: [beam(95.9375)],
      });
      const [first] = coursing.answer.intervals;
      expect(coursing.answer.cost.slice(0, 4)).toEqual([0, 0, 0, 1]);
      expect(first).toMatchObject({ count: 3, thin: inches(1.625) });
      expect(first!.joint).toBeCloseTo(inches(9.9375 - 7 - 1.625) / 3, 6);
    });

    it('is not used by a drawing that does not allow it', () => {
      const coursing = plan({ ...walls, controlHeights: [control(11, { hold: 'hard' })], bondBeams: [beam(96)] });
      expect(coursing.answer.cost[0]).toBe(1);
      expect(coursing.answer.cost[3]).toBe(0);
    });
  });

  it('starts on a first course of another height where there is one', () => {
    const type = earthBlock({ firstCourse: { height: inches(5.5) } });
    const coursing = plan({ ...rectangle(240, 120, type), bondBeams: [beam(98)] });
    expect(coursing.courses[0]).toEqual({
      number: 1,
      lift: 1,
      bottom: inches(0.5),
      top: inches(6),
      joint: inches(0.5),
    });
    expect(coursing.courses[1]).toMatchObject({ bottom: inches(6.5), top: inches(10) });
    expect(coursing.answer.cost).toEqual([0, 0, 0, 0, 0, 0]);
    expect(coursing.courses).toHaveLength(24);
  });
});
