/** The server as a program of its own: it says when it is ready, stops when told, and says what is wrong. */
import { spawn, type ChildProcess } from 'node:child_process';
import path from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openTestDatabase, type TestDatabase } from '../helpers/database';

const ROOT = path.resolve(import.meta.dirname, '../..');

let database: TestDatabase;
beforeAll(async () => {
  database = await openTestDatabase();
});
afterAll(() => database.remove());

interface Running {
  readonly child: ChildProcess;
  readonly said: () => string;
  readonly ended: Promise<{ readonly code: number | null; readonly signal: string | null }>;
}

function start(program: string, changes: Record<string, string | undefined> = {}): Running {
  const env: NodeJS.ProcessEnv = {
    NODE_ENV: 'production',
    PATH: process.env.PATH,
    DATABASE_URL: database.url,
    APP_URL: 'http://localhost:4600',
    AUTH_SECRET: 'a secret for tests only, of enough characters',
    LOCAL_MAIL: '1',
    PORT: '0',
    ...changes,
  };
  const child = spawn(process.execPath, ['--import', 'tsx', program], { cwd: ROOT, env });
  let words = '';
  child.stdout.on('data', (data) => (words += data));
  child.stderr.on('data', (data) => (words += data));
  const ended = new Promise<{ code: number | null; signal: string | null }>((resolve) =>
    child.once('exit', (code, signal) => resolve({ code, signal })),
  );
  return { child, said: () => words, ended };
}

describe('the server', () => {
  it.each(['SIGTERM', 'SIGINT'] as const)('is ready at an address, and stops cleanly on %s', async (signal) => {
    const running = start('server/index.ts');
    await expect.poll(running.said, { timeout: 20_000 }).toMatch(/^ready http:\/\/127\.0\.0\.1:\d+$/m);
    const address = /ready (\S+)/.exec(running.said())?.[1] ?? '';
    const health = await fetch(`${address}/api/health`);
    expect(await health.json()).toEqual({ ok: true });
    running.child.kill(signal);
    expect(await running.ended).toEqual({ code: 0, signal: null });
    await expect(fetch(`${address}/api/health`)).rejects.toThrow();
  });

  it('ends at once with the name of a setting that is wrong', async () => {
    const running = start('server/index.ts', { APP_URL: 'somewhere', AUTH_SECRET: undefined });
    expect((await running.ended).code).toBe(1);
    expect(running.said()).toMatch(/^APP_URL: /m);
    expect(running.said()).toMatch(/^AUTH_SECRET: /m);
  });

  it('ends when there is no database', async () => {
    const running = start('server/index.ts', { DATABASE_URL: 'postgres://nobody@127.0.0.1:9/none' });
    expect((await running.ended).code).toBe(1);
    expect(running.said()).toMatch(/ECONNREFUSED/);
  });
});

describe('the demo’s own program', () => {
  it('fills an empty database once, and says how to sign in each time', async () => {
    const first = start('db/demo/run.ts');
    expect((await first.ended).code).toBe(0);
    expect(first.said()).toMatch(/^The database was empty/m);
    expect(first.said()).toMatch(/lead@cedarbend\.example/);

    const second = start('db/demo/run.ts');
    expect((await second.ended).code).toBe(0);
    expect(second.said()).not.toMatch(/was empty/);
    expect(second.said()).toMatch(/lead@cedarbend\.example/);
    const sites = await database.pool.query('select name from sites order by name');
    expect(sites.rows.map((row) => row.name)).toEqual(['Cedar Bend tool store', 'Harrow Lane studio']);
  });
});
