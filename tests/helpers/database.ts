/**
 * A real PostgreSQL for tests. With TEST_DATABASE_URL it uses that server; without, it starts a throw-away one. Each
 * test file gets a database of its own, copied from one that was migrated.
 */
import { randomBytes } from 'node:crypto';
import { mkdtempSync, rmSync, chmodSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import pg from 'pg';
import { startCluster } from '../../db/cluster/postgres.mjs';
import { connect, type Connection } from '../../db/connect';
import { migrateDatabase } from '../../db/migrate';

export interface TestDatabase extends Connection {
  readonly url: string;
  /** Closes the pool, removes the database, and stops the server if it was started for it. */
  readonly remove: () => Promise<void>;
}

interface Server {
  readonly urlOf: (database: string) => string;
  readonly stop: () => Promise<void>;
}

async function findServer(): Promise<Server> {
  const given = process.env.TEST_DATABASE_URL;
  if (given !== undefined && given !== '') {
    const urlOf = (database: string) => {
      const url = new URL(given);
      url.pathname = `/${database}`;
      return url.href;
    };
    return { urlOf, stop: () => Promise.resolve() };
  }
  const folder = mkdtempSync(path.join(os.tmpdir(), 'polewright-test-'));
  // PostgreSQL may run as another user, who has to reach its own folder below.
  chmodSync(folder, 0o711);
  const cluster = await startCluster({ folder: path.join(folder, 'postgres'), durable: false, say: () => undefined });
  const stop = async () => {
    await cluster.stop();
    rmSync(folder, { recursive: true, force: true });
  };
  return { urlOf: cluster.urlOf, stop };
}

async function ask(url: string, ...statements: string[]): Promise<void> {
  const client = new pg.Client({ connectionString: url });
  await client.connect();
  try {
    for (const statement of statements) await client.query(statement);
  } finally {
    await client.end();
  }
}

/** A migrated, empty database with a name of its own. */
export async function openTestDatabase(): Promise<TestDatabase> {
  const server = await findServer();
  const name = `test_${randomBytes(6).toString('hex')}`;
  const admin = server.urlOf('postgres');
  await ask(admin, `create database ${name}`);
  const url = server.urlOf(name);
  await migrateDatabase(url);
  const connection = connect(url);
  const remove = async () => {
    await connection.close();
    await ask(admin, `drop database ${name} with (force)`);
    await server.stop();
  };
  return { ...connection, url, remove };
}
