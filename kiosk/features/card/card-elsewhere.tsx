import { useNavigate } from 'react-router-dom';
import { sentenceOf } from '#src/lib/http.ts';
import { Button } from '#src/ui/button.tsx';
import { HoldButton } from '#src/ui/hold-button.tsx';
import { MessageScreen } from '#kiosk/lib/message-screen.tsx';
import { usePresence } from '#kiosk/lib/presence.ts';
import { useOpenCard } from './card-preview.tsx';
import type { RunningCard } from './use-running-card.ts';

/** The card runs at another terminal: who has it, and for its own person or the owner a way to take it along. */
export const CardElsewhere = ({ card }: Pick<RunningCard, 'card'>) => {
  const { person } = usePresence();
  const navigate = useNavigate();
  const open = useOpenCard(card.casting.id);
  const { openedBy, terminal } = card.melt;
  const isOwn = openedBy === person.name;
  const mayTakeAlong = isOwn || person.roles.includes('owner');
  const sentence = isOwn
    ? `You opened this card at ${terminal}. Carry it on here?`
    : `${openedBy} has this flask at ${terminal}. Ask there, or choose another flask.`;
  return (
    <MessageScreen
      state="caution"
      mark={isOwn ? 'Yours, at another terminal' : 'Not here'}
      sentence={open.error ? sentenceOf(open.error) : sentence}
      actions={
        <>
          <Button
            size="terminal"
            icon="scan"
            kind={mayTakeAlong ? 'plain' : 'main'}
            onClick={() => void navigate('/')}
          >
            Scan another
          </Button>
          {mayTakeAlong ? (
            <HoldButton
              className="grow-2"
              disabled={open.isPending}
              onHeld={() => open.mutate({ carryOn: true })}
            >
              Hold to carry on here
            </HoldButton>
          ) : null}
        </>
      }
    />
  );
};
