/** Dimensions of the plan and every place where each could stand: lengths of the runs, running distances of the jambs. */
import { roundTicks } from '../length/ticks';
import type { RunGeometry } from '../walls/types';
import type { DimensionShape, FigureText } from './figure';
import type { Label } from './labels';
import { onRun } from './onRun';
import type { PlanContext } from './planContext';
import { grown, readableTurn, textBox, turnedQuad } from './text';

/** Distances of a dimension line off the face, as parts of its text's height. */
const OFFSETS = [1.7, 2.6, 3.7, 5, 6.6, 8.5, 11, 14];
const ALONG = [0.5, 0.36, 0.64, 0.22, 0.78];

/** A run's length along its outside face, at any distance outside it; inside only where there is no room outside. */
function lengthLabel(context: PlanContext, run: RunGeometry): Label | null {
  const { scale } = context.options;
  const height = scale.textHeight.dimension;
  const box = textBox({ kind: 'measure', length: run.length }, 'dimension', false, scale, context.tape);
  if (run.length < box.width + 1.6 * height) return null;
  const turn = readableTurn(run.direction);
  const covered = grown(box, scale.clear);
  const places = [
    ...OFFSETS.map((offset) => -offset * height),
    ...OFFSETS.slice(0, 3).map((o) => run.thickness + o * height),
  ].flatMap((depth) =>
    ALONG.flatMap((part) => {
      const middle = run.length * part;
      const half = covered.width / 2;
      if (middle - half < 0.5 * height || middle + half > run.length - 0.5 * height) return [];
      const textAt = onRun(run, middle, depth);
      const from = onRun(run, 0, depth);
      const to = onRun(run, run.length, depth);
      const shape: DimensionShape = {
        kind: 'dimension',
        role: 'dimension',
        thing: { kind: 'run', id: run.runId },
        emphasis: context.emphasisOf('run', run.runId),
        from,
        to,
        length: run.length,
        textAt,
        turn,
      };
      const lines = [
        [from, onRun(run, middle - half, depth)],
        [onRun(run, middle + half, depth), to],
      ] as const;
      const cost =
        (Math.abs(depth < 0 ? depth : depth - run.thickness) / height) * 0.22 +
        Math.abs(part - 0.5) * 3 +
        (depth < 0 ? 0 : 3);
      return [{ quad: turnedQuad(textAt, covered, turn), lines, cost, shapes: [shape] }];
    }),
  );
  const selected = context.emphasisOf('run', run.runId) === 'selected';
  return { priority: selected ? 2.5 : 4, anchor: onRun(run, run.length / 2, 0), places, most: selected ? 40 : 9 };
}

export function lengthLabels(context: PlanContext): Label[] {
  return context.setOut.walls.runs.flatMap((run) => lengthLabel(context, run) ?? []);
}

/** How far a running distance stands off the face, and beside its jamb, as parts of its text's height. */
const RUNNING_OFF = [0.5, 1.2, 2];
const BESIDE = [0, 0.6, -0.6];

/** A jamb's distance from the run's first corner, written across the wall beside the jamb, as a tape laid along it reads. */
function runningLabel(context: PlanContext, run: RunGeometry, at: number, openingId: string): Label {
  const { scale } = context.options;
  const height = scale.textHeight.small;
  const text: FigureText = { kind: 'measure', length: roundTicks(at) };
  const box = textBox(text, 'small', false, scale, context.tape);
  const turn = readableTurn(run.inward);
  const covered = grown(box, scale.clear * 0.5);
  const places = [-1, 1].flatMap((side) =>
    RUNNING_OFF.flatMap((off) =>
      BESIDE.map((beside) => {
        const face = side < 0 ? 0 : run.thickness;
        const textAt = onRun(run, at + beside * height, face + side * (off * height + box.width / 2));
        return {
          quad: turnedQuad(textAt, covered, turn),
          lines: [],
          cost: off * 0.5 + Math.abs(beside) * 0.6 + (side < 0 ? 0 : 1.5),
          shapes: [
            {
              kind: 'text' as const,
              role: 'dimension' as const,
              thing: { kind: 'opening' as const, id: openingId },
              at: textAt,
              text,
              size: 'small' as const,
              turn,
              anchor: 'middle' as const,
            },
          ],
        };
      }),
    ),
  );
  return { priority: 3, anchor: onRun(run, at, 0), places, most: 14 };
}

export function runningLabels(context: PlanContext): Label[] {
  const { walls } = context.setOut;
  return walls.running.flatMap(({ runId, at, what, openingId }) => {
    const run = walls.runById.get(runId);
    return run && what === 'jamb' && openingId !== null ? [runningLabel(context, run, at, openingId)] : [];
  });
}
