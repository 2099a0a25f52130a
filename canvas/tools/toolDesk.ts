/** Holds the tool in hand, hands it events, and lays it down when another is taken up. */
import type { Ticks } from '../../model/length/ticks';
import type { StrokeEvent } from '../input/events';
import type { ToolId } from '../store/draftStore';
import { createKeepClearTool } from './keepClearTool';
import { createOpeningTool } from './openingTool';
import { createRunTool } from './runTool';
import { createSelectTool } from './selectTool';
import type { RunTool, Tool, ToolHost } from './tool';

export interface ToolDesk {
  stroke(event: StrokeEvent): 'keep' | 'pan';
  /** Ends what is being drawn where it stands; false when nothing was. */
  finish(): boolean;
  /** Drops what is being drawn; false when nothing was. */
  drop(): boolean;
  /** Takes the last point of what is being drawn back; false when there is none. */
  stepBack(): boolean;
  holdLength(length: Ticks | null): void;
  holdAngle(degrees: number | null): void;
  place(): boolean;
  /** Whether a tool is in the middle of something. */
  isBusy(): boolean;
  stop(): void;
}

export function createToolDesk(host: ToolHost): ToolDesk {
  const { draft } = host;
  const run: RunTool = createRunTool(host);
  const tools: Readonly<Record<ToolId, Tool>> = {
    select: createSelectTool(host),
    run,
    door: createOpeningTool(host, 'door'),
    window: createOpeningTool(host, 'window'),
    passage: createOpeningTool(host, 'passage'),
    keepClear: createKeepClearTool(host),
  };

  /** Looking never draws, whatever tool was last in hand. */
  function inHand(): Tool {
    const { mode, tool } = draft.get();
    return mode === 'edit' ? tools[tool] : tools.select;
  }

  const stop = draft.api.subscribe((state, before) => {
    if (state.tool !== before.tool || state.mode !== before.mode) {
      const laidDown = before.mode === 'edit' ? tools[before.tool] : tools.select;
      if (laidDown.stateName() !== 'idle') laidDown.leave();
    } else if (state.drawing !== before.drawing && state.gesture === null) inHand().refresh?.();
  });

  return {
    stroke: (event) => inHand().handle(event),
    finish: () => inHand().finish(),
    drop() {
      const tool = inHand();
      const busy = tool.stateName() !== 'idle';
      tool.leave();
      return busy;
    },
    stepBack: () => inHand().stepBack(),
    holdLength: (length) => run.holdLength(length),
    holdAngle: (degrees) => run.holdAngle(degrees),
    place: () => inHand() === run && run.place(),
    isBusy: () => inHand().stateName() !== 'idle',
    stop,
  };
}
