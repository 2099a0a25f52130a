/** Starts the server: reads the environment, brings the database up to date, listens, and stops cleanly when told to. */
import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { connect } from '../db/connect';
import { migrateDatabase } from '../db/migrate';
import { forgetAnswers } from '../db/queries/writes';
import { buildApp } from './app';
import { EnvError, readEnv, type Env } from './config/env';
import { openParts } from './parts';

/** A phone may come back with its unsent writes after weeks on a site without signal. */
const ANSWERS_KEPT_DAYS = 90;
const STOP_AT_MOST_MS = 8000;

async function start(env: Env): Promise<void> {
  await migrateDatabase(env.DATABASE_URL);
  const database = connect(env.DATABASE_URL);
  const parts = await openParts({ env, db: database.db });
  const kept = ANSWERS_KEPT_DAYS * 24 * 60 * 60 * 1000;
  await forgetAnswers(parts.deps.db, new Date(Date.now() - kept));
  const server = createServer(buildApp(parts.deps));

  let stopping = false;
  const stop = async (): Promise<void> => {
    if (stopping) return;
    stopping = true;
    // Answers under way are finished; a connection that stays open without one is not waited for.
    setTimeout(() => process.exit(1), STOP_AT_MOST_MS).unref();
    await new Promise<void>((resolve) => {
      server.close(() => resolve());
      server.closeIdleConnections();
    });
    await parts.close();
    await database.close();
  };
  process.on('SIGTERM', () => void stop());
  process.on('SIGINT', () => void stop());

  await new Promise<void>((resolve, reject) => {
    server.once('error', reject);
    server.listen(env.PORT, env.HOST, resolve);
  });
  const { address, port, family } = server.address() as AddressInfo;
  process.stdout.write(`ready http://${family === 'IPv6' ? `[${address}]` : address}:${port}\n`);
}

try {
  await start(readEnv(process.env));
} catch (error) {
  const words = error instanceof EnvError ? `The environment is not right:\n${error.message}` : String(error);
  process.stderr.write(`${words}\n`);
  process.exit(1);
}
