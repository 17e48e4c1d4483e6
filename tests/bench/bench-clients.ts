import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { gzipSync } from 'node:zlib';
import { ensureClients } from '#server/services/clients-build.ts';

const root = fileURLToPath(new URL('../..', import.meta.url));

interface Chunk {
  readonly file: string;
  readonly imports?: readonly string[];
}

type Manifest = Readonly<Record<string, Chunk>>;

/** Every script a page loads before it asks for more: its entry and what that imports, each once. */
const scriptsOf = (manifest: Manifest, key: string, seen = new Set<string>()): Set<string> => {
  const chunk = manifest[key];
  if (!chunk || seen.has(chunk.file)) return seen;
  seen.add(chunk.file);
  for (const imported of chunk.imports ?? []) scriptsOf(manifest, imported, seen);
  return seen;
};

const compressedKb = (files: Iterable<string>): number =>
  [...files].reduce((sum, file) => sum + gzipSync(readFileSync(join(root, 'dist', file))).length, 0) / 1024;

/** Compressed script of each application at its first load, kB. */
export const benchClients = async (): Promise<Record<string, number>> => {
  await ensureClients(root, () => {});
  const manifest = JSON.parse(readFileSync(join(root, 'dist/.vite/manifest.json'), 'utf8')) as Manifest;
  return {
    'terminal.scriptKbGzip': compressedKb(scriptsOf(manifest, 'kiosk/index.html')),
    'desk.scriptKbGzip': compressedKb(scriptsOf(manifest, 'index.html')),
  };
};
