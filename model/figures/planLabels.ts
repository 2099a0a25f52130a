/** The labels of the plan and every place where each could stand: corner letters, cautions, notes, dimensions. */
import type { PlanPoint, Vec } from '../geometry/point';
import { toPoint } from '../geometry/vec';
import type { ThingRef } from '../things';
import type { RunGeometry } from '../walls/types';
import type { DimensionShape, FigureText, Role, Shape, TextSize } from './figure';
import type { Label, Place } from './labels';
import { onRun } from './onRun';
import type { PlanContext } from './planContext';
import { placeOfThing } from './placeOfThing';
import { readableTurn, textBox, turnedQuad, type TextBox } from './text';

const DIRECTIONS = 16;
const DISTANCES = [0.35, 0.8, 1.5, 2.4, 3.6];

const grown = (box: TextBox, by: number): TextBox => ({ width: box.width + 2 * by, height: box.height + 2 * by });

/** Places all round an anchor, nearer first; `liked` is a direction it would rather stand in. */
function placesAround(
  context: PlanContext,
  anchor: Vec,
  box: TextBox,
  liked: Vec | null,
  shapesAt: (at: PlanPoint) => Shape[],
): Place[] {
  const { scale } = context.options;
  const unit = scale.textHeight.label;
  const covered = grown(box, scale.clear);
  return DISTANCES.flatMap((distance, ring) =>
    Array.from({ length: DIRECTIONS }, (_, step) => {
      const angle = (2 * Math.PI * step) / DIRECTIONS;
      const x = Math.cos(angle);
      const y = Math.sin(angle);
      // The box's own half size in this direction, so that every place on a ring is equally clear of the anchor.
      const half = Math.min(box.width / 2 / Math.max(Math.abs(x), 1e-9), box.height / 2 / Math.max(Math.abs(y), 1e-9));
      const far = half + distance * unit;
      const at = toPoint({ x: anchor.x + x * far, y: anchor.y + y * far });
      const away = liked ? 1 - (x * liked.x + y * liked.y) : 0;
      return { quad: turnedQuad(at, covered, 0), lines: [], cost: ring * 1.1 + away * 0.6, shapes: shapesAt(at) };
    }),
  );
}

function letterLabels(context: PlanContext): Label[] {
  const { walls, poles } = context.setOut;
  const { scale, selection } = context.options;
  const poleByCorner = new Map(poles.poles.flatMap((pole) => (pole.cornerId ? [[pole.cornerId, pole]] : [])));
  const at = walls.corners.map((corner) => {
    const pole = poleByCorner.get(corner.cornerId);
    return { letter: corner.letter, id: corner.cornerId, anchor: corner.at, pole, runIds: corner.runIds };
  });
  const others = poles.poles
    .filter((pole) => pole.cornerId === null)
    .map((pole) => ({ letter: pole.letter, id: pole.id, anchor: pole.corner, pole, runIds: pole.runIds }));
  return [...at, ...others].map(({ letter, id, anchor, pole, runIds }) => {
    const thing: ThingRef = pole ? { kind: 'pole', id: pole.id } : { kind: 'corner', id };
    const chosen =
      selection !== null &&
      ((selection.kind === thing.kind && selection.id === thing.id) ||
        (selection.kind === 'corner' && selection.id === pole?.cornerId) ||
        (selection.kind === 'brace' && pole?.braces.some((brace) => brace.id === selection.id) === true));
    const differs =
      context.emphasisOf('corner', id) === 'differs' || context.emphasisOf(thing.kind, thing.id) === 'differs';
    const emphasis = chosen ? 'selected' : differs ? 'differs' : 'plain';
    const text: FigureText = { kind: 'literal', text: letter };
    const box = textBox(text, 'letter', true, scale, context.tape);
    return {
      priority: chosen ? 0 : 1,
      anchor,
      places: placesAround(context, anchor, box, likedSide(context, runIds), (place) => [
        {
          kind: 'text',
          role: 'letter',
          thing,
          emphasis,
          at: place,
          text,
          size: 'letter',
          turn: 0,
          anchor: 'middle',
          framed: true,
        },
      ]),
      most: chosen ? Infinity : 60,
    };
  });
}

/** Where a letter would rather stand: inside the corner, away from lines and braces. */
function likedSide(context: PlanContext, runIds: readonly string[]): Vec | null {
  let [x, y] = [0, 0];
  for (const id of runIds) {
    const run = context.setOut.walls.runById.get(id);
    if (run) [x, y] = [x + run.inward.x, y + run.inward.y];
  }
  const length = Math.hypot(x, y);
  return length < 1e-6 ? null : { x: x / length, y: y / length };
}

/** One mark for each thing that has a reason weighing more than a note, shown where that thing is. */
function cautionLabels(context: PlanContext): Label[] {
  const { scale } = context.options;
  const seen = new Set<string>();
  const labels: Label[] = [];
  for (const reason of context.setOut.reasons) {
    const key = `${reason.thing.kind} ${reason.thing.id}`;
    if (reason.weight === 'note' || seen.has(key)) continue;
    seen.add(key);
    const anchor = placeOfThing(context, reason.thing);
    if (!anchor) continue;
    const side = scale.textHeight.label * 1.3;
    const box = { width: side * 1.15, height: side };
    labels.push({
      priority: 2,
      anchor,
      places: placesAround(context, anchor, box, null, (at) => cautionShapes(at, box, reason.thing)),
      most: 60,
    });
  }
  return labels;
}

function cautionShapes(at: PlanPoint, box: TextBox, thing: ThingRef): Shape[] {
  const [w, h] = [box.width / 2, box.height / 2];
  const points = [
    { x: at.x - w, y: at.y - h },
    { x: at.x + w, y: at.y - h },
    { x: at.x, y: at.y + h },
  ].map(toPoint);
  const text: FigureText = { kind: 'literal', text: '!' };
  const middle = toPoint({ x: at.x, y: at.y - h * 0.25 });
  return [
    { kind: 'polygon', role: 'caution', thing, points },
    { kind: 'text', role: 'caution', thing, at: middle, text, size: 'small', turn: 0, anchor: 'middle' },
  ];
}

function noteLabels(context: PlanContext): Label[] {
  return (context.options.notes ?? []).flatMap((note) => {
    const anchor = placeOfThing(context, note.thing);
    if (!anchor) return [];
    return [textLabel(context, anchor, note.text, 'label', 'note', note.thing, 2, true)];
  });
}

function textLabel(
  context: PlanContext,
  anchor: Vec,
  text: FigureText,
  size: TextSize,
  role: Role,
  thing: ThingRef,
  priority: number,
  framed: boolean,
): Label {
  const box = textBox(text, size, framed, context.options.scale, context.tape);
  return {
    priority,
    anchor,
    places: placesAround(context, anchor, box, null, (at) => [
      { kind: 'text', role, thing, emphasis: 'differs', at, text, size, turn: 0, anchor: 'middle', framed },
    ]),
    most: 60,
  };
}

/** Distances of a dimension line off the face, as parts of its text's height. */
const OFFSETS = [1.7, 2.6, 3.7, 5, 6.6, 8.5, 11, 14];
const ALONG = [0.5, 0.36, 0.64, 0.22, 0.78];

/** A run's length along its outside face, at any distance outside it; inside only where there is no room outside. */
function dimensionLabel(context: PlanContext, run: RunGeometry): Label | null {
  const { scale } = context.options;
  const height = scale.textHeight.dimension;
  const box = textBox({ kind: 'measure', length: run.length }, 'dimension', false, scale, context.tape);
  if (run.length < box.width + 1.6 * height) return null;
  const turn = readableTurn(run.direction);
  const covered = grown(box, scale.clear);
  const places = [
    ...OFFSETS.map((offset) => -offset * height),
    ...OFFSETS.slice(0, 3).map((o) => run.thickness + o * height),
  ].flatMap((depth) =>
    ALONG.flatMap((part) => {
      const middle = run.length * part;
      const half = covered.width / 2;
      if (middle - half < 0.5 * height || middle + half > run.length - 0.5 * height) return [];
      const textAt = onRun(run, middle, depth);
      const from = onRun(run, 0, depth);
      const to = onRun(run, run.length, depth);
      const shape: DimensionShape = {
        kind: 'dimension',
        role: 'dimension',
        thing: { kind: 'run', id: run.runId },
        emphasis: context.emphasisOf('run', run.runId),
        from,
        to,
        length: run.length,
        textAt,
        turn,
      };
      const lines = [
        [from, onRun(run, middle - half, depth)],
        [onRun(run, middle + half, depth), to],
      ] as const;
      const cost =
        (Math.abs(depth < 0 ? depth : depth - run.thickness) / height) * 0.22 +
        Math.abs(part - 0.5) * 3 +
        (depth < 0 ? 0 : 3);
      return [{ quad: turnedQuad(textAt, covered, turn), lines, cost, shapes: [shape] }];
    }),
  );
  const selected = context.emphasisOf('run', run.runId) === 'selected';
  return { priority: selected ? 2.5 : 4, anchor: onRun(run, run.length / 2, 0), places, most: selected ? 40 : 9 };
}

/** Every label of the plan with its places, in a fixed order. */
export function labelsOfPlan(context: PlanContext): Label[] {
  const labels = [...letterLabels(context)];
  if (context.options.cautions !== false) labels.push(...cautionLabels(context));
  labels.push(...noteLabels(context));
  if (context.options.dimensions)
    for (const run of context.setOut.walls.runs) {
      const label = dimensionLabel(context, run);
      if (label) labels.push(label);
    }
  return labels;
}
