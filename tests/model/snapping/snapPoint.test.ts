import { describe, expect, it } from 'vitest';
import { newDrawing } from '../../../model/drawing/defaults';
import { addCornerOnRun } from '../../../model/drawing/edits/addRun';
import type { Drawing } from '../../../model/drawing/schema';
import { fromBearing } from '../../../model/geometry/vec';
import { inches, ticks, type Ticks } from '../../../model/length/ticks';
import { snapSceneOf } from '../../../model/snapping/scene';
import { snapPoint, type SnapRequest } from '../../../model/snapping/snapPoint';
import { SNAP_ALL, type Snap, type SnapAnchor } from '../../../model/snapping/types';
import { layOutWalls } from '../../../model/walls/layOutWalls';

type Place = readonly [number, number];

function plan(corners: Readonly<Record<string, Place>>, runs: readonly string[]): Drawing {
  return {
    ...newDrawing('imperial'),
    corners: Object.entries(corners).map(([id, [x, y]]) => ({ id, letter: id, x: inches(x), y: inches(y) })),
    runs: runs.map((id) => {
      const [from = '', to = ''] = id.split('-');
      return { id, from, to, wallTypeId: 'wall' };
    }),
  };
}

const at = (x: number, y: number) => ({ x: inches(x), y: inches(y) });

/** Snaps with a reach of 6 in. */
function snap(drawing: Drawing, raw: Place, change: Partial<SnapRequest> = {}): Snap {
  const scene = snapSceneOf(drawing, layOutWalls(drawing));
  return snapPoint({ scene, from: null, raw: at(...raw), reach: inches(6), options: SNAP_ALL, ...change });
}

function kinds(caught: Snap): string[] {
  return caught.caught.map((one) => one.kind).sort();
}

/** An anchor whose snaps are not about lengths. */
const noModule = { options: { ...SNAP_ALL, module: false } };
const from = (x: number, y: number): SnapAnchor => ({ point: at(x, y) });

describe('catching corners', () => {
  //
  //   A──────────B      raw beside B
  //
  const wall = plan({ A: [0, 0], B: [200, 0] }, ['A-B']);

  it('catches the corner within reach before anything else', () => {
    expect(snap(wall, [203, 4])).toEqual({
      point: at(200, 0),
      caught: [{ kind: 'corner', thing: { kind: 'corner', id: 'B' } }],
    });
  });
  it('catches the nearest of two', () => {
    const two = plan({ A: [0, 0], B: [4, 0] }, []);
    expect(snap(two, [3, 0]).point).toEqual(at(4, 0));
    expect(snap(two, [1, 0]).point).toEqual(at(0, 0));
  });
  it('calls the corner that closes the outline so', () => {
    expect(kinds(snap(wall, [2, 1], { closes: 'A' }))).toEqual(['close']);
  });
  it('leaves out what moves with the point, and the anchor itself', () => {
    expect(snap(wall, [203, 40], { exclude: new Set(['B']) }).caught).toEqual([]);
    expect(kinds(snap(wall, [1, 1], { from: from(0, 0) }))).not.toContain('corner');
  });
  it('catches points that the caller names', () => {
    expect(snap(wall, [52, 81], { points: [at(50, 80)] })).toEqual({ point: at(50, 80), caught: [{ kind: 'point' }] });
  });
});

describe('catching one thing', () => {
  //      ·  raw
  //   A──────────B
  const wall = plan({ A: [0, 0], B: [200, 0] }, ['A-B']);

  it('falls onto a run, and says how far along', () => {
    const caught = snap(wall, [77, 4]);
    expect(caught.point).toEqual(at(77, 0));
    expect(caught.caught[0]).toMatchObject({ kind: 'onRun', thing: { kind: 'run', id: 'A-B' }, at: inches(77) });
  });

  it('falls on a slanting run where a tee made at that distance would be', () => {
    const slant = plan({ A: [0, 0], B: [200, 77] }, ['A-B']);
    const caught = snap(slant, [101, 36]);
    const [on] = caught.caught;
    expect(on?.kind).toBe('onRun');
    const tee = addCornerOnRun(slant, 'A-B', on?.at ?? ticks(0), () => 'n');
    expect(tee?.drawing.corners.at(-2)).toMatchObject({ id: 'B' });
    expect(tee?.drawing.corners.at(-1)).toMatchObject(caught.point);
  });

  //   A · · · · · raw        level with A
  it('keeps square to the axes from the anchor', () => {
    const caught = snap(plan({}, []), [150, 3], { from: from(0, 0), ...noModule });
    expect(caught).toEqual({
      point: at(150, 0),
      caught: [{ kind: 'rightAngle', guide: [at(0, 0), at(150, 0)] }],
      length: inches(150),
      angle: 0,
    });
  });

  //  B
  //    ╲            square to A–B, which slants
  //     A · · raw
  it('keeps square to the runs at the anchor', () => {
    const way = fromBearing(150);
    const square = fromBearing(60);
    const raw: Place = [100 * square.x + 2, 100 * square.y];
    const caught = snap(plan({}, []), raw, { from: { ...from(0, 0), along: [way] }, ...noModule });
    expect(kinds(caught)).toContain('rightAngle');
    expect(caught.angle).toBeCloseTo(60, 5);
  });

  it('turns by 15° where nothing stronger is near', () => {
    const caught = snap(plan({}, []), [100, 59], { from: from(0, 0), ...noModule });
    expect(kinds(caught)).toEqual(['angle15']);
    expect(caught.angle).toBeCloseTo(30, 4);
  });

  //  A                  in line over B, far from A
  //            · raw
  //            B
  it('lines up with a corner', () => {
    const caught = snap(plan({ A: [0, 300], B: [100, 0] }, []), [103, 150]);
    expect(caught).toEqual({
      point: at(100, 150),
      caught: [{ kind: 'alignX', guide: [at(100, 0), at(100, 150)], thing: { kind: 'corner', id: 'B' } }],
    });
  });

  it('stops at a length of whole units', () => {
    // The module is 18 in: unit 17 5/8 and joint 3/8. Along no particular bearing, 91 in stops at 90.
    const way = fromBearing(22.5);
    const caught = snap(plan({}, []), [91 * way.x, 91 * way.y], { from: from(0, 0), reach: inches(2) });
    expect(kinds(caught)).toEqual(['module']);
    expect(caught.length).toBe(inches(90));
  });
});

describe('catching two things that agree', () => {
  //   D · · · · · raw
  //               ·          level with D and over C
  //               C
  it('stops where two corners line up', () => {
    const caught = snap(plan({ C: [200, 0], D: [0, 120] }, []), [203, 117]);
    expect(caught.point).toEqual(at(200, 120));
    expect(kinds(caught)).toEqual(['alignX', 'alignY']);
  });

  //   A·········raw
  //              ·           square from A and over C
  //              C
  it('stops where a right angle passes over a corner', () => {
    const caught = snap(plan({ C: [152, -90] }, []), [149, 4], { from: from(0, 0), ...noModule });
    expect(caught.point).toEqual(at(152, 0));
    expect(kinds(caught)).toEqual(['alignX', 'rightAngle']);
  });

  it('stops at a whole length along a right angle, to the tick', () => {
    const caught = snap(plan({}, []), [91.5, 3], { from: from(0, 0) });
    expect(caught.point).toEqual(at(90, 0));
    expect(kinds(caught)).toEqual(['module', 'rightAngle']);
    expect(caught.length).toBe(inches(90));
  });

  it('asks the caller which lengths need no cutting', () => {
    const goodLengths = (near: Ticks) => [ticks(Math.round(near / inches(25)) * inches(25))];
    const caught = snap(plan({}, []), [103, 2], { from: from(0, 0), goodLengths });
    expect(caught.point).toEqual(at(100, 0));
  });

  //      C
  //      ·           square from C down onto the run
  //   A──┴───────B
  it('drops square onto a run', () => {
    const drawing = plan({ A: [0, 0], B: [300, 0] }, ['A-B']);
    const caught = snap(drawing, [98, 3], { from: from(100, 120), ...noModule });
    expect(caught.point).toEqual(at(100, 0));
    expect(kinds(caught)).toEqual(['onRun', 'rightAngle']);
    expect(caught.caught.find((one) => one.kind === 'onRun')?.at).toBe(inches(100));
  });

  it('says everything that the point keeps', () => {
    // 90 in level from the anchor is also over C.
    const caught = snap(plan({ C: [90, -50] }, []), [91, 2], { from: from(0, 0) });
    expect(kinds(caught)).toEqual(['alignX', 'module', 'rightAngle']);
  });

  it('is held from both neighbours of a corner that moves', () => {
    const drawing = plan({ A: [0, 0], B: [203, 3], C: [200, 150] }, ['A-B', 'B-C']);
    const caught = snap(drawing, [203, 3], {
      from: from(0, 0),
      also: [from(200, 150)],
      exclude: new Set(['B']),
      options: { ...SNAP_ALL, module: false, alignment: false },
    });
    expect(caught.point).toEqual(at(200, 0));
    expect(kinds(caught)).toEqual(['rightAngle', 'rightAngle']);
  });
});

describe('switched off', () => {
  const drawing = plan({ A: [0, 0], B: [200, 0] }, ['A-B']);
  it('only rounds to the tick', () => {
    const caught = snap(drawing, [199, 1], { options: { ...SNAP_ALL, on: false } });
    expect(caught).toEqual({ point: at(199, 1), caught: [] });
  });
  it('catches nothing of a kind that is off', () => {
    const options = { on: true, rightAngles: false, alignment: false, points: false, module: false };
    expect(snap(drawing, [199, 1], { from: from(0, 0), options }).caught).toEqual([]);
  });
  it('catches nothing out of reach', () => {
    expect(snap(drawing, [77, 40]).caught).toEqual([]);
  });
  it('answers where nothing is drawn and the point is on its anchor', () => {
    expect(snap(plan({}, []), [0, 0], { from: from(0, 0) })).toEqual({ point: at(0, 0), caught: [], length: 0 });
  });
});
