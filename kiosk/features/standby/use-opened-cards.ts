import { useQueries } from '@tanstack/react-query';
import { useEffect } from 'react';
import type { Casting } from '#shared/contracts/casting.ts';
import { cardQuery } from '#src/api/cards.ts';
import { cardStateOf } from '#kiosk/lib/card-state-of.ts';
import { rememberClocks } from '#kiosk/lib/remembered-clocks.ts';
import { runningClockOf, type RunningClock } from '#kiosk/lib/running-clock.ts';
import { useOutboxView } from '#kiosk/outbox/outbox-context.ts';

/** A casting whose card has been opened: how it runs, and whether this terminal holds it. */
export interface OpenedCard {
  readonly castingId: string;
  readonly clock: RunningClock | null;
  readonly isHere: boolean;
}

/** The opened cards among `castings`, with those of this terminal remembered for the lock screen. */
export const useOpenedCards = (castings: readonly Casting[]): readonly OpenedCard[] => {
  const { entries } = useOutboxView();
  const opened = castings.filter(({ melt }) => melt !== null);
  const cards = useQueries({
    queries: opened.map(({ id }) => ({ ...cardQuery(id), refetchInterval: 10_000 })),
    combine: (results) => results.flatMap(({ data }) => (data ? [data] : [])),
  });
  const known = cards.map((card) => ({
    castingId: card.casting.id,
    clock: runningClockOf({ card, state: cardStateOf(card, entries) }),
    isHere: card.abilities.record,
  }));
  const isComplete = cards.length === opened.length;
  const here = JSON.stringify(known.flatMap(({ isHere, clock }) => (isHere && clock ? [clock] : [])));
  useEffect(() => {
    if (isComplete) rememberClocks(JSON.parse(here) as RunningClock[]);
  }, [here, isComplete]);
  return known;
};
