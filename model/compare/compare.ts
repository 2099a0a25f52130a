/** Two states of a site compared: what changed, in the trade's terms, and which poles have to be marked again. */
import type { Drawing } from '../drawing/schema';
import type { Survey } from '../drawing/surveySchema';
import type { SetOut } from '../setOut';
import type { ThingRef } from '../things';
import { compareOpenings } from './openings';
import { polesToRemark } from './remark';
import { compareJoints, comparePoles } from './setOuts';
import { compareSettings, compareSurveys } from './settings';
import type { Change, Comparison } from './types';
import { compareCorners, compareRuns } from './walls';

export interface ComparedState {
  readonly drawing: Drawing;
  readonly survey: Survey;
  readonly setOut: SetOut;
}

const ONLY_BEFORE: ReadonlySet<Change['code']> = new Set([
  'runRemoved',
  'cornerRemoved',
  'openingRemoved',
  'keepClearRemoved',
  'controlRemoved',
  'beamRemoved',
]);
const ONLY_AFTER: ReadonlySet<Change['code']> = new Set([
  'runAdded',
  'cornerAdded',
  'openingAdded',
  'keepClearAdded',
  'controlAdded',
  'beamAdded',
]);

function thingsOf(changes: readonly Change[], without: ReadonlySet<Change['code']>): ThingRef[] {
  const seen = new Map<string, ThingRef>();
  for (const { code, thing } of changes) if (!without.has(code)) seen.set(`${thing.kind} ${thing.id}`, thing);
  return [...seen.values()];
}

/**
 * Compares two states of a site. Things are matched by their ids. Changes come in the order: walls, openings, areas and
 * heights, kit and rules, survey, and then what followed of itself: bed joints, poles and braces.
 */
export function compareDrawings(before: ComparedState, after: ComparedState): Comparison {
  const changes: Change[] = [
    ...compareCorners(before.drawing, after.drawing),
    ...compareRuns(before.drawing, after.drawing, before.setOut.walls, after.setOut.walls),
    ...compareOpenings(before.drawing, after.drawing),
    ...compareSettings(before.drawing, after.drawing),
    ...compareSurveys(before.survey, after.survey),
    ...compareJoints(before.setOut.coursing, after.setOut.coursing, after.drawing.tapeStep),
    ...comparePoles(before.setOut.poles, after.setOut.poles),
  ];
  return {
    changes,
    polesToRemark: polesToRemark(before.setOut.marks, after.setOut.marks),
    differingBefore: thingsOf(changes, ONLY_AFTER),
    differingAfter: thingsOf(changes, ONLY_BEFORE),
  };
}
