/** What changed of the openings. */
import type { Drawing, Opening } from '../drawing/schema';
import type { Ticks } from '../length/ticks';
import { matchById, sameData } from './matching';
import type { Change } from './types';

/** Letters of a drawing's corners and runs, for the names in changes. */
export interface Letters {
  readonly corner: ReadonlyMap<string, string>;
  readonly run: ReadonlyMap<string, { readonly name: string; readonly from: string; readonly to: string }>;
}

export function lettersOf(drawing: Drawing): Letters {
  const corner = new Map(drawing.corners.map((each) => [each.id, each.letter]));
  const run = new Map(
    drawing.runs.map((each) => {
      const from = corner.get(each.from) ?? '';
      const to = corner.get(each.to) ?? '';
      return [each.id, { name: `${from}–${to}`, from, to }];
    }),
  );
  return { corner, run };
}

function whole(opening: Opening, code: 'openingAdded' | 'openingRemoved', letters: Letters): Change {
  const run = letters.run.get(opening.runId)?.name ?? '';
  const added = code === 'openingAdded';
  return {
    code,
    thing: { kind: 'opening', id: opening.id },
    names: { kind: opening.kind, run },
    before: added ? null : opening.width,
    after: added ? opening.width : null,
  };
}

function changed(was: Opening, now: Opening, letters: Letters): Change[] {
  const changes: Change[] = [];
  const run = letters.run.get(now.runId);
  const names = { kind: now.kind, run: run?.name ?? '' };
  const thing = { kind: 'opening', id: now.id } as const;
  const note = (code: Change['code'], before: Ticks | null, after: Ticks | null, more: Record<string, string> = {}) =>
    changes.push({ code, thing, names: { ...names, ...more }, before, after });
  if (was.at !== now.at)
    note('openingMoved', was.at, now.at, { toward: (now.at > was.at ? run?.to : run?.from) ?? '' });
  if (was.width !== now.width) note('openingWidth', was.width, now.width);
  if (was.sill !== now.sill) note('openingSill', was.sill, now.sill);
  if (was.head !== now.head) note('openingHead', was.head, now.head);
  if (was.frame !== now.frame) note('openingFrame', was.frame, now.frame);
  if (was.lintel.depth !== now.lintel.depth) note('lintel', was.lintel.depth, now.lintel.depth, { part: 'depth' });
  if (was.lintel.bearing !== now.lintel.bearing)
    note('lintel', was.lintel.bearing, now.lintel.bearing, { part: 'bearing' });
  if (was.kind === 'door' && now.kind === 'door') {
    if (was.swing.hinge !== now.swing.hinge)
      note('doorHinge', null, null, { corner: (now.swing.hinge === 'near' ? run?.from : run?.to) ?? '' });
    if (was.swing.opens !== now.swing.opens) note('doorOpens', null, null, { opens: now.swing.opens });
  }
  if (was.kind !== 'window' && now.kind !== 'window' && !sameData(was.way, now.way)) {
    const use = was.way.used === now.way.used ? 'size' : now.way.used ? 'used' : 'unused';
    note('doorWay', was.way.width, now.way.width, { use });
  }
  return changes;
}

/** One that went to another run, or became another kind, is removed and added. */
export function compareOpenings(before: Drawing, after: Drawing): Change[] {
  const old = lettersOf(before);
  const letters = lettersOf(after);
  const matched = matchById(before.openings, after.openings);
  const changes = matched.removed.map((opening) => whole(opening, 'openingRemoved', old));
  changes.push(...matched.added.map((opening) => whole(opening, 'openingAdded', letters)));
  for (const [was, now] of matched.both)
    if (was.runId !== now.runId || was.kind !== now.kind)
      changes.push(whole(was, 'openingRemoved', old), whole(now, 'openingAdded', letters));
    else changes.push(...changed(was, now, letters));
  return changes;
}
