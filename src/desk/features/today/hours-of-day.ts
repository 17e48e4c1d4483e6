const hourMs = 3_600_000;
const fewestHours = 10;

/** A span of a day in whole hours after local midnight. */
export interface DayHours {
  readonly from: number;
  readonly to: number;
}

/**
 * The hours a day's picture runs over: an hour on either side of everything that happens, at least ten hours, never
 * outside the day. `moments` and `midnightMs` are in ms since the epoch; a day without moments shows 7 to 19.
 */
export const hoursOfDay = (moments: readonly number[], midnightMs: number): DayHours => {
  if (moments.length === 0) return { from: 7, to: 19 };
  const hours = moments.map((ms) => (ms - midnightMs) / hourMs);
  const from = Math.max(0, Math.floor(Math.min(...hours)) - 1);
  const to = Math.min(24, Math.ceil(Math.max(...hours)) + 1);
  const missing = Math.max(0, fewestHours - (to - from));
  const later = Math.min(missing, 24 - to);
  return { from: Math.max(0, from - (missing - later)), to: to + later };
};
