/**
 * The top of the foundation all the way round, rolled out straight: x along the outside faces from the first corner,
 * y above the high point, drawn taller than it is so that fractions of an inch can be seen.
 */
import type { Drawing } from '../drawing/schema';
import { roundTicks } from '../length/ticks';
import type { PlanPoint } from '../geometry/point';
import type { SetOut } from '../setOut';
import type { RunGeometry } from '../walls/types';
import { boundsOf } from './bounds';
import type { Figure, LabelScale, Shape } from './figure';
import { textBox } from './text';

export interface ProfileOptions {
  readonly scale: LabelScale;
  /** The reading that is selected, or null. */
  readonly readingId: string | null;
  /** Height that the range of the foundation takes up, in ticks of this figure. */
  readonly tall: number;
}

interface Stretch {
  readonly run: RunGeometry;
  /** Where the run begins in the figure, and whether it is walked from its second corner to its first. */
  readonly from: number;
  readonly backwards: boolean;
}

/** Runs in the order of walking round: loops first, the others after them, each stretch where the last ended. */
function walkRound(setOut: SetOut, gap: number): { stretches: Stretch[]; corners: { id: string; x: number }[] } {
  const { walls } = setOut;
  const stretches: Stretch[] = [];
  const corners: { id: string; x: number }[] = [];
  const walked = new Set<string>();
  let at = 0;
  function walk(run: RunGeometry, fromCorner: string): string {
    walked.add(run.runId);
    const backwards = run.ends[0].cornerId !== fromCorner;
    stretches.push({ run, from: at, backwards });
    at += run.length;
    const to = run.ends[backwards ? 0 : 1].cornerId;
    corners.push({ id: to, x: at });
    return to;
  }
  for (const footprint of walls.footprints) {
    let corner = footprint.cornerIds[0];
    if (corner === undefined || footprint.runIds.some((id) => walked.has(id))) continue;
    if (stretches.length > 0) at += gap;
    corners.push({ id: corner, x: at });
    for (const id of footprint.runIds) {
      const run = walls.runById.get(id);
      if (run && corner !== undefined) corner = walk(run, corner);
    }
  }
  for (const run of walls.runs) {
    if (walked.has(run.runId)) continue;
    if (stretches.length > 0) at += gap;
    const first = run.ends[0].cornerId;
    corners.push({ id: first, x: at });
    walk(run, first);
  }
  return { stretches, corners };
}

/** How many times taller than long the heights are drawn. */
function profileStretch(setOut: SetOut, tall: number): number {
  return setOut.ground.range > 0 ? tall / setOut.ground.range : 1;
}

/** The rolled-out profile with its stations, the high point named, and the level line above (not to scale). */
export function profileFigure(drawing: Drawing, setOut: SetOut, options: ProfileOptions): Figure {
  const { scale, tall } = options;
  const tape = { units: drawing.units, step: drawing.tapeStep };
  const { ground, walls } = setOut;
  const unit = scale.textHeight.small;
  const stretch = profileStretch(setOut, tall);
  const { stretches, corners } = walkRound(setOut, unit * 3);
  const shapes: Shape[] = [];
  const at = (x: number, height: number): PlanPoint => ({ x: roundTicks(x), y: roundTicks(height * stretch) });
  const deep = roundTicks(-ground.range * stretch - unit * 1.6);

  const cornerX = new Map<string, number>();
  for (const corner of corners) if (!cornerX.has(corner.id)) cornerX.set(corner.id, corner.x);
  for (const { run, from, backwards } of stretches) {
    const heightAt = (end: 0 | 1) => ground.heightByCorner.get(run.ends[end].cornerId) ?? 0;
    const inner = (ground.profileByRun.get(run.runId) ?? []).filter((each) => each.at > 0 && each.at < run.length);
    const along = [{ at: 0, height: heightAt(0) }, ...inner, { at: run.length, height: heightAt(1) }];
    const line = along.map((each) => at(from + (backwards ? run.length - each.at : each.at), each.height));
    if (backwards) line.reverse();
    const thing = { kind: 'run', id: run.runId } as const;
    const points = [...line, { x: roundTicks(from + run.length), y: deep }, { x: roundTicks(from), y: deep }];
    shapes.push({ kind: 'polygon', role: 'concrete', emphasis: 'quiet', thing, points });
    shapes.push({ kind: 'lines', role: 'ground', thing, lines: [line] });
  }
  const width = corners.reduce((most, corner) => Math.max(most, corner.x), 0);
  const levelY = roundTicks(Math.max(unit * 3.2, tall * 0.25));
  shapes.push({
    kind: 'lines',
    role: 'level-line',
    lines: [
      [
        { x: roundTicks(-unit), y: levelY },
        { x: roundTicks(width + unit), y: levelY },
      ],
    ],
  });

  for (const station of ground.stations) {
    const thing = { kind: 'station', id: station.readingId } as const;
    const selected = station.readingId === options.readingId;
    const emphasis = selected ? 'selected' : station.over > 0 ? 'differs' : 'plain';
    const places = stationPlaces(station.station, stretches, corners).map((x) => at(x, station.height));
    for (const place of places)
      shapes.push({ kind: 'dot', role: 'foot', thing, emphasis, at: place, size: selected ? 'large' : 'small' });
    const [first] = places;
    if (!first || station.readingId !== ground.highPoint?.readingId) continue;
    const text = { kind: 'word', key: 'walls.highPoint' } as const;
    const half = textBox(text, 'small', false, scale, tape).width / 2;
    const textAt = {
      x: roundTicks(Math.max(half, Math.min(first.x, width - half))),
      y: roundTicks(first.y + unit * 1.3),
    };
    shapes.push({ kind: 'text', role: 'note', thing, at: textAt, text, size: 'small', turn: 0, anchor: 'middle' });
  }
  let clear = -Infinity;
  for (const corner of corners) {
    const letter = walls.cornerById.get(corner.id)?.letter;
    if (letter === undefined) continue;
    const text = { kind: 'literal', text: letter } as const;
    const box = textBox(text, 'label', false, scale, tape);
    if (corner.x - box.width / 2 < clear) continue;
    clear = corner.x + box.width / 2 + scale.clear;
    const place = { x: roundTicks(corner.x), y: roundTicks(deep - unit * 0.9) };
    const thing = { kind: 'corner', id: corner.id } as const;
    shapes.push({ kind: 'text', role: 'note', thing, at: place, text, size: 'label', turn: 0, anchor: 'middle' });
  }
  return { name: 'profile', bounds: boundsOf(shapes, scale, tape), tape, shapes };
}

/** Where a station falls in the figure: a loop's first corner stands at both its ends. */
function stationPlaces(
  station: { kind: 'corner'; cornerId: string } | { kind: 'run'; runId: string; at: number },
  stretches: readonly Stretch[],
  corners: readonly { id: string; x: number }[],
): number[] {
  if (station.kind === 'corner') return corners.filter((each) => each.id === station.cornerId).map((each) => each.x);
  return stretches
    .filter((each) => each.run.runId === station.runId)
    .map((each) => each.from + (each.backwards ? each.run.length - station.at : station.at));
}
