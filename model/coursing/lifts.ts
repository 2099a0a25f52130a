/** The lifts of the building, and those that rise too high between two bond beams. */
import type { Drawing } from '../drawing/schema';
import { roundTicks, ticks, type Ticks } from '../length/ticks';
import type { Reason } from '../reasons';
import { ruleValue } from '../rules/registry';
import type { Walls } from '../walls/types';
import type { PlanLift } from './layCourses';
import type { Course, Lift } from './types';

/**
 * Holds each lift against the rule `liftToThickness`: its masonry, measured to the underside of the bond beam (NMAC
 * 14.7.4.23 A), is no taller than so many times the thinnest wall. Where it is, the nearest height that would do is that
 * of the highest course line that a beam may be set on.
 */
export function checkLifts(
  drawing: Drawing,
  walls: Walls,
  planned: readonly PlanLift[],
  courses: readonly Course[],
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
        nearest: { below: highestLine(courses, number, base + most), above: null },
      });
    }
    return { number, base, top, beam, most, firstCourse, lastCourse };
  });
  return { lifts, reasons };
}

/** The highest course top of a lift at or below a height; null where even its first course is above. */
function highestLine(courses: readonly Course[], lift: number, most: number): Ticks | null {
  let highest: Ticks | null = null;
  for (const course of courses) if (course.lift === lift && course.top <= most) highest = course.top;
  return highest;
}
