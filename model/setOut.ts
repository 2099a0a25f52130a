/** The whole set-out of a drawing and its survey, from the parts. */
import { layBond } from './bond/layBond';
import type { Bond } from './bond/types';
import { planCourses } from './coursing/planCourses';
import type { Coursing } from './coursing/types';
import type { Drawing } from './drawing/schema';
import type { Survey } from './drawing/surveySchema';
import { stringLines } from './lines/stringLines';
import type { Lines } from './lines/types';
import { markPoles } from './marks/markPoles';
import type { Marks } from './marks/types';
import { placePoles } from './poles/placePoles';
import type { PoleSet } from './poles/types';
import type { Reason } from './reasons';
import { levelGround } from './survey/levelGround';
import type { Ground } from './survey/types';
import { takeOff } from './takeoff/takeOff';
import type { Takeoff } from './takeoff/types';
import { layOutWalls } from './walls/layOutWalls';
import type { Walls } from './walls/types';

export interface SetOut {
  readonly walls: Walls;
  readonly ground: Ground;
  readonly coursing: Coursing;
  readonly bond: Bond;
  readonly poles: PoleSet;
  readonly marks: Marks;
  readonly lines: Lines;
  readonly takeoff: Takeoff;
  /** Everything that was wrong or worth saying, from every part. */
  readonly reasons: readonly Reason[];
}

/** Solves a drawing. Total over what the schema admits: what can't be solved is a reason, and the rest is solved. */
export function solve(drawing: Drawing, survey: Survey): SetOut {
  const walls = layOutWalls(drawing);
  const ground = levelGround(drawing, walls, survey);
  const coursing = planCourses(drawing, walls, ground);
  const bond = layBond(drawing, walls, coursing);
  const poles = placePoles(drawing, walls);
  const marks = markPoles(drawing, ground, coursing, poles);
  const lines = stringLines(drawing, walls, poles);
  const takeoff = takeOff({ drawing, walls, ground, coursing, bond, poles, lines });
  const reasons = [walls, ground, coursing, bond, poles, marks, lines].flatMap((part) => part.reasons);
  return { walls, ground, coursing, bond, poles, marks, lines, takeoff, reasons };
}
