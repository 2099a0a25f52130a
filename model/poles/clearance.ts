/** Whether one brace can stand where a candidate puts it, and what refuses it. */
import type { PoleKit } from '../drawing/schema';
import { boxOfSegment, inflate } from '../geometry/box';
import type { PlanPoint } from '../geometry/point';
import { distanceSegmentToPolygon, distanceToPolygon, edges, whereIs } from '../geometry/polygon';
import { distanceBetweenSegments } from '../geometry/segment';
import { distance } from '../geometry/vec';
import type { ThingRef } from '../things';
import type { Ground, Obstacle } from './obstacles';
import { partsInside } from './plane';

export interface BraceLine {
  readonly from: PlanPoint;
  readonly foot: PlanPoint;
}

/** What one obstacle says to a brace: nothing, no, or over it with head room. */
type Verdict = 'clear' | 'refused' | 'over';

/**
 * A way through is passed over only where the brace, at `fixing × (1 − x/reach)` above the ground at plan distance x, is
 * more than the head room all across it; its lowest place is where it leaves the way on the foot's side.
 */
function overWay(line: BraceLine, ring: readonly PlanPoint[], kit: PoleKit): Verdict {
  if (whereIs(ring, line.foot) !== 'outside') return whereIs(ring, line.foot) === 'inside' ? 'refused' : 'clear';
  const parts = partsInside(line.from, line.foot, ring);
  const last = parts[parts.length - 1];
  if (!last) return 'clear';
  return kit.brace.fixing * (1 - last[1]) > kit.brace.headRoom ? 'over' : 'refused';
}

function verdictOf(line: BraceLine, obstacle: Obstacle, poleId: string, kit: PoleKit): Verdict {
  const { ring } = obstacle;
  switch (obstacle.kind) {
    case 'frame':
      return 'clear';
    case 'way':
      return overWay(line, ring, kit);
    case 'wall':
      if (distanceToPolygon(ring, line.foot) < kit.clearance) return 'refused';
      return distanceSegmentToPolygon(ring, line.from, line.foot) > 0 ? 'clear' : 'refused';
    case 'pole':
      if (obstacle.thing.id === poleId) return 'clear';
      return distanceSegmentToPolygon(ring, line.from, line.foot) < kit.clearance ? 'refused' : 'clear';
    case 'swing':
    case 'keepClear':
      if (whereIs(ring, line.foot) === 'inside') return 'refused';
      return partsInside(line.from, line.foot, ring).length > 0 ? 'refused' : 'clear';
  }
}

function leavesBoundary(line: BraceLine, boundary: readonly PlanPoint[]): boolean {
  if (whereIs(boundary, line.foot) === 'outside') return true;
  const inside = partsInside(line.from, line.foot, boundary).reduce((sum, [from, to]) => sum + to - from, 0);
  return (
    inside < 1 - 1e-6 && !edges(boundary).some(([a, b]) => distanceBetweenSegments(a, b, line.foot, line.foot) === 0)
  );
}

export type Standing =
  | { readonly free: true; readonly over: readonly ThingRef[] }
  | { readonly free: false; readonly refusedBy: readonly Obstacle[]; readonly boundary: boolean };

/**
 * Tries one brace line from a pole. With `all`, every obstacle that refuses it is named; without, the first found is enough.
 */
export function tryBrace(line: BraceLine, poleId: string, kit: PoleKit, ground: Ground, all = false): Standing {
  const over: ThingRef[] = [];
  const refusedBy: Obstacle[] = [];
  const boundary = ground.boundary !== null && leavesBoundary(line, ground.boundary);
  if (boundary && !all) return { free: false, refusedBy, boundary };
  for (const obstacle of ground.near(inflate(boxOfSegment(line.from, line.foot), kit.clearance))) {
    const verdict = verdictOf(line, obstacle, poleId, kit);
    if (verdict === 'over') over.push(obstacle.thing);
    if (verdict !== 'refused') continue;
    refusedBy.push(obstacle);
    if (!all) break;
  }
  if (boundary || refusedBy.length > 0) return { free: false, refusedBy, boundary };
  return { free: true, over };
}

/** True where two braces of different poles come nearer than the clearance, line to line (feet included). */
export function bracesConflict(a: BraceLine, b: BraceLine, clearance: number): boolean {
  const gap = distance(a.from, b.from);
  if (gap > distance(a.from, a.foot) + distance(b.from, b.foot) + clearance) return false;
  const least = distanceBetweenSegments(a.from, a.foot, b.from, b.foot);
  return least === 0 || least < clearance;
}
