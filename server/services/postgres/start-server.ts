import { existsSync, readFileSync, renameSync, statSync } from 'node:fs';
import { createServer } from 'node:net';
import { join } from 'node:path';
import { StartProblem } from '#server/services/start-problem.ts';
import type { ClusterHome } from './cluster-home.ts';
import { clusterPaths } from './make-cluster.ts';
import type { PostgresBinaries } from './postgres-binaries.ts';
import { findPostmaster, type Postmaster } from './postmaster.ts';
import { runQuietly } from './run-program.ts';

/** How one private server is to be run. */
export interface ServerOptions {
  readonly home: ClusterHome;
  readonly binaries: PostgresBinaries;
  /** False only for throw-away data: a power cut may then spoil it. */
  readonly durable: boolean;
}

const PORTS_TRIED = 5;
const START_SECONDS = 300;
const STOP_SECONDS = 60;
const LOG_LIMIT_BYTES = 10_000_000;

/** Asks the system for a TCP port that is free on the loopback address just now. */
export const freePort = (): Promise<number> =>
  new Promise((resolve, reject) => {
    const probe = createServer();
    probe.once('error', reject);
    probe.listen(0, '127.0.0.1', () => {
      const address = probe.address();
      probe.close(() => resolve(typeof address === 'object' && address ? address.port : 0));
    });
  });

const switches = (port: number, durable: boolean): string => {
  const safety = durable ? 'on' : 'off';
  const settings = [
    `fsync=${safety}`,
    `full_page_writes=${safety}`,
    `synchronous_commit=${safety}`,
    'log_checkpoints=off',
  ];
  return `-h 127.0.0.1 -p ${port} -k '' ${settings.map((setting) => `-c ${setting}`).join(' ')}`;
};

const logSize = (log: string): number => (existsSync(log) ? statSync(log).size : 0);

const rotateLog = (log: string): void => {
  if (logSize(log) > LOG_LIMIT_BYTES) renameSync(log, `${log}.old`);
};

const readLogFrom = (log: string, start: number): string =>
  existsSync(log) ? readFileSync(log).subarray(start).toString().trim() : '';

const isPortTaken = (words: string): boolean => /could not bind|Address already in use/i.test(words);

const refusal = (log: string, words: string): StartProblem => {
  if (/No space left on device/i.test(words)) {
    return new StartProblem('The database cannot start because the disk is full. Make room and start again.');
  }
  const last = words.split('\n').slice(-5).join('\n');
  return new StartProblem(`The database did not start. The last lines of ${log} are:\n${last}`);
};

/** Starts the server on the port asked for, or on a free one, and waits until it answers. */
export const startServer = async (
  { home, binaries, durable }: ServerOptions,
  wantedPort: number | null = null,
): Promise<Postmaster> => {
  const { pgdata, log } = clusterPaths(home);
  rotateLog(log);
  let words = '';
  for (let tried = 0; tried < PORTS_TRIED; tried += 1) {
    const port = wantedPort ?? (await freePort());
    const before = logSize(log);
    const wait = ['-w', '-t', String(START_SECONDS)];
    const args = ['-D', pgdata, '-l', log, ...wait, '-o', switches(port, durable), 'start'];
    const code = await runQuietly(join(binaries.bin, 'pg_ctl'), args, home.user);
    const running = code === 0 ? findPostmaster(pgdata) : null;
    if (running) return running;
    words = readLogFrom(log, before);
    if (!isPortTaken(words)) break;
  }
  throw refusal(log, words);
};

/** Stops the server: sessions are cut, everything acknowledged is on disk. Harmless when it is stopped already. */
export const stopServer = async ({ home, binaries }: ServerOptions): Promise<void> => {
  const { pgdata } = clusterPaths(home);
  if (findPostmaster(pgdata) === null) return;
  const args = ['-D', pgdata, '-m', 'fast', '-w', '-t', String(STOP_SECONDS), 'stop'];
  await runQuietly(join(binaries.bin, 'pg_ctl'), args, home.user);
};
