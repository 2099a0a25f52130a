import type { Logger } from 'pino';
import type { Db } from '../../db/queries/db';
import type { Auth } from '../auth/auth';
import type { Env } from '../config/env';
import type { LocalMailbox } from '../mail/localMailbox';
import type { Mailer } from '../mail/mailer';

/** What the app is built from; tests give their own. */
export interface Deps {
  readonly env: Env;
  readonly db: Db;
  readonly auth: Auth;
  readonly mailer: Mailer;
  /** Null unless the server runs in local mode. */
  readonly mailbox: LocalMailbox | null;
  readonly log: Logger;
  readonly now: () => Date;
}
