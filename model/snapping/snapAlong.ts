/** Where an opening stops along its run, and where a run stops that is slid sideways. */
import type { Drawing, Opening, WallType } from '../drawing/schema';
import { dot, sub } from '../geometry/vec';
import { roundTicks, roundToStep, ticks, type Ticks } from '../length/ticks';
import { unitAlong } from '../walls/runs';
import type { RunGeometry, Walls } from '../walls/types';

/** `unit`: a whole number of half units from an end of the run. `centre`: in the middle. `opening`: as far from a neighbour as whole units. */
export interface AlongSnap {
  readonly at: Ticks;
  readonly kind: 'unit' | 'centre' | 'end' | 'opening' | 'step';
}

export interface OpeningSnapRequest {
  readonly drawing: Drawing;
  readonly walls: Walls;
  readonly runId: string;
  /** The near jamb, where the finger would have it. */
  readonly raw: number;
  readonly width: Ticks;
  readonly reach: number;
  /** The opening being moved, which is no neighbour of itself. */
  readonly openingId?: string;
}

interface Stop {
  readonly at: number;
  readonly kind: AlongSnap['kind'];
  readonly strength: number;
}

/** Half units measured from a face: n halves and their joints, and one joint more where the jamb ends against no unit. */
function unitStops(raw: number, from: number, sign: 1 | -1, type: WallType): Stop[] {
  const joint = type.headJoint.nominal;
  const half = (unitAlong(type) + joint) / 2;
  // The last unit before the jamb has no joint after it.
  const count = Math.round((sign * (raw - from) + joint) / half);
  return [count - 1, count, count + 1]
    .filter((n) => n > 0)
    .map((n) => ({ at: from + sign * (n * half - joint), kind: 'unit' as const, strength: n % 2 === 0 ? 2 : 1 }));
}

function neighbours(request: OpeningSnapRequest): readonly Opening[] {
  return request.drawing.openings.filter((one) => one.runId === request.runId && one.id !== request.openingId);
}

/**
 * Where an opening's near jamb stops: the middle of its run, its ends, half and whole units from either end or from the next
 * opening; the tape's step otherwise. Kept within the run where it fits.
 */
export function snapOpening(request: OpeningSnapRequest): AlongSnap {
  const { drawing, walls, runId, raw, width, reach } = request;
  const run = walls.runById.get(runId);
  const step = roundToStep(raw, drawing.tapeStep);
  if (!run) return { at: step, kind: 'step' };
  const type = drawing.wallTypes.find((one) => one.id === run.wallTypeId);
  const far = (at: number): number => at - width;
  const stops: Stop[] = [
    { at: (run.length - width) / 2, kind: 'centre', strength: 3 },
    { at: 0, kind: 'end', strength: 1 },
    { at: far(run.length), kind: 'end', strength: 1 },
  ];
  if (type) {
    stops.push(...unitStops(raw, 0, 1, type));
    stops.push(...unitStops(raw + width, run.length, -1, type).map((stop) => ({ ...stop, at: far(stop.at) })));
    for (const other of neighbours(request)) {
      const after = unitStops(raw, other.at + other.width, 1, type);
      const before = unitStops(raw + width, other.at, -1, type).map((stop) => ({ ...stop, at: far(stop.at) }));
      stops.push(...[...after, ...before].map((stop) => ({ ...stop, kind: 'opening' as const })));
    }
  }
  const most = Math.max(0, run.length - width);
  const within = stops.filter((stop) => stop.at >= 0 && stop.at <= most && Math.abs(stop.at - raw) <= reach);
  const [best] = within.sort((a, b) => Math.abs(a.at - raw) - Math.abs(b.at - raw) || b.strength - a.strength);
  const strong = within.find((stop) => stop.kind === 'centre') ?? best;
  if (strong) return { at: roundTicks(strong.at), kind: strong.kind };
  return { at: ticks(Math.max(0, Math.min(step, most))), kind: 'step' };
}

export interface SlideSnapRequest {
  readonly drawing: Drawing;
  readonly walls: Walls;
  readonly runId: string;
  /** To the left of the run's direction, as `slideRun` takes it. */
  readonly raw: number;
  readonly reach: number;
  /** Lengths near one, that need no cutting, for the walls that stretch. */
  readonly goodLengths?: (near: Ticks) => readonly Ticks[];
}

export interface SlideSnap {
  readonly by: Ticks;
  readonly kind: 'module' | 'align' | 'back' | 'step';
  /** The corner lined up with, or the run whose length needs no cutting. */
  readonly withId?: string;
}

interface SlideStop {
  readonly by: number;
  readonly kind: 'module' | 'align' | 'back';
  readonly withId?: string;
}

/** Slides that bring a wall square to this one, and joined to it, to a length that needs no cutting. */
function moduleStops(run: RunGeometry, request: SlideSnapRequest): SlideStop[] {
  const { walls, raw, goodLengths } = request;
  if (!goodLengths) return [];
  return run.ends.flatMap((end) =>
    end.others.flatMap((id) => {
      const other = walls.runById.get(id);
      if (!other || Math.abs(dot(other.direction, run.direction)) > 1e-9) return [];
      const startsHere = other.ends[0].cornerId === end.cornerId;
      const away = dot(other.direction, run.inward) * (startsHere ? 1 : -1);
      // Sliding towards the far end shortens the other wall.
      return goodLengths(roundTicks(other.length - away * raw)).map((length) => ({
        by: (other.length - length) * away,
        kind: 'module' as const,
        withId: id,
      }));
    }),
  );
}

/** Where a run stops that is slid sideways: in line with another corner, at lengths that need no cutting, or where it was. */
export function snapSlide(request: SlideSnapRequest): SlideSnap {
  const { drawing, walls, runId, raw, reach } = request;
  const step = roundToStep(raw, drawing.tapeStep);
  const run = walls.runById.get(runId);
  if (!run) return { by: step, kind: 'step' };
  const stops: SlideStop[] = [{ by: 0, kind: 'back' }, ...moduleStops(run, request)];
  for (const corner of drawing.corners) {
    const by = dot(sub(corner, run.start), run.inward);
    if (Math.abs(by - raw) <= reach && Math.abs(by) >= 1) stops.push({ by, kind: 'align', withId: corner.id });
  }
  let best: SlideStop | null = null;
  for (const stop of stops) {
    const off = Math.abs(stop.by - raw);
    if (off <= reach && (!best || off < Math.abs(best.by - raw))) best = stop;
  }
  if (!best) return { by: step, kind: 'step' };
  const { by, kind, withId } = best;
  return withId === undefined ? { by: roundTicks(by), kind } : { by: roundTicks(by), kind, withId };
}
