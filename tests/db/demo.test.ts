import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { drawingSchema } from '../../model/drawing/schema';
import { surveySchema } from '../../model/drawing/surveySchema';
import { feet, mm, type Ticks } from '../../model/length/ticks';
import { solve } from '../../model/setOut';
import { cedarBend } from '../../db/demo/cedarBend';
import { harrowLane } from '../../db/demo/harrowLane';
import { DEMO_PASSWORD, DEMO_PEOPLE } from '../../db/demo/people';
import { fillDemo } from '../../db/demo/seed';
import { openTestServer, type TestServer } from '../helpers/server';

const versions = [cedarBend, harrowLane].flatMap((site) => [
  ...site.revisions.map((revision, i) => [`${site.name}, revision ${i + 1}`, revision] as const),
  [`${site.name}, draft`, site.draft] as const,
]);

describe.each(versions)('%s', (_name, { drawing, survey }) => {
  it('is a drawing and a survey that the server takes', () => {
    expect(drawingSchema.parse(drawing)).toEqual(drawing);
    expect(surveySchema.parse(survey)).toEqual(survey);
  });

  it('solves with nothing blocked and no rule broken, every pole with its two braces', () => {
    const setOut = solve(drawing, survey);
    expect(setOut.reasons.filter((reason) => reason.weight !== 'note')).toEqual([]);
    expect(setOut.ground.assumed).toBe(false);
    expect(setOut.poles.poles).toHaveLength(drawing.corners.length);
    for (const pole of setOut.poles.poles) expect(pole.braces, pole.letter).toHaveLength(2);
  });

  it('meets every height that the courses have to', () => {
    const { controls } = solve(drawing, survey).coursing.answer;
    expect(controls.length).toBeGreaterThan(0);
    expect(controls.filter((control) => !control.met || control.miss !== 0)).toEqual([]);
  });
});

describe('Cedar Bend tool store', () => {
  const [first, second, third] = cedarBend.revisions.map((revision) => solve(revision.drawing, revision.survey));
  const braceOfA = (setOut: typeof first) => setOut?.poles.poleById.get('cA')?.braces.map((brace) => brace.turned);

  it('has corner A braced straight until the door and its path come near, and turned from then on', () => {
    expect(braceOfA(first)).toEqual([0, 0]);
    for (const setOut of [second, third]) {
      const braces = setOut?.poles.poleById.get('cA')?.braces ?? [];
      const south = braces.find((brace) => brace.turnedFor !== null);
      expect(south?.turnedFor).toEqual({ kind: 'keepClear', id: 'path' });
      expect(south?.turned).toBeGreaterThanOrEqual(10);
      expect(south?.turned).toBeLessThanOrEqual(30);
    }
  });

  it('has its high point at C, 47 7/8 in below the line, and its first mark 43 7/8 in below it at every pole', () => {
    expect(second?.ground.highPoint?.station).toEqual({ kind: 'corner', cornerId: 'cC' });
    expect(second?.ground.levelLine).toBe(feet(0, 47.875));
    const firsts = second?.marks.poles.map((pole) => pole.marks.find((mark) => mark.course === 1)?.fromLine);
    expect(firsts).toEqual(Array<Ticks>(6).fill(feet(0, -43.875)));
  });

  it('is 24 by 18 ft with a notch of 10 by 6 ft: 372 sq ft', () => {
    expect(second?.walls.footprints).toHaveLength(1);
    expect(second?.walls.footprints[0]?.areaOutside).toBe(372 * feet(1) ** 2);
    expect(second?.walls.perimeter).toBe(feet(84));
  });

  it('lays 23 courses of 4 in, and in revision 3 the eleven courses below the heads a little thicker', () => {
    expect(first?.coursing.answer.intervals.map((interval) => interval.count).reduce((a, b) => a + b)).toBe(22);
    expect(first?.coursing.courses.map((course) => course.top)).toEqual(
      Array.from({ length: 23 }, (_, i) => feet(0, 4 * (i + 1))),
    );
    const head = third?.coursing.courses.find((course) => course.number === 20);
    expect(head?.top).toBe(feet(0, 81));
    // 45 in from sill to head in 11 courses: 45/11 − 3 5/8 in of joint.
    const interval = third?.coursing.answer.intervals.find((each) => each.firstCourse <= 15 && each.lastCourse >= 15);
    expect(interval?.joint).toBeCloseTo((45 / 11 - 3.625) * 16_256, 6);
  });
});

describe('Harrow Lane studio', () => {
  it('has two lifts from its second revision on, each lower than ten times the wall’s thickness', () => {
    const [first, second] = harrowLane.revisions.map((revision) => solve(revision.drawing, revision.survey));
    expect(first?.coursing.lifts.map((lift) => [lift.base, lift.top])).toEqual([[mm(0), mm(2300)]]);
    expect(second?.coursing.lifts.map((lift) => [lift.base, lift.top])).toEqual([
      [mm(0), mm(2300)],
      [mm(2500), mm(4700)],
    ]);
    expect(second?.coursing.courses).toHaveLength(23 + 22);
    expect(second?.marks.poles.map((pole) => pole.lift).sort()).toEqual([1, 1, 1, 1, 2, 2, 2, 2]);
  });

  it('ends aslant in its third', () => {
    const { drawing, survey } = harrowLane.revisions[2] ?? harrowLane.draft;
    const angle = solve(drawing, survey).walls.cornerById.get('cB')?.angle;
    // Half a metre in 4.74 m.
    expect(angle).toBeCloseTo((Math.atan2(4.74, 0.5) * 180) / Math.PI, 6);
  });
});

describe('a database filled with the demo', () => {
  let server: TestServer;
  beforeAll(async () => {
    server = await openTestServer();
    expect(await fillDemo(server.database.db, new Date('2025-06-01T12:00:00Z'))).toBe(true);
  });
  afterAll(() => server.close());

  it('lets each of its people in, to both sites, in roles that differ', async () => {
    for (const { email, cedarBend: one, harrowLane: two } of DEMO_PEOPLE) {
      const caller = server.stranger();
      const signedIn = await caller.post('/api/auth/sign-in/email', { email, password: DEMO_PASSWORD });
      expect(signedIn.status, email).toBe(200);
      const { sites } = (await caller.get('/api/sites')).body;
      expect(sites).toMatchObject([
        { name: 'Cedar Bend tool store', role: one, people: 4, lastRevision: 3, draftChanged: true },
        { name: 'Harrow Lane studio', role: two, people: 4, lastRevision: 3, draftChanged: false },
      ]);
      expect(sites[0].outline[0].length).toBeGreaterThanOrEqual(6);
    }
    expect(new Set(DEMO_PEOPLE.map((person) => person.cedarBend)).size).toBe(4);
  });

  it('answers its drafts, revisions and sheets', async () => {
    const caller = server.stranger();
    await caller.post('/api/auth/sign-in/email', { email: DEMO_PEOPLE[0].email, password: DEMO_PASSWORD });
    for (const { id } of (await caller.get('/api/sites')).body.sites) {
      const draft = await caller.get(`/api/sites/${id}/draft`);
      expect(draft.body).toMatchObject({ afterRevision: 3, drawingVersion: 3, surveyVersion: 3 });
      const { revisions } = (await caller.get(`/api/sites/${id}/revisions`)).body;
      expect(revisions.map((revision: { number: number }) => revision.number)).toEqual([3, 2, 1]);
      expect(new Set(revisions.map((revision: { note: string }) => revision.note)).size).toBe(3);
      expect((await caller.get(`/api/sites/${id}/revisions/2`)).status).toBe(200);
      expect((await caller.get(`/api/sites/${id}/revisions/3/sheets.pdf`)).status).toBe(200);
      expect((await caller.get(`/api/sites/${id}/draft/sheets.pdf`)).status).toBe(200);
    }
  });

  it('is left alone from then on', async () => {
    expect(await fillDemo(server.database.db, new Date())).toBe(false);
    const { rows } = await server.database.pool.query('select count(*)::int as many from sites');
    expect(rows[0].many).toBe(2);
  });
});
