import { Link } from 'react-router-dom';
import type { ChargeLine, ChargeOutcome, ChargeProposal, SavedChargePlan } from '#shared/contracts/charge.ts';
import { formatFineness, lotKindNames } from '#shared/domain/metal/lot.ts';
import { Crucible } from '#src/ui/crucible.tsx';
import { DefinitionList } from '#src/ui/definition-list.tsx';
import { finenessRange } from '#src/ui/fineness-range.ts';
import { FinenessScale } from '#src/ui/fineness-scale.tsx';
import { Notice } from '#src/ui/notice.tsx';
import { useStudio } from '#src/desk/parts/use-studio.ts';
import { MarkWords } from '#src/desk/parts/mark-words.tsx';
import { PlainTable } from '#src/desk/parts/plain-table.tsx';
import { writeWeighable } from './metal-mass.ts';
import { gapWords, shareWords, wouldDoSentence } from './charge-words.ts';

type Planned = Extract<ChargeOutcome, { readonly kind: 'planned' }>;
type Short = Extract<ChargeOutcome, { readonly kind: 'short' }>;

/** The lots of a charge with what to weigh of each. */
export const ChargeLines = ({
  caption,
  lines,
}: {
  readonly caption: string;
  readonly lines: readonly ChargeLine[];
}) => {
  const { units } = useStudio();
  return (
    <PlainTable
      caption={caption}
      align="left"
      heads={['Lot', 'Kind', 'Mass']}
      figures={[2]}
      rows={lines.map(({ lotId, code, name, kind, massG }) => ({
        key: lotId,
        cells: [
          <Link
            to={`/metal/lots/${lotId}`}
            className="font-extrabold underline decoration-2 underline-offset-4"
          >
            {code} {name}
          </Link>,
          lotKindNames[kind],
          <span className="font-extrabold whitespace-nowrap">{writeWeighable(massG, units.mass)}</span>,
        ],
      }))}
    />
  );
};

/** A charge that holds every limit: what to weigh, what it comes to, and how good it is. */
export const PlannedCharge = ({
  proposal,
  outcome,
}: {
  readonly proposal: ChargeProposal;
  readonly outcome: Planned;
}) => {
  const { mass } = useStudio();
  const { markPpt, wantedG } = proposal;
  const { lines, totalG, expectedPpt, worstPpt, returnsShare, gap } = outcome;
  return (
    <div className="grid gap-x-14 gap-y-8 lg:grid-cols-[minmax(0,1fr)_minmax(0,420px)]">
      <div className="grid content-start gap-6">
        <ChargeLines caption="Lots of the charge" lines={lines} />
        <DefinitionList
          items={[
            { term: 'Charge in all', value: mass(totalG), note: `${mass(wantedG)} wanted` },
            { term: 'Fineness expected', value: formatFineness(expectedPpt), note: `mark ${markPpt}` },
            {
              term: 'Fineness at the worst',
              value: formatFineness(worstPpt),
              note: 'at lower bounds',
            },
            { term: 'Share of returns', value: shareWords(returnsShare) },
            { term: 'This plan is', value: gapWords(gap) },
          ]}
        />
      </div>
      <div className="grid content-start gap-6">
        <Crucible
          lots={lines.map(({ lotId, code, kind, massG }) => ({
            key: lotId,
            label: code,
            kind: kind === 'returns' ? 'returns' : 'other',
            inG: 0,
            plannedG: massG,
          }))}
          wantedG={wantedG}
          format={mass}
        />
        <FinenessScale
          mark={markPpt}
          worst={worstPpt}
          range={finenessRange(markPpt, worstPpt)}
          format={formatFineness}
        />
        <MarkWords metal={proposal.markedMetal} worstPpt={worstPpt} markPpt={markPpt} />
      </div>
    </div>
  );
};

/** What stands in the way of a charge, and what would do. */
export const ShortCharge = ({ outcome }: { readonly outcome: Short }) => {
  const { units } = useStudio();
  const remedy = wouldDoSentence(outcome, (grams) => writeWeighable(grams, units.mass));
  return (
    <Notice kind="caution" title="The metal on hand makes no charge that holds every limit.">
      <ul className="grid gap-1">
        {outcome.obstacles.map((obstacle) => (
          <li key={obstacle}>{obstacle}</li>
        ))}
      </ul>
      {remedy ? <p className="pt-3 text-lg font-black text-ink">{remedy}</p> : null}
    </Notice>
  );
};

/** The plan that is kept for a casting. */
export const KeptPlan = ({ plan }: { readonly plan: SavedChargePlan }) => {
  const { clock } = useStudio();
  return (
    <div className="grid max-w-3xl gap-3">
      <ChargeLines caption="Lots of the kept plan" lines={plan.lines} />
      <p className="text-soft">
        {plan.person}, {clock.dayAndTime(plan.at)}. Fineness expected {formatFineness(plan.expectedPpt)}, at
        the worst {formatFineness(plan.worstPpt)}; share of returns {shareWords(plan.returnsShare)}.
      </p>
    </div>
  );
};
