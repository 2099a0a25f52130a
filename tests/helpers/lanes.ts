/** Rows of small buildings with lanes between, where the braces of facing corners are in one another's way. */
import type { Drawing } from '../../model/drawing/schema';
import { door, emptySite, withOpenings, withWalls, type Place } from '../model/poles/sites';

function rectangleAt(x: number, y: number, width: number, height: number): Place[] {
  return [
    [x, y],
    [x + width, y],
    [x + width, y + height],
    [x, y + height],
  ];
}

/** `count` rectangles side by side, each lane's width and shift as `random` (from 0 up to 1) has it, a door in each. */
export function lanesOf(count: number, random: () => number): Drawing {
  let drawing = emptySite();
  let x = 0;
  for (let i = 0; i < count; i += 1) {
    const y = Math.floor(random() * 7) - 3;
    drawing = withWalls(drawing, rectangleAt(x, y, 120, 110), true, `b${i}`);
    const opens = random() < 0.5 ? ('in' as const) : ('out' as const);
    drawing = withOpenings(
      drawing,
      door(`b${i}BC`, 14 + Math.floor(random() * 44), { swing: { hinge: 'near', opens } }),
    );
    x += 120 + 76 + Math.floor(random() * 32);
  }
  return drawing;
}

/** The same numbers from the same seed (a linear congruential generator, constants of Numerical Recipes). */
export function randomFrom(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    return state / 2 ** 32;
  };
}
