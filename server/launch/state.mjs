/** The one folder outside the checkout: the database cluster and the secrets of this checkout's local server. */
import { createHash, randomBytes } from 'node:crypto';
import { chmodSync, existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import { isRoot } from '../../db/cluster/debian.mjs';

export const CHECKOUT = path.resolve(fileURLToPath(import.meta.url), '../../..');

/**
 * `POLEWRIGHT_STATE`, else `/var/lib/polewright` for root (PostgreSQL then runs as another user, which could not enter
 * root's home) and `~/.local/state/polewright` for anyone else; below it one folder for each checkout.
 */
export function stateFolder() {
  const userState = process.env.XDG_STATE_HOME || path.join(os.homedir(), '.local', 'state');
  const base = process.env.POLEWRIGHT_STATE || (isRoot() ? '/var/lib/polewright' : path.join(userState, 'polewright'));
  const key = createHash('sha256').update(CHECKOUT).digest('hex').slice(0, 8);
  const folder = path.join(base, `${path.basename(CHECKOUT).replace(/[^\w-]/g, '_')}-${key}`);
  mkdirSync(folder, { recursive: true });
  if (isRoot()) for (const each of [base, folder]) chmodSync(each, 0o711);
  return folder;
}

/**
 * A secret made once and kept.
 * @param {string} folder
 * @param {string} name
 */
export function keptSecret(folder, name) {
  const file = path.join(folder, name);
  if (!existsSync(file)) writeFileSync(file, randomBytes(32).toString('base64url'), { mode: 0o600 });
  return readFileSync(file, 'utf8').trim();
}
