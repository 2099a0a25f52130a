/** Taps go round an area that must stay free, or the site's boundary; a tap on the first point closes it. */
import { addKeepClear, setBoundary } from '../../model/drawing/edits/keepClears';
import type { PlanPoint } from '../../model/geometry/point';
import { distance } from '../../model/geometry/vec';
import { isDrag, type StrokeEvent } from '../input/events';
import { EMPTY_PREVIEW } from '../store/preview';
import type { Caught, Tool, ToolHost } from './tool';

type State =
  | { readonly name: 'idle' }
  | { readonly name: 'outlining'; readonly points: readonly PlanPoint[]; readonly pressed: StrokeEvent | null };

export function createKeepClearTool(host: ToolHost): Tool {
  const { draft } = host;
  let state: State = { name: 'idle' };

  function caughtAt(event: StrokeEvent): Caught {
    const points = state.name === 'outlining' ? state.points : [];
    const last = points.at(-1);
    return host.catchPoint(event.plan, {
      reach: host.reach(event.pointer),
      snapping: draft.get().snapping && !event.modifiers.alt,
      from: last ? { point: last } : null,
      points: points.length >= 3 ? points.slice(0, 1) : [],
    });
  }

  function show(event: StrokeEvent): void {
    const points = state.name === 'outlining' ? state.points : [];
    const { at, guides, word } = caughtAt(event);
    draft.setPreview({ ...EMPTY_PREVIEW, pointer: event.pointer, at, guides, caught: word, outline: [...points, at] });
  }

  function close(points: readonly PlanPoint[]): void {
    drop();
    if (points.length < 3) return;
    if (draft.get().area === 'boundary') {
      draft.edit('plan.did.boundary', (d) => setBoundary(d, points));
      draft.setTool('select');
      draft.select({ kind: 'boundary', id: 'boundary' });
      return;
    }
    const id = host.newId();
    draft.edit('plan.did.keepClear', (d) => addKeepClear(d, { name: '', points }, () => id));
    draft.setTool('select');
    draft.select({ kind: 'keepClear', id });
  }

  function drop(): void {
    state = { name: 'idle' };
    draft.setPreview(null);
  }

  function add(event: StrokeEvent): void {
    const points = state.name === 'outlining' ? state.points : [];
    const { at } = caughtAt(event);
    const first = points[0];
    const reach = host.reach(event.pointer);
    if (first && points.length >= 3 && distance(first, event.plan) <= reach) return close(points);
    const last = points.at(-1);
    state = { name: 'outlining', points: last && distance(last, at) < 1 ? points : [...points, at], pressed: null };
    show(event);
  }

  return {
    handle(event) {
      if (event.kind === 'key') return 'keep';
      if (event.kind === 'down') {
        state = { name: 'outlining', points: state.name === 'outlining' ? state.points : [], pressed: event };
        show(event);
      } else if (event.kind === 'move') {
        const pressed = state.name === 'outlining' ? state.pressed : null;
        // The first press may be meant to move the paper: nothing is there yet to be drawn on.
        if (
          pressed &&
          state.name === 'outlining' &&
          state.points.length === 0 &&
          isDrag(event.pointer, pressed.screen, event.screen)
        ) {
          drop();
          return 'pan';
        }
        show(event);
      } else if (event.kind === 'up') add(event);
      else if (event.kind === 'cancel') {
        if (state.name === 'outlining' && state.points.length > 0) {
          state = { ...state, pressed: null };
          draft.setPreview({ ...EMPTY_PREVIEW, outline: state.points });
        } else drop();
      } else if (state.name === 'outlining') show(event);
      return 'keep';
    },
    leave: drop,
    finish() {
      if (state.name === 'idle') return false;
      close(state.points);
      return true;
    },
    stepBack() {
      if (state.name !== 'outlining' || state.points.length === 0) return false;
      const points = state.points.slice(0, -1);
      if (points.length === 0) drop();
      else {
        state = { name: 'outlining', points, pressed: null };
        draft.setPreview({ ...EMPTY_PREVIEW, outline: points });
      }
      return true;
    },
    stateName: () => state.name,
  };
}
