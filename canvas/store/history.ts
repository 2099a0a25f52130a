/** Undo and redo of a drawing, by small patches: what an edit replaced, never whole copies. */
import { applyPatches, enablePatches, produceWithPatches, type Patch } from 'immer';
import type { Drawing } from '../../model/drawing/schema';

enablePatches();

/** One undo step: a dictionary key that names it, and the patches both ways. */
export interface HistoryEntry {
  readonly label: string;
  readonly patches: readonly Patch[];
  readonly inverse: readonly Patch[];
}

export interface History {
  readonly past: readonly HistoryEntry[];
  readonly future: readonly HistoryEntry[];
}

export const EMPTY_HISTORY: History = { past: [], future: [] };

/** Steps that can be undone; older ones are forgotten. */
export const HISTORY_MOST = 200;

type Item = { readonly id?: string };

/** Writes into `target` only what differs between two versions, list items by identity, so that the patches stay small. */
function rewrite(target: Drawing, before: Drawing, after: Drawing): void {
  for (const key of Object.keys(after) as (keyof Drawing)[]) {
    const old = before[key];
    const now = after[key];
    if (old === now) continue;
    if (Array.isArray(old) && Array.isArray(now)) rewriteList(target[key] as Item[], old as Item[], now as Item[]);
    else Object.assign(target, { [key]: now });
  }
}

function rewriteList(target: Item[], before: readonly Item[], after: readonly Item[]): void {
  let head = 0;
  const shorter = Math.min(before.length, after.length);
  if (before.length === after.length) {
    for (let i = 0; i < after.length; i += 1) if (before[i] !== after[i]) target[i] = after[i]!;
    return;
  }
  while (head < shorter && before[head] === after[head]) head += 1;
  let tail = 0;
  while (tail < shorter - head && before[before.length - 1 - tail] === after[after.length - 1 - tail]) tail += 1;
  target.splice(head, before.length - head - tail, ...after.slice(head, after.length - tail));
}

/** The step from one drawing to another; null when nothing changed. */
export function entryBetween(before: Drawing, after: Drawing, label: string): HistoryEntry | null {
  if (before === after) return null;
  const [, patches, inverse] = produceWithPatches(before, (draft) => rewrite(draft as Drawing, before, after));
  return patches.length === 0 ? null : { label, patches, inverse };
}

/** Remembers a step; what had been undone can no longer be redone. */
export function remember(history: History, entry: HistoryEntry): History {
  return { past: [...history.past, entry].slice(-HISTORY_MOST), future: [] };
}

export interface Stepped {
  readonly history: History;
  readonly drawing: Drawing;
}

/** Takes the last step back; null when there is none. */
export function undoStep(history: History, drawing: Drawing): Stepped | null {
  const entry = history.past.at(-1);
  if (!entry) return null;
  return {
    history: { past: history.past.slice(0, -1), future: [...history.future, entry] },
    drawing: applyPatches(drawing, entry.inverse as Patch[]),
  };
}

/** Makes the last undone step again; null when there is none. */
export function redoStep(history: History, drawing: Drawing): Stepped | null {
  const entry = history.future.at(-1);
  if (!entry) return null;
  return {
    history: { past: [...history.past, entry], future: history.future.slice(0, -1) },
    drawing: applyPatches(drawing, entry.patches as Patch[]),
  };
}
