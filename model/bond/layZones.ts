/** Solves the zones of a chain from the bottom up, each stretch once for all places where it is alike. */
import { EMPTY_FILL, type BondLimits, type CourseFill, type Span } from './courseFill';
import type { EndPair, Parity } from './ends';
import { fillStretch, type Below, type FillPair, type StretchTask } from './fillStretch';
import type { Stretch, Zone } from './stretches';

export type FillMemo = Map<string, FillPair>;

/** A stretch of a zone as laid. */
export interface LaidStretch {
  readonly stretch: Stretch;
  readonly pair: FillPair;
  readonly both: boolean;
}

export interface LaidZone {
  readonly zone: Zone;
  readonly stretches: readonly LaidStretch[];
}

export function spansOf(stretch: Stretch): readonly [Span, Span] {
  return [
    { from: stretch.start[0], to: stretch.end[0] },
    { from: stretch.start[1], to: stretch.end[1] },
  ];
}

function keyOfEnd(pair: EndPair, origin: number): string {
  return pair.map((end) => `${end.at - origin}${end.joint ? (end.lapped ? 'j' : 'b') : 'n'}`).join('/');
}

function keyOfStretch(stretch: Stretch, origin: number): string {
  return `${keyOfEnd(stretch.start, origin)}|${keyOfEnd(stretch.end, origin)}`;
}

/** The part of a list of `[start, end, …]` that comes near a stretch. */
function clip(list: readonly number[], from: number, to: number): number[] {
  const kept: number[] = [];
  for (let i = 0; i < list.length; i += 2)
    if (list[i + 1]! >= from && list[i]! <= to) kept.push(list[i]!, list[i + 1]!);
  return kept;
}

function moveFill(fill: CourseFill, by: number): CourseFill {
  if (by === 0 || fill === EMPTY_FILL) return fill;
  const move = (list: readonly number[]) => list.map((value) => value + by);
  return {
    ...fill,
    pieces: move(fill.pieces),
    joints: move(fill.joints),
    closers: move(fill.closers),
    innerClosers: move(fill.innerClosers),
  };
}

/** Solves a stretch once for all places where it is alike. */
function fillOnce(task: StretchTask, key: string, origin: number, limits: BondLimits, memo: FillMemo): FillPair {
  const move = (end: Span['from']) => ({ ...end, at: end.at - origin });
  const moveSpan = (span: Span): Span => ({ from: move(span.from), to: move(span.to) });
  const below = task.below && {
    joints: task.below.joints.map((value) => value - origin),
    closers: task.below.closers.map((value) => value - origin),
  };
  const full = `${key}|${task.first}${task.both}|${below ? `${below.joints.join()};${below.closers.join()}` : ''}`;
  let pair = memo.get(full);
  if (!pair) {
    const { whole } = task;
    const back = -origin;
    const moved: StretchTask = {
      ...task,
      spans: [moveSpan(task.spans[0]), moveSpan(task.spans[1])],
      below,
      whole: whole && { ...whole, pair: [moveFill(whole.pair[0], back), moveFill(whole.pair[1], back)] },
    };
    pair = fillStretch(moved, limits);
    memo.set(full, pair);
  }
  return [moveFill(pair[0], origin), moveFill(pair[1], origin)];
}

/** Joints and inner closers of one course across all stretches of a zone. */
export function courseOf(laid: LaidZone, parity: Parity): Below {
  return {
    joints: laid.stretches.flatMap((stretch) => stretch.pair[parity].joints),
    closers: laid.stretches.flatMap((stretch) => stretch.pair[parity].innerClosers),
  };
}

export function parityOf(course: number): Parity {
  return course % 2 === 0 ? 0 : 1;
}

/** The bond of the chain from end to end, as if nothing interrupted it. */
export function layWhole(full: Stretch, limits: BondLimits, memo: FillMemo): FillPair {
  const spans = spansOf(full);
  const origin = Math.min(spans[0].from.at, spans[1].from.at);
  const task: StretchTask = { spans, first: 0, both: true, below: null, whole: null };
  return fillOnce(task, keyOfStretch(full, origin), origin, limits, memo);
}

/**
 * Lays zone over zone from the bottom. A stretch that carries on from the zone below keeps its courses; a new one laps
 * the course under it, and the bond of the whole chain, which closes over the openings again.
 */
export function layZones(zones: readonly Zone[], full: Stretch, limits: BondLimits, memo: FillMemo): LaidZone[] {
  const keys = zones.map((zone) => zone.stretches.map((stretch) => keyOfStretch(stretch, 0)));
  const whole = zones.length > 0 ? layWhole(full, limits, memo) : null;
  const laid: LaidZone[] = [];
  zones.forEach((zone, z) => {
    const under = zone.startsLift ? null : (laid[z - 1] ?? null);
    const carried = new Map<string, LaidStretch>();
    under?.stretches.forEach((stretch, i) => carried.set(keys[z - 1]![i]!, stretch));
    const above = zones[z + 1];
    const goesOn = above !== undefined && !above.startsLift;
    const first = parityOf(zone.firstCourse);
    const lower = under ? courseOf(under, parityOf(zone.firstCourse - 1)) : null;
    const stretches = zone.stretches.map((stretch, i): LaidStretch => {
      const key = keys[z]![i]!;
      const same = carried.get(key);
      if (same?.both) return same;
      const atStart = stretch.start === full.start;
      const atEnd = stretch.end === full.end;
      if (atStart && atEnd && !lower && whole) return { stretch, both: true, pair: whole };
      const spans = spansOf(stretch);
      const origin = Math.min(spans[0].from.at, spans[1].from.at);
      const to = Math.max(spans[0].to.at, spans[1].to.at);
      const below = lower && {
        joints: clip(lower.joints, origin - limits.leastLap, to + limits.leastLap),
        closers: clip(lower.closers, origin, to),
      };
      const both = zone.lastCourse > zone.firstCourse || (goesOn && keys[z + 1]!.includes(key));
      const keeps = whole && (goesOn || lower) ? { pair: whole, atStart, atEnd } : null;
      const task: StretchTask = { spans, first, both, below, whole: keeps };
      const kept = `${keyOfStretch(stretch, origin)}${keeps ? `|${keyOfStretch(full, origin)}` : ''}`;
      return { stretch, both, pair: fillOnce(task, kept, origin, limits, memo) };
    });
    laid.push({ zone, stretches });
  });
  return laid;
}
