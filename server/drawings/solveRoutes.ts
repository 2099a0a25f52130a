import { setOutSchema, solveRequestSchema, type SetOutAnswer } from '../../model/contracts/solving';
import { solve } from '../../model/setOut';
import { limitTries } from '../http/limits';
import { toPlain } from '../http/plain';
import { route, type Route } from '../http/route';
import { needSolvable } from './workLimit';

export const solveRoutes: readonly Route[] = [
  route({
    method: 'post',
    path: '/api/solve',
    summary: 'Solve a drawing with its survey: the whole set-out, with every reason why something does not fit',
    access: 'signedIn',
    body: solveRequestSchema,
    answer: setOutSchema,
    refusals: [413, 429],
    before: ({ env }) => limitTries(env, { most: 60, minutes: 5 }),
    handle: async ({ body }) => {
      needSolvable(body.drawing);
      return toPlain(solve(body.drawing, body.survey)) as SetOutAnswer;
    },
  }),
];
