import request from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { newDrawing, newOpening } from '../../model/drawing/defaults';
import { inches } from '../../model/length/ticks';
import { APP_URL, newWriteId, openTestServer, type Caller, type TestServer } from '../helpers/server';

let server: TestServer;
let lead: Caller;
let siteId: string;
beforeAll(async () => {
  server = await openTestServer();
  lead = await server.signUp('Lead Input');
  siteId = await server.makeSite(lead);
});
afterAll(() => server.close());

const drawing = newDrawing('imperial');
const corner = { id: 'c', letter: 'A', x: inches(0), y: inches(0) };

function save(changed: unknown, more: object = {}) {
  const body = { writeId: newWriteId(), baseVersion: 0, drawing: changed, ...more };
  return lead.put(`/api/sites/${siteId}/draft/drawing`, body);
}

/** Sends text that no JSON writer would make. */
function saveText(text: string, type = 'application/json') {
  return lead.call('put', `/api/sites/${siteId}/draft/drawing`, text, { 'content-type': type });
}

describe('input that is not right', () => {
  it.each([
    ['a corner between ticks', { ...drawing, corners: [{ ...corner, x: 0.5 }] }, 'drawing.corners.0.x'],
    ['a corner 3 km away', { ...drawing, corners: [{ ...corner, x: 1_920_000_000 }] }, 'drawing.corners.0.x'],
    ['a corner where a text stands', { ...drawing, corners: [{ ...corner, y: '12' }] }, 'drawing.corners.0.y'],
    [
      'two corners of one letter',
      { ...drawing, corners: [corner, { ...corner, id: 'd' }] },
      'drawing.corners.1.letter',
    ],
    ['a letter that is none', { ...drawing, corners: [{ ...corner, letter: 'a1' }] }, 'drawing.corners.0.letter'],
    [
      'a run to nowhere',
      { ...drawing, corners: [corner], runs: [{ id: 'r', from: 'c', to: 'gone', wallTypeId: 'wall' }] },
      'drawing.runs.0.to',
    ],
    [
      'an opening on no run',
      { ...drawing, openings: [newOpening('imperial', 'door', { id: 'o', runId: 'gone', at: inches(4) })] },
      'drawing.openings.0.runId',
    ],
    ['no wall type', { ...drawing, wallTypes: [] }, 'drawing.wallTypes'],
    ['a field that nobody knows', { ...drawing, colour: 'red' }, 'drawing.colour'],
    ['another version of the drawing', { ...drawing, version: 2 }, 'drawing.version'],
    ['nothing', null, 'drawing'],
  ])('is refused with the field named: %s', async (_what, changed, field) => {
    const answer = await save(changed);
    expect(answer.status).toBe(400);
    expect(answer.body.error).toMatchObject({ code: 'badInput', field });
    expect(answer.body.error.message.length).toBeGreaterThan(3);
  });

  it.each([
    [{ writeId: 'again' }, 'writeId'],
    [{ baseVersion: -1 }, 'baseVersion'],
    [{ baseVersion: 1.5 }, 'baseVersion'],
    [{ force: true }, 'force'],
  ])('is refused around the drawing too: %o', async (more, field) => {
    const answer = await save(drawing, more);
    expect(answer.status).toBe(400);
    expect(answer.body.error.field).toBe(field);
  });

  it.each([
    ['cut off', '{"writeId": '],
    ['no JSON', 'drawing=1'],
    ['not a number', '{"baseVersion": NaN}'],
  ])('is refused as JSON: %s', async (_what, text) => {
    const answer = await saveText(text);
    expect(answer.status).toBe(400);
    expect(answer.body.error).toMatchObject({ code: 'badInput', field: 'body' });
  });

  it.each(['1e400', '-1e400', '1e308'])('is refused when a number is as large as %s', async (number) => {
    const text = JSON.stringify({
      writeId: newWriteId(),
      baseVersion: 0,
      drawing: { ...drawing, corners: [{ ...corner, x: 'HERE' }] },
    }).replace('"HERE"', number);
    const answer = await saveText(text);
    expect(answer.status).toBe(400);
    expect(answer.body.error.field).toBe('drawing.corners.0.x');
  });

  it.each([
    ['a NUL character', '\\u0000'],
    ['half a surrogate pair', '\\ud83d'],
  ])('is refused when it holds what no database can keep: %s', async (_what, escape) => {
    const named = { ...drawing, wallTypes: [{ ...drawing.wallTypes[0], name: 'HERE' }] };
    const body = JSON.stringify({ writeId: newWriteId(), baseVersion: 0, drawing: named }).replace('HERE', escape);
    const answer = await saveText(body);
    expect(answer.status).toBe(400);
    expect(answer.body.error).toMatchObject({ code: 'badInput', field: 'drawing.wallTypes.0.name' });
    const account = `{"name":"${escape}","email":"nul@site.example","password":"long-enough-word"}`;
    const headers = { 'content-type': 'application/json' };
    const refused = await server.stranger().call('post', '/api/auth/sign-up/email', account, headers);
    expect(refused.status).toBe(400);
    expect(refused.body.error.field).toBe('name');
    expect((await lead.delete(`/api/sites/${siteId}/members/${encodeURIComponent('\0')}`)).status).toBe(404);
  });

  it('is kept letter for letter, whatever the script', async () => {
    const name = 'Łódź 東 \u{1F9F1} "quoted" \\u0000 as typed';
    const own = await server.makeSite(lead);
    expect((await lead.patch(`/api/sites/${own}`, { name })).status).toBe(200);
    expect((await lead.get(`/api/sites/${own}`)).body.name).toBe(name);
  });

  it('is refused when it is not sent as JSON, for a form needs no one’s leave to cross origins', async () => {
    for (const type of ['text/plain', 'application/x-www-form-urlencoded']) {
      const answer = await saveText(JSON.stringify({ writeId: newWriteId(), baseVersion: 0, drawing }), type);
      expect(answer.status).toBe(415);
      expect(answer.body.error.field).toBe('content-type');
    }
  });

  it('is refused when it is larger than 4 MB, and taken up to there', async () => {
    const tooLarge = await saveText(`"${'x'.repeat(4 * 1024 * 1024)}"`);
    expect(tooLarge.status).toBe(413);
    expect(tooLarge.body.error.code).toBe('tooLarge');
    const large = await saveText(`"${'x'.repeat(3 * 1024 * 1024)}"`);
    expect(large.status).toBe(400);
  });

  it('is refused when it is larger than an account needs', async () => {
    const body = { name: 'x'.repeat(20_000), email: 'a@site.example', password: 'long-enough-word' };
    const answer = await server.stranger().post('/api/auth/sign-up/email', body);
    expect(answer.status).toBe(413);
    expect(answer.body.error.code).toBe('tooLarge');
  });

  it('leaves the draft untouched', async () => {
    const { body } = await lead.get(`/api/sites/${siteId}/draft`);
    expect(body).toMatchObject({ drawingVersion: 0, drawing });
  });
});

describe('who asks from where', () => {
  it.each([
    ['another origin', { origin: 'http://elsewhere.example' }],
    ['the same host on another port', { origin: 'http://localhost:4601' }],
    ['no origin to speak of', { origin: 'null' }],
  ])('changes nothing from %s', async (_what, headers) => {
    const answer = await lead.call('patch', `/api/sites/${siteId}`, { name: 'Taken over' }, headers);
    expect(answer.status).toBe(403);
    expect(answer.body.error.code).toBe('notAllowed');
    expect((await lead.get(`/api/sites/${siteId}`)).body.name).toBe('Test yard');
  });

  it('changes nothing when the browser says that the page is of another site', async () => {
    for (const fetchSite of ['cross-site', 'same-site', 'none']) {
      const answer = await request(server.app).post('/api/sites').set('sec-fetch-site', fetchSite).send({});
      expect(answer.status).toBe(403);
    }
  });

  it('takes the loopback by either of its names', async () => {
    const origin = APP_URL.replace('localhost', '127.0.0.1');
    const answer = await lead.call('patch', `/api/sites/${siteId}`, { name: 'Test yard' }, { origin });
    expect(answer.status).toBe(200);
  });
});

describe('paths', () => {
  it.each(['/api', '/api/nothing', '/api/sites/', '/api/sites/%E0%A4%A'])(
    'that lead nowhere answer in our shape: %s',
    async (path) => {
      const answer = await server.stranger().get(path);
      expect([401, 404]).toContain(answer.status);
      expect(answer.headers['content-type']).toMatch(/json/);
      expect(answer.body.error.code).toMatch(/notFound|signedOut/);
    },
  );
});
