import { describe, expect, it } from 'vitest';
import { problemType, type ProblemId } from '#shared/contracts/problem.ts';
import { ProblemError, UnreachableError } from '#src/lib/http.ts';
import { failureOf, waitAfterFailures } from './delivery.ts';

const problem = (id: ProblemId, status: number): ProblemError =>
  new ProblemError({ type: problemType(id), title: 'No.', status });

describe('failureOf', () => {
  it.each([
    [new UnreachableError(), 'later'],
    [new Error('broken'), 'later'],
    [problem('not-ready', 503), 'later'],
    [problem('unexpected', 500), 'later'],
    [problem('too-many-requests', 429), 'later'],
    [problem('not-signed-in', 401), 'sign-in'],
    [problem('terminal-not-enrolled', 403), 'sign-in'],
    [problem('event-refused', 409), 'refused'],
    [problem('not-allowed', 403), 'refused'],
    [problem('invalid-request', 400), 'refused'],
  ])('sorts %s', (error, kind) => expect(failureOf(error)).toBe(kind));
});

describe('waitAfterFailures', () => {
  it('doubles from a second up to twenty', () => {
    expect([1, 2, 3, 4, 5, 6, 40].map(waitAfterFailures)).toEqual([
      1000, 2000, 4000, 8000, 16000, 20000, 20000,
    ]);
  });
});
