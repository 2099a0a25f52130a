/** The level book: rods read over several set-ups, reduced by height of instrument and by rise and fall. */
import type { RodReading, RodSurvey } from '../drawing/surveySchema';
import { ticks, type Ticks } from '../length/ticks';
import { closeLevels, type Closure } from './closeLevels';
import { checkPegs, correctedRod, type Collimation } from './pegTest';

/** One row of the book, worked out. Heights are on the benchmark's datum. */
export interface BookRow {
  readonly reading: RodReading;
  /** 1 for the first place of the level. */
  readonly setUp: number;
  /** The rod, with the level's collimation taken out where the distance is known. */
  readonly rod: Ticks;
  /** Up or down from the row before it in the same set-up: one of the two is zero. */
  readonly rise: Ticks;
  readonly fall: Ticks;
  /** Height of the line of sight, as read. */
  readonly instrument: Ticks;
  /** Height of the point, as read. */
  readonly height: Ticks;
  /** What the closing adds; zero unless its misclosure was accepted. */
  readonly correction: Ticks;
  /** Height of the point in force. */
  readonly adjusted: Ticks;
}

/**
 * The check at the foot of the page: Σ backsights − Σ foresights = last − first = Σ rises − Σ falls (NAVEDTRA 14071, ch. 7).
 * It proves the arithmetic, not the readings. The last row counts as a foresight where its set-up has none yet.
 */
export interface BookCheck {
  readonly backs: Ticks;
  readonly fores: Ticks;
  readonly rises: Ticks;
  readonly falls: Ticks;
  readonly first: Ticks;
  readonly last: Ticks;
  readonly holds: boolean;
}

export interface LevelBook {
  readonly rows: readonly BookRow[];
  readonly check: BookCheck;
  readonly closure: Closure;
  readonly collimation: Collimation | null;
  /** Height of the level line on the benchmark's datum. */
  readonly levelLine: Ticks;
}

/** A row before the closing is known. */
export type RawRow = Omit<BookRow, 'correction' | 'adjusted'>;

/**
 * Reduces the book in whole ticks, so that nothing is lost. `coefficient` is the misclosure allowed, in mm for each root
 * of a kilometre. A row out of order (an intermediate sight before any backsight) can't come through the schema; it
 * would be taken from the benchmark.
 */
export function reduceBook(survey: RodSurvey, coefficient: number): LevelBook {
  const collimation = survey.pegTest ? checkPegs(survey.pegTest) : null;
  const slope = collimation?.slope ?? null;
  const first = survey.benchmark.height;
  const raw: RawRow[] = [];
  let [point, instrument, before, setUp] = [first, first, ticks(0), 0];
  let [backs, fores, rises, falls] = [0, 0, 0, 0];
  for (const reading of survey.readings) {
    const rod = correctedRod(reading.rod, reading.distance, slope);
    let up = 0;
    if (reading.sight === 'back') {
      setUp += 1;
      instrument = ticks(point + rod);
      backs += rod;
    } else {
      up = before - rod;
      point = ticks(instrument - rod);
      if (reading.sight === 'fore') fores += rod;
    }
    const rise = ticks(Math.max(0, up));
    const fall = ticks(Math.max(0, -up));
    rises += rise;
    falls += fall;
    raw.push({ reading, setUp, rod, rise, fall, instrument, height: point });
    before = rod;
  }
  // A set-up with no foresight yet: its last row stands for one.
  const end = raw[raw.length - 1];
  if (end && end.reading.sight !== 'fore') fores += end.rod;
  const closure = closeLevels(survey, raw, coefficient);
  const rows = raw.map((row, i): BookRow => {
    const correction = closure.corrections[i] ?? ticks(0);
    return { ...row, correction, adjusted: ticks(row.height + correction) };
  });
  const last = end?.height ?? first;
  const risen = rises - falls;
  return {
    rows,
    check: {
      backs: ticks(backs),
      fores: ticks(fores),
      rises: ticks(rises),
      falls: ticks(falls),
      first,
      last,
      holds: backs - fores === last - first && risen === last - first,
    },
    closure,
    collimation,
    levelLine: survey.levelLine ?? highestSight(rows, first),
  };
}

/** The highest line of sight that a point was read through: none of them lies above it. */
function highestSight(rows: readonly BookRow[], none: Ticks): Ticks {
  const read = rows.filter(({ reading }) => reading.sight !== 'back');
  const lines = (read.length > 0 ? read : rows).map(({ instrument, correction }) => instrument + correction);
  return lines.length === 0 ? none : ticks(lines.reduce((high, line) => Math.max(high, line), -Infinity));
}
