/** Runs that carry on in one line (through a straight joint, or past a tee's stem) are laid as one: a chain. */
import type { RunGeometry, Walls } from '../walls/types';

export interface ChainRun {
  readonly run: RunGeometry;
  /** Where the run's first corner stands along the chain. */
  readonly offset: number;
}

export interface Chain {
  readonly runs: readonly ChainRun[];
  readonly length: number;
}

/** Cosine of the largest turn, just under one degree, that is still one line. */
const ONE_LINE = 1 - 1e-4;

/** The run that carries on in this run's line past its second corner, if one does. */
function findNext(walls: Walls, run: RunGeometry): RunGeometry | null {
  const end = run.ends[1];
  if (end.kind !== 'straight' && end.kind !== 'teeBar' && end.kind !== 'cross') return null;
  for (const id of end.others) {
    const other = walls.runById.get(id);
    if (!other || other === run || other.length <= 0) continue;
    if (other.ends[0].cornerId !== end.cornerId || other.wallTypeId !== run.wallTypeId) continue;
    const turn = other.direction.x * run.direction.x + other.direction.y * run.direction.y;
    if (turn > ONE_LINE) return other;
  }
  return null;
}

/** Every run in exactly one chain, in the order of the drawing. At a crossing only the first pair found goes through. */
export function chainRuns(walls: Walls): Chain[] {
  const next = new Map<string, RunGeometry>();
  const hasPrevious = new Set<string>();
  const crossed = new Set<string>();
  for (const run of walls.runs) {
    const cornerId = run.ends[1].cornerId;
    const other = run.length > 0 && !crossed.has(cornerId) ? findNext(walls, run) : null;
    if (!other || hasPrevious.has(other.runId)) continue;
    next.set(run.runId, other);
    hasPrevious.add(other.runId);
    crossed.add(cornerId);
  }
  const chains: Chain[] = [];
  for (const first of walls.runs) {
    if (hasPrevious.has(first.runId)) continue;
    const runs: ChainRun[] = [];
    let length = 0;
    for (let run: RunGeometry | undefined = first; run; run = next.get(run.runId)) {
      runs.push({ run, offset: length });
      length += run.length;
    }
    chains.push({ runs, length });
  }
  return chains;
}
