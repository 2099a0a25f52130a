/** Concrete and bar of the bond beams. */
import type { Coursing } from '../coursing/types';
import type { Drawing } from '../drawing/schema';
import { roundTicks, ticks, TICKS_PER_MM } from '../length/ticks';
import { signedArea } from '../geometry/polygon';
import type { RunGeometry, Walls } from '../walls/types';
import type { Takeoff } from './types';

/** Laps in one bar of a run: where stock lengths join along it, and one at its second corner where it meets another run. */
function lapsInRun(run: RunGeometry, stock: number, lap: number): number {
  const along = stock > lap ? Math.max(0, Math.ceil((run.centreLength - lap) / (stock - lap)) - 1) : 0;
  return along + (run.ends[1].others.length > 0 ? 1 : 0);
}

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
    const laps = walls.runs.reduce((sum, run) => sum + lapsInRun(run, drawing.poleKit.stockLength, lap), 0);
    const concrete = (area * (beam.top - beam.soffit)) / TICKS_PER_MM ** 3;
    return [{ beamId: beam.id, length: ticks(length), concrete, bar: roundTicks(count * (length + laps * lap)) }];
  });
}
