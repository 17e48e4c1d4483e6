import { zodResolver } from '@hookform/resolvers/zod';
import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { FormProvider, useForm, useFormContext } from 'react-hook-form';
import type { z } from 'zod';
import type { Alloy } from '#shared/contracts/alloy.ts';
import { changePotRequest } from '#shared/contracts/charge.ts';
import { wholeOfLot } from '#shared/domain/metal/judge-lot.ts';
import { alloysQuery } from '#src/api/alloys.ts';
import { cruciblesQuery, useChangePot } from '#src/api/charges.ts';
import { Button } from '#src/ui/button.tsx';
import { PageTitle } from '#src/ui/page-title.tsx';
import { SelectField } from '#src/ui/select-field.tsx';
import { applyProblem } from '#src/desk/parts/apply-problem.ts';
import { approvedRevision } from '#src/desk/parts/choose-revision.ts';
import { CompositionFields } from '#src/desk/parts/composition-fields.tsx';
import { atFormPlaces, formSchema } from '#src/desk/parts/form-schema.ts';
import { FormProblem } from '#src/desk/parts/form-problem.tsx';
import { Loaded } from '#src/desk/parts/loaded.tsx';
import { useStudio } from '#src/desk/parts/use-studio.ts';
import { MassField } from './act-fields.tsx';
import { PotOutcome, type PotTarget } from './pot-outcome.tsx';
import { emptyPot, fillPot, potReading, type PotValues } from './pot-values.ts';

type Request = z.output<typeof changePotRequest>;

interface WithAlloys {
  readonly alloys: readonly Alloy[];
}

const approved = (alloys: readonly Alloy[]) =>
  alloys.flatMap((alloy) => {
    const revision = approvedRevision(alloy);
    return revision ? [{ alloy, revision }] : [];
  });

const InThePot = ({ alloys }: WithAlloys) => {
  const { units, mass } = useStudio();
  const { register, setValue } = useFormContext<PotValues>();
  const { data: crucibles = [] } = useQuery(cruciblesQuery);
  const from = register('from');
  const fill = (chosen: string): void => {
    const filled = fillPot(chosen, { alloys, crucibles }, units.mass);
    if (!filled) return;
    setValue('parts', filled.parts, { shouldDirty: true });
    if (filled.mass !== undefined) setValue('mass', filled.mass, { shouldDirty: true });
  };
  return (
    <>
      <SelectField
        label="Fill in from"
        hint="A melt’s crucible as the ledger has it, or one of your alloys; then change what is otherwise."
        placeholder="Nothing: type it"
        options={[
          ...crucibles.map(({ melt, alloy, massG }) => ({
            value: `melt:${melt.id}`,
            label: `${melt.code}, ${alloy.name}, ${mass(massG)}`,
          })),
          ...approved(alloys).map(({ alloy, revision }) => ({
            value: `alloy:${alloy.id}`,
            label: `${alloy.name} ${revision.fineness}`,
          })),
        ]}
        {...from}
        onChange={(event) => {
          void from.onChange(event);
          fill(event.target.value);
        }}
      />
      <MassField name="mass" label="Mass in the pot" hint="g, kg, dwt or ozt may stand after it." />
      <div className="grid gap-2">
        <CompositionFields whole={wholeOfLot('grain')} />
        <p className="text-[15px] text-soft">
          Gold and silver want a tolerance: 0 where nothing is known of it; the worst case then rests on the
          figures as they are typed.
        </p>
      </div>
    </>
  );
};

const Target = ({ alloys }: WithAlloys) => {
  const { register, formState } = useFormContext<PotValues>();
  return (
    <SelectField
      label="It is to become"
      placeholder="Choose an alloy"
      options={approved(alloys).map(({ alloy, revision }) => ({
        value: revision.id,
        label: `${alloy.name} ${revision.fineness}`,
      }))}
      error={formState.errors.alloyRevisionId?.message}
      {...register('alloyRevisionId')}
    />
  );
};

const targetOf = (alloys: readonly Alloy[], revisionId: string): PotTarget | null => {
  const found = approved(alloys).find(({ revision }) => revision.id === revisionId);
  return found
    ? { name: found.alloy.name, family: found.alloy.family, fineness: found.revision.fineness }
    : null;
};

const PotForm = ({ alloys }: WithAlloys) => {
  const { units } = useStudio();
  const reading = useMemo(() => potReading(units.mass), [units.mass]);
  const change = useChangePot();
  const form = useForm<PotValues, unknown, Request>({
    resolver: zodResolver(formSchema(changePotRequest, reading)),
    defaultValues: emptyPot,
  });
  const submit = form.handleSubmit(async (request) => {
    try {
      await change.mutateAsync(request);
    } catch (error) {
      const placed = atFormPlaces(error, (path) => reading.placeOf(path, form.getValues()));
      applyProblem<PotValues>(placed, ['mass', 'parts', 'alloyRevisionId'], form.setError);
    }
  });
  const target = change.variables ? targetOf(alloys, change.variables.alloyRevisionId) : null;
  return (
    <div className="grid gap-x-14 gap-y-11 xl:grid-cols-[minmax(0,520px)_minmax(0,1fr)]">
      <FormProvider {...form}>
        <form
          noValidate
          onSubmit={(event) => void submit(event)}
          className="grid max-w-[720px] content-start gap-6"
        >
          <InThePot alloys={alloys} />
          <Target alloys={alloys} />
          <FormProblem sentence={form.formState.errors.root?.['server']?.message} />
          <p>
            <Button type="submit" kind={change.data ? 'plain' : 'main'} busy={change.isPending}>
              Work out what to add
            </Button>
          </p>
        </form>
      </FormProvider>
      {change.data && change.variables && target ? (
        <PotOutcome pot={change.variables} target={target} outcome={change.data} />
      ) : null}
    </div>
  );
};

/** Raises or lowers a pot already melted: what it holds, what it is to become, and what to add from the lots on hand. */
export const PotPage = () => {
  const alloys = useQuery(alloysQuery);
  return (
    <>
      <PageTitle
        title="Change a pot"
        summary="Metal already melted, raised or lowered to an alloy: the least that puts every element right."
      />
      <Loaded query={alloys} what="the alloys">
        {(list) => <PotForm alloys={list} />}
      </Loaded>
    </>
  );
};
