import { describe, expect, it } from 'vitest';
import { addRun, pointOfPlace, type EndPlace } from '../../../../model/drawing/edits/addRun';
import { closeLoop, reverseRuns, standInside } from '../../../../model/drawing/edits/closeLoop';
import { deleteCorner, deleteRun, deleteThing } from '../../../../model/drawing/edits/deleteThing';
import { joinCorners, joinCornerToRun } from '../../../../model/drawing/edits/joinCorners';
import { newDrawing } from '../../../../model/drawing/defaults';
import { inches, ticks } from '../../../../model/length/ticks';
import { layOutWalls } from '../../../../model/walls/layOutWalls';
import { expectWhole, ids, openingAt, places, plan, RECTANGLE, runNames, TEED, withOpening } from './scene';

const point = (x: number, y: number): EndPlace => ({ kind: 'point', point: { x: inches(x), y: inches(y) } });
const corner = (cornerId: string): EndPlace => ({ kind: 'corner', cornerId });
const onRun = (runId: string, at: number): EndPlace => ({ kind: 'run', runId, at: inches(at) });

describe('adding a run', () => {
  it('between bare points makes two lettered corners', () => {
    const drawing = expectWhole(newDrawing('imperial'), (d) =>
      addRun(d, { from: point(0, 0), to: point(90, 0) }, ids()),
    );
    expect(drawing.corners.map((one) => [one.id, one.letter])).toEqual([
      ['n1', 'A'],
      ['n2', 'B'],
    ]);
    expect(drawing.runs).toEqual([{ id: 'n3', from: 'n1', to: 'n2', wallTypeId: 'wall' }]);
  });

  it('goes on from a corner, and takes the corner that a point falls on', () => {
    const chain = plan({ A: [0, 0], B: [90, 0], C: [90, 60] }, ['A-B', 'B-C']);
    const drawing = expectWhole(chain, (d) => addRun(d, { from: corner('C'), to: point(0, 0) }, ids()));
    expect(runNames(drawing)).toEqual(['A-B', 'B-C', 'C-A']);
  });

  it('on the middle of a run makes a tee and shares its openings out', () => {
    const opened = withOpening(withOpening(RECTANGLE, 'near', 'A-B', 20), 'far', 'A-B', 200);
    const drawing = expectWhole(opened, (d) => addRun(d, { from: onRun('A-B', 144), to: point(144, 100) }, ids()));
    expect(places(drawing)['n1']).toEqual([144, 0]);
    expect(runNames(drawing)).toEqual(['A-n1', 'n1-B', 'B-C', 'C-D', 'D-A', 'n1-n3']);
    expect(openingAt(drawing, 'near')).toEqual({ runId: 'A-B', at: 20 });
    expect(openingAt(drawing, 'far')).toEqual({ runId: 'n2', at: 56 });
    expect(layOutWalls(drawing).cornerById.get('n1')?.kind).toBe('tee');
  });

  it('from run to run makes two tees', () => {
    const drawing = expectWhole(RECTANGLE, (d) => addRun(d, { from: onRun('A-B', 144), to: onRun('C-D', 216) }, ids()));
    expect(drawing.runs.length).toBe(7);
    expect(layOutWalls(drawing).corners.filter((one) => one.kind === 'tee').length).toBe(2);
  });

  it('at the end of a run takes its corner', () => {
    expect(addRun(RECTANGLE, { from: onRun('A-B', 0), to: onRun('B-C', 999) }, ids()).runs.at(-1)).toMatchObject({
      from: 'A',
      to: 'C',
    });
  });

  it('changes nothing where it can’t be', () => {
    const id = ids();
    expect(addRun(RECTANGLE, { from: corner('A'), to: corner('A') }, id)).toBe(RECTANGLE);
    expect(addRun(RECTANGLE, { from: corner('B'), to: corner('A') }, id)).toBe(RECTANGLE);
    expect(addRun(RECTANGLE, { from: corner('A'), to: corner('gone') }, id)).toBe(RECTANGLE);
    expect(addRun(RECTANGLE, { from: onRun('A-B', 30), to: onRun('A-B', 60) }, id)).toBe(RECTANGLE);
    expect(addRun(RECTANGLE, { from: corner('A'), to: point(99_999_999, 0) }, id)).toBe(RECTANGLE);
    expect(addRun(RECTANGLE, { from: corner('A'), to: corner('C'), wallTypeId: 'gone' }, id)).toBe(RECTANGLE);
  });

  it('knows where an end would be', () => {
    expect(pointOfPlace(RECTANGLE, onRun('B-C', 50))).toEqual({ x: inches(360), y: inches(50) });
    expect(pointOfPlace(RECTANGLE, corner('C'))).toEqual({ x: inches(360), y: inches(240) });
    expect(pointOfPlace(RECTANGLE, corner('gone'))).toBeNull();
  });
});

describe('closing an outline', () => {
  const chain = plan({ A: [0, 0], B: [90, 0], C: [90, 60], D: [0, 60] }, ['A-B', 'B-C', 'C-D']);

  it('joins the last corner to the first, the same way round', () => {
    expect(runNames(expectWhole(chain, (d) => closeLoop(d, 'D', ids())))).toEqual(['A-B', 'B-C', 'C-D', 'D-A']);
    expect(runNames(closeLoop(chain, 'A', ids())).at(-1)).toBe('D-A');
  });
  it('changes nothing where there is nothing to close', () => {
    expect(closeLoop(RECTANGLE, 'A', ids())).toBe(RECTANGLE);
    expect(closeLoop(chain, 'B', ids())).toBe(chain);
    const wall = plan({ A: [0, 0], B: [90, 0] }, ['A-B']);
    expect(closeLoop(wall, 'B', ids())).toBe(wall);
  });
  it('drawn clockwise can be turned to stand inside its line', () => {
    const clockwise = plan({ A: [0, 0], B: [0, 240], C: [360, 240], D: [360, 0] }, ['A-B', 'B-C', 'C-D', 'D-A']);
    const opened = withOpening(clockwise, 'o', 'B-C', 50, 'door');
    expect(layOutWalls(opened).footprints[0]?.bodyInside).toBe(false);
    const turned = expectWhole(opened, (d) => standInside(d, 'A'));
    expect(layOutWalls(turned).footprints[0]?.bodyInside).toBe(true);
    expect(runNames(turned)).toEqual(['B-A', 'C-B', 'D-C', 'A-D']);
    // The door is 39 in wide: its jambs stay where they are, 271 in from the other corner.
    expect(openingAt(turned, 'o')).toEqual({ runId: 'B-C', at: 271 });
    expect(turned.openings[0]).toMatchObject({ swing: { hinge: 'far', opens: 'in' } });
    expect(standInside(turned, 'A')).toBe(turned);
  });
  it('turned twice is as it was', () => {
    const opened = withOpening(RECTANGLE, 'o', 'A-B', 31, 'door');
    expect(reverseRuns(reverseRuns(opened, ['A-B']), ['A-B'])).toEqual(opened);
  });
});

describe('deleting', () => {
  it('a run takes its openings and the corners that no other run uses', () => {
    const chain = withOpening(plan({ A: [0, 0], B: [90, 0], C: [90, 60] }, ['A-B', 'B-C']), 'o', 'A-B', 10);
    const drawing = expectWhole(chain, (d) => deleteRun(d, 'A-B'));
    expect(Object.keys(places(drawing))).toEqual(['B', 'C']);
    expect(drawing.openings).toEqual([]);
  });

  it('a stem makes one run of its bar again, openings and all', () => {
    const opened = withOpening(TEED, 'o', 'T-B', 50);
    const drawing = expectWhole(opened, (d) => deleteThing(d, { kind: 'run', id: 'T-S' }));
    expect(runNames(drawing)).toEqual(['A-B', 'B-C', 'C-D', 'D-A']);
    expect(openingAt(drawing, 'o')).toEqual({ runId: 'A-T', at: 194 });
    expect(layOutWalls(drawing).reasons).toEqual([]);
  });

  it('a corner in the middle of a straight wall joins its two runs', () => {
    const wall = withOpening(plan({ A: [0, 0], M: [100, 0], B: [250, 0] }, ['A-M', 'M-B']), 'o', 'M-B', 20);
    const drawing = expectWhole(wall, (d) => deleteCorner(d, 'M'));
    expect(drawing.runs).toEqual([{ id: 'A-M', from: 'A', to: 'B', wallTypeId: 'wall' }]);
    expect(openingAt(drawing, 'o')).toEqual({ runId: 'A-M', at: 120 });
  });

  it('a corner between two runs joins its neighbours', () => {
    const drawing = expectWhole(RECTANGLE, (d) => deleteCorner(d, 'B'));
    expect(runNames(drawing)).toEqual(['A-C', 'C-D', 'D-A']);
  });

  it('a corner of a triangle leaves the other side', () => {
    const triangle = plan({ A: [0, 0], B: [90, 0], C: [0, 90] }, ['A-B', 'B-C', 'C-A']);
    const drawing = expectWhole(triangle, (d) => deleteCorner(d, 'B'));
    expect(runNames(drawing)).toEqual(['C-A']);
  });

  it('the corner of a tee takes the stem', () => {
    const drawing = expectWhole(TEED, (d) => deleteCorner(d, 'T'));
    expect(runNames(drawing)).toEqual(['A-B', 'B-C', 'C-D', 'D-A']);
  });

  it('a free end takes its run', () => {
    const wall = plan({ A: [0, 0], B: [90, 0], C: [90, 60] }, ['A-B', 'B-C']);
    expect(Object.keys(places(expectWhole(wall, (d) => deleteCorner(d, 'C'))))).toEqual(['A', 'B']);
  });

  it('what is not there changes nothing', () => {
    for (const kind of ['corner', 'run', 'opening', 'keepClear', 'boundary', 'controlHeight', 'bondBeam'] as const)
      expect(deleteThing(RECTANGLE, { kind, id: 'gone' })).toBe(RECTANGLE);
    expect(deleteThing(RECTANGLE, { kind: 'pole', id: 'A' })).toBe(RECTANGLE);
  });

  it('other things takes just them', () => {
    const drawing = withOpening(RECTANGLE, 'o', 'A-B', 50);
    expect(deleteThing(drawing, { kind: 'opening', id: 'o' }).openings).toEqual([]);
    expect(deleteThing(drawing, { kind: 'bondBeam', id: 'beam' }).bondBeams).toEqual([]);
    expect(deleteThing(drawing, { kind: 'wallType', id: 'wall' })).toBe(drawing);
  });
});

describe('joining corners', () => {
  it('closes a chain whose end is put on its start', () => {
    const chain = plan({ A: [0, 0], B: [90, 0], C: [90, 60], D: [5, 5] }, ['A-B', 'B-C', 'C-D']);
    const drawing = expectWhole(chain, (d) => joinCorners(d, 'D', 'A'));
    expect(runNames(drawing)).toEqual(['A-B', 'B-C', 'C-A']);
    expect(layOutWalls(drawing).footprints.length).toBe(1);
  });
  it('drops the run between them and runs that would be double', () => {
    const triangle = withOpening(plan({ A: [0, 0], B: [90, 0], C: [0, 90] }, ['A-B', 'B-C', 'C-A']), 'o', 'A-B', 9);
    const drawing = expectWhole(triangle, (d) => joinCorners(d, 'B', 'A'));
    expect(runNames(drawing)).toEqual(['A-C']);
    expect(drawing.openings).toEqual([]);
  });
  it('makes a tee of an end put on a run', () => {
    const drawing = plan({ A: [0, 0], B: [200, 0], C: [80, 100], D: [80, 3] }, ['A-B', 'C-D']);
    const joined = expectWhole(drawing, (d) => joinCornerToRun(d, 'D', 'A-B', inches(80), ids()));
    expect(
      layOutWalls(joined)
        .corners.map((one) => one.kind)
        .sort(),
    ).toEqual(['free', 'free', 'free', 'tee']);
    expect(layOutWalls(joined).reasons).toEqual([]);
  });
  it('changes nothing for a corner and itself, or its own run', () => {
    expect(joinCorners(RECTANGLE, 'A', 'A')).toBe(RECTANGLE);
    expect(joinCornerToRun(RECTANGLE, 'A', 'A-B', ticks(5), ids())).toBe(RECTANGLE);
  });
});
