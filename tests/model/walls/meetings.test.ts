import { describe, expect, it } from 'vitest';
import { inches, TICKS_PER_FOOT } from '../../../model/length/ticks';
import { layOutWalls } from '../../../model/walls/layOutWalls';
import type { Walls } from '../../../model/walls/types';
import { bodyAreas, insetArea, outline, plan, wallType, type Place } from './shapes';

const SQUARE_FOOT = TICKS_PER_FOOT ** 2;

function run(walls: Walls, id: string) {
  const found = walls.runById.get(id);
  if (!found) throw new Error(`no run ${id}`);
  return found;
}

function inInches(points: readonly { x: number; y: number }[]): Place[] {
  return points.map((point) => [point.x / inches(1), point.y / inches(1)]);
}

describe('walls of different thickness', () => {
  const types = [wallType('wall', 12), wallType('thick', 18)];
  it('meet at a corner each by its own face', () => {
    const walls = layOutWalls(plan({ A: [0, 0], B: [200, 0], C: [200, 150] }, ['A-B', 'B-C:thick'], types));
    expect(inInches(run(walls, 'A-B').body)).toEqual([
      [0, 0],
      [200, 0],
      [182, 12],
      [0, 12],
    ]);
    expect(inInches(run(walls, 'B-C').body)).toEqual([
      [200, 0],
      [200, 150],
      [182, 150],
      [182, 12],
    ]);
  });
  it('step where they go on in one line', () => {
    const walls = layOutWalls(plan({ A: [0, 0], B: [200, 0], C: [400, 0] }, ['A-B', 'B-C:thick'], types));
    expect(inInches(run(walls, 'A-B').inside)).toEqual([
      [0, 12],
      [200, 12],
    ]);
    expect(inInches(run(walls, 'B-C').inside)).toEqual([
      [200, 18],
      [400, 18],
    ]);
    expect(walls.cornerById.get('B')).toMatchObject({ kind: 'straight', angle: 180 });
    expect(walls.reasons).toEqual([]);
  });
});

describe('free ends, tees and crosses', () => {
  it('end square where nothing meets them', () => {
    const walls = layOutWalls(plan({ A: [0, 0], B: [100, 0], C: [300, 300] }, ['A-B']));
    expect(inInches(run(walls, 'A-B').body)).toEqual([
      [0, 0],
      [100, 0],
      [100, 12],
      [0, 12],
    ]);
    expect(walls.corners.map((corner) => corner.kind)).toEqual(['free', 'free', 'alone']);
    expect(walls.footprints).toEqual([]);
    expect(walls.perimeter).toBe(0);
  });

  //   D────S────C      the stem S–T stands between two bars;
  //   │    │    │      its ends stop against their inside faces
  //   A────T────B
  const teed = plan({ A: [0, 0], T: [144, 0], B: [360, 0], C: [360, 240], S: [144, 240], D: [0, 240] }, [
    'A-T',
    'T-B',
    'B-C',
    'C-S',
    'S-D',
    'D-A',
    'T-S',
  ]);

  it('stop a stem against the face of its bar, and leave the bar straight', () => {
    const walls = layOutWalls(teed);
    expect(inInches(run(walls, 'T-S').body)).toEqual([
      [144, 12],
      [144, 228],
      [132, 228],
      [132, 12],
    ]);
    expect(inInches(run(walls, 'A-T').body)).toEqual([
      [0, 0],
      [144, 0],
      [144, 12],
      [12, 12],
    ]);
    expect(run(walls, 'T-S').ends.map((end) => end.kind)).toEqual(['teeStem', 'teeStem']);
    expect(run(walls, 'A-T').ends.map((end) => end.kind)).toEqual(['outside', 'teeBar']);
    expect(walls.cornerById.get('T')).toMatchObject({ kind: 'tee', angle: null, runIds: ['T-B', 'T-S', 'A-T'] });
    const areas = bodyAreas(walls);
    expect(areas.sum).toBe(areas.union);
    // 600 − 504 square feet of outer wall and a stem of 18 ft.
    expect(areas.union).toBe((96 + 18) * SQUARE_FOOT);
  });

  it('keep the outline as the footprint, tees and all', () => {
    const [footprint, more] = layOutWalls(teed).footprints;
    expect(more).toBeUndefined();
    expect(footprint?.cornerIds).toEqual(['A', 'T', 'B', 'C', 'S', 'D']);
    expect(footprint?.areaInside).toBe(504 * SQUARE_FOOT);
  });

  it('stop a stem on the outside of a bar at its outside face', () => {
    const walls = layOutWalls(plan({ A: [0, 0], T: [100, 0], B: [200, 0], E: [100, -90] }, ['A-T', 'T-B', 'T-E']));
    expect(inInches(run(walls, 'T-E').body)).toEqual([
      [100, 0],
      [100, -90],
      [112, -90],
      [112, 0],
    ]);
    expect(bodyAreas(walls).union).toBe(bodyAreas(walls).sum);
  });

  it('stop a slanting stem along the bar’s face', () => {
    const walls = layOutWalls(plan({ A: [0, 0], T: [200, 0], B: [400, 0], E: [320, 120] }, ['A-T', 'T-B', 'T-E']));
    const { outside, inside } = run(walls, 'T-E');
    expect([outside[0].y, inside[0].y]).toEqual([inches(12), inches(12)]);
    expect(outside[0].x).toBe(inches(212));
    const areas = bodyAreas(walls);
    expect(Math.abs(areas.sum - areas.union)).toBeLessThan(inches(700));
  });

  it('take one wall through a cross and stop the other on both its faces', () => {
    const walls = layOutWalls(
      plan({ W: [0, 0], X: [100, 0], E: [220, 0], N: [100, 120], S: [100, -140] }, ['W-X', 'X-E', 'S-X', 'X-N']),
    );
    expect(walls.cornerById.get('X')?.kind).toBe('cross');
    const areas = bodyAreas(walls);
    expect(areas.sum).toBe(areas.union);
    // 220 in of one wall, and 260 in less one thickness of the other.
    expect(areas.union).toBe((220 + 260 - 12) * 12 * inches(1) ** 2);
  });

  it('fill the middle where three walls meet and none goes through', () => {
    const drawing = plan({ O: [0, 0], P: [200, 0], Q: [-100, 173], R: [-100, -173] }, ['O-P', 'O-Q', 'O-R']);
    const walls = layOutWalls(drawing);
    const areas = bodyAreas(walls);
    expect(Math.abs(areas.sum - areas.union)).toBeLessThan(inches(600));
    expect(run(walls, 'O-P').body.length).toBe(5);
    expect(walls.reasons).toEqual([]);
  });
});
