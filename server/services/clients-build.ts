import { spawn } from 'node:child_process';
import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { withFileLock } from './process/file-lock.mjs';
import type { Say } from './say.ts';
import { StartProblem } from './start-problem.ts';

/** Folders and files that the browser's code is built from. */
const SOURCE_FOLDERS = ['src', 'kiosk', 'shared'];
const SOURCE_FILES = [
  'index.html',
  'package-lock.json',
  'tailwind.config.ts',
  'tsconfig.json',
  'vite.config.ts',
  'server/services/terminal-entry.ts',
];

const isSource = (path: string): boolean => !/\.test\.tsx?$/.test(path);

const filesUnder = (root: string, folder: string): string[] =>
  readdirSync(join(root, folder), { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile())
    .map((entry) => join(entry.parentPath, entry.name));

const sourcePaths = (root: string): string[] => {
  const files = SOURCE_FILES.map((file) => join(root, file)).filter((path) => existsSync(path));
  return [...files, ...SOURCE_FOLDERS.flatMap((folder) => filesUnder(root, folder))].filter(isSource).sort();
};

const hashSources = (root: string): string => {
  const hash = createHash('sha256');
  for (const path of sourcePaths(root))
    hash.update(path.slice(root.length)).update('\0').update(readFileSync(path));
  return hash.digest('hex');
};

/** Written last and emptied first, so that an interrupted build never counts. */
const stampPath = (root: string): string => join(root, 'dist', '.sources');

const isFresh = (root: string, hash: string): boolean =>
  existsSync(stampPath(root)) && readFileSync(stampPath(root), 'utf8') === hash;

const build = (root: string, signal: AbortSignal | undefined): Promise<void> =>
  new Promise((resolve, reject) => {
    const vite = join(root, 'node_modules', 'vite', 'bin', 'vite.js');
    const child = spawn(process.execPath, [vite, 'build', '--logLevel', 'warn'], {
      cwd: root,
      // Whatever starts us, the screens are built for use: tests run with another NODE_ENV.
      env: { ...process.env, NODE_ENV: 'production' },
      stdio: ['ignore', 'pipe', 'pipe'],
      ...(signal && { signal }),
    });
    const words: Buffer[] = [];
    child.stdout.on('data', (chunk: Buffer) => words.push(chunk));
    child.stderr.on('data', (chunk: Buffer) => words.push(chunk));
    child.once('error', reject);
    child.once('close', (code) => {
      if (code === 0) resolve();
      else
        reject(
          new StartProblem(`The screens could not be built:\n${Buffer.concat(words).toString().trim()}`),
        );
    });
  });

/** Builds the desk and the terminal when their sources have changed since, and gives the folder they are in. */
export const ensureClients = async (root: string, say: Say, signal?: AbortSignal): Promise<string> => {
  const folder = join(root, 'dist');
  if (isFresh(root, hashSources(root))) return folder;
  const buildOnce = async (): Promise<void> => {
    const hash = hashSources(root);
    if (isFresh(root, hash)) return;
    say('Building the screens (about ten seconds) ...');
    await build(root, signal);
    writeFileSync(stampPath(root), hash);
  };
  const waiting = (): void => say('Waiting for another start to build the screens ...');
  await withFileLock(join(root, 'data', 'locks', 'clients.lock'), buildOnce, waiting);
  return folder;
};
