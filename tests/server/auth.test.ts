import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { APP_URL, PASSWORD, openTestServer, type TestServer } from '../helpers/server';

let server: TestServer;
beforeAll(async () => {
  server = await openTestServer();
});
afterAll(() => server.close());

describe('accounts', () => {
  it('signs a person up, in and out', async () => {
    const caller = server.stranger();
    const account = { name: 'Ona Field', email: 'Ona@Site.example', password: PASSWORD };
    expect((await caller.post('/api/auth/sign-up/email', account)).status).toBe(200);
    expect((await caller.get('/api/auth/get-session')).body.user).toMatchObject({
      name: 'Ona Field',
      email: 'ona@site.example',
    });
    expect((await caller.get('/api/sites')).status).toBe(200);

    expect((await caller.post('/api/auth/sign-out', {})).status).toBe(200);
    expect((await caller.get('/api/auth/get-session')).body).toBeNull();
    expect((await caller.get('/api/sites')).status).toBe(401);

    const again = { email: 'ona@site.example', password: PASSWORD };
    expect((await caller.post('/api/auth/sign-in/email', again)).status).toBe(200);
    expect((await caller.get('/api/sites')).status).toBe(200);
  });

  it.each([
    ['a short password', { password: 'plumb-squ' }, 400, 'badInput', 'password'],
    ['a password too long', { password: 'x'.repeat(129) }, 400, 'badInput', 'password'],
    ['no e-mail address', { email: 'ona at site' }, 400, 'badInput', 'email'],
    ['a name that is no text', { name: 7 }, 400, 'badInput', 'name'],
  ])('refuses %s and names the field', async (_what, wrong, status, code, field) => {
    const account = { name: 'Someone', email: 'someone@site.example', password: PASSWORD, ...wrong };
    const answer = await server.stranger().post('/api/auth/sign-up/email', account);
    expect(answer.status).toBe(status);
    expect(answer.body.error).toMatchObject({ code, field });
    expect(answer.body.error.message).toMatch(/\w/);
  });

  it('takes an address once, whatever its case', async () => {
    const first = await server.signUp('Bram Once');
    const answer = await server
      .stranger()
      .post('/api/auth/sign-up/email', { name: 'Other', email: first.email.toUpperCase(), password: PASSWORD });
    expect(answer.status).toBe(409);
    expect(answer.body.error).toMatchObject({ code: 'alreadyThere', field: 'email' });
  });

  it('answers a wrong password and an unknown address alike', async () => {
    const { email } = await server.signUp('Cato Alike');
    const wrong = await server.stranger().post('/api/auth/sign-in/email', { email, password: 'not-the-password' });
    const unknown = await server
      .stranger()
      .post('/api/auth/sign-in/email', { email: 'nobody@site.example', password: 'not-the-password' });
    expect([wrong.status, unknown.status]).toEqual([401, 401]);
    expect(unknown.body).toEqual(wrong.body);
  });

  it('opens no other path of the auth library', async () => {
    const caller = await server.signUp('Dara Narrow');
    for (const path of ['/api/auth/update-user', '/api/auth/change-email', '/api/auth/list-sessions', '/api/auth/ok']) {
      const answer = await caller.post(path, {});
      expect(answer.status).toBe(404);
      expect(answer.body.error.code).toBe('notFound');
    }
  });

  it('refuses to sign in from a page of another origin', async () => {
    const { email } = await server.signUp('Edda Elsewhere');
    const answer = await server
      .stranger()
      .call('post', '/api/auth/sign-in/email', { email, password: PASSWORD }, { origin: 'http://elsewhere.example' });
    expect(answer.status).toBe(403);
    expect(answer.headers['set-cookie']).toBeUndefined();
  });

  it('keeps the session in a cookie that scripts cannot read', async () => {
    const answer = await server.stranger().post('/api/auth/sign-up/email', {
      name: 'Finn Cookie',
      email: 'finn@site.example',
      password: PASSWORD,
    });
    const cookies = answer.headers['set-cookie'] as unknown as string[];
    expect(cookies.length).toBeGreaterThan(0);
    for (const cookie of cookies) {
      expect(cookie).toMatch(/HttpOnly/i);
      expect(cookie).toMatch(/SameSite=Lax/i);
    }
  });
});

describe('a forgotten password', () => {
  it('is set anew by the link in the mail, once, and ends every session', async () => {
    const caller = await server.signUp('Greta Forgot');
    const asked = await server.stranger().post('/api/auth/request-password-reset', { email: caller.email });
    expect(asked.status).toBe(200);

    const mail = await server.mailTo(caller.email);
    expect(mail.text).toContain('Greta Forgot');
    const link = new URL(mail.links[0] ?? '');
    expect(link.origin + link.pathname).toBe(`${APP_URL}/reset`);
    const token = link.searchParams.get('token');
    expect(token).toMatch(/^\w{20,}$/);

    const fresh = server.stranger();
    const newPassword = 'a-longer-plumb-line';
    expect((await fresh.post('/api/auth/reset-password', { token, newPassword: 'short' })).status).toBe(400);
    expect((await fresh.post('/api/auth/reset-password', { token, newPassword })).status).toBe(200);
    expect((await caller.get('/api/sites')).status).toBe(401);

    const { email } = caller;
    expect((await fresh.post('/api/auth/sign-in/email', { email, password: PASSWORD })).status).toBe(401);
    expect((await fresh.post('/api/auth/sign-in/email', { email, password: newPassword })).status).toBe(200);

    const twice = await server.stranger().post('/api/auth/reset-password', { token, newPassword });
    expect(twice.status).toBe(410);
    expect(twice.body.error.code).toBe('expired');
  });

  it('answers the same for an address without an account, and sends nothing', async () => {
    const { email } = await server.signUp('Hale Known');
    const known = await server.stranger().post('/api/auth/request-password-reset', { email });
    const unknown = await server.stranger().post('/api/auth/request-password-reset', { email: 'no@site.example' });
    expect(unknown.status).toBe(known.status);
    expect(unknown.body).toEqual(known.body);
    await server.mailTo(email);
    expect(server.deps.mailbox?.messages().some((message) => message.to === 'no@site.example')).toBe(false);
  });
});

describe('tries', () => {
  it('are limited where passwords could be guessed', async () => {
    const busy = await openTestServer({ NODE_ENV: 'production' });
    try {
      const caller = busy.stranger();
      const statuses: number[] = [];
      for (let i = 0; i < 65; i += 1) {
        const answer = await caller.post('/api/auth/sign-in/email', { email: 'not an address', password: 'x' });
        statuses.push(answer.status);
      }
      expect(statuses.slice(0, 60).every((status) => status === 400)).toBe(true);
      expect(statuses.slice(60)).toEqual([429, 429, 429, 429, 429]);
    } finally {
      await busy.close();
    }
  });
});
