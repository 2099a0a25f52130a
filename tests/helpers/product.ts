/** The real product for browser tests: a database of its own, the server as a process, Chromium beside it. */
import { spawn, type ChildProcess } from 'node:child_process';
import { randomBytes } from 'node:crypto';
import path from 'node:path';
import { chromium, type Browser, type BrowserContext, type BrowserContextOptions } from 'playwright-core';
import { freePort } from '../../db/cluster/postgres.mjs';
import { CHECKOUT } from '../../server/launch/state.mjs';
import { openTestDatabase, type TestDatabase } from './database';

export const PHONE = { width: 390, height: 844 };
export const TABLET = { width: 1024, height: 768 };
export const DESK = { width: 1440, height: 900 };

export interface Product {
  readonly address: string;
  readonly browser: Browser;
  readonly database: TestDatabase;
  /** A browser of somebody's own: its own cookies and storage. */
  readonly open: (viewport: { width: number; height: number }, more?: BrowserContextOptions) => Promise<BrowserContext>;
  readonly close: () => Promise<void>;
}

/** Debian's Chromium, told to keep to itself. */
export function launchChromium(): Promise<Browser> {
  return chromium.launch({
    executablePath: '/usr/bin/chromium',
    args: [
      '--no-sandbox',
      '--disable-gpu',
      '--disable-quic',
      '--no-first-run',
      '--disable-background-networking',
      '--disable-component-update',
      '--disable-sync',
    ],
  });
}

function startServer(env: Record<string, string>): Promise<ChildProcess> {
  return new Promise((resolve, reject) => {
    const child = spawn(process.execPath, ['--import', 'tsx', 'server/index.ts'], {
      cwd: CHECKOUT,
      env: { ...process.env, ...env },
      stdio: ['ignore', 'pipe', 'pipe'],
    });
    let words = '';
    const listen = (data: Buffer) => {
      words += String(data);
      if (/^ready /m.test(words)) resolve(child);
    };
    child.stdout.on('data', listen);
    child.stderr.on('data', listen);
    child.once('exit', (code) => reject(new Error(`the server stopped (status ${code}): ${words}`)));
  });
}

/** Starts it all; with `demo`, the demo sites are there. */
export async function startProduct({ demo = false } = {}): Promise<Product> {
  const database = await openTestDatabase();
  const port = await freePort();
  const address = `http://localhost:${port}`;
  const env = {
    DATABASE_URL: database.url,
    PORT: String(port),
    APP_URL: address,
    NODE_ENV: 'production',
    LOCAL_MAIL: '1',
    DEMO: demo ? '1' : '0',
    AUTH_SECRET: randomBytes(32).toString('base64url'),
    CLIENT_DIR: process.env['CLIENT_DIR'] ?? path.join(CHECKOUT, 'dist'),
  };
  if (demo) await runDemo(env);
  const server = await startServer(env);
  const browser = await launchChromium();
  return {
    address,
    browser,
    database,
    open: (viewport, more = {}) =>
      browser.newContext({ viewport, hasTouch: true, deviceScaleFactor: 1, baseURL: address, ...more }),
    close: async () => {
      await browser.close();
      const gone = new Promise((resolve) => server.once('exit', resolve));
      server.kill('SIGTERM');
      await gone;
      await database.remove();
    },
  };
}

function runDemo(env: Record<string, string>): Promise<void> {
  return new Promise((resolve, reject) => {
    const child = spawn(process.execPath, ['--import', 'tsx', 'db/demo/run.ts'], {
      cwd: CHECKOUT,
      env: { ...process.env, ...env },
      stdio: ['ignore', 'ignore', 'pipe'],
    });
    let words = '';
    child.stderr.on('data', (data) => (words += String(data)));
    child.once('exit', (code) => (code === 0 ? resolve() : reject(new Error(`the demo was not filled: ${words}`))));
  });
}
