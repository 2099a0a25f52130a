import { describe, expect, it } from 'vitest';
import {
  addBondBeam,
  addControlHeight,
  changeBondBeam,
  changeControlHeight,
  deleteBondBeam,
  deleteControlHeight,
} from '../../../../model/drawing/edits/heights';
import {
  addBoundaryPoint,
  addKeepClear,
  addKeepClearPoint,
  deleteBoundaryPoint,
  deleteKeepClear,
  deleteKeepClearPoint,
  moveBoundaryPoint,
  moveKeepClear,
  moveKeepClearPoint,
  nameKeepClear,
  setBoundary,
} from '../../../../model/drawing/edits/keepClears';
import { addOpening, changeOpening, moveOpening } from '../../../../model/drawing/edits/openings';
import {
  addWallType,
  changePoleKit,
  changeWallType,
  deleteWallType,
  setRuleValue,
  setRunWallType,
  setTapeStep,
  setUnits,
} from '../../../../model/drawing/edits/settings';
import { inches, mm, ticks } from '../../../../model/length/ticks';
import { expectWhole, ids, openingAt, RECTANGLE, withOpening } from './scene';

const at = (x: number, y: number) => ({ x: inches(x), y: inches(y) });
const TRIANGLE = [at(10, 10), at(50, 10), at(30, 40)];

describe('openings', () => {
  it('are added at usual size, kept between the run’s ends', () => {
    const add = (place: number) =>
      expectWhole(RECTANGLE, (d) => addOpening(d, { kind: 'door', runId: 'A-B', at: inches(place) }, ids()));
    expect(add(50).openings[0]).toMatchObject({ kind: 'door', at: inches(50), width: inches(39), sill: 0 });
    expect(openingAt(add(-20), 'n1').at).toBe(0);
    expect(openingAt(add(400), 'n1').at).toBe(321);
    expect(addOpening(RECTANGLE, { kind: 'door', runId: 'gone', at: ticks(0) }, ids())).toBe(RECTANGLE);
  });

  it('move along their run and to another', () => {
    const drawing = withOpening(RECTANGLE, 'o', 'A-B', 50);
    expect(openingAt(moveOpening(drawing, 'o', 'B-C', inches(20)), 'o')).toEqual({ runId: 'B-C', at: 20 });
    expect(openingAt(moveOpening(drawing, 'o', 'B-C', inches(300)), 'o').at).toBe(204);
    expect(moveOpening(drawing, 'o', 'A-B', inches(50))).toBe(drawing);
    expect(moveOpening(drawing, 'o', 'gone', inches(50))).toBe(drawing);
  });

  it('change any of their fields, their kind included', () => {
    const drawing = withOpening(RECTANGLE, 'o', 'A-B', 50);
    const wide = expectWhole(drawing, (d) => changeOpening(d, 'o', { width: inches(70), head: inches(80) }));
    expect(wide.openings[0]).toMatchObject({ kind: 'window', width: inches(70), head: inches(80), sill: inches(36) });
    const door = expectWhole(wide, (d) =>
      changeOpening(d, 'o', { kind: 'door', swing: { hinge: 'far', opens: 'out' } }),
    );
    expect(door.openings[0]).toMatchObject({ kind: 'door', width: inches(70), sill: 0, swing: { hinge: 'far' } });
    const way = { used: false, width: inches(30), depth: inches(30) };
    const passage = expectWhole(changeOpening(door, 'o', { way }), (d) => changeOpening(d, 'o', { kind: 'passage' }));
    expect(passage.openings[0]).toMatchObject({ kind: 'passage', way });
    expect(passage.openings[0]).not.toHaveProperty('swing');
    expect(changeOpening(drawing, 'o', { swing: { hinge: 'far', opens: 'out' } }).openings[0]).not.toHaveProperty(
      'swing',
    );
  });

  it('do not change to what is no opening', () => {
    const drawing = withOpening(RECTANGLE, 'o', 'A-B', 50);
    expect(changeOpening(drawing, 'o', { width: ticks(0) })).toBe(drawing);
    expect(changeOpening(drawing, 'o', { width: ticks(1.5) })).toBe(drawing);
    expect(changeOpening(drawing, 'o', { runId: 'gone' })).toBe(drawing);
    expect(changeOpening(drawing, 'gone', { width: inches(9) })).toBe(drawing);
  });
});

describe('keep-clear areas and the boundary', () => {
  const drawing = addKeepClear(RECTANGLE, { name: ' Sand ', points: TRIANGLE }, () => 'k');

  it('are added, named, moved and deleted', () => {
    expect(drawing.keepClears).toEqual([{ id: 'k', name: 'Sand', points: TRIANGLE }]);
    expect(expectWhole(drawing, (d) => nameKeepClear(d, 'k', 'Lime')).keepClears[0]?.name).toBe('Lime');
    expect(moveKeepClear(drawing, 'k', at(5, -5)).keepClears[0]?.points[0]).toEqual(at(15, 5));
    expect(deleteKeepClear(drawing, 'k').keepClears).toEqual([]);
  });
  it('change point by point, three at least', () => {
    expect(moveKeepClearPoint(drawing, 'k', 1, at(60, 12)).keepClears[0]?.points[1]).toEqual(at(60, 12));
    const four = expectWhole(drawing, (d) => addKeepClearPoint(d, 'k', 0, at(30, 5)));
    expect(four.keepClears[0]?.points).toEqual([at(10, 10), at(30, 5), at(50, 10), at(30, 40)]);
    expect(deleteKeepClearPoint(four, 'k', 1)).toEqual(drawing);
    expect(deleteKeepClearPoint(drawing, 'k', 1)).toBe(drawing);
    expect(addKeepClearPoint(drawing, 'k', 7, at(0, 0))).toBe(drawing);
    expect(moveKeepClearPoint(drawing, 'k', 1, at(50, 10))).toBe(drawing);
  });
  it('need three points to be one', () => {
    expect(addKeepClear(RECTANGLE, { name: '', points: TRIANGLE.slice(0, 2) }, ids())).toBe(RECTANGLE);
    expect(setBoundary(RECTANGLE, TRIANGLE.slice(0, 2))).toBe(RECTANGLE);
  });
  it('include one boundary', () => {
    const bounded = expectWhole(RECTANGLE, (d) => setBoundary(d, TRIANGLE));
    expect(bounded.boundary).toEqual(TRIANGLE);
    expect(moveBoundaryPoint(bounded, 0, at(0, 0)).boundary?.[0]).toEqual(at(0, 0));
    const four = addBoundaryPoint(bounded, 2, at(0, 30));
    expect(four.boundary?.length).toBe(4);
    expect(deleteBoundaryPoint(four, 3)).toEqual(bounded);
    expect(deleteBoundaryPoint(bounded, 0)).toBe(bounded);
    expect(setBoundary(bounded, null).boundary).toBeNull();
    expect(setBoundary(RECTANGLE, null)).toBe(RECTANGLE);
  });
});

describe('heights', () => {
  it('are added with usual values, changed and deleted', () => {
    const drawing = expectWhole(RECTANGLE, (d) =>
      addControlHeight(d, { kind: 'plate', name: 'Plate', height: inches(108) }, ids()),
    );
    expect(drawing.controlHeights[0]).toMatchObject({ id: 'n1', kind: 'plate', hold: 'hard', height: inches(108) });
    const soft = changeControlHeight(drawing, 'n1', { hold: 'soft', weight: 5 });
    expect(soft.controlHeights[0]).toMatchObject({ hold: 'soft', weight: 5 });
    expect(changeControlHeight(drawing, 'n1', { weight: 0 })).toBe(drawing);
    expect(deleteControlHeight(drawing, 'n1').controlHeights).toEqual([]);
  });
  it('include bond beams', () => {
    const drawing = expectWhole(RECTANGLE, (d) => addBondBeam(d, { soffit: inches(200), name: 'Upper' }, ids()));
    expect(drawing.bondBeams.map((beam) => beam.soffit)).toEqual([inches(96), inches(200)]);
    expect(changeBondBeam(drawing, 'n1', { depth: inches(10) }).bondBeams[1]?.depth).toBe(inches(10));
    expect(changeBondBeam(drawing, 'n1', { depth: ticks(0) })).toBe(drawing);
    expect(deleteBondBeam(drawing, 'n1')).toEqual(RECTANGLE);
  });
});

describe('what holds for the whole drawing', () => {
  it('has wall types, one at least, none deleted that a run uses', () => {
    const drawing = expectWhole(RECTANGLE, (d) => addWallType(d, { name: 'Thick' }, ids()));
    expect(drawing.wallTypes.map((type) => type.id)).toEqual(['wall', 'n1']);
    const changed = setRunWallType(drawing, 'A-B', 'n1');
    expect(changed.runs[0]?.wallTypeId).toBe('n1');
    expect(changed.runs[1]).toBe(drawing.runs[1]);
    expect(deleteWallType(changed, 'n1')).toBe(changed);
    expect(deleteWallType(drawing, 'n1')).toEqual(RECTANGLE);
    expect(deleteWallType(RECTANGLE, 'wall')).toBe(RECTANGLE);
    expect(setRunWallType(drawing, 'A-B', 'gone')).toBe(drawing);
  });
  it('does not take a wall type whose joints contradict themselves', () => {
    const joint = { nominal: inches(1), least: inches(2), most: inches(3) };
    expect(changeWallType(RECTANGLE, 'wall', { bedJoint: joint })).toBe(RECTANGLE);
    const good = { nominal: inches(2), least: inches(1), most: inches(3) };
    expect(changeWallType(RECTANGLE, 'wall', { bedJoint: good }).wallTypes[0]?.bedJoint).toEqual(good);
  });
  it('has a pole kit, units and a tape', () => {
    expect(changePoleKit(RECTANGLE, { spacer: inches(1) }).poleKit.spacer).toBe(inches(1));
    expect(changePoleKit(RECTANGLE, { leg: ticks(0) })).toBe(RECTANGLE);
    expect(setUnits(RECTANGLE, 'metric')).toMatchObject({ units: 'metric', tapeStep: mm(1) });
    expect(setUnits(RECTANGLE, 'imperial')).toBe(RECTANGLE);
    expect(setTapeStep(RECTANGLE, ticks(508)).tapeStep).toBe(508);
    expect(setTapeStep(RECTANGLE, ticks(500))).toBe(RECTANGLE);
  });
  it('has the site’s own values for rules', () => {
    const drawing = expectWhole(RECTANGLE, (d) => setRuleValue(d, 'liftToThickness', 8));
    expect(drawing.ruleValues).toEqual({ liftToThickness: 8 });
    expect(setRuleValue(drawing, 'liftToThickness', 8)).toBe(drawing);
    expect(setRuleValue(drawing, 'liftToThickness', null)).toEqual(RECTANGLE);
    expect(setRuleValue(drawing, 'liftToThickness', -1)).toBe(drawing);
    expect(setRuleValue(RECTANGLE, 'liftToThickness', null)).toBe(RECTANGLE);
  });
});
