/** What the rules that guard people make of a wall's height. */
import type { Drawing } from '../drawing/schema';
import { ticks, type Ticks } from '../length/ticks';
import { ruleValue } from './registry';

/**
 * Width of the limited-access zone along the side of a wall without a scaffold, over its full length: the height to be built
 * + 4 ft unless the site has its own number (29 CFR 1926.706(a), secondary).
 */
export function accessZoneWidth(drawing: Pick<Drawing, 'ruleValues'>, height: Ticks): Ticks {
  return ticks(height + ruleValue(drawing, 'accessZoneExtra'));
}

/** Whether a wall is braced until its permanent supports are in place: over 8 ft, not at 8 ft (29 CFR 1926.706(b), secondary). */
export function wantsBracing(drawing: Pick<Drawing, 'ruleValues'>, height: Ticks): boolean {
  return height > ruleValue(drawing, 'bracedOverHeight');
}
