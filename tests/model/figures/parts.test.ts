import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { placeLabels, type Label, type Place } from '../../../model/figures/labels';
import { spreadApart } from '../../../model/figures/spread';
import { typesetMeasure } from '../../../model/figures/typeset';
import { readableTurn } from '../../../model/figures/text';
import { withoutGaps } from '../../../model/figures/onRun';
import { feet, inches, mm, ticks } from '../../../model/length/ticks';

const sixteenths = { units: 'imperial', step: inches(1 / 16) } as const;

describe('setting a measurement', () => {
  it.each([
    [feet(24), '24′ 0″'],
    [feet(4, 3.375), '4′ 3 3/8″'],
    [inches(43.875), '3′ 7 7/8″'],
    [inches(0.25), '1/4″'],
    [inches(-7.5), '−7 1/2″'],
    [ticks(0), '0″'],
  ])('%d ticks as %s', (length, text) => {
    expect(
      typesetMeasure(length, sixteenths)
        .map((part) => part.text)
        .join(''),
    ).toBe(text);
  });

  it('keeps the fraction by itself, since only it is set small', () => {
    expect(typesetMeasure(inches(43.875), sixteenths, 'inches')).toEqual([
      { text: '43 ', fraction: false },
      { text: '7/8', fraction: true },
      { text: '″', fraction: false },
    ]);
    expect(typesetMeasure(mm(1119), { units: 'metric', step: mm(1) })).toEqual([{ text: '1119 mm', fraction: false }]);
  });
});

describe('spreading texts beside heights', () => {
  it('leaves heights alone that are already far enough apart', () => {
    expect(spreadApart([0, 10, 25], 10)).toEqual([0, 10, 25]);
  });

  it('parts two that are too near by moving both alike', () => {
    expect(spreadApart([10, 12], 10)).toEqual([6, 16]);
  });

  it('keeps the order and the gap, and moves no more than trying many others would', () => {
    fc.assert(
      fc.property(
        fc.array(fc.integer({ min: 0, max: 200 }), { minLength: 1, maxLength: 8 }),
        fc.integer({ min: 1, max: 40 }),
        fc.array(fc.integer({ min: -60, max: 60 }), { minLength: 8, maxLength: 8 }),
        (heights, gap, shifts) => {
          const wanted = [...heights].sort((a, b) => a - b);
          const places = spreadApart(wanted, gap);
          places.slice(1).forEach((place, i) => expect(place - (places[i] ?? 0)).toBeGreaterThanOrEqual(gap - 1e-6));
          const moves = (of: readonly number[]) =>
            of.reduce((sum, place, i) => sum + (place - (wanted[i] ?? 0)) ** 2, 0);
          // Any other lawful answer: shifted, then pushed apart from below.
          const other: number[] = [];
          wanted.forEach((height, i) => {
            const place = height + (shifts[i] ?? 0);
            other.push(i === 0 ? place : Math.max(place, (other[i - 1] ?? 0) + gap));
          });
          expect(moves(places)).toBeLessThanOrEqual(moves(other) + 1e-6);
        },
      ),
    );
  });
});

describe('turning texts', () => {
  it('reads from below or from the right, never upside down', () => {
    fc.assert(
      fc.property(fc.double({ min: -Math.PI, max: Math.PI, noNaN: true }), (angle) => {
        const turn = readableTurn({ x: Math.cos(angle), y: Math.sin(angle) });
        expect(turn).toBeGreaterThan(-90);
        expect(turn).toBeLessThanOrEqual(90.00001);
      }),
    );
    expect(readableTurn({ x: 0, y: -1 })).toBe(90);
    expect(readableTurn({ x: -1, y: 0 })).toBeCloseTo(0);
  });
});

describe('a run without its gaps', () => {
  it.each([
    [[], [[0, 100]]],
    [
      [[20, 30]],
      [
        [0, 20],
        [30, 100],
      ],
    ],
    [
      [
        [60, 90],
        [10, 20],
      ],
      [
        [0, 10],
        [20, 60],
        [90, 100],
      ],
    ],
    [
      [
        [-5, 10],
        [95, 120],
      ],
      [[10, 95]],
    ],
    [[[0, 100]], []],
    [
      [
        [10, 40],
        [30, 50],
      ],
      [
        [0, 10],
        [50, 100],
      ],
    ],
  ] as [[number, number][], [number, number][]][])('%j leaves %j', (gaps, left) => {
    expect(withoutGaps(0, 100, gaps)).toEqual(left);
  });
});

/** A place for a square label of side 2, by its middle. */
function square(x: number, y: number, cost: number): Place {
  const quad = [
    { x: x - 1, y: y - 1 },
    { x: x + 1, y: y - 1 },
    { x: x + 1, y: y + 1 },
    { x: x - 1, y: y + 1 },
  ];
  return { quad, lines: [], cost, shapes: [] };
}
const label = (priority: number, places: Place[], most = 100): Label => ({
  priority,
  anchor: { x: 0, y: 0 },
  places,
  most,
});
const field = { obstacles: [], height: 2, within: null };

describe('placing labels', () => {
  it('takes the cheapest place that is free', () => {
    const places = [square(0, 0, 5), square(9, 0, 1)];
    expect(placeLabels([label(1, places)], field)).toEqual([places[1]]);
  });

  it('keeps off what is drawn, at the price of a dearer place', () => {
    const places = [square(0, 0, 1), square(9, 0, 3)];
    const wall = {
      points: [
        { x: -5, y: 0 },
        { x: 5, y: 0 },
      ],
      weight: 10,
    };
    expect(placeLabels([label(1, places)], { ...field, obstacles: [wall] })).toEqual([places[1]]);
  });

  it('gives the first place to the more important of two, and leaves out what finds none', () => {
    const places = [square(0, 0, 1)];
    expect(placeLabels([label(2, places), label(1, places)], field)).toEqual([null, places[0]]);
  });

  it('leaves out a label whose every place costs more than it is worth', () => {
    expect(placeLabels([label(1, [square(0, 0, 11)], 10)], field)).toEqual([null]);
  });

  it('takes up the better place that a later choice has freed', () => {
    // The first stands at 0 until the second shows that its line would cross it; then both are content.
    const first = label(1, [square(0, 0, 1), square(5, 0, 1.5)]);
    const crossing: Place = {
      ...square(0, 9, 0),
      lines: [
        [
          { x: 0, y: 8 },
          { x: 0, y: -8 },
        ],
      ],
    };
    const placed = placeLabels([first, label(2, [crossing])], field);
    expect(placed).toEqual([first.places[1], crossing]);
  });

  it('answers alike each time', () => {
    const labels = Array.from({ length: 30 }, (_, i) =>
      label(i % 3, [square((i * 7) % 11, (i * 5) % 13, 1), square((i * 3) % 17, (i * 11) % 19, 2)]),
    );
    expect(placeLabels(labels, field)).toEqual(placeLabels(labels, field));
  });
});
