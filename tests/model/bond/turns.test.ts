import { describe, expect, it } from 'vitest';
import { layBond } from '../../../model/bond/layBond';
import type { Bond } from '../../../model/bond/types';
import type { Drawing } from '../../../model/drawing/schema';
import { inches } from '../../../model/length/ticks';
import { layOutWalls } from '../../../model/walls/layOutWalls';
import { evenCourses } from '../../helpers/courses';
import { earthBlock, loopOf, rectangle } from '../../helpers/drawings';

/** 16 × 8 × 8 in nominal: half a unit wide, so that lengths of whole units and of half ones both bond. */
const block = earthBlock({
  unit: { length: inches(15.625), width: inches(7.625), height: inches(7.625) },
  headJoint: { nominal: inches(0.375), least: inches(0.375), most: inches(0.375) },
  bondOffset: 'half',
  leastLap: inches(3.625),
  leastPiece: inches(3.625),
});

function lay(drawing: Drawing): Bond {
  const walls = layOutWalls(drawing);
  return layBond(drawing, walls, evenCourses(2, inches(7.625), inches(0.375)));
}

function ends(bond: Bond, runId: string, course: number): readonly [string, string] {
  const run = bond.byRun.get(runId)!;
  const { pieces } = run.patterns[run.patternByCourse[course]!]!;
  return [pieces[0]!.kind, pieces[pieces.length - 1]!.kind];
}

const closers = (bond: Bond) => bond.runs.map((run) => run.closersPerCoursePair);

describe('How the corners are turned', () => {
  it('passes a wall of whole units through at both ends in the same course, so that nothing is cut', () => {
    const bond = lay(rectangle(16 * 15 - 0.375, 16 * 6 - 0.375, block));
    expect(bond.reasons).toEqual([]);
    expect(closers(bond)).toEqual([0, 0, 0, 0]);
    for (const course of [0, 1])
      for (const runId of ['r1', 'r2', 'r3', 'r4']) {
        const [first, last] = ends(bond, runId, course);
        expect(first).toBe(last);
      }
    // One of two walls that meet goes through, never both.
    for (const course of [0, 1])
      expect(ends(bond, 'r1', course)[1] === 'unit').toBe(ends(bond, 'r2', course)[0] === 'return');
  });

  it('passes a wall of units and a half through at one end, then at the other', () => {
    const bond = lay(rectangle(16 * 15 + 7.625, 16 * 6 + 7.625, block));
    expect(closers(bond)).toEqual([0, 0, 0, 0]);
    expect(ends(bond, 'r1', 0)).toEqual(['return', 'unit']);
    expect(ends(bond, 'r1', 1)).toEqual(['unit', 'return']);
  });

  it('mixes both round one building', () => {
    const bond = lay(rectangle(16 * 15 - 0.375, 16 * 6 + 7.625, block));
    expect(closers(bond)).toEqual([0, 0, 0, 0]);
  });

  it('turns one wall back where a ring has an odd number of them to pass at both ends', () => {
    // A triangle on whole units: an odd number of runs can't all pass at both ends; two of them do.
    const side = 16 * 12 - 0.375;
    const bond = lay(
      loopOf(
        [
          [0, 0],
          [side, 0],
          [side, side],
        ],
        { wallType: block },
      ),
    );
    const passing = ['r1', 'r2', 'r3'].filter((runId) => ends(bond, runId, 0)[0] === ends(bond, runId, 0)[1]);
    expect(passing.length % 2).toBe(0);
    for (const course of [0, 1])
      for (const [a, b] of [
        ['r1', 'r2'],
        ['r2', 'r3'],
        ['r3', 'r1'],
      ] as const)
        expect((ends(bond, a, course)[1] === 'return') !== (ends(bond, b, course)[0] === 'return')).toBe(true);
  });
});
