/** `npm run routes`: the types of every route of `app/`, so that a wrong link fails the type check. */
import { expoEnvironment } from './client.mjs';
import { CHECKOUT } from './state.mjs';
import { runProgram, sayFailure } from './terminal.mjs';

try {
  await runProgram('npx', ['--no-install', 'expo', 'customize', 'tsconfig.json'], {
    cwd: CHECKOUT,
    env: expoEnvironment(),
    toDo: 'see what expo complains of; a route file may not parse.',
  });
} catch (error) {
  sayFailure(error);
  process.exitCode = 1;
}
