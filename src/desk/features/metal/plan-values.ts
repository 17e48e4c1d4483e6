import { parseDecimal } from '#shared/lib/decimal.ts';
import type { FormReading } from '#src/desk/parts/form-schema.ts';

/** What is typed to plan a charge. */
export interface PlanValues {
  /** Per cent of the charge. */
  readonly loss: string;
}

/** How the form of a plan for these castings is read. */
export const planReading = (
  castingIds: readonly string[],
): FormReading<PlanValues> & { readonly placeOfPath: (path: string) => string } => {
  const placeOfPath = (path: string): string => (path === 'lossShare' ? 'loss' : path);
  return {
    placeOfPath,
    placeOf: placeOfPath,
    read: ({ loss }) => {
      const percent = parseDecimal(loss);
      return {
        request: { castingIds, together: true, lossShare: percent.ok ? percent.value / 100 : undefined },
        faults: percent.ok ? [] : [{ path: 'loss', message: percent.error }],
      };
    },
  };
};
