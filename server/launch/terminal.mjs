/** What the commands print while they work: one line a step, a sign of life during long ones, and clear failures. */
import { spawn } from 'node:child_process';
import { StepFailed } from '../../db/cluster/debian.mjs';

/** @param {string} line */
export function say(line) {
  process.stdout.write(`${line}\n`);
}

/**
 * Runs a step and says how long it took; during a long one, a line every 15 seconds.
 * @template T
 * @param {string} name
 * @param {() => Promise<T>} work
 * @returns {Promise<T>}
 */
export async function step(name, work) {
  const start = Date.now();
  const seconds = () => `${((Date.now() - start) / 1000).toFixed(1)} s`;
  say(`· ${name}`);
  const sign = setInterval(() => say(`  … ${name}: ${seconds()} so far`), 15_000);
  try {
    const result = await work();
    say(`  done in ${seconds()}`);
    return result;
  } finally {
    clearInterval(sign);
  }
}

/** @type {Set<import('node:child_process').ChildProcess>} */
const programs = new Set();

const PATIENCE_MS = 2000;

/** Ends the programs still running, when the command itself is stopped: asked first, then forced. */
export async function stopPrograms() {
  // Its whole group: npx leaves its child behind otherwise.
  const signal = (/** @type {NodeJS.Signals} */ name) => {
    for (const child of programs) {
      try {
        if (child.pid) process.kill(-child.pid, name);
      } catch {
        // It ended by itself meanwhile.
      }
    }
  };
  if (programs.size === 0) return;
  signal('SIGTERM');
  const patience = Date.now() + PATIENCE_MS;
  while (programs.size > 0 && Date.now() < patience) await new Promise((resolve) => setTimeout(resolve, 50));
  // Expo's export goes on after SIGTERM; what it writes is not used until it is whole.
  signal('SIGKILL');
}

/**
 * Runs a program to its end; rejects with its last lines.
 * @param {string} command
 * @param {string[]} args
 * @param {{cwd: string, env?: Record<string, string | undefined>, toDo: string, show?: boolean}} options
 * @returns {Promise<void>}
 */
export function runProgram(command, args, { cwd, env, toDo, show = false }) {
  return new Promise((resolve, reject) => {
    const child = spawn(command, args, {
      cwd,
      env: { ...process.env, ...env },
      stdio: ['ignore', 'pipe', 'pipe'],
      detached: true,
    });
    programs.add(child);
    let words = '';
    for (const stream of [child.stdout, child.stderr]) {
      stream.on('data', (data) => {
        words = (words + data).slice(-20_000);
        if (show) process.stdout.write(data);
      });
    }
    child.once('error', (error) => reject(new StepFailed(`${command} could not be run: ${error.message}`, toDo)));
    child.once('close', (code) => {
      programs.delete(child);
      if (code === 0) return resolve();
      reject(new StepFailed(`"${[command, ...args].join(' ')}" ended with status ${code}:\n${words.trim()}`, toDo));
    });
  });
}

/**
 * The last word of a command that failed.
 * @param {unknown} error
 */
export function sayFailure(error) {
  const words =
    error instanceof StepFailed
      ? error.message
      : error instanceof Error
        ? (error.stack ?? error.message)
        : String(error);
  process.stderr.write(`\nFailed: ${words}\n`);
}
