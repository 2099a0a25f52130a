import { describe, expect, it } from 'vitest';
import type { Drawing } from '../../../model/drawing/schema';
import { inches } from '../../../model/length/ticks';
import { placePoles } from '../../../model/poles/placePoles';
import type { StoryPole } from '../../../model/poles/types';
import { layOutWalls } from '../../../model/walls/layOutWalls';
import { door, ell, emptySite, rectangle, withOpenings, withWalls } from './sites';

const place = (drawing: Drawing) => placePoles(drawing, layOutWalls(drawing));
const at = (pole: StoryPole | undefined) => pole && [pole.at.x, pole.at.y];
const bearings = (pole: StoryPole | undefined) =>
  pole?.braces.map((brace) => Math.round(brace.bearing)).sort((a, b) => a - b);
describe('a rectangle of 20 × 12 ft', () => {
  const set = place(rectangle());

  it('has a pole at each corner, its steel a spacer off both faces', () => {
    expect(set.poles.map((pole) => pole.letter)).toEqual(['A', 'B', 'C', 'D']);
    // Heel outward: spacer 1 in + steel 3/16 in beyond the corner each way.
    const out = inches(1 + 3 / 16);
    expect(set.poles.map(at)).toEqual([
      [-out, -out],
      [inches(240) + out, -out],
      [inches(240) + out, inches(144) + out],
      [-out, inches(144) + out],
    ]);
  });

  it('has an angle of 3 in legs and 3/16 in steel round the corner', () => {
    const s = inches(1);
    const heel = inches(1 + 3 / 16);
    const tip = inches(3 - 1 - 3 / 16);
    const section = set.poleById
      .get('A')
      ?.section.map((p) => `${p.x},${p.y}`)
      .sort();
    const expected = [
      [-heel, -heel],
      [tip, -heel],
      [tip, -s],
      [-s, -s],
      [-s, tip],
      [-heel, tip],
    ];
    expect(section).toEqual(expected.map(([x, y]) => `${x},${y}`).sort());
  });

  it('has every brace straight in line with its wall and away from it', () => {
    expect(set.poles.map(bearings)).toEqual([
      [180, 270],
      [0, 270],
      [0, 90],
      [90, 180],
    ]);
    expect(set.cost).toBe(0);
    expect(set.exact).toBe(true);
    expect(set.reasons).toEqual([]);
    expect(set.neighbourhoods.map((group) => group.length)).toEqual([1, 1, 1, 1]);
  });

  it('gives the leg by Pythagoras, the foot by two tapes', () => {
    const brace = set.poleById.get('A')?.braces.find((each) => Math.round(each.bearing) === 180);
    // 66 % of 80 in; √(80² + 52.8²) = 95.853…
    expect(brace?.reach).toBe(inches(52.8));
    expect(brace?.fixing).toBe(inches(80));
    expect(brace?.leg).toBe(inches(Math.sqrt(80 ** 2 + 52.8 ** 2)));
    expect(brace?.slope).toBeCloseTo(90 - (Math.atan2(52.8, 80) * 180) / Math.PI, 4);
    const foot = [-52.8 - 19 / 16, -19 / 16] as const;
    const tape = (x: number, y: number) => inches(Math.hypot(foot[0] - x, foot[1] - y));
    expect(brace?.ties).toEqual([
      { cornerId: 'A', distance: tape(0, 0) },
      { cornerId: 'D', distance: tape(0, 144) },
    ]);
  });
});

describe('other places for poles', () => {
  it('stands in the angle at a reentrant corner and braces into the open quadrant, 60° apart', () => {
    const pole = place(ell()).poleById.get('D');
    expect(at(pole)).toEqual([inches(169), inches(145)]);
    // As far off both faces as the least angle between braces allows: (90 − 60) / 2.
    expect(bearings(pole)).toEqual([15, 75]);
    expect(pole?.braces.map((brace) => brace.turnedFor)).toEqual([
      { kind: 'run', id: 'CD' },
      { kind: 'run', id: 'DE' },
    ]);
  });

  it('wraps the free end of a wall, braced along it and off its outside face', () => {
    const wall = withWalls(
      emptySite(),
      [
        [0, 0],
        [240, 0],
      ],
      false,
    );
    const set = place(wall);
    expect(set.poles.map((pole) => pole.letter)).toEqual(['A', 'B']);
    expect(set.poles.map(bearings)).toEqual([
      [180, 270],
      [0, 270],
    ]);
  });

  it('stands in the angle of a tee, on the side of the stem’s outside face', () => {
    // Bar A–B–C along the bottom, its body above; stem B–D up from it, its body to the left: its outside face looks right.
    const bar = withWalls(
      emptySite(),
      [
        [0, 0],
        [120, 0],
        [240, 0],
      ],
      false,
    );
    const corner = { id: 'D', letter: 'D', x: inches(120), y: inches(144) };
    const stem = { id: 'BD', from: 'B', to: 'D', wallTypeId: 'earth' };
    const set = place({ ...bar, corners: [...bar.corners, corner], runs: [...bar.runs, stem] });
    expect(set.poles.map((pole) => pole.letter)).toEqual(['A', 'B', 'C', 'D']);
    // 10 in up through the bar's thickness, then a spacer off both faces.
    expect(at(set.poleById.get('B'))).toEqual([inches(121), inches(11)]);
  });

  it('takes two poles where a stem meets the face that the bar’s line is strung to', () => {
    const bar = withWalls(
      emptySite(),
      [
        [0, 0],
        [120, 0],
        [240, 0],
      ],
      false,
    );
    const corner = { id: 'D', letter: 'D', x: inches(120), y: inches(-144) };
    const stem = { id: 'BD', from: 'B', to: 'D', wallTypeId: 'earth' };
    const set = place({ ...bar, corners: [...bar.corners, corner], runs: [...bar.runs, stem] });
    const atB = set.poles.filter((pole) => pole.cornerId === 'B');
    expect(atB.map((pole) => pole.letter)).toEqual(['B', 'B2']);
    expect(new Set(set.poles.map((pole) => pole.id)).size).toBe(set.poles.length);
  });

  it('runs its line on through a straight corner', () => {
    const set = place(
      withWalls(
        emptySite(),
        [
          [0, 0],
          [120, 0],
          [240, 0],
        ],
        false,
      ),
    );
    expect(set.poles.map((pole) => pole.letter)).toEqual(['A', 'C']);
  });

  it('adds a pole halfway along a line of 60 ft, the rule allowing 40 ft', () => {
    const set = place(
      withWalls(
        emptySite(),
        [
          [0, 0],
          [720, 0],
        ],
        false,
      ),
    );
    expect(set.poles.map((pole) => pole.letter)).toEqual(['A', 'B', 'A–B']);
    const added = set.poles[2];
    // Its 3 in leg is centred on the half: 358 1/2 in; a spacer off the face.
    expect(at(added)).toEqual([inches(358.5), inches(-1)]);
    expect(added?.id).toBe(`AB@${inches(358.5)}`);
    expect(bearings(added)).toEqual([225, 315]);
  });

  it('moves a pole along a run off the frames', () => {
    const long = withWalls(
      emptySite(),
      [
        [0, 0],
        [720, 0],
      ],
      false,
    );
    const added = place(withOpenings(long, door('AB', 340))).poles[2];
    // Clear of the far jamb at 376 by spacer 1 + clearance 2: 379 in, nearer to the half than 340 − 3 − its leg of 3.
    expect(at(added)?.[0]).toBe(inches(379));
  });

  it('measures a line of several runs that follow straight on', () => {
    const set = place(
      withWalls(
        emptySite(),
        [
          [0, 0],
          [360, 0],
          [720, 0],
        ],
        false,
      ),
    );
    expect(set.poles).toHaveLength(3);
  });

  it('keeps the steel at right angles and off both faces where a corner is not square', () => {
    for (const apex of [60, 300]) {
      const site = withWalls(emptySite(), [
        [0, 0],
        [400, 0],
        [apex, 240],
      ]);
      const walls = layOutWalls(site);
      for (const pole of placePoles(site, walls).poles) {
        expect(pole.section).toHaveLength(6);
        const [a, b, c] = pole.section;
        const cosine = (b!.x - a!.x) * (c!.x - b!.x) + (b!.y - a!.y) * (c!.y - b!.y);
        expect(Math.abs(cosine)).toBeLessThan(inches(3) * 3);
      }
    }
  });
});

describe('a pole near a frame', () => {
  const thin: Drawing = {
    ...rectangle(),
    wallTypes: rectangle().wallTypes.map((type) => ({ ...type, unit: { ...type.unit, width: inches(4) } })),
  };
  const noWay = { used: false, width: inches(0), depth: inches(0) };

  it('is set off along the wall line until its clearance is kept', () => {
    // Leg 3 + spacer 1 + clearance 2 = 6 in; the jamb is at 4 in, just past the crossing wall.
    const pole = place(withOpenings(thin, door('AB', 4, { way: noWay }))).poleById.get('A');
    expect(pole?.setOff).toEqual({ runId: 'AB', by: inches(2), for: { kind: 'opening', id: 'door-AB-4' } });
    expect(at(pole)).toEqual([inches(-2 - 19 / 16), inches(-19 / 16)]);
  });

  it('stays at its corner when the frame is as far as it has to be', () => {
    expect(place(withOpenings(thin, door('AB', 6, { way: noWay }))).poleById.get('A')?.setOff).toBeNull();
    expect(place(withOpenings(thin, door('AB', 5.9375, { way: noWay }))).poleById.get('A')?.setOff?.by).toBe(
      inches(1 / 16),
    );
  });

  it('says by how much a frame is too near at a reentrant corner, where a pole can’t be set off', () => {
    // C–D is 120 in; the door's far jamb is 4 in from D: 2 in short.
    const { reasons } = place(withOpenings(ell(), door('CD', 80, { way: noWay })));
    expect(reasons).toContainEqual({
      code: 'poleBlockedByFrame',
      weight: 'blocked',
      thing: { kind: 'pole', id: 'D' },
      against: [{ kind: 'opening', id: 'door-CD-80' }],
      amount: inches(2),
      change: { kind: 'move', thing: { kind: 'opening', id: 'door-CD-80' }, by: inches(2) },
    });
  });
});

describe('degenerate drawings', () => {
  it.each<[string, Drawing]>([
    ['nothing', emptySite()],
    ['one corner', { ...emptySite(), corners: [{ id: 'A', letter: 'A', x: inches(0), y: inches(0) }] }],
    [
      'a run of no length',
      withWalls(
        emptySite(),
        [
          [0, 0],
          [0, 0],
        ],
        false,
      ),
    ],
    [
      'a run of one tick',
      {
        ...withWalls(
          emptySite(),
          [
            [0, 0],
            [1, 0],
          ],
          false,
        ),
      },
    ],
    [
      'walls that fold back',
      withWalls(
        emptySite(),
        [
          [0, 0],
          [200, 0],
          [0, 1],
        ],
        false,
      ),
    ],
    [
      'walls that cross',
      withWalls(emptySite(), [
        [0, 0],
        [200, 200],
        [200, 0],
        [0, 200],
      ]),
    ],
    [
      'a clockwise loop',
      withWalls(emptySite(), [
        [0, 0],
        [0, 144],
        [240, 144],
        [240, 0],
      ]),
    ],
  ])('%s is solved without an exception or a figure that is none', (_, drawing) => {
    const set = place(drawing);
    for (const pole of set.poles) {
      for (const point of [pole.at, ...pole.section])
        expect(Number.isInteger(point.x) && Number.isInteger(point.y)).toBe(true);
      for (const brace of pole.braces) {
        expect(Number.isInteger(brace.leg) && brace.leg > 0).toBe(true);
        expect(Number.isFinite(brace.bearing) && Number.isFinite(brace.slope)).toBe(true);
      }
    }
    expect(Number.isFinite(set.cost)).toBe(true);
  });
});
