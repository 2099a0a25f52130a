/** The best pair of odd and even courses for one stretch, by an exact comparison over the candidates. */
import { EMPTY_FILL, spanLength, type BondLimits, type CourseFill, type Span } from './courseFill';
import { candidateFills, forcedFill, MOST_CLOSERS } from './candidates';
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

function rate(fill: CourseFill, below: Below | null, limits: BondLimits): Rated {
  if (!below) return { fill, breaks: fill.shortPieces, lap: Infinity };
  const laps = lapsBetween(fill.joints, below.joints, limits.leastLap, Infinity);
  const stacked = fill.closers.length > 0 ? countOverlaps(fill.closers, below.closers) : 0;
  return { fill, breaks: fill.shortPieces + laps.breaks + stacked, lap: laps.least };
}

function lapShort(lap: number, limits: BondLimits): number {
  const step = limits.unit / LAP_STEPS;
  return Math.ceil(Math.max(0, limits.wantedLap - Math.max(lap, 0)) / step);
}

/** Rates every candidate of one parity with so many closers; kept so that each is laid once. */
function candidatesOf(task: StretchTask, limits: BondLimits): (parity: Parity, closers: number) => readonly Rated[] {
  const kept = new Map<number, readonly Rated[]>();
  return (parity, closers) => {
    const key = parity * 10 + closers;
    const found = kept.get(key);
    if (found) return found;
    const span = task.spans[parity];
    const other = task.spans[1 - parity]!;
    const lead = (s: Span) => s.from.at + (s.from.joint ? limits.joint.nominal : 0);
    const below = parity === task.first ? task.below : null;
    const fills = candidateFills(span, closers, lead(other) - lead(span), limits);
    const rated = fills.map((fill) => rate(fill, below, limits)).sort((a, b) => a.breaks - b.breaks);
    kept.set(key, rated);
    return rated;
  };
}

/** The lowest course alone, where the stretch has only one. */
function fillOne(task: StretchTask, limits: BondLimits): CourseFill | null {
  const candidates = candidatesOf(task, limits);
  let best: { cost: Cost; fill: CourseFill } | null = null;
  for (let cuts = 0; cuts <= MOST_CLOSERS; cuts += 1) {
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

function fillBoth(task: StretchTask, limits: BondLimits, mostCuts: number): RatedPair | null {
  const candidates = candidatesOf(task, limits);
  let best: RatedPair | null = null;
  for (let cuts = 0; cuts <= mostCuts; cuts += 1) {
    for (let oddCuts = Math.max(0, cuts - MOST_CLOSERS); oddCuts <= Math.min(MOST_CLOSERS, cuts); oddCuts += 1)
      for (const odd of candidates(0, oddCuts)) {
        if (best && odd.breaks > best.cost[0]) break;
        for (const even of candidates(1, cuts - oddCuts)) {
          const own = odd.breaks + even.breaks;
          const spare: number = best ? best.cost[0] - own : Infinity;
          if (spare < 0) break;
          const laps = lapsBetween(even.fill.joints, odd.fill.joints, limits.leastLap, spare);
          if (laps.breaks > spare) continue;
          const stacked = oddCuts > 0 && cuts > oddCuts ? countOverlaps(even.fill.closers, odd.fill.closers) : 0;
          const lap = Math.min(laps.least, odd.lap, even.lap);
          const cost: Cost = [
            own + laps.breaks + stacked,
            cuts,
            odd.fill.endClosers + even.fill.endClosers,
            lapShort(lap, limits),
            odd.fill.jointOff + even.fill.jointOff,
            -Math.min(odd.fill.clear, even.fill.clear),
          ];
          if (!best || isLess(cost, best.cost)) best = { cost, pair: [odd.fill, even.fill] };
        }
      }
    if (best && best.cost[0] === 0) break;
  }
  return best;
}

/** Whether a stretch fills with at most so many cuts in its two courses and no rule broken. */
export function fillsWithCuts(spans: StretchTask['spans'], mostCuts: number, limits: BondLimits): boolean {
  const best = fillBoth({ spans, first: 0, both: true, below: null }, limits, mostCuts);
  return best !== null && best.cost[0] === 0;
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
  const best = fillBoth(task, limits, 2 * MOST_CLOSERS);
  if (best) return best.pair;
  const alone = (parity: Parity): CourseFill =>
    fillOne({ ...task, first: parity, both: false, below: parity === task.first ? task.below : null }, limits) ??
    force(parity);
  return [alone(0), alone(1)];
}
