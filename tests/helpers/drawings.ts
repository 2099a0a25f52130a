/** Drawings for the tests: an earth-block wall type, and buildings of a few runs. Lengths in inches unless named otherwise. */
import type { Corner, Drawing, Opening, WallRun, WallType } from '../../model/drawing/schema';
import { feet, inches, ticks } from '../../model/length/ticks';

/** 10 × 14 × 3 1/2 in units laid as stretchers on 1/2 in joints. */
export function earthBlock(change: Partial<WallType> = {}): WallType {
  return {
    id: 'earth',
    name: 'Earth block, 10 in',
    unitName: 'Earth block',
    mortarName: 'Earth mortar',
    unit: { length: inches(14), width: inches(10), height: inches(3.5) },
    laid: 'stretcher',
    headJoint: { nominal: inches(0.5), least: inches(0.375), most: inches(0.625) },
    bedJoint: { nominal: inches(0.5), least: inches(0.375), most: inches(0.625) },
    bedding: { least: inches(0.5), most: inches(1.25) },
    bondOffset: 'quarter',
    leastLap: inches(3.5),
    leastPiece: inches(3.5),
    ...change,
  };
}

/** A drawing without runs. */
export function emptyDrawing(wallType: WallType = earthBlock()): Drawing {
  return {
    version: 1,
    units: 'imperial',
    tapeStep: ticks(1016),
    wallTypes: [wallType],
    corners: [],
    runs: [],
    openings: [],
    keepClears: [],
    boundary: null,
    controlHeights: [],
    bondBeams: [],
    poleKit: {
      leg: inches(3),
      steel: inches(3 / 16),
      stockLength: feet(20),
      poleLength: feet(10),
      footLap: inches(6),
      spacer: inches(0.5),
      clearance: inches(2),
      brace: { leastLeg: feet(6), mostLeg: feet(10), fixing: feet(6, 8), headRoom: feet(6, 6) },
      lineBlock: inches(3),
      kerf: inches(1 / 8),
      lineWeight: 13.3,
      linePull: 90,
    },
    ruleValues: {},
  };
}

/** A drawing of corners (A, B, C … in inches) joined in order by runs `r1`, `r2` …, closed or open. */
export function loopOf(
  points: readonly (readonly [number, number])[],
  { wallType = earthBlock(), closed = true }: { wallType?: WallType; closed?: boolean } = {},
): Drawing {
  const corners = points.map(([x, y], i): Corner => {
    const letter = String.fromCharCode(65 + (i % 26)).repeat(1 + Math.floor(i / 26));
    return { id: `c${i + 1}`, letter, x: inches(x), y: inches(y) };
  });
  const count = closed ? points.length : points.length - 1;
  const runs = Array.from({ length: count }, (_, i): WallRun => {
    return { id: `r${i + 1}`, from: `c${i + 1}`, to: `c${((i + 1) % points.length) + 1}`, wallTypeId: wallType.id };
  });
  return { ...emptyDrawing(wallType), corners, runs };
}

/** A rectangle drawn counter-clockwise from its lower left corner, outside faces `width` × `depth` inches. */
export function rectangle(width: number, depth: number, wallType?: WallType): Drawing {
  return loopOf(
    [
      [0, 0],
      [width, 0],
      [width, depth],
      [0, depth],
    ],
    wallType ? { wallType } : {},
  );
}

/** An L: a rectangle with its upper right corner, `notchWidth` × `notchDepth` inches, taken out; reentrant at D. */
export function lShape(width: number, depth: number, notchWidth: number, notchDepth: number): Drawing {
  return loopOf([
    [0, 0],
    [width, 0],
    [width, depth - notchDepth],
    [width - notchWidth, depth - notchDepth],
    [width - notchWidth, depth],
    [0, depth],
  ]);
}

/** One wall between two free ends, `length` inches. */
export function freeWall(length: number, wallType?: WallType): Drawing {
  return loopOf(
    [
      [0, 0],
      [length, 0],
    ],
    { closed: false, ...(wallType ? { wallType } : {}) },
  );
}

/** Adds a door: `at` and `width` in inches along the run, head above the high point. */
export function withDoor(drawing: Drawing, runId: string, at: number, width: number, head = 84): Drawing {
  const door: Opening = {
    kind: 'door',
    id: `o${drawing.openings.length + 1}`,
    runId,
    at: inches(at),
    width: inches(width),
    sill: ticks(0),
    head: inches(head),
    frame: inches(2),
    lintel: { depth: ticks(0), bearing: ticks(0) },
    swing: { hinge: 'near', opens: 'in' },
    way: { used: true, width: inches(width), depth: inches(48) },
  };
  return { ...drawing, openings: [...drawing.openings, door] };
}

/** Adds a window: sizes in inches; the lintel's depth and bearing too. */
export function withWindow(
  drawing: Drawing,
  runId: string,
  {
    at,
    width,
    sill,
    head,
    lintel = [0, 0],
  }: {
    at: number;
    width: number;
    sill: number;
    head: number;
    lintel?: readonly [number, number];
  },
): Drawing {
  const window: Opening = {
    kind: 'window',
    id: `o${drawing.openings.length + 1}`,
    runId,
    at: inches(at),
    width: inches(width),
    sill: inches(sill),
    head: inches(head),
    frame: inches(2),
    lintel: { depth: inches(lintel[0]), bearing: inches(lintel[1]) },
  };
  return { ...drawing, openings: [...drawing.openings, window] };
}
