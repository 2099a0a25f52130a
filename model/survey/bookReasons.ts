import type { Drawing } from '../drawing/schema';
import { mm, roundTicks, ticks } from '../length/ticks';
import type { Reason } from '../reasons';
import { ruleValue } from '../rules/registry';
import type { ThingRef } from '../things';
import type { LevelBook } from './levelBook';

const SITE: ThingRef = { kind: 'site', id: 'site' };
const TEN_METRES = mm(10_000);

/** What a level book gives cause to say: how it closes, and how the level stands. Nothing of an empty one. */
export function bookReasons(drawing: Drawing, { rows, closure, collimation }: LevelBook): readonly Reason[] {
  const reasons: Reason[] = [];
  const { state, misclosure, allowed } = closure;
  if (rows.length > 0 && state === 'open') reasons.push({ code: 'levelsNotClosed', weight: 'note', thing: SITE });
  if (misclosure !== null && state === 'unchecked') {
    const amount = ticks(Math.abs(misclosure));
    reasons.push({ code: 'misclosureUnchecked', weight: 'note', thing: SITE, rule: 'levelMisclosure', amount });
  }
  if (misclosure !== null && allowed !== null && state === 'refused') {
    const amount = ticks(Math.abs(misclosure) - allowed);
    reasons.push({ code: 'misclosureOverMost', weight: 'warning', thing: SITE, rule: 'levelMisclosure', amount });
  }
  const over = Math.abs(collimation?.slope ?? 0) - ruleValue(drawing, 'collimationMost');
  if (over > 0) {
    const amount = roundTicks(over * TEN_METRES);
    reasons.push({ code: 'collimationOverMost', weight: 'warning', thing: SITE, rule: 'collimationMost', amount });
  }
  return reasons;
}
