/**
 * `npm run bench -- NAME [--json]`: one line a figure (name, value, limit), exit status 1 when a limit is missed.
 * Every figure is a ratio or a size taken in one run; none is a wall-clock time to be compared across machines.
 */
import { benchBundle } from './bundle';
import { benchCoursing } from './coursing';
import { isMissed, type Figure } from './figure';
import { benchPoles } from './poles';
import { benchSolve } from './solve';

const BENCHES: Record<string, () => Promise<Figure[]>> = {
  solve: benchSolve,
  coursing: benchCoursing,
  poles: benchPoles,
  bundle: benchBundle,
};

async function main(): Promise<void> {
  const json = process.argv.includes('--json');
  const names = process.argv.slice(2).filter((arg) => !arg.startsWith('--'));
  const unknown = names.find((name) => !(name in BENCHES));
  if (unknown !== undefined) {
    process.stderr.write(`There is no bench "${unknown}": choose from ${Object.keys(BENCHES).join(', ')}.\n`);
    process.exitCode = 2;
    return;
  }
  const figures: Figure[] = [];
  for (const name of names.length > 0 ? names : Object.keys(BENCHES)) figures.push(...(await BENCHES[name]!()));
  if (json)
    process.stdout.write(`${JSON.stringify(figures.map((figure) => ({ ...figure, missed: isMissed(figure) })))}\n`);
  else {
    for (const figure of figures) {
      const most = figure.most === null ? '' : `  at most ${figure.most}`;
      const least = figure.least === undefined ? '' : `  at least ${figure.least}`;
      const missed = isMissed(figure) ? '  MISSED' : '';
      process.stdout.write(
        `${figure.name}  ${Number(figure.value.toPrecision(4))} ${figure.unit}${most}${least}${missed}\n`,
      );
    }
  }
  if (figures.some(isMissed)) process.exitCode = 1;
}

await main();
