/** Readings put where they were taken: by corner, and along each run. */
import type { PlanPoint } from '../geometry/point';
import { roundTicks, type Ticks } from '../length/ticks';
import type { Reading } from '../drawing/surveySchema';
import type { Reason } from '../reasons';
import type { Walls } from '../walls/types';

export interface PlacedReading {
  readonly reading: Reading;
  readonly at: PlanPoint;
  /** The corner it stands for: its own, or the one that a reading at a run's very end shares. */
  readonly cornerId: string | null;
  readonly runId: string | null;
  readonly along: Ticks;
  /** What was read here before, first to last: kept, but not in force. */
  readonly earlier: readonly Reading[];
}

export interface PlacedReadings {
  /** In the survey's order; one for each station. */
  readonly placed: readonly PlacedReading[];
  readonly reasons: readonly Reason[];
}

/**
 * Puts every reading on the drawing. Of a station read again the last reading is in force and the earlier ones stay
 * beside it. A reading at a run's very end is its corner's. One whose corner or run is gone, or past the run's end, is
 * left out with a reason. Readings of either method, as `takeReadings` gives them.
 */
export function placeReadings(walls: Walls, readings: readonly Reading[]): PlacedReadings {
  const reasons: Reason[] = [];
  const byStation = new Map<string, PlacedReading>();
  for (const reading of readings) {
    const placed = placeReading(walls, reading);
    if (!placed) {
      reasons.push({ code: 'readingOffDrawing', weight: 'warning', thing: { kind: 'station', id: reading.id } });
      continue;
    }
    const key = placed.cornerId !== null ? `c:${placed.cornerId}` : `r:${placed.runId}@${placed.along}`;
    const before = byStation.get(key);
    byStation.delete(key);
    byStation.set(key, before ? { ...placed, earlier: [...before.earlier, before.reading] } : placed);
  }
  return { placed: [...byStation.values()], reasons };
}

function placeReading(walls: Walls, reading: Reading): PlacedReading | null {
  const { station } = reading;
  const none = 0 as Ticks;
  if (station.kind === 'corner') {
    const corner = walls.cornerById.get(station.cornerId);
    return corner ? { reading, at: corner.at, cornerId: corner.cornerId, runId: null, along: none, earlier: [] } : null;
  }
  const run = walls.runById.get(station.runId);
  if (!run || station.at < 0 || station.at > run.length) return null;
  const end = station.at === 0 ? run.ends[0] : station.at === run.length ? run.ends[1] : null;
  const part = run.length === 0 ? 0 : station.at / run.length;
  const at = {
    x: roundTicks(run.start.x + (run.end.x - run.start.x) * part),
    y: roundTicks(run.start.y + (run.end.y - run.start.y) * part),
  };
  return end
    ? { reading, at, cornerId: end.cornerId, runId: null, along: none, earlier: [] }
    : { reading, at, cornerId: null, runId: run.runId, along: station.at, earlier: [] };
}
