import { describe, expect, it } from 'vitest';
import { wheelMeaning } from '../../../canvas/viewport/wheelMeaning';

const turn = (deltaX: number, deltaY: number, ctrl = false, deltaMode = 0) =>
  wheelMeaning({ deltaX, deltaY, ctrl, deltaMode });

describe('the wheel', () => {
  it('zooms by a trackpad pinch, in with fingers apart and out with fingers together', () => {
    expect(turn(0, -10, true)).toEqual({ kind: 'zoom', factor: Math.exp(0.1) });
    expect(turn(0, 10, true)).toEqual({ kind: 'zoom', factor: Math.exp(-0.1) });
  });

  it('bounds one step of a pinch', () => {
    expect(turn(0, 5000, true)).toEqual({ kind: 'zoom', factor: Math.exp(-0.5) });
  });

  it('zooms by a notched wheel and pans by two fingers on a trackpad', () => {
    expect(turn(0, -120)).toEqual({ kind: 'zoom', factor: 1.2 });
    expect(turn(0, 3, false, 1)).toEqual({ kind: 'zoom', factor: 1 / 1.2 });
    expect(turn(4, 7.5)).toEqual({ kind: 'pan', dx: -4, dy: -7.5 });
    expect(turn(0, 33)).toEqual({ kind: 'pan', dx: 0, dy: -33 });
  });

  it('refuses what is not a number, and nothing at all', () => {
    for (const bad of [turn(NaN, 1), turn(0, NaN, true), turn(0, Infinity), turn(0, 0)]) expect(bad).toBe(null);
  });
});
