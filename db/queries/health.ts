import { sql } from 'drizzle-orm';
import type { Db } from '../connect';

/** Whether the database answers a question. */
export async function isDatabaseThere(db: Db): Promise<boolean> {
  return db.execute(sql`select 1`).then(
    () => true,
    () => false,
  );
}
