/** Lintels by size. */
import type { Drawing } from '../drawing/schema';
import { ticks } from '../length/ticks';
import type { Walls } from '../walls/types';
import type { Takeoff } from './types';

/** One line per size, longest first: the opening's width and a bearing at both ends. Openings that don't stand rightly are left out. */
export function lintelSchedule(drawing: Drawing, walls: Walls): Takeoff['lintels'] {
  const standing = new Set([...walls.openingsByRun.values()].flat());
  const sizes = new Map<string, { length: number; depth: number; count: number }>();
  for (const { id, width, lintel } of drawing.openings) {
    if (!standing.has(id) || lintel.depth === 0) continue;
    const length = width + 2 * lintel.bearing;
    const key = `${length}x${lintel.depth}`;
    const size = sizes.get(key) ?? { length, depth: lintel.depth, count: 0 };
    size.count += 1;
    sizes.set(key, size);
  }
  return [...sizes.values()]
    .sort((a, b) => b.length - a.length || b.depth - a.depth)
    .map(({ length, depth, count }) => ({ length: ticks(length), depth: ticks(depth), count }));
}
