/** Mouse, touch, pen and keys as one kind of event, so that a tool need not know which it was. */
import type { Vec } from '../../model/geometry/point';
import type { ScreenPoint } from '../viewport/camera';

export type PointerKind = 'mouse' | 'touch' | 'pen';

export interface Modifiers {
  readonly shift: boolean;
  readonly alt: boolean;
  /** Ctrl, or ⌘ where that is the custom. */
  readonly command: boolean;
}

export const NO_MODIFIERS: Modifiers = { shift: false, alt: false, command: false };

export interface StrokeEvent {
  /** `hover`: a mouse or pen above the drawing with nothing pressed. */
  readonly kind: 'down' | 'move' | 'up' | 'cancel' | 'hover';
  readonly pointer: PointerKind;
  readonly screen: ScreenPoint;
  /** The plan place under it, between ticks. */
  readonly plan: Vec;
  readonly modifiers: Modifiers;
  /** Milliseconds on the event's own clock. */
  readonly time: number;
}

export interface KeyPress {
  readonly kind: 'key';
  /** As in KeyboardEvent.key. */
  readonly key: string;
  readonly modifiers: Modifiers;
}

export type InputEvent = StrokeEvent | KeyPress;

/** How far from a thing a pointer still means it, in pixels. */
export const HIT_REACH: Readonly<Record<PointerKind, number>> = { touch: 24, pen: 12, mouse: 8 };

/** How far a pointer must move before it is a drag, in pixels. */
export const DRAG_START: Readonly<Record<PointerKind, number>> = { touch: 8, pen: 4, mouse: 3 };

/** Two taps this near in time (ms) and place (pixels, beside the hit reach) are one double tap. */
export const DOUBLE_TAP_TIME = 350;

/** Whether a pointer has moved far enough from where it went down to be dragging. */
export function isDrag(pointer: PointerKind, from: ScreenPoint, to: ScreenPoint): boolean {
  return Math.hypot(to.x - from.x, to.y - from.y) > DRAG_START[pointer];
}
