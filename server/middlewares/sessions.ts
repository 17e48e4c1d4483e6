import connectPgSimple from 'connect-pg-simple';
import type { RequestHandler } from 'express';
import session from 'express-session';
import pg from 'pg';
import { placeOf, type Place } from './place.ts';

declare module 'express-session' {
  interface SessionData {
    /** The application it was opened in: a PIN never opens the desk. */
    place?: Place;
    /** The terminal at which this session was signed in by PIN. */
    terminalId?: string;
  }
}

/** A shift: after this long without a request, people sign in again. */
const maxAgeMs = 12 * 60 * 60 * 1000;

/** Sessions kept in PostgreSQL, one cookie for the desk and one for the terminal; close it with the server. */
export const createSessions = (
  databaseUrl: string,
  secret: string,
): { handler: RequestHandler; close: () => Promise<void> } => {
  const pool = new pg.Pool({ connectionString: databaseUrl, max: 4 });
  // A lost connection is reported to whoever asks next; without a listener it would end the process.
  pool.on('error', () => {});
  const Store = connectPgSimple(session);
  const store = new Store({
    pool,
    tableName: 'user_sessions',
    pruneSessionInterval: 15 * 60,
    errorLog: () => {},
  });
  const sessionAt = (place: Place): RequestHandler =>
    session({
      name: `ladlemark-${place}`,
      store,
      secret,
      resave: false,
      saveUninitialized: false,
      rolling: true,
      cookie: { httpOnly: true, sameSite: 'strict', secure: 'auto', maxAge: maxAgeMs, path: '/' },
    });
  const handlers = { desk: sessionAt('desk'), terminal: sessionAt('terminal') };
  return {
    handler: (request, response, next) => handlers[placeOf(request)](request, response, next),
    close: async () => {
      store.close();
      await pool.end();
    },
  };
};
