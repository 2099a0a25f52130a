/** Checks a plan of courses against the problem itself, by plain arithmetic, and says what it costs. */
import type { Problem } from '../../model/coursing/problem';
import type { RatedPlan } from '../../model/coursing/refine';
import type { CostParts } from './coursingMilp';

/** Float error of joints that are compared with whole limits. */
const FINE = 1e-6;

/** The plan's cost, or what is wrong with it. */
export function judgeCourses(problem: Problem, plan: RatedPlan): CostParts | string {
  const { unit, joint, thin, stops } = problem;
  let [from, hardMissed, hardTicks, soft, thins] = [problem.start as number, 0, 0, 0, 0];
  let coursesInLift = 1;
  const joints: number[] = [];
  for (const [i, stop] of stops.entries()) {
    const height = plan.heights[i]!;
    const count = plan.counts[i]!;
    if (!Number.isInteger(height) || !Number.isInteger(count) || count < 0) return `stop ${i} is not whole`;
    const isThin = plan.thins[i]!;
    if (isThin && (!thin || count === 0)) return `stop ${i} has a thinner course that it may not have`;
    if (count === 0 && height !== from) return `stop ${i} has no course and is not where it starts`;
    if (count > 0) {
      const one = plan.joints[i]!;
      if (one < joint.least - FINE || one > joint.most + FINE) return `stop ${i} has a joint of ${one}`;
      const whole = isThin ? count - 1 : count;
      const rest = height - from - whole * unit - count * one;
      if (!isThin && Math.abs(rest) > FINE) return `stop ${i} is ${rest} off its courses`;
      if (isThin && (rest < thin!.least - FINE || rest > thin!.most + FINE)) return `stop ${i} has a unit of ${rest}`;
      joints.push(one);
      if (isThin) thins++;
    }
    coursesInLift += count;
    const miss = Math.abs(height - stop.height);
    if (stop.hold === 'hard') {
      hardMissed += miss > 0 ? 1 : 0;
      hardTicks += miss;
    } else soft += stop.weight * (miss + 9 * Math.max(0, miss - stop.tolerance));
    if (stop.beamDepth > 0) {
      if (coursesInLift === 0) return `no course below the beam at stop ${i}`;
      coursesInLift = 0;
    }
    from = height + stop.beamDepth;
  }
  const step = joints.reduce((most, one) => Math.max(most, Math.abs(one - joint.nominal)), 0);
  const spread = joints.length > 0 ? Math.max(...joints) - Math.min(...joints) : 0;
  return [hardMissed, hardTicks, soft, thins, step, spread];
}
