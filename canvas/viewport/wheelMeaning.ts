/** What a turn of the wheel or two fingers on a trackpad mean. */

export interface WheelTurn {
  readonly deltaX: number;
  readonly deltaY: number;
  /** As in WheelEvent: 0 pixels, 1 lines, 2 pages. */
  readonly deltaMode: number;
  /** A trackpad's pinch arrives as a wheel with ctrl. */
  readonly ctrl: boolean;
}

export type WheelMeaning =
  | { readonly kind: 'zoom'; readonly factor: number }
  | { readonly kind: 'pan'; readonly dx: number; readonly dy: number };

const LINE = 16;
const PAGE = 400;
/** A notched wheel turns by whole steps of at least this many pixels, straight up or down; a trackpad hardly ever does. */
const NOTCH = 100;

/** Null for what is not a number, or no movement. */
export function wheelMeaning(turn: WheelTurn): WheelMeaning | null {
  const unit = turn.deltaMode === 1 ? LINE : turn.deltaMode === 2 ? PAGE : 1;
  const dx = turn.deltaX * unit;
  const dy = turn.deltaY * unit;
  if (!Number.isFinite(dx) || !Number.isFinite(dy) || (dx === 0 && dy === 0)) return null;
  if (turn.ctrl) return { kind: 'zoom', factor: Math.exp(-Math.max(-50, Math.min(50, dy)) / 100) };
  const notched = turn.deltaMode !== 0 || (dx === 0 && Number.isInteger(dy) && Math.abs(dy) >= NOTCH);
  if (notched && dx === 0) return { kind: 'zoom', factor: dy < 0 ? 1.2 : 1 / 1.2 };
  return { kind: 'pan', dx: 0 - dx, dy: 0 - dy };
}
