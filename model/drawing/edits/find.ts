/** Look-ups and limits that the edits share. */
import { distance } from '../../geometry/vec';
import type { PlanPoint } from '../../geometry/point';
import { roundTicks, type Ticks } from '../../length/ticks';
import { MAX_COORDINATE, type Corner, type Drawing, type WallRun } from '../schema';

/** Gives a new id each time it is asked: the caller's, because the model knows no chance. */
export type NewId = () => string;

/** As many corners, runs or openings as a drawing may hold. */
export const MOST_THINGS = 6000;

export function findCorner(drawing: Drawing, id: string): Corner | undefined {
  return drawing.corners.find((corner) => corner.id === id);
}

export function findRun(drawing: Drawing, id: string): WallRun | undefined {
  return drawing.runs.find((run) => run.id === id);
}

/** A run with its two corners; undefined where any is missing. */
export function runWithCorners(
  drawing: Drawing,
  id: string,
): { readonly run: WallRun; readonly from: Corner; readonly to: Corner } | undefined {
  const run = findRun(drawing, id);
  const from = run && findCorner(drawing, run.from);
  const to = run && findCorner(drawing, run.to);
  return run && from && to ? { run, from, to } : undefined;
}

/** Length between two places, rounded to the tick. */
export function lengthBetween(a: PlanPoint, b: PlanPoint): Ticks {
  return roundTicks(distance(a, b));
}

/** Whole and within the drawing's bounds. */
export function isOnPlan(point: PlanPoint): boolean {
  return (
    Number.isInteger(point.x) &&
    Number.isInteger(point.y) &&
    Math.abs(point.x) <= MAX_COORDINATE &&
    Math.abs(point.y) <= MAX_COORDINATE
  );
}

/** A distance along a run, kept within what a drawing can hold. */
export function placeAlong(at: number): Ticks {
  return roundTicks(Math.max(-MAX_COORDINATE, Math.min(MAX_COORDINATE, at)));
}

/** Whether a run already joins two corners, either way round. */
export function areJoined(drawing: Drawing, a: string, b: string): boolean {
  return drawing.runs.some((run) => (run.from === a && run.to === b) || (run.from === b && run.to === a));
}

/** Runs at each corner. */
export function runsByCorner(drawing: Drawing): ReadonlyMap<string, readonly WallRun[]> {
  const found = new Map<string, WallRun[]>(drawing.corners.map((corner) => [corner.id, []]));
  for (const run of drawing.runs) {
    found.get(run.from)?.push(run);
    found.get(run.to)?.push(run);
  }
  return found;
}

export function otherEnd(run: WallRun, cornerId: string): string {
  return run.from === cornerId ? run.to : run.from;
}

/** The list with one thing changed; the same list where nothing has that id or nothing changed. */
export function replaceById<T extends { readonly id: string }>(
  list: readonly T[],
  id: string,
  change: (thing: T) => T,
): T[] {
  let changed = false;
  const next = list.map((thing) => {
    if (thing.id !== id) return thing;
    const other = change(thing);
    if (other !== thing) changed = true;
    return other;
  });
  return changed ? next : (list as T[]);
}
