import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import type { PourCard } from '#shared/contracts/card.ts';
import { cardQuery } from '#src/api/cards.ts';
import { castingsQuery } from '#src/api/castings.ts';
import { sentenceOf } from '#src/lib/http.ts';
import { Button } from '#src/ui/button.tsx';
import { Spinner } from '#src/ui/spinner.tsx';
import { MessageScreen } from '#kiosk/lib/message-screen.tsx';
import { usePresence } from '#kiosk/lib/presence.ts';
import { PracticeWalk } from './practice-walk.tsx';

const Nothing = ({ sentence }: { readonly sentence: string }) => {
  const navigate = useNavigate();
  return (
    <MessageScreen
      state="caution"
      mark="No practice"
      sentence={sentence}
      actions={
        <Button kind="main" size="terminal" icon="back" onClick={() => void navigate('/')}>
          Back to standby
        </Button>
      }
    />
  );
};

const Walk = ({ card }: { readonly card: PourCard }) => {
  const { person, terminal } = usePresence();
  const navigate = useNavigate();
  // What is read again meanwhile must not change the figures under a walk.
  const [shown] = useState(() => ({
    ...card,
    melt: { id: '', code: 'M-practice', openedBy: person.name, terminal: terminal.name },
  }));
  return <PracticeWalk card={shown} kind="walk" onLeave={() => void navigate('/', { replace: true })} />;
};

/** A card of the day, with its real figures, walked for practice: no record is made of it. */
export const PracticeScreen = () => {
  const castings = useQuery({ ...castingsQuery(), refetchInterval: false });
  const example = castings.data?.find(({ state }) => state === 'holding') ?? castings.data?.[0];
  const card = useQuery({ ...cardQuery(example?.id ?? ''), enabled: example !== undefined });
  if (card.data) return <Walk key={card.data.casting.id} card={card.data} />;
  const error = castings.error ?? card.error;
  if (error) return <Nothing sentence={sentenceOf(error)} />;
  if (castings.data && !example)
    return <Nothing sentence="No casting is planned to practise on. The owner plans castings at the desk." />;
  return (
    <main className="fill-screen grid place-items-center bg-ground text-4xl font-black text-ink">
      <h1 className="sr-only">Practice</h1>
      <Spinner label="Fetching a card to practise on" />
    </main>
  );
};
