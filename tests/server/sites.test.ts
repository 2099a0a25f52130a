import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { SiteSummary } from '../../model/contracts/sites';
import { newDrawing } from '../../model/drawing/defaults';
import { feet } from '../../model/length/ticks';
import { newWriteId, openTestServer, type Caller, type TestServer } from '../helpers/server';

let server: TestServer;
let lead: Caller;
let mason: Caller;
beforeAll(async () => {
  server = await openTestServer();
  lead = await server.signUp('Lead Sites');
  mason = await server.signUp('Mason Sites');
});
afterAll(() => server.close());

async function listFor(caller: Caller): Promise<SiteSummary[]> {
  return (await caller.get('/api/sites')).body.sites as SiteSummary[];
}

describe('the list of sites', () => {
  it('shows a person their own sites, the one changed last first, with what the list needs to know', async () => {
    const first = await server.makeSite(lead, [[mason, 'mason']]);
    const second = await server.makeSite(lead);
    expect((await listFor(lead)).map((site) => site.id)).toEqual([second, first]);

    const triangle = {
      ...newDrawing('imperial'),
      corners: [
        { id: 'a', letter: 'A', x: feet(0), y: feet(0) },
        { id: 'b', letter: 'B', x: feet(3), y: feet(0) },
        { id: 'c', letter: 'C', x: feet(0), y: feet(4) },
      ],
      runs: [
        { id: 'ab', from: 'a', to: 'b', wallTypeId: 'wall' },
        { id: 'bc', from: 'b', to: 'c', wallTypeId: 'wall' },
        { id: 'ca', from: 'c', to: 'a', wallTypeId: 'wall' },
      ],
    };
    const body = { writeId: newWriteId(), baseVersion: 0, drawing: triangle };
    await lead.put(`/api/sites/${first}/draft/drawing`, body);
    const [top] = await listFor(lead);
    expect(top).toMatchObject({ id: first, role: 'lead', people: 2, lastRevision: null, draftChanged: true });
    expect(top?.outline).toHaveLength(1);
    expect(new Set(top?.outline[0]?.map(({ x, y }) => `${x},${y}`))).toEqual(
      new Set([`0,0`, `${feet(3)},0`, `0,${feet(4)}`]),
    );
    expect(await listFor(mason)).toMatchObject([{ id: first, role: 'mason' }]);
  });

  it('is empty for someone new', async () => {
    expect(await listFor(await server.signUp('New Here'))).toEqual([]);
  });
});

describe('a site', () => {
  it('is renamed, and removed with all that is on it', async () => {
    const siteId = await server.makeSite(lead);
    const renamed = await lead.patch(`/api/sites/${siteId}`, { name: '  Lower yard ' });
    expect(renamed.body).toMatchObject({ id: siteId, name: 'Lower yard', role: 'lead' });
    expect((await lead.get(`/api/sites/${siteId}`)).body.name).toBe('Lower yard');

    const asked = { writeId: newWriteId(), note: '', drawingVersion: 0, surveyVersion: 0 };
    expect((await lead.post(`/api/sites/${siteId}/revisions`, asked)).status).toBe(201);
    expect((await lead.delete(`/api/sites/${siteId}`)).status).toBe(204);
    expect((await lead.get(`/api/sites/${siteId}`)).status).toBe(404);
    expect((await lead.get(`/api/sites/${siteId}/revisions/1`)).status).toBe(404);
  });

  it.each([
    ['', 'name'],
    ['   ', 'name'],
    ['x'.repeat(81), 'name'],
  ])('refuses the name "%s"', async (name, field) => {
    const answer = await lead.post('/api/sites', { name, units: 'metric' });
    expect(answer.status).toBe(400);
    expect(answer.body.error).toMatchObject({ code: 'badInput', field });
  });
});

describe('the crew', () => {
  it('changes by the lead’s hand, and a changed role counts at once', async () => {
    const siteId = await server.makeSite(lead, [[mason, 'mason']]);
    const path = `/api/sites/${siteId}/members/${mason.id}`;
    const save = () =>
      mason.put(`/api/sites/${siteId}/draft/drawing`, {
        writeId: newWriteId(),
        baseVersion: 0,
        drawing: newDrawing('metric'),
      });
    expect((await save()).status).toBe(403);
    expect((await lead.patch(path, { role: 'designer' })).status).toBe(204);
    expect((await save()).status).toBe(200);
    const { body } = await lead.get(`/api/sites/${siteId}/crew`);
    expect(body.members).toMatchObject([
      { name: 'Lead Sites', role: 'lead', email: lead.email },
      { name: 'Mason Sites', role: 'designer' },
    ]);
    expect((await lead.delete(path)).status).toBe(204);
    expect((await mason.get(`/api/sites/${siteId}`)).status).toBe(404);
    expect((await lead.delete(path)).status).toBe(404);
  });

  it('keeps its last lead', async () => {
    const siteId = await server.makeSite(lead, [[mason, 'mason']]);
    const own = `/api/sites/${siteId}/members/${lead.id}`;
    expect((await lead.patch(own, { role: 'observer' })).status).toBe(409);
    expect((await lead.delete(own)).status).toBe(409);
    expect((await lead.patch(`/api/sites/${siteId}/members/${mason.id}`, { role: 'lead' })).status).toBe(204);
    expect((await lead.patch(own, { role: 'observer' })).status).toBe(204);
    expect((await lead.get(`/api/sites/${siteId}`)).body.role).toBe('observer');
  });

  it('keeps a lead when two leads step down at the same time', async () => {
    const siteId = await server.makeSite(lead, [[mason, 'lead']]);
    const answers = await Promise.all([
      lead.patch(`/api/sites/${siteId}/members/${lead.id}`, { role: 'mason' }),
      mason.patch(`/api/sites/${siteId}/members/${mason.id}`, { role: 'mason' }),
    ]);
    expect(answers.map((answer) => answer.status).sort()).toEqual([204, 409]);
  });

  it('lets anyone leave, and nobody else take them off', async () => {
    const observer = await server.signUp('Observer Leaves');
    const siteId = await server.makeSite(lead, [
      [mason, 'mason'],
      [observer, 'observer'],
    ]);
    expect((await mason.delete(`/api/sites/${siteId}/members/${observer.id}`)).status).toBe(403);
    expect((await observer.delete(`/api/sites/${siteId}/members/${observer.id}`)).status).toBe(204);
    expect((await observer.get(`/api/sites/${siteId}`)).status).toBe(404);
  });
});

describe('another site’s ids', () => {
  it('lead nowhere, even for someone who works on both sites', async () => {
    const other = await server.signUp('Other Lead');
    const mine = await server.makeSite(lead);
    const theirs = await server.makeSite(other, [[lead, 'observer']]);
    const asked = { writeId: newWriteId(), note: '', drawingVersion: 0, surveyVersion: 0 };
    await other.post(`/api/sites/${theirs}/revisions`, asked);
    const drawing = newDrawing('metric');
    const save = () =>
      other.put(`/api/sites/${theirs}/draft/drawing`, { writeId: newWriteId(), baseVersion: 0, drawing });
    await save();
    const setAsideId = (await save()).body.setAsideId as string;
    const invitation = await other.post(`/api/sites/${theirs}/invitations`, {
      email: 'third@site.example',
      role: 'mason',
    });
    expect(setAsideId).toBeTruthy();

    for (const path of [
      `/api/sites/${mine}/set-aside/${setAsideId}`,
      `/api/sites/${mine}/revisions/1`,
      `/api/sites/${mine.replace(/^./, (c) => (c === '0' ? '1' : '0'))}`,
      '/api/sites/not-an-id',
    ]) {
      expect((await lead.get(path)).status).toBe(404);
    }
    expect((await lead.delete(`/api/sites/${mine}/set-aside/${setAsideId}`)).status).toBe(404);
    expect((await lead.delete(`/api/sites/${mine}/invitations/${invitation.body.id}`)).status).toBe(404);
    expect((await lead.patch(`/api/sites/${mine}/members/${other.id}`, { role: 'mason' })).status).toBe(404);
    expect((await other.get(`/api/sites/${theirs}/set-aside/${setAsideId}`)).status).toBe(200);
  });
});
