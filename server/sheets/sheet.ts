/** What every sheet has around its drawing: the heading, the title block (fields of ISO 7200:2004) and the cautions. */
import { ruleValue } from '../../model/rules/registry';
import { ticks } from '../../model/length/ticks';
import { typesetMeasure } from '../../model/figures/typeset';
import type { Tape } from '../../model/figures/figure';
import type { Drawing } from '../../model/drawing/schema';
import type { SetOut } from '../../model/setOut';
import type { Say } from '../../model/words/say';
import { colours } from './ink';
import { sizeOf, type Area, type DrawingScale, type Paper } from './paper';
import { fitted, setLine, setParagraph, widthOf, type Doc } from './type';

/** The issued revision that a set of sheets prints. */
export interface SheetRevision {
  readonly number: number;
  readonly note: string;
  readonly savedBy: string;
  /** ISO date and time. */
  readonly savedAt: string;
}

/** What all sheets of a set are printed from. */
export interface SheetSet {
  readonly siteName: string;
  /** Null for a draft. */
  readonly revision: SheetRevision | null;
  readonly drawing: Drawing;
  readonly setOut: SetOut;
  readonly tape: Tape;
  readonly paper: Paper;
  readonly say: Say;
}

/** One sheet, ready to be drawn once the number of all sheets is known. */
export interface Sheet {
  readonly paper: Paper;
  readonly lying: boolean;
  readonly documentType: 'plan' | 'elevation' | 'pole';
  readonly title: string;
  /** The scale that its drawing is true to; null on a card, whose strip fills the card. */
  readonly scale: DrawingScale | null;
  /** A sheet with its own heading; the others have their title. */
  readonly heading?: (doc: Doc, area: Area) => void;
  draw(doc: Doc, area: Area): void;
}

const MARGIN = 36;
const BLOCK_ROW = 25;
const CAUTION_SIZE = 7.2;
const CAUTION_LEADING = 8.8;
const HEADING = 34;
/** A card's heading is read at arm's length. */
export const CARD_HEADING = 74;
/** Two rows of fields and three lines of cautions. */
const BLOCK_HEIGHT = 2 * BLOCK_ROW + 3 * CAUTION_LEADING + 12;

/** The part of a sheet left for its drawing, under a heading of this height. */
export function drawingArea(paper: Paper, lying: boolean, heading = HEADING): Area {
  const size = sizeOf(paper, lying);
  const top = MARGIN + heading;
  return { x: MARGIN, y: top, width: size.width - 2 * MARGIN, height: size.height - MARGIN - BLOCK_HEIGHT - top };
}

/** The day of an ISO date and time, in UTC, as it is said: 12 November 2026. */
export function dayOf(savedAt: string): string {
  const date = new Date(savedAt);
  if (Number.isNaN(date.getTime())) return savedAt;
  return new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeZone: 'UTC' }).format(date);
}

/** Initials of the site, its revision and the sheet: unlike on every sheet of every issue of a site. */
function identification(set: SheetSet, number: number): string {
  const initials = set.siteName
    .split(/\s+/)
    .map((word) => word.match(/[\p{L}\p{N}]/u)?.[0] ?? '')
    .join('')
    .toUpperCase()
    .slice(0, 6);
  return `${initials || 'S'}-${set.revision ? `R${set.revision.number}` : 'DRAFT'}-${String(number).padStart(2, '0')}`;
}

/** The revision and its day, or that this is a draft. */
export function issueText(set: SheetSet): string {
  if (!set.revision) return set.say('sheets.draft');
  return `${set.say('sheets.revision', { number: set.revision.number })} · ${dayOf(set.revision.savedAt)}`;
}

export function issueStyleOf(set: SheetSet): { font: 'textBold'; size: number; colour: string } {
  return { font: 'textBold', size: 10, colour: set.revision ? colours.ink : colours.caution };
}

function drawHeading(doc: Doc, set: SheetSet, sheet: Sheet, area: Area): void {
  const right = area.x + area.width;
  const issue = issueText(set);
  const issueStyle = issueStyleOf(set);
  const issueWidth = widthOf(doc, issue, issueStyle);
  const title = { font: 'textBold', size: 17 } as const;
  setLine(doc, fitted(doc, sheet.title, area.width - issueWidth - 24, title), area.x, MARGIN + 16, title);
  setLine(doc, issue, right, MARGIN + 16, { ...issueStyle, align: 'end' });
  drawHeadingRule(doc, area, MARGIN + 24);
}

export function drawHeadingRule(doc: Doc, area: Area, y: number): void {
  doc.undash().lineWidth(1.2).strokeColor(colours.ink);
  doc
    .moveTo(area.x, y)
    .lineTo(area.x + area.width, y)
    .stroke();
}

/** A line across the drawing of a sheet that has not been issued, pale enough to read through. */
function drawDraftLine(doc: Doc, set: SheetSet, area: Area): void {
  const text = set.say('sheets.draft');
  const size = Math.min(64, (area.width * 0.8) / Math.max(1, text.length * 0.5));
  setLine(doc, text, area.x + area.width / 2, area.y + area.height / 2, {
    font: 'textBold',
    size,
    colour: colours.pale,
    align: 'middle',
  });
}

interface Field {
  readonly name: string;
  readonly value: string;
  /** Part of the row's width. */
  readonly share: number;
}

function drawFields(doc: Doc, area: Area, y: number, fields: readonly Field[]): void {
  let x = area.x;
  doc.undash().lineWidth(0.5).strokeColor(colours.rule);
  doc
    .moveTo(area.x, y)
    .lineTo(area.x + area.width, y)
    .stroke();
  fields.forEach((field, i) => {
    const width = field.share * area.width;
    if (i > 0) {
      doc.lineWidth(0.5).strokeColor(colours.rule);
      doc
        .moveTo(x, y)
        .lineTo(x, y + BLOCK_ROW)
        .stroke();
    }
    const inset = i > 0 ? 6 : 0;
    setLine(doc, field.name, x + inset, y + 9, { size: 6.5, colour: colours.soft });
    const style = { font: 'textMedium', size: 9.5 } as const;
    setLine(doc, fitted(doc, field.value, width - inset - 4, style), x + inset, y + 20, style);
    x += width;
  });
}

function drawBlock(doc: Doc, set: SheetSet, sheet: Sheet, area: Area, number: number, total: number): void {
  const { say, revision } = set;
  const field = (key: string) => say(`sheets.fields.${key}`);
  const top = area.y + area.height + 6;
  drawFields(doc, area, top, [
    { name: field('owner'), value: set.siteName, share: 0.32 },
    { name: field('title'), value: sheet.title, share: 0.36 },
    { name: field('documentType'), value: say(`sheets.documentTypes.${sheet.documentType}`), share: 0.18 },
    { name: field('sheet'), value: say('sheets.sheetOf', { number, total }), share: 0.14 },
  ]);
  drawFields(doc, area, top + BLOCK_ROW, [
    { name: field('identification'), value: identification(set, number), share: 0.2 },
    { name: field('issued'), value: revision ? dayOf(revision.savedAt) : say('sheets.notIssued'), share: 0.22 },
    { name: field('creator'), value: revision?.savedBy ?? '', share: 0.26 },
    { name: field('approval'), value: '', share: 0.32 },
  ]);
  const cautionTop = top + 2 * BLOCK_ROW;
  doc.lineWidth(0.5).strokeColor(colours.rule);
  doc
    .moveTo(area.x, cautionTop)
    .lineTo(area.x + area.width, cautionTop)
    .stroke();
  const power = typesetMeasure(ticks(ruleValue(set.drawing, 'powerLineDistance')), set.tape)
    .map((part) => part.text)
    .join('');
  const style = { size: CAUTION_SIZE, leading: CAUTION_LEADING } as const;
  const next = setParagraph(doc, say('sheets.cautions.code'), area.x, cautionTop + 10, area.width, {
    ...style,
    font: 'textBold',
  });
  setParagraph(doc, say('sheets.cautions.work', { power }), area.x, next, area.width, style);
}

/** Adds a page and draws a sheet on it: heading, drawing, title block, cautions. */
export function drawSheet(doc: Doc, set: SheetSet, sheet: Sheet, number: number, total: number): void {
  const size = sizeOf(sheet.paper, sheet.lying);
  doc.addPage({ size: [size.width, size.height], margin: 0 });
  const area = drawingArea(sheet.paper, sheet.lying, sheet.heading ? CARD_HEADING : HEADING);
  if (!set.revision) drawDraftLine(doc, set, area);
  sheet.draw(doc, area);
  if (sheet.heading) sheet.heading(doc, area);
  else drawHeading(doc, set, sheet, area);
  drawBlock(doc, set, sheet, area, number, total);
}
