import { useLayoutEffect } from 'react';
import { Easing, useAnimatedStyle, useReducedMotion, useSharedValue, withTiming } from 'react-native-reanimated';
import { transformBetween, type Camera } from './camera';

const GLIDE_MS = 180;
const REST = { translateX: 0, translateY: 0, scale: 1 };

/**
 * The glide of a camera that moved by itself: the picture is already drawn for where it went, starts as it looked from
 * `from`, and comes to rest. Nothing glides where the person asked for less motion, or moved the camera by hand.
 */
export function useGlide(camera: Camera, from: Camera | null) {
  const still = useReducedMotion();
  const start = useSharedValue(REST);
  /** What is left of the way: 1 at the start, 0 at rest. */
  const left = useSharedValue(0);

  // In a layout effect: the first frame that shows the new picture shows it from where it was looked at before.
  useLayoutEffect(() => {
    if (from === null || still) {
      left.set(0);
      return;
    }
    start.set(transformBetween(camera, from));
    left.set(1);
    left.set(withTiming(0, { duration: GLIDE_MS, easing: Easing.out(Easing.cubic) }));
  }, [camera, from, still, start, left]);

  return useAnimatedStyle(() => {
    const { translateX, translateY, scale } = start.get();
    const way = left.get();
    return {
      transform: [{ translateX: translateX * way }, { translateY: translateY * way }, { scale: 1 + (scale - 1) * way }],
    };
  }, [start, left]);
}
