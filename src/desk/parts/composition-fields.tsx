import { useId } from 'react';
import { useFieldArray, useFormContext, useWatch } from 'react-hook-form';
import { parseDecimal } from '#shared/lib/decimal.ts';
import { exactWhole, isWhole, sumOfWt, type WholeRange } from '#shared/lib/whole-range.ts';
import { Button } from '#src/ui/button.tsx';
import { controlClass } from '#src/ui/control-class.ts';
import { FieldError } from '#src/ui/field.tsx';
import { elementNames, writeWt } from './element-names.ts';
import { emptyPart, type PartValues } from './read-parts.ts';

/** A form that holds a composition. */
interface WithParts {
  readonly parts: PartValues[];
}

/** Sum of what can be read of the parts, wt%. */
export const sumOfParts = (parts: readonly { readonly wt: string }[]): number =>
  sumOfWt(
    parts.flatMap(({ wt }) => {
      const number = parseDecimal(wt);
      return number.ok ? [number.value] : [];
    }),
  );

/** What the running sum says: how much is missing or too much, beyond what still counts as whole. */
export const sumSentence = (sum: number, whole: WholeRange = exactWhole): string => {
  if (isWhole(sum, whole)) return `Sum ${writeWt(sum)} wt%: complete.`;
  const off = 100 - sum;
  return `Sum ${writeWt(sum)} wt%: ${writeWt(Math.abs(off))} ${off > 0 ? 'missing' : 'too much'}.`;
};

const PartRow = ({
  index,
  names,
  onRemove,
}: {
  readonly index: number;
  readonly names: string;
  readonly onRemove: () => void;
}) => {
  const { register, formState } = useFormContext<WithParts>();
  const id = useId();
  const errors = formState.errors.parts?.[index];
  const error = errors?.symbol?.message ?? errors?.wt?.message ?? errors?.tolerance?.message;
  const wiring = (isWrong: boolean) => ({
    'aria-invalid': isWrong ? (true as const) : undefined,
    'aria-describedby': error ? `${id}-error` : undefined,
    autoComplete: 'off',
    className: controlClass,
  });
  return (
    <div className="grid gap-1">
      <div className="grid grid-cols-[minmax(4.5rem,1fr)_minmax(4.5rem,1fr)_minmax(4.5rem,1fr)_auto] gap-2">
        <input
          {...register(`parts.${index}.symbol`)}
          {...wiring(Boolean(errors?.symbol))}
          aria-label={`Element ${index + 1}`}
          placeholder="Ag"
          list={names}
          maxLength={4}
        />
        <input
          {...register(`parts.${index}.wt`)}
          {...wiring(Boolean(errors?.wt))}
          aria-label={`Part of element ${index + 1}, wt%`}
          inputMode="decimal"
        />
        <input
          {...register(`parts.${index}.tolerance`)}
          {...wiring(Boolean(errors?.tolerance))}
          aria-label={`Tolerance of element ${index + 1}, wt%`}
          inputMode="decimal"
        />
        <Button kind="quiet" icon="cross" aria-label={`Take out element ${index + 1}`} onClick={onRemove} />
      </div>
      <FieldError id={`${id}-error`} error={error} />
    </div>
  );
};

/** The composition in wt%, a row for each metal, with its running sum. */
export const CompositionFields = ({ whole = exactWhole }: { readonly whole?: WholeRange }) => {
  const { control, formState } = useFormContext<WithParts>();
  const { fields, append, remove } = useFieldArray({ control, name: 'parts' });
  const parts = useWatch({ control, name: 'parts' });
  const names = useId();
  return (
    <fieldset className="grid gap-2">
      <legend className="pb-1 font-extrabold">Composition, wt%</legend>
      <div
        aria-hidden="true"
        className="grid grid-cols-[minmax(4.5rem,1fr)_minmax(4.5rem,1fr)_minmax(4.5rem,1fr)_auto] gap-2 text-[15px] text-soft"
      >
        <span>Element</span>
        <span>Part</span>
        <span>Tolerance ±</span>
        <span className="w-[62px]" />
      </div>
      <datalist id={names}>
        {Object.entries(elementNames).map(([symbol, name]) => (
          <option key={symbol} value={symbol}>
            {name}
          </option>
        ))}
      </datalist>
      {fields.map((field, index) => (
        <PartRow key={field.id} index={index} names={names} onRemove={() => remove(index)} />
      ))}
      <div className="flex flex-wrap items-center justify-between gap-3">
        <output className="font-extrabold">{sumSentence(sumOfParts(parts), whole)}</output>
        <Button onClick={() => append(emptyPart)}>Add an element</Button>
      </div>
      <FieldError
        id={`${names}-error`}
        error={formState.errors.parts?.root?.message ?? formState.errors.parts?.message}
      />
    </fieldset>
  );
};
