import { describe, expect, it } from 'vitest';
import type { Drawing } from '../../../model/drawing/schema';
import { inches, ticks } from '../../../model/length/ticks';
import { placePoles } from '../../../model/poles/placePoles';
import type { StoryPole } from '../../../model/poles/types';
import { layOutWalls } from '../../../model/walls/layOutWalls';
import { door, ell, KIT, rectangle, withOpenings, withWalls, type Place } from './sites';

const place = (drawing: Drawing) => placePoles(drawing, layOutWalls(drawing));
const bearings = (pole: StoryPole | undefined) =>
  pole?.braces.map((brace) => Math.round(brace.bearing)).sort((a, b) => a - b);
const box = (x: number, y: number, width: number, height: number) =>
  [
    [x, y],
    [x + width, y],
    [x + width, y + height],
    [x, y + height],
  ].map(([px, py]) => ({ x: inches(px ?? 0), y: inches(py ?? 0) }));
const keepClear = (id: string, x: number, y: number, width: number, height: number) => ({
  id,
  name: id,
  points: box(x, y, width, height),
});

describe('braces beside obstacles', () => {
  const drawingWith = (...areas: ReturnType<typeof keepClear>[]): Drawing => ({ ...rectangle(), keepClears: areas });

  it('turns no further than it must, to the degree', () => {
    // East edge of the area at x = −1, the pole's heel at x = −1 3/16, y = −1 3/16; its north edge 24 in below the heel.
    // Straight south it would be 3/16 in inside. The least turn east whose line passes the corner (−1, −25 3/16): 1°.
    const pole = place(drawingWith(keepClear('pit', -101, -125 - 19 / 16, 100, 101))).poleById.get('A');
    const south = pole?.braces.find((brace) => brace.inLineWith === 'DA');
    expect(south?.turned).toBe(1);
    expect(south?.turnedFor).toEqual({ kind: 'keepClear', id: 'pit' });
  });

  it('turns by 29° for an area whose corner lies at 28 1/2° from its line', () => {
    const reach = 30;
    const angle = (28.5 * Math.PI) / 180;
    const x = -19 / 16 - reach * Math.sin(angle);
    const y = -19 / 16 - reach * Math.cos(angle);
    const area = keepClear('pit', x, y - 60, 200, 60);
    const south = place(drawingWith(area))
      .poleById.get('A')
      ?.braces.find((brace) => brace.inLineWith === 'DA');
    expect(south?.turned).toBe(29);
    expect(Math.round(south?.bearing ?? 0)).toBe(270 - 29);
  });

  it('shortens its reach rather than turn, when that costs less', () => {
    // The area starts 50 in below the heel: 52.8 in does not fit, 48 in (60 %) does.
    const area = keepClear('pit', -100, -51 - 19 / 16 - 100, 200, 101);
    const south = place(drawingWith(area))
      .poleById.get('A')
      ?.braces.find((brace) => brace.inLineWith === 'DA');
    expect(south?.turned).toBe(0);
    expect(south?.reach).toBe(inches(48));
  });

  it('stays inside the boundary', () => {
    const tight = { ...rectangle(), boundary: box(-20, -200, 600, 600) };
    const west = place(tight)
      .poleById.get('A')
      ?.braces.find((brace) => brace.inLineWith === 'AB');
    expect(west?.foot.x).toBeGreaterThanOrEqual(inches(-20));
    expect(west?.turnedFor).toEqual({ kind: 'boundary', id: 'boundary' });
  });

  it('passes over a way through only with the head room', () => {
    // A second building's door opens a way under A's west brace: at plan distance x it is 80(1 − x / reach) high.
    const site = withWalls(
      rectangle(),
      [
        [-140, -150],
        [-140, 150],
      ],
      false,
      'w',
    );
    const over = (depth: number, headRoom: number) => {
      const kit = { ...KIT, brace: { ...KIT.brace, headRoom: inches(headRoom) } };
      const way = { used: true, width: inches(40), depth: inches(depth) };
      return place(withOpenings({ ...site, poleKit: kit }, door('wAB', 130, { way }))).poleById.get('A')?.braces;
    };
    // The wall's outside face looks east (its body lies left of up): x = −140. A way 80 in deep ends at −60, past the foot.
    expect(over(80, 70)?.every((brace) => brace.turned === 0 && brace.over.length === 0)).toBe(true);
    // 130 in deep it covers the foot: no brace may stand in it.
    expect(over(130, 70)?.every((brace) => brace.foot.x > inches(-10) || brace.foot.y < inches(-20))).toBe(true);
  });

  it('keeps out of a door’s swing, and says that opening it the other way frees the pole', () => {
    const way = { used: false, width: inches(0), depth: inches(0) };
    // Legs of 96 in or more stand at least 53 in out: none can stay short of the swing.
    const kit = { ...KIT, brace: { ...KIT.brace, leastLeg: inches(96) } };
    const site = { ...ell(), poleKit: kit };
    const shut = withOpenings(site, door('CD', 54, { way, swing: { hinge: 'far', opens: 'out' } }));
    const reason = place(shut).reasons.find((each) => each.thing.id === 'D');
    expect(reason).toMatchObject({
      code: 'braceAngleOut',
      weight: 'warning',
      rule: 'braceAngleLeast',
      against: [{ kind: 'opening', id: 'door-CD-54' }],
      change: { kind: 'openOtherWay', thing: { kind: 'opening', id: 'door-CD-54' } },
    });
    const opened = place(withOpenings(site, door('CD', 54, { way, swing: { hinge: 'far', opens: 'in' } })));
    expect(opened.reasons).toEqual([]);
    expect(bearings(opened.poleById.get('D'))).toEqual([15, 75]);
  });

  it('stands short of the swing where shorter legs allow it, within the angle rule', () => {
    const way = { used: false, width: inches(0), depth: inches(0) };
    const set = place(withOpenings(ell(), door('CD', 54, { way, swing: { hinge: 'far', opens: 'out' } })));
    expect(set.reasons).toEqual([]);
    const [a, b] = set.poleById.get('D')?.braces ?? [];
    const apart = Math.abs((a?.bearing ?? 0) - (b?.bearing ?? 0));
    expect(apart).toBeGreaterThanOrEqual(60 - 1e-3);
    // Between the wall's face and the leaf's edge at 120 − 54 − 36 + 1.5 in from D: the foot is nearer than that.
    expect(Math.min(a?.reach ?? 0, b?.reach ?? 0)).toBeLessThan(inches(40));
  });

  it('says which way through blocks a pole, and that not using it frees the pole', () => {
    const shut = withOpenings(ell(), door('CD', 60, { way: { used: true, width: inches(60), depth: inches(100) } }));
    const reason = place(shut).reasons.find((each) => each.thing.id === 'D');
    expect(reason?.against).toEqual([{ kind: 'opening', id: 'door-CD-60' }]);
    expect(reason?.change).toEqual({ kind: 'notUsedDuringWork', thing: { kind: 'opening', id: 'door-CD-60' } });
  });

  it('says what blocks a pole that has no place for two braces, and gives it the one that it can have', () => {
    // Water all round the corner, but for a lane to the west.
    const blocked = drawingWith(keepClear('pond', -100, -100, 200, 97), keepClear('bank', -100, 5, 98, 100));
    const { reasons, poleById } = place(blocked);
    const reason = reasons.find((each) => each.thing.id === 'A');
    expect(reason).toMatchObject({ code: 'braceBlocked', weight: 'blocked', thing: { kind: 'pole', id: 'A' } });
    expect(reason?.against).toContainEqual({ kind: 'keepClear', id: 'pond' });
    expect(poleById.get('A')?.braces.map((brace) => Math.round(brace.bearing))).toEqual([180]);
  });

  it('says how much longer a leg must be when none can hold', () => {
    // The steepest that holds stands 33 % of 80 in out: √(80² + 26.4²) = 84.24… in.
    const kit = { ...KIT, brace: { ...KIT.brace, leastLeg: inches(60), mostLeg: inches(82) } };
    const { reasons, poles } = place({ ...rectangle(), poleKit: kit });
    const by = ticks(Math.ceil(Math.hypot(80, 26.4) * 16256 - 82 * 16256));
    const thing = { kind: 'site', id: 'site' };
    expect(reasons).toEqual([
      { code: 'braceTooLong', weight: 'blocked', thing, amount: by, change: { kind: 'longerLeg', thing, by } },
    ]);
    expect(poles.every((pole) => pole.braces.length === 0)).toBe(true);
  });

  it('keeps every leg within the kit’s', () => {
    const kit = { ...KIT, brace: { ...KIT.brace, leastLeg: inches(99), mostLeg: inches(101) } };
    for (const pole of place({ ...ell(), poleKit: kit }).poles)
      for (const brace of pole.braces) {
        expect(brace.leg).toBeGreaterThanOrEqual(inches(99) - 1);
        expect(brace.leg).toBeLessThanOrEqual(inches(101) + 1);
      }
  });
});

describe('a way through near an outside corner', () => {
  /** A door in A–B whose way starts `edge` inches from A, with a working clearance of `clearance`. */
  const beside = (edge: number, clearance: number) => {
    const kit = { ...KIT, clearance: inches(clearance) };
    const way = { used: true, width: inches(64), depth: inches(60) };
    // The way of 64 in laps 14 in over each jamb of the opening of 36 in.
    const set = place(withOpenings({ ...rectangle(), poleKit: kit }, door('AB', edge + 14, { way })));
    const pole = set.poleById.get('A');
    return { pole, south: pole?.braces.find((brace) => brace.inLineWith === 'DA') };
  };

  it('makes the brace turn that would pass within the clearance of it, where the pole itself stands clear', () => {
    // The heel is 1 3/16 in west of A, so 6 1/4 in from a way that starts 5 1/16 in east of it.
    const { pole, south } = beside(5 + 1 / 16, 7);
    expect(pole?.setOff).toBeNull();
    expect(south?.turned).toBeGreaterThan(0);
    expect(south?.turnedFor).toEqual({ kind: 'opening', id: 'door-AB-19.0625' });
    expect(south?.over).toEqual([]);
  });

  it('leaves the brace straight where it keeps the clearance', () => {
    const { pole, south } = beside(5 + 1 / 16, 6);
    expect(pole?.setOff).toBeNull();
    expect(south?.turned).toBe(0);
  });

  it('sets the pole off where its steel or spacer would be in the way, as one that reaches just past the corner', () => {
    // Leg 3 + spacer 1 from the corner, and the 1/2 in that the way laps past it.
    const { pole, south } = beside(-0.5, 2);
    expect(pole?.setOff).toEqual({ runId: 'AB', by: inches(4.5), for: { kind: 'opening', id: 'door-AB-13.5' } });
    // 1 3/16 + 4 1/2 in west of A: 5 3/16 in from the way.
    expect(south?.turned).toBe(0);
  });
});

describe('poles of two buildings near one another', () => {
  /** Two rectangles side by side, 60 in apart: the facing corners' braces would meet in the lane. */
  const facing = (gap: number): Drawing => {
    const other: Place[] = [
      [240 + gap, 0],
      [480 + gap, 0],
      [480 + gap, 144],
      [240 + gap, 144],
    ];
    return withWalls(rectangle(), other, true, 'n');
  };

  it('are one neighbourhood, and their braces keep the clearance', () => {
    const set = place(facing(100));
    const group = set.neighbourhoods.find((each) => each.includes('B'));
    expect([...(group ?? [])].sort()).toEqual(['B', 'nA']);
    expect(set.exact).toBe(true);
    expect(set.cost).toBeGreaterThan(0);
    expect(set.reasons).toEqual([]);
  });

  it('are apart where their braces can’t meet', () => {
    const set = place(facing(120));
    expect(set.cost).toBe(0);
    expect(set.neighbourhoods.every((each) => each.length === 1)).toBe(true);
  });
});
