/** Turns whatever was thrown into an answer in the one shape of errors; what nobody foresaw is logged, not told. */
import type { ErrorRequestHandler, RequestHandler } from 'express';
import { Failure } from './failure';
import { word } from '../words';

/** What body-parser throws: a status and a type, no class of its own. */
function bodyFailure(error: unknown): Failure | null {
  if (typeof error !== 'object' || error === null || !('type' in error)) return null;
  switch (error.type) {
    case 'entity.too.large':
      return new Failure('tooLarge', word('server.tooLarge'));
    case 'entity.parse.failed':
      return new Failure('badInput', word('server.notJson'), { field: 'body' });
    case 'encoding.unsupported':
    case 'charset.unsupported':
    case 'request.size.invalid':
    case 'request.aborted':
      return new Failure('badInput', word('server.notReadable'), { field: 'body' });
    default:
      return null;
  }
}

/** Express throws a URIError with a status of 400 for a path that can't be decoded. */
function pathFailure(error: unknown): Failure | null {
  return error instanceof URIError ? new Failure('notFound', word('server.notFound')) : null;
}

export function answerErrors(): ErrorRequestHandler {
  return (error: unknown, req, res, next) => {
    const foreseen = error instanceof Failure ? error : (bodyFailure(error) ?? pathFailure(error));
    if (foreseen === null) req.log.error({ err: error }, 'a request failed');
    if (res.headersSent) {
      next(error);
      return;
    }
    const failure = foreseen ?? new Failure('broken', word('server.broken', { id: String(req.id) }));
    res.status(failure.status).json(failure.toBody());
  };
}

/** For every path under /api that no route answers. */
export function answerNoSuchPath(): RequestHandler {
  return () => {
    throw new Failure('notFound', word('server.notFound'));
  };
}
