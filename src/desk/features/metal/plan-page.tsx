import { zodResolver } from '@hookform/resolvers/zod';
import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { useSearchParams } from 'react-router-dom';
import type { z } from 'zod';
import type { Casting } from '#shared/contracts/casting.ts';
import { planChargeRequest, type ChargeProposal } from '#shared/contracts/charge.ts';
import { castingsQuery } from '#src/api/castings.ts';
import { chargePlanQuery, useProposeCharge, useSaveChargePlan } from '#src/api/charges.ts';
import { sentenceOf } from '#src/lib/http.ts';
import { Button } from '#src/ui/button.tsx';
import { Notice } from '#src/ui/notice.tsx';
import { PageTitle } from '#src/ui/page-title.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import { applyProblem } from '#src/desk/parts/apply-problem.ts';
import { FormProblem } from '#src/desk/parts/form-problem.tsx';
import { Loaded } from '#src/desk/parts/loaded.tsx';
import { Panel } from '#src/desk/parts/panel.tsx';
import { CastingChoice } from './casting-choice.tsx';
import { KeptPlan, PlannedCharge, ShortCharge } from './charge-view.tsx';
import { castingsToPlan } from './charge-words.ts';
import { atFormPlaces, formSchema } from '#src/desk/parts/form-schema.ts';
import { PlanEditor, type PlanLines } from './plan-editor.tsx';
import { planReading, type PlanValues } from './plan-values.ts';

type Request = z.output<typeof planChargeRequest>;

const Kept = ({ castingId }: { readonly castingId: string }) => {
  const query = useQuery(chargePlanQuery(castingId));
  return query.data ? (
    <Panel title="Kept for this casting">
      <KeptPlan plan={query.data} />
    </Panel>
  ) : null;
};

const Proposal = ({
  proposal,
  lossShare,
}: {
  readonly proposal: ChargeProposal;
  readonly lossShare: number;
}) => {
  const save = useSaveChargePlan();
  const [isByHand, setByHand] = useState(false);
  const { outcome, castingIds, alloyName, revision } = proposal;
  if (outcome.kind === 'short') return <ShortCharge outcome={outcome} />;
  const keep = (lines: PlanLines): void =>
    save.mutate({
      castingIds: [...castingIds],
      lossShare,
      lines: lines.map(({ lotId, massG }) => ({ lotId, massG })),
    });
  if (save.isSuccess)
    return (
      <Notice kind="info" title="The plan is kept.">
        The card at the terminal asks for these lots; what is really weighed in corrects what remains.
      </Notice>
    );
  return (
    <Panel title={`${alloyName}, revision ${revision}`}>
      {save.error ? <Notice kind="error" title={sentenceOf(save.error)} /> : null}
      {isByHand ? (
        <PlanEditor
          proposal={proposal}
          lines={outcome.lines}
          isBusy={save.isPending}
          onKeep={keep}
          onBack={() => setByHand(false)}
        />
      ) : (
        <>
          <PlannedCharge proposal={proposal} outcome={outcome} />
          <p className="flex flex-wrap gap-4">
            <Button kind="main" busy={save.isPending} onClick={() => keep(outcome.lines)}>
              Keep this plan
            </Button>
            <Button onClick={() => setByHand(true)}>Change it by hand</Button>
          </p>
        </>
      )}
    </Panel>
  );
};

const Planner = ({ castings }: { readonly castings: readonly Casting[] }) => {
  const [search, setSearch] = useSearchParams();
  const waiting = castingsToPlan(castings);
  // The address follows the choice a moment later; a box must answer at once.
  const [wanted, setWanted] = useState<readonly string[]>(() => search.getAll('casting'));
  const chosen = wanted.filter((id) => waiting.some((casting) => casting.id === id));
  const propose = useProposeCharge();
  const { register, handleSubmit, setError, formState } = useForm<PlanValues, unknown, Request>({
    resolver: zodResolver(formSchema(planChargeRequest, planReading(chosen))),
    defaultValues: { loss: '0' },
  });
  const submit = handleSubmit(async (request) => {
    try {
      await propose.mutateAsync(request);
    } catch (error) {
      applyProblem<PlanValues>(atFormPlaces(error, planReading(chosen).placeOfPath), ['loss'], setError);
    }
  });
  const choose = (ids: readonly string[]): void => {
    propose.reset();
    setWanted(ids);
    setSearch(new URLSearchParams(ids.map((id) => ['casting', id])), { replace: true });
  };
  const [proposal] = propose.data ?? [];
  const [first] = chosen;
  return (
    <div className="grid gap-11">
      <form noValidate onSubmit={(event) => void submit(event)} className="grid max-w-3xl gap-7">
        <CastingChoice castings={waiting} chosen={chosen} onChoose={choose} />
        {waiting.length > 0 ? (
          <>
            <div className="max-w-xs">
              <TextField
                label="Loss expected in melting"
                hint="As a share of the charge; it is charged on top."
                unit="%"
                inputMode="decimal"
                autoComplete="off"
                error={formState.errors.loss?.message}
                {...register('loss')}
              />
            </div>
            <FormProblem sentence={formState.errors.root?.['server']?.message} />
            <p>
              <Button
                type="submit"
                kind={first === undefined ? 'blocked' : proposal ? 'plain' : 'main'}
                busy={propose.isPending}
              >
                {first === undefined ? 'Choose a casting first' : 'Plan the charge'}
              </Button>
            </p>
          </>
        ) : null}
      </form>
      {proposal ? (
        <Proposal
          key={propose.submittedAt}
          proposal={proposal}
          lossShare={propose.variables?.lossShare ?? 0}
        />
      ) : null}
      {first === undefined ? null : <Kept castingId={first} />}
    </div>
  );
};

/** Plans a charge from the lots on hand for castings that wait for metal, and keeps the plan. */
export const PlanPage = () => {
  const castings = useQuery(castingsQuery());
  return (
    <>
      <PageTitle
        title="Plan a charge"
        summary="The best mixture of the lots on hand: on target for every metal, never under the mark, the oldest returns first."
      />
      <Loaded query={castings} what="the castings">
        {(list) => <Planner castings={list} />}
      </Loaded>
    </>
  );
};
