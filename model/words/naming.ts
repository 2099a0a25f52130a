/** Things by the names that a crew would use. */
import type { Drawing, Opening } from '../drawing/schema';
import type { Survey } from '../drawing/surveySchema';
import type { ThingRef } from '../things';
import type { Say } from './say';

export interface NameOptions {
  /** `title` stands alone or first (“Door in A–B”), `running` within a sentence (“the door in A–B”). */
  readonly form?: 'title' | 'running';
  /** Needed only to say where a reading was taken. */
  readonly survey?: Survey;
}

interface Names {
  readonly letters: ReadonlyMap<string, string>;
  readonly runs: ReadonlyMap<
    string,
    { readonly name: string; readonly from: string; readonly to: string; readonly length: number }
  >;
  readonly openings: ReadonlyMap<string, Opening>;
  /** 1, 2 … along its run, among openings of its kind; 0 for the only one. */
  readonly numbers: ReadonlyMap<string, number>;
}

/** Drawings are never changed in place, so their names are made once. */
const known = new WeakMap<Drawing, Names>();

function numberOpenings(openings: readonly Opening[]): Map<string, number> {
  const groups = new Map<string, Opening[]>();
  for (const opening of openings) {
    const key = `${opening.kind} ${opening.runId}`;
    const group = groups.get(key);
    if (group) group.push(opening);
    else groups.set(key, [opening]);
  }
  const numbers = new Map<string, number>();
  for (const group of groups.values()) {
    const sorted = [...group].sort((a, b) => a.at - b.at || (a.id < b.id ? -1 : 1));
    sorted.forEach((opening, i) => numbers.set(opening.id, group.length === 1 ? 0 : i + 1));
  }
  return numbers;
}

function namesOf(drawing: Drawing): Names {
  const found = known.get(drawing);
  if (found) return found;
  const corners = new Map(drawing.corners.map((corner) => [corner.id, corner]));
  const runs = new Map(
    drawing.runs.map((run) => {
      const a = corners.get(run.from);
      const b = corners.get(run.to);
      const [from, to] = [a?.letter ?? '', b?.letter ?? ''];
      const length = a && b ? Math.round(Math.hypot(b.x - a.x, b.y - a.y)) : 0;
      return [run.id, { name: `${from}–${to}`, from, to, length }];
    }),
  );
  const names: Names = {
    letters: new Map(drawing.corners.map((corner) => [corner.id, corner.letter])),
    runs,
    openings: new Map(drawing.openings.map((opening) => [opening.id, opening])),
    numbers: numberOpenings(drawing.openings),
  };
  known.set(drawing, names);
  return names;
}

interface Named {
  readonly key: string;
  readonly params?: Readonly<Record<string, string | number>>;
}

const GONE: Named = { key: 'gone' };

function nameOpening(id: string, names: Names): Named {
  const opening = names.openings.get(id);
  if (!opening) return GONE;
  const run = names.runs.get(opening.runId)?.name ?? '';
  const number = names.numbers.get(id) ?? 0;
  return number === 0
    ? { key: opening.kind, params: { run } }
    : { key: `${opening.kind}Number`, params: { run, number } };
}

/** A pole's id is its corner's, or a run's with a place along it: within the run, or at its end for a corner's second pole. */
function namePole(id: string, names: Names): Named {
  const letter = names.letters.get(id);
  if (letter !== undefined) return { key: '', params: { letter } };
  const [runId = '', place = ''] = id.split('@');
  const run = names.runs.get(runId);
  if (!run) return GONE;
  const at = Number(place);
  if (at === 0) return { key: 'Second', params: { letter: run.from } };
  if (Math.abs(at - run.length) <= 1) return { key: 'Second', params: { letter: run.to } };
  return { key: 'Along', params: { run: run.name } };
}

function nameBrace(id: string, names: Names): Named {
  const dot = id.lastIndexOf('.');
  const pole = namePole(id.slice(0, dot), names);
  return pole === GONE ? GONE : { key: `brace${pole.key}`, params: { ...pole.params, number: id.slice(dot + 1) } };
}

function nameStation(id: string, names: Names, survey: Survey | undefined): Named {
  const station = survey?.readings.find((reading) => reading.id === id)?.station;
  if (!station) return { key: 'station' };
  if (station.kind === 'corner') {
    const letter = names.letters.get(station.cornerId);
    return letter === undefined ? { key: 'station' } : { key: 'stationCorner', params: { letter } };
  }
  const run = names.runs.get(station.runId);
  return run ? { key: 'stationRun', params: { run: run.name } } : { key: 'station' };
}

const CONTROL_KEYS = {
  sill: 'controlSill',
  head: 'controlHead',
  plate: 'controlPlate',
  named: 'controlNamed',
} as const;

function named(thing: ThingRef, drawing: Drawing, survey: Survey | undefined): Named {
  const names = namesOf(drawing);
  switch (thing.kind) {
    case 'corner': {
      const letter = names.letters.get(thing.id);
      return letter === undefined ? GONE : { key: 'corner', params: { letter } };
    }
    case 'run': {
      const run = names.runs.get(thing.id);
      return run ? { key: 'run', params: { run: run.name } } : GONE;
    }
    case 'opening':
      return nameOpening(thing.id, names);
    case 'pole': {
      const pole = namePole(thing.id, names);
      return pole === GONE ? GONE : { key: `pole${pole.key}`, params: pole.params ?? {} };
    }
    case 'brace':
      return nameBrace(thing.id, names);
    case 'station':
      return nameStation(thing.id, names, survey);
    case 'keepClear': {
      const area = drawing.keepClears.find((each) => each.id === thing.id);
      return area ? { key: 'keepClear', params: { name: area.name } } : GONE;
    }
    case 'controlHeight': {
      const control = drawing.controlHeights.find((each) => each.id === thing.id);
      if (!control) return GONE;
      return control.name
        ? { key: 'controlHeight', params: { name: control.name } }
        : { key: CONTROL_KEYS[control.kind] };
    }
    case 'bondBeam': {
      const beam = drawing.bondBeams.find((each) => each.id === thing.id);
      if (!beam) return GONE;
      return beam.name ? { key: 'bondBeam', params: { name: beam.name } } : { key: 'bondBeamPlain' };
    }
    case 'wallType': {
      const type = drawing.wallTypes.find((each) => each.id === thing.id);
      if (!type) return GONE;
      return type.name ? { key: 'wallType', params: { name: type.name } } : { key: 'wallTypePlain' };
    }
    case 'lift':
    case 'course':
      return { key: thing.kind, params: { number: thing.id } };
    case 'boundary':
    case 'site':
      return { key: thing.kind };
  }
}

/** The name of anything in a drawing or its set-out. What is no longer drawn is said to be so. */
export function nameThing(thing: ThingRef, drawing: Drawing, say: Say, options: NameOptions = {}): string {
  const { key, params } = named(thing, drawing, options.survey);
  return say(`reasons.${options.form ?? 'title'}.${key}`, params);
}

/** “a, b and c”. */
export function listOf(names: readonly string[], say: Say): string {
  const last = names[names.length - 1] ?? '';
  if (names.length < 2) return last;
  const list = names
    .slice(0, -1)
    .reduce((sum, name) => (sum === '' ? name : say('reasons.comma', { list: sum, last: name })), '');
  return say('reasons.and', { list, last });
}
