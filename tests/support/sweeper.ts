import { spawn } from 'node:child_process';
import { fileURLToPath } from 'node:url';

const SCRIPT = fileURLToPath(new URL('./sweep.mjs', import.meta.url));

/**
 * Promises that the folders, and every process that works in them, go when this process does, however it ends;
 * the answer does it at once and resolves when it is done.
 */
export const startSweeper = (folders: readonly string[]): (() => Promise<void>) => {
  const child = spawn(process.execPath, [SCRIPT, ...folders], {
    detached: true,
    // Without our settings: a sweeper for a folder above must not take this one for a server in it.
    env: {},
    stdio: ['pipe', 'ignore', 'inherit'],
  });
  const done = new Promise<void>((resolve) => child.once('exit', () => resolve()));
  child.unref();
  return () => {
    child.ref();
    child.stdin.end();
    return done;
  };
};
