/** The places that a brace may go: bearings by whole degrees and reaches by parts of the fixing height, with their costs. */
import type { PoleKit } from '../drawing/schema';
import type { PlanPoint, Vec } from '../geometry/point';
import { dot, negate } from '../geometry/vec';
import { ticks, type Ticks } from '../length/ticks';
import { degreesBetween, stepFrom, turn } from './plane';
import type { Seat } from './seats';

/** Which bearings and reaches are tried. Reaches are in per cent of the fixing height. */
export interface CandidateOptions {
  /** Largest turn from the ideal bearing, and the step between turns, in whole degrees. */
  readonly turnMost: number;
  readonly turnStep: number;
  readonly reaches: readonly number[];
}

export const USUAL_CANDIDATES: CandidateOptions = {
  turnMost: 60,
  turnStep: 1,
  reaches: [66, 60, 75, 50, 85, 100],
};

/** The reach that a brace is best at, in per cent of its fixing height (typical: half the height to the whole of it). */
const BEST_REACH = 66;
/** A brace steeper than this reach, in per cent of its fixing height, holds nothing. */
const LEAST_REACH = 33;
/** Weights of the whole-number cost; a turn of t degrees costs t². */
const ALONG_FACE = 1500;
const NEAR_FACE = 3;
const NEAR_FACE_DEGREES = 30;
export const OVER_WAY = 400;

/** One bearing that would plumb the pole along a wall line. */
interface Ideal {
  readonly runId: string;
  readonly bearing: Vec;
  /** Toward the wall rather than away from it. */
  readonly alongFace: boolean;
}

export interface Candidate {
  readonly runId: string;
  readonly foot: PlanPoint;
  readonly direction: Vec;
  readonly reach: Ticks;
  readonly turned: number;
  readonly alongFace: boolean;
  /** Cost of its bearing and reach; passing over a way comes on top. */
  readonly cost: number;
}

export interface ReachLimits {
  readonly least: number;
  readonly most: number;
}

/** Plan distances that the kit's legs allow at its fixing height; null where the longest leg is too short to hold. */
export function reachLimits(kit: PoleKit): ReachLimits | null {
  const { fixing, leastLeg, mostLeg } = kit.brace;
  const under = (leg: number) => Math.sqrt(Math.max(0, leg * leg - fixing * fixing));
  const most = under(mostLeg);
  const least = Math.max(under(leastLeg), (fixing * LEAST_REACH) / 100);
  return least <= most ? { least, most } : null;
}

/** How much longer the kit's longest leg must be to hold a pole at all. */
export function legShortBy(kit: PoleKit): Ticks {
  const { fixing, leastLeg, mostLeg } = kit.brace;
  const steepest = Math.hypot(fixing, (fixing * LEAST_REACH) / 100);
  return ticks(Math.ceil(Math.max(steepest, leastLeg) - mostLeg));
}

/** The reaches to try, each with its cost: the square of its per cents away from the best. */
function reachesWithin(kit: PoleKit, limits: ReachLimits, options: CandidateOptions): { reach: Ticks; cost: number }[] {
  const fixing = kit.brace.fixing;
  const found = new Map<number, number>();
  for (const part of options.reaches) {
    const wanted = (fixing * part) / 100;
    // Rounded to the inside of the limits, so that the leg made from it keeps to the kit's.
    const reach = Math.min(Math.floor(limits.most), Math.max(Math.ceil(limits.least), Math.round(wanted)));
    const off = Math.round((100 * reach) / fixing) - BEST_REACH;
    if (!found.has(reach)) found.set(reach, off * off);
  }
  return [...found].map(([reach, cost]) => ({ reach: ticks(reach), cost }));
}

/** For each of the two braces of a seat's pole, the bearings that would suit it best. */
export function idealsAt(seat: Seat): readonly [readonly Ideal[], readonly Ideal[]] {
  const [a, b] = seat.faces;
  if (seat.shape === 'flat') {
    const slant = (face: typeof a): Ideal => ({ runId: face.runId, bearing: negate(face.along), alongFace: false });
    const off = a.outside ? a.off : b.off;
    const half = Math.SQRT1_2;
    const ideal = (face: typeof a): readonly Ideal[] => {
      const { x, y } = slant(face).bearing;
      return [{ ...slant(face), bearing: { x: (off.x + x) * half, y: (off.y + y) * half } }];
    };
    return [ideal(a), ideal(b)];
  }
  const both = (face: typeof a): readonly Ideal[] => [
    { runId: face.runId, bearing: negate(face.along), alongFace: false },
    { runId: face.runId, bearing: face.along, alongFace: true },
  ];
  return [both(a), both(b)];
}

/** False where a brace would go straight into the walls of its own corner. */
function isOpen(direction: Vec, seat: Seat): boolean {
  const [a, b] = seat.faces.map((face) => dot(direction, face.off) > 0);
  return seat.shape === 'wraps' ? a === true || b === true : a === true && b === true;
}

function nearFace(direction: Vec, seat: Seat): number {
  let cost = 0;
  for (const face of seat.faces) {
    const within = NEAR_FACE_DEGREES - Math.round(degreesBetween(direction, face.along));
    if (within > 0) cost += NEAR_FACE * within * within;
  }
  return cost;
}

/**
 * Each brace straight in line with its wall, at the reach that costs least; null where those lie near a face, so that
 * something turned may cost less.
 */
export function straightAt(
  seat: Seat,
  at: PlanPoint,
  kit: PoleKit,
  limits: ReachLimits,
  options: CandidateOptions,
): readonly [Candidate, Candidate] | null {
  const reaches = reachesWithin(kit, limits, options).sort((a, b) => a.cost - b.cost);
  const best = reaches[0];
  const [first, second] = idealsAt(seat).map((ideals) => ideals[0]);
  if (!best || !first || !second) return null;
  const candidate = (ideal: Ideal): Candidate => ({
    runId: ideal.runId,
    foot: stepFrom(at, [ideal.bearing, best.reach]),
    direction: ideal.bearing,
    reach: best.reach,
    turned: 0,
    alongFace: false,
    cost: best.cost + nearFace(ideal.bearing, seat),
  });
  const pair = [candidate(first), candidate(second)] as const;
  return pair.every((each) => each.cost === best.cost) ? pair : null;
}

/**
 * Every candidate of a pole's two braces, cheapest first. The cost is a whole number made only of figures that a
 * translation, a quarter-turn or a mirroring leaves alone: the turn squared, the reach's per cents off its best squared,
 * and what it takes from the room beside the faces.
 */
export function candidatesAt(
  seat: Seat,
  at: PlanPoint,
  kit: PoleKit,
  limits: ReachLimits,
  options: CandidateOptions,
): readonly [readonly Candidate[], readonly Candidate[]] {
  const reaches = reachesWithin(kit, limits, options);
  const fill = (ideals: readonly Ideal[]): Candidate[] => {
    const list: Candidate[] = [];
    for (const ideal of ideals)
      for (let size = 0; size <= options.turnMost; size += options.turnStep)
        for (const turned of size === 0 ? [0] : [size, -size]) {
          const direction = turn(ideal.bearing, turned);
          if (!isOpen(direction, seat)) continue;
          const base = turned * turned + (ideal.alongFace ? ALONG_FACE : 0) + nearFace(direction, seat);
          for (const { reach, cost } of reaches)
            list.push({
              runId: ideal.runId,
              foot: stepFrom(at, [direction, reach]),
              direction,
              reach,
              turned: Math.abs(turned),
              alongFace: ideal.alongFace,
              cost: base + cost,
            });
        }
    return list.sort((p, q) => p.cost - q.cost);
  };
  const [first, second] = idealsAt(seat);
  return [fill(first), fill(second)];
}
