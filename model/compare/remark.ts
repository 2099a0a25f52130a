/** Which poles have to be marked again, and by how much. */
import { ticks } from '../length/ticks';
import type { Marks, PoleMark, PoleMarks } from '../marks/types';
import type { PoleToRemark } from './types';

/** A course keeps its number; any other mark is known by what it is for. */
function keyOf(mark: PoleMark): string {
  if (mark.course !== null) return `course ${mark.course}`;
  const things = mark.things.map((thing) => `${thing.kind} ${thing.id}`).sort();
  return [...mark.kinds, ...things].join(' ');
}

function meaningOf(mark: PoleMark): string {
  return [...mark.kinds].sort().join(' ');
}

function remark(was: PoleMarks | undefined, now: PoleMarks): PoleToRemark | null {
  const old = new Map((was?.marks ?? []).map((mark) => [keyOf(mark), mark]));
  const courses: number[] = [];
  let [moved, added, most] = [0, 0, 0];
  const touch = (mark: PoleMark) => {
    if (mark.course !== null) courses.push(mark.course);
  };
  for (const mark of now.marks) {
    const before = old.get(keyOf(mark));
    old.delete(keyOf(mark));
    const by = before ? mark.printed.fromLine - before.printed.fromLine : 0;
    if (before && by === 0 && meaningOf(before) === meaningOf(mark)) continue;
    if (before) moved += 1;
    else added += 1;
    if (Math.abs(by) > Math.abs(most)) most = by;
    touch(mark);
  }
  const removed = old.size;
  for (const mark of old.values()) touch(mark);
  if (moved + added + removed === 0) return null;
  return {
    poleId: now.poleId,
    letter: now.letter,
    lift: now.lift,
    firstCourse: courses.length > 0 ? Math.min(...courses) : null,
    lastCourse: courses.length > 0 ? Math.max(...courses) : null,
    moved,
    added,
    removed,
    most: ticks(most),
  };
}

/**
 * Poles whose printed marks from the level line differ, in the order of `after`. Compared as printed, since that is what
 * stands on the steel; a mark that now means something else (a course that became a sill) counts as moved. A pole that is
 * new, or in a lift that is new, has all its marks added; one that is gone needs no marking.
 */
export function polesToRemark(before: Marks, after: Marks): PoleToRemark[] {
  const key = (pole: PoleMarks) => `${pole.poleId} ${pole.lift}`;
  const old = new Map(before.poles.map((pole) => [key(pole), pole]));
  return after.poles.flatMap((now) => remark(old.get(key(now)), now) ?? []);
}
