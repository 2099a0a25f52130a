/** The stretches of masonry in each course of a chain: between its ends, the openings it passes and their lintels. */
import type { Coursing } from '../coursing/types';
import type { Opening } from '../drawing/schema';
import type { Walls } from '../walls/types';
import type { Chain } from './chains';
import type { CourseEnd, EndPair } from './ends';

/** Something that stands in a chain's courses in place of units. */
export interface Block {
  readonly from: number;
  readonly to: number;
  /** Indices of the first and last course it interrupts. */
  readonly firstCourse: number;
  readonly lastCourse: number;
  readonly lintel: boolean;
  readonly openingId: string;
}

/** A stretch in odd and even courses; both reach the same jambs, and differ only at corners. */
export interface Stretch {
  readonly start: EndPair;
  readonly end: EndPair;
}

/** Courses one above another that are interrupted alike, within one lift. */
export interface Zone {
  readonly firstCourse: number;
  readonly lastCourse: number;
  readonly stretches: readonly Stretch[];
  /** Units do not bond over a bond beam, only over the course below. */
  readonly startsLift: boolean;
}

/** Heights of sill and head of each opening on the course lines nearest to them. */
export function openingHeights(coursing: Coursing): Map<string, { sill?: number; head?: number }> {
  const heights = new Map<string, { sill?: number; head?: number }>();
  for (const control of coursing.answer.controls) {
    if (control.thing.kind !== 'opening' || (control.kind !== 'sill' && control.kind !== 'head')) continue;
    heights.set(control.thing.id, { ...heights.get(control.thing.id), [control.kind]: control.got });
  }
  return heights;
}

/** Indices of the first and last course with units between two heights; first > last where there are none. */
function coursesBetween(coursing: Coursing, bottom: number, top: number): [number, number] {
  const { courses } = coursing;
  let first = 0;
  let beyond = courses.length;
  while (first < beyond) {
    const middle = (first + beyond) >> 1;
    if (courses[middle]!.top > bottom) beyond = middle;
    else first = middle + 1;
  }
  let last = first - 1;
  while (last + 1 < courses.length && courses[last + 1]!.bottom < top) last += 1;
  return [first, last];
}

/** The openings of a chain and their lintels, along it. A lintel stands on its bearings over the head. */
export function blocksOf(
  chain: Chain,
  walls: Walls,
  openings: ReadonlyMap<string, Opening>,
  heights: ReadonlyMap<string, { sill?: number; head?: number }>,
  coursing: Coursing,
): Block[] {
  const blocks: Block[] = [];
  for (const { run, offset } of chain.runs)
    for (const id of walls.openingsByRun.get(run.runId) ?? []) {
      const opening = openings.get(id);
      if (!opening) continue;
      const sill = opening.sill === 0 ? 0 : (heights.get(id)?.sill ?? opening.sill);
      const head = heights.get(id)?.head ?? opening.head;
      const from = offset + opening.at;
      const to = from + opening.width;
      const add = (bottom: number, top: number, bearing: number, lintel: boolean) => {
        const [firstCourse, lastCourse] = coursesBetween(coursing, bottom, top);
        if (firstCourse <= lastCourse)
          blocks.push({ from: from - bearing, to: to + bearing, firstCourse, lastCourse, lintel, openingId: id });
      };
      add(sill, head, 0, false);
      if (opening.lintel.depth > 0) add(head, head + opening.lintel.depth, opening.lintel.bearing, true);
    }
  return blocks.sort((a, b) => a.from - b.from || a.to - b.to);
}

function edge(at: number, block: Block): EndPair {
  const end: CourseEnd = { at, joint: block.lintel, lapped: false, returnWidth: 0, quoin: false };
  return [end, end];
}

/** What is left of the chain between its ends when the blocks (sorted by `from`) are taken out. */
function stretchesBetween(start: EndPair, end: EndPair, blocks: readonly Block[]): Stretch[] {
  const stretches: Stretch[] = [];
  let from = start;
  let reached = -Infinity;
  for (const block of blocks) {
    const to = edge(block.from, block);
    if (block.from > reached && block.from > Math.min(start[0].at, start[1].at))
      stretches.push({ start: from, end: to });
    if (block.to > reached) {
      reached = block.to;
      from = edge(block.to, block);
    }
  }
  if (reached < Math.max(end[0].at, end[1].at)) stretches.push({ start: from, end });
  return stretches;
}

/** Cuts a chain's courses into zones: cost grows with the courses plus the openings. */
export function zonesOf(start: EndPair, end: EndPair, blocks: readonly Block[], coursing: Coursing): Zone[] {
  const count = coursing.courses.length;
  const changes = new Set<number>([0]);
  for (const block of blocks) changes.add(block.firstCourse).add(block.lastCourse + 1);
  for (let i = 1; i < count; i += 1) if (coursing.courses[i]!.lift !== coursing.courses[i - 1]!.lift) changes.add(i);
  const starts = [...changes].filter((i) => i < count).sort((a, b) => a - b);
  return starts.map((firstCourse, k) => ({
    firstCourse,
    lastCourse: (starts[k + 1] ?? count) - 1,
    startsLift: firstCourse === 0 || coursing.courses[firstCourse]!.lift !== coursing.courses[firstCourse - 1]!.lift,
    stretches: stretchesBetween(
      start,
      end,
      blocks.filter((block) => block.firstCourse <= firstCourse && firstCourse <= block.lastCourse),
    ),
  }));
}
