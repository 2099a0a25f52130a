/** Calls to the server: what goes out and comes back is checked by the shared contracts. */
import type { z } from 'zod';
import { errorSchema, type ErrorCode } from '../../model/contracts/common';

/** `offline`: the server was not reached. `unreadable`: it answered something that the contract does not know. */
export type ApiCode = ErrorCode | 'offline' | 'unreadable';

/** Every failed call: the status (0 when the server was not reached), a code for programs, and words for people. */
export class ApiError extends Error {
  override readonly name: string = 'ApiError';
  readonly status: number;
  readonly code: ApiCode;
  /** The path of the input that was wrong, where the server named one. */
  readonly field: string | undefined;

  constructor(status: number, code: ApiCode, message: string, field?: string) {
    super(message);
    this.status = status;
    this.code = code;
    this.field = field;
  }
}

export type Method = 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';

export interface Sent {
  readonly method?: Method;
  readonly body?: unknown;
  readonly signal?: AbortSignal;
}

/** The answer as it came: its status, and its JSON or null. Throws only when the server was not reached. */
export async function send(path: string, { method = 'GET', body, signal }: Sent = {}) {
  let response: Response;
  try {
    response = await fetch(path, {
      method,
      signal,
      credentials: 'same-origin',
      headers: {
        accept: 'application/json',
        ...(body === undefined ? {} : { 'content-type': 'application/json' }),
      },
      body: body === undefined ? undefined : JSON.stringify(body),
    });
  } catch (error) {
    if (error instanceof DOMException && error.name === 'AbortError') throw error;
    throw new ApiError(0, 'offline', 'the server was not reached');
  }
  const text = await response.text().catch(() => '');
  return { status: response.status, ok: response.ok, body: readJson(text) };
}

function readJson(text: string): unknown {
  if (text === '') return null;
  try {
    return JSON.parse(text) as unknown;
  } catch {
    return null;
  }
}

const codeByStatus: Readonly<Record<number, ApiCode>> = {
  400: 'badInput',
  401: 'signedOut',
  403: 'notAllowed',
  404: 'notFound',
  409: 'alreadyThere',
  410: 'expired',
  413: 'tooLarge',
  429: 'tooMany',
  // A proxy says these of a server that is down.
  502: 'unavailable',
  503: 'unavailable',
  504: 'unavailable',
};

/** The error that a refused answer stands for. */
export function errorOf(status: number, body: unknown): ApiError {
  const read = errorSchema.safeParse(body);
  if (read.success) {
    const { code, message, field } = read.data.error;
    return new ApiError(status, code, message, field);
  }
  return new ApiError(status, codeByStatus[status] ?? 'broken', `the server answered ${status}`);
}

const refusalListeners = new Set<() => void>();

/** Told whenever the server says that nobody is signed in. */
export function whenSignedOut(listener: () => void): () => void {
  refusalListeners.add(listener);
  return () => refusalListeners.delete(listener);
}

/** Calls the server and reads its answer by `answer`. Throws `ApiError`. */
export async function call<Answer>(answer: z.ZodType<Answer>, path: string, sent: Sent = {}): Promise<Answer> {
  const { status, ok, body } = await send(path, sent);
  if (!ok) {
    const error = errorOf(status, body);
    if (error.code === 'signedOut') for (const listener of refusalListeners) listener();
    throw error;
  }
  const read = answer.safeParse(body);
  if (!read.success) throw new ApiError(status, 'unreadable', read.error.message);
  return read.data;
}
