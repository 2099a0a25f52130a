import { useEffect, useLayoutEffect, useMemo, useRef, useState, type ReactNode } from 'react';
import { View, type LayoutChangeEvent, type ViewStyle } from 'react-native';
import { Gesture, GestureDetector, PointerType, type GestureTouchEvent } from 'react-native-gesture-handler';
import type { PointerKind, StrokeEvent } from '../input/events';
import { createPointerDesk, type RawPointer } from '../input/pointerDesk';
import { panBy, transformBetween, zoomAbout, type Camera, type ViewSize } from './camera';
import { listenToElement } from './wheel';
import type { Listening } from './wheel.types';
import { moveWrapper } from './wrapper';

export interface PlanViewportProps {
  /** The camera that the children are drawn for. */
  readonly camera: Camera;
  readonly size: ViewSize;
  readonly onSize: (size: ViewSize) => void;
  /** At the end of a pan, pinch or wheel turn. */
  readonly onCamera: (camera: Camera) => void;
  readonly onStroke: (event: StrokeEvent) => 'keep' | 'pan';
  readonly fingersOnlyMove: boolean;
  readonly onPenSeen: () => void;
  /** Read aloud for the drawing as a whole. */
  readonly label: string;
  readonly children: ReactNode;
}

/** The wheel says nothing when it stops: after this long without a turn it has. */
const WHEEL_REST = 140;

const KINDS: Readonly<Record<number, PointerKind>> = { [PointerType.STYLUS]: 'pen', [PointerType.MOUSE]: 'mouse' };

/** The paper under the finger: one gesture detector around the whole picture, moved by a transform until a gesture ends. */
export function PlanViewport(props: PlanViewportProps) {
  const { camera, size, label, children } = props;
  const area = useRef<View>(null);
  const wrapper = useRef<View>(null);
  const latest = useRef(props);
  /** Where the fingers have moved the paper to; null at rest. */
  const moved = useRef<Camera | null>(null);
  const [hand] = useState(() => {
    let listening: Listening | null = null;
    let wheelTimer: ReturnType<typeof setTimeout> | undefined;

    function now(): Camera {
      return moved.current ?? latest.current.camera;
    }

    function moveTo(next: Camera): void {
      moved.current = next;
      moveWrapper(wrapper.current, transformBetween(latest.current.camera, next));
    }

    function settle(): void {
      clearTimeout(wheelTimer);
      const end = moved.current;
      if (end) latest.current.onCamera(end);
    }

    const desk = createPointerDesk({
      camera: now,
      size: () => latest.current.size,
      stroke: (event) => latest.current.onStroke(event),
      cameraMoved: moveTo,
      cameraDone: settle,
      fingersOnlyMove: () => latest.current.fingersOnlyMove,
      penSeen: () => latest.current.onPenSeen(),
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
      desk,
      raws,
      listen(element: unknown) {
        listening = listenToElement(element, {
          wheel(meaning, at) {
            const next =
              meaning.kind === 'zoom'
                ? zoomAbout(now(), latest.current.size, at, meaning.factor)
                : panBy(now(), meaning.dx, meaning.dy);
            moveTo(next);
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
  });

  useLayoutEffect(() => {
    latest.current = props;
  });
  useLayoutEffect(() => {
    // The picture has been drawn for the new camera: the wrapper goes back to rest in the same frame.
    moved.current = null;
    moveWrapper(wrapper.current, { translateX: 0, translateY: 0, scale: 1 });
  }, [camera]);
  useEffect(() => hand.listen(area.current), [hand]);

  const gesture = useMemo(
    () =>
      Gesture.Manual()
        .runOnJS(true)
        .shouldCancelWhenOutside(false)
        .onTouchesDown((event, manager) => {
          manager.activate();
          for (const raw of hand.raws(event)) hand.desk.down(raw);
        })
        .onTouchesMove((event) => {
          for (const raw of hand.raws(event)) hand.desk.move(raw);
        })
        .onTouchesUp((event, manager) => {
          for (const raw of hand.raws(event)) hand.desk.up(raw);
          if (event.numberOfTouches === 0) manager.end();
        })
        .onTouchesCancelled(() => hand.desk.cancel()),
    [hand],
  );

  function onLayout(event: LayoutChangeEvent): void {
    const { width, height } = event.nativeEvent.layout;
    if (width !== size.width || height !== size.height) props.onSize({ width, height });
  }

  return (
    <GestureDetector gesture={gesture} touchAction="none" userSelect="none">
      <View ref={area} onLayout={onLayout} role="img" aria-label={label} style={fill} collapsable={false}>
        <View ref={wrapper} style={layer} collapsable={false}>
          {children}
        </View>
      </View>
    </GestureDetector>
  );
}

const fill: ViewStyle = { flex: 1, overflow: 'hidden', minHeight: 0 };
const layer: ViewStyle = { position: 'absolute', left: 0, top: 0, right: 0, bottom: 0 };
