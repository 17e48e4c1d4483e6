import { z } from 'zod';
import type { FieldProblem } from '#shared/contracts/problem.ts';
import { ProblemError } from '#src/lib/http.ts';

/** What a form says as a request, unchecked, and what in it cannot be read, by the form's own paths. */
export interface ReadForm {
  readonly request: unknown;
  readonly faults: readonly FieldProblem[];
}

/** How a form is read, and where a request's path stands in it. */
export interface FormReading<Values> {
  readonly read: (values: Values) => ReadForm;
  readonly placeOf: (path: string, values: Values) => string;
}

/** A choice that was not made is asked for; every other refusal is in the contract's own words. */
const sentenceOfIssue = ({ code, message }: z.core.$ZodIssue): string =>
  code === 'invalid_value' && /^Invalid/.test(message) ? 'Choose one.' : message;

const isUnder = (path: string, place: string): boolean => path === place || place.startsWith(`${path}.`);

/** A form's schema: reads what was typed and holds it against the contract, with every fault at the form's own field. */
export const formSchema = <Values, Request>(
  contract: z.ZodType<Request>,
  { read, placeOf }: FormReading<Values>,
) =>
  z.custom<Values>().transform((values, context): Request => {
    const { request, faults } = read(values);
    const parsed = contract.safeParse(request);
    const refused = (parsed.error?.issues ?? [])
      .map((issue) => ({ path: placeOf(issue.path.join('.'), values), message: sentenceOfIssue(issue) }))
      .filter(({ path }) => !faults.some((fault) => isUnder(path, fault.path)));
    for (const { path, message } of [...faults, ...refused]) {
      context.addIssue({ code: 'custom', path: path.split('.'), message });
    }
    return parsed.success && faults.length === 0 ? parsed.data : z.NEVER;
  });

/** A server's answer with its paths turned into the form's own. */
export const atFormPlaces = (error: unknown, placeOf: (path: string) => string): unknown => {
  if (!(error instanceof ProblemError) || !error.problem.fields) return error;
  const fields = error.problem.fields.map(({ path, message }) => ({ path: placeOf(path), message }));
  return new ProblemError({ ...error.problem, fields });
};

/** Where a list of parts keeps a fault of the list as a whole. */
export const rootOfParts = (place: string): string => (place === 'parts' ? 'parts.root' : place);
