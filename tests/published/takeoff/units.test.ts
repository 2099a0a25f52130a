/** Published counts of units, each with its source, counted by drawing the wall and taking it off. */
import { describe, expect, it } from 'vitest';
import type { Drawing, WallType } from '../../../model/drawing/schema';
import { EMPTY_SURVEY } from '../../../model/drawing/surveySchema';
import { feet, inches, mm, ticks } from '../../../model/length/ticks';
import { solve } from '../../../model/setOut';
import { earthBlock, freeWall, rectangle } from '../../helpers/drawings';

/** A wall whose courses reach the height, with its bedding as thick as its joints. */
function tall(drawing: Drawing, height: number): Drawing {
  const plate = { id: 'plate', kind: 'plate' as const, name: 'Plate', height: ticks(height), weight: 1 };
  return { ...drawing, controlHeights: [{ ...plate, tolerance: ticks(0), hold: 'hard' }] };
}

function typeOf(
  length: number,
  width: number,
  height: number,
  joint: number,
  change: Partial<WallType> = {},
): WallType {
  const fixed = { nominal: ticks(joint), least: ticks(joint), most: ticks(joint) };
  return earthBlock({
    unit: { length: ticks(length), width: ticks(width), height: ticks(height) },
    headJoint: fixed,
    bedJoint: fixed,
    bedding: { least: ticks(joint), most: ticks(joint) },
    bondOffset: 'half',
    leastLap: ticks(Math.floor(length / 4)),
    leastPiece: ticks(Math.floor(length / 4)),
    ...change,
  });
}

const block = typeOf(inches(15.625), inches(7.625), inches(7.625), inches(0.375));
const modular = typeOf(inches(7.625), inches(3.625), inches(2.25), inches(0.375), {
  // 8 in to three courses: the joint is 2 2/3 − 2 1/4, which no inch fraction gives.
  bedJoint: { nominal: inches(0.375), least: inches(0.375), most: inches(0.5) },
  bedding: { least: inches(5 / 12), most: inches(0.5) },
});
const brick = typeOf(mm(215), mm(102.5), mm(65), mm(10));

describe('Counts of units', () => {
  it('a 100 × 10 ft wall of 8 × 16 in face takes 1 125: 75 × 15 (NCMA TEK 14, 1969; NAVEDTRA 14045 p. 145)', () => {
    const { takeoff, coursing } = solve(tall(freeWall(1200 - 0.375, block), feet(10)), EMPTY_SURVEY);
    expect(coursing.courses).toHaveLength(15);
    // Halves at the two ends of every second course: two from one unit, less a kerf that the 3/8 joint allows for.
    expect(takeoff.units.total).toBe(1125);
    expect(takeoff.units.closers).toBe(2 * 7);
  });

  it('112.5 per 100 sq ft follows from it (NCMA TEK 14, 1969)', () => {
    const { takeoff } = solve(tall(freeWall(1200 - 0.375, block), feet(10)), EMPTY_SURVEY);
    expect(takeoff.units.total / ((100 * 10) / 100)).toBe(112.5);
  });

  it('a 20 × 8 × 8 ft building takes 504 by the perimeter rule, and the corners counted once less than that (NAVEDTRA 14045)', () => {
    // Perimeter 56 ft at 3/4 unit a foot, 12 courses: 504. A corner counted once is half a unit less, four a course.
    const rule = 56 * 0.75 * 12;
    expect(rule).toBe(504);
    const { takeoff, coursing, walls } = solve(tall(rectangle(240 - 0.375, 96 - 0.375, block), feet(8)), EMPTY_SURVEY);
    expect(coursing.courses).toHaveLength(12);
    // By area: each unit and its joint takes 16 × 7 5/8 of the walls' plan, which has each corner once.
    const [footprint] = walls.footprints;
    const plan = footprint!.areaOutside - footprint!.areaInside;
    const byArea = (plan / (inches(16) * inches(7.625))) * 12;
    expect(byArea).toBeCloseTo(rule - 4 * 0.5 * 12, 6);
    expect(takeoff.units).toEqual({ whole: 480, closers: 0, cutFrom: 0, total: 480 });
  });

  it('modular brick: 6.75 per sq ft, 144 / (8 × 8/3) (Brick Industry Association; derived)', () => {
    // 24 ft long and 8 ft high: 36 bricks by 36 courses on 192 sq ft.
    const { takeoff, coursing } = solve(tall(freeWall(288 - 0.375, modular), feet(8)), EMPTY_SURVEY);
    expect(coursing.courses).toHaveLength(36);
    expect(takeoff.units.total / (24 * 8)).toBe(6.75);
  });

  it('UK stretcher bond: 60 per m², 59.26 exactly (general UK practice; derived)', () => {
    // 40 bricks of 225 mm by 40 courses of 75 mm on 9 × 3 m.
    const { takeoff, coursing } = solve(tall(freeWall((9000 - 10) / 25.4, brick), mm(3000)), EMPTY_SURVEY);
    expect(coursing.courses).toHaveLength(40);
    const perSquareMetre = takeoff.units.total / 27;
    expect(perSquareMetre).toBeCloseTo(59.26, 2);
    expect(Math.ceil(perSquareMetre)).toBe(60);
  });
});

describe('Bar of a bond beam (PCI Design Handbook, 7th ed., Aid 15.4.1; derived)', () => {
  it('100 ft of two #4 bars weigh 133.6 lb before laps', () => {
    const drawing = tall(freeWall(1200, block), feet(10));
    const beam: Drawing['bondBeams'][number] = {
      id: 'beam',
      name: 'Beam',
      soffit: feet(8),
      depth: feet(2),
      tolerance: ticks(0),
      hold: 'hard',
      bars: { count: 2, diameter: inches(0.5), lap: ticks(0) },
    };
    const { takeoff } = solve({ ...drawing, bondBeams: [beam] }, EMPTY_SURVEY);
    const feetOfBar = takeoff.beams[0]!.bar / feet(1);
    expect(feetOfBar).toBe(200);
    expect(feetOfBar * 0.668).toBeCloseTo(133.6, 10);
  });
});

describe('Pole stock (common practice, no source)', () => {
  it('gives two 10 ft poles to a 20 ft length', () => {
    const { takeoff } = solve(tall(rectangle(247.625, 103.625, block), feet(8)), EMPTY_SURVEY);
    expect(takeoff.poles.stock.map(({ cuts }) => cuts)).toEqual([
      [feet(10), feet(10)],
      [feet(10), feet(10)],
    ]);
  });
});
