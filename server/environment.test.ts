import { resolve } from 'node:path';
import { describe, expect, it } from 'vitest';
import { readEnvironment } from './environment.ts';
import { StartProblem } from './services/start-problem.ts';

const problemOf = (env: NodeJS.ProcessEnv): StartProblem => {
  try {
    readEnvironment(env);
  } catch (error) {
    if (error instanceof StartProblem) return error;
    throw error;
  }
  throw new Error('these settings were accepted');
};

describe('readEnvironment', () => {
  it('needs no setting at all, and then listens on this machine only', () => {
    expect(readEnvironment({})).toEqual({ port: 4380, host: '127.0.0.1', dataDir: resolve('data') });
  });

  it('reads every setting', () => {
    const secret = 'a'.repeat(32);
    expect(
      readEnvironment({
        PORT: '8080',
        HOST: '0.0.0.0',
        DATA_DIR: '/srv/studio',
        DATABASE_URL: 'postgresql://caster:x@db.studio.test:5433/book',
        SESSION_SECRET: secret,
        PIN_PEPPER: secret,
        SMTP_URL: 'smtps://post:x@mail.studio.test',
      }),
    ).toEqual({
      port: 8080,
      host: '0.0.0.0',
      dataDir: '/srv/studio',
      databaseUrl: 'postgresql://caster:x@db.studio.test:5433/book',
      sessionSecret: secret,
      pinPepper: secret,
      smtpUrl: 'smtps://post:x@mail.studio.test',
    });
  });

  it('takes a blank setting as one that was not given', () => {
    expect(readEnvironment({ PORT: '', DATABASE_URL: '  ', SESSION_SECRET: '' })).toEqual(
      readEnvironment({}),
    );
  });

  it.each(['-1', '65536', '99999', '4380.5', 'http', '0x10'])('refuses the port %s', (PORT) => {
    expect(problemOf({ PORT }).message).toMatch(/^PORT must be a whole number from 0 to 65535/);
  });

  it.each([
    ['DATABASE_URL', 'mysql://host/book'],
    ['DATABASE_URL', 'localhost:5432'],
    ['DATABASE_URL', 'postgres://'],
    ['SMTP_URL', 'https://mail.studio.test'],
    ['SMTP_URL', 'mail.studio.test'],
    ['SESSION_SECRET', 'a'.repeat(31)],
    ['PIN_PEPPER', 'short'],
    ['HOST', 'two names'],
  ])('refuses a bad %s by name (%s)', (name, value) => {
    const problem = problemOf({ [name]: value });
    expect(problem.message).toMatch(new RegExp(`^${name} must `));
    expect(problem.message.split('\n')).toHaveLength(1);
  });

  it('lists all the bad settings at once and gives the exit code of a bad configuration', () => {
    const problem = problemOf({ PORT: 'x', SMTP_URL: 'x', PIN_PEPPER: 'x' });
    expect(problem.message.split('\n').map((line) => line.split(' ')[0])).toEqual([
      'PORT',
      'PIN_PEPPER',
      'SMTP_URL',
    ]);
    expect(problem.exitCode).toBe(78);
  });

  it('never repeats what was typed, which may hold a password', () => {
    const secret = 'hunter2';
    const { message } = problemOf({
      DATABASE_URL: `mysql://u:${secret}@h/d`,
      SESSION_SECRET: secret,
      SMTP_URL: secret,
    });
    expect(message).not.toContain(secret);
  });
});
