import type { FieldValues, Path, UseFormSetError } from 'react-hook-form';
import { ProblemError, sentenceOf } from '#src/lib/http.ts';

/**
 * Puts a failed answer's sentences at the form's own fields; whatever names no field of the form goes to `root.server`,
 * to be shown above the button. What was typed stays as it is.
 */
export const applyProblem = <Values extends FieldValues>(
  error: unknown,
  fields: readonly Path<Values>[],
  setError: UseFormSetError<Values>,
): void => {
  const faults = error instanceof ProblemError ? (error.problem.fields ?? []) : [];
  const isOurs = (path: string): path is Path<Values> =>
    fields.some((field) => path === field || path.startsWith(`${field}.`));
  const placed = faults.filter(({ path }) => isOurs(path));
  placed.forEach(({ path, message }, index) =>
    setError(path as Path<Values>, { type: 'server', message }, { shouldFocus: index === 0 }),
  );
  const homeless = faults.filter(({ path }) => !isOurs(path)).map(({ message }) => message);
  if (placed.length > 0 && homeless.length === 0) return;
  const sentence = homeless.length > 0 ? homeless.join(' ') : sentenceOf(error);
  setError('root.server', { type: 'server', message: sentence });
};
