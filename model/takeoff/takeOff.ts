/** The takeoff: what the building is made of, counted from how it is laid. */
import type { Bond } from '../bond/types';
import type { Coursing } from '../coursing/types';
import type { Drawing } from '../drawing/schema';
import type { Lines } from '../lines/types';
import type { PoleSet } from '../poles/types';
import type { Ground } from '../survey/types';
import type { Walls } from '../walls/types';
import { beamQuantities } from './beamQuantities';
import { countUnits } from './countUnits';
import { lintelSchedule } from './lintelSchedule';
import { mortarVolume } from './mortarVolume';
import { poleStock } from './poleStock';
import type { Takeoff } from './types';

export interface TakeoffParts {
  readonly drawing: Drawing;
  readonly walls: Walls;
  readonly ground: Ground;
  readonly coursing: Coursing;
  readonly bond: Bond;
  readonly poles: PoleSet;
  readonly lines: Lines;
}

/** Counts everything net, as laid: nothing is added for waste. */
export function takeOff({ drawing, walls, ground, coursing, bond, poles, lines }: TakeoffParts): Takeoff {
  return {
    ...countUnits(drawing, walls, coursing, bond),
    mortar: mortarVolume(drawing, { walls, ground, coursing, bond }),
    beams: beamQuantities(drawing, walls, coursing),
    lintels: lintelSchedule(drawing, walls),
    poles: poleStock(drawing, poles, lines),
  };
}
