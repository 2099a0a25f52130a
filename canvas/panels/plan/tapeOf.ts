import type { Drawing } from '../../../model/drawing/schema';
import type { Ticks } from '../../../model/length/ticks';
import { writeLength } from '../../../model/length/write';

/** Writes a length for a sentence, in the drawing's units and to its tape. */
export function writerOf({ units, tapeStep }: Drawing): (length: Ticks) => string {
  return (length) => writeLength(length, { units, step: tapeStep });
}
