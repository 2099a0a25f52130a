/** Every route against everyone who might call it. A route without a row here fails the first test. */
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { newDrawing } from '../../model/drawing/defaults';
import { EMPTY_SURVEY } from '../../model/drawing/surveySchema';
import { authRoutes } from '../../server/auth/contracts';
import type { RouteDescription } from '../../server/http/route';
import { routes } from '../../server/routes';
import { newWriteId, openTestServer, PASSWORD, type Caller, type TestServer } from '../helpers/server';

const WHO = ['signedOut', 'stranger', 'observer', 'mason', 'designer', 'lead'] as const;
type Who = (typeof WHO)[number];
type Statuses = readonly [number, number, number, number, number, number];

/** What a row may need: a site of its own, with one of everything on it. */
interface Scene {
  readonly siteId: string;
  readonly caller: Caller;
  /** A member whom nobody in the table is. */
  readonly other: Caller;
}
interface Request {
  readonly path?: Readonly<Record<string, string>>;
  readonly body?: unknown;
}
interface Row {
  readonly statuses: Statuses;
  readonly prepare?: (scene: Scene) => Promise<Request> | Request;
  readonly after?: (scene: Scene, who: Who) => Promise<unknown>;
}

let server: TestServer;
const callers = {} as Record<Who, Caller>;
let other: Caller;

beforeAll(async () => {
  server = await openTestServer();
  callers.signedOut = server.stranger();
  for (const who of WHO.slice(1)) callers[who] = await server.signUp(`The ${who}`);
  other = await server.signUp('The other');
});
afterAll(() => server.close());

const everyone = (status: number): Statuses => [status, status, status, status, status, status];
const signedIn = (status: number): Statuses => [401, status, status, status, status, status];
const readers = (status: number): Statuses => [401, 404, status, status, status, status];
const masonsUp = (status: number): Statuses => [401, 404, 403, status, status, status];
const designersUp = (status: number): Statuses => [401, 404, 403, 403, status, status];
const leadOnly = (status: number): Statuses => [401, 404, 403, 403, 403, status];

const versions = { drawingVersion: 0, surveyVersion: 0 };
const drawing = newDrawing('metric');

async function makeRevision({ siteId }: Scene): Promise<Request> {
  await callers.lead.post(`/api/sites/${siteId}/revisions`, { writeId: newWriteId(), note: '', ...versions });
  return { path: { number: '1' } };
}

async function setAside({ siteId }: Scene): Promise<Request> {
  const save = () =>
    callers.lead.put(`/api/sites/${siteId}/draft/survey`, {
      writeId: newWriteId(),
      baseVersion: 0,
      survey: EMPTY_SURVEY,
    });
  await save();
  return { path: { setAsideId: (await save()).body.setAsideId as string } };
}

async function makeInvitation({ siteId }: Scene): Promise<Request> {
  const body = { email: 'invited@site.example', role: 'mason' };
  const made = await callers.lead.post(`/api/sites/${siteId}/invitations`, body);
  return { path: { invitationId: made.body.id as string } };
}

async function inviteCaller({ siteId, caller }: Scene): Promise<Request> {
  const email = caller.email || 'nobody.yet@site.example';
  // An address on the crew can't be asked: the crew's own tokens are tried as strangers to another site.
  const elsewhere = await server.makeSite(other);
  const site = email === callers.stranger.email ? siteId : elsewhere;
  const asking = site === siteId ? callers.lead : other;
  await asking.post(`/api/sites/${site}/invitations`, { email, role: 'mason' });
  const { links } = await server.mailTo(email);
  return { path: { token: links[0]?.split('/').at(-1) ?? '' } };
}

const signInAgain = async ({ caller }: Scene, who: Who) => {
  if (who === 'signedOut') return;
  await caller.post('/api/auth/sign-in/email', { email: caller.email, password: PASSWORD });
};

const TABLE: Readonly<Record<string, Row>> = {
  'post /api/auth/sign-up/email': {
    statuses: everyone(400),
    prepare: () => ({ body: { name: 'Any', email: 'any@site.example', password: 'short' } }),
  },
  'post /api/auth/sign-in/email': {
    statuses: everyone(401),
    prepare: () => ({ body: { email: 'any@site.example', password: 'not-the-password' } }),
  },
  'post /api/auth/sign-out': { statuses: everyone(200), prepare: () => ({ body: {} }), after: signInAgain },
  'get /api/auth/get-session': { statuses: everyone(200) },
  'post /api/auth/request-password-reset': {
    statuses: everyone(200),
    prepare: () => ({ body: { email: 'any@site.example' } }),
  },
  'post /api/auth/reset-password': {
    statuses: everyone(410),
    prepare: () => ({ body: { token: 'no-such-token', newPassword: 'long-enough-word' } }),
  },

  'get /api/health': { statuses: everyone(200) },
  'get /api/settings': { statuses: everyone(200) },
  'get /api/mail': { statuses: everyone(200) },
  'get /api/mail/page': { statuses: everyone(200) },

  'get /api/sites': { statuses: signedIn(200) },
  'post /api/sites': { statuses: signedIn(201), prepare: () => ({ body: { name: 'Made', units: 'metric' } }) },
  'get /api/sites/:siteId': { statuses: readers(200) },
  'patch /api/sites/:siteId': { statuses: leadOnly(200), prepare: () => ({ body: { name: 'Renamed' } }) },
  'delete /api/sites/:siteId': { statuses: leadOnly(204) },

  'get /api/sites/:siteId/crew': { statuses: readers(200) },
  'patch /api/sites/:siteId/members/:userId': {
    statuses: leadOnly(204),
    prepare: (scene) => ({ path: { userId: scene.other.id }, body: { role: 'mason' } }),
  },
  'delete /api/sites/:siteId/members/:userId': {
    statuses: leadOnly(204),
    prepare: (scene) => ({ path: { userId: scene.other.id } }),
  },

  'post /api/sites/:siteId/invitations': {
    statuses: leadOnly(201),
    prepare: () => ({ body: { email: 'new.hand@site.example', role: 'mason' } }),
  },
  'delete /api/sites/:siteId/invitations/:invitationId': { statuses: leadOnly(204), prepare: makeInvitation },
  'get /api/invitations/:token': { statuses: everyone(200), prepare: inviteCaller },
  'post /api/invitations/:token/accept': { statuses: signedIn(200), prepare: inviteCaller },

  'get /api/sites/:siteId/draft': { statuses: readers(200) },
  'put /api/sites/:siteId/draft/drawing': {
    statuses: designersUp(200),
    prepare: () => ({ body: { writeId: newWriteId(), baseVersion: 0, drawing } }),
  },
  'put /api/sites/:siteId/draft/survey': {
    statuses: masonsUp(200),
    prepare: () => ({ body: { writeId: newWriteId(), baseVersion: 0, survey: EMPTY_SURVEY } }),
  },

  'get /api/sites/:siteId/set-aside': { statuses: masonsUp(200) },
  'get /api/sites/:siteId/set-aside/:setAsideId': { statuses: masonsUp(200), prepare: setAside },
  'delete /api/sites/:siteId/set-aside/:setAsideId': { statuses: masonsUp(204), prepare: setAside },

  'get /api/sites/:siteId/revisions': { statuses: readers(200) },
  'post /api/sites/:siteId/revisions': {
    statuses: designersUp(201),
    prepare: () => ({ body: { writeId: newWriteId(), note: 'ready', ...versions } }),
  },
  'get /api/sites/:siteId/revisions/:number': { statuses: readers(200), prepare: makeRevision },
  'post /api/sites/:siteId/revisions/:number/restore': {
    statuses: designersUp(200),
    prepare: async (scene) => ({
      ...(await makeRevision(scene)),
      body: { writeId: newWriteId(), ...versions },
    }),
  },

  'get /api/sites/:siteId/draft/sheets.pdf': { statuses: readers(200) },
  'get /api/sites/:siteId/revisions/:number/sheets.pdf': { statuses: readers(200), prepare: makeRevision },
  'post /api/solve': { statuses: signedIn(200), prepare: () => ({ body: { drawing, survey: EMPTY_SURVEY } }) },
};

const all: readonly RouteDescription[] = [...authRoutes, ...routes];
const nameOf = (route: RouteDescription) => `${route.method} ${route.path}`;

function fill(path: string, scene: Scene, request: Request): string {
  return path.replace(/:([A-Za-z]+)/g, (_, name: string) => {
    const value = name === 'siteId' ? scene.siteId : request.path?.[name];
    if (value === undefined) throw new Error(`the row of ${path} gives no ${name}`);
    return value;
  });
}

describe('routes and roles', () => {
  it('has a row for every route, and a route for every row', () => {
    expect(Object.keys(TABLE).sort()).toEqual(all.map(nameOf).sort());
  });

  describe.each(all.map((route) => [nameOf(route), route] as const))('%s', (name, route) => {
    it.each(WHO)('%s', async (who) => {
      const row = TABLE[name];
      if (row === undefined) throw new Error(`no row for ${name}`);
      const caller = callers[who];
      const siteId = await server.makeSite(callers.lead, [
        [callers.observer, 'observer'],
        [callers.mason, 'mason'],
        [callers.designer, 'designer'],
        [other, 'observer'],
      ]);
      const scene: Scene = { siteId, caller, other };
      const request = (await row.prepare?.(scene)) ?? {};
      const answer = await caller.call(route.method, fill(route.path, scene, request), request.body);
      await row.after?.(scene, who);
      expect(answer.status, answer.text).toBe(row.statuses[WHO.indexOf(who)]);
      if (answer.status >= 400) expect(answer.body.error.message).toMatch(/\w/);
    });
  });
});
