import { useWindowDimensions } from 'react-native';

export type LayoutName = 'phone' | 'tablet' | 'wide';

export interface Layout {
  readonly name: LayoutName;
  readonly width: number;
  readonly height: number;
}

/** Which of the three layouts a window of this width takes. */
export function layoutFor(width: number): LayoutName {
  if (width < 700) return 'phone';
  return width < 1200 ? 'tablet' : 'wide';
}

/** The layout of the window now, and its size in pixels. */
export function useLayout(): Layout {
  const { width, height } = useWindowDimensions();
  return { name: layoutFor(width), width, height };
}
