/** Steel for the poles, braces, line and line blocks. */
import type { Drawing } from '../drawing/schema';
import { ticks } from '../length/ticks';
import type { Lines } from '../lines/types';
import type { PoleSet } from '../poles/types';
import { planCuts } from './cutPlan';
import type { Takeoff } from './types';

/** A line is held at each end by a block. */
const BLOCKS_PER_LINE = 2;

/**
 * The fewest stock lengths that make the poles. A stock length cut into equal poles loses its kerfs from them, so the
 * poles of one length may together be one kerf short: two 10 ft poles come from 20 ft (common practice).
 * A pole longer than the stock can't be cut, and is missing from the plan.
 */
export function poleStock(drawing: Drawing, poles: PoleSet, lines: Lines): Takeoff['poles'] {
  const { stockLength, poleLength, kerf } = drawing.poleKit;
  const cuts = poles.poles.map(() => poleLength as number);
  const plan = planCuts(cuts, stockLength + kerf, kerf).map((stock) => {
    const used = stock.cuts.reduce((sum, cut) => sum + cut, 0);
    const left = Math.max(0, stockLength - used - kerf * stock.cuts.length);
    return { cuts: stock.cuts.map(ticks), left: ticks(left) };
  });
  return {
    count: poles.poles.length,
    braces: poles.poles.reduce((sum, pole) => sum + pole.braces.length, 0),
    stock: poleLength <= stockLength ? plan : [],
    lineBlocks: BLOCKS_PER_LINE * lines.lines.length,
    line: ticks(lines.lines.reduce((sum, line) => sum + line.cut, 0)),
  };
}
