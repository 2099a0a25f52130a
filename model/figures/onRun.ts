/** Places on a wall run, in plan. */
import type { PlanPoint } from '../geometry/point';
import { roundTicks } from '../length/ticks';
import type { RunGeometry } from '../walls/types';

/** The place `along` the outside face from the run's first corner and `depth` into the body (negative: outside), in ticks. */
export function onRun(run: RunGeometry, along: number, depth: number): PlanPoint {
  return {
    x: roundTicks(run.start.x + run.direction.x * along + run.inward.x * depth),
    y: roundTicks(run.start.y + run.direction.y * along + run.inward.y * depth),
  };
}

/** How far a place lies along a run from its first corner, in ticks (floating point). */
export function alongRun(run: RunGeometry, at: PlanPoint): number {
  return (at.x - run.start.x) * run.direction.x + (at.y - run.start.y) * run.direction.y;
}

/** A rectangle on a run, between two places along it and two depths, counter-clockwise where depth grows inward. */
export function stripOnRun(run: RunGeometry, from: number, to: number, outer: number, inner: number): PlanPoint[] {
  return [onRun(run, from, outer), onRun(run, to, outer), onRun(run, to, inner), onRun(run, from, inner)];
}

/** What is left of `from … to` once the gaps, in any order, are taken out. */
export function withoutGaps(
  from: number,
  to: number,
  gaps: readonly (readonly [number, number])[],
): (readonly [number, number])[] {
  const left: (readonly [number, number])[] = [];
  let at = from;
  for (const [start, end] of [...gaps].sort((a, b) => a[0] - b[0])) {
    if (start > at) left.push([at, Math.min(start, to)]);
    at = Math.max(at, end);
    if (at >= to) break;
  }
  if (at < to) left.push([at, to]);
  return left.filter(([start, end]) => end > start);
}
