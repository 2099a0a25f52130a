import type { WrapperTransform } from './camera';

interface NativeView {
  setNativeProps(props: object): void;
}

/** Moves the wrapper around the picture without rendering anything. */
export function moveWrapper(view: unknown, { translateX, translateY, scale }: WrapperTransform): void {
  (view as NativeView | null)?.setNativeProps({ style: { transform: [{ translateX }, { translateY }, { scale }] } });
}
