/** The draft on the screen: the drawing and survey, what is selected, the tool in hand, and undo by patches. */
import { createStore, type StoreApi } from 'zustand/vanilla';
import { may, type Role } from '../../model/contracts/common';
import type { Drawing } from '../../model/drawing/schema';
import type { Survey } from '../../model/drawing/surveySchema';
import type { ThingRef } from '../../model/things';
import { EMPTY_HISTORY, entryBetween, redoStep, remember, undoStep, type History } from './history';
import type { Preview } from './preview';
import type { Conflict, SaveStatus } from './saver';
import { isThere, runOf } from './there';

export type Mode = 'view' | 'edit';
export type ToolId = 'select' | 'run' | 'door' | 'window' | 'passage' | 'keepClear';

export type AreaKind = 'keepClear' | 'boundary';

export type DraftConflict =
  | { readonly part: 'drawing'; readonly conflict: Conflict<Drawing> }
  | { readonly part: 'survey'; readonly conflict: Conflict<Survey> };

export interface DraftState {
  readonly drawing: Drawing;
  readonly survey: Survey;
  readonly role: Role;
  readonly selection: ThingRef | null;
  readonly openRunId: string | null;
  readonly openPoleId: string | null;
  readonly mode: Mode;
  readonly tool: ToolId;
  /** What the tool for areas draws. */
  readonly area: AreaKind;
  readonly snapping: boolean;
  /** Whether the pen draws and fingers only move the paper; `unseen` until a pen has come near. */
  readonly pen: 'unseen' | 'draws' | 'asFinger';
  readonly preview: Preview | null;
  /** Label of the gesture under way; its changes are one undo step. */
  readonly gesture: string | null;
  readonly history: History;
  readonly drawingSave: SaveStatus;
  readonly surveySave: SaveStatus;
  readonly conflicts: readonly DraftConflict[];
}

/** What becomes of each field: taken back by undo, saved to the server, kept on the device, or only on screen. */
export const FIELDS: Readonly<
  Record<keyof DraftState, { readonly undoable: boolean; readonly kept: 'saved' | 'screen' }>
> = {
  drawing: { undoable: true, kept: 'saved' },
  survey: { undoable: false, kept: 'saved' },
  role: { undoable: false, kept: 'screen' },
  selection: { undoable: false, kept: 'screen' },
  openRunId: { undoable: false, kept: 'screen' },
  openPoleId: { undoable: false, kept: 'screen' },
  mode: { undoable: false, kept: 'screen' },
  tool: { undoable: false, kept: 'screen' },
  area: { undoable: false, kept: 'screen' },
  snapping: { undoable: false, kept: 'screen' },
  pen: { undoable: false, kept: 'screen' },
  preview: { undoable: false, kept: 'screen' },
  gesture: { undoable: false, kept: 'screen' },
  history: { undoable: false, kept: 'screen' },
  drawingSave: { undoable: false, kept: 'screen' },
  surveySave: { undoable: false, kept: 'screen' },
  conflicts: { undoable: false, kept: 'screen' },
};

export interface DraftStart {
  readonly drawing: Drawing;
  readonly survey: Survey;
  readonly role: Role;
}

export interface DraftStore {
  readonly api: StoreApi<DraftState>;
  get(): DraftState;
  /** One change, one undo step. Does nothing for who may not edit. `label` is a dictionary key. */
  edit(label: string, change: (drawing: Drawing) => Drawing): void;
  /** Begins a gesture: what follows is one undo step, or nothing if cancelled. Ends one that was left open. */
  begin(label: string): void;
  /** The drawing as it is after the whole gesture so far, always worked out from the drawing as it began. */
  update(change: (asBegun: Drawing) => Drawing): void;
  commit(): void;
  cancel(): void;
  undo(): void;
  redo(): void;
  editSurvey(change: (survey: Survey) => Survey): void;
  select(thing: ThingRef | null): void;
  openRun(runId: string | null): void;
  openPole(poleId: string | null): void;
  setMode(mode: Mode): void;
  setTool(tool: ToolId): void;
  setArea(area: AreaKind): void;
  setSnapping(on: boolean): void;
  setPen(pen: DraftState['pen']): void;
  setPreview(preview: Preview | null): void;
  setSave(save: Partial<Pick<DraftState, 'drawingSave' | 'surveySave' | 'conflicts'>>): void;
  /** Puts another's version on the screen; what was done before can't be undone over it. */
  adoptDrawing(drawing: Drawing): void;
  adoptSurvey(survey: Survey): void;
}

export function createDraftStore(start: DraftStart): DraftStore {
  const api = createStore<DraftState>(() => ({
    drawing: start.drawing,
    survey: start.survey,
    role: start.role,
    selection: null,
    openRunId: start.drawing.runs[0]?.id ?? null,
    openPoleId: null,
    mode: 'view',
    tool: 'select',
    area: 'keepClear',
    snapping: true,
    pen: 'unseen',
    preview: null,
    gesture: null,
    history: EMPTY_HISTORY,
    drawingSave: 'saved',
    surveySave: 'saved',
    conflicts: [],
  }));
  const get = api.getState;
  const set = api.setState;
  let asBegun: Drawing | null = null;

  function mayEdit(): boolean {
    return may(get().role, 'editDrawing');
  }

  /** Puts a drawing on the screen and lets go of what is no longer in it. */
  function show(drawing: Drawing, more: Partial<DraftState> = {}): void {
    const { selection, openRunId, openPoleId } = get();
    set({
      drawing,
      selection: selection && isThere(drawing, selection) ? selection : null,
      openRunId:
        openRunId !== null && isThere(drawing, { kind: 'run', id: openRunId })
          ? openRunId
          : (drawing.runs[0]?.id ?? null),
      openPoleId: openPoleId !== null && isThere(drawing, { kind: 'pole', id: openPoleId }) ? openPoleId : null,
      ...more,
    });
  }

  function cancel(): void {
    if (asBegun === null) return;
    const before = asBegun;
    asBegun = null;
    show(before, { gesture: null, preview: null });
  }

  function commit(): void {
    if (asBegun === null) return;
    const { drawing, history, gesture } = get();
    const entry = entryBetween(asBegun, drawing, gesture ?? '');
    asBegun = null;
    set({ gesture: null, history: entry ? remember(history, entry) : history });
  }

  function step(take: typeof undoStep): void {
    cancel();
    if (!mayEdit()) return;
    const { history, drawing } = get();
    const taken = take(history, drawing);
    if (taken) show(taken.drawing, { history: taken.history, preview: null });
  }

  return {
    api,
    get,
    edit(label, change) {
      if (!mayEdit()) return;
      commit();
      const { drawing, history } = get();
      const after = change(drawing);
      const entry = entryBetween(drawing, after, label);
      if (entry) show(after, { history: remember(history, entry) });
    },
    begin(label) {
      commit();
      if (!mayEdit()) return;
      asBegun = get().drawing;
      set({ gesture: label });
    },
    update(change) {
      if (asBegun === null) return;
      const after = change(asBegun);
      if (after !== get().drawing) show(after);
    },
    commit,
    cancel,
    undo: () => step(undoStep),
    redo: () => step(redoStep),
    editSurvey(change) {
      const { survey, role } = get();
      const after = may(role, 'editSurvey') ? change(survey) : survey;
      if (after !== survey) set({ survey: after });
    },
    select(thing) {
      const { drawing, openRunId, openPoleId } = get();
      const there = thing && isThere(drawing, thing) ? thing : null;
      set({
        selection: there,
        openRunId: (there && runOf(drawing, there)) ?? openRunId,
        openPoleId: there && (there.kind === 'corner' || there.kind === 'pole') ? there.id : openPoleId,
      });
    },
    openRun: (openRunId) => set({ openRunId }),
    openPole: (openPoleId) => set({ openPoleId }),
    setMode(mode) {
      cancel();
      if (mode === 'edit' && !mayEdit()) return;
      // Where nothing is drawn yet there is nothing to move: drawing begins with a wall.
      set({ mode, tool: mode === 'edit' && get().drawing.runs.length === 0 ? 'run' : 'select', preview: null });
    },
    setTool: (tool) => set({ tool, preview: null }),
    setArea: (area) => set({ area }),
    setSnapping: (snapping) => set({ snapping }),
    setPen: (pen) => set({ pen }),
    setPreview: (preview) => set({ preview }),
    setSave: (save) => set(save),
    adoptDrawing(drawing) {
      asBegun = null;
      show(drawing, { gesture: null, preview: null, history: EMPTY_HISTORY });
    },
    adoptSurvey: (survey) => set({ survey }),
  };
}
