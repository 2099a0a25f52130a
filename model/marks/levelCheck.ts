import type { PoleMark, PoleMarks } from './types';

/**
 * The courses whose printed distance from the level line differs between two poles, or that only one of them has:
 * none, when the two were marked from one set-out.
 */
export function levelCheck(one: PoleMarks, other: PoleMarks): number[] {
  const printed = new Map(courseMarks(other).map((mark) => [mark.course, mark.printed.fromLine]));
  const differing = courseMarks(one)
    .filter((mark) => printed.get(mark.course) !== mark.printed.fromLine)
    .map((mark) => mark.course);
  const mine = new Set(courseMarks(one).map((mark) => mark.course));
  const only = courseMarks(other).filter((mark) => !mine.has(mark.course));
  return [...differing, ...only.map((mark) => mark.course)].sort((a, b) => a - b);
}

function courseMarks(pole: PoleMarks): (PoleMark & { course: number })[] {
  return pole.marks.filter((mark): mark is PoleMark & { course: number } => mark.course !== null);
}
