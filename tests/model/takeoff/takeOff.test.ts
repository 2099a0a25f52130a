import { describe, expect, it } from 'vitest';
import type { Drawing } from '../../../model/drawing/schema';
import { EMPTY_SURVEY, type Survey } from '../../../model/drawing/surveySchema';
import { inches, TICKS_PER_INCH } from '../../../model/length/ticks';
import { solve, type SetOut } from '../../../model/setOut';
import { rectangle, withDoor, withWindow } from '../../helpers/drawings';

const CUBIC_INCH = 25.4 ** 3;

/** A rectangle on its module, 24 gauges of 4 in to the plate, a beam of 8 in under it. */
function building(change: (drawing: Drawing) => Drawing = (drawing) => drawing): Drawing {
  const drawing = rectangle(10 + 14.5 * 10, 10 + 14.5 * 7);
  return change({
    ...drawing,
    bondBeams: [
      {
        id: 'beam',
        name: 'Bond beam',
        soffit: inches(96),
        depth: inches(8),
        tolerance: inches(0),
        hold: 'hard',
        bars: { count: 2, diameter: inches(0.5), lap: inches(20) },
      },
    ],
  });
}

const solved = (drawing: Drawing, survey: Survey = EMPTY_SURVEY): SetOut => solve(drawing, survey);

describe('A takeoff', () => {
  it('counts every unit of a plain building once, corners too', () => {
    // Each course of a run of 10 + n × 14 1/2 is n units; 10, 7, 10 and 7 make 34 a course, 24 courses make 816.
    const { takeoff, coursing } = solved(building());
    expect(coursing.courses).toHaveLength(24);
    expect(takeoff.units).toEqual({ whole: 816, closers: 0, cutFrom: 0, total: 816 });
    expect(takeoff.unitsByRun.map(({ count }) => count.whole)).toEqual([240, 168, 240, 168]);
    expect(takeoff.unitsByLift).toEqual([{ lift: 1, count: takeoff.units }]);
  });

  it('agrees with the walls’ volume: units, bed and head joints fill it', () => {
    const { takeoff, walls } = solved(building());
    const [footprint] = walls.footprints;
    const plan = (footprint!.areaOutside - footprint!.areaInside) / TICKS_PER_INCH ** 2;
    // 24 courses of 4 in: 3 1/2 of unit and 1/2 of joint, the first joint being the bedding.
    const volume = plan * 96 * CUBIC_INCH;
    const units = 816 * 14 * 10 * 3.5 * CUBIC_INCH;
    const { bedding, bed, head } = takeoff.mortar;
    // Head joints: one beside every unit, 10 × 3 1/2 × 1/2.
    expect(head / CUBIC_INCH).toBeCloseTo(816 * 10 * 3.5 * 0.5, 6);
    expect(units + bedding + bed + head).toBeCloseTo(volume, 0);
    expect(bedding).toBeCloseTo(plan * 0.5 * CUBIC_INCH, 0);
  });

  it('takes openings out', () => {
    // A door from 39 to 83 on the bond over 20 courses: odd courses lose three units, even ones lose four and gain two closers.
    const { takeoff } = solved(building((drawing) => withDoor(drawing, 'r1', 39, 44, 80)));
    const closers = takeoff.units.closers;
    expect(closers).toBe(20);
    expect(takeoff.units.whole).toBe(816 - 10 * 3 - 10 * 4);
    // Ten closers of 10 in and ten of 3 1/2: with a 1/8 kerf, 13 5/8 of the 14 make one of each.
    expect(takeoff.units.cutFrom).toBe(10);
    expect(takeoff.units.total).toBe(816 - 70 + 10);
  });

  it('puts no bedding under a door', () => {
    const plain = solved(building()).takeoff.mortar.bedding;
    const { bedding } = solved(building((drawing) => withDoor(drawing, 'r1', 39, 44, 80))).takeoff.mortar;
    expect((plain - bedding) / CUBIC_INCH).toBeCloseTo(44 * 10 * 0.5, 6);
  });

  it('thickens the bedding where the survey found the foundation low', () => {
    // Down 3/8 in evenly from A to B and from D to C, and level across.
    const reading = (cornerId: string, down: number) => ({
      id: `s${cornerId}`,
      station: { kind: 'corner', cornerId } as const,
      down: inches(down),
    });
    const survey: Survey = {
      ...EMPTY_SURVEY,
      readings: [reading('c1', 48), reading('c2', 48.375), reading('c3', 48.375), reading('c4', 48)],
    };
    const level = solved(building()).takeoff.mortar.bedding;
    const sloped = solved(building(), survey).takeoff.mortar.bedding;
    const extra = (sloped - level) / CUBIC_INCH;
    expect(extra).toBeCloseTo(10 * (0.375 / 155) * integralOfFirstCourse(), 4);
  });

  it('makes the beam of the walls’ plan by its depth, bars on the centre line with their laps', () => {
    const { takeoff } = solved(building());
    const centre = 2 * (155 - 10) + 2 * (111.5 - 10);
    const [beam] = takeoff.beams;
    expect(beam!.length).toBe(inches(centre));
    expect(beam!.concrete / CUBIC_INCH).toBeCloseTo(centre * 10 * 8, 4);
    // Two bars; every run is shorter than the 20 ft stock, so only the four corners are lapped.
    expect(beam!.bar).toBe(inches(2 * (centre + 4 * 20)));
  });

  it('lists lintels by size: width and two bearings', () => {
    const { takeoff } = solved(
      building((drawing) => {
        const one = withWindow(drawing, 'r1', { at: 39, width: 44, sill: 32, head: 80, lintel: [8, 8] });
        const two = withWindow(one, 'r3', { at: 39, width: 44, sill: 32, head: 80, lintel: [8, 8] });
        return withWindow(two, 'r2', { at: 40, width: 30, sill: 32, head: 80, lintel: [8, 8] });
      }),
    );
    expect(takeoff.lintels).toEqual([
      { length: inches(60), depth: inches(8), count: 2 },
      { length: inches(46), depth: inches(8), count: 1 },
    ]);
  });

  it('cuts two 10 ft poles from each 20 ft of steel, and counts braces, blocks and line', () => {
    const { takeoff, poles, lines } = solved(building());
    expect(takeoff.poles.count).toBe(4);
    expect(takeoff.poles.stock).toEqual([
      { cuts: [inches(120), inches(120)], left: 0 },
      { cuts: [inches(120), inches(120)], left: 0 },
    ]);
    expect(takeoff.poles.braces).toBe(poles.poles.flatMap((pole) => pole.braces).length);
    expect(takeoff.poles.lineBlocks).toBe(8);
    expect(takeoff.poles.line).toBe(lines.lines.reduce((sum, line) => sum + line.cut, 0));
  });
});

/**
 * ∫ x along the masonry of the first course, x being the distance from A–D, where the foundation is highest: r1 and r3 lie
 * along x, r2 stands at 155 and r4 at 0. In the first course a run starts behind the end of the one that arrives, 10 thick.
 */
function integralOfFirstCourse(): number {
  const r1 = (155 ** 2 - 10 ** 2) / 2;
  // r3 runs from C (x = 155) to D: a return of 10 at C, through at D.
  const r3 = (145 ** 2 - 0) / 2;
  const r2 = 155 * (111.5 - 10);
  return r1 + r2 + r3;
}
