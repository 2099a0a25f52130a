/** Names of every rule that guards safety, a code limit or a tolerance; `registry.ts` holds their values and sources. */
export const RULE_IDS = [
  'liftToThickness',
  'lateralSupportMost',
  'leastLapPart',
  'lineMost',
  'lineSagMost',
  'braceAngleLeast',
  'braceAngleMost',
  'accessZoneExtra',
  'bracedOverHeight',
  'powerLineDistance',
  'levelTolerance',
  'levelToleranceMost',
  'plumbTolerance',
  'plumbToleranceMost',
  'bedJointTolerance',
  'firstBedJointLeast',
  'firstBedJointMost',
  'lintelBearingLeast',
] as const;

export type RuleId = (typeof RULE_IDS)[number];
