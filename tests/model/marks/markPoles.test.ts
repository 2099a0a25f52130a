import Fraction from 'fraction.js';
import { describe, expect, it } from 'vitest';
import { planCourses } from '../../../model/coursing/planCourses';
import type { BondBeam, Drawing } from '../../../model/drawing/schema';
import { EMPTY_SURVEY, type Survey } from '../../../model/drawing/surveySchema';
import { inches, ticks, TICKS_PER_INCH } from '../../../model/length/ticks';
import { levelCheck } from '../../../model/marks/levelCheck';
import { markPoles } from '../../../model/marks/markPoles';
import type { Marks, PoleMarks } from '../../../model/marks/types';
import { placePoles } from '../../../model/poles/placePoles';
import { levelGround } from '../../../model/survey/levelGround';
import { layOutWalls } from '../../../model/walls/layOutWalls';
import { rectangle, withDoor, withWindow } from '../../helpers/drawings';

function beam(soffit: number, id = 'b1', depth = 8): BondBeam {
  return {
    id,
    name: 'Bond beam',
    soffit: inches(soffit),
    depth: inches(depth),
    tolerance: ticks(0),
    hold: 'hard',
    bars: { count: 2, diameter: inches(0.5), lap: inches(20) },
  };
}

const survey: Survey = {
  ...EMPTY_SURVEY,
  readings: [48, 48.375, 48.25, 48.0625].map((down, i) => ({
    id: `s${i}`,
    station: { kind: 'corner', cornerId: `c${i + 1}` },
    down: inches(down),
  })),
};

function marked(drawing: Drawing, readings: Survey = survey): Marks {
  const walls = layOutWalls(drawing);
  const ground = levelGround(drawing, walls, readings);
  return markPoles(drawing, ground, planCourses(drawing, walls, ground), placePoles(drawing, walls));
}

function poleOf(marks: Marks, letter: string, lift = 1): PoleMarks {
  const found = marks.poles.find((pole) => pole.letter === letter && pole.lift === lift);
  expect(found).toBeDefined();
  return found!;
}

/** Beam at 24 courses of 4 in, door to 80 in, window from 36 to 80 in: all on course lines. */
const house: Drawing = {
  ...withWindow(withDoor(rectangle(240, 120), 'r1', 60, 36, 80), 'r3', { at: 60, width: 36, sill: 36, head: 80 }),
  bondBeams: [beam(96)],
};

describe('markPoles', () => {
  const marks = marked(house);

  it('marks every pole at the same distances from the level line', () => {
    const a = poleOf(marks, 'A');
    for (const letter of ['B', 'C', 'D']) {
      expect(levelCheck(a, poleOf(marks, letter))).toEqual([]);
      expect(poleOf(marks, letter).marks.map((mark) => mark.fromLine)).toEqual(a.marks.map((mark) => mark.fromLine));
    }
  });

  it('measures above the foundation at each pole, which is lower where the reading was larger', () => {
    const first = (letter: string) => poleOf(marks, letter).marks.find((mark) => mark.course === 1)!;
    expect(first('A').aboveFoundation).toBe(inches(4));
    expect(first('B').aboveFoundation).toBe(inches(4.375));
    expect(first('C').aboveFoundation).toBe(inches(4.25));
    expect(poleOf(marks, 'B').foundation).toBe(inches(-0.375));
  });

  it('measures from a foot that is lapped 6 in down over the foundation', () => {
    const pole = poleOf(marks, 'B');
    expect(pole.foot).toBe(inches(-6.375));
    expect(pole.head).toBe(inches(113.625));
    expect(pole.marks.find((mark) => mark.course === 1)!.fromFoot).toBe(inches(10.375));
  });

  it('makes one mark of heights that fall together, highest first, and says whose they are', () => {
    const pole = poleOf(marks, 'A');
    const heights = pole.marks.map((mark) => mark.height);
    expect(heights).toEqual([...heights].sort((x, y) => y - x));
    expect(new Set(heights).size).toBe(heights.length);
    const named = pole.marks.filter((mark) => mark.kinds.some((kind) => kind !== 'course'));
    expect(named.map(({ height, course, kinds }) => [height, course, kinds])).toEqual([
      [inches(104), null, ['beamTop']],
      [inches(96), 24, ['course', 'beamSoffit']],
      [inches(80), 20, ['course', 'head', 'lintelSeat']],
      [inches(36), 9, ['course', 'sill']],
    ]);
    // The door (o1) is on A–B; the window (o2) is not on a run at A, but its sill is marked there too.
    expect(named[2]!.things).toEqual([{ kind: 'opening', id: 'o1' }]);
    expect(named[3]!.things).toEqual([{ kind: 'opening', id: 'o2' }]);
    expect(poleOf(marks, 'C').marks.find((mark) => mark.height === inches(80))!.things).toEqual([
      { kind: 'opening', id: 'o2' },
    ]);
  });

  it('rounds each mark once from its exact height', () => {
    // A beam at 97 in: 23 courses share 93 in, 4 1/23 in each.
    const odd = marked({ ...house, bondBeams: [beam(97)], openings: [] });
    const pole = poleOf(odd, 'A');
    for (const mark of pole.marks.filter((one) => one.course !== null)) {
      const sixteenths = new Fraction(93, 23)
        .mul(mark.course! - 1)
        .add(4 - 48)
        .mul(16);
      const rounded = sixteenths.s < 0n ? sixteenths.neg().round().neg() : sixteenths.round();
      expect(mark.printed.fromLine).toBe(rounded.mul(1016).valueOf());
    }
  });

  it('marks a frame’s head where it stands, and the lintel’s seat on its course line, when the two part', () => {
    const missed = withDoor({ ...rectangle(240, 120), bondBeams: [beam(96)] }, 'r1', 60, 36, 82);
    const named = poleOf(marked(missed), 'A').marks.filter((mark) =>
      mark.kinds.some((kind) => kind === 'head' || kind === 'lintelSeat'),
    );
    // Under a beam at 96 in, four courses of 3 7/8 in leave 80 1/2; three of 4 1/8 leave 83 5/8, which is further off.
    expect(named.map((mark) => [mark.height, mark.kinds])).toEqual([
      [inches(82), ['head']],
      [inches(80.5), ['course', 'lintelSeat']],
    ]);
  });

  it('stands the pole of the next lift on the beam, its foot lapped down over it', () => {
    const two = marked({ ...house, bondBeams: [beam(96), beam(184, 'b2')] });
    const pole = poleOf(two, 'B', 2);
    expect(pole.foot).toBe(inches(98));
    expect(pole.head).toBe(inches(218));
    const first = pole.marks[pole.marks.length - 1]!;
    expect([first.height, first.course]).toEqual([inches(108), 25]);
    expect(first.fromFoot).toBe(inches(10));
    expect(first.aboveFoundation).toBe(inches(108.375));
  });

  it('says which pole does not reach, and by how much', () => {
    const tall = marked({ ...house, bondBeams: [beam(112)] });
    // 112 + 8 in to the beam's top, 120 − 6 = 114 in of reach at the high point.
    const reasons = tall.reasons.filter((reason) => reason.code === 'poleTooShort');
    expect(reasons.map((reason) => [reason.thing.id, reason.amount])).toEqual([
      ['c1', inches(6)],
      ['c2', inches(6.375)],
      ['c3', inches(6.25)],
      ['c4', inches(6.0625)],
    ]);
    expect(poleOf(tall, 'A').marks[0]!.height).toBe(inches(120));
  });

  it('agrees with itself whatever the level line’s height', () => {
    const higher: Survey = {
      ...survey,
      readings: survey.readings.map((reading) => ({ ...reading, down: ticks(reading.down + 7 * TICKS_PER_INCH) })),
    };
    const raised = marked(house, higher);
    marks.poles.forEach((pole, i) => {
      pole.marks.forEach((mark, k) => {
        const same = raised.poles[i]!.marks[k]!;
        expect(same.aboveFoundation).toBe(mark.aboveFoundation);
        expect(same.fromLine).toBe(mark.fromLine - 7 * TICKS_PER_INCH);
      });
    });
  });

  it('finds a course whose marks differ between two poles', () => {
    const other = marked({ ...house, bondBeams: [beam(96.5)], openings: [] });
    expect(levelCheck(poleOf(marks, 'A'), poleOf(other, 'A'))).toContain(24);
    const fewer = marked({ ...house, bondBeams: [beam(92)] });
    expect(levelCheck(poleOf(fewer, 'A'), poleOf(marks, 'A'))).toEqual([24]);
  });
});
