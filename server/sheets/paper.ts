/** Paper sizes and the standard scales, in points (1/72 in) of paper for each tick of the building. */
import type { Units } from '../../model/drawing/schema';

export type Paper = 'letter' | 'tabloid' | 'a4' | 'a3';

export interface PaperSize {
  readonly width: number;
  readonly height: number;
}

const millimetres = (width: number, height: number): PaperSize => ({
  width: (width * 72) / 25.4,
  height: (height * 72) / 25.4,
});

/** Upright sizes in points. A4 and A3 by ISO 216 (210 × 297 and 297 × 420 mm). */
const SIZES: Readonly<Record<Paper, PaperSize>> = {
  letter: { width: 612, height: 792 },
  tabloid: { width: 792, height: 1224 },
  a4: millimetres(210, 297),
  a3: millimetres(297, 420),
};

/** Cards go up the wall: they are never larger than a letter or A4 sheet. */
const CARD: Readonly<Record<Paper, Paper>> = { letter: 'letter', tabloid: 'letter', a4: 'a4', a3: 'a4' };

export function sizeOf(paper: Paper, lying: boolean): PaperSize {
  const { width, height } = SIZES[paper];
  return lying ? { width: height, height: width } : { width, height };
}

export function cardPaper(paper: Paper): Paper {
  return CARD[paper];
}

/** One tick (1/640 mm) at full size, in points. */
const POINTS_PER_TICK = 72 / 25.4 / 640;

/** A drawing scale 1:n. */
export interface DrawingScale {
  readonly denominator: number;
  readonly pointsPerTick: number;
  /** As it is written on the sheet. */
  readonly text: string;
}

/** Inches to the foot for each architectural scale (general drafting practice); smaller ones are engineers' feet to the inch. */
const IMPERIAL: readonly (readonly [number, string])[] = [
  [4, '3 in = 1 ft'],
  [8, '1 1/2 in = 1 ft'],
  [12, '1 in = 1 ft'],
  [16, '3/4 in = 1 ft'],
  [24, '1/2 in = 1 ft'],
  [32, '3/8 in = 1 ft'],
  [48, '1/4 in = 1 ft'],
  [64, '3/16 in = 1 ft'],
  [96, '1/8 in = 1 ft'],
  [128, '3/32 in = 1 ft'],
  [192, '1/16 in = 1 ft'],
  [240, '1 in = 20 ft'],
  [360, '1 in = 30 ft'],
  [480, '1 in = 40 ft'],
  [600, '1 in = 50 ft'],
  [1200, '1 in = 100 ft'],
  [2400, '1 in = 200 ft'],
  [6000, '1 in = 500 ft'],
  [12000, '1 in = 1000 ft'],
];

/** ISO 5455 reductions (from memory). */
const METRIC: readonly number[] = [5, 10, 20, 50, 100, 200, 500, 1000, 2000, 5000, 10000];

/** The standard scales, largest first. */
export function standardScales(units: Units): readonly DrawingScale[] {
  const scales: readonly (readonly [number, string])[] =
    units === 'imperial'
      ? IMPERIAL.map(([n, text]) => [n, `${text} (1:${n})`] as const)
      : METRIC.map((n) => [n, `1:${n}`] as const);
  return scales.map(([denominator, text]) => ({ denominator, text, pointsPerTick: POINTS_PER_TICK / denominator }));
}

/** The largest standard scale that fits, or the smallest there is. */
export function largestThatFits(units: Units, fits: (scale: DrawingScale) => boolean): DrawingScale {
  const scales = standardScales(units);
  const found = scales.find(fits) ?? scales[scales.length - 1];
  if (!found) throw new Error('there is no standard scale for these units');
  return found;
}

/** A part of a sheet, in points, y down. */
export interface Area {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
}
