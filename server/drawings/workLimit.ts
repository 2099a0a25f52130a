import type { Drawing } from '../../model/drawing/schema';
import { Failure } from '../http/failure';
import { word } from '../words';

/** One request must not hold the server up: a bigger drawing is solved where it is drawn, in the browser. */
const MOST_RUNS = 1000;
const MOST_OPENINGS = 2000;

/** Throws `tooLarge` for a drawing that would keep the server from everyone else for too long. */
export function needSolvable(drawing: Drawing): void {
  if (drawing.runs.length > MOST_RUNS || drawing.openings.length > MOST_OPENINGS) {
    throw new Failure('tooLarge', word('server.tooMuchToSolve'), { field: 'drawing.runs' });
  }
}
