/** How far each printed mark is from exact, and how far apart that sets the same mark on two poles. */
import { ticks, type Ticks } from '../length/ticks';
import type { Marks, PoleMark, PoleMarks } from './types';

/** The three distances that a mark can be set by. */
export interface Distances {
  readonly fromLine: Ticks;
  readonly fromFoot: Ticks;
  readonly aboveFoundation: Ticks;
}

/** One printed mark: printed less exact, in ticks. No figure is more than half a step of the tape. */
export interface PrintedError extends Distances {
  readonly poleId: string;
  readonly lift: number;
  readonly height: Ticks;
  readonly course: number | null;
}

/** One row for every mark of every pole and lift, in their order. */
export function printedErrors(marks: Marks): PrintedError[] {
  return marks.poles.flatMap((pole) =>
    pole.marks.map((mark) => ({
      poleId: pole.poleId,
      lift: pole.lift,
      height: mark.height,
      course: mark.course,
      fromLine: ticks(mark.printed.fromLine - mark.fromLine),
      fromFoot: ticks(mark.printed.fromFoot - mark.fromFoot),
      aboveFoundation: ticks(mark.printed.aboveFoundation - mark.aboveFoundation),
    })),
  );
}

/** The same mark on two poles: how much higher it stands on the other one when both are set by their printed distance. */
export interface LevelDifference extends Distances {
  readonly height: Ticks;
  readonly course: number | null;
}

/**
 * One row for every mark that two poles both carry. From the level line both are printed alike, so the first figure is 0
 * where the two were marked from one set-out. From the foot or the foundation each is rounded on its own, so they differ
 * by a step of the tape at most: two roundings of half a step.
 */
export function levelDifferences(one: PoleMarks, other: PoleMarks): LevelDifference[] {
  const others = new Map(other.marks.map((mark) => [mark.height, mark]));
  return one.marks.flatMap((mark): LevelDifference[] => {
    const same = others.get(mark.height);
    if (!same) return [];
    const [mine, theirs] = [setAt(one, mark), setAt(other, same)];
    return [
      {
        height: mark.height,
        course: mark.course,
        fromLine: ticks(theirs.fromLine - mine.fromLine),
        fromFoot: ticks(theirs.fromFoot - mine.fromFoot),
        aboveFoundation: ticks(theirs.aboveFoundation - mine.aboveFoundation),
      },
    ];
  });
}

/** Heights above the high point at which a mark ends up, set by each of its printed distances. */
function setAt(pole: PoleMarks, { printed }: PoleMark): Distances {
  return {
    fromLine: ticks(pole.levelLine + printed.fromLine),
    fromFoot: ticks(pole.foot + printed.fromFoot),
    aboveFoundation: ticks(pole.foundation + printed.aboveFoundation),
  };
}

/** Whether every mark that two poles both carry is level within a step of the tape, however it is set. */
export function areLevel(one: PoleMarks, other: PoleMarks, tapeStep: Ticks): boolean {
  return levelDifferences(one, other).every(({ fromLine, fromFoot, aboveFoundation }) =>
    [fromLine, fromFoot, aboveFoundation].every((difference) => Math.abs(difference) <= tapeStep),
  );
}
