/** The best pair of odd and even courses for one stretch, by an exact comparison over the candidates. */
import { EMPTY_FILL, spanLength, type BondLimits, type CourseFill, type Span } from './courseFill';
import { candidateFills, forcedFill, MOST_CLOSERS } from './candidates';
import { gridFills } from './gridFill';
import { countOverlaps, lapsBetween } from './laps';
import type { Parity } from './ends';

/** The course under a stretch: its joints and closers along the face. */
export interface Below {
  readonly joints: readonly number[];
  readonly closers: readonly number[];
}

export interface StretchTask {
  readonly spans: readonly [Span, Span];
  /** The parity of its lowest course. */
  readonly first: Parity;
  /** Whether courses of both parities are laid, or the lowest only. */
  readonly both: boolean;
  readonly below: Below | null;
  /** The bond of the whole wall, where this stretch is a part of it: the courses over it will be laid so. */
  readonly whole: WholeBond | null;
}

export interface WholeBond {
  readonly pair: FillPair;
  /** Which ends of the stretch are the wall's own. */
  readonly atStart: boolean;
  readonly atEnd: boolean;
}

export type FillPair = readonly [CourseFill, CourseFill];

/** Rule breaks; cuts; closers beside corners and jambs; lap under the wanted; joints off nominal; closers off the middle. */
type Cost = readonly [number, number, number, number, number, number];

function isLess(a: Cost, b: Cost): boolean {
  for (let i = 0; i < a.length; i += 1) if (a[i]! !== b[i]!) return a[i]! < b[i]!;
  return false;
}

interface Rated {
  readonly fill: CourseFill;
  /** Rules it breaks by itself and over the course below. */
  readonly breaks: number;
  readonly lap: number;
}

/** Laps are compared in steps of this part of a unit, so that a hair of lap does not outweigh an even joint. */
const LAP_STEPS = 32;

/** The courses that a candidate has to lap besides the other of its pair. */
function neighboursOf(task: StretchTask, parity: Parity): Below[] {
  const neighbours: Below[] = [];
  if (task.below && parity === task.first) neighbours.push(task.below);
  if (task.whole) {
    const { joints, innerClosers } = task.whole.pair[parity === 0 ? 1 : 0];
    neighbours.push({ joints, closers: innerClosers });
  }
  return neighbours;
}

function rate(fill: CourseFill, neighbours: readonly Below[], limits: BondLimits): Rated {
  let breaks = fill.faults;
  let lap = Infinity;
  for (const { joints, closers } of neighbours) {
    const laps = lapsBetween(fill.joints, joints, limits.leastLap, Infinity);
    breaks += laps.breaks + countOverlaps(fill.innerClosers, closers);
    lap = Math.min(lap, laps.least);
  }
  return { fill, breaks, lap };
}

function lapShort(lap: number, limits: BondLimits): number {
  const step = limits.unit / LAP_STEPS;
  return Math.ceil(Math.max(0, limits.wantedLap - Math.max(lap, 0)) / step);
}

type Candidates = (parity: Parity, closers: number) => readonly Rated[];

/** Rates every candidate of one parity with so many closers; kept so that each is laid once. */
function candidatesOf(task: StretchTask, limits: BondLimits, thorough: boolean): Candidates {
  const kept = new Map<number, readonly Rated[]>();
  return (parity, closers) => {
    const key = parity * 10 + closers;
    const found = kept.get(key);
    if (found) return found;
    const span = task.spans[parity];
    const other = task.spans[1 - parity]!;
    const lead = (s: Span) => s.from.at + (s.from.joint ? limits.joint.nominal : 0);
    const neighbours = neighboursOf(task, parity);
    const fills: CourseFill[] = [];
    if (task.whole) {
      const { pair, atStart, atEnd } = task.whole;
      const grid = gridFills(span, pair[parity].pieces, atStart, atEnd, limits);
      fills.push(...grid.filter((fill) => fill.cuts === closers));
    }
    fills.push(...candidateFills(span, closers, lead(other) - lead(span), limits, thorough));
    const rated = fills
      .map((fill) => rate(fill, neighbours, limits))
      .sort(
        (a, b) => a.breaks - b.breaks || a.fill.endClosers - b.fill.endClosers || a.fill.jointOff - b.fill.jointOff,
      );
    kept.set(key, rated);
    return rated;
  };
}

/** A course that keeps the wall's bond has that bond's closers and up to two at each jamb. */
function mostInCourse(task: StretchTask): number {
  return task.whole ? MOST_CLOSERS + 4 : MOST_CLOSERS;
}

/** The lowest course alone, where the stretch has only one. */
function fillOne(task: StretchTask, limits: BondLimits): CourseFill | null {
  const candidates = candidatesOf(task, limits, true);
  let best: { cost: Cost; fill: CourseFill } | null = null;
  for (let cuts = 0; cuts <= mostInCourse(task); cuts += 1) {
    for (const { fill, breaks, lap } of candidates(task.first, cuts)) {
      const cost: Cost = [breaks, cuts, fill.endClosers, lapShort(lap, limits), fill.jointOff, -fill.clear];
      if (!best || isLess(cost, best.cost)) best = { cost, fill };
    }
    if (best && best.cost[0] === 0) break;
  }
  return best?.fill ?? null;
}

interface RatedPair {
  readonly cost: Cost;
  readonly pair: FillPair;
}

/** Whether a pair can still be better than the best, by what is known of it before its laps are. */
function canBeat(best: RatedPair, odd: Rated, even: Rated): boolean {
  const [breaks, , endClosers, lap, jointOff, clear] = best.cost;
  if (breaks > 0) return true;
  const ends = odd.fill.endClosers + even.fill.endClosers;
  if (ends !== endClosers) return ends < endClosers;
  if (lap > 0) return true;
  const off = odd.fill.jointOff + even.fill.jointOff;
  return off !== jointOff ? off < jointOff : -Math.min(odd.fill.clear, even.fill.clear) < clear;
}

/** The best pair with so many cuts, rules broken no more often than `most.breaks`, if it is better than `best`. */
function bestWithCuts(
  candidates: Candidates,
  cuts: number,
  most: { readonly breaks: number; readonly inCourse: number },
  limits: BondLimits,
  best: RatedPair | null,
): RatedPair | null {
  const mostBreaks = most.breaks;
  for (let oddCuts = Math.max(0, cuts - most.inCourse); oddCuts <= Math.min(most.inCourse, cuts); oddCuts += 1) {
    const odds = candidates(0, oddCuts);
    const evens = odds.length > 0 ? candidates(1, cuts - oddCuts) : [];
    for (const odd of odds) {
      if (odd.breaks > (best ? best.cost[0] : mostBreaks)) break;
      for (const even of evens) {
        const own = odd.breaks + even.breaks;
        const spare: number = (best ? best.cost[0] : mostBreaks) - own;
        if (spare < 0) break;
        if (best && !canBeat(best, odd, even)) continue;
        const laps = lapsBetween(even.fill.joints, odd.fill.joints, limits.leastLap, spare);
        if (laps.breaks > spare) continue;
        const stacked = countOverlaps(even.fill.innerClosers, odd.fill.innerClosers);
        if (laps.breaks + stacked > spare) continue;
        const cost: Cost = [
          own + laps.breaks + stacked,
          cuts,
          odd.fill.endClosers + even.fill.endClosers,
          lapShort(Math.min(laps.least, odd.lap, even.lap), limits),
          odd.fill.jointOff + even.fill.jointOff,
          -Math.min(odd.fill.clear, even.fill.clear),
        ];
        if (!best || isLess(cost, best.cost)) best = { cost, pair: [odd.fill, even.fill] };
      }
    }
  }
  return best;
}

/** With the fewest cuts that break no rule; where every arrangement breaks one, the one that breaks fewest. */
function fillBoth(task: StretchTask, limits: BondLimits, mostCuts: number, broken: boolean): RatedPair | null {
  const quick = candidatesOf(task, limits, false);
  const candidates = candidatesOf(task, limits, true);
  const inCourse = mostInCourse(task);
  for (let cuts = 0; cuts <= mostCuts; cuts += 1)
    for (const from of cuts === 0 ? [quick] : [quick, candidates]) {
      const whole = bestWithCuts(from, cuts, { breaks: 0, inCourse }, limits, null);
      if (whole) return whole;
    }
  let best: RatedPair | null = null;
  for (let cuts = 0; broken && cuts <= mostCuts; cuts += 1)
    best = bestWithCuts(candidates, cuts, { breaks: Infinity, inCourse }, limits, best);
  return best;
}

/** The fewest cuts, up to `mostCuts`, with which the two courses of a stretch break no rule; null where it takes more. */
export function fewestCuts(spans: StretchTask['spans'], mostCuts: number, limits: BondLimits): number | null {
  return fillBoth({ spans, first: 0, both: true, below: null, whole: null }, limits, mostCuts, false)?.cost[1] ?? null;
}

/**
 * Fills a stretch. Where no arrangement keeps the joints inside their limits, it is filled with a piece that does not
 * fit the rules, or left empty where not even that goes in; whoever asked can see it by the pieces.
 */
export function fillStretch(task: StretchTask, limits: BondLimits): FillPair {
  const force = (parity: Parity): CourseFill =>
    spanLength(task.spans[parity]) > 0 ? (forcedFill(task.spans[parity], limits) ?? EMPTY_FILL) : EMPTY_FILL;
  if (!task.both) {
    const fill = fillOne(task, limits) ?? force(task.first);
    return task.first === 0 ? [fill, EMPTY_FILL] : [EMPTY_FILL, fill];
  }
  const best = fillBoth(task, limits, 2 * mostInCourse(task), true);
  if (best) return best.pair;
  const alone = (parity: Parity): CourseFill =>
    fillOne({ ...task, first: parity, both: false, below: parity === task.first ? task.below : null }, limits) ??
    force(parity);
  return [alone(0), alone(1)];
}
