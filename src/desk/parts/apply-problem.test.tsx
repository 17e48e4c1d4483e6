import { describe, expect, it, vi } from 'vitest';
import { problemType, type FieldProblem } from '#shared/contracts/problem.ts';
import { ProblemError, UnreachableError } from '#src/lib/http.ts';
import { applyProblem } from './apply-problem.ts';

interface Values {
  readonly login: string;
  readonly tables: { readonly silver: { readonly low: string } };
}

const refused = (fields?: readonly FieldProblem[]): ProblemError =>
  new ProblemError({
    type: problemType('invalid-request'),
    title: 'Something in the request is not right.',
    status: 400,
    ...(fields ? { fields } : {}),
  });

const placesOf = (error: unknown): readonly (readonly [string, string])[] => {
  const setError = vi.fn();
  applyProblem<Values>(error, ['login', 'tables'], setError);
  return setError.mock.calls.map(
    ([path, fault]) => [path as string, (fault as { message: string }).message] as const,
  );
};

describe('applyProblem', () => {
  it('puts each sentence at its field, nested ones too', () => {
    const error = refused([
      { path: 'login', message: 'Someone already signs in by that name.' },
      { path: 'tables.silver.low', message: 'Not below 0.' },
    ]);
    expect(placesOf(error)).toEqual([
      ['login', 'Someone already signs in by that name.'],
      ['tables.silver.low', 'Not below 0.'],
    ]);
  });

  it('shows a sentence for a field the form does not have above the button', () => {
    expect(placesOf(refused([{ path: 'loginName', message: 'Too long.' }]))).toEqual([
      ['root.server', 'Too long.'],
    ]);
  });

  it('shows the answer’s own sentence when no field is named', () => {
    expect(placesOf(refused())).toEqual([['root.server', 'Something in the request is not right.']]);
  });

  it('says that the server is away when it is', () => {
    const [[path, message] = []] = placesOf(new UnreachableError());
    expect(path).toBe('root.server');
    expect(message).toMatch(/cannot be reached/);
  });
});
