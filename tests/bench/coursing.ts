/** How much quicker the coursing search is than a general mixed-integer solver on the same problems. */
import loadHighs from 'highs';
import { rankPlans } from '../../model/coursing/rankPlans';
import type { Problem } from '../../model/coursing/problem';
import { leastByMilp } from '../helpers/coursingMilp';
import { coursingProblems } from '../helpers/coursingProblems';
import type { Figure } from './figure';

const PROBLEMS = 120;
const SEED = 50;

function timeOf(problems: readonly Problem[], solveOne: (problem: Problem) => unknown): number {
  const start = performance.now();
  for (const problem of problems) solveOne(problem);
  return performance.now() - start;
}

/**
 * Both solve the same random problems, all parts of the cost, in turns, so that other work on the machine weighs on both
 * alike. Ours is warmed up first, as it is in any browser that has been drawing for a second; HiGHS is compiled beforehand.
 */
export async function benchCoursing(): Promise<Figure[]> {
  const highs = await loadHighs();
  const ours = (problem: Problem): unknown => rankPlans(problem, 1);
  const theirs = (problem: Problem): unknown => leastByMilp(highs, problem);
  const problems = coursingProblems(PROBLEMS, SEED);
  const warm = coursingProblems(400, SEED + 1);
  timeOf(warm, ours);
  timeOf(warm, ours);
  timeOf(problems.slice(0, 5), theirs);
  let [ourTime, theirTime] = [0, 0];
  for (let i = 0; i < PROBLEMS; i += 10) {
    const some = problems.slice(i, i + 10);
    theirTime += timeOf(some, theirs);
    ourTime += timeOf(some, ours);
  }
  return [
    { name: 'coursing: a problem', value: ourTime / PROBLEMS, unit: 'ms', most: null },
    { name: 'coursing: a problem by HiGHS', value: theirTime / PROBLEMS, unit: 'ms', most: null },
    { name: 'coursing: times as fast as HiGHS', value: theirTime / ourTime, unit: '×', most: null, least: 50 },
  ];
}
