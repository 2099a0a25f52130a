/** The least change that would let a blocked pole have its two braces: at a door, at the pole itself, or at its legs. */
import type { Door, Drawing } from '../drawing/schema';
import { negate } from '../geometry/vec';
import { TICKS_PER_INCH, TICKS_PER_MM, ticks } from '../length/ticks';
import type { Reason } from '../reasons';
import type { ThingRef } from '../things';
import type { Walls } from '../walls/types';
import { reachLimits, WIDE_CANDIDATES, type CandidateOptions } from './candidates';
import { groundOf, swingOf, type Ground, type Obstacle } from './obstacles';
import { PoleBraces, type PoleSite } from './poleBraces';
import { standAt, standsIn } from './section';

export type Change = NonNullable<Reason['change']>;

/** Coarse enough to ask "what if" again and again: a change found with these frees the pole, a finer one may be missed. */
const WHAT_IF: CandidateOptions = { turnMost: 90, turnStep: 5, reaches: [66, 50, 33, 85, 120] };
/** A pole is set off by whole steps, to this many leg lengths of its angle. */
const SET_OFF_STEP = { imperial: TICKS_PER_INCH, metric: 20 * TICKS_PER_MM };
const SET_OFF_LEGS = 8;
const SET_OFF_TRIES = 40;
/** Shorter reaches tried, in per cent of the fixing height, from the longest down. */
const SHORT_REACHES = [90, 80, 72, 66, 60, 55, 50, 45, 40, 36, 33];

export interface Blocked {
  readonly drawing: Drawing;
  readonly walls: Walls;
  readonly site: PoleSite;
  /** What stands near enough to matter, poles included. */
  readonly near: readonly Obstacle[];
  readonly ground: Ground;
  /** Things of which at least one has to give way. */
  readonly culprits: readonly ThingRef[];
}

function canBrace(site: PoleSite, obstacles: readonly Obstacle[], ground: Ground): boolean {
  return new PoleBraces(site, groundOf(obstacles, ground.boundary)).own() !== null;
}

function atDoor({ walls, site, near, ground }: Blocked, door: Door): Change | null {
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

function atOpenings(blocked: Blocked): Change | null {
  const { drawing, site, near, ground, culprits } = blocked;
  const named = new Set(culprits.filter((thing) => thing.kind === 'opening').map((thing) => thing.id));
  if (named.size === 0) return null;
  const openings = drawing.openings.filter((opening) => named.has(opening.id));
  const has = (kind: Obstacle['kind'], id: string) => near.some((each) => each.kind === kind && each.thing.id === id);
  for (const opening of openings) {
    const change = opening.kind === 'door' && has('swing', opening.id) ? atDoor(blocked, opening) : null;
    if (change) return change;
  }
  for (const { id } of openings) {
    if (!has('way', id)) continue;
    const others = near.filter((each) => each.kind !== 'way' || each.thing.id !== id);
    if (canBrace(site, others, ground)) return { kind: 'notUsedDuringWork', thing: { kind: 'opening', id } };
  }
  return null;
}

/** The least set-off along either wall line, past the corner, from which the pole can be braced and where it can stand. */
function setOff({ drawing, site, near, ground }: Blocked): Change | null {
  if (site.seat.shape !== 'wraps') return null;
  const most = SET_OFF_LEGS * site.kit.leg;
  const step = Math.max(SET_OFF_STEP[drawing.units], Math.ceil(most / SET_OFF_TRIES));
  const local = groundOf(
    near.filter((each) => each.thing.kind !== 'pole' || each.thing.id !== site.poleId),
    ground.boundary,
  );
  for (let by = step; by <= most; by += step)
    for (const face of site.seat.faces) {
      const away = negate(face.along);
      const { at, ring } = standAt(site.seat, site.kit, { x: away.x * by, y: away.y * by });
      if (standsIn(ring, local).length > 0) continue;
      if (canBrace({ ...site, at, options: WHAT_IF }, near, ground))
        return { kind: 'setOff', thing: { kind: 'pole', id: site.poleId }, by: ticks(by) };
    }
  return null;
}

/** The longest leg under the kit's least with which the pole can be braced. */
function shorterLeg({ site, near, ground }: Blocked): Change | null {
  const { fixing, leastLeg } = site.kit.brace;
  for (const part of SHORT_REACHES) {
    const leg = Math.ceil(Math.hypot(fixing, (fixing * part) / 100));
    if (leg >= leastLeg) continue;
    const kit = { ...site.kit, brace: { ...site.kit.brace, leastLeg: ticks(leg) } };
    const reach = reachLimits(kit);
    const options = { ...WHAT_IF, reaches: [part, ...WHAT_IF.reaches] };
    if (reach && canBrace({ ...site, kit, reach, options }, near, ground))
      return { kind: 'shorterLeg', thing: { kind: 'pole', id: site.poleId }, by: ticks(leastLeg - leg) };
  }
  return null;
}

/**
 * The least change found that frees a blocked pole, least first: a door's swing, a way not used during the work, the pole set
 * off, a shorter leg. Only an opening among the culprits is asked about: without one of them giving way nothing is freed.
 */
export function freedBy(blocked: Blocked): Change | null {
  const wide = { ...blocked, site: { ...blocked.site, options: WIDE_CANDIDATES } };
  return atOpenings(wide) ?? setOff(blocked) ?? shorterLeg(blocked);
}
