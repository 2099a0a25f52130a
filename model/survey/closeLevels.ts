/** The closing of a round of levels: its misclosure against the one allowed, and its sharing out. */
import type { RodSurvey } from '../drawing/surveySchema';
import { roundTicks, ticks, TICKS_PER_MM, type Ticks } from '../length/ticks';
import type { RawRow } from './levelBook';

const TICKS_PER_KM = 1_000_000 * TICKS_PER_MM;

/**
 * `open`: the last point's height is not known, or its foresight not taken. `unchecked`: closed, with no length to judge
 * the miss by. `accepted`: within what is allowed, and shared out. `refused`: beyond it, and left as it is.
 */
export type ClosureState = 'open' | 'unchecked' | 'accepted' | 'refused';

export interface Closure {
  readonly state: ClosureState;
  /** Height carried to the last foresight's point, less its known height; null while open. */
  readonly misclosure: Ticks | null;
  /** The most that the rule allows for this length; null where the length is not known. */
  readonly allowed: Ticks | null;
  /** Length levelled: as given, else the sum of the back and foresights; null where neither is known. */
  readonly length: Ticks | null;
  /** How it was shared out; null unless accepted. Set-ups where distances were asked for but are not all there. */
  readonly by: 'distance' | 'setUps' | null;
  /** What each row's height gains, by its place in the book. */
  readonly corrections: readonly Ticks[];
}

/** The misclosure allowed for a length levelled: coefficient × √K, K in kilometres (third order: 12 mm √K, NOAA/FGCS, secondary). */
export function allowedMisclosure(length: Ticks, coefficient: number): Ticks {
  return roundTicks(coefficient * TICKS_PER_MM * Math.sqrt(Math.max(0, length) / TICKS_PER_KM));
}

/**
 * Closes a reduced book. An accepted misclosure is shared out in proportion to the distance levelled up to each set-up's
 * end, or to the number of set-ups. Every point of a set-up moves with its line of sight, so heights read from one
 * place keep their differences; each share is rounded once from the exact proportion, and the last is the whole
 * misclosure, so that the shares add up to it exactly.
 */
export function closeLevels(survey: RodSurvey, rows: readonly RawRow[], coefficient: number): Closure {
  const sights = sightsBySetUp(rows);
  const summed = sights.reduce<number | null>((sum, one) => (sum === null || one === null ? null : sum + one), 0);
  const length = survey.length ?? (summed ? ticks(summed) : null);
  const allowed = length === null ? null : allowedMisclosure(length, coefficient);
  const end = rows[rows.length - 1];
  const none = rows.map(() => ticks(0));
  if (survey.closing === null || !end || end.reading.sight !== 'fore')
    return { state: 'open', misclosure: null, allowed, length, by: null, corrections: none };
  const misclosure = ticks(end.height - survey.closing);
  if (allowed === null || Math.abs(misclosure) > allowed) {
    const state = allowed === null ? 'unchecked' : 'refused';
    return { state, misclosure, allowed, length, by: null, corrections: none };
  }
  const by = survey.share === 'distance' && summed ? 'distance' : 'setUps';
  const whole = by === 'distance' ? (summed as number) : sights.length;
  let reached = 0;
  const shares = sights.map((distance) => {
    reached += by === 'distance' ? (distance as number) : 1;
    return roundTicks((-misclosure * reached) / whole);
  });
  const corrections = rows.map(({ setUp, reading }) => {
    // A backsight's point is the turning point before: it took its share with the foresight there.
    const share = reading.sight === 'back' ? setUp - 2 : setUp - 1;
    return shares[share] ?? ticks(0);
  });
  return { state: 'accepted', misclosure, allowed, length, by, corrections };
}

/** Length of each set-up's backsight and foresight together; null where one was not taken. */
function sightsBySetUp(rows: readonly RawRow[]): (number | null)[] {
  const sums: (number | null)[] = [];
  for (const { reading, setUp } of rows) {
    const i = Math.max(0, setUp - 1);
    if (reading.sight === 'intermediate') continue;
    const sum = sums[i] === undefined ? 0 : sums[i];
    sums[i] = sum === null || reading.distance === undefined ? null : sum + reading.distance;
  }
  return sums;
}
