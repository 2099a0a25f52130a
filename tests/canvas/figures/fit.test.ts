import { describe, expect, it } from 'vitest';
import { boxInView, fitDrawing, fitLabels, type MakeFigure } from '../../../canvas/figures/fit';
import { labelScale } from '../../../canvas/figures/labelScale';
import { pathOf } from '../../../canvas/figures/paths';
import { toScreen } from '../../../canvas/viewport/camera';
import { EMPTY_SURVEY } from '../../../model/drawing/surveySchema';
import { elevationFigure } from '../../../model/figures/elevation';
import { planFigure } from '../../../model/figures/plan';
import { inches, ticks } from '../../../model/length/ticks';
import { solve } from '../../../model/setOut';
import { slantedStudio, toolStore } from '../../model/figures/scenes';
import { coveredTexts } from '../../model/figures/texts';

const views = [
  { width: 390, height: 440 },
  { width: 300, height: 700 },
  { width: 560, height: 300 },
  { width: 1200, height: 800 },
];
const even = (px: number) => ({ left: px, top: px, right: px, bottom: px });
const scenes = [toolStore(), slantedStudio()].map((drawing) => ({ drawing, setOut: solve(drawing, EMPTY_SURVEY) }));

describe('fitting a figure', () => {
  it.each(views)('shows a whole elevation with its labels in $width × $height, and wastes little', (size) => {
    for (const { drawing, setOut } of scenes) {
      const make: MakeFigure = (scale) => {
        const figure = elevationFigure(drawing, setOut, 'r0', { scale, selectedCourse: null, poleId: null });
        if (!figure) throw new Error('no elevation');
        return figure;
      };
      const camera = fitLabels([make], size, even(10));
      const { bounds } = make(labelScale(camera.scale), null);
      const lowerLeft = toScreen(camera, size, { x: bounds.left, y: bounds.bottom });
      const upperRight = toScreen(camera, size, { x: bounds.right, y: bounds.top });
      // Within the 10 px of padding but for 2 px that the last round may leave.
      expect(Math.min(lowerLeft.x, upperRight.y)).toBeGreaterThan(8);
      expect(upperRight.x).toBeLessThan(size.width - 8);
      expect(lowerLeft.y).toBeLessThan(size.height - 8);
      const used = Math.max(
        (upperRight.x - lowerLeft.x) / (size.width - 20),
        (lowerLeft.y - upperRight.y) / (size.height - 20),
      );
      expect(used).toBeGreaterThan(0.95);
    }
  });

  it.each(views)('keeps every letter and length of a plan in view in $width × $height', (size) => {
    for (const { drawing, setOut } of scenes) {
      const make: MakeFigure = (scale, within) =>
        planFigure(drawing, setOut, { selection: null, scale, dimensions: true, within });
      const camera = fitDrawing([make], size, even(40));
      const scale = labelScale(camera.scale);
      const texts = coveredTexts(make(scale, boxInView(camera, size, 6)), scale);
      expect(texts.length).toBeGreaterThanOrEqual(drawing.corners.length);
      for (const { points } of texts)
        for (const point of points) {
          const { x, y } = toScreen(camera, size, point);
          expect(Math.min(x, y)).toBeGreaterThan(0);
          expect(x).toBeLessThan(size.width);
          expect(y).toBeLessThan(size.height);
        }
    }
  });

  it('fits two figures as one, so that they stand alike', () => {
    const [store, studio] = scenes.map(
      ({ drawing, setOut }): MakeFigure =>
        (scale) =>
          planFigure(drawing, setOut, { selection: null, scale, dimensions: false }),
    );
    if (!store || !studio) throw new Error('two scenes are needed');
    const size = { width: 500, height: 500 };
    expect(fitDrawing([store, studio], size, even(20))).toEqual(fitDrawing([studio, store], size, even(20)));
  });
});

describe('paths of shapes', () => {
  // One pixel to the inch: plan coordinates in inches read off as pixels, y turned down.
  const scale = 1 / inches(1);
  const at = (x: number, y: number) => ({ x: inches(x), y: inches(y) });

  it('trace polygons, lines and boxes with y down', () => {
    const triangle = { kind: 'polygon', role: 'body', points: [at(0, 0), at(4, 0), at(4, 3)] } as const;
    expect(pathOf(triangle, scale)).toBe('M0 0L4 0L4 -3Z');
    const lines = {
      kind: 'lines',
      role: 'joint',
      lines: [
        [at(0, 1), at(2, 1)],
        [at(1, 0), at(1, 2)],
      ],
    } as const;
    expect(pathOf(lines, scale)).toBe('M0 -1L2 -1M1 0L1 -2');
    const boxes = { kind: 'boxes', role: 'unit', boxes: [[inches(1), inches(2), inches(3), inches(4)]] } as const;
    expect(pathOf(boxes, scale)).toBe('M1 -6h3v4h-3Z');
  });

  it('sweep an arc counter-clockwise as it is seen', () => {
    const arc = { kind: 'arc', role: 'swing', centre: at(0, 0), radius: ticks(inches(2)), from: 0, to: 90 } as const;
    expect(pathOf(arc, scale)).toBe('M2 0A2 2 0 0 0 0 -2');
  });

  it('leave texts and dots to their own elements', () => {
    expect(pathOf({ kind: 'dot', role: 'foot', at: at(0, 0), size: 'small' }, scale)).toBeNull();
  });
});
