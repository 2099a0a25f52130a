import { describe, expect, it } from 'vitest';
import { EnvError, readEnv } from '../../server/config/env';

const GOOD = {
  DATABASE_URL: 'postgres://someone@127.0.0.1:5432/polewright',
  APP_URL: 'https://poles.example/',
  AUTH_SECRET: 'x'.repeat(32),
  SMTP_URL: 'smtp://mail.example:587',
};

function problems(variables: Record<string, string | undefined>): string[] {
  try {
    readEnv(variables);
    return [];
  } catch (error) {
    if (error instanceof EnvError) return error.message.split('\n');
    throw error;
  }
}

describe('the environment', () => {
  it('needs little, and keeps to the loopback unless told', () => {
    expect(readEnv(GOOD)).toMatchObject({
      NODE_ENV: 'production',
      APP_URL: 'https://poles.example',
      HOST: '127.0.0.1',
      PORT: 4000,
      LOCAL_MAIL: false,
      DEMO: false,
      TRUST_PROXY: 0,
      CLIENT_DIR: 'dist',
    });
  });

  it.each([
    ['DATABASE_URL', undefined],
    ['DATABASE_URL', 'mysql://somewhere/else'],
    ['APP_URL', undefined],
    ['APP_URL', 'poles.example'],
    ['APP_URL', 'ftp://poles.example'],
    ['AUTH_SECRET', undefined],
    ['AUTH_SECRET', 'short'],
    ['PORT', 'many'],
    ['PORT', '70000'],
    ['NODE_ENV', 'staging'],
    ['TRUST_PROXY', '-1'],
    ['LOCAL_MAIL', 'yes'],
    ['SMTP_URL', undefined],
    ['SMTP_URL', 'mail.example'],
    ['SMTP_URL', ''],
  ])('names %s when it is %s, and nothing else', (name, value) => {
    const found = problems({ ...GOOD, [name]: value });
    expect(found).toHaveLength(1);
    expect(found[0]).toMatch(new RegExp(`^${name}: .{8,}`));
  });

  it('names all that is wrong at once', () => {
    const names = problems({}).map((line) => line.split(':')[0]);
    expect(names).toEqual(expect.arrayContaining(['DATABASE_URL', 'APP_URL', 'AUTH_SECRET']));
  });

  it('shows caught mail on the loopback only', () => {
    const local = { ...GOOD, SMTP_URL: undefined, LOCAL_MAIL: '1' };
    expect(problems(local)).toEqual([]);
    expect(problems({ ...local, HOST: '0.0.0.0' })[0]).toMatch(/^LOCAL_MAIL: /);
  });

  it('never repeats a secret in its words', () => {
    const found = problems({ ...GOOD, AUTH_SECRET: 'hush-hush', DATABASE_URL: 'nonsense-with-password' }).join();
    expect(found).not.toMatch(/hush-hush|nonsense-with-password/);
  });
});
