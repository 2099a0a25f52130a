/** The numbers of the rules against the publications they are taken from. */
import { describe, expect, it } from 'vitest';
import { checkJoints } from '../../../model/asLaid/checkJoints';
import { levelAllowed, plumbAllowed } from '../../../model/asLaid/tolerances';
import { planCourses } from '../../../model/coursing/planCourses';
import type { Drawing } from '../../../model/drawing/schema';
import { EMPTY_SURVEY } from '../../../model/drawing/surveySchema';
import { feet, inches, mm, ticks } from '../../../model/length/ticks';
import type { RuleId } from '../../../model/rules/ids';
import { RULES } from '../../../model/rules/registry';
import { levelGround } from '../../../model/survey/levelGround';
import { layOutWalls } from '../../../model/walls/layOutWalls';
import { earthBlock, rectangle } from '../../helpers/drawings';

const TMS = 'TMS 602, as explained by the Mason Contractors Association (secondary)';

describe('rules', () => {
  it.each<[RuleId, number, string]>([
    // TMS 602, as explained by the Mason Contractors Association (secondary).
    ['firstBedJointLeast', inches(1 / 4), TMS],
    ['firstBedJointMost', inches(3 / 4), TMS],
    ['bedJointTolerance', inches(1 / 8), TMS],
    ['levelTolerance', inches(1 / 4), TMS],
    ['levelToleranceMost', inches(1 / 2), TMS],
    ['plumbTolerance', inches(1 / 4), TMS],
    ['plumbToleranceMost', inches(1 / 2), TMS],
    ['firstBedJointMostGrouted', inches(1.25), TMS],
    ['plumbToleranceTwenty', inches(3 / 8), TMS],
    // LABC Warranty Technical Manual v8, ch. 1.
    ['shortLevelMost', mm(10), 'LABC Warranty Technical Manual v8, ch. 1'],
    ['longLevelMost', mm(15), 'LABC Warranty Technical Manual v8, ch. 1'],
    ['jointFromMeanMost', mm(5), 'LABC Warranty Technical Manual v8, ch. 1'],
    // New Mexico Earthen Building Materials Code, 2021.
    ['lateralSupportMost', feet(24), 'NMAC 14.7.4.23 A'],
    ['leastLapPart', 0.25, 'NMAC 14.7.4.11 E'],
    // Minke, Building with Earth, p. 140.
    ['lintelBearingLeast', mm(400), 'Minke, Building with Earth, p. 140'],
    // 29 CFR 1926 (secondary).
    ['accessZoneExtra', feet(4), '29 CFR 1926.706(a) (secondary)'],
    ['bracedOverHeight', feet(8), '29 CFR 1926.706(b) (secondary)'],
    ['powerLineDistance', feet(10), '29 CFR 1926.1408 Table A'],
    // Common practice, no source; the same ratio for adobe in two Arizona codes.
    ['liftToThickness', 10, 'Yuma City Code §150-032 A(1)'],
  ])('%s is as published', (id, value, source) => {
    expect(RULES[id].value).toBe(value);
    expect(RULES[id].source).toContain(source);
  });
});

describe('height between bond beams', () => {
  const withBeam = (width: number, soffit: number): Drawing => ({
    ...rectangle(240, 120, earthBlock({ unit: { length: inches(14), width: inches(width), height: inches(3.5) } })),
    bondBeams: [
      {
        id: 'b1',
        name: 'Bond beam',
        soffit: inches(soffit),
        depth: inches(6),
        tolerance: ticks(0),
        hold: 'hard',
        bars: { count: 0, diameter: ticks(0), lap: ticks(0) },
      },
    ],
  });
  const tooTall = (drawing: Drawing): boolean => {
    const walls = layOutWalls(drawing);
    const coursing = planCourses(drawing, walls, levelGround(drawing, walls, EMPTY_SURVEY));
    return coursing.reasons.some((reason) => reason.code === 'liftTooTall');
  };

  // Common practice, no source (10 × thickness); measured to the underside of the beam: NMAC 14.7.4.23 A.
  it.each([
    [10, 100],
    [14, 140],
  ])('is at most %i × 10 = %i in', (width, height) => {
    expect(tooTall(withBeam(width, height))).toBe(false);
    expect(tooTall(withBeam(width, height + 1 / 16))).toBe(true);
  });
});

describe('tolerances of laid work', () => {
  const rules = { ruleValues: {} };

  // TMS 602, as explained by the Mason Contractors Association (secondary): 1/4 in in 10 ft, 1/2 in at most.
  it.each([
    [5, 1 / 4],
    [10, 1 / 4],
    [15, 3 / 8],
    [20, 1 / 2],
    [100, 1 / 2],
  ])('level over %i ft is held to %f in', (length, most) => {
    expect(levelAllowed(rules, feet(length)).most).toBe(inches(most));
  });

  // The same: plumb 1/4 in in 10 ft, 3/8 in in 20 ft, 1/2 in at most.
  it.each([
    [10, 1 / 4],
    [20, 3 / 8],
    [21, 1 / 2],
  ])('plumb over %i ft is held to %f in', (height, most) => {
    expect(plumbAllowed(rules, feet(height)).most).toBe(inches(most));
  });

  // LABC Warranty Technical Manual v8, ch. 1: bed joints level to 10 mm up to 5 m, 15 mm above.
  it('level by the UK manual is 10 mm up to 5 m and 15 mm above', () => {
    expect(levelAllowed(rules, mm(5000), 'labc').most).toBe(mm(10));
    expect(levelAllowed(rules, mm(5001), 'labc').most).toBe(mm(15));
  });

  // The same: each joint within 5 mm of the mean of any 8.
  it('joints by the UK manual lie within 5 mm of the mean of any eight in a row', () => {
    const laid = (thick: number, joints = 8) =>
      Array.from({ length: joints }, (_, i) => ({
        id: `j${i + 1}`,
        runId: 'r1',
        at: ticks(0),
        course: i + 1,
        thickness: mm(i === 3 ? thick : 10),
      }));
    const worst = (thick: number, joints?: number) =>
      checkJoints(rectangle(240, 120), laid(thick, joints), new Map(), 'labc').find(
        ({ readingIds: [id] }) => id === 'j4',
      );
    // One of eight thicker by d is off their mean by 7 d / 8: 5 mm at 5 5/7.
    expect(worst(15.7)!.over).toBe(0);
    expect(worst(15.75)!.over).toBeGreaterThan(0);
    expect(worst(18)!.off).toBe(mm(7));
    // Eight joints with a course left out between them are not in a row.
    const gap = laid(18).map((one) => (one.course > 5 ? { ...one, course: one.course + 1 } : one));
    expect(checkJoints(rectangle(240, 120), gap, new Map(), 'labc')).toEqual([]);
    // Seven joints have no eight to be held to.
    expect(worst(18, 7)).toBeUndefined();
  });
});
