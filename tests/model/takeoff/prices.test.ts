import Fraction from 'fraction.js';
import { describe, expect, it } from 'vitest';
import { EMPTY_SURVEY } from '../../../model/drawing/surveySchema';
import { feet, inches } from '../../../model/length/ticks';
import { solve } from '../../../model/setOut';
import { priceTakeoff, type Prices } from '../../../model/takeoff/prices';
import { rectangle } from '../../helpers/drawings';

const drawing = {
  ...rectangle(10 + 14.5 * 10, 10 + 14.5 * 7),
  bondBeams: [
    {
      id: 'beam',
      name: 'Bond beam',
      soffit: inches(96),
      depth: inches(8),
      tolerance: inches(0),
      hold: 'hard' as const,
      bars: { count: 2, diameter: inches(0.5), lap: inches(20) },
    },
  ],
};
const { takeoff } = solve(drawing, EMPTY_SURVEY);
const NOTHING: Prices = { units: {}, kinds: {} };

describe('The cost of a takeoff', () => {
  it('adds the waste, rounds up to whole packs and multiplies, line by line', () => {
    // 816 units (34 a course, 24 courses) and 5 % are 856.8; 90 to a pallet makes ten pallets.
    const costs = priceTakeoff(drawing, takeoff, {
      units: { earth: { perPack: 31_500, pack: 90, waste: 5 } },
      kinds: { poleStock: { perPack: 8900, pack: 1, waste: 0 }, lineBlock: { perPack: 450, pack: 2, waste: 0 } },
    });
    const [units] = costs.lines;
    const packs = new Fraction(816).mul(105).div(100).div(90).ceil().valueOf();
    expect(units).toEqual({
      kind: 'unit',
      wallTypeId: 'earth',
      net: 816,
      withWaste: 856.8,
      packs,
      overPercent: (100 * (900 - 816)) / 816,
      cost: packs * 31_500,
    });
    // Four 10 ft poles from two lengths, eight blocks in four pairs.
    expect(costs.total).toBe(315_000 + 2 * 8900 + 4 * 450);
    expect(costs.unpriced).toBe(costs.lines.length - 3);
  });

  it('buys no pack for a hair of a volume, and one for anything more', () => {
    const net = takeoff.mortar.bedding + takeoff.mortar.bed + takeoff.mortar.head;
    const packsOf = (pack: number) =>
      priceTakeoff(drawing, takeoff, { units: {}, kinds: { mortar: { perPack: 1, pack, waste: 0 } } }).total;
    expect(packsOf(net / 3)).toBe(3);
    expect(packsOf(net / 3.001)).toBe(4);
  });

  it('says what has no price instead of leaving it out of the list', () => {
    const costs = priceTakeoff(drawing, takeoff, NOTHING);
    expect(costs.total).toBe(0);
    expect(costs.unpriced).toBe(costs.lines.length);
    expect(costs.lines.map((line) => line.kind)).toEqual([
      'unit',
      'mortar',
      'concrete',
      'bar',
      'poleStock',
      'brace',
      'line',
      'lineBlock',
    ]);
  });
});

describe('The bar of a bond beam', () => {
  it('is cut from the fewest stock lengths, laps included', () => {
    // Centre lines 145 and 101 1/2, a lap of 20 at the second corner: two bars each of 165, 121 1/2, 165 and 121 1/2 in.
    const [beam] = takeoff.beams;
    const cuts = beam!.stock.flatMap((plan) => Array<readonly number[]>(plan.count).fill(plan.cuts)).flat();
    expect(cuts.sort((a, b) => b - a)).toEqual([
      ...Array<number>(4).fill(inches(165)),
      ...Array<number>(4).fill(inches(121.5)),
    ]);
    // None of 240 in makes two of them: eight lengths.
    expect(beam!.stock.reduce((sum, plan) => sum + plan.count, 0)).toBe(8);
    expect(beam!.bar).toBe(inches(4 * (165 + 121.5)));
  });

  it('laps along a wall longer than the stock', () => {
    // 50 ft less 10 in of centre line and a lap of 20: 610 in. Lengths of 240 lapped 20 reach 240, 460, 680: two and 170.
    const long = { ...drawing, ...cornersOf(600, 111.5) };
    const { takeoff: other } = solve(long, EMPTY_SURVEY);
    const [beam] = other.beams;
    const whole = beam!.stock.filter((plan) => plan.cuts.length === 1 && plan.cuts[0] === feet(20));
    expect(whole.map((plan) => plan.count)).toEqual([8]);
    const cuts = beam!.stock.flatMap((plan) => Array<readonly number[]>(plan.count).fill(plan.cuts)).flat();
    expect(cuts.filter((cut) => cut === inches(170))).toHaveLength(4);
    expect(beam!.bar).toBe(cuts.reduce((sum, cut) => sum + cut, 0));
  });
});

describe('The takeoff by course', () => {
  it('adds up to the whole', () => {
    expect(takeoff.unitsByCourse).toHaveLength(24);
    expect(takeoff.unitsByCourse.every((count) => count.whole === 34 && count.closers === 0)).toBe(true);
    expect(takeoff.unitsByCourse.map((count) => count.course)).toEqual(Array.from({ length: 24 }, (_, i) => i + 1));
  });
});

function cornersOf(width: number, depth: number) {
  const { corners, runs } = rectangle(width, depth);
  return { corners, runs };
}
