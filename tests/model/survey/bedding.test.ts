import fc from 'fast-check';
import Fraction from 'fraction.js';
import { describe, expect, it } from 'vitest';
import type { Drawing } from '../../../model/drawing/schema';
import { EMPTY_SURVEY, type Station, type Survey } from '../../../model/drawing/surveySchema';
import { inches, ticks } from '../../../model/length/ticks';
import { beddingAlong } from '../../../model/survey/bedding';
import { beddingChoices, grindBy } from '../../../model/survey/beddingChoices';
import { levelGround } from '../../../model/survey/levelGround';
import { solve } from '../../../model/setOut';
import { layOutWalls } from '../../../model/walls/layOutWalls';
import { freeWall, lShape, rectangle, withDoor, withWindow } from '../../helpers/drawings';

const CUBIC_INCH = 25.4 ** 3;
const corner = (n: number): Station => ({ kind: 'corner', cornerId: `c${n}` });
const onRun = (n: number, at: number): Station => ({ kind: 'run', runId: `r${n}`, at: inches(at) });

/** Readings in inches below the level line. */
function read(...downs: readonly (readonly [Station, number])[]): Survey {
  return {
    ...EMPTY_SURVEY,
    readings: downs.map(([station, down], i) => ({ id: `s${i}`, station, down: inches(down) })),
  };
}

function levelled(drawing: Drawing, survey: Survey) {
  const walls = layOutWalls(drawing);
  const ground = levelGround(drawing, walls, survey);
  return { drawing, walls, ground, bedding: beddingAlong(drawing, walls, ground) };
}

describe('bedding along a run', () => {
  it('is the area under the profile times the thickness, for a wall that ends square', () => {
    // 10 in thick, 100 in long; bedding 1/2 in at A, 1 1/2 in at 40, 1 in at B: 40 × 1 + 60 × 1 1/4 = 115 sq in.
    const survey = read([corner(1), 48], [onRun(1, 40), 49], [corner(2), 48.5]);
    const { bedding } = levelled(freeWall(100), survey);
    expect(bedding).toHaveLength(1);
    expect(bedding[0]).toMatchObject({ runId: 'r1', thinnest: inches(0.5), thickest: inches(1.5) });
    expect(bedding[0]!.volume / CUBIC_INCH).toBeCloseTo(1150, 6);
  });

  it('leaves out a door, and nothing else', () => {
    // Level: 1/2 in under 100 − 30 in of wall.
    const { bedding } = levelled(withDoor(freeWall(100), 'r1', 20, 30), read([corner(1), 48]));
    expect(bedding[0]!.volume / CUBIC_INCH).toBeCloseTo(70 * 10 * 0.5, 6);
  });

  it('goes on under a window', () => {
    const drawing = withWindow(freeWall(100), 'r1', { at: 20, width: 30, sill: 24, head: 60 });
    expect(levelled(drawing, read([corner(1), 48])).bedding[0]!.volume / CUBIC_INCH).toBeCloseTo(500, 6);
  });

  it('counts each corner of a level building once: the footprint’s area less the inside', () => {
    const around = levelled(rectangle(240, 120), read([corner(1), 48])).bedding;
    const sum = around.reduce((total, { volume }) => total + volume, 0);
    expect(sum / CUBIC_INCH).toBeCloseTo((240 * 120 - 220 * 100) * 0.5, 4);
    // Reentrant: the L’s walls cover 240 × 160 less 100 × 80, less the same inside.
    const ell = levelled(lShape(240, 160, 100, 80), read([corner(1), 48])).bedding;
    const area = 240 * 160 - 100 * 80 - (220 * 140 - 100 * 80);
    expect(ell.reduce((total, { volume }) => total + volume, 0) / CUBIC_INCH).toBeCloseTo(area * 0.5, 4);
  });

  it('is, with mitred ends, what rational arithmetic integrates', () => {
    // One side of a 240 × 120 building: thickness 10, width x for the first 10 in and 240 − x for the last, bedding straight between readings.
    const eighths = fc.integer({ min: 0, max: 24 });
    fc.assert(
      fc.property(eighths, eighths, eighths, fc.integer({ min: 1, max: 239 }), (a, b, c, at) => {
        const downs = [a, b, c].map((n) => 48 + n / 8);
        const { bedding } = levelled(
          rectangle(240, 120),
          read(
            [corner(1), downs[0]!],
            [onRun(1, at), downs[1]!],
            [corner(2), downs[2]!],
            [corner(3), 48],
            [corner(4), 48],
          ),
        );
        const depths = [a, b, c].map((n) => new Fraction(n, 8).add(1, 2));
        const depthAt = (x: Fraction): Fraction => {
          const [from, to, start, end] =
            x.compare(at) <= 0 ? [0, at, depths[0]!, depths[1]!] : [at, 240, depths[1]!, depths[2]!];
          return end
            .sub(start)
            .mul(x.sub(from))
            .div(to - from)
            .add(start);
        };
        const width = (x: Fraction): Fraction => {
          if (x.compare(10) < 0) return x;
          return x.compare(230) > 0 ? new Fraction(240).sub(x) : new Fraction(10);
        };
        const stops = [...new Set([0, 10, at, 230, 240])].sort((p, q) => p - q);
        // Width and depth are straight between stops, so that the three-point rule is exact.
        const area = stops.slice(1).reduce((sum, stop, i) => {
          const [p, q] = [new Fraction(stops[i]!), new Fraction(stop)];
          const f = (x: Fraction) => width(x).mul(depthAt(x));
          const middle = p.add(q).div(2);
          return sum.add(
            q
              .sub(p)
              .div(6)
              .mul(f(p).add(f(middle).mul(4)).add(f(q))),
          );
        }, new Fraction(0));
        expect(bedding[0]!.volume / CUBIC_INCH).toBeCloseTo(area.valueOf(), 5);
      }),
    );
  });

  it('agrees with the takeoff of the whole building', () => {
    const drawing = withDoor(rectangle(240, 120), 'r1', 60, 36);
    const survey = read([corner(1), 48], [corner(2), 48.5], [corner(3), 49], [corner(4), 48.25]);
    const { bedding } = levelled(drawing, survey);
    const sum = bedding.reduce((total, { volume }) => total + volume, 0);
    const { takeoff } = solve(drawing, survey);
    // The takeoff gives a corner to the run that goes through, at that run's depth: on ground this even, within half a percent.
    expect(Math.abs(takeoff.mortar.bedding / sum - 1)).toBeLessThan(0.005);
  });
});

describe('what to do where the bedding is too thick', () => {
  // A 100 in wall, 10 in thick, its ground falling straight from the high point by 1 1/4 in: bedding 1/2 to 1 3/4 in, most 1 1/4.
  const falling = levelled(freeWall(100), read([corner(1), 48], [corner(2), 49.25]));
  const choices = beddingChoices(falling.drawing, falling.walls, falling.ground);

  it('is nothing where it is within its most', () => {
    const { drawing, walls, ground } = levelled(freeWall(100), read([corner(1), 48], [corner(2), 48.75]));
    expect(beddingChoices(drawing, walls, ground)).toEqual([]);
  });

  it('thickens in layers from where it passes the most', () => {
    const layers = choices[0]!;
    expect(layers).toMatchObject({ kind: 'layers', beds: 2, mortarSaved: 0, deepest: inches(1.75) });
    // 1 1/4 in is reached at 60 in.
    expect(layers.stretches).toEqual([{ runId: 'r1', from: inches(60), to: inches(100), deepest: inches(1.75) }]);
    expect(layers.mortar / CUBIC_INCH).toBeCloseTo(1125, 6);
  });

  it('tells a stretch once, through its stations, and no further than the run', () => {
    // D of an L is reentrant: the bodies of C–D and D–E reach past it inside.
    const low = levelled(
      lShape(240, 160, 100, 80),
      read(
        [corner(1), 48],
        [corner(2), 48],
        [corner(3), 48],
        [onRun(3, 80), 49],
        [corner(4), 49.5],
        [corner(5), 48],
        [corner(6), 48],
      ),
    );
    const layers = beddingChoices(low.drawing, low.walls, low.ground)[0]!;
    // 1 1/4 in of bedding is 3/4 in down: at 60 in of C–D, and half way along D–E.
    expect(layers.stretches).toEqual([
      { runId: 'r3', from: inches(60), to: inches(100), deepest: inches(2) },
      { runId: 'r4', from: 0, to: inches(40), deepest: inches(2) },
    ]);
  });

  it('grinds the high stretch just so deep that the lowest place is within, and says what that saves', () => {
    const grind = choices[1]!;
    expect(grind).toMatchObject({ kind: 'grind', deepest: inches(0.5), lower: inches(0.5), length: inches(40) });
    expect(grind.stretches).toEqual([{ runId: 'r1', from: 0, to: inches(40), deepest: inches(0.5) }]);
    // Ground away: a wedge of 40 × 1/2 / 2 × 10 = 100. Saved: 1/2 in everywhere, 500, less that.
    expect(grind.ground / CUBIC_INCH).toBeCloseTo(100, 6);
    expect(grind.mortarSaved / CUBIC_INCH).toBeCloseTo(400, 6);
    expect(grind.mortar / CUBIC_INCH).toBeCloseTo(725, 6);
  });

  it('is right about grinding: levelled again after it, nothing is over and the mortar is what was said', () => {
    const grind = grindBy(falling.drawing, falling.walls, falling.ground, inches(0.5));
    const again = levelled(freeWall(100), read([corner(1), 48.5], [onRun(1, 40), 48.5], [corner(2), 49.25]));
    expect(again.ground.stations.every(({ over }) => over === 0)).toBe(true);
    expect(again.bedding[0]!.volume / grind.mortar).toBeCloseTo(1, 9);
    expect(beddingChoices(again.drawing, again.walls, again.ground)).toEqual([]);
  });

  it('lays a levelling course over the low stretch', () => {
    const course = choices[2]!;
    expect(course).toMatchObject({ kind: 'levellingCourse', length: inches(40), deepest: inches(1.25) });
    // Concrete up to 1/2 in under the first course: 40 in of 3/4 to 1 1/4 in, 10 in wide.
    expect(course.levelling / CUBIC_INCH).toBeCloseTo(400, 6);
    expect(course.mortarSaved / CUBIC_INCH).toBeCloseTo(400, 6);
    // A unit and its 1/2 in joint must leave 1/2 to 1 1/4 in: at most 1 1/4 − 1/2 − 1/2 = 1/4 in high.
    expect(course.unitHeight).toEqual({ least: 1, most: inches(0.25) });
    expect(course.units).toBe(Math.ceil(40 / 14.5));
  });

  it('says where no one unit would do', () => {
    const steep = levelled(freeWall(100), read([corner(1), 48], [corner(2), 50.5]));
    const course = beddingChoices(steep.drawing, steep.walls, steep.ground)[2]!;
    expect(course).toMatchObject({ unitHeight: null, units: 0 });
  });

  it('never finds nonsense in any foundation', () => {
    const downs = fc.array(fc.integer({ min: 0, max: 300_000 }), { minLength: 4, maxLength: 4 });
    fc.assert(
      fc.property(downs, (all) => {
        const drawing = withDoor(rectangle(240, 120), 'r1', 60, 36);
        const survey = {
          ...EMPTY_SURVEY,
          readings: all.map((down, i) => ({ id: `s${i}`, station: corner(i + 1), down: ticks(down) })),
        };
        const { walls, ground, bedding } = levelled(drawing, survey);
        const whole = bedding.reduce((sum, { volume }) => sum + volume, 0);
        for (const choice of beddingChoices(drawing, walls, ground)) {
          expect(choice.mortar).toBeGreaterThan(0);
          expect(choice.mortar + choice.mortarSaved).toBeCloseTo(whole, 0);
          expect(choice.stretches.every(({ from, to }) => to > from)).toBe(true);
        }
      }),
    );
  });
});
