import { afterEach, describe, expect, it, vi } from 'vitest';
import { z } from 'zod';
import { ApiError, call, errorOf, whenSignedOut } from '../../../canvas/client/api';
import { worthRetrying } from '../../../canvas/client/queryClient';
import { newWriteId } from '../../../canvas/client/writeId';
import { writeIdSchema } from '../../../model/contracts/common';

function answering(status: number, body: unknown) {
  const text = typeof body === 'string' ? body : JSON.stringify(body);
  const fetched = vi.fn<typeof fetch>(() => Promise.resolve(new Response(status === 204 ? null : text, { status })));
  vi.stubGlobal('fetch', fetched);
  return fetched;
}

async function failure(promise: Promise<unknown>): Promise<ApiError> {
  const error = await promise.then(
    () => null,
    (reason: unknown) => reason,
  );
  if (!(error instanceof ApiError)) throw new Error('this should have failed with an ApiError');
  return error;
}

afterEach(() => {
  vi.unstubAllGlobals();
});

const named = z.strictObject({ name: z.string() });

describe('calling the server', () => {
  it('sends JSON and reads the answer by its contract', async () => {
    const fetched = answering(200, { name: 'Cedar Bend' });
    expect(await call(named, '/api/x', { method: 'PUT', body: { a: 1 } })).toEqual({ name: 'Cedar Bend' });
    const [path, sent] = fetched.mock.calls[0] ?? [];
    expect(path).toBe('/api/x');
    expect(sent).toMatchObject({ method: 'PUT', body: '{"a":1}', credentials: 'same-origin' });
  });

  it('refuses an answer that the contract does not know', async () => {
    answering(200, { title: 'Cedar Bend' });
    expect((await failure(call(named, '/api/x'))).code).toBe('unreadable');
  });

  it('takes an empty answer where nothing is to be said', async () => {
    answering(204, '');
    expect(await call(z.unknown(), '/api/x', { method: 'DELETE' })).toBeNull();
  });

  it('keeps code, words and field of a refusal', async () => {
    answering(409, { error: { code: 'alreadyThere', message: 'a member already', field: 'email' } });
    const error = await failure(call(named, '/api/x'));
    expect(error).toMatchObject({ status: 409, code: 'alreadyThere', message: 'a member already', field: 'email' });
  });

  it('says offline when the server was not reached', async () => {
    vi.stubGlobal('fetch', () => Promise.reject(new TypeError('Failed to fetch')));
    expect(await failure(call(named, '/api/x'))).toMatchObject({ status: 0, code: 'offline' });
  });

  it('tells of a session that ended, and stops telling when asked to', async () => {
    answering(401, { error: { code: 'signedOut', message: 'sign in' } });
    const told = vi.fn();
    const stop = whenSignedOut(told);
    await failure(call(named, '/api/x'));
    expect(told).toHaveBeenCalledTimes(1);
    stop();
    await failure(call(named, '/api/x'));
    expect(told).toHaveBeenCalledTimes(1);
  });
});

describe('errors', () => {
  it.each([
    [400, 'badInput'],
    [403, 'notAllowed'],
    [404, 'notFound'],
    [429, 'tooMany'],
    [502, 'unavailable'],
    [503, 'unavailable'],
    [500, 'broken'],
    [418, 'broken'],
  ])('reads %i without words of ours as %s', (status, code) => {
    expect(errorOf(status, '<html>').code).toBe(code);
  });

  it('tries again only what may mend itself, three times at most', () => {
    const error = (code: ApiError['code']) => new ApiError(0, code, '');
    expect(worthRetrying(0, error('unavailable'))).toBe(true);
    expect(worthRetrying(2, error('broken'))).toBe(true);
    expect(worthRetrying(3, error('broken'))).toBe(false);
    expect(worthRetrying(0, error('notFound'))).toBe(false);
    expect(worthRetrying(0, error('offline'))).toBe(false);
    expect(worthRetrying(0, new Error('other'))).toBe(false);
  });
});

describe('write ids', () => {
  it('are what the contract asks for, also where the browser has no randomUUID', () => {
    expect(writeIdSchema.safeParse(newWriteId()).success).toBe(true);
    const { crypto } = globalThis;
    vi.stubGlobal('crypto', { getRandomValues: crypto.getRandomValues.bind(crypto) });
    const ids = Array.from({ length: 50 }, newWriteId);
    for (const id of ids) expect(writeIdSchema.safeParse(id).success).toBe(true);
    expect(new Set(ids).size).toBe(50);
  });
});
