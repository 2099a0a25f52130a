/** A virtual hand over a drawing: pointers in feet, chained, through the same desk and tools as the screen's. */
import { createPointerDesk, type RawPointer } from '../../../canvas/input/pointerDesk';
import type { PointerKind } from '../../../canvas/input/events';
import { createDraftStore, type ToolId } from '../../../canvas/store/draftStore';
import { createToolDesk } from '../../../canvas/tools/toolDesk';
import { createToolHost } from '../../../canvas/tools/toolHost';
import { toScreen, type Camera } from '../../../canvas/viewport/camera';
import type { Role } from '../../../model/contracts/common';
import type { Drawing } from '../../../model/drawing/schema';
import { EMPTY_SURVEY } from '../../../model/drawing/surveySchema';
import { feet, TICKS_PER_FOOT } from '../../../model/length/ticks';

const size = { width: 1000, height: 1000 };
/** Twenty pixels to the foot, foot 25 at the middle of the view. */
const START: Camera = { x: feet(15), y: feet(10), scale: 20 / TICKS_PER_FOOT };

export function hand(drawing: Drawing, options: { role?: Role; mode?: 'view' | 'edit' } = {}) {
  const draft = createDraftStore({ drawing, survey: EMPTY_SURVEY, role: options.role ?? 'lead' });
  draft.setMode(options.mode ?? 'edit');
  let ids = 0;
  let camera = START;
  let now = 0;
  const tools = createToolDesk(
    createToolHost({ draft, poles: () => null, scale: () => camera.scale, newId: () => `n${(ids += 1)}` }),
  );
  const desk = createPointerDesk({
    camera: () => camera,
    size: () => size,
    stroke: (event) => tools.stroke(event),
    cameraMoved: (next) => {
      camera = next;
    },
    cameraDone: () => undefined,
    fingersOnlyMove: () => draft.get().pen === 'draws',
    penSeen: () => undefined,
  });
  let pointer: PointerKind = 'mouse';
  const raw = (x: number, y: number, id = 1): RawPointer => {
    now += 400;
    const at = toScreen(START, size, { x: x * TICKS_PER_FOOT, y: y * TICKS_PER_FOOT });
    return { id, pointer, x: at.x, y: at.y, time: now };
  };
  const chain = {
    draft,
    tools,
    camera: () => camera,
    as(kind: PointerKind) {
      pointer = kind;
      return chain;
    },
    tool(tool: ToolId) {
      draft.setTool(tool);
      return chain;
    },
    down(x: number, y: number, id = 1) {
      desk.down(raw(x, y, id));
      return chain;
    },
    move(x: number, y: number, id = 1) {
      desk.move(raw(x, y, id));
      return chain;
    },
    up(x: number, y: number, id = 1) {
      desk.up(raw(x, y, id));
      return chain;
    },
    hover(x: number, y: number) {
      desk.hover(raw(x, y));
      return chain;
    },
    tap(x: number, y: number) {
      return chain.down(x, y).up(x, y);
    },
    /** A second tap so soon that it is one double tap. */
    tapAgain(x: number, y: number) {
      now -= 700;
      return chain.tap(x, y);
    },
    drag(fromX: number, fromY: number, toX: number, toY: number) {
      return chain
        .down(fromX, fromY)
        .move((fromX + toX) / 2, (fromY + toY) / 2)
        .move(toX, toY)
        .up(toX, toY);
    },
    /** Corners as `A 0,0`, in feet. */
    corners: () =>
      draft.get().drawing.corners.map((corner) => `${corner.letter} ${inFeet(corner.x)},${inFeet(corner.y)}`),
    /** Runs as `A–B`. */
    runs: () => {
      const letters = new Map(draft.get().drawing.corners.map((corner) => [corner.id, corner.letter]));
      return draft.get().drawing.runs.map((run) => `${letters.get(run.from)}–${letters.get(run.to)}`);
    },
    undoLabels: () => draft.get().history.past.map((entry) => entry.label),
  };
  return chain;
}

export function inFeet(length: number): number {
  return Math.round((length / TICKS_PER_FOOT) * 1000) / 1000;
}
