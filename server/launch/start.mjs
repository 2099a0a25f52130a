/** `npm start`: everything for the main job, from a fresh clone to a printed address, and a clean stop. */
import { spawn } from 'node:child_process';
import { existsSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { createServer } from 'node:net';
import path from 'node:path';
import { StepFailed } from '../../db/cluster/debian.mjs';
import { freePort, needDatabase, startCluster } from '../../db/cluster/postgres.mjs';
import { needClient } from './client.mjs';
import { needPackages } from './packages.mjs';
import { CHECKOUT, keptSecret, stateFolder } from './state.mjs';
import { runProgram, say, sayFailure, step, stopPrograms } from './terminal.mjs';

const USUAL_PORT = 4600;

/** @returns {Promise<number>} */
function choosePort() {
  if (process.env.PORT) return Promise.resolve(Number(process.env.PORT));
  return new Promise((resolve) => {
    const probe = createServer();
    probe.once('error', () => resolve(freePort()));
    probe.listen(USUAL_PORT, '127.0.0.1', () => probe.close(() => resolve(USUAL_PORT)));
  });
}

/** @param {number} pid */
function isRunning(pid) {
  try {
    process.kill(pid, 0);
    return true;
  } catch {
    return false;
  }
}

/**
 * One server for each checkout: a second start would take the database from under the first.
 * @param {string} file
 */
function refuseSecondStart(file) {
  if (!existsSync(file)) return;
  const [pid, address] = readFileSync(file, 'utf8').split('\n');
  if (isRunning(Number(pid))) {
    throw new StepFailed(
      `Polewright is already running from this checkout${address ? ` at ${address}` : ''} (process ${pid}).`,
      'use that one, or stop it first.',
    );
  }
}

/**
 * Starts Express and waits until it listens.
 * @param {Record<string, string>} env
 * @returns {Promise<import('node:child_process').ChildProcess>}
 */
function startServer(env) {
  return new Promise((resolve, reject) => {
    const child = spawn(process.execPath, ['--import', 'tsx', 'server/index.ts'], {
      cwd: CHECKOUT,
      env: { ...process.env, ...env },
      stdio: ['ignore', 'pipe', 'inherit'],
      // Its own group: Ctrl-C reaches only us, and we stop it before the database.
      detached: true,
    });
    let words = '';
    child.stdout.on('data', (data) => {
      process.stdout.write(data);
      words = (words + data).slice(-4000);
      if (/^ready /m.test(words)) resolve(child);
    });
    child.once('exit', (code) =>
      reject(new StepFailed(`The server stopped while starting (status ${code}).`, 'read its words above.')),
    );
  });
}

/** @param {import('node:child_process').ChildProcess} child @returns {Promise<void>} */
function stopServer(child) {
  return new Promise((resolve) => {
    if (child.exitCode !== null || child.signalCode !== null) return resolve();
    const force = setTimeout(() => child.kill('SIGKILL'), 10_000);
    child.once('exit', () => {
      clearTimeout(force);
      resolve();
    });
    child.kill('SIGTERM');
  });
}

async function main() {
  const began = Date.now();
  say('Polewright');
  const state = stateFolder();
  const running = path.join(state, 'running');
  refuseSecondStart(running);
  writeFileSync(running, String(process.pid));

  /** @type {(() => Promise<void>)[]} */
  const undo = [async () => rmSync(running, { force: true })];
  let stopping = false;
  /** @param {number} status */
  const stop = async (status) => {
    if (stopping) return;
    stopping = true;
    await stopPrograms();
    for (const each of undo.reverse()) await each().catch(sayFailure);
    process.exit(status);
  };
  for (const signal of /** @type {const} */ (['SIGINT', 'SIGTERM', 'SIGHUP'])) {
    process.on(signal, () => {
      say('\nStopping');
      void stop(0);
    });
  }

  try {
    await needPackages();
    let databaseUrl = process.env.DATABASE_URL;
    if (!databaseUrl) {
      const cluster = await step('Starting PostgreSQL', async () => {
        const started = await startCluster({
          folder: path.join(state, 'postgres'),
          durable: true,
          say: (line) => say(`  ${line}`),
        });
        undo.push(started.stop);
        await needDatabase(started);
        return started;
      });
      databaseUrl = cluster.url;
    }
    const client = await needClient();
    const port = await choosePort();
    const address = process.env.APP_URL || `http://localhost:${port}`;
    const env = {
      DATABASE_URL: databaseUrl,
      PORT: String(port),
      APP_URL: address,
      CLIENT_DIR: client,
      AUTH_SECRET: process.env.AUTH_SECRET || keptSecret(state, 'auth-secret'),
      ...(process.env.SMTP_URL ? {} : { LOCAL_MAIL: '1' }),
      DEMO: process.env.DEMO || '1',
    };
    await step('Migrating the database, and the demo where it is empty', () =>
      runProgram(process.execPath, ['--import', 'tsx', 'db/demo/run.ts'], {
        cwd: CHECKOUT,
        env,
        show: true,
        toDo: 'see that the database can be reached and is ours.',
      }),
    );
    const server = await step('Starting the server', () => startServer(env));
    undo.push(() => stopServer(server));
    server.once('exit', (code) => {
      if (!stopping) {
        say(`The server stopped by itself (status ${code}).`);
        void stop(1);
      }
    });
    writeFileSync(running, `${process.pid}\n${address}`);
    say(`\nOpen ${address}   (ready in ${((Date.now() - began) / 1000).toFixed(1)} s; Ctrl-C stops everything)`);
    if (!process.env.SMTP_URL) say(`Mail stays here: read it at ${address}/mail`);
  } catch (error) {
    if (!stopping) sayFailure(error);
    await stop(1);
  }
}

await main();
