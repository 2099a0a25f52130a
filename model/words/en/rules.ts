/** Each rule's name and what it guards; its number and source come from the registry. */
export const rules = {
  liftToThickness: {
    name: 'Height between bond beams',
    guards: 'How many times its thickness a wall may rise before a bond beam ties it.',
  },
  lateralSupportMost: {
    name: 'Distance between lateral supports',
    guards: 'How far a wall may run between the crossing walls that hold it upright.',
  },
  leastLapPart: {
    name: 'Least lap',
    guards: 'How much of its length each unit laps the one below, so that no crack finds a straight way up.',
  },
  lineMost: {
    name: 'Longest line without a trig',
    guards: 'How long a line may be before something must hold it up between the poles.',
  },
  lineSagMost: {
    name: 'Most sag of a line',
    guards: 'How far a line may hang below its marks, and the course with it.',
  },
  braceAngleLeast: {
    name: 'Least angle between two braces',
    guards: 'That two braces pull in ways different enough to plumb the pole both ways.',
  },
  braceAngleMost: {
    name: 'Most angle between two braces',
    guards: 'That two braces do not pull against each other in one line.',
  },
  accessZoneExtra: {
    name: 'Limited-access zone beside a wall',
    guards: 'How much wider than the wall is high to keep people away from the side without a scaffold.',
  },
  bracedOverHeight: {
    name: 'Height over which a wall is braced',
    guards: 'Over this height a wall is braced until its permanent supports are in place.',
  },
  powerLineDistance: {
    name: 'Distance from power lines',
    guards: 'How far steel poles stay from a power line while they are carried, stood and braced.',
  },
  levelTolerance: {
    name: 'Level, in 10 ft',
    guards: 'How far a course may be out of level in 10 ft.',
  },
  levelToleranceMost: {
    name: 'Level, at most',
    guards: 'How far a course may be out of level over any length.',
  },
  plumbTolerance: {
    name: 'Plumb, in 10 ft',
    guards: 'How far a wall may lean in 10 ft.',
  },
  plumbToleranceMost: {
    name: 'Plumb, at most',
    guards: 'How far a wall may lean over any height.',
  },
  bedJointTolerance: {
    name: 'Bed joint, either way',
    guards: 'How far a bed joint may be from the joint that was planned.',
  },
  firstBedJointLeast: {
    name: 'First bed joint, least',
    guards: 'The thinnest bedding under the first course.',
  },
  firstBedJointMost: {
    name: 'First bed joint, most',
    guards: 'The thickest bedding under the first course.',
  },
  lintelBearingLeast: {
    name: 'Least lintel bearing',
    guards: 'How far a lintel rests on the masonry at each side.',
  },
  standing: {
    code: 'Code',
    guidance: 'Guidance',
    commonPractice: 'Common practice',
  },
  changed: 'Changed for this site',
  caution: 'Local codes and a licensed designer or engineer decide. This checks arithmetic, not structure.',
} as const;
