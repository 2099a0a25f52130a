/** Small drawings for the client's tests, in whole feet. */
import { feet, inches, ticks, type Ticks } from '../../model/length/ticks';
import { drawingSchema, type Drawing } from '../../model/drawing/schema';

/** Corners by letter, in feet; runs join them in order and close the loop. */
export function building(corners: readonly (readonly [number, number])[], closed = true): Drawing {
  const letters = corners.map((_, i) => String.fromCharCode(65 + i));
  const next = (i: number) => letters[(i + 1) % letters.length]!;
  return drawingSchema.parse({
    version: 1,
    units: 'imperial',
    tapeStep: 1016,
    wallTypes: [
      {
        id: 'wall',
        name: 'Earth block',
        unitName: 'Earth block',
        mortarName: 'Earth mortar',
        unit: { length: inches(14), width: inches(10), height: inches(3.5) },
        laid: 'stretcher',
        headJoint: { nominal: inches(0.5), least: inches(0.375), most: inches(0.75) },
        bedJoint: { nominal: inches(0.5), least: inches(0.375), most: inches(0.75) },
        bedding: { least: inches(0.5), most: inches(1) },
        bondOffset: 'half',
        leastLap: inches(3.5),
        leastPiece: inches(3),
      },
    ],
    corners: corners.map(([x, y], i) => ({ id: letters[i]!, letter: letters[i]!, x: feet(x), y: feet(y) })),
    runs: letters
      .slice(0, closed ? letters.length : -1)
      .map((from, i) => ({ id: `${from}${next(i)}`, from, to: next(i), wallTypeId: 'wall' })),
    openings: [],
    keepClears: [],
    boundary: null,
    controlHeights: [],
    bondBeams: [],
    poleKit: {
      leg: inches(3),
      steel: inches(0.1875),
      stockLength: feet(20),
      poleLength: feet(10),
      footLap: inches(6),
      spacer: inches(0.125),
      clearance: inches(2),
      brace: { leastLeg: feet(6), mostLeg: feet(10), fixing: feet(6.5), headRoom: feet(6.5) },
      lineBlock: inches(1),
      kerf: inches(0.125),
      lineWeight: 13,
      linePull: 90,
    },
    ruleValues: {},
  });
}

/** A window on a run, `at` and `width` in feet. */
export function withWindow(drawing: Drawing, runId: string, at: number, width: number, id = 'w1'): Drawing {
  const size = (value: number): Ticks => ticks(feet(value));
  return drawingSchema.parse({
    ...drawing,
    openings: [
      ...drawing.openings,
      {
        kind: 'window',
        id,
        runId,
        at: size(at),
        width: size(width),
        sill: size(3),
        head: size(7),
        frame: inches(1.5),
        lintel: { depth: inches(4), bearing: inches(10) },
      },
    ],
  });
}
