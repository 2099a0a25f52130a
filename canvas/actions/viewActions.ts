import { may } from '../../model/contracts/common';
import type { Action } from './action';
import { isEditing } from './action';

const always = () => true;
const ZOOM_STEP = 1.4;

export const fit: Action = {
  id: 'fit',
  label: () => 'actions.fit',
  icon: () => 'fit',
  enabled: always,
  run: ({ view }) => view.fit(),
};

export const zoomIn: Action = {
  id: 'zoomIn',
  label: () => 'actions.zoomIn',
  icon: () => 'zoomIn',
  enabled: always,
  run: ({ view }) => view.zoomBy(ZOOM_STEP),
};

export const zoomOut: Action = {
  id: 'zoomOut',
  label: () => 'actions.zoomOut',
  icon: () => 'zoomOut',
  enabled: always,
  run: ({ view }) => view.zoomBy(1 / ZOOM_STEP),
};

/** Enters and leaves the edit state; what is being drawn is dropped. */
export const draw: Action = {
  id: 'draw',
  label: (state) => (isEditing(state) ? 'actions.view' : 'actions.draw'),
  icon: (state) => (isEditing(state) ? 'check' : 'edit'),
  enabled: (state) => may(state.role, 'editDrawing'),
  on: isEditing,
  run({ draft, tools }) {
    tools.drop();
    draft.setMode(isEditing(draft.get()) ? 'view' : 'edit');
  },
};

export const snapping: Action = {
  id: 'snapping',
  label: (state) => (state.snapping ? 'actions.snapOn' : 'actions.snapOff'),
  icon: () => 'snap',
  enabled: isEditing,
  on: (state) => state.snapping,
  run: ({ draft }) => draft.setSnapping(!draft.get().snapping),
};

/** Shown once a pen has come near. */
export const penDraws: Action = {
  id: 'penDraws',
  label: (state) => (state.pen === 'draws' ? 'actions.penDraws' : 'actions.penAsFinger'),
  icon: (state) => (state.pen === 'draws' ? 'pen' : 'finger'),
  enabled: (state) => state.pen !== 'unseen',
  on: (state) => state.pen === 'draws',
  run: ({ draft }) => draft.setPen(draft.get().pen === 'draws' ? 'asFinger' : 'draws'),
};
