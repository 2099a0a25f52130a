import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Role } from '../../model/contracts/common';
import { APP_URL, openTestServer, type Caller, type TestServer } from '../helpers/server';

let server: TestServer;
let lead: Caller;
beforeAll(async () => {
  server = await openTestServer();
  lead = await server.signUp('Lead Invites');
});
afterAll(() => server.close());

async function invite(siteId: string, email: string, role: Role = 'mason') {
  return lead.post(`/api/sites/${siteId}/invitations`, { email, role });
}

/** The token in the newest mail to this address. */
async function tokenFor(email: string): Promise<string> {
  const { links } = await server.mailTo(email);
  const prefix = `${APP_URL}/invitation/`;
  expect(links[0]?.startsWith(prefix)).toBe(true);
  return links[0]?.slice(prefix.length) ?? '';
}

describe('an invitation', () => {
  it('reaches an address by mail, shows what it offers, and makes its holder a member', async () => {
    const siteId = await server.makeSite(lead);
    const made = await invite(siteId, 'Ivo.Asked@Site.example', 'designer');
    expect(made.status).toBe(201);
    expect(made.body).toMatchObject({ email: 'ivo.asked@site.example', role: 'designer', invitedBy: 'Lead Invites' });

    const token = await tokenFor('ivo.asked@site.example');
    const shown = await server.stranger().get(`/api/invitations/${token}`);
    expect(shown.body).toEqual({
      siteName: 'Test yard',
      role: 'designer',
      invitedBy: 'Lead Invites',
      email: 'ivo.asked@site.example',
      state: 'open',
    });
    expect((await server.stranger().post(`/api/invitations/${token}/accept`)).status).toBe(401);

    const asked = await server.signUp('Ivo Asked');
    const accepted = await asked.post(`/api/invitations/${token}/accept`);
    expect(accepted.body).toEqual({ siteId });
    expect((await asked.get(`/api/sites/${siteId}`)).body.role).toBe('designer');
    expect((await server.stranger().get(`/api/invitations/${token}`)).body.state).toBe('accepted');
    expect((await lead.get(`/api/sites/${siteId}/crew`)).body.invitations).toEqual([]);
  });

  it('is for the address that it was sent to, and no other', async () => {
    const siteId = await server.makeSite(lead);
    await invite(siteId, 'meant@site.example');
    const token = await tokenFor('meant@site.example');
    const other = await server.signUp('Not Meant');
    const answer = await other.post(`/api/invitations/${token}/accept`);
    expect(answer.status).toBe(403);
    expect(answer.body.error.message).toMatch(/another address/);
    expect((await other.get(`/api/sites/${siteId}`)).status).toBe(404);
  });

  it('pressed twice answers the same; used after leaving it answers 409', async () => {
    const siteId = await server.makeSite(lead);
    const person = await server.signUp('Jo Twice');
    await invite(siteId, person.email);
    const token = await tokenFor(person.email);
    const both = await Promise.all([1, 2].map(() => person.post(`/api/invitations/${token}/accept`)));
    expect(both.map((answer) => answer.body)).toEqual([{ siteId }, { siteId }]);
    await lead.delete(`/api/sites/${siteId}/members/${person.id}`);
    expect((await person.post(`/api/invitations/${token}/accept`)).status).toBe(409);
    expect((await person.get(`/api/sites/${siteId}`)).status).toBe(404);
  });

  it('runs out after 14 days', async () => {
    const siteId = await server.makeSite(lead);
    const person = await server.signUp('Kit Late');
    await invite(siteId, person.email);
    const token = await tokenFor(person.email);
    const before = server.clock.now;
    const days = (count: number) => new Date(before.getTime() + count * 24 * 60 * 60 * 1000);
    try {
      server.clock.now = days(13.9);
      expect((await person.get(`/api/invitations/${token}`)).body.state).toBe('open');
      server.clock.now = days(14.1);
      expect((await person.get(`/api/invitations/${token}`)).body.state).toBe('expired');
      expect((await person.post(`/api/invitations/${token}/accept`)).status).toBe(410);
      expect((await lead.get(`/api/sites/${siteId}/crew`)).body.invitations).toEqual([]);
    } finally {
      server.clock.now = before;
    }
  });

  it('taken back opens nothing', async () => {
    const siteId = await server.makeSite(lead);
    const person = await server.signUp('Lu Revoked');
    const made = await invite(siteId, person.email);
    const token = await tokenFor(person.email);
    expect((await lead.delete(`/api/sites/${siteId}/invitations/${made.body.id}`)).status).toBe(204);
    expect((await person.post(`/api/invitations/${token}/accept`)).status).toBe(404);
    expect((await lead.delete(`/api/sites/${siteId}/invitations/${made.body.id}`)).status).toBe(404);
  });

  it('sent again replaces the one before', async () => {
    const siteId = await server.makeSite(lead);
    const person = await server.signUp('Mo Again');
    await invite(siteId, person.email, 'observer');
    const first = await tokenFor(person.email);
    await invite(siteId, person.email, 'mason');
    await expect.poll(() => tokenFor(person.email)).not.toBe(first);
    expect((await person.post(`/api/invitations/${first}/accept`)).status).toBe(404);
    const { body } = await lead.get(`/api/sites/${siteId}/crew`);
    expect(body.invitations).toMatchObject([{ email: person.email, role: 'mason' }]);
    expect((await person.post(`/api/invitations/${await tokenFor(person.email)}/accept`)).status).toBe(200);
    expect((await person.get(`/api/sites/${siteId}`)).body.role).toBe('mason');
  });

  it('is refused for someone on the crew already, and for what is no address', async () => {
    const siteId = await server.makeSite(lead);
    const member = await invite(siteId, lead.email.toUpperCase());
    expect(member.status).toBe(409);
    expect(member.body.error).toMatchObject({ code: 'alreadyThere', field: 'email' });
    const wrong = await invite(siteId, 'nobody at nowhere');
    expect(wrong.status).toBe(400);
    expect(wrong.body.error.field).toBe('email');
  });

  it('is not made when it can’t be mailed, and that is said', async () => {
    const silent = await openTestServer({ LOCAL_MAIL: '0', SMTP_URL: 'smtp://127.0.0.1:9' });
    try {
      const alone = await silent.signUp('Lead Unheard');
      const siteId = await silent.makeSite(alone);
      const answer = await alone.post(`/api/sites/${siteId}/invitations`, { email: 'far@site.example', role: 'mason' });
      expect(answer.status).toBe(503);
      expect(answer.body.error.code).toBe('unavailable');
      expect((await alone.get(`/api/sites/${siteId}/crew`)).body.invitations).toEqual([]);
    } finally {
      await silent.close();
    }
  });

  it('leaves only its hash in the database', async () => {
    const siteId = await server.makeSite(lead);
    await invite(siteId, 'hashed@site.example');
    const token = await tokenFor('hashed@site.example');
    const { rows } = await server.database.pool.query('select * from invitations where site_id = $1', [siteId]);
    expect(rows).toHaveLength(1);
    expect(JSON.stringify(rows)).not.toContain(token);
  });

  it('is shown to the lead only', async () => {
    const mason = await server.signUp('Mason Looks');
    const siteId = await server.makeSite(lead, [[mason, 'mason']]);
    await invite(siteId, 'open@site.example');
    expect((await lead.get(`/api/sites/${siteId}/crew`)).body.invitations).toHaveLength(1);
    expect((await mason.get(`/api/sites/${siteId}/crew`)).body.invitations).toEqual([]);
  });

  it.each(['short', 'x'.repeat(43), 'has space in the middle of it'])(
    'with the token "%s" is not there',
    async (token) => {
      expect((await server.stranger().get(`/api/invitations/${encodeURIComponent(token)}`)).status).toBe(404);
    },
  );
});
