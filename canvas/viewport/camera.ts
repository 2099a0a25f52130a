/** Where the drawing is looked at from: arithmetic between plan (ticks, y up) and screen (pixels, y down). */
import type { Box } from '../../model/figures/figure';
import type { PlanPoint, Vec } from '../../model/geometry/point';
import { roundTicks, TICKS_PER_MM } from '../../model/length/ticks';

declare const screenBrand: unique symbol;

/** A place in the drawing's view, in CSS pixels from its top left, y down. */
export interface ScreenPoint {
  readonly x: number;
  readonly y: number;
  readonly [screenBrand]: 'screen';
}

export interface ViewSize {
  readonly width: number;
  readonly height: number;
}

/** The plan point at the middle of the view, and pixels per tick. */
export interface Camera {
  readonly x: number;
  readonly y: number;
  readonly scale: number;
}

/** Least and most pixels per tick: half a kilometre across a screen, to one millimetre 8 px wide. */
export const SCALE_LEAST = 0.002 / TICKS_PER_MM;
export const SCALE_MOST = 8 / TICKS_PER_MM;

/** Marks a pair of pixels as a place in the view. */
export function screenPoint(x: number, y: number): ScreenPoint {
  return { x, y } as ScreenPoint;
}

export function toScreen(camera: Camera, size: ViewSize, at: Vec): ScreenPoint {
  return screenPoint(
    size.width / 2 + (at.x - camera.x) * camera.scale,
    size.height / 2 - (at.y - camera.y) * camera.scale,
  );
}

/** The plan place under a screen point, between ticks. */
export function toPlan(camera: Camera, size: ViewSize, at: { readonly x: number; readonly y: number }): Vec {
  return {
    x: camera.x + (at.x - size.width / 2) / camera.scale,
    y: camera.y - (at.y - size.height / 2) / camera.scale,
  };
}

/** A plan place rounded to whole ticks. */
export function toPlanPoint(at: Vec): PlanPoint {
  return { x: roundTicks(at.x), y: roundTicks(at.y) };
}

/** Pixels on the screen as ticks on the plan, at this camera. */
export function reachInTicks(camera: Camera, pixels: number): number {
  return pixels / camera.scale;
}

export function clampScale(scale: number): number {
  if (!(scale > 0)) return SCALE_LEAST;
  return Math.min(SCALE_MOST, Math.max(SCALE_LEAST, scale));
}

/** Moves the paper by pixels: what was under the finger stays under it. */
export function panBy(camera: Camera, dx: number, dy: number): Camera {
  if (!Number.isFinite(dx) || !Number.isFinite(dy)) return camera;
  return { ...camera, x: camera.x - dx / camera.scale, y: camera.y + dy / camera.scale };
}

/** Zooms by a factor so that the plan place under `at` stays under it. Refuses a factor that is no positive number. */
export function zoomAbout(
  camera: Camera,
  size: ViewSize,
  at: { readonly x: number; readonly y: number },
  factor: number,
): Camera {
  if (!(factor > 0) || !Number.isFinite(factor)) return camera;
  const held = toPlan(camera, size, at);
  const scale = clampScale(camera.scale * factor);
  return holdAt(held, at, scale, size);
}

function holdAt(held: Vec, at: { readonly x: number; readonly y: number }, scale: number, size: ViewSize): Camera {
  return { x: held.x - (at.x - size.width / 2) / scale, y: held.y + (at.y - size.height / 2) / scale, scale };
}

export interface TwoPoints {
  readonly a: { readonly x: number; readonly y: number };
  readonly b: { readonly x: number; readonly y: number };
}

/** Two fingers moved from one pair of places to another: pan and zoom together, the middle held under the middle. */
export function pinchTo(start: Camera, size: ViewSize, from: TwoPoints, to: TwoPoints): Camera {
  const before = Math.hypot(from.a.x - from.b.x, from.a.y - from.b.y);
  const after = Math.hypot(to.a.x - to.b.x, to.a.y - to.b.y);
  const factor = before > 1 && Number.isFinite(after) ? Math.max(after, 1) / before : 1;
  const held = toPlan(start, size, middle(from));
  return holdAt(held, middle(to), clampScale(start.scale * factor), size);
}

function middle(points: TwoPoints): { x: number; y: number } {
  return { x: (points.a.x + points.b.x) / 2, y: (points.a.y + points.b.y) / 2 };
}

/** Room to leave around what is fitted, in pixels. */
export interface Padding {
  readonly left: number;
  readonly top: number;
  readonly right: number;
  readonly bottom: number;
}

/** The camera that shows a whole box inside the padding. A point or an empty view gets a workable scale. */
export function fitBox(box: Box, size: ViewSize, padding: Padding): Camera {
  const wide = Math.max(1, box.right - box.left);
  const high = Math.max(1, box.top - box.bottom);
  const room = {
    width: Math.max(16, size.width - padding.left - padding.right),
    height: Math.max(16, size.height - padding.top - padding.bottom),
  };
  const scale = clampScale(Math.min(room.width / wide, room.height / high));
  const offX = (padding.left - padding.right) / 2;
  const offY = (padding.top - padding.bottom) / 2;
  return { x: (box.left + box.right) / 2 - offX / scale, y: (box.bottom + box.top) / 2 + offY / scale, scale };
}

/**
 * The camera moved as little as it can be so that the places stand at least `margin` pixels inside the view; it steps back
 * where they don't fit together. The same camera comes back where all of them are in sight, `edge` pixels inside.
 */
export function bringIntoView(
  camera: Camera,
  size: ViewSize,
  places: readonly Vec[],
  { edge, margin }: { readonly edge: number; readonly margin: number },
): Camera {
  const seen = places.map((at) => toScreen(camera, size, at));
  const inside = ({ x, y }: ScreenPoint) => x >= edge && y >= edge && x <= size.width - edge && y <= size.height - edge;
  if (seen.every(inside)) return camera;
  const left = Math.min(...seen.map(({ x }) => x));
  const right = Math.max(...seen.map(({ x }) => x));
  const top = Math.min(...seen.map(({ y }) => y));
  const bottom = Math.max(...seen.map(({ y }) => y));
  const wide = Math.max(1, size.width - 2 * margin);
  const high = Math.max(1, size.height - 2 * margin);
  const factor = Math.min(1, wide / Math.max(1, right - left), high / Math.max(1, bottom - top));
  if (factor < 1) {
    const middleOf = toPlan(camera, size, { x: (left + right) / 2, y: (top + bottom) / 2 });
    return { ...middleOf, scale: clampScale(camera.scale * factor) };
  }
  return panBy(camera, intoSpan(left, right, margin, size.width), intoSpan(top, bottom, margin, size.height));
}

/** How far to move what lies from `least` to `most` so that it stands `margin` inside a view. */
function intoSpan(least: number, most: number, margin: number, view: number): number {
  if (least < margin) return margin - least;
  return most > view - margin ? view - margin - most : 0;
}

/** Keeps some of the box in sight: the middle of the view never leaves the box by more than half a view. */
export function clampCamera(camera: Camera, box: Box, size: ViewSize): Camera {
  const halfWide = size.width / 2 / camera.scale;
  const halfHigh = size.height / 2 / camera.scale;
  const x = Math.min(box.right + halfWide, Math.max(box.left - halfWide, camera.x));
  const y = Math.min(box.top + halfHigh, Math.max(box.bottom - halfHigh, camera.y));
  return x === camera.x && y === camera.y ? camera : { x, y, scale: camera.scale };
}

/** A wrapper's transform that shows the picture drawn for `drawn` as it looks from `now`: about the view's middle. */
export interface WrapperTransform {
  readonly translateX: number;
  readonly translateY: number;
  readonly scale: number;
}

export function transformBetween(drawn: Camera, now: Camera): WrapperTransform {
  return {
    translateX: (drawn.x - now.x) * now.scale,
    translateY: (now.y - drawn.y) * now.scale,
    scale: now.scale / drawn.scale,
  };
}
