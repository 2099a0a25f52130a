import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Reading, Survey } from '../../../model/drawing/surveySchema';
import { EMPTY_SURVEY } from '../../../model/drawing/surveySchema';
import { inches, mm, ticks } from '../../../model/length/ticks';
import { heightAt } from '../../../model/survey/heightAt';
import { levelGround } from '../../../model/survey/levelGround';
import { layOutWalls } from '../../../model/walls/layOutWalls';
import { rectangle } from '../../helpers/drawings';

const drawing = rectangle(240, 120);
const walls = layOutWalls(drawing);

function survey(...readings: [string, Reading['station'], number][]): Survey {
  return {
    ...EMPTY_SURVEY,
    readings: readings.map(([id, station, down]) => ({ id, station, down: inches(down) })),
  };
}
const corner = (n: number): Reading['station'] => ({ kind: 'corner', cornerId: `c${n}` });
const onRun = (n: number, at: number): Reading['station'] => ({ kind: 'run', runId: `r${n}`, at: inches(at) });

const read = survey(
  ['a', corner(1), 48.25],
  ['b', corner(2), 48.5],
  ['c', onRun(2, 60), 48],
  ['d', corner(3), 49],
  ['e', corner(4), 48.375],
);

describe('levelGround', () => {
  const ground = levelGround(drawing, walls, read);

  it('takes the smallest reading as the high point and the level line as that far above it', () => {
    expect(ground.highPoint?.readingId).toBe('c');
    expect(ground.levelLine).toBe(inches(48));
    expect(ground.range).toBe(inches(1));
    expect(ground.assumed).toBe(false);
  });

  it('gives each station its height and a bedding that grows with its reading', () => {
    expect(ground.stations.map(({ readingId, height, bedding }) => [readingId, height, bedding])).toEqual([
      ['a', inches(-0.25), inches(0.75)],
      ['b', inches(-0.5), inches(1)],
      ['c', 0, inches(0.5)],
      ['d', inches(-1), inches(1.5)],
      ['e', inches(-0.375), inches(0.875)],
    ]);
  });

  it('names bedding over its most, 1 1/4 in here, and by how much', () => {
    expect(ground.reasons).toEqual([
      { code: 'beddingOverMost', weight: 'warning', thing: { kind: 'station', id: 'd' }, amount: inches(0.25) },
    ]);
  });

  it('puts the first-course top at the least bedding and one unit, wherever the low places are', () => {
    expect(ground.firstCourseTop).toBe(inches(4));
  });

  it('draws the ground straight between stations', () => {
    expect(heightAt(ground, 'r2', inches(0))).toBe(inches(-0.5));
    expect(heightAt(ground, 'r2', inches(30))).toBe(inches(-0.25));
    expect(heightAt(ground, 'r2', inches(60))).toBe(0);
    expect(heightAt(ground, 'r2', inches(90))).toBe(inches(-0.5));
    expect(heightAt(ground, 'r2', inches(500))).toBe(inches(-1));
    expect(heightAt(ground, 'no such run', inches(3))).toBe(0);
  });

  it('fills a corner that was not read from the readings on either side, along the walls', () => {
    // B lies between A (0, 240 in away) and C (−1 in, 120 in away): two thirds of the way down to C.
    const partly = levelGround(
      drawing,
      walls,
      survey(['a', corner(1), 48], ['d', corner(3), 49], ['e', corner(4), 48]),
    );
    expect(partly.heightByCorner.get('c2')).toBe(ticks(Math.round((-16_256 * 2) / 3)));
    expect(partly.reasons.filter((reason) => reason.code === 'cornerNotRead').map((reason) => reason.thing.id)).toEqual(
      ['c2'],
    );
  });

  it('takes the last of several readings at one station, and a reading at a run’s very end for its corner', () => {
    const again = levelGround(
      drawing,
      walls,
      survey(['wrong', corner(1), 40], ['b', corner(2), 49], ['right', onRun(1, 0), 48]),
    );
    expect(again.stations.map((station) => station.readingId)).toEqual(['b', 'right']);
    expect(again.levelLine).toBe(inches(48));
    expect(again.heightByCorner.get('c1')).toBe(0);
  });

  it('leaves out readings that are off the drawing, and says which', () => {
    const off = levelGround(
      drawing,
      walls,
      survey(['a', corner(1), 48], ['x', corner(9), 12], ['y', onRun(1, 241), 12], ['z', onRun(7, 1), 12]),
    );
    expect(off.stations).toHaveLength(1);
    expect(
      off.reasons.filter((reason) => reason.code === 'readingOffDrawing').map((reason) => reason.thing.id),
    ).toEqual(['x', 'y', 'z']);
  });

  it('takes an unread foundation as level, 48 in or 1 200 mm under the line, and says so', () => {
    const assumed = levelGround(drawing, walls, EMPTY_SURVEY);
    expect(assumed.assumed).toBe(true);
    expect(assumed.levelLine).toBe(inches(48));
    expect(assumed.range).toBe(0);
    expect(assumed.reasons.map((reason) => reason.code)).toEqual(['surveyAssumed']);
    expect(levelGround({ ...drawing, units: 'metric' }, walls, EMPTY_SURVEY).levelLine).toBe(mm(1200));
  });

  it('does not change when the level line is shot higher: only the line moves', () => {
    fc.assert(
      fc.property(
        fc.array(fc.integer({ min: 0, max: 100_000 }), { minLength: 4, maxLength: 4 }),
        fc.integer({ min: 0, max: 1_000_000 }),
        (downs, up) => {
          const at = (raise: number): Survey => ({
            ...EMPTY_SURVEY,
            readings: downs.map((down, i) => ({ id: `s${i}`, station: corner(i + 1), down: ticks(down + raise) })),
          });
          const low = levelGround(drawing, walls, at(0));
          const high = levelGround(drawing, walls, at(up));
          expect(high.levelLine - low.levelLine).toBe(up);
          expect([...high.heightByCorner]).toEqual([...low.heightByCorner]);
          expect(high.firstCourseTop).toBe(low.firstCourseTop);
        },
      ),
    );
  });
});
