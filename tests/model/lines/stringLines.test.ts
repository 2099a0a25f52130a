import Fraction from 'fraction.js';
import { describe, expect, it } from 'vitest';
import type { Drawing } from '../../../model/drawing/schema';
import { inches, ticks, TICKS_PER_INCH } from '../../../model/length/ticks';
import { stringLines } from '../../../model/lines/stringLines';
import { placePoles } from '../../../model/poles/placePoles';
import type { PoleSet, StoryPole } from '../../../model/poles/types';
import { layOutWalls } from '../../../model/walls/layOutWalls';
import { freeWall, loopOf, rectangle } from '../../helpers/drawings';

function strung(drawing: Drawing) {
  const walls = layOutWalls(drawing);
  return stringLines(drawing, walls, placePoles(drawing, walls));
}

/** Poles at the given corners only, with nothing on them. */
function polesAt(drawing: Drawing, cornerIds: readonly string[], change: Partial<StoryPole> = {}): PoleSet {
  const poles = drawing.corners
    .filter((corner) => cornerIds.includes(corner.id))
    .map((corner): StoryPole => {
      const at = { x: corner.x, y: corner.y };
      const runIds = drawing.runs.filter((run) => run.from === corner.id || run.to === corner.id).map((run) => run.id);
      const { id, letter } = corner;
      return { id, letter, cornerId: id, corner: at, at, section: [], setOff: null, runIds, braces: [], ...change };
    });
  return {
    poles,
    poleById: new Map(poles.map((pole) => [pole.id, pole])),
    cost: 0,
    neighbourhoods: [],
    exact: true,
    reasons: [],
  };
}

describe('stringLines', () => {
  it('strings one line for each run, corner to corner, and cuts it a line block longer at each end', () => {
    const { lines } = strung(rectangle(240, 120));
    expect(lines.map(({ runId, span, cut }) => [runId, span, cut])).toEqual([
      ['r1', inches(240), inches(246)],
      ['r2', inches(120), inches(126)],
      ['r3', inches(240), inches(246)],
      ['r4', inches(120), inches(126)],
    ]);
  });

  it('gives sag by w L² / (8 T), to the tick, by rational arithmetic', () => {
    const drawing = freeWall(300);
    const walls = layOutWalls(drawing);
    const [line] = stringLines(drawing, walls, polesAt(drawing, ['c1', 'c2'])).lines;
    // 13.3 mN/m, 90 N: metres are 25.4/1000 of inches, ticks 640 000 a metre.
    const metres = new Fraction(300).mul(254).div(10_000);
    const sag = new Fraction('13.3')
      .div(1000)
      .mul(metres)
      .mul(metres)
      .mul(640_000)
      .div(8 * 90);
    expect(line?.sag).toBe(sag.round().valueOf());
  });

  it('places as few trigs as hold the sag, evenly, and says so', () => {
    const drawing = freeWall(420);
    const walls = layOutWalls(drawing);
    const { lines, reasons } = stringLines(drawing, walls, polesAt(drawing, ['c1', 'c2']));
    const [line] = lines;
    expect(line!.sag).toBeGreaterThan(1016);
    expect(line!.trigs).toEqual([inches(210)]);
    expect(line!.sagWithTrigs).toBe(Math.round(line!.sag / 4));
    expect(reasons).toEqual([
      {
        code: 'lineSags',
        weight: 'note',
        thing: { kind: 'run', id: 'r1' },
        rule: 'lineSagMost',
        amount: ticks(line!.sag - 1016),
      },
    ]);
  });

  it('says how hard to pull instead: with that, the sag is just the most', () => {
    const drawing = freeWall(420);
    const walls = layOutWalls(drawing);
    const [line] = stringLines(drawing, walls, polesAt(drawing, ['c1', 'c2'])).lines;
    const metres = new Fraction(420).mul(254).div(10_000);
    // w L² / (8 s), s = 1/16 in in metres.
    const most = new Fraction(254, 160_000);
    const pull = new Fraction('13.3').div(1000).mul(metres).mul(metres).div(8).div(most);
    expect(line!.pullWithoutTrigs).toBeCloseTo(pull.valueOf(), 9);
    const harder = { ...drawing, poleKit: { ...drawing.poleKit, linePull: line!.pullWithoutTrigs! + 0.001 } };
    expect(stringLines(harder, walls, polesAt(drawing, ['c1', 'c2'])).lines[0]!.trigs).toEqual([]);
    const never = { ...drawing, ruleValues: { lineSagMost: 0 } };
    expect(stringLines(never, walls, polesAt(drawing, ['c1', 'c2'])).lines[0]!.pullWithoutTrigs).toBeNull();
  });

  it('warns where no number of trigs can hold the sag', () => {
    const drawing = { ...freeWall(420), ruleValues: { lineSagMost: 0 } };
    const walls = layOutWalls(drawing);
    const { lines, reasons } = stringLines(drawing, walls, polesAt(drawing, ['c1', 'c2']));
    expect(lines[0]!.trigs).toHaveLength(20);
    expect(reasons[0]!.weight).toBe('warning');
  });

  it('runs past the corner to a pole that is set off along the wall', () => {
    const drawing = freeWall(200);
    const walls = layOutWalls(drawing);
    const setOff = { runId: 'r1', by: inches(9), for: { kind: 'opening', id: 'o' } } as const;
    const both = polesAt(drawing, ['c1', 'c2'], { setOff });
    expect(stringLines(drawing, walls, both).lines[0]!.span).toBe(inches(218));
  });

  it('passes on through a run in line with it where no pole stands between them', () => {
    const drawing = loopOf(
      [
        [0, 0],
        [100, 0],
        [260, 0],
      ],
      { closed: false },
    );
    const walls = layOutWalls(drawing);
    const through = stringLines(drawing, walls, polesAt(drawing, ['c1', 'c3'])).lines;
    expect(through.map(({ fromPoleId, toPoleId, span }) => [fromPoleId, toPoleId, span])).toEqual([
      ['c1', 'c3', 260 * TICKS_PER_INCH],
    ]);
    const stopped = stringLines(drawing, walls, polesAt(drawing, ['c1', 'c2', 'c3'])).lines;
    expect(stopped.map(({ runId, span }) => [runId, span])).toEqual([
      ['r1', inches(100)],
      ['r2', inches(160)],
    ]);
  });

  it('is the same for a building moved across the plan', () => {
    const moved = rectangle(240, 120);
    const shifted = {
      ...moved,
      corners: moved.corners.map((corner) => ({ ...corner, x: ticks(corner.x + 777), y: ticks(corner.y - 5_000_001) })),
    };
    expect(strung(shifted)).toEqual(strung(moved));
  });
});
