/** npm's packages: installed from the lock file when they are missing or older than it. */
import { statSync } from 'node:fs';
import path from 'node:path';
import { CHECKOUT } from './state.mjs';
import { runProgram, step } from './terminal.mjs';

/** @param {string} name @returns {number} */
function changedAt(name) {
  return statSync(path.join(CHECKOUT, name), { throwIfNoEntry: false })?.mtimeMs ?? 0;
}

export async function needPackages() {
  // npm writes its own copy of the lock last of all, so an install that was cut short is done again.
  const installed = changedAt('node_modules/.package-lock.json');
  if (installed > 0 && installed >= changedAt('package-lock.json')) return;
  await step('Installing packages (npm ci): one to three minutes the first time', () =>
    runProgram('npm', ['ci', '--no-audit', '--no-fund', '--cache', path.join(CHECKOUT, '.state', 'npm-cache')], {
      cwd: CHECKOUT,
      toDo: 'see that the network reaches the npm registry, then run the command again.',
    }),
  );
}
