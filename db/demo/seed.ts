/** Fills an empty database with people and two sites to try the product on. */
import { isDeepStrictEqual } from 'node:util';
import { hashPassword } from 'better-auth/crypto';
import { drawingOutlines } from '../../model/drawing/emptyOutline';
import type { Db } from '../connect';
import { isDatabaseEmpty, putPerson, putSite } from '../queries/filling';
import { cedarBend } from './cedarBend';
import type { DemoSite } from './demoSite';
import { harrowLane } from './harrowLane';
import { DEMO_PASSWORD, DEMO_PEOPLE, type DemoPerson } from './people';

const DAY_MS = 24 * 60 * 60 * 1000;

const [, DESIGNER, MASON] = DEMO_PEOPLE;

async function fillSite(db: Db, site: DemoSite, on: 'cedarBend' | 'harrowLane', drawnBy: DemoPerson, now: Date) {
  const members = DEMO_PEOPLE.map((person) => ({ userId: person.id, role: person[on] }));
  const ago = (days: number) => new Date(now.getTime() - days * DAY_MS);
  const last = site.revisions.at(-1);
  const changed = !isDeepStrictEqual(site.draft, { drawing: last?.drawing, survey: last?.survey });
  await putSite(db, {
    name: site.name,
    createdAt: ago((site.revisions[0]?.daysAgo ?? 0) + 3),
    members,
    revisions: site.revisions.map(({ daysAgo, ...revision }) => ({
      ...revision,
      savedBy: drawnBy.id,
      savedByName: drawnBy.name,
      savedAt: ago(daysAgo),
    })),
    draft: { ...site.draft, outline: drawingOutlines(site.draft.drawing) },
    draftChanged: changed,
    changedBy: drawnBy.id,
    changedAt: changed ? ago(1) : ago(last?.daysAgo ?? 1),
  });
}

/** Returns whether it was filled: a database that holds anyone or anything already is left alone. */
export async function fillDemo(db: Db, now: Date): Promise<boolean> {
  if (!(await isDatabaseEmpty(db))) return false;
  const passwordHash = await hashPassword(DEMO_PASSWORD);
  await db.transaction(async (tx) => {
    for (const { id, name, email } of DEMO_PEOPLE) await putPerson(tx, { id, name, email, passwordHash });
    await fillSite(tx, harrowLane, 'harrowLane', MASON, now);
    await fillSite(tx, cedarBend, 'cedarBend', DESIGNER, now);
  });
  return true;
}
