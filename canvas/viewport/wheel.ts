import type { ElementEars, HeldDown, Listening } from './wheel.types';

const NOTHING_HELD: HeldDown = { pointer: null, moves: false, shift: false, alt: false, command: false, time: 0 };

/** Without a browser there is no wheel and nothing hovers. */
export function listenToElement(_element: unknown, _ears: ElementEars): Listening {
  return { held: () => ({ ...NOTHING_HELD, time: Date.now() }), stop: () => undefined };
}
