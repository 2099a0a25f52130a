import type { Drawing, WallType } from '../drawing/schema';

/** The wall type that sets the gauge and the bedding: the first one that a run uses, else the first of the drawing. */
export function coursedType(drawing: Drawing): WallType {
  const used = new Set(drawing.runs.map((run) => run.wallTypeId));
  const first = drawing.wallTypes.find((type) => used.has(type.id)) ?? drawing.wallTypes[0];
  // The schema holds at least one wall type.
  return first as WallType;
}
