import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { cedarBend } from '../../db/demo/cedarBend';
import { newDrawing } from '../../model/drawing/defaults';
import type { Drawing } from '../../model/drawing/schema';
import { EMPTY_SURVEY } from '../../model/drawing/surveySchema';
import { feet, ticks } from '../../model/length/ticks';
import { newWriteId, openTestServer, type Caller, type TestServer } from '../helpers/server';

let server: TestServer;
let lead: Caller;
beforeAll(async () => {
  server = await openTestServer();
  lead = await server.signUp('Lead Solves');
});
afterAll(() => server.close());

const { drawing, survey } = cedarBend.draft;

/** A long fence of so many runs, end to end. */
function fence(runs: number): Drawing {
  const letter = (i: number) =>
    String.fromCharCode(65 + Math.floor(i / 676), 65 + (Math.floor(i / 26) % 26), 65 + (i % 26));
  return {
    ...newDrawing('imperial'),
    corners: Array.from({ length: runs + 1 }, (_, i) => ({
      id: `c${i}`,
      letter: letter(i),
      x: ticks(feet(6) * (i % 50)),
      y: ticks(feet(20) * Math.floor(i / 50)),
    })),
    runs: Array.from({ length: runs }, (_, i) => ({ id: `r${i}`, from: `c${i}`, to: `c${i + 1}`, wallTypeId: 'wall' })),
  };
}

describe('solving', () => {
  it('answers the whole set-out, its maps as objects by id', async () => {
    const answer = await lead.post('/api/solve', { drawing, survey });
    expect(answer.status).toBe(200);
    // 24 ft along A–B; six corners, six poles; the level line 47 7/8 in over the high point at C.
    expect(answer.body.walls.runById.rAB.length).toBe(feet(24));
    expect(Object.keys(answer.body.poles.poleById).sort()).toEqual(['cA', 'cB', 'cC', 'cD', 'cE', 'cF']);
    expect(answer.body.ground.levelLine).toBe(feet(0, 47.875));
    expect(answer.body.ground.heightByCorner.cC).toBe(0);
    expect(Array.isArray(answer.body.reasons)).toBe(true);
  });

  it('refuses what is no drawing, with the field', async () => {
    const answer = await lead.post('/api/solve', { drawing: { ...drawing, tapeStep: 7 }, survey });
    expect(answer.status).toBe(400);
    expect(answer.body.error.field).toBe('drawing.tapeStep');
  });

  it('refuses what would hold the server up', async () => {
    const answer = await lead.post('/api/solve', { drawing: fence(1001), survey: EMPTY_SURVEY });
    expect(answer.status).toBe(413);
    expect(answer.body.error).toMatchObject({ code: 'tooLarge', field: 'drawing.runs' });
  });
});

describe('sheets', () => {
  it('are a PDF of the draft, and of a revision under its number', async () => {
    const siteId = await server.makeSite(lead);
    await lead.patch(`/api/sites/${siteId}`, { name: 'Yard "No. 3" / Süd' });
    await lead.put(`/api/sites/${siteId}/draft/drawing`, { writeId: newWriteId(), baseVersion: 0, drawing });
    await lead.put(`/api/sites/${siteId}/draft/survey`, { writeId: newWriteId(), baseVersion: 0, survey });
    const asked = { writeId: newWriteId(), note: 'To lay by', drawingVersion: 1, surveyVersion: 1 };
    await lead.post(`/api/sites/${siteId}/revisions`, asked);

    for (const [where, name] of [
      ['draft/sheets.pdf', 'draft'],
      ['revisions/1/sheets.pdf', 'revision-1'],
      ['revisions/1/sheets.pdf?paper=a3', 'revision-1'],
    ] as const) {
      const answer = await lead.get(`/api/sites/${siteId}/${where}`);
      expect(answer.status, where).toBe(200);
      expect(answer.headers['content-type']).toBe('application/pdf');
      expect(answer.headers['content-disposition']).toBe(`inline; filename*=UTF-8''Yard-No-3-S%C3%BCd-${name}.pdf`);
      const bytes = answer.body as Buffer;
      expect(bytes.subarray(0, 5).toString()).toBe('%PDF-');
      expect(bytes.subarray(-6).toString()).toContain('%%EOF');
    }
  });

  it('are refused on paper that there is none of, and for a revision that there is none of', async () => {
    const siteId = await server.makeSite(lead);
    const wrong = await lead.get(`/api/sites/${siteId}/draft/sheets.pdf?paper=b5`);
    expect(wrong.status).toBe(400);
    expect(wrong.body.error.field).toBe('paper');
    expect((await lead.get(`/api/sites/${siteId}/revisions/3/sheets.pdf`)).status).toBe(404);
  });
});
