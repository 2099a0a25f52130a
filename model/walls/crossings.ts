/** Runs and corners that lie where they can't: runs that cross, touch or lie on one another, corners in one place. */
import type { Corner } from '../drawing/schema';
import { boxOf, boxOfSegment, type Box } from '../geometry/box';
import { gridOf } from '../geometry/grid';
import { overlapDepth } from '../geometry/polygon';
import { meetSegments } from '../geometry/segment';
import { samePoint } from '../geometry/vec';
import { roundTicks, TICKS_PER_MM } from '../length/ticks';
import type { Reason } from '../reasons';
import type { ReadyRun } from './runs';
import type { RunGeometry } from './types';

/** Bodies that run into each other by less than this touch: faces are rounded to the tick. */
const TOUCHING = TICKS_PER_MM / 2;

function forEachPair(boxes: readonly Box[], visit: (i: number, j: number) => void): void {
  const grid = gridOf(boxes);
  boxes.forEach((box, i) => {
    for (const j of grid.find(box)) if (j > i) visit(i, j);
  });
}

function shareCorner(a: ReadyRun, b: ReadyRun): boolean {
  const { from, to } = a.run;
  return from === b.run.from || from === b.run.to || to === b.run.from || to === b.run.to;
}

function isEnd(run: ReadyRun, point: { x: number; y: number }): boolean {
  return samePoint(run.from, point) || samePoint(run.to, point);
}

/** Runs whose lines cross, touch without a shared corner, or lie on one another. */
function crossingLines(runs: readonly ReadyRun[], told: Set<string>): readonly Reason[] {
  const reasons: Reason[] = [];
  forEachPair(
    runs.map((run) => boxOfSegment(run.from, run.to)),
    (i, j) => {
      const a = runs[i];
      const b = runs[j];
      if (!a || !b) return;
      const met = meetSegments({ a: a.from, b: a.to }, { a: b.from, b: b.to });
      if (met.kind === 'apart') return;
      if (met.kind !== 'overlap' && shareCorner(a, b)) return;
      // Ends in one place are the corners' to complain about.
      if (met.kind === 'touch' && isEnd(a, met.at) && isEnd(b, met.at)) return;
      told.add(`${a.run.id} ${b.run.id}`);
      reasons.push({
        code: met.kind === 'overlap' ? 'runsOverlap' : 'runsCross',
        weight: 'blocked',
        thing: { kind: 'run', id: a.run.id },
        against: [{ kind: 'run', id: b.run.id }],
        ...(met.kind === 'overlap'
          ? { amount: roundTicks(Math.hypot(met.to.x - met.from.x, met.to.y - met.from.y)) }
          : {}),
      });
    },
  );
  return reasons;
}

/** Runs whose bodies stand in one another though their lines don't meet: walls closer than their thickness. */
function overlappingBodies(
  runs: readonly ReadyRun[],
  geometry: ReadonlyMap<string, RunGeometry>,
  told: ReadonlySet<string>,
): readonly Reason[] {
  const reasons: Reason[] = [];
  const bodies = runs.map((run) => geometry.get(run.run.id)?.body ?? []);
  const boxes = runs.map((run, i) => boxOf(bodies[i] ?? []) ?? boxOfSegment(run.from, run.to));
  forEachPair(boxes, (i, j) => {
    const a = runs[i];
    const b = runs[j];
    if (!a || !b || shareCorner(a, b) || told.has(`${a.run.id} ${b.run.id}`)) return;
    const depth = overlapDepth(bodies[i] ?? [], bodies[j] ?? []);
    if (depth <= TOUCHING) return;
    reasons.push({
      code: 'runsOverlap',
      weight: 'warning',
      thing: { kind: 'run', id: a.run.id },
      against: [{ kind: 'run', id: b.run.id }],
      amount: roundTicks(depth),
    });
  });
  return reasons;
}

/** Two corners in one place: the runs there don't join. */
export function coincidingCorners(corners: readonly Corner[]): readonly Reason[] {
  const first = new Map<string, string>();
  const reasons: Reason[] = [];
  for (const corner of corners) {
    const place = `${corner.x} ${corner.y}`;
    const other = first.get(place);
    if (other === undefined) first.set(place, corner.id);
    else
      reasons.push({
        code: 'cornersCoincide',
        weight: 'warning',
        thing: { kind: 'corner', id: corner.id },
        against: [{ kind: 'corner', id: other }],
      });
  }
  return reasons;
}

/** Every pair of runs that get in each other's way, each pair once. */
export function findCrossings(
  runs: readonly ReadyRun[],
  geometry: ReadonlyMap<string, RunGeometry>,
): readonly Reason[] {
  const told = new Set<string>();
  const lines = crossingLines(runs, told);
  return [...lines, ...overlappingBodies(runs, geometry, told)];
}
