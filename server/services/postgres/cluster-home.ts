import {
  chmodSync,
  chownSync,
  existsSync,
  mkdirSync,
  mkdtempSync,
  readFileSync,
  rmSync,
  statSync,
  writeFileSync,
} from 'node:fs';
import { join } from 'node:path';
import { ensureDataDir } from '#server/services/data-dir.ts';
import type { Say } from '#server/services/say.ts';
import { StartProblem } from '#server/services/start-problem.ts';
import { runQuietly, type ServerUser } from './run-program.ts';

/** Where a private cluster lives, and the user its server runs as (null: as ourselves). */
export interface ClusterHome {
  readonly path: string;
  readonly user: ServerUser | null;
}

/** Folders every user may pass through, best first; /var/lib is never swept, /var/tmp is writable almost anywhere. */
const FALLBACKS = ['/var/lib', '/var/tmp'];

const PRIVATE = 0o700;

/** The file in DATA_DIR that remembers a home elsewhere, so that a later start never opens an empty book instead. */
const PLACE_FILE = 'postgres-place';

const isRoot = (): boolean => process.getuid?.() === 0;

/** The entries of /etc/passwd: name, uid and gid of each user of this machine. */
const localUsers = (): ServerUser[] =>
  readFileSync('/etc/passwd', 'utf8')
    .split('\n')
    .map((line) => line.split(':'))
    .map(([name = '', , uid, gid]) => ({ name, uid: Number(uid), gid: Number(gid) }));

const postgresUser = (): ServerUser => {
  const user = localUsers().find(({ name }) => name === 'postgres');
  if (user) return user;
  throw new StartProblem(
    'PostgreSQL refuses to run as root, and there is no user "postgres" to run it as. Start as another user, or install Debian\'s package postgresql.',
  );
};

const ownerOf = (path: string): ServerUser => {
  const { uid, gid } = statSync(path);
  return localUsers().find((user) => user.uid === uid) ?? { name: `user ${uid}`, uid, gid };
};

/** As root, the server runs as whoever owns the home already, else as Debian's own user for it. */
const serverUser = (home: string): ServerUser | null => {
  if (!isRoot()) return null;
  const owner = existsSync(home) ? ownerOf(home) : null;
  return owner && owner.uid !== 0 ? owner : postgresUser();
};

const claim = (path: string, user: ServerUser | null): void => {
  if (user) chownSync(path, user.uid, user.gid);
  chmodSync(path, PRIVATE);
};

/** Asks the file system itself: modes, mounts and foreign file servers all have a say. */
const isUsableBy = async (path: string, user: ServerUser | null): Promise<boolean> =>
  (await runQuietly('/bin/sh', ['-c', 'cd "$1" && test -w .', 'sh', path], user)) === 0;

const tryToMake = async (path: string, user: ServerUser | null): Promise<boolean> => {
  try {
    mkdirSync(path, { recursive: true });
    claim(path, user);
  } catch (error) {
    if (!isRoot()) throw error;
    return false;
  }
  return isUsableBy(path, user);
};

const makeElsewhere = (): string => {
  for (const folder of FALLBACKS) {
    try {
      return mkdtempSync(join(folder, 'ladlemark-'));
    } catch {
      continue;
    }
  }
  throw new StartProblem('No folder was found in which PostgreSQL could keep its data; set DATA_DIR to one.');
};

const keptElsewhere = (dataDir: string): string | null => {
  const place = join(dataDir, PLACE_FILE);
  if (!existsSync(place)) return null;
  const path = readFileSync(place, 'utf8').trim();
  if (existsSync(path)) return path;
  throw new StartProblem(
    `${place} says that the records are kept in ${path}, which is not there. Put that folder back, or remove ${place} to begin with an empty book.`,
  );
};

/**
 * Finds or makes the folder of the private cluster: `postgres` in DATA_DIR, or, when the database's user cannot
 * pass there, a folder of its own elsewhere, which it says and remembers.
 */
export const findClusterHome = async (dataDir: string, say: Say): Promise<ClusterHome> => {
  ensureDataDir(dataDir);
  const path = keptElsewhere(dataDir) ?? join(dataDir, 'postgres');
  const user = serverUser(path);
  if (existsSync(join(path, 'current'))) {
    if (await isUsableBy(path, user)) return { path, user };
    const who = user ? `its owner, the user ${user.name},` : 'this user';
    throw new StartProblem(
      `The database in ${path} is out of reach for ${who}. Open the folders above it with chmod o+x, or start as the user who made it, or set DATA_DIR to another folder.`,
    );
  }
  if (!isRoot() && existsSync(path) && !(await isUsableBy(path, null))) {
    throw new StartProblem(
      `${path} belongs to another user; start as that user, or set DATA_DIR to a folder of your own.`,
    );
  }
  if (await tryToMake(path, user)) return { path, user };
  if (user === null) throw new StartProblem(`${path} cannot be written to; set DATA_DIR to another folder.`);
  rmSync(path, { recursive: true, force: true });
  const elsewhere = makeElsewhere();
  claim(elsewhere, user);
  writeFileSync(join(dataDir, PLACE_FILE), `${elsewhere}\n`);
  say(`The user ${user.name} cannot pass to ${dataDir}, so the database is kept in ${elsewhere}.`);
  return { path: elsewhere, user };
};
