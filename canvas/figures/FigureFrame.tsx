import { useMemo, useRef, useState } from 'react';
import { View } from 'react-native';
import type { Vec } from '../../model/geometry/point';
import { HIT_REACH, isDrag, type StrokeEvent } from '../input/events';
import { PlanViewport } from '../viewport/PlanViewport';
import type { Camera, Padding, ViewSize } from '../viewport/camera';
import { FigureView } from './FigureView';
import { boxInView, fitDrawing, fitLabels, type MakeFigure } from './fit';
import { labelScale } from './labelScale';

interface Props {
  /** The same function for as long as the figure is the same. */
  readonly make: MakeFigure;
  /** What is shown: when it changes, the figure is fitted anew; otherwise it stays where it was moved to. */
  readonly of: string;
  readonly label: string;
  /** A place pointed at, in the figure's ticks, and how far around it a thing is still meant. */
  readonly onTap?: (at: Vec, reach: number) => void;
  /** Labels stand beside the drawing and are fitted with it, or find room inside what is in view. */
  readonly labels?: 'beside' | 'inView';
  /** Another figure that is fitted together with this one, so that both stand alike beside one another. */
  readonly alongside?: MakeFigure;
  /** Where it was moved to, when that is shared with another figure; null while it is as fitted. */
  readonly shared?: { readonly camera: Camera | null; readonly onCamera: (camera: Camera) => void };
}

const BESIDE: Padding = { left: 14, top: 14, right: 14, bottom: 14 };
/** Room for a letter or a dimension outside the braces' feet. */
const IN_VIEW: Padding = { left: 40, top: 40, right: 40, bottom: 40 };
const EDGE = 6;
const NO_SIZE: ViewSize = { width: 0, height: 0 };
const nothing = () => undefined;

/** A figure fitted into its box; fingers and the wheel move it, and a tap says where. */
export function FigureFrame({ make, of, label, onTap, labels = 'beside', alongside, shared }: Props) {
  const [size, setSize] = useState<ViewSize>(NO_SIZE);
  const [moved, setMoved] = useState<{ of: string; camera: Camera } | null>(null);
  const down = useRef<StrokeEvent | null>(null);
  const there = size.width > 0 && size.height > 0;
  const fitted = useMemo(() => {
    const makes = alongside ? [make, alongside] : [make];
    return labels === 'inView' ? fitDrawing(makes, size, IN_VIEW) : fitLabels(makes, size, BESIDE);
  }, [make, alongside, size, labels]);
  const own = moved?.of === of ? moved.camera : null;
  const camera = (shared ? shared.camera : own) ?? fitted;
  const figure = useMemo(
    () => make(labelScale(camera.scale), labels === 'inView' ? boxInView(camera, size, EDGE) : null),
    [make, camera, size, labels],
  );

  function onStroke(event: StrokeEvent): 'keep' | 'pan' {
    if (event.kind === 'down') down.current = event;
    const from = down.current;
    if (event.kind === 'move' && from && isDrag(event.pointer, from.screen, event.screen)) {
      down.current = null;
      return 'pan';
    }
    if (event.kind === 'up' && from) onTap?.(event.plan, HIT_REACH[event.pointer] / camera.scale);
    if (event.kind === 'up' || event.kind === 'cancel') down.current = null;
    return 'keep';
  }

  return (
    <View style={{ flex: 1, minHeight: 0 }}>
      <PlanViewport
        camera={camera}
        size={size}
        onSize={setSize}
        onCamera={(next) => (shared ? shared.onCamera(next) : setMoved({ of, camera: next }))}
        onStroke={onStroke}
        fingersOnlyMove={false}
        onPenSeen={nothing}
        label={label}
      >
        {there ? <FigureView figure={figure} camera={camera} size={size} /> : null}
      </PlanViewport>
    </View>
  );
}
