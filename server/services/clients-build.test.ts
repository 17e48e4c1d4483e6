import { existsSync, mkdirSync, mkdtempSync, rmSync, symlinkSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';
import { afterEach, beforeEach, expect, it } from 'vitest';
import { ensureClients } from './clients-build.ts';

let root = '';

const write = (name: string, text: string): void => writeFileSync(join(root, name), text);

beforeEach(() => {
  root = mkdtempSync(join(tmpdir(), 'ladlemark-clients-'));
  for (const folder of ['src', 'kiosk', 'shared']) mkdirSync(join(root, folder));
  symlinkSync(resolve('node_modules'), join(root, 'node_modules'));
  write('package.json', '{ "type": "module" }');
  write('index.html', '<!doctype html><script type="module" src="/src/main.ts"></script>');
  write('src/main.ts', 'document.title = "desk";');
});
afterEach(() => rmSync(root, { recursive: true }));

const ensure = async (): Promise<string[]> => {
  const said: string[] = [];
  await ensureClients(root, (line) => said.push(line));
  return said;
};

it('builds when there is nothing, when a source changes or a build was cut off, and only then', async () => {
  expect(await ensure()).toHaveLength(1);
  expect(existsSync(join(root, 'dist', 'index.html'))).toBe(true);
  expect(await ensure()).toEqual([]);
  write('src/main.test.ts', 'a test is no source');
  expect(await ensure()).toEqual([]);
  write('src/main.ts', 'document.title = "terminal";');
  expect(await ensure()).toHaveLength(1);
  rmSync(join(root, 'dist', '.sources'));
  expect(await ensure()).toHaveLength(1);
}, 60_000);

it('builds once for two starters', async () => {
  const said = (await Promise.all([ensure(), ensure()])).flat();
  expect(said.filter((line) => line.startsWith('Building'))).toHaveLength(1);
}, 60_000);

it('says so when the sources do not build, and tries again next time', async () => {
  write('src/main.ts', 'import "./missing.ts";');
  await expect(ensure()).rejects.toThrow('The screens could not be built');
  write('src/main.ts', 'document.title = "mended";');
  expect(await ensure()).toHaveLength(1);
}, 60_000);
