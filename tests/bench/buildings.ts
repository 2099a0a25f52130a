/** Buildings of any number of runs to measure with: one long crenellated house and many L-shaped ones, doors and windows in both. */
import { letterAt } from '../../model/drawing/letters';
import { newDrawing, newOpening } from '../../model/drawing/defaults';
import type { Corner, Drawing, Opening, WallRun } from '../../model/drawing/schema';
import type { Reading, Survey } from '../../model/drawing/surveySchema';
import { feet, inches, ticks } from '../../model/length/ticks';

type Place = readonly [number, number];

/** An L of six runs, 24 × 18 ft, its lower left corner at (x, y) in feet. */
function lHouse(x: number, y: number): Place[] {
  return [
    [0, 0],
    [24, 0],
    [24, 12],
    [14, 12],
    [14, 18],
    [0, 18],
  ].map(([dx, dy]) => [x + dx!, y + dy!]);
}

/** A house crenellated front and back, each merlon 16 ft wide: `runs` is even and at least 8. */
function crenellatedHouse(runs: number): Place[] {
  const steps = (runs - 4) / 2;
  const front = Math.floor(steps / 2);
  const back = steps - front;
  const width = 16 * (Math.max(front, back) + 1);
  const edge = (count: number, depthAt: (i: number) => number): Place[] =>
    Array.from({ length: count + 1 }, (_, i): Place[] => {
      const right = i === count ? width : 16 * (i + 1);
      return [
        [16 * i, depthAt(i)],
        [right, depthAt(i)],
      ];
    }).flat();
  return [...edge(front, (i) => (i % 2 === 0 ? 0 : 6)), ...edge(back, (i) => (i % 2 === 0 ? 30 : 24)).reverse()];
}

/** A site of exactly `runs` runs (even, at least 10), and a reading at every corner. */
export function siteOf(runs: number): { drawing: Drawing; survey: Survey } {
  const houses: Place[][] = [];
  const big = runs - 6 * Math.floor(runs / 2 / 6);
  houses.push(crenellatedHouse(big % 2 === 0 ? big : big + 1));
  const across = Math.ceil(Math.sqrt(runs / 12));
  for (let i = 0; houses.flat().length < runs; i += 1)
    houses.push(lHouse((i % across) * 60, -60 * (1 + Math.floor(i / across))));

  const base = newDrawing('imperial');
  const corners: Corner[] = [];
  const wallRuns: WallRun[] = [];
  const openings: Opening[] = [];
  const readings: Reading[] = [];
  let next = 0;
  for (const house of houses) {
    const first = corners.length;
    house.forEach(([x, y], i) => {
      const id = `c${first + i}`;
      corners.push({ id, letter: letterAt(first + i), x: feet(x), y: feet(y) });
      readings.push({
        id: `r${first + i}`,
        station: { kind: 'corner', cornerId: id },
        down: inches(48 + ((first + i * 7) % 11) / 16),
      });
      const to = `c${first + ((i + 1) % house.length)}`;
      const runId = `w${first + i}`;
      wallRuns.push({ id: runId, from: id, to, wallTypeId: base.wallTypes[0]!.id });
      const [nx, ny] = house[(i + 1) % house.length]!;
      const length = Math.hypot(nx - x, ny - y);
      if (length < 14) return;
      const kind = i % 3 === 0 ? 'door' : 'window';
      const opening = newOpening('imperial', kind, { id: `o${(next += 1)}`, runId, at: feet(length / 2 - 1.5) });
      openings.push({ ...opening, at: ticks(feet(length / 2) - Math.round(opening.width / 2)) });
    });
  }
  return {
    drawing: { ...base, corners, runs: wallRuns, openings },
    survey: { version: 1, method: 'measureDown', readings },
  };
}
