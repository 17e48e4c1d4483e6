import { setTimeout as delay } from 'node:timers/promises';
import pg from 'pg';

const ANSWER_WITHIN_MS = 15_000;
const POLL_MS = 100;

/** Answers of a server that is not ready yet: still recovering, just stopping, or not listening. */
const PASSING = new Set(['57P03', '57P01', 'ECONNREFUSED', 'ECONNRESET']);

const codeOf = (error: unknown): string => (error as { code?: string }).code ?? '';

/** Opens a connection, waiting while the server recovers; the caller ends it. Rejects with the driver's own error. */
export const connectWhenReady = async (connectionString: string, patienceMs: number): Promise<pg.Client> => {
  const deadline = Date.now() + patienceMs;
  for (;;) {
    const client = new pg.Client({ connectionString, connectionTimeoutMillis: ANSWER_WITHIN_MS });
    // A server that dies under an open connection is told through this event, and through the next query.
    client.on('error', () => {});
    try {
      await client.connect();
      return client;
    } catch (error) {
      await client.end().catch(() => {});
      if (!PASSING.has(codeOf(error)) || Date.now() > deadline) throw error;
    }
    await delay(POLL_MS);
  }
};
