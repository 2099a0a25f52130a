/** Why a brace had to turn, and why a pole can't be braced: the obstacle, and what would free it. */
import type { Drawing } from '../drawing/schema';
import { boxAround } from '../geometry/box';
import type { Vec } from '../geometry/point';
import type { Reason } from '../reasons';
import type { ThingRef } from '../things';
import type { Walls } from '../walls/types';
import { idealsAt, WIDE_CANDIDATES, type Candidate, type CandidateOptions } from './candidates';
import { tryBrace } from './clearance';
import { culpritsOf, type Budget } from './culprits';
import { freedBy } from './freed';
import { Nearby } from './nearby';
import type { Ground } from './obstacles';
import { stepFrom } from './plane';
import { PoleBraces, type PoleSite } from './poleBraces';

/** What refuses a brace straight along one ideal bearing: an opening before a wall; null where nothing fixed does. */
function refusal(site: PoleSite, bearing: Vec, reach: number, ground: Ground): ThingRef | null {
  const foot = stepFrom(site.at, [bearing, reach]);
  const tried = tryBrace({ from: site.at, foot }, site.poleId, site.kit, ground, true);
  if (tried.free) return null;
  const opening = tried.refusedBy.find((obstacle) => obstacle.thing.kind === 'opening');
  return (opening ?? tried.refusedBy[0])?.thing ?? { kind: 'boundary', id: 'boundary' };
}

/**
 * What made a brace turn: the thing that stands where it would go straight, away from its wall; or, where only the walls
 * of its own corner do (in an angle they always do), what stands where it would go straight toward its wall.
 */
export function turnedFor(site: PoleSite, candidate: Candidate, which: 0 | 1, ground: Ground): ThingRef | null {
  if (candidate.turned === 0) return null;
  const own = new Set(site.seat.faces.map((face) => face.runId));
  const ideals = idealsAt(site.seat)[which];
  const away = ideals.find((each) => !each.alongFace);
  const refused = away ? refusal(site, away.bearing, candidate.reach, ground) : null;
  if (!candidate.alongFace || (refused && !(refused.kind === 'run' && own.has(refused.id)))) return refused;
  const toward = ideals.find((each) => each.alongFace);
  return toward ? refusal(site, toward.bearing, candidate.reach, ground) : null;
}

/** Counted work for the explanations of one site: enough for hundreds of blocked poles. */
export const EXPLAIN_WORK = 4_000_000;
/** Where the work has run out, causes are looked for among a few places only, and no change is sought. */
const ROUGH: CandidateOptions = { turnMost: 60, turnStep: 15, reaches: [66, 33, 100] };
/** What one "what if" costs of the work, about. */
const CHANGE_WORK = 60_000;
/** Work for one pole's causes then. */
const ROUGH_WORK = 5_000;
/** A reason names this many obstacles at most. */
const NAMED_MOST = 6;

/**
 * The reason of a pole that can't be braced: the smallest set of things that causes it, the walls of its own corner given
 * (and named where they alone do), and the least change found that frees it.
 */
export function whyBlocked(drawing: Drawing, walls: Walls, site: PoleSite, ground: Ground, budget: Budget): Reason {
  const thorough = budget.left > 0;
  const wide = new PoleBraces({ ...site, options: thorough ? WIDE_CANDIDATES : ROUGH }, ground);
  const nearby = new Nearby(site.at, site.poleId, site.kit, ground, wide.longestReach);
  const found = culpritsOf(wide, nearby, thorough ? budget : { left: ROUGH_WORK });
  const own: ThingRef[] = [...new Set(site.seat.faces.map((face) => face.runId))].map((id) => ({ kind: 'run', id }));
  const culprits = found?.things ?? [];
  let change = null;
  if (thorough) {
    budget.left -= CHANGE_WORK;
    const around = boxAround(site.at, wide.longestReach + site.kit.leg * 8 + site.kit.clearance);
    const near = ground.near(around).filter((obstacle) => obstacle.kind !== 'frame');
    change = freedBy({ drawing, walls, site, near, ground, culprits });
  }
  return {
    code: 'braceBlocked',
    weight: 'blocked',
    thing: { kind: 'pole', id: site.poleId },
    against: (culprits.length > 0 ? culprits : own).slice(0, NAMED_MOST),
    ...(change ? { change } : {}),
  };
}
