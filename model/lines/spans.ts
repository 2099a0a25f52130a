/** Which lines are strung: from pole to pole along each run, and on through runs in line with it. */
import { roundTicks, type Ticks } from '../length/ticks';
import type { PoleSet, StoryPole } from '../poles/types';
import type { RunGeometry, Walls } from '../walls/types';

export interface Span {
  readonly runId: string;
  readonly fromPoleId: string | null;
  readonly toPoleId: string | null;
  readonly length: Ticks;
}

interface Stop {
  readonly pole: StoryPole | null;
  readonly along: number;
}

/** Two directions count as one line when they part by less than this in a unit length (a hundredth of a degree). */
const IN_LINE = 1.7e-4;

/**
 * The lines of a building. A line starts at a pole and runs to the next one; where the run ends in line with another
 * and no pole stands there, the line goes on through it. A pole set off along the run lengthens its line by as much.
 */
export function spansOf(walls: Walls, poles: PoleSet): Span[] {
  const byRun = new Map<string, StoryPole[]>();
  for (const pole of poles.poles) {
    for (const runId of pole.runIds) {
      const list = byRun.get(runId);
      if (list) list.push(pole);
      else byRun.set(runId, [pole]);
    }
  }
  const done = new Set<string>();
  const spans: Span[] = [];
  for (const run of walls.runs) {
    if (done.has(run.runId) || run.length === 0) continue;
    const chain = chainOf(walls, byRun, run);
    for (const link of chain) done.add(link.runId);
    spans.push(...spansOfChain(chain, byRun));
  }
  return spans;
}

/** The runs that one line may pass through, in order along it, all walked the way the first is drawn. */
function chainOf(walls: Walls, byRun: ReadonlyMap<string, readonly StoryPole[]>, run: RunGeometry): RunGeometry[] {
  const chain = [run];
  const seen = new Set([run.runId]);
  for (const side of [1, 0] as const) {
    for (let last: RunGeometry | null = run; last;) {
      last = nextInLine(walls, byRun, last, side, seen);
      if (last) {
        seen.add(last.runId);
        if (side === 1) chain.push(last);
        else chain.unshift(last);
      }
    }
  }
  return chain;
}

function nextInLine(
  walls: Walls,
  byRun: ReadonlyMap<string, readonly StoryPole[]>,
  run: RunGeometry,
  side: 0 | 1,
  seen: ReadonlySet<string>,
): RunGeometry | null {
  const end = run.ends[side];
  const held = (byRun.get(run.runId) ?? []).some((pole) => pole.cornerId === end.cornerId);
  if (held || end.kind === 'teeStem') return null;
  for (const otherId of end.others) {
    const other = walls.runById.get(otherId);
    if (!other || other.length === 0 || seen.has(otherId)) continue;
    const turn = Math.abs(run.direction.x * other.direction.y - run.direction.y * other.direction.x);
    const sameWay = run.direction.x * other.direction.x + run.direction.y * other.direction.y > 0;
    // Drawn the other way, its outside face is the other face: no line passes from one to the other.
    if (turn < IN_LINE && sameWay && other.ends[side === 1 ? 0 : 1].cornerId === end.cornerId) return other;
  }
  return null;
}

function spansOfChain(chain: readonly RunGeometry[], byRun: ReadonlyMap<string, readonly StoryPole[]>): Span[] {
  const first = chain[0] as RunGeometry;
  const last = chain[chain.length - 1] as RunGeometry;
  const along = (point: { x: number; y: number }): number =>
    (point.x - first.start.x) * first.direction.x + (point.y - first.start.y) * first.direction.y;
  const spans: Span[] = [];
  const seen = new Set<string>();
  const stops: (Stop & { runId: string })[] = [];
  for (const run of chain) {
    for (const pole of byRun.get(run.runId) ?? []) {
      if (seen.has(pole.id)) continue;
      seen.add(pole.id);
      stops.push({ pole, along: along(pole.corner), runId: run.runId });
    }
  }
  stops.sort((a, b) => a.along - b.along);
  const [start, end] = [0, along(last.end)];
  const near = 1;
  if (!stops[0] || stops[0].along > start + near) stops.unshift({ pole: null, along: start, runId: first.runId });
  if ((stops[stops.length - 1] as Stop).along < end - near) {
    stops.push({ pole: null, along: end, runId: last.runId });
  }
  for (let i = 0; i + 1 < stops.length; i++) {
    const a = stops[i] as Stop & { runId: string };
    const b = stops[i + 1] as Stop & { runId: string };
    const setOff = setOffAlong(a.pole, chain, i === 0) + setOffAlong(b.pole, chain, i + 2 === stops.length);
    spans.push({
      runId: runAt(chain, along, (a.along + b.along) / 2),
      fromPoleId: a.pole?.id ?? null,
      toPoleId: b.pole?.id ?? null,
      length: roundTicks(b.along - a.along + setOff),
    });
  }
  return spans;
}

/** A pole at the end of a line, set off along it, stands beyond the corner. */
function setOffAlong(pole: StoryPole | null, chain: readonly RunGeometry[], atEnd: boolean): number {
  if (!pole?.setOff || !atEnd) return 0;
  const { runId, by } = pole.setOff;
  return chain.some((run) => run.runId === runId) ? by : 0;
}

function runAt(chain: readonly RunGeometry[], along: (point: RunGeometry['end']) => number, at: number): string {
  const found = chain.find((run) => along(run.end) >= at) ?? (chain[chain.length - 1] as RunGeometry);
  return found.runId;
}
