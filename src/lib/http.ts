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
/** A scanned page, or a sheet of a thousand lots, takes longer than a line of words. */
const giveUpLongAfterMs = 120_000;

/** What a request carries, how it is written, and how long it may take. */
interface Content {
  readonly type?: string;
  readonly body?: BodyInit;
  readonly timeoutMs: number;
}

const nothing: Content = { timeoutMs: giveUpAfterMs };

const asJson = (body: unknown, timeoutMs: number = giveUpAfterMs): Content =>
  body === undefined ? nothing : { type: 'application/json', body: JSON.stringify(body), timeoutMs };

const asFile = (file: Blob): Content => ({
  type: 'application/octet-stream',
  body: file,
  timeoutMs: giveUpLongAfterMs,
});

const send = async (method: string, path: string, { type, body, timeoutMs }: Content): Promise<Response> => {
  try {
    return await fetch(path, {
      method,
      credentials: 'same-origin',
      headers: {
        Accept: 'application/json',
        'Ladlemark-Place': place,
        ...(type === undefined ? {} : { 'Content-Type': type }),
      },
      signal: AbortSignal.timeout(timeoutMs),
      ...(body === undefined ? {} : { body }),
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

const request = async <Answer>(method: string, path: string, content: Content): Promise<Answer> => {
  const response = await send(method, path, content);
  if (response.status === 204) return undefined as Answer;
  const answer = await readJson(response);
  if (!response.ok) throw new ProblemError(answer as Problem);
  return answer as Answer;
};

/** The bytes of a file that the API keeps; what they are, the answer's own type says. */
const requestBlob = async (path: string): Promise<Blob> => {
  const response = await send('GET', path, nothing);
  if (!response.ok) throw new ProblemError((await readJson(response)) as Problem);
  try {
    return await response.blob();
  } catch {
    throw new UnreachableError();
  }
};

/** Requests to our own API; rejects with a ProblemError or an UnreachableError. */
export const http = {
  get: <Answer>(path: string): Promise<Answer> => request('GET', path, nothing),
  blob: requestBlob,
  post: <Answer>(path: string, body?: unknown): Promise<Answer> => request('POST', path, asJson(body)),
  /** Sends what the server works on for long, such as a sheet of a thousand rows; two minutes at most. */
  postLong: <Answer>(path: string, body: unknown): Promise<Answer> =>
    request('POST', path, asJson(body, giveUpLongAfterMs)),
  patch: <Answer>(path: string, body: unknown): Promise<Answer> => request('PATCH', path, asJson(body)),
  /** Sends a file as it is, as the whole body; two minutes at most. */
  upload: <Answer>(path: string, file: Blob): Promise<Answer> => request('POST', path, asFile(file)),
};
