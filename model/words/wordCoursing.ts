/** What an answer of the coursing costs, in words, in the strict order that it is judged by. */
import type { ControlResult, CoursingAnswer, Proof } from '../coursing/types';
import type { Drawing } from '../drawing/schema';
import { roundToStep, ticks, type Ticks } from '../length/ticks';
import { coursedType } from '../survey/coursedType';
import { nameThing } from './naming';
import type { Say } from './say';
import type { WriteLength } from './wordReason';

/**
 * One sentence for every height that is missed by as much as the tape can show, the hard ones first; one for every thinner
 * course; and one for the joints.
 */
export function wordCost(answer: CoursingAnswer, drawing: Drawing, say: Say, write: WriteLength): string[] {
  const shown = answer.controls.filter((one) => roundToStep(one.miss, drawing.tapeStep) !== 0);
  const rank = (one: ControlResult): number => (one.hold === 'hard' ? 0 : one.met ? 2 : 1);
  const misses = [...shown].sort((a, b) => rank(a) - rank(b)).map((one) => wordMiss(one, drawing, say, write));
  const thinner = answer.intervals.flatMap(({ thin, lastCourse }) =>
    thin === undefined ? [] : [say('coursing.thinner', { course: lastCourse, size: write(thin) })],
  );
  const heights = misses.length > 0 ? misses : [say('coursing.everyHeightMet')];
  return [...heights, ...thinner, ...wordJoints(answer, drawing, say, write)];
}

function wordMiss(one: ControlResult, drawing: Drawing, say: Say, write: WriteLength): string {
  const thing = nameThing(one.thing, drawing, say, { form: 'running' });
  // A control height is called by its own name; only a thing with several heights says which.
  const which = one.thing.kind === 'controlHeight' ? 'other' : one.kind;
  const height = say(`coursing.height.${which === 'plate' || which === 'named' ? 'other' : which}`, { thing });
  const how = one.hold === 'hard' ? 'hard' : one.met ? 'within' : 'past';
  const way = one.miss > 0 ? 'Above' : 'Below';
  return say(`coursing.miss.${how}${way}`, { amount: write(ticks(Math.abs(one.miss))), height });
}

function wordJoints(answer: CoursingAnswer, drawing: Drawing, say: Say, write: WriteLength): string[] {
  const { tapeStep } = drawing;
  const joints = answer.intervals.map((interval) => interval.joint);
  if (joints.length === 0) return [];
  const { nominal } = coursedType(drawing).bedJoint;
  const onTape = (length: number): Ticks => roundToStep(length, tapeStep);
  const [thinnest, thickest] = [onTape(Math.min(...joints)), onTape(Math.max(...joints))];
  const largest = Math.max(...joints.map((joint) => Math.abs(joint - nominal)));
  if (onTape(largest) === 0 && thinnest === thickest && thinnest === onTape(nominal)) {
    return [say('coursing.nominalJoints', { joint: write(nominal) })];
  }
  const step = onTape(largest) === 0 ? say('coursing.hair', { step: write(tapeStep) }) : write(onTape(largest));
  return thinnest === thickest
    ? [say('coursing.evenJoints', { joint: write(thinnest), step })]
    : [say('coursing.joints', { thinnest: write(thinnest), thickest: write(thickest), step })];
}

/** How far an answer is known to be the best, in a sentence; null where it is proved, or was never searched for. */
export function wordProof(proof: Proof | undefined, say: Say): string | null {
  return proof === undefined || proof === 'all' ? null : say(`coursing.proof.${proof}`);
}
