import { localMailSchema } from '../../model/contracts/mail';
import { Failure } from '../http/failure';
import type { Deps } from '../http/deps';
import { route, type Route } from '../http/route';
import { word } from '../words';
import type { LocalMailbox } from './localMailbox';
import { writeMailPage } from './mailPage';

function needMailbox({ mailbox }: Deps): LocalMailbox {
  if (mailbox === null) throw new Failure('notFound', word('server.notFound'));
  return mailbox;
}

export const mailRoutes: readonly Route[] = [
  route({
    method: 'get',
    path: '/api/mail',
    summary: 'Mail caught on this machine, the newest first; only where there is no mail server',
    access: 'everyone',
    answer: localMailSchema,
    refusals: [404],
    handle: async ({ deps }) => ({ messages: [...needMailbox(deps).messages()] }),
  }),
  route({
    method: 'get',
    path: '/api/mail/page',
    summary: 'The same as a page to read',
    access: 'everyone',
    answer: 'text/html',
    refusals: [404],
    handle: async ({ deps, res }) => {
      res.type('html').send(writeMailPage(needMailbox(deps).messages()));
    },
  }),
];
