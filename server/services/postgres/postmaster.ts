import { existsSync, readdirSync, readFileSync, readlinkSync, realpathSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { setTimeout as delay } from 'node:timers/promises';
import { isProcessAlive } from '#server/services/process/process-identity.mjs';
import { StartProblem } from '#server/services/start-problem.ts';

/** A running server: its main process and the TCP port it listens on. */
export interface Postmaster {
  readonly pid: number;
  readonly port: number;
}

/** How long the helpers of a killed server may take to notice that it is gone. */
const ORPHANS_LEAVE_WITHIN_MS = 30_000;

const pidFile = (pgdata: string): string => join(pgdata, 'postmaster.pid');

/** Lines 1 and 4 of postmaster.pid; null when the file is absent or torn. */
const readPidFile = (pgdata: string): Postmaster | null => {
  if (!existsSync(pidFile(pgdata))) return null;
  const lines = readFileSync(pidFile(pgdata), 'utf8').split('\n');
  const [pid, port] = [Number(lines[0]), Number(lines[3])];
  return pid > 0 && port > 0 ? { pid, port } : null;
};

const worksIn = (pid: string, folder: string): boolean => {
  try {
    return readlinkSync(`/proc/${pid}/cwd`) === folder && isProcessAlive(`${pid}:`);
  } catch {
    return false;
  }
};

/** Every process of the server whose data folder this is: PostgreSQL works inside it, and nothing else does. */
const processesIn = (pgdata: string): number[] => {
  const folder = realpathSync(pgdata);
  return readdirSync('/proc')
    .filter((entry) => /^\d+$/.test(entry) && worksIn(entry, folder))
    .map(Number);
};

const isRunning = (pgdata: string, pid: number): boolean =>
  existsSync('/proc/self/cwd') ? worksIn(String(pid), realpathSync(pgdata)) : isProcessAlive(`${pid}:`);

/** The running server of a data folder; a zombie, a stranger with its number or a mere file does not count. */
export const findPostmaster = (pgdata: string): Postmaster | null => {
  const noted = readPidFile(pgdata);
  return noted && isRunning(pgdata, noted.pid) ? noted : null;
};

/**
 * Removes what a killed server left behind. Its helpers are waited for first: they may still be writing, and a
 * second server beside them would spoil the data.
 */
export const clearStaleServer = async (pgdata: string): Promise<void> => {
  const deadline = Date.now() + ORPHANS_LEAVE_WITHIN_MS;
  while (existsSync('/proc/self/cwd') && processesIn(pgdata).length > 0) {
    if (Date.now() > deadline) {
      throw new StartProblem(
        `A killed database server left processes behind (${processesIn(pgdata).join(', ')}). End them with kill and start again.`,
      );
    }
    await delay(50);
  }
  rmSync(pidFile(pgdata), { force: true });
};
