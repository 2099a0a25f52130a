import type { Drawing } from '../drawing/schema';
import { ticks } from '../length/ticks';
import { ruleValue } from '../rules/registry';
import type { SquareLimits } from './checkSquare';

/** The tape's step as its accuracy, and how far a length may be out by the rule in force. */
export function squareLimits(drawing: Pick<Drawing, 'tapeStep' | 'ruleValues'>): SquareLimits {
  return { accuracy: drawing.tapeStep, most: ticks(ruleValue(drawing, 'squareMost')) };
}
