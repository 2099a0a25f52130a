/** Steel of the story poles: what a stock length gives, and the angle as it is drawn, against published and derived values. */
import { describe, expect, it } from 'vitest';
import type { PlanPoint } from '../../../model/geometry/point';
import { EMPTY_SURVEY } from '../../../model/drawing/surveySchema';
import { inches, TICKS_PER_INCH } from '../../../model/length/ticks';
import { solve } from '../../../model/setOut';
import { rectangle } from '../../helpers/drawings';

/** The pole of a free-standing rectangle’s first corner, of that steel, its section in inches from its heel. */
function sectionOf(steel: number): readonly { x: number; y: number }[] {
  const drawing = rectangle(240, 120);
  const kit = { ...drawing.poleKit, steel: inches(steel) };
  const pole = solve({ ...drawing, poleKit: kit }, EMPTY_SURVEY).poles.poleById.get('c1')!;
  return pole.section.map(({ x, y }: PlanPoint) => ({ x: x / TICKS_PER_INCH, y: y / TICKS_PER_INCH }));
}

/** Area and second moment about a leg’s axis through the centroid, by sums over the polygon’s edges (Green’s theorem). */
function momentsOf(section: readonly { x: number; y: number }[]): { area: number; inertia: number } {
  let [area, first, second] = [0, 0, 0];
  section.forEach((p, i) => {
    const q = section[(i + 1) % section.length]!;
    const cross = p.x * q.y - q.x * p.y;
    area += cross / 2;
    first += ((p.y + q.y) * cross) / 6;
    second += ((p.y * p.y + p.y * q.y + q.y * q.y) * cross) / 12;
  });
  return { area: Math.abs(area), inertia: Math.abs(second - (first * first) / area) };
}

describe('the steel angle', () => {
  // Derived, square-corner geometry: A = t (2b − t) = 1.090 in². AISC values on a property page (secondary): 3.71 lb/ft.
  it('3 × 3 × 3/16 in has 1.090 in² and weighs 3.709 lb/ft', () => {
    const { area } = momentsOf(sectionOf(3 / 16));
    expect(area.toFixed(3)).toBe('1.090');
    expect(area).toBeCloseTo((3 / 16) * (2 * 3 - 3 / 16), 4);
    // Steel at 490 lb/ft³ (AISC’s usual density, from memory).
    const pounds = (area / 144) * 490;
    expect(Math.abs(pounds - 3.709)).toBeLessThan(0.002);
    expect(pounds.toFixed(2)).toBe('3.71');
  });

  // AISC (secondary): I = 0.948 in⁴, with the fillet and rounded toes; square corners come within 2 %.
  it('is as stiff as published, to its rounded corners', () => {
    expect(Math.abs(momentsOf(sectionOf(3 / 16)).inertia / 0.948 - 1)).toBeLessThan(0.02);
  });

  // Derived, square-corner geometry: 1/8 bends, 1/4 is heavy (common practice, no source).
  it('of 1/8, 3/16 and 1/4 in is stiff as 0.69 : 1 : 1.29', () => {
    const [thin, usual, thick] = [1 / 8, 3 / 16, 1 / 4].map((steel) => momentsOf(sectionOf(steel)).inertia);
    expect((thin! / usual!).toFixed(2)).toBe('0.69');
    expect((thick! / usual!).toFixed(2)).toBe('1.29');
  });
});

describe('pole stock', () => {
  // Common practice, no source: 20 ft of stock gives two 10 ft poles.
  it('of 20 ft gives two 10 ft poles', () => {
    const { takeoff } = solve(rectangle(240, 120), EMPTY_SURVEY);
    expect(takeoff.poles.count).toBe(4);
    expect(takeoff.poles.stock.map(({ cuts }) => cuts.map((cut) => cut / TICKS_PER_INCH))).toEqual([
      [120, 120],
      [120, 120],
    ]);
  });
});
