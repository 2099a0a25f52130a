/** Wall drawings for these tests, and the general geometry library that they are checked against. */
import Coordinate from 'jsts/org/locationtech/jts/geom/Coordinate.js';
import GeometryFactory from 'jsts/org/locationtech/jts/geom/GeometryFactory.js';
import BufferOp from 'jsts/org/locationtech/jts/operation/buffer/BufferOp.js';
import BufferParameters from 'jsts/org/locationtech/jts/operation/buffer/BufferParameters.js';
import UnaryUnionOp from 'jsts/org/locationtech/jts/operation/union/UnaryUnionOp.js';
import { newDrawing } from '../../../model/drawing/defaults';
import { letterAt } from '../../../model/drawing/letters';
import type { Drawing, WallType } from '../../../model/drawing/schema';
import type { PlanPoint } from '../../../model/geometry/point';
import { inches } from '../../../model/length/ticks';
import type { Walls } from '../../../model/walls/types';

export type Place = readonly [number, number];

export function wallType(id: string, thickness: number, change: Partial<WallType> = {}): WallType {
  const [usual] = newDrawing('imperial').wallTypes;
  if (!usual) throw new Error('a new drawing has a wall type');
  return { ...usual, unit: { ...usual.unit, width: inches(thickness) }, ...change, id };
}

/** Corners by name in inches; runs as `A-B`, or `A-B:thick` for another wall type. Ids are the names. */
export function plan(
  corners: Readonly<Record<string, Place>>,
  runs: readonly string[],
  types: readonly WallType[] = [wallType('wall', 12)],
): Drawing {
  return {
    ...newDrawing('imperial'),
    wallTypes: [...types],
    corners: Object.entries(corners).map(([id, [x, y]], i) => {
      return { id, letter: letterAt(i), x: inches(x), y: inches(y) };
    }),
    runs: runs.map((text) => {
      const [id = '', wallTypeId = types[0]?.id ?? ''] = text.split(':');
      const [from = '', to = ''] = id.split('-');
      return { id, from, to, wallTypeId };
    }),
  };
}

/** A closed outline through places in inches. */
export function outline(places: readonly Place[], types?: readonly WallType[]): Drawing {
  const names = places.map((_, i) => letterAt(i));
  const corners = Object.fromEntries(places.map((place, i) => [letterAt(i), place]));
  return plan(
    corners,
    names.map((name, i) => `${name}-${names[(i + 1) % names.length]}`),
    types,
  );
}

const factory = new GeometryFactory();

function polygonOf(ring: readonly { readonly x: number; readonly y: number }[]) {
  const closed = [...ring, ...ring.slice(0, 1)];
  return factory.createPolygon(closed.map((point) => new Coordinate(point.x, point.y)));
}

/** Area of the union of all bodies, and the sum of their areas, by the library. */
export function bodyAreas(walls: Walls): { readonly union: number; readonly sum: number } {
  const bodies = walls.runs.map((run) => polygonOf(run.body));
  const union = UnaryUnionOp.union(factory.createGeometryCollection(bodies)).getArea();
  return { union, sum: bodies.reduce((total, body) => total + body.getArea(), 0) };
}

/** Area of a ring moved in by a distance, its corners mitred, by the library. */
export function insetArea(ring: readonly PlanPoint[], by: number): number {
  const parameters = new BufferParameters(8, BufferParameters.CAP_FLAT, BufferParameters.JOIN_MITRE, 20);
  return BufferOp.bufferOp(polygonOf(ring), -by, parameters).getArea();
}

export function ringArea(ring: readonly PlanPoint[]): number {
  return polygonOf(ring).getArea();
}
