/** Openings in plan: the gap, the frame, a door's leaf and swing, a window's glass line. */
import type { Door, Opening } from '../drawing/schema';
import type { PlanPoint } from '../geometry/point';
import { roundTicks } from '../length/ticks';
import type { RunGeometry } from '../walls/types';
import { onRun, stripOnRun } from './onRun';
import type { PlanContext } from './planContext';

const bearing = (from: PlanPoint, to: PlanPoint) => (Math.atan2(to.y - from.y, to.x - from.x) * 180) / Math.PI;

/** The leaf stands open at a right angle to the wall; its edge sweeps from there to the other jamb. */
function drawLeaf(context: PlanContext, run: RunGeometry, door: Door): void {
  const leaf = door.width - 2 * door.frame;
  if (leaf <= 0) return;
  const inward = door.swing.opens === 'in';
  const depth = inward ? run.thickness : 0;
  const near = door.at + door.frame;
  const far = door.at + door.width - door.frame;
  const [hingeAt, latchAt] = door.swing.hinge === 'near' ? [near, far] : [far, near];
  const hinge = onRun(run, hingeAt, depth);
  const latch = onRun(run, latchAt, depth);
  const open = onRun(run, hingeAt, inward ? depth + leaf : -leaf);
  const emphasis = context.emphasisOf('opening', door.id);
  const thing = { kind: 'opening', id: door.id } as const;
  const [a, b] = [bearing(hinge, open), bearing(hinge, latch)];
  const openFirst = (((b - a) % 360) + 360) % 360 < 180;
  context.shapes.push({ kind: 'lines', role: 'frame', thing, emphasis, lines: [[hinge, open]] });
  context.shapes.push({
    kind: 'arc',
    role: 'swing',
    thing,
    emphasis,
    centre: hinge,
    radius: roundTicks(leaf),
    from: openFirst ? a : b,
    to: openFirst ? b : a,
  });
  const inner = inward ? [depth, depth + leaf] : [-leaf, 0];
  context.obstacles.push({
    points: stripOnRun(run, Math.min(hingeAt, latchAt), Math.max(hingeAt, latchAt), inner[0] ?? 0, inner[1] ?? 0),
    weight: 8,
  });
}

function drawOpening(context: PlanContext, run: RunGeometry, opening: Opening): void {
  const { at, width, frame } = opening;
  const emphasis = context.emphasisOf('opening', opening.id);
  const thing = { kind: 'opening', id: opening.id } as const;
  const gap = stripOnRun(run, at, at + width, 0, run.thickness);
  context.shapes.push({ kind: 'polygon', role: 'opening', thing, emphasis, points: gap });
  if (frame > 0 && frame * 2 < width) {
    for (const [from, to] of [
      [at, at + frame],
      [at + width - frame, at + width],
    ] as const)
      context.shapes.push({
        kind: 'polygon',
        role: 'frame',
        thing,
        emphasis,
        points: stripOnRun(run, from, to, 0, run.thickness),
      });
  }
  if (opening.kind === 'window') {
    const lines = [0.4, 0.6].map((part) => [
      onRun(run, at + frame, run.thickness * part),
      onRun(run, at + width - frame, run.thickness * part),
    ]);
    context.shapes.push({ kind: 'lines', role: 'frame', thing, emphasis, lines });
    const sill = [0, run.thickness].map((depth) => [onRun(run, at, depth), onRun(run, at + width, depth)]);
    context.shapes.push({ kind: 'lines', role: 'swing', thing, emphasis, lines: sill });
  }
  if (opening.kind === 'door') drawLeaf(context, run, opening);
}

/** Draws every opening that stands rightly on its run; the others only as outlines to look into. */
export function drawOpenings(context: PlanContext): void {
  const { walls } = context.setOut;
  const drawn = new Set<string>();
  for (const run of walls.runs) {
    for (const id of walls.openingsByRun.get(run.runId) ?? []) {
      const opening = context.openingById.get(id);
      if (!opening) continue;
      drawn.add(id);
      drawOpening(context, run, opening);
    }
  }
  for (const opening of context.drawing.openings) {
    const run = walls.runById.get(opening.runId);
    if (!run || drawn.has(opening.id)) continue;
    const points = stripOnRun(run, opening.at, opening.at + opening.width, 0, run.thickness);
    const emphasis = context.emphasisOf('opening', opening.id);
    context.shapes.push({
      kind: 'polygon',
      role: 'caution',
      thing: { kind: 'opening', id: opening.id },
      emphasis,
      points,
    });
  }
}
