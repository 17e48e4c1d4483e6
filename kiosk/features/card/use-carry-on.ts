import { useEffect, useEffectEvent } from 'react';
import { isOver } from '#shared/domain/pour-card/card-state.ts';
import { ProblemError } from '#src/lib/http.ts';
import { useOpenCard } from './card-preview.tsx';
import type { RunningCard } from './use-running-card.ts';

/**
 * When another person goes on with a card that runs at this terminal, has that written in the melt book; why the server
 * refused it, or null.
 */
export const useCarryOn = ({ card, state, person, waiting }: RunningCard): ProblemError | null => {
  const { mutate, error } = useOpenCard(card.casting.id);
  const isAnother = card.melt.openedBy !== person.name && waiting === 0 && !isOver(state);
  const carryOn = useEffectEvent(() => mutate({ carryOn: false }));
  useEffect(() => {
    if (isAnother) carryOn();
  }, [isAnother, card.melt.id]);
  return isAnother && error instanceof ProblemError ? error : null;
};
