/** Openings in elevation: the gap, the frame's members, the lintel on its bearings. */
import type { Opening } from '../drawing/schema';
import type { PlanPoint } from '../geometry/point';
import { roundTicks } from '../length/ticks';
import type { ElevationContext } from './elevation';
import { lowestFoundation } from './elevationWall';

function box(left: number, bottom: number, right: number, top: number): PlanPoint[] {
  return [
    { x: roundTicks(left), y: roundTicks(bottom) },
    { x: roundTicks(right), y: roundTicks(bottom) },
    { x: roundTicks(right), y: roundTicks(top) },
    { x: roundTicks(left), y: roundTicks(top) },
  ];
}

function drawOpening(context: ElevationContext, opening: Opening): void {
  const left = opening.at;
  const right = opening.at + opening.width;
  const standsOnFoundation = opening.kind !== 'window' || opening.sill === 0;
  const bottom = standsOnFoundation ? lowestFoundation(context, left, right) : opening.sill;
  const { frame, head } = opening;
  if (head <= bottom) return;
  const thing = { kind: 'opening', id: opening.id } as const;
  const emphasis = context.differs('opening', opening.id) ? 'differs' : 'plain';
  const { shapes } = context;
  shapes.push({ kind: 'polygon', role: 'opening', thing, emphasis, points: box(left, bottom, right, head) });
  if (frame > 0 && frame * 2 < opening.width && bottom + frame * 2 < head) {
    const members: [number, number, number, number][] = [
      [left, bottom, frame, head - bottom],
      [right - frame, bottom, frame, head - bottom],
      [left, head - frame, opening.width, frame],
    ];
    if (!standsOnFoundation) members.push([left, bottom, opening.width, frame]);
    shapes.push({ kind: 'boxes', role: 'frame', thing, emphasis, boxes: members });
  }
  const { depth, bearing } = opening.lintel;
  if (depth > 0) {
    const from = Math.max(0, left - bearing);
    const to = Math.min(context.run.length, right + bearing);
    shapes.push({ kind: 'boxes', role: 'lintel', thing, emphasis, boxes: [[from, head, to - from, depth]] });
  }
}

/** Draws the openings that stand rightly on the run, over its units. */
export function drawElevationOpenings(context: ElevationContext): void {
  const ids = new Set(context.setOut.walls.openingsByRun.get(context.run.runId) ?? []);
  for (const opening of context.drawing.openings) if (ids.has(opening.id)) drawOpening(context, opening);
}
