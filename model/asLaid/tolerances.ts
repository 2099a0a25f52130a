/** Tolerances of laid work, from the rules in force on a drawing. */
import type { Drawing } from '../drawing/schema';
import { feet, mm, roundTicks, ticks, type Ticks } from '../length/ticks';
import type { RuleId } from '../rules/ids';
import { ruleValue } from '../rules/registry';
import type { ToleranceSet } from './types';

type Rules = Pick<Drawing, 'ruleValues'>;

export interface Allowed {
  readonly rule: RuleId;
  readonly most: Ticks;
}

const TEN_FEET = feet(10);
const FIVE_METRES = mm(5000);

/**
 * How far a course may be out of level over a length. TMS 602 (secondary): 1/4 in in 10 ft, 1/2 in at most; over more than
 * 10 ft in proportion to the length, and never less than the 10 ft's. LABC (UK): 10 mm up to 5 m, 15 mm above.
 */
export function levelAllowed(rules: Rules, length: number, set: ToleranceSet = 'tms'): Allowed {
  if (set === 'labc') {
    const rule = length <= FIVE_METRES ? 'shortLevelMost' : 'longLevelMost';
    return { rule, most: ticks(ruleValue(rules, rule)) };
  }
  const inTenFeet = ruleValue(rules, 'levelTolerance');
  const most = ruleValue(rules, 'levelToleranceMost');
  const wanted = inTenFeet * Math.max(1, length / TEN_FEET);
  return wanted <= most
    ? { rule: 'levelTolerance', most: roundTicks(wanted) }
    : { rule: 'levelToleranceMost', most: ticks(most) };
}

/** How far a wall may lean over a height: 1/4 in in 10 ft, 3/8 in in 20 ft, 1/2 in at most (TMS 602, secondary). */
export function plumbAllowed(rules: Rules, height: number): Allowed {
  const rule =
    height <= TEN_FEET ? 'plumbTolerance' : height <= 2 * TEN_FEET ? 'plumbToleranceTwenty' : 'plumbToleranceMost';
  return { rule, most: ticks(ruleValue(rules, rule)) };
}
