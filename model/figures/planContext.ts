/** What every part of the plan figure is made from, and where it puts its shapes. */
import type { Drawing, Opening } from '../drawing/schema';
import type { SetOut } from '../setOut';
import type { ThingRef } from '../things';
import type { Box, Emphasis, FigureText, LabelScale, Shape, Tape } from './figure';
import type { Obstacle } from './labels';

export interface PlanNote {
  readonly thing: ThingRef;
  readonly text: FigureText;
}

export interface PlanOptions {
  readonly selection: ThingRef | null;
  readonly scale: LabelScale;
  /** Things drawn as differing from the other revision. */
  readonly differing?: readonly ThingRef[];
  /** Short texts to stand beside things: the numbers of a list of changes. */
  readonly notes?: readonly PlanNote[];
  /** Lengths of the runs, outside. */
  readonly dimensions: boolean;
  /** Running distances of the jambs from each run's first corner, as on paper. */
  readonly running?: boolean;
  /** The course whose units are shown; the first by default. */
  readonly course?: number;
  /** Marks where something does not fit. */
  readonly cautions?: boolean;
  /** What is in view: labels of things inside it stay inside it. */
  readonly within?: Box | null;
}

export interface PlanContext {
  readonly drawing: Drawing;
  readonly setOut: SetOut;
  readonly options: PlanOptions;
  readonly tape: Tape;
  readonly openingById: ReadonlyMap<string, Opening>;
  readonly shapes: Shape[];
  readonly obstacles: Obstacle[];
  emphasisOf(kind: ThingRef['kind'], id: string): Emphasis;
}

export function planContext(drawing: Drawing, setOut: SetOut, options: PlanOptions): PlanContext {
  const differing = new Set((options.differing ?? []).map((thing) => `${thing.kind} ${thing.id}`));
  const { selection } = options;
  return {
    drawing,
    setOut,
    options,
    tape: { units: drawing.units, step: drawing.tapeStep },
    openingById: new Map(drawing.openings.map((opening) => [opening.id, opening])),
    shapes: [],
    obstacles: [],
    emphasisOf(kind, id) {
      if (selection?.kind === kind && selection.id === id) return 'selected';
      return differing.has(`${kind} ${id}`) ? 'differs' : 'plain';
    },
  };
}
