import { wheelMeaning } from './wheelMeaning';
import type { ElementEars, HeldDown, Listening } from './wheel.types';

/**
 * Listens on the drawing's own element. The wheel's listener is not passive, because a trackpad pinch would otherwise
 * zoom the whole page; React's own wheel handlers are passive.
 */
export function listenToElement(element: unknown, ears: ElementEars): Listening {
  if (!(element instanceof HTMLElement)) {
    return { held: () => heldOf(null), stop: () => undefined };
  }
  const node = element;
  let last: HeldDown = heldOf(null);

  function place(event: MouseEvent): { x: number; y: number } {
    const box = node.getBoundingClientRect();
    return { x: event.clientX - box.left, y: event.clientY - box.top };
  }

  function onWheel(event: WheelEvent): void {
    event.preventDefault();
    const meaning = wheelMeaning({
      deltaX: event.deltaX,
      deltaY: event.deltaY,
      deltaMode: event.deltaMode,
      ctrl: event.ctrlKey || event.metaKey,
    });
    if (meaning) ears.wheel(meaning, place(event));
  }

  function onPointer(event: PointerEvent): void {
    last = heldOf(event);
    if (event.type === 'pointermove' && event.buttons === 0 && event.pointerType !== 'touch') {
      ears.hover(event.pointerType === 'pen' ? 'pen' : 'mouse', place(event), event.timeStamp);
    }
  }

  function onMenu(event: Event): void {
    event.preventDefault();
  }

  node.addEventListener('wheel', onWheel, { passive: false });
  node.addEventListener('pointerdown', onPointer, { capture: true });
  node.addEventListener('pointermove', onPointer, { capture: true });
  node.addEventListener('pointerup', onPointer, { capture: true });
  node.addEventListener('contextmenu', onMenu);
  return {
    held: () => last,
    stop() {
      node.removeEventListener('wheel', onWheel);
      node.removeEventListener('pointerdown', onPointer, { capture: true });
      node.removeEventListener('pointermove', onPointer, { capture: true });
      node.removeEventListener('pointerup', onPointer, { capture: true });
      node.removeEventListener('contextmenu', onMenu);
    },
  };
}

function heldOf(event: PointerEvent | null): HeldDown {
  const kind = event?.pointerType;
  return {
    pointer: kind === 'pen' || kind === 'mouse' || kind === 'touch' ? kind : null,
    moves: event !== null && event.pointerType === 'mouse' && (event.buttons & 6) !== 0 && (event.buttons & 1) === 0,
    shift: event?.shiftKey ?? false,
    alt: event?.altKey ?? false,
    command: (event?.ctrlKey ?? false) || (event?.metaKey ?? false),
    time: event?.timeStamp ?? 0,
  };
}
