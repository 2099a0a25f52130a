/** Concrete and bar of the bond beams. */
import type { Coursing } from '../coursing/types';
import type { Drawing } from '../drawing/schema';
import { roundTicks, ticks, TICKS_PER_MM } from '../length/ticks';
import { signedArea } from '../geometry/polygon';
import type { Walls } from '../walls/types';
import { barLength, planBars } from './barPlan';
import type { Takeoff } from './types';

/**
 * Each beam runs along every wall. Concrete is the walls' plan (mitred bodies, so a corner counts once) by the beam's
 * depth, in cubic millimetres, bar not deducted; length and bar follow the centre lines. Bars are bought in the same
 * stock length as the poles' steel and lapped where they join, and once at each corner that a run arrives at.
 */
export function beamQuantities(drawing: Drawing, walls: Walls, coursing: Coursing): Takeoff['beams'] {
  const beams = new Map(drawing.bondBeams.map((beam) => [beam.id, beam]));
  const area = walls.runs.reduce((sum, run) => sum + Math.abs(signedArea(run.body)), 0);
  const length = walls.runs.reduce((sum, run) => sum + run.centreLength, 0);
  return coursing.lifts.flatMap(({ beam }) => {
    const drawn = beam && beams.get(beam.id);
    if (!beam || !drawn) return [];
    const { count, lap } = drawn.bars;
    const { stockLength: stock, kerf } = drawing.poleKit;
    const concrete = (area * (beam.top - beam.soffit)) / TICKS_PER_MM ** 3;
    return [
      {
        beamId: beam.id,
        length: ticks(length),
        concrete,
        bar: roundTicks(barLength(walls.runs, count, stock, lap)),
        stock: planBars(walls.runs, count, { stock, lap, kerf }),
      },
    ];
  });
}
