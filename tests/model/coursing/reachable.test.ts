/** The nearest heights that can be met, against asking the search for every height in turn. */
import { describe, expect, it } from 'vitest';
import { nearestReachable } from '../../../model/coursing/reachable';
import type { Problem, Stop } from '../../../model/coursing/problem';
import { rankPlans } from '../../../model/coursing/rankPlans';
import { ticks } from '../../../model/length/ticks';
import { coursingProblems } from '../../helpers/coursingProblems';

/** Whether courses can meet one height while every other hard height stays where the plan has it. */
function canMeet(problem: Problem, heights: readonly number[], index: number, height: number): boolean {
  const stops = problem.stops.flatMap((stop, i): Stop[] => {
    if (i === index) return [{ ...stop, hold: 'hard', height: ticks(height) }];
    if (stop.hold === 'hard') return [{ ...stop, height: ticks(heights[i]!) }];
    // Other soft heights give way, but a soft beam's lift must still hold a course.
    return stop.beamDepth > 0 ? [{ ...stop, weight: 1 }] : [];
  });
  return rankPlans({ ...problem, stops }, 1).plans[0]?.cost.hard === 0;
}

/** Whole courses; heights a tenth as fine, so that every one can be tried. */
const problems = coursingProblems(120, 31)
  .filter((problem) => !problem.thin)
  .map((problem): Problem => {
    const tenth = (value: number) => ticks(Math.round(value / 40));
    const { unit, joint } = problem;
    const stops = problem.stops.map((stop) => ({
      ...stop,
      height: tenth(stop.height),
      beamDepth: tenth(stop.beamDepth),
    }));
    return {
      unit: tenth(unit),
      joint: { least: tenth(joint.least), nominal: tenth(joint.nominal), most: tenth(joint.most) },
      start: tenth(problem.start),
      stops: stops.filter((stop, i) => i === 0 || stop.height > stops[i - 1]!.height + stops[i - 1]!.beamDepth),
    };
  })
  .filter(({ joint, start, stops }) => joint.least <= joint.nominal && stops.every((stop) => stop.height >= start));

describe('the nearest heights that courses can meet', () => {
  it('are the very nearest, by trying every height between', () => {
    let tried = 0;
    for (const problem of problems) {
      const [plan] = rankPlans(problem, 1).plans;
      problem.stops.forEach((stop, index) => {
        if (!plan || plan.heights[index] === stop.height || stop.beamDepth > 0) return;
        // A height that the neighbours' beams or hard heights reach past is another question.
        const { below, above } = nearestReachable(problem, plan, index);
        for (const [found, way] of [
          [below, -1],
          [above, 1],
        ] as const) {
          if (found === null) continue;
          for (let height: number = stop.height; height !== found; height += way) {
            if (isBetween(problem, index, height))
              expect([height, canMeet(problem, plan.heights, index, height)]).toEqual([height, false]);
          }
          if (isBetween(problem, index, found)) {
            expect([found, canMeet(problem, plan.heights, index, found)]).toEqual([found, true]);
            tried++;
          }
        }
      });
    }
    expect(tried).toBeGreaterThan(40);
  });
});

/** Whether a height lies where the stop can be moved without passing its neighbours. */
function isBetween(problem: Problem, index: number, height: number): boolean {
  const below = problem.stops[index - 1];
  const above = problem.stops[index + 1];
  return height >= (below ? below.height + below.beamDepth : problem.start) && (!above || height <= above.height);
}
