/** Limits of tries, counted by the caller's address, for what can be guessed at or used to send mail. */
import { rateLimit } from 'express-rate-limit';
import type { RequestHandler } from 'express';
import type { Env } from '../config/env';
import { word } from '../words';
import { Failure } from './failure';

export interface Tries {
  readonly most: number;
  readonly minutes: number;
}

/** Tests come from one address and far faster than people: they are given a hundred times as many. */
const TEST_FACTOR = 100;

export function limitTries(env: Env, { most, minutes }: Tries): RequestHandler {
  return rateLimit({
    windowMs: minutes * 60_000,
    limit: env.NODE_ENV === 'test' ? most * TEST_FACTOR : most,
    standardHeaders: 'draft-7',
    legacyHeaders: false,
    handler: (_req, _res, next) => next(new Failure('tooMany', word('server.tooMany'))),
  });
}
