/** The environment that the server runs by. A wrong or missing variable ends the start with its name. */
import { z } from 'zod';

const flag = z
  .enum(['0', '1'], 'this is 1 or 0')
  .default('0')
  .transform((value) => value === '1');

const loopback = new Set(['127.0.0.1', '::1', 'localhost']);

const schema = z
  .object({
    NODE_ENV: z.enum(['development', 'test', 'production']).default('production'),
    DATABASE_URL: z.url({ protocol: /^postgres(ql)?$/, error: 'this is a PostgreSQL address, postgres://…' }),
    /** Where people reach the product: in links of mails, and the one origin that may change anything. */
    APP_URL: z
      .url({ protocol: /^https?$/, error: 'this is the address people open, http://… or https://…' })
      .transform((url) => url.replace(/\/+$/, '')),
    HOST: z.string().min(1).default('127.0.0.1'),
    PORT: z.coerce.number().int().min(0).max(65_535).default(4000),
    /** Signs the sessions' cookies; changing it signs everyone out. */
    AUTH_SECRET: z.string('a secret of 32 characters or more is needed').min(32, 'a secret has 32 characters or more'),
    SMTP_URL: z.url({ protocol: /^smtps?$/, error: 'this is a mail server, smtp://… or smtps://…' }).optional(),
    MAIL_FROM: z.string().min(3).default('Polewright <polewright@localhost>'),
    /** Catches every mail in memory instead of sending it, and shows it to whoever opens the mail page. */
    LOCAL_MAIL: flag,
    /** Tells the client that the demo sites are there to be tried. */
    DEMO: flag,
    /** How many proxies stand in front, so that the caller's address is read past them and no further. */
    TRUST_PROXY: z.coerce.number().int().min(0).max(10).default(0),
    /** Folder of the exported client. */
    CLIENT_DIR: z.string().min(1).default('dist'),
  })
  .superRefine((env, context) => {
    const refuse = (name: string, message: string) => context.addIssue({ code: 'custom', path: [name], message });
    if (env.LOCAL_MAIL && !loopback.has(env.HOST)) {
      refuse('LOCAL_MAIL', 'only a server that listens on the loopback may show its mail to anyone');
    }
    if (!env.LOCAL_MAIL && env.SMTP_URL === undefined) refuse('SMTP_URL', 'a mail server is needed, or LOCAL_MAIL=1');
  });

export type Env = z.infer<typeof schema>;

/** Thrown at start: says each variable that is wrong, and why, one a line. */
export class EnvError extends Error {
  override readonly name = 'EnvError';
}

/** Reads the settings from variables such as `process.env`; empty ones count as not set. Throws `EnvError`. */
export function readEnv(variables: Readonly<Record<string, string | undefined>>): Env {
  const set = Object.fromEntries(Object.entries(variables).filter(([, value]) => value !== undefined && value !== ''));
  const read = schema.safeParse(set);
  if (read.success) return read.data;
  const lines = read.error.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}`);
  throw new EnvError(lines.join('\n'));
}
