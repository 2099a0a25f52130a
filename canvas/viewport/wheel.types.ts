import type { PointerKind } from '../input/events';
import type { WheelMeaning } from './wheelMeaning';

/** What the drawing's element tells besides touches: the wheel, a pointer that hovers, and the buttons and keys held. */
export interface ElementEars {
  wheel(meaning: WheelMeaning, at: { readonly x: number; readonly y: number }): void;
  hover(pointer: 'mouse' | 'pen', at: { readonly x: number; readonly y: number }, time: number): void;
}

export interface HeldDown {
  /** What the last press or move was made with; null where the system itself does not say. */
  readonly pointer: PointerKind | null;
  /** Middle or right button. */
  readonly moves: boolean;
  readonly shift: boolean;
  readonly alt: boolean;
  readonly command: boolean;
  readonly time: number;
}

export interface Listening {
  /** Buttons and keys of the last press or move. */
  held(): HeldDown;
  stop(): void;
}
