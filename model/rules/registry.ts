/** Every rule with its value, its unit and where it comes from. A site may change the value; the source stays in view. */
import type { Drawing } from '../drawing/schema';
import { feet, inches, mm } from '../length/ticks';
import type { RuleId } from './ids';

/** `ticks` for lengths; `ratio` of one length to another; `degrees`; a plain `number`. */
export type RuleUnit = 'ticks' | 'ratio' | 'degrees' | 'number';

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
    source: 'New Mexico Earthen Building Materials Code (2021), NMAC 14.7.4.23 A',
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
    source: 'Minke, Building with Earth, p. 140 (earthquake guidance)',
    standing: 'guidance',
  },
};

/** The value in force on this drawing: the site's own where it has changed the rule. */
export function ruleValue(drawing: Pick<Drawing, 'ruleValues'>, id: RuleId): number {
  return drawing.ruleValues[id] ?? RULES[id].value;
}

/** Whether the site has its own value for this rule. */
export function ruleChanged(drawing: Pick<Drawing, 'ruleValues'>, id: RuleId): boolean {
  return ruleValue(drawing, id) !== RULES[id].value;
}
