/** Keep-clear areas and the site boundary: rings of points. */
import type { PlanPoint } from '../../geometry/point';
import { samePoint } from '../../geometry/vec';
import { ticks } from '../../length/ticks';
import type { Drawing, KeepClear } from '../schema';
import { isOnPlan, replaceById, type NewId } from './find';

const LEAST_POINTS = 3;
const MOST_POINTS = 200;
const MOST_AREAS = 200;

function isRing(points: readonly PlanPoint[]): boolean {
  return points.length >= LEAST_POINTS && points.length <= MOST_POINTS && points.every(isOnPlan);
}

function changeRing(drawing: Drawing, id: string, change: (points: readonly PlanPoint[]) => PlanPoint[]): Drawing {
  const keepClears = replaceById(drawing.keepClears, id, (area) => {
    const points = change(area.points);
    return isRing(points) ? { ...area, points } : area;
  });
  return keepClears === drawing.keepClears ? drawing : { ...drawing, keepClears };
}

/** Adds an area to keep free; three points at least. */
export function addKeepClear(
  drawing: Drawing,
  area: { readonly name: string; readonly points: readonly PlanPoint[] },
  newId: NewId,
): Drawing {
  if (!isRing(area.points) || drawing.keepClears.length >= MOST_AREAS) return drawing;
  const added: KeepClear = { id: newId(), name: area.name.trim().slice(0, 80), points: [...area.points] };
  return { ...drawing, keepClears: [...drawing.keepClears, added] };
}

export function nameKeepClear(drawing: Drawing, id: string, name: string): Drawing {
  const trimmed = name.trim().slice(0, 80);
  const keepClears = replaceById(drawing.keepClears, id, (area) =>
    area.name === trimmed ? area : { ...area, name: trimmed },
  );
  return keepClears === drawing.keepClears ? drawing : { ...drawing, keepClears };
}

function movePoint(points: readonly PlanPoint[], index: number, to: PlanPoint): PlanPoint[] {
  return points.map((point, i) => (i === index ? { x: to.x, y: to.y } : point));
}

function insertPoint(points: readonly PlanPoint[], after: number, point: PlanPoint): PlanPoint[] {
  return [...points.slice(0, after + 1), { x: point.x, y: point.y }, ...points.slice(after + 1)];
}

function dropPoint(points: readonly PlanPoint[], index: number): PlanPoint[] {
  return points.filter((_, i) => i !== index);
}

function holds(points: readonly PlanPoint[], index: number): boolean {
  return Number.isInteger(index) && index >= 0 && index < points.length;
}

/** Moves one point of an area, counted from 0. */
export function moveKeepClearPoint(drawing: Drawing, id: string, index: number, to: PlanPoint): Drawing {
  const area = drawing.keepClears.find((one) => one.id === id);
  const point = area?.points[index];
  if (!point || samePoint(point, to)) return drawing;
  return changeRing(drawing, id, (points) => movePoint(points, index, to));
}

/** Adds a point on the side that starts at the point `after`. */
export function addKeepClearPoint(drawing: Drawing, id: string, after: number, point: PlanPoint): Drawing {
  const area = drawing.keepClears.find((one) => one.id === id);
  if (!area || !holds(area.points, after)) return drawing;
  return changeRing(drawing, id, (points) => insertPoint(points, after, point));
}

/** Takes one point away; the last three stay. */
export function deleteKeepClearPoint(drawing: Drawing, id: string, index: number): Drawing {
  const area = drawing.keepClears.find((one) => one.id === id);
  if (!area || !holds(area.points, index) || area.points.length <= LEAST_POINTS) return drawing;
  return changeRing(drawing, id, (points) => dropPoint(points, index));
}

/** Moves a whole area. */
export function moveKeepClear(drawing: Drawing, id: string, by: PlanPoint): Drawing {
  if (by.x === 0 && by.y === 0) return drawing;
  return changeRing(drawing, id, (points) => points.map(({ x, y }) => ({ x: ticks(x + by.x), y: ticks(y + by.y) })));
}

export function deleteKeepClear(drawing: Drawing, id: string): Drawing {
  return drawing.keepClears.some((area) => area.id === id)
    ? { ...drawing, keepClears: drawing.keepClears.filter((area) => area.id !== id) }
    : drawing;
}

/** Sets the site boundary, or takes it away with null. */
export function setBoundary(drawing: Drawing, points: readonly PlanPoint[] | null): Drawing {
  if (points === null) return drawing.boundary === null ? drawing : { ...drawing, boundary: null };
  return isRing(points) ? { ...drawing, boundary: points.map(({ x, y }) => ({ x, y })) } : drawing;
}

export function moveBoundaryPoint(drawing: Drawing, index: number, to: PlanPoint): Drawing {
  const point = drawing.boundary?.[index];
  if (!drawing.boundary || !point || samePoint(point, to)) return drawing;
  return setBoundary(drawing, movePoint(drawing.boundary, index, to));
}

export function addBoundaryPoint(drawing: Drawing, after: number, point: PlanPoint): Drawing {
  if (!drawing.boundary || !holds(drawing.boundary, after)) return drawing;
  return setBoundary(drawing, insertPoint(drawing.boundary, after, point));
}

export function deleteBoundaryPoint(drawing: Drawing, index: number): Drawing {
  if (!drawing.boundary || !holds(drawing.boundary, index) || drawing.boundary.length <= LEAST_POINTS) return drawing;
  return setBoundary(drawing, dropPoint(drawing.boundary, index));
}
