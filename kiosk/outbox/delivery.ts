import { isProblem } from '#shared/contracts/problem.ts';
import { ProblemError } from '#src/lib/http.ts';

/** Why an entry was not delivered: to be tried later, waiting for a sign-in, or refused for good. */
export type FailedDelivery = 'later' | 'sign-in' | 'refused';

/** Sorts a failed delivery: no answer or a server in trouble is tried again, a refusal with a reason is final. */
export const failureOf = (error: unknown): FailedDelivery => {
  if (!(error instanceof ProblemError)) return 'later';
  const { problem } = error;
  if (isProblem(problem, 'not-signed-in') || isProblem(problem, 'terminal-not-enrolled')) return 'sign-in';
  return problem.status >= 500 || problem.status === 429 ? 'later' : 'refused';
};

const firstWaitMs = 1_000;
const longestWaitMs = 20_000;

/** How long to wait after so many failures in a row, ms: 1 s, 2 s, 4 s … 20 s. */
export const waitAfterFailures = (failures: number): number =>
  Math.min(longestWaitMs, firstWaitMs * 2 ** Math.max(0, failures - 1));
