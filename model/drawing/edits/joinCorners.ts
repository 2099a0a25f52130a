/** Joins a corner to another, or to the middle of a run: how a dragged end closes an outline or makes a tee. */
import type { Ticks } from '../../length/ticks';
import type { Drawing, WallRun } from '../schema';
import { addCornerOnRun } from './addRun';
import { findCorner, type NewId } from './find';
import { placeCorners } from './moveCorners';

/**
 * Makes one corner of two: the runs of the first go to the second, at the second's place. A run between the two goes, and so
 * does a second run between the same corners, with their openings.
 */
export function joinCorners(drawing: Drawing, cornerId: string, into: string): Drawing {
  const corner = findCorner(drawing, cornerId);
  const place = findCorner(drawing, into);
  if (!corner || !place || cornerId === into) return drawing;
  const moved = placeCorners(drawing, new Map([[cornerId, { x: place.x, y: place.y }]]));
  const kept: WallRun[] = [];
  const pairs = new Set<string>();
  for (const run of moved.runs) {
    const from = run.from === cornerId ? into : run.from;
    const to = run.to === cornerId ? into : run.to;
    const pair = from < to ? `${from} ${to}` : `${to} ${from}`;
    if (from === to || pairs.has(pair)) continue;
    pairs.add(pair);
    kept.push(from === run.from && to === run.to ? run : { ...run, from, to });
  }
  const runIds = new Set(kept.map((run) => run.id));
  return {
    ...moved,
    corners: moved.corners.filter((one) => one.id !== cornerId),
    runs: kept,
    openings: moved.openings.some((opening) => !runIds.has(opening.runId))
      ? moved.openings.filter((opening) => runIds.has(opening.runId))
      : moved.openings,
  };
}

/** Joins a corner to a run, which is split there: a tee. The same drawing comes back where the run is one of the corner's own. */
export function joinCornerToRun(drawing: Drawing, cornerId: string, runId: string, at: Ticks, newId: NewId): Drawing {
  const run = drawing.runs.find((one) => one.id === runId);
  if (!run || run.from === cornerId || run.to === cornerId || !findCorner(drawing, cornerId)) return drawing;
  const split = addCornerOnRun(drawing, runId, at, newId);
  return split ? joinCorners(split.drawing, cornerId, split.cornerId) : drawing;
}
