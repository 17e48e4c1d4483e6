import { queryOptions, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import type { PinSignInRequest, Session, SignInRequest } from '#shared/contracts/session.ts';
import { http } from '#src/lib/http.ts';

/** Who is signed in here, and what the application may show them. */
export const sessionQuery = queryOptions({
  queryKey: ['session'],
  queryFn: () => http.get<Session>('/api/session'),
  staleTime: 30_000,
});

/** The session, kept fresh. */
export const useSession = () => useQuery(sessionQuery);

const useSessionChange = <Request>(send: (request: Request) => Promise<Session>) => {
  const client = useQueryClient();
  return useMutation({
    mutationFn: send,
    onSuccess: (session) => client.setQueryData(sessionQuery.queryKey, session),
  });
};

/** Signs in at the desk. */
export const useSignIn = () =>
  useSessionChange((request: SignInRequest) => http.post<Session>('/api/session/desk', request));

/** Signs in at a terminal. */
export const usePinSignIn = () =>
  useSessionChange((request: PinSignInRequest) => http.post<Session>('/api/session/terminal', request));

/** Signs out; whatever was read is forgotten, only the session itself is asked for again. */
export const useSignOut = () => {
  const client = useQueryClient();
  return useMutation({
    mutationFn: () => http.post<undefined>('/api/session/end'),
    onSettled: async () => {
      client.removeQueries({ predicate: ({ queryKey }) => queryKey[0] !== 'session' });
      await client.invalidateQueries({ queryKey: sessionQuery.queryKey });
    },
  });
};
