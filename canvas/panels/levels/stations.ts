/** The stations of a site in the order in which one walks round the walls. */
import type { Drawing } from '../../../model/drawing/schema';
import type { Reading, Station, Survey } from '../../../model/drawing/surveySchema';
import type { Ticks } from '../../../model/length/ticks';
import { placeReadings, type PlacedReading } from '../../../model/survey/placeReadings';
import { takeReadings } from '../../../model/survey/takeReadings';
import type { RunGeometry, Walls } from '../../../model/walls/types';

export interface StationEntry {
  /** The same for the same place, read or not. */
  readonly key: string;
  readonly station: Station;
  /** Letter of a corner; null along a run. */
  readonly letter: string | null;
  /** For a station along a run: the run's name, the letter it is measured from, and how far. */
  readonly along: { readonly run: string; readonly letter: string; readonly at: Ticks } | null;
  readonly reading: Reading | null;
}

export interface StationBook {
  readonly entries: readonly StationEntry[];
  /** Readings whose corner or run is no longer drawn. */
  readonly off: readonly Reading[];
}

export function stationKey(station: Station): string {
  return station.kind === 'corner' ? `corner ${station.cornerId}` : `run ${station.runId} ${station.at}`;
}

/** Corners and runs as one passes them: each loop in turn, then what belongs to none. */
function inOrder(walls: Walls): readonly (RunGeometry | { readonly cornerId: string })[] {
  const order: (RunGeometry | { readonly cornerId: string })[] = [];
  const seen = new Set<string>();
  const passCorner = (cornerId: string) => {
    if (seen.has(cornerId)) return;
    seen.add(cornerId);
    order.push({ cornerId });
  };
  const passRun = (runId: string) => {
    const run = walls.runById.get(runId);
    if (!run || seen.has(runId)) return;
    seen.add(runId);
    order.push(run);
  };
  for (const loop of walls.footprints) {
    loop.cornerIds.forEach((cornerId, i) => {
      passCorner(cornerId);
      const runId = loop.runIds[i];
      if (runId !== undefined) passRun(runId);
    });
  }
  for (const run of walls.runs) {
    passCorner(run.ends[0].cornerId);
    passRun(run.runId);
    passCorner(run.ends[1].cornerId);
  }
  return order;
}

/** Every corner, read or not, and every station that was read along a run; of a station read twice, its last reading. */
export function listStations(walls: Walls, survey: Survey, ruleValues: Drawing['ruleValues'] = {}): StationBook {
  const { readings } = takeReadings(survey, ruleValues);
  const { placed, reasons } = placeReadings(walls, readings);
  const atCorner = new Map<string, Reading>();
  const alongRun = new Map<string, PlacedReading[]>();
  for (const one of placed) {
    if (one.cornerId !== null) atCorner.set(one.cornerId, one.reading);
    else if (one.runId !== null) alongRun.set(one.runId, [...(alongRun.get(one.runId) ?? []), one]);
  }
  const entries = inOrder(walls).flatMap((passed): StationEntry[] => {
    if ('runId' in passed) return along(passed, walls, alongRun.get(passed.runId) ?? []);
    const station = { kind: 'corner', cornerId: passed.cornerId } as const;
    const letter = walls.cornerById.get(passed.cornerId)?.letter ?? '';
    const reading = atCorner.get(passed.cornerId) ?? null;
    return [{ key: stationKey(station), station, letter, along: null, reading }];
  });
  const offIds = new Set(reasons.filter(({ code }) => code === 'readingOffDrawing').map(({ thing }) => thing.id));
  return { entries, off: readings.filter(({ id }) => offIds.has(id)) };
}

function along(run: RunGeometry, walls: Walls, placed: readonly PlacedReading[]): StationEntry[] {
  const letter = walls.cornerById.get(run.ends[0].cornerId)?.letter ?? '';
  return [...placed]
    .sort((a, b) => a.along - b.along)
    .map(({ reading, along: at }) => {
      const station = { kind: 'run', runId: run.runId, at } as const;
      return { key: stationKey(station), station, letter: null, along: { run: run.name, letter, at }, reading };
    });
}

/** The station after `key` that has no reading, looking round from there; null where all are read. */
export function nextUnread(entries: readonly StationEntry[], key: string): string | null {
  const from = entries.findIndex((entry) => entry.key === key);
  for (let i = 1; i <= entries.length; i++) {
    const entry = entries[(from + i + entries.length) % entries.length];
    if (entry && entry.reading === null && entry.key !== key) return entry.key;
  }
  return null;
}
