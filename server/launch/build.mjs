/** `npm run build`: the web client into `dist/`. */
import { needClient } from './client.mjs';
import { needPackages } from './packages.mjs';
import { say, sayFailure } from './terminal.mjs';

try {
  await needPackages();
  say(`The web client stands in ${await needClient()}`);
} catch (error) {
  sayFailure(error);
  process.exitCode = 1;
}
