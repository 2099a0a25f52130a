import type { Drawing, Units } from '../../model/drawing/schema';
import { inches, feet, mm, ticks } from '../../model/length/ticks';

export function firstDrawing(units: Units): Drawing {
  const imperial = units === 'imperial';
  return {
    version: 1,
    units,
    tapeStep: ticks(imperial ? 1016 : 640),
    wallTypes: [
      {
        id: 'w1',
        name: '',
        unitName: '',
        mortarName: '',
        unit: { length: mm(300), width: mm(250), height: mm(90) },
        laid: 'stretcher',
        headJoint: { nominal: mm(10), least: mm(8), most: mm(13) },
        bedJoint: { nominal: mm(10), least: mm(8), most: mm(13) },
        bedding: { least: mm(10), most: mm(20) },
        bondOffset: 'half',
        leastLap: mm(70),
        leastPiece: mm(70),
      },
    ],
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
      spacer: inches(1),
      clearance: inches(2),
      brace: { leastLeg: feet(6), mostLeg: feet(10), fixing: feet(6, 8), headRoom: feet(6, 8) },
      lineBlock: inches(1),
      kerf: inches(1 / 8),
      lineWeight: 13,
      linePull: 90,
    },
    ruleValues: {},
  };
}
