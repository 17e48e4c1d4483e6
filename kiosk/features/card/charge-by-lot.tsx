import { useState } from 'react';
import { chargedG } from '#shared/domain/pour-card/card-state.ts';
import { Button } from '#src/ui/button.tsx';
import { HoldButton } from '#src/ui/hold-button.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';
import { splitFigure } from '#kiosk/lib/unit-writer.ts';
import { useScanner } from '#kiosk/lib/use-scanner.ts';
import { CardFrame } from './card-frame.tsx';
import { FindLot } from './find-lot.tsx';
import { lotChargeWords } from './lot-charge-words.ts';
import { LotGauge } from './lot-gauge.tsx';
import { TakeOut } from './take-out.tsx';
import { useLotCharge, type LotCharge } from './use-lot-charge.ts';
import { useLotChoice } from './use-lot-choice.ts';
import { WeighLot } from './weigh-lot.tsx';
import type { RunningCard } from './use-running-card.ts';

interface OverviewProps {
  readonly running: RunningCard;
  readonly charge: LotCharge;
  readonly onCode: (code: string) => void;
  readonly onScan: () => void;
  readonly onTakeOut: () => void;
}

/** Where the charge stands: the next lot, what is to go of it, and what is in already. */
const Overview = ({ running, charge, onCode, onScan, onTakeOut }: OverviewProps) => {
  const { card, state, write, record } = running;
  useScanner((code) => {
    onCode(code);
    return true;
  });
  const words = lotChargeWords(charge, state, card.context, write);
  const { figure, unit } = splitFigure(words.mass);
  const isOutAdvised = charge.advice !== null && words.state === 'caution';
  return (
    <CardFrame
      running={running}
      sentence={words.sentence}
      number={figure}
      unit={unit}
      state={<StateMark state={words.state} text={words.stateWords} size="terminal" />}
      sub={words.sub}
      gauge={<LotGauge running={running} charge={charge} onChoose={onCode} />}
      actions={
        <>
          {chargedG(state) > 0 ? (
            <Button size="terminal" kind={isOutAdvised ? 'main' : 'plain'} onClick={onTakeOut}>
              Take some out
            </Button>
          ) : null}
          <Button
            size="terminal"
            icon="scan"
            kind={words.state === 'wait' ? 'main' : 'plain'}
            onClick={onScan}
          >
            Scan a lot
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
    />
  );
};

/** Props of {@link ChargeByLot}. */
export interface ChargeByLotProps {
  readonly running: RunningCard;
  /** Goes on without lots; null once metal is in or a plan names its lots. */
  readonly onLoose: (() => void) | null;
}

/** Metal into the crucible lot by lot, by the plan where there is one. */
export const ChargeByLot = ({ running, onLoose }: ChargeByLotProps) => {
  const charge = useLotCharge(running);
  const { choice, choose, chooseScanned, scan, clear } = useLotChoice(charge);
  const [isTakingOut, setIsTakingOut] = useState(false);
  if (isTakingOut) {
    const advised = charge.advice?.out?.lotId;
    return <TakeOut running={running} advised={advised} onDone={() => setIsTakingOut(false)} />;
  }
  if (choice.kind === 'chosen') {
    const { lot } = choice;
    return (
      <WeighLot key={lot.id} running={running} charge={charge} lot={lot} onCode={choose} onDone={clear} />
    );
  }
  // A lot that was touched is not looked for by the camera meanwhile: it might see another.
  if (choice.kind !== 'none' && (choice.kind !== 'asking' || choice.isScanning)) {
    return (
      <FindLot
        running={running}
        charge={charge}
        choice={choice}
        onCode={chooseScanned}
        onBack={clear}
        onLoose={onLoose}
      />
    );
  }
  return (
    <Overview
      running={running}
      charge={charge}
      onCode={choose}
      onScan={scan}
      onTakeOut={() => setIsTakingOut(true)}
    />
  );
};
