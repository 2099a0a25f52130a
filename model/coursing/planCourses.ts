/** The courses of the whole building: one gauge all the way round, chosen to land on the heights that matter. */
import type { Drawing } from '../drawing/schema';
import { ticks, type Ticks } from '../length/ticks';
import type { Reason } from '../reasons';
import { coursedType } from '../survey/coursedType';
import type { Ground } from '../survey/types';
import type { Walls } from '../walls/types';
import { buildAnswer, type Built, type Parts } from './buildAnswer';
import { gatherControls, missCode } from './controls';
import { lettingGo } from './lettingGo';
import { checkLifts } from './lifts';
import { rate } from './refine';
import { settle } from './settle';
import type { Course, Coursing, CoursingAnswer } from './types';

/** The best answer and this many others: five in all. */
const MOST_OTHERS = 4;

/**
 * Chooses whole numbers of courses and one bed joint for each interval between the heights that courses must meet, in strict order:
 * fewest hard heights missed, and by least; least soft misses by weight; fewest thinner courses; joints nearest the
 * nominal; joints most even. Exact (see `search.ts`, `refine.ts`, `rankPlans.ts`). The others offered have other counts of courses, or even
 * joints past a height that can't be met anyway. Heights are above the high point of the foundation.
 */
export function planCourses(drawing: Drawing, walls: Walls, ground: Ground): Coursing {
  const type = coursedType(drawing);
  const gathered = gatherControls(drawing, walls, ground);
  const settled = settle(type, ground.firstCourseTop, gathered, 1 + MOST_OTHERS);
  const { problem, ranking, left, openTop } = settled;
  const [best, ...rest] = ranking.plans;
  const chosen = best ?? rate(problem, { cost: { hard: 0, soft: 0 }, heights: [], counts: [], thins: [] });
  const parts: Parts = { problem, left, openTop, bedding: ground.leastBedding };
  const built = buildAnswer(parts, chosen);
  const { lifts, reasons: tall } = checkLifts(drawing, walls, built.lifts, built.courses);
  const missed = missedReasons(built.answer, left.length);
  const others = [...rest.map((plan) => buildAnswer(parts, plan)), ...lettingGo(parts, built)];
  const lastLift = lifts[lifts.length - 1];
  return {
    unitHeight: type.unit.height,
    courses: built.courses,
    lifts,
    answer: built.answer,
    others: differing(built, others, drawing.tapeStep),
    othersComplete: ranking.complete,
    proof: settled.proof,
    top: lastLift?.beam?.top ?? lastLift?.top ?? ground.firstCourseTop,
    reasons: [...gathered.reasons, ...settled.reasons, ...missed, ...tall],
  };
}

/** The best few of the other answers that miss no more hard heights, and that the tape can tell from those before them. */
function differing(best: Built, others: readonly Built[], tapeStep: Ticks): CoursingAnswer[] {
  const kept = [best];
  const inOrder = others
    .filter((other) => other.answer.cost[0] <= best.answer.cost[0])
    .sort((a, b) => compareParts(a.answer.cost, b.answer.cost));
  for (const other of inOrder) {
    if (kept.length > MOST_OTHERS) break;
    if (kept.every((one) => tellApart(one, other, tapeStep))) kept.push(other);
  }
  return kept.slice(1).map((one) => one.answer);
}

function compareParts(a: CoursingAnswer['cost'], b: CoursingAnswer['cost']): number {
  const differs = a.findIndex((part, i) => part !== b[i]);
  return differs < 0 ? 0 : (a[differs] as number) - (b[differs] as number);
}

function tellApart(one: Built, other: Built, tapeStep: Ticks): boolean {
  return (
    one.courses.length !== other.courses.length ||
    one.courses.some((course, i) => Math.abs(course.top - (other.courses[i] as Course).top) >= tapeStep)
  );
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
