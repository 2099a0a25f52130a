/** Every wall run from outside, all at one standard scale, as many to a sheet as find room, in the order of the runs. */
import { elevationFigure } from '../../model/figures/elevation';
import type { Figure } from '../../model/figures/figure';
import { BAR_SCALE_HEIGHT, drawBarScale } from './barScale';
import { paperLabelScale } from './ink';
import { largestThatFits, type Area, type DrawingScale } from './paper';
import { printFigure } from './paperPrinter';
import { heightOnPaper, widthOnPaper } from './planSheet';
import { drawingArea, type Sheet, type SheetSet } from './sheet';
import { setLine, type Doc } from './type';

const CAPTION = 16;
const GAP = 18;

interface Elevation {
  readonly name: string;
  readonly figure: Figure;
}

/** Elevations side by side on one ground line. */
interface Shelf {
  readonly items: Elevation[];
  width: number;
  /** Highest top and lowest bottom of its figures, points above and below the high point. */
  above: number;
  below: number;
}

function elevationsAt(set: SheetSet, scale: DrawingScale, room: Area): Elevation[] | null {
  const longest = set.setOut.walls.runs.reduce((most, run) => Math.max(most, run.length), 0);
  if (longest * scale.pointsPerTick > room.width) return null;
  const labelScale = paperLabelScale(scale.pointsPerTick);
  const elevations: Elevation[] = [];
  for (const run of set.setOut.walls.runs) {
    const figure = elevationFigure(set.drawing, set.setOut, run.runId, {
      scale: labelScale,
      selectedCourse: null,
      poleId: null,
    });
    if (!figure) continue;
    if (widthOnPaper(figure, scale) > room.width || heightOnPaper(figure, scale) + CAPTION > room.height) return null;
    elevations.push({ name: run.name, figure });
  }
  return elevations;
}

function shelve(elevations: readonly Elevation[], scale: DrawingScale, room: Area): Shelf[] {
  const shelves: Shelf[] = [];
  for (const item of elevations) {
    const width = widthOnPaper(item.figure, scale);
    const above = item.figure.bounds.top * scale.pointsPerTick;
    const below = -item.figure.bounds.bottom * scale.pointsPerTick;
    const last = shelves[shelves.length - 1];
    const fits =
      last &&
      last.width + GAP + width <= room.width &&
      Math.max(last.above, above) + Math.max(last.below, below) + CAPTION <= room.height;
    if (last && fits) {
      last.items.push(item);
      last.width += GAP + width;
      last.above = Math.max(last.above, above);
      last.below = Math.max(last.below, below);
    } else shelves.push({ items: [item], width, above, below });
  }
  return shelves;
}

/** Height of a shelf with the captions under it. */
const heightOf = (shelf: Shelf) => shelf.above + shelf.below + CAPTION;

function sheetsOf(shelves: readonly Shelf[], room: Area): Shelf[][] {
  const sheets: Shelf[][] = [];
  let used = 0;
  for (const shelf of shelves) {
    const last = sheets[sheets.length - 1];
    const height = heightOf(shelf);
    if (last && used + GAP + height <= room.height) {
      last.push(shelf);
      used += GAP + height;
    } else {
      sheets.push([shelf]);
      used = height;
    }
  }
  return sheets;
}

function drawShelves(doc: Doc, set: SheetSet, shelves: readonly Shelf[], scale: DrawingScale, room: Area): void {
  const height = shelves.reduce((sum, shelf) => sum + heightOf(shelf), 0);
  // What room is left is shared out between the shelves.
  const gap = Math.min(GAP * 2.5, (room.height - height) / Math.max(1, shelves.length));
  let top = room.y + gap / 2;
  for (const shelf of shelves) {
    const ground = top + shelf.above;
    const spare = (room.width - shelf.width) / (shelf.items.length + 1);
    const between = Math.min(spare, GAP * 2);
    let x = room.x + (room.width - shelf.width - between * (shelf.items.length - 1)) / 2;
    for (const { name, figure } of shelf.items) {
      const width = widthOnPaper(figure, scale);
      const place = {
        x: x - figure.bounds.left * scale.pointsPerTick,
        y: ground,
        pointsPerTick: scale.pointsPerTick,
      };
      printFigure(doc, figure, place, set.say);
      const caption = set.say('sheets.elevation', { name });
      setLine(doc, caption, place.x, ground + shelf.below + 11, { font: 'textBold', size: 9.5 });
      x += width + GAP + between;
    }
    top += heightOf(shelf) + gap;
  }
}

/** None where there are no runs. */
export function elevationSheets(set: SheetSet): Sheet[] {
  const lying = true;
  const whole = drawingArea(set.paper, lying);
  const room = { ...whole, height: whole.height - BAR_SCALE_HEIGHT };
  let elevations: Elevation[] = [];
  const scale = largestThatFits(set.drawing.units, (candidate) => {
    const made = elevationsAt(set, candidate, room);
    if (made) elevations = made;
    return made !== null;
  });
  return sheetsOf(shelve(elevations, scale, room), room).map((shelves) => {
    const names = shelves.flatMap((shelf) => shelf.items.map((item) => item.name));
    return {
      paper: set.paper,
      lying,
      documentType: 'elevation',
      title: `${set.say('sheets.elevations')}: ${names.join(', ')}`,
      scale,
      draw(doc, area) {
        drawShelves(doc, set, shelves, scale, { ...area, height: area.height - BAR_SCALE_HEIGHT });
        drawBarScale(doc, set.tape, scale, area.x + 8, area.y + area.height - 4, set.say);
      },
    };
  });
}
