/** What is not as in the course below. */
import type { Piece, RunBond } from '../bond/types';
import type { Coursing } from '../coursing/types';
import { ticks } from '../length/ticks';
import type { Walls } from '../walls/types';
import type { CourseChange, CourseRun } from './types';

/** Whether a run's own unit, rather than a return, stands at its end; null where nothing reaches it. */
function goesThrough(pieces: readonly Piece[], end: 0 | 1, length: number): boolean | null {
  const piece = end === 0 ? pieces[0] : pieces[pieces.length - 1];
  if (!piece) return null;
  const reaches = end === 0 ? piece.start <= 0 : piece.end >= length;
  return reaches ? piece.kind !== 'return' : false;
}

function turnsOf(walls: Walls, here: readonly CourseRun[], below: readonly CourseRun[]): CourseChange[] {
  const changes: CourseChange[] = [];
  const under = new Map(below.map((run) => [run.runId, run]));
  for (const { runId, pieces } of here) {
    const run = walls.runById.get(runId);
    const before = under.get(runId);
    if (!run || !before) continue;
    for (const end of [0, 1] as const) {
      const { kind, cornerId, others } = run.ends[end];
      if ((kind !== 'outside' && kind !== 'reentrant') || others.length !== 1) continue;
      const was = goesThrough(before.pieces, end, run.length);
      if (goesThrough(pieces, end, run.length) === true && was === false)
        changes.push({ what: 'cornerTurns', cornerId, runId });
    }
  }
  return changes;
}

function gapChanges(here: CourseRun, below: CourseRun | undefined): CourseChange[] {
  const key = (gap: CourseRun['gaps'][number]) => `${gap.what} ${gap.openingId}`;
  const under = new Set(below?.gaps.map(key));
  const now = new Set(here.gaps.map(key));
  const { runId } = here;
  const starts = here.gaps
    .filter((gap) => !under.has(key(gap)))
    .map(({ what, openingId }): CourseChange => {
      return { what: what === 'lintel' ? 'lintelStarts' : 'openingStarts', openingId, runId };
    });
  const ends = (below?.gaps ?? [])
    .filter((gap) => !now.has(key(gap)))
    .map(({ what, openingId }): CourseChange => {
      return { what: what === 'lintel' ? 'lintelEnds' : 'openingEnds', openingId, runId };
    });
  return [...ends, ...starts];
}

/** Changes of the course with this index (0 at the bottom); `below` is the course under it, empty for the first. */
export function changesAt(
  index: number,
  parts: { readonly walls: Walls; readonly coursing: Coursing; readonly runBonds: ReadonlyMap<string, RunBond> },
  here: readonly CourseRun[],
  below: readonly CourseRun[],
): CourseChange[] {
  const { walls, coursing, runBonds } = parts;
  const course = coursing.courses[index];
  const under = coursing.courses[index - 1];
  if (!course || !under) return [];
  const changes: CourseChange[] = [];
  const isNewLift = course.lift !== under.lift;
  if (isNewLift) {
    const beam = coursing.lifts.find((lift) => lift.number === under.lift)?.beam;
    changes.push({ what: 'newLift', beamId: beam?.id ?? null });
  }
  if (course.joint !== under.joint) changes.push({ what: 'bedJoint', from: under.joint, to: course.joint });
  const [height, heightUnder] = [course.top - course.bottom, under.top - under.bottom];
  if (height !== heightUnder) changes.push({ what: 'unitHeight', from: ticks(heightUnder), to: ticks(height) });
  const runsBelow = new Map(below.map((run) => [run.runId, run]));
  for (const run of here) changes.push(...gapChanges(run, runsBelow.get(run.runId)));
  changes.push(...turnsOf(walls, here, below));
  for (const { runId } of here) {
    const patterns = runBonds.get(runId)?.patternByCourse;
    if (patterns && index >= 2 && patterns[index] !== patterns[index - 2]) changes.push({ what: 'pieces', runId });
  }
  return changes;
}
