/**
 * Draws wall runs: tap corner after corner, or drag. A chain goes on from its last corner until it meets a wall or a
 * corner that was there, closes on its first corner, or is ended.
 */
import type { EndPlace } from '../../model/drawing/edits/addRun';
import type { PlanPoint, Vec } from '../../model/geometry/point';
import { distance, samePoint, sub, unit } from '../../model/geometry/vec';
import { roundTicks, ticks, type Ticks } from '../../model/length/ticks';
import { DOUBLE_TAP_TIME, isDrag, type PointerKind, type StrokeEvent } from '../input/events';
import { EMPTY_PREVIEW } from '../store/preview';
import { cornerById, directionsAt, drawRun } from './edits';
import { aimedEnd, angleTo, firstAim, type RunAim } from './runDirection';
import type { Caught, RunTool, ToolHost } from './tool';

/** The end that the next run starts from. Corners of the chain are remembered, so that undo steps back along it. */
interface Chain {
  readonly start: EndPlace;
  readonly at: PlanPoint;
  /** Corners placed so far, the first included once it is one. */
  readonly corners: readonly string[];
}

type State =
  | { readonly name: 'idle' }
  | { readonly name: 'pointing'; readonly down: StrokeEvent; readonly chain: Chain }
  | {
      readonly name: 'drawing';
      readonly chain: Chain;
      readonly pressed: StrokeEvent | null;
      readonly lastUp: StrokeEvent | null;
    };

/** How far the next corner is taken to be while only its angle was said: about ten feet. */
const UNSAID = 1_950_000;

export function createRunTool(host: ToolHost): RunTool {
  const { draft } = host;
  let state: State = { name: 'idle' };
  let heldLength: Ticks | null = null;
  let heldAngle: number | null = null;
  let lastPointer: PointerKind = 'mouse';

  function beforeOf(chain: Chain): Vec | null {
    const { drawing } = draft.get();
    const last = chain.corners.at(-1);
    const previous = chain.corners.at(-2);
    if (last === undefined) return null;
    const here = cornerById(drawing, last);
    const run = drawing.runs.find((one) => one.to === last || one.from === last);
    const there = cornerById(drawing, previous ?? (run ? (run.to === last ? run.from : run.to) : ''));
    return here && there ? unit(sub(here, there)) : null;
  }

  function caughtAt(event: StrokeEvent, chain: Chain | null): Caught {
    const { drawing, snapping } = draft.get();
    return host.catchPoint(event.plan, {
      reach: host.reach(event.pointer),
      snapping: snapping && !event.modifiers.alt,
      from: chain && { point: chain.at, along: directionsAt(drawing, chain.corners.at(-1) ?? null) },
      closes: chain && chain.corners.length >= 3 ? chain.corners[0] : undefined,
    });
  }

  function aimOf(chain: Chain): RunAim {
    return { from: chain.at, before: beforeOf(chain), heldLength, heldAngle };
  }

  function show(chain: Chain, caught: Caught): void {
    const aim = aimOf(chain);
    const to = aimedEnd(aim, caught.at);
    const free = samePoint(to, caught.at);
    draft.setPreview({
      ...EMPTY_PREVIEW,
      pointer: lastPointer,
      at: to,
      guides: free ? caught.guides : [],
      caught: free ? caught.word : null,
      run: {
        from: chain.at,
        to,
        length: roundTicks(distance(chain.at, to)),
        angle: angleTo(aim, to),
        heldLength,
        heldAngle,
      },
    });
  }

  /** Between two corners: nothing is pointed at, but the next length can be typed. */
  function showWaiting(chain: Chain): void {
    const run = { from: chain.at, to: chain.at, length: ticks(0), angle: null, heldLength, heldAngle };
    draft.setPreview({ ...EMPTY_PREVIEW, pointer: lastPointer, run });
  }

  function showStart(caught: Caught, pointer: PointerKind): void {
    draft.setPreview({ ...EMPTY_PREVIEW, pointer, at: caught.at, guides: caught.guides, caught: caught.word });
  }

  function end(): void {
    state = { name: 'idle' };
    heldLength = null;
    heldAngle = null;
    draft.setPreview(null);
  }

  /** A chain whose last corner was undone goes on from the corner before it; one with none left is over. */
  function keepUp(): void {
    if (state.name !== 'drawing' || state.chain.start.kind !== 'corner') return;
    const { drawing } = draft.get();
    const corners = state.chain.corners.filter((id) => cornerById(drawing, id) !== null);
    if (corners.length === state.chain.corners.length) return;
    const last = cornerById(drawing, corners.at(-1) ?? '');
    if (!last) return end();
    const at = { x: last.x, y: last.y };
    state = { ...state, chain: { start: { kind: 'corner', cornerId: last.id }, at, corners } };
  }

  function chainFrom(caught: Caught): Chain {
    const start = placeOf(caught);
    return { start, at: caught.at, corners: start.kind === 'corner' ? [start.cornerId] : [] };
  }

  /** Draws the run to a place; the chain goes on from a new corner, and is over where it met what was there. */
  function drawTo(chain: Chain, to: PlanPoint, caught: Caught | null): void {
    const onCaught = caught !== null && samePoint(caught.at, to);
    const target: EndPlace = onCaught ? placeOf(caught) : { kind: 'point', point: to };
    const before = draft.get().drawing;
    draft.edit('plan.did.drawRun', (d) => drawRun(d, chain.start, target, chain.corners[0] ?? null, host.newId));
    const { drawing } = draft.get();
    if (drawing === before) return;
    heldLength = null;
    heldAngle = null;
    const at = drawing.corners.find((corner) => samePoint(corner, to));
    const started = drawing.corners.find((corner) => samePoint(corner, chain.at));
    const metOld = at !== undefined && (before.corners.some((corner) => corner.id === at.id) || target.kind === 'run');
    if (!at || !started || metOld) {
      end();
      const run = drawing.runs.at(-1);
      if (run) draft.select({ kind: 'run', id: run.id });
      return;
    }
    const corners = [...(chain.corners.length > 0 ? chain.corners : [started.id]), at.id];
    state = {
      name: 'drawing',
      chain: { start: { kind: 'corner', cornerId: at.id }, at: { x: at.x, y: at.y }, corners },
      pressed: null,
      lastUp: null,
    };
    draft.select({ kind: 'corner', id: at.id });
    showWaiting(state.chain);
  }

  function isDoubleTap(event: StrokeEvent): boolean {
    if (state.name !== 'drawing' || !state.lastUp) return false;
    const near = Math.hypot(event.screen.x - state.lastUp.screen.x, event.screen.y - state.lastUp.screen.y);
    return event.time - state.lastUp.time <= DOUBLE_TAP_TIME && near <= 24;
  }

  function up(event: StrokeEvent): void {
    if (state.name === 'pointing') {
      state = { name: 'drawing', chain: state.chain, pressed: null, lastUp: event };
      draft.select(null);
      showWaiting(state.chain);
      return;
    }
    if (state.name !== 'drawing' || !state.pressed) return;
    if (isDoubleTap(event)) return end();
    const { chain } = state;
    const caught = caughtAt(event, chain);
    drawTo(chain, aimedEnd(aimOf(chain), caught.at), caught);
    const now: State = state as State;
    if (now.name === 'drawing') state = { ...now, pressed: null, lastUp: event };
  }

  return {
    handle(event) {
      if (event.kind === 'key') return 'keep';
      lastPointer = event.pointer;
      keepUp();
      if (event.kind === 'down') {
        if (state.name === 'idle') {
          const caught = caughtAt(event, null);
          state = { name: 'pointing', down: event, chain: chainFrom(caught) };
          showStart(caught, event.pointer);
        } else if (state.name === 'drawing') {
          state = { ...state, pressed: event };
          show(state.chain, caughtAt(event, state.chain));
        }
      } else if (event.kind === 'move') {
        if (state.name === 'pointing' && isDrag(event.pointer, state.down.screen, event.screen))
          state = { name: 'drawing', chain: state.chain, pressed: state.down, lastUp: null };
        if (state.name === 'drawing' && state.pressed) show(state.chain, caughtAt(event, state.chain));
      } else if (event.kind === 'hover') {
        if (state.name === 'drawing') show(state.chain, caughtAt(event, state.chain));
        else if (state.name === 'idle') showStart(caughtAt(event, null), event.pointer);
      } else if (event.kind === 'up') up(event);
      else if (state.name === 'drawing' && (state.chain.corners.length > 0 || state.lastUp)) {
        // The stroke is taken back, the chain is not: its last corner still waits for the next.
        state = { ...state, pressed: null };
        showWaiting(state.chain);
      } else end();
      return 'keep';
    },
    leave: end,
    finish() {
      const drawing = state.name !== 'idle';
      end();
      return drawing;
    },
    stepBack() {
      // A first corner that no run has made real yet is taken back here; the rest is the drawing's own undo.
      if (state.name === 'idle' || (state.name === 'drawing' && state.chain.corners.length > 1)) return false;
      end();
      return true;
    },
    refresh() {
      keepUp();
      if (state.name === 'drawing' && draft.get().preview === null) showWaiting(state.chain);
    },
    stateName: () => {
      keepUp();
      return state.name;
    },
    holdLength(length) {
      heldLength = length;
      showHeld();
    },
    holdAngle(degrees) {
      heldAngle = degrees;
      showHeld();
    },
    place() {
      keepUp();
      if (state.name !== 'drawing') return false;
      const run = draft.get().preview?.run;
      if (!run || run.length === 0) return false;
      drawTo(state.chain, run.to, null);
      return true;
    },
  };

  /** What was typed moves the preview at once, from where the pointer last was. */
  function showHeld(): void {
    if (state.name !== 'drawing') return;
    const { chain } = state;
    const pointed = draft.get().preview?.run?.to;
    const shown =
      pointed && !samePoint(pointed, chain.at) ? pointed : firstAim(chain.at, beforeOf(chain), heldLength ?? UNSAID);
    show(chain, { at: shown, cornerId: null, onRun: null, guides: [], word: null });
  }
}

function placeOf(caught: Caught): EndPlace {
  if (caught.cornerId !== null) return { kind: 'corner', cornerId: caught.cornerId };
  if (caught.onRun) return { kind: 'run', runId: caught.onRun.runId, at: caught.onRun.at };
  return { kind: 'point', point: caught.at };
}
