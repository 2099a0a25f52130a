/** Small buildings in inches, for tests of poles and braces. */
import type { Door, Drawing, Opening } from '../../../model/drawing/schema';
import { inches } from '../../../model/length/ticks';

export type Place = readonly [number, number];

const wallType = {
  id: 'earth',
  name: 'Earth block',
  unitName: 'Earth block 14 × 10 × 3 1/2',
  mortarName: 'Stabilised earth',
  unit: { length: inches(14), width: inches(10), height: inches(3.5) },
  laid: 'stretcher' as const,
  headJoint: { nominal: inches(0.5), least: inches(0.375), most: inches(0.75) },
  bedJoint: { nominal: inches(0.5), least: inches(0.375), most: inches(0.75) },
  bedding: { least: inches(0.5), most: inches(1.25) },
  bondOffset: 'half' as const,
  leastLap: inches(3.5),
  leastPiece: inches(4),
};

/** 3 × 3 × 3/16 in angle, 1 in spacer, 2 in clearance; fixed at 80 in, so that the best reach is 66 % of it, 52.8 in. */
export const KIT: Drawing['poleKit'] = {
  leg: inches(3),
  steel: inches(3 / 16),
  stockLength: inches(240),
  poleLength: inches(120),
  footLap: inches(6),
  spacer: inches(1),
  clearance: inches(2),
  brace: { leastLeg: inches(84), mostLeg: inches(120), fixing: inches(80), headRoom: inches(76) },
  lineBlock: inches(2),
  kerf: inches(0.125),
  lineWeight: 4,
  linePull: 90,
};

/** An empty drawing with one wall type, a 10 in wall. */
export function emptySite(): Drawing {
  return {
    version: 1,
    units: 'imperial',
    tapeStep: inches(1 / 16),
    wallTypes: [wallType],
    corners: [],
    runs: [],
    openings: [],
    keepClears: [],
    boundary: null,
    controlHeights: [],
    bondBeams: [],
    poleKit: KIT,
    ruleValues: {},
  };
}

const letterOf = (i: number): string =>
  (i < 26 ? '' : letterOf(Math.floor(i / 26) - 1)) + String.fromCharCode(65 + (i % 26));

/** Adds runs from place to place; `closed` joins the last to the first. Ids are `A`, `AB` and so on, after a prefix. */
export function withWalls(site: Drawing, places: readonly Place[], closed = true, prefix = ''): Drawing {
  const first = site.corners.length;
  const corners = places.map(([x, y], i) => ({
    id: prefix + letterOf(i),
    letter: letterOf(first + i),
    x: inches(x),
    y: inches(y),
  }));
  const runs = places.flatMap((_, i) => {
    const from = corners[i];
    const to = corners[(i + 1) % corners.length];
    if (!from || !to || (!closed && i === places.length - 1)) return [];
    return [
      {
        id: `${prefix}${letterOf(i)}${letterOf((i + 1) % places.length)}`,
        from: from.id,
        to: to.id,
        wallTypeId: 'earth',
      },
    ];
  });
  return { ...site, corners: [...site.corners, ...corners], runs: [...site.runs, ...runs] };
}

/** A door 36 in wide with a way 40 in wide and 60 in deep, `at` inches along its run. */
export function door(runId: string, at: number, changes: Partial<Door> = {}): Door {
  return {
    id: `door-${runId}-${at}`,
    kind: 'door',
    runId,
    at: inches(at),
    width: inches(36),
    sill: inches(0),
    head: inches(84),
    frame: inches(1.5),
    lintel: { depth: inches(8), bearing: inches(8) },
    swing: { hinge: 'near', opens: 'in' },
    way: { used: true, width: inches(40), depth: inches(60) },
    ...changes,
  };
}

export function withOpenings(site: Drawing, ...openings: readonly Opening[]): Drawing {
  return { ...site, openings: [...site.openings, ...openings] };
}

/** 20 ft × 12 ft, drawn counter-clockwise from the lower left. */
export const rectangle = (): Drawing =>
  withWalls(emptySite(), [
    [0, 0],
    [240, 0],
    [240, 144],
    [0, 144],
  ]);

/** An L of 24 ft × 18 ft whose upper right 10 ft × 6 ft is open: D is the reentrant corner. */
export const ell = (): Drawing =>
  withWalls(emptySite(), [
    [0, 0],
    [288, 0],
    [288, 144],
    [168, 144],
    [168, 216],
    [0, 216],
  ]);
