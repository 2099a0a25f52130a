import { useEffect, useState } from 'react';
import type { Figure } from '../../../model/figures/figure';
import type { ThingRef } from '../../../model/things';
import type { ActionContext } from '../../actions/action';
import { runKey } from '../../actions/keys';
import { newWriteId } from '../../client/writeId';
import { HIT_REACH, isDrag, type StrokeEvent } from '../../input/events';
import type { DraftStore } from '../../store/draftStore';
import type { Solver } from '../../store/solver';
import { createToolDesk, type ToolDesk } from '../../tools/toolDesk';
import { createToolHost } from '../../tools/toolHost';
import { toScreen } from '../../viewport/camera';
import { useLatest } from '../../viewport/useLatest';
import { useWorkspace } from '../workspace/workspace';
import type { PlanCamera } from './usePlanCamera';

export interface PlanHand {
  readonly context: ActionContext;
  readonly onStroke: (event: StrokeEvent) => 'keep' | 'pan';
}

export interface PlanHandOf {
  readonly camera: PlanCamera;
  /** The figure as it is shown, for its dimensions to be tapped. */
  readonly figure: Figure | null;
  readonly onDimension: (thing: ThingRef) => void;
  /** Whether a length is being typed, so that digits are no commands. */
  readonly isTyping: boolean;
}

interface Hand extends PlanHand {
  readonly tools: ToolDesk;
}

function createHand(draft: DraftStore, solver: Solver, now: () => PlanHandOf): Hand {
  const newId = () => newWriteId().replaceAll('-', '').slice(0, 12);
  const host = createToolHost({
    draft,
    poles: () => solver.get().solved?.setOut.poles ?? null,
    scale: () => now().camera.camera?.scale ?? 1e-4,
    newId,
  });
  const tools = createToolDesk(host);
  const view = { fit: () => now().camera.fit(), zoomBy: (factor: number) => now().camera.zoomBy(factor) };
  const context: ActionContext = { draft, tools, view, newId };
  let pressed: { readonly down: StrokeEvent; readonly thing: ThingRef } | null = null;

  /** The run whose dimension is written where the pointer is; walls under it come first. */
  function dimensionUnder(event: StrokeEvent): ThingRef | null {
    const { figure, camera } = now();
    if (!figure || !camera.camera || draft.get().tool !== 'select') return null;
    if (host.hit(event.plan, host.reach('mouse'))) return null;
    for (const shape of figure.shapes) {
      if (shape.kind !== 'dimension' || !shape.thing) continue;
      const at = toScreen(camera.camera, camera.size, shape.textAt);
      const away = Math.hypot(at.x - event.screen.x, at.y - event.screen.y);
      if (away <= Math.max(18, HIT_REACH[event.pointer])) return shape.thing;
    }
    return null;
  }

  function onStroke(event: StrokeEvent): 'keep' | 'pan' {
    if (event.kind === 'down') {
      const thing = dimensionUnder(event);
      pressed = thing && { down: event, thing };
      if (thing) return 'keep';
    } else if (pressed && event.kind !== 'hover') {
      const { down, thing } = pressed;
      if (event.kind === 'move' && !isDrag(event.pointer, down.screen, event.screen)) return 'keep';
      pressed = null;
      if (event.kind === 'move') return 'pan';
      if (event.kind === 'up') now().onDimension(thing);
      return 'keep';
    }
    return tools.stroke(event);
  }

  return { context, tools, onStroke };
}

/** Keys that belong to a field or a dialog, and Enter and space on a button, are not the plan's. */
function isPlanKey(event: KeyboardEvent): boolean {
  const target = event.target instanceof HTMLElement ? event.target : null;
  if (event.defaultPrevented || target?.closest('input,textarea,select,[role=dialog],[role=radiogroup]')) return false;
  const onControl = target?.closest('button,[role=button],a') != null;
  return !(onControl && (event.key === 'Enter' || event.key === ' '));
}

/** Hands strokes and keys on the plan to the tools and the commands. */
export function usePlanHand(of: PlanHandOf): PlanHand {
  const { draft, solver } = useWorkspace();
  const latest = useLatest(of);
  const [hand] = useState(() => createHand(draft, solver, latest));

  useEffect(() => hand.tools.stop, [hand]);
  useEffect(() => {
    function onKey(event: KeyboardEvent): void {
      if (!isPlanKey(event)) return;
      const modifiers = { shift: event.shiftKey, alt: event.altKey, command: event.ctrlKey || event.metaKey };
      if (runKey({ kind: 'key', key: event.key, modifiers }, hand.context, latest().isTyping)) event.preventDefault();
    }
    globalThis.addEventListener?.('keydown', onKey);
    return () => globalThis.removeEventListener?.('keydown', onKey);
  }, [hand, latest]);

  return hand;
}
