import { QueryClient } from '@tanstack/react-query';
import { ProblemError } from './http.ts';

const isWorthRetrying = (failures: number, error: Error): boolean =>
  failures < 2 && (!(error instanceof ProblemError) || error.problem.status >= 500);

/** Makes the client that keeps what was read from the server. */
export const createQueryClient = (): QueryClient =>
  new QueryClient({
    defaultOptions: { queries: { retry: isWorthRetrying, staleTime: 5_000 }, mutations: { retry: false } },
  });
