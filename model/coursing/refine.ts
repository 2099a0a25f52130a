/** Among the plans of least cost, the one whose joints stay nearest the nominal, and then spread least. */
import { compareCosts } from './costPieces';
import { jointRange, type JointLimits } from './fitInterval';
import type { Problem, Stop } from './problem';
import { cheapestWithin, type Plan, type SearchHelp } from './search';

/** A plan with everything it is judged by. */
export interface RatedPlan extends Plan {
  /** Largest step of a joint away from the nominal, in ticks. */
  readonly step: number;
  /** Thickest joint less thinnest, in ticks. */
  readonly spread: number;
  /** The joint of each stop's interval, in ticks, not rounded; the nominal one where it has no course. */
  readonly joints: readonly number[];
}

/** Two joints that part by less are one: finer than any two different joints of under 300 courses each. */
const FINE = 1e-5;

/**
 * Judges a plan, and settles the joints of intervals whose thinner course leaves them a choice: none further from nominal
 * than the interval that is the furthest, then all within the shortest stretch that has a part of every range, then each
 * as near nominal as that allows.
 */
export function rate(problem: Problem, plan: Plan): RatedPlan {
  const { nominal } = problem.joint;
  const ranges = jointRangesOf(problem, plan);
  const held = ranges.filter((range) => range !== null);
  if (held.length === 0) return { ...plan, step: 0, spread: 0, joints: ranges.map(() => nominal) };
  const step = held.reduce((most, one) => Math.max(most, one.least - nominal, nominal - one.most), 0);
  const inner = held.map((one) => ({
    least: Math.max(one.least, nominal - step),
    most: Math.min(one.most, nominal + step),
  }));
  const thickest = Math.max(...inner.map((one) => one.least));
  const thinnest = Math.min(...inner.map((one) => one.most));
  const spread = Math.max(0, thickest - thinnest);
  const together = spread > 0 ? { least: thinnest, most: thickest } : { least: thickest, most: thinnest };
  const joints = ranges.map((one) =>
    one ? within(within(nominal, together.least, together.most), one.least, one.most) : nominal,
  );
  return { ...plan, step, spread, joints };
}

function within(value: number, least: number, most: number): number {
  return Math.min(most, Math.max(least, value));
}

/** The joints that each stop's interval may have; null where it holds no course. */
function jointRangesOf(problem: Problem, plan: Plan): (JointLimits | null)[] {
  let below: number = problem.start;
  return plan.counts.map((count, i) => {
    const from = below;
    const height = plan.heights[i] as number;
    below = height + (problem.stops[i] as Stop).beamDepth;
    if (count === 0) return null;
    const thin = plan.thins[i] ? (problem.thin ?? null) : null;
    return jointRange(height - from, { count, thin }, problem.unit, problem.joint);
  });
}

/** Strict order of plans: cost, then largest step from the nominal joint, then spread. */
export function compareRated(a: RatedPlan, b: RatedPlan): number {
  const cost = compareCosts(a.cost, b.cost);
  if (cost !== 0) return cost;
  if (Math.abs(a.step - b.step) > FINE) return a.step - b.step;
  return Math.abs(a.spread - b.spread) > FINE ? a.spread - b.spread : 0;
}

/**
 * Narrows the joint limits round the nominal as far as the least cost still holds: the largest step from nominal is then
 * the least there is. Then narrows them from each side in turn: with the step fixed, one joint lies at it, so the
 * least spread is found by raising the lower limit or by lowering the upper. Each trial is a whole exact search; where the
 * work runs out, the best so far stands.
 */
export function refine(problem: Problem, plan: Plan, help: SearchHelp): RatedPlan {
  const { nominal, least, most } = problem.joint;
  const attempt = (limits: JointLimits): RatedPlan | null => {
    const found = cheapestWithin(problem, limits, plan.cost, help);
    return found && rate(problem, found);
  };
  const around = (step: number): JointLimits => ({
    least: Math.max(least, nominal - step),
    most: Math.min(most, nominal + step),
  });
  let best = narrow(
    rate(problem, plan),
    (p) => p.step,
    (step) => attempt(around(step)),
  );
  const { step } = best;
  const sides = [
    (spread: number): JointLimits => ({ ...around(step), least: nominal + step - spread }),
    (spread: number): JointLimits => ({ ...around(step), most: nominal - step + spread }),
  ];
  for (const side of sides) {
    best = narrow(
      best,
      (p) => p.spread,
      (spread) => attempt(clamp(side(spread), around(step))),
    );
  }
  return best;
}

function clamp(limits: JointLimits, outer: JointLimits): JointLimits {
  return { least: Math.max(limits.least, outer.least), most: Math.min(limits.most, outer.most) };
}

/** Finds the least measure that `attempt` can still reach: just under the best first, which mostly settles it. */
function narrow(
  start: RatedPlan,
  measure: (plan: RatedPlan) => number,
  attempt: (most: number) => RatedPlan | null,
): RatedPlan {
  let best = start;
  let out = -FINE;
  while (measure(best) - out > 2 * FINE) {
    const under = attempt(measure(best) - FINE);
    if (!under || measure(under) >= measure(best)) return best;
    best = under;
    const middle = (out + measure(best)) / 2;
    const half = middle > 0 ? attempt(middle) : null;
    if (half && measure(half) < measure(best)) best = half;
    else out = Math.max(out, middle);
  }
  return best;
}
