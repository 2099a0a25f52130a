/** Reads a body of JSON, and refuses text in it that no database can keep. */
import express, { type RequestHandler } from 'express';
import { word } from '../words';
import { Failure } from './failure';

/** A NUL character or half of a surrogate pair: JSON can spell both, PostgreSQL refuses them. */
const UNKEEPABLE = /[\0\p{Cs}]/u;

/** Where the first such text is, `drawing.corners.0.id`; null when there is none. */
function findUnkeepable(value: unknown, path: readonly string[]): string | null {
  if (typeof value === 'string') return UNKEEPABLE.test(value) ? path.join('.') || 'body' : null;
  if (typeof value !== 'object' || value === null) return null;
  for (const [key, item] of Object.entries(value)) {
    const found = UNKEEPABLE.test(key) ? [...path, '?'].join('.') : findUnkeepable(item, [...path, key]);
    if (found !== null) return found;
  }
  return null;
}

/** `limit` as body-parser reads it: `4mb`. */
export function readJson(limit: string): RequestHandler[] {
  const parse = express.json({
    limit,
    strict: false,
    // Such text can only be there where something is escaped; most bodies need no second look.
    verify: (_req, res, text) => {
      Reflect.set(res, 'hasEscapes', text.includes('\\u'));
    },
  });
  const check: RequestHandler = (req, res, next) => {
    const found = Reflect.get(res, 'hasEscapes') === true ? findUnkeepable(req.body, []) : null;
    if (found !== null) throw new Failure('badInput', word('server.badText'), { field: found });
    next();
  };
  return [parse, check];
}
