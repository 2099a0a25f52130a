/** Words and numbers of an elevation, in columns beside the wall: course numbers left, heights right, lengths below. */
import type { PlanPoint } from '../geometry/point';
import { roundTicks, type Ticks } from '../length/ticks';
import type { ThingRef } from '../things';
import type { ElevationContext } from './elevation';
import { polesOfRun } from './elevationPoles';
import { foundationLine } from './elevationWall';
import type { FigureText, Role, Shape } from './figure';
import { spreadApart } from './spread';
import { textBox } from './text';

interface HeightLabel {
  readonly height: Ticks;
  readonly text: FigureText;
  readonly role: Role;
  readonly thing?: ThingRef;
}

/** Texts in a column, each joined to its height by a leader. */
function column(context: ElevationContext, labels: readonly HeightLabel[], edge: number, side: -1 | 1): void {
  const { scale } = context.options;
  const height = scale.textHeight.small;
  const sorted = [...labels].sort((a, b) => a.height - b.height);
  const places = spreadApart(
    sorted.map((label) => label.height),
    height * 1.25,
  );
  sorted.forEach((label, i) => {
    const y = roundTicks(places[i] ?? label.height);
    const text = edge + side * height * 1.5;
    const leader = [
      { x: roundTicks(edge), y: label.height },
      { x: roundTicks(edge + side * height * 0.5), y: label.height },
      { x: roundTicks(text - side * height * 0.3), y },
    ];
    // The level line runs up to its own name; only a name moved off it needs a leader.
    if (label.role !== 'level-line' || y !== label.height)
      context.shapes.push({ kind: 'lines', role: 'dimension', lines: [leader] });
    context.shapes.push({
      kind: 'text',
      role: label.role,
      thing: label.thing,
      at: { x: roundTicks(text), y },
      text: label.text,
      size: 'small',
      turn: 0,
      anchor: side === 1 ? 'start' : 'end',
    });
  });
}

function heightLabels(context: ElevationContext): HeightLabel[] {
  const { setOut, drawing, run } = context;
  const ids = new Set(setOut.walls.openingsByRun.get(run.runId) ?? []);
  const labels: HeightLabel[] = [
    { height: setOut.ground.levelLine, text: { kind: 'word', key: 'walls.levelLine' }, role: 'level-line' },
  ];
  const seen = new Set<string>();
  const add = (key: string, height: Ticks, role: Role, thing: ThingRef) => {
    if (seen.has(`${key} ${height}`)) return;
    seen.add(`${key} ${height}`);
    labels.push({ height, text: { kind: 'labelled', key, length: height }, role, thing });
  };
  for (const opening of drawing.openings) {
    if (!ids.has(opening.id)) continue;
    const thing = { kind: 'opening', id: opening.id } as const;
    if (opening.sill > 0) add('walls.sill', opening.sill, 'frame', thing);
    add('walls.head', opening.head, 'frame', thing);
  }
  for (const lift of setOut.coursing.lifts) {
    const thing = { kind: 'lift', id: String(lift.number) } as const;
    if (lift.beam) {
      add('walls.beamSoffit', lift.beam.soffit, 'note', { kind: 'bondBeam', id: lift.beam.id });
      add('walls.beamTop', lift.beam.top, 'note', { kind: 'bondBeam', id: lift.beam.id });
    } else add('walls.wallTop', lift.top, 'note', thing);
  }
  return labels;
}

/** Course numbers: the first, the selected, and every fifth; no two nearer than a text's height. */
function courseLabels(context: ElevationContext): HeightLabel[] {
  const { selectedCourse } = context.options;
  const { courses } = context.setOut.coursing;
  const last = courses[courses.length - 1]?.number;
  return courses
    .filter(({ number }) => number === 1 || number % 5 === 0 || number === last || number === selectedCourse)
    .map((course) => ({
      height: course.top,
      text: { kind: 'literal', text: String(course.number) },
      role: course.number === selectedCourse ? 'mark-main' : 'note',
      thing: { kind: 'course', id: String(course.number) },
    }));
}

/** Running distances of the jambs from the first corner, written upright under them, and the whole run below. */
function lengthLabels(context: ElevationContext): Shape[] {
  const { run, setOut, drawing, options, tape } = context;
  const { scale } = options;
  const small = scale.textHeight.small;
  const below = Math.min(...foundationLine(context).map((point) => point.y)) - small * 1.2;
  const openingById = new Map(drawing.openings.map((opening) => [opening.id, opening]));
  const jambs = (setOut.walls.openingsByRun.get(run.runId) ?? []).flatMap((id) => {
    const opening = openingById.get(id);
    return opening ? [opening.at, roundTicks(opening.at + opening.width)] : [];
  });
  const shapes: Shape[] = [];
  const ticksDown: PlanPoint[][] = [];
  let deepest = 0;
  let clear = -Infinity;
  for (const at of [...new Set(jambs)].sort((a, b) => a - b)) {
    ticksDown.push([
      { x: at, y: roundTicks(below - small * 0.15) },
      { x: at, y: roundTicks(below - small * 0.6) },
    ]);
    if (at - clear < small * 1.15) continue;
    clear = at;
    const text: FigureText = { kind: 'measure', length: at };
    deepest = Math.max(deepest, textBox(text, 'small', false, scale, tape).width);
    const place = { x: at, y: roundTicks(below - small * 0.85) };
    shapes.push({ kind: 'text', role: 'dimension', at: place, text, size: 'small', turn: 90, anchor: 'end' });
  }
  if (ticksDown.length > 0) shapes.push({ kind: 'lines', role: 'dimension', lines: ticksDown });
  const { width } = textBox({ kind: 'measure', length: run.length }, 'dimension', false, scale, tape);
  if (run.length < width + scale.textHeight.dimension) return shapes;
  const y = roundTicks(below - (deepest > 0 ? deepest + small : 0) - scale.textHeight.dimension);
  shapes.push({
    kind: 'dimension',
    role: 'dimension',
    from: { x: roundTicks(0), y },
    to: { x: run.length, y },
    length: run.length,
    textAt: { x: roundTicks(run.length / 2), y },
    turn: 0,
  });
  return shapes;
}

/** The letters of the run's two corners, over the poles' heads. */
function cornerLetters(context: ElevationContext): Shape[] {
  const { run, setOut, options } = context;
  const spans = polesOfRun(context);
  const height = options.scale.textHeight.letter;
  return run.ends.flatMap((end, i): Shape[] => {
    const corner = setOut.walls.cornerById.get(end.cornerId);
    if (!corner) return [];
    const span = spans.find((each) => each.pole.cornerId === end.cornerId);
    const marks = setOut.marks.poles.find((each) => each.poleId === span?.pole.id);
    const x = span ? (span.left + span.right) / 2 : i === 0 ? 0 : run.length;
    const top = Math.max(marks?.head ?? 0, setOut.coursing.top);
    return [
      {
        kind: 'text',
        role: 'letter',
        thing: span ? { kind: 'pole', id: span.pole.id } : { kind: 'corner', id: end.cornerId },
        emphasis: span && span.pole.id === options.poleId ? 'selected' : 'plain',
        at: { x: roundTicks(x), y: roundTicks(top + height * 1.1) },
        text: { kind: 'literal', text: corner.letter },
        size: 'letter',
        turn: 0,
        anchor: 'middle',
        framed: true,
      },
    ];
  });
}

export function drawElevationLabels(context: ElevationContext): void {
  const spans = polesOfRun(context);
  const past = context.options.scale.textHeight.small * 0.4;
  const left = Math.min(0, spans[0]?.left ?? 0) - past;
  const right = Math.max(context.run.length, spans[spans.length - 1]?.right ?? 0) + past;
  column(context, courseLabels(context), left, -1);
  column(context, heightLabels(context), right, 1);
  if (context.options.dimensions !== false) context.shapes.push(...lengthLabels(context));
  context.shapes.push(...cornerLetters(context));
}
