/** Slides a wall parallel to itself. */
import type { PlanPoint } from '../../geometry/point';
import { meetLines } from '../../geometry/segment';
import { along, dot, perp, sub, toPoint, unit } from '../../geometry/vec';
import type { Ticks } from '../../length/ticks';
import type { Drawing, WallRun } from '../schema';
import { runWithCorners } from './find';
import { placeCorners } from './moveCorners';
import { planOf, straightWall, wayOff } from './straight';

/** Whether any run of the drawing turned back on itself or lost its length between two drawings with the same runs. */
export function turnsBack(before: Drawing, after: Drawing, runs: readonly WallRun[]): boolean {
  const old = new Map(before.corners.map((corner) => [corner.id, corner]));
  const now = new Map(after.corners.map((corner) => [corner.id, corner]));
  return runs.some((run) => {
    const [a, b, c, d] = [old.get(run.from), old.get(run.to), now.get(run.from), now.get(run.to)];
    return !a || !b || !c || !d || dot(sub(b, a), sub(d, c)) <= 0;
  });
}

/**
 * Slides a run, with the whole straight wall that it is part of, by a distance to the left of its direction: the side of
 * its body. Walls that meet it stretch or shorten along their own lines; free ends move square. The same drawing comes
 * back where a wall would turn back on itself.
 */
export function slideRun(drawing: Drawing, runId: string, by: Ticks): Drawing {
  const found = runWithCorners(drawing, runId);
  if (!found || by === 0) return drawing;
  const direction = unit(sub(found.to, found.from));
  if (direction.x === 0 && direction.y === 0) return drawing;
  const plan = planOf(drawing);
  const wall = straightWall(plan, found.run);
  const inWall = new Set(wall.runs.map((run) => run.id));
  const normal = perp(direction);
  const onLine = along(found.from, normal, by);
  const places = new Map<string, PlanPoint>();
  for (const corner of wall.corners) {
    const way = wayOff(plan, corner.id, direction, inWall);
    const met = way ? meetLines(corner, way, onLine, direction) : null;
    places.set(corner.id, toPoint(met ?? along(corner, normal, by)));
  }
  const slid = placeCorners(drawing, places);
  const touched = wall.corners.flatMap((corner) => plan.runsAt.get(corner.id) ?? []);
  return turnsBack(drawing, slid, touched) ? drawing : slid;
}
