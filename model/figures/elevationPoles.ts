/** The poles of a run in elevation with their marks, the mason's line of the selected course, and the level line. */
import { roundTicks } from '../length/ticks';
import type { StoryPole } from '../poles/types';
import type { ElevationContext } from './elevation';
import { alongRun } from './onRun';
import { usualGap } from './pole';

export interface PoleSpan {
  readonly pole: StoryPole;
  readonly left: number;
  readonly right: number;
}

/** Poles that carry this run's lines, with what they cover along it, first corner's first. */
export function polesOfRun(context: ElevationContext): PoleSpan[] {
  const least = context.options.scale.textHeight.small * 0.5;
  return context.setOut.poles.poles
    .filter((pole) => pole.runIds.includes(context.run.runId))
    .map((pole) => {
      const along = pole.section.map((point) => alongRun(context.run, point));
      const [left, right] = along.length > 0 ? [Math.min(...along), Math.max(...along)] : [0, 0];
      const grow = Math.max(0, least - (right - left)) / 2;
      return { pole, left: left - grow, right: right + grow };
    })
    .sort((a, b) => a.left - b.left);
}

/** The lift that is shown: the selected course's, or the first. */
function shownLift(context: ElevationContext): number {
  const { selectedCourse } = context.options;
  const course = context.setOut.coursing.courses.find((each) => each.number === selectedCourse);
  return course?.lift ?? 1;
}

export function drawElevationPoles(context: ElevationContext): void {
  const { setOut, options, run, shapes } = context;
  const lift = shownLift(context);
  const over = options.scale.textHeight.small * 0.28;
  const spans = polesOfRun(context);
  for (const { pole, left, right } of spans) {
    const marks = setOut.marks.poles.find((each) => each.poleId === pole.id && each.lift === lift);
    if (!marks || marks.head <= marks.foot) continue;
    const thing = { kind: 'pole', id: pole.id } as const;
    const emphasis = options.poleId === pole.id ? 'selected' : 'plain';
    shapes.push({
      kind: 'boxes',
      role: 'pole',
      thing,
      emphasis,
      boxes: [[left, marks.foot, right - left, marks.head - marks.foot]],
    });
    // Where every mark would make one band, only those are shown that have a name or a number beside them.
    const near = usualGap(marks) < options.scale.textHeight.small * 0.4;
    const shown = marks.marks.filter(
      (mark) => !near || mark.course === null || mark.course % 5 === 0 || mark.course === 1,
    );
    const lines = shown.map((mark) => [
      { x: roundTicks(left - over), y: mark.height },
      { x: roundTicks(right + over), y: mark.height },
    ]);
    shapes.push({ kind: 'lines', role: 'mark', thing, emphasis, lines });
  }
  const past = options.scale.textHeight.small * 0.9;
  const first = spans[0]?.left ?? 0;
  const last = spans[spans.length - 1]?.right ?? run.length;
  const level = setOut.ground.levelLine;
  const ends = [Math.min(first, 0) - past, Math.max(last, run.length) + past].map(roundTicks);
  const [from = roundTicks(0), to = run.length] = ends;
  shapes.push({
    kind: 'lines',
    role: 'level-line',
    lines: [
      [
        { x: from, y: level },
        { x: to, y: level },
      ],
    ],
  });
  const course = setOut.coursing.courses.find((each) => each.number === options.selectedCourse);
  if (course)
    shapes.push({
      kind: 'lines',
      role: 'line',
      thing: { kind: 'course', id: String(course.number) },
      emphasis: 'selected',
      lines: [
        [
          { x: roundTicks(first), y: course.top },
          { x: roundTicks(last), y: course.top },
        ],
      ],
    });
}
