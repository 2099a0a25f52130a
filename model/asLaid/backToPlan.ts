/** From a course that has drifted back to the plan: equal joints to the next control height, or the first line that can be met. */
import type { Course, Coursing } from '../coursing/types';
import type { Drawing } from '../drawing/schema';
import { roundTicks, ticks, type Ticks } from '../length/ticks';
import { coursedType } from '../survey/coursedType';
import type { BackToPlan, LaidHeight } from './types';

/**
 * The joints above a course as laid. Between its top and a line n courses up lie n units, whose heights are what they are,
 * and n joints: equal ones of (rise − units) / n reach the line exactly, and any line is in reach whose equal joint is
 * inside the wall type's limits, for n joints sum to anything between n × least and n × most. A lift ends at its beam, which is
 * formed to its own height.
 */
export function backToPlan(drawing: Drawing, coursing: Coursing, laid: LaidHeight): BackToPlan {
  const { bedJoint } = coursedType(drawing);
  const from = coursing.courses.find(({ number }) => number === laid.course);
  const left = coursing.courses.filter(({ number, lift }) => number > laid.course && lift === from?.lift);
  const drift = ticks(laid.height - (from?.top ?? laid.height));
  const control = nextControl(coursing, left);
  const sums = unitSums(left);
  const jointTo = (count: number): number => ((left[count - 1] as Course).top - laid.height - sums[count]!) / count;
  const allowed = (joint: number) => joint >= bedJoint.least && joint <= bedJoint.most;

  let first: BackToPlan['first'] = null;
  for (let count = 1; count <= left.length && !first; count++) {
    const joint = jointTo(count);
    const { number, top } = left[count - 1] as Course;
    if (allowed(joint)) first = { course: number, height: top, joint };
  }
  const place = { runId: laid.runId, at: laid.at };
  const common = { place, course: laid.course, drift, control, first };
  if (!control) return { ...common, joint: null, nearest: null };
  const count = control.course - laid.course;
  const exact = jointTo(count);
  const held = Math.min(bedJoint.most, Math.max(bedJoint.least, exact));
  return {
    ...common,
    joint: { exact, count, within: allowed(exact) },
    nearest: roundTicks(laid.height + sums[count]! + count * held),
  };
}

/** Heights of the first n units left, for every n. */
function unitSums(left: readonly Course[]): readonly number[] {
  const sums = [0];
  for (const { top, bottom } of left) sums.push(sums[sums.length - 1]! + (top - bottom));
  return sums;
}

/** The lowest control height on a course that is left in this lift, else the lift's top. */
function nextControl(coursing: Coursing, left: readonly Course[]): BackToPlan['control'] {
  const tops = new Map<number, Ticks>(left.map(({ number, top }) => [number, top]));
  let next: BackToPlan['control'] = null;
  for (const { thing, course } of coursing.answer.controls) {
    const height = course === null ? undefined : tops.get(course);
    if (course === null || height === undefined || (next && next.course <= course)) continue;
    next = { thing, course, height };
  }
  const last = left[left.length - 1];
  return next ?? (last ? { thing: null, course: last.number, height: last.top } : null);
}
