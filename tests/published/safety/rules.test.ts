/** Numbers that guard people, against the regulations that they are taken from. */
import { describe, expect, it } from 'vitest';
import { feet, inches, ticks } from '../../../model/length/ticks';
import { RULES } from '../../../model/rules/registry';
import { accessZoneWidth, wantsBracing } from '../../../model/rules/safety';

const untouched = { ruleValues: {} };

describe('the limited-access zone', () => {
  // 29 CFR 1926.706(a) (secondary): the height to be built and 4 ft more.
  it.each([
    [8, 12],
    [12, 16],
  ])('of a wall of %i ft is %i ft wide', (height, width) => {
    expect(accessZoneWidth(untouched, feet(height))).toBe(feet(width));
  });

  it('follows the site’s own number', () => {
    expect(accessZoneWidth({ ruleValues: { accessZoneExtra: feet(6) } }, feet(8))).toBe(feet(14));
  });
});

describe('bracing', () => {
  // 29 CFR 1926.706(b) (secondary): walls over 8 ft; exactly 8 ft is not over.
  it('is wanted over 8 ft and not at 8 ft', () => {
    expect(wantsBracing(untouched, feet(8))).toBe(false);
    expect(wantsBracing(untouched, ticks(feet(8) + 1))).toBe(true);
    expect(wantsBracing({ ruleValues: { bracedOverHeight: feet(6) } }, feet(6, 1))).toBe(true);
  });
});

describe('other numbers', () => {
  // 29 CFR 1926.1408 Table A (secondary): power lines up to 50 kV.
  it('keep 10 ft from power lines', () => {
    expect(RULES.powerLineDistance.value).toBe(feet(10));
    expect(RULES.powerLineDistance.source).toContain('1926.1408 Table A');
    expect(RULES.powerLineDistance.source).toContain('secondary');
  });

  // 29 CFR 1926.1153: respirable silica, action level 25 and limit 50 µg/m³ over 8 h.
  it('hold silica dust at 25 to act and 50 at most', () => {
    expect([RULES.silicaActionLevel.value, RULES.silicaLimit.value]).toEqual([25, 50]);
    expect(RULES.silicaLimit.unit).toBe('microgramsPerCubicMetre');
    expect(RULES.silicaLimit.source).toContain('29 CFR 1926.1153');
  });

  // Minke, Building with Earth, p. 140; NMAC 14.7.4.23 A; New Mexico practice (secondary); Practical Action, "Mud as a mortar", p. 4-5.
  it('are as published for earth walls', () => {
    expect(RULES.openingWidthMost.value).toBe(1200 * 640);
    expect(RULES.pierWidthLeast.value).toBe(1000 * 640);
    expect([RULES.openingPartMost.value, RULES.pierPartLeast.value]).toEqual([1 / 3, 1 / 3]);
    expect([RULES.storeysMost.value, RULES.twoStoreyThicknessBelow.value, RULES.twoStoreyThicknessAbove.value]).toEqual(
      [2, inches(14), inches(10)],
    );
    expect([RULES.beamDepthLeast.value, RULES.beamWidthLeast.value]).toEqual([inches(6), inches(10)]);
    expect(RULES.earthJointLeast.value).toBe(10 * 640);
    expect(RULES.grainToJointMost.value).toBe(1 / 3);
  });
});
