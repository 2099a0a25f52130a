/** Debian's packages: installed when missing and allowed, otherwise the reader is told exactly what to type. */
import { spawnSync } from 'node:child_process';
import { existsSync } from 'node:fs';

/** Thrown with words for the person at the terminal: what failed, and what to do. */
export class StepFailed extends Error {
  /**
   * @param {string} what
   * @param {string} toDo
   */
  constructor(what, toDo) {
    super(`${what}\n  What to do: ${toDo}`);
  }
}

export function isRoot() {
  return process.getuid?.() === 0;
}

/**
 * Installs a Debian package as root, or says what to type.
 * @param {string} name
 * @param {string} why
 * @param {(line: string) => void} say
 */
export function installPackage(name, why, say) {
  const command = `apt-get install -y --no-install-recommends ${name}`;
  if (!existsSync('/usr/bin/apt-get')) {
    throw new StepFailed(
      `${why} is missing, and this system has no apt-get.`,
      `install ${name} by your system's means.`,
    );
  }
  if (!isRoot()) {
    throw new StepFailed(`${why} is missing.`, `run "sudo ${command}", then this command again.`);
  }
  say(`${why} is missing: installing Debian's ${name} (a minute or two)`);
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
  const run = (/** @type {string[]} */ args) => spawnSync('apt-get', args, { env, encoding: 'utf8' });
  run(['update']);
  const result = run(['install', '-y', '--no-install-recommends', name]);
  if (result.status !== 0) {
    throw new StepFailed(
      `apt-get could not install ${name}: ${(result.stderr || '').trim().split('\n').at(-1)}`,
      `run "${command}" by hand and see what it says.`,
    );
  }
}
