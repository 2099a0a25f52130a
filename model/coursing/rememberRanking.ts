/** Rankings remembered by their problem: most edits of a drawing move nothing that the courses depend on. */
import type { Problem } from './problem';
import { rankPlans, type Ranking } from './rankPlans';

/** As many problems as an edit goes back and forth between. */
const MOST_REMEMBERED = 16;

const remembered = new Map<string, Ranking>();

/** `rankPlans`, worked out once for equal problems; the same result in every way. */
export function rankOnce(problem: Problem, most: number): Ranking {
  const { unit, joint, start, stops, thin } = problem;
  const key = JSON.stringify([
    most,
    unit,
    [joint.least, joint.nominal, joint.most],
    start,
    thin ? [thin.least, thin.most] : null,
    stops.map((stop) => [stop.height, stop.hold, stop.tolerance, stop.weight, stop.beamDepth]),
  ]);
  const known = remembered.get(key);
  const ranking = known ?? rankPlans(problem, most);
  // Put last, so that the one not asked for longest is the first to go.
  remembered.delete(key);
  remembered.set(key, ranking);
  if (remembered.size > MOST_REMEMBERED) {
    for (const oldest of remembered.keys()) {
      remembered.delete(oldest);
      break;
    }
  }
  return ranking;
}
