import type { Action } from './action';
import { isEditing } from './action';

/** Takes back what is being drawn point by point first, then the drawing's own steps. */
export const undo: Action = {
  id: 'undo',
  label: () => 'actions.undo',
  icon: () => 'undo',
  of: (state) => state.history.past.at(-1)?.label ?? null,
  enabled: (state) => isEditing(state) && (state.history.past.length > 0 || state.preview !== null),
  run({ draft, tools }) {
    if (!tools.stepBack()) draft.undo();
  },
};

export const redo: Action = {
  id: 'redo',
  label: () => 'actions.redo',
  icon: () => 'redo',
  of: (state) => state.history.future.at(-1)?.label ?? null,
  enabled: (state) => isEditing(state) && state.history.future.length > 0,
  run: ({ draft }) => draft.redo(),
};

/** Ends what is being drawn where it stands. */
export const finish: Action = {
  id: 'finish',
  label: () => 'actions.finish',
  icon: () => 'check',
  enabled: isEditing,
  run({ tools }) {
    tools.finish();
  },
};

/** Drops what is being drawn; with nothing to drop, lets go of the tool, then of what is selected, then of editing. */
export const cancel: Action = {
  id: 'cancel',
  label: () => 'actions.cancel',
  icon: () => 'close',
  enabled: () => true,
  run({ draft, tools }) {
    if (tools.isBusy()) return void tools.drop();
    const { mode, tool, selection } = draft.get();
    if (mode === 'edit' && tool !== 'select') draft.setTool('select');
    else if (selection) draft.select(null);
    else if (mode === 'edit') draft.setMode('view');
  },
};
