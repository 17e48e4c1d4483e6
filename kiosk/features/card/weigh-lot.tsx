import type { Lot } from '#shared/contracts/lot.ts';
import { lotKindNames } from '#shared/domain/metal/lot.ts';
import { chargeKindOf } from '#shared/domain/pour-card/card-event.ts';
import { chargedG } from '#shared/domain/pour-card/card-state.ts';
import { correctedFromG } from '#shared/domain/pour-card/charge-lines.ts';
import { judgeWeighing } from '#shared/domain/pour-card/judge-weighing.ts';
import { parseLotCode } from '#shared/lib/codes.ts';
import { LotGauge } from './lot-gauge.tsx';
import { MassEntry } from './mass-entry.tsx';
import type { LotCharge } from './use-lot-charge.ts';
import type { RunningCard } from './use-running-card.ts';

/** Props of {@link WeighLot}. */
export interface WeighLotProps {
  readonly running: RunningCard;
  readonly charge: LotCharge;
  readonly lot: Lot;
  /** Takes the code of another lot that is scanned meanwhile. */
  readonly onCode: (code: string) => void;
  readonly onDone: () => void;
}

/** One lot's metal on the pan: how much of it goes into the crucible. */
export const WeighLot = ({ running, charge, lot, onCode, onDone }: WeighLotProps) => {
  const { card, state, write, record } = running;
  const { plannedMetalG, limits } = card.context;
  const { id, code, kind, compositionWt, toleranceWt, balanceG } = lot;
  const line = charge.lines.find(({ lotId }) => lotId === id);
  const addG = charge.advice?.add?.lotId === id ? charge.advice.add.massG : null;
  const toGoG = addG ?? (charge.hasPlan ? (line?.toGoG ?? 0) : null);
  const roomG = Math.max(0, plannedMetalG * (1 + limits.chargeTolerance) - chargedG(state));
  const before = line ? correctedFromG(line) : null;
  const instead = before === null ? '' : ` instead of ${write.mass(before)}`;
  const wanted =
    toGoG === null
      ? `${write.mass(Math.max(0, plannedMetalG - chargedG(state)))} of the charge is to go.`
      : `${write.mass(toGoG)} of it is to go${instead}.`;
  return (
    <MassEntry
      running={running}
      sentence={`Weigh ${lotKindNames[kind]}, lot ${code}.`}
      label={`Mass of lot ${code}`}
      actionWords={(mass) => `Put in ${mass}`}
      sub={`${wanted} ${lot.name}.`}
      judge={(massG) =>
        judgeWeighing({
          massG,
          code,
          toGoG,
          roomG,
          onHandG: balanceG,
          tolerance: limits.chargeTolerance,
          unit: write.units.mass,
        })
      }
      picture={<LotGauge running={running} charge={charge} onChoose={onCode} />}
      onLabel={(scanned) => {
        const isLabel = parseLotCode(scanned).ok && /[a-z]/i.test(scanned);
        if (isLabel) onCode(scanned);
        return isLabel;
      }}
      onCancel={onDone}
      onMass={(massG) => {
        const snapshot = { id, code, kind, compositionWt, toleranceWt };
        if (record({ type: 'charge-weighed', kind: chargeKindOf(kind), massG, lot: snapshot })) onDone();
      }}
    />
  );
};
