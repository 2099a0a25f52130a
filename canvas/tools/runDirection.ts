/** Where a run being drawn ends: by the pointer, or by the length and angle that were typed. */
import { placeAt } from '../../model/drawing/edits/runLength';
import type { PlanPoint, Vec } from '../../model/geometry/point';
import { bearing, cross, dot, fromBearing, sub, unit } from '../../model/geometry/vec';
import { roundTicks, type Ticks } from '../../model/length/ticks';

export interface RunAim {
  readonly from: PlanPoint;
  /** Direction of the run before, towards `from`; null where a chain starts. */
  readonly before: Vec | null;
  readonly heldLength: Ticks | null;
  /** Degrees between the run before and this one; from +x where there is none before. */
  readonly heldAngle: number | null;
}

/** Angle between the run before and a run from its end to `to`, 0 to 180 degrees; null where there is none before. */
export function angleTo(aim: Pick<RunAim, 'from' | 'before'>, to: Vec): number | null {
  if (!aim.before) return null;
  const way = sub(to, aim.from);
  if (way.x === 0 && way.y === 0) return null;
  const back = { x: 0 - aim.before.x, y: 0 - aim.before.y };
  return (Math.abs(Math.atan2(cross(back, way), dot(back, way))) * 180) / Math.PI;
}

/** The end that the aim holds to, nearest to where the pointer is: a held angle turns to the pointer's side. */
export function aimedEnd(aim: RunAim, pointer: PlanPoint): PlanPoint {
  const { from, before, heldLength, heldAngle } = aim;
  if (heldLength === null && heldAngle === null) return pointer;
  const way = sub(pointer, from);
  const direction = heldAngle === null ? unit(way) : heldDirection(before, heldAngle, way);
  const free = dot(way, direction);
  const length = heldLength ?? roundTicks(Math.max(0, free));
  if ((direction.x === 0 && direction.y === 0) || length === 0) return from;
  return placeAt(from, direction, length);
}

function heldDirection(before: Vec | null, degrees: number, way: Vec): Vec {
  if (!before) return fromBearing(degrees);
  const back = bearing({ x: 0 - before.x, y: 0 - before.y });
  const left = fromBearing(back - degrees);
  const right = fromBearing(back + degrees);
  // A plan is drawn with its walls to the left more often than not: the left turn wins where the pointer does not say.
  return dot(way, right) > dot(way, left) ? right : left;
}

/** Where a run would go before the pointer has said anything: square to the left of the run before, or to the right. */
export function firstAim(from: PlanPoint, before: Vec | null, length: number): PlanPoint {
  const way = before ? { x: 0 - before.y, y: before.x } : { x: 1, y: 0 };
  return { x: roundTicks(from.x + way.x * length), y: roundTicks(from.y + way.y * length) };
}
