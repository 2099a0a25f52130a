import { describe, expect, it } from 'vitest';
import { inches, TICKS_PER_FOOT } from '../../../model/length/ticks';
import { layOutWalls } from '../../../model/walls/layOutWalls';
import type { Walls } from '../../../model/walls/types';
import { bodyAreas, insetArea, outline, plan, wallType, type Place } from './shapes';

const SQUARE_FOOT = TICKS_PER_FOOT ** 2;

function run(walls: Walls, id: string) {
  const found = walls.runById.get(id);
  if (!found) throw new Error(`no run ${id}`);
  return found;
}

function inInches(points: readonly { x: number; y: number }[]): Place[] {
  return points.map((point) => [point.x / inches(1), point.y / inches(1)]);
}

const RECTANGLE: readonly Place[] = [
  [0, 0],
  [360, 0],
  [360, 240],
  [0, 240],
];
const ELL: readonly Place[] = [
  [0, 0],
  [360, 0],
  [360, 120],
  [180, 120],
  [180, 240],
  [0, 240],
];
const YOU: readonly Place[] = [
  [0, 0],
  [480, 0],
  [480, 300],
  [360, 300],
  [360, 120],
  [120, 120],
  [120, 300],
  [0, 300],
];

describe('a rectangle of 30 × 20 ft with 12 in walls', () => {
  const walls = layOutWalls(outline(RECTANGLE));

  it('has outside, inside and centre lengths', () => {
    const { length, insideLength, centreLength, thickness, name } = run(walls, 'A-B');
    expect([length, insideLength, centreLength, thickness]).toEqual([360, 336, 348, 12].map(inches));
    expect(name).toBe('A–B');
  });
  it('has mitred bodies inside its line, counter-clockwise', () => {
    expect(inInches(run(walls, 'A-B').body)).toEqual([
      [0, 0],
      [360, 0],
      [348, 12],
      [12, 12],
    ]);
    expect(run(walls, 'A-B').inward).toEqual({ x: 0, y: 1 });
    expect(run(walls, 'C-D').inward).toEqual({ x: 0, y: -1 });
  });
  it('has one footprint of 600 square feet, 504 inside, 100 ft round', () => {
    const [footprint, more] = walls.footprints;
    expect(more).toBeUndefined();
    expect(footprint?.cornerIds).toEqual(['A', 'B', 'C', 'D']);
    expect(footprint?.runIds).toEqual(['A-B', 'B-C', 'C-D', 'D-A']);
    expect(footprint?.areaOutside).toBe(600 * SQUARE_FOOT);
    expect(footprint?.areaInside).toBe(504 * SQUARE_FOOT);
    expect(footprint?.perimeter).toBe(100 * TICKS_PER_FOOT);
    expect(footprint?.bodyInside).toBe(true);
    expect(walls.perimeter).toBe(100 * TICKS_PER_FOOT);
  });
  it('has outside corners of 90°', () => {
    expect(walls.corners.map((corner) => [corner.kind, corner.angle])).toEqual(Array(4).fill(['outside', 90]));
    expect(run(walls, 'A-B').ends).toEqual([
      { cornerId: 'A', kind: 'outside', others: ['D-A'] },
      { cornerId: 'B', kind: 'outside', others: ['B-C'] },
    ]);
  });
  it('has equal diagonals', () => {
    // 30² + 20² = 1300.
    const expected = inches(12 * Math.sqrt(1300));
    expect(walls.diagonals).toEqual([
      { from: 'A', to: 'C', length: expected },
      { from: 'B', to: 'D', length: expected },
    ]);
  });
  it('has nothing wrong', () => {
    expect(walls.reasons).toEqual([]);
  });
});

describe('diagonals', () => {
  it('of a rectangle of 30 × 40 are 50, and of 8.5 × 11 are 13.90 (US Army EN0069A, fig. 1-39)', () => {
    const by = (w: number, h: number) =>
      layOutWalls(
        outline([
          [0, 0],
          [w, 0],
          [w, h],
          [0, h],
        ]),
      );
    expect(by(360, 480).diagonals.map((one) => one.length)).toEqual([inches(600), inches(600)]);
    expect(by(102, 132).diagonals.map((one) => Math.round((one.length / TICKS_PER_FOOT) * 100) / 100)).toEqual([
      13.9, 13.9,
    ]);
  });
  it('differ by 0.416 in where 20 × 30 ft is skewed 1/4 in along the 30 ft side', () => {
    const walls = layOutWalls(
      outline([
        [0, 0],
        [360, 0],
        [360.25, 240],
        [0.25, 240],
      ]),
    );
    const [ac, bd] = walls.diagonals;
    expect(((ac?.length ?? 0) - (bd?.length ?? 0)) / inches(1)).toBeCloseTo(0.416, 3);
  });
  it('skip corners in the middle of a straight side, and are none for other shapes', () => {
    const withTee = plan({ A: [0, 0], T: [100, 0], B: [360, 0], C: [360, 240], D: [0, 240], E: [100, 120] }, [
      'A-T',
      'T-B',
      'B-C',
      'C-D',
      'D-A',
      'T-E',
    ]);
    expect(layOutWalls(withTee).diagonals.map(({ from, to }) => from + to)).toEqual(['AC', 'BD']);
    expect(layOutWalls(outline(ELL)).diagonals).toEqual([]);
    expect(
      layOutWalls(
        outline([
          [0, 0],
          [360, 0],
          [180, 240],
        ]),
      ).diagonals,
    ).toEqual([]);
  });
});

describe('closed outlines against a general geometry library', () => {
  it.each<[string, readonly Place[], number]>([
    ['a rectangle', RECTANGLE, 4],
    ['an L', ELL, 5],
    ['a U', YOU, 6],
  ])('lay %s out as its outline moved in, exactly', (_, places, outsideCorners) => {
    const drawing = outline(places);
    const walls = layOutWalls(drawing);
    const [footprint] = walls.footprints;
    const areas = bodyAreas(walls);
    expect(footprint?.areaInside).toBe(insetArea(drawing.corners, inches(12)));
    expect(areas.union).toBe((footprint?.areaOutside ?? 0) - (footprint?.areaInside ?? 0));
    expect(areas.sum).toBe(areas.union);
    expect(walls.corners.filter((corner) => corner.kind === 'outside').length).toBe(outsideCorners);
    expect(walls.corners.filter((corner) => corner.angle === 270 || corner.angle === 90).length).toBe(places.length);
    expect(walls.reasons).toEqual([]);
  });

  it.each<[string, readonly Place[]]>([
    [
      'a triangle',
      [
        [0, 0],
        [300, 0],
        [150, 260],
      ],
    ],
    [
      'a hexagon',
      [
        [100, 0],
        [300, 0],
        [400, 173],
        [300, 346],
        [100, 346],
        [0, 173],
      ],
    ],
    [
      'an arrow with a reentrant corner',
      [
        [0, 0],
        [400, 150],
        [0, 300],
        [120, 150],
      ],
    ],
    [
      'an irregular outline',
      [
        [0, 0],
        [250, -70],
        [480, 40],
        [430, 330],
        [200, 260],
        [-60, 290],
      ],
    ],
  ])('lay %s out to the tick at any angle', (_, places) => {
    const drawing = outline(places);
    const walls = layOutWalls(drawing);
    const [footprint] = walls.footprints;
    const perimeter = footprint?.perimeter ?? 0;
    const areas = bodyAreas(walls);
    // Faces are rounded to the tick: an area may be out by a tick along the perimeter.
    expect(Math.abs((footprint?.areaInside ?? 0) - insetArea(drawing.corners, inches(12)))).toBeLessThan(perimeter);
    expect(Math.abs(areas.union - areas.sum)).toBeLessThan(perimeter);
    expect(Math.abs(areas.sum - ((footprint?.areaOutside ?? 0) - (footprint?.areaInside ?? 0)))).toBeLessThan(
      perimeter,
    );
    const turned = walls.corners.reduce((sum, corner) => sum + (corner.angle ?? 0), 0);
    expect(turned).toBeCloseTo(180 * (places.length - 2), 6);
    expect(walls.reasons).toEqual([]);
  });

  it('stands outside its line where it is drawn clockwise', () => {
    const walls = layOutWalls(outline([...RECTANGLE].reverse()));
    const [footprint] = walls.footprints;
    expect(footprint?.bodyInside).toBe(false);
    expect(footprint?.areaOutside).toBe(600 * SQUARE_FOOT);
    // The other faces stand 12 in outside: 32 × 22 ft.
    expect(footprint?.areaInside).toBe(704 * SQUARE_FOOT);
    expect(walls.corners.map((corner) => corner.angle)).toEqual([270, 270, 270, 270]);
    expect(bodyAreas(walls).union).toBe(104 * SQUARE_FOOT);
    expect(walls.reasons).toEqual([]);
  });
});

describe('footprints', () => {
  it('leave out walls that lead nowhere, and keep apart buildings that a wall joins', () => {
    const walls = layOutWalls(
      plan(
        {
          A: [0, 0],
          B: [100, 0],
          C: [100, 100],
          D: [0, 100],
          E: [300, 0],
          F: [400, 0],
          G: [400, 100],
          H: [300, 100],
          L: [500, 200],
          M: [600, 200],
        },
        ['A-B', 'B-C', 'C-D', 'D-A', 'E-F', 'F-G', 'G-H', 'H-E', 'C-H', 'G-L', 'L-M'],
      ),
    );
    expect(walls.footprints.map((footprint) => footprint.cornerIds.join(''))).toEqual(['ABCD', 'EFGH']);
    expect(walls.perimeter).toBe(inches(800));
  });

  it('split at a corner where two outlines touch', () => {
    const walls = layOutWalls(
      plan({ A: [0, 0], B: [100, 0], X: [100, 100], D: [0, 100], E: [200, 100], F: [200, 200], G: [100, 200] }, [
        'A-B',
        'B-X',
        'X-D',
        'D-A',
        'X-E',
        'E-F',
        'F-G',
        'G-X',
      ]),
    );
    expect(walls.footprints.map((footprint) => [...footprint.cornerIds].sort().join(''))).toEqual(['ABDX', 'EFGX']);
  });
});
