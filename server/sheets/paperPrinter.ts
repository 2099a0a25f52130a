/** Prints a figure's shapes on a sheet, true to scale: one tick is always the same length of paper. */
import type { DimensionShape, Figure, FigureText, Shape, Tape, TextShape } from '../../model/figures/figure';
import { textBox } from '../../model/figures/text';
import type { TypePart } from '../../model/figures/typeset';
import type { Vec } from '../../model/geometry/point';
import type { Say } from '../../model/words/say';
import { colours, inkOf, paperLabelScale, paperTextSize, type Ink } from './ink';
import { measure, setLine, type Doc } from './type';

export interface PaperPlace {
  /** Where the figure's origin stands on the sheet, points, y down. */
  readonly x: number;
  readonly y: number;
  readonly pointsPerTick: number;
}

interface Press {
  readonly doc: Doc;
  readonly place: PaperPlace;
  readonly tape: Tape;
  readonly say: Say;
}

const across = (place: PaperPlace, x: number) => place.x + x * place.pointsPerTick;
const down = (place: PaperPlace, y: number) => place.y - y * place.pointsPerTick;

/** Half the height of Barlow's capitals, as a part of the size: texts stand with that height on their place. */
const HALF_CAPITAL = 0.35;

function partsOf(words: FigureText, { tape, say }: Press): TypePart[] {
  switch (words.kind) {
    case 'literal':
      return [{ text: words.text, fraction: false }];
    case 'word':
      return [{ text: say(words.key, words.params), fraction: false }];
    case 'measure':
      return measure(words.length, tape);
    case 'labelled':
      return [{ text: `${say(words.key)} `, fraction: false }, ...measure(words.length, tape)];
  }
}

function trace({ doc, place }: Press, points: readonly Vec[], close: boolean): void {
  points.forEach((point, i) => {
    if (i === 0) doc.moveTo(across(place, point.x), down(place, point.y));
    else doc.lineTo(across(place, point.x), down(place, point.y));
  });
  if (close) doc.closePath();
}

/** Fills and strokes the path that was traced. */
function paint(doc: Doc, ink: Ink, closed: boolean): void {
  const fill = closed ? ink.fill : null;
  if (ink.stroke) {
    doc.lineWidth(ink.width).strokeColor(ink.stroke);
    if (ink.dash) doc.addContent(`[${ink.dash.join(' ')}] 0 d`);
    else doc.undash();
  }
  if (fill && ink.stroke) doc.fillAndStroke(fill, ink.stroke);
  else if (fill) doc.fill(fill);
  else if (ink.stroke) doc.stroke();
  else doc.addContent('n');
}

const HATCH_STEP = 5;

/** Lines at 45° across a polygon, clipped to it. */
function hatch(press: Press, points: readonly Vec[]): void {
  const { doc, place } = press;
  const xs = points.map((point) => across(place, point.x));
  const ys = points.map((point) => down(place, point.y));
  const [left, right, top, bottom] = [Math.min(...xs), Math.max(...xs), Math.min(...ys), Math.max(...ys)];
  doc.save();
  trace(press, points, true);
  doc.clip();
  // Lines of one family over the whole sheet, so that neighbouring hatches run on.
  const first = Math.ceil((left + top) / HATCH_STEP) * HATCH_STEP;
  for (let sum = first; sum <= right + bottom; sum += HATCH_STEP)
    doc.moveTo(sum - bottom, bottom).lineTo(sum - top, top);
  doc.undash().lineWidth(0.35).strokeColor(colours.hatch).stroke();
  doc.restore();
}

function printText(press: Press, shape: TextShape): void {
  const { doc, place } = press;
  const [x, y] = [across(place, shape.at.x), down(place, shape.at.y)];
  const ink = inkOf(shape.role, shape.emphasis);
  const size = paperTextSize[shape.size];
  doc.save();
  if (shape.turn !== 0) doc.rotate(-shape.turn, { origin: [x, y] });
  if (shape.framed) {
    const box = textBox(shape.text, shape.size, true, paperLabelScale(1), press.tape);
    doc.roundedRect(x - box.width / 2, y - box.height / 2, box.width, box.height, 1.5);
    paint(doc, ink, true);
  }
  setLine(doc, partsOf(shape.text, press), x, y + size * HALF_CAPITAL, {
    font: 'numbersBold',
    size,
    colour: ink.text,
    align: shape.anchor,
  });
  doc.restore();
}

const SLASH = 3;

function printDimension(press: Press, shape: DimensionShape): void {
  const { doc, place, tape } = press;
  const from = { x: across(place, shape.from.x), y: down(place, shape.from.y) };
  const to = { x: across(place, shape.to.x), y: down(place, shape.to.y) };
  const text = { x: across(place, shape.textAt.x), y: down(place, shape.textAt.y) };
  const length = Math.hypot(to.x - from.x, to.y - from.y);
  if (!(length > 0)) return;
  const u = { x: (to.x - from.x) / length, y: (to.y - from.y) / length };
  const words = { kind: 'measure', length: shape.length } as const;
  const gap = textBox(words, 'dimension', false, paperLabelScale(1), tape).width / 2 + 2.5;
  const middle = (text.x - from.x) * u.x + (text.y - from.y) * u.y;
  const ink = inkOf('dimension', shape.emphasis);
  const point = (far: number): [number, number] => [from.x + u.x * far, from.y + u.y * far];
  doc.moveTo(...point(0)).lineTo(...point(Math.max(0, middle - gap)));
  doc.moveTo(...point(Math.min(length, middle + gap))).lineTo(...point(length));
  paint(doc, ink, false);
  const lean = { x: (u.x + u.y) * Math.SQRT1_2 * SLASH, y: (u.y - u.x) * Math.SQRT1_2 * SLASH };
  for (const end of [from, to]) doc.moveTo(end.x - lean.x, end.y - lean.y).lineTo(end.x + lean.x, end.y + lean.y);
  paint(doc, { ...ink, width: ink.width * 1.6, dash: null }, false);
  doc.save();
  if (shape.turn !== 0) doc.rotate(-shape.turn, { origin: [text.x, text.y] });
  const size = paperTextSize.dimension;
  setLine(doc, measure(shape.length, tape), text.x, text.y + size * HALF_CAPITAL, {
    font: 'numbersBold',
    size,
    align: 'middle',
  });
  doc.restore();
}

function printArc(press: Press, shape: Extract<Shape, { kind: 'arc' }>): void {
  const sweep = (((shape.to - shape.from) % 360) + 360) % 360;
  const steps = Math.max(2, Math.ceil(sweep / 5));
  const points = Array.from({ length: steps + 1 }, (_, i) => {
    const angle = ((shape.from + (sweep * i) / steps) * Math.PI) / 180;
    return {
      x: shape.centre.x + shape.radius * Math.cos(angle),
      y: shape.centre.y + shape.radius * Math.sin(angle),
    };
  });
  trace(press, points, false);
}

function printShape(press: Press, shape: Shape): void {
  const { doc, place } = press;
  const ink = inkOf(shape.role, shape.emphasis);
  switch (shape.kind) {
    case 'polygon':
      if (shape.hatched) hatch(press, shape.points);
      trace(press, shape.points, true);
      paint(doc, shape.hatched ? { ...ink, fill: null } : ink, true);
      return;
    case 'lines':
      for (const line of shape.lines) trace(press, line, false);
      paint(doc, ink, false);
      return;
    case 'boxes':
      for (const [x, y, width, height] of shape.boxes)
        doc.rect(across(place, x), down(place, y + height), width * place.pointsPerTick, height * place.pointsPerTick);
      paint(doc, ink, true);
      return;
    case 'arc':
      printArc(press, shape);
      paint(doc, ink, false);
      return;
    case 'dot':
      doc.circle(across(place, shape.at.x), down(place, shape.at.y), shape.size === 'large' ? 3.2 : 2.4);
      paint(doc, ink, true);
      return;
    case 'text':
      printText(press, shape);
      return;
    case 'dimension':
      printDimension(press, shape);
      return;
  }
}

/** Prints every shape of a figure in order. Lengths in the figure are lengths on paper by `pointsPerTick`, exactly. */
export function printFigure(doc: Doc, figure: Figure, place: PaperPlace, say: Say): void {
  const press = { doc, place, tape: figure.tape, say };
  doc.save();
  doc.lineJoin('miter').lineCap('butt');
  for (const shape of figure.shapes) printShape(press, shape);
  doc.restore();
}
