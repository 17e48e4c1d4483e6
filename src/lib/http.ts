import { isProblem, type Problem, type ProblemId } from '#shared/contracts/problem.ts';

/** The application that is asking; the server keeps a session for each. */
export type Place = 'desk' | 'terminal';

let place: Place = 'desk';

/** Says once, at the start, which application this page is. */
export const setPlace = (which: Place): void => {
  place = which;
};

/** The server's answer was an error; `message` is its one sentence for people. */
export class ProblemError extends Error {
  readonly problem: Problem;

  constructor(problem: Problem) {
    super(problem.title);
    this.name = 'ProblemError';
    this.problem = problem;
  }
}

/** The server did not answer at all: no network, or the server is down. Nothing is known to be stored. */
export class UnreachableError extends Error {
  constructor() {
    super('The server cannot be reached. Check the network; this goes on by itself when it is back.');
    this.name = 'UnreachableError';
  }
}

/** Whether an error is the server's problem of this id. */
export const isProblemError = (error: unknown, id: ProblemId): error is ProblemError =>
  error instanceof ProblemError && isProblem(error.problem, id);

/** The sentence to show for any error. */
export const sentenceOf = (error: unknown): string =>
  error instanceof ProblemError || error instanceof UnreachableError
    ? error.message
    : 'Something went wrong on this page. Load it again.';

const giveUpAfterMs = 15_000;

const send = async (method: string, path: string, body: unknown): Promise<Response> => {
  try {
    return await fetch(path, {
      method,
      credentials: 'same-origin',
      headers: {
        Accept: 'application/json',
        'Ladlemark-Place': place,
        ...(body === undefined ? {} : { 'Content-Type': 'application/json' }),
      },
      signal: AbortSignal.timeout(giveUpAfterMs),
      ...(body === undefined ? {} : { body: JSON.stringify(body) }),
    });
  } catch {
    throw new UnreachableError();
  }
};

const readJson = async (response: Response): Promise<unknown> => {
  try {
    return await response.json();
  } catch {
    // Cut off half-way, or answered by something between us and the server.
    throw new UnreachableError();
  }
};

const request = async <Answer>(method: string, path: string, body?: unknown): Promise<Answer> => {
  const response = await send(method, path, body);
  if (response.status === 204) return undefined as Answer;
  const answer = await readJson(response);
  if (!response.ok) throw new ProblemError(answer as Problem);
  return answer as Answer;
};

/** The bytes of a file that the API keeps; what they are, the answer's own type says. */
const requestBlob = async (path: string): Promise<Blob> => {
  const response = await send('GET', path, undefined);
  if (!response.ok) throw new ProblemError((await readJson(response)) as Problem);
  try {
    return await response.blob();
  } catch {
    throw new UnreachableError();
  }
};

/** Requests to our own API; rejects with a ProblemError or an UnreachableError. */
export const http = {
  get: <Answer>(path: string): Promise<Answer> => request('GET', path),
  blob: requestBlob,
  post: <Answer>(path: string, body?: unknown): Promise<Answer> => request('POST', path, body),
  patch: <Answer>(path: string, body: unknown): Promise<Answer> => request('PATCH', path, body),
};
