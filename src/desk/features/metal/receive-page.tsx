import { zodResolver } from '@hookform/resolvers/zod';
import { useQuery } from '@tanstack/react-query';
import { useMemo, useState } from 'react';
import { FormProvider, useForm, useFormContext, useWatch, type Path } from 'react-hook-form';
import { Link, useNavigate } from 'react-router-dom';
import type { z } from 'zod';
import { receiveLotRequest } from '#shared/contracts/lot.ts';
import { wholeOfLot } from '#shared/domain/metal/judge-lot.ts';
import { lotKindNames, lotKinds } from '#shared/domain/metal/lot.ts';
import { alloysQuery } from '#src/api/alloys.ts';
import { useReceiveLot } from '#src/api/lots.ts';
import { isProblemError } from '#src/lib/http.ts';
import { useNow } from '#src/lib/use-now.ts';
import { buttonClass } from '#src/ui/button-class.ts';
import { Button } from '#src/ui/button.tsx';
import { CheckField } from '#src/ui/check-field.tsx';
import { PageTitle } from '#src/ui/page-title.tsx';
import { SelectField } from '#src/ui/select-field.tsx';
import { TextAreaField } from '#src/ui/text-area-field.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import { applyProblem } from '#src/desk/parts/apply-problem.ts';
import { FormProblem } from '#src/desk/parts/form-problem.tsx';
import { useStudio } from '#src/desk/parts/use-studio.ts';
import { approvedRevision } from '#src/desk/parts/choose-revision.ts';
import { CompositionFields } from '#src/desk/parts/composition-fields.tsx';
import { capitalised } from '#src/desk/parts/element-names.ts';
import { atFormPlaces, formSchema, rootOfParts } from '#src/desk/parts/form-schema.ts';
import { MassField } from './act-fields.tsx';
import { useActKey } from './use-act-key.ts';
import { emptyReceive, receiveReading, type ReceiveValues } from './receive-values.ts';

type Request = z.output<typeof receiveLotRequest>;

const kinds = lotKinds.map((kind) => ({ value: kind, label: capitalised(lotKindNames[kind]) }));

const fields: readonly Path<ReceiveValues>[] = [
  'name',
  'kind',
  'alloyRevisionId',
  'parts',
  'mass',
  'supplier',
  'supplierReference',
  'place',
  'receivedOn',
  'quarantineReason',
];

const WhatItIs = () => {
  const { register, formState, control } = useFormContext<ReceiveValues>();
  const alloys = useQuery(alloysQuery);
  const kind = useWatch({ control, name: 'kind' });
  const options = (alloys.data ?? []).flatMap((alloy) => {
    const revision = approvedRevision(alloy);
    return revision ? [{ value: revision.id, label: `${alloy.name}, revision ${revision.number}` }] : [];
  });
  const { errors } = formState;
  return (
    <>
      <TextField
        label="Name"
        hint="As the studio calls it."
        autoComplete="off"
        error={errors.name?.message}
        {...register('name')}
      />
      <div className="grid items-start gap-4 sm:grid-cols-2">
        <SelectField
          label="Kind"
          placeholder="Choose a kind"
          options={kinds}
          error={errors.kind?.message}
          {...register('kind')}
        />
        <SelectField
          label="Alloy"
          placeholder="None of ours"
          options={options}
          error={errors.alloyRevisionId?.message}
          {...register('alloyRevisionId')}
        />
      </div>
      <div className="grid gap-2">
        <CompositionFields whole={wholeOfLot(kind)} />
        <p className="text-[15px] text-soft">
          {kind === 'fine'
            ? 'Fine metal is certified by its purity alone: gold 99.99 is complete as it stands, without the rest.'
            : 'As the certificate says. Gold and silver want its tolerance: 0 where it gives none.'}
        </p>
      </div>
    </>
  );
};

const WhereFrom = () => {
  const { register, formState } = useFormContext<ReceiveValues>();
  const { errors } = formState;
  return (
    <>
      <div className="grid items-start gap-4 sm:grid-cols-2">
        <MassField name="mass" label="Mass" hint="As weighed here; g, kg, dwt or ozt may stand after it." />
        <TextField
          label="Received on"
          hint="The day it came."
          type="date"
          error={errors.receivedOn?.message}
          {...register('receivedOn')}
        />
        <TextField label="Supplier" error={errors.supplier?.message} {...register('supplier')} />
        <TextField
          label="Supplier’s reference"
          autoComplete="off"
          error={errors.supplierReference?.message}
          {...register('supplierReference')}
        />
      </div>
      <TextField
        label="Place"
        hint="Where it lies in the studio."
        error={errors.place?.message}
        {...register('place')}
      />
      <TextAreaField
        label="Keep in quarantine, because"
        hint="Leave it empty if the metal may be used at once."
        rows={2}
        error={errors.quarantineReason?.message}
        {...register('quarantineReason')}
      />
    </>
  );
};

/** Takes a lot in; what looks odd is asked about at its field, and taken once the person stands by it. */
export const ReceivePage = () => {
  const { clock, units } = useStudio();
  const nowMs = useNow(60_000);
  const key = useActKey();
  const [isQuestioned, setQuestioned] = useState(false);
  const receive = useReceiveLot();
  const navigate = useNavigate();
  const reading = useMemo(
    () => receiveReading({ key, unit: units.mass, clock, nowMs }),
    [key, units.mass, clock, nowMs],
  );
  const form = useForm<ReceiveValues, unknown, Request>({
    resolver: zodResolver(formSchema(receiveLotRequest, reading)),
    defaultValues: emptyReceive(clock.dayOf(nowMs)),
    mode: 'onTouched',
  });
  const submit = form.handleSubmit(async (request) => {
    try {
      const lot = await receive.mutateAsync(request);
      await navigate(`/metal/lots/${lot.id}`);
    } catch (error) {
      if (isProblemError(error, 'entry-questioned')) setQuestioned(true);
      const atPlaces = atFormPlaces(error, (path) => rootOfParts(reading.placeOf(path, form.getValues())));
      applyProblem<ReceiveValues>(atPlaces, fields, form.setError);
    }
  });
  return (
    <>
      <PageTitle
        title="Receive a lot"
        summary="It gets a code and a label; from then on every gram of it is followed."
      />
      <FormProvider {...form}>
        <form noValidate onSubmit={(event) => void submit(event)} className="grid max-w-[720px] gap-7">
          <WhatItIs />
          <WhereFrom />
          {isQuestioned ? (
            <CheckField
              label="I have looked at it again, and it is right"
              hint="What is asked above is then taken as typed."
              {...form.register('confirmed')}
            />
          ) : null}
          <FormProblem sentence={form.formState.errors.root?.['server']?.message} />
          <p className="flex flex-wrap gap-4">
            <Button type="submit" kind="main" busy={form.formState.isSubmitting}>
              Take it in
            </Button>
            <Link to="/metal" className={buttonClass({ kind: 'quiet' })}>
              Leave without taking in
            </Link>
          </p>
        </form>
      </FormProvider>
    </>
  );
};
