/** One object per command: the bar, the menu and the keyboard all run the same. */
import type { DraftState, DraftStore } from '../store/draftStore';
import type { ToolDesk } from '../tools/toolDesk';

/** What a command can do to the view: the camera belongs to the screen. */
export interface ViewCommands {
  fit(): void;
  /** About the middle of the view. */
  zoomBy(factor: number): void;
}

export interface ActionContext {
  readonly draft: DraftStore;
  readonly tools: ToolDesk;
  readonly view: ViewCommands;
  newId(): string;
}

/** Names of icons of the kit; kept as names so that commands load without views. */
export type ActionIcon =
  | 'undo'
  | 'redo'
  | 'delete'
  | 'fit'
  | 'zoomIn'
  | 'zoomOut'
  | 'snap'
  | 'pen'
  | 'finger'
  | 'check'
  | 'close'
  | 'swap'
  | 'copy'
  | 'select'
  | 'wallRun'
  | 'door'
  | 'window'
  | 'passage'
  | 'keepClear'
  | 'edit';

/** Dictionary keys under `plan.actions` and `plan.tools`. */
export type ActionLabel =
  | `actions.${
      | 'undo'
      | 'redo'
      | 'delete'
      | 'fit'
      | 'zoomIn'
      | 'zoomOut'
      | 'snapOn'
      | 'snapOff'
      | 'penDraws'
      | 'penAsFinger'
      | 'finish'
      | 'cancel'
      | 'flipHinge'
      | 'openOtherWay'
      | 'duplicate'
      | 'turnRun'
      | 'draw'
      | 'view'}`
  | `tools.${'select' | 'run' | 'door' | 'window' | 'passage' | 'keepClear'}`;

export interface Action {
  readonly id: string;
  label(state: DraftState): ActionLabel;
  icon(state: DraftState): ActionIcon;
  enabled(state: DraftState): boolean;
  /** Dictionary key of what it would do it to: the step that undo takes back. */
  of?(state: DraftState): string | null;
  /** For a switch or a choice: whether it is on. */
  on?(state: DraftState): boolean;
  run(context: ActionContext): void;
}

/** Whether the drawing may be changed now: by the person's role, and in the edit state. */
export function isEditing(state: DraftState): boolean {
  return state.mode === 'edit';
}
