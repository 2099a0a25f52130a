import { useMemo } from 'react';
import type { Box, Figure } from '../../../model/figures/figure';
import { planFigure } from '../../../model/figures/plan';
import { roundTicks } from '../../../model/length/ticks';
import { labelScale } from '../../figures/labelScale';
import { toPlan, type Camera, type ViewSize } from '../../viewport/camera';
import { useDraft, useSolved } from '../workspace/workspace';

/** What is in view, a little inside its edges. */
function boxInView(camera: Camera, size: ViewSize): Box {
  const inset = 6;
  const low = toPlan(camera, size, { x: inset, y: size.height - inset });
  const high = toPlan(camera, size, { x: size.width - inset, y: inset });
  return { left: roundTicks(low.x), bottom: roundTicks(low.y), right: roundTicks(high.x), top: roundTicks(high.y) };
}

/** The plan's figure for a camera: made again when the set-out, the selection or the camera is another. */
export function usePlanFigure(camera: Camera | null, size: ViewSize): Figure | null {
  const { drawing, setOut } = useSolved();
  const selection = useDraft((state) => state.selection);
  return useMemo(
    () =>
      camera &&
      planFigure(drawing, setOut, {
        selection,
        scale: labelScale(camera.scale),
        dimensions: true,
        cautions: true,
        within: boxInView(camera, size),
      }),
    [drawing, setOut, selection, camera, size],
  );
}
