import type { z } from 'zod';
import type { TemperatureUnit } from '#shared/lib/units.ts';
import type { AlloyFormValues } from '#src/desk/parts/alloy-form-values.ts';
import { formSchema, type FormReading } from '#src/desk/parts/form-schema.ts';
import { formPathOf, readAlloyForm } from '#src/desk/parts/read-alloy-form.ts';

/** How the alloy's form is read in the studio's degrees. */
export const alloyReading = (unit: TemperatureUnit): FormReading<AlloyFormValues> => ({
  read: (values) => readAlloyForm(values, unit),
  placeOf: (path, { parts }) => formPathOf(path, parts),
});

/** A form's schema: reads what was typed into a request and holds it against the contract, with faults at the form's fields. */
export const alloyFormSchema = <Request>(contract: z.ZodType<Request>, unit: TemperatureUnit) =>
  formSchema(contract, alloyReading(unit));
