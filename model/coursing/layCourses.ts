/** A plan turned into intervals, courses and lifts. */
import { roundTicks, ticks, type Ticks } from '../length/ticks';
import { jointOf } from './fitInterval';
import type { Problem } from './problem';
import type { RatedPlan } from './refine';
import type { Course, CourseInterval } from './types';

/** A height of a plan with the course whose top it is, counted through all lifts; 0 for none. */
export interface Line {
  readonly height: Ticks;
  readonly count: number;
  /** The last of those courses is a thinner one, and the bed joint is this. */
  readonly thin: boolean;
  readonly joint: number;
  /** Depth of the beam that starts here; 0 for none. */
  readonly beamDepth: Ticks;
  readonly beamId: string | null;
}

export interface PlanLift {
  readonly number: number;
  readonly base: Ticks;
  readonly top: Ticks;
  readonly beam: { readonly id: string; readonly soffit: Ticks; readonly top: Ticks } | null;
  readonly intervals: readonly CourseInterval[];
  readonly firstCourse: number;
  readonly lastCourse: number;
}

/** The plan's lines, and above them, where nothing ends the wall, courses of the nominal joint up to `openTop`. */
export function linesOf(problem: Problem, plan: RatedPlan, openTop: Ticks | null): Line[] {
  const lines = problem.stops.map((stop, i): Line => {
    const beam = stop.controls.find((control) => control.kind === 'bondBeam');
    return {
      height: ticks(plan.heights[i] as number),
      count: plan.counts[i] as number,
      thin: plan.thins[i] as boolean,
      joint: plan.joints[i] as number,
      beamDepth: stop.beamDepth,
      beamId: stop.beamDepth > 0 ? (beam?.thing.id ?? null) : null,
    };
  });
  if (openTop === null) return lines;
  const last = lines[lines.length - 1];
  const from = last ? last.height + last.beamDepth : problem.start;
  const gauge = problem.unit + problem.joint.nominal;
  const count = Math.max(last?.beamId ? 1 : 0, Math.round((openTop - from) / gauge));
  const joint = problem.joint.nominal;
  const height = ticks(from + count * gauge);
  return [...lines, { height, count, thin: false, joint, beamDepth: ticks(0), beamId: null }];
}

/** Lifts with their intervals of equal courses. `problem.start` is the top of course 1, in lift 1. */
export function liftsOf(problem: Problem, lines: readonly Line[]): PlanLift[] {
  const lifts: PlanLift[] = [];
  let base = ticks(0);
  let from = problem.start;
  let course = 1;
  let group: Line[] = [];
  const close = (last: Line | undefined): void => {
    const number = lifts.length + 1;
    const intervals = intervalsOf(problem.unit, from, group, number, course);
    const lastCourse = course + group.reduce((sum, line) => sum + line.count, 0);
    const top = last?.height ?? from;
    const beam = last?.beamId ? { id: last.beamId, soffit: top, top: ticks(top + last.beamDepth) } : null;
    lifts.push({ number, base, top, beam, intervals, firstCourse: number === 1 ? 1 : course + 1, lastCourse });
    base = from = beam?.top ?? top;
    course = lastCourse;
    group = [];
  };
  for (const line of lines) {
    group.push(line);
    if (line.beamId !== null) close(line);
  }
  const courses = group.reduce((sum, line) => sum + line.count, 0);
  if (lifts.length === 0 || courses > 0) close(group[group.length - 1]);
  return lifts;
}

/**
 * One lift's intervals, as few as there can be from the bottom up: a line that an interval's equal courses pass anyway, to
 * the tick, does not break it. A thinner course ends its interval, which is its stop's alone.
 */
function intervalsOf(
  unit: Ticks,
  start: Ticks,
  lines: readonly Line[],
  lift: number,
  before: number,
): CourseInterval[] {
  const intervals: CourseInterval[] = [];
  let from = start;
  let course = before;
  for (let i = 0; i < lines.length;) {
    let end = lines.length - 1;
    while (end > i && !passes(from, lines.slice(i, end + 1))) end--;
    const count = lines.slice(i, end + 1).reduce((sum, line) => sum + line.count, 0);
    const last = lines[end] as Line;
    const to = last.height;
    if (count > 0) {
      const joint = last.thin ? last.joint : jointOf(from, to, count, unit);
      intervals.push({
        lift,
        fromHeight: from,
        toHeight: to,
        count,
        joint,
        firstCourse: course + 1,
        lastCourse: course + count,
        ...(last.thin ? { thin: roundTicks(to - from - count * joint - (count - 1) * unit) } : {}),
      });
    }
    from = to;
    course += count;
    i = end + 1;
  }
  return intervals;
}

function passes(from: Ticks, lines: readonly Line[]): boolean {
  if (lines.length > 1 && lines.some((line) => line.thin)) return false;
  const to = (lines[lines.length - 1] as Line).height;
  const total = lines.reduce((sum, line) => sum + line.count, 0);
  let count = 0;
  return lines.every((line) => {
    count += line.count;
    return courseTop(from, to, total, count) === line.height;
  });
}

/** Top of the k-th of `count` equal courses, from its exact height, rounded once. */
export function courseTop(from: Ticks, to: Ticks, count: number, k: number): Ticks {
  return count === 0 ? from : roundTicks(from + (k * (to - from)) / count);
}

/** Top of an interval's k-th course, from its exact height, rounded once. */
function topIn(interval: CourseInterval, unit: Ticks, k: number): Ticks {
  const { fromHeight, toHeight, count, joint, thin } = interval;
  if (thin === undefined) return courseTop(fromHeight, toHeight, count, k);
  return k === count ? toHeight : roundTicks(fromHeight + k * (unit + joint));
}

/** Every course from the bottom up. Course 1 lies on the least bedding, the first of each later lift on its beam. */
export function coursesOf(problem: Problem, bedding: Ticks, lifts: readonly PlanLift[]): Course[] {
  const courses: Course[] = [{ number: 1, lift: 1, bottom: bedding, top: problem.start, joint: bedding }];
  let below: Ticks = problem.start;
  for (const lift of lifts) {
    if (lift.number > 1) below = lift.base;
    for (const interval of lift.intervals) {
      for (let k = 1; k <= interval.count; k++) {
        const top = topIn(interval, problem.unit, k);
        const isThin = interval.thin !== undefined && k === interval.count;
        const bottom = ticks(top - (isThin ? (interval.thin as Ticks) : problem.unit));
        courses.push({ number: courses.length + 1, lift: lift.number, bottom, top, joint: ticks(bottom - below) });
        below = top;
      }
    }
  }
  return courses;
}
