/** Gives a run an exact length or bearing, and decides what moves with its far end. */
import type { PlanPoint, Vec } from '../../geometry/point';
import { along, cross, distance, dot, fromBearing, sub, toPoint, unit } from '../../geometry/vec';
import { roundTicks, ticks, type Ticks } from '../../length/ticks';
import type { Drawing, WallRun } from '../schema';
import { otherEnd, runWithCorners } from './find';
import { moveCorner, placeCorners } from './moveCorners';
import { turnsBack } from './slideRun';
import { areInLine, directionFrom, planOf } from './straight';

/** Which corner of the run stays where it is. */
export type KeptEnd = 'from' | 'to';

/** The place on the plan in a direction whose distance rounds to `length`: of the ticks round the true one, the nearest. */
export function placeAt(from: PlanPoint, direction: Vec, length: Ticks): PlanPoint {
  const exact = along(from, direction, length);
  const middle = toPoint(exact);
  let best = middle;
  let bestMiss = Infinity;
  for (const dx of [0, -1, 1]) {
    for (const dy of [0, -1, 1]) {
      const place = { x: ticks(middle.x + dx), y: ticks(middle.y + dy) };
      if (roundTicks(distance(from, place)) !== length) continue;
      const miss = Math.abs(cross(direction, sub(place, exact)));
      if (miss < bestMiss) [best, bestMiss] = [place, miss];
    }
  }
  return best;
}

type Plan = ReturnType<typeof planOf>;

/** Every corner that is joined to `start` otherwise than by `run`. */
function joinedTo(plan: Plan, start: string, run: WallRun): ReadonlySet<string> {
  const reached = new Set<string>([start]);
  const waiting = [start];
  for (let id = waiting.pop(); id !== undefined; id = waiting.pop()) {
    for (const other of plan.runsAt.get(id) ?? []) {
      if (other.id === run.id) continue;
      const next = otherEnd(other, id);
      if (reached.has(next)) continue;
      reached.add(next);
      waiting.push(next);
    }
  }
  return reached;
}

/** Which runs in line with a move give way to it: any of them, or those long enough not to turn back on themselves. */
type GivesWay = 'any' | 'longEnough';

/**
 * The corners carried along when one side of a closed outline grows: from the far end on, through every run that is not
 * in line with the move or can't give way to it; the others stretch or shorten. Null where the kept corner would be
 * carried too.
 */
function carriedAlong(
  plan: Plan,
  run: WallRun,
  [kept, far]: readonly [string, string],
  shift: Vec,
  givesWay: GivesWay,
): ReadonlySet<string> | null {
  const direction = unit(shift);
  const carried = new Set<string>([far]);
  const waiting = [far];
  for (let id = waiting.pop(); id !== undefined; id = waiting.pop()) {
    for (const other of plan.runsAt.get(id) ?? []) {
      if (other.id === run.id) continue;
      const next = otherEnd(other, id);
      if (carried.has(next)) continue;
      const here = plan.corners.get(id);
      const there = plan.corners.get(next);
      if (!here || !there) continue;
      const away = directionFrom(plan, other, id);
      // The near end of the stretching run moves towards its far end by this much.
      const shortens = dot(shift, away);
      if (areInLine(away, direction) && (givesWay === 'any' || shortens < distance(here, there))) continue;
      if (next === kept) return null;
      carried.add(next);
      waiting.push(next);
    }
  }
  return carried;
}

function moveFarEnd(drawing: Drawing, run: WallRun, keep: KeptEnd, place: PlanPoint): Drawing {
  const plan = planOf(drawing);
  const far = keep === 'from' ? run.to : run.from;
  const kept = keep === 'from' ? run.from : run.to;
  const corner = plan.corners.get(far);
  if (!corner) return drawing;
  const shift = sub(place, corner);
  if (shift.x === 0 && shift.y === 0) return drawing;
  const joined = joinedTo(plan, far, run);
  const carried = joined.has(kept) ? carriedAlong(plan, run, [kept, far], shift, 'longEnough') : joined;
  if (!carried) {
    // Walls that would give way but are too short leave no answer; where none runs the same way, the corner moves alone.
    return carriedAlong(plan, run, [kept, far], shift, 'any') ? drawing : moveCorner(drawing, far, place);
  }
  const places = new Map<string, PlanPoint>();
  for (const id of carried) {
    const one = plan.corners.get(id);
    if (one) places.set(id, { x: ticks(one.x + shift.x), y: ticks(one.y + shift.y) });
  }
  const moved = placeCorners(drawing, places);
  const stretched = drawing.runs.filter((one) => carried.has(one.from) !== carried.has(one.to) && one.id !== run.id);
  return turnsBack(drawing, moved, stretched) ? drawing : moved;
}

/**
 * Gives a run a length; the corner at the kept end stays. What is joined to the far end only is carried along whole. In a
 * closed outline the walls beyond the far end are carried along, and the walls that run the same way as this one stretch,
 * so a rectangle stays a rectangle and every other wall keeps its length. Where none runs the same way (a triangle) only the
 * far corner moves. The same drawing comes back where a wall would turn back on itself.
 */
export function setRunLength(drawing: Drawing, runId: string, length: Ticks, keep: KeptEnd): Drawing {
  const found = runWithCorners(drawing, runId);
  if (!found || length <= 0 || !Number.isInteger(length)) return drawing;
  const [kept, far] = keep === 'from' ? [found.from, found.to] : [found.to, found.from];
  const direction = unit(sub(far, kept));
  if (direction.x === 0 && direction.y === 0) return drawing;
  if (roundTicks(distance(kept, far)) === length) return drawing;
  return moveFarEnd(drawing, found.run, keep, placeAt(kept, direction, length));
}

/**
 * Turns a run about its kept corner to a bearing of the run's own direction (first corner to second), in degrees
 * counter-clockwise from +x; its length stays. What is joined to the far end only is carried along without turning; in a
 * closed outline only the far corner moves.
 */
export function setRunAngle(drawing: Drawing, runId: string, degrees: number, keep: KeptEnd): Drawing {
  const found = runWithCorners(drawing, runId);
  if (!found || !Number.isFinite(degrees)) return drawing;
  const [kept, far] = keep === 'from' ? [found.from, found.to] : [found.to, found.from];
  const length = roundTicks(distance(kept, far));
  if (length === 0) return drawing;
  const place = placeAt(kept, fromBearing(keep === 'from' ? degrees : degrees + 180), length);
  const plan = planOf(drawing);
  if (joinedTo(plan, far.id, found.run).has(kept.id)) return moveCorner(drawing, far.id, place);
  return moveFarEnd(drawing, found.run, keep, place);
}
