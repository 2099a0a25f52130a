/** A small tool store in earth block, in feet and inches: an L with six corners, one lift, a door close to a corner. */
import type { Door, Drawing, KeepClear, Opening } from '../../model/drawing/schema';
import type { Survey } from '../../model/drawing/surveySchema';
import { feet, inches, ticks, type Ticks } from '../../model/length/ticks';
import type { DemoSite } from './demoSite';

const UNIT = { length: inches(17 + 5 / 8), width: inches(12), height: inches(3 + 5 / 8) };
const JOINT = inches(3 / 8);
const COURSE = inches(4);

/** Height of a course's top where every joint is nominal: the first is a unit on a bedding as thick as a joint. */
function course(number: number): Ticks {
  return ticks(number * COURSE);
}

/** Where a jamb falls after so many whole units, and an opening as wide as so many with a joint more. */
function afterUnits(count: number): Ticks {
  return ticks(count * (UNIT.length + JOINT) - JOINT);
}
function unitsWide(count: number): Ticks {
  return ticks(count * (UNIT.length + JOINT) + JOINT);
}

const LINTEL = { depth: inches(8), bearing: inches(12) };
const FRAME = inches(1.5);

interface Heights {
  readonly head: Ticks;
  readonly soffit: Ticks;
}

function door(id: string, runId: string, at: Ticks, head: Ticks, rest: Pick<Door, 'swing' | 'way'>): Opening {
  return {
    kind: 'door',
    id,
    runId,
    at,
    width: unitsWide(2),
    sill: ticks(0),
    head,
    frame: FRAME,
    lintel: LINTEL,
    ...rest,
  };
}

function window(id: string, runId: string, at: Ticks, head: Ticks): Opening {
  const sill = course(9);
  return { kind: 'window', id, runId, at, width: unitsWide(2), sill, head, frame: FRAME, lintel: LINTEL };
}

const MIXING_BAY: KeepClear = {
  id: 'mixing',
  name: 'Mixing bay',
  points: [
    { x: feet(-13), y: feet(-19) },
    { x: feet(-7), y: feet(-19) },
    { x: feet(-7), y: feet(-13) },
    { x: feet(-13), y: feet(-13) },
  ],
};

/** From the mixing bay to the south door, past the brace that corner A would have straight to the south. */
const BARROW_PATH: KeepClear = {
  id: 'path',
  name: 'Barrow path',
  points: [
    { x: feet(-9, 2), y: feet(-13) },
    { x: feet(-6, 10), y: feet(-15) },
    { x: feet(4, 2), y: feet(-2) },
    { x: feet(4, 2), y: ticks(0) },
    { x: feet(1, 10), y: ticks(0) },
  ],
};

interface Variant extends Heights {
  readonly barrowPath: boolean;
  /** Whole units between corner A and the door on A–B. */
  readonly doorAfter: number;
  readonly westWindow: boolean;
  /** Whole units between corner B and the window on B–C. */
  readonly eastWindowAfter: number;
}

function draw({ head, soffit, barrowPath, doorAfter, westWindow, eastWindowAfter }: Variant): Drawing {
  const corner = (letter: string, x: number, y: number) => ({
    id: `c${letter}`,
    letter,
    x: feet(x),
    y: feet(y),
  });
  const run = (from: string, to: string) => ({
    id: `r${from}${to}`,
    from: `c${from}`,
    to: `c${to}`,
    wallTypeId: 'block12',
  });
  const openings = [
    door('doorSouth', 'rAB', afterUnits(doorAfter), head, {
      swing: { hinge: 'far', opens: 'in' },
      way: { used: true, width: feet(4), depth: feet(5) },
    }),
    window('windowSouth', 'rAB', afterUnits(8), head),
    window('windowEast', 'rBC', afterUnits(eastWindowAfter), head),
    door('doorYard', 'rCD', afterUnits(2), head, {
      swing: { hinge: 'near', opens: 'in' },
      way: { used: true, width: feet(4), depth: feet(5) },
    }),
    window('windowNorth', 'rEF', afterUnits(3), head),
    ...(westWindow ? [window('windowWest', 'rFA', afterUnits(5), head)] : []),
  ];
  return {
    version: 1,
    units: 'imperial',
    tapeStep: ticks(1016),
    wallTypes: [
      {
        id: 'block12',
        name: '12 in earth block',
        unitName: 'Pressed earth block',
        mortarName: 'Stabilised earth mortar',
        unit: UNIT,
        laid: 'stretcher',
        headJoint: { nominal: JOINT, least: inches(1 / 4), most: inches(5 / 8) },
        bedJoint: { nominal: JOINT, least: inches(1 / 4), most: inches(1 / 2) },
        bedding: { least: JOINT, most: inches(1 + 1 / 4) },
        bondOffset: 'half',
        leastLap: inches(4 + 3 / 8),
        leastPiece: inches(4),
      },
    ],
    corners: [
      corner('A', 0, 0),
      corner('B', 24, 0),
      corner('C', 24, 12),
      corner('D', 14, 12),
      corner('E', 14, 18),
      corner('F', 0, 18),
    ],
    runs: [run('A', 'B'), run('B', 'C'), run('C', 'D'), run('D', 'E'), run('E', 'F'), run('F', 'A')],
    openings,
    keepClears: [MIXING_BAY, ...(barrowPath ? [BARROW_PATH] : [])],
    boundary: [
      { x: feet(-20), y: feet(-24) },
      { x: feet(40), y: feet(-24) },
      { x: feet(38), y: feet(34) },
      { x: feet(-20), y: feet(32) },
    ],
    controlHeights: [],
    bondBeams: [
      {
        id: 'beam',
        name: 'Bond beam',
        soffit,
        depth: inches(8),
        tolerance: ticks(0),
        hold: 'hard',
        bars: { count: 2, diameter: inches(1 / 2), lap: inches(20) },
      },
    ],
    poleKit: {
      leg: inches(3),
      steel: inches(3 / 16),
      stockLength: feet(20),
      poleLength: feet(10),
      footLap: inches(6),
      spacer: inches(1),
      clearance: inches(2),
      brace: { leastLeg: feet(5), mostLeg: feet(10), fixing: feet(6, 8), headRoom: feet(6, 6) },
      lineBlock: inches(1.5),
      kerf: inches(1 / 8),
      lineWeight: 14,
      linePull: 90,
    },
    ruleValues: {},
  };
}

/** Measured down from the level line, in inches; C reads least and is the high point. */
const CORNERS_DOWN: Readonly<Record<string, number>> = {
  A: 48 + 1 / 4,
  B: 48 + 1 / 8,
  C: 47 + 7 / 8,
  D: 48,
  E: 48 + 3 / 8,
  F: 48 + 1 / 2,
};
const RUNS_DOWN: readonly (readonly [run: string, feet: number, down: number])[] = [
  ['AB', 8, 48 + 5 / 16],
  ['AB', 16, 48 + 1 / 4],
  ['BC', 6, 48],
  ['CD', 5, 47 + 15 / 16],
  ['EF', 7, 48 + 9 / 16],
  ['FA', 6, 48 + 5 / 8],
  ['FA', 12, 48 + 3 / 8],
];

function surveyed(along: boolean): Survey {
  const corners = Object.entries(CORNERS_DOWN).map(([letter, down]) => ({
    id: `at${letter}`,
    station: { kind: 'corner' as const, cornerId: `c${letter}` },
    down: inches(down),
  }));
  const runs = RUNS_DOWN.map(([run, at, down]) => ({
    id: `on${run}${at}`,
    station: { kind: 'run' as const, runId: `r${run}`, at: feet(at) },
    down: inches(down),
  }));
  return { version: 1, method: 'measureDown', readings: along ? [...corners, ...runs] : corners };
}

const FIRST: Variant = {
  head: course(20),
  soffit: course(23),
  doorAfter: 2,
  barrowPath: false,
  westWindow: false,
  eastWindowAfter: 3,
};
const SECOND: Variant = { ...FIRST, westWindow: true, doorAfter: 1, barrowPath: true };
/** An inch higher than whole courses: the joints above the sills take it up. */
const THIRD: Variant = { ...SECOND, head: inches(81), soffit: inches(93) };

export const cedarBend: DemoSite = {
  name: 'Cedar Bend tool store',
  revisions: [
    {
      note: 'First drawing; the foundation read at its corners.',
      drawing: draw(FIRST),
      survey: surveyed(false),
      daysAgo: 23,
    },
    {
      note: 'South door moved to the corner, window added in the west wall; foundation read between the corners.',
      drawing: draw(SECOND),
      survey: surveyed(true),
      daysAgo: 12,
    },
    {
      note: 'Heads and bond beam one inch higher, to suit the frames that came.',
      drawing: draw(THIRD),
      survey: surveyed(true),
      daysAgo: 4,
    },
  ],
  draft: { drawing: draw({ ...THIRD, eastWindowAfter: 2 }), survey: surveyed(true) },
};
