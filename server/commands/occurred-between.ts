/**
 * The moment an event is filed under: the terminal's own, but never before the event it follows and never in the
 * future, so that a wrong clock cannot turn the book's order round. When it was recorded is kept beside it.
 */
export const occurredBetween = (reported: string, previous: Date | null, now: Date): Date => {
  const latest = Math.min(Date.parse(reported), now.getTime());
  return new Date(Math.max(latest, previous?.getTime() ?? latest));
};
