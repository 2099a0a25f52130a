import { describe, expect, it } from 'vitest';
import type { Drawing } from '../../../model/drawing/schema';
import { inches } from '../../../model/length/ticks';
import { layOutWalls } from '../../../model/walls/layOutWalls';
import { outline, plan, wallType } from './shapes';

const run = (id: string) => ({ kind: 'run', id }) as const;
const corner = (id: string) => ({ kind: 'corner', id }) as const;

function reasons(drawing: Drawing) {
  return layOutWalls(drawing).reasons;
}

describe('what can be wrong with walls', () => {
  it('names a run without length and leaves it out', () => {
    const walls = layOutWalls(plan({ A: [0, 0], B: [0, 0], C: [50, 0] }, ['A-B', 'B-C']));
    expect(walls.reasons).toEqual([
      { code: 'runHasNoLength', weight: 'blocked', thing: run('A-B'), amount: 0 },
      { code: 'cornersCoincide', weight: 'warning', thing: corner('B'), against: [corner('A')] },
    ]);
    expect(walls.runs.map((one) => one.runId)).toEqual(['B-C']);
    expect(walls.cornerById.get('A')?.kind).toBe('alone');
  });

  it('names runs that cross', () => {
    expect(reasons(plan({ A: [0, 0], B: [100, 0], C: [50, -60], D: [50, 60] }, ['A-B', 'C-D']))).toEqual([
      { code: 'runsCross', weight: 'blocked', thing: run('A-B'), against: [run('C-D')] },
    ]);
  });

  it('names a run that ends on another without a corner there', () => {
    expect(reasons(plan({ A: [0, 0], B: [100, 0], C: [50, 0], D: [50, 60] }, ['A-B', 'C-D']))).toMatchObject([
      { code: 'runsCross', thing: run('A-B'), against: [run('C-D')] },
    ]);
  });

  it('names runs that lie on one another, and by how much', () => {
    expect(reasons(plan({ A: [0, 0], B: [100, 0], C: [70, 0], D: [170, 0] }, ['A-B', 'C-D']))).toEqual([
      { code: 'runsOverlap', weight: 'blocked', thing: run('A-B'), against: [run('C-D')], amount: inches(30) },
    ]);
  });

  it('names runs from one corner that lie on one another', () => {
    expect(reasons(plan({ A: [0, 0], B: [100, 0], C: [170, 0] }, ['A-B', 'A-C']))).toContainEqual({
      code: 'runsOverlap',
      weight: 'blocked',
      thing: run('A-B'),
      against: [run('A-C')],
      amount: inches(100),
    });
  });

  it('names a second run between the same corners and leaves it out', () => {
    const drawing = plan({ A: [0, 0], B: [100, 0] }, ['A-B', 'B-A']);
    const walls = layOutWalls(drawing);
    expect(walls.reasons).toEqual([
      { code: 'runsOverlap', weight: 'blocked', thing: run('B-A'), against: [run('A-B')] },
    ]);
    expect(walls.runs.length).toBe(1);
  });

  it('names walls that stand closer than their thickness', () => {
    expect(reasons(plan({ A: [0, 0], B: [100, 0], C: [0, 9], D: [100, 9] }, ['A-B', 'C-D']))).toEqual([
      { code: 'runsOverlap', weight: 'warning', thing: run('A-B'), against: [run('C-D')], amount: inches(3) },
    ]);
    expect(reasons(plan({ A: [0, 0], B: [100, 0], C: [0, 12], D: [100, 12] }, ['A-B', 'C-D']))).toEqual([]);
  });

  it('names a corner where more than four runs meet', () => {
    const star = plan({ O: [0, 0], P: [200, 0], Q: [62, 190], R: [-162, 118], S: [-162, -118], T: [62, -190] }, [
      'O-P',
      'O-Q',
      'O-R',
      'O-S',
      'O-T',
    ]);
    expect(reasons(star)).toEqual([
      {
        code: 'tooManyRunsMeet',
        weight: 'blocked',
        thing: corner('O'),
        against: ['O-P', 'O-Q', 'O-R', 'O-S', 'O-T'].map(run),
      },
    ]);
  });

  it('names a corner too sharp to turn', () => {
    // 15°: a mitre of 12 in / sin 7.5° is 92 in, more than four thicknesses. 45° is 31 in.
    const at = (degrees: number) => {
      const radians = (degrees * Math.PI) / 180;
      return plan({ A: [300 * Math.cos(radians), 300 * Math.sin(radians)], B: [0, 0], C: [300, 0] }, ['A-B', 'B-C']);
    };
    expect(reasons(at(15))).toMatchObject([{ code: 'cornerTooSharp', thing: corner('B') }]);
    expect(reasons(at(45))).toEqual([]);
  });

  it('names a run too short for its corners, and by how much', () => {
    const walls = layOutWalls(plan({ A: [0, 100], B: [0, 0], C: [20, 0], D: [20, 100] }, ['A-B', 'B-C', 'C-D']));
    expect(walls.reasons).toContainEqual({
      code: 'runTooShortForCorner',
      weight: 'blocked',
      thing: run('B-C'),
      against: [run('A-B'), run('C-D')],
      amount: inches(4),
    });
    expect(walls.runById.get('B-C')?.insideLength).toBe(0);
    expect(walls.runById.get('B-C')?.body.length).toBe(3);
  });

  it('names wall types whose units differ in height', () => {
    const tall = wallType('tall', 12);
    const types = [wallType('wall', 12), { ...tall, unit: { ...tall.unit, height: inches(7.625) } }];
    const drawing = plan({ A: [0, 0], B: [100, 0], C: [100, 100] }, ['A-B', 'B-C:tall'], types);
    expect(reasons(drawing)).toEqual([
      {
        code: 'unitHeightsDiffer',
        weight: 'blocked',
        thing: { kind: 'wallType', id: 'tall' },
        against: [{ kind: 'wallType', id: 'wall' }],
        amount: inches(4),
      },
    ]);
    // A type that no run uses does no harm.
    expect(
      reasons({
        ...outline([
          [0, 0],
          [100, 0],
          [100, 100],
        ]),
        wallTypes: types,
      }),
    ).toEqual([]);
  });

  it('solves a drawing with nothing in it', () => {
    const walls = layOutWalls(plan({}, []));
    expect(walls.runs).toEqual([]);
    expect(walls.reasons).toEqual([]);
  });
});
