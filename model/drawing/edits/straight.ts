/** Runs that continue one another in one line, through tees and straight corners: to the builder they are one wall. */
import type { PlanPoint, Vec } from '../../geometry/point';
import { cross, dot, sub, unit } from '../../geometry/vec';
import type { Corner, Drawing, WallRun } from '../schema';
import { otherEnd, runsByCorner } from './find';

/** Sine of the angle within which two runs count as one line: a corner rounded to the tick on a run of a few inches. */
const IN_LINE = 1e-3;

export function areInLine(a: Vec, b: Vec): boolean {
  return Math.abs(cross(a, b)) < IN_LINE;
}

export interface StraightWall {
  /** From one end to the other, in the direction of the run that was asked for. */
  readonly corners: readonly Corner[];
  readonly runs: readonly WallRun[];
}

interface Plan {
  readonly corners: ReadonlyMap<string, Corner>;
  readonly runsAt: ReadonlyMap<string, readonly WallRun[]>;
}

export function planOf(drawing: Drawing): Plan {
  return { corners: new Map(drawing.corners.map((corner) => [corner.id, corner])), runsAt: runsByCorner(drawing) };
}

/** Direction of a run seen from one of its corners. */
export function directionFrom(plan: Plan, run: WallRun, cornerId: string): Vec {
  const here = plan.corners.get(cornerId);
  const there = plan.corners.get(otherEnd(run, cornerId));
  return here && there ? unit(sub(there, here)) : { x: 0, y: 0 };
}

function follow(plan: Plan, run: WallRun, towards: string): { corners: Corner[]; runs: WallRun[] } {
  const corners: Corner[] = [];
  const runs: WallRun[] = [];
  const seen = new Set([run.id]);
  let last = run;
  let at = towards;
  for (;;) {
    const corner = plan.corners.get(at);
    if (!corner) return { corners, runs };
    corners.push(corner);
    const back = directionFrom(plan, last, at);
    const here = at;
    const next = (plan.runsAt.get(at) ?? []).find((other) => {
      const away = directionFrom(plan, other, here);
      return !seen.has(other.id) && areInLine(back, away) && dot(back, away) < 0;
    });
    if (!next) return { corners, runs };
    seen.add(next.id);
    runs.push(next);
    last = next;
    at = otherEnd(next, at);
  }
}

/** The whole straight wall that a run is part of. */
export function straightWall(plan: Plan, run: WallRun): StraightWall {
  const ahead = follow(plan, run, run.to);
  const behind = follow(plan, run, run.from);
  return {
    corners: [...behind.corners.reverse(), ...ahead.corners],
    runs: [...behind.runs.reverse(), run, ...ahead.runs],
  };
}

/** The first other run at a corner that leaves the line of `direction`: the way along which the corner can slide. */
export function wayOff(plan: Plan, cornerId: string, direction: Vec, not: ReadonlySet<string>): Vec | null {
  for (const other of plan.runsAt.get(cornerId) ?? []) {
    if (not.has(other.id)) continue;
    const away = directionFrom(plan, other, cornerId);
    if (!areInLine(away, direction)) return away;
  }
  return null;
}

export function placeOf(corner: Corner): PlanPoint {
  return { x: corner.x, y: corner.y };
}
