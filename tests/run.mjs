/** `npm test`: every test there is, on a throw-away database and in a real browser, closing with one line that counts them all. */
import { existsSync, readFileSync, rmSync } from 'node:fs';
import path from 'node:path';
import { installPackage } from '../db/cluster/debian.mjs';
import { startCluster } from '../db/cluster/postgres.mjs';
import { needClient } from '../server/launch/client.mjs';
import { needPackages } from '../server/launch/packages.mjs';
import { CHECKOUT, stateFolder } from '../server/launch/state.mjs';
import { runProgram, say, sayFailure, step, stopPrograms } from '../server/launch/terminal.mjs';

const CHROMIUM = '/usr/bin/chromium';

/** @param {string} file */
function countTests(file) {
  if (!existsSync(file)) return { passed: 0, failed: 0, skipped: 0 };
  const report = JSON.parse(readFileSync(file, 'utf8'));
  // A file that could not even be loaded has no tests of its own to fail.
  const brokenFiles = report.testResults.filter(
    (/** @type {{status: string, assertionResults: unknown[]}} */ each) =>
      each.status === 'failed' && each.assertionResults.length === 0,
  ).length;
  return {
    passed: report.numPassedTests,
    failed: report.numFailedTests + brokenFiles,
    skipped: report.numPendingTests + report.numTodoTests,
  };
}

async function main() {
  const only = process.argv.slice(2);
  const folder = path.join(stateFolder(), `test-${process.pid}`);
  const report = path.join(CHECKOUT, '.state', 'test-report.json');
  /** @type {(() => Promise<void>)[]} */
  const undo = [async () => rmSync(folder, { recursive: true, force: true })];
  let ended = false;
  /** @param {number} status */
  const end = async (status) => {
    if (ended) return;
    ended = true;
    await stopPrograms();
    for (const each of undo.reverse()) await each().catch(sayFailure);
    process.exit(status);
  };
  for (const signal of /** @type {const} */ (['SIGINT', 'SIGTERM', 'SIGHUP'])) process.on(signal, () => void end(1));

  let failure = null;
  rmSync(report, { force: true });
  try {
    await needPackages();
    if (!existsSync(CHROMIUM))
      installPackage('chromium', 'Chromium, for the browser tests,', (line) => say(`  ${line}`));
    const cluster = await step('Starting a throw-away PostgreSQL', async () => {
      const started = await startCluster({ folder, durable: false, say: (line) => say(`  ${line}`) });
      undo.push(started.stop);
      return started;
    });
    const client = await needClient();
    const types = path.join('.expo', 'types', 'router.d.ts');
    if (!existsSync(path.join(CHECKOUT, types)) || !existsSync(path.join(CHECKOUT, 'expo-env.d.ts'))) {
      await step('Making the typed routes', () =>
        runProgram('npm', ['run', 'routes'], { cwd: CHECKOUT, toDo: 'run "npm run routes" by hand.' }),
      );
    }
    await step('Running the tests', () =>
      runProgram(
        'npx',
        [
          '--no-install',
          'vitest',
          'run',
          '--reporter=default',
          '--reporter=json',
          `--outputFile.json=${report}`,
          ...only,
        ],
        {
          cwd: CHECKOUT,
          env: { TEST_DATABASE_URL: cluster.urlOf('postgres'), CLIENT_DIR: client, NODE_ENV: 'test' },
          show: true,
          toDo: 'read the failures above.',
        },
      ),
    );
  } catch (error) {
    failure = error;
  }
  const { passed, failed, skipped } = countTests(report);
  if (failure && failed === 0) sayFailure(failure);
  const allFailed = failure && failed === 0 ? 1 : failed;
  say(`\n${passed} passed, ${allFailed} failed${skipped ? `, ${skipped} skipped` : ''}`);
  await end(allFailed === 0 && passed > 0 ? 0 : 1);
}

await main();
