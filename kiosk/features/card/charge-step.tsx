import { chargedG } from '#shared/domain/pour-card/card-state.ts';
import { useDraft } from '#kiosk/lib/use-draft.ts';
import { ChargeByLot } from './charge-by-lot.tsx';
import { ChargeLoose } from './charge-loose.tsx';
import { useLots } from './use-lot-charge.ts';
import type { RunningCard } from './use-running-card.ts';

/**
 * Metal into the crucible until the charge is what the card plans: lot by lot, unless the studio has no lots on hand, the
 * card was opened before lots were kept, or the metal at hand is of none.
 */
export const ChargeStep = ({ running }: { readonly running: RunningCard }) => {
  const { card, state } = running;
  const [isLoose, setIsLoose] = useDraft(`loose.${card.melt.id}`, false);
  const lots = useLots();
  const isEmpty = chargedG(state) === 0;
  const isByLotOnly = Boolean(card.chargePlan) || (state.lots ?? []).length > 0;
  const hasLots = lots === undefined || lots.length > 0;
  const isByLot = card.context.alloy !== undefined && (isByLotOnly || (isEmpty && hasLots && !isLoose));
  if (!isByLot) {
    const mayChange = isLoose && isEmpty && hasLots && card.context.alloy !== undefined;
    return <ChargeLoose running={running} onByLot={mayChange ? () => setIsLoose(false) : null} />;
  }
  return <ChargeByLot running={running} onLoose={isByLotOnly ? null : () => setIsLoose(true)} />;
};
