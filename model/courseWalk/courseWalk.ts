/** The course walk: everything the crew needs for one course, put together from the set-out's parts. */
import type { Bond } from '../bond/types';
import { unitSize } from '../bond/unitSize';
import type { Coursing } from '../coursing/types';
import type { Drawing } from '../drawing/schema';
import { ticks } from '../length/ticks';
import type { Marks } from '../marks/types';
import { planCuts } from '../takeoff/cutPlan';
import type { Walls } from '../walls/types';
import { changesAt } from './changes';
import { blocksByRun, gapsAt } from './gaps';
import type { CourseCut, CourseRun, CourseWalk, LineSetting } from './types';

/** The parts of a set-out that a walk reads. */
export interface WalkParts {
  readonly walls: Walls;
  readonly coursing: Coursing;
  readonly bond: Bond;
  readonly marks: Marks;
}

function runsAt(parts: WalkParts, blocks: ReturnType<typeof blocksByRun>, index: number): CourseRun[] {
  return parts.walls.runs.flatMap(({ runId }) => {
    const laid = parts.bond.byRun.get(runId);
    const pieces = laid?.patterns[laid.patternByCourse[index] ?? -1]?.pieces;
    if (!pieces) return [];
    return {
      runId,
      pieces,
      whole: pieces.filter((piece) => piece.kind === 'unit').length,
      closers: pieces.filter((piece) => piece.kind === 'closer').length,
      gaps: gapsAt(blocks.get(runId) ?? [], index),
    };
  });
}

/** Every pole of the course's lift that carries its mark. The mark is found by its course, never added up. */
function linesAt(marks: Marks, course: number, lift: number): LineSetting[] {
  return marks.poles.flatMap((pole) => {
    const mark = pole.lift === lift ? pole.marks.find((each) => each.course === course) : undefined;
    if (!mark) return [];
    const { fromLine, fromFoot, printed, height } = mark;
    return {
      poleId: pole.poleId,
      letter: pole.letter,
      fromLine,
      fromFoot,
      printed: { fromLine: printed.fromLine, fromFoot: printed.fromFoot },
      beyondHead: height > pole.head,
    };
  });
}

function cutsOf(drawing: Drawing, walls: Walls, runs: readonly CourseRun[]): { cuts: CourseCut[]; cutFrom: number } {
  const cuts: CourseCut[] = [];
  let cutFrom = 0;
  for (const type of drawing.wallTypes) {
    const byLength = new Map<number, { count: number; runIds: Set<string> }>();
    const lengths: number[] = [];
    for (const { runId, pieces } of runs) {
      if (walls.runById.get(runId)?.wallTypeId !== type.id) continue;
      for (const { kind, start, end } of pieces) {
        if (kind !== 'closer') continue;
        const cut = byLength.get(end - start) ?? { count: 0, runIds: new Set<string>() };
        cut.count += 1;
        cut.runIds.add(runId);
        byLength.set(end - start, cut);
        lengths.push(end - start);
      }
    }
    cutFrom += planCuts(lengths, unitSize(type).along, drawing.poleKit.kerf).length;
    for (const [length, { count, runIds }] of [...byLength].sort((a, b) => b[0] - a[0]))
      cuts.push({ wallTypeId: type.id, length: ticks(length), count, runIds: [...runIds] });
  }
  return { cuts, cutFrom };
}

/**
 * The walk of one course, by its number from 1; null where there is no such course. Costs one pass over the course's
 * pieces and the building's openings.
 */
export function courseWalk(drawing: Drawing, parts: WalkParts, number: number): CourseWalk | null {
  const index = number - 1;
  const course = parts.coursing.courses[index];
  if (!course) return null;
  const blocks = blocksByRun(drawing, parts.walls, parts.coursing);
  const runs = runsAt(parts, blocks, index);
  const below = index > 0 ? runsAt(parts, blocks, index - 1) : [];
  const { lift, bottom, top, joint } = course;
  return {
    course: number,
    lift,
    bottom,
    top,
    joint,
    runs,
    lines: linesAt(parts.marks, number, lift),
    ...cutsOf(drawing, parts.walls, runs),
    changes: changesAt(index, { ...parts, runBonds: parts.bond.byRun }, runs, below),
  };
}
