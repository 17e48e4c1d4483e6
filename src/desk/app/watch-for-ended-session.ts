import type { QueryClient } from '@tanstack/react-query';
import { sessionQuery } from '#src/api/session.ts';
import { isProblemError } from '#src/lib/http.ts';

/** Asks who is signed in again as soon as any answer says that nobody is, so that the sign-in comes up. */
export const watchForEndedSession = (client: QueryClient): QueryClient => {
  const check = (error: unknown): void => {
    if (isProblemError(error, 'not-signed-in'))
      void client.invalidateQueries({ queryKey: sessionQuery.queryKey });
  };
  client.getQueryCache().subscribe((event) => {
    if (event.type === 'updated' && event.action.type === 'error') check(event.action.error);
  });
  client.getMutationCache().subscribe((event) => {
    if (event.type === 'updated' && event.action.type === 'error') check(event.action.error);
  });
  return client;
};
