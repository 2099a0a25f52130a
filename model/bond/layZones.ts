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

function spansOf(stretch: Stretch): readonly [Span, Span] {
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
  return { ...fill, pieces: move(fill.pieces), joints: move(fill.joints), closers: move(fill.closers) };
}

/** Solves a stretch once for all places where it is alike. */
function fillOnce(task: StretchTask, key: string, origin: number, limits: BondLimits, memo: FillMemo): FillPair {
  const move = (end: Span['from']) => ({ ...end, at: end.at - origin });
  const moveSpan = (span: Span): Span => ({ from: move(span.from), to: move(span.to) });
  const below = task.below && {
    joints: task.below.joints.map((value) => value - origin),
    closers: task.below.closers.map((value) => value - origin),
  };
  const whole = `${key}|${task.first}${task.both}|${below ? `${below.joints.join()};${below.closers.join()}` : ''}`;
  let pair = memo.get(whole);
  if (!pair) {
    pair = fillStretch({ ...task, spans: [moveSpan(task.spans[0]), moveSpan(task.spans[1])], below }, limits);
    memo.set(whole, pair);
  }
  return [moveFill(pair[0], origin), moveFill(pair[1], origin)];
}

/** Joints and closers of one course across all stretches of a zone. */
export function courseOf(laid: LaidZone, parity: Parity): Below {
  return {
    joints: laid.stretches.flatMap((stretch) => stretch.pair[parity].joints),
    closers: laid.stretches.flatMap((stretch) => stretch.pair[parity].closers),
  };
}

export function parityOf(course: number): Parity {
  return course % 2 === 0 ? 0 : 1;
}

/**
 * Lays zone over zone. A stretch that carries on from the zone below keeps its courses; a new one laps the course under it.
 */
export function layZones(zones: readonly Zone[], limits: BondLimits, memo: FillMemo): LaidZone[] {
  const keys = zones.map((zone) => zone.stretches.map((stretch) => keyOfStretch(stretch, 0)));
  const laid: LaidZone[] = [];
  zones.forEach((zone, z) => {
    const under = zone.startsLift ? null : (laid[z - 1] ?? null);
    const carried = new Map<string, LaidStretch>();
    under?.stretches.forEach((stretch, i) => carried.set(keys[z - 1]![i]!, stretch));
    const above = zones[z + 1];
    const first = parityOf(zone.firstCourse);
    const lower = under ? courseOf(under, parityOf(zone.firstCourse - 1)) : null;
    const stretches = zone.stretches.map((stretch, i): LaidStretch => {
      const key = keys[z]![i]!;
      const same = carried.get(key);
      if (same?.both) return same;
      const spans = spansOf(stretch);
      const origin = Math.min(spans[0].from.at, spans[1].from.at);
      const to = Math.max(spans[0].to.at, spans[1].to.at);
      const below = lower && {
        joints: clip(lower.joints, origin - limits.leastLap, to + limits.leastLap),
        closers: clip(lower.closers, origin, to),
      };
      const carriesOn = above !== undefined && !above.startsLift && keys[z + 1]!.includes(key);
      const both = zone.lastCourse > zone.firstCourse || carriesOn;
      const task: StretchTask = { spans, first, both, below };
      return { stretch, both, pair: fillOnce(task, keyOfStretch(stretch, origin), origin, limits, memo) };
    });
    laid.push({ zone, stretches });
  });
  return laid;
}
