import type { ReactNode } from 'react';
import type { Drawing } from '../../../model/drawing/schema';
import type { Ticks } from '../../../model/length/ticks';
import { LengthField } from '../keypad/LengthField';
import { useDraft, useDraftActions } from '../workspace/workspace';

export interface LengthOf {
  readonly label: string;
  readonly value: Ticks;
  readonly set: (drawing: Drawing, length: Ticks) => Drawing;
  readonly form?: 'inches' | 'feet';
  readonly least?: Ticks;
  readonly most?: Ticks;
}

export interface Fields {
  readonly editing: boolean;
  /** A length of the drawing that is changed by one undo step. `undo`: a dictionary key that names the step. */
  length(of: LengthOf): ReactNode;
  change(change: (drawing: Drawing) => Drawing): void;
}

/** Fields bound to the draft: lengths in the drawing's units, disabled unless the drawing is being edited. */
export function useFields(undo: 'plan.did.change' | 'plan.did.building'): Fields {
  const actions = useDraftActions();
  const editing = useDraft((state) => state.mode === 'edit');
  const units = useDraft((state) => state.drawing.units);
  const step = useDraft((state) => state.drawing.tapeStep);
  return {
    editing,
    change: (change) => actions.edit(undo, change),
    length: ({ label, value, set, form = 'inches', least, most }) => (
      <LengthField
        key={label}
        label={label}
        value={value}
        units={units}
        step={step}
        form={form}
        least={least}
        most={most}
        disabled={!editing}
        onCommit={(length) => actions.edit(undo, (drawing) => set(drawing, length))}
      />
    ),
  };
}
