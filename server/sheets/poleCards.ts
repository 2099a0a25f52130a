/** One card for each pole and lift, to go up the wall with whoever marks it: the strip and its table in one. */
import type { PoleMark, PoleMarks } from '../../model/marks/types';
import { poleFigure, tagsOfMark, usualGap } from '../../model/figures/pole';
import { roundTicks } from '../../model/length/ticks';
import type { StoryPole } from '../../model/poles/types';
import { colours, paperLabelScale } from './ink';
import { cardPaper, type Area } from './paper';
import { printFigure } from './paperPrinter';
import {
  CARD_HEADING,
  drawHeadingRule,
  drawingArea,
  issueStyleOf,
  issueText,
  type Sheet,
  type SheetSet,
} from './sheet';
import { measure, setLine, widthOf, type Doc } from './type';

const STRIP = 120;
const HEAD = 22;
const BRACE_LINE = 15;
const LEAST_ROW = 11.5;
const MOST_ROW = 26;

interface Card {
  readonly marks: PoleMarks;
  readonly pole: StoryPole | null;
  readonly part: number;
  readonly parts: number;
}

/** Room between the table's head and the lines about braces. */
function tableRoom(area: Area, braces: number): Area {
  const below = braces > 0 ? braces * BRACE_LINE + 14 : 6;
  return { ...area, y: area.y + HEAD, height: area.height - HEAD - below };
}

/** A lift with more marks than a card has rows goes on over several cards, the lower part first. */
function cardsOf(set: SheetSet, marks: PoleMarks, most: number): Card[] {
  const pole = set.setOut.poles.poleById.get(marks.poleId) ?? null;
  const parts = Math.max(1, Math.ceil(marks.marks.length / most));
  const size = Math.ceil(marks.marks.length / parts);
  return Array.from({ length: parts }, (_, i) => {
    const rising = [...marks.marks].reverse().slice(i * size, (i + 1) * size);
    const lowest = rising[0];
    const cut = i > 0 && lowest ? roundTicks(lowest.height - usualGap(marks)) : marks.foot;
    return {
      marks: { ...marks, foot: cut, foundation: i > 0 ? cut : marks.foundation, marks: rising.reverse() },
      pole,
      part: i + 1,
      parts,
    };
  });
}

/** Height from the lowest thing drawn to a little over the top mark, in ticks. */
function heightOf(marks: PoleMarks): number {
  const top = marks.marks[0]?.height ?? marks.head;
  return top + usualGap(marks) * 0.6 - Math.min(marks.foot, marks.foundation);
}

function tagsOf(set: SheetSet, mark: PoleMark): string {
  return tagsOfMark(mark)
    .map((kind) => set.say(`poles.kinds.${kind}`))
    .join(', ');
}

function drawRow(doc: Doc, set: SheetSet, mark: PoleMark, y: number, columns: Columns, size: number): void {
  const base = y + size * 0.36;
  const bold = { font: 'numbersBold', size } as const;
  const { fromLine } = mark.printed;
  const course = mark.course === null ? '' : String(mark.course);
  const courseWidth = setLine(doc, course, columns.mark, base, bold);
  const tags = tagsOf(set, mark);
  const tagAt = columns.mark + (course === '' ? 0 : Math.max(courseWidth + 8, size * 1.5));
  if (tags !== '') setLine(doc, tags, tagAt, base, { font: 'numbersBold', size: size * 0.86, colour: colours.frame });
  if (fromLine === 0) setLine(doc, set.say('sheets.onLine'), columns.fromLine, base, { ...bold, align: 'end' });
  else {
    const parts = measure(roundTicks(Math.abs(fromLine)), set.tape, inchStyle(set));
    const width = setLine(doc, parts, columns.fromLine, base, { ...bold, align: 'end' });
    const way = set.say(fromLine < 0 ? 'sheets.down' : 'sheets.up');
    setLine(doc, way, columns.fromLine - width - 5, base, {
      font: 'numbers',
      size,
      colour: colours.levelLine,
      align: 'end',
    });
  }
  setLine(doc, measure(mark.printed.fromFoot, set.tape, inchStyle(set)), columns.fromFoot, base, {
    ...bold,
    align: 'end',
  });
  setLine(doc, measure(mark.printed.aboveFoundation, set.tape, inchStyle(set)), columns.above, base, {
    ...bold,
    align: 'end',
  });
  const box = Math.min(size * 0.8, 11);
  doc.undash().lineWidth(0.6).strokeColor(colours.soft);
  doc.rect(columns.done - box, y - box / 2, box, box).stroke();
}

/** Marks are read off in inches, as a tape is. */
function inchStyle(set: SheetSet): 'inches' | 'mm' {
  return set.tape.units === 'imperial' ? 'inches' : 'mm';
}

interface Columns {
  readonly mark: number;
  readonly fromLine: number;
  readonly fromFoot: number;
  readonly above: number;
  readonly done: number;
}

function columnsIn(area: Area): Columns {
  const left = area.x + STRIP;
  const width = area.width - STRIP;
  return {
    mark: left + 6,
    fromLine: left + width * 0.5,
    fromFoot: left + width * 0.69,
    above: left + width * 0.9,
    done: left + width,
  };
}

/** The pole's letter first, then where it belongs; at the right which issue this is, and the first mark. */
function drawTitle(doc: Doc, set: SheetSet, card: Card, area: Area): void {
  const { marks } = card;
  const { say } = set;
  const top = area.y - CARD_HEADING;
  const right = area.x + area.width;
  setLine(doc, say('sheets.poleTitle', { letter: marks.letter }), area.x, top + 40, { font: 'numbersBold', size: 52 });
  const lift = say('sheets.poleSubtitle', { letter: marks.letter, lift: marks.lift });
  const part = card.parts > 1 ? `, ${say('sheets.polePart', { part: card.part, parts: card.parts })}` : '';
  setLine(doc, `${lift}${part} · ${set.siteName}`, area.x, top + 60, { font: 'textMedium', size: 11.5 });
  setLine(doc, issueText(set), right, top + 40, { ...issueStyleOf(set), align: 'end' });
  drawHeadingRule(doc, area, top + 67);
  const first = card.part === 1 ? marks.marks[marks.marks.length - 1] : undefined;
  if (!first) return;
  const side = say(first.printed.fromLine <= 0 ? 'sheets.belowLine' : 'sheets.aboveLine');
  const words = { size: 11.5 } as const;
  const sideWidth = setLine(doc, ` ${side}`, right, top + 60, { ...words, align: 'end' });
  const parts = measure(roundTicks(Math.abs(first.printed.fromLine)), set.tape, inchStyle(set));
  const bold = { font: 'numbersBold', size: 13.5 } as const;
  const width = setLine(doc, parts, right - sideWidth, top + 60, { ...bold, align: 'end' });
  setLine(doc, `${say('sheets.firstMark')} `, right - sideWidth - width, top + 60, { ...words, align: 'end' });
}

function drawHeadings(doc: Doc, set: SheetSet, room: Area, columns: Columns): void {
  const style = { font: 'textMedium', size: 8, colour: colours.soft } as const;
  const y = room.y - 9;
  setLine(doc, set.say('sheets.columns.mark'), columns.mark, y, style);
  setLine(doc, set.say('sheets.columns.fromLine'), columns.fromLine, y, { ...style, align: 'end' });
  setLine(doc, set.say('sheets.columns.fromFoot'), columns.fromFoot, y, { ...style, align: 'end' });
  setLine(doc, set.say('sheets.columns.aboveFoundation'), columns.above, y, { ...style, align: 'end' });
  setLine(doc, set.say('sheets.columns.done'), columns.done, y, { ...style, align: 'end' });
}

function drawBraces(doc: Doc, set: SheetSet, pole: StoryPole, area: Area): void {
  let y = area.y + area.height - pole.braces.length * BRACE_LINE + 4;
  const plain = { size: 10 } as const;
  const number = { font: 'numbersBold', size: 11 } as const;
  const letterOf = (id: string) => set.setOut.walls.cornerById.get(id)?.letter ?? '';
  pole.braces.forEach((brace, i) => {
    let x = area.x;
    const put = (text: string | ReturnType<typeof measure>, style: typeof plain | typeof number) => {
      setLine(doc, text, x, y, style);
      x += widthOf(doc, text, style) + 4;
    };
    setLine(doc, set.say('sheets.brace', { number: i + 1 }), x, y, { font: 'textBold', size: 10 });
    x += 56;
    put(set.say('sheets.braceLeg'), plain);
    put(measure(brace.leg, set.tape), number);
    put(`${set.say('sheets.braceSlope', { degrees: Math.round(brace.slope) })}, ${set.say('sheets.braceFoot')}`, plain);
    brace.ties.forEach((tie, j) => {
      if (j > 0) put(set.say('sheets.and'), plain);
      put(measure(tie.distance, set.tape), number);
      put(set.say('sheets.fromCorner', { letter: letterOf(tie.cornerId) }), plain);
    });
    y += BRACE_LINE;
  });
}

function cardSheet(set: SheetSet, card: Card, scale: { readonly pointsPerTick: number }, paper: Sheet['paper']): Sheet {
  const { marks, pole } = card;
  const braces = marks.lift === 1 && pole ? pole.braces.length : 0;
  return {
    paper,
    lying: false,
    documentType: 'pole',
    title: `${set.say('sheets.poleTitle', { letter: marks.letter })}, ${set.say('sheets.poleSubtitle', { letter: marks.letter, lift: marks.lift })}`,
    scale: null,
    heading: (doc, area) => drawTitle(doc, set, card, area),
    draw(doc, area) {
      const room = tableRoom(area, braces);
      const columns = columnsIn(area);
      if (braces > 0 && pole) drawBraces(doc, set, pole, area);
      if (marks.marks.length === 0) {
        setLine(doc, set.say('sheets.noMarks'), room.x, room.y + 20, { size: 12, colour: colours.soft });
        return;
      }
      drawHeadings(doc, set, room, columns);
      const labelScale = paperLabelScale(scale.pointsPerTick);
      const left = area.x + labelScale.textHeight.small * scale.pointsPerTick * 1.6;
      const { figure, rows } = poleFigure(set.drawing, marks, {
        scale: labelScale,
        rowGap: LEAST_ROW / scale.pointsPerTick,
        tableAt: (area.x + STRIP - left) / scale.pointsPerTick,
        selectedHeight: null,
        mostAbove: usualGap(marks) * 0.6,
      });
      const gap = usualGap(marks) * scale.pointsPerTick;
      const rowHeight = Math.min(MOST_ROW, Math.max(LEAST_ROW, gap));
      const top = (marks.marks[0]?.height ?? marks.head) * scale.pointsPerTick;
      const origin = room.y + rowHeight / 2 + top;
      printFigure(doc, figure, { x: left, y: origin, pointsPerTick: scale.pointsPerTick }, set.say);
      doc.undash().lineWidth(0.4).strokeColor(colours.rule);
      doc
        .moveTo(area.x + STRIP, room.y)
        .lineTo(area.x + area.width, room.y)
        .stroke();
      const size = Math.min(16, rowHeight * 0.74);
      for (const { mark, y } of rows) {
        const at = origin - y * scale.pointsPerTick;
        doc.undash().lineWidth(0.4).strokeColor(colours.rule);
        doc
          .moveTo(area.x + STRIP, at + rowHeight / 2)
          .lineTo(area.x + area.width, at + rowHeight / 2)
          .stroke();
        drawRow(doc, set, mark, at, columns, size);
      }
      drawLevelName(doc, set, origin - marks.levelLine * scale.pointsPerTick, area);
    },
  };
}

/** The level line's name under its left end, clear of the steel. */
function drawLevelName(doc: Doc, set: SheetSet, y: number, area: Area): void {
  const style = { font: 'numbersBold', size: 8, colour: colours.levelLine } as const;
  setLine(doc, set.say('sheets.levelLine'), area.x + STRIP - 8, y - 2.5, { ...style, align: 'end' });
}

/** Cards in the order of the poles, each pole's lifts from the bottom up. */
export function poleCards(set: SheetSet): Sheet[] {
  const paper = cardPaper(set.paper);
  const room = tableRoom(drawingArea(paper, false, CARD_HEADING), 2);
  const most = Math.max(1, Math.floor(room.height / LEAST_ROW) - 3);
  const cards = set.setOut.marks.poles.flatMap((marks) => cardsOf(set, marks, most));
  return cards.map((card) => {
    // The strip fills the card, so that its rows are as large as they can be; a single mark needs no more than a row.
    const fill = (room.height - LEAST_ROW) / Math.max(1, heightOf(card.marks));
    const scale = { pointsPerTick: Math.min(fill, MOST_ROW / usualGap(card.marks)) };
    return cardSheet(set, card, scale, paper);
  });
}
