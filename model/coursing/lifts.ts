/** The lifts of the building, and those that rise too high between two bond beams. */
import type { Drawing } from '../drawing/schema';
import { roundTicks, ticks } from '../length/ticks';
import type { Reason } from '../reasons';
import { ruleValue } from '../rules/registry';
import type { Walls } from '../walls/types';
import type { PlanLift } from './layCourses';
import type { Lift } from './types';

/**
 * Holds each lift against the rule `liftToThickness`: its masonry, measured to the underside of the bond beam (NMAC
 * 14.7.4.23 A), is no taller than so many times the thinnest wall.
 */
export function checkLifts(
  drawing: Drawing,
  walls: Walls,
  planned: readonly PlanLift[],
): { lifts: Lift[]; reasons: Reason[] } {
  const thinnest = walls.runs.reduce((least, run) => Math.min(least, run.thickness), Infinity);
  const ratio = ruleValue(drawing, 'liftToThickness');
  const most = ticks(Number.isFinite(thinnest) ? roundTicks(ratio * thinnest) : Number.MAX_SAFE_INTEGER);
  const reasons: Reason[] = [];
  const lifts = planned.map(({ number, base, top, beam, firstCourse, lastCourse }): Lift => {
    const over = top - base - most;
    if (over > 0) {
      reasons.push({
        code: 'liftTooTall',
        weight: 'warning',
        thing: { kind: 'lift', id: String(number) },
        ...(beam ? { against: [{ kind: 'bondBeam', id: beam.id } as const] } : {}),
        rule: 'liftToThickness',
        amount: ticks(over),
        nearest: { below: ticks(base + most), above: null },
      });
    }
    return { number, base, top, beam, most, firstCourse, lastCourse };
  });
  return { lifts, reasons };
}
