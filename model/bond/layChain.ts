/** Lays one chain of runs and hands each run its share. */
import type { Coursing } from '../coursing/types';
import type { Opening } from '../drawing/schema';
import { ticks, type Ticks } from '../length/ticks';
import type { Reason } from '../reasons';
import type { Walls } from '../walls/types';
import type { Chain } from './chains';
import { checkChain } from './checkChain';
import { spanLength, type BondLimits } from './courseFill';
import { endOfRun, type EndPair, type Parity } from './ends';
import { hasTooManyPieces } from './limits';
import { layZones, type FillMemo } from './layZones';
import { farEnd, noCutEitherWay, type NoCut } from './noCut';
import { shareChain } from './shareChain';
import { blocksOf, zonesOf } from './stretches';
import type { RunBond } from './types';

export interface ChainTask {
  readonly chain: Chain;
  readonly walls: Walls;
  readonly openings: ReadonlyMap<string, Opening>;
  readonly heights: ReadonlyMap<string, { sill?: number; head?: number }>;
  readonly coursing: Coursing;
  readonly limits: BondLimits;
  readonly memo: FillMemo;
  /** In which parity the arriving run goes through, by corner. */
  readonly turns: ReadonlyMap<string, Parity>;
}

function hasSpan(start: EndPair, end: EndPair): boolean {
  return spanLength({ from: start[0], to: end[0] }) > 0 && spanLength({ from: start[1], to: end[1] }) > 0;
}

/** Lays a chain and gives each of its runs the pieces that are its own. */
export function layChain(task: ChainTask): { runs: RunBond[]; reasons: Reason[] } {
  const { chain, walls, coursing, limits, memo, turns } = task;
  const firstRun = chain.runs[0]!.run;
  const lastRun = chain.runs[chain.runs.length - 1]!.run;
  const start = endOfRun(walls, firstRun, 0, turns.get(firstRun.ends[0].cornerId) ?? 0);
  const endInto = endOfRun(walls, lastRun, 1, turns.get(lastRun.ends[1].cornerId) ?? 0);
  const end = farEnd(endInto, chain.length);
  const blocks = chain.length > 0 ? blocksOf(chain, walls, task.openings, task.heights, coursing) : [];
  const canLay = chain.length > 0 && !hasTooManyPieces(chain.length, limits) && hasSpan(start, end);
  const zones = canLay ? zonesOf(start, end, blocks, coursing) : [];
  const laid = layZones(zones, { start, end }, limits, memo);
  const noCut = chain.length > 0 ? noCutEitherWay(start, endInto, chain.length, limits) : { below: null, above: null };
  const noCutOf = (length: number): NoCut => {
    const shift = (value: Ticks | null): Ticks | null => {
      const moved = value === null ? 0 : value - chain.length + length;
      return moved > 0 ? ticks(moved) : null;
    };
    return { below: shift(noCut.below), above: shift(noCut.above) };
  };
  const shares = shareChain(chain, laid, start, end, coursing.courses.length);
  const checks = checkChain(chain, laid, limits, noCutOf);
  const runs = chain.runs.map(({ run }, i): RunBond => ({
    runId: run.runId,
    ...shares[i]!,
    noCut: noCutOf(run.length),
    lap: checks.laps[i]!,
  }));
  return { runs, reasons: checks.reasons };
}
