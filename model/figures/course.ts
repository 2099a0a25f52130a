/** One course of the building in plan: its units, closers and openings, and what the line is set to at each pole. */
import type { CourseWalk, CourseRun } from '../courseWalk/types';
import type { Drawing } from '../drawing/schema';
import { ticks } from '../length/ticks';
import type { PlanPoint } from '../geometry/point';
import type { SetOut } from '../setOut';
import type { RunGeometry } from '../walls/types';
import { boundsOf } from './bounds';
import type { Figure, LabelScale, Shape } from './figure';
import { onRun, stripOnRun } from './onRun';

export interface CourseFigureOptions {
  readonly scale: LabelScale;
  /** The run, corner or pole that is selected, or null. */
  readonly selected: { readonly kind: string; readonly id: string } | null;
  /** The length of each closer beside it; left out where a plan is small. */
  readonly cutLengths?: boolean;
}

/** Degrees by which a text along a run is turned, so that it reads from below or from the right. */
function readingTurn({ direction }: RunGeometry): number {
  const turn = (Math.atan2(direction.y, direction.x) * 180) / Math.PI;
  return turn > 90 || turn <= -90 ? turn + (turn > 0 ? -180 : 180) : turn;
}

/** Units side by side make one strip; head joints are lines across it, so that a run is a few shapes however long. */
function drawRun(course: CourseRun, run: RunGeometry, options: CourseFigureOptions): Shape[] {
  const thing = { kind: 'run', id: run.runId } as const;
  const emphasis = options.selected?.kind === 'run' && options.selected.id === run.runId ? 'selected' : 'plain';
  const shapes: Shape[] = [];
  const joints: PlanPoint[][] = [];
  const closers: Shape[] = [];
  const across = (at: number) => [onRun(run, at, 0), onRun(run, at, run.thickness)];
  const own = course.pieces.filter((piece) => piece.kind !== 'return');
  let from: number | null = null;
  own.forEach((piece, i) => {
    from ??= piece.start;
    joints.push(across(piece.start), across(piece.end));
    const next = own[i + 1];
    const isGap = !next || course.gaps.some((gap) => gap.from < next.start && gap.to > piece.end);
    if (isGap) {
      const points = stripOnRun(run, from, piece.end, 0, run.thickness);
      shapes.push({ kind: 'polygon', role: 'unit', thing, emphasis, points });
      from = null;
    }
    if (piece.kind !== 'closer') return;
    const points = stripOnRun(run, piece.start, piece.end, 0, run.thickness);
    closers.push({ kind: 'polygon', role: 'closer', thing, points, hatched: true });
    if (options.cutLengths)
      closers.push({
        kind: 'text',
        role: 'dimension',
        thing,
        at: onRun(run, (piece.start + piece.end) / 2, run.thickness / 2),
        text: { kind: 'measure', length: ticks(piece.end - piece.start) },
        size: 'small',
        turn: readingTurn(run),
        anchor: 'middle',
      });
  });
  shapes.push(...closers);
  if (joints.length > 0) shapes.push({ kind: 'lines', role: 'joint', thing, lines: joints });
  for (const gap of course.gaps)
    shapes.push({
      kind: 'polygon',
      role: gap.what,
      thing: { kind: 'opening', id: gap.openingId },
      points: stripOnRun(run, gap.from, gap.to, 0, run.thickness),
    });
  return shapes;
}

/** The line of the course along each run's outside face, from pole to pole. */
function drawLines(setOut: SetOut): Shape {
  const lines = setOut.walls.runs
    .filter((run) => run.length > 0)
    .map((run): PlanPoint[] => [onRun(run, 0, 0), onRun(run, run.length, 0)]);
  return { kind: 'lines', role: 'line', lines };
}

function drawPoles(walk: CourseWalk, setOut: SetOut, options: CourseFigureOptions): Shape[] {
  const at = new Map(setOut.poles.poles.map((pole) => [pole.id, pole.at]));
  const drop = options.scale.textHeight.letter + options.scale.textHeight.dimension;
  return walk.lines.flatMap((setting): Shape[] => {
    const place = at.get(setting.poleId);
    if (!place) return [];
    const thing = { kind: 'pole', id: setting.poleId } as const;
    const emphasis = options.selected?.kind === 'pole' && options.selected.id === setting.poleId ? 'selected' : 'plain';
    const role = setting.beyondHead ? 'caution' : 'mark';
    const text = { kind: 'text', thing, emphasis, turn: 0, anchor: 'middle' } as const;
    return [
      { kind: 'dot', role: 'pole', thing, emphasis, at: place, size: 'large' },
      {
        ...text,
        role: 'letter',
        at: { x: place.x, y: ticks(Math.round(place.y + options.scale.textHeight.letter)) },
        text: { kind: 'literal', text: setting.letter },
        size: 'letter',
        framed: true,
      },
      {
        ...text,
        role,
        at: { x: place.x, y: ticks(Math.round(place.y - drop)) },
        text: { kind: 'measure', length: setting.printed.fromLine },
        size: 'dimension',
      },
    ];
  });
}

/**
 * The plan of one course from its walk. Whole units are strips with their joints across, closers are hatched, openings
 * and lintels stand in their places; each pole has its letter and how far its mark lies from the level line.
 */
export function courseFigure(drawing: Drawing, setOut: SetOut, walk: CourseWalk, options: CourseFigureOptions): Figure {
  const tape = { units: drawing.units, step: drawing.tapeStep };
  const shapes: Shape[] = [];
  for (const course of walk.runs) {
    const run = setOut.walls.runById.get(course.runId);
    if (run && run.length > 0) shapes.push(...drawRun(course, run, options));
  }
  shapes.push(drawLines(setOut), ...drawPoles(walk, setOut, options));
  return { name: 'course', bounds: boundsOf(shapes, options.scale, tape), tape, shapes };
}
