import { randomBytes, randomUUID } from 'node:crypto';
import { link, readFile, unlink, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import type { Environment } from '#server/environment.ts';
import { ensureDataDir } from './data-dir.ts';
import { StartProblem } from './start-problem.ts';

/** The two keys no one may know: one signs session cookies, the other is mixed into every PIN's hash. */
export interface Secrets {
  readonly sessionSecret: string;
  readonly pinPepper: string;
}

const SECRET_BYTES = 32;

const codeOf = (error: unknown): string | undefined => (error as NodeJS.ErrnoException).code;

const readSecret = async (path: string): Promise<string | null> => {
  try {
    const text = (await readFile(path, 'utf8')).trim();
    if (text.length >= SECRET_BYTES) return text;
  } catch (error) {
    if (codeOf(error) === 'ENOENT') return null;
    if (codeOf(error) !== 'EACCES') throw error;
    throw new StartProblem(
      `${path} belongs to another user; start as that user, or set DATA_DIR to a folder of your own.`,
    );
  }
  throw new StartProblem(
    `${path} is damaged. Put it back from a backup, or remove it to have a new one made; then everyone signs in again, and PINs that were made with it must be set anew.`,
  );
};

/** Writes beside and links into place, so that a crash leaves no half file and the first of two starters wins. */
const makeSecret = async (path: string): Promise<string> => {
  const aside = `${path}.${randomUUID()}`;
  const text = `${randomBytes(SECRET_BYTES).toString('base64url')}\n`;
  await writeFile(aside, text, { mode: 0o600 }).catch((error: unknown) => {
    throw new StartProblem(
      `${path} cannot be written (${codeOf(error)}); set DATA_DIR to a folder you may write to.`,
    );
  });
  try {
    await link(aside, path);
  } catch (error) {
    if (codeOf(error) !== 'EEXIST') throw error;
  } finally {
    await unlink(aside);
  }
  return (await readSecret(path)) ?? makeSecret(path);
};

const keptSecret = async (path: string): Promise<string> => (await readSecret(path)) ?? makeSecret(path);

/** Takes the secrets from the settings, or from files only this user may read, made at the first start. */
export const loadSecrets = async (environment: Environment): Promise<Secrets> => {
  ensureDataDir(environment.dataDir);
  const kept = (name: string): Promise<string> => keptSecret(join(environment.dataDir, name));
  return {
    sessionSecret: environment.sessionSecret ?? (await kept('session-secret')),
    pinPepper: environment.pinPepper ?? (await kept('pin-pepper')),
  };
};
