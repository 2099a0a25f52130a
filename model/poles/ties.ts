/** A brace's foot by two tape distances from named corners. */
import type { PlanPoint } from '../geometry/point';
import { cross, distance, dot, sub } from '../geometry/vec';
import { roundTicks } from '../length/ticks';
import type { Walls } from '../walls/types';
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

/**
 * The two corners that fix a foot best: the shortest pair of tapes among those that cross at 30° or more, else the pair
 * that crosses nearest to square. Empty where the drawing has no two corners out of line with the foot.
 */
export function tiesOf(foot: PlanPoint, cornerIds: readonly string[], walls: Walls): readonly Tie[] {
  const corners = cornerIds
    .flatMap((id) => walls.cornerById.get(id) ?? [])
    .map((corner) => ({ corner, away: sub(corner.at, foot), tape: distance(corner.at, foot) }))
    .filter((each) => each.tape > 0)
    .sort((a, b) => a.tape - b.tape || a.corner.letter.localeCompare(b.corner.letter));
  let best: { pair: typeof corners; sine: number; length: number } | null = null;
  corners.forEach((a, i) => {
    for (const b of corners.slice(i + 1)) {
      const sine = Math.abs(cross(a.away, b.away)) / Math.hypot(cross(a.away, b.away), dot(a.away, b.away));
      const length = a.tape + b.tape;
      const better =
        !best ||
        (sine >= GOOD_SINE && (best.sine < GOOD_SINE || length < best.length)) ||
        (best.sine < GOOD_SINE && sine > best.sine);
      if (better && sine > 0.01) best = { pair: [a, b], sine, length };
    }
  });
  const chosen = best as { pair: typeof corners } | null;
  return (chosen?.pair ?? []).map(({ corner, tape }) => ({ cornerId: corner.cornerId, distance: roundTicks(tape) }));
}
