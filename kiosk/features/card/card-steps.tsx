import { useEffect } from 'react';
import { sentenceOf } from '#src/lib/http.ts';
import { MessageScreen } from '#kiosk/lib/message-screen.tsx';
import { firstName } from '#kiosk/lib/presence.ts';
import { rememberClock } from '#kiosk/lib/remembered-clocks.ts';
import { runningClockOf } from '#kiosk/lib/running-clock.ts';
import { CardMenu } from './card-menu.tsx';
import { CardWalk } from './card-walk.tsx';
import { useCarryOn } from './use-carry-on.ts';
import { useRunningCard, type RunningCard } from './use-running-card.ts';

const useRememberedHere = ({ card, state }: RunningCard): void => {
  const clock = JSON.stringify(runningClockOf({ card, state }));
  const castingId = card.casting.id;
  useEffect(
    () => rememberClock(castingId, JSON.parse(clock) as ReturnType<typeof runningClockOf>),
    [castingId, clock],
  );
};

/** A running card of this terminal, in the name of whoever is signed in. */
export const CardSteps = ({ card }: Pick<RunningCard, 'card'>) => {
  const running = useRunningCard(card);
  useRememberedHere(running);
  const refusal = useCarryOn(running);
  const menu = <CardMenu card={card} write={running.write} />;
  if (running.waitsFor) {
    const name = firstName(running.waitsFor);
    return (
      <MessageScreen
        state="wait"
        mark="Records wait"
        sentence={`${name} has records on this card that are not written yet. ${name} signs in first.`}
        actions={menu}
      />
    );
  }
  if (refusal)
    return <MessageScreen state="caution" mark="Not yours" sentence={sentenceOf(refusal)} actions={menu} />;
  return <CardWalk running={running} />;
};
