/** How the cost of the whole set-out grows with the building. */
import { solve } from '../../model/setOut';
import { siteOf } from './buildings';
import type { Figure } from './figure';

/** Milliseconds of one solve: the least of several, after a warm-up, so that other work on the machine counts least. */
function timeOf(runs: number, times: number): number {
  const { drawing, survey } = siteOf(runs);
  if (drawing.runs.length !== runs) throw new Error(`the site has ${drawing.runs.length} runs, not ${runs}`);
  solve(drawing, survey);
  let least = Infinity;
  for (let i = 0; i < times; i += 1) {
    const start = performance.now();
    const setOut = solve(drawing, survey);
    least = Math.min(least, performance.now() - start);
    if (setOut.poles.poles.length === 0) throw new Error('the site was not solved');
  }
  return least;
}

export async function benchSolve(): Promise<Figure[]> {
  const ten = timeOf(10, 30);
  const hundred = timeOf(100, 10);
  const thousand = timeOf(1000, 5);
  return [
    { name: 'solve: 10 runs', value: ten, unit: 'ms', most: null },
    { name: 'solve: 100 runs', value: hundred, unit: 'ms', most: null },
    { name: 'solve: 1 000 runs', value: thousand, unit: 'ms', most: null },
    { name: 'solve: growth exponent, 100 to 1 000 runs', value: Math.log10(thousand / hundred), unit: '', most: 1.3 },
  ];
}
