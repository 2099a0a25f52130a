/** Units whole and cut, by run and lift. */
import type { Bond, BondPattern, RunBond } from '../bond/types';
import { unitSize } from '../bond/unitSize';
import type { Coursing } from '../coursing/types';
import type { Drawing } from '../drawing/schema';
import type { Walls } from '../walls/types';
import { cutPlan } from './cutPlan';
import type { CourseCount, UnitCount } from './types';

export interface UnitCounts {
  readonly units: UnitCount;
  readonly unitsByRun: readonly { readonly runId: string; readonly count: UnitCount }[];
  readonly unitsByLift: readonly { readonly lift: number; readonly count: UnitCount }[];
  readonly unitsByCourse: readonly CourseCount[];
}

/** Steps that one run's closers of one lift may take to prove their cutting plan. */
const CLOSER_WORK = 20_000;

const NONE: UnitCount = { whole: 0, closers: 0, cutFrom: 0, total: 0 };

function sum(a: UnitCount, b: UnitCount): UnitCount {
  return {
    whole: a.whole + b.whole,
    closers: a.closers + b.closers,
    cutFrom: a.cutFrom + b.cutFrom,
    total: a.total + b.total,
  };
}

/** How often each pattern of a run is laid in each lift. */
function coursesByLift(run: RunBond, coursing: Coursing): Map<number, Map<number, number>> {
  const lifts = new Map<number, Map<number, number>>();
  run.patternByCourse.forEach((pattern, i) => {
    const lift = coursing.courses[i]?.lift;
    if (lift === undefined) return;
    const laid = lifts.get(lift) ?? new Map<number, number>();
    laid.set(pattern, (laid.get(pattern) ?? 0) + 1);
    lifts.set(lift, laid);
  });
  return lifts;
}

/** Returns belong to the crossing run and are counted there, so that a corner counts once. */
function countLift(patterns: readonly BondPattern[], laid: ReadonlyMap<number, number>, unit: number, kerf: number) {
  let whole = 0;
  const closers: number[] = [];
  for (const [index, times] of laid)
    for (const piece of patterns[index]?.pieces ?? []) {
      if (piece.kind === 'unit') whole += times;
      if (piece.kind === 'closer') for (let i = 0; i < times; i += 1) closers.push(piece.end - piece.start);
    }
  const cutFrom = cutPlan(closers, unit, kerf, CLOSER_WORK).stock.length;
  return { whole, closers: closers.length, cutFrom, total: whole + cutFrom };
}

/** Adds up every course over the runs; a run's patterns are counted once each. */
function countCourses(bond: Bond, coursing: Coursing): CourseCount[] {
  const counts = coursing.courses.map(({ number, lift }) => ({ course: number, lift, whole: 0, closers: 0 }));
  for (const { patterns, patternByCourse } of bond.runs) {
    const found = patterns.map(({ pieces }) => {
      const closers = pieces.filter((piece) => piece.kind === 'closer').length;
      return { closers, whole: pieces.filter((piece) => piece.kind === 'unit').length };
    });
    patternByCourse.forEach((pattern, i) => {
      const [count, add] = [counts[i], found[pattern]];
      if (!count || !add) return;
      count.whole += add.whole;
      count.closers += add.closers;
    });
  }
  return counts;
}

/**
 * Counts what is laid. Closers are cut by the plan that takes the fewest units, each saw cut losing a kerf (the kit's): an
 * offcut long enough serves another closer of the same run and lift, where it falls, and is thrown away otherwise. So the
 * counts by run and by lift both add up to the whole.
 */
export function countUnits(drawing: Drawing, walls: Walls, coursing: Coursing, bond: Bond): UnitCounts {
  const units = new Map(drawing.wallTypes.map((type) => [type.id, unitSize(type).along]));
  const byLift = new Map<number, UnitCount>(coursing.lifts.map((lift) => [lift.number, NONE]));
  let total = NONE;
  const unitsByRun = bond.runs.map((run) => {
    const unit = units.get(walls.runById.get(run.runId)?.wallTypeId ?? '') ?? 0;
    let count = NONE;
    for (const [lift, laid] of coursesByLift(run, coursing)) {
      const part = countLift(run.patterns, laid, unit, drawing.poleKit.kerf);
      count = sum(count, part);
      byLift.set(lift, sum(byLift.get(lift) ?? NONE, part));
    }
    total = sum(total, count);
    return { runId: run.runId, count };
  });
  const unitsByLift = [...byLift].sort((a, b) => a[0] - b[0]).map(([lift, count]) => ({ lift, count }));
  return { units: total, unitsByRun, unitsByLift, unitsByCourse: countCourses(bond, coursing) };
}
