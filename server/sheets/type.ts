/** Setting type on a sheet: our own fonts only, tabular figures, and a fraction set as one. */
import { fileURLToPath } from 'node:url';
import type PDFDocument from 'pdfkit';
import type { LengthStyle } from '../../model/length/write';
import type { Ticks } from '../../model/length/ticks';
import type { Tape } from '../../model/figures/figure';
import { typesetMeasure, type TypePart } from '../../model/figures/typeset';
import { colours } from './ink';

/** A document being written. */
export type Doc = InstanceType<typeof PDFDocument>;

const FONT_FILES = {
  text: 'Barlow-400Regular.ttf',
  textMedium: 'Barlow-500Medium.ttf',
  textBold: 'Barlow-600SemiBold.ttf',
  numbers: 'BarlowCondensed-500Medium.ttf',
  numbersBold: 'BarlowCondensed-600SemiBold.ttf',
} as const;
export type FontName = keyof typeof FONT_FILES;

/** The font that a document opens with, so that it never falls back on a font that it doesn't carry. */
export const FIRST_FONT = fontPath('text');

function fontPath(name: FontName): string {
  return fileURLToPath(new URL(`../../fonts/${FONT_FILES[name]}`, import.meta.url));
}

export function registerFonts(doc: Doc): void {
  for (const name of Object.keys(FONT_FILES) as FontName[]) doc.registerFont(name, fontPath(name));
}

export interface TypeStyle {
  readonly font?: FontName;
  readonly size: number;
  readonly colour?: string;
  readonly align?: 'start' | 'middle' | 'end';
}

const plain = (text: string): TypePart[] => [{ text, fraction: false }];
const featuresOf = (part: TypePart): ('frac' | 'tnum' | 'kern')[] => (part.fraction ? ['frac'] : ['tnum', 'kern']);

/** A measurement ready to be set. The PDF writer makes a fraction of figures round a fraction slash only. */
export function measure(length: Ticks, tape: Tape, style?: LengthStyle): TypePart[] {
  return typesetMeasure(length, tape, style).map((part) =>
    part.fraction ? { ...part, text: part.text.replace('/', '\u2044') } : part,
  );
}

/** Width of a text in points. */
export function widthOf(doc: Doc, text: string | readonly TypePart[], style: TypeStyle): number {
  doc.font(style.font ?? 'text').fontSize(style.size);
  const parts = typeof text === 'string' ? plain(text) : text;
  return parts.reduce((sum, part) => sum + doc.widthOfString(part.text, { features: featuresOf(part) }), 0);
}

/** Sets one line with its baseline at (x, y); never wraps, never moves to another page. Returns its width. */
export function setLine(doc: Doc, text: string | readonly TypePart[], x: number, y: number, style: TypeStyle): number {
  const width = widthOf(doc, text, style);
  let at = style.align === 'middle' ? x - width / 2 : style.align === 'end' ? x - width : x;
  doc.fillColor(style.colour ?? colours.ink);
  for (const part of typeof text === 'string' ? plain(text) : text) {
    const features = featuresOf(part);
    doc.text(part.text, at, y, { lineBreak: false, baseline: 'alphabetic', features });
    at += doc.widthOfString(part.text, { features });
  }
  return width;
}

/** Sets words in lines no wider than `width`, the first baseline at y. Returns the baseline after the last line. */
export function setParagraph(
  doc: Doc,
  text: string,
  x: number,
  y: number,
  width: number,
  style: TypeStyle & { readonly leading: number },
): number {
  let line = '';
  let at = y;
  const flush = () => {
    setLine(doc, line, x, at, style);
    at += style.leading;
  };
  for (const word of text.split(' ')) {
    const longer = line === '' ? word : `${line} ${word}`;
    if (line !== '' && widthOf(doc, longer, style) > width) {
      flush();
      line = word;
    } else line = longer;
  }
  if (line !== '') flush();
  return at;
}

/** A text cut to a width, its end replaced by an ellipsis where it doesn't fit. */
export function fitted(doc: Doc, text: string, width: number, style: TypeStyle): string {
  if (widthOf(doc, text, style) <= width) return text;
  let kept = text;
  while (kept.length > 0 && widthOf(doc, `${kept.trimEnd()}…`, style) > width) kept = kept.slice(0, -1);
  return `${kept.trimEnd()}…`;
}
