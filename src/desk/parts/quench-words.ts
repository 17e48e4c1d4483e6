import type { QuenchRule } from '#shared/domain/alloy/quench-rule.ts';
import { formatClock } from '#shared/lib/units.ts';

/** A quench rule in a few words: `after 12:00, in water`; `at once, by 2:00, in warm water`. */
export const quenchWords = ({ earliestS, latestS, medium }: QuenchRule): string =>
  [
    earliestS > 0 ? `after ${formatClock(earliestS)}` : 'at once',
    latestS === null ? '' : `by ${formatClock(latestS)}`,
    `in ${medium}`,
  ]
    .filter(Boolean)
    .join(', ');
