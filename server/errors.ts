import type { FieldProblem, ProblemId } from '#shared/contracts/problem.ts';

/** What an error may carry beside its sentence. */
export interface ErrorDetails {
  readonly fields?: readonly FieldProblem[];
  readonly retryAfterS?: number;
}

const statusOf: Readonly<Record<ProblemId, number>> = {
  'invalid-request': 400,
  'not-signed-in': 401,
  'wrong-sign-in': 401,
  'sign-in-delayed': 429,
  'sign-in-locked': 423,
  'terminal-not-enrolled': 403,
  'token-refused': 401,
  'not-allowed': 403,
  'not-found': 404,
  'foreign-request': 403,
  'flask-code-refused': 422,
  'no-open-casting': 404,
  'wrong-state': 409,
  'card-elsewhere': 409,
  'alloy-not-approved': 409,
  'event-refused': 409,
  'reading-questioned': 422,
  'reading-refused': 409,
  'lot-code-refused': 422,
  'not-enough-metal': 409,
  'charge-refused': 422,
  'entry-questioned': 422,
  'already-exists': 409,
  'changed-meanwhile': 409,
  'too-many-requests': 429,
  'too-large': 413,
  'not-ready': 503,
  unexpected: 500,
};

/** An error meant for people: a stable id and one sentence that says what is wrong and what to do. */
export class AppError extends Error {
  readonly id: ProblemId;
  readonly status: number;
  readonly details: ErrorDetails;

  constructor(id: ProblemId, sentence: string, details: ErrorDetails = {}) {
    super(sentence);
    this.name = 'AppError';
    this.id = id;
    this.status = statusOf[id];
    this.details = details;
  }
}

/** A fault at one field of the request. */
export const fieldError = (path: string, message: string): AppError =>
  new AppError('invalid-request', message, { fields: [{ path, message }] });

/** The record asked for does not exist, or is not this person's to know of. */
export const notFound = (what: string): AppError => new AppError('not-found', `There is no such ${what}.`);
