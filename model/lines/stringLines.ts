/** The mason's lines: how long to cut each, how far it sags, and where it wants a trig. */
import type { Drawing } from '../drawing/schema';
import { roundTicks, ticks, type Ticks } from '../length/ticks';
import type { PoleSet } from '../poles/types';
import type { Reason } from '../reasons';
import { ruleValue } from '../rules/registry';
import type { Walls } from '../walls/types';
import { pullFor, sagExact, sagOf } from './sag';
import { spansOf } from './spans';
import type { LineRun, Lines } from './types';

/** More trigs than this on one line is no line: the rule's limit can't be held. */
const MOST_TRIGS = 20;

/**
 * Strings every line of the building with the kit's line and pull. A line that sags by more than the rule
 * `lineSagMost`, or is as long as the rule `lineMost`, gets trigs at equal spacing, as few as keep both.
 */
export function stringLines(drawing: Drawing, walls: Walls, poles: PoleSet): Lines {
  const { lineBlock, lineWeight, linePull } = drawing.poleKit;
  const sagMost = ruleValue(drawing, 'lineSagMost');
  const lengthMost = ruleValue(drawing, 'lineMost');
  const reasons: Reason[] = [];
  const lines = spansOf(walls, poles).map((span): LineRun => {
    const sag = sagOf(span.length, lineWeight, linePull);
    const parts = 1 + trigsFor(span.length, (part) => sagExact(part, lineWeight, linePull) <= sagMost, lengthMost);
    const sagWithTrigs = sagOf(roundTicks(span.length / parts), lineWeight, linePull);
    if (sag > sagMost) {
      reasons.push({
        code: 'lineSags',
        weight: sagWithTrigs > sagMost ? 'warning' : 'note',
        thing: { kind: 'run', id: span.runId },
        rule: 'lineSagMost',
        amount: roundTicks(sag - sagMost),
      });
    }
    return {
      runId: span.runId,
      fromPoleId: span.fromPoleId,
      toPoleId: span.toPoleId,
      span: span.length,
      cut: ticks(span.length + 2 * lineBlock),
      sag,
      trigs: Array.from({ length: parts - 1 }, (_, i) => roundTicks(((i + 1) * span.length) / parts)),
      sagWithTrigs,
      pullWithoutTrigs: pullFor(span.length, lineWeight, sagMost),
    };
  });
  return { lines, reasons };
}

/** The fewest trigs that hold every part of the line; at most `MOST_TRIGS`. */
function trigsFor(span: Ticks, holds: (part: number) => boolean, lengthMost: number): number {
  const least = lengthMost > 0 && span >= lengthMost ? 1 : 0;
  for (let trigs = least; trigs < MOST_TRIGS; trigs++) {
    const part = span / (trigs + 1);
    if (holds(part) && (lengthMost <= 0 || part <= lengthMost)) return trigs;
  }
  return MOST_TRIGS;
}
