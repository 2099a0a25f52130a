/** The auth paths that are open, with what each takes and answers, for the OpenAPI description; better-auth does the work. */
import { z } from 'zod';
import type { RouteDescription } from '../http/route';

const email = z.email();
const person = z.object({ id: z.string(), name: z.string(), email: z.string() });
const status = z.object({ status: z.boolean() });

/** What is described here is what is let through: every other path of better-auth answers 404. */
export const authRoutes: readonly RouteDescription[] = [
  {
    method: 'post',
    path: '/api/auth/sign-up/email',
    summary: 'Make an account and sign in',
    access: 'everyone',
    body: z.object({ name: z.string(), email, password: z.string() }),
    answer: z.object({ token: z.string().nullable(), user: person }),
    refusals: [400, 409, 413, 429],
  },
  {
    method: 'post',
    path: '/api/auth/sign-in/email',
    summary: 'Sign in',
    access: 'everyone',
    body: z.object({ email, password: z.string(), rememberMe: z.boolean().optional() }),
    answer: z.object({ redirect: z.boolean(), token: z.string(), user: person }),
    refusals: [400, 401, 413, 429],
  },
  {
    method: 'post',
    path: '/api/auth/sign-out',
    summary: 'Sign out',
    access: 'everyone',
    body: z.object({}),
    answer: z.object({ success: z.boolean() }),
    refusals: [429],
  },
  {
    method: 'get',
    path: '/api/auth/get-session',
    summary: 'Who is signed in; null for nobody',
    access: 'everyone',
    answer: z.object({ session: z.object({ id: z.string(), expiresAt: z.string() }), user: person }).nullable(),
    refusals: [],
  },
  {
    method: 'post',
    path: '/api/auth/request-password-reset',
    summary: 'Mail a link to set a new password; the answer is the same whether or not there is an account',
    access: 'everyone',
    body: z.object({ email }),
    answer: status,
    refusals: [400, 413, 429],
  },
  {
    method: 'post',
    path: '/api/auth/reset-password',
    summary: 'Set a new password with the token from the mail; every session of the account ends',
    access: 'everyone',
    body: z.object({ newPassword: z.string(), token: z.string() }),
    answer: status,
    refusals: [400, 410, 413, 429],
  },
];
