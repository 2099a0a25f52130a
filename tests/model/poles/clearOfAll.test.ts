/** Every brace placed is checked against the site by a general geometry library, and the search by trying everything. */
import fc from 'fast-check';
import GeometryFactory from 'jsts/org/locationtech/jts/geom/GeometryFactory.js';
import Coordinate from 'jsts/org/locationtech/jts/geom/Coordinate.js';
import OverlayOp from 'jsts/org/locationtech/jts/operation/overlay/OverlayOp.js';
import DistanceOp from 'jsts/org/locationtech/jts/operation/distance/DistanceOp.js';
import { describe, expect, it } from 'vitest';
import type { Drawing } from '../../../model/drawing/schema';
import type { PlanPoint } from '../../../model/geometry/point';
import { inches } from '../../../model/length/ticks';
import {
  reachLimits,
  USUAL_CANDIDATES,
  WIDE_CANDIDATES,
  type Candidate,
  type CandidateOptions,
} from '../../../model/poles/candidates';
import { groundOf, obstacleOf, obstaclesOf } from '../../../model/poles/obstacles';
import { PoleBraces, type PoleSite } from '../../../model/poles/poleBraces';
import { placePoles } from '../../../model/poles/placePoles';
import type { PoleSet } from '../../../model/poles/types';
import { USUAL_BOUND } from '../../../model/poles/group';
import { seatsAtCorners } from '../../../model/poles/seats';
import { layOutWalls } from '../../../model/walls/layOutWalls';
import { door, emptySite, KIT, withOpenings, withWalls, type Place } from './sites';

const factory = new GeometryFactory();
const coordinate = (p: PlanPoint) => new Coordinate(p.x, p.y);
const line = (a: PlanPoint, b: PlanPoint) => factory.createLineString([coordinate(a), coordinate(b)]);
const area = (ring: readonly PlanPoint[]) =>
  factory.createPolygon(factory.createLinearRing([...ring, ring[0]!].map(coordinate)));
const lengthInside = (a: object, b: object): number => OverlayOp.intersection(a as never, b as never).getLength();
const apart = (a: object, b: object): number => DistanceOp.distance(a as never, b as never);

const rectangleAt = (x: number, y: number, width: number, height: number): Place[] => [
  [x, y],
  [x + width, y],
  [x + width, y + height],
  [x, y + height],
];

/** Two small rectangles a lane apart, a door and two areas to keep clear, all at random. */
const sitesApart = (least: number): fc.Arbitrary<Drawing> =>
  fc
    .record({
      lane: fc.integer({ min: least, max: 130 }),
      shift: fc.integer({ min: -60, max: 60 }),
      doorAt: fc.integer({ min: 12, max: 70 }),
      out: fc.boolean(),
      areas: fc.array(
        fc.record({
          x: fc.integer({ min: -80, max: 400 }),
          y: fc.integer({ min: -80, max: 200 }),
          size: fc.integer({ min: 5, max: 60 }),
        }),
        { maxLength: 2 },
      ),
    })
    .map(({ lane, shift, doorAt, out, areas }) => {
      const first = withWalls(emptySite(), rectangleAt(0, 0, 120, 100), true, 'p');
      const both = withWalls(first, rectangleAt(120 + lane, shift, 120, 100), true, 'q');
      const opened = withOpenings(
        both,
        door('pBC', Math.min(doorAt, 50), { swing: { hinge: 'near', opens: out ? 'out' : 'in' } }),
      );
      const keepClears = areas.map(({ x, y, size }, i) => ({
        id: `k${i}`,
        name: 'area',
        points: rectangleAt(x, y, size, size).map(([px, py]) => ({ x: inches(px), y: inches(py) })),
      }));
      return { ...opened, keepClears };
    });

const sites = sitesApart(48);

/** Bearings 30° apart and one reach: few enough for every combination, enough to get round real obstacles. */
const COARSE: CandidateOptions = { turnMost: 60, turnStep: 30, reaches: [66] };

describe('braces on random sites', () => {
  it('cross no wall, no area, no swing and no other brace, and keep the angle rule', () => {
    fc.assert(
      fc.property(sites, (drawing) => {
        const walls = layOutWalls(drawing);
        const set = placePoles(drawing, walls);
        const loose = new Set(set.reasons.filter((r) => r.code === 'braceAngleOut').map((r) => r.thing.id));
        const braces = set.poles.flatMap((pole) =>
          pole.braces.map((brace) => ({ pole, brace, line: line(pole.at, brace.foot) })),
        );
        for (const { pole, brace, line: path } of braces) {
          for (const run of walls.runs) {
            expect(apart(path, area(run.body))).toBeGreaterThan(0);
            expect(apart(line(brace.foot, brace.foot), area(run.body))).toBeGreaterThanOrEqual(KIT.clearance - 1);
          }
          // It may touch an area's edge, within the rounding of its foot.
          for (const keep of drawing.keepClears) expect(lengthInside(path, area(keep.points))).toBeLessThan(8);
          for (const other of braces)
            if (other.pole !== pole) expect(apart(path, other.line)).toBeGreaterThanOrEqual(KIT.clearance - 1);
          for (const other of set.poles)
            if (other !== pole) expect(apart(path, area(other.section))).toBeGreaterThanOrEqual(KIT.clearance - 1);
          expect(brace.reach).toBe(Math.round(Math.hypot(brace.foot.x - pole.at.x, brace.foot.y - pole.at.y)));
        }
        for (const pole of set.poles) {
          const [a, b] = pole.braces;
          if (!a || !b || loose.has(pole.id)) continue;
          const turned = Math.abs(a.bearing - b.bearing);
          const angle = Math.min(turned, 360 - turned);
          expect(angle).toBeGreaterThanOrEqual(60 - 1e-3);
          expect(angle).toBeLessThanOrEqual(120 + 1e-3);
        }
      }),
      { numRuns: 30 },
    );
  });

  it('keep clear even where the search stops at its bound, which is then said', () => {
    // Twelve short walls 30 in apart in three columns: hardly room for a brace.
    let drawing = emptySite();
    for (let i = 0; i < 12; i += 1) {
      const [x, y] = [(i % 3) * 150, Math.floor(i / 3) * 30];
      drawing = withWalls(
        drawing,
        [
          [x, y],
          [x + 100, y],
        ],
        false,
        `w${i}`,
      );
    }
    const set = placePoles(drawing, layOutWalls(drawing), {
      candidates: USUAL_CANDIDATES,
      wide: USUAL_CANDIDATES,
      bound: { most: 4000, inAll: 12_000 },
    });
    expect(set.exact).toBe(false);
    expect(set.gap).toBeGreaterThan(0);
    expect(set.reasons.map((reason) => reason.code)).toContain('searchBoundReached');
    const braces = set.poles.flatMap((pole) => pole.braces.map((brace) => ({ pole, path: line(pole.at, brace.foot) })));
    expect(braces.length).toBeGreaterThan(12);
    for (const a of braces)
      for (const b of braces)
        if (a.pole !== b.pole) expect(apart(a.path, b.path)).toBeGreaterThanOrEqual(KIT.clearance - 1);
    const unbraced = set.poles.filter((pole) => pole.braces.length < 2).map((pole) => pole.id);
    const said = set.reasons.filter((reason) => reason.code === 'braceBlocked').map((reason) => reason.thing.id);
    expect(said.sort()).toEqual(unbraced.sort());
  });

  it('cost no more than the cheapest of every possible placing', () => {
    let solved = 0;
    let joined = 0;
    fc.assert(
      fc.property(sitesApart(70), (drawing) => {
        const walls = layOutWalls(drawing);
        const set = placePoles(drawing, walls, { candidates: COARSE, wide: COARSE, bound: USUAL_BOUND });
        fc.pre(set.reasons.length === 0);
        expect(set.exact).toBe(true);
        expect(set.cost).toBe(cheapestOfAll(drawing, set));
        solved += 1;
        if (set.neighbourhoods.some((group) => group.length > 1)) joined += 1;
      }),
      { numRuns: 300, seed: 9, endOnFailure: true },
    );
    expect(solved).toBe(300);
    // Braces of different poles had to give way to one another in some of the sites.
    expect(joined).toBeGreaterThan(15);
  });

  it('say truly how far at most they are from the least, where the search stops at its bound', () => {
    let bounded = 0;
    fc.assert(
      fc.property(sites, (drawing) => {
        const walls = layOutWalls(drawing);
        const least = placePoles(drawing, walls);
        expect([least.exact, least.gap]).toEqual([true, 0]);
        fc.pre(least.poles.every((pole) => pole.braces.length === 2));
        const options = { candidates: USUAL_CANDIDATES, wide: WIDE_CANDIDATES, bound: { most: 40, inAll: 80 } };
        const set = placePoles(drawing, walls, options);
        const unbraced = set.poles.filter((pole) => pole.braces.length < 2).length;
        const lower = set.cost + unbraced * 1_000_000 - (set.gap ?? 0);
        expect(lower).toBeLessThanOrEqual(least.cost);
        if (unbraced === 0) expect(set.cost).toBeGreaterThanOrEqual(least.cost);
        if (!set.exact) bounded += 1;
        else expect(set.cost).toBe(least.cost);
      }),
      { numRuns: 25, seed: 4, endOnFailure: true },
    );
    expect(bounded).toBeGreaterThan(4);
  });
});

interface Choice {
  readonly cost: number;
  readonly lines: readonly object[];
}

/** Every pair of candidates of every pole, and every combination of them, by brute force. */
function cheapestOfAll(drawing: Drawing, placed: PoleSet): number {
  const walls = layOutWalls(drawing);
  const poles = placed.poles.map((pole) => obstacleOf('pole', { kind: 'pole', id: pole.id }, pole.section));
  const ground = groundOf([...obstaclesOf(drawing, walls), ...poles], null);
  const reach = reachLimits(KIT)!;
  const choices = seatsAtCorners(walls).map((seat): Choice[] => {
    const at = placed.poleById.get(seat.id)!.at;
    const limits = { least: 60, most: 120 };
    const site: PoleSite = { poleId: seat.id, seat, at, kit: KIT, reach, limits, options: COARSE };
    const braces = new PoleBraces(site, ground);
    const lines = new Map<Candidate, object>();
    const lineTo = (candidate: Candidate): object => {
      const known = lines.get(candidate) ?? line(at, candidate.foot);
      lines.set(candidate, known);
      return known;
    };
    return braces.upTo(0, Infinity).flatMap((a) =>
      braces.upTo(1, Infinity).flatMap((b): Choice[] => {
        const cosine = a.direction.x * b.direction.x + a.direction.y * b.direction.y;
        const angle = Math.round((Math.acos(Math.max(-1, Math.min(1, cosine))) * 180) / Math.PI);
        if (angle < 60 || angle > 120) return [];
        const cost = a.cost + b.cost + (angle - 90) ** 2;
        return [{ cost, lines: [lineTo(a), lineTo(b)] }];
      }),
    );
  });
  const known = new Map<object, Map<object, boolean>>();
  const clearLines = (p: object, q: object): boolean => {
    const row = known.get(p) ?? new Map<object, boolean>();
    known.set(p, row);
    const found = row.get(q) ?? apart(p, q) >= KIT.clearance;
    row.set(q, found);
    return found;
  };
  const clear = (a: Choice, b: Choice): boolean => a.lines.every((p) => b.lines.every((q) => clearLines(p, q)));
  const places = placed.poles.map((pole) => pole.at);
  const far = 2 * reach.most + KIT.clearance;
  const meet = (i: number, j: number) => Math.hypot(places[i]!.x - places[j]!.x, places[i]!.y - places[j]!.y) <= far;
  return partsOf(choices.length, meet).reduce(
    (sum, part) =>
      sum +
      cheapest(
        part.map((i) => choices[i]!),
        clear,
      ),
    0,
  );
}

/** Poles whose braces can meet, straight or by way of others: each part can be placed for itself. */
function partsOf(count: number, meet: (i: number, j: number) => boolean): number[][] {
  const parts: number[][] = [];
  for (let i = 0; i < count; i += 1) {
    const joined = parts.filter((part) => part.some((j) => meet(i, j)));
    const rest = parts.filter((part) => !joined.includes(part));
    parts.splice(0, parts.length, ...rest, [...joined.flat(), i]);
  }
  return parts;
}

function cheapest(parts: readonly (readonly Choice[])[], clear: (a: Choice, b: Choice) => boolean): number {
  const choices = parts.map((options) => [...options].sort((a, b) => a.cost - b.cost));
  const least = choices.map((_, i) => choices.slice(i).reduce((sum, options) => sum + (options[0]?.cost ?? 0), 0));
  let best = Infinity;
  const descend = (i: number, chosen: readonly Choice[], cost: number): void => {
    const options = choices[i];
    if (!options) best = Math.min(best, cost);
    for (const choice of options ?? []) {
      if (cost + choice.cost + (least[i + 1] ?? 0) >= best) return;
      if (chosen.every((other) => clear(choice, other))) descend(i + 1, [...chosen, choice], cost + choice.cost);
    }
  };
  descend(0, [], 0);
  return best;
}
