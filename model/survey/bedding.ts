/** Bedding along every run: how thick, over what stretch, and its volume. */
import type { Drawing } from '../drawing/schema';
import { TICKS_PER_MM, ticks, type Ticks } from '../length/ticks';
import type { RunGeometry, Walls } from '../walls/types';
import { reachOf, volumeOver, withoutGaps, type DepthPiece } from './depthPieces';
import type { Ground } from './types';

/** Cubic ticks in a cubic millimetre. */
export const PER_CUBIC_MM = TICKS_PER_MM ** 3;

export interface RunBedding {
  readonly runId: string;
  /** Thinnest and thickest under its masonry; zero where there is none. */
  readonly thinnest: Ticks;
  readonly thickest: Ticks;
  /** In cubic millimetres, mitred at the corners; nothing under a way through to the foundation. */
  readonly volume: number;
}

/** Bedding under the first course of each run: least bedding less the foundation's height, straight between stations. */
export function beddingAlong(drawing: Drawing, walls: Walls, ground: Ground): readonly RunBedding[] {
  const openings = new Map(drawing.openings.map((opening) => [opening.id, opening]));
  return walls.runs.map((run) => {
    const pieces = beddingPieces(run, walls, ground, openings);
    const depths = pieces.flatMap(({ start, end }) => [start, end]);
    return {
      runId: run.runId,
      thinnest: ticks(depths.length === 0 ? 0 : Math.round(depths.reduce((a, b) => Math.min(a, b)))),
      thickest: ticks(depths.length === 0 ? 0 : Math.round(depths.reduce((a, b) => Math.max(a, b)))),
      volume: volumeOver(run, pieces) / PER_CUBIC_MM,
    };
  });
}

/** The bedding of one run as straight pieces, flat beyond its ends, with a gap at every opening that reaches the foundation. */
export function beddingPieces(
  run: RunGeometry,
  walls: Walls,
  ground: Ground,
  openings: ReadonlyMap<string, Drawing['openings'][number]>,
): readonly DepthPiece[] {
  const [low, high] = reachOf(run);
  const profile = ground.profileByRun.get(run.runId) ?? [];
  const knots = profile.map(({ at, height }) => ({ at: at as number, depth: ground.leastBedding - height }));
  const first = knots[0] ?? { at: 0, depth: ground.leastBedding };
  const last = knots[knots.length - 1] ?? first;
  const whole = [{ ...first, at: low }, ...knots, { ...last, at: high }];
  const pieces: DepthPiece[] = [];
  for (let i = 1; i < whole.length; i++) {
    const [a, b] = [whole[i - 1]!, whole[i]!];
    if (b.at > a.at) pieces.push({ from: a.at, to: b.at, start: a.depth, end: b.depth });
  }
  const gaps = (walls.openingsByRun.get(run.runId) ?? []).flatMap((id): (readonly [number, number])[] => {
    const opening = openings.get(id);
    return opening && opening.sill <= 0 ? [[opening.at, opening.at + opening.width]] : [];
  });
  return withoutGaps(pieces, gaps);
}
