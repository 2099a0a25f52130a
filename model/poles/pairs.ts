/** The pairs of braces that one pole may have, found in order of their cost. */
import type { PoleKit } from '../drawing/schema';
import type { PlanPoint } from '../geometry/point';
import type { ThingRef } from '../things';
import {
  candidatesAt,
  OVER_WAY,
  straightAt,
  type Candidate,
  type CandidateOptions,
  type ReachLimits,
} from './candidates';
import { tryBrace } from './clearance';
import type { Ground } from './obstacles';
import { degreesBetween } from './plane';
import type { Seat } from './seats';

export interface Pair {
  readonly cost: number;
  readonly braces: readonly [Candidate, Candidate];
}

export interface AngleLimits {
  /** Least and most angle between the two braces in plan, in degrees. */
  readonly least: number;
  readonly most: number;
}

/** A right angle is best; the square of the degrees away from it counts. */
const BEST_ANGLE = 90;
/** Angles come from whole degrees of turn: what floating point adds must not refuse one on the limit. */
const ANGLE_SLACK = 1e-6;

function angleCost(a: Candidate, b: Candidate, limits: AngleLimits): number | null {
  const angle = degreesBetween(a.direction, b.direction);
  if (angle < limits.least - ANGLE_SLACK || angle > limits.most + ANGLE_SLACK) return null;
  const off = Math.round(angle) - BEST_ANGLE;
  return off * off;
}

export type CandidateLists = readonly [readonly Candidate[], readonly Candidate[]];

/** The two braces of one pole: candidates listed, and tried against the ground, when first asked for. */
export interface PoleBraces {
  readonly poleId: string;
  readonly at: PlanPoint;
  /** Straight in line with each wall at the best reach: the least that any pair can cost before its angle. */
  readonly straight: readonly [Candidate, Candidate] | null;
  readonly lists: () => CandidateLists;
  /** Ways that a candidate passes over; null where it can't stand. */
  readonly over: (candidate: Candidate) => readonly ThingRef[] | null;
  readonly limits: AngleLimits;
}

export interface PoleSite {
  readonly poleId: string;
  readonly seat: Seat;
  readonly at: PlanPoint;
  readonly kit: PoleKit;
  readonly reach: ReachLimits;
  readonly limits: AngleLimits;
  readonly options: CandidateOptions;
}

export function poleBraces(site: PoleSite, ground: Ground): PoleBraces {
  const { poleId, seat, at, kit, reach, limits, options } = site;
  let listed: CandidateLists | null = null;
  const lists = () => (listed ??= candidatesAt(seat, at, kit, reach, options));
  const known = new Map<Candidate, readonly ThingRef[] | null>();
  const over = (candidate: Candidate) => {
    const found = known.get(candidate);
    if (found !== undefined) return found;
    const tried = tryBrace({ from: at, foot: candidate.foot }, poleId, kit, ground);
    const answer = tried.free ? tried.over : null;
    known.set(candidate, answer);
    return answer;
  };
  return { poleId, at, straight: straightAt(seat, at, kit, reach, options), lists, over, limits };
}

function fullCost(braces: PoleBraces, candidate: Candidate): number | null {
  const over = braces.over(candidate);
  return over === null ? null : candidate.cost + OVER_WAY * over.length;
}

/** Both braces straight and square to one another, where nothing is in their way: no pair can cost less. */
function straightPair(braces: PoleBraces): Pair | null {
  if (!braces.straight) return null;
  const [a, b] = braces.straight;
  if (angleCost(a, b, braces.limits) !== 0) return null;
  const free = [a, b].every((candidate) => braces.over(candidate)?.length === 0);
  return free ? { cost: a.cost + b.cost, braces: [a, b] } : null;
}

/**
 * The cheapest pair, or null. Both lists are in order of cost and no pair costs less than its two candidates, so the
 * search ends as soon as they alone reach the best found. Most poles end at the very first pair.
 */
export function cheapestPair(braces: PoleBraces): Pair | null {
  const quick = straightPair(braces);
  if (quick) return quick;
  const [first, second] = braces.lists();
  const leastSecond = second[0]?.cost ?? Infinity;
  let best: Pair | null = null;
  for (const a of first) {
    if (best && a.cost + leastSecond >= best.cost) break;
    const costA = fullCost(braces, a);
    if (costA === null) continue;
    if (!best && !second.some((b) => braces.over(b) !== null)) return null;
    for (const b of second) {
      if (best && costA + b.cost >= best.cost) break;
      const angle = angleCost(a, b, braces.limits);
      if (angle === null || (best && costA + b.cost + angle >= best.cost)) continue;
      const costB = fullCost(braces, b);
      if (costB === null) continue;
      const cost = costA + costB + angle;
      if (!best || cost < best.cost) best = { cost, braces: [a, b] };
    }
  }
  return best;
}

/** A candidate and the pair that it makes. */
export interface Ranked {
  readonly candidate: Candidate;
  readonly pair: Pair;
}

/** Every pair that `first` makes with a candidate for brace `which`, of those that cost no more than `most`, cheapest first. */
export function pairsWith(braces: PoleBraces, first: Candidate, which: 0 | 1, most: number): readonly Ranked[] {
  const costFirst = fullCost(braces, first);
  if (costFirst === null) return [];
  const found: Ranked[] = [];
  for (const candidate of braces.lists()[which]) {
    if (costFirst + candidate.cost > most) break;
    const angle = angleCost(first, candidate, braces.limits);
    if (angle === null || costFirst + candidate.cost + angle > most) continue;
    const costSecond = fullCost(braces, candidate);
    if (costSecond === null || costFirst + costSecond + angle > most) continue;
    const pair: Pair = {
      cost: costFirst + costSecond + angle,
      braces: which === 0 ? [candidate, first] : [first, candidate],
    };
    found.push({ candidate, pair });
  }
  return found.sort((a, b) => a.pair.cost - b.pair.cost);
}

/** The cheapest pair with one brace given, within `most`; null where it can't stand or finds no partner. */
export function bestWith(braces: PoleBraces, given: Candidate, which: 0 | 1, most: number): Pair | null {
  const costGiven = fullCost(braces, given);
  if (costGiven === null) return null;
  let best: Pair | null = null;
  for (const other of braces.lists()[which === 0 ? 1 : 0]) {
    if (costGiven + other.cost > most || (best && costGiven + other.cost >= best.cost)) break;
    const angle = angleCost(given, other, braces.limits);
    if (angle === null || (best && costGiven + other.cost + angle >= best.cost)) continue;
    const costOther = fullCost(braces, other);
    if (costOther === null) continue;
    const cost = costGiven + costOther + angle;
    if (cost > most || (best && cost >= best.cost)) continue;
    best = { cost, braces: which === 0 ? [given, other] : [other, given] };
  }
  return best;
}
