/** A depth along a run as straight pieces: cutting it, and its exact volume over the wall's body. */
import type { RunGeometry } from '../walls/types';

/** A depth that goes straight from `start` at `from` to `end` at `to`, along a run's outside face, in ticks as floats. */
export interface DepthPiece {
  readonly from: number;
  readonly to: number;
  readonly start: number;
  readonly end: number;
}

function depthAt(piece: DepthPiece, at: number): number {
  const { from, to, start, end } = piece;
  return to === from ? start : start + ((end - start) * (at - from)) / (to - from);
}

function part(piece: DepthPiece, from: number, to: number): DepthPiece {
  return { from, to, start: depthAt(piece, from), end: depthAt(piece, to) };
}

/** The pieces without what lies within the gaps, `[from, to]`. Both in order along the run; one pass over each. */
export function withoutGaps(
  pieces: readonly DepthPiece[],
  gaps: readonly (readonly [number, number])[],
): readonly DepthPiece[] {
  const left: DepthPiece[] = [];
  let next = 0;
  for (const piece of pieces) {
    let from = piece.from;
    while (next < gaps.length && gaps[next]![0] < piece.to) {
      const [start, end] = gaps[next]!;
      if (start > from) left.push(part(piece, from, start));
      from = Math.max(from, end);
      // A gap that goes on past this piece is the next one's too.
      if (end >= piece.to) break;
      next += 1;
    }
    if (from < piece.to) left.push(from === piece.from ? piece : part(piece, from, piece.to));
  }
  return left;
}

/** The parts of the pieces that are deeper than a level. */
export function deeperThan(pieces: readonly DepthPiece[], level: number): readonly DepthPiece[] {
  return pieces.flatMap((piece) => {
    const { from, to, start, end } = piece;
    if (start <= level && end <= level) return [];
    if (start >= level && end >= level) return [piece];
    const crossing = from + ((to - from) * (level - start)) / (end - start);
    return start > level ? [{ ...piece, to: crossing, end: level }] : [{ ...piece, from: crossing, start: level }];
  });
}

/** Each depth changed by the same straight rule. */
export function mapDepths(pieces: readonly DepthPiece[], change: (depth: number) => number): readonly DepthPiece[] {
  return pieces.map((piece) => ({ ...piece, start: change(piece.start), end: change(piece.end) }));
}

/** Pieces that touch, joined: the stretches that they cover, with the greatest depth of each. */
export function stretchesOf(pieces: readonly DepthPiece[]): { from: number; to: number; deepest: number }[] {
  const stretches: { from: number; to: number; deepest: number }[] = [];
  for (const piece of pieces) {
    if (piece.to <= piece.from) continue;
    const deepest = Math.max(piece.start, piece.end);
    const last = stretches[stretches.length - 1];
    if (last && piece.from <= last.to) {
      last.to = piece.to;
      last.deepest = Math.max(last.deepest, deepest);
    } else stretches.push({ from: piece.from, to: piece.to, deepest });
  }
  return stretches;
}

/** The least and greatest distance along the run that its body reaches, mitres included. */
export function reachOf(run: RunGeometry): readonly [number, number] {
  const along = run.body.map((point) => alongOf(run, point));
  return [along.reduce((a, b) => Math.min(a, b), 0), along.reduce((a, b) => Math.max(a, b), run.length)];
}

function alongOf(run: RunGeometry, { x, y }: { x: number; y: number }): number {
  return (x - run.start.x) * run.direction.x + (y - run.start.y) * run.direction.y;
}

/**
 * Volume of a depth over the wall's body in plan, in cubic ticks: ∬ depth dA = ∮ F dy by Green's theorem, F the integral
 * of the depth along the run. Each edge is cut where the depth bends; between, F is quadratic and Simpson's rule is
 * exact for it (the prismoidal formula). Mitred ends count as they are cut, so that a corner is shared and never twice.
 * `pieces` in order along the run. One pass over the pieces, and over those beside each end.
 */
export function volumeOver(run: RunGeometry, pieces: readonly DepthPiece[]): number {
  const sums: number[] = [0];
  for (const { from, to, start, end } of pieces)
    sums.push((sums[sums.length - 1] as number) + ((to - from) * (start + end)) / 2);
  const integral = (at: number): number => {
    let [low, high] = [0, pieces.length];
    while (low < high) {
      const middle = (low + high) >> 1;
      if ((pieces[middle] as DepthPiece).to < at) low = middle + 1;
      else high = middle;
    }
    const piece = pieces[low];
    const before = sums[low] as number;
    if (!piece || at <= piece.from) return before;
    return before + ((at - piece.from) * (piece.start + depthAt(piece, at))) / 2;
  };
  const across = (point: { x: number; y: number }) =>
    (point.x - run.start.x) * run.inward.x + (point.y - run.start.y) * run.inward.y;
  let volume = 0;
  run.body.forEach((corner, i) => {
    const next = run.body[(i + 1) % run.body.length] ?? corner;
    const [x0, x1] = [alongOf(run, corner), alongOf(run, next)];
    const dy = across(next) - across(corner);
    const [low, high] = [Math.min(x0, x1), Math.max(x0, x1)];
    if (high === low) {
      volume += integral(low) * dy;
      return;
    }
    const bends = pieces.flatMap(({ from, to }) => [from, to]).filter((at) => at > low && at < high);
    const stops = [low, ...bends, high];
    let area = 0;
    for (let k = 1; k < stops.length; k++) {
      const [a, b] = [stops[k - 1] as number, stops[k] as number];
      area += ((b - a) * (integral(a) + 4 * integral((a + b) / 2) + integral(b))) / 6;
    }
    volume += (area * dy) / (high - low);
  });
  return Math.max(0, volume);
}
