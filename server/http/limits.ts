/** Limits of tries, counted by the caller's address, for what can be guessed at or used to send mail. */
import { rateLimit } from 'express-rate-limit';
import type { RequestHandler } from 'express';
import { word } from '../words';
import { Failure } from './failure';

export interface Tries {
  readonly most: number;
  readonly minutes: number;
}

export function limitTries({ most, minutes }: Tries): RequestHandler {
  return rateLimit({
    windowMs: minutes * 60_000,
    limit: most,
    standardHeaders: 'draft-7',
    legacyHeaders: false,
    handler: (_req, _res, next) => next(new Failure('tooMany', word('server.tooMany'))),
  });
}
