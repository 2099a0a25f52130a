/** The whole server on a database of its own, called as a browser would call it. */
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import type { Express } from 'express';
import request, { type Response } from 'supertest';
import type { Role } from '../../model/contracts/common';
import type { LocalMessage } from '../../model/contracts/mail';
import { addMember } from '../../db/queries/crew';
import { buildApp } from '../../server/app';
import { readEnv } from '../../server/config/env';
import type { Deps } from '../../server/http/deps';
import type { Method } from '../../server/http/route';
import { openParts } from '../../server/parts';
import { openTestDatabase, type TestDatabase } from './database';

export const APP_URL = 'http://localhost:4600';
export const PASSWORD = 'plumb-and-square';

/** Someone at a browser of their own, which keeps its cookies. */
export class Caller {
  readonly #agent: ReturnType<typeof request.agent>;
  id = '';
  email = '';
  name = '';

  constructor(app: Express) {
    this.#agent = request.agent(app);
  }

  async call(method: Method, path: string, body?: unknown, headers: Record<string, string> = {}): Promise<Response> {
    let asked = this.#agent[method](path).set('origin', APP_URL);
    for (const [name, value] of Object.entries(headers)) asked = asked.set(name, value);
    return body === undefined ? asked : asked.send(body as object);
  }

  get(path: string): Promise<Response> {
    return this.call('get', path);
  }
  post(path: string, body?: unknown): Promise<Response> {
    return this.call('post', path, body);
  }
  put(path: string, body: unknown): Promise<Response> {
    return this.call('put', path, body);
  }
  patch(path: string, body: unknown): Promise<Response> {
    return this.call('patch', path, body);
  }
  delete(path: string): Promise<Response> {
    return this.call('delete', path);
  }
}

export interface TestServer {
  readonly app: Express;
  readonly deps: Deps;
  readonly database: TestDatabase;
  /** The time that the server takes it to be; a test may move it on. */
  readonly clock: { now: Date };
  /** A browser with nobody signed in. */
  readonly stranger: () => Caller;
  /** A new account, signed in. */
  readonly signUp: (name: string) => Promise<Caller>;
  /** A site led by `lead`, with others on it in their roles. */
  readonly makeSite: (lead: Caller, crew?: readonly (readonly [Caller, Role])[]) => Promise<string>;
  /** Waits for the next mail to this address. */
  readonly mailTo: (address: string) => Promise<LocalMessage>;
  readonly close: () => Promise<void>;
}

function makeClient(): string {
  const folder = mkdtempSync(path.join(os.tmpdir(), 'polewright-client-'));
  writeFileSync(path.join(folder, 'index.html'), '<!doctype html><title>the page</title>');
  writeFileSync(path.join(folder, 'manifest.json'), '{}');
  return folder;
}

export async function openTestServer(changes: Readonly<Record<string, string>> = {}): Promise<TestServer> {
  const database = await openTestDatabase();
  const clientFolder = makeClient();
  const env = readEnv({
    NODE_ENV: 'test',
    DATABASE_URL: database.url,
    APP_URL,
    AUTH_SECRET: 'a secret for tests only, of enough characters',
    LOCAL_MAIL: '1',
    CLIENT_DIR: clientFolder,
    ...changes,
  });
  const clock = { now: new Date() };
  const parts = await openParts({ env, db: database.db, now: () => clock.now });
  const app = buildApp(parts.deps);

  async function signUp(name: string): Promise<Caller> {
    const caller = new Caller(app);
    const email = `${name.toLowerCase().replace(/\W+/g, '.')}@site.example`;
    const answer = await caller.post('/api/auth/sign-up/email', { name, email, password: PASSWORD });
    if (answer.status !== 200) throw new Error(`sign-up answered ${answer.status}: ${answer.text}`);
    return Object.assign(caller, { id: answer.body.user.id as string, email, name });
  }

  async function makeSite(lead: Caller, crew: readonly (readonly [Caller, Role])[] = []): Promise<string> {
    const made = await lead.post('/api/sites', { name: 'Test yard', units: 'imperial' });
    if (made.status !== 201) throw new Error(`a site was not made: ${made.text}`);
    const siteId = made.body.id as string;
    for (const [caller, role] of crew) await addMember(database.db, { siteId, userId: caller.id, role });
    return siteId;
  }

  async function mailTo(address: string): Promise<LocalMessage> {
    for (let tries = 0; tries < 100; tries += 1) {
      const found = parts.deps.mailbox?.messages().find((message) => message.to === address);
      if (found) return found;
      await new Promise((resolve) => setTimeout(resolve, 20));
    }
    throw new Error(`no mail came for ${address}`);
  }

  async function close(): Promise<void> {
    await parts.close();
    await database.remove();
    rmSync(clientFolder, { recursive: true, force: true });
  }

  const stranger = () => new Caller(app);
  return { app, deps: parts.deps, database, clock, stranger, signUp, makeSite, mailTo, close };
}

/** A write id that no other write has. */
export function newWriteId(): string {
  return crypto.randomUUID();
}
