/**
 * Sorts raw pointers into what they mean: one stroke for the tool, a pan, or two fingers that pan and pinch.
 * A second finger takes the stroke back; fingers that rest while the pen is down are a palm and are ignored.
 */
import type { Vec } from '../../model/geometry/point';
import { panBy, pinchTo, screenPoint, toPlan, type Camera, type ScreenPoint, type ViewSize } from '../viewport/camera';
import { isDrag, NO_MODIFIERS, type Modifiers, type PointerKind, type StrokeEvent } from './events';

export interface RawPointer {
  readonly id: number;
  readonly pointer: PointerKind;
  readonly x: number;
  readonly y: number;
  readonly time: number;
  readonly modifiers?: Modifiers;
  /** Middle or right button: moves the paper. */
  readonly moves?: boolean;
}

export interface DeskHost {
  camera(): Camera;
  size(): ViewSize;
  /** A stroke's event; the tool answers `pan` when a drag that began on nothing should move the paper. */
  stroke(event: StrokeEvent): 'keep' | 'pan';
  /** The camera while fingers move the paper; committed by `cameraDone`. */
  cameraMoved(camera: Camera): void;
  cameraDone(): void;
  /** True when the pen draws and fingers only move the paper. */
  fingersOnlyMove(): boolean;
  penSeen(): void;
}

interface Held {
  readonly pointer: PointerKind;
  x: number;
  y: number;
}

type DeskState =
  | { readonly name: 'idle' }
  | { readonly name: 'stroke'; readonly id: number; readonly last: StrokeEvent }
  /** A finger that may only move the paper: a tap if it never moves. */
  | { readonly name: 'mayPan'; readonly id: number; readonly down: RawPointer }
  | { readonly name: 'pan'; readonly id: number; readonly start: Camera; readonly from: ScreenPoint }
  | {
      readonly name: 'pinch';
      readonly ids: readonly [number, number];
      readonly start: Camera;
      readonly from: readonly [ScreenPoint, ScreenPoint];
    }
  /** Fingers still down after a gesture that must not begin another. */
  | { readonly name: 'spent' };

export interface PointerDesk {
  down(raw: RawPointer): void;
  move(raw: RawPointer): void;
  up(raw: RawPointer): void;
  cancel(): void;
  hover(raw: RawPointer): void;
  /** For tests and the screen: what the pointers mean now. */
  stateName(): DeskState['name'];
}

export function createPointerDesk(host: DeskHost): PointerDesk {
  let state: DeskState = { name: 'idle' };
  const held = new Map<number, Held>();

  function eventOf(kind: StrokeEvent['kind'], raw: RawPointer): StrokeEvent {
    const screen = screenPoint(raw.x, raw.y);
    const plan: Vec = toPlan(host.camera(), host.size(), screen);
    return { kind, pointer: raw.pointer, screen, plan, modifiers: raw.modifiers ?? NO_MODIFIERS, time: raw.time };
  }

  function takeBackStroke(): void {
    if (state.name === 'stroke') host.stroke({ ...state.last, kind: 'cancel' });
  }

  function beginPan(id: number, x: number, y: number): void {
    state = { name: 'pan', id, start: host.camera(), from: screenPoint(x, y) };
  }

  function beginPinch(first: number, second: number): void {
    const a = held.get(first);
    const b = held.get(second);
    if (!a || !b) return;
    const from = [screenPoint(a.x, a.y), screenPoint(b.x, b.y)] as const;
    state = { name: 'pinch', ids: [first, second], start: host.camera(), from };
  }

  function fingers(): number[] {
    return [...held].filter(([, pointer]) => pointer.pointer === 'touch').map(([id]) => id);
  }

  function penIsDown(): boolean {
    return [...held.values()].some((pointer) => pointer.pointer === 'pen');
  }

  function down(raw: RawPointer): void {
    if (!Number.isFinite(raw.x) || !Number.isFinite(raw.y)) return;
    if (raw.pointer === 'pen') host.penSeen();
    const palm = raw.pointer === 'touch' && penIsDown();
    if (palm) return;
    if (raw.pointer === 'pen' && fingers().length > 0) {
      // The palm often lands before the pen's tip: what it began is taken back.
      takeBackStroke();
      endCamera();
      for (const id of fingers()) held.delete(id);
      state = { name: 'idle' };
    }
    held.set(raw.id, { pointer: raw.pointer, x: raw.x, y: raw.y });
    const down = fingers();
    if (down.length >= 2) {
      if (down.length === 2 && state.name !== 'spent') {
        takeBackStroke();
        endCamera();
        beginPinch(down[0]!, down[1]!);
      }
      return;
    }
    if (state.name !== 'idle') return;
    if (raw.moves === true) return beginPan(raw.id, raw.x, raw.y);
    if (raw.pointer === 'touch' && host.fingersOnlyMove()) {
      state = { name: 'mayPan', id: raw.id, down: raw };
      return;
    }
    const event = eventOf('down', raw);
    state = { name: 'stroke', id: raw.id, last: event };
    host.stroke(event);
  }

  function move(raw: RawPointer): void {
    const pointer = held.get(raw.id);
    if (!pointer || !Number.isFinite(raw.x) || !Number.isFinite(raw.y)) return;
    pointer.x = raw.x;
    pointer.y = raw.y;
    if (state.name === 'stroke' && state.id === raw.id) {
      const event = eventOf('move', raw);
      state = { ...state, last: event };
      if (host.stroke(event) === 'pan') beginPan(raw.id, raw.x, raw.y);
    } else if (state.name === 'mayPan' && state.id === raw.id) {
      const from = screenPoint(state.down.x, state.down.y);
      if (!isDrag('touch', from, screenPoint(raw.x, raw.y))) return;
      beginPan(raw.id, state.down.x, state.down.y);
      followPan(raw);
    } else if (state.name === 'pan' && state.id === raw.id) {
      followPan(raw);
    } else if (state.name === 'pinch' && state.ids.includes(raw.id)) {
      const a = held.get(state.ids[0]);
      const b = held.get(state.ids[1]);
      if (a && b)
        host.cameraMoved(
          pinchTo(state.start, host.size(), { a: state.from[0], b: state.from[1] }, { a: { ...a }, b: { ...b } }),
        );
    }
  }

  function followPan(raw: RawPointer): void {
    if (state.name === 'pan') host.cameraMoved(panBy(state.start, raw.x - state.from.x, raw.y - state.from.y));
  }

  function endCamera(): void {
    if (state.name === 'pan' || state.name === 'pinch') host.cameraDone();
  }

  function up(raw: RawPointer): void {
    if (!held.delete(raw.id)) return;
    if (state.name === 'stroke' && state.id === raw.id) {
      host.stroke(eventOf('up', raw));
      state = { name: held.size > 0 ? 'spent' : 'idle' };
    } else if (state.name === 'mayPan' && state.id === raw.id) {
      // A finger that never moved still points at a thing: the same tap a pen would make.
      host.stroke(eventOf('down', state.down));
      host.stroke(eventOf('up', raw));
      state = { name: 'idle' };
    } else if (state.name === 'pan' && state.id === raw.id) {
      endCamera();
      state = { name: held.size > 0 ? 'spent' : 'idle' };
    } else if (state.name === 'pinch' && state.ids.includes(raw.id)) {
      endCamera();
      const left = [...held][0];
      if (left) beginPan(left[0], left[1].x, left[1].y);
      else state = { name: 'idle' };
    }
    if (held.size === 0) state = { name: 'idle' };
  }

  function cancel(): void {
    takeBackStroke();
    endCamera();
    held.clear();
    state = { name: 'idle' };
  }

  function hover(raw: RawPointer): void {
    if (state.name === 'idle' && Number.isFinite(raw.x) && Number.isFinite(raw.y)) host.stroke(eventOf('hover', raw));
  }

  return { down, move, up, cancel, hover, stateName: () => state.name };
}
