import { randomBytes } from 'node:crypto';
import {
  chownSync,
  closeSync,
  existsSync,
  fsyncSync,
  mkdirSync,
  openSync,
  readFileSync,
  renameSync,
  rmSync,
  writeFileSync,
} from 'node:fs';
import { join } from 'node:path';
import { StartProblem } from '#server/services/start-problem.ts';
import type { ClusterHome } from './cluster-home.ts';
import type { PostgresBinaries } from './postgres-binaries.ts';
import { readOutput } from './run-program.ts';

/** The superuser of a private cluster; the product itself works as a role with fewer rights. */
export const KEEPER = 'keeper';

const PASSWORD_BYTES = 24;

/** The paths of a finished cluster inside its home. */
export const clusterPaths = (home: ClusterHome) => {
  const current = join(home.path, 'current');
  return {
    current,
    pgdata: join(current, 'pgdata'),
    password: join(current, 'password'),
    log: join(current, 'server.log'),
  } as const;
};

/** The major version that made the cluster, or null when none is made yet. */
export const clusterMajor = (home: ClusterHome): number | null => {
  const { current, pgdata } = clusterPaths(home);
  if (!existsSync(current)) return null;
  const version = join(pgdata, 'PG_VERSION');
  if (existsSync(version)) return Number.parseInt(readFileSync(version, 'utf8'), 10);
  throw new StartProblem(
    `${current} is there, but it holds no database. Put it back from a backup, or move it away to begin with an empty book.`,
  );
};

/** A rename is only safe from a power cut once the folder that holds the name has reached the disk. */
const syncFolder = (path: string): void => {
  const handle = openSync(path, 'r');
  fsyncSync(handle);
  closeSync(handle);
};

/**
 * Makes a cluster with checksums, UTF-8 and passwords only. All is made aside and renamed into place in one step,
 * so that a half-made one is never mistaken for the real one; what an interrupted start left aside is removed.
 */
export const makeCluster = async (
  home: ClusterHome,
  { bin }: PostgresBinaries,
  durable: boolean,
): Promise<void> => {
  const making = join(home.path, 'making');
  rmSync(making, { recursive: true, force: true });
  mkdirSync(making, { mode: 0o700 });
  const password = join(making, 'password');
  writeFileSync(password, randomBytes(PASSWORD_BYTES).toString('base64url'), { mode: 0o600 });
  if (home.user) for (const path of [making, password]) chownSync(path, home.user.uid, home.user.gid);
  const locale = ['-E', 'UTF8', '--locale=C.UTF-8'];
  const access = ['-U', KEEPER, '-A', 'scram-sha-256', '--pwfile', password];
  const safety = durable ? ['--data-checksums'] : ['--no-sync'];
  await readOutput(
    join(bin, 'initdb'),
    ['-D', join(making, 'pgdata'), ...access, ...locale, ...safety],
    home.user,
  );
  renameSync(making, clusterPaths(home).current);
  if (durable) syncFolder(home.path);
};
