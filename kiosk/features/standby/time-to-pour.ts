const minuteMs = 60_000;

/** How long until a planned pour, in words that are read at a glance: `in 8 min`, `in 2 h 43`, `12 min late`. */
export const timeToPour = (plannedAt: string, nowMs: number): string => {
  const minutes = Math.round((Date.parse(plannedAt) - nowMs) / minuteMs);
  if (minutes === 0) return 'now';
  const away = Math.abs(minutes);
  const hours = Math.floor(away / 60);
  const rest = away % 60;
  const span = hours === 0 ? `${away} min` : rest === 0 ? `${hours} h` : `${hours} h ${rest}`;
  return minutes > 0 ? `in ${span}` : `${span} late`;
};
