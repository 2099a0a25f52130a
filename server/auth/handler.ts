/** better-auth behind Express: only the paths we describe, and refusals in our own shape beside better-auth's code. */
import { toNodeHandler } from 'better-auth/node';
import type { RequestHandler } from 'express';
import type { ErrorCode } from '../../model/contracts/common';
import { Failure } from '../http/failure';
import { word, type WordKey } from '../words';
import type { Auth } from './auth';
import { authRoutes } from './contracts';

interface Refusal {
  readonly code: ErrorCode;
  readonly key: WordKey;
  readonly field?: string;
}

/** better-auth's codes that a person can do something about. */
const REFUSALS: Readonly<Record<string, Refusal>> = {
  INVALID_EMAIL_OR_PASSWORD: { code: 'signedOut', key: 'server.wrongSignIn' },
  INVALID_EMAIL: { code: 'badInput', key: 'server.badAddress', field: 'email' },
  INVALID_PASSWORD: { code: 'badInput', key: 'server.passwordTooShort', field: 'password' },
  PASSWORD_TOO_SHORT: { code: 'badInput', key: 'server.passwordTooShort', field: 'password' },
  PASSWORD_TOO_LONG: { code: 'badInput', key: 'server.passwordTooLong', field: 'password' },
  USER_ALREADY_EXISTS: { code: 'alreadyThere', key: 'server.addressTaken', field: 'email' },
  USER_ALREADY_EXISTS_USE_ANOTHER_EMAIL: { code: 'alreadyThere', key: 'server.addressTaken', field: 'email' },
  INVALID_TOKEN: { code: 'expired', key: 'server.linkExpired', field: 'token' },
  INVALID_ORIGIN: { code: 'notAllowed', key: 'server.otherOrigin' },
  MISSING_OR_NULL_ORIGIN: { code: 'notAllowed', key: 'server.otherOrigin' },
};

/** `[body.email] Invalid input; …`: better-auth's own validation names the field so. */
function fieldIn(message: unknown): string | undefined {
  return typeof message === 'string' ? /^\[body\.([A-Za-z.]+)\]/.exec(message)?.[1] : undefined;
}

function toFailure(status: number, body: unknown): Failure {
  const { code, message } = (typeof body === 'object' && body !== null ? body : {}) as Record<string, unknown>;
  const refusal = typeof code === 'string' ? REFUSALS[code] : undefined;
  if (refusal) return new Failure(refusal.code, word(refusal.key), refusal.field ? { field: refusal.field } : {});
  if (status >= 500) return new Failure('broken', word('server.unavailable'));
  if (status === 401) return new Failure('signedOut', word('server.signedOut'));
  if (status === 403) return new Failure('notAllowed', word('server.otherOrigin'));
  if (status === 404) return new Failure('notFound', word('server.notFound'));
  return new Failure('badInput', word('server.badInput'), { field: fieldIn(message) ?? 'body' });
}

async function inOurShape(answer: Response): Promise<Response> {
  if (answer.ok) return answer;
  const body: unknown = await answer.json().catch(() => null);
  const failure = toFailure(answer.status, body);
  const code = typeof body === 'object' && body !== null && 'code' in body ? body.code : undefined;
  const headers = new Headers(answer.headers);
  headers.delete('content-length');
  headers.set('content-type', 'application/json; charset=utf-8');
  return new Response(JSON.stringify({ ...failure.toBody(), ...(typeof code === 'string' ? { code } : {}) }), {
    status: failure.status,
    headers,
  });
}

export function handleAuth(auth: Auth): RequestHandler {
  const open = new Set(authRoutes.map((route) => `${route.method} ${route.path}`));
  const pass = toNodeHandler(async (request: Request) => inOurShape(await auth.handler(request)));
  return async (req, res) => {
    if (!open.has(`${req.method.toLowerCase()} ${req.path}`)) throw new Failure('notFound', word('server.notFound'));
    await pass(req, res);
  };
}
