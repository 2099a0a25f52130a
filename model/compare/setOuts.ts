/** What changed of the set-out by itself: bed joints, poles set off, braces turned. */
import type { CourseInterval, Coursing } from '../coursing/types';
import { roundTicks, type Ticks } from '../length/ticks';
import type { Brace, PoleSet } from '../poles/types';
import type { ThingRef } from '../things';
import type { Change } from './types';

/** The control that a stretch of equal courses runs up to, or its lift where none is met there. */
function goalOf(coursing: Coursing, interval: CourseInterval): { readonly thing: ThingRef; readonly goal: string } {
  const control = coursing.answer.controls.find((each) => each.got === interval.toHeight && each.course !== null);
  if (!control) return { thing: { kind: 'lift', id: String(interval.lift) }, goal: 'top' };
  return { thing: control.thing, goal: control.kind };
}

/** Joints of the stretches that run up to the same thing, where they differ by a quarter of the tape's step or more. */
export function compareJoints(before: Coursing, after: Coursing, tapeStep: Ticks): Change[] {
  const key = ({ thing, goal }: ReturnType<typeof goalOf>) => `${goal} ${thing.kind} ${thing.id}`;
  const old = new Map(before.answer.intervals.map((each) => [key(goalOf(before, each)), each]));
  return after.answer.intervals.flatMap((now): Change[] => {
    const { thing, goal } = goalOf(after, now);
    const was = old.get(key({ thing, goal }));
    if (!was || Math.abs(was.joint - now.joint) < tapeStep / 4) return [];
    const names = { goal, from: String(now.firstCourse), to: String(now.lastCourse) };
    return [{ code: 'jointChanged', thing, names, before: roundTicks(was.joint), after: roundTicks(now.joint) }];
  });
}

function braceChange(letter: string, was: Brace | undefined, now: Brace): Change | null {
  if (!was || was.turned === now.turned) return null;
  const names = { letter, brace: now.id.slice(now.id.lastIndexOf('.') + 1), degrees: String(now.turned) };
  const thing: ThingRef = { kind: 'brace', id: now.id };
  return { code: now.turned === 0 ? 'braceStraight' : 'braceTurned', thing, names, before: null, after: null };
}

export function comparePoles(before: PoleSet, after: PoleSet): Change[] {
  return after.poles.flatMap((now) => {
    const was = before.poleById.get(now.id);
    if (!was) return [];
    const changes: Change[] = [];
    const by = (pole: typeof now) => pole.setOff?.by ?? (0 as Ticks);
    if (by(was) !== by(now) || (by(now) > 0 && was.setOff?.runId !== now.setOff?.runId))
      changes.push({
        code: 'poleSetOff',
        thing: { kind: 'pole', id: now.id },
        names: { letter: now.letter },
        before: by(was),
        after: by(now),
      });
    const old = new Map(was.braces.map((brace) => [brace.id, brace]));
    for (const brace of now.braces) {
      const change = braceChange(now.letter, old.get(brace.id), brace);
      if (change) changes.push(change);
    }
    return changes;
  });
}
