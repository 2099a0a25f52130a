import { useState } from 'react';
import { readLength } from '../../../model/length/read';
import type { ActionContext } from '../../actions/action';
import { useDraft } from '../workspace/workspace';

export interface RunEntry {
  /** A run is being drawn, so that its length and angle can be typed. */
  readonly drawing: boolean;
  readonly text: string;
  readonly onChange: (text: string) => void;
  /** Places the corner at what was typed or pointed. */
  readonly place: () => void;
  readonly holdAngle: (degrees: number | null) => void;
}

/** The exact length and angle of the run being drawn, as typed. What can't be read yet holds nothing. */
export function useRunEntry({ tools }: ActionContext): RunEntry {
  const units = useDraft((state) => state.drawing.units);
  const drawing = useDraft((state) => state.tool === 'run' && state.mode === 'edit' && state.preview?.run != null);
  const placed = useDraft((state) => state.drawing.runs.length);
  const [text, setText] = useState('');
  const now = `${drawing} ${placed}`;
  const [of, setOf] = useState(now);
  if (of !== now) {
    // What was typed belonged to the run before.
    setOf(now);
    setText('');
  }

  return {
    drawing,
    text,
    onChange(next) {
      setText(next);
      const read = readLength(next, { units });
      tools.holdLength(read.ok && read.ticks > 0 ? read.ticks : null);
    },
    place() {
      if (tools.place()) setText('');
    },
    holdAngle: (degrees) => tools.holdAngle(degrees),
  };
}
