/** The numbers of the rules against the publications they are taken from. */
import { describe, expect, it } from 'vitest';
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
