/** Where on the plan a thing is, for a label that speaks of it. */
import type { PlanPoint } from '../geometry/point';
import { roundTicks } from '../length/ticks';
import type { ThingRef } from '../things';
import { onRun } from './onRun';
import type { PlanContext } from './planContext';

function middleOfPoints(points: readonly PlanPoint[]): PlanPoint | null {
  if (points.length === 0) return null;
  const sum = points.reduce((total, point) => ({ x: total.x + point.x, y: total.y + point.y }), { x: 0, y: 0 });
  return { x: roundTicks(sum.x / points.length), y: roundTicks(sum.y / points.length) };
}

/** The place of a thing, or null for things that stand nowhere in plan (a course, a bond beam, the site). */
export function placeOfThing(context: PlanContext, thing: ThingRef): PlanPoint | null {
  const { walls, poles, ground } = context.setOut;
  switch (thing.kind) {
    case 'corner':
      return walls.cornerById.get(thing.id)?.at ?? null;
    case 'run': {
      const run = walls.runById.get(thing.id);
      return run ? onRun(run, run.length / 2, run.thickness / 2) : null;
    }
    case 'opening': {
      const opening = context.openingById.get(thing.id);
      const run = opening ? walls.runById.get(opening.runId) : undefined;
      return opening && run ? onRun(run, opening.at + opening.width / 2, run.thickness / 2) : null;
    }
    case 'keepClear':
      return middleOfPoints(context.drawing.keepClears.find((area) => area.id === thing.id)?.points ?? []);
    case 'boundary':
      return context.drawing.boundary?.[0] ?? null;
    case 'pole':
      return poles.poleById.get(thing.id)?.at ?? walls.cornerById.get(thing.id)?.at ?? null;
    case 'brace': {
      const pole = poles.poleById.get(thing.id.replace(/\.\d+$/, ''));
      return pole?.braces.find((brace) => brace.id === thing.id)?.foot ?? pole?.at ?? null;
    }
    case 'station':
      return ground.stations.find((station) => station.readingId === thing.id)?.at ?? null;
    default:
      return null;
  }
}
