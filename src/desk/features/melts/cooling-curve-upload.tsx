import { useQuery } from '@tanstack/react-query';
import { useId, useState } from 'react';
import { readsTemperature } from '#shared/domain/instrument/instrument.ts';
import { useRecordCurve } from '#src/api/cooling-curves.ts';
import { instrumentsQuery } from '#src/api/instruments.ts';
import { sentenceOf } from '#src/lib/http.ts';
import { FieldError } from '#src/ui/field.tsx';
import { SelectField } from '#src/ui/select-field.tsx';
import { Spinner } from '#src/ui/spinner.tsx';

/** Hands in a logger's table of time and temperature; what is wrong with it is said beside it. */
export const CoolingCurveUpload = ({ meltId }: { readonly meltId: string }) => {
  const id = useId();
  const record = useRecordCurve(meltId);
  const instruments = useQuery(instrumentsQuery);
  const [instrumentId, setInstrumentId] = useState('');
  const options = (instruments.data ?? [])
    .filter(({ kind, active }) => active && readsTemperature(kind))
    .map(({ id: value, name }) => ({ value, label: name }));
  const send = async (file: File): Promise<void> => {
    const table = await file.text();
    record.mutate({
      key: crypto.randomUUID(),
      table,
      instrumentId: instrumentId === '' ? null : instrumentId,
      note: file.name,
    });
  };
  return (
    <div className="screen-only grid max-w-[720px] items-start gap-5 sm:grid-cols-2">
      <SelectField
        label="Logged with"
        hint="Its offset is added, and what its check is worth."
        placeholder="An instrument not named here"
        options={options}
        value={instrumentId}
        onChange={(event) => setInstrumentId(event.target.value)}
      />
      <div className="grid gap-1.5">
        <label htmlFor={id} className="font-extrabold">
          Hand in a curve
        </label>
        <p id={`${id}-hint`} className="text-[15px] text-soft">
          A CSV of time and temperature, °C or °F, with the columns named in its first line.
        </p>
        <input
          id={id}
          type="file"
          accept=".csv,.tsv,.txt,text/csv,text/plain"
          aria-describedby={`${id}-hint ${id}-error`}
          onChange={({ target }) => {
            const [file] = target.files ?? [];
            if (file) void send(file);
            target.value = '';
          }}
          className="text-[15px] file:mr-3 file:rounded-xl file:border-2 file:border-solid file:border-ink file:bg-ground file:px-3 file:py-1.5 file:font-extrabold"
        />
        {record.isPending ? <Spinner label="Reading the curve" /> : null}
        <FieldError id={`${id}-error`} error={record.error ? sentenceOf(record.error) : undefined} />
      </div>
    </div>
  );
};
