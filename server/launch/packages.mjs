/** npm's packages: installed from the lock file when they are missing or older than it. */
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { createHash } from 'node:crypto';
import path from 'node:path';
import { CHECKOUT } from './state.mjs';
import { runProgram, step } from './terminal.mjs';

export async function needPackages() {
  const stamp = path.join(CHECKOUT, 'node_modules', '.installed-from');
  const lock = createHash('sha256')
    .update(readFileSync(path.join(CHECKOUT, 'package-lock.json')))
    .digest('hex');
  if (existsSync(stamp) && readFileSync(stamp, 'utf8') === lock) return;
  await step('Installing packages (npm ci): one to three minutes the first time', async () => {
    await runProgram('npm', ['ci', '--no-audit', '--no-fund', '--cache', path.join(CHECKOUT, '.state', 'npm-cache')], {
      cwd: CHECKOUT,
      toDo: 'see that the network reaches the npm registry, then run the command again.',
    });
    mkdirSync(path.dirname(stamp), { recursive: true });
    writeFileSync(stamp, lock);
  });
}
