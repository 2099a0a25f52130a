/** Gives each run of a chain its pieces, with courses alike sharing one pattern. */
import { ticks } from '../length/ticks';
import type { Chain } from './chains';
import type { EndPair, Parity } from './ends';
import { parityOf, type LaidZone } from './layZones';
import type { BondPattern, Piece } from './types';

export interface RunShare {
  readonly patterns: readonly BondPattern[];
  readonly patternByCourse: readonly number[];
  readonly closersPerCoursePair: number;
}

interface ChainPiece {
  readonly kind: Piece['kind'];
  readonly start: number;
  readonly end: number;
}

/** A whole course of the chain with the returns seen at its two ends. */
function piecesOf(laid: LaidZone, start: EndPair, end: EndPair, parity: Parity): ChainPiece[] {
  const pieces: ChainPiece[] = [];
  const first = laid.stretches[0];
  const last = laid.stretches[laid.stretches.length - 1];
  const { at: from, returnWidth: before } = start[parity];
  const { at: to, returnWidth: after } = end[parity];
  if (before > 0 && first?.stretch.start === start) pieces.push({ kind: 'return', start: from - before, end: from });
  for (const { pair } of laid.stretches) {
    const { pieces: flat, closers } = pair[parity];
    let next = 0;
    for (let i = 0; i < flat.length; i += 2) {
      const isCloser = closers[next] === flat[i];
      if (isCloser) next += 2;
      pieces.push({ kind: isCloser ? 'closer' : 'unit', start: flat[i]!, end: flat[i + 1]! });
    }
  }
  if (after > 0 && last?.stretch.end === end) pieces.push({ kind: 'return', start: to, end: to + after });
  return pieces;
}

/** A piece that crosses from one run into the next is the run's that has more of it; the other sees a return. */
function shareCourse(chain: Chain, pieces: readonly ChainPiece[]): Piece[][] {
  if (chain.runs.length === 1)
    return [pieces.map(({ kind, start, end }) => ({ kind, start: ticks(start), end: ticks(end) }))];
  const shares: Piece[][] = chain.runs.map(() => []);
  let r = 0;
  for (const { kind, start, end } of pieces) {
    while (r < chain.runs.length - 1 && start >= chain.runs[r + 1]!.offset) r += 1;
    const owner = ownerOf(chain, r, start, end);
    for (let k = r; k < chain.runs.length; k += 1) {
      const { run, offset } = chain.runs[k]!;
      if (k > r && end <= offset) break;
      const own = k === owner;
      const from = own ? start - offset : Math.max(0, start - offset);
      const to = own ? end - offset : Math.min(run.length, end - offset);
      shares[k]!.push({ kind: own ? kind : 'return', start: ticks(from), end: ticks(to) });
    }
  }
  return shares;
}

function ownerOf(chain: Chain, first: number, start: number, end: number): number {
  let owner = first;
  let most = -1;
  for (let k = first; k < chain.runs.length; k += 1) {
    const { run, offset } = chain.runs[k]!;
    if (k > first && end <= offset) break;
    const part = Math.min(end, offset + run.length) - Math.max(start, offset);
    if (part > most) [owner, most] = [k, part];
  }
  return owner;
}

/** The patterns of each run, in the chain's order. Each zone's courses are laid out once for both parities. */
export function shareChain(
  chain: Chain,
  laid: readonly LaidZone[],
  start: EndPair,
  end: EndPair,
  courses: number,
): RunShare[] {
  const built = chain.runs.map(() => ({
    patterns: [] as BondPattern[],
    byKey: new Map<string, number>(),
    patternByCourse: new Array<number>(courses).fill(-1),
    closers: 0,
  }));
  for (const zone of laid) {
    const { firstCourse, lastCourse } = zone.zone;
    for (let course = firstCourse; course <= Math.min(firstCourse + 1, lastCourse); course += 1) {
      const shares = shareCourse(chain, piecesOf(zone, start, end, parityOf(course)));
      shares.forEach((pieces, i) => {
        const run = built[i]!;
        const key = pieces.map((piece) => `${piece.kind}${piece.start}:${piece.end}`).join();
        let index = run.byKey.get(key);
        if (index === undefined) {
          index = run.patterns.push({ pieces }) - 1;
          run.byKey.set(key, index);
        }
        for (let c = course; c <= lastCourse; c += 2) run.patternByCourse[c] = index;
      });
    }
  }
  return built.map(({ patterns, patternByCourse }) => {
    const noPieces = patternByCourse.includes(-1) ? patterns.push({ pieces: [] }) - 1 : -1;
    const indices = patternByCourse.map((index) => (index < 0 ? noPieces : index));
    const closers = (course: number) =>
      patterns[indices[course] ?? -1]?.pieces.filter((piece) => piece.kind === 'closer').length ?? 0;
    return { patterns, patternByCourse: indices, closersPerCoursePair: closers(0) + closers(1) };
  });
}
