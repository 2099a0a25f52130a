/** Commands on the selected thing. */
import { reverseRuns } from '../../model/drawing/edits/closeLoop';
import { deleteThing } from '../../model/drawing/edits/deleteThing';
import { changeOpening, moveOpening } from '../../model/drawing/edits/openings';
import type { Opening } from '../../model/drawing/schema';
import { roundTicks, ticks } from '../../model/length/ticks';
import type { ThingRef } from '../../model/things';
import type { DraftState } from '../store/draftStore';
import { runLine } from '../tools/edits';
import type { Action } from './action';
import { isEditing } from './action';

const DELETED: ReadonlySet<ThingRef['kind']> = new Set(['corner', 'run', 'opening', 'keepClear', 'boundary', 'pole']);

function selectedOpening({ selection, drawing }: DraftState): Opening | null {
  if (selection?.kind !== 'opening') return null;
  return drawing.openings.find((opening) => opening.id === selection.id) ?? null;
}

function selectedDoor(state: DraftState): Extract<Opening, { kind: 'door' }> | null {
  const opening = selectedOpening(state);
  return opening?.kind === 'door' ? opening : null;
}

/** A pole stands at its corner: what is deleted or moved is the corner. */
export function drawnThing(selection: ThingRef): ThingRef {
  return selection.kind === 'pole' ? { kind: 'corner', id: selection.id } : selection;
}

export const remove: Action = {
  id: 'delete',
  label: () => 'actions.delete',
  icon: () => 'delete',
  enabled: (state) => isEditing(state) && state.selection !== null && DELETED.has(state.selection.kind),
  run({ draft }) {
    const { selection } = draft.get();
    if (selection) draft.edit('plan.did.remove', (d) => deleteThing(d, drawnThing(selection)));
  },
};

export const flipHinge: Action = {
  id: 'flipHinge',
  label: () => 'actions.flipHinge',
  icon: () => 'swap',
  enabled: (state) => isEditing(state) && selectedDoor(state) !== null,
  run({ draft }) {
    const door = selectedDoor(draft.get());
    if (!door) return;
    const hinge = door.swing.hinge === 'near' ? 'far' : 'near';
    draft.edit('plan.did.flipHinge', (d) => changeOpening(d, door.id, { swing: { ...door.swing, hinge } }));
  },
};

export const openOtherWay: Action = {
  id: 'openOtherWay',
  label: () => 'actions.openOtherWay',
  icon: () => 'door',
  enabled: (state) => isEditing(state) && selectedDoor(state) !== null,
  run({ draft }) {
    const door = selectedDoor(draft.get());
    if (!door) return;
    const opens = door.swing.opens === 'in' ? 'out' : 'in';
    draft.edit('plan.did.openOtherWay', (d) => changeOpening(d, door.id, { swing: { ...door.swing, opens } }));
  },
};

/** One more of the same opening in the nearest gap of its run that holds it. */
export const duplicate: Action = {
  id: 'duplicate',
  label: () => 'actions.duplicate',
  icon: () => 'copy',
  enabled: (state) => isEditing(state) && nextGap(state) !== null,
  run({ draft, newId }) {
    const state = draft.get();
    const opening = selectedOpening(state);
    const at = nextGap(state);
    if (!opening || at === null) return;
    const id = newId();
    draft.edit('plan.did.duplicate', (d) =>
      moveOpening({ ...d, openings: [...d.openings, { ...opening, id }] }, id, opening.runId, ticks(at)),
    );
    draft.select({ kind: 'opening', id });
  },
};

/** Where another such opening stands clear of the others by its own width, nearest to the one that is copied. */
function nextGap(state: DraftState): number | null {
  const opening = selectedOpening(state);
  const line = opening && runLine(state.drawing, opening.runId);
  if (!opening || !line) return null;
  const others = state.drawing.openings.filter((one) => one.runId === opening.runId);
  const clear = opening.width;
  const places = others.flatMap((one) => [one.at + one.width + clear, one.at - clear - opening.width]);
  const free = places.filter(
    (at) =>
      at >= 0 &&
      at + opening.width <= line.length &&
      others.every((one) => at + opening.width <= one.at || at >= one.at + one.width),
  );
  const [nearest] = free.sort((a, b) => Math.abs(a - opening.at) - Math.abs(b - opening.at));
  return nearest === undefined ? null : roundTicks(nearest);
}

export const turnRun: Action = {
  id: 'turnRun',
  label: () => 'actions.turnRun',
  icon: () => 'swap',
  enabled: (state) => isEditing(state) && state.selection?.kind === 'run',
  run({ draft }) {
    const { selection } = draft.get();
    if (selection?.kind === 'run') draft.edit('plan.did.turnRun', (d) => reverseRuns(d, [selection.id]));
  },
};
