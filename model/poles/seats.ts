/** Where poles are wanted: every place at a corner where a line starts, and along runs whose line would be too long. */
import type { Drawing } from '../drawing/schema';
import type { PlanPoint, Vec } from '../geometry/point';
import { cross, dot, negate, perp } from '../geometry/vec';
import type { Ticks } from '../length/ticks';
import type { RunGeometry, Walls } from '../walls/types';
import { degreesBetween, stepFrom } from './plane';

/** One wall face that ends at a pole's seat. */
export interface SeatFace {
  readonly runId: string;
  /** Along the face, away from the seat. */
  readonly along: Vec;
  /** Off the face, to the open side where the pole stands. */
  readonly off: Vec;
  /** True for the face that the line is strung to. */
  readonly outside: boolean;
  /** False for the short face that closes a free end. */
  readonly isRun: boolean;
}

export interface Seat {
  readonly id: string;
  readonly letter: string;
  readonly cornerId: string | null;
  /** Where the two faces meet. */
  readonly vertex: PlanPoint;
  readonly faces: readonly [SeatFace, SeatFace];
  /** `wraps`: the wall's angle points at the pole. `angle`: the pole stands in the angle. `flat`: on a face that goes on. */
  readonly shape: 'wraps' | 'angle' | 'flat';
}

/** Within this of a straight angle, in degrees, a pole lies flat on the face. */
const FLAT_WITHIN = 30;
/** Within this of a straight angle, in degrees, a line runs on through a corner. */
const STRAIGHT_WITHIN = 1;

/** More runs than this at one corner can't be built, and have a reason of their own. */
const ARMS_MOST = 8;

interface Arm {
  readonly run: RunGeometry;
  readonly away: Vec;
  readonly outsideOff: Vec;
  readonly bearing: number;
}

function armsAt(cornerId: string, runIds: readonly string[], walls: Walls): Arm[] {
  const arms: Arm[] = [];
  for (const runId of runIds) {
    const run = walls.runById.get(runId);
    if (!run || run.length <= 0) continue;
    const starts = run.ends[0].cornerId === cornerId;
    const away = starts ? run.direction : negate(run.direction);
    arms.push({ run, away, outsideOff: negate(run.inward), bearing: Math.atan2(away.y, away.x) });
  }
  return arms.sort((a, b) => a.bearing - b.bearing);
}

function faceOf(arm: Arm, off: Vec): SeatFace {
  return { runId: arm.run.runId, along: arm.away, off, outside: dot(off, arm.outsideOff) > 0, isRun: true };
}

/** Where two faces meet: the point at each face's own distance from the corner. */
function vertexOf(at: PlanPoint, a: Arm, b: Arm, offA: Vec, offB: Vec): PlanPoint {
  const depthA = dot(offA, a.outsideOff) > 0 ? 0 : a.run.thickness;
  const depthB = dot(offB, b.outsideOff) > 0 ? 0 : b.run.thickness;
  const sine = cross(offA, offB);
  if (Math.abs(sine) < 0.05) return stepFrom(at, [offA, Math.max(depthA, depthB)]);
  return stepFrom(at, [perp(offB), -depthA / sine], [perp(offA), depthB / sine]);
}

function sweep(from: Arm, to: Arm): number {
  const least = degreesBetween(from.away, to.away);
  return cross(from.away, to.away) < 0 ? 360 - least : least;
}

function shapeOf(angle: number): Seat['shape'] {
  if (Math.abs(angle - 180) <= FLAT_WITHIN) return 'flat';
  return angle > 180 ? 'wraps' : 'angle';
}

interface Sector {
  readonly faces: readonly [SeatFace, SeatFace];
  readonly vertex: PlanPoint;
  readonly angle: number;
  readonly lines: number;
}

/** The open places round a corner, between one run and the next counter-clockwise, where at least one line starts. */
function sectorsAt(at: PlanPoint, arms: readonly Arm[]): Sector[] {
  const sectors: Sector[] = [];
  arms.forEach((arm, i) => {
    const next = arms[(i + 1) % arms.length];
    if (!next || next === arm) return;
    const offA = perp(arm.away);
    const offB = negate(perp(next.away));
    const faces = [faceOf(arm, offA), faceOf(next, offB)] as const;
    const lines = faces.filter((face) => face.outside).length;
    const angle = sweep(arm, next);
    const runsOn = Math.abs(angle - 180) <= STRAIGHT_WITHIN && (lines === 2 || lines === 0);
    if (lines === 0 || runsOn) return;
    sectors.push({ faces, vertex: vertexOf(at, arm, next, offA, offB), angle, lines });
  });
  return sectors;
}

function freeEnd(at: PlanPoint, arm: Arm): Sector {
  const run: SeatFace = faceOf(arm, arm.outsideOff);
  const end: SeatFace = {
    runId: arm.run.runId,
    along: negate(arm.outsideOff),
    off: negate(arm.away),
    outside: false,
    isRun: false,
  };
  return { faces: [run, end], vertex: at, angle: 270, lines: 1 };
}

/** Seats at corners, in the drawing's order; the first at a corner carries the corner's own id and letter. */
export function seatsAtCorners(walls: Walls): Seat[] {
  const seats: Seat[] = [];
  for (const corner of walls.corners) {
    const arms = armsAt(corner.cornerId, corner.runIds, walls);
    if (arms.length > ARMS_MOST) continue;
    const only = arms.length === 1 ? arms[0] : undefined;
    const sectors = only ? [freeEnd(corner.at, only)] : sectorsAt(corner.at, arms);
    sectors.sort((a, b) => b.lines - a.lines);
    sectors.forEach((sector, i) => {
      const first = i === 0;
      const line = sector.faces.find((face) => face.outside) ?? sector.faces[0];
      const run = walls.runById.get(line.runId);
      const at = run && run.ends[0].cornerId === corner.cornerId ? 0 : (run?.length ?? 0);
      seats.push({
        id: first ? corner.cornerId : `${line.runId}@${at}`,
        letter: first ? corner.letter : `${corner.letter}${i + 1}`,
        cornerId: corner.cornerId,
        vertex: sector.vertex,
        faces: sector.faces,
        shape: shapeOf(sector.angle),
      });
    });
  }
  return seats;
}

/** A stretch of line between two seats: one run, or several that follow straight on. */
interface Stretch {
  readonly runs: readonly RunGeometry[];
  readonly length: number;
}

function stretches(walls: Walls, seated: ReadonlySet<string>): Stretch[] {
  const found: Stretch[] = [];
  const used = new Set<string>();
  const startsAt = new Map<string, RunGeometry[]>();
  for (const run of walls.runs) {
    const list = startsAt.get(run.ends[0].cornerId);
    if (list) list.push(run);
    else startsAt.set(run.ends[0].cornerId, [run]);
  }
  const follow = (first: RunGeometry) => {
    const runs = [first];
    used.add(first.runId);
    let last = first;
    for (;;) {
      const end = last.ends[1].cornerId;
      const next = (startsAt.get(end) ?? []).find(
        (run) => !used.has(run.runId) && dot(run.direction, last.direction) > 0.9998,
      );
      if (!next || seated.has(`${end} ${last.runId}`)) break;
      runs.push(next);
      used.add(next.runId);
      last = next;
    }
    found.push({ runs, length: runs.reduce((sum, run) => sum + run.length, 0) });
  };
  const begins = walls.runs.filter((run) => run.length > 0 && seated.has(`${run.ends[0].cornerId} ${run.runId}`));
  for (const run of begins) if (!used.has(run.runId)) follow(run);
  for (const run of walls.runs) if (run.length > 0 && !used.has(run.runId)) follow(run);
  return found;
}

/** The place nearest `wanted` where a pole `wide` clears every opening of the run by `clear`; null where there is none. */
function freePlace(
  run: RunGeometry,
  jambs: readonly (readonly [number, number])[],
  wanted: number,
  wide: number,
  clear: number,
) {
  const isFree = (at: number) =>
    at >= clear &&
    at + wide + clear <= run.length &&
    jambs.every(([a, b]) => at + wide + clear <= a || at - clear >= b);
  const tries = [wanted, ...jambs.flatMap(([a, b]) => [a - clear - wide, b + clear]), clear, run.length - wide - clear];
  return tries.sort((a, b) => Math.abs(a - wanted) - Math.abs(b - wanted) || a - b).find(isFree) ?? null;
}

export interface RunSeats {
  readonly seats: readonly Seat[];
  /** Runs whose line stays too long because openings leave no place for a pole, with the excess. */
  readonly crowded: readonly { readonly runId: string; readonly over: Ticks; readonly openingIds: readonly string[] }[];
}

/** Seats along the lines longer than `lineMost`, evenly spaced and clear of the frames. */
export function seatsAlongRuns(drawing: Drawing, walls: Walls, corners: readonly Seat[], lineMost: number): RunSeats {
  const seated = new Set(
    corners.flatMap((seat) =>
      seat.faces.filter((face) => face.outside).map((face) => `${seat.cornerId} ${face.runId}`),
    ),
  );
  const openings = new Map(drawing.openings.map((opening) => [opening.id, opening]));
  const wide = drawing.poleKit.leg;
  const clear = drawing.poleKit.spacer + drawing.poleKit.clearance;
  const seats: Seat[] = [];
  const crowded: { runId: string; over: Ticks; openingIds: string[] }[] = [];
  if (!(lineMost > 0)) return { seats, crowded };
  for (const stretch of stretches(walls, seated)) {
    const parts = Math.min(400, Math.ceil(stretch.length / lineMost));
    const placed = new Map<string, { at: number; run: RunGeometry }[]>();
    for (let i = 1; i < parts; i += 1) {
      let before = 0;
      const goal = (stretch.length * i) / parts;
      const run = stretch.runs.find((each) => (goal < before + each.length ? true : ((before += each.length), false)));
      if (!run) continue;
      const ids = walls.openingsByRun.get(run.runId) ?? [];
      const jambs = ids.flatMap((id) => {
        const opening = openings.get(id);
        return opening ? [[opening.at, opening.at + opening.width] as const] : [];
      });
      const at = freePlace(run, jambs, Math.round(goal - before - wide / 2), wide, clear);
      const list = placed.get(run.runId) ?? [];
      if (at === null || list.some((other) => Math.abs(other.at - at) < wide + clear)) {
        crowded.push({ runId: run.runId, over: Math.round(stretch.length - lineMost) as Ticks, openingIds: [...ids] });
        continue;
      }
      list.push({ at, run });
      placed.set(run.runId, list);
    }
    for (const list of placed.values())
      list
        .sort((a, b) => a.at - b.at)
        .forEach(({ at, run }, i) => {
          const off = negate(run.inward);
          const face = (along: Vec): SeatFace => ({ runId: run.runId, along, off, outside: true, isRun: true });
          seats.push({
            id: `${run.runId}@${at}`,
            letter: list.length === 1 ? run.name : `${run.name} ${i + 1}`,
            cornerId: null,
            vertex: stepFrom(run.start, [run.direction, at]),
            faces: [face(run.direction), face(negate(run.direction))],
            shape: 'flat',
          });
        });
  }
  return { seats, crowded };
}
