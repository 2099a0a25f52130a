/** A figure is plain data in model coordinates (ticks), shown on screen as SVG and on paper as vector PDF. */
import type { Units } from '../drawing/schema';
import type { PlanPoint } from '../geometry/point';
import type { Ticks } from '../length/ticks';
import type { ThingRef } from '../things';

/** What a shape is; the printers give it its colour, width and dash. */
export type Role =
  | 'face'
  | 'body'
  | 'unit'
  | 'closer'
  | 'return'
  | 'joint'
  | 'frame'
  | 'opening'
  | 'swing'
  | 'way'
  | 'keep-clear'
  | 'boundary'
  | 'line'
  | 'pole'
  | 'brace'
  | 'foot'
  | 'mark'
  | 'mark-main'
  | 'level-line'
  | 'ground'
  | 'concrete'
  | 'lintel'
  | 'dimension'
  | 'letter'
  | 'caution'
  | 'note';

/** Text sizes are the printers' own: a figure only says which. */
export type TextSize = 'small' | 'label' | 'dimension' | 'letter';

/** What a text says: a literal (a letter, a course number), a measurement to be set as one, or a word from the dictionary. */
export type FigureText =
  | { readonly kind: 'literal'; readonly text: string }
  | { readonly kind: 'measure'; readonly length: Ticks }
  /** A word and its measurement: "sill 2′ 4″". */
  | { readonly kind: 'labelled'; readonly key: string; readonly length: Ticks }
  | { readonly kind: 'word'; readonly key: string; readonly params?: Readonly<Record<string, string | number>> };

/** Selected things are drawn solid and heavy; differing ones by line style and label. */
export type Emphasis = 'plain' | 'selected' | 'quiet' | 'differs';

interface ShapeBase {
  readonly role: Role;
  readonly thing?: ThingRef;
  readonly emphasis?: Emphasis;
}

export type Shape =
  | (ShapeBase & { readonly kind: 'polygon'; readonly points: readonly PlanPoint[]; readonly hatched?: boolean })
  /** Many open polylines in one shape: one SVG path, however many joints. */
  | (ShapeBase & { readonly kind: 'lines'; readonly lines: readonly (readonly PlanPoint[])[] })
  /** Many rectangles in one shape: `[x, y, width, height]` in ticks. */
  | (ShapeBase & { readonly kind: 'boxes'; readonly boxes: readonly (readonly [number, number, number, number])[] })
  /** Counter-clockwise from `from` to `to`, degrees. */
  | (ShapeBase & {
      readonly kind: 'arc';
      readonly centre: PlanPoint;
      readonly radius: Ticks;
      readonly from: number;
      readonly to: number;
    })
  /** A ring of a size on the screen or the paper, not of the building: brace feet, handles. */
  | (ShapeBase & { readonly kind: 'dot'; readonly at: PlanPoint; readonly size: 'small' | 'large' })
  | (ShapeBase & {
      readonly kind: 'text';
      readonly at: PlanPoint;
      readonly text: FigureText;
      readonly size: TextSize;
      /** Degrees counter-clockwise. */
      readonly turn: number;
      readonly anchor: 'start' | 'middle' | 'end';
      /** A letter in its frame, as poles and corners are named. */
      readonly framed?: boolean;
    })
  /** A dimension line already placed: its two ends, drawn with ticks, broken around its text. */
  | (ShapeBase & {
      readonly kind: 'dimension';
      readonly from: PlanPoint;
      readonly to: PlanPoint;
      readonly length: Ticks;
      /** Middle of its text on the line. */
      readonly textAt: PlanPoint;
      /** Turn of its text, in degrees counter-clockwise: along the line, read from below or from the right. */
      readonly turn: number;
    });

export type TextShape = Extract<Shape, { kind: 'text' }>;
export type DimensionShape = Extract<Shape, { kind: 'dimension' }>;

/** How measurements in a figure are written: the drawing's units and tape step. */
export interface Tape {
  readonly units: Units;
  readonly step: Ticks;
}

export interface Box {
  readonly left: Ticks;
  readonly bottom: Ticks;
  readonly right: Ticks;
  readonly top: Ticks;
}

export interface Figure {
  readonly name: 'plan' | 'elevation' | 'pole' | 'profile' | 'course';
  /** All that must be seen: the building with its poles and braces, labels and dimensions. */
  readonly bounds: Box;
  readonly tape: Tape;
  /** Painted in order. */
  readonly shapes: readonly Shape[];
}

/** What label placement must know of the printer: sizes in ticks at the scale being drawn. */
export interface LabelScale {
  /** Height of each text size, in ticks at this scale. */
  readonly textHeight: Readonly<Record<TextSize, number>>;
  /** Mean advance of a character as a part of its height. */
  readonly advance: number;
  /** Clear space around a label, in ticks. */
  readonly clear: number;
}
