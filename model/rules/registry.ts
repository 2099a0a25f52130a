/** Every rule with its value, its unit and where it comes from. A site may change the value; the source stays in view. */
import type { Drawing } from '../drawing/schema';
import { feet, inches, mm } from '../length/ticks';
import type { RuleId } from './ids';

/**
 * `ticks` for lengths; `ratio` of one length to another; `degrees`; a plain `number`; `mmPerRootKm` for the misclosure
 * of levels, millimetres × √(kilometres levelled); `microgramsPerCubicMetre` of air.
 */
export type RuleUnit = 'ticks' | 'ratio' | 'degrees' | 'number' | 'mmPerRootKm' | 'microgramsPerCubicMetre';

/** `code`: a clause read in the code itself. `guidance`: published advice, or a code known only at second hand. */
export type RuleStanding = 'code' | 'guidance' | 'commonPractice';

export interface Rule {
  readonly id: RuleId;
  /** The value in force unless the site has its own, in the rule's unit. */
  readonly value: number;
  readonly unit: RuleUnit;
  /** Publication and clause; says `(secondary)` where the clause itself was not read. */
  readonly source: string;
  readonly standing: RuleStanding;
}

const TMS = 'TMS 602, as explained by the Mason Contractors Association (secondary)';
const PRACTICE = 'common practice, no source';
const LABC = 'LABC Warranty Technical Manual v8, ch. 1 (UK)';
const MINKE = 'Minke, Building with Earth, p. 140 (earthquake guidance)';
const NMAC_23 = 'New Mexico Earthen Building Materials Code (2021), NMAC 14.7.4.23 A';
const BEAM = 'New Mexico practice for earth walls (secondary)';
const MUD = 'Practical Action, "Mud as a mortar", p. 4-5';
const SILICA = '29 CFR 1926.1153, over 8 hours';

export const RULES: Readonly<Record<RuleId, Rule>> = {
  liftToThickness: {
    id: 'liftToThickness',
    value: 10,
    unit: 'ratio',
    source:
      'common practice, no source; the same ratio for adobe in Yuma City Code §150-032 A(1) and Apache Junction AZ Ord. 341 (UBC 1982 §2405(b))',
    standing: 'commonPractice',
  },
  lateralSupportMost: {
    id: 'lateralSupportMost',
    value: feet(24),
    unit: 'ticks',
    source: NMAC_23,
    standing: 'code',
  },
  leastLapPart: {
    id: 'leastLapPart',
    value: 0.25,
    unit: 'ratio',
    source: 'New Mexico Earthen Building Materials Code (2021), NMAC 14.7.4.11 E',
    standing: 'code',
  },
  lineMost: {
    id: 'lineMost',
    value: feet(40),
    unit: 'ticks',
    source: 'Masonry Construction magazine, "Building walls straight": trigs on walls of 40 ft and more',
    standing: 'guidance',
  },
  lineSagMost: {
    id: 'lineSagMost',
    value: inches(1 / 16),
    unit: 'ticks',
    source: PRACTICE,
    standing: 'commonPractice',
  },
  braceAngleLeast: { id: 'braceAngleLeast', value: 60, unit: 'degrees', source: PRACTICE, standing: 'commonPractice' },
  braceAngleMost: { id: 'braceAngleMost', value: 120, unit: 'degrees', source: PRACTICE, standing: 'commonPractice' },
  accessZoneExtra: {
    id: 'accessZoneExtra',
    value: feet(4),
    unit: 'ticks',
    source: '29 CFR 1926.706(a) (secondary)',
    standing: 'guidance',
  },
  bracedOverHeight: {
    id: 'bracedOverHeight',
    value: feet(8),
    unit: 'ticks',
    source: '29 CFR 1926.706(b) (secondary)',
    standing: 'guidance',
  },
  powerLineDistance: {
    id: 'powerLineDistance',
    value: feet(10),
    unit: 'ticks',
    source: '29 CFR 1926.1408 Table A, lines up to 50 kV (secondary)',
    standing: 'guidance',
  },
  levelTolerance: { id: 'levelTolerance', value: inches(1 / 4), unit: 'ticks', source: TMS, standing: 'guidance' },
  levelToleranceMost: {
    id: 'levelToleranceMost',
    value: inches(1 / 2),
    unit: 'ticks',
    source: TMS,
    standing: 'guidance',
  },
  plumbTolerance: { id: 'plumbTolerance', value: inches(1 / 4), unit: 'ticks', source: TMS, standing: 'guidance' },
  plumbToleranceMost: {
    id: 'plumbToleranceMost',
    value: inches(1 / 2),
    unit: 'ticks',
    source: TMS,
    standing: 'guidance',
  },
  bedJointTolerance: {
    id: 'bedJointTolerance',
    value: inches(1 / 8),
    unit: 'ticks',
    source: TMS,
    standing: 'guidance',
  },
  firstBedJointLeast: {
    id: 'firstBedJointLeast',
    value: inches(1 / 4),
    unit: 'ticks',
    source: TMS,
    standing: 'guidance',
  },
  firstBedJointMost: {
    id: 'firstBedJointMost',
    value: inches(3 / 4),
    unit: 'ticks',
    source: TMS,
    standing: 'guidance',
  },
  lintelBearingLeast: {
    id: 'lintelBearingLeast',
    value: mm(400),
    unit: 'ticks',
    source: MINKE,
    standing: 'guidance',
  },
  levelMisclosure: {
    id: 'levelMisclosure',
    value: 12,
    unit: 'mmPerRootKm',
    source: 'NOAA/FGCS third order: 12 mm √K, K in kilometres (secondary)',
    standing: 'guidance',
  },
  collimationMost: {
    id: 'collimationMost',
    value: 0.0001,
    unit: 'ratio',
    source: `${PRACTICE}: 1 mm in 10 m`,
    standing: 'commonPractice',
  },
  rereadingMost: {
    id: 'rereadingMost',
    value: inches(1 / 8),
    unit: 'ticks',
    source: PRACTICE,
    standing: 'commonPractice',
  },
  plumbToleranceTwenty: {
    id: 'plumbToleranceTwenty',
    value: inches(3 / 8),
    unit: 'ticks',
    source: TMS,
    standing: 'guidance',
  },
  firstBedJointMostGrouted: {
    id: 'firstBedJointMostGrouted',
    value: inches(5 / 4),
    unit: 'ticks',
    source: TMS,
    standing: 'guidance',
  },
  shortLevelMost: { id: 'shortLevelMost', value: mm(10), unit: 'ticks', source: LABC, standing: 'guidance' },
  longLevelMost: { id: 'longLevelMost', value: mm(15), unit: 'ticks', source: LABC, standing: 'guidance' },
  jointFromMeanMost: { id: 'jointFromMeanMost', value: mm(5), unit: 'ticks', source: LABC, standing: 'guidance' },
  squareMost: { id: 'squareMost', value: inches(1 / 4), unit: 'ticks', source: PRACTICE, standing: 'commonPractice' },
  openingWidthMost: { id: 'openingWidthMost', value: mm(1200), unit: 'ticks', source: MINKE, standing: 'guidance' },
  openingPartMost: { id: 'openingPartMost', value: 1 / 3, unit: 'ratio', source: MINKE, standing: 'guidance' },
  pierWidthLeast: { id: 'pierWidthLeast', value: mm(1000), unit: 'ticks', source: MINKE, standing: 'guidance' },
  pierPartLeast: { id: 'pierPartLeast', value: 1 / 3, unit: 'ratio', source: MINKE, standing: 'guidance' },
  storeysMost: { id: 'storeysMost', value: 2, unit: 'number', source: NMAC_23, standing: 'code' },
  twoStoreyThicknessBelow: {
    id: 'twoStoreyThicknessBelow',
    value: inches(14),
    unit: 'ticks',
    source: NMAC_23,
    standing: 'code',
  },
  twoStoreyThicknessAbove: {
    id: 'twoStoreyThicknessAbove',
    value: inches(10),
    unit: 'ticks',
    source: NMAC_23,
    standing: 'code',
  },
  beamDepthLeast: { id: 'beamDepthLeast', value: inches(6), unit: 'ticks', source: BEAM, standing: 'guidance' },
  beamWidthLeast: { id: 'beamWidthLeast', value: inches(10), unit: 'ticks', source: BEAM, standing: 'guidance' },
  earthJointLeast: { id: 'earthJointLeast', value: mm(10), unit: 'ticks', source: MUD, standing: 'guidance' },
  grainToJointMost: { id: 'grainToJointMost', value: 1 / 3, unit: 'ratio', source: MUD, standing: 'guidance' },
  silicaActionLevel: {
    id: 'silicaActionLevel',
    value: 25,
    unit: 'microgramsPerCubicMetre',
    source: SILICA,
    standing: 'guidance',
  },
  silicaLimit: { id: 'silicaLimit', value: 50, unit: 'microgramsPerCubicMetre', source: SILICA, standing: 'guidance' },
};

/** The value in force on this drawing: the site's own where it has changed the rule. */
export function ruleValue(drawing: Pick<Drawing, 'ruleValues'>, id: RuleId): number {
  return drawing.ruleValues[id] ?? RULES[id].value;
}

/** Whether the site has its own value for this rule. */
export function ruleChanged(drawing: Pick<Drawing, 'ruleValues'>, id: RuleId): boolean {
  return ruleValue(drawing, id) !== RULES[id].value;
}

/** A rule as it stands on a drawing. */
export interface RuleInForce extends Rule {
  /** The number that is checked against: the site's own where it has one. */
  readonly inForce: number;
  /** The site's own value; null where it takes the registry's. */
  readonly own: number | null;
}

/** Every rule with its value, unit, source and standing, and the site's own value where it has set one. */
export function rulesInForce(drawing: Pick<Drawing, 'ruleValues'>): readonly RuleInForce[] {
  return Object.values(RULES).map((rule) => {
    const own = drawing.ruleValues[rule.id] ?? null;
    return { ...rule, own, inForce: own ?? rule.value };
  });
}
