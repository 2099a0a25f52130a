/** What can be done where the bedding is thicker than its most, and what each way takes, in plain quantities. */
import type { Drawing } from '../drawing/schema';
import { roundTicks, ticks, type Ticks } from '../length/ticks';
import type { RunGeometry, Walls } from '../walls/types';
import { beddingPieces, PER_CUBIC_MM } from './bedding';
import { coursedType } from './coursedType';
import { deeperThan, mapDepths, stretchesOf, volumeOver, type DepthPiece } from './depthPieces';
import type { Ground } from './types';

/** A part of a run where the work is done. */
export interface BeddingStretch {
  readonly runId: string;
  readonly from: Ticks;
  readonly to: Ticks;
  /** Thickest bedding, deepest grinding or thickest levelling within it. */
  readonly deepest: Ticks;
}

/**
 * `layers`: the thick bedding in beds, each set before the next. `grind`: the high stretches down until everywhere is
 * within. `levellingCourse`: a level strip on the low stretches, of concrete or of thinner units, under the first course.
 */
export interface BeddingChoice {
  readonly kind: 'layers' | 'grind' | 'levellingCourse';
  readonly stretches: readonly BeddingStretch[];
  /** Of all stretches together. */
  readonly length: Ticks;
  /** Most of any stretch. */
  readonly deepest: Ticks;
  /** Beds that the thickest place takes, one on the other: 1 where nothing is laid twice. */
  readonly beds: number;
  /** Bedding mortar of the whole building this way, and less than with everything bedded as it is; cubic millimetres. */
  readonly mortar: number;
  readonly mortarSaved: number;
  /** Concrete ground away, and levelling laid, in cubic millimetres. */
  readonly ground: number;
  readonly levelling: number;
  /** How much lower every mark is than before: grinding lowers the high point. */
  readonly lower: Ticks;
  /** Height of a thinner unit that would do for the whole levelling course, one bed joint over it; null where none would. */
  readonly unitHeight: { readonly least: Ticks; readonly most: Ticks } | null;
  /** How many such units the stretches take; 0 where none would do. */
  readonly units: number;
}

interface BeddedRun {
  readonly run: RunGeometry;
  readonly pieces: readonly DepthPiece[];
}

/**
 * The choices where bedding somewhere passes the most that the wall type allows, as a table; empty where it does not.
 * Nothing is recommended: thickening is what crews do (common practice, no source), and the quantities let them weigh
 * the others against it.
 */
export function beddingChoices(drawing: Drawing, walls: Walls, ground: Ground): readonly BeddingChoice[] {
  const { most } = coursedType(drawing).bedding;
  const runs = beddedRuns(drawing, walls, ground);
  const thickest = roundTicks(deepestOf(runs.flatMap(({ pieces }) => pieces)));
  if (thickest <= most) return [];
  return [
    inLayers(runs, most, thickest),
    grindBy(drawing, walls, ground, ticks(thickest - most)),
    levellingCourse(drawing, runs, thickest),
  ];
}

function inLayers(runs: readonly BeddedRun[], most: Ticks, thickest: Ticks): BeddingChoice {
  const stretches = stretchesWhere(runs, (pieces) => deeperThan(pieces, most));
  return {
    ...nothing('layers', runs, stretches),
    // No bed may be laid at all where the most is zero: one for each tick would say nothing.
    beds: most === 0 ? 0 : Math.ceil(thickest / most),
  };
}

/**
 * Grinding every place within `depth` of the high point down to that level: the high point, the first course and every
 * mark come down by it, and the bedding elsewhere with them. `depth` above zero, in ticks.
 */
export function grindBy(drawing: Drawing, walls: Walls, ground: Ground, depth: Ticks): BeddingChoice {
  const runs = beddedRuns(drawing, walls, ground);
  // A place stands over the new level by what its bedding lacks to least + depth.
  const over = (pieces: readonly DepthPiece[]) =>
    deeperThan(
      mapDepths(pieces, (bedding) => ground.leastBedding + depth - bedding),
      0,
    );
  const before = volumeOf(runs, (pieces) => pieces);
  const removed = volumeOf(runs, over);
  const saved = volumeOf(runs, (pieces) => mapDepths(pieces, () => depth)) - removed;
  return {
    ...nothing('grind', runs, stretchesWhere(runs, over)),
    mortar: before - saved,
    mortarSaved: saved,
    ground: removed,
    lower: depth,
  };
}

function levellingCourse(drawing: Drawing, runs: readonly BeddedRun[], thickest: Ticks): BeddingChoice {
  const type = coursedType(drawing);
  const { least, most } = type.bedding;
  const low = (pieces: readonly DepthPiece[]) => deeperThan(pieces, most);
  // The strip's top leaves the least bedding over it.
  const strip = (pieces: readonly DepthPiece[]) => mapDepths(low(pieces), (bedding) => bedding - least);
  const before = volumeOf(runs, (pieces) => pieces);
  const levelling = volumeOf(runs, strip);
  const joint = type.bedJoint.nominal;
  // One unit and its joint must leave a bedding inside its limits at the thinnest place (just over the most) and the thickest.
  const unitHeight = {
    least: ticks(Math.max(1, thickest - most - joint)),
    most: ticks(most - least - joint),
  };
  const possible = unitHeight.least <= unitHeight.most;
  const stretches = stretchesWhere(runs, strip);
  const module = (type.laid === 'stretcher' ? type.unit.length : type.unit.width) + type.headJoint.nominal;
  return {
    ...nothing('levellingCourse', runs, stretches),
    mortar: before - levelling,
    mortarSaved: levelling,
    levelling,
    unitHeight: possible ? unitHeight : null,
    units: possible ? stretches.reduce((sum, { from, to }) => sum + Math.ceil((to - from) / module), 0) : 0,
  };
}

function nothing(
  kind: BeddingChoice['kind'],
  runs: readonly BeddedRun[],
  stretches: readonly BeddingStretch[],
): BeddingChoice {
  return {
    kind,
    stretches,
    length: ticks(stretches.reduce((sum, { from, to }) => sum + (to - from), 0)),
    deepest: ticks(stretches.reduce((most, { deepest }) => Math.max(most, deepest), 0)),
    beds: 1,
    mortar: volumeOf(runs, (pieces) => pieces),
    mortarSaved: 0,
    ground: 0,
    levelling: 0,
    lower: ticks(0),
    unitHeight: null,
    units: 0,
  };
}

function beddedRuns(drawing: Drawing, walls: Walls, ground: Ground): readonly BeddedRun[] {
  const openings = new Map(drawing.openings.map((opening) => [opening.id, opening]));
  return walls.runs.map((run) => ({ run, pieces: beddingPieces(run, walls, ground, openings) }));
}

function deepestOf(pieces: readonly DepthPiece[]): number {
  return pieces.reduce((most, { start, end }) => Math.max(most, start, end), 0);
}

function stretchesWhere(
  runs: readonly BeddedRun[],
  where: (pieces: readonly DepthPiece[]) => readonly DepthPiece[],
): readonly BeddingStretch[] {
  return runs.flatMap(({ run, pieces }) =>
    stretchesOf(where(pieces)).flatMap(({ from, to, deepest }): BeddingStretch[] => {
      // A mitre may reach past the corner; the stretch is measured on the outside face.
      const [start, end] = [roundTicks(Math.max(0, from)), roundTicks(Math.min(run.length, to))];
      return end > start ? [{ runId: run.runId, from: start, to: end, deepest: roundTicks(deepest) }] : [];
    }),
  );
}

/** In cubic millimetres. */
function volumeOf(runs: readonly BeddedRun[], shape: (pieces: readonly DepthPiece[]) => readonly DepthPiece[]): number {
  return runs.reduce((sum, { run, pieces }) => sum + volumeOver(run, shape(pieces)), 0) / PER_CUBIC_MM;
}
