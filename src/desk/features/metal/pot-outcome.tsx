import type { ChangePotRequest, ChargeOutcome } from '#shared/contracts/charge.ts';
import { markedMetal, type AlloyFamily } from '#shared/domain/alloy/alloy-family.ts';
import { formatFineness } from '#shared/domain/metal/lot.ts';
import { Crucible } from '#src/ui/crucible.tsx';
import { DefinitionList } from '#src/ui/definition-list.tsx';
import { finenessRange } from '#src/ui/fineness-range.ts';
import { FinenessScale } from '#src/ui/fineness-scale.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';
import { MarkWords } from '#src/desk/parts/mark-words.tsx';
import { Panel } from '#src/desk/parts/panel.tsx';
import { writeComposition } from '#src/desk/parts/element-names.ts';
import { useStudio } from '#src/desk/parts/use-studio.ts';
import { ChargeLines, ShortCharge } from './charge-view.tsx';
import { writeWeighable } from './metal-mass.ts';

type Planned = Extract<ChargeOutcome, { readonly kind: 'planned' }>;

/** What a pot is to become. */
export interface PotTarget {
  readonly name: string;
  readonly family: AlloyFamily;
  readonly fineness: number;
}

interface PotOutcomeProps {
  readonly pot: ChangePotRequest;
  readonly target: PotTarget;
}

const Additions = ({ pot, target, outcome }: PotOutcomeProps & { readonly outcome: Planned }) => {
  const { units } = useStudio();
  const { lines, totalG, partsWt, expectedPpt, worstPpt } = outcome;
  const mass = (grams: number): string => writeWeighable(grams, units.mass);
  return (
    <div className="grid gap-8">
      <div className="grid content-start gap-6">
        {lines.length === 0 ? (
          <StateMark state="ready" text={`It is ${target.name} as it is: nothing is to be added.`} />
        ) : (
          <ChargeLines caption="What to add" lines={lines} />
        )}
        <DefinitionList
          items={[
            { term: 'In the pot now', value: mass(pot.massG) },
            { term: 'Added', value: mass(totalG - pot.massG) },
            { term: 'In the pot then', value: mass(totalG) },
            {
              term: 'Fineness expected',
              value: formatFineness(expectedPpt),
              note: `mark ${target.fineness}`,
            },
            {
              term: 'Fineness at the worst',
              value: formatFineness(worstPpt),
              note: 'at lower bounds',
            },
            { term: 'Composition then, wt%', value: writeComposition(partsWt) },
          ]}
        />
        <p className="text-soft">
          Nothing is kept or moved by this: weigh the lots in at the terminal, or count them afterwards.
        </p>
      </div>
      <div className="grid items-end gap-6 sm:grid-cols-2">
        <Crucible
          lots={[
            { key: 'pot', label: 'the pot', kind: 'other', inG: pot.massG, plannedG: pot.massG },
            ...lines.map(({ lotId, code, kind, massG }) => ({
              key: lotId,
              label: code,
              kind: kind === 'returns' ? ('returns' as const) : ('other' as const),
              inG: 0,
              plannedG: massG,
            })),
          ]}
          wantedG={totalG}
          format={mass}
        />
        <div className="grid gap-4">
          <FinenessScale
            mark={target.fineness}
            worst={worstPpt}
            range={finenessRange(target.fineness, worstPpt)}
            format={formatFineness}
          />
          <MarkWords metal={markedMetal(target.family)} worstPpt={worstPpt} markPpt={target.fineness} />
        </div>
      </div>
    </div>
  );
};

/** What to add to a pot, or what stands in the way and what would do. */
export const PotOutcome = ({ outcome, ...props }: PotOutcomeProps & { readonly outcome: ChargeOutcome }) => (
  <Panel title={`To make it ${props.target.name} ${props.target.fineness}`}>
    {outcome.kind === 'short' ? (
      <ShortCharge outcome={outcome} />
    ) : (
      <Additions {...props} outcome={outcome} />
    )}
  </Panel>
);
