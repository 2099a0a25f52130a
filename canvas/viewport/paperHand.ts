import { PointerType, type GestureTouchEvent } from 'react-native-gesture-handler';
import type { PointerKind, StrokeEvent } from '../input/events';
import { createPointerDesk, type RawPointer } from '../input/pointerDesk';
import { panBy, transformBetween, zoomAbout, type Camera, type ViewSize } from './camera';
import { listenToElement } from './wheel';
import type { Listening } from './wheel.types';
import { moveWrapper } from './wrapper';

/** What the hand on the paper needs of the screen as it is now. */
export interface PaperHandHost {
  /** The camera that the picture is drawn for. */
  readonly camera: Camera;
  readonly size: ViewSize;
  readonly onCamera: (camera: Camera) => void;
  readonly onStroke: (event: StrokeEvent) => 'keep' | 'pan';
  readonly fingersOnlyMove: boolean;
  readonly onPenSeen: () => void;
}

export interface PaperHand {
  down(event: GestureTouchEvent): void;
  move(event: GestureTouchEvent): void;
  up(event: GestureTouchEvent): void;
  cancel(): void;
  /** The wrapper around the picture, that is moved during a gesture. */
  holdWrapper(view: unknown): void;
  /** The picture was drawn for a new camera: the wrapper goes back to rest in the same frame. */
  rest(): void;
  /** Listens to the wheel and what hovers; answers how to stop. */
  listen(element: unknown): () => void;
}

/** The wheel says nothing when it stops: after this long without a turn it has. */
const WHEEL_REST = 140;

const KINDS: Readonly<Record<number, PointerKind>> = { [PointerType.STYLUS]: 'pen', [PointerType.MOUSE]: 'mouse' };

/** Moves the paper by a transform while fingers or the wheel turn it, and hands strokes on. */
export function createPaperHand(now: () => PaperHandHost): PaperHand {
  let listening: Listening | null = null;
  let wheelTimer: ReturnType<typeof setTimeout> | undefined;
  let wrapper: unknown = null;
  /** Where the fingers have moved the paper to; null at rest. */
  let moved: Camera | null = null;

  function cameraNow(): Camera {
    return moved ?? now().camera;
  }

  function moveTo(next: Camera): void {
    moved = next;
    moveWrapper(wrapper, transformBetween(now().camera, next));
  }

  function settle(): void {
    clearTimeout(wheelTimer);
    if (moved) now().onCamera(moved);
  }

  const desk = createPointerDesk({
    camera: cameraNow,
    size: () => now().size,
    stroke: (event) => now().onStroke(event),
    cameraMoved: moveTo,
    cameraDone: settle,
    fingersOnlyMove: () => now().fingersOnlyMove,
    penSeen: () => now().onPenSeen(),
  });

  function raws(event: GestureTouchEvent): RawPointer[] {
    const held = listening?.held();
    return event.changedTouches.map((touch) => ({
      id: touch.id,
      // The gesture keeps the kind of its first pointer; a palm beside a pen needs its own.
      pointer: held?.pointer ?? KINDS[event.pointerType] ?? 'touch',
      x: touch.x,
      y: touch.y,
      time: held?.time ?? 0,
      modifiers: held,
      moves: held?.moves,
    }));
  }

  return {
    down: (event) => raws(event).forEach((raw) => desk.down(raw)),
    move: (event) => raws(event).forEach((raw) => desk.move(raw)),
    up: (event) => raws(event).forEach((raw) => desk.up(raw)),
    cancel: () => desk.cancel(),
    holdWrapper(view) {
      wrapper = view;
    },
    rest() {
      moved = null;
      moveWrapper(wrapper, { translateX: 0, translateY: 0, scale: 1 });
    },
    listen(element) {
      listening = listenToElement(element, {
        wheel(meaning, at) {
          const camera = cameraNow();
          moveTo(
            meaning.kind === 'zoom'
              ? zoomAbout(camera, now().size, at, meaning.factor)
              : panBy(camera, meaning.dx, meaning.dy),
          );
          clearTimeout(wheelTimer);
          wheelTimer = setTimeout(settle, WHEEL_REST);
        },
        hover: (pointer, at, time) => desk.hover({ id: -1, pointer, ...at, time, modifiers: listening?.held() }),
      });
      return () => {
        clearTimeout(wheelTimer);
        listening?.stop();
      };
    },
  };
}
