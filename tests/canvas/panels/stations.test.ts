import { describe, expect, it } from 'vitest';
import { withoutReadings, withReading } from '../../../canvas/panels/levels/readings';
import { listStations, nextUnread, stationKey } from '../../../canvas/panels/levels/stations';
import { newDrawing } from '../../../model/drawing/defaults';
import type { Drawing } from '../../../model/drawing/schema';
import { EMPTY_SURVEY, type Reading, type Station, type Survey } from '../../../model/drawing/surveySchema';
import { feet, inches } from '../../../model/length/ticks';
import { layOutWalls } from '../../../model/walls/layOutWalls';

/** A rectangle A–B–C–D of 24 by 12 ft, and a lone run E–F beside it; the runs are listed out of order on purpose. */
function building(): Drawing {
  const drawing = newDrawing('imperial');
  const wallTypeId = drawing.wallTypes[0]?.id ?? '';
  const corners = [
    ['A', 0, 0],
    ['B', 24, 0],
    ['C', 24, 12],
    ['D', 0, 12],
    ['E', 40, 0],
    ['F', 52, 0],
  ] as const;
  const runs = ['CD', 'EF', 'AB', 'DA', 'BC'];
  return {
    ...drawing,
    corners: corners.map(([letter, x, y]) => ({ id: letter, letter, x: feet(x), y: feet(y) })),
    runs: runs.map((name) => ({ id: name, from: name.charAt(0), to: name.charAt(1), wallTypeId })),
  };
}

const walls = layOutWalls(building());
const corner = (cornerId: string): Station => ({ kind: 'corner', cornerId });
const along = (runId: string, at: number): Station => ({ kind: 'run', runId, at: feet(at) });

function survey(...readings: readonly [string, Station, number][]): Survey {
  return readings.reduce<Survey>(
    (sum, [id, station, down]) => withReading(sum, id, station, inches(down)),
    EMPTY_SURVEY,
  );
}

describe('the stations of a level book', () => {
  it('are every corner, read or not, in the order of walking round, then what stands apart', () => {
    const letters = listStations(walls, EMPTY_SURVEY).entries.map(({ letter }) => letter);
    const loop = letters.slice(0, 4).join('');
    expect('ABCDABCD').toContain(loop);
    expect(letters.slice(4)).toEqual(['E', 'F']);
  });

  it('take in what was read along a run between its corners, by distance', () => {
    const book = listStations(
      walls,
      survey(['2', along('AB', 16), 48], ['1', along('AB', 8), 47.5], ['b', corner('B'), 48]),
    );
    const names = book.entries.map(({ letter, along: on }) => letter ?? `${on?.run} ${on?.letter} ${on?.at}`);
    const a = names.indexOf('A');
    expect(names.slice(a, a + 4)).toEqual(['A', `A–B A ${feet(8)}`, `A–B A ${feet(16)}`, 'B']);
    expect(book.entries.find(({ letter }) => letter === 'B')?.reading?.down).toBe(inches(48));
    expect(book.off).toEqual([]);
  });

  it('show the last reading of a station that was read twice', () => {
    const book = listStations(walls, survey(['old', corner('C'), 48], ['new', corner('C'), 47]));
    expect(book.entries.filter(({ letter }) => letter === 'C').map(({ reading }) => reading?.id)).toEqual(['new']);
    expect(book.off).toEqual([]);
  });

  it('set apart readings whose corner or run is gone, or that lie past the run’s end', () => {
    const book = listStations(
      walls,
      survey(['x', corner('Z'), 48], ['y', along('AB', 25), 48], ['z', along('AB', 24), 48]),
    );
    expect(book.off.map(({ id }) => id)).toEqual(['x', 'y']);
    expect(book.entries.find(({ letter }) => letter === 'B')?.reading?.id).toBe('z');
  });

  it('lead from one unread station to the next, round the end, until all are read', () => {
    const keys = listStations(walls, EMPTY_SURVEY).entries.map(({ key }) => key);
    let now = survey();
    let key: string | null = keys[3] ?? null;
    const visited: string[] = [];
    while (key !== null) {
      visited.push(key);
      const entry = listStations(walls, now).entries.find((each) => each.key === key);
      if (!entry) throw new Error('no such station');
      now = withReading(now, `reading-${visited.length}`, entry.station, inches(48));
      key = nextUnread(listStations(walls, now).entries, key);
    }
    expect(visited).toEqual([...keys.slice(3), ...keys.slice(0, 3)]);
  });

  it('are named apart: a corner, and each place along a run', () => {
    const keys = [corner('A'), corner('B'), along('AB', 1), along('AB', 2), along('CD', 1)].map(stationKey);
    expect(new Set(keys).size).toBe(5);
  });
});

function measured(of: Survey): readonly Reading[] {
  return of.method === 'measureDown' ? of.readings : [];
}

describe('changing a survey', () => {
  it('puts a reading in place of its own, leaving the others and the original alone', () => {
    const before = survey(['a', corner('A'), 48], ['b', corner('B'), 47]);
    const after = withReading(before, 'a', corner('A'), inches(46));
    expect(measured(after).map(({ id, down }) => [id, down])).toEqual([
      ['a', inches(46)],
      ['b', inches(47)],
    ]);
    expect(measured(before)[0]?.down).toBe(inches(48));
    expect(withoutReadings(after, ['b', 'none']).readings.map(({ id }) => id)).toEqual(['a']);
  });

  it('leaves a rod survey as it is: its rows belong to their set-ups', () => {
    const byRod: Survey = {
      version: 1,
      method: 'rod',
      benchmark: { name: 'Nail', height: inches(0) },
      closing: null,
      share: 'setUps',
      readings: [{ id: 'a', station: corner('A'), sight: 'back', rod: inches(48) }],
    };
    expect(withReading(byRod, 'a', corner('A'), inches(46))).toBe(byRod);
    expect(withoutReadings(byRod, ['a'])).toBe(byRod);
  });
});
