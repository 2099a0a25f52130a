/** The model's edits as the tools use them, and the few look-ups that go with them. */
import { addRun, type EndPlace } from '../../model/drawing/edits/addRun';
import { standInside } from '../../model/drawing/edits/closeLoop';
import { findCorner, otherEnd, runWithCorners, type NewId } from '../../model/drawing/edits/find';
import type { Corner, Drawing, Opening } from '../../model/drawing/schema';
import type { PlanPoint, Vec } from '../../model/geometry/point';
import { distance, perp, sub, unit } from '../../model/geometry/vec';
import { roundTicks, type Ticks } from '../../model/length/ticks';
import type { SnapAnchor } from '../../model/snapping/types';

export function cornerById(drawing: Drawing, id: string): Corner | null {
  return findCorner(drawing, id) ?? null;
}

export function openingById(drawing: Drawing, id: string): Opening | null {
  return drawing.openings.find((opening) => opening.id === id) ?? null;
}

export interface RunLine {
  readonly from: PlanPoint;
  readonly direction: Vec;
  /** To the left, into the wall's body. */
  readonly inward: Vec;
  readonly length: Ticks;
}

export function runLine(drawing: Drawing, runId: string): RunLine | null {
  const found = runWithCorners(drawing, runId);
  if (!found) return null;
  const direction = unit(sub(found.to, found.from));
  return { from: found.from, direction, inward: perp(direction), length: roundTicks(distance(found.from, found.to)) };
}

/** Draws a run; one that closes its chain turns the whole outline so that it stands inside its line. */
export function drawRun(
  drawing: Drawing,
  from: EndPlace,
  to: EndPlace,
  chainStart: string | null,
  newId: NewId,
): Drawing {
  // A run goes on in its neighbour's wall type, so that a wall does not change thickness at a corner unasked.
  const wallTypeId = drawing.runs.at(-1)?.wallTypeId;
  const drawn = addRun(drawing, { from, to, wallTypeId }, newId);
  const closes = drawn !== drawing && to.kind === 'corner' && to.cornerId === chainStart;
  return closes ? standInside(drawn, to.cornerId) : drawn;
}

/** Directions of the runs at a corner, away from it. */
export function directionsAt(drawing: Drawing, cornerId: string | null): Vec[] {
  const here = cornerId === null ? null : cornerById(drawing, cornerId);
  if (!here) return [];
  return drawing.runs.flatMap((run) => {
    if (run.from !== here.id && run.to !== here.id) return [];
    const there = cornerById(drawing, otherEnd(run, here.id));
    return there ? [unit(sub(there, here))] : [];
  });
}

/** What a corner being moved is held by: its neighbours, each with its other runs, and the ids that move with it. */
export function neighboursOf(
  drawing: Drawing,
  cornerId: string,
): { anchors: SnapAnchor[]; moving: ReadonlySet<string> } {
  const runs = drawing.runs.filter((run) => run.from === cornerId || run.to === cornerId);
  const moved = new Set(runs.map((run) => run.id));
  const anchors = runs.flatMap((run) => {
    const there = cornerById(drawing, otherEnd(run, cornerId));
    if (!there) return [];
    const rest = { ...drawing, runs: drawing.runs.filter((one) => !moved.has(one.id)) };
    return [{ point: { x: there.x, y: there.y }, along: directionsAt(rest, there.id) }];
  });
  return { anchors, moving: new Set([cornerId, ...moved]) };
}
