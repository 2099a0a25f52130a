/** Logged work against the plan: level, plumb and joints inside their tolerances, and the way back where it drifts. */
import type { Coursing } from '../coursing/types';
import type { Drawing } from '../drawing/schema';
import { ticks, type Ticks } from '../length/ticks';
import { ruleValue } from '../rules/registry';
import type { Walls } from '../walls/types';
import { backToPlan } from './backToPlan';
import { checkJoints } from './checkJoints';
import { finding, placeKey } from './finding';
import { levelAllowed, plumbAllowed } from './tolerances';
import type { AsLaid, LaidFinding, LaidHeight, LaidLog, LaidPlace, LaidPlumb, ToleranceSet } from './types';

/**
 * Checks a log. Courses are held to their planned heights within the most that level allows, and to each other along each
 * run between neighbouring readings and from end to end. Work grows as n log n of the log.
 */
export function checkLaid(
  drawing: Drawing,
  walls: Walls,
  coursing: Coursing,
  log: LaidLog,
  set: ToleranceSet = 'tms',
): AsLaid {
  const courseByNumber = new Map(coursing.courses.map((course) => [course.number, course]));
  const drawn = ({ runId, at }: LaidPlace) => {
    const run = walls.runById.get(runId);
    return run !== undefined && at >= 0 && at <= run.length;
  };
  const planned = (one: LaidPlace & { course: number }) => drawn(one) && courseByNumber.has(one.course);
  const heights = lastOf(log.heights.filter(planned), (one) => `${one.course} ${placeKey(one)}`);
  const joints = lastOf(log.joints.filter(planned), (one) => `${one.course} ${placeKey(one)}`);
  const plumbs = lastOf(log.plumbs.filter(drawn), (one) => `${one.from} ${placeKey(one)}`);

  const planOf = (one: LaidHeight): Ticks => courseByNumber.get(one.course)?.top ?? one.height;
  const heightMost = ruleValue(drawing, 'levelToleranceMost');
  const findings: LaidFinding[] = [
    ...heights.map((one) =>
      finding('height', [one], one.height - planOf(one), {
        rule: 'levelToleranceMost',
        most: ticks(heightMost),
      }),
    ),
    ...checkLevel(drawing, heights, set),
    ...checkPlumb(drawing, plumbs),
    ...checkJoints(drawing, joints, courseByNumber, set),
  ];
  const topmost = new Map<string, LaidHeight>();
  for (const one of heights) {
    const before = topmost.get(placeKey(one));
    if (!before || one.course > before.course) topmost.set(placeKey(one), one);
  }
  return {
    findings,
    back: [...topmost.values()].map((one) => backToPlan(drawing, coursing, one)),
    ignored: [
      ...[...log.heights, ...log.joints].filter((one) => !planned(one)),
      ...log.plumbs.filter((one) => !drawn(one)),
    ].map(({ id }) => id),
  };
}

/** Of readings alike by key the last; in the order of their first. */
function lastOf<T>(readings: readonly T[], keyOf: (one: T) => string): readonly T[] {
  return [...new Map(readings.map((one) => [keyOf(one), one])).values()];
}

function grouped<T>(readings: readonly T[], keyOf: (one: T) => string): readonly T[][] {
  const groups = new Map<string, T[]>();
  for (const one of readings) {
    const group = groups.get(keyOf(one));
    if (group) group.push(one);
    else groups.set(keyOf(one), [one]);
  }
  return [...groups.values()];
}

function checkLevel(drawing: Drawing, heights: readonly LaidHeight[], set: ToleranceSet): LaidFinding[] {
  return grouped(heights, ({ runId, course }) => `${course} ${runId}`).flatMap((group) => {
    const along = [...group].sort((a, b) => a.at - b.at);
    const pairs = along.slice(1).map((to, i) => [along[i]!, to] as const);
    if (along.length > 2) pairs.push([along[0]!, along[along.length - 1]!]);
    return pairs.map(([from, to]) =>
      finding('level', [from, to], to.height - from.height, levelAllowed(drawing, to.at - from.at, set)),
    );
  });
}

/** Each lift by itself, and every lift on those below: a wall plumb in each lift may still lean as a whole. */
function checkPlumb(drawing: Drawing, plumbs: readonly LaidPlumb[]): LaidFinding[] {
  return grouped(plumbs, placeKey).flatMap((group) => {
    const upwards = [...group].sort((a, b) => a.from - b.from);
    const found: LaidFinding[] = [];
    const chain: LaidPlumb[] = [];
    let lean = 0;
    for (const one of upwards) {
      found.push(finding('plumb', [one], one.lean, plumbAllowed(drawing, one.to - one.from)));
      lean += one.lean;
      chain.push(one);
      const [lowest, ...others] = chain;
      if (lowest && others.length > 0)
        found.push(finding('liftBase', [lowest, ...others], lean, plumbAllowed(drawing, one.to - lowest.from)));
    }
    return found;
  });
}
