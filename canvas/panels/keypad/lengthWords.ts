import type { Units } from '../../../model/drawing/schema';
import { readLength } from '../../../model/length/read';
import type { Ticks } from '../../../model/length/ticks';
import { writeLength } from '../../../model/length/write';
import type { Words } from '../../ui/words';

export interface LengthLimits {
  readonly units: Units;
  readonly step: Ticks;
  /** Zero unless said. */
  readonly least?: Ticks;
  readonly most?: Ticks;
}

export type Entered = { readonly ok: true; readonly ticks: Ticks } | { readonly ok: false; readonly words: string };

/** Reads an entry and says in words what is wrong with it: at which character, or against which limit. */
export function enterLength(text: string, limits: LengthLimits, t: Words): Entered {
  const { units, step, least, most } = limits;
  const read = readLength(text, { units });
  if (!read.ok) {
    const problem = t(`lengths.problems.${read.problem}`);
    const there = text.slice(read.at).trim();
    return { ok: false, words: there === '' ? problem : t('plan.entry.wrongAt', { problem, there }) };
  }
  const write = (length: Ticks) => writeLength(length, { units, step });
  if (read.ticks < (least ?? 0))
    return {
      ok: false,
      words: least === undefined ? t('plan.entry.negative') : t('plan.entry.tooSmall', { least: write(least) }),
    };
  if (most !== undefined && read.ticks > most)
    return { ok: false, words: t('plan.entry.tooLarge', { most: write(most) }) };
  return { ok: true, ticks: read.ticks };
}
