/**
 * Only the product's own pages may change anything: a browser names the page that a request came from, and says
 * whether it is of the same site. Programs that send neither header carry no one's cookies by accident.
 */
import type { RequestHandler } from 'express';
import { ownOrigins } from '../auth/auth';
import type { Env } from '../config/env';
import { word } from '../words';
import { Failure } from './failure';

const READS = new Set(['GET', 'HEAD', 'OPTIONS']);

export function refuseOtherOrigins(env: Env): RequestHandler {
  const own = new Set(ownOrigins(env));
  return (req, _res, next) => {
    if (READS.has(req.method)) return next();
    const origin = req.get('origin');
    const fetchSite = req.get('sec-fetch-site');
    const foreign = origin === undefined ? fetchSite !== undefined && fetchSite !== 'same-origin' : !own.has(origin);
    if (foreign) throw new Failure('notAllowed', word('server.otherOrigin'));
    next();
  };
}
