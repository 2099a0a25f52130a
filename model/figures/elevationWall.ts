/** The wall in elevation: foundation, mortar, units by kind, bond beams. */
import { roundTicks, ticks, type Ticks } from '../length/ticks';
import type { PlanPoint } from '../geometry/point';
import type { ElevationContext } from './elevation';
import type { Shape } from './figure';

type BoxShape = readonly [number, number, number, number];

const place = (x: number, y: number): PlanPoint => ({ x: roundTicks(x), y: roundTicks(y) });

/** The top of the foundation along the run, from its first corner to its second, as points. */
export function foundationLine(context: ElevationContext): PlanPoint[] {
  const { run, setOut } = context;
  const profile = setOut.ground.profileByRun.get(run.runId) ?? [];
  const inside = profile.filter((point) => point.at > 0 && point.at < run.length);
  const first = setOut.ground.heightByCorner.get(run.ends[0].cornerId) ?? profile[0]?.height ?? 0;
  const last = setOut.ground.heightByCorner.get(run.ends[1].cornerId) ?? profile[profile.length - 1]?.height ?? 0;
  return [place(0, first), ...inside.map((point) => place(point.at, point.height)), place(run.length, last)];
}

/** The lowest foundation between two places along the run. */
export function lowestFoundation(context: ElevationContext, from: number, to: number): Ticks {
  let lowest = Infinity;
  const line = foundationLine(context);
  line.forEach((point, i) => {
    if (point.x >= from && point.x <= to) lowest = Math.min(lowest, point.y);
    const next = line[i + 1];
    if (!next || next.x <= point.x) return;
    for (const at of [from, to])
      if (at >= point.x && at <= next.x)
        lowest = Math.min(lowest, point.y + ((next.y - point.y) * (at - point.x)) / (next.x - point.x));
  });
  return lowest === Infinity ? ticks(0) : roundTicks(lowest);
}

/** How far the foundation is drawn past the wall's ends, and how deep below its lowest place. */
function foundationMargin(context: ElevationContext): { past: number; deep: number } {
  const { small } = context.options.scale.textHeight;
  return { past: Math.max(small * 1.1, context.drawing.poleKit.leg * 1.5), deep: small * 1.2 };
}

export function drawElevationGround(context: ElevationContext): void {
  const line = foundationLine(context);
  const { past, deep } = foundationMargin(context);
  const [first, last] = [line[0], line[line.length - 1]];
  if (!first || !last) return;
  const top = [place(first.x - past, first.y), ...line, place(last.x + past, last.y)];
  const bottom = Math.min(...line.map((point) => point.y)) - deep;
  const points = [...top, place(last.x + past, bottom), place(first.x - past, bottom)];
  context.shapes.push({ kind: 'polygon', role: 'concrete', points });
  context.shapes.push({ kind: 'lines', role: 'ground', lines: [top] });
}

/** The height from which a lift's mortar is drawn: the foundation for the first, the beam below for the others. */
function drawMortar(context: ElevationContext): void {
  const { run, setOut } = context;
  for (const lift of setOut.coursing.lifts) {
    const thing = { kind: 'run', id: run.runId } as const;
    const base = lift.number === 1 ? foundationLine(context) : [place(0, lift.base), place(run.length, lift.base)];
    const points = [...base, place(run.length, lift.top), place(0, lift.top)];
    context.shapes.push({ kind: 'polygon', role: 'joint', thing, points });
  }
}

export function drawElevationUnits(context: ElevationContext): void {
  const { run, setOut } = context;
  drawMortar(context);
  const bond = setOut.bond.byRun.get(run.runId);
  const boxes = { unit: [] as BoxShape[], closer: [] as BoxShape[], return: [] as BoxShape[] };
  const crosses: PlanPoint[][] = [];
  setOut.coursing.courses.forEach((course, i) => {
    for (const piece of bond?.patterns[bond.patternByCourse[i] ?? -1]?.pieces ?? []) {
      // Where a run ends in a reentrant corner its units go on behind the other wall's face, out of sight.
      const start = Math.max(0, piece.start);
      const end = Math.min(run.length, piece.end);
      if (end <= start) continue;
      boxes[piece.kind].push([start, course.bottom, end - start, course.top - course.bottom]);
      if (piece.kind === 'closer') crosses.push([place(start, course.bottom), place(end, course.top)]);
    }
  });
  const thing = { kind: 'run', id: run.runId } as const;
  for (const role of ['unit', 'return', 'closer'] as const)
    if (boxes[role].length > 0) context.shapes.push({ kind: 'boxes', role, thing, boxes: boxes[role] });
  // A cut unit is told by its slash, not by its colour alone.
  if (crosses.length > 0) context.shapes.push({ kind: 'lines', role: 'closer', thing, lines: crosses });
  drawBeams(context);
}

function drawBeams(context: ElevationContext): void {
  for (const lift of context.setOut.coursing.lifts) {
    const { beam } = lift;
    if (!beam) continue;
    const shape: Shape = {
      kind: 'boxes',
      role: 'concrete',
      thing: { kind: 'bondBeam', id: beam.id },
      emphasis: context.differs('bondBeam', beam.id) ? 'differs' : 'plain',
      boxes: [[0, beam.soffit, context.run.length, beam.top - beam.soffit]],
    };
    context.shapes.push(shape);
  }
}
