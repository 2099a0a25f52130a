/** Who is signed in, by better-auth's own endpoints. */
import { useQuery } from '@tanstack/react-query';
import { z } from 'zod';
import { ApiError, errorOf, send, whenSignedOut } from './api';
import { forgetOffline } from './offline';
import { queryClient } from './queryClient';

const userSchema = z.object({ id: z.string(), name: z.string(), email: z.string() });
export type User = z.infer<typeof userSchema>;

/** `unknown` until the server, or what this device remembers, has said. */
export type Session = 'unknown' | 'out' | { readonly in: User };

export const sessionKey = ['session'] as const;
const REMEMBERED_AS = 'polewright.user';

const sessionAnswer = z.object({ user: userSchema }).nullable();
const signedAnswer = z.object({ user: userSchema });

function remember(user: User | null) {
  try {
    if (user) globalThis.localStorage?.setItem(REMEMBERED_AS, JSON.stringify(user));
    else globalThis.localStorage?.removeItem(REMEMBERED_AS);
  } catch {
    // Storage may be switched off; then a start without signal asks to sign in.
  }
}

function remembered(): User | null {
  try {
    const read = userSchema.safeParse(JSON.parse(globalThis.localStorage?.getItem(REMEMBERED_AS) ?? 'null'));
    return read.success ? read.data : null;
  } catch {
    return null;
  }
}

/** Asks who is signed in. Without signal, the one who was last signed in on this device: the server checks every call anyway. */
async function fetchUser(): Promise<User | null> {
  let answer: Awaited<ReturnType<typeof send>>;
  try {
    answer = await send('/api/auth/get-session');
  } catch (error) {
    const last = error instanceof ApiError ? remembered() : null;
    if (last) return last;
    throw error;
  }
  if (!answer.ok && answer.status !== 401) throw errorOf(answer.status, answer.body);
  const read = sessionAnswer.safeParse(answer.ok ? answer.body : null);
  if (!read.success) throw new ApiError(answer.status, 'unreadable', read.error.message);
  remember(read.data?.user ?? null);
  return read.data?.user ?? null;
}

export interface SessionState {
  readonly session: Session;
  /** Why it can't be known, where the server could not be asked. */
  readonly error: Error | null;
  readonly retry: () => void;
}

/** The session as it stands. */
export function useSession(): SessionState {
  const { data, error, refetch } = useQuery({ queryKey: sessionKey, queryFn: fetchUser, staleTime: Infinity });
  const session: Session = data === undefined ? 'unknown' : data === null ? 'out' : { in: data };
  return { session, error: data === undefined ? error : null, retry: () => void refetch() };
}

whenSignedOut(() => {
  if (queryClient.getQueryData(sessionKey)) {
    remember(null);
    queryClient.setQueryData(sessionKey, null);
  }
});

/** Why signing in or up did not go: better-auth's codes, and our own where the server was not reached. */
export type AuthProblem =
  | 'wrongPassword'
  | 'emailTaken'
  | 'badEmail'
  | 'shortPassword'
  | 'longPassword'
  | 'oldLink'
  | 'tooMany'
  | 'offline'
  | 'broken';

export class AuthError extends Error {
  override readonly name = 'AuthError';
  readonly problem: AuthProblem;
  constructor(problem: AuthProblem) {
    super(problem);
    this.problem = problem;
  }
}

const problemByCode: Readonly<Record<string, AuthProblem>> = {
  INVALID_EMAIL_OR_PASSWORD: 'wrongPassword',
  USER_ALREADY_EXISTS: 'emailTaken',
  USER_ALREADY_EXISTS_USE_ANOTHER_EMAIL: 'emailTaken',
  INVALID_EMAIL: 'badEmail',
  PASSWORD_TOO_SHORT: 'shortPassword',
  PASSWORD_TOO_LONG: 'longPassword',
  INVALID_TOKEN: 'oldLink',
};

async function ask(path: string, body: unknown): Promise<unknown> {
  let answer: Awaited<ReturnType<typeof send>>;
  try {
    answer = await send(`/api/auth${path}`, { method: 'POST', body });
  } catch {
    throw new AuthError('offline');
  }
  if (answer.ok) return answer.body;
  const code = z.object({ code: z.string() }).safeParse(answer.body);
  const known = code.success ? problemByCode[code.data.code] : undefined;
  throw new AuthError(known ?? (answer.status === 429 ? 'tooMany' : 'broken'));
}

function enter(body: unknown) {
  const read = signedAnswer.safeParse(body);
  if (!read.success) throw new AuthError('broken');
  remember(read.data.user);
  // Nothing of whoever was here before may be shown to the next.
  queryClient.removeQueries({ predicate: (query) => query.queryKey[0] === 'sites' });
  queryClient.setQueryData(sessionKey, read.data.user);
}

/** Throws `AuthError`, as all of these do. */
export async function signIn(email: string, password: string): Promise<void> {
  enter(await ask('/sign-in/email', { email: email.trim(), password }));
}

export async function signUp(name: string, email: string, password: string): Promise<void> {
  enter(await ask('/sign-up/email', { name: name.trim(), email: email.trim(), password }));
}

export async function signOut(): Promise<void> {
  await ask('/sign-out', {});
  remember(null);
  queryClient.setQueryData(sessionKey, null);
  queryClient.removeQueries({ predicate: (query) => query.queryKey[0] !== 'session' });
  await forgetOffline();
}

/** Sends a link by mail, if anyone has that address; the answer is the same if not. */
export async function requestReset(email: string): Promise<void> {
  await ask('/request-password-reset', { email: email.trim() });
}

export async function resetPassword(token: string, newPassword: string): Promise<void> {
  await ask('/reset-password', { token, newPassword });
}
