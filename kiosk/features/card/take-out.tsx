import { useState } from 'react';
import { chargeKinds, type ChargeKind } from '#shared/domain/pour-card/card-event.ts';
import { Button } from '#src/ui/button.tsx';
import { MassEntry } from './mass-entry.tsx';
import { chargeKindWords } from './weigh-in.tsx';
import type { RunningCard } from './use-running-card.ts';

/** Metal taken out of the crucible again: which, and how much. */
export const TakeOut = ({
  running,
  onDone,
}: {
  readonly running: RunningCard;
  readonly onDone: () => void;
}) => {
  const { state, write, record } = running;
  const present = chargeKinds.filter((kind) => state.charge[kind] > 0);
  const [kind, setKind] = useState<ChargeKind>(present[0] ?? 'grain');
  return (
    <MassEntry
      running={running}
      sentence={`How much ${chargeKindWords[kind]} comes out?`}
      label={`Mass of ${chargeKindWords[kind]} taken out`}
      actionWords={(mass) => `Take out ${mass}`}
      sub={`${write.mass(state.charge[kind])} of it is in the crucible.`}
      onCancel={onDone}
      onMass={(massG) => {
        if (record({ type: 'charge-taken-out', kind, massG })) onDone();
      }}
    >
      {present.length > 1 ? (
        <div role="group" aria-label="What comes out" className="flex gap-4">
          {present.map((choice) => (
            <Button
              key={choice}
              size="terminal"
              aria-pressed={choice === kind}
              icon={choice === kind ? 'tick' : undefined}
              onClick={() => setKind(choice)}
            >
              {chargeKindWords[choice]}
            </Button>
          ))}
        </div>
      ) : null}
    </MassEntry>
  );
};
