/** The places that a brace may go: bearings by whole degrees and reaches by parts of the fixing height, with their costs. */
import type { PoleKit } from '../drawing/schema';
import type { PlanPoint, Vec } from '../geometry/point';
import { dot, negate } from '../geometry/vec';
import { ticks, type Ticks } from '../length/ticks';
import type { ThingRef } from '../things';
import { degreesBetween, turn } from './plane';
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

/**
 * Tried where the usual ones leave a pole without two braces that keep the angle rule: every bearing on the open side, and
 * reaches from the steepest that holds to the longest leg of most kits.
 */
export const WIDE_CANDIDATES: CandidateOptions = {
  turnMost: 90,
  turnStep: 1,
  reaches: [66, 60, 72, 75, 55, 50, 80, 45, 85, 40, 90, 95, 36, 100, 33, 110, 120, 130, 150],
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

/** A whole-degree bearing that one brace of a pole may take. */
export interface Heading {
  readonly runId: string;
  readonly direction: Vec;
  /** Which of the brace's ideal bearings it was turned from, and by how many degrees counter-clockwise. */
  readonly ideal: number;
  readonly turn: number;
  readonly alongFace: boolean;
  /** Cost of the bearing alone. */
  readonly cost: number;
}

/** A plan distance that a brace may take, and what it costs. */
export interface Reach {
  readonly reach: Ticks;
  readonly cost: number;
}

/** A place where one brace can stand. */
export interface Candidate {
  /** Place of its heading in the brace's list. */
  readonly heading: number;
  readonly runId: string;
  readonly foot: PlanPoint;
  readonly direction: Vec;
  readonly reach: Ticks;
  readonly turned: number;
  readonly alongFace: boolean;
  /** Ways through that it passes over with head room. */
  readonly over: readonly ThingRef[];
  /** Cost of its bearing and reach, and of every way that it passes over. */
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

/** The reaches to try, cheapest first: each costs the square of its per cents away from the best. */
export function reachesWithin(kit: PoleKit, limits: ReachLimits, options: CandidateOptions): readonly Reach[] {
  const fixing = kit.brace.fixing;
  const found = new Map<number, number>();
  for (const part of options.reaches) {
    const wanted = (fixing * part) / 100;
    // Rounded to the inside of the limits, so that the leg made from it keeps to the kit's.
    const reach = Math.min(Math.floor(limits.most), Math.max(Math.ceil(limits.least), Math.round(wanted)));
    const off = Math.round((100 * reach) / fixing) - BEST_REACH;
    if (!found.has(reach)) found.set(reach, off * off);
  }
  return [...found].map(([reach, cost]) => ({ reach: ticks(reach), cost })).sort((a, b) => a.cost - b.cost);
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
  const a = dot(direction, seat.faces[0].off) > 0;
  const b = dot(direction, seat.faces[1].off) > 0;
  return seat.shape === 'wraps' ? a || b : a && b;
}

/** A direction whose cosine with a face is under this lies more than `NEAR_FACE_DEGREES` off it: no need to ask further. */
const NEAR_FACE_COSINE = Math.cos(((NEAR_FACE_DEGREES - 0.4) * Math.PI) / 180);

function nearFace(direction: Vec, seat: Seat): number {
  let cost = 0;
  for (const face of seat.faces) {
    if (dot(direction, face.along) < NEAR_FACE_COSINE) continue;
    const within = NEAR_FACE_DEGREES - Math.round(degreesBetween(direction, face.along));
    if (within > 0) cost += NEAR_FACE * within * within;
  }
  return cost;
}

/**
 * Every heading of a pole's two braces, cheapest first. The cost is a whole number made only of figures that a translation,
 * a quarter-turn or a mirroring leaves alone: the turn squared, and what it takes from the room beside the faces.
 */
export function headingsAt(
  ideals: readonly (readonly Ideal[])[],
  seat: Seat,
  options: CandidateOptions,
): readonly (readonly Heading[])[] {
  return ideals.map((each) => {
    const list: Heading[] = [];
    each.forEach(({ runId, bearing, alongFace }, ideal) => {
      for (let size = 0; size <= options.turnMost; size += options.turnStep)
        for (let side = 0; side < (size === 0 ? 1 : 2); side += 1) {
          const turned = side === 0 ? size : -size;
          const direction = turn(bearing, turned);
          if (!isOpen(direction, seat)) continue;
          const cost = size * size + (alongFace ? ALONG_FACE : 0) + nearFace(direction, seat);
          list.push({ runId, direction, ideal, turn: turned, alongFace, cost });
        }
    });
    return list.sort((p, q) => p.cost - q.cost);
  });
}

/**
 * Each brace straight in line with its wall; null where one lies near a face, so that something turned may cost less.
 */
export function straightHeadings(
  ideals: readonly (readonly Ideal[])[],
  seat: Seat,
): readonly [Heading, Heading] | null {
  const [first, second] = ideals.map((each) => each[0]);
  if (!first || !second) return null;
  const heading = ({ runId, bearing, alongFace }: Ideal): Heading => {
    const cost = nearFace(bearing, seat) + (alongFace ? ALONG_FACE : 0);
    return { runId, direction: bearing, ideal: 0, turn: 0, alongFace, cost };
  };
  const pair = [heading(first), heading(second)] as const;
  return pair.every((each) => each.cost === 0) ? pair : null;
}
