import type { Drawing } from '../../model/drawing/schema';
import type { PlanPoint } from '../../model/geometry/point';
import { layOutWalls } from '../../model/walls/layOutWalls';

/** More than this is not seen in a picture the size of a thumb. */
const MOST_POINTS = 2000;

/**
 * Outlines of the walls for the picture in the list of sites: the outside of every closed loop, and the body of
 * every run that belongs to none.
 */
export function outlineOf(drawing: Drawing): PlanPoint[][] {
  const walls = layOutWalls(drawing);
  const inLoops = new Set(walls.footprints.flatMap((footprint) => footprint.runIds));
  const loops = walls.footprints.map((footprint) =>
    footprint.cornerIds.flatMap((id) => walls.cornerById.get(id)?.at ?? []),
  );
  const bodies = walls.runs.filter((run) => !inLoops.has(run.runId)).map((run) => [...run.body]);
  let points = 0;
  return [...loops, ...bodies]
    .filter((outline) => outline.length >= 3 && (points += outline.length) <= MOST_POINTS)
    .map((outline) => outline.map(({ x, y }) => ({ x, y })));
}
