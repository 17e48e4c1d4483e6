import { useState } from 'react';
import type { PersonAtTerminal } from '#shared/contracts/person.ts';
import { usePinSignIn } from '#src/api/session.ts';
import { isProblemError, ProblemError, sentenceOf } from '#src/lib/http.ts';
import { useNow } from '#src/lib/use-now.ts';
import { Button } from '#src/ui/button.tsx';
import { PinPad } from '#src/ui/pin-pad.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';

/** Props of {@link PinEntry}. */
export interface PinEntryProps {
  readonly person: PersonAtTerminal;
  readonly onBack: () => void;
}

const fewestDigits = 6;

const retryMomentOf = (error: unknown, atMs: number): number =>
  error instanceof ProblemError && error.problem.retryAfterS !== undefined
    ? atMs + error.problem.retryAfterS * 1000
    : 0;

const useAttempts = (personId: string) => {
  const [pin, setPin] = useState('');
  const [openAtMs, setOpenAtMs] = useState(0);
  const signIn = usePinSignIn();
  const waitS = Math.max(0, Math.ceil((openAtMs - useNow(250, openAtMs > 0)) / 1000));
  const isLocked = isProblemError(signIn.error, 'sign-in-locked');
  const isOpen = waitS === 0 && !isLocked && !signIn.isPending;
  const send = (): void => {
    if (!isOpen || pin.length < fewestDigits) return;
    signIn.mutate(
      { personId, pin },
      {
        onError: (error) => {
          setPin('');
          setOpenAtMs(retryMomentOf(error, Date.now()));
        },
      },
    );
  };
  return { pin, setPin, send, waitS, isLocked, isOpen, signIn } as const;
};

/** The PIN of the person chosen: wrong, to be waited for, or locked, each in one sentence. */
export const PinEntry = ({ person, onBack }: PinEntryProps) => {
  const { pin, setPin, send, waitS, isLocked, isOpen, signIn } = useAttempts(person.id);
  const isDelayed = isProblemError(signIn.error, 'sign-in-delayed');
  const words =
    waitS > 0
      ? `Too many wrong tries. Wait ${waitS} s.`
      : isDelayed
        ? ''
        : signIn.error && sentenceOf(signIn.error);
  const isReady = pin.length >= fewestDigits;
  return (
    <div className="grid max-w-[600px] gap-4 [&_[role=group]>div]:!grid-rows-[repeat(4,76px)]">
      <div role="alert" className="min-h-11">
        {words ? (
          <StateMark state={isLocked ? 'stop' : waitS > 0 ? 'wait' : 'caution'} text={words} size="desk" />
        ) : null}
      </div>
      <PinPad
        label={`PIN of ${person.name}`}
        value={pin}
        onChange={setPin}
        onEnter={send}
        disabled={!isOpen}
      />
      <div className="terminal-actions max-w-[560px]">
        <Button size="terminal" icon="people" onClick={onBack}>
          Someone else
        </Button>
        <Button
          kind={isReady && isOpen ? 'main' : 'blocked'}
          size="terminal"
          busy={signIn.isPending}
          onClick={send}
        >
          {isLocked ? 'Locked' : 'Sign in'}
        </Button>
      </div>
    </div>
  );
};
