import { useQuery } from '@tanstack/react-query';
import { useNavigate, useParams } from 'react-router-dom';
import type { PourCard } from '#shared/contracts/card.ts';
import { cardQuery } from '#src/api/cards.ts';
import { sentenceOf } from '#src/lib/http.ts';
import { Button } from '#src/ui/button.tsx';
import { Spinner } from '#src/ui/spinner.tsx';
import { MessageScreen } from '#kiosk/lib/message-screen.tsx';
import { CardElsewhere } from './card-elsewhere.tsx';
import { CardPreview } from './card-preview.tsx';
import { CardSteps } from './card-steps.tsx';
import type { RunningCard } from './use-running-card.ts';

/** How often a card is read again, so that one taken to another terminal is noticed, ms. */
const everyMs = 10_000;

const isRunning = (card: PourCard): card is RunningCard['card'] => card.melt !== null;

const Card = ({ card }: { readonly card: PourCard }) => {
  if (!isRunning(card)) return <CardPreview card={card} />;
  return card.abilities.record ? <CardSteps key={card.melt.id} card={card} /> : <CardElsewhere card={card} />;
};

/** One casting's card: before it is opened, at another terminal, or at the step where it stands here. */
export const CardScreen = () => {
  const { castingId = '' } = useParams();
  const navigate = useNavigate();
  const {
    data: card,
    error,
    refetch,
    isFetching,
  } = useQuery({
    ...cardQuery(castingId),
    refetchInterval: everyMs,
  });
  if (card) return <Card card={card} />;
  if (!error) {
    return (
      <main className="grid h-dvh place-items-center bg-ground text-4xl font-black text-ink">
        <h1 className="sr-only">Pour card</h1>
        <Spinner label="Fetching the card" />
      </main>
    );
  }
  return (
    <MessageScreen
      state="caution"
      mark="No card"
      sentence={sentenceOf(error)}
      actions={
        <>
          <Button size="terminal" busy={isFetching} onClick={() => void refetch()}>
            Try again
          </Button>
          <Button size="terminal" kind="main" icon="scan" onClick={() => void navigate('/')}>
            Scan another
          </Button>
        </>
      }
    />
  );
};
