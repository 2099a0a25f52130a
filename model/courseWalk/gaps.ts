/** The openings and lintels that stand in a course of a run. */
import { blocksOf, openingHeights, type Block } from '../bond/stretches';
import type { Coursing } from '../coursing/types';
import type { Drawing } from '../drawing/schema';
import { ticks } from '../length/ticks';
import type { Walls } from '../walls/types';
import type { CourseGap } from './types';

/** What stands in each run's courses in place of units, as the bond has it; found once for any number of courses. */
export function blocksByRun(drawing: Drawing, walls: Walls, coursing: Coursing): Map<string, readonly Block[]> {
  const openings = new Map(drawing.openings.map((opening) => [opening.id, opening]));
  const heights = openingHeights(coursing);
  return new Map(
    walls.runs.map((run) => {
      const chain = { runs: [{ run, offset: 0 }], length: run.length };
      return [run.runId, blocksOf(chain, walls, openings, heights, coursing)];
    }),
  );
}

/** The gaps of one course, by its index. */
export function gapsAt(blocks: readonly Block[], index: number): CourseGap[] {
  return blocks
    .filter(({ firstCourse, lastCourse }) => firstCourse <= index && index <= lastCourse)
    .map(({ openingId, lintel, from, to }) => ({
      openingId,
      what: lintel ? 'lintel' : 'opening',
      from: ticks(from),
      to: ticks(to),
    }));
}
