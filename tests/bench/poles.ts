/** How much quicker the placing of braces is than a general mixed-integer solver on the same problems. */
import loadHighs from 'highs';
import { lanesOf, randomFrom } from '../helpers/lanes';
import { leastByHighs, leastByUs, modelOf, polesOf } from '../helpers/polesMilp';
import type { Figure } from './figure';

const SITES = 8;

/**
 * Both choose among the same candidates of the same sites, in turns. Ours starts from the ground, trying where braces can
 * stand; HiGHS is given the finished model, and only its solving is timed.
 */
export async function benchPoles(): Promise<Figure[]> {
  const highs = await loadHighs();
  const sites = Array.from({ length: SITES }, (_, i) => lanesOf(4, randomFrom(i + 1)))
    .map((drawing) => ({ poles: polesOf(drawing), clearance: drawing.poleKit.clearance }))
    .filter(({ poles }) => poles().every((pole) => pole.own()));
  const models = sites.map(({ poles, clearance }) => modelOf(poles(), clearance));
  for (let i = 0; i < 20; i += 1) for (const { poles, clearance } of sites) leastByUs(poles(), clearance);
  let [ourTime, theirTime] = [0, 0];
  sites.forEach(({ poles, clearance }, i) => {
    const fresh = poles();
    const start = performance.now();
    const ours = leastByUs(fresh, clearance);
    const middle = performance.now();
    const theirs = leastByHighs(highs, models[i] ?? '');
    theirTime += performance.now() - middle;
    ourTime += middle - start;
    if (ours !== theirs) throw new Error(`site ${i + 1} costs ${ours} by us and ${theirs} by HiGHS`);
  });
  return [
    { name: 'poles: a site', value: ourTime / sites.length, unit: 'ms', most: null },
    { name: 'poles: a site by HiGHS', value: theirTime / sites.length, unit: 'ms', most: null },
    { name: 'poles: times as fast as HiGHS', value: theirTime / ourTime, unit: '×', most: null, least: 50 },
  ];
}
