/** Moves corners and keeps what hangs on their runs where a builder would look for it. */
import type { PlanPoint } from '../../geometry/point';
import { meetLines, partAlong } from '../../geometry/segment';
import { between, distance, dot, samePoint, sub, toPoint, unit } from '../../geometry/vec';
import { roundTicks } from '../../length/ticks';
import type { Corner, Drawing, Opening, WallRun } from '../schema';
import { findCorner, isOnPlan, lengthBetween, placeAlong } from './find';
import { placeOf, planOf, straightWall, wayOff } from './straight';

function shiftOf(run: WallRun, before: ReadonlyMap<string, Corner>, moved: ReadonlyMap<string, PlanPoint>): number {
  const from = before.get(run.from);
  const to = before.get(run.to);
  if (!from || !to) return 0;
  const newFrom = moved.get(run.from);
  const newTo = moved.get(run.to);
  if (!newFrom) return 0;
  if (!newTo) return lengthBetween(newFrom, to) - lengthBetween(from, to);
  const carried = newFrom.x - from.x === newTo.x - to.x && newFrom.y - from.y === newTo.y - to.y;
  return carried ? 0 : 0 - dot(sub(newFrom, from), unit(sub(to, from)));
}

/**
 * Puts corners in new places. Openings keep their distance from the end of their run that stays; where both ends move
 * alike they are carried along; where both move otherwise they keep their place on the plan, along the run. The same
 * drawing comes back where nothing moves or a place is off the plan.
 */
export function placeCorners(drawing: Drawing, places: ReadonlyMap<string, PlanPoint>): Drawing {
  const before = new Map(drawing.corners.map((corner) => [corner.id, corner]));
  const moved = new Map<string, PlanPoint>();
  for (const [id, place] of places) {
    const corner = before.get(id);
    if (!corner || !isOnPlan(place)) return drawing;
    if (!samePoint(corner, place)) moved.set(id, place);
  }
  if (moved.size === 0) return drawing;
  const shifts = new Map<string, number>();
  for (const run of drawing.runs) {
    const shift = roundTicks(shiftOf(run, before, moved));
    if (shift !== 0) shifts.set(run.id, shift);
  }
  const shifted = (opening: Opening): Opening => {
    const shift = shifts.get(opening.runId);
    return shift === undefined ? opening : { ...opening, at: placeAlong(opening.at + shift) };
  };
  return {
    ...drawing,
    corners: drawing.corners.map((corner) => {
      const place = moved.get(corner.id);
      return place ? { ...corner, x: place.x, y: place.y } : corner;
    }),
    openings: drawing.openings.some((opening) => shifts.has(opening.runId))
      ? drawing.openings.map(shifted)
      : drawing.openings,
  };
}

/**
 * Moves one corner. Straight walls that end at it stay straight: tees along them slide, each along its stem, onto the new
 * line. A corner in the middle of a straight wall bends it.
 */
export function moveCorner(drawing: Drawing, cornerId: string, place: PlanPoint): Drawing {
  const corner = findCorner(drawing, cornerId);
  if (!corner || !isOnPlan(place) || samePoint(corner, place)) return drawing;
  const plan = planOf(drawing);
  const places = new Map<string, PlanPoint>([[cornerId, place]]);
  for (const run of plan.runsAt.get(cornerId) ?? []) {
    const wall = straightWall(plan, run);
    const ends = [wall.corners[0], wall.corners[wall.corners.length - 1]];
    if (!ends.some((end) => end?.id === cornerId)) continue;
    const anchor = ends.find((end) => end?.id !== cornerId);
    if (!anchor) continue;
    const inWall = new Set(wall.runs.map((one) => one.id));
    for (const middle of wall.corners.slice(1, -1))
      places.set(middle.id, slideOntoLine(plan, middle, anchor, corner, place, inWall));
  }
  return placeCorners(drawing, places);
}

function slideOntoLine(
  plan: ReturnType<typeof planOf>,
  middle: Corner,
  anchor: Corner,
  from: Corner,
  to: PlanPoint,
  inWall: ReadonlySet<string>,
): PlanPoint {
  const line = sub(to, anchor);
  const stem = wayOff(plan, middle.id, sub(from, anchor), inWall);
  const met = stem ? meetLines(anchor, line, middle, stem) : null;
  if (met) {
    const part = partAlong(anchor, to, met);
    if (part > 0 && part < 1) return toPoint(met);
  }
  const size = distance(anchor, to);
  const kept = distance(anchor, middle);
  if (size === 0) return placeOf(middle);
  return toPoint(between(anchor, to, kept < size ? kept / size : kept / distance(anchor, from)));
}
