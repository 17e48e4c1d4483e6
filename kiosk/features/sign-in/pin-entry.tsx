import type { PersonAtTerminal } from '#shared/contracts/person.ts';
import { usePinSignIn } from '#src/api/session.ts';
import { Button } from '#src/ui/button.tsx';
import { PinPad } from '#src/ui/pin-pad.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';
import { usePinAttempts } from '#kiosk/lib/use-pin-attempts.ts';

/** Props of {@link PinEntry}. */
export interface PinEntryProps {
  readonly person: PersonAtTerminal;
  readonly onBack: () => void;
}

/** The PIN of the person chosen: wrong, to be waited for, or locked, each in one sentence. */
export const PinEntry = ({ person, onBack }: PinEntryProps) => {
  const { mutateAsync } = usePinSignIn();
  const attempts = usePinAttempts((pin) => mutateAsync({ personId: person.id, pin }));
  const { isOpen, isReady, isLocked, words } = attempts;
  return (
    <div className="grid max-w-[600px] gap-4 [&_[role=group]>div]:!grid-rows-[repeat(4,76px)]">
      <div role="alert" className="min-h-11">
        {words ? <StateMark state={attempts.state} text={words} size="desk" /> : null}
      </div>
      <PinPad
        label={`PIN of ${person.name}`}
        value={attempts.pin}
        onChange={attempts.setPin}
        onEnter={attempts.send}
        disabled={!isOpen}
      />
      <div className="terminal-actions max-w-[560px]">
        <Button size="terminal" icon="people" onClick={onBack}>
          Someone else
        </Button>
        <Button
          kind={isReady && isOpen ? 'main' : 'blocked'}
          size="terminal"
          busy={attempts.isBusy}
          onClick={attempts.send}
        >
          {isLocked ? 'Locked' : 'Sign in'}
        </Button>
      </div>
    </div>
  );
};
