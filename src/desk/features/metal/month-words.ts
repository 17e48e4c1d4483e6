import type { LossRate } from '#shared/contracts/reconciliation.ts';
import type { MonthOfMetal } from '#shared/domain/metal/reconcile.ts';

const names = [
  'January',
  'February',
  'March',
  'April',
  'May',
  'June',
  'July',
  'August',
  'September',
  'October',
  'November',
  'December',
] as const;

/** Whether a text is a month as addresses write it, `year-month`. */
export const isMonth = (text: string): boolean => /^2\d{3}-(0[1-9]|1[0-2])$/.test(text);

/** The month so many months after another: `('2026-12', 1)` is `2027-01`. */
export const monthAfter = (month: string, months: number): string => {
  const [year = 0, number = 1] = month.split('-').map(Number);
  const count = year * 12 + number - 1 + months;
  return `${Math.floor(count / 12)}-${String((count % 12) + 1).padStart(2, '0')}`;
};

/** A month in words: `December 2026`. */
export const monthWords = (month: string): string => {
  const [year, number] = month.split('-').map(Number);
  return `${names[(number ?? 1) - 1]} ${year}`;
};

/** One line of a month's account and what it comes to of a metal, mg; what leaves is below nought. */
export interface MonthLine {
  readonly name: string;
  readonly of: (metal: MonthOfMetal) => number;
  /** Whether it is what the lines above or below it add up to. */
  readonly isBalance: boolean;
}

const line = (name: string, of: MonthLine['of']): MonthLine => ({ name, of, isBalance: false });
const balance = (name: string, of: MonthLine['of']): MonthLine => ({ name, of, isBalance: true });

/** The account of the lots: the lines between the first and the last add up to their difference. */
export const lotLines: readonly MonthLine[] = [
  balance('On hand at the start', ({ opening }) => opening),
  line('Received', ({ received }) => received),
  line('Weighed into crucibles', ({ issued }) => -issued),
  line('Returned from melts', ({ returned }) => returned),
  line('Sent to refine', ({ dispatched }) => -dispatched),
  line('Difference found at counts', ({ counted }) => counted),
  line('Changed by new assays', ({ reassayed }) => reassayed),
  balance('On hand at the end', ({ closing }) => closing),
];

/** The account of the crucibles, made in the same way. */
export const crucibleLines: readonly MonthLine[] = [
  balance('In crucibles at the start', ({ crucibleOpening }) => crucibleOpening),
  line('Weighed in', ({ issued }) => issued),
  line('In castings', ({ cast }) => -cast),
  line('Returned as lots', ({ returned }) => -returned),
  line('Lost', ({ lost }) => -lost),
  balance('In crucibles at the end', ({ crucibleClosing }) => crucibleClosing),
];

/** By how much an account's lines miss its closing balance, mg; nought when it adds up. */
export const missingMg = (lines: readonly MonthLine[], metal: MonthOfMetal): number => {
  const closing = lines.at(-1)?.of(metal) ?? 0;
  return lines.slice(0, -1).reduce((sum, { of }) => sum + of(metal), 0) - closing;
};

/** What was lost of what went in, in per cent with two decimals. */
export const lossRateWords = ({ metalInMg, lostMg }: LossRate): string =>
  metalInMg === 0 ? 'no metal' : `${((lostMg / metalInMg) * 100).toFixed(2)}\u00a0%`;
