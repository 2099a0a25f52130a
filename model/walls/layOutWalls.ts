/** The walls of a drawing: faces, mitres, lengths, footprints, and what is wrong with them. */
import type { Corner, Drawing, Opening } from '../drawing/schema';
import { roundTicks, ticks } from '../length/ticks';
import type { Reason } from '../reasons';
import { coincidingCorners, findCrossings } from './crossings';
import { faceRun, type FacedRun } from './faces';
import { diagonalsOf, findLoops, footprintOf } from './loops';
import { meetAtCorner, rayOf, sortRays, type CornerMeeting, type Ray, type RayEnd } from './meetings';
import { placeOpenings } from './openings';
import { readyRuns, type ReadyRun } from './runs';
import type { CornerGeometry, RunEnd, RunningDimension, Walls } from './types';

/** More runs than this at one corner can't be bonded. */
const RUNS_AT_CORNER_MOST = 4;

interface Meetings {
  readonly byCorner: ReadonlyMap<string, CornerMeeting>;
  readonly reasons: readonly Reason[];
}

function meetCorners(corners: readonly Corner[], runs: readonly ReadyRun[]): Meetings {
  const rays = new Map<string, Ray[]>(corners.map((corner) => [corner.id, []]));
  for (const ready of runs) {
    rays.get(ready.run.from)?.push(rayOf(ready, true));
    rays.get(ready.run.to)?.push(rayOf(ready, false));
  }
  const byCorner = new Map<string, CornerMeeting>();
  const reasons: Reason[] = [];
  for (const corner of corners) {
    const sorted = sortRays(corner, rays.get(corner.id) ?? []);
    const meeting = meetAtCorner(sorted);
    byCorner.set(corner.id, meeting);
    const thing = { kind: 'corner', id: corner.id } as const;
    const against = sorted.map((ray) => ({ kind: 'run', id: ray.ready.run.id }) as const);
    if (sorted.length > RUNS_AT_CORNER_MOST)
      reasons.push({ code: 'tooManyRunsMeet', weight: 'blocked', thing, against });
    if (meeting.tooSharp) reasons.push({ code: 'cornerTooSharp', weight: 'warning', thing, against });
  }
  return { byCorner, reasons };
}

function faceRuns(runs: readonly ReadyRun[], meetings: ReadonlyMap<string, CornerMeeting>): readonly FacedRun[] {
  const ends = new Map<string, [RayEnd | null, RayEnd | null]>(runs.map((ready) => [ready.run.id, [null, null]]));
  const others = new Map<RayEnd, readonly string[]>();
  for (const meeting of meetings.values()) {
    for (const end of meeting.ends) {
      const pair = ends.get(end.ray.ready.run.id);
      if (pair) pair[end.ray.first ? 0 : 1] = end;
      others.set(
        end,
        meeting.ends.filter((other) => other !== end).map((other) => other.ray.ready.run.id),
      );
    }
  }
  const runEnd = (cornerId: string, end: RayEnd): RunEnd => ({
    cornerId,
    kind: end.kind,
    others: others.get(end) ?? [],
  });
  return runs.flatMap((ready) => {
    const [start, end] = ends.get(ready.run.id) ?? [null, null];
    if (!start || !end) return [];
    return [faceRun(ready, start, end, [runEnd(ready.run.from, start), runEnd(ready.run.to, end)])];
  });
}

function cornerGeometry(corner: Corner, meeting: CornerMeeting | undefined): CornerGeometry {
  return {
    cornerId: corner.id,
    letter: corner.letter,
    at: { x: corner.x, y: corner.y },
    kind: meeting?.kind ?? 'alone',
    runIds: meeting?.ends.map((end) => end.ray.ready.run.id) ?? [],
    angle: meeting?.angle ?? null,
  };
}

/** One gauge serves the whole building, so every wall type in use needs units of one height. */
function unitHeights(drawing: Drawing, runs: readonly ReadyRun[]): readonly Reason[] {
  const used = new Set(runs.map((ready) => ready.run.wallTypeId));
  const types = drawing.wallTypes.filter((type) => used.has(type.id));
  const [first, ...rest] = types;
  if (!first) return [];
  return rest
    .filter((type) => type.unit.height !== first.unit.height)
    .map((type) => ({
      code: 'unitHeightsDiffer',
      weight: 'blocked',
      thing: { kind: 'wallType', id: type.id },
      against: [{ kind: 'wallType', id: first.id }],
      amount: ticks(Math.abs(type.unit.height - first.unit.height)),
    }));
}

function runningAlong(run: FacedRun, openings: readonly Opening[]): readonly RunningDimension[] {
  const { runId, length } = run.geometry;
  const jambs = openings
    .flatMap((opening) => [
      { runId, at: opening.at, what: 'jamb' as const, openingId: opening.id },
      { runId, at: ticks(opening.at + opening.width), what: 'jamb' as const, openingId: opening.id },
    ])
    .sort((a, b) => a.at - b.at);
  return [...jambs, { runId, at: length, what: 'end', openingId: null }];
}

function groupByRun(openings: readonly Opening[]): ReadonlyMap<string, readonly Opening[]> {
  const groups = new Map<string, Opening[]>();
  for (const opening of openings) {
    const group = groups.get(opening.runId);
    if (group) group.push(opening);
    else groups.set(opening.runId, [opening]);
  }
  return groups;
}

/**
 * Lays out the walls of a drawing. Every run that has a length gets its faces and body; what is degenerate is left out of
 * the rest and named in `reasons`. Total over what the schema admits; cost grows with the building.
 */
export function layOutWalls(drawing: Drawing): Walls {
  const ready = readyRuns(drawing);
  const meetings = meetCorners(drawing.corners, ready.runs);
  const faced = faceRuns(ready.runs, meetings.byCorner);
  const runs = faced.map((run) => run.geometry);
  const runById = new Map(runs.map((run) => [run.runId, run]));
  const corners = drawing.corners.map((corner) => cornerGeometry(corner, meetings.byCorner.get(corner.id)));
  const cornerById = new Map(corners.map((corner) => [corner.cornerId, corner]));
  const footprints = findLoops(corners, runById).map((loop) => footprintOf(loop, runById));

  const tooShort = faced.flatMap((run): Reason[] =>
    run.shortBy > 0
      ? [
          {
            code: 'runTooShortForCorner',
            weight: 'blocked',
            thing: { kind: 'run', id: run.geometry.runId },
            against: run.geometry.ends.flatMap((end) => end.others.map((id) => ({ kind: 'run' as const, id }))),
            amount: run.shortBy,
          },
        ]
      : [],
  );
  const onRun = groupByRun(drawing.openings);
  const openingsByRun = new Map<string, readonly string[]>();
  const running: RunningDimension[] = [];
  const openingReasons: Reason[] = [];
  for (const run of faced) {
    const placed = placeOpenings(run, onRun.get(run.geometry.runId) ?? []);
    openingsByRun.set(
      run.geometry.runId,
      placed.openings.map((opening) => opening.id),
    );
    running.push(...runningAlong(run, placed.openings));
    openingReasons.push(...placed.reasons);
  }
  return {
    runs,
    runById,
    corners,
    cornerById,
    footprints,
    diagonals: footprints.flatMap((footprint) => diagonalsOf(footprint, cornerById)),
    running,
    openingsByRun,
    perimeter: roundTicks(footprints.reduce((sum, footprint) => sum + footprint.perimeter, 0)),
    reasons: [
      ...ready.reasons,
      ...coincidingCorners(drawing.corners),
      ...meetings.reasons,
      ...tooShort,
      ...unitHeights(drawing, ready.runs),
      ...findCrossings(ready.runs, runById),
      ...openingReasons,
    ],
  };
}
