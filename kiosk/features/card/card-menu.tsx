import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import type { PourCard } from '#shared/contracts/card.ts';
import { isOver } from '#shared/domain/pour-card/card-state.ts';
import { Button } from '#src/ui/button.tsx';
import { Dialog } from '#src/ui/dialog.tsx';
import { Icon } from '#src/ui/icon.tsx';
import { ComfortButton } from '#kiosk/lib/comfort-button.tsx';
import { firstName, usePresence } from '#kiosk/lib/presence.ts';
import type { UnitWriter } from '#kiosk/lib/unit-writer.ts';
import { useUndelivered } from '#kiosk/outbox/photograph-context.ts';
import { CardFiguresGrid } from './card-figures-grid.tsx';
import type { RunningCard } from './use-running-card.ts';

/** Props of {@link CardMenu}. */
export interface CardMenuProps {
  readonly card: PourCard;
  readonly write: UnitWriter;
  /** The card as it runs; absent before it is opened. */
  readonly running?: RunningCard;
  /** Opens a screen over the step. */
  readonly onAside?: (aside: 'hand-over' | 'photograph') => void;
}

const WaysOut = () => {
  const { signOut } = usePresence();
  const navigate = useNavigate();
  const hasWaiting = useUndelivered() > 0;
  // Whoever signs in next did not ask for this card, so it is not left open for them.
  const leave = (): void => {
    void navigate('/');
    signOut();
  };
  return (
    <>
      <Button size="terminal" icon="back" onClick={() => void navigate('/')}>
        Standby
      </Button>
      <Button size="terminal" icon="lock" kind={hasWaiting ? 'blocked' : 'plain'} onClick={leave}>
        {hasWaiting ? 'Sign-out waits' : 'Sign out'}
      </Button>
    </>
  );
};

const RunningActions = ({ running, onAside }: Required<Pick<CardMenuProps, 'running' | 'onAside'>>) => {
  const { state, practice } = running;
  const isLate = state.step === 'close' || state.step === 'quench';
  return (
    <>
      {isLate ? (
        <Button size="terminal" icon="camera" onClick={() => onAside('photograph')}>
          Photograph
        </Button>
      ) : null}
      {practice || isOver(state) ? null : (
        <Button size="terminal" icon="people" onClick={() => onAside('hand-over')}>
          Hand over
        </Button>
      )}
    </>
  );
};

/** Whoever is signed in, and behind it what is needed now and then: the card's figures, the device's comfort, the way out. */
export const CardMenu = ({ card, write, running, onAside }: CardMenuProps) => {
  const { person } = usePresence();
  const [isOpen, setIsOpen] = useState(false);
  const close = (): void => setIsOpen(false);
  return (
    <>
      <button
        type="button"
        aria-haspopup="dialog"
        onClick={() => setIsOpen(true)}
        className="inline-flex min-h-18 min-w-18 touch-manipulation items-center gap-3 rounded-2xl px-3 text-2xl font-black select-none"
      >
        <Icon name="person" className="size-9" />
        {firstName(person.name)}
        <span className="sr-only">: figures, comfort, sign out</span>
      </button>
      <Dialog
        open={isOpen}
        onClose={close}
        title={`${person.name} at this card`}
        size="terminal"
        actions={
          <>
            {running && onAside ? (
              <RunningActions
                running={running}
                onAside={(aside) => {
                  close();
                  onAside(aside);
                }}
              />
            ) : null}
            <ComfortButton />
            {running?.practice ? (
              <Button size="terminal" icon="back" onClick={running.leave}>
                {running.practice.kind === 'walk' ? 'End the practice' : 'Begin anew'}
              </Button>
            ) : (
              <WaysOut />
            )}
          </>
        }
      >
        <CardFiguresGrid card={card} write={write} isWide />
      </Dialog>
    </>
  );
};
