/** Adds wall runs: from and to corners that are there, places on runs (which makes a tee), or bare points. */
import type { PlanPoint } from '../../geometry/point';
import { along, samePoint, sub, toPoint, unit } from '../../geometry/vec';
import type { Ticks } from '../../length/ticks';
import { nextLetter } from '../letters';
import type { Drawing, Opening, WallRun } from '../schema';
import {
  areJoined,
  findCorner,
  isOnPlan,
  lengthBetween,
  MOST_THINGS,
  runWithCorners,
  type NewId,
  placeAlong,
} from './find';

/** Where a run starts or ends: a corner, a place on a run measured along its outside face, or a point of the plan. */
export type EndPlace =
  | { readonly kind: 'corner'; readonly cornerId: string }
  | { readonly kind: 'run'; readonly runId: string; readonly at: Ticks }
  | { readonly kind: 'point'; readonly point: PlanPoint };

interface Settled {
  readonly drawing: Drawing;
  readonly cornerId: string;
}

/** Adds a corner with the next free letter; the corner that is there already, where there is one. */
function addCorner(drawing: Drawing, point: PlanPoint, newId: NewId): Settled | null {
  const there = drawing.corners.find((corner) => samePoint(corner, point));
  if (there) return { drawing, cornerId: there.id };
  if (!isOnPlan(point) || drawing.corners.length >= MOST_THINGS) return null;
  const corner = { id: newId(), letter: nextLetter(drawing.corners), x: point.x, y: point.y };
  return { drawing: { ...drawing, corners: [...drawing.corners, corner] }, cornerId: corner.id };
}

/**
 * Splits a run in two at a corner that lies on it. The first half keeps the run's id; openings go to the half that holds
 * their middle.
 */
function splitRun(drawing: Drawing, run: WallRun, cornerId: string, at: Ticks, newId: NewId): Drawing {
  const second: WallRun = { ...run, id: newId(), from: cornerId };
  const toHalf = (opening: Opening): Opening =>
    opening.runId !== run.id || opening.at + opening.width / 2 < at
      ? opening
      : { ...opening, runId: second.id, at: placeAlong(opening.at - at) };
  return {
    ...drawing,
    runs: drawing.runs.flatMap((one) => (one.id === run.id ? [{ ...one, to: cornerId }, second] : [one])),
    openings: drawing.openings.map(toHalf),
  };
}

/** Makes a corner on a run: one of its own where the place is at an end, else a new one that splits it. */
export function addCornerOnRun(drawing: Drawing, runId: string, at: Ticks, newId: NewId): Settled | null {
  const found = runWithCorners(drawing, runId);
  if (!found) return null;
  const { run, from, to } = found;
  const point = toPoint(along(from, unit(sub(to, from)), at));
  if (at <= 0 || samePoint(point, from)) return { drawing, cornerId: from.id };
  if (at >= lengthBetween(from, to) || samePoint(point, to)) return { drawing, cornerId: to.id };
  if (drawing.runs.length >= MOST_THINGS) return null;
  const added = addCorner(drawing, point, newId);
  if (!added || areJoined(added.drawing, added.cornerId, from.id) || areJoined(added.drawing, added.cornerId, to.id))
    return added;
  return {
    drawing: splitRun(added.drawing, run, added.cornerId, lengthBetween(from, point), newId),
    cornerId: added.cornerId,
  };
}

function settle(drawing: Drawing, place: EndPlace, newId: NewId): Settled | null {
  if (place.kind === 'corner')
    return findCorner(drawing, place.cornerId) ? { drawing, cornerId: place.cornerId } : null;
  if (place.kind === 'run') return addCornerOnRun(drawing, place.runId, place.at, newId);
  return addCorner(drawing, place.point, newId);
}

/** A place on a run as a point, before the drawing changes under it. */
function fixPlace(drawing: Drawing, place: EndPlace): EndPlace {
  if (place.kind !== 'run') return place;
  const found = runWithCorners(drawing, place.runId);
  if (!found) return place;
  return { kind: 'point', point: toPoint(along(found.from, unit(sub(found.to, found.from)), place.at)) };
}

/**
 * Adds a run. An end on the middle of a run makes a tee: that run is split there. The new run is the last of
 * `drawing.runs`, so a tool finds its corners there. The same drawing comes back where the two ends are one corner, are
 * joined already, or can't be found.
 */
export function addRun(
  drawing: Drawing,
  ends: { readonly from: EndPlace; readonly to: EndPlace; readonly wallTypeId?: string },
  newId: NewId,
): Drawing {
  const wallTypeId = ends.wallTypeId ?? drawing.wallTypes[0]?.id;
  if (wallTypeId === undefined || !drawing.wallTypes.some((type) => type.id === wallTypeId)) return drawing;
  if (drawing.runs.length >= MOST_THINGS) return drawing;
  const onSameRun = ends.from.kind === 'run' && ends.to.kind === 'run' && ends.from.runId === ends.to.runId;
  if (onSameRun) return drawing;
  const from = settle(drawing, ends.from, newId);
  if (!from) return drawing;
  const to = settle(from.drawing, ends.to, newId);
  if (!to || from.cornerId === to.cornerId || areJoined(to.drawing, from.cornerId, to.cornerId)) return drawing;
  const a = findCorner(to.drawing, from.cornerId);
  const b = findCorner(to.drawing, to.cornerId);
  if (!a || !b || samePoint(a, b)) return drawing;
  const run: WallRun = { id: newId(), from: from.cornerId, to: to.cornerId, wallTypeId };
  return { ...to.drawing, runs: [...to.drawing.runs, run] };
}

/** Where an end would be put, as a point; null where its corner or run is gone. */
export function pointOfPlace(drawing: Drawing, place: EndPlace): PlanPoint | null {
  const fixed = fixPlace(drawing, place);
  if (fixed.kind === 'point') return fixed.point;
  const corner = fixed.kind === 'corner' ? findCorner(drawing, fixed.cornerId) : undefined;
  return corner ? { x: corner.x, y: corner.y } : null;
}
