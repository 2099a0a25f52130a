/** Reasons in words: what is wrong and by how much, and what would free it. */
import type { Drawing } from '../drawing/schema';
import type { Survey } from '../drawing/surveySchema';
import type { Ticks } from '../length/ticks';
import type { Brace, StoryPole } from '../poles/types';
import type { Reason, ReasonCode } from '../reasons';
import type { ThingRef } from '../things';
import { listOf, nameThing } from './naming';
import type { Say } from './say';

/** Writes a length for reading, in the site's units and to its tape. */
export type WriteLength = (length: Ticks) => string;

/** What the full sentence of each reason needs; without all of it the plain one is said. */
const FULL: Readonly<Record<ReasonCode, readonly ('amount' | 'against')[] | null>> = {
  runHasNoLength: null,
  runsCross: ['against'],
  runsOverlap: ['against'],
  cornersCoincide: ['against'],
  tooManyRunsMeet: ['against'],
  cornerTooSharp: ['against'],
  runTooShortForCorner: ['amount'],
  unitHeightsDiffer: ['against', 'amount'],
  openingPastEnd: ['against', 'amount'],
  openingsOverlap: ['against', 'amount'],
  openingUpsideDown: ['amount'],
  openingAboveWall: ['amount'],
  lintelBearingPastEnd: ['against', 'amount'],
  readingOffDrawing: null,
  surveyAssumed: null,
  cornerNotRead: null,
  beddingOverMost: ['amount'],
  rereadingsDiffer: ['amount'],
  levelsNotClosed: null,
  misclosureUnchecked: ['amount'],
  misclosureOverMost: ['amount'],
  collimationOverMost: ['amount'],
  heightBelowFirstCourse: ['amount'],
  hardHeightNotMet: ['amount'],
  softHeightMissed: ['amount'],
  heightInsideBeam: ['against', 'amount'],
  noCoursesFit: null,
  liftTooTall: ['amount'],
  beamsOverlap: ['against', 'amount'],
  noWallTop: null,
  straightJoint: null,
  lapUnderLeast: ['amount'],
  pieceUnderLeast: ['amount'],
  runDoesNotBond: null,
  poleBlockedByFrame: ['against', 'amount'],
  poleBlocked: ['against'],
  braceBlocked: ['against'],
  braceAngleOut: ['against'],
  braceTooLong: ['amount'],
  poleTooShort: ['against', 'amount'],
  lineSags: ['amount'],
  searchBoundReached: null,
};

export const REASON_CODES = Object.keys(FULL) as readonly ReasonCode[];

function sentenceKey(reason: Reason): 'plain' | 'full' | 'line' | 'poles' {
  if (reason.code === 'poleBlockedByFrame' && reason.thing.kind === 'run' && reason.amount !== undefined) return 'line';
  if (reason.code === 'searchBoundReached' && reason.thing.kind === 'pole') return 'poles';
  const needs = FULL[reason.code];
  if (!needs) return 'plain';
  const has = { amount: reason.amount !== undefined, against: (reason.against?.length ?? 0) > 0 };
  return needs.every((need) => has[need]) ? 'full' : 'plain';
}

/** What is wrong, in one sentence. */
export function wordProblem(reason: Reason, drawing: Drawing, say: Say, write: WriteLength, survey?: Survey): string {
  const name = (thing: ThingRef, form: 'title' | 'running') =>
    nameThing(thing, drawing, say, survey ? { form, survey } : { form });
  return say(`reasons.${reason.code}.${sentenceKey(reason)}`, {
    thing: name(reason.thing, 'title'),
    running: name(reason.thing, 'running'),
    against: listOf(
      (reason.against ?? []).map((thing) => name(thing, 'running')),
      say,
    ),
    // Small misses still read as something: a length is never worded as less than nothing.
    amount: reason.amount === undefined ? '' : write(Math.abs(reason.amount) as Ticks),
  });
}

/** What would free it, in a sentence; null where nothing is known to. */
export function wordFix(reason: Reason, drawing: Drawing, say: Say, write: WriteLength): string | null {
  const { change, nearest } = reason;
  if (change) {
    const thing = nameThing(change.thing, drawing, say, { form: 'running' });
    return say(`reasons.fix.${change.kind}`, { thing, by: 'by' in change ? write(change.by) : '' });
  }
  if (!nearest || (nearest.below === null && nearest.above === null)) return null;
  const key = nearest.below === null ? 'above' : nearest.above === null ? 'below' : 'both';
  return say(`reasons.nearest.${key}`, {
    below: nearest.below === null ? '' : write(nearest.below),
    above: nearest.above === null ? '' : write(nearest.above),
  });
}

/** The problem and, where one is known, what would free it. */
export function wordReason(reason: Reason, drawing: Drawing, say: Say, write: WriteLength, survey?: Survey): string {
  const first = wordProblem(reason, drawing, say, write, survey);
  const second = wordFix(reason, drawing, say, write);
  return second === null ? first : say('reasons.sentences', { first, second });
}

/** How a brace stands: “turned 29° for the door in A–B”, “straight in line with A–B”. */
export function wordBrace(brace: Brace, drawing: Drawing, say: Say): string {
  if (brace.turned === 0)
    return say('reasons.straight', {
      run: nameThing({ kind: 'run', id: brace.inLineWith }, drawing, say, { form: 'running' }),
    });
  if (!brace.turnedFor) return say('reasons.turnedPlain', { degrees: brace.turned });
  const thing = nameThing(brace.turnedFor, drawing, say, { form: 'running' });
  return say('reasons.turned', { degrees: brace.turned, thing });
}

/** How a pole is set off, or null. */
export function wordSetOff(pole: StoryPole, drawing: Drawing, say: Say, write: WriteLength): string | null {
  if (!pole.setOff) return null;
  const run = nameThing({ kind: 'run', id: pole.setOff.runId }, drawing, say, { form: 'running' });
  const thing = nameThing(pole.setOff.for, drawing, say, { form: 'running' });
  return say('reasons.setOff', { by: write(pole.setOff.by), run, thing });
}
