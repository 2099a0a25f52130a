import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { layBond } from '../../../model/bond/layBond';
import type { Bond, RunBond } from '../../../model/bond/types';
import type { Drawing } from '../../../model/drawing/schema';
import { inches, ticks } from '../../../model/length/ticks';
import { layOutWalls } from '../../../model/walls/layOutWalls';
import type { Walls } from '../../../model/walls/types';
import { checkRun } from '../../helpers/bondChecker';
import { evenCourses } from '../../helpers/courses';
import { earthBlock, emptyDrawing, freeWall, loopOf, rectangle, withDoor, withWindow } from '../../helpers/drawings';

const COURSES = 26;
const courses = evenCourses(COURSES, inches(3.5), inches(0.5));

function lay(drawing: Drawing): { walls: Walls; bond: Bond } {
  const walls = layOutWalls(drawing);
  return { walls, bond: layBond(drawing, walls, courses) };
}

/** Two ticks, 0.003 mm, are what rounding each joint to whole ticks can take from a lap. */
const ROUNDING = 2;

/** Reads every run by the independent checker; reasons must be given where and only where it finds a rule broken. */
function expectHonest(drawing: Drawing): void {
  const { walls, bond } = lay(drawing);
  const wall = drawing.wallTypes[0]!;
  for (const run of bond.runs) {
    const found = checkRun(drawing, walls, courses, run);
    const codes = bond.reasons.filter((reason) => reason.thing.id === run.runId).map((reason) => reason.code);
    if (!codes.includes('runDoesNotBond')) expect(found.faults).toEqual([]);
    expect(codes.includes('straightJoint')).toBe(found.lap <= 0);
    expect(codes.includes('lapUnderLeast')).toBe(found.lap > 0 && found.lap < wall.leastLap - ROUNDING);
    expect(codes.includes('pieceUnderLeast')).toBe(found.shortest < wall.leastPiece);
    if (found.lap > 0 && found.lap !== Infinity) expect(run.lap).toBe(found.lap);
    expect(new Set(codes).size).toBe(codes.length);
  }
}

const sizes = fc.integer({ min: inches(70), max: inches(420) });

describe('A laid bond, read by a checker of its own', () => {
  it('keeps every rule in rectangles of any size, with no reason to give', () => {
    fc.assert(
      fc.property(sizes, sizes, (width, depth) => {
        const drawing = rectangle(width / 16_256, depth / 16_256);
        expectHonest(drawing);
        expect(lay(drawing).bond.reasons).toEqual([]);
      }),
      { numRuns: 60 },
    );
  });

  it('keeps every rule in free-standing walls of any length', () => {
    fc.assert(
      fc.property(fc.integer({ min: inches(36), max: inches(500) }), (length) => {
        const drawing = freeWall(length / 16_256);
        expectHonest(drawing);
        expect(lay(drawing).bond.reasons).toEqual([]);
      }),
      { numRuns: 60 },
    );
  });

  it('keeps off openings and lintels, and says so where a lap or a piece is too short', () => {
    const opening = fc.record({
      at: fc.integer({ min: 30, max: 100 }),
      width: fc.integer({ min: 20, max: 48 }),
      sill: fc.constantFrom(0, 16, 28),
      lintel: fc.constantFrom<readonly [number, number]>([0, 0], [8, 8], [4, 6]),
    });
    fc.assert(
      fc.property(fc.integer({ min: 180, max: 320 }), opening, (length, { at, width, sill, lintel }) => {
        expectHonest(withWindow(rectangle(length, 121), 'r1', { at, width, sill, head: 80, lintel }));
      }),
      { numRuns: 60 },
    );
  });

  it('needs no closer beside a door set on the bond but the one at each jamb in alternate courses', () => {
    // Odd courses: a return of 10, then units from 10 1/2: the second ends at 39, the sixth starts at 83.
    const { bond } = lay(withDoor(rectangle(10 + 14.5 * 12, 10 + 14.5 * 7), 'r1', 39, 44, 80));
    const run = bond.byRun.get('r1')!;
    expect(bond.reasons).toEqual([]);
    expect(run.closersPerCoursePair).toBe(2);
  });

  it('lays the courses over an opening as if it were not there', () => {
    const { bond } = lay(withWindow(rectangle(223, 140), 'r1', { at: 77, width: 31, sill: 28, head: 80 }));
    const plain = lay(rectangle(223, 140)).bond.byRun.get('r1')!;
    const run = bond.byRun.get('r1')!;
    const piecesOf = (of: RunBond, course: number) => of.patterns[of.patternByCourse[course]!]!.pieces;
    for (const course of [0, 1, 24, 25]) expect(piecesOf(run, course)).toEqual(piecesOf(plain, course));
  });
});

describe('A laid bond', () => {
  const drawing = loopOf([
    [0, 0],
    [203, 0],
    [203, 117],
    [119, 117],
    [119, 190],
    [0, 190],
  ]);

  it('is the same wherever the building stands', () => {
    const moved = {
      ...drawing,
      corners: drawing.corners.map((c) => ({ ...c, x: ticks(c.x + 12_345), y: ticks(c.y - 678_901) })),
    };
    expect(lay(moved).bond).toEqual(lay(drawing).bond);
  });

  it('lays as many units, closers and returns where the building is mirrored', () => {
    // Mirrored about the y axis, each run is drawn the other way so that its body stays inside.
    const mirrored: Drawing = {
      ...drawing,
      corners: drawing.corners.map((corner) => ({ ...corner, x: ticks(-corner.x) })),
      runs: drawing.runs.map((run) => ({ ...run, from: run.to, to: run.from })),
    };
    const before = lay(drawing);
    const after = lay(mirrored);
    for (const run of before.bond.runs) {
      const other = after.bond.byRun.get(run.runId)!;
      const count = (of: RunBond, kind: string) =>
        [0, 1].map((c) => of.patterns[of.patternByCourse[c]!]!.pieces.filter((piece) => piece.kind === kind).length);
      // Which of the two courses a return falls in depends on the run that a corner starts with.
      expect(count(other, 'return').sort()).toEqual(count(run, 'return').sort());
      expect(count(other, 'unit').reduce((a, b) => a + b)).toBe(count(run, 'unit').reduce((a, b) => a + b));
      expect(other.closersPerCoursePair).toBe(run.closersPerCoursePair);
      expect(other.noCut).toEqual(run.noCut);
    }
  });

  it('holds as many patterns for a hundred courses as for four', () => {
    const walls = layOutWalls(drawing);
    const low = layBond(drawing, walls, evenCourses(4, inches(3.5), inches(0.5)));
    const high = layBond(drawing, walls, evenCourses(100, inches(3.5), inches(0.5)));
    expect(high.runs.map((run) => run.patterns.length)).toEqual(low.runs.map((run) => run.patterns.length));
    expect(high.runs.every((run) => run.patternByCourse.length === 100)).toBe(true);
  });

  it('lays headers across the wall, with closers that keep their joints apart', () => {
    // 215 × 102.5 mm bricks: a return and its joint are two modules, so without closers every joint would be straight.
    const headers = earthBlock({
      unit: { length: ticks(215 * 640), width: ticks(102.5 * 640), height: ticks(65 * 640) },
      laid: 'header',
      headJoint: { nominal: ticks(6400), least: ticks(4800), most: ticks(7680) },
      // A quarter of the 102.5 mm that show.
      leastLap: ticks(25.6 * 640),
      leastPiece: ticks(40 * 640),
      bondOffset: 'half',
    });
    const metric = rectangle(2915 / 25.4, 2915 / 25.4, headers);
    expectHonest(metric);
    expect(lay(metric).bond.reasons).toEqual([]);
  });

  it('says what a run too short for any bond lacks, and is not stopped by it', () => {
    const { bond } = lay(rectangle(200, 8));
    expect(bond.reasons.some((reason) => reason.code === 'runDoesNotBond' && reason.weight === 'blocked')).toBe(true);
    for (const run of bond.runs) expect(run.patternByCourse).toHaveLength(COURSES);
  });

  it('is total over crossing, coinciding and crowded runs', () => {
    const place = fc.record({ x: fc.integer({ min: -40, max: 40 }), y: fc.integer({ min: -40, max: 40 }) });
    const pairs = fc.array(fc.tuple(fc.nat(6), fc.nat(6)), { maxLength: 9 });
    fc.assert(
      fc.property(fc.array(place, { minLength: 7, maxLength: 7 }), pairs, (places, ends) => {
        const crowded: Drawing = {
          ...emptyDrawing(),
          corners: places.map(({ x, y }, i) => ({ id: `c${i}`, letter: 'ABCDEFG'[i]!, x: inches(x), y: inches(y) })),
          runs: ends
            .filter(([a, b]) => a !== b)
            .map(([a, b], i) => ({ id: `r${i}`, from: `c${a}`, to: `c${b}`, wallTypeId: 'earth' })),
        };
        const { walls, bond } = lay(crowded);
        expect(bond.runs).toHaveLength(walls.runs.length);
        for (const run of bond.runs)
          for (const { pieces } of run.patterns)
            for (const piece of pieces) {
              expect(Number.isSafeInteger(piece.start)).toBe(true);
              expect(piece.end).toBeGreaterThan(piece.start);
            }
      }),
      { numRuns: 200 },
    );
  });

  it('has nothing to lay without courses', () => {
    const walls = layOutWalls(drawing);
    const bond = layBond(drawing, walls, evenCourses(0, inches(3.5), inches(0.5)));
    expect(bond.runs).toHaveLength(6);
    expect(bond.runs.every((run) => run.patternByCourse.length === 0)).toBe(true);
  });
});

describe('A bond of sizes that no wall has', () => {
  it('is refused where a course would have more units than can be laid, and bounded where joints may be anything', () => {
    const dust = earthBlock({
      unit: { length: ticks(1), width: ticks(1), height: ticks(1) },
      headJoint: { nominal: ticks(0), least: ticks(0), most: ticks(0) },
      leastLap: ticks(0),
      leastPiece: ticks(0),
    });
    const { bond } = lay(freeWall(5000, dust));
    expect(bond.reasons.map((reason) => reason.code)).toEqual(['runDoesNotBond']);

    const anyJoint = earthBlock({ headJoint: { nominal: inches(0.5), least: ticks(0), most: inches(7000) } });
    const wide = lay(freeWall(5000, anyJoint)).bond;
    expect(wide.runs[0]!.closersPerCoursePair).toBe(2);
    expect(wide.reasons).toEqual([]);
  });

  it('says so where a single piece is all that fits', () => {
    const { bond } = lay(freeWall(2));
    expect(bond.reasons.map((reason) => [reason.code, reason.amount])).toEqual([['pieceUnderLeast', inches(1.5)]]);
  });
});
