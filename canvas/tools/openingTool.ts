/** A tap on a run places a door, window or passage there; a drag slides it along before it is let go. */
import { newOpening, type OpeningKind } from '../../model/drawing/defaults';
import { addOpening } from '../../model/drawing/edits/openings';
import type { Drawing } from '../../model/drawing/schema';
import { roundTicks, ticks, type Ticks } from '../../model/length/ticks';
import type { StrokeEvent } from '../input/events';
import { EMPTY_PREVIEW } from '../store/preview';
import { runLine } from './edits';
import type { Tool, ToolHost } from './tool';

type State =
  | { readonly name: 'idle' }
  | {
      readonly name: 'dragging';
      readonly runId: string;
      readonly id: string;
      readonly width: Ticks;
      readonly asBegun: Drawing;
    };

export function createOpeningTool(host: ToolHost, kind: OpeningKind): Tool {
  const { draft } = host;
  let state: State = { name: 'idle' };

  function runUnder(event: StrokeEvent): string | null {
    const thing = host.hit(event.plan, host.reach(event.pointer));
    if (thing?.kind === 'run') return thing.id;
    if (thing?.kind === 'opening')
      return draft.get().drawing.openings.find((one) => one.id === thing.id)?.runId ?? null;
    if (thing?.kind !== 'corner' && thing?.kind !== 'pole') return null;
    // A finger at the end of a run reaches its corner first: the run that starts there is as near.
    const { runs } = draft.get().drawing;
    return (runs.find((run) => run.from === thing.id) ?? runs.find((run) => run.to === thing.id))?.id ?? null;
  }

  function slide(event: StrokeEvent): void {
    if (state.name !== 'dragging') return;
    const { runId, id, width, asBegun } = state;
    const line = runLine(asBegun, runId);
    if (!line) return;
    const along = (event.plan.x - line.from.x) * line.direction.x + (event.plan.y - line.from.y) * line.direction.y;
    const snapping = draft.get().snapping && !event.modifiers.alt;
    const reach = host.reach(event.pointer);
    const caught = host.catchOpening({ runId, raw: along - width / 2, width, reach, snapping, openingId: id });
    const at = roundTicks(Math.max(0, Math.min(line.length - width, caught.at)));
    draft.update((d) => addOpening(d, { kind, runId, at }, () => id));
    const place = { x: roundTicks(event.plan.x), y: roundTicks(event.plan.y) };
    draft.setPreview({ ...EMPTY_PREVIEW, pointer: event.pointer, at: place, caught: caught.word, length: at });
  }

  function cancel(): void {
    if (state.name === 'dragging') draft.cancel();
    draft.setPreview(null);
    state = { name: 'idle' };
  }

  return {
    handle(event) {
      if (event.kind === 'key' || event.kind === 'hover') return 'keep';
      if (event.kind === 'cancel') cancel();
      if (event.kind === 'down') {
        const runId = runUnder(event);
        if (runId === null) return 'keep';
        const asBegun = draft.get().drawing;
        draft.begin('plan.did.placeOpening');
        const id = host.newId();
        const { width } = newOpening(asBegun.units, kind, { id, runId, at: ticks(0) });
        state = { name: 'dragging', runId, id, width, asBegun };
        slide(event);
      } else if (event.kind === 'move') {
        if (state.name === 'idle') return 'pan';
        slide(event);
      } else if (event.kind === 'up' && state.name === 'dragging') {
        const { id } = state;
        draft.commit();
        state = { name: 'idle' };
        draft.setTool('select');
        draft.select({ kind: 'opening', id });
      }
      return 'keep';
    },
    leave: cancel,
    finish() {
      const dragging = state.name === 'dragging';
      cancel();
      return dragging;
    },
    stepBack() {
      const dragging = state.name === 'dragging';
      if (dragging) cancel();
      return dragging;
    },
    stateName: () => state.name,
  };
}
