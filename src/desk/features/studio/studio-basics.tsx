import { markPlaces } from '#shared/domain/metal/fineness-marks.ts';
import { SelectField } from '#src/ui/select-field.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import { faultAt, type FormPart } from './form-parts.ts';
import { NumberField } from './number-field.tsx';

const temperatureUnits = [
  { value: 'C', label: 'degrees Celsius, °C' },
  { value: 'F', label: 'degrees Fahrenheit, °F' },
];

const massUnits = [
  { value: 'g', label: 'grams, g' },
  { value: 'dwt', label: 'pennyweight, dwt' },
  { value: 'ozt', label: 'troy ounces, ozt' },
];

const marksPlaces = markPlaces.map((place) => ({ value: place, label: place }));

/** The studio's name, units, marks, time zone and idle lock. */
export const StudioBasics = ({ register, errors }: FormPart) => (
  <div className="grid max-w-3xl items-start gap-5 sm:grid-cols-2">
    <TextField
      label="Name"
      hint="As it stands at the sign-in."
      autoComplete="off"
      error={faultAt(errors, 'name')}
      {...register('name')}
    />
    <TextField
      label="Time zone"
      hint="Written like Europe/Lisbon; the day begins by it."
      list="time-zones"
      autoComplete="off"
      spellCheck={false}
      error={faultAt(errors, 'timeZone')}
      {...register('timeZone')}
    />
    <datalist id="time-zones">
      {Intl.supportedValuesOf('timeZone').map((zone) => (
        <option key={zone} value={zone} />
      ))}
    </datalist>
    <SelectField
      label="Temperatures are read in"
      options={temperatureUnits}
      error={faultAt(errors, 'temperatureUnit')}
      {...register('temperatureUnit')}
    />
    <SelectField
      label="Metal is weighed in"
      options={massUnits}
      error={faultAt(errors, 'massUnit')}
      {...register('massUnit')}
    />
    <SelectField
      label="Fineness marks are judged by"
      hint="The local assay office has the last word."
      options={marksPlaces}
      error={faultAt(errors, 'marksPlace')}
      {...register('marksPlace')}
    />
    <NumberField
      path="idleLockS"
      label="A terminal locks after"
      unit="s"
      hint="Without a touch; its timers run on."
      register={register}
      errors={errors}
    />
  </div>
);
