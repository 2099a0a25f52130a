/**
 * What stands near one pole, asked about many brace lines: the plain cases (far away, no edge met) in a few
 * multiplications, the rest by `clearance.ts`. The answers are the same.
 */
import type { PoleKit } from '../drawing/schema';
import { boxAround, type Box } from '../geometry/box';
import type { PlanPoint } from '../geometry/point';
import { whereIs } from '../geometry/polygon';
import type { ThingRef } from '../things';
import { leavesBoundary, pointNear, verdictOf, type BraceLine } from './clearance';
import { flatOf, type Ground, type Obstacle } from './obstacles';

const NOTHING_OVER: readonly ThingRef[] = [];

/** True where the box of a segment and another box, wider by `by`, share no point. */
function apart(box: Box, by: number, ax: number, ay: number, bx: number, by2: number): boolean {
  return (
    (ax < box.minX - by && bx < box.minX - by) ||
    (ax > box.maxX + by && bx > box.maxX + by) ||
    (ay < box.minY - by && by2 < box.minY - by) ||
    (ay > box.maxY + by && by2 > box.maxY + by)
  );
}

/** True where the segment meets or touches an edge of the closed ring. */
function meetsEdge(flat: Float64Array, ax: number, ay: number, bx: number, by: number): boolean {
  const dx = bx - ax;
  const dy = by - ay;
  let cx = flat[0] as number;
  let cy = flat[1] as number;
  let sideC = dx * (cy - ay) - dy * (cx - ax);
  for (let i = 2; i < flat.length; i += 2) {
    const ex = flat[i] as number;
    const ey = flat[i + 1] as number;
    const sideE = dx * (ey - ay) - dy * (ex - ax);
    if ((sideC <= 0 && sideE >= 0) || (sideC >= 0 && sideE <= 0)) {
      const ux = ex - cx;
      const uy = ey - cy;
      const a = ux * (ay - cy) - uy * (ax - cx);
      const b = ux * (by - cy) - uy * (bx - cx);
      if (((a <= 0 && b >= 0) || (a >= 0 && b <= 0)) && boxesTouch(ax, bx, cx, ex) && boxesTouch(ay, by, cy, ey))
        return true;
    }
    cx = ex;
    cy = ey;
    sideC = sideE;
  }
  return false;
}

function boxesTouch(a: number, b: number, c: number, d: number): boolean {
  return Math.max(a, b) >= Math.min(c, d) && Math.max(c, d) >= Math.min(a, b);
}

/** Whether a point lies within a ring, even-odd; on an edge either answer may come. */
function within(flat: Float64Array, x: number, y: number): boolean {
  let inside = false;
  for (let i = 2; i < flat.length; i += 2) {
    const ay = flat[i - 1] as number;
    const by = flat[i + 1] as number;
    if (ay > y === by > y) continue;
    const ax = flat[i - 2] as number;
    const bx = flat[i] as number;
    if (x < ((bx - ax) * (y - ay)) / (by - ay) + ax) inside = !inside;
  }
  return inside;
}

/** Whether a point lies within `by` of a ring's edges. */
function nearEdge(flat: Float64Array, x: number, y: number, by: number): boolean {
  for (let i = 2; i < flat.length; i += 2) {
    const cx = flat[i - 2] as number;
    const cy = flat[i - 1] as number;
    const ux = (flat[i] as number) - cx;
    const uy = (flat[i + 1] as number) - cy;
    const px = x - cx;
    const py = y - cy;
    const along = px * ux + py * uy;
    const size = ux * ux + uy * uy;
    const square =
      along <= 0
        ? px * px + py * py
        : along >= size
          ? (px - ux) * (px - ux) + (py - uy) * (py - uy)
          : Math.pow((ux * py - uy * px) / Math.sqrt(size), 2);
    if (square < by * by) return true;
  }
  return false;
}

export class Nearby {
  private readonly obstacles: readonly Obstacle[];
  private readonly boundary: {
    readonly ring: readonly PlanPoint[];
    readonly flat: Float64Array;
    readonly holds: boolean;
  } | null;

  /** Everything that a brace of the pole at `at` can meet within `reach`. */
  constructor(
    private readonly at: PlanPoint,
    private readonly poleId: string,
    private readonly kit: PoleKit,
    ground: Ground,
    reach: number,
  ) {
    this.obstacles = ground
      .near(boxAround(at, reach + kit.clearance + 1))
      .filter(({ kind, thing }) => kind !== 'frame' && (kind !== 'pole' || thing.id !== poleId));
    const ring = ground.boundary;
    this.boundary = ring && { ring, flat: flatOf(ring), holds: whereIs(ring, at) !== 'outside' };
  }

  /** The ways that a brace with this foot passes over; null where it can't stand. */
  over(foot: PlanPoint): readonly ThingRef[] | null {
    const line: BraceLine = { from: this.at, foot };
    if (this.boundary && this.crossesBoundary(line)) return null;
    const { x, y } = this.at;
    let over = NOTHING_OVER;
    for (const obstacle of this.obstacles) {
      if (apart(obstacle.box, this.kit.clearance, x, y, foot.x, foot.y) || this.isPlain(obstacle, foot)) continue;
      if (obstacle.kind === 'wall' || obstacle.kind === 'pole') return null;
      const verdict = verdictOf(line, obstacle, this.poleId, this.kit);
      if (verdict === 'refused') return null;
      if (verdict === 'over') over = [...over, obstacle.thing];
    }
    return over;
  }

  /** Everything that refuses a brace with this foot. */
  refusers(foot: PlanPoint): ThingRef[] {
    const line: BraceLine = { from: this.at, foot };
    const { x, y } = this.at;
    const found: ThingRef[] = this.crossesBoundary(line) ? [{ kind: 'boundary', id: 'boundary' }] : [];
    for (const obstacle of this.obstacles) {
      if (apart(obstacle.box, this.kit.clearance, x, y, foot.x, foot.y) || this.isPlain(obstacle, foot)) continue;
      if (verdictOf(line, obstacle, this.poleId, this.kit) === 'refused') found.push(obstacle.thing);
    }
    return found;
  }

  /** True where the obstacle surely says nothing; of a wall or a pole, exactly where it says nothing. */
  private isPlain({ kind, flat, box }: Obstacle, foot: PlanPoint): boolean {
    const { x, y } = this.at;
    if (kind === 'pole') return !this.comesNear(flat, foot);
    if (meetsEdge(flat, x, y, foot.x, foot.y) || within(flat, foot.x, foot.y)) return false;
    if (kind !== 'wall') return true;
    const { clearance } = this.kit;
    return apart(box, clearance, foot.x, foot.y, foot.x, foot.y) || !nearEdge(flat, foot.x, foot.y, clearance);
  }

  /** Whether a brace comes nearer to a ring than the clearance. */
  private comesNear(flat: Float64Array, foot: PlanPoint): boolean {
    const { x, y } = this.at;
    const { clearance } = this.kit;
    if (clearance === 0) return false;
    if (meetsEdge(flat, x, y, foot.x, foot.y) || within(flat, foot.x, foot.y)) return true;
    if (nearEdge(flat, x, y, clearance) || nearEdge(flat, foot.x, foot.y, clearance)) return true;
    for (let i = 2; i < flat.length; i += 2)
      if (pointNear(flat[i] as number, flat[i + 1] as number, x, y, foot.x - x, foot.y - y, clearance * clearance))
        return true;
    return false;
  }

  private crossesBoundary(line: BraceLine): boolean {
    const boundary = this.boundary;
    if (!boundary) return false;
    const { x, y } = this.at;
    if (!meetsEdge(boundary.flat, x, y, line.foot.x, line.foot.y)) return !boundary.holds;
    return leavesBoundary(line, boundary.ring);
  }
}
