/** Why a brace had to turn, and why a pole can't be braced: the obstacle, and what would free it. */
import type { Door, Drawing } from '../drawing/schema';
import { boxAround } from '../geometry/box';
import type { PlanPoint, Vec } from '../geometry/point';
import { negate } from '../geometry/vec';
import { roundTicks, ticks } from '../length/ticks';
import type { Reason } from '../reasons';
import type { ThingRef } from '../things';
import type { Walls } from '../walls/types';
import { headingsAt, idealsAt, reachesWithin, reachLimits, type Candidate, type CandidateOptions } from './candidates';
import { tryBrace } from './clearance';
import { groundOf, swingOf, type Ground, type Obstacle } from './obstacles';
import { PoleBraces, type PoleSite } from './poleBraces';
import { stepFrom } from './plane';
import { standAt } from './section';

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

/** Coarse enough to ask "what if" for every obstacle near a pole. */
const WHAT_IF: CandidateOptions = { turnMost: 60, turnStep: 5, reaches: [66, 50, 100] };
const SHORT_REACHES = [60, 50, 40, 33];
/** Trial distances for setting a pole off, in leg lengths of its angle. */
const SET_OFF_LEGS = [1, 2, 4, 6, 8];
/** A reason names this many obstacles at most. */
const NAMED_MOST = 6;

function feetOf(site: PoleSite): PlanPoint[] {
  const reaches = reachesWithin(site.kit, site.reach, site.options);
  return headingsAt(idealsAt(site.seat), site.seat, site.options)
    .flat()
    .flatMap(({ direction }) => reaches.map(({ reach }) => stepFrom(site.at, [direction, reach])));
}

type Change = NonNullable<Reason['change']>;

function canBrace(site: PoleSite, obstacles: readonly Obstacle[], ground: Ground): boolean {
  const local = groundOf(obstacles, ground.boundary);
  return new PoleBraces(site, local).own() !== null;
}

function doorChange(
  site: PoleSite,
  door: Door,
  near: readonly Obstacle[],
  walls: Walls,
  ground: Ground,
): Change | null {
  const run = walls.runById.get(door.runId);
  if (!run) return null;
  const thing: ThingRef = { kind: 'opening', id: door.id };
  const others = near.filter((obstacle) => obstacle.kind !== 'swing' || obstacle.thing.id !== door.id);
  const flipped = { ...door.swing, opens: door.swing.opens === 'in' ? ('out' as const) : ('in' as const) };
  const swapped = { ...door.swing, hinge: door.swing.hinge === 'near' ? ('far' as const) : ('near' as const) };
  for (const [kind, swing] of [
    ['openOtherWay', flipped],
    ['swapHinge', swapped],
  ] as const) {
    const changed = swingOf(run, { ...door, swing });
    if (canBrace(site, changed ? [...others, changed] : others, ground)) return { kind, thing };
  }
  return null;
}

function freedBy(
  drawing: Drawing,
  walls: Walls,
  site: PoleSite,
  near: readonly Obstacle[],
  ground: Ground,
): Change | null {
  const openings = new Map(drawing.openings.map((opening) => [opening.id, opening]));
  for (const obstacle of near) {
    const opening = openings.get(obstacle.thing.id);
    if (obstacle.kind !== 'swing' || opening?.kind !== 'door') continue;
    const change = doorChange(site, opening, near, walls, ground);
    if (change) return change;
  }
  for (const obstacle of near)
    if (
      obstacle.kind === 'way' &&
      canBrace(
        site,
        near.filter((other) => other !== obstacle),
        ground,
      )
    )
      return { kind: 'notUsedDuringWork', thing: obstacle.thing };
  const pole: ThingRef = { kind: 'pole', id: site.poleId };
  for (const legs of site.seat.shape === 'wraps' ? SET_OFF_LEGS : [])
    for (const face of site.seat.faces) {
      const by = legs * site.kit.leg;
      const shift = { x: negate(face.along).x * by, y: negate(face.along).y * by };
      const at = standAt(site.seat, site.kit, shift).at;
      if (canBrace({ ...site, at }, near, ground)) return { kind: 'setOff', thing: pole, by: ticks(by) };
    }
  for (const part of SHORT_REACHES) {
    const leg = Math.floor(Math.hypot(site.kit.brace.fixing, (site.kit.brace.fixing * part) / 100));
    if (leg >= site.kit.brace.leastLeg) continue;
    const kit = { ...site.kit, brace: { ...site.kit.brace, leastLeg: ticks(leg) } };
    const reach = reachLimits(kit);
    const options = { ...WHAT_IF, reaches: [part] };
    if (reach && canBrace({ ...site, kit, reach, options }, near, ground))
      return { kind: 'shorterLeg', thing: pole, by: roundTicks(site.kit.brace.leastLeg - leg) };
  }
  return null;
}

/**
 * The reason of a pole that can't be braced: the obstacles that alone would free it if they were gone, or else those that
 * refuse most candidates, and the first change found that frees it.
 */
export function whyBlocked(drawing: Drawing, walls: Walls, site: PoleSite, ground: Ground): Reason {
  const coarse: PoleSite = { ...site, options: WHAT_IF };
  const around = boxAround(site.at, site.reach.most + site.kit.leg * 8);
  const near = ground.near(around).filter((obstacle) => obstacle.kind !== 'frame');
  const counts = new Map<string, { thing: ThingRef; count: number }>();
  const note = (thing: ThingRef) => {
    const key = `${thing.kind} ${thing.id}`;
    counts.set(key, { thing, count: (counts.get(key)?.count ?? 0) + 1 });
  };
  for (const foot of feetOf(coarse)) {
    const tried = tryBrace({ from: site.at, foot }, site.poleId, site.kit, ground, true);
    if (tried.free) continue;
    for (const obstacle of tried.refusedBy) note(obstacle.thing);
    if (tried.boundary) note({ kind: 'boundary', id: 'boundary' });
  }
  const ranked = [...counts.values()].sort((a, b) => b.count - a.count).map((each) => each.thing);
  const own = new Set(site.seat.faces.map((face) => face.runId));
  const alone = ranked.filter((thing) => {
    if (thing.kind === 'run' && own.has(thing.id)) return false;
    if (thing.kind === 'boundary') return canBrace(coarse, near, { ...ground, boundary: null });
    return canBrace(
      coarse,
      near.filter((o) => o.thing.id !== thing.id || o.thing.kind !== thing.kind),
      ground,
    );
  });
  const strangers = ranked.filter((thing) => thing.kind !== 'run' || !own.has(thing.id));
  const against = (alone.length > 0 ? alone : strangers.length > 0 ? strangers : ranked).slice(0, NAMED_MOST);
  const change = freedBy(drawing, walls, coarse, near, ground);
  return {
    code: 'braceBlocked',
    weight: 'blocked',
    thing: { kind: 'pole', id: site.poleId },
    against,
    ...(change ? { change } : {}),
  };
}
