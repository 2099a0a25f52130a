/** Accounts, passwords and sessions, by better-auth on our own tables. */
import { betterAuth } from 'better-auth';
import { drizzleAdapter } from 'better-auth/adapters/drizzle';
import { tables, type Db } from '../../db/connect';
import type { Env } from '../config/env';
import type { Mailer } from '../mail/mailer';
import { writeResetMail } from '../mail/letters';

export const PASSWORD_LEAST = 10;
export const PASSWORD_MOST = 128;

interface AuthDeps {
  readonly env: Env;
  readonly db: Db;
  readonly mailer: Mailer;
}

/** Origins whose pages may sign people in and change things: the product's own; on a loopback by either of its names. */
export function ownOrigins(env: Env): string[] {
  const { origin, hostname } = new URL(env.APP_URL);
  const names = ['localhost', '127.0.0.1'];
  if (!names.includes(hostname)) return [origin];
  return names.map((name) => {
    const url = new URL(env.APP_URL);
    url.hostname = name;
    return url.origin;
  });
}

export function createAuth({ env, db, mailer }: AuthDeps) {
  return betterAuth({
    appName: 'Polewright',
    baseURL: env.APP_URL,
    basePath: '/api/auth',
    secret: env.AUTH_SECRET,
    trustedOrigins: ownOrigins(env),
    database: drizzleAdapter(db, { provider: 'pg', schema: tables, transaction: true }),
    telemetry: { enabled: false },
    // Our own limiter stands in front, with our own shape of answers.
    rateLimit: { enabled: false },
    logger: { disabled: true },
    emailAndPassword: {
      enabled: true,
      minPasswordLength: PASSWORD_LEAST,
      maxPasswordLength: PASSWORD_MOST,
      requireEmailVerification: false,
      resetPasswordTokenExpiresIn: 3600,
      revokeSessionsOnPasswordReset: true,
      // Not awaited: how long a mail takes must not tell a stranger whether an address has an account.
      sendResetPassword: async ({ user, token }) => {
        const link = `${env.APP_URL}/reset?token=${encodeURIComponent(token)}`;
        mailer.sendLater(writeResetMail({ to: user.email, name: user.name, link }));
      },
    },
    session: { expiresIn: 60 * 60 * 24 * 30, updateAge: 60 * 60 * 24 },
    advanced: {
      cookiePrefix: 'polewright',
      useSecureCookies: env.APP_URL.startsWith('https:'),
      ipAddress: { disableIpTracking: true },
    },
  });
}

export type Auth = ReturnType<typeof createAuth>;
