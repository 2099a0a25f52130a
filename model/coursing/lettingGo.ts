/** Answers that stop bending the joints towards a soft height which can't be met anyway. */
import { buildAnswer, type Built, type Parts } from './buildAnswer';
import type { Stop } from './problem';
import { rankOnce } from './rememberRanking';
import type { ControlResult } from './types';

/** Heights let go one by one; more than these are only let go all together. */
const MOST_ONE_BY_ONE = 4;

/**
 * The best answer draws every soft height as near as can be, so it bends the joints even where the height stays out of
 * its tolerance. For each such height, and for all of them together, this is the best answer that passes over it
 * instead: fewer joints to remember, and a larger miss.
 */
export function lettingGo(parts: Parts, best: Built): Built[] {
  const { problem } = parts;
  const missed = new Set(
    best.answer.controls.filter((one) => one.hold === 'soft' && !one.met).map((one) => one.wanted),
  );
  const stops = problem.stops.filter((stop) => stop.hold === 'soft' && stop.beamDepth === 0 && missed.has(stop.height));
  const groups: Stop[][] = stops.length > MOST_ONE_BY_ONE ? [] : stops.map((stop) => [stop]);
  if (stops.length > 1) groups.push(stops);
  return groups.flatMap((group) => {
    const kept = { ...problem, stops: problem.stops.filter((stop) => !group.includes(stop)) };
    const [plan] = rankOnce(kept, 1).plans;
    if (!plan) return [];
    const letGo = group.flatMap((stop) => stop.controls);
    return [inOrderOf(best, buildAnswer({ ...parts, problem: kept }, plan, letGo))];
  });
}

/** The same answer with its controls in the order of another answer's. */
function inOrderOf(other: Built, built: Built): Built {
  const key = ({ thing, kind }: ControlResult) => `${thing.kind} ${thing.id} ${kind}`;
  const found = new Map(built.answer.controls.map((one) => [key(one), one]));
  const controls = other.answer.controls.flatMap((one) => found.get(key(one)) ?? []);
  return { ...built, answer: { ...built.answer, controls } };
}
