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
  levelMisclosure: {
    name: 'Misclosure of the levels',
    guards: 'How far a round of levels may miss the height it comes back to, for each root of a kilometre levelled.',
  },
  collimationMost: {
    name: 'Collimation of the level',
    guards: 'How far the line of sight may be off level, for its length, before the level is adjusted.',
  },
  rereadingMost: {
    name: 'Two readings of one station',
    guards: 'How far two readings of one station may differ before both are doubted.',
  },
  plumbToleranceTwenty: {
    name: 'Plumb, in 20 ft',
    guards: 'How far a wall may lean in 20 ft.',
  },
  firstBedJointMostGrouted: {
    name: 'First bed joint, most, where the first course is fully grouted',
    guards: 'The thickest bedding under a first course that is fully grouted on a concrete foundation.',
  },
  shortLevelMost: {
    name: 'Level, up to 5 m',
    guards: 'How far a bed joint may be out of level over 5 m or less.',
  },
  longLevelMost: {
    name: 'Level, over 5 m',
    guards: 'How far a bed joint may be out of level over more than 5 m.',
  },
  jointFromMeanMost: {
    name: 'Bed joint, from the mean of eight',
    guards: 'How far a bed joint may be from the mean of any eight in a row.',
  },
  squareMost: {
    name: 'Out of square',
    guards: 'How far a measured side or diagonal may be from the drawing before corners are moved.',
  },
  openingWidthMost: {
    name: 'Widest opening',
    guards: 'How wide an opening may be in an earth wall where the ground shakes.',
  },
  openingPartMost: {
    name: 'Opening as a part of its wall',
    guards: 'How much of a wall’s length an opening may take where the ground shakes.',
  },
  pierWidthLeast: {
    name: 'Least pier',
    guards: 'How wide the masonry beside an opening is at least where the ground shakes.',
  },
  pierPartLeast: {
    name: 'Least pier for its height',
    guards: 'How wide a pier is at least for its height where the ground shakes.',
  },
  storeysMost: {
    name: 'Most storeys',
    guards: 'How many storeys earth walls may carry.',
  },
  twoStoreyThicknessBelow: {
    name: 'Lower wall of two storeys',
    guards: 'How thick the lower wall of two storeys is at least.',
  },
  twoStoreyThicknessAbove: {
    name: 'Upper wall of two storeys',
    guards: 'How thick the upper wall of two storeys is at least.',
  },
  beamDepthLeast: {
    name: 'Least depth of a bond beam',
    guards: 'How deep a bond beam on an earth wall is at least.',
  },
  beamWidthLeast: {
    name: 'Least width of a bond beam',
    guards: 'How wide a bond beam on an earth wall is at least.',
  },
  earthJointLeast: {
    name: 'Least joint in earth mortar',
    guards: 'How thick a joint of stabilised earth mortar is at least.',
  },
  grainToJointMost: {
    name: 'Largest grain for the joint',
    guards: 'How large the mortar’s grains may be for the joint they lie in.',
  },
  silicaActionLevel: {
    name: 'Silica dust, action level',
    guards: 'The dust in the air, in micrograms to the cubic metre, from which exposure is assessed.',
  },
  silicaLimit: {
    name: 'Silica dust, limit',
    guards: 'The dust in the air, in micrograms to the cubic metre, that no one may breathe over 8 hours.',
  },
  standing: {
    code: 'Code',
    guidance: 'Guidance',
    commonPractice: 'Common practice',
  },
  changed: 'Changed for this site',
  caution: 'Local codes and a licensed designer or engineer decide. This checks arithmetic, not structure.',
} as const;
