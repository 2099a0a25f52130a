/** Moves the selected thing by the arrow keys: one tape step, or one module with shift. */
import { moveKeepClear } from '../../model/drawing/edits/keepClears';
import { moveCorner } from '../../model/drawing/edits/moveCorners';
import { moveOpening } from '../../model/drawing/edits/openings';
import { slideRun } from '../../model/drawing/edits/slideRun';
import type { Drawing } from '../../model/drawing/schema';
import type { PlanPoint, Vec } from '../../model/geometry/point';
import { dot } from '../../model/geometry/vec';
import { ticks, type Ticks } from '../../model/length/ticks';
import type { ThingRef } from '../../model/things';
import { unitAlong } from '../../model/walls/runs';
import { cornerById, openingById, runLine } from '../tools/edits';
import { drawnType } from '../tools/toolHost';

export const ARROWS: Readonly<Record<string, Vec>> = {
  ArrowLeft: { x: -1, y: 0 },
  ArrowRight: { x: 1, y: 0 },
  ArrowUp: { x: 0, y: 1 },
  ArrowDown: { x: 0, y: -1 },
};

/** One tape step, or with `far` one unit and its head joint. */
export function nudgeStep(drawing: Drawing, far: boolean): Ticks {
  const type = drawnType(drawing);
  return far && type ? ticks(unitAlong(type) + type.headJoint.nominal) : drawing.tapeStep;
}

/** A direction that agrees with neither axis of a thing that only moves along a line leaves it where it is. */
function along(way: Vec, line: Vec, step: Ticks): Ticks {
  const part = dot(way, line);
  return Math.abs(part) < 1e-6 ? ticks(0) : ticks(Math.sign(part) * step);
}

export function nudge(drawing: Drawing, thing: ThingRef, way: Vec, far: boolean): Drawing {
  const step = nudgeStep(drawing, far);
  const by: PlanPoint = { x: ticks(way.x * step), y: ticks(way.y * step) };
  if (thing.kind === 'corner' || thing.kind === 'pole') {
    const corner = cornerById(drawing, thing.id);
    return corner ? moveCorner(drawing, corner.id, { x: ticks(corner.x + by.x), y: ticks(corner.y + by.y) }) : drawing;
  }
  if (thing.kind === 'run') {
    const line = runLine(drawing, thing.id);
    return line ? slideRun(drawing, thing.id, along(way, line.inward, step)) : drawing;
  }
  if (thing.kind === 'opening') {
    const opening = openingById(drawing, thing.id);
    const line = opening && runLine(drawing, opening.runId);
    if (!opening || !line) return drawing;
    return moveOpening(drawing, opening.id, opening.runId, ticks(opening.at + along(way, line.direction, step)));
  }
  return thing.kind === 'keepClear' ? moveKeepClear(drawing, thing.id, by) : drawing;
}
