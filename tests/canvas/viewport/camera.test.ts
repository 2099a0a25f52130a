import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  clampCamera,
  fitBox,
  panBy,
  pinchTo,
  SCALE_LEAST,
  SCALE_MOST,
  screenPoint,
  toPlan,
  toScreen,
  transformBetween,
  zoomAbout,
  type Camera,
} from '../../../canvas/viewport/camera';
import { ticks } from '../../../model/length/ticks';

const size = { width: 390, height: 600 };
const box = { left: ticks(0), bottom: ticks(0), right: ticks(4000), top: ticks(2000) };
const none = { left: 0, top: 0, right: 0, bottom: 0 };

const someCamera = fc.record({
  x: fc.integer({ min: -1e8, max: 1e8 }),
  y: fc.integer({ min: -1e8, max: 1e8 }),
  scale: fc.double({ min: SCALE_LEAST, max: SCALE_MOST, noNaN: true }),
});
const somePlace = fc.record({ x: fc.integer({ min: 0, max: 390 }), y: fc.integer({ min: 0, max: 600 }) });

describe('the camera', () => {
  it('puts its own place in the middle of the view and up on the plan upwards on the screen', () => {
    const camera: Camera = { x: 1000, y: 500, scale: 0.01 };
    expect(toScreen(camera, size, { x: 1000, y: 500 })).toEqual({ x: 195, y: 300 });
    expect(toScreen(camera, size, { x: 2000, y: 1500 })).toEqual({ x: 205, y: 290 });
  });

  it('finds the plan place that it shows at a screen place', () => {
    fc.assert(
      fc.property(someCamera, somePlace, (camera, at) => {
        const back = toScreen(camera, size, toPlan(camera, size, at));
        expect(Math.abs(back.x - at.x)).toBeLessThan(1e-6);
        expect(Math.abs(back.y - at.y)).toBeLessThan(1e-6);
      }),
    );
  });

  it('keeps what is under the finger under it while panning', () => {
    const camera: Camera = { x: 0, y: 0, scale: 0.01 };
    const moved = panBy(camera, 30, -20);
    expect(moved).toEqual({ x: -3000, y: -2000, scale: 0.01 });
    expect(toScreen(moved, size, { x: 0, y: 0 })).toEqual({ x: 225, y: 280 });
  });

  it('keeps the place under the pointer while zooming', () => {
    fc.assert(
      fc.property(someCamera, somePlace, fc.double({ min: 0.2, max: 5, noNaN: true }), (camera, at, factor) => {
        const held = toPlan(camera, size, at);
        const shown = toScreen(zoomAbout(camera, size, at, factor), size, held);
        expect(Math.abs(shown.x - at.x)).toBeLessThan(1e-5);
        expect(Math.abs(shown.y - at.y)).toBeLessThan(1e-5);
      }),
    );
  });

  it('refuses a zoom factor and a pan that are not numbers', () => {
    const camera: Camera = { x: 5, y: 6, scale: 0.01 };
    for (const factor of [NaN, 0, -1, Infinity])
      expect(zoomAbout(camera, size, screenPoint(0, 0), factor)).toBe(camera);
    expect(panBy(camera, NaN, 0)).toBe(camera);
  });

  it('stops zooming at its limits', () => {
    const camera: Camera = { x: 0, y: 0, scale: 0.01 };
    expect(zoomAbout(camera, size, screenPoint(0, 0), 1e9).scale).toBe(SCALE_MOST);
    expect(zoomAbout(camera, size, screenPoint(0, 0), 1e-9).scale).toBe(SCALE_LEAST);
  });

  it('pans and zooms together with two fingers: each finger keeps its place', () => {
    const camera: Camera = { x: 0, y: 0, scale: 0.001 };
    const from = { a: { x: 100, y: 100 }, b: { x: 200, y: 100 } };
    const to = { a: { x: 120, y: 150 }, b: { x: 320, y: 150 } };
    const after = pinchTo(camera, size, from, to);
    expect(after.scale).toBeCloseTo(0.002, 12);
    const a = toScreen(after, size, toPlan(camera, size, from.a));
    const b = toScreen(after, size, toPlan(camera, size, from.b));
    expect([a.x, a.y, b.x, b.y].map((value) => Math.round(value * 1e6) / 1e6)).toEqual([120, 150, 320, 150]);
  });

  it('only pans when two fingers start at one place', () => {
    const camera: Camera = { x: 0, y: 0, scale: 0.001 };
    const at = { x: 50, y: 50 };
    const after = pinchTo(camera, size, { a: at, b: at }, { a: { x: 60, y: 50 }, b: { x: 80, y: 50 } });
    expect(after.scale).toBe(0.001);
    expect(Number.isFinite(after.x) && Number.isFinite(after.y)).toBe(true);
  });

  it('fits a box into the padded view and centres it there', () => {
    const camera = fitBox(box, { width: 500, height: 400 }, { left: 100, top: 0, right: 0, bottom: 0 });
    expect(camera.scale).toBe(SCALE_MOST);
    const wide = { left: ticks(0), bottom: ticks(0), right: ticks(4_000_000), top: ticks(1_000_000) };
    const fitted = fitBox(wide, { width: 500, height: 400 }, { left: 100, top: 20, right: 0, bottom: 0 });
    expect(toScreen(fitted, { width: 500, height: 400 }, { x: 0, y: 500_000 })).toEqual({ x: 100, y: 210 });
    expect(toScreen(fitted, { width: 500, height: 400 }, { x: 4_000_000, y: 500_000 })).toEqual({ x: 500, y: 210 });
  });

  it('finds a workable camera for a point, an empty view and a view smaller than its padding', () => {
    const point = { left: ticks(7), bottom: ticks(8), right: ticks(7), top: ticks(8) };
    for (const view of [size, { width: 0, height: 0 }, { width: 10, height: 10 }]) {
      const camera = fitBox(point, view, { left: 40, top: 40, right: 40, bottom: 40 });
      expect(camera.scale).toBeGreaterThanOrEqual(SCALE_LEAST);
      expect(camera.scale).toBeLessThanOrEqual(SCALE_MOST);
      expect(Number.isFinite(camera.x) && Number.isFinite(camera.y)).toBe(true);
    }
    expect(fitBox(point, size, none)).toMatchObject({ x: 7, y: 8 });
  });

  it('never lets the drawing out of sight', () => {
    const camera: Camera = { x: 1e9, y: -1e9, scale: 0.01 };
    const kept = clampCamera(camera, box, size);
    expect(kept).toEqual({ x: 4000 + 19_500, y: 0 - 30_000, scale: 0.01 });
    expect(clampCamera(kept, box, size)).toBe(kept);
  });

  it('shows by a transform of the drawn picture what the moved camera would draw', () => {
    fc.assert(
      fc.property(somePlace, fc.double({ min: 0.3, max: 3, noNaN: true }), (at, factor) => {
        const drawn: Camera = { x: 1000, y: 2000, scale: 0.001 };
        const now = panBy(zoomAbout(drawn, size, at, factor), 12, -7);
        const plan = { x: 31_000, y: -12_000 };
        const before = toScreen(drawn, size, plan);
        const { translateX, translateY, scale } = transformBetween(drawn, now);
        const shown = {
          x: (before.x - size.width / 2) * scale + size.width / 2 + translateX,
          y: (before.y - size.height / 2) * scale + size.height / 2 + translateY,
        };
        const expected = toScreen(now, size, plan);
        expect(shown.x).toBeCloseTo(expected.x, 6);
        expect(shown.y).toBeCloseTo(expected.y, 6);
      }),
    );
  });
});
