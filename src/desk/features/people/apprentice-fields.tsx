import { useQuery } from '@tanstack/react-query';
import { useController, useWatch, type Control } from 'react-hook-form';
import { workerRoleOf } from '#shared/domain/people/apprenticeship.ts';
import { alloysQuery } from '#src/api/alloys.ts';
import { CheckField } from '#src/ui/check-field.tsx';
import { ChipChoice } from '#src/desk/parts/chip-choice.tsx';
import { partChoices, type PartChoice, type PersonValues } from './person-values.ts';

const partNames: Readonly<Record<PartChoice, string>> = {
  charge: 'charge',
  melt: 'melt',
  pour: 'flask out, pour and quench',
  close: 'close',
};

interface Props<Request> {
  readonly control: Control<PersonValues, unknown, Request>;
}

const AlloyFields = <Request,>({ control }: Props<Request>) => {
  const every = useController({ control, name: 'everyAlloy' }).field;
  const chosen = useController({ control, name: 'alloyIds' }).field;
  const alloys = useQuery(alloysQuery);
  const names = Object.fromEntries((alloys.data ?? []).map(({ id, name }) => [id, name]));
  return (
    <div className="grid content-start gap-3">
      <CheckField
        label="Every alloy"
        checked={every.value}
        onChange={({ currentTarget }) => every.onChange(currentTarget.checked)}
      />
      {every.value ? null : (
        <ChipChoice
          legend="These alloys"
          values={Object.keys(names)}
          names={names}
          chosen={chosen.value}
          onChange={chosen.onChange}
        />
      )}
    </div>
  );
};

const PartFields = <Request,>({ control }: Props<Request>) => {
  const every = useController({ control, name: 'everyPart' }).field;
  const chosen = useController({ control, name: 'parts' }).field;
  return (
    <div className="grid content-start gap-3">
      <CheckField
        label="Every part of a card"
        hint="The guard is everyone’s. What is not theirs, a caster takes over."
        checked={every.value}
        onChange={({ currentTarget }) => every.onChange(currentTarget.checked)}
      />
      {every.value ? null : (
        <ChipChoice
          legend="These parts"
          values={partChoices}
          names={partNames}
          chosen={chosen.value}
          onChange={chosen.onChange}
        />
      )}
    </div>
  );
};

/** Which alloys and which parts of a card an apprentice may do; shown only for someone who works as one. */
export const ApprenticeFields = <Request,>({ control }: Props<Request>) => {
  const roles = useWatch({ control, name: 'roles' });
  if (workerRoleOf(roles) !== 'apprentice') return null;
  return (
    <fieldset className="grid gap-4">
      <legend className="pb-3 text-lg font-black">What this apprentice may do</legend>
      <div className="grid gap-x-14 gap-y-6 md:grid-cols-2">
        <AlloyFields control={control} />
        <PartFields control={control} />
      </div>
    </fieldset>
  );
};
