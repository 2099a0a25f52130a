/** The courses of the whole building: one gauge all the way round, chosen to land on the heights that matter. */
import type { Drawing } from '../drawing/schema';
import { ticks, type Ticks } from '../length/ticks';
import type { Reason } from '../reasons';
import { coursedType } from '../survey/coursedType';
import type { Ground } from '../survey/types';
import type { Walls } from '../walls/types';
import { coursesOf, liftsOf, linesOf } from './buildAnswer';
import { controlResults } from './controlResults';
import { gatherControls, missCode } from './controls';
import { HARD_MISS } from './costPieces';
import { checkLifts } from './lifts';
import type { Control, Problem } from './problem';
import { rate, type RatedPlan } from './refine';
import { settle } from './settle';
import type { Coursing, CoursingAnswer } from './types';

/** The best answer and this many others. */
const MOST_OTHERS = 5;

/**
 * Chooses whole numbers of courses and one bed joint for each interval between the heights that courses must meet, in strict order:
 * fewest hard heights missed, and by least; least soft misses by weight; joints nearest the nominal; joints
 * most even. Exact (see `search.ts`, `refine.ts`, `rankPlans.ts`). Heights are above the high point of the foundation.
 */
export function planCourses(drawing: Drawing, walls: Walls, ground: Ground): Coursing {
  const type = coursedType(drawing);
  const gathered = gatherControls(drawing, walls, ground);
  const settled = settle(type, ground.firstCourseTop, gathered, 1 + MOST_OTHERS);
  const { problem, ranking, left, openTop } = settled;
  const [best, ...rest] = ranking.plans;
  const chosen = best ?? rate(problem, { cost: { hard: 0, soft: 0 }, heights: [], counts: [] });
  const built = build(problem, chosen, left, openTop, ground.leastBedding);
  const { lifts, reasons: tall } = checkLifts(drawing, walls, built.lifts);
  const missed = missedReasons(built.answer, left.length);
  const lastLift = lifts[lifts.length - 1];
  return {
    unitHeight: type.unit.height,
    courses: built.courses,
    lifts,
    answer: built.answer,
    others: otherAnswers(problem, built, rest, left, openTop, ground.leastBedding),
    top: lastLift?.beam?.top ?? lastLift?.top ?? ground.firstCourseTop,
    reasons: [...gathered.reasons, ...settled.reasons, ...missed, ...tall],
  };
}

type Built = ReturnType<typeof build>;

function build(problem: Problem, plan: RatedPlan, left: readonly Control[], openTop: Ticks | null, bedding: Ticks) {
  const lifts = liftsOf(problem, linesOf(problem, plan, openTop));
  const courses = coursesOf(problem, bedding, lifts);
  const controls = controlResults(problem, plan, courses, left);
  const leftHard = controls.slice(controls.length - left.length).filter((one) => one.hold === 'hard' && !one.met);
  const answer: CoursingAnswer = {
    intervals: lifts.flatMap((lift) => lift.intervals),
    controls,
    cost: [Math.floor(plan.cost.hard / HARD_MISS) + leftHard.length, plan.cost.soft, plan.step, plan.spread],
  };
  return { lifts, courses, answer };
}

/** The next best answers whose courses differ, and that miss no more hard heights than the best. */
function otherAnswers(
  problem: Problem,
  best: Built,
  rest: readonly RatedPlan[],
  left: readonly Control[],
  openTop: Ticks | null,
  bedding: Ticks,
): CoursingAnswer[] {
  const seen = new Set([signature(best)]);
  return rest.flatMap((plan) => {
    const built = build(problem, plan, left, openTop, bedding);
    if (built.answer.cost[0] > best.answer.cost[0] || seen.has(signature(built))) return [];
    seen.add(signature(built));
    return [built.answer];
  });
}

function signature(built: Built): string {
  return built.courses.map((course) => course.top).join(' ');
}

/** The last `left` controls have their reasons already. */
function missedReasons(answer: CoursingAnswer, left: number): Reason[] {
  return answer.controls.slice(0, answer.controls.length - left).flatMap((control): Reason[] => {
    if (control.met) return [];
    return [
      {
        code: missCode(control),
        weight: control.hold === 'hard' ? 'warning' : 'note',
        thing: control.thing,
        amount: ticks(Math.abs(control.miss)),
        nearest: { below: control.below, above: control.above },
      },
    ];
  });
}
