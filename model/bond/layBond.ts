/** Every course of every run as units, head joints, closers and returns. */
import type { Coursing } from '../coursing/types';
import type { Drawing } from '../drawing/schema';
import type { Reason } from '../reasons';
import type { Walls } from '../walls/types';
import { chainRuns } from './chains';
import { layChain } from './layChain';
import { bondLimits } from './limits';
import { openingHeights } from './stretches';
import { turnCorners, type BondKit } from './turnCorners';
import type { Bond, RunBond } from './types';

/**
 * Lays the bond of a building. Total over any drawing: a run that can't be bonded has a reason and what pieces there are.
 * Stretches alike are solved once, courses alike share one pattern.
 */
export function layBond(drawing: Drawing, walls: Walls, coursing: Coursing): Bond {
  const openings = new Map(drawing.openings.map((opening) => [opening.id, opening]));
  const heights = openingHeights(coursing);
  const kits = new Map(
    drawing.wallTypes.map((type): [string, BondKit] => [type.id, { limits: bondLimits(type), memo: new Map() }]),
  );
  const byRun = new Map<string, RunBond>();
  const reasons: Reason[] = [];
  const chains = chainRuns(walls);
  const turns = turnCorners(chains, walls, kits);
  for (const chain of chains) {
    const kit = kits.get(chain.runs[0]!.run.wallTypeId);
    if (!kit) continue;
    const laid = layChain({ chain, walls, openings, heights, coursing, turns, ...kit });
    for (const run of laid.runs) byRun.set(run.runId, run);
    reasons.push(...laid.reasons);
  }
  const runs = walls.runs.flatMap((run) => byRun.get(run.runId) ?? []);
  return { runs, byRun, reasons };
}
