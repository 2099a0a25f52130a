/** What wants a height on this drawing: openings, control heights and bond beams, sorted into stops and refusals. */
import type { Drawing } from '../drawing/schema';
import { feet, mm, ticks, type Ticks } from '../length/ticks';
import type { Reason } from '../reasons';
import type { Ground } from '../survey/types';
import type { Walls } from '../walls/types';
import type { Control, Stop } from './problem';

/** Highest wall that is coursed, and most courses: beyond these nothing is coursed. */
export const MOST_COURSES = 1000;

/** Soft heights that the search holds at once, the heaviest first; the others take the course line nearest to them. */
const MOST_SOFT_STOPS = 24;

export interface Gathered {
  readonly stops: readonly Stop[];
  /** Heights that no course line is asked to meet; each has its reason. */
  readonly left: readonly Control[];
  /** Where masonry goes on to above the last stop, when nothing drawn ends it. */
  readonly openTop: Ticks | null;
  /** Some soft heights were left out because the search can't hold so many. */
  readonly tooMany: boolean;
  readonly reasons: readonly Reason[];
}

/** Sorts every height that courses should meet. */
export function gatherControls(drawing: Drawing, walls: Walls, ground: Ground): Gathered {
  const reasons: Reason[] = [];
  const beams = beamsInOrder(drawing, ground, reasons);
  const lastBeam = beams[beams.length - 1];
  const beamTop = lastBeam ? ticks(lastBeam.height + lastBeam.beamDepth) : null;
  const plate = highestPlate(drawing, beamTop ?? ground.firstCourseTop);
  const drawn = [...openingControls(drawing, walls), ...heightControls(drawing)];

  const isSecondStorey = new Set(
    drawing.openings.filter((opening) => beamTop !== null && opening.sill >= beamTop).map((opening) => opening.id),
  );
  const wallTop = (control: Control): Ticks | null => {
    if (plate !== null) return plate;
    if (beamTop === null || control.thing.kind !== 'opening' || isSecondStorey.has(control.thing.id)) return null;
    return beamTop;
  };
  const left: Control[] = [];
  const kept: Control[] = [];
  for (const control of drawn) {
    const refusal = refuse(control, wallTop(control), beams, ground.firstCourseTop);
    if (refusal) {
      reasons.push(refusal);
      left.push(control);
    } else kept.push(control);
  }
  const { stops, tooMany } = toStops(beams, kept);
  left.push(...tooMany);
  if (tooMany.length > 0) reasons.push({ code: 'searchBoundReached', weight: 'note', thing: SITE });
  const highest = kept.reduce((high, { height }) => Math.max(high, height), 0);
  const ends = plate !== null || (beamTop !== null && highest <= beamTop);
  if (!ends) reasons.push({ code: 'noWallTop', weight: 'note', thing: SITE });
  return {
    stops,
    left,
    openTop: ends ? null : openTop(drawing, Math.max(highest, beamTop ?? 0)),
    tooMany: tooMany.length > 0,
    reasons,
  };
}

const SITE = { kind: 'site', id: 'site' } as const;

/** Without a plate or a last beam: 10 ft or 3 m, or a lintel's depth over the highest head (common practice, no source). */
function openTop(drawing: Drawing, highest: number): Ticks {
  const lintel = drawing.openings.reduce((most, opening) => Math.max(most, opening.lintel.depth), 0);
  const usual = drawing.units === 'imperial' ? feet(10) : mm(3000);
  return ticks(Math.max(usual, highest + lintel));
}

function beamsInOrder(drawing: Drawing, ground: Ground, reasons: Reason[]): Stop[] {
  const sorted = [...drawing.bondBeams].sort((a, b) => a.soffit - b.soffit);
  const stops: Stop[] = [];
  let below: { id: string; top: number } | null = null;
  for (const beam of sorted) {
    const thing = { kind: 'bondBeam', id: beam.id } as const;
    if (beam.soffit < ground.firstCourseTop) {
      reasons.push(belowFirst(thing, beam.soffit, ground.firstCourseTop));
      continue;
    }
    if (below && beam.soffit < below.top) {
      reasons.push({
        code: 'beamsOverlap',
        weight: 'blocked',
        thing,
        against: [{ kind: 'bondBeam', id: below.id }],
        amount: ticks(below.top - beam.soffit),
      });
      continue;
    }
    below = { id: beam.id, top: beam.soffit + beam.depth };
    const { soffit: height, tolerance, hold } = beam;
    const control: Control = { thing, kind: 'bondBeam', height, tolerance, hold, weight: BEAM_WEIGHT };
    stops.push({ height, hold, tolerance, weight: BEAM_WEIGHT, controls: [control], beamDepth: beam.depth });
  }
  return stops;
}

/** A beam runs all round the building: a miss of it weighs as much as ten openings (common practice, no source). */
const BEAM_WEIGHT = 10;

function highestPlate(drawing: Drawing, above: Ticks): Ticks | null {
  const heights = drawing.controlHeights
    .filter((control) => control.kind === 'plate' && control.height > above)
    .map((control) => control.height);
  return heights.length === 0 ? null : ticks(Math.max(...heights));
}

function openingControls(drawing: Drawing, walls: Walls): Control[] {
  const valid = new Set([...walls.openingsByRun.values()].flat());
  return drawing.openings.flatMap((opening): Control[] => {
    if (!valid.has(opening.id)) return [];
    const base = {
      thing: { kind: 'opening', id: opening.id },
      // A miss that the tape can't show is none.
      tolerance: drawing.tapeStep,
      hold: 'soft',
      weight: 1,
    } as const;
    const head: Control = { ...base, kind: 'head', height: opening.head };
    // An opening down to the foundation has no masonry sill to land on a course line.
    return opening.sill > 0 ? [{ ...base, kind: 'sill', height: opening.sill }, head] : [head];
  });
}

function heightControls(drawing: Drawing): Control[] {
  return drawing.controlHeights.map(({ id, kind, height, tolerance, hold, weight }) => ({
    thing: { kind: 'controlHeight', id },
    kind,
    height,
    tolerance,
    hold,
    weight,
  }));
}

function belowFirst(thing: Control['thing'], height: Ticks, first: Ticks): Reason {
  return {
    code: 'heightBelowFirstCourse',
    weight: 'warning',
    thing,
    amount: ticks(first - height),
    nearest: { below: null, above: first },
  };
}

function refuse(control: Control, wallTop: Ticks | null, beams: readonly Stop[], first: Ticks): Reason | null {
  const { thing, height } = control;
  if (height < first) return belowFirst(thing, height, first);
  if (wallTop !== null && height > wallTop) {
    return {
      code: control.thing.kind === 'opening' ? 'openingAboveWall' : missCode(control),
      weight: 'warning',
      thing,
      amount: ticks(height - wallTop),
      nearest: { below: wallTop, above: null },
    };
  }
  const beam = beams.find((one) => height > one.height && height < one.height + one.beamDepth);
  if (!beam) return null;
  const top = ticks(beam.height + beam.beamDepth);
  return {
    code: 'heightInsideBeam',
    weight: 'warning',
    thing,
    against: beam.controls.map((one) => one.thing),
    amount: ticks(Math.min(height - beam.height, top - height)),
    nearest: { below: beam.height, above: top },
  };
}

export function missCode(control: Pick<Control, 'hold'>): 'hardHeightNotMet' | 'softHeightMissed' {
  return control.hold === 'hard' ? 'hardHeightNotMet' : 'softHeightMissed';
}

/** Merges controls that want one height into one stop, and keeps the soft ones to what the search can hold. */
function toStops(beams: readonly Stop[], controls: readonly Control[]): { stops: Stop[]; tooMany: Control[] } {
  const byHeight = new Map<Ticks, Control[]>();
  for (const control of controls) {
    const list = byHeight.get(control.height);
    if (list) list.push(control);
    else byHeight.set(control.height, [control]);
  }
  const merged = [...byHeight].map(([height, together]): Stop => {
    const weight = together.reduce((sum, control) => sum + control.weight, 0);
    const tolerance = ticks(together.reduce((least, control) => Math.min(least, control.tolerance), Infinity));
    const hold = together.some((control) => control.hold === 'hard') ? 'hard' : 'soft';
    return { height, hold, tolerance, weight, controls: together, beamDepth: ticks(0) };
  });
  const atBeam = new Map(beams.map((beam) => [beam.height, beam]));
  const joined = new Map<Ticks, Stop>();
  const others: Stop[] = [];
  for (const stop of merged) {
    const beam = atBeam.get(stop.height);
    if (!beam) others.push(stop);
    else {
      joined.set(beam.height, {
        ...beam,
        hold: beam.hold === 'hard' || stop.hold === 'hard' ? 'hard' : 'soft',
        tolerance: ticks(Math.min(beam.tolerance, stop.tolerance)),
        weight: beam.weight + stop.weight,
        controls: [...beam.controls, ...stop.controls],
      });
    }
  }
  const soft = others.filter((stop) => stop.hold === 'soft').sort((a, b) => b.weight - a.weight || a.height - b.height);
  const held = new Set([...others.filter((stop) => stop.hold === 'hard'), ...soft.slice(0, MOST_SOFT_STOPS)]);
  return {
    stops: [...[...held], ...beams.map((beam) => joined.get(beam.height) ?? beam)].sort((a, b) => a.height - b.height),
    tooMany: soft.slice(MOST_SOFT_STOPS).flatMap((stop) => [...stop.controls]),
  };
}
