import { markedMetal } from '#shared/domain/alloy/alloy-family.ts';
import { formatFineness } from '#shared/domain/metal/lot.ts';
import type { ChargeLineState } from '#shared/domain/pour-card/charge-lines.ts';
import { judgeMetal } from '#shared/domain/pour-card/judge-metal.ts';
import { Crucible, type CrucibleLot } from '#src/ui/crucible.tsx';
import { finenessRange } from '#src/ui/fineness-range.ts';
import { FinenessScale } from '#src/ui/fineness-scale.tsx';
import { LotList } from './lot-list.tsx';
import type { LotCharge } from './use-lot-charge.ts';
import type { RunningCard } from './use-running-card.ts';

/** Props of {@link LotGauge}. */
export interface LotGaugeProps {
  readonly running: RunningCard;
  readonly charge: LotCharge;
  readonly onChoose: (code: string) => void;
}

const layerOf =
  (metal: 'gold' | 'silver') =>
  ({ lotId, code, kind, inG, toGoG }: ChargeLineState): CrucibleLot => ({
    key: lotId,
    label: code,
    kind: kind === 'returns' ? 'returns' : kind === 'master' ? 'other' : metal,
    inG,
    plannedG: inG + toGoG,
  });

const Fineness = ({ running: { card, state } }: Pick<LotGaugeProps, 'running'>) => {
  const mark = card.context.alloy?.markPpt;
  if (mark === undefined) return null;
  const metal = judgeMetal(state, card.context);
  const known = metal ? [metal.worstPpt, metal.expectedPpt] : [];
  return (
    <FinenessScale
      mark={mark}
      worst={metal?.worstPpt ?? null}
      expected={metal?.expectedPpt ?? null}
      range={finenessRange(mark, ...known)}
      format={formatFineness}
    />
  );
};

/** The crucible as it fills by lot, its lots beside it, and the fineness against the mark. */
export const LotGauge = ({ running, charge, onChoose }: LotGaugeProps) => {
  const { card, write } = running;
  const metal = markedMetal(card.casting.alloy.family) === 'Ag' ? 'silver' : 'gold';
  return (
    <div className="grid h-full grid-rows-[minmax(0,1fr)_auto] gap-3">
      <div className="grid min-h-0 grid-cols-[176px_minmax(0,1fr)] gap-4">
        <Crucible
          lots={charge.lines.map(layerOf(metal))}
          wantedG={card.context.plannedMetalG}
          format={write.mass}
          labelled={false}
          className="w-full"
        />
        <LotList lines={charge.lines} write={write} onChoose={onChoose} />
      </div>
      <Fineness running={running} />
    </div>
  );
};
