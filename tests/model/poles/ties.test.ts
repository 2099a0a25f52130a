/** A foot's two tapes: that they cross well, and pass no wall where two others would not; walls by a general geometry library. */
import { assert as check, constantFrom, integer, property } from 'fast-check';
import Coordinate from 'jsts/org/locationtech/jts/geom/Coordinate.js';
import GeometryFactory from 'jsts/org/locationtech/jts/geom/GeometryFactory.js';
import OverlayOp from 'jsts/org/locationtech/jts/operation/overlay/OverlayOp.js';
import { describe, expect, it } from 'vitest';
import type { PlanPoint } from '../../../model/geometry/point';
import { placePoles } from '../../../model/poles/placePoles';
import { cornersAround } from '../../../model/poles/ties';
import { layOutWalls } from '../../../model/walls/layOutWalls';
import { door, ell, rectangle, withOpenings } from './sites';

const factory = new GeometryFactory();
const at = (p: PlanPoint) => new Coordinate(p.x, p.y);
const inWall = (a: PlanPoint, b: PlanPoint, body: readonly PlanPoint[]): number =>
  OverlayOp.intersection(
    factory.createLineString([at(a), at(b)]),
    factory.createPolygon(factory.createLinearRing([...body, body[0]!].map(at))),
  ).getLength();

/** Degrees between two tapes at a foot, 0 to 90. */
function crossing(foot: PlanPoint, a: PlanPoint, b: PlanPoint): number {
  const angle = Math.abs(Math.atan2(a.y - foot.y, a.x - foot.x) - Math.atan2(b.y - foot.y, b.x - foot.x));
  const degrees = (angle * 180) / Math.PI;
  return Math.min(degrees % 180, 180 - (degrees % 180));
}

describe('the tapes of a brace’s foot', () => {
  it('cross at 30° or more and pass no wall, wherever two corners in reach do', () => {
    let kept = 0;
    check(
      property(constantFrom(rectangle(), ell()), integer({ min: 20, max: 70 }), (plain, doorAt) => {
        const drawing = withOpenings(plain, door('CD', doorAt));
        const walls = layOutWalls(drawing);
        const free = (corner: PlanPoint, foot: PlanPoint) =>
          walls.runs.every((run) => inWall(corner, foot, run.body) < 4);
        for (const pole of placePoles(drawing, walls).poles)
          for (const { foot, ties } of pole.braces) {
            const corners = cornersAround(pole.runIds, walls).map((id) => walls.cornerById.get(id)!.at);
            const well = corners.flatMap((a, i) =>
              corners.slice(i + 1).filter((b) => crossing(foot, a, b) >= 30.01 && free(a, foot) && free(b, foot)),
            );
            const [a, b] = ties.map((tie) => walls.cornerById.get(tie.cornerId)!.at);
            expect(ties.map((tie) => tie.distance)).toEqual(
              [a!, b!].map((corner) => Math.round(Math.hypot(corner.x - foot.x, corner.y - foot.y))),
            );
            if (well.length === 0) continue;
            kept += 1;
            expect(crossing(foot, a!, b!)).toBeGreaterThanOrEqual(30 - 1e-6);
            expect(inWallOf(a!, foot) + inWallOf(b!, foot)).toBeLessThan(8);
          }
        function inWallOf(corner: PlanPoint, foot: PlanPoint): number {
          return walls.runs.reduce((sum, run) => sum + inWall(corner, foot, run.body), 0);
        }
      }),
      { numRuns: 20, seed: 2, endOnFailure: true },
    );
    expect(kept).toBeGreaterThan(50);
  });
});
