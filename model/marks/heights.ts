/** The heights that every pole carries, lift by lift, before they are measured from any one pole. */
import type { ControlResult, Coursing, Lift } from '../coursing/types';
import type { Drawing } from '../drawing/schema';
import type { Ticks } from '../length/ticks';
import type { ThingRef } from '../things';
import type { MarkKind } from './types';

export interface MarkHeight {
  readonly height: Ticks;
  readonly course: number | null;
  readonly kinds: readonly MarkKind[];
  /** Things that are the same for every pole: beams and control heights. */
  readonly things: readonly ThingRef[];
  /** Openings that want this mark, in the drawing's order. */
  readonly openings: readonly ThingRef[];
}

/** The order in which kinds are named on one mark. */
const KIND_ORDER: readonly MarkKind[] = [
  'course',
  'sill',
  'head',
  'lintelSeat',
  'beamSoffit',
  'beamTop',
  'plate',
  'named',
];

interface Gathered {
  course: number | null;
  readonly kinds: Set<MarkKind>;
  readonly things: ThingRef[];
  readonly openings: ThingRef[];
}

/** The marks of one lift, highest first; equal heights are one mark. */
export function markHeights(drawing: Drawing, coursing: Coursing, lift: Lift): MarkHeight[] {
  const found = new Map<Ticks, Gathered>();
  const at = (height: Ticks): Gathered => {
    const old = found.get(height);
    if (old) return old;
    const made: Gathered = { course: null, kinds: new Set(), things: [], openings: [] };
    found.set(height, made);
    return made;
  };
  for (const course of coursing.courses) {
    if (course.lift !== lift.number) continue;
    const mark = at(course.top);
    mark.course = course.number;
    mark.kinds.add('course');
  }
  if (lift.beam) {
    const thing: ThingRef = { kind: 'bondBeam', id: lift.beam.id };
    addMark(at(lift.beam.soffit), 'beamSoffit', thing);
    addMark(at(lift.beam.top), 'beamTop', thing);
  }
  const top = lift.beam?.top ?? lift.top;
  const inLift = (height: Ticks): boolean =>
    height <= top && (height > lift.base || (lift.number === 1 && height === lift.base));
  for (const control of coursing.answer.controls) {
    for (const [kind, height] of marksOf(control)) {
      if (inLift(height)) addMark(at(height), kind, control.thing);
    }
  }
  return [...found]
    .sort(([a], [b]) => b - a)
    .map(([height, mark]) => ({
      height,
      course: mark.course,
      kinds: KIND_ORDER.filter((kind) => mark.kinds.has(kind)),
      things: mark.things,
      openings: mark.openings,
    }));
}

function addMark(mark: Gathered, kind: MarkKind, thing: ThingRef): void {
  mark.kinds.add(kind);
  const list = thing.kind === 'opening' ? mark.openings : mark.things;
  // The same thing's kinds come one after the other, so the last one tells whether it is there.
  const last = list[list.length - 1];
  if (last?.kind !== thing.kind || last.id !== thing.id) list.push(thing);
}

/**
 * What one height that the courses had to meet puts on the pole. A frame's head stands where it is drawn, so it is marked
 * there; masonry stops on a course line, so a sill, a lintel's seat and a plate are marked on the line they got.
 */
function marksOf(control: ControlResult): [MarkKind, Ticks][] {
  const line = control.course === null ? control.wanted : control.got;
  if (control.kind === 'bondBeam') return [];
  if (control.kind === 'head' && control.thing.kind === 'opening') {
    return [
      ['head', control.wanted],
      ['lintelSeat', line],
    ];
  }
  return [[control.kind, line]];
}
