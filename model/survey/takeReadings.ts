/** Readings of either method as one: how far each station lies below the level line. */
import type { Drawing } from '../drawing/schema';
import type { Reading, Survey } from '../drawing/surveySchema';
import { ticks } from '../length/ticks';
import { ruleValue } from '../rules/registry';
import { reduceBook, type LevelBook } from './levelBook';

export interface TakenReadings {
  readonly readings: readonly Reading[];
  /** The level book worked out; null where the foundation was measured down. */
  readonly book: LevelBook | null;
}

/**
 * A rod survey as measured down: each station lies below the level line by their difference in height. Rows without a
 * station are turning points; a backsight is at the foresight's point before it and counts only as the first row, where it
 * stands on the benchmark. A level line given under a station makes that one's measure negative: up.
 */
export function takeReadings(survey: Survey, ruleValues: Drawing['ruleValues'] = {}): TakenReadings {
  if (survey.method === 'measureDown') return { readings: survey.readings, book: null };
  const book = reduceBook(survey, ruleValue({ ruleValues }, 'levelMisclosure'));
  const readings = book.rows.flatMap(({ reading, adjusted }, i): Reading[] => {
    const { id, station, sight } = reading;
    if (station === null || (sight === 'back' && i > 0)) return [];
    return [{ id, station, down: ticks(book.levelLine - adjusted) }];
  });
  return { readings, book };
}
