import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { Draft, Revision, RevisionSummary } from '../../model/contracts/drawings';
import { newDrawing } from '../../model/drawing/defaults';
import type { Drawing } from '../../model/drawing/schema';
import { EMPTY_SURVEY } from '../../model/drawing/surveySchema';
import { inches } from '../../model/length/ticks';
import { newWriteId, openTestServer, type Caller, type TestServer } from '../helpers/server';

let server: TestServer;
let lead: Caller;
beforeAll(async () => {
  server = await openTestServer();
  lead = await server.signUp('Lead Revisions');
});
afterAll(() => server.close());

function drawingAt(inch: number): Drawing {
  return { ...newDrawing('imperial'), corners: [{ id: 'c', letter: 'A', x: inches(inch), y: inches(0) }] };
}

async function draftOf(siteId: string): Promise<Draft> {
  return (await lead.get(`/api/sites/${siteId}/draft`)).body as Draft;
}

async function draw(siteId: string, inch: number): Promise<void> {
  const { drawingVersion } = await draftOf(siteId);
  const body = { writeId: newWriteId(), baseVersion: drawingVersion, drawing: drawingAt(inch) };
  expect((await lead.put(`/api/sites/${siteId}/draft/drawing`, body)).status).toBe(200);
}

async function issue(siteId: string, note: string, writeId = newWriteId()) {
  const { drawingVersion, surveyVersion } = await draftOf(siteId);
  return lead.post(`/api/sites/${siteId}/revisions`, { writeId, note, drawingVersion, surveyVersion });
}

async function restore(siteId: string, number: number, writeId = newWriteId()) {
  const { drawingVersion, surveyVersion } = await draftOf(siteId);
  return lead.post(`/api/sites/${siteId}/revisions/${number}/restore`, { writeId, drawingVersion, surveyVersion });
}

describe('revisions', () => {
  it('are numbered from 1 within their site and hold what the draft was', async () => {
    const siteId = await server.makeSite(lead);
    await draw(siteId, 1);
    expect((await issue(siteId, '  for the crew  ')).body).toMatchObject({ number: 1, note: 'for the crew' });
    await draw(siteId, 2);
    expect((await draftOf(siteId)).changedSince).toBe(true);
    const second = await issue(siteId, 'wider');
    expect(second.status).toBe(201);
    expect(second.body).toMatchObject({ number: 2, savedBy: 'Lead Revisions' });

    const list = (await lead.get(`/api/sites/${siteId}/revisions`)).body.revisions as RevisionSummary[];
    expect(list.map((revision) => revision.number)).toEqual([2, 1]);
    const first = (await lead.get(`/api/sites/${siteId}/revisions/1`)).body as Revision;
    expect(first).toMatchObject({ drawing: drawingAt(1), survey: EMPTY_SURVEY });
    expect(await draftOf(siteId)).toMatchObject({ afterRevision: 2, changedSince: false });
  });

  it('count the draft as unchanged when it is drawn back to what was issued', async () => {
    const siteId = await server.makeSite(lead);
    await draw(siteId, 1);
    await issue(siteId, '');
    await draw(siteId, 2);
    expect((await draftOf(siteId)).changedSince).toBe(true);
    await draw(siteId, 1);
    expect((await draftOf(siteId)).changedSince).toBe(false);
  });

  it('are refused when the draft moved on since it was looked at', async () => {
    const siteId = await server.makeSite(lead);
    const before = await draftOf(siteId);
    await draw(siteId, 1);
    const answer = await lead.post(`/api/sites/${siteId}/revisions`, {
      writeId: newWriteId(),
      note: '',
      drawingVersion: before.drawingVersion,
      surveyVersion: before.surveyVersion,
    });
    expect(answer.status).toBe(409);
    expect(answer.body.error.code).toBe('stale');
    expect((await lead.get(`/api/sites/${siteId}/revisions`)).body.revisions).toEqual([]);
  });

  it('sent twice are saved once', async () => {
    const siteId = await server.makeSite(lead);
    await draw(siteId, 1);
    const writeId = newWriteId();
    const answers = await Promise.all([issue(siteId, 'once', writeId), issue(siteId, 'once', writeId)]);
    expect(answers.map((answer) => answer.status)).toEqual([201, 201]);
    expect(answers[1]?.body).toEqual(answers[0]?.body);
    expect((await lead.get(`/api/sites/${siteId}/revisions`)).body.revisions).toHaveLength(1);
  });

  it.each(['0', '-1', '1.5', 'one', '99'])('answer 404 for the number %s', async (number) => {
    const siteId = await server.makeSite(lead);
    await issue(siteId, '');
    expect((await lead.get(`/api/sites/${siteId}/revisions/${number}`)).status).toBe(404);
  });

  it('offer no way to be changed or removed', async () => {
    const siteId = await server.makeSite(lead);
    await issue(siteId, '');
    for (const method of ['put', 'patch', 'delete'] as const) {
      const answer = await lead.call(method, `/api/sites/${siteId}/revisions/1`, { note: 'changed' });
      expect(answer.status).toBe(404);
    }
  });
});

describe('restoring a revision', () => {
  it('makes it the draft again under new versions, and sets unsaved changes aside', async () => {
    const siteId = await server.makeSite(lead);
    await draw(siteId, 1);
    await issue(siteId, 'first');
    await draw(siteId, 2);
    await issue(siteId, 'second');
    await draw(siteId, 3);
    const before = await draftOf(siteId);

    const restored = await restore(siteId, 1);
    expect(restored.status).toBe(200);
    expect(restored.body).toMatchObject({
      drawing: drawingAt(1),
      drawingVersion: before.drawingVersion + 1,
      surveyVersion: before.surveyVersion + 1,
      afterRevision: 1,
      changedSince: false,
    });
    const { body } = await lead.get(`/api/sites/${siteId}/set-aside`);
    expect(body.setAside).toMatchObject([{ part: 'drawing' }]);
    const kept = await lead.get(`/api/sites/${siteId}/set-aside/${body.setAside[0].id}`);
    expect(kept.body.drawing).toEqual(drawingAt(3));
  });

  it('sets nothing aside when the draft was saved as a revision', async () => {
    const siteId = await server.makeSite(lead);
    await draw(siteId, 1);
    await issue(siteId, 'first');
    await draw(siteId, 2);
    await issue(siteId, 'second');
    expect((await restore(siteId, 1)).status).toBe(200);
    expect((await lead.get(`/api/sites/${siteId}/set-aside`)).body.setAside).toEqual([]);
  });

  it('is done once when sent twice, and refused from an older draft', async () => {
    const siteId = await server.makeSite(lead);
    await draw(siteId, 1);
    await issue(siteId, 'first');
    const { drawingVersion, surveyVersion } = await draftOf(siteId);
    const asked = { writeId: newWriteId(), drawingVersion, surveyVersion };
    const path = `/api/sites/${siteId}/revisions/1/restore`;
    const first = await lead.post(path, asked);
    const again = await lead.post(path, asked);
    expect([first.status, again.status]).toEqual([200, 200]);
    expect(again.body.drawingVersion).toBe(drawingVersion + 1);

    const older = await lead.post(path, { ...asked, writeId: newWriteId() });
    expect(older.status).toBe(409);
    expect(older.body.error.code).toBe('stale');
  });
});
