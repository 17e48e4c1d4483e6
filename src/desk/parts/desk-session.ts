import { createContext, use } from 'react';
import type { Session } from '#shared/contracts/session.ts';

/** The session of someone who is signed in at the desk. */
export interface DeskSession extends Session {
  readonly person: NonNullable<Session['person']>;
}

/** Provided by the session gate to every page behind it. */
export const DeskSessionContext = createContext<DeskSession | null>(null);

/** Who is signed in at the desk, with the studio's units and time zone; throws outside the session gate. */
export const useDeskSession = (): DeskSession => {
  const session = use(DeskSessionContext);
  if (!session) throw new Error('A page of the desk was shown outside the session gate.');
  return session;
};
