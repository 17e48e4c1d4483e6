import type { ChargeKind } from '#shared/domain/pour-card/card-event.ts';
import { chargeWords } from './charge-words.ts';
import { MassEntry } from './mass-entry.tsx';
import type { RunningCard } from './use-running-card.ts';

/** Props of {@link WeighIn}. */
export interface WeighInProps {
  readonly running: RunningCard;
  readonly kind: ChargeKind;
  readonly onDone: () => void;
}

/** What each kind of charge is called in a sentence. */
export const chargeKindWords: Readonly<Record<ChargeKind, string>> = {
  grain: 'casting grain',
  returns: 'returns',
};

/** One weighing into the crucible. */
export const WeighIn = ({ running, kind, onDone }: WeighInProps) => {
  const { mass: now, stateWords } = chargeWords(running.state, running.card.context, running.write);
  return (
    <MassEntry
      running={running}
      sentence={`How much ${chargeKindWords[kind]} goes in?`}
      label={`Mass of ${chargeKindWords[kind]}`}
      actionWords={(mass) => `Put in ${mass}`}
      sub={`${now}. ${stateWords}.`}
      onCancel={onDone}
      onMass={(massG) => {
        if (running.record({ type: 'charge-weighed', kind, massG })) onDone();
      }}
    />
  );
};
