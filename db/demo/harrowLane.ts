/** A two-storey studio in metric units: two lifts, each closed by a bond beam, and an end wall that follows the lane. */
import type { Drawing, Opening } from '../../model/drawing/schema';
import type { Survey } from '../../model/drawing/surveySchema';
import { mm, ticks, type Ticks } from '../../model/length/ticks';
import type { DemoSite } from './demoSite';

/** A unit is twice as long as it is wide, joint included, so that a wall bonds in whole and half units. */
const LENGTH = 490;
const WIDTH = 240;
const JOINT = 10;
const HALF = (LENGTH + JOINT) / 2;
const GAUGE = 100;

/** Where a jamb falls after so many half units, and an opening as wide as so many with a joint more, in millimetres. */
const afterHalves = (count: number): Ticks => mm(count * HALF - JOINT);
const halvesWide = (count: number): Ticks => mm(count * HALF + JOINT);

const GROUND_SOFFIT = 23 * GAUGE;
const BEAM_DEPTH = 200;
/** Each lift starts afresh: the upper one on the first beam. */
const UPPER = GROUND_SOFFIT + BEAM_DEPTH;
const UPPER_SOFFIT = UPPER + 22 * GAUGE;

/** Outside lengths that bond without cutting. */
const ALONG = 29 * HALF - JOINT;
const ACROSS = 19 * HALF - JOINT;

interface Variant {
  readonly upper: boolean;
  /** How much further the lane end reaches at B than at C, in millimetres: zero is square. */
  readonly splay: number;
  readonly doorHinge: 'near' | 'far';
}

const FRAME = mm(40);

function windowAt(id: string, runId: string, after: number, storey: 'ground' | 'upper'): Opening {
  const base = storey === 'ground' ? 0 : UPPER;
  return {
    kind: 'window',
    id,
    runId,
    at: afterHalves(after),
    width: halvesWide(4),
    sill: mm(base + 9 * GAUGE),
    head: mm(base + 20 * GAUGE),
    frame: FRAME,
    lintel: { depth: mm(100), bearing: mm(250) },
  };
}

function draw({ upper, splay, doorHinge }: Variant): Drawing {
  const corner = (letter: string, x: number, y: number) => ({ id: `c${letter}`, letter, x: mm(x), y: mm(y) });
  const run = (from: string, to: string) => ({
    id: `r${from}${to}`,
    from: `c${from}`,
    to: `c${to}`,
    wallTypeId: 'block240',
  });
  const beam = (id: string, name: string, soffit: number) => ({
    id,
    name,
    soffit: mm(soffit),
    depth: mm(BEAM_DEPTH),
    tolerance: ticks(0),
    hold: 'hard' as const,
    bars: { count: 4, diameter: mm(12), lap: mm(600) },
  });
  return {
    version: 1,
    units: 'metric',
    tapeStep: ticks(640),
    wallTypes: [
      {
        id: 'block240',
        name: '240 mm earth block',
        unitName: 'Pressed earth block',
        mortarName: 'Stabilised earth mortar',
        unit: { length: mm(LENGTH), width: mm(WIDTH), height: mm(GAUGE - JOINT) },
        laid: 'stretcher',
        headJoint: { nominal: mm(JOINT), least: mm(7), most: mm(13) },
        bedJoint: { nominal: mm(JOINT), least: mm(8), most: mm(13) },
        bedding: { least: mm(JOINT), most: mm(30) },
        bondOffset: 'half',
        // A quarter of the unit's length (NMAC 14.7.4.11 E).
        leastLap: mm(LENGTH / 4),
        leastPiece: mm(110),
      },
    ],
    corners: [corner('A', 0, 0), corner('B', ALONG + splay, 0), corner('C', ALONG, ACROSS), corner('D', 0, ACROSS)],
    runs: [run('A', 'B'), run('B', 'C'), run('C', 'D'), run('D', 'A')],
    openings: [
      {
        kind: 'door',
        id: 'door',
        runId: 'rAB',
        at: afterHalves(4),
        width: halvesWide(4),
        sill: ticks(0),
        head: mm(20 * GAUGE),
        frame: FRAME,
        lintel: { depth: mm(100), bearing: mm(250) },
        swing: { hinge: doorHinge, opens: 'in' },
        way: { used: true, width: mm(1500), depth: mm(1500) },
      },
      windowAt('windowSouth', 'rAB', 16, 'ground'),
      windowAt('windowNorth', 'rCD', 6, 'ground'),
      windowAt('windowNorthWest', 'rCD', 18, 'ground'),
      windowAt('windowWest', 'rDA', 8, 'ground'),
      ...(upper
        ? [
            windowAt('upperSouthWest', 'rAB', 4, 'upper'),
            windowAt('upperSouth', 'rAB', 16, 'upper'),
            windowAt('upperNorth', 'rCD', 6, 'upper'),
            windowAt('upperWest', 'rDA', 8, 'upper'),
          ]
        : []),
    ],
    keepClears: [],
    boundary: null,
    controlHeights: [],
    bondBeams: [
      beam('beamGround', 'Ground floor beam', GROUND_SOFFIT),
      ...(upper ? [beam('beamUpper', 'Upper floor beam', UPPER_SOFFIT)] : []),
    ],
    poleKit: {
      leg: mm(75),
      steel: mm(5),
      stockLength: mm(6000),
      poleLength: mm(3000),
      footLap: mm(150),
      spacer: mm(25),
      clearance: mm(50),
      brace: { leastLeg: mm(1500), mostLeg: mm(3000), fixing: mm(2000), headRoom: mm(2000) },
      lineBlock: mm(40),
      kerf: mm(3),
      lineWeight: 14,
      linePull: 90,
    },
    ruleValues: {},
  };
}

/** Measured down from the level line, in millimetres; D reads least and is the high point. */
function surveyed(splay: number): Survey {
  const corners: Readonly<Record<string, number>> = { A: 1212, B: 1218, C: 1209, D: 1205 };
  const along: readonly (readonly [run: string, at: number, down: number])[] = [
    ['AB', 2400, 1214],
    ['AB', 4900, 1217],
    ['BC', 2400, splay === 0 ? 1213 : 1214],
    ['CD', 3600, 1208],
    ['DA', 2400, 1207],
  ];
  return {
    version: 1,
    method: 'measureDown',
    readings: [
      ...Object.entries(corners).map(([letter, down]) => ({
        id: `at${letter}`,
        station: { kind: 'corner' as const, cornerId: `c${letter}` },
        down: mm(down),
      })),
      ...along.map(([run, at, down]) => ({
        id: `on${run}${at}`,
        station: { kind: 'run' as const, runId: `r${run}`, at: mm(at) },
        down: mm(down),
      })),
    ],
  };
}

const FIRST: Variant = { upper: false, splay: 0, doorHinge: 'near' };
const SECOND: Variant = { ...FIRST, upper: true };
const THIRD: Variant = { ...SECOND, splay: 500, doorHinge: 'far' };

export const harrowLane: DemoSite = {
  name: 'Harrow Lane studio',
  revisions: [
    { note: 'Ground floor only.', drawing: draw(FIRST), survey: surveyed(0), daysAgo: 40 },
    {
      note: 'Upper floor added: a second lift on the ground floor beam.',
      drawing: draw(SECOND),
      survey: surveyed(0),
      daysAgo: 19,
    },
    {
      note: 'The lane end follows the lane; the door is hung on its other jamb.',
      drawing: draw(THIRD),
      survey: surveyed(500),
      daysAgo: 2,
    },
  ],
  draft: { drawing: draw(THIRD), survey: surveyed(500) },
};
