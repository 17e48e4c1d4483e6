import { useState } from 'react';
import {
  chargeKindOf,
  chargeKinds,
  type ChargeKind,
  type ChargeLot,
} from '#shared/domain/pour-card/card-event.ts';
import type { CardState } from '#shared/domain/pour-card/card-state.ts';
import { Button } from '#src/ui/button.tsx';
import { MassEntry } from './mass-entry.tsx';
import { chargeKindWords } from './weigh-in.tsx';
import type { RunningCard } from './use-running-card.ts';

/** Something in the crucible that can come out: metal of one lot, or of none. */
interface Choice {
  readonly key: string;
  readonly words: string;
  readonly kind: ChargeKind;
  readonly lot: ChargeLot | undefined;
  readonly inG: number;
}

/** What is in the crucible, by lot and then by kind where it is of none. */
export const choicesOf = ({ charge, lots = [] }: Pick<CardState, 'charge' | 'lots'>): readonly Choice[] => {
  const ofLots = lots.map(({ massG, ...lot }): Choice => {
    const kind = chargeKindOf(lot.kind);
    return { key: lot.id, words: `lot ${lot.code}`, kind, lot, inG: massG };
  });
  const loose = chargeKinds.flatMap((kind): readonly Choice[] => {
    const lotted = ofLots.reduce((sum, choice) => sum + (choice.kind === kind ? choice.inG : 0), 0);
    const inG = Math.round((charge[kind] - lotted) * 1000) / 1000;
    return inG > 0 ? [{ key: kind, words: chargeKindWords[kind], kind, lot: undefined, inG }] : [];
  });
  return [...ofLots, ...loose];
};

/** Props of {@link TakeOut}. */
export interface TakeOutProps {
  readonly running: RunningCard;
  /** The lot that is advised to come out, if any. */
  readonly advised?: string | undefined;
  readonly onDone: () => void;
}

/** Metal taken out of the crucible again: which, and how much. */
export const TakeOut = ({ running, advised, onDone }: TakeOutProps) => {
  const { state, write, record } = running;
  const choices = choicesOf(state);
  const [key, setKey] = useState(advised ?? choices.at(-1)?.key);
  const chosen = choices.find((choice) => choice.key === key) ?? choices.at(-1);
  if (!chosen) return null;
  const { words, kind, lot, inG } = chosen;
  return (
    <MassEntry
      running={running}
      sentence={`How much of ${words} comes out?`}
      label={`Mass of ${words} taken out`}
      actionWords={(mass) => `Take out ${mass}`}
      sub={`${write.mass(inG)} of it is in the crucible.`}
      onCancel={onDone}
      onMass={(massG) => {
        if (record({ type: 'charge-taken-out', kind, massG, lot })) onDone();
      }}
    >
      {choices.length > 1 ? (
        <div role="group" aria-label="What comes out" className="flex flex-wrap gap-3">
          {choices.map((choice) => (
            <Button
              key={choice.key}
              size="terminal"
              className="!min-h-18 !px-3 !text-[20px]"
              aria-pressed={choice.key === chosen.key}
              icon={choice.key === chosen.key ? 'tick' : undefined}
              onClick={() => setKey(choice.key)}
            >
              {choice.lot?.code ?? choice.words}
            </Button>
          ))}
        </div>
      ) : null}
    </MassEntry>
  );
};
