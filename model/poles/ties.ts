/** A brace's foot by two tape distances from named corners. */
import { boxOfSegment } from '../geometry/box';
import type { PlanPoint, Vec } from '../geometry/point';
import { cross, distance, dot, sub } from '../geometry/vec';
import { roundTicks } from '../length/ticks';
import type { Walls } from '../walls/types';
import type { Ground } from './obstacles';
import { partsInside } from './plane';
import type { Tie } from './types';

/** Two tapes fix a foot well where they cross at 30° or more: below that a small slip of either moves it far. */
const GOOD_SINE = 0.5;

/** Corners tried for one foot; a usual corner has four within two runs. */
const CORNERS_MOST = 24;

/** Corners one and two runs away from a pole's own runs: those a crew would hold the tape on. */
export function cornersAround(runIds: readonly string[], walls: Walls): string[] {
  const found = new Set<string>();
  let edge = runIds;
  for (let step = 0; step < 2; step += 1) {
    const next: string[] = [];
    for (const runId of edge)
      for (const end of walls.runById.get(runId)?.ends ?? []) {
        if (!found.has(end.cornerId)) next.push(...(walls.cornerById.get(end.cornerId)?.runIds ?? []));
        found.add(end.cornerId);
      }
    edge = next;
  }
  return [...found].slice(0, CORNERS_MOST);
}

/** True where a tape from a corner to a foot would run through the body of a wall. */
function runsThrough(corner: PlanPoint, foot: PlanPoint, ground: Ground): boolean {
  return ground
    .near(boxOfSegment(corner, foot))
    .some((obstacle) => obstacle.kind === 'wall' && partsInside(corner, foot, obstacle.ring).length > 0);
}

interface Tape {
  readonly cornerId: string;
  readonly at: PlanPoint;
  readonly away: Vec;
  readonly tape: number;
}

/** The pair of tapes that fixes a foot best: the shortest of those that cross at 30° or more, else the nearest to square. */
function bestPair(tapes: readonly Tape[]): { readonly pair: readonly [Tape, Tape]; readonly good: boolean } | null {
  let best: { pair: readonly [Tape, Tape]; sine: number; length: number } | null = null;
  for (const [i, a] of tapes.entries())
    for (const b of tapes.slice(i + 1)) {
      const sine = Math.abs(cross(a.away, b.away)) / Math.hypot(cross(a.away, b.away), dot(a.away, b.away));
      const length = a.tape + b.tape;
      const better =
        !best ||
        (sine >= GOOD_SINE && (best.sine < GOOD_SINE || length < best.length)) ||
        (best.sine < GOOD_SINE && sine > best.sine);
      if (better && sine > 0.01) best = { pair: [a, b], sine, length };
    }
  return best && { pair: best.pair, good: best.sine >= GOOD_SINE };
}

/**
 * The two corners that fix a foot best: the shortest pair of tapes that cross at 30° or more and pass no wall's body; where
 * there is none, one that crosses well through a wall (its place is open until it is laid); else the pair that crosses
 * nearest to square. Empty where the drawing has no two corners out of line with the foot.
 */
export function tiesOf(foot: PlanPoint, cornerIds: readonly string[], walls: Walls, ground: Ground): readonly Tie[] {
  const tapes = cornerIds
    .flatMap((id) => walls.cornerById.get(id) ?? [])
    .map(({ cornerId, letter, at }) => ({ cornerId, letter, at, away: sub(at, foot), tape: distance(at, foot) }))
    .filter((each) => each.tape > 0)
    .sort((a, b) => a.tape - b.tape || (a.letter < b.letter ? -1 : 1));
  const any = bestPair(tapes);
  const through = ({ at }: Tape) => runsThrough(at, foot, ground);
  let chosen = any;
  if (any?.pair.some(through)) {
    const clear = bestPair(tapes.filter((tape) => !through(tape)));
    if (clear && (clear.good || !any.good)) chosen = clear;
  }
  return (chosen?.pair ?? []).map(({ cornerId, tape }) => ({ cornerId, distance: roundTicks(tape) }));
}
