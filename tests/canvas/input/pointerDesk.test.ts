import { describe, expect, it } from 'vitest';
import { createPointerDesk, type RawPointer } from '../../../canvas/input/pointerDesk';
import type { PointerKind, StrokeEvent } from '../../../canvas/input/events';
import { screenPoint, toScreen, type Camera } from '../../../canvas/viewport/camera';

const size = { width: 400, height: 400 };

/** A desk with a virtual hand: chained calls, and a record of what came out. */
function hand(options: { fingersOnlyMove?: boolean; answer?: (event: StrokeEvent) => 'keep' | 'pan' } = {}) {
  const start: Camera = { x: 0, y: 0, scale: 0.001 };
  const seen = { strokes: [] as string[], events: [] as StrokeEvent[], camera: start, done: 0, pens: 0 };
  const desk = createPointerDesk({
    camera: () => seen.camera,
    size: () => size,
    stroke(event) {
      seen.strokes.push(event.kind);
      seen.events.push(event);
      return options.answer?.(event) ?? 'keep';
    },
    cameraMoved(camera) {
      seen.camera = camera;
    },
    cameraDone() {
      seen.done += 1;
    },
    fingersOnlyMove: () => options.fingersOnlyMove ?? false,
    penSeen() {
      seen.pens += 1;
    },
  });
  let pointer: PointerKind = 'touch';
  const raw = (id: number, x: number, y: number): RawPointer => ({ id, pointer, x, y, time: 0 });
  const chain = {
    seen,
    desk,
    as(kind: PointerKind) {
      pointer = kind;
      return chain;
    },
    down(id: number, x: number, y: number) {
      desk.down(raw(id, x, y));
      return chain;
    },
    move(id: number, x: number, y: number) {
      desk.move(raw(id, x, y));
      return chain;
    },
    up(id: number, x: number, y: number) {
      desk.up(raw(id, x, y));
      return chain;
    },
  };
  return chain;
}

describe('sorting pointers', () => {
  it('hands one finger to the tool as a stroke', () => {
    const { seen } = hand().down(1, 10, 10).move(1, 30, 10).up(1, 30, 10);
    expect(seen.strokes).toEqual(['down', 'move', 'up']);
    expect(seen.events[1]?.plan).toEqual({ x: (30 - 200) / 0.001, y: (200 - 10) / 0.001 });
  });

  it('takes the stroke back when a second finger comes, and pinches', () => {
    const h = hand().down(1, 100, 200).move(1, 110, 200).down(2, 210, 200);
    expect(h.seen.strokes).toEqual(['down', 'move', 'cancel']);
    expect(h.desk.stateName()).toBe('pinch');
    h.move(1, 60, 200).move(2, 260, 200);
    expect(h.seen.camera.scale).toBeCloseTo(0.002, 12);
    h.up(1, 60, 200).up(2, 260, 200);
    expect(h.seen.strokes).toEqual(['down', 'move', 'cancel']);
    expect(h.seen.done).toBe(2);
    expect(h.desk.stateName()).toBe('idle');
  });

  it('keeps moving the paper with the finger that is left after a pinch, and starts no stroke', () => {
    const h = hand().down(1, 100, 200).down(2, 200, 200).up(2, 200, 200).move(1, 140, 200);
    expect(h.desk.stateName()).toBe('pan');
    expect(toScreen(h.seen.camera, size, { x: 0, y: 0 }).x).toBeCloseTo(240, 9);
    h.up(1, 140, 200);
    expect(h.seen.strokes).toEqual(['down', 'cancel']);
  });

  it('moves the paper when the tool says that the drag began on nothing', () => {
    const h = hand({ answer: (event) => (event.kind === 'move' ? 'pan' : 'keep') });
    h.down(1, 100, 100).move(1, 120, 100).move(1, 150, 100).up(1, 150, 100);
    expect(h.seen.strokes).toEqual(['down', 'move']);
    expect(toScreen(h.seen.camera, size, { x: 0, y: 0 }).x).toBeCloseTo(230, 9);
    expect(h.seen.done).toBe(1);
  });

  it('lets fingers only move the paper once the pen draws, and still takes their taps', () => {
    const h = hand({ fingersOnlyMove: true });
    h.down(1, 100, 100).move(1, 160, 100).up(1, 160, 100);
    expect(h.seen.strokes).toEqual([]);
    expect(toScreen(h.seen.camera, size, { x: 0, y: 0 }).x).toBeCloseTo(260, 9);
    h.down(1, 100, 100).up(1, 101, 100);
    expect(h.seen.strokes).toEqual(['down', 'up']);
    h.as('pen').down(2, 50, 50).move(2, 90, 50).up(2, 90, 50);
    expect(h.seen.strokes).toEqual(['down', 'up', 'down', 'move', 'up']);
    expect(h.seen.pens).toBe(1);
  });

  it('ignores a palm that rests while the pen is down', () => {
    const h = hand().as('pen').down(1, 100, 100).as('touch').down(2, 200, 300).move(2, 220, 300);
    h.as('pen').move(1, 120, 100).up(1, 120, 100);
    expect(h.seen.strokes).toEqual(['down', 'move', 'up']);
  });

  it('takes back what the palm began when the pen comes down after it', () => {
    const h = hand().down(2, 200, 300).move(2, 202, 300).as('pen').down(1, 100, 100).up(1, 100, 100);
    expect(h.seen.strokes).toEqual(['down', 'move', 'cancel', 'down', 'up']);
    expect(h.seen.events[3]?.pointer).toBe('pen');
  });

  it('moves the paper with the middle button', () => {
    const h = hand();
    h.desk.down({ id: 1, pointer: 'mouse', x: 10, y: 10, time: 0, moves: true });
    h.as('mouse').move(1, 40, 10).up(1, 40, 10);
    expect(h.seen.strokes).toEqual([]);
    expect(toScreen(h.seen.camera, size, { x: 0, y: 0 }).x).toBeCloseTo(230, 9);
  });

  it('refuses places that are not numbers', () => {
    const h = hand().down(1, NaN, 10).move(1, 5, 5).down(2, 10, 10).move(2, 20, Infinity).up(2, 10, 10);
    expect(h.seen.strokes).toEqual(['down', 'up']);
    expect(h.seen.events.every((event) => Number.isFinite(event.screen.x))).toBe(true);
    expect(h.seen.events[0]?.screen).toEqual(screenPoint(10, 10));
  });
});
