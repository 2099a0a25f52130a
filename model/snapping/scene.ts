/** What there is to catch, sorted and indexed once when a drag begins. */
import type { Drawing } from '../drawing/schema';
import { boxAround, boxOfSegment } from '../geometry/box';
import { gridOf, type Grid } from '../geometry/grid';
import type { PlanPoint } from '../geometry/point';
import { ticks, type Ticks } from '../length/ticks';
import { unitAlong } from '../walls/runs';
import type { RunGeometry, Walls } from '../walls/types';
import type { GoodLengths } from './types';

export interface SceneCorner extends PlanPoint {
  readonly id: string;
}

export interface SnapScene {
  readonly corners: readonly SceneCorner[];
  readonly cornerGrid: Grid;
  readonly byX: readonly SceneCorner[];
  readonly byY: readonly SceneCorner[];
  readonly runs: readonly RunGeometry[];
  readonly runGrid: Grid;
  readonly wholeUnits: GoodLengths;
}

/** Multiples of one unit and its head joint on either side of a length: the fallback where the bond has no say. */
function wholeUnitLengths(module: Ticks): GoodLengths {
  return (near) => {
    const below = Math.floor(near / module);
    return [below, below + 1].filter((count) => count > 0).map((count) => ticks(count * module));
  };
}

export function snapSceneOf(drawing: Drawing, walls: Walls): SnapScene {
  const corners = drawing.corners.map(({ id, x, y }) => ({ id, x, y }));
  const [type] = drawing.wallTypes;
  return {
    corners,
    cornerGrid: gridOf(corners.map((corner) => boxAround(corner, 0))),
    byX: [...corners].sort((a, b) => a.x - b.x),
    byY: [...corners].sort((a, b) => a.y - b.y),
    runs: walls.runs,
    runGrid: gridOf(walls.runs.map((run) => boxOfSegment(run.start, run.end))),
    wholeUnits: type ? wholeUnitLengths(ticks(unitAlong(type) + type.headJoint.nominal)) : () => [],
  };
}
