/** Heights near one that fall on course lines of the nominal joint: where a sill, a head or a beam costs nothing. */
import type { Drawing } from '../drawing/schema';
import { ticks, type Ticks } from '../length/ticks';
import { coursedType } from '../survey/coursedType';
import { countsWithin } from './fitInterval';
import type { Coursing } from './types';

export interface GaugeHeights {
  /** The nearest at or below and at or above the height; the same one where it falls on a course line itself. */
  readonly below: Ticks | null;
  readonly above: Ticks;
  /** Whether whole courses can meet the height itself by joints within their limits, other heights left out of account. */
  readonly canBeMet: boolean;
}

/**
 * The gauge starts on the first course, and anew on each bond beam: a height is measured in the lift that it lies in, and
 * above the last one where the wall would go on. `below` is null under the first course.
 */
export function gaugeHeights(drawing: Drawing, coursing: Coursing, height: Ticks): GaugeHeights {
  const { unit, bedJoint } = coursedType(drawing);
  const gauge = unit.height + bedJoint.nominal;
  const first = coursing.courses[0]?.top ?? ticks(0);
  const beamTops = coursing.lifts.flatMap(({ beam }) => (beam && beam.top <= height ? [beam.top] : []));
  const base = beamTops[beamTops.length - 1];
  const from = base ?? first;
  if (height < from) return { below: null, above: from, canBeMet: false };
  const rise = height - from;
  // On a beam the wall goes on with a course at least; the first course is one itself.
  const least = base === undefined ? 0 : 1;
  const count = Math.floor(rise / gauge);
  const { from: fewest, to: most } = countsWithin(rise, rise, unit.height, bedJoint);
  const canBeMet = Math.max(fewest, least) <= most;
  if (count < least) return { below: null, above: ticks(from + gauge), canBeMet };
  const below = ticks(from + count * gauge);
  return { below, above: below === height ? below : ticks(below + gauge), canBeMet };
}
