import { StartProblem } from '#server/services/start-problem.ts';
import { connectWhenReady } from './connect-when-ready.ts';

const PATIENCE_MS = 10_000;

const OLDEST = 130_000;

const sentences: Readonly<Record<string, string>> = {
  ECONNREFUSED: 'no server listens there; start it, or correct the address',
  ENOTFOUND: 'its host name is not known',
  EAI_AGAIN: 'its host name is not known',
  ETIMEDOUT: 'its host does not answer',
  '28P01': 'the user or the password is wrong',
  '28000': 'the server refuses this user',
  '3D000': 'the server has no database of that name; make it with createdb',
  '57P03': 'the server is still starting; try again',
  '53300': 'the server has no connection left to give',
};

const reason = (error: unknown): string => {
  const { code, message } = error as { code?: string; message?: string };
  return sentences[code ?? ''] ?? message ?? 'it does not answer';
};

/**
 * Tries the database that DATABASE_URL names.
 * @throws {StartProblem} saying what is wrong with it, without repeating its password.
 */
export const checkDatabase = async (url: string): Promise<void> => {
  const client = await connectWhenReady(url, PATIENCE_MS).catch((error: unknown) => {
    throw new StartProblem(`The database named by DATABASE_URL cannot be used: ${reason(error)}.`);
  });
  try {
    const { rows } = await client.query<{ version: number }>(
      "SELECT current_setting('server_version_num')::int AS version",
    );
    if ((rows[0]?.version ?? 0) < OLDEST) {
      throw new StartProblem(
        'The database named by DATABASE_URL is older than PostgreSQL 13; use a newer one.',
      );
    }
  } finally {
    await client.end();
  }
};
