import { useState } from 'react';
import { ProblemError } from '#src/lib/http.ts';
import { useNow } from '#src/lib/use-now.ts';

/** Seconds the server wants to be left alone for after this error; 0 when it says nothing of waiting. */
export const waitOf = (error: unknown): number =>
  error instanceof ProblemError ? (error.problem.retryAfterS ?? 0) : 0;

/** Whole seconds still to wait, counting down to 0, and a function that starts a wait. */
export const useWait = (): readonly [number, (seconds: number) => void] => {
  const [untilMs, setUntilMs] = useState(0);
  const [isOver, setIsOver] = useState(true);
  const now = useNow(250, !isOver);
  const left = isOver ? 0 : Math.max(0, Math.ceil((untilMs - now) / 1000));
  if (!isOver && left === 0) setIsOver(true);
  const start = (seconds: number): void => {
    setUntilMs(Date.now() + seconds * 1000);
    setIsOver(false);
  };
  return [left, start];
};
