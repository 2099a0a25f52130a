/**
 * What a new drawing starts with. Sizes are common practice for earth block, no source, unless one is named; every one of
 * them can be changed on the site.
 */
import { inches, mm, ticks, type Ticks } from '../length/ticks';
import type { BondBeam, ControlHeight, Drawing, Opening, PoleKit, Units, WallType } from './schema';

const IMPERIAL_WALL: WallType = {
  id: 'wall',
  name: '12 in earth block',
  unitName: 'Earth block',
  mortarName: 'Stabilised earth mortar',
  unit: { length: inches(17.625), width: inches(12), height: inches(3.625) },
  laid: 'stretcher',
  headJoint: { nominal: inches(3 / 8), least: inches(1 / 4), most: inches(1 / 2) },
  bedJoint: { nominal: inches(3 / 8), least: inches(1 / 4), most: inches(1 / 2) },
  // The first bed joint is 1/4 to 3/4 in (TMS 602, secondary); 3/8 puts the course lines on whole gauges of 4 in.
  bedding: { least: inches(3 / 8), most: inches(3 / 4) },
  bondOffset: 'half',
  // A quarter of the unit's length (NMAC 14.7.4.11 E).
  leastLap: ticks(71_628),
  leastPiece: inches(4),
};

const METRIC_WALL: WallType = {
  id: 'wall',
  name: '240 mm earth block',
  unitName: 'Earth block',
  mortarName: 'Stabilised earth mortar',
  unit: { length: mm(390), width: mm(240), height: mm(90) },
  laid: 'stretcher',
  headJoint: { nominal: mm(10), least: mm(7), most: mm(13) },
  bedJoint: { nominal: mm(10), least: mm(7), most: mm(13) },
  bedding: { least: mm(10), most: mm(20) },
  bondOffset: 'half',
  // A quarter of the unit's length (NMAC 14.7.4.11 E). A turned corner laps 390 − 240 − 10 = 140 mm, and a joint over the
  // middle of a stem 115 mm.
  leastLap: mm(97.5),
  leastPiece: mm(90),
};

const IMPERIAL_KIT: PoleKit = {
  leg: inches(3),
  steel: inches(3 / 16),
  stockLength: inches(240),
  poleLength: inches(120),
  footLap: inches(6),
  spacer: inches(1 / 2),
  clearance: inches(2),
  brace: { leastLeg: inches(60), mostLeg: inches(120), fixing: inches(80), headRoom: inches(78) },
  lineBlock: inches(3),
  kerf: inches(1 / 8),
  // 1 100 ft to the pound (from memory) pulled at 20 lb.
  lineWeight: 13.3,
  linePull: 89,
};

const METRIC_KIT: PoleKit = {
  leg: mm(75),
  steel: mm(5),
  stockLength: mm(6000),
  poleLength: mm(3000),
  footLap: mm(150),
  spacer: mm(12),
  clearance: mm(50),
  brace: { leastLeg: mm(1500), mostLeg: mm(3000), fixing: mm(2000), headRoom: mm(1950) },
  lineBlock: mm(75),
  kerf: mm(3),
  lineWeight: 13.3,
  linePull: 90,
};

/** Marks to 1/16 in, or to 1 mm. */
export function defaultTapeStep(units: Units): Ticks {
  return units === 'imperial' ? inches(1 / 16) : mm(1);
}

/** The wall type that a new drawing starts with; its id is `wall`. */
function defaultWallType(units: Units): WallType {
  return units === 'imperial' ? IMPERIAL_WALL : METRIC_WALL;
}

function defaultPoleKit(units: Units): PoleKit {
  return units === 'imperial' ? IMPERIAL_KIT : METRIC_KIT;
}

/** A bond beam that closes a wall of one storey, on the course line of 24 gauges. */
export function newBondBeam(units: Units, id: string): BondBeam {
  const imperial = units === 'imperial';
  return {
    id,
    name: 'Bond beam',
    soffit: imperial ? inches(96) : mm(2400),
    depth: imperial ? inches(8) : mm(200),
    tolerance: imperial ? inches(1 / 8) : mm(3),
    hold: 'hard',
    // Two #4 bars lapped 40 diameters.
    bars: imperial
      ? { count: 2, diameter: inches(1 / 2), lap: inches(20) }
      : { count: 2, diameter: mm(12), lap: mm(480) },
  };
}

/** A height for the course lines to meet, on a course line to begin with. */
export function newControlHeight(units: Units, kind: ControlHeight['kind'], id: string): ControlHeight {
  const imperial = units === 'imperial';
  const gauges = { sill: 9, head: 21, plate: 24, named: 12 }[kind];
  return {
    id,
    kind,
    name: '',
    height: imperial ? inches(4 * gauges) : mm(100 * gauges),
    tolerance: imperial ? inches(1 / 4) : mm(6),
    hold: kind === 'plate' ? 'hard' : 'soft',
    weight: 1,
  };
}

export type OpeningKind = Opening['kind'];

/** An opening of usual size on a run; its sill and head fall on course lines of the default gauge. */
export function newOpening(
  units: Units,
  kind: OpeningKind,
  place: { readonly id: string; readonly runId: string; readonly at: Ticks },
): Opening {
  const imperial = units === 'imperial';
  const base = {
    id: place.id,
    runId: place.runId,
    at: place.at,
    head: imperial ? inches(84) : mm(2100),
    lintel: imperial ? { depth: inches(7.625), bearing: inches(12) } : { depth: mm(190), bearing: mm(300) },
  };
  const way = imperial
    ? { used: true, width: inches(36), depth: inches(36) }
    : { used: true, width: mm(900), depth: mm(900) };
  const frame = imperial ? inches(1.5) : mm(40);
  if (kind === 'window')
    return {
      ...base,
      kind,
      width: imperial ? inches(36) : mm(900),
      sill: imperial ? inches(36) : mm(900),
      frame,
    };
  const width = imperial ? inches(39) : mm(980);
  if (kind === 'passage') return { ...base, kind, width, sill: ticks(0), frame: ticks(0), way };
  return { ...base, kind, width, sill: ticks(0), frame, swing: { hinge: 'near', opens: 'in' }, way };
}

/** An empty drawing: one wall type, one bond beam, a pole kit, no rule changed. */
export function newDrawing(units: Units): Drawing {
  return {
    version: 1,
    units,
    tapeStep: defaultTapeStep(units),
    wallTypes: [defaultWallType(units)],
    corners: [],
    runs: [],
    openings: [],
    keepClears: [],
    boundary: null,
    controlHeights: [],
    bondBeams: [newBondBeam(units, 'beam')],
    poleKit: defaultPoleKit(units),
    ruleValues: {},
  };
}
