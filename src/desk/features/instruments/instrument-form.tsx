import { zodResolver } from '@hookform/resolvers/zod';
import { useQuery } from '@tanstack/react-query';
import { useForm, useWatch } from 'react-hook-form';
import { z } from 'zod';
import {
  createInstrumentRequest,
  type CreatedInstrument,
  type CreateInstrumentRequest,
} from '#shared/contracts/instrument.ts';
import { instrumentKindNames, instrumentKinds } from '#shared/domain/instrument/instrument.ts';
import { thermocouples, thermocoupleTypes } from '#shared/domain/instrument/thermocouple.ts';
import { useCreateInstrument } from '#src/api/instruments.ts';
import { terminalsQuery } from '#src/api/terminals.ts';
import { Button } from '#src/ui/button.tsx';
import { SelectField } from '#src/ui/select-field.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import { applyProblem } from '#src/desk/parts/apply-problem.ts';
import { FormProblem } from '#src/desk/parts/form-problem.tsx';

interface Values {
  readonly name: string;
  readonly kind: CreateInstrumentRequest['kind'];
  readonly thermocouple: string;
  readonly terminalId: string;
}

const empty: Values = { name: '', kind: 'thermometer', thermocouple: 'K', terminalId: '' };

const form = z
  .custom<Values>()
  .transform(({ thermocouple, terminalId, ...rest }): unknown => ({
    ...rest,
    thermocouple: rest.kind === 'thermometer' ? thermocouple : null,
    terminalId: terminalId === '' ? null : terminalId,
  }))
  .pipe(createInstrumentRequest as z.ZodType<CreateInstrumentRequest, unknown>);

const kinds = instrumentKinds.map((value) => ({ value, label: instrumentKindNames[value] }));
const types = thermocoupleTypes.map((value) => ({
  value,
  label: `${value}, ${thermocouples[value].metals}`,
}));

const Token = ({ created, onDone }: { readonly created: CreatedInstrument; readonly onDone: () => void }) => (
  <section
    aria-labelledby="token"
    className="screen-only grid gap-4 rounded-[22px] border-2 border-line bg-panel px-6 py-6"
  >
    <h2 id="token" className="text-[21px] font-black">
      Token of {created.instrument.name}
    </h2>
    <p className="font-mono text-[17px] font-bold break-all" data-part="token">
      {created.token}
    </p>
    <p className="text-soft">
      A logger sends it with every reading. It is shown only here and now; lost, end the instrument and enter
      it anew. docs/instruments.md says how to send.
    </p>
    <p>
      <Button onClick={onDone}>It is noted</Button>
    </p>
  </section>
);

/** Enters an instrument and shows the token it sends with. */
export const InstrumentForm = () => {
  const create = useCreateInstrument();
  const terminals = useQuery(terminalsQuery);
  const { register, control, handleSubmit, setError, reset, formState } = useForm<
    Values,
    unknown,
    CreateInstrumentRequest
  >({ resolver: zodResolver(form), defaultValues: empty });
  const kind = useWatch({ control, name: 'kind' });
  const { errors } = formState;
  const submit = handleSubmit(async (request) => {
    try {
      await create.mutateAsync(request);
      reset();
    } catch (error) {
      applyProblem(error, ['name', 'kind', 'thermocouple', 'terminalId'], setError);
    }
  });
  if (create.data) return <Token created={create.data} onDone={() => create.reset()} />;
  const places = (terminals.data ?? [])
    .filter(({ revokedAt }) => revokedAt === null)
    .map(({ id, name, bay }) => ({ value: id, label: `${name}, ${bay}` }));
  return (
    <section aria-labelledby="enter" className="screen-only grid gap-5">
      <h2 id="enter" className="text-[21px] font-black">
        Enter an instrument
      </h2>
      <form noValidate onSubmit={(event) => void submit(event)} className="grid gap-5">
        <TextField
          label="Name of the instrument"
          hint="As people call it, such as “Dip lance, bay 1”."
          autoComplete="off"
          error={errors.name?.message}
          {...register('name')}
        />
        <SelectField label="What it is" options={kinds} error={errors.kind?.message} {...register('kind')} />
        {kind === 'thermometer' ? (
          <SelectField
            label="Thermocouple"
            options={types}
            error={errors.thermocouple?.message}
            {...register('thermocouple')}
          />
        ) : null}
        <SelectField
          label="Where it stands"
          placeholder="At no terminal"
          options={places}
          error={errors.terminalId?.message}
          {...register('terminalId')}
        />
        <FormProblem sentence={errors.root?.server?.message} />
        <p>
          <Button type="submit" kind="main" busy={create.isPending}>
            Enter it
          </Button>
        </p>
      </form>
    </section>
  );
};
