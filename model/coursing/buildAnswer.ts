/** A plan as an answer: its lifts, its courses, what became of every height, and what it costs. */
import type { Ticks } from '../length/ticks';
import { controlResults } from './controlResults';
import { HARD_MISS } from './costPieces';
import { coursesOf, liftsOf, linesOf, type PlanLift } from './layCourses';
import { missCost, takeApart, type Control, type Problem } from './problem';
import type { RatedPlan } from './refine';
import type { Course, CoursingAnswer } from './types';

export interface Parts {
  readonly problem: Problem;
  /** Heights that no course was asked to meet. */
  readonly left: readonly Control[];
  readonly openTop: Ticks | null;
  readonly bedding: Ticks;
}

export interface Built {
  readonly lifts: readonly PlanLift[];
  readonly courses: readonly Course[];
  readonly answer: CoursingAnswer;
}

/** Lays out a plan. `letGo` are further heights that it passes over, which count in its cost all the same. */
export function buildAnswer(parts: Parts, plan: RatedPlan, letGo: readonly Control[] = []): Built {
  const { problem, left, openTop, bedding } = parts;
  const lifts = liftsOf(problem, linesOf(problem, plan, openTop));
  const courses = coursesOf(problem, bedding, lifts);
  const controls = controlResults(problem, plan, courses, [...letGo, ...left]);
  const asked = controls.length - left.length;
  const leftHard = controls.slice(asked).filter((one) => one.hold === 'hard' && !one.met).length;
  const passed = controls.slice(asked - letGo.length, asked);
  const held = takeApart(problem, plan.cost.soft);
  const soft = passed.reduce((sum, one, i) => sum + missCost(letGo[i] as Control, one.miss), held.soft);
  const hard = Math.floor(plan.cost.hard / HARD_MISS);
  const answer: CoursingAnswer = {
    intervals: lifts.flatMap((lift) => lift.intervals),
    controls,
    cost: [hard + leftHard, plan.cost.hard - hard * HARD_MISS, soft, held.thin, plan.step, plan.spread],
  };
  return { lifts, courses, answer };
}
