import type { WrapperTransform } from './camera';

/**
 * Moves the wrapper around the picture without rendering anything. Written straight to the element, so that a redrawn
 * picture and the transform's return to rest land in the same frame.
 */
export function moveWrapper(view: unknown, { translateX, translateY, scale }: WrapperTransform): void {
  if (!(view instanceof HTMLElement)) return;
  const rest = translateX === 0 && translateY === 0 && scale === 1;
  view.style.transform = rest ? '' : `translate(${translateX}px, ${translateY}px) scale(${scale})`;
}
