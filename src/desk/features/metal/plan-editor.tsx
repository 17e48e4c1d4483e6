import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import type { ChargeLine, ChargeProposal } from '#shared/contracts/charge.ts';
import { formatFineness, lotKindNames } from '#shared/domain/metal/lot.ts';
import { toMilligrams } from '#shared/domain/metal/ledger.ts';
import { lotsQuery } from '#src/api/lots.ts';
import { Button } from '#src/ui/button.tsx';
import { controlClass } from '#src/ui/control-class.ts';
import { DefinitionList } from '#src/ui/definition-list.tsx';
import { SelectField } from '#src/ui/select-field.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';
import { MarkWords } from '#src/desk/parts/mark-words.tsx';
import { PlainTable } from '#src/desk/parts/plain-table.tsx';
import { useStudio } from '#src/desk/parts/use-studio.ts';
import { shareWords } from './charge-words.ts';
import { judgeHandPlan, lotsToPlan, type HandLine, type HandPlan } from './hand-plan.ts';
import { writeExactMass } from './metal-mass.ts';

/** Lines of a plan to be kept, g. */
export type PlanLines = readonly Pick<ChargeLine, 'lotId' | 'massG'>[];

const Verdict = ({ proposal, judged }: { readonly proposal: ChargeProposal; readonly judged: HandPlan }) => {
  const { mass } = useStudio();
  const { plan, faults } = judged;
  return (
    <div className="grid content-start gap-4">
      {plan ? (
        <>
          <DefinitionList
            items={[
              {
                term: 'Charge in all',
                value: mass(plan.totalMg / 1000),
                note: `${mass(proposal.wantedG)} wanted`,
              },
              {
                term: 'Fineness expected',
                value: formatFineness(plan.expectedPpt),
                note: `mark ${proposal.markPpt}`,
              },
              { term: 'Fineness at the worst', value: formatFineness(plan.worstPpt) },
              {
                term: 'Share of returns',
                value: shareWords(plan.returnsShare),
                note: `at most ${shareWords(proposal.returnsLimit)}`,
              },
            ]}
          />
          <MarkWords metal={proposal.markedMetal} worstPpt={plan.worstPpt} markPpt={proposal.markPpt} />
        </>
      ) : null}
      <div aria-live="polite" className="grid gap-1.5">
        {faults.length === 0 ? <StateMark state="ready" text="It holds every limit." size="row" /> : null}
        {faults.map((fault) => (
          <StateMark key={fault} state="stop" text={fault} size="row" />
        ))}
      </div>
    </div>
  );
};

/** Changes a plan by hand: masses, lots put in and taken out; every limit is judged at once, and what breaks one is not kept. */
export const PlanEditor = (props: {
  readonly proposal: ChargeProposal;
  readonly lines: readonly ChargeLine[];
  readonly isBusy: boolean;
  readonly onKeep: (lines: PlanLines) => void;
  readonly onBack: () => void;
}) => {
  const { proposal, isBusy, onKeep, onBack } = props;
  const { units, mass } = useStudio();
  const { data = [] } = useQuery(lotsQuery('yes'));
  const lots = lotsToPlan(data);
  const [lines, setLines] = useState<readonly HandLine[]>(() =>
    props.lines.map(({ lotId, massG }) => ({ lotId, mass: writeExactMass(toMilligrams(massG), units.mass) })),
  );
  const judged = judgeHandPlan(lines, lots, proposal, units.mass);
  const others = lots.filter(({ id }) => !lines.some(({ lotId }) => lotId === id));
  const set = (lotId: string, typed: string): void =>
    setLines(lines.map((line) => (line.lotId === lotId ? { lotId, mass: typed } : line)));
  const isBlocked = judged.plan === null || judged.faults.length > 0;
  return (
    <div className="grid gap-x-14 gap-y-8 lg:grid-cols-[minmax(0,1fr)_minmax(0,420px)]">
      <div className="grid content-start gap-5">
        <PlainTable
          caption="Lots of the plan, changed by hand"
          align="left"
          heads={['Lot', 'Kind', 'On hand', `Mass, ${units.mass}`, 'Leave out']}
          figures={[2]}
          rows={lines.flatMap(({ lotId, mass: typed }) => {
            const lot = lots.find(({ id }) => id === lotId);
            if (!lot) return [];
            return [
              {
                key: lotId,
                cells: [
                  `${lot.code} ${lot.name}`,
                  lotKindNames[lot.kind],
                  mass(lot.balanceG),
                  <input
                    aria-label={`Mass of ${lot.code}, ${units.mass}`}
                    inputMode="decimal"
                    autoComplete="off"
                    value={typed}
                    onChange={({ target }) => set(lotId, target.value)}
                    className={`${controlClass} !min-h-10 !w-32 text-right`}
                  />,
                  <Button
                    kind="quiet"
                    icon="cross"
                    className="!min-h-10"
                    aria-label={`Leave ${lot.code} out`}
                    onClick={() => setLines(lines.filter((line) => line.lotId !== lotId))}
                  />,
                ],
              },
            ];
          })}
        />
        <div className="max-w-xl">
          <SelectField
            label="Put another lot in"
            placeholder="Choose a lot"
            value=""
            options={others.map(({ id, code, name, balanceG }) => ({
              value: id,
              label: `${code} ${name}, ${mass(balanceG)}`,
            }))}
            onChange={({ target }) => {
              if (target.value !== '') setLines([...lines, { lotId: target.value, mass: '' }]);
            }}
          />
        </div>
      </div>
      <Verdict proposal={proposal} judged={judged} />
      <p className="flex flex-wrap gap-4 lg:col-span-2">
        <Button
          kind={isBlocked ? 'blocked' : 'main'}
          disabled={isBlocked}
          busy={isBusy}
          onClick={() =>
            onKeep(
              (judged.plan?.lines ?? []).map(({ lot, massMg }) => ({ lotId: lot.id, massG: massMg / 1000 })),
            )
          }
        >
          {isBlocked ? 'It breaks a limit' : 'Keep the changed plan'}
        </Button>
        <Button onClick={onBack}>Back to the computed plan</Button>
      </p>
    </div>
  );
};
