import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { newDrawing } from '../../model/drawing/defaults';
import { getDraft, saveDrawing } from '../../db/queries/drafts';
import { putPerson } from '../../db/queries/filling';
import { listRevisions, saveRevision } from '../../db/queries/revisions';
import { createSite, deleteSite } from '../../db/queries/sites';
import { forgetAnswers } from '../../db/queries/writes';
import { openTestDatabase, type TestDatabase } from '../helpers/database';

const USER = 'person-1';
const NAME = 'Ada Ledger';

let database: TestDatabase;
beforeAll(async () => {
  database = await openTestDatabase();
  await putPerson(database.db, { id: USER, name: NAME, email: 'ada@site.example', passwordHash: 'none' });
});
afterAll(() => database.remove());

async function makeSite(): Promise<string> {
  const drawing = newDrawing('metric');
  return (await createSite(database.db, { name: 'Yard', drawing, outline: [], userId: USER })).id;
}

function issue(siteId: string, note: string) {
  const write = { siteId, writeId: randomUUID(), userId: USER, kind: 'saveRevision' as const, asked: note };
  return saveRevision(database.db, write, { drawingVersion: 0, surveyVersion: 0, note, savedByName: NAME });
}

/** PostgreSQL's own words for why a statement failed. */
async function refusal(statement: string, values: unknown[]): Promise<{ code: string; message: string } | null> {
  return database.pool.query(statement, values).then(
    () => null,
    (error: { code: string; message: string }) => ({ code: error.code, message: error.message }),
  );
}

describe('a revision in the database', () => {
  const KEPT = { code: '23001', message: 'a revision is never changed or removed' };

  it.each([
    ['changed', "update revisions set note = 'other' where site_id = $1"],
    ['renumbered', 'update revisions set number = number + 1 where site_id = $1'],
    ['removed', 'delete from revisions where site_id = $1'],
  ])('can’t be %s, not even by SQL', async (_what, statement) => {
    const siteId = await makeSite();
    await issue(siteId, 'as issued');
    expect(await refusal(statement, [siteId])).toEqual(KEPT);
    expect(await listRevisions(database.db, siteId)).toMatchObject([{ number: 1, note: 'as issued' }]);
  });

  it('can’t be emptied away with the others', async () => {
    const siteId = await makeSite();
    await issue(siteId, 'as issued');
    expect(await refusal('truncate revisions', [])).toEqual(KEPT);
    expect(await refusal('truncate sites cascade', [])).toEqual(KEPT);
    expect(await listRevisions(database.db, siteId)).toHaveLength(1);
  });

  it('goes with its whole site, with everything else on it', async () => {
    const siteId = await makeSite();
    const other = await makeSite();
    await issue(siteId, 'gone');
    await issue(other, 'stays');
    await deleteSite(database.db, siteId);
    for (const table of ['revisions', 'drafts', 'memberships', 'writes']) {
      const left = await database.pool.query(`select 1 from ${table} where site_id = $1`, [siteId]);
      expect(left.rowCount).toBe(0);
    }
    expect(await listRevisions(database.db, other)).toMatchObject([{ note: 'stays' }]);
  });

  it('keeps the person who saved it', async () => {
    const siteId = await makeSite();
    await issue(siteId, 'signed');
    expect((await refusal('delete from "user" where id = $1', [USER]))?.message).toMatch(/foreign key constraint/);
    expect(await listRevisions(database.db, siteId)).toMatchObject([{ savedBy: NAME }]);
  });
});

describe('numbers', () => {
  it('are distinct and consecutive however many save at once', async () => {
    const siteId = await makeSite();
    const many = 25;
    const saved = await Promise.all(Array.from({ length: many }, (_, i) => issue(siteId, `note ${i}`)));
    const numbers = saved.map((each) => (each?.state === 'saved' ? each.revision.number : 0));
    expect(numbers.sort((a, b) => a - b)).toEqual(Array.from({ length: many }, (_, i) => i + 1));
  });

  it('can’t be given twice, not even by SQL', async () => {
    const siteId = await makeSite();
    await issue(siteId, 'first');
    const copy = `insert into revisions (site_id, number, note, drawing, survey, saved_by, saved_by_name)
      select site_id, number, note, drawing, survey, saved_by, saved_by_name from revisions where site_id = $1`;
    expect(await refusal(copy, [siteId])).toMatchObject({ code: '23505' });
  });
});

describe('a save that fails half way', () => {
  it('leaves the draft as it was', async () => {
    const siteId = await makeSite();
    const write = { siteId, writeId: 'not-a-uuid', userId: USER, kind: 'saveDrawing' as const, asked: '' };
    const saving = { baseVersion: 0, drawing: newDrawing('imperial'), outline: [] };
    await expect(saveDrawing(database.db, write, saving)).rejects.toThrow();
    expect(await getDraft(database.db, siteId)).toMatchObject({ drawingVersion: 0, drawing: { units: 'metric' } });
  });
});

describe('answers kept', () => {
  it('are forgotten once they are old, and no sooner', async () => {
    const siteId = await makeSite();
    await issue(siteId, 'kept');
    const kept = () => database.pool.query('select 1 from writes where site_id = $1', [siteId]);
    await forgetAnswers(database.db, new Date(Date.now() - 60_000));
    expect((await kept()).rowCount).toBe(1);
    await forgetAnswers(database.db, new Date(Date.now() + 60_000));
    expect((await kept()).rowCount).toBe(0);
  });
});
