import { describe, expect, it } from 'vitest';
import { newDrawing, newOpening } from '../../../model/drawing/defaults';
import type { Drawing } from '../../../model/drawing/schema';
import { hitAll, hitAreaPoint, hitTest, indexHits } from '../../../model/hit/hitTest';
import { inches } from '../../../model/length/ticks';
import type { PoleSet } from '../../../model/poles/types';
import type { ThingKind } from '../../../model/things';
import { layOutWalls } from '../../../model/walls/layOutWalls';

const at = (x: number, y: number) => ({ x: inches(x), y: inches(y) });

//   D────────────C
//   │   k────k   │     a keep-clear inside the room,
//   │   └────┘   │     an opening from 100 to 136 on A–B
//   A────▭───────B
const ROOM: Drawing = {
  ...newDrawing('imperial'),
  corners: [
    { id: 'A', letter: 'A', ...at(0, 0) },
    { id: 'B', letter: 'B', ...at(360, 0) },
    { id: 'C', letter: 'C', ...at(360, 240) },
    { id: 'D', letter: 'D', ...at(0, 240) },
  ],
  runs: ['A-B', 'B-C', 'C-D', 'D-A'].map((id) => {
    const [from = '', to = ''] = id.split('-');
    return { id, from, to, wallTypeId: 'wall' };
  }),
  openings: [newOpening('imperial', 'window', { id: 'o', runId: 'A-B', at: inches(100) })],
  keepClears: [{ id: 'k', name: 'Sand', points: [at(80, 60), at(160, 60), at(160, 120), at(80, 120)] }],
  boundary: [at(-100, -100), at(500, -100), at(500, 400), at(-100, 400)],
};
const WALLS = layOutWalls(ROOM);
const POLES: PoleSet = {
  poles: [
    {
      id: 'A',
      letter: 'A',
      cornerId: 'A',
      corner: at(0, 0),
      at: at(-1, -1),
      section: [at(-1, -1), at(2, -1), at(2, -0.8), at(-0.8, -0.8), at(-0.8, 2), at(-1, 2)],
      setOff: null,
      runIds: ['D-A', 'A-B'],
      braces: [
        {
          id: 'A.1',
          poleId: 'A',
          foot: at(-60, -1),
          bearing: 180,
          reach: inches(59),
          fixing: inches(80),
          leg: inches(99),
          slope: 53,
          inLineWith: 'A-B',
          turned: 0,
          turnedFor: null,
          over: [],
          ties: [],
        },
      ],
    },
  ],
  poleById: new Map(),
  cost: 0,
  neighbourhoods: [],
  exact: true,
  reasons: [],
};

const index = indexHits(ROOM, WALLS, POLES);
const hit = (x: number, y: number, reach = 4, kinds?: readonly ThingKind[]) => {
  const thing = hitTest(index, at(x, y), inches(reach), kinds && new Set(kinds));
  return thing && `${thing.kind} ${thing.id}`;
};

describe('what lies under the finger', () => {
  it('is a corner within reach, before the pole and the runs there', () => {
    expect(hit(2, 2)).toBe('corner A');
    expect(hit(362, 238)).toBe('corner C');
  });
  it('is a pole or a brace where the corner is out of reach or not asked for', () => {
    expect(hit(-1, 1, 4, ['pole', 'run'])).toBe('pole A');
    expect(hit(-30, 1)).toBe('brace A.1');
    expect(hit(-30, 9)).toBeNull();
  });
  it('is the opening before its run', () => {
    expect(hit(110, 6)).toBe('opening o');
    expect(hit(98, 6)).toBe('run A-B');
    expect(hit(98, -1)).toBe('run A-B');
  });
  it('is the wall that it is on, before what is only near', () => {
    expect(hit(200, 6)).toBe('run A-B');
    expect(hit(200, 14)).toBe('run A-B');
    expect(hit(200, 20)).toBeNull();
  });
  it('is a keep-clear inside it and near its edge', () => {
    expect(hit(120, 90)).toBe('keepClear k');
    expect(hit(163, 90)).toBe('keepClear k');
  });
  it('is the boundary on its line only', () => {
    expect(hit(200, -98)).toBe('boundary boundary');
    expect(hit(200, -80)).toBeNull();
  });
  it('can be asked for by kind', () => {
    expect(hit(110, 6, 4, ['run'])).toBe('run A-B');
    expect(hit(120, 90, 4, ['run'])).toBeNull();
  });
  it('lists everything, likeliest first, nearest of a kind first', () => {
    const all = hitAll(index, at(0, 0), inches(4)).map((one) => `${one.thing.kind} ${one.thing.id}`);
    expect(all[0]).toBe('corner A');
    expect([...all].sort()).toEqual(['brace A.1', 'corner A', 'pole A', 'run A-B', 'run D-A']);
    const two = hitAll(index, at(359, 3), inches(400), new Set<ThingKind>(['corner'])).map((one) => one.thing.id);
    expect(two).toEqual(['B', 'C', 'A']);
  });
  it('is nothing on an empty plan', () => {
    const empty = newDrawing('metric');
    expect(hitTest(indexHits(empty, layOutWalls(empty), null), at(0, 0), inches(9))).toBeNull();
  });
  it('can be an opening that does not fit its run', () => {
    const wrong = { ...ROOM, openings: ROOM.openings.map((one) => ({ ...one, at: inches(350) })) };
    const walls = layOutWalls(wrong);
    expect(walls.openingsByRun.get('A-B')).toEqual([]);
    expect(hitTest(indexHits(wrong, walls, null), at(375, 6), inches(4))).toEqual({ kind: 'opening', id: 'o' });
  });
});

describe('the points of areas', () => {
  it('are caught within reach, the nearest first', () => {
    expect(hitAreaPoint(ROOM, at(158, 61), inches(4))).toEqual({ thing: { kind: 'keepClear', id: 'k' }, index: 1 });
    expect(hitAreaPoint(ROOM, at(-99, 399), inches(4))).toEqual({
      thing: { kind: 'boundary', id: 'boundary' },
      index: 3,
    });
    expect(hitAreaPoint(ROOM, at(120, 61), inches(4))).toBeNull();
  });
});
