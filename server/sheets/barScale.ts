/** The scale written and drawn, so that a copy that was shrunk gives itself away. */
import { TICKS_PER_FOOT, TICKS_PER_MM, ticks } from '../../model/length/ticks';
import { measure, setLine, widthOf, type Doc } from './type';
import type { Tape } from '../../model/figures/figure';
import type { Say } from '../../model/words/say';
import { colours } from './ink';
import type { DrawingScale } from './paper';

export const BAR_SCALE_HEIGHT = 26;
const MOST_WIDTH = 150;
const PARTS = 4;

/** One part of the bar in ticks: the largest round length of which four fit. */
function partOf(tape: Tape, scale: DrawingScale): number {
  const unit = tape.units === 'imperial' ? TICKS_PER_FOOT : 100 * TICKS_PER_MM;
  const rounds = [0.25, 0.5, 1, 2, 5, 10, 20, 50, 100, 200, 500, 1000, 5000, 20000].map((n) => n * unit);
  const fits = rounds.filter((length) => length * PARTS * scale.pointsPerTick <= MOST_WIDTH);
  return fits[fits.length - 1] ?? unit * 0.25;
}

/** Draws the bar with its left end at (x, y), y the bar's lower edge; four parts, light and dark in turn. */
export function drawBarScale(doc: Doc, tape: Tape, scale: DrawingScale, x: number, y: number, say: Say): void {
  const part = partOf(tape, scale);
  const width = part * scale.pointsPerTick;
  for (let i = 0; i < PARTS; i += 1) {
    doc
      .undash()
      .lineWidth(0.6)
      .rect(x + i * width, y - 4, width, 4);
    doc.fillAndStroke(i % 2 === 0 ? colours.ink : colours.white, colours.ink);
  }
  for (const i of [0, 2, 4])
    setLine(doc, measure(ticks(Math.round(part * i)), tape), x + i * width, y - 7, {
      font: 'numbers',
      size: 7.5,
      align: 'middle',
    });
  const written = say('sheets.scale', { scale: scale.text });
  const style = { font: 'textBold', size: 8.5 } as const;
  const at = x + PARTS * width + 22;
  setLine(doc, written, at, y, style);
  setLine(doc, say('sheets.barScale'), at + widthOf(doc, written, style) + 10, y, { size: 7, colour: colours.soft });
}
