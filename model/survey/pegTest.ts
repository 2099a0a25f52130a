/** The two-peg check of a level: how far its line of sight is off level, and what that makes of a reading. */
import type { PegTest } from '../drawing/surveySchema';
import { roundTicks, type Ticks } from '../length/ticks';

export interface Collimation {
  /**
   * Rise of the line of sight for its length, as a ratio: positive where it looks up and every rod is read too large.
   * Null where both places lie alike to the pegs, so that the error falls out of both.
   */
  readonly slope: number | null;
  /** How much higher peg B stands than peg A, free of the error. */
  readonly rise: Ticks;
  /** What the rods must be read at from the second place once the instrument is adjusted. */
  readonly wanted: { readonly a: Ticks; readonly b: Ticks };
}

/**
 * Collimation from the rods read on two pegs, from midway and from near one of them. A line of sight that rises by the
 * slope c reads c × distance too large, so that a − b = rise + c (to A − to B) from either place: two equations whose
 * difference gives c, and then the rise (two-peg test, standard practice in levelling). The places need not be exact
 * middles: the distances are in the equations.
 */
export function checkPegs({ midway, near }: PegTest): Collimation {
  const lean = near.toA - near.toB - (midway.toA - midway.toB);
  const slope = lean === 0 ? null : (near.a - near.b - (midway.a - midway.b)) / lean;
  const c = slope ?? 0;
  return {
    slope,
    rise: roundTicks(midway.a - midway.b - c * (midway.toA - midway.toB)),
    wanted: { a: correctedRod(near.a, near.toA, slope), b: correctedRod(near.b, near.toB, slope) },
  };
}

/** A slope beyond 1 in 100 is a misread peg and no state of a level: nothing is corrected by it (common practice, no source). */
const MOST_SLOPE = 0.01;

/** The rod as a level in adjustment would have read it from that distance; as read where the slope can't be a level's. */
export function correctedRod(rod: Ticks, distance: Ticks | undefined, slope: number | null): Ticks {
  const known = distance !== undefined && slope !== null && Math.abs(slope) <= MOST_SLOPE;
  return known ? roundTicks(rod - slope * distance) : rod;
}
