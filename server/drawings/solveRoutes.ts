import { setOutSchema, solveRequestSchema, type SetOutAnswer } from '../../model/contracts/solving';
import { Failure } from '../http/failure';
import { limitTries } from '../http/limits';
import { toPlain } from '../http/plain';
import { route, type Route } from '../http/route';
import { word } from '../words';

/** One request must not hold the server up: a bigger drawing is solved where it is drawn, in the browser. */
export const MOST_RUNS_SOLVED = 1000;
const MOST_OPENINGS_SOLVED = 2000;

export const solveRoutes: readonly Route[] = [
  route({
    method: 'post',
    path: '/api/solve',
    summary: 'Solve a drawing with its survey: the whole set-out, with every reason why something does not fit',
    access: 'signedIn',
    body: solveRequestSchema,
    answer: setOutSchema,
    refusals: [413, 429],
    before: ({ env }) => limitTries({ most: env.NODE_ENV === 'test' ? 1000 : 120, minutes: 5 }),
    handle: async ({ body }) => {
      const { drawing, survey } = body;
      if (drawing.runs.length > MOST_RUNS_SOLVED || drawing.openings.length > MOST_OPENINGS_SOLVED) {
        throw new Failure('tooLarge', word('server.tooMuchToSolve'), { field: 'drawing.runs' });
      }
      const { solve } = await import('../../model/setOut');
      return toPlain(solve(drawing, survey)) as SetOutAnswer;
    },
  }),
];
