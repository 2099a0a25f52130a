/** How much room a text takes at a scale: the placing of labels and both printers go by the same boxes. */
import type { Vec } from '../geometry/point';
import type { Ticks } from '../length/ticks';
import type { DimensionShape, FigureText, LabelScale, Tape, TextShape, TextSize } from './figure';
import { typesetMeasure } from './typeset';

/** A frame stands this far off its letter, as a part of the text's height. */
const FRAME_PAD = 0.36;
/** A framed letter is at least as wide as this part of its text's height. */
const FRAME_LEAST = 1.5;

export interface TextBox {
  readonly width: number;
  readonly height: number;
}

/** Characters of a measurement as it is set: a fraction's figures take three fifths of their width. */
function measureLetters(length: Ticks, tape: Tape): number {
  return typesetMeasure(length, tape).reduce((sum, part) => sum + part.text.length * (part.fraction ? 0.62 : 1), 0);
}

/** Small letters are narrower than the figures and capitals that a scale's advance is for. */
const SMALL_LETTERS = 0.82;

/** A word's own name is about as long as the word in English, and somewhat more is allowed for other languages. */
function wordLetters(key: string): number {
  return (key.length - key.lastIndexOf('.') + 2) * SMALL_LETTERS;
}

/** Characters to allow for a text; words are measured once worded, so a printer may give their length. */
export function lettersOf(text: FigureText, tape: Tape): number {
  switch (text.kind) {
    case 'literal':
      return text.text.length;
    case 'measure':
      return measureLetters(text.length, tape);
    case 'labelled':
      return measureLetters(text.length, tape) + wordLetters(text.key) + 1;
    case 'word':
      return wordLetters(text.key);
  }
}

/** Width and height of a text at a scale, its frame included, in ticks. */
export function textBox(text: FigureText, size: TextSize, framed: boolean, scale: LabelScale, tape: Tape): TextBox {
  const height = scale.textHeight[size];
  const width = lettersOf(text, tape) * scale.advance * height;
  if (!framed) return { width, height };
  return {
    width: Math.max(width + 2 * FRAME_PAD * height, FRAME_LEAST * height),
    height: height * (1 + 1.4 * FRAME_PAD),
  };
}

/** A box with so much room around it on every side. */
export function grown(box: TextBox, by: number): TextBox {
  return { width: box.width + 2 * by, height: box.height + 2 * by };
}

/** The corners of a box of that size around `middle`, turned counter-clockwise by `turn` degrees. */
export function turnedQuad(middle: Vec, box: TextBox, turn: number): Vec[] {
  const angle = (turn * Math.PI) / 180;
  const cos = Math.cos(angle);
  const sin = Math.sin(angle);
  const [w, h] = [box.width / 2, box.height / 2];
  return (
    [
      [-w, -h],
      [w, -h],
      [w, h],
      [-w, h],
    ] as const
  ).map(([x, y]) => ({ x: middle.x + x * cos - y * sin, y: middle.y + x * sin + y * cos }));
}

/** The box that a text covers, as a polygon. Texts stand with their middle height on `at`. */
export function textQuad(shape: TextShape, scale: LabelScale, tape: Tape): Vec[] {
  const box = textBox(shape.text, shape.size, shape.framed === true, scale, tape);
  const shift = shape.anchor === 'middle' ? 0 : shape.anchor === 'start' ? box.width / 2 : -box.width / 2;
  const angle = (shape.turn * Math.PI) / 180;
  const middle = { x: shape.at.x + shift * Math.cos(angle), y: shape.at.y + shift * Math.sin(angle) };
  return turnedQuad(middle, box, shape.turn);
}

/** The box that a dimension's text covers, as a polygon. */
export function dimensionQuad(shape: DimensionShape, scale: LabelScale, tape: Tape): Vec[] {
  const box = textBox({ kind: 'measure', length: shape.length }, 'dimension', false, scale, tape);
  return turnedQuad(shape.textAt, box, shape.turn);
}

/** The turn of a text along a direction so that it reads from below or from the right: above −90° and up to 90°. */
export function readableTurn(direction: Vec): number {
  const turn = (Math.atan2(direction.y, direction.x) * 180) / Math.PI;
  if (turn > 90 + 1e-6) return turn - 180;
  if (turn <= -90 + 1e-6) return turn + 180;
  return turn;
}
