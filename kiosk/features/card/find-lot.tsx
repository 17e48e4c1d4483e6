import { Button } from '#src/ui/button.tsx';
import { Spinner } from '#src/ui/spinner.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';
import { ScanPanel } from '#kiosk/lib/scan-panel.tsx';
import { useScanner } from '#kiosk/lib/use-scanner.ts';
import { CardFrame } from './card-frame.tsx';
import type { LotCharge } from './use-lot-charge.ts';
import type { LotChoice } from './use-lot-choice.ts';
import type { RunningCard } from './use-running-card.ts';

/** Props of {@link FindLot}. */
export interface FindLotProps {
  readonly running: RunningCard;
  readonly charge: LotCharge;
  readonly choice: Exclude<LotChoice, { readonly kind: 'chosen' | 'none' }>;
  readonly onCode: (code: string) => void;
  readonly onBack: () => void;
  /** Goes on without lots, where that is possible. */
  readonly onLoose: (() => void) | null;
}

const longestShown = 40;

const Said = ({ choice }: Pick<FindLotProps, 'choice'>) => {
  if (choice.kind === 'asking') return <Spinner label={`Looking ${choice.code} up`} />;
  return (
    <span role="alert">
      {choice.kind === 'refused' ? <StateMark state="caution" text="Not taken" size="terminal" /> : null}
    </span>
  );
};

/** A lot shown to the camera, scanned, or its number typed; one that may not go in is refused here. */
export const FindLot = ({ running, charge, choice, onCode, onBack, onLoose }: FindLotProps) => {
  useScanner((code) => {
    onCode(code);
    return true;
  });
  const wanted = charge.next
    ? `Show me the label of lot ${charge.next.code}.`
    : 'Show me the label of a lot.';
  return (
    <CardFrame
      running={running}
      sentence={choice.kind === 'refused' ? choice.sentence : wanted}
      state={<Said choice={choice} />}
      sub={
        choice.kind === 'refused' ? (
          <p className="break-words">
            Read: <span className="font-extrabold text-ink">{choice.code.slice(0, longestShown)}</span>
          </p>
        ) : undefined
      }
      gauge={
        <div className="grid h-full">
          <ScanPanel of="lot" onCode={onCode} />
        </div>
      }
      actions={
        <>
          <Button size="terminal" icon="back" onClick={onBack}>
            Back
          </Button>
          {onLoose ? (
            <Button size="terminal" onClick={onLoose}>
              The metal has no lot
            </Button>
          ) : null}
        </>
      }
    />
  );
};
