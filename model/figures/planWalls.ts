/** The walls in plan: bodies, the units of one course as light lines, faces broken at openings, the mason's lines. */
import type { PlanPoint } from '../geometry/point';
import type { EndKind, RunGeometry } from '../walls/types';
import { alongRun, onRun, stripOnRun, withoutGaps } from './onRun';
import type { PlanContext } from './planContext';

/** Openings of a run as gaps along it. */
function gapsOf(context: PlanContext, runId: string): (readonly [number, number])[] {
  return (context.setOut.walls.openingsByRun.get(runId) ?? []).flatMap((id) => {
    const opening = context.openingById.get(id);
    return opening ? [[opening.at, opening.at + opening.width] as const] : [];
  });
}

function drawBody(context: PlanContext, run: RunGeometry): void {
  const emphasis = context.emphasisOf('run', run.runId);
  const thing = { kind: 'run', id: run.runId } as const;
  if (run.body.length >= 3) context.shapes.push({ kind: 'polygon', role: 'body', thing, emphasis, points: run.body });
  const ends = [...run.outside, ...run.inside].map((point) => alongRun(run, point));
  const points = stripOnRun(run, Math.min(...ends), Math.max(...ends), 0, run.thickness);
  context.obstacles.push({ points, weight: 12 });
}

/** Head joints of the shown course, across the wall; left out where they would run together at this scale. */
function drawJoints(context: PlanContext, run: RunGeometry): void {
  const { setOut, drawing, options } = context;
  const bond = setOut.bond.byRun.get(run.runId);
  const pattern = bond?.patterns[bond.patternByCourse[(options.course ?? 1) - 1] ?? 0];
  if (!pattern) return;
  const type = drawing.wallTypes.find((each) => each.id === run.wallTypeId) ?? drawing.wallTypes[0];
  if (!type || Math.min(type.unit.length, type.unit.width) < options.scale.textHeight.small * 0.35) return;
  const lines: PlanPoint[][] = [];
  pattern.pieces.forEach((piece, i) => {
    const next = pattern.pieces[i + 1];
    if (!next || next.start - piece.end > type.headJoint.most * 2 + type.leastPiece) return;
    const at = (piece.end + next.start) / 2;
    lines.push([onRun(run, at, 0), onRun(run, at, run.thickness)]);
  });
  const thing = { kind: 'run', id: run.runId } as const;
  if (lines.length > 0) context.shapes.push({ kind: 'lines', role: 'joint', thing, lines });
}

function drawFaces(context: PlanContext, run: RunGeometry): void {
  const gaps = gapsOf(context, run.runId);
  const lines: PlanPoint[][] = [];
  const [outsideFrom, outsideTo] = run.outside;
  const [insideFrom, insideTo] = run.inside;
  for (const [from, to] of withoutGaps(alongRun(run, outsideFrom), alongRun(run, outsideTo), gaps))
    lines.push([onRun(run, from, 0), onRun(run, to, 0)]);
  for (const [from, to] of withoutGaps(alongRun(run, insideFrom), alongRun(run, insideTo), gaps))
    lines.push([onRun(run, from, run.thickness), onRun(run, to, run.thickness)]);
  for (const [from, to] of gaps)
    for (const at of [from, to]) lines.push([onRun(run, at, 0), onRun(run, at, run.thickness)]);
  if (run.ends[0].kind === 'free') lines.push([outsideFrom, insideFrom]);
  if (run.ends[1].kind === 'free') lines.push([outsideTo, insideTo]);
  const emphasis = context.emphasisOf('run', run.runId);
  context.shapes.push({ kind: 'lines', role: 'face', thing: { kind: 'run', id: run.runId }, emphasis, lines });
}

/** How far the line runs on past the face's end, so that lines cross at the poles. */
function runsOn(kind: EndKind, off: number): number {
  if (kind === 'outside') return off;
  return kind === 'reentrant' ? -off : 0;
}

/** The mason's line, drawn just off the outside face so that it can be told from it. */
function drawLine(context: PlanContext, run: RunGeometry): void {
  const off = Math.max(context.drawing.poleKit.spacer, context.options.scale.textHeight.small * 0.2);
  const [from, to] = run.outside;
  const line = [
    onRun(run, alongRun(run, from) - runsOn(run.ends[0].kind, off), -off),
    onRun(run, alongRun(run, to) + runsOn(run.ends[1].kind, off), -off),
  ];
  context.shapes.push({ kind: 'lines', role: 'line', thing: { kind: 'run', id: run.runId }, lines: [line] });
}

export function drawBodies(context: PlanContext): void {
  for (const run of context.setOut.walls.runs) drawBody(context, run);
  for (const run of context.setOut.walls.runs) drawJoints(context, run);
}

export function drawFacesAndLines(context: PlanContext): void {
  for (const run of context.setOut.walls.runs) drawFaces(context, run);
  for (const run of context.setOut.walls.runs) drawLine(context, run);
}
