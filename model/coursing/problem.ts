/** The coursing problem as the search sees it: stops from the bottom up, and what a miss of each costs. */
import type { ControlResult } from './types';
import type { Ticks } from '../length/ticks';
import type { ThingRef } from '../things';
import { HARD_MISS, type Piece } from './costPieces';

/** A thing that wants a height. */
export interface Control {
  readonly thing: ThingRef;
  readonly kind: ControlResult['kind'];
  readonly height: Ticks;
  readonly tolerance: Ticks;
  readonly hold: 'hard' | 'soft';
  readonly weight: number;
}

/** A height where the course lines are held: every control that wants it, merged. */
export interface Stop {
  readonly height: Ticks;
  readonly hold: 'hard' | 'soft';
  readonly tolerance: Ticks;
  readonly weight: number;
  readonly controls: readonly Control[];
  /** The bond beam that starts here and ends the lift: its depth; 0 for any other stop. */
  readonly beamDepth: Ticks;
}

/** A thinner course: the least and most height of its unit. Alike for a split unit, apart where units are ripped to fit. */
export interface ThinCourse {
  readonly least: Ticks;
  readonly most: Ticks;
}

export interface Problem {
  readonly unit: Ticks;
  readonly joint: { readonly nominal: Ticks; readonly least: Ticks; readonly most: Ticks };
  /** Top of the first course. */
  readonly start: Ticks;
  /** From the lowest up. */
  readonly stops: readonly Stop[];
  /** What one course of every interval, its last, may be; absent where every course is whole. */
  readonly thin?: ThinCourse;
  /** Thinner courses cost nothing: for a search of the hard heights alone. */
  readonly thinIsFree?: boolean;
}

/**
 * Where thinner courses are allowed, soft costs are counted in this many parts and each thinner course costs one part: a
 * soft miss of one tick outweighs a thinner course in every interval (at most 40 control heights, 24 openings and 10 beams).
 */
const PARTS = 128;

/** Parts of one weighted tick in a problem's costs. */
export function partsOf(problem: Problem): number {
  return problem.thin ? PARTS : 1;
}

/** What an interval's thinner course costs, if it has one. */
export function thinCost(problem: Problem, thin: ThinCourse | null): number {
  return thin === null || problem.thinIsFree ? 0 : 1;
}

/** A search's soft cost taken apart: weighted ticks, and thinner courses. */
export function takeApart(problem: Problem, soft: number): { soft: number; thin: number } {
  const parts = partsOf(problem);
  return { soft: Math.floor(soft / parts), thin: soft % parts };
}

/** Ticks missed beyond the tolerance count this many times. */
export const BEYOND_TOLERANCE = 10;

/** What a miss of one soft control costs: its weight for each tick, tenfold beyond the tolerance. */
export function missCost(control: Pick<Control, 'weight' | 'tolerance'>, miss: number): number {
  const off = Math.abs(miss);
  const within = Math.min(off, control.tolerance);
  return control.weight * (within + BEYOND_TOLERANCE * (off - within));
}

/**
 * Where a stop has to be looked for. In a best plan no stop lies further below its height than one course of the thickest
 * joint, G, unless the stops above hold it down. For let it lie lower, and take with it the stops above up to the first
 * interval that can lose a course: an interval can't where it has none, or only a lift's last or a thinner one. If each of
 * them lies more than G too low, all can rise by that course, and the plan was not the best. From each to the next, that
 * depth shrinks by no more than what the interval may be high less what is drawn between the two heights. So the stop lies
 * within G and the most that such shrinking adds up to. The same holds upside down.
 */
export function windowOf(problem: Problem, index: number): { lo: number; hi: number } {
  const { stops, unit, joint, thin } = problem;
  const course = unit + joint.most;
  const shrinks = (below: Stop, above: Stop): number => {
    const highest = below.beamDepth > 0 ? course : thin ? thin.most + joint.most : 0;
    return highest - (above.height - below.height - below.beamDepth);
  };
  let down = 0;
  for (let i = index, sum = 0; i + 1 < stops.length; i++) {
    sum += shrinks(stops[i] as Stop, stops[i + 1] as Stop);
    down = Math.max(down, sum);
  }
  let up = 0;
  for (let i = index, sum = 0; i > 0; i--) {
    sum += shrinks(stops[i - 1] as Stop, stops[i] as Stop);
    up = Math.max(up, sum);
  }
  const { height } = stops[index] as Stop;
  return { lo: height - course - down - 1, hi: height + course + up + 1 };
}

/** What holding the stop at each height within `lo`…`hi` costs, in the problem's parts. */
export function chargeOf(stop: Stop, lo: number, hi: number, parts: number): Piece[] {
  const { height } = stop;
  const weight = stop.weight * parts;
  if (stop.hold === 'hard') {
    return [
      { lo, hi: height - 1, hard: HARD_MISS + (height - lo), soft: 0, hardSlope: -1, softSlope: 0 },
      { lo: height, hi: height, hard: 0, soft: 0, hardSlope: 0, softSlope: 0 },
      { lo: height + 1, hi, hard: HARD_MISS + 1, soft: 0, hardSlope: 1, softSlope: 0 },
    ];
  }
  const tolerance = Math.min(stop.tolerance, height - lo, hi - height);
  const near = weight;
  const far = weight * BEYOND_TOLERANCE;
  const pieces: Piece[] = [
    {
      lo,
      hi: height - tolerance - 1,
      hard: 0,
      soft: near * tolerance + far * (height - tolerance - lo),
      hardSlope: 0,
      softSlope: -far,
    },
    { lo: height - tolerance, hi: height, hard: 0, soft: near * tolerance, hardSlope: 0, softSlope: -near },
    { lo: height + 1, hi: height + tolerance, hard: 0, soft: near, hardSlope: 0, softSlope: near },
    {
      lo: height + tolerance + 1,
      hi,
      hard: 0,
      soft: near * tolerance + far,
      hardSlope: 0,
      softSlope: far,
    },
  ];
  return pieces.filter((piece) => piece.lo <= piece.hi);
}
