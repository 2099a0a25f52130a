/** The sheets of a drawing as one vector PDF: the plan, every wall from outside, and a card for each pole and lift. */
import PDFDocument from 'pdfkit';
import type { Drawing } from '../../model/drawing/schema';
import type { Survey } from '../../model/drawing/surveySchema';
import { solve } from '../../model/setOut';
import type { Say } from '../../model/words/say';
import { say as english } from '../words';
import { elevationSheets } from './elevationSheets';
import type { Paper } from './paper';
import { planSheet } from './planSheet';
import { poleCards } from './poleCards';
import { drawSheet, type SheetRevision, type SheetSet } from './sheet';
import { FIRST_FONT, registerFonts } from './type';

export interface SheetsInput {
  readonly siteName: string;
  /** The issued revision, or null for a draft, which says so across every sheet. */
  readonly revision: SheetRevision | null;
  readonly drawing: Drawing;
  readonly survey: Survey;
  /** Letter where the drawing is in inches, A4 where it is in millimetres, unless given. */
  readonly paper?: Paper;
}

export interface PrintOptions {
  readonly say?: Say;
  /** Content streams are compressed unless this is false. */
  readonly compress?: boolean;
}

/** A draft has no date of its own, and the same draft must print the same file. */
const NO_DATE = new Date(0);

/** Solves the drawing and prints its sheets. The same input gives the same bytes. */
export function printSheets(input: SheetsInput, options: PrintOptions = {}): NodeJS.ReadableStream {
  const { drawing, siteName, revision } = input;
  const say = options.say ?? english;
  const set: SheetSet = {
    siteName,
    revision,
    drawing,
    setOut: solve(drawing, input.survey),
    tape: { units: drawing.units, step: drawing.tapeStep },
    paper: input.paper ?? (drawing.units === 'imperial' ? 'letter' : 'a4'),
    say,
  };
  const issued = revision ? new Date(revision.savedAt) : NO_DATE;
  const title = revision ? say('sheets.revision', { number: revision.number }) : say('sheets.draft');
  const doc = new PDFDocument({
    autoFirstPage: false,
    compress: options.compress ?? true,
    font: FIRST_FONT,
    info: {
      Title: `${siteName}: ${title}`,
      Author: revision?.savedBy ?? '',
      CreationDate: Number.isNaN(issued.getTime()) ? NO_DATE : issued,
    },
  });
  registerFonts(doc);
  const sheets = [planSheet(set), ...elevationSheets(set), ...poleCards(set)];
  sheets.forEach((sheet, i) => drawSheet(doc, set, sheet, i + 1, sheets.length));
  doc.end();
  return doc;
}
