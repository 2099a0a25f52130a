import { describe, expect, it } from 'vitest';
import { layBond } from '../../../model/bond/layBond';
import type { Bond, Piece } from '../../../model/bond/types';
import type { Drawing } from '../../../model/drawing/schema';
import { inches } from '../../../model/length/ticks';
import { layOutWalls } from '../../../model/walls/layOutWalls';
import type { Walls } from '../../../model/walls/types';
import { evenCourses } from '../../helpers/courses';
import { lShape, loopOf, rectangle } from '../../helpers/drawings';

const courses = evenCourses(6, inches(3.5), inches(0.5));

function lay(drawing: Drawing): { walls: Walls; bond: Bond } {
  const walls = layOutWalls(drawing);
  return { walls, bond: layBond(drawing, walls, courses) };
}

function piecesAt(bond: Bond, runId: string, course: number): readonly Piece[] {
  const run = bond.byRun.get(runId)!;
  return run.patterns[run.patternByCourse[course]!]!.pieces;
}

/** Each non-return piece of a course as a rectangle in plan, for walls along x and y. */
function plan(walls: Walls, bond: Bond, course: number): { x0: number; x1: number; y0: number; y1: number }[] {
  return walls.runs.flatMap(({ runId, start, direction, inward, thickness }) =>
    piecesAt(bond, runId, course)
      .filter((piece) => piece.kind !== 'return')
      .map((piece) => {
        const corner = (along: number, across: number) => ({
          x: start.x + Math.round(direction.x) * along + Math.round(inward.x) * across,
          y: start.y + Math.round(direction.y) * along + Math.round(inward.y) * across,
        });
        const a = corner(piece.start, 0);
        const b = corner(piece.end, thickness);
        return { x0: Math.min(a.x, b.x), x1: Math.max(a.x, b.x), y0: Math.min(a.y, b.y), y1: Math.max(a.y, b.y) };
      }),
  );
}

describe('Corners of a laid bond', () => {
  it('lays a rectangle on its module without a closer, lapped 3 1/2 in, a quarter of a 14 in unit', () => {
    // Trade: return + joint = 10 1/2, so lengths of 10 + n × 14 1/2 need no cutting; the lap is 14 − 10 1/2 = 3 1/2.
    const { bond } = lay(rectangle(10 + 14.5 * 10, 10 + 14.5 * 7));
    expect(bond.reasons).toEqual([]);
    for (const run of bond.runs) {
      expect(run.closersPerCoursePair).toBe(0);
      expect(run.lap).toBe(inches(3.5));
    }
    expect(piecesAt(bond, 'r1', 0).slice(0, 3)).toEqual([
      { kind: 'return', start: 0, end: inches(10) },
      { kind: 'unit', start: inches(10.5), end: inches(24.5) },
      { kind: 'unit', start: inches(25), end: inches(39) },
    ]);
    expect(piecesAt(bond, 'r1', 1)[0]).toEqual({ kind: 'unit', start: 0, end: inches(14) });
  });

  it.each([3, 4, 5, 7])('laps the corners in alternation round a loop of %i runs', (sides) => {
    const points = Array.from({ length: sides }, (_, i): [number, number] => {
      const turn = (2 * Math.PI * i) / sides;
      return [200 * Math.cos(turn), 200 * Math.sin(turn)];
    });
    const { walls, bond } = lay(loopOf(points));
    for (let course = 0; course < 4; course += 1)
      walls.runs.forEach((run, i) => {
        const next = walls.runs[(i + 1) % sides]!;
        const arrives = piecesAt(bond, run.runId, course).at(-1)!;
        const leaves = piecesAt(bond, next.runId, course)[0]!;
        const arriverGoesThrough = course % 2 === 0;
        expect(arrives.end).toBe(run.length);
        expect(leaves.start).toBe(0);
        expect(arrives.kind === 'return').toBe(!arriverGoesThrough);
        expect(leaves.kind === 'return').toBe(arriverGoesThrough);
      });
  });

  it('shows a return as wide as the other wall is cut on this face: its thickness over the sine of the angle', () => {
    const hexagon = Array.from({ length: 6 }, (_, i): [number, number] => {
      return [240 * Math.cos((Math.PI * i) / 3), 240 * Math.sin((Math.PI * i) / 3)];
    });
    const { bond } = lay(loopOf(hexagon));
    const first = piecesAt(bond, 'r1', 0)[0]!;
    expect(first.kind).toBe('return');
    // The corners are rounded to ticks, so the angle is not 120° to the last digit.
    expect(Math.abs(first.end - inches(10 / Math.sin((2 * Math.PI) / 3)))).toBeLessThanOrEqual(2);
  });

  it.each([
    ['a rectangle', rectangle(10 + 14.5 * 10, 10 + 14.5 * 7)],
    ['a rectangle that takes closers', rectangle(163, 121)],
    ['an L', lShape(10 + 14.5 * 9, 10 + 14.5 * 8, 14.5 * 4, 14.5 * 4)],
    ['an L that takes closers', lShape(190, 171, 77, 66)],
  ])('fills the plan of %s in every course: no piece in another, and what is left is mortar', (_, drawing) => {
    const { walls, bond } = lay(drawing);
    const [footprint] = walls.footprints;
    const area = footprint!.areaOutside - footprint!.areaInside;
    for (const course of [0, 1]) {
      const pieces = plan(walls, bond, course);
      pieces.forEach((a, i) =>
        pieces.slice(i + 1).forEach((b) => {
          const apart = a.x1 <= b.x0 || b.x1 <= a.x0 || a.y1 <= b.y0 || b.y1 <= a.y0;
          expect(apart).toBe(true);
        }),
      );
      const units = pieces.reduce((sum, { x0, x1, y0, y1 }) => sum + (x1 - x0) * (y1 - y0), 0);
      // Round a loop there is one head joint for every piece.
      const joint = (area - units) / pieces.length / inches(10);
      expect(joint).toBeGreaterThanOrEqual(inches(0.375));
      expect(joint).toBeLessThanOrEqual(inches(0.625));
    }
  });

  it('passes a reentrant corner by the other wall’s thickness where it goes through, and stops a joint short where not', () => {
    // D is the reentrant corner: run 3 arrives there and run 4 leaves.
    const { walls, bond } = lay(lShape(10 + 14.5 * 9, 10 + 14.5 * 8, 14.5 * 4, 14.5 * 4));
    const length = walls.runById.get('r3')!.length;
    expect(walls.cornerById.get('c4')!.kind).toBe('reentrant');
    expect(piecesAt(bond, 'r3', 0).at(-1)!.end).toBe(length + inches(10));
    expect(piecesAt(bond, 'r4', 0)[0]!.start).toBe(inches(0.5));
    expect(piecesAt(bond, 'r3', 1).at(-1)!.end).toBe(length - inches(0.5));
    expect(piecesAt(bond, 'r4', 1)[0]!.start).toBe(inches(-10));
    expect(bond.reasons).toEqual([]);
  });

  it('carries on in bond through a straight joint, each unit laid by one run only', () => {
    const whole = lay(rectangle(10 + 14.5 * 10, 200));
    const halves = lay(
      loopOf([
        [0, 0],
        [70, 0],
        [10 + 14.5 * 10, 0],
        [10 + 14.5 * 10, 200],
        [0, 200],
      ]),
    );
    for (const course of [0, 1]) {
      const laid = [
        ...piecesAt(halves.bond, 'r1', course),
        ...piecesAt(halves.bond, 'r2', course).map((piece) => ({
          ...piece,
          start: piece.start + inches(70),
          end: piece.end + inches(70),
        })),
      ].filter((piece, i) => piece.kind !== 'return' || i === 0 || piece.end === inches(155));
      expect(laid).toEqual(piecesAt(whole.bond, 'r1', course));
    }
  });

  it('butts the stem of a tee against its bar, which carries on in bond', () => {
    const bar = rectangle(10 + 14.5 * 10, 10 + 14.5 * 7);
    const drawing: Drawing = {
      ...bar,
      corners: [
        ...bar.corners.slice(0, 1),
        { id: 'm', letter: 'M', x: inches(80), y: inches(0) },
        ...bar.corners.slice(1),
        { id: 'n', letter: 'N', x: inches(80), y: inches(111.5) },
      ],
      runs: [
        { id: 'r1', from: 'c1', to: 'm', wallTypeId: 'earth' },
        { id: 'r1b', from: 'm', to: 'c2', wallTypeId: 'earth' },
        { id: 'r2', from: 'c2', to: 'c3', wallTypeId: 'earth' },
        { id: 'r3', from: 'c3', to: 'n', wallTypeId: 'earth' },
        { id: 'r3b', from: 'n', to: 'c4', wallTypeId: 'earth' },
        { id: 'r4', from: 'c4', to: 'c1', wallTypeId: 'earth' },
        { id: 'stem', from: 'm', to: 'n', wallTypeId: 'earth' },
      ],
    };
    const { walls, bond } = lay(drawing);
    expect(walls.cornerById.get('m')!.kind).toBe('tee');
    for (const course of [0, 1]) {
      const stem = piecesAt(bond, 'stem', course);
      expect(stem[0]!.start).toBeGreaterThanOrEqual(inches(10.375));
      expect(stem[0]!.start).toBeLessThanOrEqual(inches(10.625));
      expect(stem.at(-1)!.end).toBeLessThanOrEqual(inches(111.5 - 10.375));
      expect(stem.at(-1)!.end).toBeGreaterThanOrEqual(inches(111.5 - 10.625));
    }
    expect(bond.byRun.get('r1')!.closersPerCoursePair + bond.byRun.get('r1b')!.closersPerCoursePair).toBe(0);
  });
});
