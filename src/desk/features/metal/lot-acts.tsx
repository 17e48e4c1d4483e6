import type { z } from 'zod';
import {
  amendLotRequest,
  countLotRequest,
  dispatchLotRequest,
  releaseLotRequest,
  type LotDetail,
} from '#shared/contracts/lot.ts';
import { wholeOfLot } from '#shared/domain/metal/judge-lot.ts';
import { useAmendLot, useCountLot, useDispatchLot, useReleaseLot } from '#src/api/lots.ts';
import { useStudio } from '#src/desk/parts/use-studio.ts';
import { CompositionFields } from '#src/desk/parts/composition-fields.tsx';
import { CountersignFields, MassField, ReasonField, WordsField } from './act-fields.tsx';
import { ActForm } from './act-form.tsx';
import {
  assayReading,
  emptyMass,
  massReading,
  wordsReading,
  type AssayValues,
  type MassValues,
} from './act-readings.ts';
import { writeExactGrams } from './metal-mass.ts';
import { partsOfAssay } from '#src/desk/parts/read-parts.ts';
import { useActKey } from './use-act-key.ts';

interface ActProps {
  readonly lot: LotDetail;
  readonly onClose: () => void;
}

const CountAct = ({ lot, onClose }: ActProps) => {
  const { units } = useStudio();
  const key = useActKey();
  const count = useCountLot(lot.id);
  return (
    <ActForm<MassValues, z.output<typeof countLotRequest>>
      title={`Count ${lot.code}`}
      words={`The ledger says ${writeExactGrams(lot.balanceG, units.mass)}. Weigh what lies there and type what the balance says.`}
      contract={countLotRequest}
      reading={massReading(key, units.mass, { mass: 'countedG', reason: 'explanation', sign: 'may' })}
      defaults={emptyMass}
      fields={['mass', 'reason', 'sign']}
      submitWords="Write the count down"
      send={count.mutateAsync}
      onClose={onClose}
    >
      <MassField name="mass" label="On the balance" expectedG={lot.balanceG} />
      <ReasonField
        name="reason"
        label="Why it differs"
        hint="Only where the balance and the ledger differ."
      />
      <CountersignFields hint="Where they differ a second person signs, an owner or a caster." />
    </ActForm>
  );
};

/** What a new assay reaches beyond the lot itself. */
const touchedWords = ({ melts }: LotDetail): string =>
  melts.length === 0
    ? ''
    : ` Its metal went into ${melts.map(({ code }) => code).join(', ')}: look at those again.`;

const AssayAct = ({ lot, onClose }: ActProps) => {
  const amend = useAmendLot(lot.id);
  return (
    <ActForm<AssayValues, z.output<typeof amendLotRequest>>
      title={`New assay of ${lot.code}`}
      words={`What the certificate said stays beside it; from now on the new assay counts.${touchedWords(lot)}`}
      contract={amendLotRequest}
      reading={assayReading}
      defaults={{ parts: partsOfAssay(lot), reason: '' }}
      fields={['parts', 'reason']}
      submitWords="Write the assay down"
      send={amend.mutateAsync}
      onClose={onClose}
    >
      <CompositionFields whole={wholeOfLot(lot.kind)} />
      <ReasonField name="reason" label="Whose assay it is" hint="The laboratory and its number." />
    </ActForm>
  );
};

const MoveAct = ({ lot, onClose }: ActProps) => {
  const amend = useAmendLot(lot.id);
  return (
    <ActForm<{ place: string; reason: string }, z.output<typeof amendLotRequest>>
      title={`Put ${lot.code} elsewhere`}
      words={lot.place ? `It lies here: ${lot.place}.` : 'Nobody has said yet where it lies.'}
      contract={amendLotRequest}
      reading={wordsReading({ kind: 'moved' })}
      defaults={{ place: '', reason: '' }}
      fields={['place', 'reason']}
      submitWords="It lies there now"
      send={amend.mutateAsync}
      onClose={onClose}
    >
      <WordsField name="place" label="New place" />
      <ReasonField name="reason" label="Why" hint="May stay empty." />
    </ActForm>
  );
};

const QuarantineAct = ({ lot, onClose }: ActProps) => {
  const amend = useAmendLot(lot.id);
  return (
    <ActForm<{ reason: string }, z.output<typeof amendLotRequest>>
      title={`Put ${lot.code} in quarantine`}
      words="Nobody can plan it or weigh it in until the owner lets it out."
      contract={amendLotRequest}
      reading={wordsReading({ kind: 'quarantined' })}
      defaults={{ reason: '' }}
      fields={['reason']}
      submitWords="Put it in quarantine"
      send={amend.mutateAsync}
      onClose={onClose}
    >
      <ReasonField name="reason" label="Why" hint="Those at the terminal read this." />
    </ActForm>
  );
};

const ReleaseAct = ({ lot, onClose }: ActProps) => {
  const release = useReleaseLot(lot.id);
  return (
    <ActForm<{ reason: string }, z.output<typeof releaseLotRequest>>
      title={`Let ${lot.code} out of quarantine`}
      words={`It was put there for this: ${lot.quarantineReason ?? ''}`}
      contract={releaseLotRequest}
      reading={wordsReading()}
      defaults={{ reason: '' }}
      fields={['reason']}
      submitWords="Let it out"
      send={release.mutateAsync}
      onClose={onClose}
    >
      <ReasonField name="reason" label="Why it may be used" />
    </ActForm>
  );
};

const DispatchAct = ({ lot, onClose }: ActProps) => {
  const { units } = useStudio();
  const key = useActKey();
  const dispatch = useDispatchLot(lot.id);
  return (
    <ActForm<MassValues, z.output<typeof dispatchLotRequest>>
      title={`Send metal of ${lot.code} to be refined`}
      words={`The ledger says ${writeExactGrams(lot.balanceG, units.mass)}. What is sent leaves the studio.`}
      contract={dispatchLotRequest}
      reading={massReading(key, units.mass, { mass: 'massG', reason: 'reason', sign: 'none' })}
      defaults={emptyMass}
      fields={['mass', 'reason']}
      submitWords="Send it"
      send={dispatch.mutateAsync}
      onClose={onClose}
    >
      <MassField name="mass" label="Mass sent" expectedG={lot.balanceG} />
      <ReasonField name="reason" label="Where it goes" />
    </ActForm>
  );
};

/** Each act on a lot by its name. */
export const lotActs = {
  count: CountAct,
  assay: AssayAct,
  move: MoveAct,
  quarantine: QuarantineAct,
  release: ReleaseAct,
  dispatch: DispatchAct,
} as const;
