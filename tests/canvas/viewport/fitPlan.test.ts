import { describe, expect, it } from 'vitest';
import { toScreen } from '../../../canvas/viewport/camera';
import { fitPlan, groundBox } from '../../../canvas/viewport/fitPlan';
import { chipPlace } from '../../../canvas/panels/plan/chipPlace';
import { EMPTY_SURVEY } from '../../../model/drawing/surveySchema';
import { planFigure } from '../../../model/figures/plan';
import { feet } from '../../../model/length/ticks';
import { solve } from '../../../model/setOut';
import { building } from '../helpers';

const square = building([
  [0, 0],
  [20, 0],
  [20, 10],
  [0, 10],
]);
const labelScale = (pixelsPerTick: number) => ({
  textHeight: {
    small: 12 / pixelsPerTick,
    label: 13 / pixelsPerTick,
    dimension: 16 / pixelsPerTick,
    letter: 17 / pixelsPerTick,
  },
  advance: 0.46,
  clear: 4 / pixelsPerTick,
});

describe('fitting the plan', () => {
  it.each([
    { width: 390, height: 507 },
    { width: 800, height: 600 },
    { width: 300, height: 900 },
  ])('shows walls, braces, letters and dimensions inside $width × $height', (size) => {
    const setOut = solve(square, EMPTY_SURVEY);
    const figureAt = (scale: ReturnType<typeof labelScale>) =>
      planFigure(square, setOut, { selection: null, scale, dimensions: true });
    const padding = { left: 20, top: 20, right: 20, bottom: 20 };
    const camera = fitPlan({ drawing: square, setOut, size, padding, figureAt, labelScale });
    const { bounds } = figureAt(labelScale(camera.scale));
    const low = toScreen(camera, size, { x: bounds.left, y: bounds.bottom });
    const high = toScreen(camera, size, { x: bounds.right, y: bounds.top });
    expect(Math.min(low.x, high.y)).toBeGreaterThanOrEqual(0);
    expect(high.x).toBeLessThanOrEqual(size.width);
    expect(low.y).toBeLessThanOrEqual(size.height);
    // And not lost in the middle: the building with its braces takes most of one direction.
    expect(Math.max((high.x - low.x) / size.width, (low.y - high.y) / size.height)).toBeGreaterThan(0.75);
  });

  it('shows some thirty feet where nothing is drawn yet', () => {
    const nothing = building([], false);
    const setOut = solve(nothing, EMPTY_SURVEY);
    expect(groundBox(nothing, setOut)).toBe(null);
    const size = { width: 390, height: 500 };
    const camera = fitPlan({
      drawing: nothing,
      setOut,
      size,
      padding: { left: 0, top: 0, right: 0, bottom: 0 },
      labelScale,
      figureAt: () => {
        throw new Error('nothing to draw');
      },
    });
    expect(camera).toMatchObject({ x: 0, y: 0 });
    expect(size.width / camera.scale).toBeGreaterThan(feet(25));
    expect(size.width / camera.scale).toBeLessThan(feet(40));
  });
});

describe('where the numbers ride', () => {
  const size = { width: 390, height: 500 };

  it('keeps them above a finger, farther than above a mouse', () => {
    expect(chipPlace({ x: 195, y: 300 }, 'touch', size).top).toBeLessThan(300 - 64);
    expect(chipPlace({ x: 195, y: 300 }, 'mouse', size).top).toBeGreaterThan(300 - 80);
  });

  it('keeps them inside the view, and beside the finger near its top', () => {
    for (const x of [0, 60, 195, 330, 390])
      for (const y of [0, 50, 250, 500]) {
        const place = chipPlace({ x, y }, 'touch', size);
        expect(place.left).toBeGreaterThanOrEqual(0);
        expect(place.left + place.width).toBeLessThanOrEqual(size.width);
        expect(place.top).toBeGreaterThanOrEqual(0);
      }
    const left = chipPlace({ x: 40, y: 30 }, 'touch', size);
    expect(left.left).toBeGreaterThanOrEqual(40 + 24);
  });
});
