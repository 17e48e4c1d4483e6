import { zodResolver } from '@hookform/resolvers/zod';
import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { FormProvider, useForm, useWatch } from 'react-hook-form';
import { Link, useNavigate, useParams } from 'react-router-dom';
import type { z } from 'zod';
import { closeOutRequest, type FilledCrucible } from '#shared/contracts/charge.ts';
import { cruciblesQuery, useCloseOut } from '#src/api/charges.ts';
import { buttonClass } from '#src/ui/button-class.ts';
import { Button } from '#src/ui/button.tsx';
import { Notice } from '#src/ui/notice.tsx';
import { PageTitle } from '#src/ui/page-title.tsx';
import { applyProblem } from '#src/desk/parts/apply-problem.ts';
import { writeComposition } from '#src/desk/parts/element-names.ts';
import { atFormPlaces, formSchema } from '#src/desk/parts/form-schema.ts';
import { FormProblem } from '#src/desk/parts/form-problem.tsx';
import { Loaded } from '#src/desk/parts/loaded.tsx';
import { useStudio } from '#src/desk/parts/use-studio.ts';
import { MassField, ReasonField } from './act-fields.tsx';
import { allButton, castingsMg, closeOutReading, type CloseOutValues } from './close-out-values.ts';
import { writeExactGrams, writeExactMass } from './metal-mass.ts';

const InCastings = ({ massG }: { readonly massG: number }) => {
  const { units } = useStudio();
  const values = useWatch<CloseOutValues>() as CloseOutValues;
  const mg = castingsMg(values, massG, units.mass);
  if (mg === null) return null;
  return (
    <p className="text-lg font-black">
      {mg < 0
        ? `That is ${writeExactMass(-mg, units.mass)} ${units.mass} more than is in it.`
        : `In castings: ${writeExactMass(mg, units.mass)} ${units.mass}.`}
    </p>
  );
};

const CloseOutForm = ({ crucible }: { readonly crucible: FilledCrucible }) => {
  const { units } = useStudio();
  const { melt, massG } = crucible;
  const closeOut = useCloseOut(melt.id);
  const navigate = useNavigate();
  const reading = useMemo(() => closeOutReading(units.mass), [units.mass]);
  const form = useForm<CloseOutValues, unknown, z.output<typeof closeOutRequest>>({
    resolver: zodResolver(formSchema(closeOutRequest, reading)),
    defaultValues: allButton(massG, units.mass),
  });
  const submit = form.handleSubmit(async (request) => {
    try {
      await closeOut.mutateAsync(request);
      await navigate(`/melts/${melt.id}`);
    } catch (error) {
      const placed = atFormPlaces(error, (path) => reading.placeOf(path, form.getValues()));
      applyProblem<CloseOutValues>(placed, ['button', 'loss', 'note'], form.setError);
    }
  });
  return (
    <FormProvider {...form}>
      <form noValidate onSubmit={(event) => void submit(event)} className="grid max-w-[720px] gap-6">
        <div className="grid items-start gap-4 sm:grid-cols-2">
          <MassField name="button" label="Button" hint="It becomes a lot of returns." />
          <MassField name="loss" label="Lost" hint="What is nowhere to be found." />
        </div>
        <InCastings massG={massG} />
        <ReasonField name="note" label="What became of the melt" />
        <FormProblem sentence={form.formState.errors.root?.['server']?.message} />
        <p className="flex flex-wrap gap-4">
          <Button type="submit" kind="main" busy={form.formState.isSubmitting}>
            Close it out
          </Button>
          <Link to={`/melts/${melt.id}`} className={buttonClass({ kind: 'quiet' })}>
            Leave it in the crucible
          </Link>
        </p>
      </form>
    </FormProvider>
  );
};

const isOpen = (
  <Notice kind="empty" title="Its card is still open.">
    It is closed at its terminal; the metal is weighed out there.
  </Notice>
);

/** Says what became of the metal that a card left in its crucible: button, loss, and castings for the rest. */
export const CruciblePage = () => {
  const { meltId = '' } = useParams();
  const { units } = useStudio();
  const query = useQuery(cruciblesQuery);
  return (
    <Loaded query={query} what="the crucibles">
      {(crucibles) => {
        const crucible = crucibles.find(({ melt }) => melt.id === meltId);
        if (!crucible)
          return (
            <>
              <PageTitle title="An empty crucible" />
              <Notice
                kind="empty"
                title="By the ledger there is no metal in the crucible of this melt."
                action={
                  <Link to="/metal" className={buttonClass()}>
                    See the lots
                  </Link>
                }
              />
            </>
          );
        const { massG, alloy, melt, compositionWt, endedAt } = crucible;
        return (
          <>
            <PageTitle
              title={`What became of ${melt.code}`}
              summary={`${writeExactGrams(massG, units.mass)} of ${alloy.name} in its crucible: ${writeComposition(compositionWt)} wt%.`}
            />
            {endedAt === null ? isOpen : <CloseOutForm crucible={crucible} />}
          </>
        );
      }}
    </Loaded>
  );
};
