/** `npm run dev`: Express restarting on change, and Metro in front of it, so that the page and the API share an origin. */
import path from 'node:path';
import concurrently from 'concurrently';
import { freePort, needDatabase, startCluster } from '../../db/cluster/postgres.mjs';
import { expoEnvironment } from './client.mjs';
import { CHECKOUT, keptSecret, stateFolder } from './state.mjs';
import { say, sayFailure } from './terminal.mjs';

const PAGE_PORT = Number(process.env.PORT || 8090);

try {
  const state = stateFolder();
  const cluster = process.env.DATABASE_URL
    ? null
    : await startCluster({ folder: path.join(state, 'postgres-dev'), durable: true, say });
  if (cluster) await needDatabase(cluster);
  const apiPort = await freePort();
  const env = {
    DATABASE_URL: process.env.DATABASE_URL || cluster?.url,
    PORT: String(apiPort),
    API_PORT: String(apiPort),
    APP_URL: `http://localhost:${PAGE_PORT}`,
    AUTH_SECRET: keptSecret(state, 'auth-secret'),
    CLIENT_DIR: path.join(CHECKOUT, 'dist'),
    LOCAL_MAIL: '1',
  };
  const { commands, result } = concurrently(
    [
      { name: 'server', command: 'node --import tsx db/demo/run.ts && node --watch --import tsx server/index.ts', env },
      {
        name: 'page',
        command: `npx --no-install expo start --web --port ${PAGE_PORT}`,
        env: { ...expoEnvironment(), ...env, PORT: undefined },
      },
    ],
    { cwd: CHECKOUT, killOthersOn: ['failure', 'success'] },
  );
  for (const signal of /** @type {const} */ (['SIGINT', 'SIGTERM', 'SIGHUP'])) {
    process.on(signal, () => commands.forEach((command) => command.kill('SIGTERM')));
  }
  await result.catch(() => undefined);
  await cluster?.stop();
} catch (error) {
  sayFailure(error);
  process.exitCode = 1;
}
