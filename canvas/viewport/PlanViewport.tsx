import { useEffect, useLayoutEffect, useMemo, useRef, useState, type ReactNode } from 'react';
import { View, type LayoutChangeEvent, type ViewStyle } from 'react-native';
import { Gesture, GestureDetector } from 'react-native-gesture-handler';
import Animated from 'react-native-reanimated';
import type { Camera, ViewSize } from './camera';
import { createPaperHand, type PaperHandHost } from './paperHand';
import { useGlide } from './useGlide';
import { useLatest } from './useLatest';

export interface PlanViewportProps extends PaperHandHost {
  readonly onSize: (size: ViewSize) => void;
  /** Where a camera that moved by itself comes from; null where a hand moved it. */
  readonly glideFrom?: Camera | null;
  /** Read aloud for the drawing as a whole. */
  readonly label: string;
  readonly children: ReactNode;
}

/** The paper under the finger: one gesture detector around the whole picture, moved by a transform until a gesture ends. */
export function PlanViewport(props: PlanViewportProps) {
  const { camera, size, label, children, onSize, glideFrom = null } = props;
  const area = useRef<View>(null);
  const wrapper = useRef<View>(null);
  const glide = useGlide(camera, glideFrom);
  const latest = useLatest<PaperHandHost>(props);
  const [hand] = useState(() => createPaperHand(latest));

  useLayoutEffect(() => {
    hand.holdWrapper(wrapper.current);
    hand.rest();
  }, [hand, camera]);
  useEffect(() => hand.listen(area.current), [hand]);

  const gesture = useMemo(
    () =>
      Gesture.Manual()
        .runOnJS(true)
        .shouldCancelWhenOutside(false)
        .onTouchesDown((event, manager) => {
          manager.activate();
          hand.down(event);
        })
        .onTouchesMove((event) => hand.move(event))
        .onTouchesUp((event, manager) => {
          hand.up(event);
          if (event.numberOfTouches === 0) manager.end();
        })
        .onTouchesCancelled(() => hand.cancel()),
    [hand],
  );

  function onLayout(event: LayoutChangeEvent): void {
    const { width, height } = event.nativeEvent.layout;
    if (width !== size.width || height !== size.height) onSize({ width, height });
  }

  return (
    <GestureDetector gesture={gesture} touchAction="none" userSelect="none">
      <View ref={area} onLayout={onLayout} role="img" aria-label={label} style={fill} collapsable={false}>
        <View ref={wrapper} style={layer} collapsable={false}>
          <Animated.View style={[layer, glide]}>{children}</Animated.View>
        </View>
      </View>
    </GestureDetector>
  );
}

const fill: ViewStyle = { flex: 1, overflow: 'hidden', minHeight: 0 };
const layer: ViewStyle = { position: 'absolute', left: 0, top: 0, right: 0, bottom: 0 };
