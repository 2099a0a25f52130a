/** What the keys of a keyboard do on the plan. */
import type { KeyPress } from '../input/events';
import type { Action, ActionContext } from './action';
import { isEditing } from './action';
import { cancel, finish, redo, undo } from './historyActions';
import { ARROWS, nudge } from './nudge';
import { remove } from './thingActions';
import { fit, zoomIn, zoomOut } from './viewActions';

const PLAIN: Readonly<Record<string, Action>> = {
  Delete: remove,
  Backspace: remove,
  Escape: cancel,
  '+': zoomIn,
  '=': zoomIn,
  '-': zoomOut,
  '−': zoomOut,
  '0': fit,
};

function actionOf({ key, modifiers }: KeyPress): Action | null {
  if (modifiers.command) {
    if (key.toLowerCase() === 'z') return modifiers.shift ? redo : undo;
    return key.toLowerCase() === 'y' ? redo : null;
  }
  return modifiers.alt ? null : (PLAIN[key] ?? null);
}

/**
 * Runs what a key stands for; true when it stood for something that could be done. `typing`: a keypad has the digits,
 * signs and erasing, so they mean no command.
 */
export function runKey(press: KeyPress, context: ActionContext, typing = false): boolean {
  const state = context.draft.get();
  const way = press.modifiers.command || press.modifiers.alt ? undefined : ARROWS[press.key];
  if (way) {
    const { selection } = state;
    if (!isEditing(state) || !selection) return false;
    context.draft.edit('plan.did.nudge', (d) => nudge(d, selection, way, press.modifiers.shift));
    return true;
  }
  if (press.key === 'Enter' && !typing && isEditing(state)) {
    if (context.tools.place()) return true;
    if (!context.tools.isBusy()) return false;
    finish.run(context);
    return true;
  }
  const action = actionOf(press);
  if (!action || !action.enabled(state)) return false;
  if (typing && !press.modifiers.command && press.key !== 'Escape' && press.key !== 'Delete') return false;
  action.run(context);
  return true;
}
