import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { mkdirSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { openTestServer, type TestServer } from '../helpers/server';

const HTML = 'text/html,application/xhtml+xml,*/*;q=0.8';

let server: TestServer;
beforeAll(async () => {
  server = await openTestServer();
  const hashed = path.join(server.deps.env.CLIENT_DIR, '_expo/static/js/web');
  mkdirSync(hashed, { recursive: true });
  writeFileSync(path.join(hashed, 'entry-0a1b.js'), `// ${'one line of the client '.repeat(200)}`);
});
afterAll(() => server.close());

const ask = (where: string, accept: string) => server.stranger().call('get', where, undefined, { accept });

describe('the client', () => {
  it.each(['/', '/sites', '/sites/some-id/plan', '/reset?token=abc', '/invitation/abc.def'])(
    'is one page at every address a person may open: %s',
    async (where) => {
      const answer = await ask(where, HTML);
      expect(answer.status).toBe(200);
      expect(answer.text).toContain('the page');
      expect(answer.headers['cache-control']).toBe('no-cache');
    },
  );

  it('answers 404 for files that are not there, and for what is not asked for as a page', async () => {
    expect((await ask('/_expo/static/js/web/entry-gone.js', '*/*')).status).toBe(404);
    expect((await ask('/sites', 'application/json')).status).toBe(404);
    expect((await server.stranger().call('post', '/sites', {}, { accept: HTML })).status).toBe(404);
  });

  it('never stands in for the API', async () => {
    const answer = await ask('/api/nothing', HTML);
    expect(answer.status).toBe(404);
    expect(answer.body.error.code).toBe('notFound');
  });

  it('serves files named by their content for a year, compressed, and the others to be asked for again', async () => {
    const hashed = await ask('/_expo/static/js/web/entry-0a1b.js', '*/*');
    expect(hashed.headers['cache-control']).toBe('public, max-age=31536000, immutable');
    expect(hashed.headers['content-encoding']).toMatch(/gzip|br/);
    expect((await ask('/manifest.json', '*/*')).headers['cache-control']).toBe('no-cache');
  });

  it('can’t be led out of its folder', async () => {
    for (const where of ['/../package.json', '/..%2fpackage.json', '/%2e%2e/%2e%2e/etc/passwd']) {
      const answer = await ask(where, '*/*');
      expect(answer.status).toBeGreaterThanOrEqual(400);
      expect(answer.text).not.toMatch(/root:|"dependencies"/);
    }
  });
});

describe('headers', () => {
  it('keep a browser to our own scripts, out of other pages’ frames, and answers out of caches', async () => {
    const page = await ask('/', HTML);
    const policy = page.headers['content-security-policy'] ?? '';
    expect(policy).toContain("script-src 'self';");
    expect(policy).toContain("style-src 'self' 'unsafe-inline'");
    expect(policy).toContain("frame-ancestors 'none'");
    expect(page.headers['x-content-type-options']).toBe('nosniff');
    expect(page.headers['x-powered-by']).toBeUndefined();
    // On plain http a browser told to use https would reach nothing.
    expect(policy).not.toContain('upgrade-insecure-requests');
    expect(page.headers['strict-transport-security']).toBeUndefined();
    const api = await server.stranger().get('/api/health');
    expect(api.headers['cache-control']).toBe('no-store');
    expect(api.headers['x-request-id']).toMatch(/^[0-9a-f-]{36}$/);
  });
});

describe('caught mail', () => {
  it('is listed and shown as a page, with nothing in it taken for markup', async () => {
    const lead = await server.signUp('Lead <b>Bold');
    const siteId = await server.makeSite(lead);
    await lead.patch(`/api/sites/${siteId}`, { name: '<script>alert(1)</script> yard' });
    await lead.post(`/api/sites/${siteId}/invitations`, { email: 'asked@site.example', role: 'mason' });
    const mail = await server.mailTo('asked@site.example');
    expect(mail.subject).toBe('Lead <b>Bold asks you to join <script>alert(1)</script> yard');

    const { body } = await server.stranger().get('/api/mail');
    expect(body.messages[0]).toMatchObject({ to: 'asked@site.example', links: [expect.stringMatching(/invitation/)] });
    const page = await server.stranger().get('/api/mail/page');
    expect(page.headers['content-type']).toMatch(/text\/html/);
    expect(page.text).toContain('&lt;script&gt;');
    expect(page.text).not.toContain('<script>');
    expect(page.text).toContain(`<a href="${mail.links[0]}">`);
  });

  it('is neither listed nor shown where there is a mail server', async () => {
    const real = await openTestServer({ LOCAL_MAIL: '0', SMTP_URL: 'smtp://127.0.0.1:9' });
    try {
      expect((await real.stranger().get('/api/settings')).body).toEqual({ localMail: false, demo: false });
      expect((await real.stranger().get('/api/mail')).status).toBe(404);
      expect((await real.stranger().get('/api/mail/page')).status).toBe(404);
      // A mail server that can't be reached is logged, and no one is told whether an address has an account.
      const { email } = await real.signUp('No Post');
      const answer = await real.stranger().post('/api/auth/request-password-reset', { email });
      expect(answer.status).toBe(200);
    } finally {
      await real.close();
    }
  });
});
