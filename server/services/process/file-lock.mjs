import { randomUUID } from 'node:crypto';
import { mkdir, readFile, rename, stat, unlink, writeFile } from 'node:fs/promises';
import { dirname } from 'node:path';
import { setTimeout as delay } from 'node:timers/promises';
import { isProcessAlive, processIdentity } from './process-identity.mjs';

const POLL_MS = 100;
const NAMELESS_IS_DEAD_AFTER_MS = 10_000;

const readHolder = (path) => readFile(path, 'utf8').catch(() => null);

const isAbandoned = async (path, holder) => {
  if (holder !== '') return !isProcessAlive(holder);
  const info = await stat(path).catch(() => null);
  return info !== null && Date.now() - info.mtimeMs > NAMELESS_IS_DEAD_AFTER_MS;
};

/** Takes away a dead holder's file; a live one that slipped in between is put back. */
const clearAbandoned = async (path, holder) => {
  const aside = `${path}.${randomUUID()}`;
  try {
    await rename(path, aside);
  } catch {
    return;
  }
  if ((await readHolder(aside)) === holder) await unlink(aside);
  else await rename(aside, path);
};

const tryTake = async (path) => {
  try {
    await writeFile(path, processIdentity(), { flag: 'wx' });
    return true;
  } catch (error) {
    if (error.code === 'EEXIST') return false;
    throw error;
  }
};

/**
 * Runs the task while holding a lock file, so that two processes do not do the same work at once; a file
 * left by a killed process is taken over. `onWait` is called once if another process holds it.
 */
export async function withFileLock(path, task, onWait = () => {}) {
  await mkdir(dirname(path), { recursive: true });
  let waiting = false;
  while (!(await tryTake(path))) {
    const holder = await readHolder(path);
    if (holder === null) continue;
    if (await isAbandoned(path, holder)) {
      await clearAbandoned(path, holder);
      continue;
    }
    if (!waiting) onWait();
    waiting = true;
    await delay(POLL_MS);
  }
  try {
    return await task();
  } finally {
    await unlink(path).catch(() => {});
  }
}
