/** The steel angle in plan, and where it stands at its seat: clear of the faces, and set off where a frame is near. */
import type { Drawing, PoleKit } from '../drawing/schema';
import { boxOf, inflate } from '../geometry/box';
import type { PlanPoint, Vec } from '../geometry/point';
import { counterClockwise, whereIs } from '../geometry/polygon';
import { add, dot, negate, perp, unit } from '../geometry/vec';
import { ticks, type Ticks } from '../length/ticks';
import type { ThingRef } from '../things';
import type { RunGeometry } from '../walls/types';
import type { Ground } from './obstacles';
import { ringsOverlap, stepFrom } from './plane';
import type { Seat, SeatFace } from './seats';

export interface Stand {
  /** Heel of the angle. */
  readonly at: PlanPoint;
  readonly ring: readonly PlanPoint[];
}

/** The L from its heel: two legs at right angles, `steel` thick, counter-clockwise. */
function angleRing(heel: PlanPoint, first: Vec, second: Vec, kit: PoleKit): readonly PlanPoint[] {
  const steel = Math.min(kit.steel, kit.leg);
  const ring = [
    heel,
    stepFrom(heel, [first, kit.leg]),
    stepFrom(heel, [first, kit.leg], [second, steel]),
    stepFrom(heel, [first, steel], [second, steel]),
    stepFrom(heel, [first, steel], [second, kit.leg]),
    stepFrom(heel, [second, kit.leg]),
  ];
  return counterClockwise(ring);
}

/** How far along `bisector` the angle must be so that its heel and each leg's tip stay `spacer` off the leg's own face. */
function pushOut(seat: Seat, bisector: Vec, tips: readonly Vec[], spacer: number): number {
  const [a, b] = seat.faces;
  const out = (face: SeatFace, tip: Vec) =>
    (spacer - Math.min(0, dot(tip, face.off))) / Math.max(0.1, dot(bisector, face.off));
  return Math.max(...tips.map((tip) => (dot(tip, a.along) >= dot(tip, b.along) ? out(a, tip) : out(b, tip))));
}

const scaled = (v: Vec, by: number): Vec => ({ x: v.x * by, y: v.y * by });

/** The face that the line is strung to; the first where both are. */
function lineFace(seat: Seat): SeatFace {
  const [a, b] = seat.faces;
  return a.outside ? a : b;
}

/**
 * Stands the angle at a seat. At a right angle each leg lies along a face, a spacer off it: heel outward where it wraps
 * the corner, heel inward where it stands in the angle. At other angles the same rigid angle keeps its bisector on the
 * corner's, as near as the spacer lets it. On a face that goes on, one leg lies along the face and one points off it.
 */
export function standAt(seat: Seat, kit: PoleKit, shift: Vec = { x: 0, y: 0 }): Stand {
  const vertex = stepFrom(seat.vertex, [shift, 1]);
  const [a, b] = seat.faces;
  if (seat.shape === 'flat') {
    const face = lineFace(seat);
    const heel = stepFrom(vertex, [face.off, kit.spacer]);
    return { at: heel, ring: angleRing(heel, face.along, face.off, kit) };
  }
  const sum = unit(add(a.off, b.off));
  const bisector = sum.x === 0 && sum.y === 0 ? a.off : sum;
  const inward = seat.shape === 'wraps' ? negate(bisector) : bisector;
  const half = Math.SQRT1_2;
  const left = scaled(add(inward, perp(inward)), half);
  const right = scaled(add(inward, negate(perp(inward))), half);
  if (seat.shape === 'angle') {
    const out = pushOut(seat, bisector, [scaled(left, kit.leg), scaled(right, kit.leg)], kit.spacer);
    const heel = stepFrom(vertex, [bisector, out]);
    return { at: heel, ring: angleRing(heel, right, left, kit) };
  }
  const inner = kit.leg - Math.min(kit.steel, kit.leg);
  const legs = [scaled(left, inner), scaled(right, inner)];
  const out = pushOut(seat, bisector, legs, kit.spacer) + Math.min(kit.steel, kit.leg) * Math.SQRT2;
  const heel = stepFrom(vertex, [bisector, out]);
  return { at: heel, ring: angleRing(heel, right, left, kit) };
}

/** A frame's near jamb as seen from the seat, along its face. */
interface NearJamb {
  readonly face: SeatFace;
  readonly opening: ThingRef;
  readonly distance: number;
}

/** What an opening takes of its run, way through included. */
export interface Taken {
  readonly id: string;
  readonly from: number;
  readonly to: number;
}

/** Openings of each run from jamb to jamb, or to the edges of its way, where a pole needs no clearance beside. */
export function takenOf(drawing: Drawing, openingsByRun: ReadonlyMap<string, readonly string[]>): Map<string, Taken[]> {
  const openings = new Map(drawing.openings.map((opening) => [opening.id, opening]));
  const taken = new Map<string, Taken[]>();
  for (const [runId, ids] of openingsByRun)
    taken.set(
      runId,
      ids.flatMap((id) => {
        const opening = openings.get(id);
        if (!opening) return [];
        const used = opening.kind !== 'window' && opening.way.used ? opening.way.width : 0;
        const beside = Math.max(0, used / 2 - opening.width / 2 - drawing.poleKit.clearance);
        return [{ id, from: opening.at - beside, to: opening.at + opening.width + beside }];
      }),
    );
  return taken;
}

/** The nearest jamb on each face of the seat. */
export function nearJambs(
  seat: Seat,
  runById: ReadonlyMap<string, RunGeometry>,
  takenByRun: ReadonlyMap<string, readonly Taken[]>,
): NearJamb[] {
  if (seat.cornerId === null) return [];
  return seat.faces.flatMap((face) => {
    const run = runById.get(face.runId);
    if (!run || !face.isRun) return [];
    const forward = dot(face.along, run.direction) > 0;
    const begin = forward ? run.start : run.end;
    const inset = dot({ x: seat.vertex.x - begin.x, y: seat.vertex.y - begin.y }, face.along);
    let nearest: NearJamb | null = null;
    for (const jamb of takenByRun.get(run.runId) ?? []) {
      const away = (forward ? jamb.from : run.length - jamb.to) - inset;
      if (nearest === null || away < nearest.distance)
        nearest = { face, opening: { kind: 'opening', id: jamb.id }, distance: Math.round(away) };
    }
    return nearest ? [nearest] : [];
  });
}

export interface Standing extends Stand {
  readonly setOff: { readonly runId: string; readonly by: Ticks; readonly for: ThingRef } | null;
  /** Frames that it could not be set off from, and by how much they are too near. */
  readonly frames: readonly { readonly opening: ThingRef; readonly short: Ticks }[];
  /** What else it stands in. */
  readonly blockedBy: readonly ThingRef[];
}

/** What the section stands in, its own frames apart. */
export function standsIn(ring: readonly PlanPoint[], ground: Ground): ThingRef[] {
  const found: ThingRef[] = [];
  const box = boxOf(ring);
  if (!box) return found;
  for (const obstacle of ground.near(inflate(box, 1)))
    if (obstacle.kind !== 'frame' && ringsOverlap(ring, obstacle.ring)) found.push(obstacle.thing);
  const boundary = ground.boundary;
  if (boundary && ring.some((point) => whereIs(boundary, point) === 'outside'))
    found.push({ kind: 'boundary', id: 'boundary' });
  return found;
}

/**
 * Stands a seat's pole. The pole takes the first leg + spacer of each face; a frame nearer than that and the working
 * clearance wants it set off along the wall line, past the corner and away from the frame. Set off along one line by the
 * clearance or more it also stands that far off the other face, and so is clear of a frame there too.
 */
export function standClear(drawing: Drawing, seat: Seat, jambs: readonly NearJamb[], ground: Ground): Standing {
  const kit = drawing.poleKit;
  const room = kit.leg + kit.spacer + kit.clearance;
  const near = jambs.filter((jamb) => jamb.distance < room);
  const plain = standAt(seat, kit);
  const plainIn = standsIn(plain.ring, ground);
  if (near.length === 0) return { ...plain, setOff: null, frames: [], blockedBy: plainIn };
  if (seat.shape === 'wraps') {
    const tries = near
      .map((jamb) => {
        const own = room - jamb.distance;
        return { jamb, by: near.length > 1 ? Math.max(own, kit.clearance) : own };
      })
      .sort((a, b) => a.by - b.by);
    for (const { jamb, by } of tries) {
      const stand = standAt(seat, kit, scaled(negate(jamb.face.along), by));
      if (standsIn(stand.ring, ground).length > 0) continue;
      return {
        ...stand,
        setOff: { runId: jamb.face.runId, by: ticks(by), for: jamb.opening },
        frames: [],
        blockedBy: [],
      };
    }
  }
  const frames = near.map((jamb) => ({ opening: jamb.opening, short: ticks(room - jamb.distance) }));
  return { ...plain, setOff: null, frames, blockedBy: plainIn };
}
