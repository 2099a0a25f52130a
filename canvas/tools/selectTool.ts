/** Taps select; in the edit state, drags move what they began on: a corner, a run sideways, an opening along its run. */
import { joinCorners, joinCornerToRun } from '../../model/drawing/edits/joinCorners';
import { moveKeepClear, moveKeepClearPoint } from '../../model/drawing/edits/keepClears';
import { moveCorner } from '../../model/drawing/edits/moveCorners';
import { moveOpening } from '../../model/drawing/edits/openings';
import { slideRun } from '../../model/drawing/edits/slideRun';
import type { Drawing } from '../../model/drawing/schema';
import type { PlanPoint } from '../../model/geometry/point';
import { add, distance, dot, sub } from '../../model/geometry/vec';
import { roundTicks, roundToStep, type Ticks } from '../../model/length/ticks';
import type { ThingRef } from '../../model/things';
import { isDrag, type StrokeEvent } from '../input/events';
import { EMPTY_PREVIEW } from '../store/preview';
import { cornerById, neighboursOf, openingById, runLine } from './edits';
import type { Caught, Tool, ToolHost } from './tool';

type Grip =
  | { readonly kind: 'corner'; readonly id: string; readonly from: PlanPoint }
  | { readonly kind: 'run'; readonly id: string }
  | { readonly kind: 'opening'; readonly id: string; readonly runId: string; readonly at: Ticks; readonly width: Ticks }
  | { readonly kind: 'point'; readonly id: string; readonly index: number; readonly from: PlanPoint }
  | { readonly kind: 'keepClear'; readonly id: string };

type State =
  | { readonly name: 'idle' }
  | { readonly name: 'pointing'; readonly down: StrokeEvent; readonly thing: ThingRef | null }
  | {
      readonly name: 'dragging';
      readonly down: StrokeEvent;
      readonly grip: Grip;
      readonly asBegun: Drawing;
      readonly caught: Caught | null;
    };

const LABELS: Readonly<Record<Grip['kind'], string>> = {
  corner: 'plan.did.moveCorner',
  run: 'plan.did.slideRun',
  opening: 'plan.did.slideOpening',
  point: 'plan.did.movePoint',
  keepClear: 'plan.did.movePoint',
};

export function createSelectTool(host: ToolHost): Tool {
  const { draft } = host;
  let state: State = { name: 'idle' };

  function gripOf(thing: ThingRef | null, down: StrokeEvent): Grip | null {
    const { drawing } = draft.get();
    if (!thing) return null;
    if (thing.kind === 'corner' || thing.kind === 'pole') {
      const corner = cornerById(drawing, thing.id);
      return corner && { kind: 'corner', id: corner.id, from: { x: corner.x, y: corner.y } };
    }
    if (thing.kind === 'run') return { kind: 'run', id: thing.id };
    if (thing.kind === 'opening') {
      const opening = openingById(drawing, thing.id);
      return opening && { kind: 'opening', id: opening.id, runId: opening.runId, at: opening.at, width: opening.width };
    }
    if (thing.kind !== 'keepClear') return null;
    const area = drawing.keepClears.find((one) => one.id === thing.id);
    const reach = host.reach(down.pointer);
    const index = area?.points.findIndex((point) => distance(point, down.plan) <= reach) ?? -1;
    const from = area?.points[index];
    return from ? { kind: 'point', id: thing.id, index, from } : { kind: 'keepClear', id: thing.id };
  }

  function drag(grip: Grip, asBegun: Drawing, down: StrokeEvent, event: StrokeEvent): Caught | null {
    const delta = sub(event.plan, down.plan);
    const snapping = draft.get().snapping && !event.modifiers.alt;
    const reach = host.reach(event.pointer);
    const shown = { ...EMPTY_PREVIEW, pointer: event.pointer };
    if (grip.kind === 'corner' || grip.kind === 'point') {
      const held = grip.kind === 'corner' ? neighboursOf(asBegun, grip.id) : null;
      const caught = host.catchPoint(add(grip.from, delta), {
        reach,
        snapping,
        from: held?.anchors[0] ?? null,
        also: held?.anchors.slice(1),
        without: held?.moving,
      });
      draft.update((d) =>
        grip.kind === 'corner'
          ? moveCorner(d, grip.id, caught.at)
          : moveKeepClearPoint(d, grip.id, grip.index, caught.at),
      );
      draft.setPreview({ ...shown, at: caught.at, guides: caught.guides, caught: caught.word });
      return caught;
    } else if (grip.kind === 'run') {
      const line = runLine(asBegun, grip.id);
      if (!line) return null;
      const { at: by, word } = host.catchSlide({ runId: grip.id, raw: dot(delta, line.inward), reach, snapping });
      draft.update((d) => slideRun(d, grip.id, by));
      const at = { x: roundTicks(event.plan.x), y: roundTicks(event.plan.y) };
      draft.setPreview({ ...shown, at, caught: word, length: roundTicks(Math.abs(by)) });
    } else if (grip.kind === 'opening') {
      const line = runLine(asBegun, grip.runId);
      if (!line) return null;
      const raw = grip.at + dot(delta, line.direction);
      const { runId, width, id: openingId } = grip;
      const caught = host.catchOpening({ runId, raw, width, reach, snapping, openingId });
      draft.update((d) => moveOpening(d, grip.id, grip.runId, caught.at));
      const at = { x: roundTicks(event.plan.x), y: roundTicks(event.plan.y) };
      draft.setPreview({ ...shown, at, caught: caught.word, length: caught.at });
    } else {
      const by = { x: roundToStep(delta.x, asBegun.tapeStep), y: roundToStep(delta.y, asBegun.tapeStep) };
      draft.update((d) => moveKeepClear(d, grip.id, by));
      draft.setPreview(shown);
    }
    return null;
  }

  /** A corner let go of on another, or on a run, is joined to it: an outline closes, or a tee is made. */
  function join(grip: Grip, caught: Caught | null): void {
    if (grip.kind !== 'corner' || !caught) return;
    const { cornerId, onRun } = caught;
    if (cornerId !== null) {
      draft.update((d) => joinCorners(d, grip.id, cornerId));
      draft.select({ kind: 'corner', id: cornerId });
    } else if (onRun) {
      draft.update((d) => joinCornerToRun(d, grip.id, onRun.runId, onRun.at, host.newId));
    }
  }

  function cancel(): void {
    if (state.name === 'dragging') draft.cancel();
    draft.setPreview(null);
    state = { name: 'idle' };
  }

  return {
    handle(event) {
      if (event.kind === 'key' || event.kind === 'hover') return 'keep';
      if (event.kind === 'down') {
        state = {
          name: 'pointing',
          down: event,
          thing: meant(host.hit(event.plan, host.reach(event.pointer)), draft.get().drawing),
        };
        return 'keep';
      }
      if (event.kind === 'cancel') {
        cancel();
        return 'keep';
      }
      if (event.kind === 'move') {
        if (state.name === 'pointing' && isDrag(event.pointer, state.down.screen, event.screen)) {
          const grip = draft.get().mode === 'edit' ? gripOf(state.thing, state.down) : null;
          if (!grip) {
            state = { name: 'idle' };
            return 'pan';
          }
          draft.select(state.thing);
          draft.begin(LABELS[grip.kind]);
          state = { name: 'dragging', down: state.down, grip, asBegun: draft.get().drawing, caught: null };
        }
        if (state.name === 'dragging') state = { ...state, caught: drag(state.grip, state.asBegun, state.down, event) };
        return 'keep';
      }
      if (state.name === 'dragging') {
        join(state.grip, state.caught);
        draft.commit();
        draft.setPreview(null);
      } else if (state.name === 'pointing') {
        draft.select(state.thing);
      }
      state = { name: 'idle' };
      return 'keep';
    },
    leave: cancel,
    finish() {
      if (state.name === 'idle') return false;
      cancel();
      return true;
    },
    stepBack() {
      const dragging = state.name === 'dragging';
      if (dragging) cancel();
      return dragging;
    },
    stateName: () => state.name,
  };
}

/** A pole and its braces stand for the corner they belong to; a pole along a run stands for itself. */
function meant(thing: ThingRef | null, drawing: Drawing): ThingRef | null {
  if (thing?.kind !== 'pole' && thing?.kind !== 'brace') return thing;
  const poleId = thing.kind === 'brace' ? thing.id.replace(/\.\d+$/, '') : thing.id;
  return cornerById(drawing, poleId) ? { kind: 'corner', id: poleId } : { kind: 'pole', id: poleId };
}
