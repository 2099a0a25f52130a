/** Coursing made by hand, so that the bond and the takeoff are tested apart from the planner of courses. */
import type { Coursing, Course, Lift } from '../../model/coursing/types';
import { ticks, type Ticks } from '../../model/length/ticks';

/** Equal courses from zero: the first on `bedding`, each other on `joint`; one lift, no beam. */
export function evenCourses(count: number, unit: Ticks, joint: Ticks, bedding: Ticks = joint): Coursing {
  const courses = Array.from({ length: count }, (_, i): Course => {
    const bottom = ticks(bedding + i * (unit + joint));
    return { number: i + 1, lift: 1, bottom, top: ticks(bottom + unit), joint: i === 0 ? bedding : joint };
  });
  const top = courses.length > 0 ? courses[courses.length - 1]!.top : ticks(0);
  const lift: Lift = {
    number: 1,
    base: ticks(0),
    top,
    beam: null,
    most: ticks(top * 2),
    firstCourse: 1,
    lastCourse: count,
  };
  return {
    unitHeight: unit,
    courses,
    lifts: [lift],
    answer: { intervals: [], controls: [], cost: [0, 0, 0, 0, 0, 0] },
    others: [],
    top,
    reasons: [],
  };
}
