import type { ReactNode } from 'react';

/** Props of {@link ChipChoice}. */
export interface ChipChoiceProps<Value extends string> {
  readonly legend: string;
  readonly names: Readonly<Record<Value, ReactNode>>;
  readonly values: readonly Value[];
  readonly chosen: readonly Value[];
  readonly onChange: (chosen: Value[]) => void;
}

/** A compact choice of any of a few; choosing none narrows nothing. */
export const ChipChoice = <Value extends string>({
  legend,
  names,
  values,
  chosen,
  onChange,
}: ChipChoiceProps<Value>) => (
  <fieldset className="flex flex-wrap items-center gap-2">
    <legend className="float-left mr-1 min-w-40 py-1.5 text-[15px] font-extrabold text-soft">{legend}</legend>
    {values.map((value) => (
      <label key={value} className="relative inline-flex">
        <input
          type="checkbox"
          checked={chosen.includes(value)}
          onChange={({ currentTarget }) =>
            onChange(
              values.filter((each) => (each === value ? currentTarget.checked : chosen.includes(each))),
            )
          }
          className="peer absolute inset-0 appearance-none rounded-full"
        />
        <span className="pointer-events-none relative inline-flex min-h-9 items-center rounded-full border-2 border-soft px-3.5 text-[15px] font-extrabold peer-checked:border-ink peer-checked:bg-ink peer-checked:text-ground">
          {names[value]}
        </span>
      </label>
    ))}
  </fieldset>
);
