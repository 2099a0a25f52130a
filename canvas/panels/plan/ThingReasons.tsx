import type { Reason } from '../../../model/reasons';
import type { ThingRef } from '../../../model/things';
import { wordReason } from '../../../model/words/wordReason';
import { Caution } from '../../ui/Caution';
import { say } from '../../ui/words';
import { useSolved } from '../workspace/workspace';
import { writerOf } from './tapeOf';

/** Whether a reason is about a thing: a corner answers for its pole and its braces. */
export function isAbout(reason: Reason, thing: ThingRef): boolean {
  const about = reason.thing;
  if (about.kind === thing.kind && about.id === thing.id) return true;
  if (thing.kind !== 'corner' && thing.kind !== 'pole') return false;
  if (about.kind === 'pole' || about.kind === 'corner') return about.id === thing.id;
  return about.kind === 'brace' && about.id.replace(/\.\d+$/, '') === thing.id;
}

/** What does not fit about the selected thing, at most two: the rest are in the list. */
export function ThingReasons({ thing }: { thing: ThingRef }) {
  const { drawing, survey, setOut } = useSolved();
  const write = writerOf(drawing);
  const mine = setOut.reasons.filter((reason) => isAbout(reason, thing));
  return mine
    .slice(0, 2)
    .map((reason, i) => (
      <Caution
        key={`${reason.code} ${i}`}
        bare
        weight={reason.weight}
        text={wordReason(reason, drawing, say, write, survey)}
      />
    ));
}
