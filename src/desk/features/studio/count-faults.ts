/** How many sentences a form's errors hold, nested fields included; those of the form as a whole are left out. */
export const countFaults = (errors: unknown): number => {
  if (errors === null || typeof errors !== 'object') return 0;
  if ('message' in errors && typeof errors.message === 'string') return 1;
  return Object.entries(errors).reduce(
    (sum, [key, value]) => (key === 'root' || key === 'ref' ? sum : sum + countFaults(value)),
    0,
  );
};
