/** The sizes of a unit as it lies in its wall. */
import type { WallType } from '../drawing/schema';
import type { Ticks } from '../length/ticks';

/** A unit as laid: along the run, through the wall, and up. All in ticks. */
export interface UnitSize {
  readonly along: Ticks;
  readonly thickness: Ticks;
  readonly height: Ticks;
}

/** A stretcher lies along the wall, which is then as thick as the unit is wide; a header lies across it. */
export function unitSize(wallType: WallType): UnitSize {
  const { length, width, height } = wallType.unit;
  return wallType.laid === 'stretcher'
    ? { along: length, thickness: width, height }
    : { along: width, thickness: length, height };
}

/** The bond's offset of one course over the next, as a part of the module. */
export function offsetPart(wallType: WallType): number {
  return wallType.bondOffset === 'half' ? 1 / 2 : wallType.bondOffset === 'third' ? 1 / 3 : 1 / 4;
}
