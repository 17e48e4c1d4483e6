import { useState } from 'react';
import type { CrucibleLot } from '#src/ui/crucible.tsx';
import type { ChargeKind } from '#shared/domain/pour-card/card-event.ts';
import { markedMetal } from '#shared/domain/alloy/alloy-family.ts';
import { judgeCharge } from '#shared/domain/pour-card/judge-charge.ts';
import { formatPercent } from '#shared/lib/units.ts';
import { Button } from '#src/ui/button.tsx';
import { Crucible } from '#src/ui/crucible.tsx';
import { HoldButton } from '#src/ui/hold-button.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';
import { splitFigure } from '#kiosk/lib/unit-writer.ts';
import { CardFrame } from './card-frame.tsx';
import { chargeWords } from './charge-words.ts';
import { TakeOut } from './take-out.tsx';
import { WeighIn } from './weigh-in.tsx';
import type { RunningCard } from './use-running-card.ts';

const lotsOf = ({ card, state }: RunningCard): readonly CrucibleLot[] => {
  const { grain, returns } = state.charge;
  const metal = markedMetal(card.casting.alloy.family) === 'Ag' ? 'silver' : 'gold';
  return [
    { key: 'returns', label: 'returns', kind: 'returns', inG: returns, plannedG: returns },
    {
      key: 'grain',
      label: 'casting grain',
      kind: metal,
      inG: grain,
      plannedG: Math.max(grain, card.context.plannedMetalG - returns),
    },
  ];
};

type Mode = { readonly kind: ChargeKind; readonly way: 'in' } | { readonly way: 'out' } | null;

/** Props of {@link ChargeLoose}. */
export interface ChargeLooseProps {
  readonly running: RunningCard;
  /** Goes back to the studio's lots; null where there are none, or once metal is in. */
  readonly onByLot: (() => void) | null;
}

/** Metal of no lot into the crucible, grain and returns, until the charge is what the card plans. */
export const ChargeLoose = ({ running, onByLot }: ChargeLooseProps) => {
  const { card, state, write, record } = running;
  const [mode, setMode] = useState<Mode>(null);
  if (mode?.way === 'in') return <WeighIn running={running} kind={mode.kind} onDone={() => setMode(null)} />;
  if (mode?.way === 'out') return <TakeOut running={running} onDone={() => setMode(null)} />;
  const words = chargeWords(state, card.context, write);
  const { totalG, lowG, highG, returnsShare } = judgeCharge(state, card.context);
  const { figure, unit } = splitFigure(words.mass);
  return (
    <CardFrame
      running={running}
      sentence={card.instruction.sentences.charge}
      number={figure}
      unit={unit}
      state={<StateMark state={words.state} text={words.stateWords} size="terminal" />}
      sub={`${write.mass(totalG)} is in; ${write.mass(lowG)} to ${write.mass(highG)} wanted. Returns ${formatPercent(returnsShare)} of at most ${formatPercent(card.context.limits.returnsShare)}.`}
      gauge={
        <Crucible
          lots={lotsOf(running)}
          wantedG={card.context.plannedMetalG}
          format={write.mass}
          className="size-full"
        />
      }
      actions={
        <>
          <Button size="terminal" icon="scale" onClick={() => setMode({ way: 'in', kind: 'returns' })}>
            Returns in
          </Button>
          <Button
            size="terminal"
            icon="scale"
            kind={words.state === 'wait' ? 'main' : 'plain'}
            onClick={() => setMode({ way: 'in', kind: 'grain' })}
          >
            Grain in
          </Button>
          {words.blocked === null ? (
            <HoldButton className="grow-2" onHeld={() => record({ type: 'charge-closed' })}>
              Complete. Hold
            </HoldButton>
          ) : (
            <Button kind="blocked" size="terminal" className="grow-2">
              {words.blocked}
            </Button>
          )}
        </>
      }
    >
      {totalG > 0 ? (
        <Button
          size="terminal"
          className="!min-h-18"
          kind={words.state === 'caution' ? 'main' : 'plain'}
          onClick={() => setMode({ way: 'out' })}
        >
          Take some out
        </Button>
      ) : onByLot ? (
        <Button size="terminal" icon="scan" className="!min-h-18" onClick={onByLot}>
          By lot instead
        </Button>
      ) : null}
    </CardFrame>
  );
};
