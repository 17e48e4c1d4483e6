import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import type { PourCard } from '#shared/contracts/card.ts';
import { Button } from '#src/ui/button.tsx';
import { Dialog } from '#src/ui/dialog.tsx';
import { Icon } from '#src/ui/icon.tsx';
import { firstName, usePresence } from '#kiosk/lib/presence.ts';
import { ThemeButton } from '#kiosk/lib/theme-button.tsx';
import type { UnitWriter } from '#kiosk/lib/unit-writer.ts';
import { useOutboxView } from '#kiosk/outbox/outbox-context.ts';
import { CardFiguresGrid } from './card-figures-grid.tsx';

/** Whoever is signed in, and behind it what is needed now and then: the card's figures, the theme, the way out. */
export const CardMenu = ({ card, write }: { readonly card: PourCard; readonly write: UnitWriter }) => {
  const { person, signOut } = usePresence();
  const [isOpen, setIsOpen] = useState(false);
  const navigate = useNavigate();
  const hasWaiting = useOutboxView().entries.length > 0;
  // Whoever signs in next did not ask for this card, so it is not left open for them.
  const leave = (): void => {
    void navigate('/');
    signOut();
  };
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
        <span className="sr-only">: figures, theme, sign out</span>
      </button>
      <Dialog
        open={isOpen}
        onClose={() => setIsOpen(false)}
        title={`${person.name} at this card`}
        size="terminal"
        actions={
          <>
            <ThemeButton />
            <Button size="terminal" icon="back" onClick={() => void navigate('/')}>
              Standby
            </Button>
            <Button size="terminal" icon="lock" kind={hasWaiting ? 'blocked' : 'plain'} onClick={leave}>
              {hasWaiting ? 'Sign-out waits' : 'Sign out'}
            </Button>
          </>
        }
      >
        <CardFiguresGrid card={card} write={write} />
      </Dialog>
    </>
  );
};
