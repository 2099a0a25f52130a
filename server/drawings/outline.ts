import type { Drawing } from '../../model/drawing/schema';
import { drawingOutlines } from '../../model/drawing/emptyOutline';
import type { PlanPoint } from '../../model/geometry/point';

/** More than this is not seen in a picture the size of a thumb. */
const MOST_POINTS = 2000;

/** Lines of the walls for the picture in the list of sites, kept short enough for a list of many. */
export function outlineOf(drawing: Drawing): PlanPoint[][] {
  let points = 0;
  return drawingOutlines(drawing).filter((line) => (points += line.length) <= MOST_POINTS);
}
