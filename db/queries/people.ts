import { inArray } from 'drizzle-orm';
import type { Db } from '../connect';
import { user } from '../schema/auth';

/** Those of the addresses that have an account. */
export async function findPeople(db: Db, emails: readonly string[]): Promise<string[]> {
  const rows = await db
    .select({ email: user.email })
    .from(user)
    .where(inArray(user.email, [...emails]));
  return rows.map((row) => row.email);
}
