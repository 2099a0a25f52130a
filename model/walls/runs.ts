/** A drawing's runs made ready for geometry: their corners looked up, their directions, lengths and thicknesses. */
import type { Corner, Drawing, WallRun, WallType } from '../drawing/schema';
import type { Vec } from '../geometry/point';
import { distance, perp, sub, unit } from '../geometry/vec';
import { ticks, type Ticks } from '../length/ticks';
import type { Reason } from '../reasons';

/** One run that has a length. `length` is in ticks but not rounded. */
export interface ReadyRun {
  readonly run: WallRun;
  readonly from: Corner;
  readonly to: Corner;
  readonly length: number;
  readonly direction: Vec;
  readonly inward: Vec;
  readonly thickness: Ticks;
}

/** How thick a wall of this type stands: its units' width laid as stretchers, their length laid as headers. */
export function thicknessOf(type: WallType): Ticks {
  return type.laid === 'stretcher' ? type.unit.width : type.unit.length;
}

/** How long a unit is along a wall of this type. */
export function unitAlong(type: WallType): Ticks {
  return type.laid === 'stretcher' ? type.unit.length : type.unit.width;
}

export interface ReadyRuns {
  readonly runs: readonly ReadyRun[];
  readonly reasons: readonly Reason[];
}

/** Runs with a length, in the drawing's order; those without, and second runs between the same two corners, become reasons. */
export function readyRuns(drawing: Drawing): ReadyRuns {
  const corners = new Map(drawing.corners.map((corner) => [corner.id, corner]));
  const types = new Map(drawing.wallTypes.map((type) => [type.id, type]));
  const byEnds = new Map<string, string>();
  const runs: ReadyRun[] = [];
  const reasons: Reason[] = [];
  for (const run of drawing.runs) {
    const from = corners.get(run.from);
    const to = corners.get(run.to);
    const type = types.get(run.wallTypeId);
    if (!from || !to || !type) continue;
    const thing = { kind: 'run', id: run.id } as const;
    if (from.x === to.x && from.y === to.y) {
      reasons.push({ code: 'runHasNoLength', weight: 'blocked', thing, amount: ticks(0) });
      continue;
    }
    const ends = run.from < run.to ? `${run.from} ${run.to}` : `${run.to} ${run.from}`;
    const first = byEnds.get(ends);
    if (first !== undefined) {
      reasons.push({ code: 'runsOverlap', weight: 'blocked', thing, against: [{ kind: 'run', id: first }] });
      continue;
    }
    byEnds.set(ends, run.id);
    const direction = unit(sub(to, from));
    runs.push({
      run,
      from,
      to,
      length: distance(from, to),
      direction,
      inward: perp(direction),
      thickness: thicknessOf(type),
    });
  }
  return { runs, reasons };
}
