import { useCallback, useEffect, useRef, useState } from 'react';
import { planFigure } from '../../../model/figures/plan';
import { labelScale } from '../../figures/labelScale';
import { bringIntoView, clampCamera, zoomAbout, type Camera, type ViewSize } from '../../viewport/camera';
import { fitPlan, groundBox } from '../../viewport/fitPlan';
import type { Solved } from '../../store/solver';
import { useWorkspace } from '../workspace/workspace';

const PADDING = { left: 20, top: 20, right: 20, bottom: 20 };
const NO_SIZE: ViewSize = { width: 0, height: 0 };
/** A corner nearer to the view's edge than this is out of sight; it is brought in by a quarter of the view. */
const EDGE = 24;

interface Held {
  readonly camera: Camera | null;
  readonly size: ViewSize;
  readonly glideFrom: Camera | null;
}

/** The camera moved by itself. */
function glidedTo(before: Held, camera: Camera): Held {
  return camera === before.camera ? before : { ...before, camera, glideFrom: before.camera };
}

export interface PlanCamera {
  /** Null until the view has a size. */
  readonly camera: Camera | null;
  readonly size: ViewSize;
  /** Where it was looked at from before the camera moved by itself: it glides from there. Null when a hand moved it. */
  readonly glideFrom: Camera | null;
  readonly onSize: (size: ViewSize) => void;
  readonly setCamera: (camera: Camera) => void;
  readonly fit: () => void;
  readonly zoomBy: (factor: number) => void;
}

/** Fits the building with its poles and dimensions into a view; the boundary and areas give way. */
export function fitSolved({ drawing, setOut }: Solved, size: ViewSize): Camera {
  const building = { ...drawing, boundary: null, keepClears: [] };
  return fitPlan({
    drawing,
    setOut,
    size,
    padding: PADDING,
    labelScale,
    figureAt: (scale) => planFigure(building, setOut, { selection: null, scale, dimensions: true }),
  });
}

/** What is drawn stays where it is on the screen when the view grows or shrinks at its right or bottom. */
function heldTopLeft(camera: Camera, before: ViewSize, now: ViewSize): Camera {
  const dx = (now.width - before.width) / 2 / camera.scale;
  const dy = (now.height - before.height) / 2 / camera.scale;
  return { ...camera, x: camera.x + dx, y: camera.y - dy };
}

/** The camera over the plan: fitted when the view first has a size, and kept on what it shows as the view changes. */
export function usePlanCamera(): PlanCamera {
  const { solver, draft } = useWorkspace();
  const [state, setState] = useState<Held>({ camera: null, size: NO_SIZE, glideFrom: null });
  /** True until the person has moved the paper: then a change of the view's size fits it anew. */
  const fitted = useRef(true);

  const onSize = useCallback(
    (size: ViewSize) => {
      setState((before) => {
        if (size.width <= 0 || size.height <= 0) return before;
        const { solved } = solver.get();
        const drawn = draft.get().preview?.run;
        if (before.camera && drawn && size.height < before.size.height) {
          // The keypad took the room: the corner that is being drawn from comes to the middle of what is left.
          fitted.current = false;
          return { camera: { ...before.camera, x: drawn.from.x, y: drawn.from.y }, size, glideFrom: null };
        }
        if (solved && (before.camera === null || fitted.current))
          return { camera: fitSolved(solved, size), size, glideFrom: null };
        if (!before.camera) return { ...before, size };
        return { camera: heldTopLeft(before.camera, before.size, size), size, glideFrom: null };
      });
    },
    [solver, draft],
  );

  const setCamera = useCallback(
    (camera: Camera) => {
      fitted.current = false;
      setState((before) => {
        const { solved } = solver.get();
        const box = solved && groundBox(solved.drawing, solved.setOut);
        const kept = box ? clampCamera(camera, box, before.size) : { ...camera };
        return { ...before, camera: kept, glideFrom: null };
      });
    },
    [solver],
  );

  const fit = useCallback(() => {
    fitted.current = true;
    setState((before) => {
      const { solved } = solver.get();
      return solved && before.size.width > 0 ? glidedTo(before, fitSolved(solved, before.size)) : before;
    });
  }, [solver]);

  const zoomBy = useCallback((factor: number) => {
    fitted.current = false;
    setState((before) => {
      const { camera, size } = before;
      const middle = { x: size.width / 2, y: size.height / 2 };
      return camera ? glidedTo(before, zoomAbout(camera, size, middle, factor)) : before;
    });
  }, []);

  // A typed length may end out of sight: where the run is drawn from, and to, come into view.
  useEffect(
    () =>
      draft.api.subscribe(({ preview }, { preview: previous }) => {
        const run = preview?.run;
        if (!run) return;
        const typed = run.heldLength !== null && run.heldLength !== previous?.run?.heldLength;
        const goesOn = run.from !== previous?.run?.from;
        if (!typed && !goesOn) return;
        setState((before) => {
          const { camera, size } = before;
          if (!camera || size.width === 0) return before;
          const margin = Math.min(size.width, size.height) / 4;
          const places = typed ? [run.from, run.to] : [run.from];
          const brought = bringIntoView(camera, size, places, { edge: EDGE, margin });
          if (brought !== camera) fitted.current = false;
          return glidedTo(before, brought);
        });
      }),
    [draft],
  );

  return { ...state, onSize, setCamera, fit, zoomBy };
}
