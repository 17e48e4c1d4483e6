import { useMutation } from '@tanstack/react-query';
import { useState } from 'react';
import { isProblemError, ProblemError, sentenceOf, UnreachableError } from '#src/lib/http.ts';
import { useNow } from '#src/lib/use-now.ts';

/** The fewest digits of a PIN. */
const fewestDigits = 6;

const retryMomentOf = (error: unknown, atMs: number): number =>
  error instanceof ProblemError && error.problem.retryAfterS !== undefined
    ? atMs + error.problem.retryAfterS * 1000
    : 0;

const wordsOf = (error: Error): string =>
  error instanceof UnreachableError
    ? 'No server, and it alone knows the PINs. Check the network, then try again.'
    : sentenceOf(error);

/** A PIN as it is typed, sent to be verified, and what came of it. */
export interface PinAttempts {
  readonly pin: string;
  readonly setPin: (pin: string) => void;
  readonly send: () => void;
  readonly isLocked: boolean;
  /** Whether a PIN may be typed now. */
  readonly isOpen: boolean;
  /** Whether enough digits are typed. */
  readonly isReady: boolean;
  readonly isBusy: boolean;
  /** What is wrong, in one sentence; empty while nothing is. */
  readonly words: string;
  readonly state: 'stop' | 'wait' | 'caution';
}

/** Lets a PIN be tried: wrong, to be waited for, or locked, each in one sentence. */
export const usePinAttempts = (verify: (pin: string) => Promise<unknown>): PinAttempts => {
  const [pin, setPin] = useState('');
  const [openAtMs, setOpenAtMs] = useState(0);
  const attempt = useMutation({
    mutationFn: verify,
    onError: (error) => {
      setPin('');
      setOpenAtMs(retryMomentOf(error, Date.now()));
    },
  });
  const waitS = Math.max(0, Math.ceil((openAtMs - useNow(250, openAtMs > 0)) / 1000));
  const isLocked = isProblemError(attempt.error, 'sign-in-locked');
  const isOpen = waitS === 0 && !isLocked && !attempt.isPending;
  const isReady = pin.length >= fewestDigits;
  const isDelayed = isProblemError(attempt.error, 'sign-in-delayed');
  const wrong = attempt.error && !isDelayed ? wordsOf(attempt.error) : '';
  return {
    pin,
    setPin,
    send: () => {
      if (isOpen && isReady) attempt.mutate(pin);
    },
    isLocked,
    isOpen,
    isReady,
    isBusy: attempt.isPending,
    words: waitS > 0 ? `Too many wrong tries. Wait ${waitS} s.` : wrong,
    state: isLocked ? 'stop' : waitS > 0 ? 'wait' : 'caution',
  };
};
