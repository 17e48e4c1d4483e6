import { readdirSync } from 'node:fs';
import { delimiter, join } from 'node:path';
import { isProgram } from '#server/services/process/find-program.ts';
import { installPackage, mayInstall } from '#server/services/process/install-package.ts';
import type { Say } from '#server/services/say.ts';
import { StartProblem } from '#server/services/start-problem.ts';
import { readOutput } from './run-program.ts';

/** One installed PostgreSQL server: its major version and the folder of its programs. */
export interface PostgresBinaries {
  readonly major: number;
  readonly bin: string;
}

/** Debian's folder of PostgreSQL versions, side by side. */
const DEBIAN_FOLDER = '/usr/lib/postgresql';

/** Generated columns and a non-superuser's right to trusted extensions came with this version. */
const OLDEST_MAJOR = 13;

const hasServer = (bin: string): boolean =>
  ['initdb', 'pg_ctl', 'postgres'].every((program) => isProgram(join(bin, program)));

const listFolder = (folder: string): string[] => {
  try {
    return readdirSync(folder);
  } catch {
    return [];
  }
};

const majorOf = async (bin: string): Promise<number> => {
  const words = await readOutput(join(bin, 'postgres'), ['--version']);
  return Number(/\(PostgreSQL\) (\d+)/.exec(words)?.[1] ?? 0);
};

/** Finds the installed servers, newest first, in Debian's folders and on the PATH. */
export const findPostgres = async (
  folder = DEBIAN_FOLDER,
  path = process.env['PATH'] ?? '',
): Promise<readonly PostgresBinaries[]> => {
  const candidates = [
    ...listFolder(folder).map((version) => join(folder, version, 'bin')),
    ...path.split(delimiter).filter((entry) => entry.startsWith('/')),
  ];
  const bins = [...new Set(candidates)].filter(hasServer);
  const found = await Promise.all(bins.map(async (bin) => ({ major: await majorOf(bin), bin })));
  return found.filter(({ major }) => major >= OLDEST_MAJOR).sort((a, b) => b.major - a.major);
};

/**
 * Finds PostgreSQL's server, or installs Debian's package when it may.
 * @throws {StartProblem} saying what to type when it is missing and may not be installed.
 */
export const ensurePostgres = async (say: Say): Promise<readonly PostgresBinaries[]> => {
  const present = await findPostgres();
  if (present.length > 0) return present;
  if (mayInstall()) say('Installing PostgreSQL (up to a minute) ...');
  const installed = (await installPackage('postgresql')) ? await findPostgres() : [];
  if (installed.length > 0) return installed;
  throw new StartProblem(
    'PostgreSQL is not installed. Type "sudo apt-get install postgresql" and start again, or set DATABASE_URL to a database of your own.',
  );
};

/** The programs that belong to PostgreSQL's own private folder, for a finished cluster's version or the newest. */
export const binariesFor = (
  installed: readonly PostgresBinaries[],
  major: number | null,
): PostgresBinaries => {
  const match = installed.find((binaries) => major === null || binaries.major === major);
  if (match) return match;
  const others = installed.map((binaries) => binaries.major).join(', ');
  throw new StartProblem(
    `The records were made by PostgreSQL ${major}, and only ${others} is installed. Type "sudo apt-get install postgresql-${major}" and start again.`,
  );
};
