import { Button } from '#src/ui/button.tsx';
import { CheckField } from '#src/ui/check-field.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import type { StepValues } from './step-values.ts';

type Options = StepValues['options'];

/** Props of {@link AnswerFields}. */
export interface AnswerFieldsProps {
  readonly options: Options;
  readonly onChange: (options: Options) => void;
  /** Sentences by field of the step. */
  readonly faults: ReadonlyMap<string, string>;
}

const mostAnswers = 8;

/** The answers that may be chosen at a step, and which of them are a variance. */
export const AnswerFields = ({ options, onChange, faults }: AnswerFieldsProps) => (
  <fieldset className="grid gap-3">
    <legend className="pb-1 font-extrabold">Answers</legend>
    {options.map((option, index) => (
      <div
        // An answer has no name but its place.
        key={index}
        className="grid gap-x-5 gap-y-2 sm:grid-cols-[minmax(0,1fr)_auto_auto] sm:items-center"
      >
        <TextField
          label={`Answer ${index + 1}`}
          value={option.words}
          maxLength={60}
          error={faults.get(`options.${index}.words`)}
          onChange={({ currentTarget }) =>
            onChange(options.with(index, { ...option, words: currentTarget.value }))
          }
        />
        <div className="sm:pt-7">
          <CheckField
            label="is a variance"
            checked={option.isVariance}
            onChange={({ currentTarget }) =>
              onChange(options.with(index, { ...option, isVariance: currentTarget.checked }))
            }
          />
        </div>
        <div className="sm:pt-7">
          <Button kind="quiet" onClick={() => onChange(options.toSpliced(index, 1))}>
            Remove<span className="sr-only"> answer {index + 1}</span>
          </Button>
        </div>
      </div>
    ))}
    {options.length < mostAnswers ? (
      <p>
        <Button icon="plus" onClick={() => onChange([...options, { words: '', isVariance: false }])}>
          Another answer
        </Button>
      </p>
    ) : null}
  </fieldset>
);
