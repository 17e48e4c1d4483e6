import { mkdtempSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { readEnvironment } from '#server/environment.ts';
import { loadSecrets } from './secrets.ts';

let dataDir = '';
beforeEach(() => (dataDir = mkdtempSync(join(tmpdir(), 'ladlemark-secrets-'))));
afterEach(() => rmSync(dataDir, { recursive: true }));

const load = (settings: NodeJS.ProcessEnv = {}) =>
  loadSecrets(readEnvironment({ DATA_DIR: dataDir, ...settings }));

describe('loadSecrets', () => {
  it('makes two different secrets once, keeps them, and lets only their owner read them', async () => {
    const made = await load();
    expect(made.sessionSecret).not.toBe(made.pinPepper);
    expect(await load()).toEqual(made);
    for (const name of ['session-secret', 'pin-pepper']) {
      expect(statSync(join(dataDir, name)).mode & 0o777).toBe(0o600);
      expect(Buffer.from(readFileSync(join(dataDir, name), 'utf8'), 'base64url')).toHaveLength(32);
    }
  });

  it('gives two starters at once the same secrets', async () => {
    const [one, two] = await Promise.all([load(), load()]);
    expect(one).toEqual(two);
  });

  it('prefers those of the settings', async () => {
    const given = 'of the studio, from its own vault';
    expect(await load({ SESSION_SECRET: given, PIN_PEPPER: given })).toEqual({
      sessionSecret: given,
      pinPepper: given,
    });
  });

  it('never replaces a damaged one by itself', async () => {
    writeFileSync(join(dataDir, 'pin-pepper'), 'torn');
    await expect(load()).rejects.toThrow(/pin-pepper is damaged/);
    expect(readFileSync(join(dataDir, 'pin-pepper'), 'utf8')).toBe('torn');
  });
});
