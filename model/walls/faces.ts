/** The faces and body of each run, from how its two ends meet their neighbours. */
import type { PlanPoint, Vec } from '../geometry/point';
import { add, along, dot, scale, toPoint } from '../geometry/vec';
import { roundTicks, type Ticks } from '../length/ticks';
import type { RayEnd } from './meetings';
import type { ReadyRun } from './runs';
import type { RunEnd, RunGeometry } from './types';

export interface FacedRun {
  readonly geometry: RunGeometry;
  /** From and to where, along the outside face, an opening may stand: clear of other runs' bodies. */
  readonly clear: readonly [number, number];
  /** How much longer the run would have to be for its corners; 0 where it is long enough. */
  readonly shortBy: Ticks;
}

interface Sides {
  readonly outside: readonly [Vec, Vec];
  readonly inside: readonly [Vec, Vec];
  readonly shortBy: number;
}

/** The four corners of the body from the two ends, kept from turning inside out where the run is too short for them. */
function sidesOf(ready: ReadyRun, start: RayEnd, end: RayEnd): Sides {
  const { direction, inward, thickness, length, from } = ready;
  // At its first corner the ray looks along the run, at its second back along it: left and right change places.
  const outsideStart = dot(start.right, direction);
  const insideStart = dot(start.left, direction);
  const outsideEnd = length + dot(end.left, direction);
  const insideEnd = length + dot(end.right, direction);
  const place = (at: number, across: number): Vec => add(along(from, direction, at), scale(inward, across));
  const outsideLength = outsideEnd - outsideStart;
  const insideLength = insideEnd - insideStart;
  if (outsideLength > 0 && insideLength > 0) {
    return {
      outside: [place(outsideStart, 0), place(outsideEnd, 0)],
      inside: [place(insideStart, thickness), place(insideEnd, thickness)],
      shortBy: 0,
    };
  }
  const shortBy = 0 - Math.min(outsideLength, insideLength);
  if (outsideLength <= 0 && insideLength <= 0) {
    return {
      outside: [place(0, 0), place(length, 0)],
      inside: [place(0, thickness), place(length, thickness)],
      shortBy,
    };
  }
  // The two mitres cross inside the wall: the body ends in a point there.
  const part = outsideLength / (outsideLength - insideLength);
  const tip = place(outsideStart + (insideStart - outsideStart) * part, thickness * part);
  return insideLength <= 0
    ? { outside: [place(outsideStart, 0), place(outsideEnd, 0)], inside: [tip, tip], shortBy }
    : { outside: [tip, tip], inside: [place(insideStart, thickness), place(insideEnd, thickness)], shortBy };
}

function withoutRepeats(ring: readonly PlanPoint[]): readonly PlanPoint[] {
  return ring.filter((point, i) => {
    const before = ring[(i + ring.length - 1) % ring.length];
    return !before || before.x !== point.x || before.y !== point.y;
  });
}

/** Faces, lengths and body of one run between the two ends that `meetAtCorner` found for it. */
export function faceRun(ready: ReadyRun, start: RayEnd, end: RayEnd, ends: readonly [RunEnd, RunEnd]): FacedRun {
  const { run, from, to, direction, inward, thickness, length } = ready;
  const sides = sidesOf(ready, start, end);
  const faceLength = (face: readonly [Vec, Vec]): number => Math.hypot(face[1].x - face[0].x, face[1].y - face[0].y);
  const outside = faceLength(sides.outside);
  const inside = faceLength(sides.inside);
  const whole = sides.shortBy === 0;
  const middle = (at: Vec, meeting: RayEnd): Vec[] => (meeting.middle && whole ? [add(at, meeting.middle)] : []);
  const ring = [
    sides.outside[0],
    sides.outside[1],
    ...middle(to, end),
    sides.inside[1],
    sides.inside[0],
    ...middle(from, start),
  ];
  const geometry: RunGeometry = {
    runId: run.id,
    name: `${from.letter}–${to.letter}`,
    wallTypeId: run.wallTypeId,
    thickness,
    direction,
    inward,
    start: { x: from.x, y: from.y },
    end: { x: to.x, y: to.y },
    length: roundTicks(length),
    insideLength: roundTicks(inside),
    centreLength: roundTicks((outside + inside) / 2),
    outside: [toPoint(sides.outside[0]), toPoint(sides.outside[1])],
    inside: [toPoint(sides.inside[0]), toPoint(sides.inside[1])],
    body: withoutRepeats(ring.map(toPoint)),
    ends,
  };
  return { geometry, clear: [start.clear, length - end.clear], shortBy: roundTicks(sides.shortBy) };
}
