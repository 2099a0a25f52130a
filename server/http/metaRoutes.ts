import { healthSchema, settingsSchema } from '../../model/contracts/mail';
import { isDatabaseThere } from '../../db/queries/health';
import { word } from '../words';
import { Failure } from './failure';
import { route, type Route } from './route';

export const metaRoutes: readonly Route[] = [
  route({
    method: 'get',
    path: '/api/health',
    summary: 'Whether the server and its database answer',
    access: 'everyone',
    answer: healthSchema,
    refusals: [503],
    handle: async ({ deps }) => {
      if (!(await isDatabaseThere(deps.db))) throw new Failure('unavailable', word('server.unavailable'));
      return { ok: true as const };
    },
  }),
  route({
    method: 'get',
    path: '/api/settings',
    summary: 'What the client must know of this server',
    access: 'everyone',
    answer: settingsSchema,
    handle: async ({ deps }) => ({ localMail: deps.mailbox !== null, demo: deps.env.DEMO }),
  }),
];
