import { describe, expect, it } from 'vitest';
import { bringIntoView, toScreen, type Camera } from '../../../canvas/viewport/camera';

const size = { width: 400, height: 800 };
const camera: Camera = { x: 0, y: 0, scale: 0.01 };
const room = { edge: 24, margin: 100 };

describe('bringing places into view', () => {
  it('leaves the camera alone while every place is in sight', () => {
    expect(bringIntoView(camera, size, [{ x: 17_000, y: 0 }], room)).toBe(camera);
  });

  it('moves a place that is out at the right to the margin, without zooming', () => {
    const brought = bringIntoView(camera, size, [{ x: 50_000, y: 1_000 }], room);
    expect(brought.scale).toBe(camera.scale);
    const seen = toScreen(brought, size, { x: 50_000, y: 1_000 });
    expect(seen.x).toBeCloseTo(300, 6);
    expect(seen.y).toBeCloseTo(390, 6);
  });

  it('moves a place that is out above to the margin at the top', () => {
    const seen = toScreen(bringIntoView(camera, size, [{ x: 0, y: 90_000 }], room), size, { x: 0, y: 90_000 });
    expect(seen.x).toBeCloseTo(200, 6);
    expect(seen.y).toBeCloseTo(100, 6);
  });

  it('steps back until two places that are far apart stand inside the margins', () => {
    const places = [
      { x: -10_000, y: 0 },
      { x: 90_000, y: 0 },
    ];
    const brought = bringIntoView(camera, size, places, room);
    expect(brought.scale).toBeCloseTo(200 / 100_000, 12);
    expect(toScreen(brought, size, places[0]!).x).toBeCloseTo(100, 6);
    expect(toScreen(brought, size, places[1]!).x).toBeCloseTo(300, 6);
  });
});
