import { describe, expect, it } from 'vitest';
import { courseWalk } from '../../../model/courseWalk/courseWalk';
import type { Drawing } from '../../../model/drawing/schema';
import { EMPTY_SURVEY, type Survey } from '../../../model/drawing/surveySchema';
import { courseFigure } from '../../../model/figures/course';
import type { LabelScale } from '../../../model/figures/figure';
import { inches, ticks } from '../../../model/length/ticks';
import { solve } from '../../../model/setOut';
import { loopOf, rectangle, withDoor, withWindow } from '../../helpers/drawings';

const beam = {
  id: 'beam',
  name: 'Bond beam',
  soffit: inches(96),
  depth: inches(8),
  tolerance: inches(0),
  hold: 'hard',
  bars: { count: 2, diameter: inches(0.5), lap: inches(20) },
} as const;

/** A rectangle on its module with a window from course 9 to 20 and its lintel in courses 21 and 22. */
function house(): Drawing {
  const plain = { ...rectangle(10 + 14.5 * 10, 10 + 14.5 * 7), bondBeams: [beam] };
  return withWindow(plain, 'r1', { at: 39, width: 44, sill: 32, head: 80, lintel: [8, 8] });
}

function walkOf(drawing: Drawing, course: number, survey: Survey = EMPTY_SURVEY) {
  const setOut = solve(drawing, survey);
  return { setOut, walk: courseWalk(drawing, setOut, course) };
}

describe('A course walk', () => {
  it('has each run’s units of that course, as many as the module gives', () => {
    // A run of 10 + n × 14 1/2 lays n whole units in every course.
    const { walk } = walkOf(house(), 3);
    expect(walk!.runs.map(({ whole, closers }) => [whole, closers])).toEqual([
      [10, 0],
      [7, 0],
      [10, 0],
      [7, 0],
    ]);
    expect(walk!.cuts).toEqual([]);
    expect(walk!.cutFrom).toBe(0);
  });

  it('sets the line to the same distance below the level line at every pole, from the exact height', () => {
    // First mark 4 in above the high point; read 48 in below the line, so 44 in down (check value), and 4 in up a course.
    const survey: Survey = {
      ...EMPTY_SURVEY,
      readings: ['c1', 'c2', 'c3', 'c4'].map((cornerId, i) => ({
        id: `s${i}`,
        station: { kind: 'corner', cornerId } as const,
        down: inches(i === 1 ? 48.375 : 48),
      })),
    };
    for (const [course, down] of [
      [1, 44],
      [2, 40],
      [12, 0],
      [20, -32],
    ] as const) {
      const { walk } = walkOf(house(), course, survey);
      expect(walk!.lines.map((line) => line.letter)).toEqual(['A', 'B', 'C', 'D']);
      expect(walk!.lines.map((line) => line.printed.fromLine)).toEqual(Array(4).fill(ticks(inches(-down) + 0)));
    }
  });

  it('lists what to cut by length, and the units it takes with offcuts used', () => {
    // Beside a door on the bond, even courses have a closer of 10 in at one jamb and 3 1/2 in at the other: one 14 in unit.
    const drawing = withDoor({ ...rectangle(155, 111.5), bondBeams: [beam] }, 'r1', 39, 44, 80);
    const walks = [1, 2].map((course) => walkOf(drawing, course).walk!);
    const withCuts = walks.find((walk) => walk.cuts.length > 0)!;
    expect(withCuts.cuts).toEqual([
      { wallTypeId: 'earth', length: inches(10), count: 1, runIds: ['r1'] },
      { wallTypeId: 'earth', length: inches(3.5), count: 1, runIds: ['r1'] },
    ]);
    expect(withCuts.cutFrom).toBe(1);
    expect(walks.find((walk) => walk !== withCuts)!.cuts).toEqual([]);
  });

  it('says which corners turn, and nothing more between two plain courses', () => {
    const { walk } = walkOf(house(), 4);
    expect(walk!.changes.map((change) => change.what)).toEqual(Array(4).fill('cornerTurns'));
    expect(new Set(walk!.changes.map((change) => (change.what === 'cornerTurns' ? change.cornerId : '')))).toEqual(
      new Set(['c1', 'c2', 'c3', 'c4']),
    );
  });

  it.each([
    [9, ['openingStarts']],
    [10, []],
    [21, ['openingEnds', 'lintelStarts']],
    [22, []],
    [23, ['lintelEnds']],
  ])('says in course %i where an opening or its lintel starts and ends', (course, expected) => {
    const { walk } = walkOf(house(), course);
    const found = walk!.changes.map((change) => change.what).filter((what) => /^(opening|lintel)/.test(what));
    expect(found).toEqual(expected);
  });

  it('says that a course stands on a beam', () => {
    const two = {
      ...rectangle(155, 111.5),
      bondBeams: [
        { ...beam, id: 'low', soffit: inches(48) },
        { ...beam, soffit: inches(104) },
      ],
    };
    const { walk } = walkOf(two, 13);
    expect(walk!.lift).toBe(2);
    expect(walk!.changes).toContainEqual({ what: 'newLift', beamId: 'low' });
    const all = new Set(walk!.lines.map((line) => line.poleId));
    expect(all.size).toBe(walk!.lines.length);
  });

  it('agrees with the takeoff: the walks of all courses add up to it', () => {
    const drawing = withDoor(house(), 'r3', 41, 40, 80);
    const setOut = solve(drawing, EMPTY_SURVEY);
    let whole = 0;
    let closers = 0;
    for (const { number } of setOut.coursing.courses) {
      const walk = courseWalk(drawing, setOut, number)!;
      for (const run of walk.runs) [whole, closers] = [whole + run.whole, closers + run.closers];
      expect(walk.cuts.reduce((sum, cut) => sum + cut.count, 0)).toBe(walk.runs.reduce((sum, r) => sum + r.closers, 0));
    }
    expect([whole, closers]).toEqual([setOut.takeoff.units.whole, setOut.takeoff.units.closers]);
    expect(closers).toBeGreaterThan(0);
  });

  it.each([0, -1, 25, 1.5])('is null for course %d of 24', (course) => {
    expect(walkOf(house(), course).walk).toBeNull();
  });
});

const scale: LabelScale = {
  textHeight: { small: 2000, label: 2500, dimension: 2500, letter: 4000 },
  advance: 0.5,
  clear: 500,
};

describe('The figure of a course', () => {
  it('covers in units what the pieces cover, and stands each opening in its place', () => {
    const drawing = house();
    const { setOut, walk } = walkOf(drawing, 10);
    const figure = courseFigure(drawing, setOut, walk!, { scale, selected: null, cutLengths: true });
    const openings = figure.shapes.filter((shape) => shape.role === 'opening');
    expect(openings).toHaveLength(1);
    expect(openings[0]).toMatchObject({
      thing: { kind: 'opening', id: drawing.openings[0]!.id },
      points: [
        { x: inches(39), y: 0 },
        { x: inches(83), y: 0 },
        { x: inches(83), y: inches(10) },
        { x: inches(39), y: inches(10) },
      ],
    });
    // Every piece brings its two edges; the window parts its run into two strips, the other three runs are one each.
    const own = walk!.runs.flatMap((run) => run.pieces.filter((piece) => piece.kind !== 'return'));
    const edges = figure.shapes.flatMap((shape) =>
      shape.kind === 'lines' && shape.role === 'joint' ? shape.lines : [],
    );
    expect(edges).toHaveLength(2 * own.length);
    expect(figure.shapes.filter((shape) => shape.role === 'unit')).toHaveLength(5);
    expect(figure.shapes.filter((shape) => shape.role === 'closer')).toHaveLength(
      own.filter((piece) => piece.kind === 'closer').length,
    );
  });

  it('writes at each pole its letter and the mark from the level line', () => {
    const drawing = house();
    const { setOut, walk } = walkOf(drawing, 5);
    const figure = courseFigure(drawing, setOut, walk!, { scale, selected: { kind: 'pole', id: 'none' } });
    const texts = figure.shapes.flatMap((shape) => (shape.kind === 'text' ? [shape.text] : []));
    expect(texts.filter((text) => text.kind === 'literal').map((text) => text.text)).toEqual(['A', 'B', 'C', 'D']);
    expect(texts.filter((text) => text.kind === 'measure').map((text) => text.length)).toEqual(
      walk!.lines.map((line) => line.printed.fromLine),
    );
  });

  it('has a few shapes a run, however long the run', () => {
    const shapesFor = (length: number) => {
      const drawing = { ...rectangle(length, 111.5), bondBeams: [beam] };
      const { setOut, walk } = walkOf(drawing, 1);
      return courseFigure(drawing, setOut, walk!, { scale, selected: null }).shapes.filter((s) => s.thing?.id === 'r1');
    };
    expect(shapesFor(10 + 14.5 * 100)).toHaveLength(shapesFor(10 + 14.5 * 10).length);
  });

  it('turns with the building: no text is upside down', () => {
    for (let turn = 0; turn < 360; turn += 30) {
      const points = [
        [0, 0],
        [163, 0],
        [163, 121],
        [0, 121],
      ].map(([x, y]): [number, number] => {
        const angle = (turn * Math.PI) / 180;
        return [x! * Math.cos(angle) - y! * Math.sin(angle), x! * Math.sin(angle) + y! * Math.cos(angle)];
      });
      const drawing = { ...loopOf(points), bondBeams: [beam] };
      const { setOut, walk } = walkOf(drawing, 1);
      const figure = courseFigure(drawing, setOut, walk!, { scale, selected: null, cutLengths: true });
      for (const shape of figure.shapes)
        if (shape.kind === 'text') {
          expect(shape.turn).toBeGreaterThan(-90.001);
          expect(shape.turn).toBeLessThanOrEqual(90);
        }
    }
  });
});
