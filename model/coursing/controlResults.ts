/** What became of every height, in one plan. */
import { ticks, type Ticks } from '../length/ticks';
import type { Control, Problem, Stop } from './problem';
import { nearestReachable } from './reachable';
import type { Plan } from './search';
import type { ControlResult, Course } from './types';

/** Results for the controls of every stop, then for those that no course was asked to meet. */
export function controlResults(
  problem: Problem,
  plan: Plan,
  courses: readonly Course[],
  left: readonly Control[],
): ControlResult[] {
  const courseAt = new Map(courses.map((course) => [course.top, course.number]));
  const results = problem.stops.flatMap((stop: Stop, i) => {
    const got = ticks(plan.heights[i] as number);
    const missed = stop.controls.some((control) => !isMet(control, got));
    const nearest = missed ? nearestReachable(problem, plan, i) : NONE;
    return stop.controls.map((control) => result(control, got, courseAt.get(got) ?? null, nearest));
  });
  const lines = courses.map((course) => course.top);
  for (const control of left) {
    const { below, above } = neighbours(lines, control.height);
    const got = nearer(control.height, below, above);
    results.push(result(control, got, courseAt.get(got) ?? null, { below, above }));
  }
  return results;
}

const NONE = { below: null, above: null };

function isMet(control: Control, got: Ticks): boolean {
  return Math.abs(got - control.height) <= (control.hold === 'hard' ? 0 : control.tolerance);
}

function result(
  control: Control,
  got: Ticks,
  course: number | null,
  nearest: { below: Ticks | null; above: Ticks | null },
): ControlResult {
  const met = isMet(control, got);
  return {
    thing: control.thing,
    kind: control.kind,
    wanted: control.height,
    got,
    miss: ticks(got - control.height),
    course,
    hold: control.hold,
    met,
    below: met ? null : nearest.below,
    above: met ? null : nearest.above,
  };
}

/** The course lines next below (or at) and above (or at) a height. */
function neighbours(lines: readonly Ticks[], height: Ticks): { below: Ticks | null; above: Ticks | null } {
  let low = 0;
  let high = lines.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if ((lines[middle] as Ticks) < height) low = middle + 1;
    else high = middle;
  }
  const above = lines[low] ?? null;
  return { below: above === height ? height : (lines[low - 1] ?? null), above };
}

function nearer(height: Ticks, below: Ticks | null, above: Ticks | null): Ticks {
  if (below === null) return above ?? height;
  if (above === null) return below;
  return height - below <= above - height ? below : above;
}
