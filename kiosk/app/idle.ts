/** Whether a terminal that was last touched at `lastTouchMs` has stood idle long enough to lock. */
export const isIdle = (lastTouchMs: number, nowMs: number, idleLockS: number): boolean =>
  nowMs - lastTouchMs >= idleLockS * 1000;
