/** The ranking of a drawing's coursing, with what has to be left out where the whole can't be searched. */
import type { WallType } from '../drawing/schema';
import { mm, ticks, type Ticks } from '../length/ticks';
import type { Reason } from '../reasons';
import { MOST_COURSES, type Gathered } from './controls';
import type { Control, Problem, Stop, ThinCourse } from './problem';
import { rankOnce } from './rememberRanking';
import type { Ranking } from './rankPlans';
import type { Proof } from './types';

export interface Settled {
  readonly problem: Problem;
  readonly ranking: Ranking;
  readonly left: readonly Control[];
  readonly openTop: Ticks | null;
  readonly proof: Proof;
  readonly reasons: readonly Reason[];
}

const NOTHING: Ranking = { plans: [], complete: true, proved: false };

/**
 * Ranks the plans of the gathered stops. Where the search's bound on its work is reached before there is any plan, the
 * lighter half of the soft heights is left out, as often as it takes. Where no counts fit at all, or the wall would
 * take more than `MOST_COURSES`, courses of the nominal joint go up past every height.
 */
export function settle(type: WallType, start: Ticks, gathered: Gathered, most: number): Settled {
  const { openTop } = gathered;
  const thin = usableThin(type);
  const { stops } = gathered;
  let problem: Problem = { unit: type.unit.height, joint: usableJoint(type), start, stops, ...(thin ? { thin } : {}) };
  let left: readonly Control[] = gathered.left;
  const reasons: Reason[] = [];
  const tallest = Math.max(openTop ?? 0, problem.stops[problem.stops.length - 1]?.height ?? 0);
  const fits = (tallest - start) / (problem.unit + problem.joint.least) <= MOST_COURSES;
  let ranking = fits ? rankOnce(problem, most) : NOTHING;
  while (fits && ranking.plans.length === 0 && !ranking.complete) {
    const dropped = lighterHalf(problem.stops);
    if (dropped.size === 0) break;
    left = [...left, ...[...dropped].flatMap((stop) => stop.controls)];
    problem = { ...problem, stops: problem.stops.filter((stop) => !dropped.has(stop)) };
    ranking = rankOnce(problem, most);
  }
  if (ranking.plans.length > 0) {
    const dropped = left.length > gathered.left.length;
    if (dropped || !ranking.proved) reasons.push(BOUND_REACHED);
    const proof = dropped || gathered.tooMany ? 'held' : ranking.proved ? 'all' : 'heights';
    return { problem, ranking, left, openTop, proof, reasons };
  }
  left = [...left, ...problem.stops.flatMap((stop) => stop.controls)];
  problem = { ...problem, stops: [] };
  const reach = start + MOST_COURSES * (problem.unit + problem.joint.nominal);
  return {
    problem,
    ranking: rankOnce(problem, 1),
    left,
    openTop: ticks(Math.min(tallest, reach)),
    proof: 'none',
    reasons: [{ code: 'noCoursesFit', weight: 'blocked', thing: { kind: 'wallType', id: type.id } }],
  };
}

const BOUND_REACHED: Reason = { code: 'searchBoundReached', weight: 'note', thing: { kind: 'site', id: 'site' } };

/** The joint's limits, never further from its nominal than a unit is high: a joint beyond that is no joint. */
function usableJoint(type: WallType): Problem['joint'] {
  const { nominal, least, most } = type.bedJoint;
  const { height } = type.unit;
  return {
    nominal,
    least: ticks(Math.max(least, nominal - height)),
    most: ticks(Math.min(most, nominal + height)),
  };
}

/** Courses taller than this are never thinned: costs in parts stay whole numbers up to it (see `partsOf`). */
const TALLEST_THINNED = mm(5000);

/** What a thinner course may be: lower than a unit, and in no way where units or joints are past any that there are. */
function usableThin(type: WallType): ThinCourse | null {
  if (!type.thinCourse) return null;
  const { height } = type.unit;
  const most = ticks(Math.min(type.thinCourse.most, height - 1));
  if (most < type.thinCourse.least || height + usableJoint(type).most > TALLEST_THINNED) return null;
  return { least: type.thinCourse.least, most };
}

/** Half of the soft stops that are no beam's, the lightest first. */
function lighterHalf(stops: readonly Stop[]): Set<Stop> {
  const soft = stops.filter((stop) => stop.hold === 'soft' && stop.beamDepth === 0);
  soft.sort((a, b) => a.weight - b.weight || b.height - a.height);
  return new Set(soft.slice(0, Math.ceil(soft.length / 2)));
}
