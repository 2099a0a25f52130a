/** Writes already answered: a client that lost the answer sends the write again, and gets the same one. */
import { and, eq, lt } from 'drizzle-orm';
import type { Db } from '../connect';
import { writes } from '../schema/drawings';

export type WriteKind = 'saveDrawing' | 'saveSurvey' | 'saveRevision' | 'restoreRevision';

/** One write as it was asked for. */
export interface Write {
  readonly siteId: string;
  readonly writeId: string;
  readonly userId: string;
  readonly kind: WriteKind;
  /** SHA-256 of everything asked. */
  readonly asked: string;
}

export type Answered<A> =
  | { readonly state: 'new' }
  | { readonly state: 'answered'; readonly answer: A }
  /** The same id came with another content, from another person, or for another kind of write. */
  | { readonly state: 'reused' };

/** To be called with the draft's row locked, so that the same write sent twice at once is done once. */
export async function findAnswer<A>(tx: Db, write: Write): Promise<Answered<A>> {
  const [row] = await tx
    .select()
    .from(writes)
    .where(and(eq(writes.siteId, write.siteId), eq(writes.writeId, write.writeId)));
  if (row === undefined) return { state: 'new' };
  const same = row.kind === write.kind && row.userId === write.userId && row.asked === write.asked;
  return same ? { state: 'answered', answer: row.answer as A } : { state: 'reused' };
}

export async function keepAnswer<A>(tx: Db, write: Write, answer: A): Promise<void> {
  await tx.insert(writes).values({ ...write, answer });
}

/** Forgets the answers given before `moment`: no client still waits for them. Returns how many. */
export async function forgetAnswers(db: Db, moment: Date): Promise<number> {
  const gone = await db.delete(writes).where(lt(writes.writtenAt, moment)).returning({ writeId: writes.writeId });
  return gone.length;
}
