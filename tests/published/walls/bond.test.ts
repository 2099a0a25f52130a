/** Published values of walls and bond, each with its source, worked through the model. */
import { describe, expect, it } from 'vitest';
import { layBond } from '../../../model/bond/layBond';
import { noCutLengths } from '../../../model/bond/noCut';
import type { WallType } from '../../../model/drawing/schema';
import { inches, mm, ticks, type Ticks } from '../../../model/length/ticks';
import { ruleValue } from '../../../model/rules/registry';
import { layOutWalls } from '../../../model/walls/layOutWalls';
import { evenCourses } from '../../helpers/courses';
import { earthBlock, freeWall, rectangle } from '../../helpers/drawings';

function fixedJoint(joint: Ticks): WallType['headJoint'] {
  return { nominal: joint, least: joint, most: joint };
}

/** 7 5/8 × 7 5/8 × 15 5/8 in concrete block on 3/8 in joints. */
const block = earthBlock({
  unit: { length: inches(15.625), width: inches(7.625), height: inches(7.625) },
  headJoint: fixedJoint(inches(0.375)),
  bedJoint: fixedJoint(inches(0.375)),
  bondOffset: 'half',
  leastLap: inches(3.625),
  leastPiece: inches(3.625),
});

/** 215 × 102.5 × 65 mm brick on 10 mm joints: the 225 mm format. */
const brick = earthBlock({
  unit: { length: mm(215), width: mm(102.5), height: mm(65) },
  headJoint: fixedJoint(mm(10)),
  bedJoint: fixedJoint(mm(10)),
  bondOffset: 'half',
  leastLap: mm(46),
  leastPiece: mm(46),
});

function unitsIn(length: Ticks, wallType: WallType): number {
  const drawing = freeWall(length / 16_256, wallType);
  const walls = layOutWalls(drawing);
  const bond = layBond(drawing, walls, evenCourses(2, wallType.unit.height, wallType.bedJoint.nominal));
  const run = bond.byRun.get('r1')!;
  const { pieces } = run.patterns[run.patternByCourse[0]!]!;
  return pieces.every((piece) => piece.kind === 'unit') ? pieces.length : -1;
}

describe('Co-ordinating sizes of the 225 mm format (UK Technical Information Sheet 9, “Brickwork Dimensions”, Table 1)', () => {
  // Opening n × 225 + 10, run n × 225, pier n × 225 − 10.
  it.each([
    [1, 235, 225, 215],
    [4, 910, 900, 890],
  ])('%i units: opening %f, run %f, pier %f mm', (n, opening, run, pier) => {
    // A pier stands between two free ends, a run from an outside corner to a reentrant one less the wall that crosses it,
    // and an opening is a pier’s length and a joint on each side.
    const { below, above } = noCutLengths(brick, ['free', 'free'], mm(pier));
    expect([below, above]).toEqual([mm(pier), mm(pier)]);
    expect(unitsIn(mm(pier), brick)).toBe(n);
    const along = noCutLengths(brick, ['outside', 'reentrant'], mm(run));
    expect([along.below, along.above]).toEqual([mm(run), mm(run)]);
    expect(opening).toBe(pier + 2 * 10);
  });

  it('1 1/2 units: 347.5, 337.5 and 327.5 mm, one whole and one half with its joint', () => {
    // 215 + 10 + 102.5, and a joint more for the run, two for the opening.
    const drawing = freeWall(327.5 / 25.4, brick);
    const walls = layOutWalls(drawing);
    const bond = layBond(drawing, walls, evenCourses(2, mm(65), mm(10)));
    const run = bond.byRun.get('r1')!;
    expect(bond.reasons).toEqual([]);
    const sizes = run.patternByCourse.map((pattern) =>
      run.patterns[pattern]!.pieces.map((p) => (p.end - p.start) / 640),
    );
    expect(sizes.map((course) => [...course].sort((a, b) => a - b))).toEqual([
      [102.5, 215],
      [102.5, 215],
    ]);
    expect(sizes[0]).toEqual([...sizes[1]!].reverse());
  });
});

describe('Concrete block, 8 × 16 in nominal (NAVEDTRA 14043 and 14045, Table 4-1 note)', () => {
  it('makes a wall one joint, 3/8 in, shorter than nominal', () => {
    for (const nominal of [48, 96, 160]) {
      const { below, above } = noCutLengths(block, ['free', 'free'], inches(nominal - 0.375));
      expect([below, above]).toEqual([inches(nominal - 0.375), inches(nominal - 0.375)]);
    }
  });

  it.each([
    [8, 12],
    [10, 15],
  ])('%i ft of height takes %i courses: 1.5 times the height in feet', (height, courses) => {
    const coursing = evenCourses(courses, block.unit.height, block.bedJoint.nominal);
    expect(coursing.top).toBe(inches(height * 12));
    expect(courses).toBe(1.5 * height);
  });

  it('turns a corner in half bond with a return of half a unit, so that nothing is cut', () => {
    const drawing = rectangle(15 * 16 + 7.625, 6 * 16 + 7.625, block);
    const walls = layOutWalls(drawing);
    const bond = layBond(drawing, walls, evenCourses(2, block.unit.height, block.bedJoint.nominal));
    expect(bond.reasons).toEqual([]);
    expect(bond.runs.map((run) => [run.closersPerCoursePair, run.lap])).toEqual(
      bond.runs.map(() => [0, inches(7.625)]),
    );
  });
});

describe('Three modular bricks end to end (a brick maker’s design guide, secondary)', () => {
  const modular = earthBlock({
    unit: { length: inches(7.625), width: inches(3.625), height: inches(2.25) },
    headJoint: fixedJoint(inches(0.375)),
    bondOffset: 'half',
    leastLap: inches(1.75),
    leastPiece: inches(1.75),
  });

  it('measure 3 × 7 5/8 + 2 × 3/8 = 23 5/8 in, and an opening carries a joint more at each side', () => {
    expect(unitsIn(inches(23.625), modular)).toBe(3);
    expect(noCutLengths(modular, ['free', 'free'], inches(23.625)).below).toBe(inches(23.625));
    expect(unitsIn(inches(24.375), modular)).toBe(-1);
  });
});

describe('The module (ISO 1006, secondary)', () => {
  it('is 100 mm; 4 in is 101.6 mm', () => {
    expect(mm(100)).toBe(64_000);
    expect(inches(4)).toBe(mm(101.6));
  });
});

describe('Lap and lift in earth walls', () => {
  it('laps by at least a quarter of the unit’s visible length (NMAC 14.7.4.11 E)', () => {
    expect(ruleValue(rectangle(100, 100), 'leastLapPart')).toBe(0.25);
  });

  it('leaves 14 in units 10 in wide a lap of 3 1/2 in at a turned corner, a quarter to the last fraction (derived)', () => {
    const quarter = ticks(inches(14) / 4);
    const drawing = rectangle(10 + 14.5 * 8, 10 + 14.5 * 5);
    const walls = layOutWalls(drawing);
    const bond = layBond(drawing, walls, evenCourses(2, inches(3.5), inches(0.5)));
    expect(bond.runs.map((run) => run.lap)).toEqual(bond.runs.map(() => quarter));
  });
});
