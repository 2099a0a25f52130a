/** The web client: built when it is missing or its sources have changed since. */
import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readdirSync, readFileSync, renameSync, rmSync, statSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { CHECKOUT } from './state.mjs';
import { runProgram, step } from './terminal.mjs';

const SOURCES = [
  'app',
  'canvas',
  'model',
  'assets',
  'fonts',
  'public',
  'app.json',
  'babel.config.js',
  'metro.config.js',
  'package-lock.json',
];

/** @param {string} at @returns {string[]} */
function filesBelow(at) {
  if (!existsSync(at)) return [];
  if (!statSync(at).isDirectory()) return [at];
  return readdirSync(at)
    .sort()
    .flatMap((name) => filesBelow(path.join(at, name)));
}

/** @param {string} checkout */
export function sourcesStamp(checkout) {
  const hash = createHash('sha256');
  for (const file of SOURCES.flatMap((source) => filesBelow(path.join(checkout, source)))) {
    hash.update(path.relative(checkout, file)).update('\0').update(readFileSync(file)).update('\0');
  }
  return hash.digest('hex');
}

/** What Expo and Metro must be told to stay inside the checkout and off the network. */
export function expoEnvironment() {
  const cache = path.join(CHECKOUT, 'node_modules', '.cache');
  const temporary = path.join(cache, 'tmp');
  mkdirSync(temporary, { recursive: true });
  return {
    EXPO_OFFLINE: '1',
    EXPO_NO_TELEMETRY: '1',
    __UNSAFE_EXPO_HOME_DIRECTORY: path.join(cache, 'expo-home'),
    TMPDIR: temporary,
  };
}

/** Imports that lead nowhere are left out of the build: Expo's own tree shaking, which it still has to be asked for. */
const SHAKEN = { EXPO_UNSTABLE_METRO_OPTIMIZE_GRAPH: '1', EXPO_UNSTABLE_TREE_SHAKING: '1' };

export async function needClient() {
  const built = path.join(CHECKOUT, 'dist');
  const stampFile = path.join(built, 'built-from.txt');
  const stamp = sourcesStamp(CHECKOUT);
  if (existsSync(stampFile) && readFileSync(stampFile, 'utf8') === stamp) return built;
  await step('Building the web client: about a minute the first time', async () => {
    const fresh = path.join(CHECKOUT, '.state', 'dist-new');
    rmSync(fresh, { recursive: true, force: true });
    await runProgram('npx', ['--no-install', 'expo', 'export', '--platform', 'web', '--output-dir', fresh], {
      cwd: CHECKOUT,
      env: { ...expoEnvironment(), ...SHAKEN, CI: '1' },
      toDo: 'mend what the build complains of, or check out a version that builds.',
    });
    writeFileSync(path.join(fresh, 'built-from.txt'), stamp);
    rmSync(built, { recursive: true, force: true });
    renameSync(fresh, built);
  });
  return built;
}
