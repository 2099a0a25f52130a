/** The plan on one sheet, at the largest standard scale that takes it in with its braces, letters and dimensions. */
import type { Figure } from '../../model/figures/figure';
import { planFigure } from '../../model/figures/plan';
import { BAR_SCALE_HEIGHT, drawBarScale } from './barScale';
import { colours, paperLabelScale } from './ink';
import { largestThatFits, type Area, type DrawingScale } from './paper';
import { printFigure } from './paperPrinter';
import { drawingArea, type Sheet, type SheetSet } from './sheet';
import { setLine } from './type';

export function widthOnPaper(figure: Figure, scale: DrawingScale): number {
  return (figure.bounds.right - figure.bounds.left) * scale.pointsPerTick;
}

export function heightOnPaper(figure: Figure, scale: DrawingScale): number {
  return (figure.bounds.top - figure.bounds.bottom) * scale.pointsPerTick;
}

function planAt(set: SheetSet, scale: DrawingScale): Figure {
  return planFigure(set.drawing, set.setOut, {
    selection: null,
    scale: paperLabelScale(scale.pointsPerTick),
    dimensions: true,
    running: true,
    cautions: true,
  });
}

/** Room for the drawing above the bar scale. */
function roomIn(area: Area): Area {
  return { ...area, height: area.height - BAR_SCALE_HEIGHT };
}

/** Whether the walls alone would already be too large: spares making the figure at scales that can't fit. */
function cornersFit(set: SheetSet, scale: DrawingScale, room: Area): boolean {
  const xs = set.drawing.corners.map((corner) => corner.x);
  const ys = set.drawing.corners.map((corner) => corner.y);
  if (xs.length === 0) return true;
  const spread = (values: readonly number[]) =>
    values.reduce((most, value) => Math.max(most, value), -Infinity) -
    values.reduce((least, value) => Math.min(least, value), Infinity);
  return spread(xs) * scale.pointsPerTick <= room.width && spread(ys) * scale.pointsPerTick <= room.height;
}

export function planSheet(set: SheetSet): Sheet {
  const lying = true;
  const room = roomIn(drawingArea(set.paper, lying));
  let figure: Figure | null = null;
  const scale = largestThatFits(set.drawing.units, (candidate) => {
    if (!cornersFit(set, candidate, room)) return false;
    figure = planAt(set, candidate);
    return widthOnPaper(figure, candidate) <= room.width && heightOnPaper(figure, candidate) <= room.height;
  });
  const plan: Figure = figure ?? planAt(set, scale);
  return {
    paper: set.paper,
    lying,
    documentType: 'plan',
    title: set.say('sheets.plan'),
    scale,
    draw(doc, area) {
      const inside = roomIn(area);
      const middle = { x: (plan.bounds.left + plan.bounds.right) / 2, y: (plan.bounds.bottom + plan.bounds.top) / 2 };
      const place = {
        x: inside.x + inside.width / 2 - middle.x * scale.pointsPerTick,
        y: inside.y + inside.height / 2 + middle.y * scale.pointsPerTick,
        pointsPerTick: scale.pointsPerTick,
      };
      doc.save();
      doc.rect(inside.x, inside.y, inside.width, inside.height).clip();
      printFigure(doc, plan, place, set.say);
      doc.restore();
      setLine(doc, set.say('sheets.runningFrom'), area.x + area.width, area.y + area.height - 4, {
        size: 7.5,
        colour: colours.soft,
        align: 'end',
      });
      drawBarScale(doc, set.tape, scale, area.x + 8, area.y + area.height - 4, set.say);
    },
  };
}
