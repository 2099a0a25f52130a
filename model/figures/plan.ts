/** The plan as a figure: what is on the ground, the walls, their openings, the poles with their braces, and the words. */
import type { Drawing } from '../drawing/schema';
import type { SetOut } from '../setOut';
import { boundsOf } from './bounds';
import type { Figure } from './figure';
import { placeLabels } from './labels';
import { planContext, type PlanOptions } from './planContext';
import { drawGround } from './planGround';
import { labelsOfPlan } from './planLabels';
import { drawOpenings } from './planOpenings';
import { drawPoles } from './planPoles';
import { drawBodies, drawFacesAndLines } from './planWalls';

/**
 * The plan at a scale. The scale decides only what is sized by the printer: how large a pole is drawn at least, which
 * labels find room and where they stand. Bounds take in braces, labels and
 * dimensions, but no boundary or keep-clear that lies beyond them.
 */
export function planFigure(drawing: Drawing, setOut: SetOut, options: PlanOptions): Figure {
  const context = planContext(drawing, setOut, options);
  drawGround(context);
  drawBodies(context);
  drawOpenings(context);
  drawFacesAndLines(context);
  drawPoles(context);
  const places = placeLabels(labelsOfPlan(context), {
    obstacles: context.obstacles,
    height: options.scale.textHeight.label,
    within: options.within ?? null,
  });
  for (const place of places) if (place) context.shapes.push(...place.shapes);
  // The boundary and what is kept clear may lie far out: the building is what must be seen, where there is one.
  const building = context.shapes.filter(({ role }) => role !== 'boundary' && role !== 'keep-clear');
  const seen = building.length > 0 ? building : context.shapes;
  return {
    name: 'plan',
    bounds: boundsOf(seen, options.scale, context.tape),
    tape: context.tape,
    shapes: context.shapes,
  };
}
