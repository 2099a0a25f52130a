/** Footprints: the closed outlines that runs make, found by walking round each connected part with the outside at the right. */
import type { PlanPoint } from '../geometry/point';
import { crossSign, orientation } from '../geometry/orientation';
import { signedArea } from '../geometry/polygon';
import { distance, dot, unit, sub } from '../geometry/vec';
import { roundTicks } from '../length/ticks';
import type { CornerGeometry, Diagonal, Footprint, RunGeometry } from './types';

interface Step {
  readonly cornerId: string;
  readonly runId: string;
}

interface Graph {
  /** Runs at each corner counter-clockwise, dead ends taken away. */
  readonly runsAt: ReadonlyMap<string, readonly string[]>;
  readonly farEnd: (runId: string, cornerId: string) => string;
}

/** Takes away runs that end free, again and again, until only loops and the runs between loops are left. */
function withoutDeadEnds(corners: readonly CornerGeometry[], runs: ReadonlyMap<string, RunGeometry>): Graph {
  const farEnd = (runId: string, cornerId: string): string => {
    const ends = runs.get(runId)?.ends;
    if (!ends) return cornerId;
    return ends[0].cornerId === cornerId ? ends[1].cornerId : ends[0].cornerId;
  };
  const left = new Map(corners.map((corner) => [corner.cornerId, new Set(corner.runIds)]));
  const dead = corners.filter((corner) => corner.runIds.length === 1).map((corner) => corner.cornerId);
  for (let id = dead.pop(); id !== undefined; id = dead.pop()) {
    const here = left.get(id);
    const [runId] = here ?? [];
    if (!here || here.size !== 1 || runId === undefined) continue;
    const there = farEnd(runId, id);
    here.clear();
    left.get(there)?.delete(runId);
    if (left.get(there)?.size === 1) dead.push(there);
  }
  const runsAt = new Map(
    corners.map((corner) => [
      corner.cornerId,
      corner.runIds.filter((runId) => left.get(corner.cornerId)?.has(runId) ?? false),
    ]),
  );
  return { runsAt, farEnd };
}

/** Splits a walk that comes back to a corner into loops that don't; runs walked both ways fall out. */
function simpleLoops(walk: readonly Step[]): readonly (readonly Step[])[] {
  const loops: (readonly Step[])[] = [];
  const stack: Step[] = [];
  const place = new Map<string, number>();
  for (const step of walk) {
    const before = place.get(step.cornerId);
    if (before !== undefined) {
      const loop = stack.splice(before);
      for (const one of loop) place.delete(one.cornerId);
      if (loop.length > 2) loops.push(loop);
    }
    place.set(step.cornerId, stack.length);
    stack.push(step);
  }
  if (stack.length > 2) loops.push(stack);
  return loops;
}

/** Walks round one connected part from its leftmost corner, the outside at the right: counter-clockwise, `most` steps at most. */
function walkRound(graph: Graph, start: Step, most: number): readonly Step[] {
  const walk: Step[] = [];
  let step = start;
  do {
    walk.push(step);
    const next = graph.farEnd(step.runId, step.cornerId);
    const runs = graph.runsAt.get(next) ?? [];
    const turned = runs[(runs.indexOf(step.runId) + 1) % runs.length];
    if (turned === undefined) break;
    step = { cornerId: next, runId: turned };
  } while ((step.cornerId !== start.cornerId || step.runId !== start.runId) && walk.length < most);
  return walk;
}

/** Closed outlines of every connected part, counter-clockwise, each from the corner that comes first in the drawing. */
export function findLoops(
  corners: readonly CornerGeometry[],
  runs: ReadonlyMap<string, RunGeometry>,
): readonly (readonly Step[])[] {
  const graph = withoutDeadEnds(corners, runs);
  const at = new Map(corners.map((corner) => [corner.cornerId, corner.at]));
  const order = new Map(corners.map((corner, i) => [corner.cornerId, i]));
  const byPlace = [...corners].sort((a, b) => a.at.x - b.at.x || a.at.y - b.at.y);
  const seen = new Set<string>();
  const loops: (readonly Step[])[] = [];
  // Every run is walked once each way at most.
  const most = 2 * runs.size;
  for (const corner of byPlace) {
    const here = graph.runsAt.get(corner.cornerId) ?? [];
    if (seen.has(corner.cornerId) || here.length === 0) continue;
    const lowest = here.reduce((best, runId) => {
      const a = at.get(graph.farEnd(best, corner.cornerId));
      const b = at.get(graph.farEnd(runId, corner.cornerId));
      if (!a || !b) return best;
      const turn = crossSign(a.x - corner.at.x, a.y - corner.at.y, b.x - corner.at.x, b.y - corner.at.y);
      return turn < 0 ? runId : best;
    });
    loops.push(...simpleLoops(walkRound(graph, { cornerId: corner.cornerId, runId: lowest }, most)));
    const reached = [corner.cornerId];
    for (let id = reached.pop(); id !== undefined; id = reached.pop()) {
      if (seen.has(id)) continue;
      seen.add(id);
      for (const runId of graph.runsAt.get(id) ?? []) reached.push(graph.farEnd(runId, id));
    }
  }
  const rank = (step: Step | undefined): number => (step ? (order.get(step.cornerId) ?? 0) : 0);
  return loops
    .map((loop) => {
      const first = loop.reduce((best, step, i) => (rank(step) < rank(loop[best]) ? i : best), 0);
      return [...loop.slice(first), ...loop.slice(0, first)];
    })
    .sort((a, b) => rank(a[0]) - rank(b[0]));
}

/** Where two faces of neighbouring runs leave the loop: the ends of each face in the order of the walk. */
function faceRing(
  loop: readonly Step[],
  runs: ReadonlyMap<string, RunGeometry>,
  face: 'outside' | 'inside',
): readonly PlanPoint[] {
  return loop.flatMap((step) => {
    const run = runs.get(step.runId);
    if (!run) return [];
    const [a, b] = run[face];
    return run.ends[0].cornerId === step.cornerId ? [a, b] : [b, a];
  });
}

/** Areas and perimeter of one loop. */
export function footprintOf(loop: readonly Step[], runs: ReadonlyMap<string, RunGeometry>): Footprint {
  let perimeter = 0;
  let bodyInside = true;
  for (const step of loop) {
    const run = runs.get(step.runId);
    if (!run) continue;
    perimeter += distance(run.start, run.end);
    if (run.ends[0].cornerId !== step.cornerId) bodyInside = false;
  }
  return {
    cornerIds: loop.map((step) => step.cornerId),
    runIds: loop.map((step) => step.runId),
    areaOutside: Math.abs(signedArea(faceRing(loop, runs, 'outside'))),
    areaInside: Math.abs(signedArea(faceRing(loop, runs, 'inside'))),
    perimeter: roundTicks(perimeter),
    bodyInside,
  };
}

/** Both diagonals of a footprint whose outline turns at exactly four corners, all the same way; none otherwise. */
export function diagonalsOf(footprint: Footprint, corners: ReadonlyMap<string, CornerGeometry>): readonly Diagonal[] {
  const ring = footprint.cornerIds.flatMap((id) => corners.get(id) ?? []);
  const turning = ring.filter((corner, i) => {
    const before = ring[(i + ring.length - 1) % ring.length];
    const after = ring[(i + 1) % ring.length];
    if (!before || !after) return false;
    // A cosine that rounds to 1 within the tick's reach is a corner in the middle of a straight side.
    return dot(unit(sub(corner.at, before.at)), unit(sub(after.at, corner.at))) < 1 - 1e-7;
  });
  const [a, b, c, d] = turning;
  if (turning.length !== 4 || !a || !b || !c || !d) return [];
  const turns = [
    orientation(a.at, b.at, c.at),
    orientation(b.at, c.at, d.at),
    orientation(c.at, d.at, a.at),
    orientation(d.at, a.at, b.at),
  ];
  if (turns.some((turn) => turn <= 0)) return [];
  return [
    { from: a.cornerId, to: c.cornerId, length: roundTicks(distance(a.at, c.at)) },
    { from: b.cornerId, to: d.cornerId, length: roundTicks(distance(b.at, d.at)) },
  ];
}
