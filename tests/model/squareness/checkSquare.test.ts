import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { inches, ticks, TICKS_PER_INCH } from '../../../model/length/ticks';
import { checkSquare } from '../../../model/squareness/checkSquare';
import { rectangleLean } from '../../../model/squareness/rectangle';
import type { DrawnCorner, Taped } from '../../../model/squareness/types';

type Place = readonly [number, number];

const limits = { accuracy: inches(1 / 16), most: inches(1 / 4) };

function figure(...places: readonly Place[]): DrawnCorner[] {
  return places.map(([x, y], i) => ({ id: String.fromCharCode(65 + i), at: { x: inches(x), y: inches(y) } }));
}

/** Tape between corners as they stand: `AB AC …`. */
function tape(standing: readonly Place[], pairs: string): Taped[] {
  return pairs.split(' ').map((pair) => {
    const [p, q] = [...pair].map((letter) => standing[letter.charCodeAt(0) - 65]!) as [Place, Place];
    return { id: pair, from: pair[0]!, to: pair[1]!, length: inches(Math.hypot(q[0] - p[0], q[1] - p[1])) };
  });
}

const ALL = 'AB BC CD DA AC BD';
const square: readonly Place[] = [
  [0, 0],
  [360, 0],
  [360, 240],
  [0, 240],
];

describe('squareness', () => {
  it('has nothing to move where the tape agrees with the drawing', () => {
    const found = checkSquare(figure(...square), tape(square, ALL), limits);
    expect(found).toMatchObject({ spare: 1, fixed: true, worst: 0, within: true, misread: [] });
    expect(found.moves.every(({ distance }) => distance === 0)).toBe(true);
    expect(found.single).toMatchObject({ distance: 0, left: 0 });
  });

  it('is the closed form for a rectangle that leans: every corner a quarter of the lean along, a quarter across', () => {
    // The far side 1/4 in along. The best turn takes out s·l·w-shares; by hand: with the middle held, the corners are
    // out by ±s/2 along x. A turn by t adds t·y to x and −t·x to y; least squares gives t = −(s/2)(w/2)/((l² + w²)/4).
    const s = 0.25;
    const leaning: readonly Place[] = [square[0]!, square[1]!, [360 + s, 240], [s, 240]];
    const found = checkSquare(figure(...square), tape(leaning, ALL), limits);
    const t = ((s / 2) * 120) / (180 ** 2 + 120 ** 2);
    // What stays after the turn: (s/2 − t·120 along, t·180 across).
    const out = Math.hypot(s / 2 - t * 120, t * 180);
    for (const { distance } of found.moves) expect(Math.abs(distance - out * TICKS_PER_INCH)).toBeLessThan(3);
    const [ac, bd] = ['AC', 'BD'].map((id) => tape(leaning, id)[0]!.length);
    expect(Math.abs(rectangleLean(inches(360), ac!, bd!) - inches(s))).toBeLessThan(3);
  });

  it('names the one corner that was set wrong, and the move that puts it right', () => {
    const wrong = [...square.slice(0, 2), [360.5, 239.25] as Place, square[3]!];
    const found = checkSquare(figure(...square), tape(wrong, ALL), limits);
    expect(found.within).toBe(false);
    expect(found.single!.cornerId).toBe('C');
    expect(Math.abs(found.single!.x + inches(0.5))).toBeLessThan(40);
    expect(Math.abs(found.single!.y - inches(0.75))).toBeLessThan(40);
    expect(found.single!.left).toBeLessThan(5);
  });

  it('is out of square with equal diagonals where opposite sides are not alike', () => {
    const trapezoid: readonly Place[] = [
      [0, 0],
      [360, 0],
      [358, 240],
      [2, 240],
    ];
    const found = checkSquare(figure(...square), tape(trapezoid, ALL), limits);
    const [ac, bd] = found.taped.slice(4);
    expect(ac!.off).toBe(bd!.off);
    expect(found.within).toBe(false);
    // The upper corners stand 2 in inwards each; the figure is symmetrical, so that nothing turns.
    found.moves.forEach(({ distance }, i) => expect(Math.abs(distance - inches(i < 2 ? 0 : 2))).toBeLessThan(3));
  });

  it('can’t tell which of six is misread on a rectangle, and can with more diagonals', () => {
    const six = tape(square, ALL).map((one) =>
      one.id === 'AC' ? { ...one, length: ticks(one.length + inches(2)) } : one,
    );
    expect(checkSquare(figure(...square), six, limits).misread).toHaveLength(6);
    const hexagon: readonly Place[] = [
      [0, 0],
      [200, 0],
      [300, 150],
      [200, 300],
      [0, 300],
      [-100, 150],
    ];
    const many = tape(hexagon, 'AB BC CD DE EF FA AC AD AE BD BE BF CE CF DF').map((one) =>
      one.id === 'BE' ? { ...one, length: ticks(one.length + inches(1)) } : one,
    );
    const found = checkSquare(figure(...hexagon), many, limits);
    expect(found.spare).toBe(6);
    expect(found.misread.map(({ id }) => id)).toEqual(['BE']);
    expect(Math.abs(found.misread[0]!.by - inches(1))).toBeLessThan(inches(1 / 64));
  });

  it('leaves out what is taped from a corner to itself, or to none', () => {
    const odd = [
      { id: 'AA', from: 'A', to: 'A', length: inches(5) },
      { id: 'AZ', from: 'A', to: 'Z', length: inches(5) },
    ];
    const found = checkSquare(figure(...square), [...odd, ...tape(square, ALL)], limits);
    expect(found.taped.map(({ id }) => id)).toEqual(ALL.split(' '));
    expect(found.spare).toBe(1);
  });

  it('says when the measurements leave the shape open', () => {
    const found = checkSquare(figure(...square), tape(square, 'AB BC CD DA'), limits);
    expect(found).toMatchObject({ spare: -1, fixed: false, single: null });
    // A square brace short of one length: rods at their lengths already, so that nothing moves.
    expect(found.moves.every(({ distance }) => distance === 0)).toBe(true);
  });

  it('shows least squares: no small change of any corner makes the residuals smaller', () => {
    const off = fc.integer({ min: -4000, max: 4000 });
    fc.assert(
      fc.property(fc.array(off, { minLength: 10, maxLength: 10 }), (errors) => {
        const pentagon: readonly Place[] = [
          [0, 0],
          [300, 20],
          [340, 250],
          [120, 330],
          [-40, 200],
        ];
        const taped = tape(pentagon, 'AB BC CD DE EA AC AD BD BE CE').map((one, i) => ({
          ...one,
          length: ticks(one.length + errors[i]!),
        }));
        const found = checkSquare(figure(...pentagon), taped, limits);
        // Where the corners stand: the drawing less the moves, but for one turn and shift of the whole, which no length feels.
        const at = figure(...pentagon).map((corner, i) => ({
          x: corner.at.x - found.moves[i]!.x,
          y: corner.at.y - found.moves[i]!.y,
        }));
        const squares = (points: readonly { x: number; y: number }[]) =>
          taped.reduce((sum, { from, to, length }) => {
            const [p, q] = [points[from.charCodeAt(0) - 65]!, points[to.charCodeAt(0) - 65]!];
            return sum + (Math.hypot(q.x - p.x, q.y - p.y) - length) ** 2;
          }, 0);
        const least = found.taped.reduce((sum, { residual }) => sum + residual ** 2, 0);
        for (let i = 0; i < 10; i++) {
          for (const by of [-400, 400]) {
            const nudged = at.map((point, k) =>
              k === i >> 1 ? { x: point.x + (i % 2 ? by : 0), y: point.y + (i % 2 ? 0 : by) } : point,
            );
            expect(squares(nudged)).toBeGreaterThan(least - 10 * Math.sqrt(least) - 10);
          }
        }
      }),
      { numRuns: 60 },
    );
  });

  it('is finite on anything: corners in one place, nothing taped, lengths of nothing', () => {
    const place = fc.tuple(fc.integer({ min: -3, max: 3 }), fc.integer({ min: -3, max: 3 }));
    const id = fc.constantFrom('A', 'B', 'C', 'D', 'E', 'Z');
    fc.assert(
      fc.property(
        fc.array(place, { maxLength: 5 }),
        fc.array(fc.record({ from: id, to: id, length: fc.integer({ min: 0, max: 2_000_000_000 }) }), {
          maxLength: 12,
        }),
        (places, lengths) => {
          const taped = lengths.map((one, i) => ({ ...one, id: `m${i}`, length: ticks(one.length) }));
          const found = checkSquare(figure(...(places as Place[])), taped, limits);
          const numbers = [
            found.worst,
            ...found.moves.flatMap(({ x, y, distance }) => [x, y, distance]),
            ...found.taped.flatMap(({ off, residual, checked, normalised }) => [off, residual, checked, normalised]),
            ...found.misread.map(({ by }) => by),
            ...(found.single ? [found.single.x, found.single.y, found.single.left] : []),
          ];
          expect(numbers.every(Number.isFinite)).toBe(true);
        },
      ),
    );
  });

  it('does not depend on where the building stands, nor on which way it is turned by a quarter', () => {
    const wrong = [...square.slice(0, 2), [360.5, 239.25] as Place, square[3]!];
    const here = checkSquare(figure(...square), tape(wrong, ALL), limits);
    const turned = square.map(([x, y]): Place => [5000 - y, 700 + x]);
    const there = checkSquare(figure(...turned), tape(wrong, ALL), limits);
    expect(there.single!.cornerId).toBe(here.single!.cornerId);
    there.moves.forEach((move, i) => {
      expect(Math.abs(move.x + here.moves[i]!.y)).toBeLessThanOrEqual(1);
      expect(Math.abs(move.y - here.moves[i]!.x)).toBeLessThanOrEqual(1);
    });
  });
});
