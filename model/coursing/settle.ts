/** The ranking of a drawing's coursing, with what has to be left out where the whole can't be searched. */
import type { WallType } from '../drawing/schema';
import { ticks, type Ticks } from '../length/ticks';
import type { Reason } from '../reasons';
import { MOST_COURSES, type Gathered } from './controls';
import type { Control, Problem, Stop } from './problem';
import { rankOnce } from './rememberRanking';
import type { Ranking } from './rankPlans';

export interface Settled {
  readonly problem: Problem;
  readonly ranking: Ranking;
  readonly left: readonly Control[];
  readonly openTop: Ticks | null;
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
  let problem: Problem = { unit: type.unit.height, joint: usableJoint(type), start, stops: gathered.stops };
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
    if (left.length > gathered.left.length || !ranking.proved) reasons.push(BOUND_REACHED);
    return { problem, ranking, left, openTop, reasons };
  }
  left = [...left, ...problem.stops.flatMap((stop) => stop.controls)];
  problem = { ...problem, stops: [] };
  const reach = start + MOST_COURSES * (problem.unit + problem.joint.nominal);
  return {
    problem,
    ranking: rankOnce(problem, 1),
    left,
    openTop: ticks(Math.min(tallest, reach)),
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

/** Half of the soft stops that are no beam's, the lightest first. */
function lighterHalf(stops: readonly Stop[]): Set<Stop> {
  const soft = stops.filter((stop) => stop.hold === 'soft' && stop.beamDepth === 0);
  soft.sort((a, b) => a.weight - b.weight || b.height - a.height);
  return new Set(soft.slice(0, Math.ceil(soft.length / 2)));
}
