/** What the server is made of besides its database, opened together and closed together. */
import { pino, type Logger } from 'pino';
import type { Db } from '../db/queries/db';
import { createAuth } from './auth/auth';
import type { Env } from './config/env';
import type { Deps } from './http/deps';
import { openLocalMailbox } from './mail/localMailbox';
import { createMailer } from './mail/mailer';

export interface Parts {
  readonly deps: Deps;
  readonly close: () => Promise<void>;
}

export interface PartsOptions {
  readonly env: Env;
  /** It stays the caller's to close. */
  readonly db: Db;
  readonly log?: Logger;
  readonly now?: () => Date;
}

export async function openParts({ env, db, log = makeLog(env), now = () => new Date() }: PartsOptions): Promise<Parts> {
  const mailbox = env.LOCAL_MAIL ? await openLocalMailbox() : null;
  const mailer = createMailer({ url: mailbox?.url ?? env.SMTP_URL ?? '', from: env.MAIL_FROM, log });
  const auth = createAuth({ env, db, mailer });

  async function close(): Promise<void> {
    await mailer.close();
    await mailbox?.close();
  }
  return { deps: { env, db, auth, mailer, mailbox, log, now }, close };
}

/** Warnings and worse on this machine, every request where a log is collected; nothing in tests. */
function makeLog(env: Env): Logger {
  const level = env.NODE_ENV === 'test' ? 'silent' : env.LOCAL_MAIL ? 'error' : 'info';
  return pino({ level }, pino.destination({ dest: 2, sync: false }));
}
