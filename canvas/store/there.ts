/** Whether a thing is in a drawing, and which run it belongs to. */
import type { Drawing } from '../../model/drawing/schema';
import type { ThingRef } from '../../model/things';

/** A pole along a run is named by the run and how far along it stands. */
function poleHost(id: string): { readonly runId: string } | null {
  const split = id.indexOf('@');
  return split < 0 ? null : { runId: id.slice(0, split) };
}

/** True when the thing stands in the drawing. Things of the set-out alone (courses, lifts, stations) are taken as there. */
export function isThere(drawing: Drawing, thing: ThingRef): boolean {
  const has = (list: readonly { readonly id: string }[]) => list.some((item) => item.id === thing.id);
  switch (thing.kind) {
    case 'corner':
      return has(drawing.corners);
    case 'run':
      return has(drawing.runs);
    case 'opening':
      return has(drawing.openings);
    case 'keepClear':
      return has(drawing.keepClears);
    case 'boundary':
      return drawing.boundary !== null;
    case 'controlHeight':
      return has(drawing.controlHeights);
    case 'bondBeam':
      return has(drawing.bondBeams);
    case 'wallType':
      return has(drawing.wallTypes);
    case 'pole':
    case 'brace': {
      const poleId = thing.kind === 'brace' ? thing.id.replace(/\.\d+$/, '') : thing.id;
      const along = poleHost(poleId);
      if (along) return drawing.runs.some((run) => run.id === along.runId);
      return drawing.corners.some((corner) => corner.id === poleId);
    }
    default:
      return true;
  }
}

/** The run whose elevation shows the thing; null where it belongs to none. A corner shows the run that starts there. */
export function runOf(drawing: Drawing, thing: ThingRef): string | null {
  if (thing.kind === 'run') return thing.id;
  if (thing.kind === 'opening') return drawing.openings.find((opening) => opening.id === thing.id)?.runId ?? null;
  if (thing.kind === 'corner' || thing.kind === 'pole') {
    const along = poleHost(thing.id);
    if (along) return along.runId;
    const starts = drawing.runs.find((run) => run.from === thing.id);
    return (starts ?? drawing.runs.find((run) => run.to === thing.id))?.id ?? null;
  }
  return null;
}
