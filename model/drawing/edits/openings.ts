/** Adds, moves and changes openings. */
import { roundTicks, ticks, type Ticks } from '../../length/ticks';
import { newOpening, type OpeningKind } from '../defaults';
import { openingSchema, type Door, type Drawing, type Opening } from '../schema';
import { findRun, lengthBetween, MOST_THINGS, replaceById, runWithCorners, type NewId } from './find';

/** A place along a run at which an opening of a width lies within it; as near 0 as can be where it is wider than the run. */
function within(drawing: Drawing, runId: string, at: Ticks, width: Ticks): Ticks | null {
  const found = runWithCorners(drawing, runId);
  if (!found || !Number.isFinite(at)) return null;
  const most = lengthBetween(found.from, found.to) - width;
  return ticks(Math.max(0, Math.min(roundTicks(at), most)));
}

/** Adds an opening of usual size with its near jamb at a place on a run, kept between the run's ends. */
export function addOpening(
  drawing: Drawing,
  place: { readonly kind: OpeningKind; readonly runId: string; readonly at: Ticks },
  newId: NewId,
): Drawing {
  if (drawing.openings.length >= MOST_THINGS || !findRun(drawing, place.runId)) return drawing;
  const opening = newOpening(drawing.units, place.kind, { id: newId(), runId: place.runId, at: ticks(0) });
  const at = within(drawing, place.runId, place.at, opening.width);
  return at === null ? drawing : { ...drawing, openings: [...drawing.openings, { ...opening, at }] };
}

/** Moves an opening along its run or to another, kept between the run's ends. */
export function moveOpening(drawing: Drawing, openingId: string, runId: string, at: Ticks): Drawing {
  const openings = replaceById(drawing.openings, openingId, (opening) => {
    const place = within(drawing, runId, at, opening.width);
    return place === null || (place === opening.at && runId === opening.runId)
      ? opening
      : { ...opening, runId, at: place };
  });
  return openings === drawing.openings ? drawing : { ...drawing, openings };
}

/** Any of an opening's fields besides its id; a swing is kept only by a door, a way through by a door or passage. */
export type OpeningChange = Partial<Omit<Door, 'id' | 'kind'>> & { readonly kind?: OpeningKind };

function asKind(drawing: Drawing, opening: Opening, kind: OpeningKind): Opening {
  if (kind === opening.kind) return opening;
  const usual = newOpening(drawing.units, kind, opening);
  // A window's sill is no door's: sill and frame come with the kind, the rest is the opening's own.
  const { at, width, head, lintel } = opening;
  const base = { ...usual, at, width, head, lintel };
  return 'way' in opening && 'way' in base ? { ...base, way: opening.way } : base;
}

/** Changes any of an opening's fields. The same drawing comes back where the opening would not be one any more. */
export function changeOpening(drawing: Drawing, openingId: string, change: OpeningChange): Drawing {
  const openings = replaceById(drawing.openings, openingId, (opening) => {
    const { kind, swing, way, ...fields } = change;
    const next: Opening = { ...asKind(drawing, opening, kind ?? opening.kind), ...fields };
    const withWay = way !== undefined && 'way' in next ? { ...next, way } : next;
    const whole = swing !== undefined && withWay.kind === 'door' ? { ...withWay, swing } : withWay;
    return openingSchema.safeParse(whole).success && findRun(drawing, whole.runId) ? whole : opening;
  });
  return openings === drawing.openings ? drawing : { ...drawing, openings };
}
