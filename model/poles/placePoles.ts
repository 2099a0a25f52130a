/** Story poles and their braces, placed clear of everything on the site. */
import type { Drawing } from '../drawing/schema';
import type { PlanPoint } from '../geometry/point';
import { bearing, length } from '../geometry/vec';
import { roundTicks } from '../length/ticks';
import type { Reason } from '../reasons';
import { ruleValue } from '../rules/registry';
import type { ThingRef } from '../things';
import type { Walls } from '../walls/types';
import {
  legShortBy,
  reachLimits,
  USUAL_CANDIDATES,
  WIDE_CANDIDATES,
  type Candidate,
  type CandidateOptions,
} from './candidates';
import { bracesConflict, type BraceLine } from './clearance';
import type { Budget } from './culprits';
import { EXPLAIN_WORK, turnedFor, whyBlocked } from './explain';
import { groundOf, obstacleOf, obstaclesOf, type Ground } from './obstacles';
import { PoleBraces, type AngleLimits, type PoleSite } from './poleBraces';
import { USUAL_BOUND, type SearchBound } from './group';
import { rivalsOf } from './rivals';
import { placeBraces, type Placed } from './search';
import { nearJambs, standClear, takenOf, type Standing } from './section';
import { seatsAlongRuns, seatsAtCorners, type Seat } from './seats';
import { cornersAround, tiesOf } from './ties';
import type { Brace, PoleSet, StoryPole } from './types';

export interface PoleOptions {
  readonly candidates: CandidateOptions;
  /** Tried for a pole to which the usual candidates give no two braces that keep the angle rule. */
  readonly wide: CandidateOptions;
  readonly bound: SearchBound;
}

const USUAL: PoleOptions = { candidates: USUAL_CANDIDATES, wide: WIDE_CANDIDATES, bound: USUAL_BOUND };

/** Where no pair keeps the angle rule, one within these degrees still stands, with a warning. */
const LOOSE_ANGLES: AngleLimits = { least: 30, most: 150 };

const poleRef = (id: string): ThingRef => ({ kind: 'pole', id });

interface Stood {
  readonly seat: Seat;
  readonly standing: Standing;
}

function standAll(drawing: Drawing, walls: Walls, ground: Ground, reasons: Reason[]): Stood[] {
  const corners = seatsAtCorners(walls);
  const along = seatsAlongRuns(drawing, walls, corners, ruleValue(drawing, 'lineMost'));
  for (const { runId, over, openingIds } of along.crowded)
    reasons.push({
      code: 'poleBlockedByFrame',
      weight: 'warning',
      thing: { kind: 'run', id: runId },
      against: openingIds.map((id) => ({ kind: 'opening', id })),
      rule: 'lineMost',
      amount: over,
    });
  const taken = takenOf(drawing, walls.openingsByRun);
  return [...corners, ...along.seats].map((seat) => {
    const standing = standClear(drawing, seat, nearJambs(seat, walls.runById, taken), ground);
    for (const { opening, short } of standing.frames)
      reasons.push({
        code: 'poleBlockedByFrame',
        weight: 'blocked',
        thing: poleRef(seat.id),
        against: [opening],
        amount: short,
        change: { kind: 'move', thing: opening, by: short },
      });
    const named = new Set(standing.frames.map(({ opening }) => opening.id));
    const against = standing.blockedBy.filter((thing) => !named.has(thing.id));
    if (against.length > 0) reasons.push({ code: 'poleBlocked', weight: 'blocked', thing: poleRef(seat.id), against });
    return { seat, standing };
  });
}

function braceOf(
  site: PoleSite,
  candidate: Candidate,
  which: 0 | 1,
  ground: Ground,
  cornerIds: readonly string[],
  walls: Walls,
): Brace {
  const { fixing } = site.kit.brace;
  const from = site.at;
  const away = { x: candidate.foot.x - from.x, y: candidate.foot.y - from.y };
  // Measured to the foot as it was rounded, as a tape would.
  const reach = length(away);
  return {
    id: `${site.poleId}.${which + 1}`,
    poleId: site.poleId,
    foot: candidate.foot,
    bearing: bearing(away),
    reach: roundTicks(reach),
    fixing,
    leg: roundTicks(Math.hypot(fixing, reach)),
    slope: (Math.atan2(fixing, reach) * 180) / Math.PI,
    inLineWith: candidate.runId,
    turned: candidate.turned,
    turnedFor: turnedFor(site, candidate, which, ground),
    over: candidate.over,
    ties: tiesOf(candidate.foot, cornerIds, walls, ground),
  };
}

/** The cheapest single brace of a pole that can't have two, clear of the braces placed. */
function lonelyBrace(pole: PoleBraces, placed: readonly BraceLine[], clearance: number): [Candidate, 0 | 1] | null {
  let best: [Candidate, 0 | 1] | null = null;
  ([0, 1] as const).forEach((which) => {
    const found = pole.upTo(which, Infinity).find((candidate) => {
      const line = { from: pole.at, foot: candidate.foot };
      return !placed.some((other) => bracesConflict(line, other, clearance));
    });
    if (found && (!best || found.cost < best[0].cost)) best = [found, which];
  });
  return best;
}

interface Search {
  readonly sites: readonly PoleSite[];
  readonly poles: readonly PoleBraces[];
  readonly placed: Placed;
}

/** A pole's braces among the usual candidates, or the wide ones where those hold no pair, or at a looser angle. */
function bracesAt(site: PoleSite, ground: Ground, wide: CandidateOptions): PoleBraces {
  const usual = new PoleBraces(site, ground);
  if (usual.own()) return usual;
  const wider = new PoleBraces({ ...site, options: wide }, ground);
  if (wider.own()) return wider;
  const loose = new PoleBraces({ ...site, limits: LOOSE_ANGLES }, ground);
  return loose.own() ? loose : usual;
}

/** Sites in an order that the drawing's lists don't change, each with the angle limits that it can keep. */
function searchAll(
  drawing: Drawing,
  walls: Walls,
  stood: readonly Stood[],
  ground: Ground,
  options: PoleOptions,
  budget: Budget,
  reasons: Reason[],
): Search | null {
  const kit = drawing.poleKit;
  const reach = reachLimits(kit);
  if (!reach) {
    const thing: ThingRef = { kind: 'site', id: 'site' };
    const by = legShortBy(kit);
    reasons.push({
      code: 'braceTooLong',
      weight: 'blocked',
      thing,
      amount: by,
      change: { kind: 'longerLeg', thing, by },
    });
    return null;
  }
  const limits = { least: ruleValue(drawing, 'braceAngleLeast'), most: ruleValue(drawing, 'braceAngleMost') };
  const sites: PoleSite[] = [];
  const poles = [...stood]
    .sort((a, b) => (a.seat.id < b.seat.id ? -1 : 1))
    .map(({ seat, standing }) => {
      const site = { poleId: seat.id, seat, at: standing.at, kit, reach, limits, options: options.candidates };
      const braces = bracesAt(site, ground, options.wide);
      sites.push(braces.site);
      if (braces.site.limits === LOOSE_ANGLES) {
        const why = whyBlocked(drawing, walls, { ...braces.site, limits }, ground, budget);
        reasons.push({ ...why, code: 'braceAngleOut', weight: 'warning', rule: 'braceAngleLeast' });
      }
      return braces;
    });
  const placed = placeBraces(poles, kit.clearance, options.bound);
  const left = leftOut(poles, placed);
  if (left.size === 0 || placed.bounded.length > 0) return { sites, poles, placed };
  // What the others' braces leave no usual place for may have a steeper or wider one.
  const widened = poles.map((pole, i) =>
    left.has(i) ? new PoleBraces({ ...pole.site, options: options.wide }, ground) : pole,
  );
  const again = placeBraces(widened, kit.clearance, options.bound);
  if (leftOut(widened, again).size >= left.size) return { sites, poles, placed };
  return { sites: widened.map((pole) => pole.site), poles: widened, placed: again };
}

/** Poles that could be braced were it not for the others. */
function leftOut(poles: readonly PoleBraces[], placed: Placed): ReadonlySet<number> {
  return new Set(poles.flatMap((pole, i) => (pole.own() && !placed.pairs[i] ? [i] : [])));
}

function linesPlaced(search: Search): BraceLine[] {
  return search.placed.pairs.flatMap((pair, i) => {
    const pole = search.poles[i];
    return pair && pole ? pair.braces.map((brace) => ({ from: pole.at, foot: brace.foot })) : [];
  });
}

function bracesByPole(
  drawing: Drawing,
  walls: Walls,
  search: Search,
  ground: Ground,
  budget: Budget,
  reasons: Reason[],
): Map<string, readonly Brace[]> {
  const placedLines: BraceLine[] = search.placed.pairs.includes(null) ? linesPlaced(search) : [];
  const found = new Map<string, readonly Brace[]>();
  search.sites.forEach((site, i) => {
    const pole = search.poles[i];
    const pair = search.placed.pairs[i];
    if (!pole) return;
    const cornerIds = cornersAround(
      site.seat.faces.map((face) => face.runId),
      walls,
    );
    const make = (candidate: Candidate, which: 0 | 1) => braceOf(site, candidate, which, ground, cornerIds, walls);
    if (pair) {
      found.set(site.poleId, [make(pair.braces[0], 0), make(pair.braces[1], 1)]);
      return;
    }
    const group = search.placed.groups.find((members) => members.includes(i)) ?? [];
    if (pole.own()) {
      const rivals = rivalsOf(i, group, search.poles, site.kit.clearance);
      const against = rivals.flatMap((j) => search.sites[j]?.poleId ?? []).map(poleRef);
      reasons.push({ code: 'braceBlocked', weight: 'blocked', thing: poleRef(site.poleId), against });
    } else reasons.push(whyBlocked(drawing, walls, site, ground, budget));
    const single = lonelyBrace(pole, placedLines, site.kit.clearance);
    if (!single) return;
    placedLines.push({ from: pole.at, foot: single[0].foot });
    found.set(site.poleId, [make(single[0], single[1])]);
  });
  return found;
}

function storyPole({ seat, standing }: Stood, corner: PlanPoint, braces: readonly Brace[]): StoryPole {
  return {
    id: seat.id,
    letter: seat.letter,
    cornerId: seat.cornerId,
    corner,
    at: standing.at,
    section: standing.ring,
    setOff: standing.setOff,
    runIds: [...new Set(seat.faces.map((face) => face.runId))],
    braces,
  };
}

/**
 * Places a pole at every corner and free end where lines start and along lines longer than the rule allows, and two braces
 * to each, at the least total cost over whole degrees of bearing and the usual reaches. What can't be placed has a reason
 * that names the obstacle. `options` changes the candidates and the search's bound, for trials.
 */
export function placePoles(drawing: Drawing, walls: Walls, options: PoleOptions = USUAL): PoleSet {
  const reasons: Reason[] = [];
  const fixed = obstaclesOf(drawing, walls);
  const stood = standAll(drawing, walls, groundOf(fixed, drawing.boundary), reasons);
  const poleObstacles = stood.map(({ seat, standing }) => obstacleOf('pole', poleRef(seat.id), standing.ring));
  const ground = groundOf([...fixed, ...poleObstacles], drawing.boundary);
  const budget = { left: EXPLAIN_WORK };
  const search = searchAll(drawing, walls, stood, ground, options, budget, reasons);
  const braces = search
    ? bracesByPole(drawing, walls, search, ground, budget, reasons)
    : new Map<string, readonly Brace[]>();
  const poles = stood.map((each) => storyPole(each, each.seat.vertex, braces.get(each.seat.id) ?? []));
  const idsOf = (group: readonly number[]) => group.flatMap((i) => search?.sites[i]?.poleId ?? []);
  for (const group of search?.placed.bounded ?? []) {
    const [first, ...others] = idsOf(group).map(poleRef);
    if (first) reasons.push({ code: 'searchBoundReached', weight: 'note', thing: first, against: others });
  }
  return {
    poles,
    poleById: new Map(poles.map((pole) => [pole.id, pole])),
    cost: search ? search.placed.pairs.reduce((sum, pair) => sum + (pair?.cost ?? 0), 0) : 0,
    neighbourhoods: search ? search.placed.groups.map(idsOf) : poles.map((pole) => [pole.id]),
    gap: search?.placed.gap ?? 0,
    exact: (search?.placed.bounded.length ?? 0) === 0,
    reasons,
  };
}
