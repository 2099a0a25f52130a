import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { layBond } from '../../../model/bond/layBond';
import { noCutLengths } from '../../../model/bond/noCut';
import { inches, ticks } from '../../../model/length/ticks';
import { layOutWalls } from '../../../model/walls/layOutWalls';
import { evenCourses } from '../../helpers/courses';
import { earthBlock, rectangle } from '../../helpers/drawings';

/** One joint only, so that the lengths that fit stand a whole module apart. */
const fixed = earthBlock({ headJoint: { nominal: inches(0.5), least: inches(0.5), most: inches(0.5) } });

function closersOf(length: number): number {
  const drawing = rectangle(length / 16_256, 10 + 14.5 * 6);
  const walls = layOutWalls(drawing);
  const bond = layBond(drawing, walls, evenCourses(2, inches(3.5), inches(0.5)));
  return bond.byRun.get('r1')!.closersPerCoursePair;
}

describe('Lengths that need no cutting', () => {
  it.each([
    // Outside face between two outside corners: n × 14 1/2 + 10, a return being 10 wide.
    ['outside', 'outside', 100, 97, 111.5],
    // An outside and a reentrant corner: n × 14 1/2, the wall passing on into the other’s thickness.
    ['outside', 'reentrant', 100, 87, 101.5],
    // Two reentrant corners: n × 14 1/2 − 10.
    ['reentrant', 'reentrant', 100, 91.5, 106],
    // Two free ends: n units and the joints between.
    ['free', 'free', 100, 86.5, 101],
  ] as const)('%s to %s, near %f in: %f below and %f above', (from, to, near, below, above) => {
    expect(noCutLengths(fixed, [from, to], inches(near))).toEqual({ below: inches(below), above: inches(above) });
  });

  it('is the length itself where that needs no cutting, and reaches as far as the joints may spread', () => {
    // Seven units of 14 with joints of 3/8 to 1/2: wider ones would leave less than the 3 1/2 in of lap.
    expect(noCutLengths(earthBlock(), ['outside', 'outside'], inches(111.5))).toEqual({
      below: inches(111.5),
      above: inches(111.5),
    });
    const near = inches(110.9);
    expect(noCutLengths(earthBlock(), ['outside', 'outside'], near)).toEqual({ below: near, above: near });
    expect(noCutLengths(earthBlock(), ['outside', 'outside'], inches(110))).toEqual({
      below: inches(97),
      above: inches(10 + 7 * 14.375),
    });
  });

  it('agrees with the bond: walls of these lengths are laid without closers, and those between with some', () => {
    fc.assert(
      fc.property(fc.integer({ min: inches(60), max: inches(300) }), (length) => {
        const { below, above } = noCutLengths(earthBlock(), ['outside', 'outside'], ticks(length));
        expect(below).not.toBeNull();
        expect(above).not.toBeNull();
        expect(closersOf(below!)).toBe(0);
        expect(closersOf(above!)).toBe(0);
        expect(below! <= length && length <= above!).toBe(true);
        if (below! < length && length < above!) expect(closersOf(length)).toBeGreaterThan(0);
      }),
      { numRuns: 80 },
    );
  });

  it('has none for units that return two modules wide, whose joints would all be straight', () => {
    const headers = earthBlock({
      unit: { length: inches(14.5), width: inches(7), height: inches(3.5) },
      laid: 'header',
      headJoint: { nominal: inches(0.5), least: inches(0.5), most: inches(0.5) },
    });
    expect(noCutLengths(headers, ['outside', 'outside'], inches(120))).toEqual({ below: null, above: null });
  });
});
