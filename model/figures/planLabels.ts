/** The labels of the plan and every place where each could stand: corner letters, cautions, notes. */
import type { PlanPoint, Vec } from '../geometry/point';
import { toPoint } from '../geometry/vec';
import type { ThingRef } from '../things';
import type { FigureText, Role, Shape, TextSize } from './figure';
import type { Label, Place } from './labels';
import type { PlanContext } from './planContext';
import { placeOfThing } from './placeOfThing';
import { lengthLabels, runningLabels } from './planDimensions';
import { grown, textBox, turnedQuad, type TextBox } from './text';

const DIRECTIONS = 16;
const DISTANCES = [0.35, 0.8, 1.5, 2.4, 3.6];

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

/** Every label of the plan with its places, in a fixed order. */
export function labelsOfPlan(context: PlanContext): Label[] {
  const labels = [...letterLabels(context)];
  if (context.options.cautions !== false) labels.push(...cautionLabels(context));
  labels.push(...noteLabels(context));
  if (context.options.running) labels.push(...runningLabels(context));
  if (context.options.dimensions) labels.push(...lengthLabels(context));
  return labels;
}
