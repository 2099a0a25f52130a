/** Deletes a thing and what can't stand without it. */
import { dot } from '../../geometry/vec';
import type { ThingRef } from '../../things';
import type { Drawing, Opening, WallRun } from '../schema';
import { areJoined, findCorner, lengthBetween, otherEnd, runsByCorner, placeAlong } from './find';
import { deleteKeepClear } from './keepClears';
import { deleteBondBeam, deleteControlHeight } from './heights';
import { areInLine, directionFrom, planOf } from './straight';
import { deleteWallType } from './settings';

function without<T extends { readonly id: string }>(list: T[], ids: ReadonlySet<string>): T[] {
  return list.some((thing) => ids.has(thing.id)) ? list.filter((thing) => !ids.has(thing.id)) : list;
}

/** Runs gone, with their openings and the corners that no other run uses. Corners at those places only are looked at. */
function withoutRuns(drawing: Drawing, runIds: ReadonlySet<string>): Drawing {
  const ends = new Set(drawing.runs.flatMap((run) => (runIds.has(run.id) ? [run.from, run.to] : [])));
  const runs = without(drawing.runs, runIds);
  for (const run of runs) {
    ends.delete(run.from);
    ends.delete(run.to);
  }
  return {
    ...drawing,
    runs,
    openings: drawing.openings.some((opening) => runIds.has(opening.runId))
      ? drawing.openings.filter((opening) => !runIds.has(opening.runId))
      : drawing.openings,
    corners: without(drawing.corners, ends),
  };
}

/** Two runs at a corner as the first that ends there and the second that starts there, where they are drawn so. */
function inOrder(a: WallRun, b: WallRun, cornerId: string): readonly [WallRun, WallRun] | null {
  if (a.to === cornerId && b.from === cornerId) return [a, b];
  if (b.to === cornerId && a.from === cornerId) return [b, a];
  return null;
}

/**
 * Takes a corner out from between two runs of one wall type drawn one after the other and makes them one, which keeps the
 * first's id. Openings of the second keep their distance from its far end. Null where they can't be one.
 */
function joinRunsAt(drawing: Drawing, cornerId: string, a: WallRun, b: WallRun): Drawing | null {
  const order = inOrder(a, b, cornerId);
  if (!order || a.wallTypeId !== b.wallTypeId) return null;
  const [first, second] = order;
  if (first.from === second.to || areJoined(drawing, first.from, second.to)) return null;
  const corner = findCorner(drawing, cornerId);
  const from = findCorner(drawing, first.from);
  const to = findCorner(drawing, second.to);
  if (!corner || !from || !to) return null;
  const shift = lengthBetween(from, to) - lengthBetween(corner, to);
  const moved = (opening: Opening): Opening =>
    opening.runId === second.id ? { ...opening, runId: first.id, at: placeAlong(opening.at + shift) } : opening;
  return {
    ...drawing,
    runs: drawing.runs.flatMap((run) => {
      if (run.id === second.id) return [];
      return run.id === first.id ? [{ ...run, to: second.to }] : [run];
    }),
    corners: drawing.corners.filter((one) => one.id !== cornerId),
    openings: drawing.openings.some((opening) => opening.runId === second.id)
      ? drawing.openings.map(moved)
      : drawing.openings,
  };
}

/** Joins the two runs at a corner that is no corner any more: they go on in one line. */
function joinStraight(drawing: Drawing, cornerId: string): Drawing {
  const plan = planOf(drawing);
  const [a, b, more] = plan.runsAt.get(cornerId) ?? [];
  if (!a || !b || more) return drawing;
  const toA = directionFrom(plan, a, cornerId);
  const toB = directionFrom(plan, b, cornerId);
  if (!areInLine(toA, toB) || dot(toA, toB) >= 0) return drawing;
  return joinRunsAt(drawing, cornerId, a, b) ?? drawing;
}

/** Deletes a run, its openings, and the corners left without a run; the bar of a tee becomes one run again. */
export function deleteRun(drawing: Drawing, runId: string): Drawing {
  const run = drawing.runs.find((one) => one.id === runId);
  if (!run) return drawing;
  const wasTee = runsByCorner(drawing);
  const rest = withoutRuns(drawing, new Set([runId]));
  const tees = [run.from, run.to].filter((id) => wasTee.get(id)?.length === 3);
  return tees.reduce(joinStraight, rest);
}

/**
 * Deletes a corner. Between two runs drawn one after the other, its neighbours are joined by one straight run; at a tee the
 * bar becomes one run and the stem goes; otherwise its runs go with it.
 */
export function deleteCorner(drawing: Drawing, cornerId: string): Drawing {
  if (!findCorner(drawing, cornerId)) return drawing;
  const plan = planOf(drawing);
  const here = plan.runsAt.get(cornerId) ?? [];
  const [a, b] = here;
  if (a && b && here.length === 2) {
    const joined = joinRunsAt(drawing, cornerId, a, b);
    if (joined) return joined;
  }
  if (here.length === 3) {
    const stem = here.find((run) => {
      const [p, q] = here.filter((other) => other !== run).map((other) => directionFrom(plan, other, cornerId));
      return p && q && areInLine(p, q) && dot(p, q) < 0;
    });
    const joined = stem ? deleteRun(drawing, stem.id) : drawing;
    if (!findCorner(joined, cornerId)) return joined;
  }
  const gone = withoutRuns(drawing, new Set(here.map((run) => run.id)));
  const rest = { ...gone, corners: without(gone.corners, new Set([cornerId])) };
  return here
    .map((run) => otherEnd(run, cornerId))
    .filter((id) => plan.runsAt.get(id)?.length === 3)
    .reduce(joinStraight, rest);
}

/** Deletes any thing that a drawing holds; the same drawing comes back where it holds no such thing or can't lose it. */
export function deleteThing(drawing: Drawing, thing: ThingRef): Drawing {
  switch (thing.kind) {
    case 'corner':
      return deleteCorner(drawing, thing.id);
    case 'run':
      return deleteRun(drawing, thing.id);
    case 'opening': {
      const openings = without(drawing.openings, new Set([thing.id]));
      return openings === drawing.openings ? drawing : { ...drawing, openings };
    }
    case 'keepClear':
      return deleteKeepClear(drawing, thing.id);
    case 'boundary':
      return drawing.boundary === null ? drawing : { ...drawing, boundary: null };
    case 'controlHeight':
      return deleteControlHeight(drawing, thing.id);
    case 'bondBeam':
      return deleteBondBeam(drawing, thing.id);
    case 'wallType':
      return deleteWallType(drawing, thing.id);
    default:
      return drawing;
  }
}
