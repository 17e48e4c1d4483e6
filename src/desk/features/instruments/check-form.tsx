import { zodResolver } from '@hookform/resolvers/zod';
import { useState } from 'react';
import { useForm, useWatch } from 'react-hook-form';
import { z } from 'zod';
import { recordCheckRequest, type Instrument } from '#shared/contracts/instrument.ts';
import { fixedPointData, fixedPoints, type FixedPointName } from '#shared/domain/instrument/fixed-point.ts';
import { judgePlateau } from '#shared/domain/instrument/pyrometer-check.ts';
import { parseDecimal } from '#shared/lib/decimal.ts';
import { fromCelsius, toCelsius, type TemperatureUnit } from '#shared/lib/units.ts';
import { useRecordCheck } from '#src/api/instruments.ts';
import { Button } from '#src/ui/button.tsx';
import { Dialog } from '#src/ui/dialog.tsx';
import { SelectField } from '#src/ui/select-field.tsx';
import { TextAreaField } from '#src/ui/text-area-field.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import { applyProblem } from '#src/desk/parts/apply-problem.ts';
import { FormProblem } from '#src/desk/parts/form-problem.tsx';
import { useStudio } from '#src/desk/parts/use-studio.ts';

interface Values {
  readonly point: FixedPointName;
  readonly readC: string;
  readonly wanderC: string;
  readonly note: string;
}

type Request = z.output<typeof recordCheckRequest>;

const numberOf = (text: string): number => {
  const parsed = parseDecimal(text);
  return parsed.ok ? parsed.value : Number.NaN;
};

/** What was typed as numbers in °C; NaN where it is none. */
const readingOf = ({ point, readC, wanderC }: Values, unit: TemperatureUnit) => ({
  point,
  readC: toCelsius(numberOf(readC), unit),
  wanderC: unit === 'F' ? (numberOf(wanderC) * 5) / 9 : numberOf(wanderC),
});

const formFor = (key: string, unit: TemperatureUnit) =>
  z
    .custom<Values>()
    .transform((values): unknown => ({ ...readingOf(values, unit), key, note: values.note }))
    .pipe(recordCheckRequest as z.ZodType<Request, unknown>);

const CheckFields = ({
  instrument,
  onClose,
}: {
  readonly instrument: Instrument;
  readonly onClose: () => void;
}) => {
  const { units } = useStudio();
  const [key] = useState(() => crypto.randomUUID());
  const record = useRecordCheck(instrument.id);
  const { register, control, handleSubmit, setError, formState } = useForm<Values, unknown, Request>({
    resolver: zodResolver(formFor(key, units.temperature)),
    defaultValues: { point: 'silver', readC: '', wanderC: '0.5', note: '' },
  });
  const values = useWatch({ control }) as Values;
  const { temperatureC, caution, source } = fixedPointData[values.point];
  const finding = judgePlateau(readingOf(values, units.temperature));
  const { errors } = formState;
  const submit = handleSubmit(async (request) => {
    try {
      await record.mutateAsync(request);
      onClose();
    } catch (error) {
      applyProblem(error, ['point', 'readC', 'wanderC', 'note'], setError);
    }
  });
  const options = fixedPoints.map((value) => ({
    value,
    label: `${fixedPointData[value].name}, ${fromCelsius(fixedPointData[value].temperatureC, units.temperature).toFixed(1)} °${units.temperature}`,
  }));
  return (
    <form noValidate onSubmit={(event) => void submit(event)} className="grid gap-5">
      <p className="text-soft">
        While pure metal or the eutectic freezes, nature keeps its temperature: the phase rule leaves no
        freedom. Melt it, let it freeze slowly, and read the instrument on the plateau at {temperatureC} °C.
      </p>
      <SelectField label="Metal" options={options} hint={`${caution} ${source}`} {...register('point')} />
      <div className="grid items-start gap-4 sm:grid-cols-2">
        <TextField
          label="Read on the plateau"
          hint="The middle, without any offset."
          unit={`°${units.temperature}`}
          inputMode="decimal"
          autoComplete="off"
          error={errors.readC?.message}
          {...register('readC')}
        />
        <TextField
          label="It wandered by ±"
          unit={`°${units.temperature}`}
          inputMode="decimal"
          autoComplete="off"
          error={errors.wanderC?.message}
          {...register('wanderC')}
        />
      </div>
      {values.readC.trim() === '' ? null : (
        <p role="status" className="font-extrabold">
          {finding.ok ? finding.value.sentence : finding.error}
        </p>
      )}
      <TextAreaField label="Note" rows={2} error={errors.note?.message} {...register('note')} />
      <FormProblem sentence={errors.root?.server?.message} />
      <p className="flex flex-wrap gap-3">
        <Button type="submit" kind="main" busy={record.isPending}>
          Record the check
        </Button>
        <Button onClick={onClose}>Leave it</Button>
      </p>
    </form>
  );
};

/** Records a check of an instrument at a freezing point; what it will find is said while it is typed. */
export const CheckForm = ({ instrument }: { readonly instrument: Instrument }) => {
  const [open, setOpen] = useState(false);
  return (
    <>
      <Button aria-label={`Record a check: ${instrument.name}`} onClick={() => setOpen(true)}>
        Record a check
      </Button>
      {open ? (
        <Dialog open onClose={() => setOpen(false)} title={`Check of ${instrument.name}`}>
          <CheckFields instrument={instrument} onClose={() => setOpen(false)} />
        </Dialog>
      ) : null}
    </>
  );
};
