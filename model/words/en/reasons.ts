/** Names of things, and why something does not fit: the thing, the rule, the amount, and what would free it. */
export const reasons = {
  /** As a heading or at the start of a line. */
  title: {
    corner: 'Corner {{letter}}',
    run: 'Wall {{run}}',
    door: 'Door in {{run}}',
    doorNumber: 'Door {{number}} in {{run}}',
    window: 'Window in {{run}}',
    windowNumber: 'Window {{number}} in {{run}}',
    passage: 'Passage in {{run}}',
    passageNumber: 'Passage {{number}} in {{run}}',
    opening: 'Opening',
    keepClear: 'Keep-clear {{name}}',
    boundary: 'Site boundary',
    controlHeight: '{{name}}',
    controlSill: 'Sill height',
    controlHead: 'Head height',
    controlPlate: 'Plate height',
    controlNamed: 'Height to meet',
    bondBeam: '{{name}}',
    bondBeamPlain: 'Bond beam',
    pole: 'Pole {{letter}}',
    poleSecond: 'Second pole at {{letter}}',
    poleAlong: 'Pole in {{run}}',
    brace: 'Brace {{number}} of pole {{letter}}',
    braceSecond: 'Brace {{number}} of the second pole at {{letter}}',
    braceAlong: 'Brace {{number}} of the pole in {{run}}',
    station: 'Reading',
    stationCorner: 'Reading at {{letter}}',
    stationRun: 'Reading in {{run}}',
    lift: 'Lift {{number}}',
    course: 'Course {{number}}',
    wallType: '{{name}}',
    wallTypePlain: 'Wall type',
    site: 'The site',
    gone: 'Something no longer drawn',
  },
  /** Within a sentence. */
  running: {
    corner: 'corner {{letter}}',
    run: 'wall {{run}}',
    door: 'the door in {{run}}',
    doorNumber: 'door {{number}} in {{run}}',
    window: 'the window in {{run}}',
    windowNumber: 'window {{number}} in {{run}}',
    passage: 'the passage in {{run}}',
    passageNumber: 'passage {{number}} in {{run}}',
    opening: 'the opening',
    keepClear: 'keep-clear {{name}}',
    boundary: 'the site boundary',
    controlHeight: '{{name}}',
    controlSill: 'the sill height',
    controlHead: 'the head height',
    controlPlate: 'the plate height',
    controlNamed: 'the height to meet',
    bondBeam: '{{name}}',
    bondBeamPlain: 'the bond beam',
    pole: 'pole {{letter}}',
    poleSecond: 'the second pole at {{letter}}',
    poleAlong: 'the pole in {{run}}',
    brace: 'brace {{number}} of pole {{letter}}',
    braceSecond: 'brace {{number}} of the second pole at {{letter}}',
    braceAlong: 'brace {{number}} of the pole in {{run}}',
    station: 'the reading',
    stationCorner: 'the reading at {{letter}}',
    stationRun: 'the reading in {{run}}',
    lift: 'lift {{number}}',
    course: 'course {{number}}',
    wallType: '{{name}}',
    wallTypePlain: 'the wall type',
    site: 'the site',
    gone: 'something no longer drawn',
  },
  and: '{{list}} and {{last}}',
  comma: '{{list}}, {{last}}',
  sentences: '{{first}} {{second}}',

  runHasNoLength: { plain: '{{thing}} has no length: its two corners are in one place.' },
  runsCross: {
    plain: '{{thing}} crosses another wall.',
    full: '{{thing}} crosses {{against}} where there is no corner.',
  },
  runsOverlap: {
    plain: '{{thing}} lies over another wall.',
    full: '{{thing}} lies over {{against}}.',
  },
  cornersCoincide: {
    plain: '{{thing}} is in the same place as another corner.',
    full: '{{thing}} is in the same place as {{against}}.',
  },
  tooManyRunsMeet: {
    plain: 'Too many walls meet at {{running}}.',
    full: 'Too many walls meet at {{running}} to be bonded: {{against}}.',
  },
  cornerTooSharp: {
    plain: '{{thing}} is too sharp to be bonded.',
    full: '{{thing}}, between {{against}}, is too sharp to be bonded.',
  },
  runTooShortForCorner: {
    plain: '{{thing}} is too short for its corners.',
    full: '{{thing}} is {{amount}} too short for its corners.',
  },
  unitHeightsDiffer: {
    plain: 'The units of {{running}} are of another height: courses can’t be level all the way round.',
    full: 'The units of {{running}} and {{against}} differ in height by {{amount}}: courses can’t be level all the way round.',
  },

  openingPastEnd: {
    plain: '{{thing}} runs past the end of its wall.',
    full: '{{thing}} runs {{amount}} past the end of {{against}}.',
  },
  openingsOverlap: {
    plain: '{{thing}} overlaps another opening.',
    full: '{{thing}} overlaps {{against}} by {{amount}}.',
  },
  openingUpsideDown: {
    plain: '{{thing}} has its sill at or above its head.',
    full: '{{thing}} has its sill {{amount}} above its head.',
  },
  openingAboveWall: {
    plain: '{{thing}} rises above the wall.',
    full: '{{thing}} rises {{amount}} above the top of the wall.',
  },
  lintelBearingPastEnd: {
    plain: 'The lintel of {{running}} has no masonry to bear on.',
    full: 'The lintel of {{running}} bears {{amount}} past the masonry of {{against}}.',
  },

  readingOffDrawing: { plain: '{{thing}} is at a place that is no longer on the drawing.' },
  surveyAssumed: { plain: 'No levels have been read: the foundation is taken as level.' },
  cornerNotRead: { plain: '{{thing}} has no reading: its height is taken from its neighbours.' },
  beddingOverMost: {
    plain: 'Bedding at {{running}} is thicker than its most.',
    full: 'Bedding at {{running}} is {{amount}} over its most: thicken it in layers, grind the high stretch, or start a levelling course.',
  },
  rereadingsDiffer: {
    plain: '{{thing}} was taken more than once, and the readings differ: the last one counts.',
    full: '{{thing}} was taken more than once, {{amount}} apart: the last one counts. Read it again.',
  },
  levelsNotClosed: {
    plain: 'The levels do not come back to a known height, so that nothing shows a misread rod.',
  },
  misclosureUnchecked: {
    plain: 'How far the levels may miss can’t be said without the length levelled.',
    full: 'The levels close with a miss of {{amount}}. Whether that is allowed can’t be said without the length levelled.',
  },
  misclosureOverMost: {
    plain: 'The levels miss the known height by more than the rule allows: level the round again.',
    full: 'The levels miss the known height by {{amount}} more than the rule allows: level the round again.',
  },
  collimationOverMost: {
    plain: 'The level is out of adjustment: keep backsights and foresights alike in length, or have it adjusted.',
    full: 'The level is out of adjustment by {{amount}} in 10 m more than the rule allows: keep backsights and foresights alike in length, or have it adjusted.',
  },

  heightBelowFirstCourse: {
    plain: '{{thing}} is below the top of the first course.',
    full: '{{thing}} is {{amount}} below the top of the first course.',
  },
  hardHeightNotMet: {
    plain: '{{thing}} can’t be met by whole courses.',
    full: '{{thing}} misses the course line by {{amount}}.',
  },
  softHeightMissed: {
    plain: '{{thing}} is off the course line.',
    full: '{{thing}} is {{amount}} off the course line.',
  },
  heightInsideBeam: {
    plain: '{{thing}} falls inside a bond beam.',
    full: '{{thing}} falls {{amount}} inside {{against}}.',
  },
  noCoursesFit: { plain: 'No number of courses meets the heights with joints inside their limits.' },
  liftTooTall: {
    plain: '{{thing}} is taller than the rule allows between bond beams.',
    full: '{{thing}} is {{amount}} taller than the rule allows between bond beams.',
  },
  beamsOverlap: {
    plain: '{{thing}} lies in the bond beam below it.',
    full: '{{thing}} lies {{amount}} into {{against}} below it.',
  },
  noWallTop: { plain: 'Nothing says how high the walls go: set a plate height or a last bond beam.' },

  straightJoint: { plain: '{{thing}} has a straight joint: head joints stand one above another.' },
  lapUnderLeast: {
    plain: '{{thing}} has units that lap less than the least.',
    full: '{{thing}} has a lap {{amount}} under the least.',
  },
  pieceUnderLeast: {
    plain: '{{thing}} needs a piece shorter than the least.',
    full: '{{thing}} needs a piece {{amount}} shorter than the least.',
  },
  runDoesNotBond: { plain: '{{thing}} can’t be bonded at this length.' },

  poleBlockedByFrame: {
    plain: '{{thing}} has no room beside the frame.',
    full: '{{thing}} stands {{amount}} too near {{against}}, and can’t be set off along the wall line.',
    line: 'The line of {{running}} is {{amount}} longer than the rule allows, and the frames leave no place for a pole between.',
  },
  poleBlocked: {
    plain: '{{thing}} has no free place to stand.',
    full: '{{thing}} would stand in {{against}}.',
  },
  braceBlocked: {
    plain: '{{thing}} can’t be braced both ways.',
    full: '{{thing}} can’t be braced both ways with {{against}} in the way.',
  },
  braceAngleOut: {
    plain: '{{thing}} has two braces that pull too nearly the same way.',
    full: '{{thing}} has two braces that pull too nearly the same way, because of {{against}}.',
  },
  braceTooLong: {
    plain: 'The longest brace leg is too short for the height of its fixing.',
    full: 'The longest brace leg is {{amount}} too short to hold a pole at the height of its fixing.',
  },
  poleTooShort: {
    plain: '{{thing}} is too short for its lift.',
    full: '{{thing}} is {{amount}} too short for {{against}}.',
  },
  lineSags: {
    plain: 'The line of {{running}} sags more than its most: it wants a trig.',
    full: 'The line of {{running}} sags {{amount}} more than its most: it wants a trig.',
  },
  searchBoundReached: {
    plain: 'There were too many ways to try them all: this one works, and a better one may be missed.',
    poles:
      'Round {{running}} there were too many ways to try them all: the braces are clear, and a better placing may be missed.',
  },

  /** What would do. */
  nearest: {
    both: 'Nearest that does: {{below}} or {{above}}.',
    below: 'Nearest that does: {{below}}.',
    above: 'Nearest that does: {{above}}.',
  },
  fix: {
    swapHinge: 'Hinges on the other jamb of {{thing}} would free it.',
    openOtherWay: 'It is free if {{thing}} opens the other way.',
    notUsedDuringWork: 'It is free if the crew does not go through {{thing}} during the work.',
    setOff: 'It is free with {{thing}} set off by {{by}}.',
    shorterLeg: 'It is free with brace legs {{by}} shorter than the kit’s least.',
    longerLeg: 'Legs {{by}} longer would hold.',
    move: 'It is free with {{thing}} moved {{by}}.',
  },
  turned: 'turned {{degrees}}° for {{thing}}',
  turnedPlain: 'turned {{degrees}}°',
  straight: 'straight in line with {{run}}',
  setOff: 'set off {{by}} along {{run}} for {{thing}}',
  over: 'passes over {{thing}} with head room',
} as const;
