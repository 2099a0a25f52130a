import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { staleSchema, type Draft } from '../../model/contracts/drawings';
import { newDrawing } from '../../model/drawing/defaults';
import type { Drawing } from '../../model/drawing/schema';
import { EMPTY_SURVEY, type Survey } from '../../model/drawing/surveySchema';
import { inches } from '../../model/length/ticks';
import { newWriteId, openTestServer, type Caller, type TestServer } from '../helpers/server';

let server: TestServer;
let lead: Caller;
let mason: Caller;
beforeAll(async () => {
  server = await openTestServer();
  lead = await server.signUp('Lead Drafts');
  mason = await server.signUp('Mason Drafts');
});
afterAll(() => server.close());

/** A drawing told from others by one corner, so many inches along. */
function drawingAt(inch: number): Drawing {
  return { ...newDrawing('imperial'), corners: [{ id: 'c', letter: 'A', x: inches(inch), y: inches(0) }] };
}

function surveyOf(down: number): Survey {
  return {
    ...EMPTY_SURVEY,
    readings: [{ id: 'r', station: { kind: 'corner', cornerId: 'c' }, down: inches(down) }],
  };
}

async function draftOf(siteId: string): Promise<Draft> {
  return (await lead.get(`/api/sites/${siteId}/draft`)).body as Draft;
}

function saveDrawing(caller: Caller, siteId: string, baseVersion: number, drawing: Drawing, writeId = newWriteId()) {
  return caller.put(`/api/sites/${siteId}/draft/drawing`, { writeId, baseVersion, drawing });
}

function saveSurvey(caller: Caller, siteId: string, baseVersion: number, survey: Survey, writeId = newWriteId()) {
  return caller.put(`/api/sites/${siteId}/draft/survey`, { writeId, baseVersion, survey });
}

describe('the draft', () => {
  it('starts as an empty drawing in the units asked for, never saved', async () => {
    const siteId = await server.makeSite(lead);
    expect(await draftOf(siteId)).toMatchObject({
      drawing: newDrawing('imperial'),
      drawingVersion: 0,
      survey: EMPTY_SURVEY,
      surveyVersion: 0,
      afterRevision: null,
      changedSince: false,
      changedBy: 'Lead Drafts',
    });
  });

  it('takes each save over the version it was made from, drawing and survey apart', async () => {
    const siteId = await server.makeSite(lead, [[mason, 'mason']]);
    expect((await saveDrawing(lead, siteId, 0, drawingAt(1))).body).toEqual({ version: 1 });
    expect((await saveSurvey(mason, siteId, 0, surveyOf(48))).body).toEqual({ version: 1 });
    expect((await saveDrawing(lead, siteId, 1, drawingAt(2))).body).toEqual({ version: 2 });
    expect(await draftOf(siteId)).toMatchObject({
      drawing: drawingAt(2),
      drawingVersion: 2,
      survey: surveyOf(48),
      surveyVersion: 1,
      changedSince: true,
      changedBy: 'Lead Drafts',
    });
  });

  it('sets a stale save aside and answers with what is there now', async () => {
    const siteId = await server.makeSite(lead);
    await saveDrawing(lead, siteId, 0, drawingAt(1));
    const refused = await saveDrawing(lead, siteId, 0, drawingAt(99));
    expect(refused.status).toBe(409);
    const stale = staleSchema.parse(refused.body);
    expect(stale.current.drawing).toEqual(drawingAt(1));
    expect(stale.current.drawingVersion).toBe(1);

    const { body } = await lead.get(`/api/sites/${siteId}/set-aside`);
    expect(body.setAside).toMatchObject([{ id: stale.setAsideId, part: 'drawing', savedBy: 'Lead Drafts' }]);
    const kept = await lead.get(`/api/sites/${siteId}/set-aside/${stale.setAsideId}`);
    expect(kept.body).toMatchObject({ drawing: drawingAt(99), survey: null });
  });

  it('lets one of many saves made at once through, and keeps every other', async () => {
    const siteId = await server.makeSite(lead);
    const inchesAlong = [1, 2, 3, 4, 5, 6, 7, 8];
    const answers = await Promise.all(inchesAlong.map((inch) => saveDrawing(lead, siteId, 0, drawingAt(inch))));
    expect(answers.map((answer) => answer.status).sort()).toEqual([200, ...Array<number>(7).fill(409)]);

    const { body } = await lead.get(`/api/sites/${siteId}/set-aside`);
    const ids = (body.setAside as { id: string }[]).map((each) => each.id);
    const kept = await Promise.all(ids.map((id) => lead.get(`/api/sites/${siteId}/set-aside/${id}`)));
    const all = [...kept.map((each) => each.body.drawing), (await draftOf(siteId)).drawing] as Drawing[];
    expect(all.map((drawing) => drawing.corners[0]?.x).sort((a = inches(0), b = inches(0)) => a - b)).toEqual(
      inchesAlong.map((inch) => inches(inch)),
    );
    expect((await draftOf(siteId)).drawingVersion).toBe(1);
  });

  it('does a save sent twice only once, and answers the same', async () => {
    const siteId = await server.makeSite(lead);
    const writeId = newWriteId();
    const answers = await Promise.all([1, 2, 3].map(() => saveDrawing(lead, siteId, 0, drawingAt(5), writeId)));
    for (const answer of answers) {
      expect(answer.status).toBe(200);
      expect(answer.body).toEqual({ version: 1 });
    }
    await saveDrawing(lead, siteId, 1, drawingAt(6));
    expect((await saveDrawing(lead, siteId, 0, drawingAt(5), writeId)).body).toEqual({ version: 1 });
    expect((await draftOf(siteId)).drawing).toEqual(drawingAt(6));
    expect((await lead.get(`/api/sites/${siteId}/set-aside`)).body.setAside).toEqual([]);
  });

  it('sets a stale save sent twice aside only once', async () => {
    const siteId = await server.makeSite(lead);
    await saveSurvey(lead, siteId, 0, surveyOf(48));
    const writeId = newWriteId();
    const first = await saveSurvey(lead, siteId, 0, surveyOf(50), writeId);
    const second = await saveSurvey(lead, siteId, 0, surveyOf(50), writeId);
    expect([first.status, second.status]).toEqual([409, 409]);
    expect(second.body.setAsideId).toBe(first.body.setAsideId);
    expect((await lead.get(`/api/sites/${siteId}/set-aside`)).body.setAside).toHaveLength(1);
  });

  it('refuses a write id that stood for something else', async () => {
    const siteId = await server.makeSite(lead, [[mason, 'mason']]);
    const writeId = newWriteId();
    await saveSurvey(lead, siteId, 0, surveyOf(48), writeId);
    const reused = [
      await saveSurvey(lead, siteId, 1, surveyOf(49), writeId),
      await saveSurvey(mason, siteId, 0, surveyOf(48), writeId),
      await saveDrawing(lead, siteId, 0, drawingAt(1), writeId),
    ];
    for (const answer of reused) {
      expect(answer.status).toBe(400);
      expect(answer.body.error).toMatchObject({ code: 'badInput', field: 'writeId' });
    }
    expect(await draftOf(siteId)).toMatchObject({ drawingVersion: 0, surveyVersion: 1, survey: surveyOf(48) });
  });
});

describe('what was set aside', () => {
  it('is let go by whoever saved it, or by who may edit that part', async () => {
    const designer = await server.signUp('Designer Aside');
    const siteId = await server.makeSite(lead, [
      [mason, 'mason'],
      [designer, 'designer'],
    ]);
    await saveDrawing(lead, siteId, 0, drawingAt(1));
    await saveSurvey(lead, siteId, 0, surveyOf(48));
    const drawingAside = (await saveDrawing(designer, siteId, 0, drawingAt(2))).body.setAsideId as string;
    const surveyAside = (await saveSurvey(designer, siteId, 0, surveyOf(49))).body.setAsideId as string;

    expect((await mason.delete(`/api/sites/${siteId}/set-aside/${drawingAside}`)).status).toBe(403);
    expect((await mason.delete(`/api/sites/${siteId}/set-aside/${surveyAside}`)).status).toBe(204);
    expect((await lead.delete(`/api/sites/${siteId}/set-aside/${drawingAside}`)).status).toBe(204);
    expect((await lead.delete(`/api/sites/${siteId}/set-aside/${drawingAside}`)).status).toBe(404);
  });
});
