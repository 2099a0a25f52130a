/** A wall run from outside as a figure: x along the run from its first corner, y above the foundation's high point. */
import type { Drawing } from '../drawing/schema';
import type { SetOut } from '../setOut';
import { boundsOf } from './bounds';
import { drawElevationLabels } from './elevationLabels';
import { drawElevationOpenings } from './elevationOpenings';
import { drawElevationPoles } from './elevationPoles';
import { drawElevationGround, drawElevationUnits } from './elevationWall';
import type { Figure, LabelScale, Shape, Tape } from './figure';
import type { RunGeometry } from '../walls/types';

export interface ElevationOptions {
  readonly scale: LabelScale;
  /** The course whose line is strung, or null. */
  readonly selectedCourse: number | null;
  /** The pole shown as selected, or null. */
  readonly poleId: string | null;
  /** Openings, bond beams … drawn as differing from the other revision: `kind id`. */
  readonly differing?: readonly { readonly kind: string; readonly id: string }[];
  /** Lengths under the wall. */
  readonly dimensions?: boolean;
}

export interface ElevationContext {
  readonly drawing: Drawing;
  readonly setOut: SetOut;
  readonly run: RunGeometry;
  readonly options: ElevationOptions;
  readonly tape: Tape;
  readonly shapes: Shape[];
  differs(kind: string, id: string): boolean;
}

/** The elevation of a run; null where there is no such run or it has no length. */
export function elevationFigure(
  drawing: Drawing,
  setOut: SetOut,
  runId: string,
  options: ElevationOptions,
): Figure | null {
  const run = setOut.walls.runById.get(runId);
  if (!run || run.length <= 0) return null;
  const differing = new Set((options.differing ?? []).map((thing) => `${thing.kind} ${thing.id}`));
  const tape = { units: drawing.units, step: drawing.tapeStep };
  const context: ElevationContext = {
    drawing,
    setOut,
    run,
    options,
    tape,
    shapes: [],
    differs: (kind, id) => differing.has(`${kind} ${id}`),
  };
  drawElevationGround(context);
  drawElevationUnits(context);
  drawElevationOpenings(context);
  drawElevationPoles(context);
  drawElevationLabels(context);
  return { name: 'elevation', bounds: boundsOf(context.shapes, options.scale, tape), tape, shapes: context.shapes };
}
