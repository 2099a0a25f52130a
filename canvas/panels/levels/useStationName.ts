import type { Units } from '../../../model/drawing/schema';
import type { Ticks } from '../../../model/length/ticks';
import { writeLength } from '../../../model/length/write';
import { useWords } from '../../ui/words';
import type { StationEntry } from './stations';

/** Names a station: `Corner A`, or `A–B, 8' 0" from A`. */
export function useStationName(units: Units, step: Ticks): (entry: StationEntry) => string {
  const t = useWords();
  return ({ letter, along }) =>
    along
      ? t('levels.onRun', { run: along.run, at: writeLength(along.at, { units, step }), letter: along.letter })
      : t('levels.corner', { letter: letter ?? '' });
}
