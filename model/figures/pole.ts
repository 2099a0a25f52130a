/**
 * A pole as a strip with a table's rows beside it: the same figure on screen and on a printed card. Heights are true to
 * one another; x has no meaning but the strip's own, so widths come from the printer.
 */
import type { Drawing } from '../drawing/schema';
import { roundTicks, type Ticks } from '../length/ticks';
import type { PlanPoint } from '../geometry/point';
import type { MarkKind, PoleMark, PoleMarks } from '../marks/types';
import { boundsOf } from './bounds';
import type { Emphasis, Figure, LabelScale, Role, Shape } from './figure';
import { spreadApart } from './spread';

export interface PoleOptions {
  readonly scale: LabelScale;
  /** Least distance between two rows of the table, in ticks. */
  readonly rowGap: number;
  /** Where the table's rows begin: the leaders end there. */
  readonly tableAt: number;
  /** Height of the selected mark, or null. */
  readonly selectedHeight: Ticks | null;
  /** The steel above the top mark is cut short where it is longer than this, in ticks. */
  readonly mostAbove: number;
}

/** A mark and the height of its row's middle. */
export interface PoleRow {
  readonly mark: PoleMark;
  readonly y: number;
}

export interface PoleFigure {
  readonly figure: Figure;
  /** Highest first, as the marks. */
  readonly rows: readonly PoleRow[];
}

/** Marks other than course tops carry their own colour: frames' sills and heads, beams. */
function roleOfMark(mark: PoleMark): Role {
  if (mark.kinds.some((kind) => kind === 'sill' || kind === 'head' || kind === 'lintelSeat')) return 'frame';
  return 'mark';
}

const point = (x: number, y: number): PlanPoint => ({ x: roundTicks(x), y: roundTicks(y) });

/** The steel from foot to head, with a break where its head is cut short. */
function drawSteel(shapes: Shape[], marks: PoleMarks, width: number, options: PoleOptions): number {
  const highest = marks.marks[0]?.height ?? marks.foot;
  const cut = marks.head - highest > options.mostAbove;
  const top = cut ? highest + options.mostAbove : marks.head;
  const thing = { kind: 'pole', id: marks.poleId } as const;
  shapes.push({ kind: 'boxes', role: 'pole', thing, boxes: [[0, marks.foot, width, top - marks.foot]] });
  // The far leg of the angle, seen along its edge.
  shapes.push({
    kind: 'boxes',
    role: 'pole',
    emphasis: 'quiet',
    thing,
    boxes: [[width * 0.74, marks.foot, width * 0.26, top - marks.foot]],
  });
  if (cut) {
    const step = width / 4;
    const zigzag = [0, 1, 2, 3, 4].map((i) => point(i * step, top + (i % 2 === 0 ? 0 : step)));
    const outer = [point(-step, top), ...zigzag, point(width + step, top)];
    shapes.push({ kind: 'lines', role: 'ground', lines: [outer] });
  }
  return top;
}

/** The strip of one pole and lift, and where each row of its table stands. */
export function poleFigure(drawing: Drawing, marks: PoleMarks, options: PoleOptions): PoleFigure {
  const tape = { units: drawing.units, step: drawing.tapeStep };
  const shapes: Shape[] = [];
  const unit = options.scale.textHeight.small;
  const width = unit * 2.4;
  drawSteel(shapes, marks, width, options);
  const foundation = marks.lift === 1 ? marks.foundation : marks.foot;
  shapes.push({
    kind: 'lines',
    role: 'ground',
    lines: [[point(-unit, foundation), point(width + unit * 3, foundation)]],
  });

  const rising = [...marks.marks].reverse();
  const places = spreadApart(
    rising.map((mark) => mark.height),
    options.rowGap,
  );
  const rows = rising.map((mark, i) => ({ mark, y: places[i] ?? mark.height }));
  const leaders: Record<Emphasis, PlanPoint[][]> = { plain: [], selected: [], quiet: [], differs: [] };
  const over = unit * 0.45;
  for (const { mark, y } of rows) {
    const selected = options.selectedHeight === mark.height;
    const emphasis = selected ? 'selected' : 'plain';
    const reach = selected ? over * 2 : mark.course !== null && mark.course % 5 === 0 ? over * 1.5 : over;
    shapes.push({
      kind: 'lines',
      role: selected ? 'mark-main' : roleOfMark(mark),
      emphasis,
      thing: { kind: 'course', id: String(mark.course ?? mark.height) },
      lines: [[point(-reach, mark.height), point(width + reach, mark.height)]],
    });
    leaders[emphasis].push([
      point(width + reach, mark.height),
      point(width + over * 2.4, mark.height),
      point(options.tableAt - over, y),
      point(options.tableAt, y),
    ]);
  }
  for (const emphasis of ['plain', 'selected'] as const)
    if (leaders[emphasis].length > 0)
      shapes.push({ kind: 'lines', role: 'dimension', emphasis, lines: leaders[emphasis] });
  shapes.push({
    kind: 'lines',
    role: 'level-line',
    lines: [[point(-unit, marks.levelLine), point(options.tableAt - over, marks.levelLine)]],
  });
  return {
    figure: { name: 'pole', bounds: boundsOf(shapes, options.scale, tape), tape, shapes },
    rows: rows.reverse(),
  };
}

/**
 * The usual distance between two marks: three of four are at least so far apart, so that rows of this height hardly
 * move off their marks. The whole strip where there is only one mark.
 */
export function usualGap(marks: PoleMarks): number {
  const gaps = marks.marks
    .flatMap((mark, i) => {
      const next = marks.marks[i + 1];
      return next && mark.height > next.height ? [mark.height - next.height] : [];
    })
    .sort((a, b) => a - b);
  return gaps[Math.floor(gaps.length / 4)] ?? Math.max(1, marks.head - marks.foot);
}

/** What a mark is besides a course's top. A lintel's seat is its opening's head: only one of the two is said. */
export function tagsOfMark(mark: PoleMark): readonly MarkKind[] {
  return mark.kinds.filter((kind) => kind !== 'course' && !(kind === 'lintelSeat' && mark.kinds.includes('head')));
}
