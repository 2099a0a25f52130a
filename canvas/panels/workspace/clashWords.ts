import { compareOpenings } from '../../../model/compare/openings';
import { compareSettings } from '../../../model/compare/settings';
import { compareCorners, compareRuns } from '../../../model/compare/walls';
import type { Drawing } from '../../../model/drawing/schema';
import { writeLength } from '../../../model/length/write';
import { layOutWalls } from '../../../model/walls/layOutWalls';
import type { Say } from '../../../model/words/say';
import { wordChange, type WordedChange } from '../../../model/words/wordChange';

/** How mine differs from theirs, change by change, in the trade's words. */
export function clashWords(theirs: Drawing, mine: Drawing, say: Say): readonly WordedChange[] {
  const changes = [
    ...compareCorners(theirs, mine),
    ...compareRuns(theirs, mine, layOutWalls(theirs), layOutWalls(mine)),
    ...compareOpenings(theirs, mine),
    ...compareSettings(theirs, mine),
  ];
  const write = (length: Parameters<typeof writeLength>[0]) =>
    writeLength(length, { units: mine.units, step: mine.tapeStep });
  return changes.map((change) => wordChange(change, theirs, mine, say, write));
}
