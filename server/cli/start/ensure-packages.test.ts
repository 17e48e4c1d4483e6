import { existsSync, mkdirSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { ensurePackages } from './ensure-packages.mjs';
import { nodeProblem } from './node-problem.mjs';

let root = '';
beforeEach(() => (root = mkdtempSync(join(tmpdir(), 'ladlemark-packages-'))));
afterEach(() => rmSync(root, { recursive: true }));

const writeJson = (name: string, content: unknown): void =>
  writeFileSync(join(root, name), JSON.stringify(content));

/** A project whose one package lies beside it, so that npm needs no network. */
const makeProject = (version: string): void => {
  const own = { name: 'foundry', version: '1.0.0', dependencies: { tongs: 'file:tongs' } };
  mkdirSync(join(root, 'tongs'), { recursive: true });
  writeJson('package.json', own);
  writeJson('tongs/package.json', { name: 'tongs', version });
  const packages = {
    '': own,
    'node_modules/tongs': { resolved: 'tongs', link: true },
    tongs: { name: 'tongs', version },
  };
  writeJson('package-lock.json', { name: 'foundry', version: '1.0.0', lockfileVersion: 3, packages });
};

const ensure = async (): Promise<string[]> => {
  const said: string[] = [];
  await ensurePackages(root, (line) => said.push(line));
  return said;
};

describe('ensurePackages', () => {
  it('installs on a fresh clone, not again, and again once the lock file has changed', async () => {
    makeProject('1.0.0');
    expect(await ensure()).toHaveLength(1);
    expect(existsSync(join(root, 'node_modules', 'tongs', 'package.json'))).toBe(true);
    expect(await ensure()).toEqual([]);
    makeProject('1.1.0');
    expect(await ensure()).toHaveLength(1);
    expect(await ensure()).toEqual([]);
  }, 30_000);

  it('installs again over an installation that was cut off', async () => {
    makeProject('1.0.0');
    mkdirSync(join(root, 'node_modules', 'half'), { recursive: true });
    expect(await ensure()).toHaveLength(1);
    expect(readFileSync(join(root, 'node_modules', '.package-lock.json'), 'utf8')).toContain('tongs');
  }, 30_000);

  it('lets one of two starters install', async () => {
    makeProject('1.0.0');
    const said = (await Promise.all([ensure(), ensure()])).flat();
    expect(said.filter((line) => line.startsWith('Installing'))).toHaveLength(1);
  }, 30_000);
});

describe('nodeProblem', () => {
  it.each([
    ['18.20.4', /needs Node\.js 20\.19 or newer; this is 18\.20\.4/],
    ['20.18.9', /needs Node\.js 20\.19/],
  ])('refuses %s', (version, sentence) => expect(nodeProblem(version)).toMatch(sentence));

  it.each(['20.19.0', '20.20.2', '22.0.0', '24.1.0'])('takes %s', (version) =>
    expect(nodeProblem(version)).toBeNull(),
  );
});
