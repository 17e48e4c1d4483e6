import { AppError } from '../errors.ts';

/** After how many wrong tries in a row each further one has to wait. */
const freeTries = 3;
const longestWaitS = 60;

/** When the next try is looked at after this many failures: 1, 2, 4 … 60 seconds; null while tries are free. */
export const waitAfter = (failures: number, now: Date): Date | null =>
  failures < freeTries
    ? null
    : new Date(now.getTime() + Math.min(longestWaitS, 2 ** (failures - freeTries)) * 1000);

/** The error for a try that comes before the wait is over; null when it may be looked at. */
export const tooSoon = (waitUntil: Date | null, now: Date): AppError | null => {
  const seconds = waitUntil ? Math.ceil((waitUntil.getTime() - now.getTime()) / 1000) : 0;
  if (seconds <= 0) return null;
  const sentence = `Too many wrong tries. Wait ${seconds} ${seconds === 1 ? 'second' : 'seconds'} and try again.`;
  return new AppError('sign-in-delayed', sentence, { retryAfterS: seconds });
};
