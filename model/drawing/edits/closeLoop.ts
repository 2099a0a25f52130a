/** Closes a chain of runs into an outline, and turns runs round so that an outline stands inside its line. */
import { signedArea } from '../../geometry/polygon';
import type { Drawing, Opening, WallRun } from '../schema';
import { addRun } from './addRun';
import { findCorner, lengthBetween, otherEnd, runsByCorner, type NewId, placeAlong } from './find';

interface Chain {
  /** From the corner that was asked for to the other end; the same corner again where the chain is closed. */
  readonly cornerIds: readonly string[];
  readonly runs: readonly WallRun[];
}

/** Follows the chain of runs from a corner, as long as each corner on the way joins just two. */
function chainFrom(drawing: Drawing, cornerId: string): Chain {
  const runsAt = runsByCorner(drawing);
  const cornerIds = [cornerId];
  const runs: WallRun[] = [];
  const seen = new Set<string>();
  for (let at = cornerId; ;) {
    const here = runsAt.get(at) ?? [];
    const next = here.find((run) => !seen.has(run.id));
    if (!next || (runs.length > 0 && here.length !== 2)) return { cornerIds, runs };
    seen.add(next.id);
    runs.push(next);
    at = otherEnd(next, at);
    cornerIds.push(at);
    if (at === cornerId) return { cornerIds, runs };
  }
}

/**
 * Joins the free end of a chain of runs to the chain's other free end. The new run goes the same way round as the last one
 * drawn. The same drawing comes back where the chain has fewer than two runs, is closed, or ends at a tee.
 */
export function closeLoop(drawing: Drawing, cornerId: string, newId: NewId): Drawing {
  const chain = chainFrom(drawing, cornerId);
  const last = chain.cornerIds[chain.cornerIds.length - 1];
  const first = chain.runs[0];
  if (!first || last === undefined || last === cornerId || chain.runs.length < 2) return drawing;
  const runsAt = runsByCorner(drawing);
  if (runsAt.get(cornerId)?.length !== 1 || runsAt.get(last)?.length !== 1) return drawing;
  const [from, to] = first.to === cornerId ? [cornerId, last] : [last, cornerId];
  return addRun(
    drawing,
    { from: { kind: 'corner', cornerId: from }, to: { kind: 'corner', cornerId: to }, wallTypeId: first.wallTypeId },
    newId,
  );
}

function turnOpening(opening: Opening, length: number): Opening {
  const at = placeAlong(length - opening.at - opening.width);
  if (opening.kind !== 'door') return { ...opening, at };
  const hinge = opening.swing.hinge === 'near' ? 'far' : 'near';
  return { ...opening, at, swing: { ...opening.swing, hinge } };
}

/**
 * Turns runs round: their bodies come to lie on the other side of their lines. Openings and hinges stay at their jambs; a
 * door that opened in still opens in, to the new inside.
 */
export function reverseRuns(drawing: Drawing, runIds: readonly string[]): Drawing {
  const turned = new Set(runIds);
  const lengths = new Map<string, number>();
  for (const run of drawing.runs) {
    if (!turned.has(run.id)) continue;
    const from = findCorner(drawing, run.from);
    const to = findCorner(drawing, run.to);
    if (from && to) lengths.set(run.id, lengthBetween(from, to));
  }
  if (lengths.size === 0) return drawing;
  return {
    ...drawing,
    runs: drawing.runs.map((run) => (lengths.has(run.id) ? { ...run, from: run.to, to: run.from } : run)),
    openings: drawing.openings.map((opening) => {
      const length = lengths.get(opening.runId);
      return length === undefined ? opening : turnOpening(opening, length);
    }),
  };
}

/** Turns the runs of the closed outline through a corner so that every body lies inside; the same drawing where it is open. */
export function standInside(drawing: Drawing, cornerId: string): Drawing {
  const chain = chainFrom(drawing, cornerId);
  if (chain.runs.length < 3 || chain.cornerIds[chain.cornerIds.length - 1] !== cornerId) return drawing;
  const ring = chain.cornerIds.slice(0, -1).flatMap((id) => findCorner(drawing, id) ?? []);
  const counterClockwise = signedArea(ring) > 0;
  const wrong = chain.runs.filter((run, i) => (run.from === chain.cornerIds[i]) !== counterClockwise);
  return reverseRuns(
    drawing,
    wrong.map((run) => run.id),
  );
}
