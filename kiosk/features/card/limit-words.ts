import type { Limits } from '#shared/domain/instruction/instruction-step.ts';

/** A number's limits in words, written by `write`; empty when both are open. */
export const limitWords = ({ low, high }: Limits, write: (value: number) => string): string => {
  if (low !== null && high !== null) return `Between ${write(low)} and ${write(high)}.`;
  if (low !== null) return `No less than ${write(low)}.`;
  return high === null ? '' : `No more than ${write(high)}.`;
};
