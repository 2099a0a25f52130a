/** What a wall type asks of its bond. */
import type { WallType } from '../drawing/schema';
import type { BondLimits } from './courseFill';
import { offsetPart, unitSize } from './unitSize';

/** The limits of a wall type. The wanted lap is what the bond's offset gives, or the least lap where that is more. */
export function bondLimits(wallType: WallType): BondLimits {
  const unit = unitSize(wallType).along;
  const { headJoint, leastLap, leastPiece } = wallType;
  const offset = offsetPart(wallType);
  const wantedLap = Math.max(leastLap, Math.floor(offset * (unit + headJoint.nominal)) - headJoint.nominal);
  return { unit, joint: headJoint, leastLap, leastPiece, wantedLap, offset };
}

/** No wall has this many units in a course; a drawing that asks for more is not laid. */
const MOST_PIECES = 20_000;

/** Whether a course of this length would have more pieces than any wall has. */
export function hasTooManyPieces(length: number, limits: BondLimits): boolean {
  return length / (limits.unit + limits.joint.least) > MOST_PIECES;
}
