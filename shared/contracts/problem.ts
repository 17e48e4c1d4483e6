/** One fault at one field of a request. */
export interface FieldProblem {
  /** The field's path, parts joined by dots; empty for the request as a whole. */
  readonly path: string;
  readonly message: string;
}

/** An error answer, RFC 9457 problem details; `title` is one sentence that says what is wrong and what to do. */
export interface Problem {
  /** `urn:ladlemark:problem:` and the stable id. */
  readonly type: string;
  readonly title: string;
  readonly status: number;
  readonly fields?: readonly FieldProblem[];
  /** Seconds after which it is worth trying again. */
  readonly retryAfterS?: number;
}

const prefix = 'urn:ladlemark:problem:';

/** The stable ids of every error the server names. */
export const problemIds = [
  'invalid-request',
  'not-signed-in',
  'wrong-sign-in',
  'sign-in-delayed',
  'sign-in-locked',
  'terminal-not-enrolled',
  'token-refused',
  'not-allowed',
  'not-found',
  'foreign-request',
  'flask-code-refused',
  'no-open-casting',
  'wrong-state',
  'card-elsewhere',
  'alloy-not-approved',
  'event-refused',
  'reading-questioned',
  'reading-refused',
  'lot-code-refused',
  'not-enough-metal',
  'charge-refused',
  'entry-questioned',
  'already-exists',
  'changed-meanwhile',
  'too-many-requests',
  'too-large',
  'not-ready',
  'unexpected',
] as const;
/** A stable error id. */
export type ProblemId = (typeof problemIds)[number];

/** The `type` of a problem from its id. */
export const problemType = (id: ProblemId): string => prefix + id;

/** Whether a problem is the one with this id. */
export const isProblem = (problem: Pick<Problem, 'type'>, id: ProblemId): boolean =>
  problem.type === problemType(id);
