import { z } from 'zod';
import type { FieldProblem } from '#shared/contracts/problem.ts';
import type { TemperatureUnit } from '#shared/lib/units.ts';
import type { AlloyFormValues } from './alloy-form-values.ts';
import { formPathOf, readAlloyForm } from './read-alloy-form.ts';

const sentence = ({ message, code }: { readonly message: string; readonly code: string }): string =>
  code === 'invalid_value' ? 'Choose one.' : message;

const isUnder = (path: string, place: string): boolean => path === place || place.startsWith(`${path}.`);

/** Every fault of a form: what cannot be read, then what the contract refuses where nothing else is wrong already. */
const faultsOf = (
  values: AlloyFormValues,
  faults: readonly FieldProblem[],
  issues: readonly z.core.$ZodIssue[],
): readonly FieldProblem[] => {
  const refused = issues.map((issue) => ({
    path: formPathOf(issue.path.join('.'), values.parts),
    message: sentence(issue),
  }));
  return [...faults, ...refused.filter(({ path }) => !faults.some((fault) => isUnder(path, fault.path)))];
};

/** A form's schema: reads what was typed into a request and holds it against the contract, with faults at the form's fields. */
export const alloyFormSchema = <Request>(contract: z.ZodType<Request>, unit: TemperatureUnit) =>
  z.custom<AlloyFormValues>().transform((values, context): Request => {
    const { request, faults } = readAlloyForm(values, unit);
    const parsed = contract.safeParse(request);
    for (const { path, message } of faultsOf(values, faults, parsed.error?.issues ?? [])) {
      context.addIssue({ code: 'custom', path: path.split('.'), message });
    }
    return parsed.success && faults.length === 0 ? parsed.data : z.NEVER;
  });
