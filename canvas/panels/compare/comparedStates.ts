/** The two states that are compared, solved, and the numbers that join the words to the drawing. */
import { compareDrawings, type ComparedState } from '../../../model/compare/compare';
import type { Change, Comparison } from '../../../model/compare/types';
import type { Drawing } from '../../../model/drawing/schema';
import type { Survey } from '../../../model/drawing/surveySchema';
import type { PlanNote } from '../../../model/figures/planContext';
import { solve } from '../../../model/setOut';
import type { ThingRef } from '../../../model/things';

export interface State {
  readonly drawing: Drawing;
  readonly survey: Survey;
}

/** Everything that changed about one thing, under one number. */
export interface NumberedChanges {
  readonly number: number;
  readonly thing: ThingRef;
  readonly changes: readonly Change[];
}

export interface Compared {
  readonly before: ComparedState;
  readonly after: ComparedState;
  readonly comparison: Comparison;
  readonly numbered: readonly NumberedChanges[];
  /** The numbers as notes on each plan, for the things that it has. */
  readonly notesBefore: readonly PlanNote[];
  readonly notesAfter: readonly PlanNote[];
}

const keyOf = (thing: ThingRef) => `${thing.kind} ${thing.id}`;

function numberChanges(changes: readonly Change[]): NumberedChanges[] {
  const byThing = new Map<string, Change[]>();
  for (const change of changes) {
    const there = byThing.get(keyOf(change.thing));
    if (there) there.push(change);
    else byThing.set(keyOf(change.thing), [change]);
  }
  return [...byThing.values()].flatMap((of, i) => {
    const [first] = of;
    return first ? [{ number: i + 1, thing: first.thing, changes: of }] : [];
  });
}

function notesFor(numbered: readonly NumberedChanges[], things: readonly ThingRef[]): PlanNote[] {
  const there = new Set(things.map(keyOf));
  return numbered
    .filter(({ thing }) => there.has(keyOf(thing)))
    .map(({ number, thing }) => ({ thing, text: { kind: 'literal', text: String(number) } }));
}

/** Solves both and compares them. */
export function compareStates(before: State, after: State): Compared {
  const solved = (state: State): ComparedState => ({ ...state, setOut: solve(state.drawing, state.survey) });
  const [was, is] = [solved(before), solved(after)];
  const comparison = compareDrawings(was, is);
  const numbered = numberChanges(comparison.changes);
  return {
    before: was,
    after: is,
    comparison,
    numbered,
    notesBefore: notesFor(numbered, comparison.differingBefore),
    notesAfter: notesFor(numbered, comparison.differingAfter),
  };
}
