/** The surveyed foundation: its high point, its profile under every run, and the bedding that levels it. */
import type { Drawing } from '../drawing/schema';
import type { Survey } from '../drawing/surveySchema';
import { inches, mm, ticks, type Ticks } from '../length/ticks';
import type { Reason } from '../reasons';
import { ruleValue } from '../rules/registry';
import type { Walls } from '../walls/types';
import { coursedType } from './coursedType';
import { fillCorners } from './fillCorners';
import { bookReasons } from './bookReasons';
import { placeReadings, type PlacedReading } from './placeReadings';
import { takeReadings } from './takeReadings';
import type { Ground, GroundStation, ProfilePoint } from './types';

/**
 * Levels the foundation from readings measured down from one level line, or from a level book reduced to the same. The smallest reading is the high point and
 * becomes height zero; every other place is lower by the difference, and its bedding is thicker by the same. The
 * first-course top is the high point + least bedding + one unit, one level all the way round (common practice, no source).
 * With no reading on the drawing the foundation is taken as level, 48 in or 1 200 mm below the level line.
 */
export function levelGround(drawing: Drawing, walls: Walls, survey: Survey): Ground {
  const type = coursedType(drawing);
  const { readings, book } = takeReadings(survey, drawing.ruleValues);
  const { placed, reasons: placing } = placeReadings(walls, readings);
  const reasons: Reason[] = [...placing, ...(book ? bookReasons(drawing, book) : [])];
  const assumed = placed.length === 0;
  const least = assumed
    ? assumedLevelLine(drawing)
    : ticks(placed.reduce((smallest, { reading }) => Math.min(smallest, reading.down), Infinity));
  if (assumed) reasons.push({ code: 'surveyAssumed', weight: 'note', thing: { kind: 'site', id: 'site' } });

  const stations = placed.map((one) => toStation(one, least, type.bedding));
  const rereadingMost = ruleValue(drawing, 'rereadingMost');
  for (const station of stations) {
    if (station.spread > rereadingMost) {
      reasons.push({
        code: 'rereadingsDiffer',
        weight: 'note',
        thing: { kind: 'station', id: station.readingId },
        rule: 'rereadingMost',
        amount: station.spread,
      });
    }
    if (station.over > 0) {
      reasons.push({
        code: 'beddingOverMost',
        weight: 'warning',
        thing: { kind: 'station', id: station.readingId },
        amount: station.over,
      });
    }
  }
  const { heightByCorner, profileByRun } = profiles(walls, placed, least, reasons);
  const lowest = stations.reduce((low, { height }) => Math.min(low, height), 0);
  return {
    assumed,
    levelLine: least,
    highPoint: stations.find((station) => station.height === 0) ?? null,
    range: ticks(0 - lowest),
    stations,
    profileByRun,
    heightByCorner,
    leastBedding: type.bedding.least,
    firstCourseTop: ticks(type.bedding.least + (type.firstCourse ?? type.unit).height),
    book,
    reasons,
  };
}

/** Where no reading was taken: the level line is set at a height that is easy to reach (common practice, no source). */
function assumedLevelLine(drawing: Drawing): Ticks {
  return drawing.units === 'imperial' ? inches(48) : mm(1200);
}

function heightOf(down: Ticks, least: Ticks): Ticks {
  return ticks(least - down);
}

function toStation(placed: PlacedReading, least: Ticks, limits: { least: Ticks; most: Ticks }): GroundStation {
  const { reading, at, earlier } = placed;
  const downs = [reading, ...earlier].map(({ down }) => down);
  const bedding = ticks(limits.least + (reading.down - least));
  return {
    readingId: reading.id,
    station: reading.station,
    at,
    down: reading.down,
    height: heightOf(reading.down, least),
    bedding,
    over: ticks(Math.max(0, bedding - limits.most)),
    earlier: earlier.map(({ id, down }) => ({ readingId: id, down })),
    spread: ticks(downs.reduce((a, b) => Math.max(a, b), -Infinity) - downs.reduce((a, b) => Math.min(a, b), Infinity)),
  };
}

function profiles(
  walls: Walls,
  placed: readonly PlacedReading[],
  least: Ticks,
  reasons: Reason[],
): { heightByCorner: Map<string, Ticks>; profileByRun: Map<string, ProfilePoint[]> } {
  const read = new Map<string, Ticks>();
  const along = new Map<string, ProfilePoint[]>();
  for (const { reading, cornerId, runId, along: at } of placed) {
    const height = heightOf(reading.down, least);
    if (cornerId !== null) read.set(cornerId, height);
    else if (runId !== null) {
      const points = along.get(runId);
      if (points) points.push({ at, height });
      else along.set(runId, [{ at, height }]);
    }
  }
  for (const points of along.values()) points.sort((a, b) => a.at - b.at);

  const filled = placed.length === 0 ? new Map<string, Ticks>() : fillCorners(walls, read, along);
  const heightByCorner = new Map<string, Ticks>();
  for (const { cornerId } of walls.corners) {
    heightByCorner.set(cornerId, read.get(cornerId) ?? filled.get(cornerId) ?? ticks(0));
    if (placed.length > 0 && !read.has(cornerId)) {
      reasons.push({ code: 'cornerNotRead', weight: 'note', thing: { kind: 'corner', id: cornerId } });
    }
  }
  const profileByRun = new Map<string, ProfilePoint[]>();
  for (const run of walls.runs) {
    const start = heightByCorner.get(run.ends[0].cornerId) ?? ticks(0);
    const end = heightByCorner.get(run.ends[1].cornerId) ?? ticks(0);
    profileByRun.set(run.runId, [
      { at: ticks(0), height: start },
      ...(along.get(run.runId) ?? []),
      { at: run.length, height: end },
    ]);
  }
  return { heightByCorner, profileByRun };
}
