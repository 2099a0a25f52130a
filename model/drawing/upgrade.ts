/** Drawings as they were stored, of any version that there has been, as drawings of today's version. */
import { z } from 'zod';
import { drawingSchema, type Drawing } from './schema';

export type StoredDrawing =
  | { readonly ok: true; readonly drawing: Drawing }
  | {
      readonly ok: false;
      /** `newer`: written by a later version of the program. `unreadable`: not a drawing, or a damaged one. */
      readonly problem: 'newer' | 'unreadable';
      /** Where in the stored value, as `runs.3.from`; '' for the whole. */
      readonly path: string;
    };

const CURRENT = 1;
const versionSchema = z.looseObject({ version: z.number().int().min(1) });

/** Steps from each version to the one after it. */
const STEPS: ReadonlyMap<number, (stored: unknown) => unknown> = new Map();

/** Reads a stored drawing, brought up to today's version step by step and checked whole. */
export function parseStoredDrawing(json: unknown): StoredDrawing {
  const versioned = versionSchema.safeParse(json);
  if (!versioned.success) return { ok: false, problem: 'unreadable', path: '' };
  const { version } = versioned.data;
  if (version > CURRENT) return { ok: false, problem: 'newer', path: 'version' };
  let stored: unknown = json;
  for (let step = version; step < CURRENT; step++) stored = STEPS.get(step)?.(stored) ?? stored;
  const parsed = drawingSchema.safeParse(stored);
  if (parsed.success) return { ok: true, drawing: parsed.data };
  return { ok: false, problem: 'unreadable', path: parsed.error.issues[0]?.path.join('.') ?? '' };
}
