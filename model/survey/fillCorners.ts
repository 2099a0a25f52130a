/** Heights of the corners that were not read, from the readings nearest to them along the walls. */
import { roundTicks, type Ticks } from '../length/ticks';
import type { Walls } from '../walls/types';
import type { ProfilePoint } from './types';

interface Found {
  readonly distance: number;
  readonly cornerId: string;
  /** The reading it comes from. */
  readonly source: string;
  readonly height: Ticks;
}

/**
 * Heights for every corner without a reading that some reading reaches along the walls. Between two readings the
 * foundation is taken as straight: each such corner takes the two nearest readings (the search stops at a reading), by
 * their distances along the outside faces; with one reading in reach, that one's height. Two-label shortest paths, so
 * the work grows as n log n.
 */
export function fillCorners(
  walls: Walls,
  read: ReadonlyMap<string, Ticks>,
  along: ReadonlyMap<string, readonly ProfilePoint[]>,
): Map<string, Ticks> {
  const links = new Map<string, { to: string; length: number }[]>();
  const heap: Found[] = [];
  const link = (from: string, to: string, length: number): void => {
    const list = links.get(from);
    if (list) list.push({ to, length });
    else links.set(from, [{ to, length }]);
  };
  for (const run of walls.runs) {
    const [start, end] = [run.ends[0].cornerId, run.ends[1].cornerId];
    const points = along.get(run.runId) ?? [];
    const first = points[0];
    const last = points[points.length - 1];
    if (first && last) {
      push(heap, { distance: first.at, cornerId: start, source: `${run.runId}@${first.at}`, height: first.height });
      push(heap, {
        distance: run.length - last.at,
        cornerId: end,
        source: `${run.runId}@${last.at}`,
        height: last.height,
      });
    } else {
      link(start, end, run.length);
      link(end, start, run.length);
    }
  }
  for (const [cornerId, height] of read) {
    for (const { to, length } of links.get(cornerId) ?? []) {
      push(heap, { distance: length, cornerId: to, source: cornerId, height });
    }
  }
  const nearest = new Map<string, Found[]>();
  for (let next = pop(heap); next; next = pop(heap)) {
    if (read.has(next.cornerId)) continue;
    const found = nearest.get(next.cornerId) ?? [];
    if (found.length >= 2 || found[0]?.source === next.source) continue;
    found.push(next);
    nearest.set(next.cornerId, found);
    for (const { to, length } of links.get(next.cornerId) ?? []) {
      if (!read.has(to)) push(heap, { ...next, distance: next.distance + length, cornerId: to });
    }
  }
  return new Map([...nearest].map(([cornerId, found]) => [cornerId, between(found)]));
}

function between(found: readonly Found[]): Ticks {
  const [one, two] = found as [Found, Found | undefined];
  if (!two || one.distance + two.distance === 0) return one.height;
  return roundTicks((one.height * two.distance + two.height * one.distance) / (one.distance + two.distance));
}

function push(heap: Found[], item: Found): void {
  let i = heap.length;
  heap.push(item);
  while (i > 0) {
    const parent = (i - 1) >> 1;
    const above = heap[parent] as Found;
    if (above.distance <= item.distance) break;
    heap[i] = above;
    i = parent;
  }
  heap[i] = item;
}

function pop(heap: Found[]): Found | undefined {
  const top = heap[0];
  const item = heap.pop();
  if (!top || !item || heap.length === 0) return top;
  let i = 0;
  for (;;) {
    let child = 2 * i + 1;
    if (child >= heap.length) break;
    if (child + 1 < heap.length && (heap[child + 1] as Found).distance < (heap[child] as Found).distance) child++;
    if ((heap[child] as Found).distance >= item.distance) break;
    heap[i] = heap[child] as Found;
    i = child;
  }
  heap[i] = item;
  return top;
}
