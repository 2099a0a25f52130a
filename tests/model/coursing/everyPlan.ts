/** The coursing problem by trying everything: every whole height of every stop, every count. For small numbers only. */
import type { Problem } from '../../../model/coursing/problem';

/** Hard heights missed, ticks they are missed by, soft misses, largest step, spread. */
export type Judged = readonly [number, number, number, number, number];

export interface Tried {
  readonly counts: readonly number[];
  readonly judged: Judged;
}

export function compareJudged(a: Judged, b: Judged): number {
  for (let i = 0; i < a.length; i++) {
    const difference = a[i]! - b[i]!;
    if (Math.abs(difference) > 1e-4) return difference;
  }
  return 0;
}

/** Heights that may be tried for one stop. */
export type Tryable = (stop: number, height: number) => boolean;

/** The best plan of every vector of counts, in strict order; heights up to `highest`. */
export function everyPlan(problem: Problem, highest: number, tryable: Tryable = () => true): Tried[] {
  const best = new Map<string, Tried>();
  const { unit, joint, stops } = problem;

  function judge(heights: readonly number[], counts: readonly number[]): Judged {
    let missed = 0;
    let amount = 0;
    let soft = 0;
    stops.forEach((stop, i) => {
      const miss = Math.abs(heights[i]! - stop.height);
      if (stop.hold === 'hard') {
        if (miss > 0) missed++;
        amount += miss;
      } else soft += stop.weight * (miss <= stop.tolerance ? miss : stop.tolerance + 10 * (miss - stop.tolerance));
    });
    const joints: number[] = [];
    let from: number = problem.start;
    stops.forEach((stop, i) => {
      if (counts[i]! > 0) joints.push((heights[i]! - from) / counts[i]! - unit);
      from = heights[i]! + stop.beamDepth;
    });
    if (joints.length === 0) return [missed, amount, soft, 0, 0];
    const step = Math.max(...joints.map((one) => Math.abs(one - joint.nominal)));
    return [missed, amount, soft, step, Math.max(...joints) - Math.min(...joints)];
  }

  function go(i: number, from: number, inLift: number, heights: number[], counts: number[]): void {
    const stop = stops[i];
    if (!stop) {
      const judged = judge(heights, counts);
      const key = counts.join(' ');
      const old = best.get(key);
      if (!old || compareJudged(judged, old.judged) < 0) best.set(key, { counts: [...counts], judged });
      return;
    }
    for (let height = from; height <= highest; height++) {
      if (!tryable(i, height)) continue;
      for (let count = 0; count * (unit + joint.least) <= height - from; count++) {
        if (count * (unit + joint.most) < height - from) continue;
        if (stop.beamDepth > 0 && inLift + count === 0) continue;
        const lift = stop.beamDepth > 0 ? 0 : inLift + count;
        go(i + 1, height + stop.beamDepth, lift, [...heights, height], [...counts, count]);
      }
    }
  }

  go(0, problem.start, 1, [], []);
  return [...best.values()].sort((a, b) => compareJudged(a.judged, b.judged));
}
