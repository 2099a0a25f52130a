/** What must stay free: the boundary, keep-clears and the ways through doors. */
import type { Door, Opening, Passage } from '../drawing/schema';
import type { RunGeometry } from '../walls/types';
import { stripOnRun } from './onRun';
import type { PlanContext } from './planContext';

/** A way through: both sides of its opening, centred on it. */
function drawWay(context: PlanContext, run: RunGeometry, opening: Door | Passage): void {
  const { way } = opening;
  if (!way.used || way.width === 0 || way.depth === 0) return;
  const middle = opening.at + opening.width / 2;
  const [from, to] = [middle - way.width / 2, middle + way.width / 2];
  const thing = { kind: 'opening', id: opening.id } as const;
  const emphasis = context.emphasisOf('opening', opening.id);
  for (const [outer, inner] of [
    [-way.depth, 0],
    [run.thickness, run.thickness + way.depth],
  ] as const) {
    const points = stripOnRun(run, from, to, outer, inner);
    context.shapes.push({ kind: 'polygon', role: 'way', thing, emphasis, points, hatched: true });
    context.obstacles.push({ points, weight: 5 });
  }
}

function hasWay(opening: Opening | undefined): opening is Door | Passage {
  return opening !== undefined && opening.kind !== 'window';
}

/** Draws the boundary, the keep-clears and the ways through, under everything else. */
export function drawGround(context: PlanContext): void {
  const { drawing, setOut, shapes, obstacles } = context;
  if (drawing.boundary) {
    const points = drawing.boundary;
    const thing = { kind: 'boundary', id: 'boundary' } as const;
    shapes.push({ kind: 'polygon', role: 'boundary', thing, points });
    points.forEach((from, i) => {
      const to = points[(i + 1) % points.length];
      if (to) obstacles.push({ points: [from, to], weight: 7 });
    });
  }
  for (const area of drawing.keepClears) {
    const emphasis = context.emphasisOf('keepClear', area.id);
    const thing = { kind: 'keepClear', id: area.id } as const;
    shapes.push({ kind: 'polygon', role: 'keep-clear', thing, emphasis, points: area.points, hatched: true });
    area.points.forEach((from, i) => {
      const to = area.points[(i + 1) % area.points.length];
      if (to) obstacles.push({ points: [from, to], weight: 3 });
    });
  }
  for (const run of setOut.walls.runs) {
    for (const id of setOut.walls.openingsByRun.get(run.runId) ?? []) {
      const opening = context.openingById.get(id);
      if (hasWay(opening)) drawWay(context, run, opening);
    }
  }
}
