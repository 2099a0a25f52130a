/** The bar of a bond beam as pieces cut from stock lengths and lapped. */
import { ticks } from '../length/ticks';
import type { RunGeometry } from '../walls/types';
import { planCuts } from './cutPlan';
import type { StockPlan } from './types';

/** Bars of more pieces than this are not planned piece by piece: no building has them. */
const MOST_PIECES = 50_000;

/** What one line of bar along a run has to reach: its centre line, and a lap at the second corner where it meets another run. */
function reachOf(run: RunGeometry, lap: number): number {
  return run.centreLength + (run.ends[1].others.length > 0 ? lap : 0);
}

/** Stock lengths of one line of bar: all but the last are whole, and each laps the one before. */
function piecesAlong(reach: number, stock: number, lap: number): { readonly wholes: number; readonly rest: number } {
  if (reach <= stock || stock <= lap) return { wholes: 0, rest: reach };
  const wholes = Math.ceil((reach - lap) / (stock - lap)) - 1;
  return { wholes, rest: reach - wholes * (stock - lap) };
}

/** Length of `count` lines of bar along every run, laps included, in ticks. */
export function barLength(runs: readonly RunGeometry[], count: number, stock: number, lap: number): number {
  return runs.reduce((sum, run) => {
    const { wholes, rest } = piecesAlong(reachOf(run, lap), stock, lap);
    return sum + count * (wholes * stock + rest);
  }, 0);
}

/**
 * The fewest stock lengths for those bars. Whole lengths need no cut; the last pieces of all lines are cut together by an
 * exact plan, each cut losing a kerf. Empty where a stock length is no longer than the lap, so that no bar gets on.
 */
export function planBars(
  runs: readonly RunGeometry[],
  count: number,
  { stock, lap, kerf }: { readonly stock: number; readonly lap: number; readonly kerf: number },
): StockPlan[] {
  if (stock <= lap) return [];
  const lines = runs.filter((run) => run.centreLength > 0).map((run) => piecesAlong(reachOf(run, lap), stock, lap));
  const wholes = count * lines.reduce((sum, line) => sum + line.wholes, 0);
  const plans: StockPlan[] = wholes > 0 ? [{ count: wholes, cuts: [ticks(stock)], left: ticks(0) }] : [];
  if (lines.length * count > MOST_PIECES) return [];
  const cuts = lines.flatMap(({ rest }) => new Array<number>(count).fill(rest));
  const alike = new Map<string, { count: number; cuts: readonly number[]; left: number }>();
  for (const { cuts: made, left } of planCuts(cuts, stock, kerf)) {
    const key = made.join();
    const plan = alike.get(key) ?? { count: 0, cuts: made, left };
    plan.count += 1;
    alike.set(key, plan);
  }
  for (const plan of alike.values())
    plans.push({ count: plan.count, cuts: plan.cuts.map(ticks), left: ticks(plan.left) });
  return plans;
}
