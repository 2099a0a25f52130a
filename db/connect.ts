import { drizzle } from 'drizzle-orm/node-postgres';
import type { NodePgDatabase } from 'drizzle-orm/node-postgres';
import pg from 'pg';
import * as auth from './schema/auth';
import * as drawings from './schema/drawings';
import * as sites from './schema/sites';

/** Every table, as Drizzle and better-auth want them. */
export const tables = { ...auth, ...sites, ...drawings };

/** A database or a transaction on it: what every query takes first. */
export type Db = NodePgDatabase<typeof tables>;

export interface Connection {
  readonly db: Db;
  readonly pool: pg.Pool;
  /** Waits for the queries under way, then lets go of the server. */
  readonly close: () => Promise<void>;
}

/** Opens a pool of connections to the PostgreSQL database at `url`. */
export function connect(url: string, options: { readonly most?: number } = {}): Connection {
  const pool = new pg.Pool({
    connectionString: url,
    max: options.most ?? 10,
    connectionTimeoutMillis: 10_000,
    application_name: 'polewright',
  });
  // An idle connection that breaks is replaced by the pool at the next query; without a listener it would end the process.
  pool.on('error', () => undefined);
  return { db: drizzle(pool, { schema: tables }), pool, close: () => pool.end() };
}
