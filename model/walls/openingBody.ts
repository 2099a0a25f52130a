/** An opening's place in plan. */
import type { Opening } from '../drawing/schema';
import type { PlanPoint } from '../geometry/point';
import { add, along, scale, toPoint } from '../geometry/vec';
import type { RunGeometry } from './types';

/** The part of the wall that an opening takes out, counter-clockwise from its near jamb on the outside face. */
export function openingBody(
  run: RunGeometry,
  opening: Pick<Opening, 'at' | 'width'>,
): readonly [PlanPoint, PlanPoint, PlanPoint, PlanPoint] {
  const near = along(run.start, run.direction, opening.at);
  const far = along(run.start, run.direction, opening.at + opening.width);
  const across = scale(run.inward, run.thickness);
  return [toPoint(near), toPoint(far), toPoint(add(far, across)), toPoint(add(near, across))];
}
